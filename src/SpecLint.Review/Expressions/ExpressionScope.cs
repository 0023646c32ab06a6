using System.Collections.Immutable;
using SpecLint.Review.Figures;
using SpecLint.Review.Rules;
using SpecLint.Spec.Schema;
using SpecLint.Spec.Units;

namespace SpecLint.Review.Expressions;

/// <summary>What an expression can name besides the keys of the spec format: figures and reference tables.</summary>
/// <param name="Figures">The figures.</param>
/// <param name="Tables">The reference tables.</param>
public sealed record ExpressionScope(FigureCatalogue Figures, ReferenceTables Tables)
{
    /// <summary>All keys of the spec format, for suggestions.</summary>
    internal static IEnumerable<string> KeyNames => KeyCatalogue.Entries.Select(e => e.Key);

    /// <summary>How a key of the spec format is used in an expression; null when there is no such key.</summary>
    internal static NamedKey? FindKey(string key)
    {
        if (!KeyCatalogue.TryFind(key, out KeyEntry? entry))
        {
            return null;
        }

        // A wire given as one text is kept under its size, so the section itself never has a value.
        bool isShortForm = entry.IsSection && entry.Quantity is "wire";
        NamedKeyKind kind = isShortForm ? NamedKeyKind.Section
            : entry.Dimension is not null ? NamedKeyKind.Number
            : entry.IsList ? NamedKeyKind.List
            : entry.Quantity switch
            {
                "flag" => NamedKeyKind.Flag,
                "text" => NamedKeyKind.Text,
                _ => NamedKeyKind.Section,
            };
        bool isAlsoSection = entry.IsSection && kind == NamedKeyKind.Text;
        return new NamedKey(key, kind, entry.Dimension ?? Dimension.None, isAlsoSection ? [] : entry.Words) { DisplayUnit = entry.DisplayUnit };
    }
}

/// <summary>How a spec key is used in an expression.</summary>
internal enum NamedKeyKind
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
/// <param name="Key">Dotted key as written.</param>
/// <param name="Kind">How it is used.</param>
/// <param name="Dimension">Dimension of a number.</param>
/// <param name="Words">The words a text may take; empty when it is free.</param>
internal sealed record NamedKey(string Key, NamedKeyKind Kind, Dimension Dimension, ImmutableArray<string> Words)
{
    /// <summary>Unit for the screen; empty for a plain number.</summary>
    public string DisplayUnit { get; init; } = "";
}
