using System.Collections.Immutable;
using SpecLint.Review.Figures;
using SpecLint.Review.Findings;
using SpecLint.Review.Rules;
using SpecLint.Spec.Documents;

namespace SpecLint.Review.Reviewing;

/// <summary>Applies rulebooks to specs.</summary>
public static class Reviewer
{
    /// <summary>Reviews one spec.</summary>
    /// <param name="spec">The spec as read, faults included.</param>
    /// <param name="catalogue">All figures there are.</param>
    /// <param name="books">The rulebooks, without faults.</param>
    /// <param name="options">Date and further waivers.</param>
    public static MachineReview Review(SpecDocument spec, FigureCatalogue catalogue, IReadOnlyList<Rulebook> books, ReviewOptions options)
    {
        FigureGraph? graph = ReadingReview.LeavesMachine(spec) ? new FigureGraph(spec, catalogue) : null;
        return Review(spec, graph, books, options);
    }

    /// <summary>Reviews one spec whose figures may have been computed in part, such as a changed spec that shares results with another.</summary>
    /// <param name="spec">The spec as read, faults included.</param>
    /// <param name="graph">Its figures; null when the spec leaves no machine to compute.</param>
    /// <param name="books">The rulebooks, without faults.</param>
    /// <param name="options">Date and further waivers.</param>
    public static MachineReview Review(SpecDocument spec, FigureGraph? graph, IReadOnlyList<Rulebook> books, ReviewOptions options)
    {
        ImmutableArray<Rule> rules = [.. books.SelectMany(b => b.Rules)];
        Rule reading = rules.FirstOrDefault(r => r.Source == RuleSource.Reading) ?? ReadingReview.OwnRule;
        var findings = new List<Finding>(ReadingReview.Findings(spec, reading));
        if (graph is not null)
        {
            AddFindings(findings, rules, graph, options);
        }

        ImmutableArray<Finding> sorted =
        [
            .. findings.OrderBy(f => f.Region)
                .ThenBy(f => f.Rule.Id, StringComparer.Ordinal)
                .ThenBy(f => f.Key, StringComparer.Ordinal)
                .ThenBy(f => f.Message, StringComparer.Ordinal),
        ];
        return new MachineReview
        {
            Spec = spec,
            Figures = graph,
            Findings = sorted,
            Outcome = OutcomeOf(sorted),
            ClosingKeys = ClosingKeys(sorted),
        };
    }

    /// <summary>Applies one rule of expressions to one machine; waivers are left aside.</summary>
    /// <param name="graph">The machine.</param>
    /// <param name="rule">The rule.</param>
    public static Finding ReviewRule(FigureGraph graph, Rule rule) => new RuleReviewer(graph).Review(rule);

    private static void AddFindings(List<Finding> findings, ImmutableArray<Rule> rules, FigureGraph graph, ReviewOptions options)
    {
        var byId = new Dictionary<string, Rule>(StringComparer.Ordinal);
        foreach (Rule rule in rules)
        {
            byId.TryAdd(rule.Id, rule);
        }

        var waivers = new WaiverReview(graph.Spec, byId, options);
        var reviewer = new RuleReviewer(graph);
        foreach (Rule rule in rules)
        {
            switch (rule.Source)
            {
                case RuleSource.Reading:
                    break;
                case RuleSource.Waivers:
                    findings.AddRange(waivers.Findings(graph.Spec, rule));
                    break;
                case RuleSource.Declarations:
                    findings.AddRange(DeclarationReview.Findings(graph, rule).Select(waivers.Excuse));
                    break;
                default:
                    findings.Add(waivers.Excuse(reviewer.Review(rule)));
                    break;
            }
        }
    }

    private static ReviewOutcome OutcomeOf(ImmutableArray<Finding> findings)
    {
        bool Unmet(Grade grade) => findings.Any(f => f.Kind == FindingKind.Unmet && f.Waiver is null && f.Grade == grade);
        return Unmet(Grade.Hold) ? ReviewOutcome.Held
            : findings.Any(IsOpenHold) ? ReviewOutcome.Incomplete
            : Unmet(Grade.Query) ? ReviewOutcome.ReleasedWithQueries
            : ReviewOutcome.Released;
    }

    private static ImmutableArray<string> ClosingKeys(ImmutableArray<Finding> findings) =>
    [
        .. findings.Where(IsOpenHold)
            .SelectMany(f => f.MissingKeys.Distinct(StringComparer.Ordinal))
            .GroupBy(key => key, StringComparer.Ordinal)
            .OrderByDescending(group => group.Count())
            .ThenBy(group => group.Key, StringComparer.Ordinal)
            .Select(group => group.Key),
    ];

    private static bool IsOpenHold(Finding finding) => finding.Kind == FindingKind.Open && finding.Grade == Grade.Hold;
}
