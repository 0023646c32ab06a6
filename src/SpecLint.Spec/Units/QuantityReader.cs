using System.Globalization;

namespace SpecLint.Spec.Units;

/// <summary>Reads quantities such as <c>2.0 mm ± 0.2 mm</c>, <c>1.30 T ± 3 %</c> or <c>85 °C</c>, whatever the machine's locale.</summary>
public static class QuantityReader
{
    /// <summary>Reads a quantity of some dimension, or of any.</summary>
    /// <param name="text">The text.</param>
    /// <param name="expected">The dimension that is wanted; null accepts any.</param>
    /// <param name="isDifference">True where a temperature is a difference, without the offset of its scale.</param>
    /// <param name="quantity">The quantity in coherent SI.</param>
    /// <param name="problem">What is wrong, to follow the name of what was read; empty when nothing is.</param>
    /// <returns>False when the text is no such quantity.</returns>
    public static bool TryRead(string text, Dimension? expected, bool isDifference, out Quantity quantity, out string problem)
    {
        if (!TryReadAny(text, kind: null, isDifference, out quantity, out _, out problem))
        {
            return false;
        }

        if (expected is { } wanted && wanted != quantity.Dimension)
        {
            problem = $"is {QuantityText.Shown(text)}, of dimension {Named(quantity.Dimension)}; dimension {Named(wanted)} is expected";
            return false;
        }

        return true;
    }

    /// <summary>Reads a quantity of one kind.</summary>
    /// <param name="text">The text.</param>
    /// <param name="kind">The kind that is wanted; null accepts any.</param>
    /// <param name="quantity">The quantity in coherent SI.</param>
    /// <param name="problem">What is wrong, to follow the name of the key; empty when nothing is.</param>
    /// <returns>False when the text is no such quantity.</returns>
    public static bool TryRead(string text, QuantityKind? kind, out Quantity quantity, out string problem)
    {
        if (kind?.Name is "wire" or "cable")
        {
            return WireSize.TryRead(text, kind, out quantity, out problem);
        }

        if (!TryReadAny(text, kind, kind?.IsDifference ?? false, out quantity, out var unit, out problem))
        {
            problem = problem.Length > 0 && problem != "?" ? problem : Expected(text, kind, "");
            return false;
        }

        if (kind is null || (unit is null ? kind.TakesBareNumber : kind.Takes(unit)))
        {
            return true;
        }

        problem = unit is null
            ? $"is {QuantityText.Shown(text)} without a unit; {kind.Noun} such as {kind.Example} is expected (units: {kind.AcceptedUnits})"
            : Expected(text, kind, $", {unit.Noun}");
        return false;
    }

    private static string Expected(string text, QuantityKind? kind, string found)
    {
        string shown = text.Length == 0 ? "empty" : QuantityText.Shown(text);
        return kind is null
            ? $"is {shown}{found}; a number with a unit is expected"
            : $"is {shown}{found}; {kind.Noun} such as {kind.Example} is expected";
    }

    private static bool TryReadAny(string text, QuantityKind? kind, bool isDifference, out Quantity quantity, out UnitEntry? unit, out string problem)
    {
        quantity = default;
        unit = null;
        if (!QuantityText.TrySplit(Plain(text), out var parts, out problem))
        {
            problem = problem == "?" && kind is null ? Expected(text, null, "") : problem;
            return false;
        }

        var unitText = parts.Unit.IsEmpty && parts.HasTolerance ? parts.ToleranceUnit : parts.Unit;
        var toleranceText = parts.ToleranceUnit.IsEmpty ? unitText : parts.ToleranceUnit;
        if (parts.Unit.IsEmpty && !unitText.IsEmpty && unitText is "%")
        {
            problem = $"is {QuantityText.Shown(text)}; the value needs its own unit or % before the tolerance";
            return false;
        }

        if (!TryUnit(text, unitText, kind, out unit, out problem) || !TryUnit(text, toleranceText, kind, out var toleranceUnit, out problem))
        {
            return false;
        }

        double value = unit is null ? parts.Nominal : isDifference ? unit.DifferenceToSi(parts.Nominal) : unit.ToSi(parts.Nominal);
        if (!TryTolerance(text, parts, unit, toleranceUnit, value, out double below, out double above, out problem))
        {
            return false;
        }

        if (!double.IsFinite(value) || !double.IsFinite(below) || !double.IsFinite(above))
        {
            problem = $"is {QuantityText.Shown(text)}, more than any size; a finite number is expected";
            return false;
        }

        quantity = new Quantity(value, unit?.Dimension ?? Dimension.None, below, above, unit?.Spelling ?? "", parts.HasTolerance);
        return true;
    }

    private static bool TryTolerance(string text, QuantityText parts, UnitEntry? unit, UnitEntry? toleranceUnit, double value, out double below, out double above, out string problem)
    {
        below = 0;
        above = 0;
        problem = "";
        if (!parts.HasTolerance)
        {
            return true;
        }

        bool isShare = toleranceUnit is { Noun: "a ratio" } && unit is not { Noun: "a ratio" };
        if (isShare && unit is { Noun: "a temperature" })
        {
            problem = $"is {QuantityText.Shown(text)}; the tolerance of a temperature is a number of kelvin, as in ± 5 K";
            return false;
        }

        if (!isShare && (toleranceUnit?.Dimension ?? Dimension.None) != (unit?.Dimension ?? Dimension.None))
        {
            problem = $"is {QuantityText.Shown(text)}; the tolerance is {toleranceUnit?.Noun ?? "a bare number"}, the value {unit?.Noun ?? "a bare number"}";
            return false;
        }

        double scale = isShare ? toleranceUnit!.ToSi(1) * Math.Abs(value) : 0;
        below = isShare ? parts.Below * scale : toleranceUnit?.DifferenceToSi(parts.Below) ?? parts.Below;
        above = isShare ? parts.Above * scale : toleranceUnit?.DifferenceToSi(parts.Above) ?? parts.Above;
        return true;
    }

    private static bool TryUnit(string text, ReadOnlySpan<char> spelling, QuantityKind? kind, out UnitEntry? unit, out string problem)
    {
        unit = null;
        problem = "";
        if (spelling.IsEmpty || UnitTable.TryFind(spelling, out unit))
        {
            return true;
        }

        string written = spelling.ToString();
        string meant = UnitTable.Nearest(written) is { } near ? $" (is {near.Spelling} meant?)" : "";
        string wanted = kind is null ? "a number with a unit" : $"{kind.Noun} such as {kind.Example}";
        problem = $"is {QuantityText.Shown(text)}; the unit '{QuantityText.Shown(written)}' is not known{meant}; {wanted} is expected";
        return false;
    }

    /// <summary>One spelling for signs and spaces.</summary>
    private static string Plain(string text) => text
        .Replace("+/-", "±", StringComparison.Ordinal)
        .Replace("+-", "±", StringComparison.Ordinal)
        .Replace('\u2212', '-')
        .Replace('\u00a0', ' ')
        .Replace('\u2009', ' ')
        .Replace('\u202f', ' ')
        .Trim();

    private static string Named(Dimension dimension) => dimension == Dimension.None ? "of a plain number" : string.Create(CultureInfo.InvariantCulture, $"{dimension}");
}
