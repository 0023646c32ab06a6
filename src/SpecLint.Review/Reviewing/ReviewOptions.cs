using System.Collections.Immutable;
using SpecLint.Review.Findings;

namespace SpecLint.Review.Reviewing;

/// <summary>What a review is told besides the spec and the rulebooks.</summary>
public sealed record ReviewOptions
{
    /// <summary>No date, no waivers but the spec's own.</summary>
    public static ReviewOptions Default { get; } = new();

    /// <summary>The date on which waivers are judged; null leaves their last day unjudged, which is then said.</summary>
    public DateOnly? On { get; init; }

    /// <summary>Waivers given outside the spec.</summary>
    public ImmutableArray<Waiver> Waivers { get; init; } = [];
}
