using System.Buffers;
using System.Globalization;
using System.Text;

namespace SpecLint.Reporting.Sheets;

/// <summary>Emphasis of a stretch of text.</summary>
internal enum Emphasis
{
    /// <summary>None.</summary>
    Plain,

    /// <summary>A heading.</summary>
    Heading,

    /// <summary>Less important than its surroundings.</summary>
    Quiet,

    /// <summary>The word of a hold.</summary>
    Hold,

    /// <summary>The word of a query.</summary>
    Query,

    /// <summary>The word of a remark.</summary>
    Remark,
}

/// <summary>Lines of text within a number of columns.</summary>
internal sealed class TextPage
{
    private static readonly SearchValues<char> NumberSigns = SearchValues.Create("+-.0123456789e");

    private readonly TextWriter _writer;
    private readonly bool _usesColour;

    /// <summary>A page over a writer.</summary>
    /// <param name="writer">Where the lines go; each ends with <c>\n</c> alone.</param>
    /// <param name="options">Width and colour.</param>
    public TextPage(TextWriter writer, SheetOptions options)
    {
        _writer = writer;
        Width = Math.Max(40, options.Width);
        _usesColour = options.UsesColour;
    }

    /// <summary>Columns to stay within.</summary>
    public int Width { get; }

    /// <summary>Number of columns a text takes on a terminal.</summary>
    /// <param name="text">One line without control characters.</param>
    public static int Columns(string text)
    {
        int columns = 0;
        foreach (Rune rune in text.EnumerateRunes())
        {
            columns += Rune.GetUnicodeCategory(rune) is UnicodeCategory.NonSpacingMark or UnicodeCategory.EnclosingMark ? 0 : IsWide(rune.Value) ? 2 : 1;
        }

        return columns;
    }

    /// <summary>The text with spaces behind it up to a number of columns.</summary>
    /// <param name="text">One line.</param>
    /// <param name="columns">Columns to fill.</param>
    public static string Pad(string text, int columns) => text + new string(' ', Math.Max(0, columns - Columns(text)));

    /// <summary>An empty line.</summary>
    public void Blank() => _writer.Write('\n');

    /// <summary>A line across the page.</summary>
    public void Bar() => Line(new string('─', Width), Emphasis.Quiet);

    /// <summary>One line as it is.</summary>
    /// <param name="text">The line.</param>
    /// <param name="emphasis">Its emphasis.</param>
    public void Line(string text, Emphasis emphasis = Emphasis.Plain)
    {
        _writer.Write(Emphasise(text.TrimEnd(), emphasis));
        _writer.Write('\n');
    }

    /// <summary>A section's heading with an empty line before it.</summary>
    /// <param name="text">The heading.</param>
    public void Heading(string text)
    {
        Blank();
        Wrapped("", text, Emphasis.Heading);
    }

    /// <summary>Text wrapped at words; lines after the first are indented as wide as the lead.</summary>
    /// <param name="lead">What stands before the first line, indentation included.</param>
    /// <param name="text">The text.</param>
    /// <param name="emphasis">Emphasis of the lead, or of the text when the lead is blank.</param>
    public void Wrapped(string lead, string text, Emphasis emphasis = Emphasis.Plain)
    {
        int indent = Columns(lead);
        bool emphasisesLead = !string.IsNullOrWhiteSpace(lead);
        bool isFirst = true;
        foreach (string line in Break(text, Width - indent))
        {
            string head = isFirst ? lead : new string(' ', indent);
            _writer.Write(emphasisesLead && isFirst ? Emphasise(head, emphasis) : head);
            _writer.Write(emphasisesLead ? line : Emphasise(line, emphasis));
            _writer.Write('\n');
            isFirst = false;
        }
    }

    /// <summary>One line whose spaces are kept, behind a lead.</summary>
    /// <param name="lead">What stands before it.</param>
    /// <param name="text">The text, known to fit.</param>
    /// <param name="emphasis">Emphasis of the lead.</param>
    public void Columned(string lead, string text, Emphasis emphasis)
    {
        _writer.Write(string.IsNullOrWhiteSpace(lead) ? lead : Emphasise(lead, emphasis));
        _writer.Write(text.TrimEnd());
        _writer.Write('\n');
    }

    private static IEnumerable<string> Break(string text, int columns)
    {
        var line = new StringBuilder();
        int used = 0;
        foreach (string word in Words(text))
        {
            int width = Columns(word);
            if (used > 0 && used + 1 + width > columns)
            {
                yield return line.ToString();
                line.Clear();
                used = 0;
            }

            if (used > 0)
            {
                line.Append(' ');
                used++;
            }

            line.Append(word);
            used += width;
        }

        yield return line.ToString();
    }

    /// <summary>Words, with a number kept beside the unit or sign that follows it, and the word line beside its number.</summary>
    private static IEnumerable<string> Words(string text)
    {
        string[] words = text.Split(' ', StringSplitOptions.RemoveEmptyEntries);
        for (int i = 0; i < words.Length; i++)
        {
            bool isNumber = char.IsAsciiDigit(words[i][^1]) && words[i].AsSpan().IndexOfAnyExcept(NumberSigns) < 0;
            bool hasNext = i + 1 < words.Length;
            if (hasNext && (isNumber ? words[i + 1].Length <= 10 && IsUnit(words[i + 1]) : words[i] == "line" && char.IsAsciiDigit(words[i + 1][0])))
            {
                yield return $"{words[i]} {words[i + 1]}";
                i++;
            }
            else
            {
                yield return words[i];
            }
        }
    }

    private static bool IsUnit(string word)
    {
        string bare = word.TrimEnd('.', ',', ';', ':', ')');
        return bare is "±" || Spec.Units.UnitTable.TryFind(bare, out _);
    }

    private string Emphasise(string text, Emphasis emphasis)
    {
        if (!_usesColour || emphasis == Emphasis.Plain || text.Length == 0)
        {
            return text;
        }

        string code = emphasis switch
        {
            Emphasis.Heading => "1",
            Emphasis.Quiet => "2",
            Emphasis.Hold => "1;31",
            Emphasis.Query => "1;33",
            _ => "1;34",
        };
        return $"\u001b[{code}m{text}\u001b[0m";
    }

    private static bool IsWide(int code) => code is
        (>= 0x1100 and <= 0x115f) or (>= 0x2e80 and <= 0xa4cf) or (>= 0xac00 and <= 0xd7a3) or (>= 0xf900 and <= 0xfaff)
        or (>= 0xfe30 and <= 0xfe6f) or (>= 0xff00 and <= 0xff60) or (>= 0xffe0 and <= 0xffe6) or (>= 0x1f300 and <= 0x1faff)
        or (>= 0x20000 and <= 0x3fffd);
}
