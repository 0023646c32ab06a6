namespace SpecLint.Review.Expressions;

/// <summary>Comparison of computed numbers: two that differ by rounding only count as equal, so that a bound met exactly is met.</summary>
internal static class Nearness
{
    /// <summary>Relative difference under which two numbers count as equal.</summary>
    public const double RoundingTolerance = 1e-9;

    public static bool AreNear(double a, double b) => Math.Abs(a - b) <= RoundingTolerance * Math.Max(Math.Abs(a), Math.Abs(b));

    public static bool Holds(Comparison comparison, double left, double right)
    {
        bool near = AreNear(left, right);
        return comparison switch
        {
            Comparison.Equal => near,
            Comparison.NotEqual => !near,
            Comparison.Less => left < right && !near,
            Comparison.LessOrEqual => left < right || near,
            Comparison.Greater => left > right && !near,
            _ => left > right || near,
        };
    }
}
