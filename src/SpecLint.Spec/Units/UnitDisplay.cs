using System.Globalization;

namespace SpecLint.Spec.Units;

/// <summary>Writes SI values in readable units, the same on every machine.</summary>
public static class UnitDisplay
{
    /// <summary>Writes a value in a unit with the digits a reader can use: <c>11.4 mm</c>, <c>2.0 A/mm²</c>, <c>85 °C</c>, <c>12 %</c>.</summary>
    /// <param name="si">Value in coherent SI.</param>
    /// <param name="unit">A spelling of the unit table, or empty for a plain number.</param>
    public static string Format(double si, string unit)
    {
        bool isKnown = UnitTable.TryFind(unit, out var entry);
        return Join(Digits(isKnown ? entry!.FromSi(si) : si), isKnown ? entry!.Spelling : unit);
    }

    /// <summary>Writes a difference: as <see cref="Format"/>, with the offset of a temperature scale left out.</summary>
    /// <param name="si">Difference in coherent SI.</param>
    /// <param name="unit">A spelling of the unit table, or empty for a plain number.</param>
    public static string FormatDifference(double si, string unit)
    {
        bool isKnown = UnitTable.TryFind(unit, out var entry);
        string spelling = isKnown && entry!.Offset > 0 ? "K" : isKnown ? entry!.Spelling : unit;
        return Join(Digits(isKnown ? entry!.DifferenceFromSi(si) : si), spelling);
    }

    /// <summary>Writes a value so that reading it gives the same number, up to the last digits of the conversion.</summary>
    /// <param name="si">Value in coherent SI.</param>
    /// <param name="unit">A spelling of the unit table, or empty for a plain number.</param>
    public static string FormatExact(double si, string unit)
    {
        bool isKnown = UnitTable.TryFind(unit, out var entry);
        double value = isKnown ? entry!.FromSi(si) : si;
        return Join(value.ToString("G15", CultureInfo.InvariantCulture), isKnown ? entry!.Spelling : unit);
    }

    /// <summary>Writes a value of an SI unit in the unit of the workshop: mm for m, rpm for rad/s, °C for K, A/mm² for A/m².</summary>
    /// <param name="si">Value in coherent SI.</param>
    /// <param name="siUnit">The SI unit, such as <c>m</c>, <c>rad/s</c> or <c>Wb</c>; empty for a plain number.</param>
    public static string Readable(double si, string siUnit) => Format(si, ReadableUnit(si, siUnit));

    /// <summary>The unit of the workshop for a value of an SI unit.</summary>
    /// <param name="si">Value in coherent SI; its size picks among mm and m, W and kW, ….</param>
    /// <param name="siUnit">The SI unit; one without a readable relative is given back.</param>
    public static string ReadableUnit(double si, string siUnit)
    {
        double size = Math.Abs(si);
        return siUnit switch
        {
            "m" => Pick(size, (2, "m"), (1e-4, "mm"), (0, "µm")),
            "m²" => Pick(size, (0.1, "m²"), (1e-3, "cm²"), (0, "mm²")),
            "m³" => Pick(size, (1, "m³"), (1e-3, "l"), (0, "cm³")),
            "kg" => Pick(size, (0.5, "kg"), (0, "g")),
            "s" => Pick(size, (7200, "h"), (600, "min"), (0.1, "s"), (0, "ms")),
            "K" => "°C",
            "T" => Pick(size, (0.1, "T"), (0, "mT")),
            "Wb" => Pick(size, (1, "Wb"), (1e-4, "mWb"), (0, "µWb")),
            "A/m" => Pick(size, (1000, "kA/m"), (0, "A/m")),
            "V" => Pick(size, (10_000, "kV"), (0.1, "V"), (0, "mV")),
            "A" => Pick(size, (0.1, "A"), (0, "mA")),
            "Ω" => Pick(size, (1e6, "MΩ"), (10_000, "kΩ"), (0.5, "Ω"), (0, "mΩ")),
            "H" => Pick(size, (1, "H"), (1e-4, "mH"), (0, "µH")),
            "F" => Pick(size, (1, "F"), (1e-2, "mF"), (1e-7, "µF"), (0, "nF")),
            "W" => Pick(size, (10_000, "kW"), (0.1, "W"), (0, "mW")),
            "J" => Pick(size, (3.6e6, "kWh"), (3600, "Wh"), (0, "J")),
            "N" => Pick(size, (10_000, "kN"), (0, "N")),
            "Pa" => Pick(size, (1e10, "GPa"), (1e5, "MPa"), (1000, "kPa"), (0, "Pa")),
            "rad/s" => "rpm",
            "rad" => "deg",
            "Hz" => Pick(size, (10_000, "kHz"), (0, "Hz")),
            "A/m²" => "A/mm²",
            "m³/s" => Pick(size, (1, "m³/s"), (0, "l/s")),
            "W/m²" => Pick(size, (1000, "kW/m²"), (0, "W/m²")),
            "1/K" => "%/K",
            "N/m" => Pick(size, (1e5, "kN/m"), (0, "N/m")),
            "Ω·m" => "µΩ·m",
            "S/m" => "MS/m",
            "A·s" => "A·h",
            _ => siUnit,
        };
    }

    /// <summary>A number with about three digits, or all before the point of a larger one.</summary>
    /// <param name="value">The number.</param>
    public static string Digits(double value)
    {
        double size = Math.Abs(value);
        if (size > 0 && (size < 1e-3 || size >= 1e7))
        {
            return value.ToString("0.##e+0", CultureInfo.InvariantCulture);
        }

        string format = size switch
        {
            >= 99.95 => "0",
            >= 9.995 => "0.#",
            >= 0.9995 => "0.0#",
            >= 0.09995 => "0.###",
            > 0 => "0.#####",
            _ => "0",
        };
        string text = value.ToString(format, CultureInfo.InvariantCulture);
        return text is "-0" ? "0" : text;
    }

    private static string Join(string digits, string unit) => unit.Length == 0 ? digits : $"{digits} {unit}";

    private static string Pick(double size, params ReadOnlySpan<(double Least, string Unit)> choices)
    {
        foreach (var (least, unit) in choices)
        {
            if (size >= least && size > 0)
            {
                return unit;
            }
        }

        // Nothing at all is written in the unit of ordinary sizes.
        return choices[Math.Max(0, choices.Length - 2)].Unit;
    }
}
