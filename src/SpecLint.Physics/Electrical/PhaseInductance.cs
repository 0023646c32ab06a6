using System.Runtime.InteropServices;

namespace SpecLint.Physics.Electrical;

/// <summary>Inductances of a phase as its terminals see them, mean over the phases.</summary>
/// <param name="Self">Flux linkage of a phase over its own current [H].</param>
/// <param name="Synchronous">The same with balanced currents in all phases [H]: self minus mutual of three phases.</param>
/// <param name="ZeroSequence">The same with equal currents in all phases [H], as a third harmonic in delta drives.</param>
[StructLayout(LayoutKind.Auto)]
public readonly record struct PhaseInductance(double Self, double Synchronous, double ZeroSequence);
