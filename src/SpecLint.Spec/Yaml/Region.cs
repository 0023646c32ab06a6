namespace SpecLint.Spec.Yaml;

/// <summary>A stretch of text: lines and columns are 1-based UTF-16 units, the end is exclusive.</summary>
/// <param name="StartLine">First line, from 1.</param>
/// <param name="StartColumn">First column, from 1.</param>
/// <param name="EndLine">Last line, from 1.</param>
/// <param name="EndColumn">Column after the last character, from 1.</param>
public readonly record struct Region(int StartLine, int StartColumn, int EndLine, int EndColumn) : IComparable<Region>
{
    /// <summary>The first character of a text, for faults that have no better place.</summary>
    public static Region Beginning { get; } = new(1, 1, 1, 2);

    /// <inheritdoc />
    public int CompareTo(Region other) =>
        (StartLine, StartColumn, EndLine, EndColumn).CompareTo((other.StartLine, other.StartColumn, other.EndLine, other.EndColumn));

    /// <summary>Orders by position.</summary>
    public static bool operator <(Region left, Region right) => left.CompareTo(right) < 0;

    /// <summary>Orders by position.</summary>
    public static bool operator >(Region left, Region right) => left.CompareTo(right) > 0;

    /// <summary>Orders by position.</summary>
    public static bool operator <=(Region left, Region right) => left.CompareTo(right) <= 0;

    /// <summary>Orders by position.</summary>
    public static bool operator >=(Region left, Region right) => left.CompareTo(right) >= 0;
}
