using System.Collections.Frozen;
using System.Collections.Immutable;
using SpecLint.Spec.Yaml;

namespace SpecLint.Spec.Documents;

/// <summary>A spec as read: every leaf by dotted key with its place, and every fault found on the way.</summary>
public sealed class SpecDocument
{
    private readonly FrozenDictionary<string, SpecValue> _values;
    private readonly FrozenDictionary<string, Region> _sections;

    internal SpecDocument(
        string path,
        string text,
        IEnumerable<SpecValue> values,
        IEnumerable<KeyValuePair<string, Region>> sections,
        ImmutableArray<SpecFault> faults)
    {
        Path = path;
        Text = text;
        Faults = faults;
        Values = [.. values];
        _values = Values.ToFrozenDictionary(v => v.Key, StringComparer.Ordinal);
        _sections = sections.ToFrozenDictionary(StringComparer.Ordinal);
    }

    /// <summary>Path as given on the command line, with <c>/</c> between segments.</summary>
    public string Path { get; }

    /// <summary>The whole text; empty when it could not be decoded.</summary>
    public string Text { get; }

    /// <summary>Every fault, in order of position.</summary>
    public ImmutableArray<SpecFault> Faults { get; }

    /// <summary>Every leaf that could be read, in order of position.</summary>
    public ImmutableArray<SpecValue> Values { get; }

    /// <summary>The leaf of a dotted key, or null when the spec does not state it.</summary>
    /// <param name="key">Dotted key.</param>
    public SpecValue? Find(string key) => _values.GetValueOrDefault(key);

    /// <summary>True when the spec states the key, as a leaf or as a section.</summary>
    /// <param name="key">Dotted key.</param>
    public bool States(string key) => _values.ContainsKey(key) || _sections.ContainsKey(key);

    /// <summary>Where the key itself stands in the text, for a leaf or a section that the spec states; else null.</summary>
    /// <param name="key">Dotted key.</param>
    public Region? KeyRegion(string key) =>
        _values.TryGetValue(key, out var value) ? value.KeyRegion : _sections.TryGetValue(key, out var region) ? region : null;

    /// <summary>The nearest stated parent of a missing key and its place; the document's first line when none is stated.</summary>
    /// <param name="key">Dotted key.</param>
    public (string Key, Region Region) NearestParent(string key)
    {
        for (int dot = key.LastIndexOf('.'); dot > 0; dot = key.LastIndexOf('.', dot - 1))
        {
            string parent = key[..dot];
            if (KeyRegion(parent) is { } region)
            {
                return (parent, region);
            }
        }

        return ("", Region.Beginning);
    }

    /// <summary>The same spec with one leaf replaced or added; places stay those of the text as written.</summary>
    /// <param name="value">The new leaf.</param>
    public SpecDocument With(SpecValue value)
    {
        var values = Values.Where(v => !string.Equals(v.Key, value.Key, StringComparison.Ordinal)).Append(value);
        return new SpecDocument(Path, Text, values, _sections, Faults);
    }
}
