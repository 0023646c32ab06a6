using System.Collections.Frozen;
using System.Collections.Immutable;
using System.Diagnostics.CodeAnalysis;

namespace SpecLint.Spec.Units;

/// <summary>What a key takes: a length, a temperature, a bare number, a word; with the units that suit it.</summary>
public sealed class QuantityKind
{
    private QuantityKind(string name, string noun, Dimension dimension, string unit, string example, string units)
    {
        Name = name;
        Noun = noun;
        Dimension = dimension;
        DisplayUnit = unit;
        Example = example;
        AcceptedUnits = units;
    }

    /// <summary>Every kind of physical quantity that the schema's <c>x-quantity</c> names; words and flags are not among them.</summary>
    public static ImmutableArray<QuantityKind> All { get; } =
    [
        new("length", "a length", Dimensions.Length, "mm", "1.5 mm", "mm, cm, m, µm, in"),
        new("area", "an area", Dimensions.Area, "mm²", "16 mm²", "mm², cm², m²"),
        new("mass", "a mass", Dimensions.Mass, "kg", "2.5 kg", "kg, g"),
        new("time", "a time", Dimensions.Time, "s", "30 s", "s, min, h"),
        new("temperature", "a temperature", Dimensions.Temperature, "°C", "40 °C", "°C, K"),
        new("temperature-difference", "a temperature difference", Dimensions.Temperature, "K", "10 K", "K, °C"),
        new("flux-density", "a flux density", Dimensions.FluxDensity, "T", "1.30 T", "T, mT, G, kG"),
        new("flux", "a magnetic flux", Dimensions.Flux, "mWb", "1.2 mWb", "Wb, mWb"),
        new("field-strength", "a field strength", Dimensions.FieldStrength, "kA/m", "1592 kA/m", "kA/m, A/m, kOe, Oe"),
        new("voltage", "a voltage", Dimensions.Voltage, "V", "48 V", "V, kV, mV"),
        new("current", "a current", Dimensions.Current, "A", "20 A", "A, mA, kA"),
        new("resistance", "a resistance", Dimensions.Resistance, "Ω", "0.5 Ω", "Ω, mΩ, kΩ"),
        new("inductance", "an inductance", Dimensions.Inductance, "mH", "1.2 mH", "H, mH, µH"),
        new("capacitance", "a capacitance", Dimensions.Capacitance, "µF", "470 µF", "F, mF, µF"),
        new("charge", "a charge", Dimensions.Charge, "A·h", "200 Ah", "Ah, mAh"),
        new("power", "a power", Dimensions.Power, "W", "1000 W", "W, kW"),
        new("energy", "an energy", Dimensions.Energy, "Wh", "2 kWh", "Wh, kWh, J"),
        new("torque", "a torque", Dimensions.Energy, "N·m", "40 N·m", "N·m, kN·m"),
        new("force", "a force", Dimensions.Force, "N", "500 N", "N, kN"),
        new("pressure", "a pressure or stress", Dimensions.Pressure, "MPa", "235 MPa", "MPa, GPa, kPa, N/mm², bar"),
        new("rotational-speed", "a rotational speed", Dimensions.Rate, "rpm", "250 rpm", "rpm, 1/min, rad/s"),
        new("velocity", "a velocity", Dimensions.Velocity, "m/s", "11 m/s", "m/s, km/h, mm/s"),
        new("frequency", "a frequency", Dimensions.Rate, "Hz", "16 kHz", "Hz, kHz"),
        new("density", "a density", Dimensions.Density, "kg/m³", "7500 kg/m³", "kg/m³, g/cm³"),
        new("current-density", "a current density", Dimensions.CurrentDensity, "A/mm²", "5 A/mm²", "A/mm², A/m²"),
        new("thermal-conductivity", "a thermal conductivity", Dimensions.ThermalConductivity, "W/(m·K)", "0.8 W/(m·K)", "W/(m·K)"),
        new("temperature-coefficient", "a temperature coefficient", Dimensions.PerKelvin, "%/K", "-0.12 %/K", "%/K, 1/K"),
        new("volume-flow", "a volume flow", Dimensions.VolumeFlow, "l/s", "15 l/s", "l/s, m³/s"),
        new("resistivity", "a resistivity", Dimensions.Resistivity, "µΩ·m", "1.5 µΩ·m", "µΩ·m, Ω·m"),
        new("conductivity", "a conductivity", Dimensions.Conductivity, "MS/m", "58 MS/m", "MS/m, S/m"),
        new("angle", "an angle", Dimension.None, "deg", "15 deg", "deg, rad"),
        new("ratio", "a ratio", Dimension.None, "", "0.85 or 85 %", "no unit, or %"),
        new("count", "a whole number", Dimension.None, "", "12", "no unit"),
        new("wire", "a wire size", Dimensions.Length, "mm", "AWG 16 or 1.25 mm", "AWG, or the bare diameter in mm"),
        new("cable", "a cable size", Dimensions.Area, "mm²", "16 mm² or AWG 6", "mm², or AWG"),
    ];

    private static readonly FrozenDictionary<string, QuantityKind> ByName = All.ToFrozenDictionary(k => k.Name, StringComparer.Ordinal);

    /// <summary>The word used in the schema.</summary>
    public string Name { get; }

    /// <summary>The kind with its article, for messages.</summary>
    public string Noun { get; }

    /// <summary>The dimension.</summary>
    public Dimension Dimension { get; }

    /// <summary>The unit for the screen; empty for plain numbers.</summary>
    public string DisplayUnit { get; }

    /// <summary>A value as one would write it.</summary>
    public string Example { get; }

    /// <summary>The units one would use, for messages.</summary>
    public string AcceptedUnits { get; }

    /// <summary>True where a bare number is a value: counts and ratios.</summary>
    public bool TakesBareNumber => Name is "ratio" or "count";

    /// <summary>True where °C counts without its offset.</summary>
    public bool IsDifference => Name is "temperature-difference";

    /// <summary>Finds a kind by its schema word.</summary>
    /// <param name="name">The word.</param>
    /// <param name="kind">The kind.</param>
    /// <returns>False for words, flags and unknown names.</returns>
    public static bool TryFind(string name, [NotNullWhen(true)] out QuantityKind? kind) => ByName.TryGetValue(name, out kind);

    /// <summary>True when a value in this unit is of this kind; rpm is no frequency and % no angle, though their dimensions agree.</summary>
    /// <param name="unit">The unit.</param>
    public bool Takes(UnitEntry unit)
    {
        if (unit.Dimension != Dimension)
        {
            return false;
        }

        return Name switch
        {
            "angle" => unit.Noun is "an angle",
            "ratio" => unit.Noun is "a ratio",
            "count" => false,
            "frequency" => unit.Noun is "a frequency" or "a rate",
            "rotational-speed" => unit.Noun is "a rotational speed",
            "flux" => unit.Noun is "a magnetic flux" || unit.Spelling is "V·s/rad",
            "torque" => unit.Noun is "a torque",
            _ => true,
        };
    }
}
