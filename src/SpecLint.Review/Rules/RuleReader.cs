using System.Collections.Immutable;
using SpecLint.Review.Expressions;
using SpecLint.Review.Figures;
using SpecLint.Spec.Names;
using SpecLint.Spec.Units;
using SpecLint.Spec.Yaml;

namespace SpecLint.Review.Rules;

/// <summary>Reads one rule of a rulebook.</summary>
internal sealed class RuleReader(string rulebook, ExpressionScope scope, SharedTexts shared, FaultList faults)
{
    private const int LongestId = 40;

    /// <summary>The words of the grades.</summary>
    internal static readonly ImmutableArray<(string, Grade)> Grades =
        [("hold", Grade.Hold), ("query", Grade.Query), ("remark", Grade.Remark)];

    private static readonly ImmutableArray<string> RuleFields =
    [
        "id", "title", "source", "when", "from", "measure", "require", "at-most", "at-least", "within", "grade", "beyond", "scale", "unit",
        "say", "why", "basis", "levers", "safety", "examples",
    ];

    private static readonly ImmutableArray<(string, RuleSource)> Sources =
    [
        ("reading", RuleSource.Reading), ("waivers", RuleSource.Waivers), ("declarations", RuleSource.Declarations), ("hazard", RuleSource.Hazard),
    ];

    private static readonly ImmutableArray<(string, SpecStage)> Stages =
        [("sketch", SpecStage.Sketch), ("order", SpecStage.Order), ("build", SpecStage.Build)];

    private static readonly ImmutableArray<(string, BasisKind)> BasisKinds =
    [
        ("standard", BasisKind.Standard), ("published", BasisKind.Published), ("derived", BasisKind.Derived),
        ("common-practice", BasisKind.CommonPractice), ("house", BasisKind.House),
    ];

    private readonly BoundReader _bounds = new(scope, faults);

    /// <summary>The rule, as far as it could be read; null when it is no mapping.</summary>
    public Rule? Read(YamlNode node)
    {
        if (FieldReader.Open(node, node.Region, "a rule", RuleFields, faults) is not { } fields)
        {
            return null;
        }

        RuleSource source = fields.Word("source", Sources, RuleSource.Expression);
        Expression? measure = _bounds.Number(fields.Scalar("measure"), "measure");
        Expression? require = _bounds.Condition(fields.Scalar("require"), "require");
        Bound? bound = _bounds.Read(fields);
        Grade grade = fields.Word("grade", Grades, Grade.Remark);
        var rule = new Rule
        {
            Id = Id(fields),
            Title = fields.Required("title"),
            Rulebook = rulebook,
            When = _bounds.Condition(fields.Scalar("when"), "when"),
            From = fields.Word("from", Stages, SpecStage.Sketch),
            Measure = measure,
            Require = require,
            Bound = bound,
            Grade = grade,
            Beyond = _bounds.ReadBeyond(fields, grade),
            Scale = _bounds.Number(fields.Scalar("scale"), "scale"),
            DisplayUnit = Unit(fields.Scalar("unit"), measure),
            Say = Say(fields, source),
            Why = fields.Required("why"),
            Basis = ReadBasis(fields),
            Levers = Levers(fields),
            Safety = Safety(fields),
            Examples = ReadExamples(fields),
            Source = source,
            Region = fields.KeyRegion("id"),
        };
        _bounds.CheckShape(fields, rule);
        return rule with { Template = Template(fields.Scalar("say"), rule) };
    }

    private string Id(FieldReader fields)
    {
        string id = fields.Required("id");
        bool fits = id.Length <= LongestId && (id.Length == 0 || char.IsAsciiLetter(id[0])) && id.All(c => char.IsAsciiLetterOrDigit(c) || c == '-');
        if (!fits)
        {
            faults.Add(
                $"id is {FieldReader.Short(id)}; expected a letter, then letters, digits and hyphens, at most {LongestId} in all",
                fields.Scalar("id")!.Region);
        }

        return id;
    }

    private string Unit(YamlScalar? scalar, Expression? measure)
    {
        if (scalar is null || scalar.Text.Length == 0)
        {
            return "";
        }

        if (!UnitTable.TryFind(scalar.Text, out UnitEntry? unit))
        {
            faults.Add($"{FieldReader.Short(scalar.Text)} is not a known unit", scalar.Region);
            return "";
        }

        if (measure is not null && unit.Dimension != measure.Dimension)
        {
            faults.Add($"unit {scalar.Text} does not fit the measure, which is {ExpressionBinder.Describe(measure.Dimension)}", scalar.Region);
        }

        return scalar.Text;
    }

    private static string Say(FieldReader fields, RuleSource source) =>
        source is RuleSource.Reading or RuleSource.Waivers or RuleSource.Declarations ? fields.Scalar("say")?.Text ?? "" : fields.Required("say");

