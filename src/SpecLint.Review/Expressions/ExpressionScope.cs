using System.Collections.Immutable;
using SpecLint.Review.Figures;
using SpecLint.Review.Rules;
using SpecLint.Spec.Units;

namespace SpecLint.Review.Expressions;

/// <summary>What an expression can name: figures, spec keys and reference tables.</summary>
public sealed record ExpressionScope
{
    /// <summary>The figures.</summary>
    public required FigureCatalogue Figures { get; init; }

    /// <summary>The spec key of a dotted name, or null when the format has no such key.</summary>
    public required Func<string, NamedKey?> FindKey { get; init; }

    /// <summary>All spec keys, for suggestions.</summary>
    public required IReadOnlyCollection<string> KeyNames { get; init; }

    /// <summary>The reference tables.</summary>
    public ReferenceTables Tables { get; init; } = ReferenceTables.Empty;
}

/// <summary>How a spec key is used in an expression.</summary>
public enum NamedKeyKind
{
    /// <summary>As a number with a dimension.</summary>
    Number,

    /// <summary>As a word to compare.</summary>
    Text,

    /// <summary>As a condition of its own.</summary>
    Flag,

    /// <summary>As a list, whose items can be counted.</summary>
    List,

    /// <summary>As a section: it can only be stated.</summary>
    Section,
}

/// <summary>A spec key that an expression may name.</summary>
/// <param name="Key">Dotted key.</param>
/// <param name="Kind">How it is used.</param>
/// <param name="Dimension">Dimension of a number.</param>
/// <param name="Words">The words a text may take; empty when it is free.</param>
public sealed record NamedKey(string Key, NamedKeyKind Kind, Dimension Dimension, ImmutableArray<string> Words);
