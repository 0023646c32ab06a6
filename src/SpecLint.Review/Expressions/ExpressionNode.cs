namespace SpecLint.Review.Expressions;

/// <summary>One node of a parsed expression.</summary>
internal abstract record ExpressionNode;
