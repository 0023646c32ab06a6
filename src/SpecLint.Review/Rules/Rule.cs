using System.Collections.Immutable;
using SpecLint.Review.Expressions;
using SpecLint.Review.Figures;
using SpecLint.Spec.Yaml;

namespace SpecLint.Review.Rules;

/// <summary>One requirement on a machine: what is measured, against what, how grave it is, and where that comes from.</summary>
public sealed record Rule
{
    /// <summary>Identifier such as <c>FIT-04</c>; permanent.</summary>
    public required string Id { get; init; }

    /// <summary>What is wrong when the rule is unmet, as a headline.</summary>
    public required string Title { get; init; }

    /// <summary>Name of the rulebook it stands in.</summary>
    public required string Rulebook { get; init; }

    /// <summary>The rule concerns a machine only where this holds; null for every machine.</summary>
    public Expression? When { get; init; }

    /// <summary>The earliest stage of a spec from which the rule counts.</summary>
    public SpecStage From { get; init; } = SpecStage.Sketch;

    /// <summary>What is measured; null for a rule that <see cref="Require"/>s something or is filled by the reader or the reviewer.</summary>
    public Expression? Measure { get; init; }

    /// <summary>The condition that must hold, for rules without a measured figure; else null.</summary>
    public Expression? Require { get; init; }

    /// <summary>The bound on the measure; null for rules without one.</summary>
    public Bound? Bound { get; init; }

    /// <summary>Grade when the bound or the requirement is not kept.</summary>
    public required Grade Grade { get; init; }

    /// <summary>A second, harsher bound with its grade; null when there is none.</summary>
    public Beyond? Beyond { get; init; }

    /// <summary>What the margin is divided by, where the bound is zero or a temperature; null for the bound's size.</summary>
    public Expression? Scale { get; init; }

    /// <summary>The finding's sentence; <c>{measure}</c>, <c>{bound}</c>, figure names and keys in braces are filled in.</summary>
    public required string Say { get; init; }

    /// <summary>Unit in which measure and bound are shown; empty to follow the figures and literals they name.</summary>
    public string DisplayUnit { get; init; } = "";

    /// <summary>Why the rule stands.</summary>
    public required string Why { get; init; }

    /// <summary>Where the limit comes from.</summary>
    public required Basis Basis { get; init; }

    /// <summary>Spec keys whose change can make the rule met; the first one stated is where the finding points.</summary>
    public ImmutableArray<string> Levers { get; init; } = [];

    /// <summary>What can hurt someone, and how to keep it from doing so.</summary>
    public ImmutableArray<string> Safety { get; init; } = [];

    /// <summary>Specs that meet and break the rule; null for rules filled by the reader or the reviewer.</summary>
    public RuleExamples? Examples { get; init; }

    /// <summary>Who finds it: the expressions of the rulebook, the reader of specs, the waiver check, or the hazard list.</summary>
    public RuleSource Source { get; init; } = RuleSource.Expression;

    /// <summary>Where the rule stands in its rulebook.</summary>
    public required Region Region { get; init; }

    /// <summary>The gravest grade that the rule can give.</summary>
    public Grade GravestGrade => Beyond is { } beyond && beyond.Grade > Grade ? beyond.Grade : Grade;

    /// <summary><see cref="Say"/> cut at its gaps; null for a rule made without a rulebook, whose sentence stands as it is.</summary>
    internal MessageTemplate? Template { get; init; }
}

/// <summary>Who decides whether a rule is met.</summary>
public enum RuleSource
{
    /// <summary>The expressions of the rulebook.</summary>
    Expression,

    /// <summary>The reader of specs: syntax, schema, units, topology (DOC-01).</summary>
    Reading,

    /// <summary>The check of waivers (DOC-03).</summary>
    Waivers,

    /// <summary>The comparison of declared with computed figures (CLM-01).</summary>
    Declarations,

    /// <summary>A hazard that is reported with every run where it exists.</summary>
    Hazard,
}

/// <summary>How far a design has come; the word of the spec's <c>stage</c>.</summary>
public enum SpecStage
{
    /// <summary>First numbers.</summary>
    Sketch,

    /// <summary>Parts are about to be ordered.</summary>
    Order,

    /// <summary>Parts are there.</summary>
    Build,
}
