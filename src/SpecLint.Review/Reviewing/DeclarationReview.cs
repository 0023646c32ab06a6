using SpecLint.Review.Expressions;
using SpecLint.Review.Figures;
using SpecLint.Review.Findings;
using SpecLint.Review.Rules;
using SpecLint.Spec.Documents;
using SpecLint.Spec.Names;
using SpecLint.Spec.Units;

namespace SpecLint.Review.Reviewing;

/// <summary>Compares the figures that a spec declares with those computed, one finding for each.</summary>
internal static class DeclarationReview
{
    /// <summary>Where declared figures stand in a spec.</summary>
    public const string Prefix = "declared.";

    private const double DefaultShare = 0.05;
    private const double DefaultHarsherShare = 0.15;

    /// <summary>How many times its own stated tolerance a declared figure may miss before the harsher grade.</summary>
    private const double HarsherToleranceFactor = 3;

    /// <summary>Temperatures are compared as rises above this [K], since a share of the absolute temperature means nothing.</summary>
    private const double ReferenceTemperature = 293.15;

    /// <summary>The findings of the rule on declared figures.</summary>
    public static IEnumerable<Finding> Findings(FigureGraph graph, Rule rule)
    {
        bool any = false;
        foreach (SpecValue declared in graph.Spec.Values)
        {
            if (declared.Key.StartsWith(Prefix, StringComparison.Ordinal))
            {
                any = true;
                yield return Compare(graph, rule, declared);
            }
        }

        if (!any)
        {
            yield return Finding(rule, FindingKind.NotApplicable, "Not applicable: no figure is declared.", "", graph.Spec.KeyRegion("declared") ?? Spec.Yaml.Region.Beginning);
        }
    }

    private static Finding Compare(FigureGraph graph, Rule rule, SpecValue declared)
    {
        string name = declared.Key[Prefix.Length..];
        Grade gravest = rule.GravestGrade;
        if (graph.Catalogue.Find(name) is not { } definition)
        {
            string meant = NearestName.Suggestion(name, graph.Catalogue.Definitions.Select(d => d.Name));
            return At(declared, rule, FindingKind.Unmet, $"There is no figure {FieldReader.Short(name)} to compare with{meant}.") with { Grade = gravest };
        }

        if (declared.Kind != SpecValueKind.Number || declared.Dimension != definition.Dimension)
        {
            string message = $"{name} is declared as {FieldReader.Short(declared.Text)}; expected a value in {Unit(definition)}.";
            return At(declared, rule, FindingKind.Unmet, message) with { Grade = gravest };
        }

        Outcome outcome = graph[name].Outcome;
        if (!outcome.HasValue)
        {
            string reason = MessageWriter.Lack(Evaluated.From(outcome));
            return outcome.Kind == OutcomeKind.NotApplicable
                ? At(declared, rule, FindingKind.NotApplicable, $"Not applicable: {name} {reason}.")
                : At(declared, rule, FindingKind.Open, $"Open: {name} cannot be compared, {reason}.") with { Grade = gravest, MissingKeys = outcome.MissingKeys };
        }

        return Compare(rule, declared, definition, outcome);
    }

    private static Finding Compare(Rule rule, SpecValue declared, FigureDefinition definition, Outcome computed)
    {
        double origin = definition.Dimension == Dimensions.Temperature && definition.DisplayUnit is "°C" ? ReferenceTemperature : 0;
        double scale = Math.Max(Math.Abs(computed.Value - origin), double.Epsilon);
        double difference = computed.Value - declared.Number;
        double deviation = Math.Abs(difference) / scale;
        double first = rule.Bound?.Most?.Constant ?? DefaultShare;
        double second = rule.Beyond?.Bound.Most?.Constant ?? DefaultHarsherShare;
        if (declared.HasTolerance)
        {
            first = (difference > 0 ? declared.ToleranceAbove : declared.ToleranceBelow) / scale;
            second = HarsherToleranceFactor * first;
        }

        first = Math.Max(first, computed.Uncertainty / scale);
        second = Math.Max(second, first);
        bool isHarsher = deviation > second && !Nearness.AreNear(deviation, second);
        bool isUnmet = deviation > first && !Nearness.AreNear(deviation, first);
        double limit = isHarsher ? second : first;
        var (said, found) = MessageWriter.Apart(declared.Number, computed.Value, definition.DisplayUnit);
        string deviates = $"{definition.Name} is declared as {said}, computed as {found}: {MessageWriter.Percent(deviation)} apart; expected at most {MessageWriter.Percent(limit)}.";
        return At(declared, rule, isUnmet ? FindingKind.Unmet : FindingKind.Met, deviates) with
        {
            Grade = isHarsher && rule.Beyond is { } beyond ? beyond.Grade : rule.Grade,
            Figures = [definition.Name],
            Value = deviation,
            Uncertainty = computed.Uncertainty / scale,
            Limit = limit,
            Margin = limit > 0 ? (limit - deviation) / limit : -deviation,
            DisplayUnit = "%",
        };
    }

    private static string Unit(FigureDefinition definition) =>
        definition.DisplayUnit.Length > 0 ? definition.DisplayUnit : definition.Dimension == Dimension.None ? "no unit" : definition.Unit;

    private static Finding At(SpecValue declared, Rule rule, FindingKind kind, string message) =>
        Finding(rule, kind, message, declared.Key, declared.ValueRegion);

    private static Finding Finding(Rule rule, FindingKind kind, string message, string key, Spec.Yaml.Region region) => new()
    {
        Rule = rule,
        Kind = kind,
        Grade = rule.Grade,
        Message = message,
        Key = key,
        Region = region,
    };
}
