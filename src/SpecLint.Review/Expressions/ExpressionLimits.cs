namespace SpecLint.Review.Expressions;

/// <summary>How large an expression may be, so that a stranger's rulebook can at worst be wrong.</summary>
public static class ExpressionLimits
{
    /// <summary>Longest text, in characters.</summary>
    public const int Length = 2000;

    /// <summary>Deepest nesting of parentheses, function arguments, <c>not</c> and signs.</summary>
    public const int Depth = 40;

    /// <summary>Greatest exponent, either sign.</summary>
    public const int Exponent = 6;

    /// <summary>Greatest exponent of a base unit in a dimension, either sign.</summary>
    public const int DimensionExponent = 24;
}
