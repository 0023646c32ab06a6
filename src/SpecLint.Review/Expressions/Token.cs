using SpecLint.Spec.Units;

namespace SpecLint.Review.Expressions;

internal enum TokenKind
{
    Number,
    Name,
    Text,
    Symbol,
    End,
}

/// <summary>One word of an expression; symbols carry their normalised spelling, numbers their SI value.</summary>
internal readonly record struct Token(TokenKind Kind, int Start, int Length, string Text)
{
    public double Number { get; init; }

    public Dimension Dimension { get; init; }

    public string Unit { get; init; } = "";

    /// <summary>True for a temperature on a scale with its own zero, which cannot be added or multiplied.</summary>
    public bool IsPoint { get; init; }

    public bool Is(string symbol) => Kind == TokenKind.Symbol && string.Equals(Text, symbol, StringComparison.Ordinal);

    public bool IsWord(string word) => Kind == TokenKind.Name && string.Equals(Text, word, StringComparison.Ordinal);
}
