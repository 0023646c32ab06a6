using SpecLint.Review.Figures;

namespace SpecLint.Review.Expressions;

/// <summary>One machine to evaluate an expression on, if need be with one figure shifted.</summary>
internal readonly record struct ExpressionContext(FigureGraph Graph)
{
    /// <summary>Name of the shifted figure; null when none is.</summary>
    public string? Shifted { get; init; }

    /// <summary>What is added to the shifted figure, in its unit.</summary>
    public double Shift { get; init; }

    public Evaluated Figure(string name)
    {
        Outcome outcome = Graph[name].Outcome;
        return outcome.HasValue && string.Equals(name, Shifted, StringComparison.Ordinal)
            ? Evaluated.Of(outcome.Value + Shift)
            : Evaluated.From(outcome);
    }
}
