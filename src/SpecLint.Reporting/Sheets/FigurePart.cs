using System.Collections.Immutable;
using SpecLint.Review.Figures;
using SpecLint.Review.Reviewing;
using SpecLint.Reporting.Derivations;
using SpecLint.Reporting.Output;

namespace SpecLint.Reporting.Sheets;

/// <summary>The key figures of a sheet and the defaults they rest on.</summary>
internal static class FigurePart
{
    /// <summary>Writes the part.</summary>
    /// <param name="page">Where to.</param>
    /// <param name="review">The review.</param>
    /// <param name="graph">Its figures.</param>
    public static void Write(TextPage page, MachineReview review, FigureGraph graph)
    {
        var groups = KeyFigures.Of(graph).ToList();
        if (groups.Any(group => group.Figures.Any(f => f.Outcome.HasValue)))
        {
            page.Heading("Key figures");
        }

        foreach (var (group, figures) in groups)
        {
            var rows = figures.Where(f => f.Outcome.HasValue).ToList();
            if (rows.Count > 0)
            {
                page.Blank();
                page.Line("  " + group, Emphasis.Quiet);
                FigureTable.Write(page, rows);
            }
        }

        WriteAssumed(page, review, graph, groups.SelectMany(g => g.Figures));
    }

    private static void WriteAssumed(TextPage page, MachineReview review, FigureGraph graph, IEnumerable<Figure> keyFigures)
    {
        IEnumerable<string> names = review.Findings.SelectMany(f => f.Figures).Concat(keyFigures.Select(f => f.Name));
        IReadOnlyList<Figure> assumed = KeyFigures.AssumedBehind(graph, names);
        if (assumed.Count == 0)
        {
            return;
        }

        page.Heading("Assumed, because the spec is silent");
        foreach (Figure figure in assumed)
        {
            page.Wrapped("  " + TextPage.Pad(figure.Name, 34) + "  ", $"{ValueText.Of(figure)}: {Printable.Line(figure.Outcome.Reason)}");
        }
    }
}
