using System.Numerics;

namespace SpecLint.Physics.Magnetics;

/// <summary>Transform of a rectangle centred on the line of angle zero.</summary>
internal sealed class BlockTransform : IPlaneTransform
{
    private readonly double _radius;
    private readonly double _halfLength;
    private readonly double _halfWidth;

    /// <summary>Describes the rectangle.</summary>
    /// <param name="radius">Distance of the centre [m].</param>
    /// <param name="length">Radial length [m].</param>
    /// <param name="width">Width along the motion [m].</param>
    public BlockTransform(double radius, double length, double width)
    {
        _radius = radius;
        _halfLength = 0.5 * length;
        _halfWidth = 0.5 * width;
    }

    /// <inheritdoc/>
    public double Reach => double.Hypot(_radius + _halfLength, _halfWidth);

    /// <inheritdoc/>
    public void Sample((double Cosine, double Sine) direction, bool odd, PhaseTable table, Span<double> value)
    {
        Span<double> centreCosine = table.Line(0);
        Span<double> centreSine = table.Line(1);
        Span<double> lengthSine = table.Line(3);
        Span<double> widthSine = table.Line(5);
        table.Fill(_radius * direction.Cosine, centreCosine, centreSine);
        table.Fill(_halfLength * direction.Cosine, table.Line(2), lengthSine);
        table.Fill(_halfWidth * direction.Sine, table.Line(4), widthSine);
        Span<double> centre = odd ? centreSine : centreCosine;
        Vector<double> scale = new(4.0 / (direction.Cosine * direction.Sine));
        for (int i = 0; i < value.Length; i += Vector<double>.Count)
        {
            Vector<double> product = new Vector<double>(centre[i..]) * new Vector<double>(lengthSine[i..]) * new Vector<double>(widthSine[i..]);
            (product * scale).CopyTo(value[i..]);
        }
    }

    /// <inheritdoc/>
    public void NodeFactor(PhaseTable table, Span<double> factor)
    {
        for (int i = 0; i < factor.Length; i++)
        {
            double k = table.WaveNumbers[i];
            factor[i] = 1.0 / (k * k);
        }
    }

    /// <inheritdoc/>
    public double OrderFactor(int order) => 1.0;
}
