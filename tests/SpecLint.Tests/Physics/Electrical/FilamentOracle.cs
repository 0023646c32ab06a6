namespace SpecLint.Tests.Physics.Electrical;

/// <summary>Inductance by sums over filaments: an oracle that shares nothing with the spectral solution.</summary>
internal static class FilamentOracle
{
    private const double Mu0 = 4e-7 * Math.PI;

    /// <summary>Mutual inductance of coaxial circles: Maxwell, Treatise, art. 701, elliptic integrals by the arithmetic-geometric mean.</summary>
    public static double CoaxialCircles(double first, double second, double distance)
    {
        double m = 4.0 * first * second / ((first + second) * (first + second) + distance * distance);
        double a = 1.0;
        double b = Math.Sqrt(1.0 - m);
        double c = Math.Sqrt(m);
        double sum = 0.5 * c * c;
        double power = 0.5;
        while (Math.Abs(c) > 1e-16)
        {
            (a, b, c) = (0.5 * (a + b), Math.Sqrt(a * b), 0.5 * (a - b));
            power *= 2.0;
            sum += power * c * c;
        }

        double k = Math.PI / (2.0 * a);
        double e = k * (1.0 - sum);
        double root = Math.Sqrt(m);
        return Mu0 * Math.Sqrt(first * second) * ((2.0 / root - root) * k - 2.0 / root * e);
    }

    /// <summary>Self inductance of a ring coil of one turn spread over n by n square cells, each cell's own term with the mean distance of a square.</summary>
    public static double Ring(double inner, double outer, double thickness, int n)
    {
        double cellWidth = (outer - inner) / n;
        double cellHeight = thickness / n;
        double own = 0.2235 * (cellWidth + cellHeight);
        double sum = 0.0;
        for (int i = 0; i < n; i++)
        {
            double first = inner + (i + 0.5) * cellWidth;
            for (int j = 0; j < n; j++)
            {
                double second = inner + (j + 0.5) * cellWidth;
                for (int step = 0; step < n; step++)
                {
                    int pairs = step == 0 ? n : 2 * (n - step);
                    double distance = i == j && step == 0 ? own : step * cellHeight;
                    sum += pairs * CoaxialCircles(first, second, distance);
                }
            }
        }

        return sum / ((double)n * n * n * n);
    }

    /// <summary>Mutual inductance of two closed polygons of straight filaments by the Neumann integral, Gauss points on every side.</summary>
    public static double Polygons(double[][] first, double[][] second)
    {
        double sum = 0.0;
        for (int i = 0; i < first.Length; i++)
        {
            for (int j = 0; j < second.Length; j++)
            {
                sum += Sides(first[i], first[(i + 1) % first.Length], second[j], second[(j + 1) % second.Length]);
            }
        }

        return Mu0 / (4.0 * Math.PI) * sum;
    }

    private static double Sides(double[] a, double[] b, double[] c, double[] d)
    {
        double dot = 0.0;
        for (int axis = 0; axis < 3; axis++)
        {
            dot += (b[axis] - a[axis]) * (d[axis] - c[axis]);
        }

        double sum = 0.0;
        foreach ((double u, double wu) in Rule)
        {
            foreach ((double v, double wv) in Rule)
            {
                double square = 0.0;
                for (int axis = 0; axis < 3; axis++)
                {
                    double gap = a[axis] + u * (b[axis] - a[axis]) - c[axis] - v * (d[axis] - c[axis]);
                    square += gap * gap;
                }

                sum += wu * wv / Math.Sqrt(square);
            }
        }

        return dot * sum;
    }

    private static readonly (double Node, double Weight)[] Rule = MakeRule();

    private static (double Node, double Weight)[] MakeRule()
    {
        var rule = new MathNet.Numerics.Integration.GaussLegendreRule(0.0, 1.0, 24);
        return [.. rule.Abscissas.Zip(rule.Weights)];
    }
}
