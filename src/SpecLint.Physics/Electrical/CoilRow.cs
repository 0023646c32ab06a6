using System.Runtime.InteropServices;

namespace SpecLint.Physics.Electrical;

/// <summary>Coils along a straight row.</summary>
/// <param name="Coils">Number of coils, >= 1.</param>
/// <param name="Pitch">Distance between neighbouring coil axes [m], > 0.</param>
[StructLayout(LayoutKind.Auto)]
public readonly record struct CoilRow(int Coils, double Pitch);
