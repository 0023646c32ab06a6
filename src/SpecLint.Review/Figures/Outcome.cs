using System.Collections.Immutable;

namespace SpecLint.Review.Figures;

/// <summary>What became of a figure.</summary>
public enum OutcomeKind
{
    /// <summary>It has a value.</summary>
    Value,

    /// <summary>The spec does not state what it needs.</summary>
    Missing,

    /// <summary>It does not concern this machine.</summary>
    NotApplicable,

    /// <summary>Its method does not hold for these inputs.</summary>
    OutOfDomain,
}

/// <summary>A figure's value with its uncertainty, or the reason why there is none; never a default in silence.</summary>
public readonly record struct Outcome
{
    private readonly ImmutableArray<string> _missing;

    private Outcome(OutcomeKind kind, double value, double uncertainty, bool isAssumed, ImmutableArray<string> missing, string reason)
    {
        Kind = kind;
        Value = value;
        Uncertainty = uncertainty;
        IsAssumed = isAssumed;
        _missing = missing;
        Reason = reason;
    }

    /// <summary>Which of the four it is.</summary>
    public OutcomeKind Kind { get; }

    /// <summary>The value in coherent SI; 0 unless <see cref="HasValue"/>.</summary>
    public double Value { get; }

    /// <summary>Half width of the band the true value is expected in, in the value's unit, ≥ 0.</summary>
    public double Uncertainty { get; }

    /// <summary>True for a default that practice allows, taken because the spec is silent.</summary>
    public bool IsAssumed { get; }

    /// <summary>The spec keys that would close a missing figure, in order of discovery.</summary>
    public ImmutableArray<string> MissingKeys => _missing.IsDefault ? [] : _missing;

    /// <summary>Why it does not apply or lies outside the method's domain; where an assumption comes from; else empty.</summary>
    public string Reason { get; }

    /// <summary>True when there is a value.</summary>
    public bool HasValue => Kind == OutcomeKind.Value;

    /// <summary>A value.</summary>
    /// <param name="value">In coherent SI, finite.</param>
    /// <param name="uncertainty">Half width of its band, same unit, ≥ 0.</param>
    public static Outcome Of(double value, double uncertainty) =>
        double.IsFinite(value) && double.IsFinite(uncertainty)
            ? new(OutcomeKind.Value, value, Math.Abs(uncertainty), isAssumed: false, [], "")
            : OutOfDomain("the calculation gives no finite number for these inputs");

    /// <summary>A default that practice allows.</summary>
    /// <param name="value">In coherent SI.</param>
    /// <param name="reason">Where the default comes from.</param>
    public static Outcome Assumed(double value, string reason) => new(OutcomeKind.Value, value, 0, isAssumed: true, [], reason);

    /// <summary>Lacks spec values.</summary>
    /// <param name="keys">The keys to state.</param>
    public static Outcome Missing(ImmutableArray<string> keys) => new(OutcomeKind.Missing, 0, 0, isAssumed: false, keys, "");

    /// <summary>Does not concern the machine.</summary>
    /// <param name="reason">Why, in a few words.</param>
    public static Outcome NotApplicable(string reason) => new(OutcomeKind.NotApplicable, 0, 0, isAssumed: false, [], reason);

    /// <summary>Lies outside the method's domain.</summary>
    /// <param name="reason">Why, in a few words.</param>
    public static Outcome OutOfDomain(string reason) => new(OutcomeKind.OutOfDomain, 0, 0, isAssumed: false, [], reason);
}
