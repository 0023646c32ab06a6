namespace SpecLint.Reporting.Sheets;

/// <summary>How a text sheet or listing is laid out.</summary>
public sealed record SheetOptions
{
    /// <summary>Columns to stay within, at least 40.</summary>
    public int Width { get; init; } = 80;

    /// <summary>Emphasise with terminal colours; they never carry meaning of their own.</summary>
    public bool UsesColour { get; init; }

    /// <summary>Also list the rules that are met, open and not applicable.</summary>
    public bool IncludesAll { get; init; }
}
