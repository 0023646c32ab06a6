namespace SpecLint.Physics.Magnetics;

/// <summary>Transform of a point, a disc or a ring-shaped turn density centred on the line of angle zero.</summary>
/// <remarks>
/// Solutions of the Helmholtz equation have a mean-value property, so a round figure multiplies the transform of its centre by a
/// factor of the wave number alone: 2 pi a J1(k a)/k for a disc, the mean of that over the winding's radii for a ring of turns.
/// J1(x) is the mean over the angle of sin(x sin a) sin a (Watson, 1944, section 2.2), a periodic integral that the trapezoid rule gives
/// to rounding error once the points lead x by some ten times its cube root.
/// </remarks>
internal sealed class RoundTransform : IPlaneTransform
{
    private const double AngularMargin = 8.0;
    private const double AngularLead = 10.0;
    private readonly double _centre;
    private readonly double _inner;
    private readonly double _outer;
    private readonly bool _slope;

    private RoundTransform(double centre, double inner, double outer, bool slope = false)
    {
        _slope = slope;
        _centre = centre;
        _inner = inner;
        _outer = outer;
    }

    /// <inheritdoc/>
    public double Reach => _centre;

    /// <summary>A point of unit strength.</summary>
    /// <param name="radius">Distance from the machine axis [m].</param>
    /// <returns>The transform.</returns>
    public static RoundTransform Point(double radius) => new(radius, 0.0, 0.0);

    /// <summary>The derivative of a point's transform by wave number times radius: J_m' in place of J_m.</summary>
    /// <param name="radius">Distance from the machine axis [m].</param>
    /// <returns>The transform.</returns>
    public static RoundTransform PointSlope(double radius) => new(radius, 0.0, 0.0, slope: true);

    /// <summary>A uniform disc.</summary>
    /// <param name="radius">Distance of the centre [m].</param>
    /// <param name="discRadius">Radius of the disc [m].</param>
    /// <returns>The transform.</returns>
    public static RoundTransform Disc(double radius, double discRadius) => new(radius, discRadius, discRadius);

    /// <summary>A ring coil with evenly spread turns.</summary>
    /// <param name="radius">Distance of the centre [m].</param>
    /// <param name="inner">Inner radius of the winding [m].</param>
    /// <param name="outer">Outer radius of the winding [m].</param>
    /// <returns>The transform.</returns>
    public static RoundTransform Ring(double radius, double inner, double outer) => new(radius, inner, outer);

    /// <inheritdoc/>
    public void Sample((double Cosine, double Sine) direction, bool odd, PhaseTable table, Span<double> value)
    {
        double u = _centre * direction.Cosine;
        if (odd != _slope)
        {
            table.Fill(u, table.Line(0), value);
        }
        else
        {
            table.Fill(u, value, table.Line(0));
        }

        if (_slope)
        {
            table.Line(0).Fill(odd ? direction.Cosine : -direction.Cosine);
            PhaseTable.Multiply(table.Line(0), value);
        }
    }

    /// <inheritdoc/>
    public void NodeFactor(PhaseTable table, Span<double> factor)
    {
        if (!(_outer > 0.0))
        {
            factor.Fill(1.0);
            return;
        }

        factor.Clear();
        double[] k = table.WaveNumbers;
        double phase = k[^1] * _outer;
        int points = (int)Math.Ceiling((phase + AngularMargin + (AngularLead * Math.Cbrt(phase))) / 4.0);
        Span<double> moment = table.Line(6);
        bool ring = _outer > _inner;
        for (int j = 0; j < points; j++)
        {
            double s = Math.Sin((j + 0.5) * Math.PI / (2.0 * points));
            if (ring)
            {
                RadialMoment.Sine(table, s, (_inner, _outer), moment);
            }
            else
            {
                table.Fill(s * _outer, table.Line(0), moment);
            }

            PhaseTable.AddScaled(s / points, moment, factor);
        }

        double scale = ring ? 2.0 * Math.PI / (_outer - _inner) : 2.0 * Math.PI * _outer;
        for (int i = 0; i < factor.Length; i++)
        {
            factor[i] *= scale / k[i];
        }
    }

    /// <inheritdoc/>
    public double OrderFactor(int order) => 1.0;
}
