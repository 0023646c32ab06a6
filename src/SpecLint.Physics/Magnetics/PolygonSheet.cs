namespace SpecLint.Physics.Magnetics;

/// <summary>Uniform charge on a polygon.</summary>
/// <remarks>
/// The triangle under one edge and the foot of the perpendicular subtends 2 arg(D + i C), with C the cross product of
/// the in-plane vectors a and b to the edge's ends and D = sa sb + a.b + z^2 + |z| (sa + sb). The product over the edges gives the whole
/// with one arctangent.
/// </remarks>
/// <seealso>Van Oosterom A., Strackee J., The solid angle of a plane triangle, IEEE Trans. Biomed. Eng. 30(2), 1983, 125-126.</seealso>
internal sealed class PolygonSheet : IChargeSheet
{
    private readonly double[] _x;
    private readonly double[] _y;

    private PolygonSheet(double[] x, double[] y)
    {
        _x = x;
        _y = y;
    }

    /// <summary>A rectangle.</summary>
    /// <param name="centre">Position of its centre along x [m].</param>
    /// <param name="length">Size along x [m].</param>
    /// <param name="width">Size along y [m].</param>
    /// <returns>The sheet.</returns>
    public static PolygonSheet Rectangle(double centre, double length, double width)
    {
        double a = centre - (0.5 * length);
        double b = centre + (0.5 * length);
        double w = 0.5 * width;
        return new PolygonSheet([a, b, b, a], [-w, -w, w, w]);
    }

    /// <summary>An annular sector, its arcs drawn as chords that keep the area.</summary>
    /// <param name="magnets">Sector magnets.</param>
    /// <param name="chordDegrees">Largest angle of one chord [degree].</param>
    /// <returns>The sheet.</returns>
    public static PolygonSheet Sector(in MagnetRow magnets, double chordDegrees)
    {
        (double inner, double outer, double halfAngle) = (magnets.InnerRadius, magnets.OuterRadius, magnets.SectorHalfAngle);
        int segments = (int)Math.Ceiling(2.0 * halfAngle * 180.0 / (Math.PI * chordDegrees));
        double step = 2.0 * halfAngle / segments;
        double swell = Math.Sqrt(step / Math.Sin(step));
        double[] x = new double[2 * (segments + 1)];
        double[] y = new double[x.Length];
        for (int i = 0; i <= segments; i++)
        {
            (double sine, double cosine) = Math.SinCos((i * step) - halfAngle);
            x[i] = outer * swell * cosine;
            y[i] = outer * swell * sine;
            x[^(i + 1)] = inner * swell * cosine;
            y[^(i + 1)] = inner * swell * sine;
        }

        return new PolygonSheet(x, y);
    }

    /// <inheritdoc/>
    public double SolidAngle(double x, double y, double z)
    {
        double height = Math.Abs(z);
        double zz = height * height;
        double ax = _x[^1] - x;
        double ay = _y[^1] - y;
        double sa = Math.Sqrt((ax * ax) + (ay * ay) + zz);
        double real = 1.0;
        double imaginary = 0.0;
        double angle = 0.0;
        for (int i = 0; i < _x.Length; i++)
        {
            double bx = _x[i] - x;
            double by = _y[i] - y;
            double sb = Math.Sqrt((bx * bx) + (by * by) + zz);
            double cross = (ax * by) - (ay * bx);
            double along = (sa * sb) + (ax * bx) + (ay * by) + zz + (height * (sa + sb));
            (real, imaginary) = ((real * along) - (imaginary * cross), (real * cross) + (imaginary * along));
            if (i % EdgesPerArctangent == EdgesPerArctangent - 1)
            {
                angle += Math.Atan2(imaginary, real);
                (real, imaginary) = (1.0, 0.0);
            }

            (ax, ay, sa) = (bx, by, sb);
        }

        angle += Math.Atan2(imaginary, real);
        return 2.0 * (angle < -Rounding ? angle + (2.0 * Math.PI) : angle);
    }

    /// <inheritdoc/>
    /// <remarks>The sum over edges of the outward normal times the integral of dl/s along the edge.</remarks>
    public (double X, double Y) InPlane(double x, double y, double z)
    {
        double sumX = 0.0;
        double sumY = 0.0;
        for (int i = 0; i < _x.Length; i++)
        {
            int j = (i + 1) % _x.Length;
            double ex = _x[j] - _x[i];
            double ey = _y[j] - _y[i];
            double length = double.Hypot(ex, ey);
            double sa = Math.Sqrt(((_x[i] - x) * (_x[i] - x)) + ((_y[i] - y) * (_y[i] - y)) + (z * z));
            double sb = Math.Sqrt(((_x[j] - x) * (_x[j] - x)) + ((_y[j] - y) * (_y[j] - y)) + (z * z));
            double pull = 2.0 * Math.Atanh(length / (sa + sb));
            sumX += pull * ey / length;
            sumY -= pull * ex / length;
        }

        return (sumX, sumY);
    }

    /// <summary>Edges whose factors are multiplied before an arctangent is taken, so that neither range nor branch is lost.</summary>
    private const int EdgesPerArctangent = 4;

    private const double Rounding = 1e-9;
}
