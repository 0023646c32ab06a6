using System.Globalization;
using System.Text;

namespace SpecLint.Spec.Units;

/// <summary>Exponents of the SI base quantities that spec-lint uses; an angle has none.</summary>
/// <param name="Length">Exponent of the metre.</param>
/// <param name="Mass">Exponent of the kilogram.</param>
/// <param name="Time">Exponent of the second.</param>
/// <param name="Current">Exponent of the ampere.</param>
/// <param name="Temperature">Exponent of the kelvin.</param>
public readonly record struct Dimension(int Length, int Mass, int Time, int Current, int Temperature)
{
    /// <summary>A pure number.</summary>
    public static Dimension None { get; }

    /// <summary>The dimension of a product.</summary>
    public static Dimension operator *(Dimension a, Dimension b) =>
        new(a.Length + b.Length, a.Mass + b.Mass, a.Time + b.Time, a.Current + b.Current, a.Temperature + b.Temperature);

    /// <summary>The dimension of a quotient.</summary>
    public static Dimension operator /(Dimension a, Dimension b) =>
        new(a.Length - b.Length, a.Mass - b.Mass, a.Time - b.Time, a.Current - b.Current, a.Temperature - b.Temperature);

    /// <summary>The base units with their exponents, such as <c>kg·m²/s²</c> written as <c>m²·kg·s⁻²</c>; empty for a number.</summary>
    public override string ToString()
    {
        var text = new StringBuilder();
        Append(text, "m", Length);
        Append(text, "kg", Mass);
        Append(text, "s", Time);
        Append(text, "A", Current);
        Append(text, "K", Temperature);
        return text.ToString();
    }

    private static void Append(StringBuilder text, string unit, int exponent)
    {
        if (exponent == 0)
        {
            return;
        }

        if (text.Length > 0)
        {
            text.Append('·');
        }

        text.Append(unit);
        if (exponent != 1)
        {
            foreach (char digit in exponent.ToString(CultureInfo.InvariantCulture))
            {
                text.Append(digit == '-' ? '⁻' : "⁰¹²³⁴⁵⁶⁷⁸⁹"[digit - '0']);
            }
        }
    }
}
