using System.Collections.Immutable;
using SpecLint.Review.Figures;

namespace SpecLint.Review.Expressions;

/// <summary>Evaluates a number on one machine, if need be with one figure shifted.</summary>
internal delegate Evaluated NumberEvaluation(in ExpressionContext context);

/// <summary>First-order uncertainty of a number that is made of several figures, taken as independent.</summary>
internal static class ExpressionUncertainty
{
    public static Evaluated Measure(FigureGraph graph, ImmutableArray<string> figures, NumberEvaluation evaluate)
    {
        var context = new ExpressionContext(graph);
        Evaluated nominal = evaluate(context);
        if (nominal.Kind != EvaluatedKind.Number)
        {
            return nominal;
        }

        double squares = 0;
        foreach (string name in figures)
        {
            Outcome outcome = graph[name].Outcome;
            if (!outcome.HasValue || outcome.Uncertainty <= 0)
            {
                continue;
            }

            Evaluated up = evaluate(context with { Shifted = name, Shift = outcome.Uncertainty });
            Evaluated down = evaluate(context with { Shifted = name, Shift = -outcome.Uncertainty });
            double share = HalfSpread(up, nominal.Number, down);
            squares += share * share;
        }

        double uncertainty = Math.Sqrt(squares);
        return double.IsFinite(uncertainty)
            ? nominal with { Uncertainty = uncertainty }
            : Evaluated.OutOfDomain("the uncertainty of the expression is not finite for these inputs");
    }

    /// <summary>Half the difference of the two shifted values; where one of them cannot be worked out, the other's distance from the nominal.</summary>
    private static double HalfSpread(Evaluated up, double nominal, Evaluated down) =>
        (up.Kind == EvaluatedKind.Number, down.Kind == EvaluatedKind.Number) switch
        {
            (true, true) => Math.Abs(up.Number - down.Number) / 2,
            (true, false) => Math.Abs(up.Number - nominal),
            (false, true) => Math.Abs(down.Number - nominal),
            _ => 0,
        };
}
