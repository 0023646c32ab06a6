using System.Collections.Immutable;
using System.Globalization;
using SpecLint.Review.Findings;
using SpecLint.Review.Rules;
using SpecLint.Spec.Documents;
using SpecLint.Spec.Names;
using SpecLint.Spec.Yaml;

namespace SpecLint.Review.Reviewing;

/// <summary>Reads the waivers of a spec, judges them, and excuses the findings that a sound waiver names.</summary>
internal sealed class WaiverReview
{
    private const string DateForm = "yyyy-MM-dd";

    private readonly List<(Waiver Waiver, string Key, ImmutableArray<string> Problems, bool IsUndated)> _waivers = [];

    /// <summary>Reads and judges the waivers.</summary>
    /// <param name="spec">The spec.</param>
    /// <param name="rules">All rules by identifier.</param>
    /// <param name="options">Date and further waivers.</param>
    public WaiverReview(SpecDocument spec, IReadOnlyDictionary<string, Rule> rules, ReviewOptions options)
    {
        for (int i = 0; ; i++)
        {
            string key = string.Create(CultureInfo.InvariantCulture, $"waivers[{i}]");
            if (!spec.States(key) && !spec.States($"{key}.rule"))
            {
                break;
            }

            string Field(string name) => spec.Find($"{key}.{name}")?.Text.Trim() ?? "";
            var waiver = new Waiver(Field("rule"), Field("reason"), Field("approved-by"), Field("until"), Blame.Place(spec, key));
            Judge(waiver, key, rules, options.On);
        }

        foreach (Waiver waiver in options.Waivers)
        {
            Judge(waiver, "", rules, options.On);
        }
    }

    /// <summary>The finding with the waiver that excuses it, or as it is.</summary>
    public Finding Excuse(Finding finding)
    {
        bool isExcusable = finding.Kind == FindingKind.Unmet && finding.Rule.Source is not (RuleSource.Reading or RuleSource.Waivers);
        if (!isExcusable)
        {
            return finding;
        }

        Waiver? waiver = _waivers
            .Where(w => w.Problems.Length == 0 && string.Equals(w.Waiver.RuleId, finding.Rule.Id, StringComparison.Ordinal))
            .Select(w => w.Waiver)
            .FirstOrDefault();
        return waiver is null ? finding : finding with { Waiver = waiver };
    }

    /// <summary>The findings of the rule on waivers: one for each waiver.</summary>
    public IEnumerable<Finding> Findings(SpecDocument spec, Rule rule)
    {
        if (_waivers.Count == 0)
        {
            yield return Finding(rule, FindingKind.NotApplicable, "Not applicable: nothing is waived.", "", Region.Beginning);
        }

        foreach (var (waiver, key, problems, isUndated) in _waivers)
        {
            string name = waiver.RuleId.Length > 0 ? $"The waiver of {FieldReader.Short(waiver.RuleId)}" : "A waiver";
            Region region = key.Length > 0 && spec.Find($"{key}.rule") is { } value ? value.ValueRegion : waiver.Region;
            if (problems.Length > 0)
            {
                string said = rule.Say.Length == 0 ? "" : rule.Say;
                yield return Finding(rule, FindingKind.Unmet, MessageWriter.Join(said, $"{name} {MessageWriter.List(problems)}."), key, region);
            }
            else if (isUndated)
            {
                Finding open = Finding(rule, FindingKind.Open, $"Open: {name} ends on {waiver.Until}; no date was given to judge it by.", key, region);
                yield return open with { Grade = Grade.Remark };
            }
            else
            {
                yield return Finding(rule, FindingKind.Met, $"{name} has a reason and was approved by {FieldReader.Short(waiver.ApprovedBy)}.", key, region);
            }
        }
    }

    private void Judge(Waiver waiver, string key, IReadOnlyDictionary<string, Rule> rules, DateOnly? on)
    {
        var problems = ImmutableArray.CreateBuilder<string>();
        if (waiver.RuleId.Length == 0)
        {
            problems.Add("names no rule");
        }
        else if (!rules.TryGetValue(waiver.RuleId, out Rule? rule))
        {
            problems.Add($"names no live rule{NearestName.Suggestion(waiver.RuleId, rules.Keys.Order(StringComparer.Ordinal))}");
        }
        else if (rule.Source is RuleSource.Reading or RuleSource.Waivers)
        {
            problems.Add("names a rule that cannot be waived");
        }

        if (waiver.Reason.Length == 0)
        {
            problems.Add("gives no reason");
        }

        if (waiver.ApprovedBy.Length == 0)
        {
            problems.Add("names no approver");
        }

        bool hasDate = DateOnly.TryParseExact(waiver.Until, DateForm, CultureInfo.InvariantCulture, DateTimeStyles.None, out DateOnly until);
        if (waiver.Until.Length > 0 && !hasDate)
        {
            problems.Add($"ends on {FieldReader.Short(waiver.Until)}, which is no date such as 2030-01-31");
        }
        else if (hasDate && on is { } today && today > until)
        {
            problems.Add($"ended on {waiver.Until}");
        }

        _waivers.Add((waiver, key, problems.ToImmutable(), hasDate && on is null));
    }

    private static Finding Finding(Rule rule, FindingKind kind, string message, string key, Region region) => new()
    {
        Rule = rule,
        Kind = kind,
        Grade = rule.Grade,
        Message = message,
        Key = key,
        Region = region,
    };
}
