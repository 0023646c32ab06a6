using System.Collections.Immutable;
using SpecLint.Review.Expressions;
using SpecLint.Review.Figures;
using SpecLint.Review.Rules;

namespace SpecLint.Review.Reviewing;

/// <summary>
/// Judges the measure of a rule against its bounds. A hold needs the value itself past the limit; where only its band reaches the limit it
/// is a query. A measure of coarse figures needs even the favourable end of the band past the limit to be a hold, and is a query before. The
/// bounds of queries and remarks judge the value alone, so that a wide band does not raise noise.
/// </summary>
internal sealed class BoundJudge(FigureGraph graph, Rule rule, Expression measure)
{
    /// <summary>The verdict that decides, of the first bound and the harsher one.</summary>
    public (BoundVerdict Deciding, BoundVerdict? Harsher) Judge()
    {
        BoundVerdict first = Judge(rule.Bound!, rule.Grade);
        if (first.Lack is not null || rule.Beyond is not { } beyond)
        {
            return (first, null);
        }

        BoundVerdict second = Judge(beyond.Bound, beyond.Grade);
        bool secondDecides = second.Lack is null && second.Grade is { } grave
            && (first.Grade is not { } mild || grave > mild || (grave == mild && second.IsPassed));
        return (secondDecides ? second : first, second);
    }

    private BoundVerdict Judge(Bound bound, Grade grade)
    {
        BoundVerdict? nearer = null;
        foreach (var (limit, isFloor) in new[] { (bound.Least, true), (bound.Most, false) })
        {
            if (limit is null)
            {
                continue;
            }

            BoundVerdict side = JudgeSide(bound, limit, isFloor, grade);
            if (side.Lack is not null)
            {
                return side;
            }

            nearer = nearer is null || side.Margin < nearer.Margin ? side : nearer;
        }

        return nearer!;
    }

    private BoundVerdict JudgeSide(Bound bound, Expression limit, bool isFloor, Grade grade)
    {
        ImmutableArray<string> figures = [.. measure.Figures.Union(limit.Figures, StringComparer.Ordinal)];
        Evaluated value = measure.Evaluate(graph);
        Evaluated allowed = limit.Evaluate(graph);
        Evaluated distance = ExpressionUncertainty.Measure(graph, figures, (in ExpressionContext context) => Distance(context, limit, isFloor));
        Evaluated scale = rule.Scale?.Evaluate(graph) ?? Evaluated.Of(Math.Abs(allowed.Number));
        if (!distance.IsKnown || !scale.IsKnown)
        {
            return new BoundVerdict { Bound = bound, Lack = Evaluated.Lack(distance, scale) };
        }

        double divisor = scale.Number > 0 ? scale.Number : Math.Max(Math.Abs(value.Number), Math.Abs(allowed.Number));
        bool isExact = Nearness.AreNear(value.Number, allowed.Number);
        double nominal = isExact ? 0 : distance.Number;
        var (given, isUncertain) = Grading(nominal, distance.Uncertainty, grade, figures);
        return new BoundVerdict
        {
            Bound = bound,
            Limit = allowed.Number,
            IsFloor = isFloor,
            Margin = divisor > 0 ? nominal / divisor : 0,
            Grade = given,
            IsPassed = nominal < 0,
            IsUncertain = isUncertain,
        };
    }

    private Evaluated Distance(in ExpressionContext context, Expression limit, bool isFloor)
    {
        Evaluated value = measure.Root.Evaluate(context);
        Evaluated allowed = limit.Root.Evaluate(context);
        return !value.IsKnown || !allowed.IsKnown ? Evaluated.Lack(value, allowed)
            : Evaluated.Of(isFloor ? value.Number - allowed.Number : allowed.Number - value.Number);
    }

    private (Grade? Grade, bool IsUncertain) Grading(double distance, double band, Grade grade, ImmutableArray<string> figures)
    {
        if (grade != Rules.Grade.Hold)
        {
            return (distance < 0 ? grade : null, false);
        }

        bool isCoarse = figures.Any(f => graph.Catalogue[f].IsCoarse);
        if (isCoarse)
        {
            return distance + band < 0 ? (grade, false) : distance < 0 ? (Rules.Grade.Query, true) : (null, false);
        }

        return distance < 0 ? (grade, false) : distance - band < 0 ? (Rules.Grade.Query, true) : (null, false);
    }
}
