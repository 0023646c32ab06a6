using SpecLint.Reporting.Sheets;

namespace SpecLint.Reporting.Listings;

/// <summary>How a working is told.</summary>
public sealed record WorkingOptions
{
    /// <summary>Levels of figures unfolded below the one asked for; 0 for that one alone.</summary>
    public int Depth { get; init; } = 1;

    /// <summary>Width and colour of the text form.</summary>
    public SheetOptions Layout { get; init; } = new();
}
