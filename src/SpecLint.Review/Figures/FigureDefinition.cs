using SpecLint.Spec.Units;

namespace SpecLint.Review.Figures;

/// <summary>One figure as declared: what it means and how it is computed.</summary>
public sealed record FigureDefinition
{
    /// <summary>Dotted name; never the name of a spec key.</summary>
    public required string Name { get; init; }

    /// <summary>Its unit in SI, the unit shown to people, and its dimension.</summary>
    public required FigureUnit UnitOfMeasure { get; init; }

    /// <summary>SI unit as written in JSON output, such as <c>V·s/rad</c>; <c>1</c> for a ratio.</summary>
    public string Unit => UnitOfMeasure.Si;

    /// <summary>Unit shown to people, such as <c>mm</c>, <c>°C</c>, <c>A/mm²</c>; <c>%</c> or empty for ratios.</summary>
    public string DisplayUnit => UnitOfMeasure.Display;

    /// <summary>Exponents of the SI base units.</summary>
    public Dimension Dimension => UnitOfMeasure.Dimension;

    /// <summary>What it is, in one line.</summary>
    public required string Meaning { get; init; }

    /// <summary>The formula, with figure names and spec keys in braces; for a numerical step, the method in words.</summary>
    public required string Formula { get; init; }

    /// <summary>Where the formula comes from.</summary>
    public required Basis Basis { get; init; }

    /// <summary>Relative uncertainty that the method itself adds to that of its inputs, ≥ 0.</summary>
    public double MethodUncertainty { get; init; }

    /// <summary>True for estimates so coarse that a hold needs even the favourable end of the band to fail.</summary>
    public bool IsCoarse { get; init; }

    /// <summary>The unit it has in a linear machine, where that differs (a speed in m/s instead of rad/s); else null.</summary>
    public FigureUnit? LinearUnit { get; init; }

    /// <summary>Computes the figure from other figures and spec values.</summary>
    public required Func<Evaluation, Outcome> Compute { get; init; }
}
