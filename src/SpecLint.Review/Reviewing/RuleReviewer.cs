using System.Collections.Immutable;
using SpecLint.Review.Expressions;
using SpecLint.Review.Figures;
using SpecLint.Review.Findings;
using SpecLint.Review.Rules;

namespace SpecLint.Review.Reviewing;

/// <summary>Applies the rules that are made of expressions, and the hazards, to one machine.</summary>
internal sealed class RuleReviewer(FigureGraph graph)
{
    private readonly SpecStage _stage = StageOf(graph);

    /// <summary>What becomes of one rule.</summary>
    public Finding Review(Rule rule)
    {
        if (rule.From > _stage)
        {
            string word = rule.From == SpecStage.Order ? "order" : "build";
            return NotApplicable(rule, $"counts from the stage {word} on");
        }

        if (rule.When is { } when)
        {
            Evaluated concerns = when.Evaluate(graph);
            if (!concerns.IsKnown)
            {
                return rule.Source == RuleSource.Hazard ? Hazard(rule, concerns) : Unclear(rule, concerns);
            }

            if (!concerns.Truth)
            {
                return NotApplicable(rule, $"concerns machines with {when.Text}");
            }
        }

        return rule.Source == RuleSource.Hazard ? Hazard(rule, lack: null)
            : rule.Require is { } require ? Require(rule, require)
            : rule is { Measure: { } measure, Bound: not null } ? Measure(rule, measure)
            : NotApplicable(rule, "has neither a measure nor a requirement");
    }

    private static SpecStage StageOf(FigureGraph graph) => graph.Spec.Find("stage")?.Text switch
    {
        "order" => SpecStage.Order,
        "build" => SpecStage.Build,
        _ => SpecStage.Sketch,
    };

    private Finding Require(Rule rule, Expression require)
    {
        Evaluated holds = require.Evaluate(graph);
        if (!holds.IsKnown)
        {
            return Lacking(rule, holds);
        }

        Blame blame = Blame.Of(rule, graph);
        return Base(rule, blame) with
        {
            Kind = holds.Truth ? FindingKind.Met : FindingKind.Unmet,
            Message = holds.Truth ? $"Holds: {require.Text}." : MessageWriter.Say(rule, graph, measured: null),
            Figures = require.Figures,
        };
    }

    private Finding Measure(Rule rule, Expression measure)
    {
        Evaluated value = measure.Measure(graph);
        if (!value.IsKnown)
        {
            return Lacking(rule, value);
        }

        var (verdict, harsher) = new BoundJudge(graph, rule, measure).Judge();
        if (verdict.Lack is { } lack)
        {
            return Lacking(rule, lack);
        }

        var measured = new MeasuredValue(value.Number, value.Uncertainty, MessageWriter.UnitOf(rule, measure, verdict.Bound), verdict);
        string tail = MessageWriter.Tail(rule, measured, OtherLimit(verdict));
        bool isMet = verdict.Grade is null;
        string statement = isMet ? "" : MessageWriter.Say(rule, graph, measured);
        if (!isMet && harsher?.Lack is { } unknown)
        {
            statement = MessageWriter.Join(statement, $"The harsher bound could not be judged: {MessageWriter.Lack(unknown)}.");
        }

        return Base(rule, Blame.Of(rule, graph)) with
        {
            Kind = isMet ? FindingKind.Met : FindingKind.Unmet,
            Grade = verdict.Grade ?? rule.GravestGrade,
            Message = MessageWriter.Join(statement, tail),
            Statement = statement,
            Figures = measure.Figures,
            Value = value.Number,
            Uncertainty = value.Uncertainty,
            Limit = verdict.Limit,
            Margin = verdict.Margin,
            IsWithinUncertainty = verdict.IsUncertain,
            Dimension = measure.Dimension,
            DisplayUnit = measured.Unit,
        };
    }

    /// <summary>The other limit of a bound with two, for the message.</summary>
    private double? OtherLimit(BoundVerdict verdict) =>
        verdict.Bound is { Least: { } least, Most: { } most } ? (verdict.IsFloor ? most : least).Evaluate(graph).Number : null;

    private Finding Hazard(Rule rule, Evaluated? lack)
    {
        string sentence = MessageWriter.Say(rule, graph, measured: null);
        string message = lack is not { } unknown ? sentence
            : $"Not known yet whether it concerns this machine ({MessageWriter.Lack(unknown)}).";
        if (lack is { Kind: EvaluatedKind.NotApplicable } no)
        {
            return NotApplicable(rule, MessageWriter.Lack(no));
        }

        return Base(rule, Blame.Of(rule, graph)) with
        {
            Kind = FindingKind.Hazard,
            Message = message,
            Figures = rule.Measure?.Figures ?? rule.When?.Figures ?? [],
            MissingKeys = lack?.MissingKeys ?? [],
        };
    }

    /// <summary>A rule that lacks an input of its measure, bound or requirement.</summary>
    private Finding Lacking(Rule rule, Evaluated lack) => lack.Kind == EvaluatedKind.NotApplicable
        ? NotApplicable(rule, MessageWriter.Lack(lack))
        : Open(rule, lack, rule.GravestGrade, "");

    /// <summary>
    /// A rule of which it is not known whether it concerns the machine. It is open, so that the lack is seen, but as a remark: a hold that
    /// may not even apply shall not keep a design from being released.
    /// </summary>
    private Finding Unclear(Rule rule, Evaluated lack) => lack.Kind == EvaluatedKind.NotApplicable
        ? NotApplicable(rule, MessageWriter.Lack(lack))
        : Open(rule, lack, Grade.Remark, "whether the rule applies ");

    private Finding Open(Rule rule, Evaluated lack, Grade grade, string subject)
    {
        Blame blame = lack.MissingKeys.Length > 0 ? Blame.OfMissing(graph.Spec, lack.MissingKeys[0]) : Blame.Of(rule, graph);
        string reason = subject.Length > 0 && lack.Kind != EvaluatedKind.Missing ? $"is unknown: {MessageWriter.Lack(lack)}" : MessageWriter.Lack(lack);
        return Base(rule, blame) with
        {
            Kind = FindingKind.Open,
            Grade = grade,
            Message = $"Open: {subject}{reason}.",
            MissingKeys = lack.MissingKeys,
            Figures = rule.Measure?.Figures ?? [],
        };
    }

    private Finding NotApplicable(Rule rule, string reason) => Base(rule, Blame.OfBystander(rule, graph.Spec)) with
    {
        Kind = FindingKind.NotApplicable,
        Message = $"Not applicable: {reason}.",
    };

    private static Finding Base(Rule rule, Blame blame) => new()
    {
        Rule = rule,
        Kind = FindingKind.Met,
        Grade = rule.Grade,
        Message = "",
        Key = blame.Key,
        Region = blame.Region,
        Related = blame.Related,
    };
}
