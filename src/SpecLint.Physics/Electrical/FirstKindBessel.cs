namespace SpecLint.Physics.Electrical;

/// <summary>Bessel functions J0 and J1 of real argument, fast enough for inner loops; absolute error under 1e-9.</summary>
/// <remarks>
/// Up to 25: Bessel's integral by the midpoint rule with 13 points a quarter turn, whose error is J of order 52. Beyond: Hankel's
/// asymptotic series, terms up to x^-7. Both sides of the switch agree to 1e-9.
/// </remarks>
/// <seealso>Abramowitz, Stegun, Handbook of Mathematical Functions, 1964, 9.1.18 and 9.2.5 to 9.2.10.</seealso>
public static class FirstKindBessel
{
    /// <summary>Argument above which the asymptotic series is used.</summary>
    public const double Switch = 25.0;

    private static readonly double[] Cosines = MakeCosines();

    /// <summary>J0.</summary>
    /// <param name="x">Argument, >= 0.</param>
    /// <returns>Value, in [-1, 1].</returns>
    public static double J0(double x)
    {
        if (x > Switch)
        {
            return Asymptotic(x, 0.0);
        }

        double sum = 0.0;
        foreach (double cosine in Cosines)
        {
            sum += Math.Cos(x * cosine);
        }

        return sum / Cosines.Length;
    }

    /// <summary>J1.</summary>
    /// <param name="x">Argument, >= 0.</param>
    /// <returns>Value, in [-1, 1].</returns>
    public static double J1(double x)
    {
        if (x > Switch)
        {
            return Asymptotic(x, 1.0);
        }

        double sum = 0.0;
        foreach (double cosine in Cosines)
        {
            sum += cosine * Math.Sin(x * cosine);
        }

        return sum / Cosines.Length;
    }

    private static double Asymptotic(double x, double order)
    {
        double mu = 4.0 * order * order;
        double p = 1.0;
        double q = 0.0;
        double term = 1.0;
        for (int index = 1; index <= 7; index++)
        {
            int odd = 2 * index - 1;
            term *= (mu - odd * odd) / (8.0 * index * x);
            double signed = index % 4 < 2 ? term : -term;
            (p, q) = index % 2 == 0 ? (p + signed, q) : (p, q + signed);
        }

        double phase = x - (0.5 * order + 0.25) * Math.PI;
        (double sine, double cosine) = Math.SinCos(phase);
        return Math.Sqrt(2.0 / (Math.PI * x)) * (p * cosine - q * sine);
    }

    private static double[] MakeCosines()
    {
        const int count = 13;
        var cosines = new double[count];
        for (int index = 0; index < count; index++)
        {
            cosines[index] = Math.Cos((index + 0.5) * 0.5 * Math.PI / count);
        }

        return cosines;
    }
}
