using System.Collections.Immutable;
using SpecLint.Review.Expressions;
using SpecLint.Review.Figures;
using SpecLint.Review.Findings;
using SpecLint.Spec.Names;
using SpecLint.Spec.Yaml;

namespace SpecLint.Review.Rules;

/// <summary>Reads the file of a house; every fault is reported with its place, and no bytes make it throw.</summary>
public static class HouseLoader
{
    private static readonly ImmutableArray<string> Fields = ["house", "rulebooks", "rules", "waivers"];
    private static readonly ImmutableArray<string> RuleFields = ["at-most", "at-least", "within", "grade", "beyond", "why"];
    private static readonly ImmutableArray<string> WaiverFields = ["rule", "reason", "approved-by", "until"];

    /// <summary>The paths of the rulebooks that a house file names, so that they can be read before the file is applied.</summary>
    /// <param name="bytes">Its bytes.</param>
    public static ImmutableArray<string> ReadRulebookPaths(ReadOnlySpan<byte> bytes)
    {
        var faults = new FaultList();
        return Open(bytes, faults) is { } fields ? [.. fields.Scalars("rulebooks").Select(s => s.Text)] : [];
    }

    /// <summary>Reads a house file and applies it to rulebooks.</summary>
    /// <param name="bytes">Its bytes.</param>
    /// <param name="scope">What its expressions can name.</param>
    /// <param name="books">All rulebooks of the review, its own further ones included.</param>
    public static House Load(ReadOnlySpan<byte> bytes, ExpressionScope scope, ImmutableArray<Rulebook> books)
    {
        var faults = new FaultList();
        if (Open(bytes, faults) is not { } fields)
        {
            return new House("", [], books, [], faults.Sorted());
        }

        string name = fields.Required("house");
        ImmutableArray<Waiver> waivers = ReadWaivers(fields, faults);
        Dictionary<string, Rule> changed = ReadRules(fields, name, scope, books, faults);
        ImmutableArray<Rulebook> applied =
            [.. books.Select(book => book with { Rules = [.. book.Rules.Select(rule => changed.GetValueOrDefault(rule.Id, rule))] })];
        return new House(name, [.. fields.Scalars("rulebooks").Select(s => s.Text)], applied, waivers, faults.Sorted());
    }

    private static FieldReader? Open(ReadOnlySpan<byte> bytes, FaultList faults)
    {
        YamlReadResult read = YamlReader.Read(bytes, YamlLimits.Default);
        foreach (YamlFault fault in read.Faults)
        {
            faults.Add(fault.Message, fault.Region);
        }

        if (read.Root is null && faults.Count == 0)
        {
            faults.Add("the house file is empty", Region.Beginning);
        }

        return read.Root is null ? null : FieldReader.Open(read.Root, Region.Beginning, "a house file", Fields, faults);
    }

    private static Dictionary<string, Rule> ReadRules(
        FieldReader fields, string house, ExpressionScope scope, ImmutableArray<Rulebook> books, FaultList faults)
    {
        var changed = new Dictionary<string, Rule>(StringComparer.Ordinal);
        YamlNode? node = fields.Find("rules");
        if (node is not YamlMapping mapping)
        {
            if (node is not null)
            {
                faults.Add("rules is not a mapping of rule ids to what changes", node.Region);
            }

            return changed;
        }

        var rules = books.SelectMany(b => b.Rules).DistinctBy(r => r.Id, StringComparer.Ordinal).ToDictionary(r => r.Id, StringComparer.Ordinal);
        foreach (YamlEntry entry in mapping.Entries)
        {
            if (!rules.TryGetValue(entry.Key.Text, out Rule? rule))
            {
                string advice = NearestName.Suggestion(entry.Key.Text, rules.Keys.Order(StringComparer.Ordinal));
                faults.Add($"there is no rule {FieldReader.Short(entry.Key.Text)}{advice}", entry.Key.Region);
            }
            else if (FieldReader.Open(entry.Value, entry.Key.Region, rule.Id, RuleFields, faults) is { } inner)
            {
                changed[rule.Id] = Change(rule, inner, house, scope, faults);
            }
        }

        return changed;
    }

    private static Rule Change(Rule rule, FieldReader fields, string house, ExpressionScope scope, FaultList faults)
    {
        var bounds = new BoundReader(scope, faults);
        Bound? bound = bounds.Read(fields) ?? rule.Bound;
        Grade grade = fields.Word("grade", RuleReader.Grades, rule.Grade);
        Beyond? beyond = fields.Has("beyond") ? bounds.ReadBeyond(fields, grade) : rule.Beyond;
        if (rule.Bound is null && bound is not null)
        {
            faults.Add($"{rule.Id} has no bound to change", fields.Region);
            return rule;
        }

        // A first grade raised to that of the second bound leaves the second without a meaning.
        beyond = beyond is not null && beyond.Grade <= grade ? null : beyond;
        string source = rule.Basis.Source.Length == 0 ? house : $"{house}, in place of: {rule.Basis.Source}";
        Rule changed = rule with
        {
            Bound = bound,
            Grade = grade,
            Beyond = beyond,
            Why = fields.Scalar("why")?.Text.Trim() ?? rule.Why,
            Basis = new Basis(BasisKind.House, source),
        };
        Check(changed, fields, scope, faults);
        return changed;
    }

    /// <summary>Checks the changed rule; a clash with a second bound that the house left as it was is a fault of the house file.</summary>
    private static void Check(Rule changed, FieldReader fields, ExpressionScope scope, FaultList faults)
    {
        bool statesBoth = fields.Has("beyond") || changed.Beyond is null;
        int before = faults.Count;
        new BoundReader(scope, faults).CheckBounds(statesBoth ? changed : changed with { Beyond = null });
        if (statesBoth || faults.Count > before)
        {
            return;
        }

        var clashes = new FaultList();
        new BoundReader(scope, clashes).CheckBounds(changed);
        if (clashes.Count > 0)
        {
            faults.Add($"the bound does not go with the second bound of {changed.Id}; state beyond too", fields.KeyRegion(""));
        }
    }

    private static ImmutableArray<Waiver> ReadWaivers(FieldReader fields, FaultList faults)
    {
        YamlNode? node = fields.Find("waivers");
        if (node is not YamlSequence list)
        {
            if (node is not null)
            {
                faults.Add("waivers is not a list", node.Region);
            }

            return [];
        }

        var waivers = ImmutableArray.CreateBuilder<Waiver>();
        foreach (YamlNode item in list.Items)
        {
            if (FieldReader.Open(item, item.Region, "a waiver", WaiverFields, faults) is { } inner)
            {
                string until = inner.Scalar("until")?.Text.Trim() ?? "";
                waivers.Add(new Waiver(inner.Required("rule"), inner.Required("reason"), inner.Required("approved-by"), until, Region.Beginning));
            }
        }

        return waivers.ToImmutable();
    }
}
