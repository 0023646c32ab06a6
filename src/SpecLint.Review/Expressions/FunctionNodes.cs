using System.Collections.Immutable;
using SpecLint.Review.Rules;

namespace SpecLint.Review.Expressions;

internal enum NumberFunction
{
    Least,
    Greatest,
    Magnitude,
    SquareRoot,
    GreatestCommonDivisor,
    LeastCommonMultiple,
}

internal sealed record FunctionNode(NumberFunction Function, ImmutableArray<ExpressionNode> Arguments) : ExpressionNode
{
    /// <summary>Largest whole number that the divisor functions take.</summary>
    private const double LargestWhole = 1e9;

    public override Evaluated Evaluate(in ExpressionContext context)
    {
        Evaluated result = Arguments[0].Evaluate(context);
        foreach (ExpressionNode argument in Arguments.AsSpan()[1..])
        {
            Evaluated next = argument.Evaluate(context);
            result = result.IsKnown && next.IsKnown ? Combine(result.Number, next.Number) : Evaluated.Lack(result, next);
        }

        if (!result.IsKnown)
        {
            return result;
        }

        return Function switch
        {
            NumberFunction.Magnitude => Evaluated.Of(Math.Abs(result.Number)),
            NumberFunction.SquareRoot when result.Number < 0 => Evaluated.OutOfDomain("the square root of a negative number"),
            NumberFunction.SquareRoot => Evaluated.Of(Math.Sqrt(result.Number)),
            _ => result,
        };
    }

    private Evaluated Combine(double a, double b)
    {
        switch (Function)
        {
            case NumberFunction.Least:
                return Evaluated.Of(Math.Min(a, b));
            case NumberFunction.Greatest:
                return Evaluated.Of(Math.Max(a, b));
            default:
                if (!IsWhole(a) || !IsWhole(b))
                {
                    return Evaluated.OutOfDomain("a common divisor or multiple needs positive whole numbers");
                }

                long divisor = Divisor((long)Math.Round(a), (long)Math.Round(b));
                return Evaluated.Of(Function == NumberFunction.GreatestCommonDivisor ? divisor : Math.Round(a) / divisor * Math.Round(b));
        }
    }

    private static bool IsWhole(double number) =>
        number is >= 1 and <= LargestWhole && Nearness.AreNear(number, Math.Round(number));

    private static long Divisor(long a, long b)
    {
        while (b != 0)
        {
            (a, b) = (b, a % b);
        }

        return a;
    }
}

/// <summary>The first of two numbers where a condition holds, else the second.</summary>
internal sealed record ChoiceNode(ExpressionNode Condition, ExpressionNode Then, ExpressionNode Else) : ExpressionNode
{
    public override Evaluated Evaluate(in ExpressionContext context)
    {
        Evaluated condition = Condition.Evaluate(context);
        return !condition.IsKnown ? condition : condition.Truth ? Then.Evaluate(context) : Else.Evaluate(context);
    }
}

/// <summary>Stands for a row's cell while the conditions on a table are checked; it is never evaluated.</summary>
internal sealed record ColumnNode : ExpressionNode
{
    public override Evaluated Evaluate(in ExpressionContext context) => Evaluated.OutOfDomain("a column has no value outside its table");
}

/// <summary>One condition on a column of a reference table.</summary>
internal sealed record TableSelector(string Column, Comparison Comparison, ExpressionNode Wanted);

/// <summary>The cell of a column in the first row of a table that fits every selector.</summary>
internal sealed record TableNode(ReferenceTable Table, string Column, ImmutableArray<TableSelector> Selectors) : ExpressionNode
{
    public override Evaluated Evaluate(in ExpressionContext context)
    {
        var wanted = new Evaluated[Selectors.Length];
        Evaluated lack = Evaluated.OfTruth(truth: true);
        for (int i = 0; i < wanted.Length; i++)
        {
            wanted[i] = Selectors[i].Wanted.Evaluate(context);
            lack = wanted[i].IsKnown ? lack : Evaluated.Lack(lack, wanted[i]);
        }

        if (!lack.IsKnown)
        {
            return lack;
        }

        foreach (ReferenceRow row in Table.Rows)
        {
            if (Fits(row, wanted))
            {
                return row.Find(Column) is not { } cell ? Evaluated.OutOfDomain($"table {Table.Name} gives no {Column} for this machine")
                    : cell.Number is { } number ? Evaluated.Of(number)
                    : Evaluated.OfText(cell.Text);
            }
        }

        return Evaluated.OutOfDomain($"table {Table.Name} has no row for this machine");
    }

    private bool Fits(ReferenceRow row, Evaluated[] wanted)
    {
        for (int i = 0; i < wanted.Length; i++)
        {
            TableSelector selector = Selectors[i];
            bool fits = row.Find(selector.Column) is { } cell && (cell.Number is { } number
                ? Nearness.Holds(selector.Comparison, number, wanted[i].Number)
                : string.Equals(cell.Text, wanted[i].Text, StringComparison.Ordinal) == (selector.Comparison == Comparison.Equal));
            if (!fits)
            {
                return false;
            }
        }

        return true;
    }
}
