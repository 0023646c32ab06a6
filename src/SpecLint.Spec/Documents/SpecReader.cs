using System.Collections.Immutable;
using SpecLint.Spec.Schema;
using SpecLint.Spec.Yaml;

namespace SpecLint.Spec.Documents;

/// <summary>Reads a spec: text, schema, units and tolerances, keys of its topology, and sizes that contradict each other.</summary>
public static class SpecReader
{
    /// <summary>Reads a spec. Whatever the bytes are, the result holds every leaf that could be read and every fault.</summary>
    /// <param name="path">Path as given on the command line, with <c>/</c> between segments.</param>
    /// <param name="bytes">The bytes of the file.</param>
    public static SpecDocument Read(string path, ReadOnlySpan<byte> bytes)
    {
        _ = SchemaCheck.Prepare();
        var yaml = YamlReader.Read(bytes, YamlLimits.Default);
        var faults = new FaultCollector();
        foreach (var fault in yaml.Faults)
        {
            faults.Add(new SpecFault("", fault.Message, fault.Region) { Related = fault.Related, RelatedMessage = fault.RelatedMessage });
        }

        if (yaml.Root is not YamlMapping root)
        {
            if (yaml.Root is not null)
            {
                string found = yaml.Root is YamlSequence ? "a list" : "a single value";
                faults.Add(new SpecFault("", $"the text is {found}; a mapping with keys such as machine and magnets is expected", yaml.Root.Region));
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
        foreach (var fault in tree.Faults)
        {
            faults.Add(fault);
        }

        var notCovered = Placement.NotCovered(document.Find);
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
