using System.Globalization;
using SpecLint.Spec.Units;

namespace SpecLint.Reporting.Quantities;

/// <summary>Writes quantities for people: four significant digits, the unit after a space, a band rounded with its value.</summary>
internal static class BandText
{
    private const int Digits = 4;

    /// <summary>A value with its unit, such as <c>30 mm</c>.</summary>
    /// <param name="value">In coherent SI.</param>
    /// <param name="unit">Display unit; empty for a number.</param>
    /// <param name="dimension">Dimension, for a unit that is not known.</param>
    public static string Value(double value, string unit, Dimension dimension)
    {
        DisplayUnit display = DisplayUnit.Of(unit, dimension);
        return display.Attach(Number(display.FromSi(value)));
    }

    /// <summary>A value with its band and unit, such as <c>0.612 ± 0.018 T</c>; without band when that is 0.</summary>
    /// <param name="value">In coherent SI.</param>
    /// <param name="uncertainty">Half width of the band in coherent SI.</param>
    /// <param name="unit">Display unit; empty for a number.</param>
    /// <param name="dimension">Dimension, for a unit that is not known.</param>
    public static string Band(double value, double uncertainty, string unit, Dimension dimension)
    {
        var (number, band, display) = Parts(value, uncertainty, unit, dimension);
        return band.Length == 0 ? display.Attach(number) : display.Attach($"{number} ± {band}");
    }

    /// <summary>The number, the band (empty when 0) and the unit of a value, for columns.</summary>
    /// <param name="value">In coherent SI.</param>
    /// <param name="uncertainty">Half width of the band in coherent SI.</param>
    /// <param name="unit">Display unit; empty for a number.</param>
    /// <param name="dimension">Dimension, for a unit that is not known.</param>
    public static (string Number, string Band, DisplayUnit Unit) Parts(double value, double uncertainty, string unit, Dimension dimension)
    {
        DisplayUnit display = DisplayUnit.Of(unit, dimension);
        double shown = display.FromSi(value);
        double band = display.DifferenceFromSi(uncertainty);
        if (!(band > Math.Abs(shown) * 1e-6))
        {
            return (Number(shown), "", display);
        }

        int decimals = 1 - (int)Math.Floor(Math.Log10(band));
        int most = shown == 0 ? decimals : Digits - 1 - (int)Math.Floor(Math.Log10(Math.Abs(shown)));
        decimals = Math.Min(decimals, most);
        return band < Math.Pow(10, -decimals) / 2
            ? (Number(shown), Number(band, 2), display)
            : (Fixed(shown, decimals), Fixed(band, decimals), display);
    }

    /// <summary>A margin as a share of its scale, such as <c>-8 %</c>.</summary>
    /// <param name="margin">Signed distance to the bound over the scale.</param>
    public static string Margin(double margin)
    {
        double percent = margin * 100;
        string text = Math.Abs(percent) >= 10 ? Fixed(percent, 0) : Number(percent, 2);
        return (margin > 0 ? "+" : "") + text + " %";
    }

    /// <summary>The number to nine significant digits: what the last bit of a processor's arithmetic does not change.</summary>
    /// <param name="number">Any finite number.</param>
    public static double Rounded(double number) => double.Parse(
        number.ToString("E8", CultureInfo.InvariantCulture), NumberStyles.Float, CultureInfo.InvariantCulture);

    /// <summary>A plain number to four significant digits.</summary>
    /// <param name="number">Any finite number.</param>
    public static string Number(double number) => Number(number, Digits);

    internal static string Number(double number, int digits)
    {
        if (number == 0)
        {
            return "0";
        }

        if (Math.Abs(number) >= 1e7 || Math.Abs(number) < 1e-4)
        {
            return number.ToString("0.###e0", CultureInfo.InvariantCulture);
        }

        int decimals = digits - 1 - (int)Math.Floor(Math.Log10(Math.Abs(number)));
        string text = Fixed(number, decimals);
        return text.Contains('.', StringComparison.Ordinal) ? text.TrimEnd('0').TrimEnd('.') : text;
    }

    private static string Fixed(double number, int decimals)
    {
        if (decimals < 0)
        {
            // Rounded through decimal text: a power of ten as divisor would leave binary dust in the last digit.
            double step = Math.Pow(10, Math.Min(-decimals, 15));
            number = Math.Round(number / step, MidpointRounding.AwayFromZero) * step;
            decimals = 0;
        }

        string text = number.ToString("F" + Math.Min(decimals, 12).ToString(CultureInfo.InvariantCulture), CultureInfo.InvariantCulture);
        return text.AsSpan().IndexOfAnyExcept("-0.") < 0 ? text.TrimStart('-') : text;
    }
}
