using SpecLint.Physics.Numerics;

namespace SpecLint.Physics.Electrical;

/// <summary>Six-point Gauss-Legendre rule on [-1, 1]; 1.4e-6 off for one full period of a cosine.</summary>
internal static class GaussPanel
{
    /// <summary>Number of nodes.</summary>
    public const int Count = 6;

    private static readonly (double[] Nodes, double[] Weights) Rule = GaussLegendreRule.Create(Count);

    /// <summary>Nodes.</summary>
    public static ReadOnlySpan<double> Nodes => Rule.Nodes;

    /// <summary>Weights, sum 2.</summary>
    public static ReadOnlySpan<double> Weights => Rule.Weights;
}
