using System.Buffers;
using System.Globalization;

namespace SpecLint.Spec.Yaml;

/// <summary>How the YAML 1.2 core schema reads a plain scalar: <c>yes</c> is a word, <c>010</c> is ten.</summary>
public static class CoreSchema
{
    private static readonly SearchValues<char> NumberCharacters = SearchValues.Create("0123456789.eE+-");

    /// <summary>True when the scalar is null.</summary>
    /// <param name="scalar">The scalar.</param>
    public static bool IsNull(YamlScalar scalar) =>
        scalar.IsPlain && scalar.Text is ("" or "~" or "null" or "Null" or "NULL");

    /// <summary>Reads a boolean.</summary>
    /// <param name="scalar">The scalar.</param>
    /// <param name="value">The boolean.</param>
    /// <returns>False when the scalar is no boolean.</returns>
    public static bool TryReadFlag(YamlScalar scalar, out bool value)
    {
        value = scalar.Text is "true" or "True" or "TRUE";
        return scalar.IsPlain && (value || scalar.Text is "false" or "False" or "FALSE");
    }

    /// <summary>Reads a decimal number, whole or not; hexadecimal and octal forms, infinities and NaN stay text.</summary>
    /// <param name="scalar">The scalar.</param>
    /// <param name="value">The number.</param>
    /// <returns>False when the scalar is no finite decimal number.</returns>
    public static bool TryReadNumber(YamlScalar scalar, out double value)
    {
        value = 0;
        return scalar.IsPlain
            && scalar.Text.Length > 0
            && scalar.Text.AsSpan().IndexOfAnyExcept(NumberCharacters) < 0
            && double.TryParse(scalar.Text, NumberStyles.Float, CultureInfo.InvariantCulture, out value)
            && double.IsFinite(value);
    }
}
