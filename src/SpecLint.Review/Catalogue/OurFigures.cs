using SpecLint.Review.Figures;

namespace SpecLint.Review.Catalogue;

/// <summary>The figures that spec-lint computes.</summary>
public static class OurFigures
{
    /// <summary>All of them, in the order in which they are listed.</summary>
    public static FigureCatalogue Catalogue { get; } = new(
    [
        .. GeometryFigures.All,
        .. MagnetFigures.All,
        .. FieldFigures.All,
        .. DemagnetisationFigures.All,
        .. WindingFigures.All,
        .. EmfFigures.All,
        .. CoilWorthFigures.All,
        .. ConductorFigures.All,
        .. RatingFigures.All,
        .. HeatFigures.All,
        .. LoadFigures.All,
        .. PracticeFigures.All,
        .. SafetyFigures.All,
    ]);
}
