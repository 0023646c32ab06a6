using System.Collections.Immutable;
using SpecLint.Review.Figures;
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

    /// <summary>True for a text, which can only be compared.</summary>
    public bool IsText { get; init; }

    /// <summary>The unit in which people would read its value, from the figures and literals it names; empty when it follows from none.</summary>
    public string DisplayUnit { get; init; } = "";

    /// <summary>The figures it names, in order.</summary>
    public required ImmutableArray<string> Figures { get; init; }

    /// <summary>The spec keys it names, in order.</summary>
    public required ImmutableArray<string> Keys { get; init; }

    /// <summary>Those of <see cref="Keys"/> that it asks to be stated.</summary>
    public ImmutableArray<string> StatedKeys { get; init; } = [];

    /// <summary>The number itself, in SI, when the whole expression is one; else null.</summary>
    public double? Constant => (Root as NumberNode)?.Number;

    /// <summary>The parsed tree.</summary>
    internal ExpressionNode Root { get; init; } = null!;

    /// <summary>The value on one machine, without its uncertainty.</summary>
    /// <param name="graph">The machine.</param>
    public Evaluated Evaluate(FigureGraph graph) => Root.Evaluate(new ExpressionContext(graph));

    /// <summary>
    /// The number on one machine with its uncertainty: each figure named is shifted by its own uncertainty, up and down, and half the
    /// differences are added in quadrature.
    /// </summary>
    /// <param name="graph">The machine.</param>
    public Evaluated Measure(FigureGraph graph) =>
        ExpressionUncertainty.Measure(graph, Figures, Root.Evaluate);
}
