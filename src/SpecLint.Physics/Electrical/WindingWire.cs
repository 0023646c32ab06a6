using System.Runtime.InteropServices;

namespace SpecLint.Physics.Electrical;

/// <summary>Wire and connection of a winding, for resistance and mass.</summary>
[StructLayout(LayoutKind.Auto)]
public readonly record struct WindingWire
{
    /// <summary>Metal.</summary>
    public required ConductorMaterial Material { get; init; }

    /// <summary>Bare diameter of one strand [m], > 0.</summary>
    public required double StrandDiameter { get; init; }

    /// <summary>Strands in hand, >= 1.</summary>
    public required int Strands { get; init; }

    /// <summary>Mean turn length [m], > 0.</summary>
    public required double MeanTurnLength { get; init; }

    /// <summary>Turns of one coil, > 0.</summary>
    public required double Turns { get; init; }

    /// <summary>Copper section of one turn, all strands [m²].</summary>
    public double TurnSection => Strands * WireGauge.Section(StrandDiameter);
}
