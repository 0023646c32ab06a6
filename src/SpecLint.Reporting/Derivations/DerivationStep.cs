using SpecLint.Review.Figures;
using SpecLint.Spec.Yaml;

namespace SpecLint.Reporting.Derivations;

/// <summary>One step of a working: a value of the spec, an intermediate result or a figure.</summary>
internal sealed record DerivationStep
{
    /// <summary>What it is.</summary>
    public required FigureInputKind Kind { get; init; }

    /// <summary>Spec key, figure name or part name.</summary>
    public required string Name { get; init; }

    /// <summary>Distance from the figure that the working leads to, which has 0.</summary>
    public required int Depth { get; init; }

    /// <summary>The value with its unit, or why there is none.</summary>
    public required string Value { get; init; }

    /// <summary>The figure; null for a key or a part.</summary>
    public Figure? Figure { get; init; }

    /// <summary>The formula with names.</summary>
    public string Formula { get; init; } = "";

    /// <summary>The formula with values; equal to <see cref="Formula"/> where it is a method in words.</summary>
    public string Substituted { get; init; } = "";

    /// <summary>Where the key stands in the spec; null for a figure, a part or a key not stated.</summary>
    public Region? Region { get; init; }
}
