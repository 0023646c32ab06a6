using System.Text.Json;
using SpecLint.Review.Rules;
using SpecLint.Reporting.Output;
using SpecLint.Reporting.Sheets;

namespace SpecLint.Reporting.Listings;

/// <summary>Rules: one in full, or the table of all.</summary>
public static class RuleListing
{
    /// <summary>Writes one rule in full.</summary>
    /// <param name="rule">The rule.</param>
    /// <param name="options">Width and colour.</param>
    /// <param name="writer">Where to.</param>
    public static void WriteText(Rule rule, SheetOptions options, TextWriter writer)
    {
        ArgumentNullException.ThrowIfNull(rule);
        ArgumentNullException.ThrowIfNull(options);
        ArgumentNullException.ThrowIfNull(writer);
        var page = new TextPage(writer, options);
        page.Wrapped(Printable.Line(rule.Id) + "  ", Printable.Line(rule.Title), Emphasis.Heading);
        page.Blank();
        foreach (var (label, text) in Parts(rule))
        {
            page.Wrapped("  " + TextPage.Pad(label, 11), text, Emphasis.Quiet);
        }
    }

    /// <summary>Writes the table of all rules, one rulebook after the other.</summary>
    /// <param name="rules">The rules in order.</param>
    /// <param name="options">Width and colour.</param>
    /// <param name="writer">Where to.</param>
    public static void WriteTable(IEnumerable<Rule> rules, SheetOptions options, TextWriter writer)
    {
        ArgumentNullException.ThrowIfNull(rules);
        ArgumentNullException.ThrowIfNull(options);
        ArgumentNullException.ThrowIfNull(writer);
        var page = new TextPage(writer, options);
        bool isFirst = true;
        foreach (var book in rules.GroupBy(r => r.Rulebook, StringComparer.Ordinal))
        {
            if (!isFirst)
            {
                page.Blank();
            }

            isFirst = false;
            page.Line(Printable.Line(book.Key), Emphasis.Heading);
            foreach (Rule rule in book)
            {
                string lead = $"  {TextPage.Pad(Printable.Line(rule.Id), 8)}{TextPage.Pad(GradeWords(rule), 14)}{TextPage.Pad(rule.Basis.KindText, 17)}";
                page.Wrapped(lead, Printable.Line(rule.Title));
            }
        }
    }

    /// <summary>Writes <c>{"rules": [{"id", "title", "grade", …}]}</c>; the stream stays open.</summary>
    /// <param name="rules">The rules in order.</param>
    /// <param name="stream">Where to.</param>
    public static void WriteJson(IEnumerable<Rule> rules, Stream stream)
    {
        ArgumentNullException.ThrowIfNull(rules);
        JsonOutput.Write(stream, json =>
        {
            json.WriteStartObject();
            json.WriteStartArray("rules");
            foreach (Rule rule in rules)
            {
                Write(json, rule);
            }

            json.WriteEndArray();
            json.WriteEndObject();
        });
    }

    private static void Write(Utf8JsonWriter json, Rule rule)
    {
        json.WriteStartObject();
        json.WriteString("id", Printable.Line(rule.Id));
        json.WriteString("title", Printable.Line(rule.Title));
        json.WriteString("rulebook", Printable.Line(rule.Rulebook));
        json.WriteString("grade", RuleText.GradeWord(rule.Grade));
        if (rule.Beyond is { } beyond)
        {
            json.WriteString("grade-beyond", RuleText.GradeWord(beyond.Grade));
        }

        json.WriteString("when", rule.When is { } when ? Printable.Line(when.Text) : "");
        json.WriteString("from-stage", StageWord(rule.From));
        json.WriteString("requirement", Printable.Line(RuleText.Requirement(rule)));
        json.WriteString("why", Printable.Sentence(rule.Why));
        json.WriteStartObject("basis");
        json.WriteString("kind", rule.Basis.KindText);
        json.WriteString("source", Printable.Line(rule.Basis.Source));
        json.WriteEndObject();
        JsonOutput.WriteTexts(json, "levers", rule.Levers);
        JsonOutput.WriteTexts(json, "safety-notes", rule.Safety);
        json.WriteEndObject();
    }

    private static IEnumerable<(string Label, string Text)> Parts(Rule rule)
    {
        string requirement = RuleText.Requirement(rule);
        yield return ("requires", requirement.Length > 0 ? Printable.Line(requirement) : SourceWords(rule.Source));
        if (rule.Source != RuleSource.Hazard)
        {
            yield return ("grade", GradeWords(rule));
        }

        if (rule.When is { } when)
        {
            yield return ("when", Printable.Line(when.Text));
        }

        if (rule.From != SpecStage.Sketch)
        {
            yield return ("from", $"stage {StageWord(rule.From)} on");
        }

        yield return ("why", Printable.Sentence(rule.Why));
        yield return ("basis", Printable.Line(RuleText.BasisWords(rule.Basis)));
        if (!rule.Levers.IsEmpty)
        {
            yield return ("levers", string.Join(", ", rule.Levers.Select(Printable.Line)));
        }

        string label = "safety";
        foreach (string note in rule.Safety)
        {
            yield return (label, Printable.Sentence(note));
            label = "";
        }

        yield return ("rulebook", Printable.Line(rule.Rulebook));
    }

    private static string GradeWords(Rule rule) =>
        rule.Source == RuleSource.Hazard ? "hazard"
        : rule.Beyond is { } beyond ? $"{RuleText.GradeWord(rule.Grade)}, {RuleText.GradeWord(beyond.Grade)}"
        : RuleText.GradeWord(rule.Grade);

    private static string StageWord(SpecStage stage) => stage switch
    {
        SpecStage.Build => "build",
        SpecStage.Order => "order",
        _ => "sketch",
    };

    private static string SourceWords(RuleSource source) => source switch
    {
        RuleSource.Reading => "decided while the spec is read",
        RuleSource.Waivers => "decided by the check of waivers",
        RuleSource.Declarations => "decided by comparing declared with computed figures",
        RuleSource.Hazard => "reported with every machine that has the hazard",
        _ => "decided by the program",
    };
}
