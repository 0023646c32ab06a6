using System.Globalization;

namespace SpecLint.Spec.Units;

/// <summary>Round wire and cable sizes: American wire gauge, or a bare diameter (wire) or cross-section (cable).</summary>
/// <seealso href="https://www.astm.org/b0258-18.html">ASTM B258, standard nominal diameters of solid round wires by gauge number; the formula is from memory.</seealso>
public static class WireSize
{
    /// <summary>Thinnest gauge number of the scale.</summary>
    private const int ThinnestGauge = 50;

    /// <summary>Bare copper diameter of a gauge: 0.127 mm · 92^((36 − n)/39).</summary>
    /// <param name="gauge">Gauge number n; 0 for 1/0, −1 for 2/0, −3 for 4/0.</param>
    /// <returns>Diameter [m].</returns>
    public static double Diameter(int gauge) => 0.127e-3 * Math.Pow(92, (36 - gauge) / 39.0);

    /// <summary>Reads a wire or cable size.</summary>
    /// <param name="text">Such as <c>AWG 16</c>, <c>AWG 2/0</c>, <c>1.25 mm</c> or <c>16 mm²</c>.</param>
    /// <param name="kind">The kind <c>wire</c> or <c>cable</c>.</param>
    /// <param name="quantity">Bare diameter [m] of a wire, cross-section [m²] of a cable.</param>
    /// <param name="problem">What is wrong, to follow the name of the key.</param>
    /// <returns>False when the text is no such size.</returns>
    internal static bool TryRead(string text, QuantityKind kind, out Quantity quantity, out string problem)
    {
        quantity = default;
        bool isWire = kind.Name is "wire";
        string upper = text.Trim().ToUpperInvariant();
        if (upper.Contains("SWG", StringComparison.Ordinal))
        {
            problem = $"is {QuantityText.Shown(text)}, a size of the British gauge; {kind.Noun} such as {kind.Example} is expected";
            return false;
        }

        if (upper.StartsWith("AWG", StringComparison.Ordinal) || upper.EndsWith("AWG", StringComparison.Ordinal))
        {
            string number = (upper.StartsWith("AWG", StringComparison.Ordinal) ? upper[3..] : upper[..^3]).Trim();
            if (!TryGauge(number, out int gauge))
            {
                problem = $"is {QuantityText.Shown(text)}; AWG 4/0 to AWG 50 in whole numbers are known";
                return false;
            }

            double diameter = Diameter(gauge);
            problem = "";
            quantity = new Quantity(isWire ? diameter : Math.PI / 4 * diameter * diameter, kind.Dimension, 0, 0, "AWG", false);
            return true;
        }

        QuantityKind.TryFind(isWire ? "length" : "area", out var metric);
        bool isRead = QuantityReader.TryRead(text, metric, out quantity, out problem);
        if (!isRead)
        {
            problem = problem.Replace($"{metric!.Noun} such as {metric.Example}", $"{kind.Noun} such as {kind.Example}", StringComparison.Ordinal);
        }

        return isRead;
    }

    private static bool TryGauge(string text, out int gauge)
    {
        gauge = 0;
        string digits = text.EndsWith("/0", StringComparison.Ordinal) ? text[..^2] : text;
        if (digits.Length == 0 || digits.Length > 4 || !int.TryParse(digits, NumberStyles.None, CultureInfo.InvariantCulture, out int number))
        {
            return false;
        }

        if (digits.Length < text.Length)
        {
            gauge = 1 - number;
            return number is >= 1 and <= 4;
        }

        gauge = number == 0 ? 1 - digits.Length : number;
        return number <= ThinnestGauge;
    }
}
