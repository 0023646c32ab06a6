using SpecLint.Physics.Geometry;
using SpecLint.Physics.Numerics;

namespace SpecLint.Physics.Magnetics;

/// <summary>One uniformly magnetised magnet alone in air.</summary>
/// <remarks>
/// Recoil permeability 1, no steel nearby. The origin is the centre of the north face and z points outward along the magnetisation; the body
/// lies at negative z. Exact to rounding outside and on the faces, infinite on sharp edges.
/// </remarks>
public static class FreeMagnet
{
    /// <summary>Flux density on the axis of a block.</summary>
    /// <param name="block">The block.</param>
    /// <param name="distance">Distance from the face [m], >= 0.</param>
    /// <returns>B_z [T].</returns>
    /// <remarks>At the face itself the first arctangent is a right angle. Steel behind the magnet doubles its thickness.</remarks>
    /// <seealso>Engel-Herbert R., Hesjedal T., J. Appl. Phys. 97, 074504, 2005, on the axis; equals Furlani E.P., Permanent Magnet and
    /// Electromechanical Devices, 2001, section 4.2.</seealso>
    public static double BlockOnAxis(in FreeBlock block, double distance)
    {
        double a = block.Length;
        double b = block.Width;
        double far = distance + block.Thickness;
        double near = Math.Atan2(a * b, 2.0 * distance * Math.Sqrt((4.0 * distance * distance) + (a * a) + (b * b)));
        return block.RemanentFluxDensity / Math.PI
            * (near - Math.Atan2(a * b, 2.0 * far * Math.Sqrt((4.0 * far * far) + (a * a) + (b * b))));
    }

    /// <summary>Flux density on the axis of a disc or cylinder.</summary>
    /// <param name="cylinder">The cylinder.</param>
    /// <param name="distance">Distance from the face [m], >= 0.</param>
    /// <returns>B_z [T].</returns>
    /// <seealso>Furlani E.P., Permanent Magnet and Electromechanical Devices, 2001, section 4.2; Derby N., Olbert S., Am. J. Phys. 78(3), 2010.</seealso>
    public static double CylinderOnAxis(in FreeCylinder cylinder, double distance)
    {
        double r = 0.5 * cylinder.Diameter;
        double far = distance + cylinder.Thickness;

        // far/hypot(far, r) - near/hypot(near, r) without cancellation at a distance.
        double fh = double.Hypot(far, r);
        double nh = double.Hypot(distance, r);
        double numerator = r * r * ((far * far) - (distance * distance));
        return 0.5 * cylinder.RemanentFluxDensity * numerator / (fh * nh * ((far * nh) + (distance * fh)));
    }

    /// <summary>Flux density of a block at any point.</summary>
    /// <param name="block">The block; its length lies along x, its width along y.</param>
    /// <param name="x">Position along the length [m].</param>
    /// <param name="y">Position along the width [m].</param>
    /// <param name="z">Height over the north face [m]; inside the body the result is the flux density too.</param>
    /// <returns>B as (x, y, z) [T].</returns>
    /// <seealso>Yang Z.J., Johansen T.H., Bratsberg H., Helgesen G., Skjeltorp A.T., Supercond. Sci. Technol. 3, 1990, 591-597;
    /// Engel-Herbert R., Hesjedal T., J. Appl. Phys. 97, 074504, 2005. Computed here as two charge sheets.</seealso>
    public static (double X, double Y, double Z) BlockField(in FreeBlock block, double x, double y, double z)
    {
        PolygonSheet sheet = PolygonSheet.Rectangle(0.0, block.Length, block.Width);
        double low = z + block.Thickness;
        (double northX, double northY) = sheet.InPlane(x, y, z);
        (double southX, double southY) = sheet.InPlane(x, y, low);
        double scale = block.RemanentFluxDensity / (4.0 * Math.PI);
        double north = z >= 0.0 ? sheet.SolidAngle(x, y, z) : -sheet.SolidAngle(x, y, z);
        double south = low >= 0.0 ? sheet.SolidAngle(x, y, low) : -sheet.SolidAngle(x, y, low);
        bool inside = z < 0.0 && low > 0.0 && Math.Abs(x) < 0.5 * block.Length && Math.Abs(y) < 0.5 * block.Width;
        double normal = (scale * (north - south)) + (inside ? block.RemanentFluxDensity : 0.0);
        return (scale * (northX - southX), scale * (northY - southY), normal);
    }

