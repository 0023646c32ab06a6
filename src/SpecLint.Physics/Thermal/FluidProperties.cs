using System.Runtime.InteropServices;

namespace SpecLint.Physics.Thermal;

/// <summary>Kinematic viscosity and conductivity of the cooling fluid.</summary>
/// <param name="KinematicViscosity">[m²/s], > 0.</param>
/// <param name="ThermalConductivity">[W/(m K)], > 0.</param>
[StructLayout(LayoutKind.Auto)]
public readonly record struct FluidProperties(double KinematicViscosity, double ThermalConductivity)
{
    /// <summary>Air near 40 C and sea level; fit to disc correlations of small machines (values from memory).</summary>
    public static FluidProperties Air => new(1.6e-5, 0.0262);
}
