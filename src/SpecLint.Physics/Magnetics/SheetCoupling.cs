using System.Runtime.InteropServices;
using SpecLint.Physics.Numerics;

namespace SpecLint.Physics.Magnetics;

/// <summary>Flux that one uniformly charged sheet sends through a parallel figure: the integral of its solid angle over the figure.</summary>
internal static class SheetCoupling
{
    private const int DiscNodes = 64;
    private static readonly (double[] Nodes, double[] Weights) DiscRule = GaussLegendreRule.Create(DiscNodes);

    /// <summary>Sizes of two parallel rectangles along one axis.</summary>
    /// <param name="HalfSource">Half the size of the charged rectangle [m].</param>
    /// <param name="HalfTarget">Half the size of the crossed rectangle [m].</param>
    /// <param name="Offset">Centre of the crossed less centre of the charged rectangle [m].</param>
    [StructLayout(LayoutKind.Auto)]
    internal readonly record struct Span(double HalfSource, double HalfTarget, double Offset);

    /// <summary>Integral over one rectangle of the solid angle that another subtends.</summary>
    /// <param name="x">Sizes along x.</param>
    /// <param name="y">Sizes along y.</param>
    /// <param name="distance">Distance of the planes [m], >= 0.</param>
    /// <returns>The integral [m^2 sr]; at contact 2 pi times the common area.</returns>
    /// <seealso>Akoun G., Yonnet J.-P., 3D analytical calculation of the forces exerted between two cuboidal magnets, IEEE Trans. Magn. 20(5),
    /// 1984, 1962-1964: the axial force function, which per unit charge is the flux.</seealso>
    public static double BetweenRectangles(in Span x, in Span y, double distance)
    {
        double sum = 0.0;
        for (int corner = 0; corner < 16; corner++)
        {
            double u = x.Offset + Signed(corner & 1, x.HalfTarget) - Signed(corner & 2, x.HalfSource);
            double v = y.Offset + Signed(corner & 4, y.HalfTarget) - Signed(corner & 8, y.HalfSource);
            double sign = int.IsOddInteger(int.PopCount(corner)) ? -1.0 : 1.0;
            sum += sign * Corner(u, v, distance);
        }

        return sum;
    }

    /// <summary>Integral over one disc of the solid angle that an equal coaxial one subtends.</summary>
    /// <param name="radius">Radius of both [m].</param>
    /// <param name="distance">Distance of the planes [m], >= 0.</param>
    /// <returns>The integral [m^2 sr], to about 1e-5; at contact 2 pi times the area.</returns>
    public static double BetweenDiscs(double radius, double distance)
    {
        DiscSheet sheet = new(0.0, radius);
        double sum = 0.0;
        for (int i = 0; i < DiscNodes; i++)
        {
            // Nodes crowd at the rim, where the solid angle of a near sheet falls off.
            double s = 0.5 * (1.0 + DiscRule.Nodes[i]);
            double rho = radius * (1.0 - (s * s));
            sum += DiscRule.Weights[i] * s * radius * rho * sheet.SolidAngle(rho, 0.0, distance);
        }

        return 2.0 * Math.PI * sum;
    }

    private static double Signed(int bit, double value) => bit == 0 ? value : -value;

    /// <summary>Antiderivative in both directions of both rectangles; terms that cancel between corners are left out.</summary>
    private static double Corner(double u, double v, double w)
    {
        double r = Math.Sqrt((u * u) + (v * v) + (w * w));
        double value = w > 0.0 ? -r * w : 0.0;
        if (w > 0.0)
        {
            value -= w * ((u * LogDifference(r, u, (v * v) + (w * w))) + (v * LogDifference(r, v, (u * u) + (w * w))));
        }

        return value + (u * v * Math.Atan2(Math.Abs(u * v), r * w) * Math.Sign(u * v));
    }

    /// <summary>ln(r - a) with r^2 = a^2 + rest, without cancellation for positive a.</summary>
    private static double LogDifference(double r, double a, double rest) => a > 0.0 ? Math.Log(rest / (r + a)) : Math.Log(r - a);
}
