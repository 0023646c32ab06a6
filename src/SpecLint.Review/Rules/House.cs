using System.Collections.Immutable;
using SpecLint.Review.Findings;

namespace SpecLint.Review.Rules;

/// <summary>What a house sets for its own reviews: further rulebooks, other bounds and grades, waivers.</summary>
/// <param name="Name">Its name.</param>
/// <param name="RulebookPaths">Paths of further rulebooks, as written.</param>
/// <param name="Books">The rulebooks with the house's bounds and grades.</param>
/// <param name="Waivers">Waivers for every spec.</param>
/// <param name="Faults">What is wrong with the file; a house file with faults is not used.</param>
public sealed record House(
    string Name,
    ImmutableArray<string> RulebookPaths,
    ImmutableArray<Rulebook> Books,
    ImmutableArray<Waiver> Waivers,
    ImmutableArray<RulebookFault> Faults);
