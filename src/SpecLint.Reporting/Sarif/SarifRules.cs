using Microsoft.CodeAnalysis.Sarif;
using SpecLint.Review.Figures;
using SpecLint.Review.Rules;
using SpecLint.Reporting.Listings;
using SpecLint.Reporting.Output;

namespace SpecLint.Reporting.Sarif;

/// <summary>The rules of a run as reporting descriptors, and the place of each in the list.</summary>
internal sealed class SarifRules
{
    private readonly List<Rule> _rules = [];
    private readonly Dictionary<string, int> _index = new(StringComparer.Ordinal);

    /// <summary>The rules loaded; others are added as findings name them.</summary>
    /// <param name="loaded">Every rule loaded.</param>
    public SarifRules(IEnumerable<Rule> loaded)
    {
        foreach (Rule rule in loaded)
        {
            IndexOf(rule);
        }
    }

    /// <summary>The standards that the rules cite.</summary>
    public SarifStandards Standards() => new(_rules);

    /// <summary>Place of a rule in the driver's list, to which it is added if need be.</summary>
    /// <param name="rule">The rule.</param>
    public int IndexOf(Rule rule)
    {
        if (_index.TryAdd(rule.Id, _rules.Count))
        {
            _rules.Add(rule);
        }

        return _index[rule.Id];
    }

    /// <summary>The descriptors in order.</summary>
    /// <param name="standards">The standards that the rules cite.</param>
    public IList<ReportingDescriptor> Descriptors(SarifStandards standards) => [.. _rules.Select(rule => Descriptor(rule, standards))];

    /// <summary>The SARIF level of a grade.</summary>
    /// <param name="grade">Grade of a rule or finding.</param>
    public static FailureLevel LevelOf(Grade grade) => grade switch
    {
        Grade.Hold => FailureLevel.Error,
        Grade.Query => FailureLevel.Warning,
        _ => FailureLevel.Note,
    };

    private static ReportingDescriptor Descriptor(Rule rule, SarifStandards standards)
    {
        string requirement = RuleText.Requirement(rule);
        var descriptor = new ReportingDescriptor
        {
            Id = rule.Id,
            Name = SarifText.PascalCase(rule.Title),
            ShortDescription = SarifText.Description(rule.Title),
            FullDescription = SarifText.Description(requirement.Length > 0 ? $"{Printable.Sentence(requirement)} {rule.Why}" : rule.Why),
            Help = new MultiformatMessageString { Text = HelpText(rule), Markdown = HelpMarkdown(rule) },
            DefaultConfiguration = new ReportingConfiguration
            {
                Level = rule.Source == RuleSource.Hazard ? FailureLevel.None : LevelOf(rule.Grade),
            },
            Relationships = standards.RelationshipsOf(rule),
        };
        descriptor.SetProperty("grade", RuleText.GradeWord(rule.Grade));
        if (rule.Beyond is { } beyond)
        {
            descriptor.SetProperty("gradeBeyond", RuleText.GradeWord(beyond.Grade));
        }

        descriptor.SetProperty("basis", rule.Basis.KindText);
        descriptor.SetProperty("safetyNotes", rule.Safety.Select(Printable.Sentence).ToArray());
        descriptor.SetProperty("tags", Tags(rule));
        return descriptor;
    }

    private static string[] Tags(Rule rule)
    {
        var tags = new List<string> { "machine-design", Printable.Line(rule.Rulebook), rule.Basis.KindText };
        if (rule.Safety.Length > 0 || rule.Source == RuleSource.Hazard)
        {
            tags.Add("safety");
        }

        return [.. tags.Distinct(StringComparer.Ordinal)];
    }

    private static string HelpText(Rule rule) =>
        string.Join("\n\n", Paragraphs(rule).Select(p => $"{p.Label}: {SarifText.Escape(p.Text)}"));

    private static string HelpMarkdown(Rule rule) =>
        string.Join("\n\n", Paragraphs(rule).Select(p => $"**{p.Label}.** {MarkdownText.Escape(SarifText.Double(Printable.Sentence(p.Text)))}"));

    private static IEnumerable<(string Label, string Text)> Paragraphs(Rule rule)
    {
        string requirement = RuleText.Requirement(rule);
        if (requirement.Length > 0)
        {
            yield return ("Requirement", requirement);
        }

        yield return ("Why", rule.Why);
        yield return ("Basis", RuleText.BasisWords(rule.Basis));
        if (rule.Levers.Length > 0)
        {
            yield return ("What to change", string.Join(", ", rule.Levers));
        }

        foreach (string note in rule.Safety)
        {
            yield return ("Safety", note);
        }
    }
}
