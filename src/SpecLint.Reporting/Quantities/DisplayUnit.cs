using System.Collections.Frozen;
using SpecLint.Spec.Units;

namespace SpecLint.Reporting.Quantities;

/// <summary>A unit in which a figure is shown.</summary>
/// <param name="Symbol">As written after the number; empty for a plain number.</param>
/// <param name="Scale">What one of it is in coherent SI.</param>
/// <param name="Offset">What its zero is in coherent SI, for temperatures.</param>
internal readonly record struct DisplayUnit(string Symbol, double Scale, double Offset)
{
    private static readonly FrozenDictionary<string, DisplayUnit> Known = Rows().ToFrozenDictionary(u => u.Symbol, StringComparer.Ordinal);

    /// <summary>The unit of a symbol; the SI base units of the dimension when the symbol is not known.</summary>
    /// <param name="symbol">Symbol, empty or <c>1</c> for a plain number.</param>
    /// <param name="dimension">Dimension of what is shown.</param>
    public static DisplayUnit Of(string symbol, Dimension dimension) =>
        symbol is "" or "1" or "–" ? new DisplayUnit("", 1, 0)
        : Known.TryGetValue(symbol, out var unit) ? unit
        : new DisplayUnit(dimension.ToString(), 1, 0);

    /// <summary>True when the symbol is a unit of the table.</summary>
    /// <param name="symbol">A word.</param>
    public static bool IsKnown(string symbol) => Known.ContainsKey(symbol);

    /// <summary>The number to show for a value.</summary>
    /// <param name="value">In coherent SI.</param>
    public double FromSi(double value) => (value - Offset) / Scale;

    /// <summary>The number to show for a difference or a band.</summary>
    /// <param name="difference">In coherent SI.</param>
    public double DifferenceFromSi(double difference) => difference / Scale;

    /// <summary>The number with the symbol behind it.</summary>
    /// <param name="number">The number as text.</param>
    public string Attach(string number) => Symbol.Length == 0 ? number : $"{number} {Symbol}";

    private static IEnumerable<DisplayUnit> Rows()
    {
        (string, double)[] rows =
        [
            ("%", 0.01), ("m", 1), ("cm", 0.01), ("mm", 1e-3), ("µm", 1e-6), ("m²", 1), ("cm²", 1e-4), ("mm²", 1e-6),
            ("T", 1), ("mT", 1e-3), ("Wb", 1), ("mWb", 1e-3), ("µWb", 1e-6), ("kA/m", 1e3), ("A/m", 1),
            ("V", 1), ("mV", 1e-3), ("kV", 1e3), ("A", 1), ("mA", 1e-3), ("kA", 1e3), ("A/m²", 1), ("A/mm²", 1e6),
            ("Ω", 1), ("mΩ", 1e-3), ("kΩ", 1e3), ("MΩ", 1e6), ("H", 1), ("mH", 1e-3), ("µH", 1e-6), ("F", 1), ("µF", 1e-6), ("mF", 1e-3),
            ("W", 1), ("kW", 1e3), ("mW", 1e-3), ("W/kg", 1), ("W/m²", 1), ("kW/m²", 1e3), ("W/K", 1), ("K/W", 1), ("J", 1), ("kJ", 1e3),
            ("Wh", 3600), ("kWh", 3.6e6), ("kg", 1), ("g", 1e-3), ("kg/m³", 1), ("N", 1), ("kN", 1e3), ("N·m", 1), ("N/m", 1), ("N/mm", 1e3),
            ("kN/mm", 1e6), ("N·m/A", 1), ("Pa", 1), ("kPa", 1e3), ("MPa", 1e6), ("GPa", 1e9), ("Hz", 1), ("kHz", 1e3),
            ("rad/s", 1), ("1/min", Math.PI / 30), ("rad", 1), ("°", Math.PI / 180), ("V·s/rad", 1), ("V·s/m", 1), ("m/s", 1), ("m/s²", 1),
            ("s", 1), ("ms", 1e-3), ("min", 60), ("h", 3600), ("K", 1), ("%/K", 0.01), ("1/K", 1), ("kg·m²", 1), ("g·mm", 1e-6),
        ];
        return rows.Select(row => new DisplayUnit(row.Item1, row.Item2, 0)).Append(new DisplayUnit("°C", 1, 273.15));
    }
}
