namespace SpecLint.Physics.Magnetics;

/// <summary>
/// Two-dimensional Fourier transform of a figure that is symmetric about the radius through its centre, sampled on circles of wave number.
/// </summary>
/// <remarks>
/// With f^(k, a) the integral of f exp(-i k (x cos a + y sin a)), the angular coefficient of order m, the integral of f J_m(k r) cos(m phi), is
/// (-1)^(m/2) times the mean over the angle a of Re f^ cos(m a) for even m, and (-1)^((m-1)/2) times that of -Im f^ cos(m a) for odd m.
/// Source: Jacobi-Anger expansion, Watson G.N., A Treatise on the Theory of Bessel Functions, 2nd ed., 1944, section 2.22.
/// </remarks>
internal interface IPlaneTransform
{
    /// <summary>Farthest distance from the machine axis that bounds the oscillation in the angle [m].</summary>
    public double Reach { get; }

    /// <summary>The transform at one angle without the factors below.</summary>
    /// <param name="direction">Cosine and sine of the angle, both positive.</param>
    /// <param name="odd">Takes minus the imaginary part instead of the real part.</param>
    /// <param name="table">Phase table of the block of wave numbers.</param>
    /// <param name="value">Receives one value per node.</param>
    public void Sample((double Cosine, double Sine) direction, bool odd, PhaseTable table, Span<double> value);

    /// <summary>Factor that depends on the wave number only.</summary>
    /// <param name="table">Phase table of the block of wave numbers.</param>
    /// <param name="factor">Receives one value per node.</param>
    public void NodeFactor(PhaseTable table, Span<double> factor);

    /// <summary>Factor that depends on the angular order only.</summary>
    /// <param name="order">Angular order, pole pairs times harmonic number.</param>
    /// <returns>The factor [-].</returns>
    public double OrderFactor(int order);
}
