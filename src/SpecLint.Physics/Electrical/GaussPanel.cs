namespace SpecLint.Physics.Electrical;

/// <summary>Six-point Gauss-Legendre rule on [-1, 1]; 1.4e-6 off for one full period of a cosine.</summary>
/// <seealso>Abramowitz, Stegun, Handbook of Mathematical Functions, 1964, table 25.4.</seealso>
internal static class GaussPanel
{
    /// <summary>Number of nodes.</summary>
    public const int Count = 6;

    /// <summary>Nodes.</summary>
    public static ReadOnlySpan<double> Nodes =>
    [
        -0.9324695142031521, -0.6612093864662645, -0.2386191860831969,
        0.2386191860831969, 0.6612093864662645, 0.9324695142031521,
    ];

    /// <summary>Weights, sum 2.</summary>
    public static ReadOnlySpan<double> Weights =>
    [
        0.1713244923791704, 0.3607615730481386, 0.4679139345726910,
        0.4679139345726910, 0.3607615730481386, 0.1713244923791704,
    ];
}
