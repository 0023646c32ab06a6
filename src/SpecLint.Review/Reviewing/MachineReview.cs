using System.Collections.Immutable;
using SpecLint.Review.Figures;
using SpecLint.Review.Findings;
using SpecLint.Review.Rules;
using SpecLint.Spec.Documents;

namespace SpecLint.Review.Reviewing;

/// <summary>The verdict on a spec.</summary>
public enum ReviewOutcome
{
    /// <summary>Nothing unmet at query or hold.</summary>
    Released,

    /// <summary>Queries to answer.</summary>
    ReleasedWithQueries,

    /// <summary>A hold-grade rule is open.</summary>
    Incomplete,

    /// <summary>A hold is unmet.</summary>
    Held,
}

/// <summary>The review of one spec.</summary>
public sealed record MachineReview
{
    /// <summary>The spec as read.</summary>
    public required SpecDocument Spec { get; init; }

    /// <summary>The figures, computed on demand; null when the spec's faults leave no machine to compute.</summary>
    public required FigureGraph? Figures { get; init; }

    /// <summary>Every rule applied, sorted by place and then by rule: unmet, met, open, not applicable, hazards.</summary>
    public required ImmutableArray<Finding> Findings { get; init; }

    /// <summary>The verdict.</summary>
    public required ReviewOutcome Outcome { get; init; }

    /// <summary>Keys that would close most open hold-grade rules, the most useful first.</summary>
    public ImmutableArray<string> ClosingKeys { get; init; } = [];

    /// <summary>Findings that are unmet and not waived, sorted by grade (gravest first), place, rule.</summary>
    public IEnumerable<Finding> Unmet => Findings
        .Where(f => f.Kind == FindingKind.Unmet && f.Waiver is null)
        .OrderByDescending(f => f.Grade);

    /// <summary>Unmet findings excused by a waiver.</summary>
    public IEnumerable<Finding> Waived => Findings.Where(f => f.Kind == FindingKind.Unmet && f.Waiver is not null);

    /// <summary>The hazards of the machine.</summary>
    public IEnumerable<Finding> Hazards => Findings.Where(f => f.Kind == FindingKind.Hazard);

    /// <summary>The gravest unmet, unwaived grade, or null when nothing is unmet.</summary>
    public Grade? Gravest => Unmet.Select(f => (Grade?)f.Grade).FirstOrDefault();
}
