using System.Collections.Immutable;
using SpecLint.Spec.Yaml;

namespace SpecLint.Spec.Documents;

/// <summary>Gathers faults so that one cause is told once: the first fault of a key at a place stands.</summary>
internal sealed class FaultCollector
{
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

    internal ImmutableArray<SpecFault> InOrder() =>
        [.. _faults.OrderBy(f => f.Region).ThenBy(f => f.Key, StringComparer.Ordinal).ThenBy(f => f.Message, StringComparer.Ordinal)];
}
