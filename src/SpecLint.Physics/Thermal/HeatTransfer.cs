using System.Runtime.InteropServices;

namespace SpecLint.Physics.Thermal;

/// <summary>Heat-transfer coefficient and the standing of its correlation.</summary>
/// <param name="Coefficient">[W/(m² K)], > 0.</param>
/// <param name="Nusselt">Nusselt number on the radius, > 0.</param>
/// <param name="Range">Where the case lies relative to the published range.</param>
/// <param name="Uncertainty">Relative, against experiment: 0.3 stands for plus or minus 30 %.</param>
[StructLayout(LayoutKind.Auto)]
public readonly record struct HeatTransfer(double Coefficient, double Nusselt, CorrelationRange Range, double Uncertainty);
