using SpecLint.Review.Findings;
using SpecLint.Review.Reviewing;
using SpecLint.Review.Rules;
using SpecLint.Reporting.Listings;
using SpecLint.Reporting.Output;
using SpecLint.Reporting.Quantities;

namespace SpecLint.Reporting.Sheets;

/// <summary>The findings of a sheet, gravest first, and those that are waived.</summary>
internal static class FindingPart
{
    private const int LabelColumns = 10;
    private const int MostMoved = 6;

    /// <summary>Writes the part.</summary>
    /// <param name="page">Where to.</param>
    /// <param name="review">The review.</param>
    public static void Write(TextPage page, MachineReview review)
    {
        var unmet = review.Unmet.ToList();
        if (unmet.Count == 0)
        {
            page.Blank();
            page.Line("No findings.");
        }

        foreach (Finding finding in unmet)
        {
            WriteFinding(page, review, finding);
        }

        WriteWaived(page, review);
    }

    /// <summary>A line under a label of the sheet's label column.</summary>
    /// <param name="page">Where to.</param>
    /// <param name="label">The label.</param>
    /// <param name="text">The text.</param>
    public static void Labelled(TextPage page, string label, string text) =>
        page.Wrapped("  " + TextPage.Pad(label, LabelColumns - 2), text, Emphasis.Quiet);

    private static void WriteFinding(TextPage page, MachineReview review, Finding finding)
    {
        page.Blank();
        string word = RuleText.GradeWord(finding.Grade);
        page.Wrapped($"{word,-8}{Printable.Line(finding.Rule.Id)}  ", Printable.Line(finding.Rule.Title), EmphasisOf(finding.Grade));
        WritePlace(page, review, finding);
        bool hasMargin = finding.Margin is not null && finding.Statement.Length > 0;
        Labelled(page, "found", Printable.Sentence(hasMargin ? finding.Statement : finding.Message));
        Labelled(page, "why", Printable.Sentence(finding.Rule.Why));
        Labelled(page, "basis", Printable.Line(RuleText.BasisWords(finding.Rule.Basis)));
        if (finding.Margin is { } margin)
        {
            string measured = ReviewWords.Measured(finding);
            Labelled(page, "margin", BandText.Margin(margin) + (measured.Length > 0 ? $" ({measured})" : "") + (finding.IsWithinUncertainty ? ", within its uncertainty" : ""));
        }

        WriteMoved(page, review, finding);
        foreach (string note in finding.Rule.Safety)
        {
            Labelled(page, "safety", Printable.Sentence(note));
        }
    }

    private static void WritePlace(TextPage page, MachineReview review, Finding finding)
    {
        Labelled(page, "at", ReviewWords.Place(review.Spec, finding.Region.StartLine));
        if (finding.Key.Length > 0)
        {
            // What the reader could not take has no value to show.
            bool isFault = finding.Rule.Source == RuleSource.Reading;
            Labelled(page, "", isFault ? Printable.Line(finding.Key) : ReviewWords.KeyWithValue(review.Spec, finding.Key));
        }
    }

    private static void WriteMoved(TextPage page, MachineReview review, Finding finding)
    {
        if (review.Figures is not { } graph || review.Spec.Find(finding.Key) is null)
        {
            return;
        }

        var moved = KeyFigures.MovedBy(graph, finding.Key).ToList();
        if (moved.Count > 0)
        {
            string rest = moved.Count > MostMoved ? FormattableString.Invariant($" and {moved.Count - MostMoved} more") : "";
            Labelled(page, "moves", $"a change here also moves {string.Join(", ", moved.Take(MostMoved))}{rest}");
        }
    }

    private static void WriteWaived(TextPage page, MachineReview review)
    {
        foreach (Finding finding in review.Waived.OrderByDescending(f => f.Grade))
        {
            page.Blank();
            page.Wrapped("waived  " + Printable.Line(finding.Rule.Id) + "  ", $"{Printable.Line(finding.Rule.Title)} ({RuleText.GradeWord(finding.Grade)})", Emphasis.Heading);
            WritePlace(page, review, finding);
            bool hasMargin = finding.Margin is not null && finding.Statement.Length > 0;
        Labelled(page, "found", Printable.Sentence(hasMargin ? finding.Statement : finding.Message));
            Waiver waiver = finding.Waiver!;
            string approval = waiver.ApprovedBy.Length > 0 ? "approved by " + Printable.Line(waiver.ApprovedBy) : "not yet approved";
            string until = waiver.Until.Length > 0 ? ", until " + Printable.Line(waiver.Until) : "";
            Labelled(page, "waiver", $"{Printable.Sentence(waiver.Reason)} ({approval}{until}; line {FormattableString.Invariant($"{waiver.Region.StartLine}")})");
            foreach (string note in finding.Rule.Safety)
            {
                Labelled(page, "safety", Printable.Sentence(note));
            }
        }
    }

    private static Emphasis EmphasisOf(Grade grade) => grade switch
    {
        Grade.Hold => Emphasis.Hold,
        Grade.Query => Emphasis.Query,
        _ => Emphasis.Remark,
    };
}
