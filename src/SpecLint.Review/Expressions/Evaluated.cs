using System.Collections.Immutable;
using SpecLint.Review.Figures;

namespace SpecLint.Review.Expressions;

/// <summary>What became of an expression.</summary>
public enum EvaluatedKind
{
    /// <summary>It is a number.</summary>
    Number,

    /// <summary>It is true or false.</summary>
    Condition,

    /// <summary>It is a text.</summary>
    Text,

    /// <summary>The spec does not state what it needs.</summary>
    Missing,

    /// <summary>It names a figure that does not concern this machine.</summary>
    NotApplicable,

    /// <summary>It cannot be worked out for these inputs.</summary>
    OutOfDomain,
}

/// <summary>The value of an expression on one machine, or the reason why there is none.</summary>
public readonly record struct Evaluated
{
    private readonly string? _text;
    private readonly ImmutableArray<string> _missing;

    private Evaluated(EvaluatedKind kind, double number, bool truth, string? text, ImmutableArray<string> missing)
    {
        Kind = kind;
        Number = number;
        Truth = truth;
        _text = text;
        _missing = missing;
    }

    /// <summary>Which of the six it is.</summary>
    public EvaluatedKind Kind { get; }

    /// <summary>The number in coherent SI; 0 unless <see cref="Kind"/> is a number.</summary>
    public double Number { get; }

    /// <summary>Half width of the number's band, same unit, ≥ 0; only filled by <see cref="Expression.Measure"/>.</summary>
    public double Uncertainty { get; init; }

    /// <summary>The truth of a condition; false unless <see cref="Kind"/> is a condition.</summary>
    public bool Truth { get; }

    /// <summary>The text, or why it does not apply or cannot be worked out; else empty.</summary>
    public string Text => _text ?? "";

    /// <summary>The spec keys that would close a missing value, in order of discovery.</summary>
    public ImmutableArray<string> MissingKeys => _missing.IsDefault ? [] : _missing;

    /// <summary>True for a number, a condition or a text.</summary>
    public bool IsKnown => Kind is EvaluatedKind.Number or EvaluatedKind.Condition or EvaluatedKind.Text;

    /// <summary>A number; out of domain when it is not finite.</summary>
    /// <param name="number">In coherent SI.</param>
    public static Evaluated Of(double number) => double.IsFinite(number)
        ? new(EvaluatedKind.Number, number, truth: false, null, [])
        : OutOfDomain("the expression gives no finite number for these inputs");

    /// <summary>A condition.</summary>
    /// <param name="truth">Whether it holds.</param>
    public static Evaluated OfTruth(bool truth) => new(EvaluatedKind.Condition, 0, truth, null, []);

    /// <summary>A text.</summary>
    /// <param name="text">The text.</param>
    public static Evaluated OfText(string text) => new(EvaluatedKind.Text, 0, truth: false, text, []);

    /// <summary>Lacks spec values.</summary>
    /// <param name="keys">The keys to state.</param>
    public static Evaluated Missing(ImmutableArray<string> keys) => new(EvaluatedKind.Missing, 0, truth: false, null, keys);

    /// <summary>Does not concern the machine.</summary>
    /// <param name="reason">Why.</param>
    public static Evaluated NotApplicable(string reason) => new(EvaluatedKind.NotApplicable, 0, truth: false, reason, []);

    /// <summary>Cannot be worked out.</summary>
    /// <param name="reason">Why.</param>
    public static Evaluated OutOfDomain(string reason) => new(EvaluatedKind.OutOfDomain, 0, truth: false, reason, []);

    /// <summary>What a figure contributes to an expression.</summary>
    /// <param name="outcome">The figure's outcome.</param>
    public static Evaluated From(Outcome outcome) => outcome.Kind switch
    {
        OutcomeKind.Value => Of(outcome.Value),
        OutcomeKind.Missing => Missing(outcome.MissingKeys),
        OutcomeKind.NotApplicable => NotApplicable(outcome.Reason),
        _ => OutOfDomain(outcome.Reason),
    };

    /// <summary>
    /// The lack of two values of which at least one is unknown: what does not apply outweighs what is missing, and that outweighs
    /// what cannot be worked out; the keys of two missing values are joined.
    /// </summary>
    /// <param name="left">First value.</param>
    /// <param name="right">Second value.</param>
    internal static Evaluated Lack(Evaluated left, Evaluated right)
    {
        if (left.Kind == EvaluatedKind.Missing && right.Kind == EvaluatedKind.Missing)
        {
            return Missing([.. left.MissingKeys.Union(right.MissingKeys, StringComparer.Ordinal)]);
        }

        return Weight(left) >= Weight(right) ? left : right;
    }

    private static int Weight(Evaluated value) => value.Kind switch
    {
        EvaluatedKind.NotApplicable => 3,
        EvaluatedKind.Missing => 2,
        EvaluatedKind.OutOfDomain => 1,
        _ => 0,
    };
}
