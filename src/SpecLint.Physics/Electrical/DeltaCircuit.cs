using System.Runtime.InteropServices;

namespace SpecLint.Physics.Electrical;

/// <summary>Resistance, zero-sequence inductance and speed of a delta-connected machine.</summary>
[StructLayout(LayoutKind.Auto)]
public readonly record struct DeltaCircuit
{
    /// <summary>Phase resistance [ohm], > 0.</summary>
    public required double PhaseResistance { get; init; }

    /// <summary>Inductance of a phase with equal currents in all phases [H], >= 0.</summary>
    public required double ZeroSequenceInductance { get; init; }

    /// <summary>Electrical angular frequency of the fundamental [rad/s], >= 0.</summary>
    public required double ElectricalSpeed { get; init; }

    /// <summary>Phases in the ring, >= 3.</summary>
    public required int Phases { get; init; }
}
