using System.Collections.Immutable;

namespace SpecLint.Physics.Magnetics;

/// <summary>Flux linkage per turn of one coil as a cosine series of odd harmonics of the electrical angle.</summary>
/// <remarks>psi(theta) is the sum over n = 1, 3, ... 15 of the amplitudes times cos(n p theta), largest with the coil over a north pole.</remarks>
public sealed record FluxLinkageHarmonics
{
    /// <summary>Number of harmonics kept: n = 1, 3, ... 15.</summary>
    public const int Count = 8;

    /// <summary>Signed peak amplitudes [Wb per turn], n = 1, 3, ... 15.</summary>
    public required ImmutableArray<double> Amplitudes { get; init; }

    /// <summary>Estimate of the numerical error of any amplitude [Wb], not counting the model's own idealisation.</summary>
    public required double NumericalError { get; init; }

    /// <summary>Peak fundamental [Wb per turn].</summary>
    public double Fundamental => Amplitudes[0];

    /// <summary>Amplitude of one harmonic [Wb per turn].</summary>
    /// <param name="n">Harmonic number, odd, 1 to 15.</param>
    /// <returns>The signed peak.</returns>
    /// <exception cref="ArgumentOutOfRangeException">n is even or outside 1 to 15.</exception>
    public double Harmonic(int n)
    {
        ArgumentOutOfRangeException.ThrowIfLessThan(n, 1);
        ArgumentOutOfRangeException.ThrowIfGreaterThan(n, (2 * Count) - 1);
        ArgumentOutOfRangeException.ThrowIfNotEqual(n, n | 1);
        return Amplitudes[n / 2];
    }

    /// <summary>The same series times a factor.</summary>
    /// <param name="factor">The factor [-].</param>
    /// <returns>The scaled series.</returns>
    public FluxLinkageHarmonics Scaled(double factor)
    {
        ImmutableArray<double>.Builder scaled = ImmutableArray.CreateBuilder<double>(Count);
        foreach (double amplitude in Amplitudes)
        {
            scaled.Add(amplitude * factor);
        }

        return new FluxLinkageHarmonics { Amplitudes = scaled.MoveToImmutable(), NumericalError = NumericalError * Math.Abs(factor) };
    }
}
