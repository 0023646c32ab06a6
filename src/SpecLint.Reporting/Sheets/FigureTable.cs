using SpecLint.Review.Figures;
using SpecLint.Reporting.Quantities;

namespace SpecLint.Reporting.Sheets;

/// <summary>Figures in columns: name, number, band, unit.</summary>
internal static class FigureTable
{
    /// <summary>Column where numbers end, counted from where names begin; a longer name takes room from the space before it.</summary>
    private const int NumberEnd = 46;

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
            string space = new(' ', Math.Max(1, NumberEnd - TextPage.Columns(figure.Name) - number.Length));
            page.Line($"    {figure.Name}{space}{number}  {TextPage.Pad(unit.Symbol, 8)}  {spread}");
        }
    }
}
