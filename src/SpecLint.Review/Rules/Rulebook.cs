using System.Collections.Immutable;
using SpecLint.Spec.Yaml;

namespace SpecLint.Review.Rules;

/// <summary>A rulebook as loaded, with every fault found in it.</summary>
/// <param name="Name">Its name.</param>
/// <param name="Path">Where it was read from; for our own, the path in the repository.</param>
/// <param name="Rules">The rules that could be loaded.</param>
/// <param name="Faults">What is wrong with it; a rulebook with faults is not used.</param>
public sealed record Rulebook(string Name, string Path, ImmutableArray<Rule> Rules, ImmutableArray<RulebookFault> Faults);

/// <summary>Something wrong with a rulebook.</summary>
/// <param name="Message">What was found and what was expected, in one sentence.</param>
/// <param name="Region">The place in the rulebook.</param>
public sealed record RulebookFault(string Message, Region Region);
