using SpecLint.Review.Figures;
using SpecLint.Reporting.Output;
using SpecLint.Reporting.Quantities;
using SpecLint.Spec.Documents;

namespace SpecLint.Reporting.Derivations;

/// <summary>Values of specs and figures as people read them.</summary>
internal static class ValueText
{
    /// <summary>A value of a spec as written; a list by its number of items.</summary>
    /// <param name="value">The leaf.</param>
    public static string Of(SpecValue value) =>
        value.Kind == SpecValueKind.List ? FormattableString.Invariant($"a list of {value.Count}")
        : value.Text.Length > 0 ? Printable.Line(value.Text)
        : BandText.Value(value.Number, value.UnitText, value.Dimension);

    /// <summary>A figure's value with its band, or why there is none.</summary>
    /// <param name="figure">The figure.</param>
    public static string Of(Figure figure) => figure.Outcome.Kind switch
    {
        OutcomeKind.Value => BandText.Band(
            figure.Outcome.Value, figure.Outcome.Uncertainty, figure.Definition.DisplayUnit, figure.Definition.Dimension),
        _ => Lack(figure.Outcome),
    };

    /// <summary>Why a figure has no value.</summary>
    /// <param name="outcome">An outcome without value.</param>
    public static string Lack(Outcome outcome) => outcome.Kind switch
    {
        OutcomeKind.Missing => "needs " + string.Join(", ", outcome.MissingKeys.Select(Printable.Line)),
        OutcomeKind.NotApplicable => "not applicable: " + Printable.Line(outcome.Reason),
        _ => "outside the method: " + Printable.Line(outcome.Reason),
    };

    /// <summary>A figure's value for a formula, without its band.</summary>
    /// <param name="figure">The figure.</param>
    public static string Bare(Figure figure) => figure.Outcome.HasValue
        ? BandText.Value(figure.Outcome.Value, figure.Definition.DisplayUnit, figure.Definition.Dimension)
        : "(no value)";

    /// <summary>A value of a spec for a formula, without its tolerance.</summary>
    /// <param name="value">The leaf; null when not stated.</param>
    public static string Bare(SpecValue? value) =>
        value is null ? "(not stated)"
        : value is { Kind: SpecValueKind.Number, HasTolerance: true } ? BandText.Value(value.Number, value.UnitText, value.Dimension)
        : Of(value);
}
