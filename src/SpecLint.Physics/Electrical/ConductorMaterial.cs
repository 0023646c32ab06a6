using System.Runtime.InteropServices;

namespace SpecLint.Physics.Electrical;

/// <summary>Electrical and thermal data of a winding wire's metal.</summary>
[StructLayout(LayoutKind.Auto)]
public readonly record struct ConductorMaterial
{
    /// <summary>Reference temperature of resistivity and coefficient [K]: 20 C.</summary>
    public const double ReferenceTemperature = 293.15;

    /// <summary>Resistivity at 20 C [ohm m], > 0.</summary>
    public required double Resistivity { get; init; }

    /// <summary>Temperature coefficient of resistance at 20 C [1/K].</summary>
    public required double TemperatureCoefficient { get; init; }

    /// <summary>Density [kg/m³], > 0.</summary>
    public required double Density { get; init; }

    /// <summary>Specific heat [J/(kg K)], > 0.</summary>
    public required double SpecificHeat { get; init; }

    /// <summary>Thermal conductivity [W/(m K)], > 0.</summary>
    public required double ThermalConductivity { get; init; }

    /// <summary>Annealed copper: IEC 60028 (1.7241e-8 ohm m, 0.00393 1/K, 8890 kg/m³); specific heat and conductivity from memory (handbook values near room temperature).</summary>
    public static ConductorMaterial Copper => new()
    {
        Resistivity = 1.7241e-8,
        TemperatureCoefficient = 0.00393,
        Density = 8890.0,
        SpecificHeat = 385.0,
        ThermalConductivity = 390.0,
    };

    /// <summary>Conductor aluminium: IEC 60889 (2.8264e-8 ohm m at most, 0.00403 1/K, 2703 kg/m³; from memory); specific heat and conductivity from memory.</summary>
    public static ConductorMaterial Aluminium => new()
    {
        Resistivity = 2.8264e-8,
        TemperatureCoefficient = 0.00403,
        Density = 2703.0,
        SpecificHeat = 900.0,
        ThermalConductivity = 220.0,
    };

    /// <summary>Resistivity at a temperature.</summary>
    /// <param name="temperature">[K].</param>
    /// <returns>[ohm m], linear law; good to 1 % from -50 to 200 C.</returns>
    public double ResistivityAt(double temperature) =>
        Resistivity * (1.0 + TemperatureCoefficient * (temperature - ReferenceTemperature));
}
