using System.Runtime.InteropServices;

namespace SpecLint.Physics.Magnetics;

/// <summary>Place of the winding along the gap.</summary>
[StructLayout(LayoutKind.Auto)]
public readonly record struct CoilLayer
{
    /// <summary>Height of the winding's middle above the magnets' face [m].</summary>
    public required double MidHeight { get; init; }

    /// <summary>Thickness of the winding along the gap [m], > 0.</summary>
    public required double Thickness { get; init; }

    /// <summary>Height of the winding's near face above the magnets [m].</summary>
    public double LowestHeight => MidHeight - (0.5 * Thickness);

    /// <summary>Height of the winding's far face above the magnets [m].</summary>
    public double HighestHeight => MidHeight + (0.5 * Thickness);
}