    /// <summary>Flux density of a cylinder at any point.</summary>
    /// <param name="cylinder">The cylinder.</param>
    /// <param name="rho">Distance from its axis [m], >= 0.</param>
    /// <param name="z">Height over the north face [m]; inside the body the result is the flux density too.</param>
    /// <returns>Radial and axial flux density [T].</returns>
    /// <seealso>Derby N., Olbert S., Cylindrical magnets and ideal solenoids, Am. J. Phys. 78(3), 2010, 229-235, DOI 10.1119/1.3256157.</seealso>
    public static (double Radial, double Axial) CylinderField(in FreeCylinder cylinder, double rho, double z)
    {
        double radius = 0.5 * cylinder.Diameter;
        double low = z + cylinder.Thickness;
        double axial = DiscSheet.EndTerm(radius, rho, low) - DiscSheet.EndTerm(radius, rho, z);
        double radial = DiscSheet.RadialTerm(radius, rho, low) - DiscSheet.RadialTerm(radius, rho, z);
        return (radial * cylinder.RemanentFluxDensity, axial * cylinder.RemanentFluxDensity);
    }

    /// <summary>Magnetic moment of a body of uniform remanence.</summary>
    /// <param name="volume">Volume [m^3].</param>
    /// <param name="remanentFluxDensity">Remanent flux density [T].</param>
    /// <returns>Moment [A m^2], volume times remanence over mu0.</returns>
    /// <seealso>Jackson J.D., Classical Electrodynamics, 3rd ed., 1998, section 5.10.</seealso>
    public static double DipoleMoment(double volume, double remanentFluxDensity) => volume * remanentFluxDensity / MagneticConstant.Mu0;

    /// <summary>Pull of a block on a thick, flat, soft steel plate.</summary>
    /// <param name="block">The block, one pole toward the plate.</param>
    /// <param name="gap">Distance between face and plate [m], >= 0.</param>
    /// <returns>Force [N]. Exact for ideal steel and recoil permeability 1; real pulls in contact are lower by roughness and saturation.</returns>
    /// <remarks>The block and its mirror image: near face on near image less twice near on far plus far on far. In contact the first is area B_r^2/2 mu0.</remarks>
    /// <seealso>Akoun G., Yonnet J.-P., IEEE Trans. Magn. 20(5), 1984, 1962-1964; image method, Jackson 1998, section 2.1.</seealso>
    public static double BlockPullOnSteel(in FreeBlock block, double gap)
    {
        SheetCoupling.Span x = new(0.5 * block.Length, 0.5 * block.Length, 0.0);
        SheetCoupling.Span y = new(0.5 * block.Width, 0.5 * block.Width, 0.0);
        double near = SheetCoupling.BetweenRectangles(x, y, 2.0 * gap);
        double middle = SheetCoupling.BetweenRectangles(x, y, (2.0 * gap) + block.Thickness);
        double far = SheetCoupling.BetweenRectangles(x, y, 2.0 * (gap + block.Thickness));
        return Pull(block.RemanentFluxDensity, near - (2.0 * middle) + far);
    }

    /// <summary>Pull of a cylinder on a thick, flat, soft steel plate.</summary>
    /// <param name="cylinder">The cylinder, one pole toward the plate.</param>
    /// <param name="gap">Distance between face and plate [m], >= 0.</param>
    /// <returns>Force [N]. Exact for ideal steel and recoil permeability 1; real pulls in contact are lower by roughness and saturation.</returns>
    /// <seealso>Image method, Jackson 1998, section 2.1; sheets as in <see cref="CylinderField"/>.</seealso>
    public static double CylinderPullOnSteel(in FreeCylinder cylinder, double gap)
    {
        double r = 0.5 * cylinder.Diameter;
        double near = SheetCoupling.BetweenDiscs(r, 2.0 * gap);
        double middle = SheetCoupling.BetweenDiscs(r, (2.0 * gap) + cylinder.Thickness);
        double far = SheetCoupling.BetweenDiscs(r, 2.0 * (gap + cylinder.Thickness));
        return Pull(cylinder.RemanentFluxDensity, near - (2.0 * middle) + far);
    }

