using SpecLint.Spec.Schema;
using SpecLint.Spec.Yaml;

namespace SpecLint.Spec.Documents;

/// <summary>Which keys belong to which machine: topology, arrangement and construction; what each machine needs; what is not covered yet.</summary>
internal static class Placement
{
    /// <summary>The one fault of a machine that is not computed yet, or null.</summary>
    internal static SpecFault? NotCovered(Func<string, SpecValue?> find)
    {
        var topology = find("machine.topology");
        var stator = find("machine.stator");
        bool isRadial = topology is { Text: "radial-flux" };
        bool isIron = stator is { Text: "slotted" or "slotless" };
        if (isRadial)
        {
            return new SpecFault(topology!.Key, "machine.topology is radial-flux, which is not covered yet; axial-flux or linear is expected", topology.ValueRegion)
            {
                Related = isIron ? stator!.ValueRegion : null,
                RelatedMessage = isIron ? $"machine.stator is {stator!.Text}, which is not covered yet either" : "",
            };
        }

        return isIron ? new SpecFault(stator!.Key, $"machine.stator is {stator.Text}, which is not covered yet; coreless is expected", stator.ValueRegion) : null;
    }

    /// <summary>Keys of another machine, one fault for the outermost of each.</summary>
    internal static IEnumerable<SpecFault> Strangers(IReadOnlyDictionary<string, Region> stated, Func<string, SpecValue?> find)
    {
        var reported = new List<string>();
        foreach (var (key, region) in stated.OrderBy(s => s.Key.Length).ThenBy(s => s.Value))
        {
            if (!reported.Exists(r => key.StartsWith(r, StringComparison.Ordinal) && key[r.Length] is '.' or '[')
                && KeyCatalogue.FindNode(key) is { } node
                && Stranger(node, key, region, find) is { } fault)
            {
                reported.Add(key);
                yield return fault;
            }
        }
    }

    /// <summary>The fault of one key that belongs to another machine, or null.</summary>
    internal static SpecFault? Stranger(SchemaNode node, string key, Region region, Func<string, SpecValue?> find)
    {
        if (node.Topologies.Length > 0 && find("machine.topology") is { } topology && !node.Topologies.Contains(topology.Text))
        {
            return new SpecFault(key, $"{key} belongs to {FaultText.Either(node.Topologies)} machines; machine.topology is {topology.Text}", region)
            {
                Related = topology.ValueRegion,
                RelatedMessage = $"machine.topology is {topology.Text}",
            };
        }

        foreach (var (name, words) in node.With)
        {
            if (find(name) is { } other && !words.Contains(other.Text))
            {
                return new SpecFault(key, $"{key} belongs to a machine with {name}: {FaultText.Either(words)}; {name} is {other.Text}", region)
                {
                    Related = other.ValueRegion,
                    RelatedMessage = $"{name} is {other.Text}",
                };
            }
        }

        return null;
    }

    /// <summary>What the stated machine needs beyond what every machine needs.</summary>
    internal static IEnumerable<(string Key, string Message)> Missing(IReadOnlyDictionary<string, Region> stated, Func<string, SpecValue?> find)
    {
        string topology = find("machine.topology")?.Text ?? "";
        if (topology is "axial-flux" or "linear" && !stated.ContainsKey("rotor.back-iron"))
        {
            yield return ("rotor.back-iron", "rotor.back-iron is missing; the iron behind the magnets, or none, is expected");
        }

        if (find("machine.stator")?.Text is "coreless" && stated.ContainsKey("winding") && !stated.ContainsKey("winding.coil.shape"))
        {
            yield return ("winding.coil.shape", "winding.coil.shape is missing; keystone, rectangle or round is expected");
        }

        if (find("machine.arrangement")?.Text is "rotor-and-return-plate" or "track-and-return-plate" && !stated.ContainsKey("rotor.return-plate"))
        {
            yield return ("rotor.return-plate", $"rotor.return-plate is missing; machine.arrangement {find("machine.arrangement")!.Text} has one");
        }
    }
}
