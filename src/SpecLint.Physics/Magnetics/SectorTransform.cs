namespace SpecLint.Physics.Magnetics;

/// <summary>Transform of an annular sector about the machine axis, symmetric about the line of angle zero.</summary>
/// <remarks>
/// The angular coefficient of order m is 2 sin(m b)/m times the integral of r J_m(k r) dr, b being the sector's half angle; J_m is
/// the angular mean of the phase, so the radial integral is closed under the mean.
/// </remarks>
internal sealed class SectorTransform : IPlaneTransform
{
    private readonly double _inner;
    private readonly double _outer;
    private readonly double _halfAngle;

    /// <summary>Describes the sector.</summary>
    /// <param name="inner">Inner radius [m].</param>
    /// <param name="outer">Outer radius [m].</param>
    /// <param name="halfAngle">Half the angle seen from the axis [rad].</param>
    public SectorTransform(double inner, double outer, double halfAngle)
    {
        _inner = inner;
        _outer = outer;
        _halfAngle = halfAngle;
    }

    /// <inheritdoc/>
    public double Reach => _outer;

    /// <inheritdoc/>
    public void Sample((double Cosine, double Sine) direction, bool odd, PhaseTable table, Span<double> value)
    {
        if (odd)
        {
            RadialMoment.Sine(table, direction.Cosine, (_inner, _outer), value);
        }
        else
        {
            RadialMoment.Cosine(table, direction.Cosine, (_inner, _outer), value);
        }
    }

    /// <inheritdoc/>
    public void NodeFactor(PhaseTable table, Span<double> factor) => factor.Fill(1.0);

    /// <inheritdoc/>
    public double OrderFactor(int order) => 2.0 * Math.Sin(order * _halfAngle) / order;
}
