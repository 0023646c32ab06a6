using System.Collections.Frozen;
using System.Collections.Immutable;
using System.Diagnostics.CodeAnalysis;
using SpecLint.Spec.Names;

namespace SpecLint.Spec.Units;

/// <summary>The units that specs and rules are written in, found by any usual spelling.</summary>
public static class UnitTable
{
    private static readonly FrozenDictionary<string, UnitEntry> BySpelling = UnitRows.All
        .SelectMany(row => row.Spellings.Select(spelling => KeyValuePair.Create(spelling, row.Entry)))
        .ToFrozenDictionary(StringComparer.Ordinal);

    /// <summary>Every unit once, grouped by what it measures.</summary>
    public static ImmutableArray<UnitEntry> Units { get; } = [.. UnitRows.All.Select(row => row.Entry)];

    /// <summary>Finds a unit.</summary>
    /// <param name="spelling">A usual spelling, such as <c>A/mm2</c>, <c>A/mm^2</c>, <c>N.m</c>, <c>µH</c>.</param>
    /// <param name="unit">The unit.</param>
    /// <returns>False when the spelling is not known.</returns>
    public static bool TryFind(string spelling, [NotNullWhen(true)] out UnitEntry? unit) => TryFind(spelling.AsSpan(), out unit);

    /// <summary>Finds a unit.</summary>
    /// <param name="spelling">A usual spelling.</param>
    /// <param name="unit">The unit.</param>
    /// <returns>False when the spelling is not known.</returns>
    public static bool TryFind(ReadOnlySpan<char> spelling, [NotNullWhen(true)] out UnitEntry? unit)
    {
        // Longer than any unit: not worth the work.
        if (spelling.Length > 40)
        {
            unit = null;
            return false;
        }

        return BySpelling.TryGetValue(UnitSpelling.Normalise(spelling), out unit);
    }

    /// <summary>The known unit whose spelling differs least, or null when none is near.</summary>
    /// <param name="spelling">An unknown spelling.</param>
    public static UnitEntry? Nearest(string spelling)
    {
        if (spelling.Length > 40)
        {
            return null;
        }

        string wanted = UnitSpelling.Normalise(spelling);
        if (TryFind("°" + wanted, out var degrees))
        {
            return degrees;
        }

        return Units.FirstOrDefault(u => string.Equals(UnitSpelling.Normalise(u.Spelling), wanted, StringComparison.OrdinalIgnoreCase))
            ?? (wanted.Length < 3 ? null : Units.FirstOrDefault(u => EditDistance.Between(UnitSpelling.Normalise(u.Spelling), wanted) == 1 && u.Spelling.Length > 1));
    }
}
