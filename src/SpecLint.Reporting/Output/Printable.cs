using System.Globalization;
using System.Text;

namespace SpecLint.Reporting.Output;

/// <summary>Makes text of unknown origin harmless on a terminal and in a report.</summary>
public static class Printable
{
    /// <summary>
    /// One line of text: white space of any kind becomes one space; control characters, terminal escapes, marks that turn
    /// the reading direction and broken surrogates become their code point in angle brackets, such as <c>&lt;U+001B&gt;</c>.
    /// </summary>
    /// <param name="text">Any text.</param>
    public static string Line(string text)
    {
        if (IsHarmless(text))
        {
            return text;
        }

        var line = new StringBuilder(text.Length + 16);
        bool space = false;
        ReadOnlySpan<char> rest = text;
        while (!rest.IsEmpty)
        {
            bool whole = Rune.DecodeFromUtf16(rest, out Rune rune, out int used) == System.Buffers.OperationStatus.Done;
            int code = whole ? rune.Value : rest[0];
            rest = rest[used..];
            if (whole && Rune.IsWhiteSpace(rune))
            {
                space = line.Length > 0;
                continue;
            }

            if (space)
            {
                line.Append(' ');
                space = false;
            }

            if (whole && !IsUnseen(rune))
            {
                line.Append(rune);
            }
            else
            {
                line.Append(CultureInfo.InvariantCulture, $"<U+{code:X4}>");
            }
        }

        return line.ToString();
    }

    /// <summary>The text as a sentence: one harmless line that ends with a stop.</summary>
    /// <param name="text">Any text.</param>
    public static string Sentence(string text)
    {
        string line = Line(text).TrimEnd();
        return line.Length == 0 || line[^1] is '.' or '!' or '?' ? line : line + ".";
    }

    private static bool IsHarmless(string text)
    {
        char before = ' ';
        foreach (char c in text)
        {
            if (c is < ' ' or > '~' && !(c is >= '\u00a1' and <= '\u024f' && c != '\u00ad') && !(c is >= '\u0391' and <= '\u03c9'))
            {
                return false;
            }

            if (c == ' ' && before == ' ')
            {
                return false;
            }

            before = c;
        }

        return text.Length == 0 || before != ' ';
    }

    private static bool IsUnseen(Rune rune) => Rune.GetUnicodeCategory(rune) is
        UnicodeCategory.Control or UnicodeCategory.Format or UnicodeCategory.PrivateUse
        or UnicodeCategory.OtherNotAssigned or UnicodeCategory.Surrogate;
}
