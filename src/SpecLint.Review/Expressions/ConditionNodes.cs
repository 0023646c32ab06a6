using System.Collections.Immutable;

namespace SpecLint.Review.Expressions;

internal enum Comparison
{
    Equal,
    NotEqual,
    Less,
    LessOrEqual,
    Greater,
    GreaterOrEqual,
}

internal sealed record NumberComparisonNode(Comparison Comparison, ExpressionNode Left, ExpressionNode Right) : ExpressionNode
{
    public override Evaluated Evaluate(in ExpressionContext context)
    {
        Evaluated left = Left.Evaluate(context);
        Evaluated right = Right.Evaluate(context);
        return left.IsKnown && right.IsKnown
            ? Evaluated.OfTruth(Nearness.Holds(Comparison, left.Number, right.Number))
            : Evaluated.Lack(left, right);
    }
}

internal sealed record TextComparisonNode(ExpressionNode Left, ImmutableArray<ExpressionNode> Options, bool IsNegated) : ExpressionNode
{
    public override Evaluated Evaluate(in ExpressionContext context)
    {
        Evaluated left = Left.Evaluate(context);
        Evaluated lack = left;
        bool found = false;
        foreach (ExpressionNode option in Options)
        {
            Evaluated right = option.Evaluate(context);
            if (!right.IsKnown)
            {
                lack = Evaluated.Lack(lack, right);
            }
            else if (left.IsKnown && string.Equals(left.Text, right.Text, StringComparison.Ordinal))
            {
                found = true;
            }
        }

        return found ? Evaluated.OfTruth(!IsNegated) : lack.IsKnown ? Evaluated.OfTruth(IsNegated) : lack;
    }
}

internal sealed record NotNode(ExpressionNode Operand) : ExpressionNode
{
    public override Evaluated Evaluate(in ExpressionContext context)
    {
        Evaluated operand = Operand.Evaluate(context);
        return operand.IsKnown ? Evaluated.OfTruth(!operand.Truth) : operand;
    }
}

/// <summary>
/// <c>and</c> (<see cref="Decisive"/> false) or <c>or</c> (true) over two or more conditions: one operand of the decisive truth decides,
/// whatever the others lack; else any lack is the whole's lack.
/// </summary>
internal sealed record JunctionNode(bool Decisive, ImmutableArray<ExpressionNode> Operands) : ExpressionNode
{
    public override Evaluated Evaluate(in ExpressionContext context)
    {
        Evaluated lack = Evaluated.OfTruth(!Decisive);
        foreach (ExpressionNode operand in Operands)
        {
            Evaluated value = operand.Evaluate(context);
            if (!value.IsKnown)
            {
                lack = Evaluated.Lack(lack, value);
            }
            else if (value.Truth == Decisive)
            {
                return value;
            }
        }

        return lack;
    }
}

/// <summary>True when the spec states a key, as a leaf or a section; never missing.</summary>
internal sealed record StatedNode(string Key) : ExpressionNode
{
    public override Evaluated Evaluate(in ExpressionContext context) => Evaluated.OfTruth(context.Graph.Spec.States(Key));
}

/// <summary>True when a figure has a value; never missing.</summary>
internal sealed record KnownNode(string Figure) : ExpressionNode
{
    public override Evaluated Evaluate(in ExpressionContext context) => Evaluated.OfTruth(context.Graph[Figure].Outcome.HasValue);
}
