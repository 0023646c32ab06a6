using SpecLint.Spec.Names;
using SpecLint.Spec.Schema;
using SpecLint.Spec.Units;

namespace SpecLint.Spec.Documents;

/// <summary>The phrases that faults of a spec are made of.</summary>
internal static class FaultText
{
    private const int MostShown = 60;

    /// <summary>A stranger's text, short and on one line.</summary>
    internal static string Shown(string text)
    {
        string line = text.ReplaceLineEndings(" ");
        return line.Length == 0 ? "empty" : line.Length <= MostShown ? line : $"{line[..MostShown]}…";
    }

    internal static string Either(IReadOnlyList<string> words) =>
        words.Count == 1 ? words[0] : $"{string.Join(", ", words.Take(words.Count - 1))} or {words[^1]}";

    /// <summary>What a key takes, with its article and an example.</summary>
    internal static string Wanted(SchemaNode node, string topology)
    {
        if (node.Item is not null)
        {
            return "a list";
        }

        string mapping = node.Children.Length > 0 ? $"a mapping with keys such as {string.Join(", ", node.Children.Take(3).Select(c => c.Name))}" : "";
        string scalar = node switch
        {
            { Words.Length: > 0 } => Either(node.Words),
            { Quantity: "flag" } => "true or false",
            { Quantity: "text" } => node.Examples.Length > 0 ? $"a text such as {node.Examples[0]}" : "a text",
            { Quantity: "figure" } => "a number with a unit",
            _ => node.KindFor(topology) is { } kind ? $"{kind.Noun} such as {(node.Quantity is "speed" ? kind.Example : node.Examples.FirstOrDefault(kind.Example))}" : "",
        };
        return scalar.Length > 0 && mapping.Length > 0 ? $"{scalar}, or {mapping}" : scalar + mapping;
    }

    internal static string NotAmong(SchemaNode node, string text)
    {
        string meant = NearestName.Of(text, node.Words) is { } near ? $"; is {near} meant?" : "";
        string others = node.Children.Length > 0 ? $", or a mapping with keys such as {string.Join(", ", node.Children.Take(3).Select(c => c.Name))}," : "";
        return $"is {Shown(text)}; {Either(node.Words)}{others} is expected{meant}";
    }
}
