using System.Globalization;

namespace SpecLint.Spec.Units;

/// <summary>A quantity taken apart: nominal value, tolerance, and the unit text of each; nothing is looked up yet.</summary>
internal readonly ref struct QuantityText
{
    /// <summary>Beyond any unit's use, and within the decimal numbers that the unit library keeps some quantities in.</summary>
    private const double LargestNumber = 1e20;

    internal required double Nominal { get; init; }

    internal required ReadOnlySpan<char> Unit { get; init; }

    internal double Below { get; init; }

    internal double Above { get; init; }

    internal bool HasTolerance { get; init; }

    internal ReadOnlySpan<char> ToleranceUnit { get; init; }

    /// <summary>Takes a text apart.</summary>
    /// <param name="text">The text, signs already normalised.</param>
    /// <param name="parts">The parts.</param>
    /// <param name="problem">What is wrong, to follow the name of the key.</param>
    internal static bool TrySplit(ReadOnlySpan<char> text, out QuantityText parts, out string problem)
    {
        parts = default;
        if (!TryNumber(text, out double nominal, out var rest, out problem))
        {
            return false;
        }

        int plusMinus = rest.IndexOf('±');
        if (plusMinus >= 0)
        {
            if (!TryNumber(rest[(plusMinus + 1)..].Trim(), out double width, out var unit, out problem) || width < 0)
            {
                problem = $"is {Shown(text)}; after ± a positive number is expected";
                return false;
            }

            parts = new QuantityText { Nominal = nominal, Unit = rest[..plusMinus].Trim(), Below = width, Above = width, HasTolerance = true, ToleranceUnit = unit.Trim() };
            return true;
        }

        int sign = SignedTail(rest);
        if (sign < 0)
        {
            parts = new QuantityText { Nominal = nominal, Unit = rest.Trim() };
            return true;
        }

        return TryTwoSided(text, nominal, rest[..sign].Trim(), rest[sign..], out parts, out problem);
    }

    private static bool TryTwoSided(ReadOnlySpan<char> text, double nominal, ReadOnlySpan<char> unit, ReadOnlySpan<char> tail, out QuantityText parts, out string problem)
    {
        parts = default;
        problem = $"is {Shown(text)}; a tolerance is written as ± 0.2 mm or +0.3/-0.1 mm";
        if (!TryNumber(tail, out double first, out var between, out _))
        {
            return false;
        }

        int slash = -1;
        for (int i = 0; i < between.Length - 1 && slash < 0; i++)
        {
            var after = between[(i + 1)..].TrimStart();
            slash = between[i] == '/' && after.Length > 0 && (after[0] is '+' or '-' or '0') ? i : -1;
        }

        if (slash < 0 || !TryNumber(between[(slash + 1)..].Trim(), out double second, out var secondUnit, out _))
        {
            return false;
        }

        var firstUnit = between[..slash].Trim();
        bool sameUnit = firstUnit.IsEmpty || UnitSpelling.Normalise(firstUnit) == UnitSpelling.Normalise(secondUnit);
        double above = Math.Max(first, second);
        double below = -Math.Min(first, second);
        if (!sameUnit || above < 0 || below < 0)
        {
            return false;
        }

        problem = "";
        parts = new QuantityText { Nominal = nominal, Unit = unit, Below = below, Above = above, HasTolerance = true, ToleranceUnit = secondUnit.Trim() };
        return true;
    }

    /// <summary>Where a tolerance such as <c>+0.3/-0.1</c> begins: a sign after a space or the number, before a digit.</summary>
    private static int SignedTail(ReadOnlySpan<char> rest)
    {
        for (int i = 0; i < rest.Length - 1; i++)
        {
            bool begins = i == 0 || rest[i - 1] == ' ';
            if (begins && rest[i] is '+' or '-' && begins && (char.IsAsciiDigit(rest[i + 1]) || rest[i + 1] == '.'))
            {
                return i;
            }
        }

        return -1;
    }

    private static bool TryNumber(ReadOnlySpan<char> text, out double value, out ReadOnlySpan<char> rest, out string problem)
    {
        int at = text.Length > 0 && text[0] is '+' or '-' ? 1 : 0;
        int digits = 0;
        bool hasPoint = false;
        while (at < text.Length && (char.IsAsciiDigit(text[at]) || (text[at] == '.' && !hasPoint)))
        {
            hasPoint |= text[at] == '.';
            digits += text[at] == '.' ? 0 : 1;
            at++;
        }

        if (digits > 0 && at < text.Length && text[at] is 'e' or 'E')
        {
            int exponent = at + 1;
            exponent += exponent < text.Length && text[exponent] is '+' or '-' ? 1 : 0;
            int end = exponent;
            while (end < text.Length && char.IsAsciiDigit(text[end]))
            {
                end++;
            }

            at = end > exponent ? end : at;
        }

        value = 0;
        rest = text[Math.Min(at, text.Length)..];
        problem = Problem(text, at, digits);
        if (problem.Length > 0)
        {
            return false;
        }

        bool isRead = double.TryParse(text[..at], NumberStyles.Float, CultureInfo.InvariantCulture, out value) && Math.Abs(value) <= LargestNumber;
        problem = isRead ? "" : $"is {Shown(text)}, more than any size; a finite number is expected";
        rest = rest.TrimStart();
        return isRead;
    }

    private static string Problem(ReadOnlySpan<char> text, int at, int digits)
    {
        if (digits == 0)
        {
            var word = text.TrimStart("+-.");
            bool isNotFinite = word.StartsWith("nan", StringComparison.OrdinalIgnoreCase) || word.StartsWith("inf", StringComparison.OrdinalIgnoreCase);
            return isNotFinite ? $"is {Shown(text)}; a finite number is expected" : "?";
        }

        if (at < text.Length - 1 && text[at] == ',' && char.IsAsciiDigit(text[at + 1]))
        {
            return $"is {Shown(text)}; decimals are written with a point and thousands without a mark, as in 1.5 or 1500";
        }

        return "";
    }

    internal static string Shown(ReadOnlySpan<char> text) => text.Length <= 60 ? text.ToString() : $"{text[..60]}…";
}
