using SpecLint.Review.Rules;

namespace SpecLint.Review.Catalogue;

/// <summary>Magnetisation curve of mild steel from its table.</summary>
internal static class SteelCurve
{
    /// <summary>Field strength at a flux density, cautious line, straight between rows.</summary>
    /// <param name="fluxDensity">Flux density [T], ≥ 0.</param>
    /// <returns>[A/m]; past the last row the steel adds nothing but μ0·H.</returns>
    public static double FieldStrength(double fluxDensity)
    {
        double field = 0;
        double density = 0;
        ReferenceTable? table = EmbeddedRulebooks.Tables.Find("bh-mild-steel");
        foreach (ReferenceRow row in table?.Rows ?? [])
        {
            if (row.Number("field") is not { } nextField || row.Number("flux-density-cautious") is not { } nextDensity)
            {
                continue;
            }

            if (fluxDensity <= nextDensity)
            {
                return field + ((nextField - field) * (fluxDensity - density) / (nextDensity - density));
            }

            (field, density) = (nextField, nextDensity);
        }

        return field + ((fluxDensity - density) / Physics.Magnetics.MagneticConstant.Mu0);
    }
}
