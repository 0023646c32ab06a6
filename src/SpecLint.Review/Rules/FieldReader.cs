using System.Collections.Immutable;
using SpecLint.Spec.Names;
using SpecLint.Spec.Yaml;

namespace SpecLint.Review.Rules;

/// <summary>Reads the fields of one mapping of a rulebook or table file and reports those that do not belong.</summary>
internal sealed class FieldReader
{
    private readonly YamlMapping _mapping;
    private readonly string _what;
    private readonly FaultList _faults;

    private FieldReader(YamlMapping mapping, string what, FaultList faults)
    {
        _mapping = mapping;
        _what = what;
        _faults = faults;
    }

    public Region Region => _mapping.Region;

    /// <summary>A reader of a mapping, or null when the node is none; fields that are not allowed are faults.</summary>
    public static FieldReader? Open(YamlNode? node, Region place, string what, ImmutableArray<string> allowed, FaultList faults)
    {
        if (node is not YamlMapping mapping)
        {
            faults.Add($"{what} is {Describe(node)}; expected fields with values", node?.Region ?? place);
            return null;
        }

        foreach (YamlEntry entry in mapping.Entries)
        {
            if (allowed.Length > 0 && !allowed.Contains(entry.Key.Text, StringComparer.Ordinal))
            {
                faults.Add($"{what} has no field {Short(entry.Key.Text)}{NearestName.Suggestion(entry.Key.Text, allowed)}", entry.Key.Region);
            }
        }

        return new FieldReader(mapping, what, faults);
    }

    /// <summary>The field's value, or null when it is not there.</summary>
    public YamlNode? Find(string name)
    {
        foreach (YamlEntry entry in _mapping.Entries)
        {
            if (string.Equals(entry.Key.Text, name, StringComparison.Ordinal))
            {
                return entry.Value;
            }
        }

        return null;
    }

    /// <summary>True when the field is there.</summary>
    public bool Has(string name) => Find(name) is not null;

    /// <summary>Where the field's key stands; the mapping's beginning when it is not there.</summary>
    public Region KeyRegion(string name)
    {
        foreach (YamlEntry entry in _mapping.Entries)
        {
            if (string.Equals(entry.Key.Text, name, StringComparison.Ordinal))
            {
                return entry.Key.Region;
            }
        }

        return _mapping.Entries.Length > 0 ? _mapping.Entries[0].Key.Region : _mapping.Region;
    }

    /// <summary>A field with one text, or null when it is not there or no text.</summary>
    public YamlScalar? Scalar(string name)
    {
        YamlNode? node = Find(name);
        if (node is null or YamlScalar)
        {
            return node as YamlScalar;
        }

        _faults.Add($"{name} is {Describe(node)}; expected one text", node.Region);
        return null;
    }

    /// <summary>A field that must be there and not be blank; empty after a fault.</summary>
    public string Required(string name)
    {
        if (!Has(name))
        {
            _faults.Add($"{_what} lacks the field {name}", KeyRegion(name));
            return "";
        }

        YamlScalar? scalar = Scalar(name);
        if (scalar is not null && string.IsNullOrWhiteSpace(scalar.Text))
        {
            _faults.Add($"{name} is empty; expected a text", scalar.Region);
        }

        return scalar?.Text.Trim() ?? "";
    }

    /// <summary>A field with one of some words; the given default when it is not there or after a fault.</summary>
    public T Word<T>(string name, ImmutableArray<(string Word, T Value)> words, T otherwise)
    {
        if (Scalar(name) is not { } scalar)
        {
            return otherwise;
        }

        foreach (var (word, value) in words)
        {
            if (string.Equals(scalar.Text, word, StringComparison.Ordinal))
            {
                return value;
            }
        }

        _faults.Add($"{name} is {Short(scalar.Text)}; expected {string.Join(" or ", words.Select(w => w.Word))}", scalar.Region);
        return otherwise;
    }

    /// <summary>A field with a list of texts, or one text in its place; empty when it is not there.</summary>
    public ImmutableArray<YamlScalar> Scalars(string name)
    {
        switch (Find(name))
        {
            case null:
                return [];
            case YamlScalar one:
                return [one];
            case YamlSequence list:
                foreach (YamlNode item in list.Items)
                {
                    if (item is not YamlScalar)
                    {
                        _faults.Add($"an item of {name} is {Describe(item)}; expected a text", item.Region);
                    }
                }

                return [.. list.Items.OfType<YamlScalar>()];
            case var other:
                _faults.Add($"{name} is {Describe(other)}; expected a list of texts", other.Region);
                return [];
        }
    }

    /// <summary>A field that maps names to texts; empty when it is not there.</summary>
    public ImmutableArray<(YamlScalar Key, YamlScalar Value)> Texts(string name)
    {
        YamlNode? node = Find(name);
        if (node is not YamlMapping mapping)
        {
            if (node is not null)
            {
                _faults.Add($"{name} is {Describe(node)}; expected names with texts", node.Region);
            }

            return [];
        }

        var texts = ImmutableArray.CreateBuilder<(YamlScalar, YamlScalar)>();
        foreach (YamlEntry entry in mapping.Entries)
        {
            if (entry.Value is YamlScalar value)
            {
                texts.Add((entry.Key, value));
            }
            else
            {
                _faults.Add($"{Short(entry.Key.Text)} is {Describe(entry.Value)}; expected a text", entry.Value.Region);
            }
        }

        return texts.ToImmutable();
    }

    /// <summary>A text cut to a length that fits a message.</summary>
    public static string Short(string text)
    {
        const int Longest = 60;
        return text.Length <= Longest ? text : string.Concat(text.AsSpan(0, char.IsHighSurrogate(text[Longest - 1]) ? Longest - 1 : Longest), "…");
    }

    private static string Describe(YamlNode? node) => node switch
    {
        null => "empty",
        YamlMapping => "a mapping",
        YamlSequence => "a list",
        YamlScalar { Text.Length: 0 } => "empty",
        _ => "a text",
    };
}
