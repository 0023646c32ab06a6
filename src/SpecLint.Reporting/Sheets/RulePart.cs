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
        Write(page, review, FindingKind.Met, "Met");
        Write(page, review, FindingKind.Open, "Open");
        Write(page, review, FindingKind.NotApplicable, "Not applicable");
    }

    private static void Write(TextPage page, MachineReview review, FindingKind kind, string heading)
    {
        var findings = review.Findings.Where(f => f.Kind == kind).OrderBy(f => f.Rule.Id, StringComparer.Ordinal).ToList();
        if (findings.Count == 0)
        {
            return;
        }

        page.Heading(heading);
        foreach (Finding finding in findings)
        {
            page.Wrapped($"  {TextPage.Pad(finding.Rule.Id, 8)}", Printable.Line(finding.Rule.Title) + Detail(finding));
        }
    }

    private static string Detail(Finding finding)
    {
        if (finding.Kind == FindingKind.Open)
        {
            return $" ({RuleText.GradeWord(finding.Grade)}): needs {string.Join(", ", finding.MissingKeys.Select(Printable.Line))}";
        }

        if (finding.Margin is not { } margin || finding.Kind != FindingKind.Met)
        {
            return finding.Message.Length > 0 ? ": " + Printable.Line(finding.Message) : "";
        }

        string measured = ReviewWords.Measured(finding);
        return $": margin {BandText.Margin(margin)}" + (measured.Length > 0 ? $" ({measured})" : "");
    }
}
