using System.Collections.Immutable;
using SpecLint.Review.Expressions;

namespace SpecLint.Review.Rules;

/// <summary>What the measure of a rule must keep to: a floor, a ceiling, or both.</summary>
/// <param name="Least">The least value allowed; null when there is none.</param>
/// <param name="Most">The greatest value allowed; null when there is none.</param>
public sealed record Bound(Expression? Least, Expression? Most);

/// <summary>A second, harsher bound.</summary>
/// <param name="Bound">The bound.</param>
/// <param name="Grade">The grade when it is not kept.</param>
public sealed record Beyond(Bound Bound, Grade Grade);

/// <summary>The examples of a rule: a spec of <c>specs-examples</c> with some values changed so that it meets or breaks the rule.</summary>
/// <param name="Of">File name without its ending.</param>
/// <param name="Meets">Keys with the texts that make the rule met; may be empty when the spec already meets it.</param>
/// <param name="Breaks">Keys with the texts that break it.</param>
/// <param name="BreaksBeyond">Keys with the texts that break the second bound; empty when there is none.</param>
public sealed record RuleExamples(
    string Of,
    ImmutableArray<KeyValuePair<string, string>> Meets,
    ImmutableArray<KeyValuePair<string, string>> Breaks,
    ImmutableArray<KeyValuePair<string, string>> BreaksBeyond)
{
    /// <summary>Keys with the texts that bring the measure to its bound; empty when the rule has no such example.</summary>
    public ImmutableArray<KeyValuePair<string, string>> Boundary { get; init; } = [];
}
