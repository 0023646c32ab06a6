using System.Text;
using Microsoft.CodeAnalysis.Sarif;
using SpecLint.Reporting.Output;

namespace SpecLint.Reporting.Sarif;

/// <summary>Text as SARIF messages want it.</summary>
internal static class SarifText
{
    /// <summary>
    /// A message: one harmless line that ends with a stop. Braces are doubled, since SARIF reads them as placeholders;
    /// brackets get a backslash only where the text would otherwise be read as an embedded link.
    /// </summary>
    /// <param name="text">Any text.</param>
    public static string Escape(string text)
    {
        string line = Double(Printable.Sentence(text));
        return line.Contains("](", StringComparison.Ordinal)
            ? line.Replace("\\", "\\\\", StringComparison.Ordinal)
                .Replace("[", "\\[", StringComparison.Ordinal)
                .Replace("]", "\\]", StringComparison.Ordinal)
            : line;
    }

    /// <summary>The text with braces doubled.</summary>
    /// <param name="text">Any text.</param>
    public static string Double(string text) =>
        text.Replace("{", "{{", StringComparison.Ordinal).Replace("}", "}}", StringComparison.Ordinal);

    /// <summary>A message object with escaped text.</summary>
    /// <param name="text">Any text.</param>
    public static Message Message(string text) => new() { Text = Escape(text) };

    /// <summary>A description with escaped text.</summary>
    /// <param name="text">Any text.</param>
    public static MultiformatMessageString Description(string text) => new() { Text = Escape(text) };

    /// <summary>
    /// A headline as one word of capitalised words, letters and digits only: <c>CoilHoleWiderThanTheMagnet</c>. Abbreviations are
    /// written like words and single letters join what follows, so that every capital begins a word.
    /// </summary>
    /// <param name="title">The headline.</param>
    public static string PascalCase(string title)
    {
        var name = new StringBuilder(title.Length);
        int length = 0;
        foreach (char c in title)
        {
            if (char.IsAsciiLetterOrDigit(c))
            {
                bool begins = length == 0 && (name.Length == 0 || char.IsAsciiLetterLower(name[^1]));
                name.Append(begins ? char.ToUpperInvariant(c) : char.ToLowerInvariant(c));
                length++;
            }
            else if (c != '\'')
            {
                length = 0;
            }
        }

        return name.Length == 0 ? "Rule" : name.ToString();
    }
}
