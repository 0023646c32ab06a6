using YamlDotNet.Core;

namespace SpecLint.Spec.Yaml;

/// <summary>Says in plain words what the parser stumbled over.</summary>
internal static class YamlSyntaxFault
{
    internal static YamlFault From(YamlException syntax, string text)
    {
        int line = Math.Max(1, (int)syntax.Start.Line);
        int column = Math.Max(1, (int)syntax.Start.Column);
        foreach (int candidate in (ReadOnlySpan<int>)[line, line - 1, line + 1, (int)syntax.End.Line])
        {
            if (TabColumn(LineOf(text, candidate)) is int tab)
            {
                return new YamlFault("a tab stands in the indentation; YAML allows only spaces there", new Region(candidate, tab, candidate, tab + 1));
            }
        }

        string said = syntax.Message;
        string message =
            Has(said, "found undefined tag handle") ? "this tag is not known; plain values are expected" :
            Has(said, "anchor") || Has(said, "alias") ? "an anchor '&name' or alias '*name' is not complete here" :
            Has(said, "cannot start any token") ? "this character cannot begin a value; put the text in quotes" :
            Has(said, "simple key") ? "a ':' is missing after this key, or the line is indented wrongly" :
            Has(said, "quoted scalar") || Has(said, "end of stream") && Has(said, "scalar") ? "the quotes opened here are not closed" :
            Has(said, "mapping values are not allowed") ? "a second ':' stands on this line, or the line is indented wrongly; put text that holds ': ' in quotes" :
            Has(said, "flow sequence") ? "the list '[' opened here is not closed, or a ',' is missing" :
            Has(said, "flow mapping") ? "the mapping '{' opened here is not closed, or a ',' is missing" :
            Has(said, "block mapping") ? "this line does not fit the keys above it; check its indentation" :
            Has(said, "block collection") || Has(said, "block sequence") || Has(said, "block entr") ? "this line does not fit the list above it; check its indentation and '-'" :
            Has(said, "escape") ? "this escape is not known in a quoted text; use single quotes" :
            Has(said, "directive") || Has(said, "document start") ? "a directive '%' is not complete here, or text stands outside the document" :
            "this is not YAML; check indentation, quotes and brackets near here";
        return new YamlFault(message, new Region(line, column, line, column + 1));
    }

    private static bool Has(string text, string part) => text.Contains(part, StringComparison.OrdinalIgnoreCase);

    private static int? TabColumn(ReadOnlySpan<char> line)
    {
        int content = line.IndexOfAnyExcept(' ', '\t', '-');
        int tab = (content < 0 ? line : line[..content]).IndexOf('\t');
        return tab < 0 || content < 0 ? null : tab + 1;
    }

    private static ReadOnlySpan<char> LineOf(string text, int line)
    {
        int current = 1;
        foreach (var piece in text.AsSpan().EnumerateLines())
        {
            if (current++ == line)
            {
                return piece;
            }
        }

        return default;
    }
}
