using SpecLint.Spec.Schema;
using SpecLint.Spec.Yaml;

namespace SpecLint.Spec.Documents;

/// <summary>Sets one value of a spec from text, as a what-if.</summary>
internal static class SpecChange
{
    internal static SpecDocument Apply(SpecDocument document, string key, string text, out SpecFault? fault)
    {
        if (KeyCatalogue.FindNode(key) is not { } node)
        {
            string meant = KeyCatalogue.Nearest(key) is { } near ? $"; is {near} meant?" : "";
            fault = new SpecFault(key, $"{FaultText.Shown(key)} is not a key of a spec{meant}", Region.Beginning);
            return document;
        }

        if (node.ShortFor.Length > 0 && node.Quantity is not "figure")
        {
            key = $"{key}.{node.ShortFor}";
            node = node.Child(node.ShortFor)!;
        }

        if (!node.TakesScalar)
        {
            string below = node.Children.Length > 0 ? $"; one of its keys, such as {node.Children[0].Key}, is expected" : "; it is a list";
            fault = new SpecFault(key, $"{key} takes no single value{below}", document.KeyRegion(key) ?? document.NearestParent(key).Region);
            return document;
        }

        var old = document.Find(key);
        var place = document.KeyRegion(key) ?? document.NearestParent(key).Region;
        var scalar = new YamlScalar(old?.ValueRegion ?? place, text.Trim(), IsPlain: true) { AliasSite = old?.AliasSite };
        string topology = document.Find("machine.topology")?.Text ?? "";
        var read = LeafReader.Read(node, key, scalar, place, topology, out fault);
        fault ??= Placement.Stranger(node, key, place, document.Find);
        if (read is null || fault is not null)
        {
            return document;
        }

        // A scalar form replaces the mapping form and the other way round: ambient for its min and max, back-iron none for a plate.
        string parent = key.LastIndexOf('.') is > 0 and var dot ? key[..dot] : "";
        var values = document.Values
            .Where(v => v.Key != key && v.Key != parent && !v.Key.StartsWith(key + ".", StringComparison.Ordinal))
            .Append(read);
        var changed = document.Rebuilt(values, document.Faults.Where(f => f.Key != key));
        fault = Placement.NotCovered(changed.Find) ?? Contradictions.Find(changed.Find).Except(document.Faults).FirstOrDefault();
        return fault is null ? changed : document;
    }
}
