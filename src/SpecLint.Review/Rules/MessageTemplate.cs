using System.Collections.Immutable;
using SpecLint.Review.Expressions;

namespace SpecLint.Review.Rules;

/// <summary>What a piece of a message stands for.</summary>
internal enum MessagePartKind
{
    /// <summary>Itself.</summary>
    Literal,

    /// <summary>The measured value.</summary>
    Measure,

    /// <summary>The bound that decides.</summary>
    Bound,

    /// <summary>The margin.</summary>
    Margin,

    /// <summary>An expression.</summary>
    Expression,
}

/// <summary>A piece of a message.</summary>
internal sealed record MessagePart(MessagePartKind Kind, string Literal)
{
    public Expression? Expression { get; init; }

    /// <summary>Unit asked for after the colon; empty when none is.</summary>
    public string Unit { get; init; } = "";
}

/// <summary>The sentence of a rule with its gaps, cut once when the rulebook is loaded.</summary>
internal sealed record MessageTemplate(ImmutableArray<MessagePart> Parts)
{
    /// <summary>A gap's text with its first character and the template's text, cut into its expression and unit; null when it is faulty.</summary>
    internal delegate MessagePart? GapReader(string gap, int start);

    /// <summary>Cuts a text at its braces; a fault is reported through <paramref name="fail"/> and the template is still returned.</summary>
    public static MessageTemplate Cut(string text, GapReader readGap, Action<ExpressionFault> fail)
    {
        var parts = ImmutableArray.CreateBuilder<MessagePart>();
        int at = 0;
        while (at < text.Length)
        {
            int open = text.IndexOf('{', at);
            int stray = text.AsSpan(at, (open < 0 ? text.Length : open) - at).IndexOf('}');
            if (stray >= 0)
            {
                fail(new ExpressionFault("'}' closes nothing", at + stray, 1));
            }

            if (open < 0)
            {
                parts.Add(new MessagePart(MessagePartKind.Literal, text[at..]));
                break;
            }

            if (open > at)
            {
                parts.Add(new MessagePart(MessagePartKind.Literal, text[at..open]));
            }

            int close = text.IndexOf('}', open);
            if (close < 0)
            {
                fail(new ExpressionFault("'{' is not closed", open, text.Length - open));
                break;
            }

            if (readGap(text[(open + 1)..close], open + 1) is { } part)
            {
                parts.Add(part);
            }

            at = close + 1;
        }

        return new MessageTemplate(parts.ToImmutable());
    }
}
