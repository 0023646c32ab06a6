using SpecLint.Review.Figures;
using SpecLint.Review.Findings;
using SpecLint.Review.Rules;
using SpecLint.Spec.Documents;
using SpecLint.Spec.Yaml;

namespace SpecLint.Review.Reviewing;

/// <summary>Turns the faults of a spec into findings and decides whether they leave a machine to compute.</summary>
public static class ReadingReview
{
    private static readonly string[] MachineKeys = ["machine.topology", "machine.arrangement", "machine.stator"];

    /// <summary>Stands in for the rule of reading when no rulebook has it, so that no fault is lost.</summary>
    public static Rule OwnRule { get; } = new()
    {
        Id = "DOC-01",
        Title = "The spec cannot be read as written",
        Rulebook = "doc",
        Grade = Grade.Hold,
        Say = "",
        Why = "A value that is not understood is not checked.",
        Basis = new Basis(BasisKind.Derived, ""),
        Source = RuleSource.Reading,
        Region = Region.Beginning,
    };

    /// <summary>One finding for each fault; one that says so when there is none.</summary>
    public static IEnumerable<Finding> Findings(SpecDocument spec, Rule rule)
    {
        if (spec.Faults.Length == 0)
        {
            yield return Finding(rule, FindingKind.Met, "The spec reads without fault.", "", Region.Beginning);
        }

        foreach (SpecFault fault in spec.Faults)
        {
            string said = rule.Say.Length == 0 ? "" : rule.Say;
            Finding finding = Finding(rule, FindingKind.Unmet, MessageWriter.Join(said, fault.Message), fault.AbsentKey.Length > 0 ? fault.AbsentKey : fault.Key, fault.Region);
            yield return fault.Related is { } place
                ? finding with { Related = [new RelatedPlace(fault.Key, place, fault.RelatedMessage)] }
                : finding;
        }
    }

    /// <summary>True when topology, arrangement and stator are read and covered, so that figures mean something.</summary>
    /// <param name="spec">The spec.</param>
    public static bool LeavesMachine(SpecDocument spec) =>
        Array.TrueForAll(MachineKeys, key => spec.Find(key) is not null && !spec.Faults.Any(f => string.Equals(f.Key, key, StringComparison.Ordinal)));

    private static Finding Finding(Rule rule, FindingKind kind, string message, string key, Region region) => new()
    {
        Rule = rule,
        Kind = kind,
        Grade = rule.Grade,
        Message = message,
        Key = key,
        Region = region,
    };
}
