using System.Collections.Immutable;
using System.Globalization;
using System.Text;
using SpecLint.Review.Figures;
using SpecLint.Review.Findings;
using SpecLint.Review.Rules;
using SpecLint.Spec.Documents;
using SpecLint.Spec.Yaml;

namespace SpecLint.Review.Reviewing;

/// <summary>Runs the examples that rules carry, so that a rulebook proves itself.</summary>
/// <param name="loadSpec">Gives the example spec of a name, or null when there is none.</param>
/// <param name="figures">All figures there are.</param>
public sealed class RuleExampleRunner(Func<string, SpecDocument?> loadSpec, FigureCatalogue figures)
{
    /// <summary>Text of an example that removes its key.</summary>
    private const string Removal = "~";

    /// <summary>Largest margin, either sign, that counts as on the bound.</summary>
    private const double BoundaryMargin = 0.01;

    /// <summary>What is wrong with the examples of a rule; empty when they show what they should.</summary>
    /// <param name="rule">A rule of expressions.</param>
    public ImmutableArray<string> Run(Rule rule)
    {
        if (rule.Examples is not { } examples)
        {
            return [$"{rule.Id} has no examples"];
        }

        if (loadSpec(examples.Of) is not { } spec)
        {
            return [$"{rule.Id}: there is no example spec {examples.Of}"];
        }

        var problems = ImmutableArray.CreateBuilder<string>();
        Check(problems, rule, spec, "meets", examples.Meets, finding => finding.Kind == FindingKind.Met);
        Check(problems, rule, spec, "breaks", examples.Breaks, finding => finding.Kind == FindingKind.Unmet && finding.Grade == rule.Grade);
        if (rule.Beyond is { } beyond && examples.BreaksBeyond.Length == 0)
        {
            problems.Add($"{rule.Id} has a second bound but no example breaks-beyond");
        }
        else if (rule.Beyond is { } second)
        {
            Check(problems, rule, spec, "breaks-beyond", examples.BreaksBeyond, finding => finding.Kind == FindingKind.Unmet && finding.Grade == second.Grade);
        }

        if (examples.Boundary.Length > 0)
        {
            Check(problems, rule, spec, "boundary", examples.Boundary, finding => finding.Margin is >= -BoundaryMargin and <= BoundaryMargin);
        }

        return problems.ToImmutable();
    }

    private void Check(
        ImmutableArray<string>.Builder problems,
        Rule rule,
        SpecDocument spec,
        string name,
        ImmutableArray<KeyValuePair<string, string>> changes,
        Func<Finding, bool> fits)
    {
        SpecDocument changed = Change(spec, changes, out string? problem);
        if (problem is not null)
        {
            problems.Add($"{rule.Id} {name}: {problem}");
            return;
        }

        Finding finding = Reviewer.ReviewRule(new FigureGraph(changed, figures), rule);
        if (!fits(finding))
        {
            problems.Add($"{rule.Id} {name}: is {finding.Kind} at {finding.Grade}. {finding.Message}");
        }
    }

    /// <summary>The spec with keys removed first and then set.</summary>
    private static SpecDocument Change(SpecDocument spec, ImmutableArray<KeyValuePair<string, string>> changes, out string? problem)
    {
        problem = null;
        SpecDocument changed = spec;
        foreach (var (key, text) in changes.OrderBy(c => !string.Equals(c.Value, Removal, StringComparison.Ordinal)))
        {
            SpecFault? fault;
            if (string.Equals(text, Removal, StringComparison.Ordinal))
            {
                changed = Without(changed, key, out fault);
            }
            else
            {
                changed = changed.WithText(key, text, out fault);
            }

            if (fault is not null)
            {
                problem = fault.Message;
                return spec;
            }
        }

        return changed;
    }

    /// <summary>The spec read again with one leaf cut out of its text.</summary>
    private static SpecDocument Without(SpecDocument spec, string key, out SpecFault? fault)
    {
        fault = null;
        if (spec.Find(key) is not { } value)
        {
            fault = new SpecFault(key, $"{key} is not stated as a value, so it cannot be removed", Region.Beginning);
            return spec;
        }

        int start = Offset(spec.Text, value.KeyRegion.StartLine, value.KeyRegion.StartColumn);
        int end = Offset(spec.Text, value.ValueRegion.EndLine, value.ValueRegion.EndColumn);
        var text = new StringBuilder(spec.Text);
        int comma = NextMark(spec.Text, end);
        if (comma >= 0 && spec.Text[comma] == ',')
        {
            end = comma + 1;
        }
        else if (PreviousMark(spec.Text, start) is >= 0 and var before && spec.Text[before] == ',')
        {
            start = before;
        }

        text.Remove(start, end - start);
        SpecDocument changed = SpecReader.Read(spec.Path, Encoding.UTF8.GetBytes(text.ToString()));
        fault = changed.Faults.Length > spec.Faults.Length
            ? changed.Faults[0] with { Message = string.Create(CultureInfo.InvariantCulture, $"without {key}: {changed.Faults[0].Message}") }
            : null;
        return changed;
    }

    private static int NextMark(string text, int from)
    {
        int at = from;
        while (at < text.Length && text[at] is ' ' or '\t')
        {
            at++;
        }

        return at < text.Length ? at : -1;
    }

    private static int PreviousMark(string text, int from)
    {
        int at = from - 1;
        while (at >= 0 && text[at] is ' ' or '\t')
        {
            at--;
        }

        return at;
    }

    private static int Offset(string text, int line, int column)
    {
        int at = 0;
        for (int i = 1; i < line; i++)
        {
            at = text.IndexOf('\n', at) + 1;
        }

        return at + column - 1;
    }
}
