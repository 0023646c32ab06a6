using System.Collections.Immutable;
using System.Globalization;
using SpecLint.Spec.Yaml;

namespace SpecLint.Spec.Documents;

/// <summary>Gathers faults so that one cause is told once: the first fault of a key at a place stands.</summary>
internal sealed class FaultCollector
{
    /// <summary>Most faults of one spec that are told; a text with more is not a spec with slips.</summary>
    internal const int MostFaults = 200;

    private readonly List<SpecFault> _faults = [];
    private readonly HashSet<(string Key, Region Region)> _seen = [];

    internal void Add(SpecFault fault)
    {
        // Two absent keys share their parent's place; they are two causes.
        if (_seen.Add((fault.AbsentKey.Length > 0 ? fault.AbsentKey : fault.Key, fault.Region)))
        {
            _faults.Add(fault);
        }
    }

    /// <summary>True when a fault already offers this key for a mistyped one.</summary>
    internal bool Suggests(string key) =>
        _faults.Exists(f => f.SuggestedKey.Length > 0 && (f.SuggestedKey == key || key.StartsWith(f.SuggestedKey + ".", StringComparison.Ordinal)));

    internal ImmutableArray<SpecFault> InOrder()
    {
        var ordered = _faults.OrderBy(f => f.Region).ThenBy(f => f.Key, StringComparer.Ordinal).ThenBy(f => f.Message, StringComparer.Ordinal);
        if (_faults.Count <= MostFaults)
        {
            return [.. ordered];
        }

        var told = ordered.Take(MostFaults).ToList();
        told.Add(new SpecFault("", string.Create(CultureInfo.InvariantCulture, $"more than {MostFaults} faults; those after this place are not listed"), told[^1].Region));
        return [.. told];
    }
}
