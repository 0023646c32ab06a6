using System.Globalization;
using SpecLint.Review.Findings;
using SpecLint.Review.Reviewing;
using SpecLint.Review.Rules;
using SpecLint.Reporting.Listings;
using SpecLint.Reporting.Output;

namespace SpecLint.Reporting.Sheets;

/// <summary>The review sheet for people who read a terminal: findings first, then what the machine is, then the outcome.</summary>
public static class TextSheet
{
    /// <summary>Writes a sheet for each review, and a table of all when there are several; lines end with <c>\n</c>.</summary>
    /// <param name="reviews">The reviews in order; each is let go of once it is written.</param>
    /// <param name="options">Width, colour and extent.</param>
    /// <param name="writer">Where to.</param>
    public static void Write(IEnumerable<MachineReview> reviews, SheetOptions options, TextWriter writer)
    {
        ArgumentNullException.ThrowIfNull(reviews);
        ArgumentNullException.ThrowIfNull(writer);
        var table = new SummaryTable();
        foreach (MachineReview review in reviews)
        {
            if (table.Count > 0)
            {
                writer.Write("\n\n");
            }

            Write(review, options, writer);
            table.Add(review);
        }

        if (table.Count > 1)
        {
            writer.Write("\n\n");
            table.Write(options, writer);
        }
    }

    /// <summary>Writes the sheet of one review.</summary>
    /// <param name="review">The review.</param>
    /// <param name="options">Width, colour and extent.</param>
    /// <param name="writer">Where to.</param>
    public static void Write(MachineReview review, SheetOptions options, TextWriter writer)
    {
        ArgumentNullException.ThrowIfNull(review);
        ArgumentNullException.ThrowIfNull(options);
        ArgumentNullException.ThrowIfNull(writer);
        var page = new TextPage(writer, options);
        WriteHead(page, review);
        FindingPart.Write(page, review);
        if (review.Figures is { } graph)
        {
            FigurePart.Write(page, review, graph);
        }

        WriteOpen(page, review);
        if (options.IncludesAll)
        {
            RulePart.Write(page, review);
        }

        WriteHazards(page, review);
        WriteOutcome(page, review);
    }

    private static void WriteHead(TextPage page, MachineReview review)
    {
        string revision = Printable.Line(review.Spec.Find("revision")?.Text ?? "");
        string title = ReviewWords.Title(review.Spec);
        page.Wrapped("", revision.Length > 0 ? $"{title}, revision {revision}" : title, Emphasis.Heading);
        string stage = Printable.Line(review.Spec.Find("stage")?.Text ?? "");
        page.Wrapped("", Printable.Line(review.Spec.Path) + (stage.Length > 0 ? $", stage {stage}" : ""));
        page.Bar();
    }

    private static void WriteOpen(TextPage page, MachineReview review)
    {
        var open = review.Findings.Where(f => f.Kind == FindingKind.Open).ToList();
        if (open.Count == 0)
        {
            return;
        }

        int holds = open.Count(f => f.Grade == Grade.Hold);
        string verb = open.Count == 1 ? "rule waits" : "rules wait";
        page.Heading(string.Create(CultureInfo.InvariantCulture, $"Open: {open.Count} {verb} for inputs, {holds} of hold grade"));
        IEnumerable<string> keys = review.ClosingKeys.IsEmpty
            ? open.SelectMany(f => f.MissingKeys).GroupBy(k => k, StringComparer.Ordinal).OrderByDescending(g => g.Count()).Select(g => g.Key)
            : review.ClosingKeys;
        foreach (string key in keys.Take(6))
        {
            var waiting = open.Where(f => f.MissingKeys.Contains(key, StringComparer.Ordinal)).Select(f => Printable.Line(f.Rule.Id)).ToList();
            string rules = waiting.Count == 0 ? "" : waiting.Count <= 6 ? string.Join(", ", waiting)
                : string.Create(CultureInfo.InvariantCulture, $"{string.Join(", ", waiting.Take(5))} and {waiting.Count - 5} more");
            page.Wrapped("  " + TextPage.Pad("state " + Printable.Line(key), 34) + "  ", rules.Length > 0 ? "for " + rules : "");
        }
    }

    private static void WriteHazards(TextPage page, MachineReview review)
    {
        var hazards = review.Hazards.ToList();
        if (hazards.Count == 0)
        {
            return;
        }

        page.Heading("Hazards of this machine");
        foreach (Finding hazard in hazards)
        {
            page.Blank();
            page.Wrapped($"  {Printable.Line(hazard.Rule.Id)}  ", Printable.Line(hazard.Rule.Title), Emphasis.Heading);
            page.Wrapped("          ", Printable.Sentence(hazard.Message));
            foreach (string note in hazard.Rule.Safety)
            {
                page.Wrapped("          ", Printable.Sentence(note));
            }
        }
    }

    private static void WriteOutcome(TextPage page, MachineReview review)
    {
        page.Blank();
        page.Bar();
        string counts = ReviewWords.Counts(review.Unmet);
        string line = counts.Length > 0 ? $"{ReviewWords.Outcome(review.Outcome)}: {counts}" : ReviewWords.Outcome(review.Outcome);
        if (review.Outcome == ReviewOutcome.Incomplete)
        {
            int open = review.Findings.Count(f => f.Kind == FindingKind.Open && f.Grade == Grade.Hold);
            line += string.Create(CultureInfo.InvariantCulture, $"{(counts.Length > 0 ? "; " : ": ")}{open} of hold grade open");
        }

        string waived = string.Join(", ", review.Waived.Where(f => f.Grade == Grade.Hold).Select(f => Printable.Line(f.Rule.Id)).Distinct(StringComparer.Ordinal));
        line += waived.Length > 0 ? $"; waived hold: {waived}" : "";
        page.Wrapped("Outcome  ", line, Emphasis.Heading);
    }
}
