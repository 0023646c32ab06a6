using YamlDotNet.Core;

namespace SpecLint.Spec.Yaml;

/// <summary>Says in plain words what the parser stumbled over.</summary>
internal static class YamlSyntaxFault
{
    internal static YamlFault From(YamlException syntax, string text)
    {
        int line = Math.Max(1, (int)syntax.Start.Line);
        int column = Math.Max(1, (int)syntax.Start.Column);
        string said = syntax.Message;
        if (FirstTab(text, line, Has(said, "tab") ? int.MaxValue : line + 1) is { } tab)
        {
            return new YamlFault("a tab stands in the indentation; YAML allows only spaces there", tab);
        }

        if (Has(said, "flow mapping") && AnchorBefore(text, line, column) is { } anchor)
        {
            // The library stops at the ',' after an anchored scalar between braces, though YAML allows it.
            return new YamlFault("an anchor '&name' on a single value between '{' and '}' cannot be read here; write this mapping with one key a line", anchor);
        }

        return new YamlFault(Sentence(said), new Region(line, column, line, column + 1));
    }

    private static string Sentence(string said) =>
        Has(said, "undefined tag handle") ? "this tag is not known; plain values are expected" :
        Has(said, "anchor or alias") ? "the name of an anchor '&name' or alias '*name' is missing here" :
        Has(said, "cannot start any token") ? "this character cannot begin a value; put the text in quotes" :
        Has(said, "unknown escape") ? "this escape is not known in a quoted text; use single quotes" :
        Has(said, "wrong indentation") ? "a line of the quoted text opened here is not indented far enough" :
        Has(said, "quoted scalar") ? "the quotes opened here are not closed" :
        Has(said, "invalid mapping") || Has(said, "mapping values are not allowed") ? "a ':' stands here inside a value; check this line's indentation, or put text that holds ': ' in quotes" :
        Has(said, "simple key") ? "a ':' is missing after this key, or the line is indented wrongly" :
        Has(said, "flow sequence") ? "the list '[' is not closed here, or a ',' is missing" :
        Has(said, "flow mapping") ? "the mapping '{' is not closed here, or a ',' is missing" :
        Has(said, "block mapping") ? "this does not fit the keys above it; check indentation, quotes and brackets" :
        Has(said, "block collection") ? "this line does not fit the list above it; check its indentation and '-'" :
        Has(said, "Block sequence entries") ? "a list item '-' stands here after a key; begin it on a line of its own" :
        Has(said, "node content") ? "a value is expected here" :
        Has(said, "document end") ? "text stands here after the end of the value; check quotes and brackets" :
        Has(said, "document start") || Has(said, "expected token") ? "text stands here outside the document" :
        Has(said, "block scalar") ? "the first line of a text after '|' or '>' is indented less than an empty line above it" :
        Has(said, "comment") ? "a comment '#' needs a space before it" :
        Has(said, "Mapping keys are not allowed") ? "a '?' stands here; put text that begins with it in quotes" :
        Has(said, "nchor") ? "an anchor '&name' cannot stand here" :
        Has(said, "incompatible") || Has(said, "directive") ? "the directive '%' here is not one of YAML 1.2" :
        "this is not YAML; check indentation, quotes and brackets near here";

    private static bool Has(string text, string part) => text.Contains(part, StringComparison.OrdinalIgnoreCase);

    private static Region? AnchorBefore(string text, int line, int column)
    {
        int current = 0;
        foreach (var piece in text.AsSpan().EnumerateLines())
        {
            if (++current == line)
            {
                int at = piece[..Math.Min(piece.Length, column - 1)].LastIndexOf(" &");
                return at < 0 ? null : new Region(line, at + 2, line, at + 3);
            }
        }

        return null;
    }

    /// <summary>The first tab that stands in the indentation of some lines; blank lines do not count.</summary>
    private static Region? FirstTab(string text, int from, int to)
    {
        int line = 0;
        foreach (var piece in text.AsSpan().EnumerateLines())
        {
            line++;
            int content = piece.IndexOfAnyExcept(' ', '\t', '-');
            int tab = content < 0 ? -1 : piece[..content].IndexOf('\t');
            if (line >= from && tab >= 0)
            {
                return new Region(line, tab + 1, line, tab + 2);
            }

            if (line >= to)
            {
                break;
            }
        }

        return null;
    }
}