    private Basis ReadBasis(FieldReader fields)
    {
        var unknown = new Basis(BasisKind.CommonPractice, "");
        if (!fields.Has("basis"))
        {
            faults.Add("a rule lacks the field basis", fields.KeyRegion("id"));
            return unknown;
        }

        if (FieldReader.Open(fields.Find("basis"), fields.KeyRegion("basis"), "basis", ["kind", "source", "cite"], faults) is not { } inner)
        {
            return unknown;
        }

        _ = inner.Required("kind");
        BasisKind kind = inner.Word("kind", BasisKinds, BasisKind.CommonPractice);
        var texts = new List<string>();
        if (inner.Scalar("source") is { } source)
        {
            texts.Add(source.Text.Trim());
        }

        foreach (YamlScalar cited in inner.Scalars("cite"))
        {
            if (shared.Sources.TryGetValue(cited.Text, out string? text))
            {
                texts.Add(text);
            }
            else
            {
                faults.Add($"there is no source named {FieldReader.Short(cited.Text)}{NearestName.Suggestion(cited.Text, shared.Sources.Keys)}", cited.Region);
            }
        }

        if (kind is BasisKind.Standard or BasisKind.Published && texts.All(string.IsNullOrWhiteSpace) && !inner.Has("cite"))
        {
            faults.Add("basis names no source; a standard or published basis needs source or cite", fields.KeyRegion("basis"));
        }

        return new Basis(kind, string.Join("; ", texts));
    }

    private ImmutableArray<string> Levers(FieldReader fields)
    {
        var levers = ImmutableArray.CreateBuilder<string>();
        foreach (YamlScalar lever in fields.Scalars("levers"))
        {
            if (ExpressionScope.FindKey(lever.Text) is null)
            {
                faults.Add($"there is no key {FieldReader.Short(lever.Text)}{NearestName.Suggestion(lever.Text, ExpressionScope.KeyNames)}", lever.Region);
            }
            else
            {
                levers.Add(lever.Text);
            }
        }

        return levers.ToImmutable();
    }

    private ImmutableArray<string> Safety(FieldReader fields)
    {
        var notes = ImmutableArray.CreateBuilder<string>();
        foreach (YamlScalar note in fields.Scalars("safety"))
        {
            if (note.Text.AsSpan().ContainsAny(" \t\n"))
            {
                notes.Add(note.Text.Trim());
            }
            else if (shared.SafetyNotes.TryGetValue(note.Text, out string? text))
            {
                notes.Add(text);
            }
            else
            {
                faults.Add(
                    $"there is no safety note named {FieldReader.Short(note.Text)}{NearestName.Suggestion(note.Text, shared.SafetyNotes.Keys)}",
                    note.Region);
            }
        }

        return notes.ToImmutable();
    }

    private RuleExamples? ReadExamples(FieldReader fields)
    {
        if (fields.Find("examples") is not { } node
            || FieldReader.Open(node, node.Region, "examples", ["of", "meets", "breaks", "breaks-beyond", "boundary"], faults) is not { } inner)
        {
            return null;
        }

        return new RuleExamples(inner.Required("of"), Changes(inner, "meets"), Changes(inner, "breaks"), Changes(inner, "breaks-beyond"))
        {
            Boundary = Changes(inner, "boundary"),
        };
    }

    private static ImmutableArray<KeyValuePair<string, string>> Changes(FieldReader fields, string name) =>
        [.. fields.Texts(name).Select(change => KeyValuePair.Create(change.Key.Text, change.Value.Text))];

    private MessageTemplate? Template(YamlScalar? say, Rule rule)
    {
        if (say is null)
        {
            return null;
        }

        return MessageTemplate.Cut(
            say.Text.Trim(),
            (gap, start) => Gap(gap, start + (say.Text.Length - say.Text.TrimStart().Length), rule, say),
            fault => faults.Add(fault, say));
    }

    private MessagePart? Gap(string gap, int start, Rule rule, YamlScalar say)
    {
        int colon = gap.LastIndexOf(':');
        string inner = colon < 0 ? gap : gap[..colon];
        string unitText = colon < 0 ? "" : gap[(colon + 1)..].Trim();
        if (!UnitTable.TryFind(unitText, out UnitEntry? unit) && unitText.Length > 0)
        {
            faults.Add(new ExpressionFault($"{FieldReader.Short(unitText)} is not a known unit", start + colon + 1, gap.Length - colon - 1), say);
            return null;
        }

        MessagePartKind kind = inner.Trim() switch
        {
            "measure" => MessagePartKind.Measure,
            "bound" => MessagePartKind.Bound,
            "margin" => MessagePartKind.Margin,
            _ => MessagePartKind.Expression,
        };
        if (kind != MessagePartKind.Expression)
        {
            bool fits = rule.Measure is { } measure && (unit is null || unit.Dimension == measure.Dimension);
            if (!fits)
            {
                faults.Add(new ExpressionFault($"{{{FieldReader.Short(gap)}}} needs a measure of that unit", start, gap.Length), say);
            }

            return new MessagePart(kind, "") { Unit = unitText };
        }

        Expression? expression = ExpressionParser.Parse(inner, say.Region, scope, out ExpressionFault? fault);
        if (fault is null && expression!.IsCondition)
        {
            fault = new ExpressionFault($"{FieldReader.Short(inner)} is a condition; expected a value", 0, inner.Length);
        }
        else if (fault is null && unit is not null && (expression!.IsText || unit.Dimension != expression.Dimension))
        {
            fault = new ExpressionFault($"{FieldReader.Short(inner)} cannot be shown in {unitText}", 0, inner.Length);
        }

        if (fault is not null)
        {
            faults.Add(fault with { Start = fault.Start + start }, say);
            return null;
        }

        return new MessagePart(kind, "") { Expression = expression, Unit = unitText };
    }
}
