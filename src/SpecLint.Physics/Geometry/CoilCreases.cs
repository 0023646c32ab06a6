using System.Runtime.InteropServices;

namespace SpecLint.Physics.Geometry;

/// <summary>Crease lines of the turn density of a keystone or rectangular coil with mitred turns, on the side of positive width.</summary>
/// <remarks>
/// The density is 1 in the hole and falls linearly to 0 across the leg, so its Laplacian lives on these lines only, with the jump of the
/// normal slope as strength: -1/w on the hole's edges, +1/w on the rim's, -|n2 - n1|/w on the mitres between sides of outward normals n1, n2.
/// </remarks>
[StructLayout(LayoutKind.Auto)]
internal readonly struct CoilCreases
{
    /// <summary>Finds the creases of a coil, coordinates counted from a point on the coil axis.</summary>
    /// <param name="coil">Keystone or rectangle; a corner radius is left out.</param>
    /// <param name="origin">Distance of the origin from the shaft axis [m].</param>
    public CoilCreases(in CoilOutline coil, double origin)
    {
        var trapezoid = new CoilTrapezoid(coil);
        HoleInner = Shift(trapezoid.InnerCorner(0.0), origin);
        HoleOuter = Shift(trapezoid.OuterCorner(0.0), origin);
        RimInner = Shift(trapezoid.InnerCorner(coil.LegWidth), origin);
        RimOuter = Shift(trapezoid.OuterCorner(coil.LegWidth), origin);
        HoleLeg = Distance(HoleInner, HoleOuter);
        RimLeg = Distance(RimInner, RimOuter);
        InnerMitre = Distance(HoleInner, RimInner);
        OuterMitre = Distance(HoleOuter, RimOuter);
        Slope = 1.0 / coil.LegWidth;
        InnerMitreJump = Slope * 2.0 * Math.Sin(0.5 * (0.5 * Math.PI - trapezoid.HalfAngle));
        OuterMitreJump = Slope * 2.0 * Math.Sin(0.5 * (0.5 * Math.PI + trapezoid.HalfAngle));
    }

    /// <summary>Corner of the hole nearer the shaft.</summary>
    public PlanePoint HoleInner { get; }

    /// <summary>Corner of the hole farther from the shaft.</summary>
    public PlanePoint HoleOuter { get; }

    /// <summary>Corner of the contour nearer the shaft.</summary>
    public PlanePoint RimInner { get; }

    /// <summary>Corner of the contour farther from the shaft.</summary>
    public PlanePoint RimOuter { get; }

    /// <summary>Length of the hole's edge along the leg [m].</summary>
    public double HoleLeg { get; }

    /// <summary>Length of the contour along the leg [m].</summary>
    public double RimLeg { get; }

    /// <summary>Length of the mitre nearer the shaft [m].</summary>
    public double InnerMitre { get; }

    /// <summary>Length of the mitre farther from the shaft [m].</summary>
    public double OuterMitre { get; }

    /// <summary>Slope of the density across the leg, the size of the jump on edges of hole and contour [1/m].</summary>
    public double Slope { get; }

    /// <summary>Size of the jump on the mitre nearer the shaft [1/m].</summary>
    public double InnerMitreJump { get; }

    /// <summary>Size of the jump on the mitre farther from the shaft [1/m].</summary>
    public double OuterMitreJump { get; }

    /// <summary>Largest distance of the contour from the origin [m].</summary>
    public double Reach => Math.Max(RimInner.Radius, RimOuter.Radius);

    private static PlanePoint Shift(PlanePoint point, double origin) => point with { Across = point.Across - origin };

    private static double Distance(PlanePoint from, PlanePoint to) => double.Hypot(to.Across - from.Across, to.Along - from.Along);
}
