namespace SpecLint.Physics.Electrical;

/// <summary>Eight-point Gauss-Legendre rule on [-1, 1].</summary>
/// <seealso>Abramowitz, Stegun, Handbook of Mathematical Functions, 1964, table 25.4.</seealso>
internal static class GaussPanel
{
    /// <summary>Number of nodes.</summary>
    public const int Count = 8;

    /// <summary>Nodes.</summary>
    public static ReadOnlySpan<double> Nodes =>
    [
        -0.9602898564975363, -0.7966664774136267, -0.5255324099163290, -0.1834346424956498,
        0.1834346424956498, 0.5255324099163290, 0.7966664774136267, 0.9602898564975363,
    ];

    /// <summary>Weights, sum 2.</summary>
    public static ReadOnlySpan<double> Weights =>
    [
        0.1012285362903763, 0.2223810344533745, 0.3137066458778873, 0.3626837833783620,
        0.3626837833783620, 0.3137066458778873, 0.2223810344533745, 0.1012285362903763,
    ];
}
