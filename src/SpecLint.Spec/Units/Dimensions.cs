namespace SpecLint.Spec.Units;

/// <summary>The dimensions of the quantities that a spec or a rule names.</summary>
public static class Dimensions
{
    /// <summary>Length.</summary>
    public static Dimension Length { get; } = new(1, 0, 0, 0, 0);

    /// <summary>Area.</summary>
    public static Dimension Area { get; } = new(2, 0, 0, 0, 0);

    /// <summary>Volume.</summary>
    public static Dimension Volume { get; } = new(3, 0, 0, 0, 0);

    /// <summary>Mass.</summary>
    public static Dimension Mass { get; } = new(0, 1, 0, 0, 0);

    /// <summary>Time.</summary>
    public static Dimension Time { get; } = new(0, 0, 1, 0, 0);

    /// <summary>Temperature.</summary>
    public static Dimension Temperature { get; } = new(0, 0, 0, 0, 1);

    /// <summary>Voltage.</summary>
    public static Dimension Voltage { get; } = new(2, 1, -3, -1, 0);

    /// <summary>Current.</summary>
    public static Dimension Current { get; } = new(0, 0, 0, 1, 0);

    /// <summary>Resistance.</summary>
    public static Dimension Resistance { get; } = new(2, 1, -3, -2, 0);

    /// <summary>Magnetic flux density.</summary>
    public static Dimension FluxDensity { get; } = new(0, 1, -2, -1, 0);

    /// <summary>Magnetic flux; also volt-seconds per radian and torque per current.</summary>
    public static Dimension Flux { get; } = new(2, 1, -2, -1, 0);

    /// <summary>Magnetic field strength and linear current density.</summary>
    public static Dimension FieldStrength { get; } = new(-1, 0, 0, 1, 0);

    /// <summary>Power.</summary>
    public static Dimension Power { get; } = new(2, 1, -3, 0, 0);

    /// <summary>Energy and torque.</summary>
    public static Dimension Energy { get; } = new(2, 1, -2, 0, 0);

    /// <summary>Force.</summary>
    public static Dimension Force { get; } = new(1, 1, -2, 0, 0);

    /// <summary>Pressure, stress and energy density.</summary>
    public static Dimension Pressure { get; } = new(-1, 1, -2, 0, 0);

    /// <summary>Turns, radians or cycles a second.</summary>
    public static Dimension Rate { get; } = new(0, 0, -1, 0, 0);

    /// <summary>Velocity.</summary>
    public static Dimension Velocity { get; } = new(1, 0, -1, 0, 0);

    /// <summary>Density.</summary>
    public static Dimension Density { get; } = new(-3, 1, 0, 0, 0);

    /// <summary>Charge.</summary>
    public static Dimension Charge { get; } = new(0, 0, 1, 1, 0);

    /// <summary>Inductance.</summary>
    public static Dimension Inductance { get; } = new(2, 1, -2, -2, 0);

    /// <summary>Capacitance.</summary>
    public static Dimension Capacitance { get; } = new(-2, -1, 4, 2, 0);

    /// <summary>Thermal conductivity.</summary>
    public static Dimension ThermalConductivity { get; } = new(1, 1, -3, 0, -1);

    /// <summary>A share per kelvin.</summary>
    public static Dimension PerKelvin { get; } = new(0, 0, 0, 0, -1);

    /// <summary>Current density.</summary>
    public static Dimension CurrentDensity { get; } = new(-2, 0, 0, 1, 0);

    /// <summary>Volume flow.</summary>
    public static Dimension VolumeFlow { get; } = new(3, 0, -1, 0, 0);

    /// <summary>Power per mass.</summary>
    public static Dimension SpecificPower { get; } = new(2, 0, -3, 0, 0);

    /// <summary>Heat flux per kelvin.</summary>
    public static Dimension HeatTransfer { get; } = new(0, 1, -3, 0, -1);

    /// <summary>Power per area.</summary>
    public static Dimension HeatFlux { get; } = new(0, 1, -3, 0, 0);

    /// <summary>Resistivity.</summary>
    public static Dimension Resistivity { get; } = new(3, 1, -3, -2, 0);

    /// <summary>Conductivity.</summary>
    public static Dimension Conductivity { get; } = new(-3, -1, 3, 2, 0);

    /// <summary>Volt-seconds per metre, newtons per ampere.</summary>
    public static Dimension ThrustConstant { get; } = new(1, 1, -2, -1, 0);

    /// <summary>Thermal resistance.</summary>
    public static Dimension ThermalResistance { get; } = new(-2, -1, 3, 0, 1);

    /// <summary>Inertia.</summary>
    public static Dimension Inertia { get; } = new(2, 1, 0, 0, 0);

    /// <summary>Stiffness.</summary>
    public static Dimension Stiffness { get; } = new(0, 1, -2, 0, 0);
}
