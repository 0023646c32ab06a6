using SpecLint.Review.Findings;
using SpecLint.Review.Reviewing;
using SpecLint.Reporting.Listings;
using SpecLint.Reporting.Output;
using SpecLint.Reporting.Quantities;

namespace SpecLint.Reporting.Sheets;

/// <summary>The rules of a sheet that are not findings: met, open, not applicable.</summary>
internal static class RulePart
{
    /// <summary>Writes the part.</summary>
    /// <param name="page">Where to.</param>
    /// <param name="review">The review.</param>
    public static void Write(TextPage page, MachineReview review)
    {
        Write(page, review, FindingKind.Met, "Rules met", Met);
        Write(page, review, FindingKind.Open, "Rules open", Open);
        Write(page, review, FindingKind.NotApplicable, "Rules that do not apply", NotApplicable);
    }

    private static void Write(TextPage page, MachineReview review, FindingKind kind, string heading, Func<Finding, string> words)
    {
        var findings = review.Findings.Where(f => f.Kind == kind).OrderBy(f => f.Rule.Id, StringComparer.Ordinal).ToList();
        if (findings.Count == 0)
        {
            return;
        }

        page.Heading(heading);
        foreach (Finding finding in findings)
        {
            page.Wrapped($"  {TextPage.Pad(Printable.Line(finding.Rule.Id), 8)}", words(finding));
        }
    }

    /// <summary>What is required and how far it is kept; not the title, which says what would be wrong.</summary>
    private static string Met(Finding finding)
    {
        string what = Printable.Line(finding.Rule.Measure?.Text ?? finding.Rule.Require?.Text ?? finding.Message);
        string measured = ReviewWords.Measured(finding);
        string margin = finding.Margin is { } share ? "margin " + BandText.Margin(share) : "";
        string detail = string.Join("; ", new[] { measured, margin }.Where(s => s.Length > 0));
        return detail.Length > 0 ? $"{what}: {detail}" : what;
    }

    private static string Open(Finding finding)
    {
        string needs = finding.MissingKeys.IsEmpty ? Printable.Line(finding.Message) : "needs " + string.Join(", ", finding.MissingKeys.Select(Printable.Line));
        return $"{Printable.Line(finding.Rule.Title)} ({RuleText.GradeWord(finding.Grade)}): {needs}";
    }

    private static string NotApplicable(Finding finding) => finding.Message.Length > 0
        ? $"{Printable.Line(finding.Rule.Title)}: {Printable.Line(finding.Message)}"
        : Printable.Line(finding.Rule.Title);
}
