using System.Text;

namespace SpecLint.Reporting.Output;

/// <summary>Text that must not be read as Markdown.</summary>
internal static class MarkdownText
{
    private const string Marks = "\\`*_[]<>#|~!";

    /// <summary>The text with every mark of Markdown escaped.</summary>
    /// <param name="text">One line of text.</param>
    public static string Escape(string text)
    {
        var escaped = new StringBuilder(text.Length + 8);
        foreach (char c in text)
        {
            if (Marks.Contains(c, StringComparison.Ordinal))
            {
                escaped.Append('\\');
            }

            escaped.Append(c);
        }

        return escaped.ToString();
    }
}
