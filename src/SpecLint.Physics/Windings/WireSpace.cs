using System.Runtime.InteropServices;

namespace SpecLint.Physics.Windings;

/// <summary>Cross-section to be filled with round enamelled wire.</summary>
[StructLayout(LayoutKind.Auto)]
public readonly record struct WireSpace
{
    /// <summary>Leg width [m], > 0.</summary>
    public required double Width { get; init; }

    /// <summary>Winding thickness along the gap [m], > 0.</summary>
    public required double Thickness { get; init; }

    /// <summary>Bare diameter of one strand [m], > 0.</summary>
    public required double BareDiameter { get; init; }

    /// <summary>Diameter over the enamel [m], >= bare diameter.</summary>
    public required double OverallDiameter { get; init; }
}
