using System.Runtime.InteropServices;

namespace SpecLint.Physics.Electrical;

/// <summary>Source and load of a bridge.</summary>
[StructLayout(LayoutKind.Auto)]
public readonly record struct BridgeSource
{
    /// <summary>Line EMF, rms [V], >= 0.</summary>
    public required double LineEmfRms { get; init; }

    /// <summary>Resistance of one phase, star equivalent, hot [ohm], >= 0.</summary>
    public required double PhaseResistance { get; init; }

    /// <summary>Synchronous inductance of one phase, star equivalent [H], >= 0.</summary>
    public required double PhaseInductance { get; init; }

    /// <summary>Electrical angular frequency [rad/s], >= 0.</summary>
    public required double ElectricalSpeed { get; init; }

    /// <summary>Drop of one diode [V], >= 0.</summary>
    public required double DiodeDrop { get; init; }
}
