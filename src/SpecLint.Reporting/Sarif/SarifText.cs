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

    /// <summary>A headline as one word in Pascal case, letters and digits only: <c>CoilHoleWiderThanTheMagnet</c>.</summary>
    /// <param name="title">The headline.</param>
    public static string PascalCase(string title)
    {
        var name = new System.Text.StringBuilder(title.Length);
        bool starts = true;
        foreach (char c in title)
        {
            if (!char.IsAsciiLetterOrDigit(c))
            {
                starts = starts || c != '\'';
                continue;
            }

            name.Append(starts ? char.ToUpperInvariant(c) : c);
            starts = false;
        }

        return name.Length == 0 ? "Rule" : name.ToString();
    }
}
