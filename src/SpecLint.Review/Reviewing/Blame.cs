using System.Collections.Immutable;
using SpecLint.Review.Expressions;
using SpecLint.Review.Figures;
using SpecLint.Review.Findings;
using SpecLint.Review.Rules;
using SpecLint.Spec.Documents;
using SpecLint.Spec.Yaml;

namespace SpecLint.Review.Reviewing;

/// <summary>The key that a finding points at, with the other keys that belong to it.</summary>
internal sealed record Blame(string Key, Region Region, ImmutableArray<RelatedPlace> Related)
{
    /// <summary>Most related places of a finding.</summary>
    private const int MostRelated = 12;

    /// <summary>
    /// Blames the first lever that the spec states; for a requirement, first the lever that it asks to be stated and is not; where no lever
    /// is stated, a key that the rule names or that its figures depend on, else the nearest stated parent of a lever.
    /// </summary>
    public static Blame Of(Rule rule, FigureGraph graph)
    {
        SpecDocument spec = graph.Spec;
        ImmutableArray<string> unstated = rule.Require?.StatedKeys ?? [];
        string key = unstated.FirstOrDefault(k => !spec.States(k) && rule.Levers.Contains(k, StringComparer.Ordinal))
            ?? rule.Levers.FirstOrDefault(spec.States)
            ?? (rule.Require is null ? null : rule.Levers.FirstOrDefault() ?? unstated.FirstOrDefault(k => !spec.States(k)))
            ?? NamedKeys(rule).FirstOrDefault(spec.States)
            ?? KeysBehind(rule, graph).FirstOrDefault()
            ?? rule.Levers.FirstOrDefault()
            ?? NamedKeys(rule).FirstOrDefault()
            ?? "";
        return new Blame(key, Place(spec, key), Others(rule, spec, key));
    }

    /// <summary>
    /// The place of a rule that does not concern the machine: a lever or a key that it names. No figure is computed for it.
    /// </summary>
    public static Blame OfBystander(Rule rule, SpecDocument spec)
    {
        ImmutableArray<string> keys = [.. rule.Levers.Concat(NamedKeys(rule))];
        string key = keys.FirstOrDefault(spec.States) ?? keys.FirstOrDefault() ?? "";
        return new Blame(key, Place(spec, key), []);
    }

    /// <summary>Blames a missing key.</summary>
    public static Blame OfMissing(SpecDocument spec, string key) => new(key, Place(spec, key), []);

    /// <summary>Where a key stands: its value, its name for a section, and for a missing key its nearest stated parent.</summary>
    public static Region Place(SpecDocument spec, string key) =>
        spec.Find(key)?.ValueRegion ?? spec.KeyRegion(key) ?? spec.NearestParent(key).Region;

    private static IEnumerable<string> NamedKeys(Rule rule) =>
        Expressions(rule).SelectMany(e => e.Keys).Distinct(StringComparer.Ordinal);

    private static IEnumerable<Expression> Expressions(Rule rule) => new[]
    {
        rule.Measure, rule.Require, rule.Bound?.Least, rule.Bound?.Most, rule.Beyond?.Bound.Least, rule.Beyond?.Bound.Most,
    }.OfType<Expression>();

    /// <summary>The stated keys behind the figures of the measure, by place; those that only say what kind of machine it is come last.</summary>
    private static IEnumerable<string> KeysBehind(Rule rule, FigureGraph graph) =>
        (rule.Measure ?? rule.Require)?.Figures
            .SelectMany(graph.KeysBehind)
            .Distinct(StringComparer.Ordinal)
            .Where(k => graph.Spec.Find(k) is not null)
            .OrderBy(k => k.StartsWith("machine.", StringComparison.Ordinal))
            .ThenBy(k => graph.Spec.Find(k)!.ValueRegion)
            .ThenBy(k => k, StringComparer.Ordinal)
        ?? Enumerable.Empty<string>();

    private static ImmutableArray<RelatedPlace> Others(Rule rule, SpecDocument spec, string blamed) =>
    [
        .. rule.Levers.Concat(NamedKeys(rule))
            .Distinct(StringComparer.Ordinal)
            .Where(k => !string.Equals(k, blamed, StringComparison.Ordinal))
            .Select(spec.Find)
            .OfType<SpecValue>()
            .Take(MostRelated)
            .Select(v => new RelatedPlace(v.Key, v.ValueRegion, Describe(v))),
    ];

    private static string Describe(SpecValue value) => value.Kind == SpecValueKind.List
        ? $"{value.Key} is a list of {value.Count}"
        : $"{value.Key} is {FieldReader.Short(value.Text)}";
}
