using SpecLint.Spec.Units;

namespace SpecLint.Reporting.Quantities;

/// <summary>A unit in which a figure is shown: one of the unit table, or coherent SI.</summary>
internal readonly record struct DisplayUnit
{
    private readonly UnitEntry? _entry;

    private DisplayUnit(string symbol, UnitEntry? entry)
    {
        Symbol = symbol;
        _entry = entry;
    }

    /// <summary>As written after the number; empty for a plain number.</summary>
    public string Symbol { get; }

    /// <summary>True for a scale whose zero is not that of SI, such as °C.</summary>
    public bool HasOffset => _entry is { Offset: not 0 };

    /// <summary>The unit of a symbol; the SI base units of the dimension when the table does not have it.</summary>
    /// <param name="symbol">Symbol, empty or <c>1</c> for a plain number.</param>
    /// <param name="dimension">Dimension of what is shown.</param>
    public static DisplayUnit Of(string symbol, Dimension dimension) =>
        symbol is "" or "1" ? new DisplayUnit("", entry: null)
        : UnitTable.TryFind(symbol, out UnitEntry? entry) ? new DisplayUnit(entry.Spelling, entry)
        : new DisplayUnit(dimension.ToString(), entry: null);

    /// <summary>The number to show for a value.</summary>
    /// <param name="value">In coherent SI.</param>
    public double FromSi(double value) => _entry?.FromSi(value) ?? value;

    /// <summary>The number to show for a difference or a band.</summary>
    /// <param name="difference">In coherent SI.</param>
    public double DifferenceFromSi(double difference) => _entry?.DifferenceFromSi(difference) ?? difference;

    /// <summary>The number with the symbol behind it.</summary>
    /// <param name="number">The number as text.</param>
    public string Attach(string number) => Symbol.Length == 0 ? number : $"{number} {Symbol}";
}
