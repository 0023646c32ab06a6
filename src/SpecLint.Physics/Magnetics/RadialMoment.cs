using System.Numerics;

namespace SpecLint.Physics.Magnetics;

/// <summary>The integrals of r cos(k c r) and r sin(k c r) between two radii, for all nodes of a block.</summary>
/// <remarks>Closed form; below <see cref="SeriesLimit"/> in k c r the power series, which avoids the cancellation.</remarks>
internal static class RadialMoment
{
    private const double SeriesLimit = 0.05;

    /// <summary>Integral of r cos(k c r) dr.</summary>
    /// <param name="table">Phase table of the block; lines 0 to 3 are overwritten.</param>
    /// <param name="c">Direction cosine [-], not zero.</param>
    /// <param name="range">Inner and outer radius [m].</param>
    /// <param name="result">Receives the integral [m^2] per node.</param>
    public static void Cosine(PhaseTable table, double c, (double Inner, double Outer) range, Span<double> result)
    {
        (double a, double b) = range;
        table.Fill(c * a, table.Line(0), table.Line(1));
        table.Fill(c * b, table.Line(2), table.Line(3));
        for (int i = 0; i < result.Length; i += Vector<double>.Count)
        {
            Vector<double> inverse = Vector<double>.One / (new Vector<double>(table.WaveNumbers.AsSpan(i)) * c);
            Vector<double> ends = (new Vector<double>(table.Line(3)[i..]) * b) - (new Vector<double>(table.Line(1)[i..]) * a);
            Vector<double> rest = new Vector<double>(table.Line(2)[i..]) - new Vector<double>(table.Line(0)[i..]);
            (inverse * (ends + (inverse * rest))).CopyTo(result[i..]);
        }

        for (int i = 0; i < result.Length; i++)
        {
            double x = table.WaveNumbers[i] * Math.Abs(c);
            if (x * b > SeriesLimit)
            {
                break;
            }

            double xx = x * x;
            result[i] = Power(a, b, 2) - (xx * (Power(a, b, 4) / 2.0)) + (xx * xx * Power(a, b, 6) / 24.0) - (xx * xx * xx * Power(a, b, 8) / 720.0);
        }
    }

    /// <summary>Integral of r sin(k c r) dr.</summary>
    /// <param name="table">Phase table of the block; lines 0 to 3 are overwritten.</param>
    /// <param name="c">Direction cosine [-], positive.</param>
    /// <param name="range">Inner and outer radius [m].</param>
    /// <param name="result">Receives the integral [m^2] per node.</param>
    public static void Sine(PhaseTable table, double c, (double Inner, double Outer) range, Span<double> result)
    {
        (double a, double b) = range;
        table.Fill(c * a, table.Line(0), table.Line(1));
        table.Fill(c * b, table.Line(2), table.Line(3));
        for (int i = 0; i < result.Length; i += Vector<double>.Count)
        {
            Vector<double> inverse = Vector<double>.One / (new Vector<double>(table.WaveNumbers.AsSpan(i)) * c);
            Vector<double> ends = (new Vector<double>(table.Line(0)[i..]) * a) - (new Vector<double>(table.Line(2)[i..]) * b);
            Vector<double> rest = new Vector<double>(table.Line(3)[i..]) - new Vector<double>(table.Line(1)[i..]);
            (inverse * (ends + (inverse * rest))).CopyTo(result[i..]);
        }

        for (int i = 0; i < result.Length; i++)
        {
            double x = table.WaveNumbers[i] * c;
            if (x * b > SeriesLimit)
            {
                break;
            }

            double xx = x * x;
            result[i] = x * (Power(a, b, 3) - (xx * Power(a, b, 5) / 6.0) + (xx * xx * Power(a, b, 7) / 120.0));
        }
    }

    private static double Power(double a, double b, int n) => (Math.Pow(b, n) - Math.Pow(a, n)) / n;
}
