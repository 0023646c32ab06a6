namespace SpecLint.Review.Expressions;

/// <summary>Something wrong with an expression.</summary>
/// <param name="Message">What was found and what was expected, in one sentence.</param>
/// <param name="Start">First character concerned, from 0, in the expression's text.</param>
/// <param name="Length">Number of characters concerned, ≥ 0.</param>
public sealed record ExpressionFault(string Message, int Start, int Length);