    /// <summary>Flux linkage per turn of a flat rectangular coil over the north face of a free block.</summary>
    /// <param name="block">The block.</param>
    /// <param name="coil">A rectangle; its length lies along the block's length, its turns fill the leg evenly.</param>
    /// <param name="layer">Height of the coil over the face.</param>
    /// <param name="displacement">Distance of the coil's centre from the block's axis, along the width [m].</param>
    /// <returns>Linkage per turn [Wb], positive over the north face; its derivative by the displacement gives the EMF of a sweep.</returns>
    /// <remarks>Mean over the turns by Gauss quadrature of closed forms; to about 1e-5 unless the coil touches the face.</remarks>
    /// <seealso>Akoun G., Yonnet J.-P., IEEE Trans. Magn. 20(5), 1984, 1962-1964.</seealso>
    public static double BlockFluxThroughCoil(in FreeBlock block, in CoilOutline coil, in CoilLayer layer, double displacement)
    {
        double sum = 0.0;
        for (int i = 0; i < TurnRule.Nodes.Length; i++)
        {
            double grown = 0.5 * coil.LegWidth * (1.0 + TurnRule.Nodes[i]);
            SheetCoupling.Span x = new(0.5 * block.Length, (0.5 * coil.HoleLength) + grown, 0.0);
            SheetCoupling.Span y = new(0.5 * block.Width, (0.5 * coil.HoleWidth) + grown, displacement);
            for (int j = 0; j < TurnRule.Nodes.Length; j++)
            {
                double z = layer.MidHeight + (0.5 * layer.Thickness * TurnRule.Nodes[j]);
                double through = SheetCoupling.BetweenRectangles(x, y, z) - SheetCoupling.BetweenRectangles(x, y, z + block.Thickness);
                sum += 0.25 * TurnRule.Weights[i] * TurnRule.Weights[j] * through;
            }
        }

        return block.RemanentFluxDensity * sum / (4.0 * Math.PI);
    }

    private static readonly (double[] Nodes, double[] Weights) TurnRule = GaussLegendreRule.Create(6);

    private static double Pull(double remanentFluxDensity, double coupling) =>
        remanentFluxDensity * remanentFluxDensity * coupling / (4.0 * Math.PI * MagneticConstant.Mu0);

    /// <summary>Distance from the face at which the field on a block's axis has fallen to a given value.</summary>
    /// <param name="block">The block; a sector may be entered as the block of equal length, area and thickness.</param>
    /// <param name="fluxDensity">Flux density looked for [T], > 0.</param>
    /// <returns>Distance [m]; 0 if the field at the face is already lower.</returns>
    public static double BlockReach(FreeBlock block, double fluxDensity) => Reach(d => BlockOnAxis(block, d), fluxDensity, block.Thickness);

    /// <summary>Distance from the face at which the field on a cylinder's axis has fallen to a given value.</summary>
    /// <param name="cylinder">The cylinder.</param>
    /// <param name="fluxDensity">Flux density looked for [T], > 0.</param>
    /// <returns>Distance [m]; 0 if the field at the face is already lower.</returns>
    public static double CylinderReach(FreeCylinder cylinder, double fluxDensity) =>
        Reach(d => CylinderOnAxis(cylinder, d), fluxDensity, cylinder.Thickness);

    private static double Reach(Func<double, double> field, double level, double scale)
    {
        const int Cap = 200;
        const double Relative = 1e-12;
        if (!(level > 0.0) || !(scale > 0.0) || !(field(0.0) > level))
        {
            return level > 0.0 ? 0.0 : double.PositiveInfinity;
        }

        double low = 0.0;
        double high = scale;
        for (int i = 0; i < Cap && field(high) > level; i++)
        {
            (low, high) = (high, 2.0 * high);
        }

        for (int i = 0; i < Cap && high - low > Relative * high; i++)
        {
            double middle = 0.5 * (low + high);
            (low, high) = field(middle) > level ? (middle, high) : (low, middle);
        }

        return 0.5 * (low + high);
    }
}
