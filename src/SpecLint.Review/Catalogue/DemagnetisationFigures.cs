using SpecLint.Physics.Magnetics;
using SpecLint.Review.Figures;

namespace SpecLint.Review.Catalogue;

/// <summary>Figures of how far the magnets are from losing their magnetisation.</summary>
internal static class DemagnetisationFigures
{
    /// <summary>Share of the intrinsic coercivity up to which the demagnetisation line is taken as straight (the knee).</summary>
    private const double KneeShare = 0.9;

    public static IEnumerable<FigureDefinition> All =>
    [
        Define.Figure("permeance.coefficient", FigureUnit.Ratio, "permeance coefficient as installed, open circuit, mean of the magnet", "(1 − N) / N with N the mean demagnetising factor from the harmonic solution", Sources.Field, x =>
            x.Part(FieldParts.Field) is { } solved ? x.Value(solved.PermeanceCoefficient) : x.Stop()) with { MethodUncertainty = 0.02 },
    ];
}
