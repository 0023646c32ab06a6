using SpecLint.Spec.Documents;
using SpecLint.Spec.Units;

namespace SpecLint.Review.Expressions;

/// <summary>One node of a parsed and dimension-checked expression.</summary>
internal abstract record ExpressionNode
{
    public abstract Evaluated Evaluate(in ExpressionContext context);
}

internal sealed record NumberNode(double Number) : ExpressionNode
{
    public override Evaluated Evaluate(in ExpressionContext context) => Evaluated.Of(Number);
}

internal sealed record TextNode(string Text) : ExpressionNode
{
    public override Evaluated Evaluate(in ExpressionContext context) => Evaluated.OfText(Text);
}

internal sealed record FigureNode(string Name) : ExpressionNode
{
    public override Evaluated Evaluate(in ExpressionContext context) => context.Figure(Name);
}

internal sealed record KeyNumberNode(string Key, Dimension Dimension) : ExpressionNode
{
    /// <remarks>The same key may take another quantity in another machine: a rated speed is a velocity in a linear one.</remarks>
    public override Evaluated Evaluate(in ExpressionContext context) => context.Graph.Spec.Find(Key) switch
    {
        { Kind: SpecValueKind.Number } value when value.Dimension == Dimension => Evaluated.Of(value.Number),
        { Kind: SpecValueKind.Number } => Evaluated.NotApplicable($"{Key} is another quantity in this machine"),
        _ => Evaluated.Missing([Key]),
    };
}

internal sealed record KeyTextNode(string Key) : ExpressionNode
{
    public override Evaluated Evaluate(in ExpressionContext context) =>
        context.Graph.Spec.Find(Key) is { } value ? Evaluated.OfText(value.Text) : Evaluated.Missing([Key]);
}

internal sealed record KeyFlagNode(string Key) : ExpressionNode
{
    public override Evaluated Evaluate(in ExpressionContext context) =>
        context.Graph.Spec.Find(Key) is { Kind: SpecValueKind.Flag } value ? Evaluated.OfTruth(value.Flag) : Evaluated.Missing([Key]);
}

internal sealed record ListLengthNode(string Key) : ExpressionNode
{
    public override Evaluated Evaluate(in ExpressionContext context) =>
        context.Graph.Spec.Find(Key) is { Kind: SpecValueKind.List } value ? Evaluated.Of(value.Count) : Evaluated.Missing([Key]);
}

internal sealed record NegationNode(ExpressionNode Operand) : ExpressionNode
{
    public override Evaluated Evaluate(in ExpressionContext context)
    {
        Evaluated operand = Operand.Evaluate(context);
        return operand.IsKnown ? Evaluated.Of(-operand.Number) : operand;
    }
}

internal sealed record PowerNode(ExpressionNode Operand, int Exponent) : ExpressionNode
{
    public override Evaluated Evaluate(in ExpressionContext context)
    {
        Evaluated operand = Operand.Evaluate(context);
        if (!operand.IsKnown)
        {
            return operand;
        }

        return operand.Number == 0 && Exponent < 0
            ? Evaluated.OutOfDomain("a division by zero")
            : Evaluated.Of(Math.Pow(operand.Number, Exponent));
    }
}

internal enum Arithmetic
{
    Sum,
    Difference,
    Product,
    Quotient,
}

internal sealed record ArithmeticNode(Arithmetic Operation, ExpressionNode Left, ExpressionNode Right) : ExpressionNode
{
    public override Evaluated Evaluate(in ExpressionContext context)
    {
        Evaluated left = Left.Evaluate(context);
        Evaluated right = Right.Evaluate(context);
        if (!left.IsKnown || !right.IsKnown)
        {
            return Evaluated.Lack(left, right);
        }

        return Operation switch
        {
            Arithmetic.Sum => Evaluated.Of(left.Number + right.Number),
            Arithmetic.Difference => Evaluated.Of(left.Number - right.Number),
            Arithmetic.Product => Evaluated.Of(left.Number * right.Number),
            _ when right.Number == 0 => Evaluated.OutOfDomain("a division by zero"),
            _ => Evaluated.Of(left.Number / right.Number),
        };
    }
}
