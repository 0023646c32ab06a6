using System.Collections.Immutable;
using SpecLint.Review.Rules;
using SpecLint.Spec.Units;
using SpecLint.Spec.Yaml;

namespace SpecLint.Review.Findings;

/// <summary>What became of a rule on a machine.</summary>
public enum FindingKind
{
    /// <summary>The rule does not hold.</summary>
    Unmet,

    /// <summary>The rule holds.</summary>
    Met,

    /// <summary>The rule lacks an input.</summary>
    Open,

    /// <summary>The rule does not concern this machine.</summary>
    NotApplicable,

    /// <summary>A hazard of the machine, reported whether or not anything is unmet.</summary>
    Hazard,
}

/// <summary>One rule applied to one machine.</summary>
public sealed record Finding
{
    /// <summary>The rule.</summary>
    public required Rule Rule { get; init; }

    /// <summary>What became of it.</summary>
    public required FindingKind Kind { get; init; }

    /// <summary>Grade of an unmet rule; for an open one, the gravest grade it could take.</summary>
    public required Grade Grade { get; init; }

    /// <summary>The sentence for people: figure, bound, margin in readable units.</summary>
    public required string Message { get; init; }

    /// <summary>The rule's own part of <see cref="Message"/>, without the standing sentence on figure, bound and margin; empty when the message has no other part.</summary>
    public string Statement { get; init; } = "";

    /// <summary>Dotted key to blame; empty for the whole document.</summary>
    public required string Key { get; init; }

    /// <summary>Its place in the spec: the value, or for a missing key its nearest stated parent.</summary>
    public required Region Region { get; init; }

    /// <summary>The other inputs, with their places.</summary>
    public ImmutableArray<RelatedPlace> Related { get; init; } = [];

    /// <summary>The figures that the measure names, whose working leads to the finding.</summary>
    public ImmutableArray<string> Figures { get; init; } = [];

    /// <summary>The measured value in SI; null where nothing is measured.</summary>
    public double? Value { get; init; }

    /// <summary>Half width of the band of the measured value, in SI.</summary>
    public double? Uncertainty { get; init; }

    /// <summary>The bound that decides, in SI; null where nothing is measured.</summary>
    public double? Limit { get; init; }

    /// <summary>Signed distance to the bound over the rule's scale; negative is not met.</summary>
    public double? Margin { get; init; }

    /// <summary>True when the nominal value keeps the bound and only its band reaches past it.</summary>
    public bool IsWithinUncertainty { get; init; }

    /// <summary>Dimension of value and bound.</summary>
    public Dimension Dimension { get; init; }

    /// <summary>Unit in which value and bound are shown, such as <c>mm</c>.</summary>
    public string DisplayUnit { get; init; } = "";

    /// <summary>The keys that would close an open rule.</summary>
    public ImmutableArray<string> MissingKeys { get; init; } = [];

    /// <summary>The waiver that excuses it; null when there is none.</summary>
    public Waiver? Waiver { get; init; }
}

/// <summary>A second place in the spec that belongs to a finding.</summary>
/// <param name="Key">Dotted key.</param>
/// <param name="Region">Its value's place.</param>
/// <param name="Message">What stands there, such as <c>magnets.width is 30 mm</c>.</param>
public sealed record RelatedPlace(string Key, Region Region, string Message);

/// <summary>An unmet rule excused in writing.</summary>
/// <param name="RuleId">The rule.</param>
/// <param name="Reason">Why it is acceptable.</param>
/// <param name="ApprovedBy">Who says so.</param>
/// <param name="Until">Last day it holds (ISO 8601), or empty.</param>
/// <param name="Region">Where it stands in the spec.</param>
public sealed record Waiver(string RuleId, string Reason, string ApprovedBy, string Until, Region Region);
