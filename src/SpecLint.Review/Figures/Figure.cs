using System.Collections.Immutable;

namespace SpecLint.Review.Figures;

/// <summary>One figure of one machine: its definition, what became of it, and what it was computed from.</summary>
/// <param name="Definition">How it is declared.</param>
/// <param name="Outcome">Its value or why there is none.</param>
/// <param name="Inputs">The spec keys, figures and table rows it was computed from, in order of first use.</param>
public sealed record Figure(FigureDefinition Definition, Outcome Outcome, ImmutableArray<FigureInput> Inputs)
{
    /// <summary>Dotted name.</summary>
    public string Name => Definition.Name;
}

/// <summary>What kind of thing a figure was computed from.</summary>
public enum FigureInputKind
{
    /// <summary>A value of the spec, stated or not.</summary>
    Key,

    /// <summary>Another figure.</summary>
    Figure,

    /// <summary>An intermediate result that is no single number, such as the transform of a magnet.</summary>
    Part,
}

/// <summary>One input of a figure.</summary>
/// <param name="Kind">What it is.</param>
/// <param name="Name">Spec key, figure name or part name.</param>
public readonly record struct FigureInput(FigureInputKind Kind, string Name);
