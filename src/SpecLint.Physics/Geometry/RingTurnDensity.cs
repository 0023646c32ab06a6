namespace SpecLint.Physics.Geometry;

/// <summary>Fourier transform of the turn density of a ring coil about its own centre, scalar form.</summary>
/// <seealso>Watson G.N., A Treatise on the Theory of Bessel Functions, 2nd ed., 1944, section 2.2.</seealso>
internal static class RingTurnDensity
{
    private const double SeriesLimit = 0.05;

    /// <summary>Transform at a wave number.</summary>
    /// <param name="k">Wave number [1/m], > 0.</param>
    /// <param name="inner">Inner radius [m], >= 0.</param>
    /// <param name="outer">Outer radius [m], above the inner.</param>
    /// <returns>Mean over the winding's radii of 2 pi r J1(k r)/k [m²], the same in every direction.</returns>
    /// <remarks>
    /// J1 as the angular mean of sin(k r sin a) sin a by the trapezoid rule, whose n points a quarter turn are off by a Bessel
    /// function of order 4 n: rounding error once the order leads the phase by ten times its cube root. The mean over the radii is then
    /// in closed form.
    /// </remarks>
    public static double Transform(double k, double inner, double outer)
    {
        double phase = k * outer;
        int points = (int)Math.Ceiling((phase + 8.0 + (10.0 * Math.Cbrt(phase))) / 4.0);
        double sum = 0.0;
        for (int j = 0; j < points; j++)
        {
            double s = Math.Sin((j + 0.5) * Math.PI / (2.0 * points));
            sum += s * (SineMoment(k * s, outer) - SineMoment(k * s, inner));
        }

        return 2.0 * Math.PI * sum / (points * k * (outer - inner));
    }

    // Integral of r sin(x r) dr from zero, by series where the closed form cancels.
    private static double SineMoment(double x, double r)
    {
        double u = x * r;
        if (u < SeriesLimit)
        {
            double uu = u * u;
            return r * r * u * ((1.0 / 3.0) - (uu * ((1.0 / 30.0) - (uu / 840.0))));
        }

        (double sine, double cosine) = Math.SinCos(u);
        return (sine - (u * cosine)) / (x * x);
    }
}
