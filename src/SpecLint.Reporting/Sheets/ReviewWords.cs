using System.Globalization;
using SpecLint.Review.Findings;
using SpecLint.Review.Reviewing;
using SpecLint.Review.Rules;
using SpecLint.Reporting.Derivations;
using SpecLint.Reporting.Output;
using SpecLint.Reporting.Quantities;
using SpecLint.Spec.Documents;

namespace SpecLint.Reporting.Sheets;

/// <summary>Reviews and findings in words.</summary>
public static class ReviewWords
{
    /// <summary>The word of an outcome.</summary>
    /// <param name="outcome">The outcome.</param>
    public static string Outcome(ReviewOutcome outcome) => outcome switch
    {
        ReviewOutcome.Released => "released",
        ReviewOutcome.ReleasedWithQueries => "released with queries",
        ReviewOutcome.Incomplete => "incomplete",
        _ => "held",
    };

    /// <summary>Title of the machine, or the file's name when the spec gives none.</summary>
    /// <param name="spec">The spec.</param>
    public static string Title(SpecDocument spec)
    {
        string title = Printable.Line(spec.Find("title")?.Text ?? "");
        return title.Length > 0 ? title : Printable.Line(spec.Path[(spec.Path.LastIndexOf('/') + 1)..]);
    }

    /// <summary>Where a finding points: <c>wind.yaml, line 12</c>.</summary>
    /// <param name="spec">The spec.</param>
    /// <param name="line">1-based line.</param>
    public static string Place(SpecDocument spec, int line) =>
        string.Create(CultureInfo.InvariantCulture, $"{Printable.Line(spec.Path)}, line {line}");

    /// <summary>A key with what the spec says there; only the key for a section, and a note when it is not stated.</summary>
    /// <param name="spec">The spec.</param>
    /// <param name="key">Dotted key.</param>
    public static string KeyWithValue(SpecDocument spec, string key)
    {
        string name = Printable.Line(key);
        return spec.Find(key) is { } value ? $"{name} = {ValueText.Of(value)}"
            : spec.States(key) ? name
            : $"{name} (not stated)";
    }

    /// <summary>A number of things: <c>1 query</c>, <c>2 queries</c>.</summary>
    /// <param name="count">How many.</param>
    /// <param name="grade">Of which grade.</param>
    public static string Count(int count, Grade grade)
    {
        string word = (grade, count) switch
        {
            (Grade.Hold, 1) => "hold",
            (Grade.Hold, _) => "holds",
            (Grade.Query, 1) => "query",
            (Grade.Query, _) => "queries",
            (_, 1) => "remark",
            _ => "remarks",
        };
        return string.Create(CultureInfo.InvariantCulture, $"{count} {word}");
    }

    /// <summary>The numbers of unmet findings by grade, gravest first: <c>1 hold, 2 queries</c>; empty when there are none.</summary>
    /// <param name="findings">Unmet findings.</param>
    public static string Counts(IEnumerable<Finding> findings) => string.Join(", ", findings
        .GroupBy(f => f.Grade)
        .OrderByDescending(g => g.Key)
        .Select(g => Count(g.Count(), g.Key)));

    /// <summary>What was measured against what: <c>measured 1.73 ± 0.02, at most 1.6</c>; empty where nothing is measured.</summary>
    /// <param name="finding">The finding.</param>
    public static string Measured(Finding finding)
    {
        if (finding.Value is not { } value)
        {
            return "";
        }

        string measured = "measured " + BandText.Band(value, finding.Uncertainty ?? 0, finding.DisplayUnit, finding.Dimension);
        return finding.Limit is not { } limit ? measured
            : $"{measured}, {Relation(finding, value, limit)} {BandText.Value(limit, finding.DisplayUnit, finding.Dimension)} required";
    }

    /// <summary>The side on which the bound lies: the rule's own word, or for a rule with two sides the one nearer to the value.</summary>
    private static string Relation(Finding finding, double value, double limit)
    {
        switch (finding.Rule.Bound)
        {
            case { Least: not null, Most: null }:
                return "at least";
            case { Least: null, Most: not null }:
                return "at most";
            default:
                bool isKept = finding.Margin is { } margin ? margin >= 0 : finding.Kind != FindingKind.Unmet;
                return value > limit == isKept ? "at least" : "at most";
        }
    }
}
