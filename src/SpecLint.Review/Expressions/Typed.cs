using System.Collections.Immutable;
using SpecLint.Spec.Units;

namespace SpecLint.Review.Expressions;

internal enum TypedKind
{
    Number,
    Condition,
    Text,
}

/// <summary>A node with what is known of its value at load time and where it stands in the expression's text.</summary>
internal sealed record Typed(ExpressionNode Node, TypedKind Kind, int Start, int End)
{
    public Dimension Dimension { get; init; }

    /// <summary>The unit in which people would read it; empty when unknown.</summary>
    public string Unit { get; init; } = "";

    /// <summary>True for a bare 0, which goes with every dimension.</summary>
    public bool IsZero { get; init; }

    /// <summary>True for a temperature written on a scale with its own zero.</summary>
    public bool IsPoint { get; init; }

    /// <summary>The words that a text key may take; empty when free or no key.</summary>
    public ImmutableArray<string> Words { get; init; } = [];

    /// <summary>The literal text, when it is one.</summary>
    public string? Literal => (Node as TextNode)?.Text;
}
