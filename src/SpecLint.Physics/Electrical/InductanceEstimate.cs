using System.Runtime.InteropServices;

namespace SpecLint.Physics.Electrical;

/// <summary>An inductance and the numerical error of its integration.</summary>
/// <param name="Value">Inductance [H].</param>
/// <param name="Error">Estimate of the integration error [H], >= 0; not the uncertainty of the model.</param>
[StructLayout(LayoutKind.Auto)]
public readonly record struct InductanceEstimate(double Value, double Error);
