using System.Text;

namespace SpecLint.Spec.Units;

/// <summary>Brings the usual spellings of a unit to one form, so that the unit table needs each unit once.</summary>
internal static class UnitSpelling
{
    internal static string Normalise(ReadOnlySpan<char> text)
    {
        var result = new StringBuilder(text.Length);
        foreach (char c in text)
        {
            string? piece = c switch
            {
                ' ' or '\u00a0' or '\u2009' or '\u202f' or '^' or '(' or ')' => "",
                '.' or '·' or '*' or '⋅' or '∙' or '×' or '\u2062' => "",
                '\u00b5' or '\u03bc' => "u",
                '²' => "2",
                '³' => "3",
                '¹' => "1",
                '⁻' or '\u2212' or '\u2010' or '\u2011' or '\u2013' => "-",
                '\u2126' or '\u03a9' => "ohm",
                '\u2103' => "°C",
                'º' or '˚' => "°",
                '″' or '”' => "\"",
                '∕' or '⁄' => "/",
                _ => null,
            };
            _ = piece is null ? result.Append(c) : result.Append(piece);
        }

        return result.ToString();
    }
}
