using System.Collections.Immutable;

namespace SpecLint.Review.Rules;

/// <summary>Texts that rulebooks share by name.</summary>
/// <param name="Sources">Sources to cite.</param>
/// <param name="SafetyNotes">Safety notes.</param>
public sealed record SharedTexts(ImmutableSortedDictionary<string, string> Sources, ImmutableSortedDictionary<string, string> SafetyNotes)
{
    /// <summary>No texts.</summary>
    public static SharedTexts None { get; } = new(
        ImmutableSortedDictionary.Create<string, string>(StringComparer.Ordinal),
        ImmutableSortedDictionary.Create<string, string>(StringComparer.Ordinal));
}
