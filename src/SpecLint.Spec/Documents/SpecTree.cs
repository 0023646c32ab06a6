using SpecLint.Spec.Schema;
using SpecLint.Spec.Yaml;

namespace SpecLint.Spec.Documents;

/// <summary>Walks the tree beside the schema and collects every leaf that can be read.</summary>
internal sealed class SpecTree
{
    private readonly List<SpecValue> _values = [];
    private readonly Dictionary<string, Region> _sections = new(StringComparer.Ordinal);
    private readonly List<SpecFault> _faults = [];
    private readonly Dictionary<string, Region> _stated = new(StringComparer.Ordinal);
    private string _topology = "";

    internal IReadOnlyList<SpecValue> Values => _values;

    internal IReadOnlyDictionary<string, Region> Sections => _sections;

    internal IReadOnlyList<SpecFault> Faults => _faults;

    /// <summary>Every known key that stands in the text, whether its value could be read or not.</summary>
    internal IReadOnlyDictionary<string, Region> Stated => _stated;

    internal static SpecTree Read(YamlMapping root)
    {
        var tree = new SpecTree { _topology = TopologyOf(root) };
        tree.ReadMapping(KeyCatalogue.Root, "", root, null);
        return tree;
    }

    private static string TopologyOf(YamlMapping root)
    {
        var machine = root.Entries.FirstOrDefault(e => e.Key.Text == "machine")?.Value as YamlMapping;
        return machine?.Entries.FirstOrDefault(e => e.Key.Text == "topology")?.Value is YamlScalar { Text: "axial-flux" or "radial-flux" or "linear" } word ? word.Text : "";
    }

    private void ReadMapping(SchemaNode node, string prefix, YamlMapping mapping, Region? alias)
    {
        foreach (var entry in mapping.Entries)
        {
            if (node.Child(entry.Key.Text) is { } child)
            {
                // The value of a measured figure stands under the figure's own name.
                bool isOwnValue = node.Quantity is "figure" && entry.Key.Text == node.ShortFor;
                string key = isOwnValue ? prefix : prefix.Length == 0 ? entry.Key.Text : $"{prefix}.{entry.Key.Text}";
                ReadNode(child, key, entry.Key.Region, entry.Value, alias);
            }
        }
    }

    private void ReadNode(SchemaNode node, string key, Region keyRegion, YamlNode value, Region? alias)
    {
        _stated.TryAdd(key, keyRegion);
        var site = value.AliasSite ?? alias;
        switch (value)
        {
            case YamlScalar scalar when node.TakesScalar:
                ReadLeaf(node, key, keyRegion, scalar with { AliasSite = site });
                break;
            case YamlMapping mapping when node.TakesMapping:
                _sections.TryAdd(key, keyRegion);
                ReadMapping(node, key, mapping, site);
                break;
            case YamlSequence list when node.Item is not null:
                ReadList(node.Item, key, keyRegion, list, site);
                break;
            default:
                // A value of the wrong shape is the schema check's to report.
                break;
        }
    }

    private void ReadLeaf(SchemaNode node, string key, Region keyRegion, YamlScalar scalar)
    {
        if (node.ShortFor.Length > 0 && node.Quantity is not "figure")
        {
            _sections.TryAdd(key, keyRegion);
            key = $"{key}.{node.ShortFor}";
            node = node.Child(node.ShortFor)!;
            _stated.TryAdd(key, keyRegion);
        }

        var read = LeafReader.Read(node, key, scalar, keyRegion, _topology, out var fault);
        if (read is not null)
        {
            _values.Add(read);
        }

        if (fault is not null)
        {
            _faults.Add(fault);
        }
    }

    private void ReadList(SchemaNode item, string key, Region keyRegion, YamlSequence list, Region? alias)
    {
        _values.Add(new SpecValue
        {
            Key = key,
            Kind = SpecValueKind.List,
            Text = "",
            Count = list.Items.Length,
            KeyRegion = keyRegion,
            ValueRegion = list.Region,
            AliasSite = alias,
        });
        for (int i = 0; i < list.Items.Length; i++)
        {
            var value = list.Items[i];
            ReadNode(item, string.Create(System.Globalization.CultureInfo.InvariantCulture, $"{key}[{i}]"), value.AliasSite ?? value.Region, value, alias);
        }
    }
}
