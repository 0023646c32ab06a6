using System.Collections.Immutable;
using SpecLint.Spec.Schema;
using SpecLint.Spec.Yaml;

namespace SpecLint.Spec.Documents;

/// <summary>Reads a spec: text, schema, units and tolerances, keys of its topology, and sizes that contradict each other.</summary>
public static class SpecReader
{
    /// <summary>A long spec has some hundred values; the check of a stranger's text must not take seconds.</summary>
    private static readonly YamlLimits Limits = YamlLimits.Default with { Nodes = 10_000 };

    /// <summary>Reads a spec. Whatever the bytes are, the result holds every leaf that could be read and every fault.</summary>
    /// <param name="path">Path as given on the command line, with <c>/</c> between segments.</param>
    /// <param name="bytes">The bytes of the file.</param>
    public static SpecDocument Read(string path, ReadOnlySpan<byte> bytes)
    {
        _ = SchemaCheck.Prepare();
        var yaml = YamlReader.Read(bytes, Limits);
        var faults = new FaultCollector();
        foreach (var fault in yaml.Faults)
        {
            faults.Add(new SpecFault("", fault.Message, fault.Region) { Related = fault.Related, RelatedMessage = fault.RelatedMessage });
        }

        if (yaml.Root is not YamlMapping root)
        {
            if (yaml.Root is not null)
            {
                var (found, place) = yaml.Root switch
                {
                    YamlSequence list => ("is a list", list.Region),
                    YamlScalar scalar when CoreSchema.IsNull(scalar) => ("holds no keys", Region.Beginning),
                    _ => ("is a single value", yaml.Root.Region),
                };
                faults.Add(new SpecFault("", $"the text {found}; a mapping with keys such as machine and magnets is expected", place));
            }

            return new SpecDocument(path, yaml.Text, [], [], faults.InOrder());
        }

        var tree = SpecTree.Read(root);
        var document = new SpecDocument(path, yaml.Text, tree.Values, tree.Sections, []);
        Check(root, tree, document, faults);
        return new SpecDocument(path, yaml.Text, tree.Values, tree.Sections, faults.InOrder());
    }

    private static void Check(YamlMapping root, SpecTree tree, SpecDocument document, FaultCollector faults)
    {
        // A construction that is not covered is one fault: its arrangement follows from it and is no second one.
        var notCovered = Placement.NotCovered(document.Find);
        foreach (var fault in tree.Faults)
        {
            if (notCovered is null || !string.Equals(fault.Key, "machine.arrangement", StringComparison.Ordinal))
            {
                faults.Add(fault);
            }
        }

        if (notCovered is not null)
        {
            faults.Add(notCovered);
        }
        else
        {
            foreach (var fault in Placement.Strangers(tree.Stated, document.Find))
            {
                faults.Add(fault);
            }

            foreach (var fault in Contradictions.Find(document.Find))
            {
                faults.Add(fault);
            }
        }

        foreach (var fault in SchemaCheck.Check(root))
        {
            if (notCovered is null || fault.AbsentKey.Length == 0)
            {
                faults.Add(fault);
            }
        }

        foreach (var (key, message) in notCovered is null ? Placement.Missing(tree.Stated, document.Find) : [])
        {
            if (!faults.Suggests(key))
            {
                var (parent, region) = document.NearestParent(key);
                faults.Add(new SpecFault(parent, message, region) { AbsentKey = key });
            }
        }
    }
}
