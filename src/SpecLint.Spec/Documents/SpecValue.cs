using SpecLint.Spec.Units;
using SpecLint.Spec.Yaml;

namespace SpecLint.Spec.Documents;

/// <summary>How a value of a spec was read.</summary>
public enum SpecValueKind
{
    /// <summary>A physical quantity or a bare number, in coherent SI.</summary>
    Number,

    /// <summary>A word, a title, a grade.</summary>
    Text,

    /// <summary>True or false.</summary>
    Flag,

    /// <summary>A sequence; its items are values of their own under <c>key[0]</c>, <c>key[1]</c>, ….</summary>
    List,
}

/// <summary>One leaf of a spec: its dotted key, its value in SI, its tolerance and its places in the text.</summary>
public sealed record SpecValue
{
    /// <summary>Dotted key, such as <c>winding.coil.leg-width</c>.</summary>
    public required string Key { get; init; }

    /// <summary>How the value was read.</summary>
    public required SpecValueKind Kind { get; init; }

    /// <summary>The text as written.</summary>
    public required string Text { get; init; }

    /// <summary>The value in coherent SI (K for temperatures, rad for angles, rad/s for speeds); 0 unless <see cref="Kind"/> is a number.</summary>
    public double Number { get; init; }

    /// <summary>Largest downward deviation allowed by the stated tolerance, in SI, ≥ 0; 0 when none is stated.</summary>
    public double ToleranceBelow { get; init; }

    /// <summary>Largest upward deviation allowed by the stated tolerance, in SI, ≥ 0; 0 when none is stated.</summary>
    public double ToleranceAbove { get; init; }

    /// <summary>True when the spec states a tolerance.</summary>
    public bool HasTolerance { get; init; }

    /// <summary>Dimension of the value.</summary>
    public Dimension Dimension { get; init; }

    /// <summary>The unit as written (normalised spelling), empty for a bare number.</summary>
    public string UnitText { get; init; } = "";

    /// <summary>The boolean, when <see cref="Kind"/> is a flag.</summary>
    public bool Flag { get; init; }

    /// <summary>Number of items, when <see cref="Kind"/> is a list.</summary>
    public int Count { get; init; }

    /// <summary>Where the key stands; for a list item, where the item stands.</summary>
    public required Region KeyRegion { get; init; }

    /// <summary>Where the value stands.</summary>
    public required Region ValueRegion { get; init; }

    /// <summary>Where the alias stands when the value was reached through one, also through a merge key; else null. Such a value is not edited in place.</summary>
    public Region? AliasSite { get; init; }
}
