using SpecLint.Review.Figures;

namespace SpecLint.Review.Catalogue;

/// <summary>Short forms for declaring figures.</summary>
internal static class Define
{
    /// <summary>A figure whose method adds no uncertainty of its own.</summary>
    public static FigureDefinition Figure(
        string name,
        FigureUnit unit,
        string meaning,
        string formula,
        Basis basis,
        Func<Evaluation, Outcome> compute) => new()
        {
            Name = name,
            UnitOfMeasure = unit,
            Meaning = meaning,
            Formula = formula,
            Basis = basis,
            Compute = compute,
        };
}
