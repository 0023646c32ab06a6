using System.Collections.Immutable;
using SpecLint.Spec.Yaml;

namespace SpecLint.Spec.Documents;

/// <summary>A spec as read: every leaf by dotted key with its place, and every fault found on the way.</summary>
public sealed class SpecDocument
{
    private readonly Dictionary<string, SpecValue> _values;
    private readonly Dictionary<string, Region> _sections;

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
        _values = new Dictionary<string, SpecValue>(Values.Length, StringComparer.Ordinal);
        foreach (var value in Values)
        {
            _values.TryAdd(value.Key, value);
        }

        _sections = new Dictionary<string, Region>(sections, StringComparer.Ordinal);
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
    public SpecDocument With(SpecValue value) => With([value]);

    /// <summary>The same spec with some leaves replaced or added; places stay those of the text as written.</summary>
    /// <param name="values">The new leaves, each key once.</param>
    public SpecDocument With(IReadOnlyCollection<SpecValue> values)
    {
        var keys = values.Select(v => v.Key).ToHashSet(StringComparer.Ordinal);
        return new SpecDocument(Path, Text, Values.Where(v => !keys.Contains(v.Key)).Concat(values), _sections, Faults);
    }

    /// <summary>The same spec with one value set from text, read exactly as if it stood in the file.</summary>
    /// <param name="key">Dotted key; an unknown one is a fault that names the nearest known key.</param>
    /// <param name="text">The value with its unit, such as <c>12 mm ± 0.1 mm</c>.</param>
    /// <param name="fault">What is wrong; null when the value was set.</param>
    /// <returns>The changed spec; this one when there is a fault.</returns>
    /// <remarks>An absent key takes the place of its nearest stated parent.</remarks>
    public SpecDocument WithText(string key, string text, out SpecFault? fault) => SpecChange.Apply(this, key, text, out fault);

    internal SpecDocument Rebuilt(IEnumerable<SpecValue> values, IEnumerable<SpecFault> faults) =>
        new(Path, Text, values, _sections, [.. faults]);

    internal bool HasSection(string key) => _sections.ContainsKey(key);
}
