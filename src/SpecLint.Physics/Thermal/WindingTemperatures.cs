using System.Runtime.InteropServices;

namespace SpecLint.Physics.Thermal;

/// <summary>Steady temperatures of a winding.</summary>
/// <param name="Mean">Mean of the winding, as resistance shows it [K].</param>
/// <param name="HotSpot">Middle of the thickness [K].</param>
/// <param name="Surface">Cover surface [K].</param>
/// <param name="Loss">Loss at the mean temperature [W].</param>
[StructLayout(LayoutKind.Auto)]
public readonly record struct WindingTemperatures(double Mean, double HotSpot, double Surface, double Loss);
