using System.Runtime.InteropServices;

namespace SpecLint.Physics.Electrical;

/// <summary>Strands in hand that run side by side through a coil without changing places.</summary>
[StructLayout(LayoutKind.Auto)]
public readonly record struct StrandBundle
{
    /// <summary>Strands side by side, >= 1.</summary>
    public required int Strands { get; init; }

    /// <summary>Distance between neighbouring strand centres, usually the overall diameter [m], > 0.</summary>
    public required double StrandPitch { get; init; }

    /// <summary>Resistance of one strand through the whole coil [ohm], > 0.</summary>
    public required double StrandResistance { get; init; }

    /// <summary>Turns of the coil, > 0.</summary>
    public required double Turns { get; init; }

    /// <summary>Length of one leg in the field [m], >= 0.</summary>
    public required double LegLength { get; init; }
}
