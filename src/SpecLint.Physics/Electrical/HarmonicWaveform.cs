using System.Collections.Immutable;
using System.Numerics;

namespace SpecLint.Physics.Electrical;

/// <summary>Periodic waveform of odd harmonics, per unit of speed or absolute.</summary>
/// <remarks>
/// Value at electrical angle x: sum over i of the real part of Amplitudes[i] exp(j (2i + 1) x). With odd orders only, the second half
/// period is the negative of the first. Peak and dead time come from even samples with parabolic or linear refinement.
/// </remarks>
public sealed record HarmonicWaveform
{
    private const int SamplesPerHalf = 720;

    /// <summary>Complex peak amplitudes of orders 1, 3, 5, ...</summary>
    public required ImmutableArray<Complex> Amplitudes { get; init; }

    /// <summary>Peak of the fundamental.</summary>
    public double Fundamental => Amplitudes.IsEmpty ? 0.0 : Complex.Abs(Amplitudes[0]);

    /// <summary>Root mean square, all orders.</summary>
    public double Rms
    {
        get
        {
            double sum = 0.0;
            foreach (Complex amplitude in Amplitudes)
            {
                sum += 0.5 * (amplitude.Real * amplitude.Real + amplitude.Imaginary * amplitude.Imaginary);
            }

            return Math.Sqrt(sum);
        }
    }

    /// <summary>Total harmonic distortion: rms of the higher orders over rms of the fundamental; NaN without a fundamental.</summary>
    /// <seealso>IEC 60034-1 (definition of total harmonic distortion; clause from memory).</seealso>
    public double Distortion
    {
        get
        {
            double fundamental = Fundamental * Fundamental;
            double all = 2.0 * Rms * Rms;
            return fundamental > 0.0 ? Math.Sqrt(Math.Max(0.0, all - fundamental) / fundamental) : double.NaN;
        }
    }

    /// <summary>Largest absolute value over the period.</summary>
    public double Peak
    {
        get
        {
            Span<double> samples = stackalloc double[SamplesPerHalf + 2];
            FillSamples(samples, Math.PI / SamplesPerHalf);
            double peak = 0.0;
            for (int index = 1; index <= SamplesPerHalf; index++)
            {
                double before = Math.Abs(samples[index - 1]);
                double here = Math.Abs(samples[index]);
                double after = Math.Abs(samples[index + 1]);
                if (here >= before && here >= after)
                {
                    double bend = before - 2.0 * here + after;
                    double rise = bend < 0.0 ? 0.125 * (after - before) * (after - before) / -bend : 0.0;
                    peak = Math.Max(peak, here + rise);
                }
            }

            return peak;
        }
    }

    /// <summary>Peak over rms; sqrt(2) for a sine; NaN for a zero waveform.</summary>
    public double CrestFactor => Peak / Rms;

    /// <summary>Value at an electrical angle.</summary>
    /// <param name="electricalAngle">[rad].</param>
    /// <returns>In the unit of the amplitudes.</returns>
    public double At(double electricalAngle)
    {
        double sum = 0.0;
        for (int index = 0; index < Amplitudes.Length; index++)
        {
            (double sine, double cosine) = Math.SinCos((2 * index + 1) * electricalAngle);
            sum += Amplitudes[index].Real * cosine - Amplitudes[index].Imaginary * sine;
        }

        return sum;
    }

    /// <summary>Samples from angle 0 at an even step.</summary>
    /// <param name="samples">Receives the values, in the unit of the amplitudes.</param>
    /// <param name="electricalStep">Step [rad].</param>
    public void FillSamples(Span<double> samples, double electricalStep)
    {
        samples.Clear();
        for (int index = 0; index < Amplitudes.Length; index++)
        {
            Complex step = Complex.FromPolarCoordinates(1.0, (2 * index + 1) * electricalStep);
            Complex turning = Amplitudes[index];
            for (int sample = 0; sample < samples.Length; sample++)
            {
                samples[sample] += turning.Real;
                turning *= step;
            }
        }
    }

    /// <summary>Share of the period during which the absolute value is under a part of the peak.</summary>
    /// <param name="partOfPeak">Threshold over the peak, in (0, 1); 0.05 for the dead time of a coil.</param>
    /// <returns>Share in [0, 1]; (2/pi) asin(part) for a sine; NaN for a zero waveform.</returns>
    public double ShareBelow(double partOfPeak)
    {
        double limit = partOfPeak * Peak;
        if (!(limit > 0.0))
        {
            return double.NaN;
        }

        Span<double> samples = stackalloc double[SamplesPerHalf + 1];
        FillSamples(samples, Math.PI / SamplesPerHalf);
        double below = 0.0;
        for (int index = 0; index < SamplesPerHalf; index++)
        {
            below += ShareInside(samples[index], samples[index + 1], limit);
        }

        return below / SamplesPerHalf;
    }

    /// <summary>Waveform with every amplitude multiplied.</summary>
    /// <param name="factor">Factor, such as a speed [rad/s].</param>
    /// <returns>New waveform.</returns>
    public HarmonicWaveform Scaled(double factor)
    {
        var scaled = ImmutableArray.CreateBuilder<Complex>(Amplitudes.Length);
        foreach (Complex amplitude in Amplitudes)
        {
            scaled.Add(factor * amplitude);
        }

        return new HarmonicWaveform { Amplitudes = scaled.MoveToImmutable() };
    }

    // Share of the straight line between two samples that lies within plus or minus the limit.
    private static double ShareInside(double from, double to, double limit)
    {
        double low = Math.Min(from, to);
        double high = Math.Max(from, to);
        double inside = Math.Min(high, limit) - Math.Max(low, -limit);
        if (inside < 0.0)
        {
            return 0.0;
        }

        return high > low ? inside / (high - low) : 1.0;
    }
}
