namespace SpecLint.Physics.Magnetics;

/// <summary>Bessel function J1 and its radial mean over a ring, scalar form.</summary>
internal static class BesselFunctions
{
    private const double AsymptoticFrom = 30.0;
    private const int AsymptoticTerms = 24;
    private const double AngularMargin = 28.0;

    /// <summary>J1(x).</summary>
    /// <param name="x">Argument [-], >= 0.</param>
    /// <returns>The value [-], to about 1e-14.</returns>
    /// <remarks>Angular mean of sin(x sin a) sin a by the trapezoid rule; from 30 on Hankel's asymptotic series.</remarks>
    /// <seealso>Watson G.N., A Treatise on the Theory of Bessel Functions, 2nd ed., 1944, sections 2.2 and 7.21.</seealso>
    public static double J1(double x) => x < AsymptoticFrom ? AngularMean(x) : Asymptotic(x);

    /// <summary>Transform of a ring coil's turn density about its own centre.</summary>
    /// <param name="k">Wave number [1/m], > 0.</param>
    /// <param name="inner">Inner radius [m].</param>
    /// <param name="outer">Outer radius [m], above the inner.</param>
    /// <returns>Mean over the winding's radii of 2 pi r J1(k r)/k [m^2].</returns>
    public static double RingMean(double k, double inner, double outer)
    {
        int points = (int)Math.Ceiling(((k * outer) + AngularMargin) / 4.0);
        double sum = 0.0;
        for (int j = 0; j < points; j++)
        {
            double s = Math.Sin((j + 0.5) * Math.PI / (2.0 * points));
            sum += s * (SineMoment(k * s, outer) - SineMoment(k * s, inner));
        }

        return 2.0 * Math.PI * sum / (points * k * (outer - inner));
    }

    private static double SineMoment(double x, double r)
    {
        double u = x * r;
        if (u < 0.05)
        {
            double uu = u * u;
            return r * r * u * ((1.0 / 3.0) - (uu * ((1.0 / 30.0) - (uu / 840.0))));
        }

        (double sine, double cosine) = Math.SinCos(u);
        return (sine - (u * cosine)) / (x * x);
    }

    private static double AngularMean(double x)
    {
        int points = (int)Math.Ceiling((x + AngularMargin) / 4.0);
        double sum = 0.0;
        for (int j = 0; j < points; j++)
        {
            double s = Math.Sin((j + 0.5) * Math.PI / (2.0 * points));
            sum += s * Math.Sin(x * s);
        }

        return sum / points;
    }

    private static double Asymptotic(double x)
    {
        double p = 1.0;
        double q = 0.0;
        double term = 1.0;
        for (int j = 1; j <= AsymptoticTerms; j++)
        {
            double odd = (2.0 * j) - 1.0;
            term *= (4.0 - (odd * odd)) / (8.0 * j * x);
            double sign = ((j / 2) % 2) == 0 ? 1.0 : -1.0;
            if ((j % 2) == 0)
            {
                p += sign * term;
            }
            else
            {
                q += sign * term;
            }
        }

        (double sine, double cosine) = Math.SinCos(x - (0.75 * Math.PI));
        return Math.Sqrt(2.0 / (Math.PI * x)) * ((p * cosine) - (q * sine));
    }
}
