using SpecLint.Review.Figures;
using SpecLint.Review.Rules;

namespace SpecLint.Reporting.Listings;

/// <summary>Rules in words.</summary>
internal static class RuleText
{
    /// <summary>The word of a grade.</summary>
    /// <param name="grade">The grade.</param>
    public static string GradeWord(Grade grade) => grade switch
    {
        Grade.Hold => "hold",
        Grade.Query => "query",
        _ => "remark",
    };

    /// <summary>What the rule requires, such as <c>a / b at most 1.1 (query), at most 1.6 (hold)</c>; empty when it has no expression.</summary>
    /// <param name="rule">The rule.</param>
    public static string Requirement(Rule rule)
    {
        string grade = GradeWord(rule.Grade);
        if (rule.Require is { } require)
        {
            return $"{require.Text} ({grade})";
        }

        if (rule.Measure is null || rule.Bound is null)
        {
            return "";
        }

        string text = $"{rule.Measure.Text} {BoundWords(rule.Bound)} ({grade})";
        return rule.Beyond is { } beyond ? $"{text}, {BoundWords(beyond.Bound)} ({GradeWord(beyond.Grade)})" : text;
    }

    /// <summary>A bound in words: <c>at least 1</c>, <c>at most 2</c>, <c>within 1 and 2</c>.</summary>
    /// <param name="bound">The bound.</param>
    public static string BoundWords(Bound bound) => (bound.Least, bound.Most) switch
    {
        ({ } least, { } most) => $"within {least.Text} and {most.Text}",
        ({ } least, null) => $"at least {least.Text}",
        (null, { } most) => $"at most {most.Text}",
        _ => "without bound",
    };

    /// <summary>Where a limit comes from, in words.</summary>
    /// <param name="basis">The basis.</param>
    public static string BasisWords(Basis basis)
    {
        string kind = basis.Kind switch
        {
            BasisKind.CommonPractice => "common practice",
            BasisKind.Derived => "derived from physics",
            BasisKind.House => "house rule",
            _ => basis.KindText,
        };
        string source = basis.Source.Length > 0 ? basis.Source : basis.Kind == BasisKind.CommonPractice ? "no source" : "";
        return source.Length == 0 ? kind : $"{kind}: {source}";
    }
}
