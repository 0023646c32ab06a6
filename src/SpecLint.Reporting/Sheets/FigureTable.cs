using SpecLint.Review.Figures;
using SpecLint.Reporting.Quantities;

namespace SpecLint.Reporting.Sheets;

/// <summary>Figures in columns: name, number, band, unit.</summary>
internal static class FigureTable
{
    /// <summary>Writes figures that have a value.</summary>
    /// <param name="page">Where to.</param>
    /// <param name="figures">The figures.</param>
    public static void Write(TextPage page, IEnumerable<Figure> figures)
    {
        foreach (Figure figure in figures)
        {
            var (number, band, unit) = BandText.Parts(
                figure.Outcome.Value, figure.Outcome.Uncertainty, figure.Definition.DisplayUnit, figure.Definition.Dimension);
            string spread = band.Length > 0 ? "± " + band : figure.Outcome.IsAssumed ? "assumed" : "";
            page.Line($"    {TextPage.Pad(figure.Name, 34)}{number,12}  {TextPage.Pad(unit.Symbol, 8)}  {spread}");
        }
    }
}
