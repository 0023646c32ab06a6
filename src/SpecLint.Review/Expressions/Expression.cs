using System.Collections.Immutable;
using SpecLint.Spec.Units;
using SpecLint.Spec.Yaml;

namespace SpecLint.Review.Expressions;

/// <summary>An expression of a rulebook, parsed and dimension-checked.</summary>
public sealed record Expression
{
    /// <summary>The text as written.</summary>
    public required string Text { get; init; }

    /// <summary>Where it stands in the rulebook.</summary>
    public required Region Region { get; init; }

    /// <summary>Dimension of its value; meaningless for a condition.</summary>
    public required Dimension Dimension { get; init; }

    /// <summary>True for a condition (comparison, <c>and</c>, <c>or</c>, <c>not</c>, <c>stated</c>).</summary>
    public required bool IsCondition { get; init; }

    /// <summary>The figures it names, in order.</summary>
    public required ImmutableArray<string> Figures { get; init; }

    /// <summary>The spec keys it names, in order.</summary>
    public required ImmutableArray<string> Keys { get; init; }

    /// <summary>The parsed tree.</summary>
    internal ExpressionNode Root { get; init; } = null!;
}
