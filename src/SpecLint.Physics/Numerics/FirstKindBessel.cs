namespace SpecLint.Physics.Numerics;

/// <summary>Bessel functions J0 and J1 of real argument, fast enough for inner loops; absolute error about 1e-14.</summary>
/// <remarks>
/// Up to 30: Bessel's integral by the midpoint rule, (x + 36)/4 points a quarter turn, their sines kept. Beyond: Hankel's
/// asymptotic series until its terms vanish.
/// </remarks>
/// <seealso>Watson G.N., A Treatise on the Theory of Bessel Functions, 2nd ed., 1944, sections 2.2 and 7.21.</seealso>
public static class FirstKindBessel
{
    /// <summary>Argument from which the asymptotic series is used.</summary>
    public const double Switch = 30.0;

    private const double AngularMargin = 36.0;
    private const int FewestPoints = 9;
    private const int MostPoints = 17;
    private const int AsymptoticTerms = 24;
    private const double Vanishing = 1e-18;
    private static readonly double[][] Sines = MakeSines();

    /// <summary>J0.</summary>
    /// <param name="x">Argument, >= 0.</param>
    /// <returns>Value, in [-1, 1].</returns>
    public static double J0(double x)
    {
        if (!(x < Switch))
        {
            return Asymptotic(x, 0.0);
        }

        double[] sines = SinesFor(x);
        double sum = 0.0;
        foreach (double s in sines)
        {
            sum += Math.Cos(x * s);
        }

        return sum / sines.Length;
    }

    /// <summary>J1.</summary>
    /// <param name="x">Argument, >= 0.</param>
    /// <returns>Value, in [-1, 1].</returns>
    public static double J1(double x)
    {
        if (!(x < Switch))
        {
            return Asymptotic(x, 1.0);
        }

        double[] sines = SinesFor(x);
        double sum = 0.0;
        foreach (double s in sines)
        {
            sum += s * Math.Sin(x * s);
        }

        return sum / sines.Length;
    }

    private static double[] SinesFor(double x) => Sines[(int)Math.Ceiling((x + AngularMargin) / 4.0) - FewestPoints];

    private static double Asymptotic(double x, double order)
    {
        double mu = 4.0 * order * order;
        double p = 1.0;
        double q = 0.0;
        double term = 1.0;
        for (int j = 1; j <= AsymptoticTerms && Math.Abs(term) > Vanishing; j++)
        {
            double odd = (2.0 * j) - 1.0;
            term *= (mu - (odd * odd)) / (8.0 * j * x);
            double signed = j % 4 < 2 ? term : -term;
            (p, q) = j % 2 == 0 ? (p + signed, q) : (p, q + signed);
        }

        (double sine, double cosine) = Math.SinCos(x - (((0.5 * order) + 0.25) * Math.PI));
        return Math.Sqrt(2.0 / (Math.PI * x)) * ((p * cosine) - (q * sine));
    }

    private static double[][] MakeSines()
    {
        var all = new double[MostPoints - FewestPoints + 1][];
        for (int index = 0; index < all.Length; index++)
        {
            int points = FewestPoints + index;
            var sines = new double[points];
            for (int j = 0; j < points; j++)
            {
                sines[j] = Math.Sin((j + 0.5) * Math.PI / (2.0 * points));
            }

            all[index] = sines;
        }

        return all;
    }
}
