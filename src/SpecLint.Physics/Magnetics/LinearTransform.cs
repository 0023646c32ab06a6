using SpecLint.Physics.Geometry;
using SpecLint.Physics.Numerics;

namespace SpecLint.Physics.Magnetics;

/// <summary>Two-dimensional Fourier transforms of magnet faces and turn densities about their own centres.</summary>
/// <remarks>All figures are symmetric about both axes, so the transform is real: the integral of f cos(kx x) cos(ky y).</remarks>
internal static class LinearTransform
{
    private const double SincSeriesLimit = 1e-3;

    /// <summary>Transform of a magnet's face.</summary>
    /// <param name="magnets">Block or disc magnets.</param>
    /// <param name="kx">Wave number along the travel [1/m].</param>
    /// <param name="ky">Wave number across the travel [1/m].</param>
    /// <returns>The transform [m^2].</returns>
    public static double Magnet(in MagnetRow magnets, double kx, double ky)
    {
        if (magnets.Shape == MagnetShape.Disc)
        {
            double k = double.Hypot(kx, ky);
            double radius = 0.5 * magnets.Length;
            return 2.0 * Math.PI * radius * FirstKindBessel.J1(k * radius) / k;
        }

        return magnets.Length * magnets.Width * Sinc(0.5 * kx * magnets.Width) * Sinc(0.5 * ky * magnets.Length);
    }

    /// <summary>Transform of a coil's turn density.</summary>
    /// <param name="coil">The coil; its centre radius is not used, a keystone counts as the rectangle of its middle.</param>
    /// <param name="kx">Wave number along the travel [1/m].</param>
    /// <param name="ky">Wave number across the travel [1/m].</param>
    /// <returns>The transform [m^2].</returns>
    public static double Coil(in CoilOutline coil, double kx, double ky)
    {
        if (coil.Shape == CoilShape.Round)
        {
            return RingTurnDensity.Transform(double.Hypot(kx, ky), 0.5 * coil.HoleWidth, (0.5 * coil.HoleWidth) + coil.LegWidth);
        }

        // Mean over the turns u = 0..w of the rectangle (HoleWidth + 2u) by (HoleLength + 2u), product of sines expanded into cosines.
        double w = coil.LegWidth;
        double a = 0.5 * kx * coil.HoleWidth;
        double b = 0.5 * ky * coil.HoleLength;
        double difference = MeanCosine(a - b, (kx - ky) * w);
        double sum = MeanCosine(a + b, (kx + ky) * w);
        return 2.0 * (difference - sum) / (kx * ky);
    }

    /// <summary>sin(x)/x.</summary>
    /// <param name="x">Argument [rad].</param>
    /// <returns>The value [-], 1 at zero.</returns>
    public static double Sinc(double x) =>
        Math.Abs(x) < SincSeriesLimit ? 1.0 - (x * x * ((1.0 / 6.0) - (x * x / 120.0))) : Math.Sin(x) / x;

    private static double MeanCosine(double start, double span) => Math.Cos(start + (0.5 * span)) * Sinc(0.5 * span);
}
