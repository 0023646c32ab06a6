namespace SpecLint.Physics.Numerics;

/// <summary>Nodes and weights of Gauss-Legendre quadrature on [-1, 1].</summary>
internal static class GaussLegendreRule
{
    private const int NewtonCap = 100;
    private const double NewtonTolerance = 1e-15;

    /// <summary>Computes one rule.</summary>
    /// <param name="order">Number of nodes, >= 1.</param>
    /// <returns>Nodes in ascending order and their weights, which sum to 2.</returns>
    /// <seealso>Abramowitz M., Stegun I.A., Handbook of Mathematical Functions, 1964, 25.4.29; roots by Newton's method.</seealso>
    public static (double[] Nodes, double[] Weights) Create(int order)
    {
        double[] nodes = new double[order];
        double[] weights = new double[order];
        for (int i = 0; i < order; i++)
        {
            double x = -Math.Cos(Math.PI * (i + 0.75) / (order + 0.5));
            double derivative = 1.0;
            for (int step = 0; step < NewtonCap; step++)
            {
                (double value, derivative) = Legendre(order, x);
                double change = value / derivative;
                x -= change;
                if (Math.Abs(change) < NewtonTolerance)
                {
                    break;
                }
            }

            nodes[i] = x;
            weights[i] = 2.0 / ((1.0 - (x * x)) * derivative * derivative);
        }

        return (nodes, weights);
    }

    private static (double Value, double Derivative) Legendre(int order, double x)
    {
        double previous = 1.0;
        double value = x;
        for (int n = 2; n <= order; n++)
        {
            double next = ((((2.0 * n) - 1.0) * x * value) - ((n - 1.0) * previous)) / n;
            previous = value;
            value = next;
        }

        return (value, order * ((x * value) - previous) / ((x * x) - 1.0));
    }
}
