using System.Collections.Immutable;
using System.Globalization;
using YamlDotNet.Core;
using YamlDotNet.Core.Events;

namespace SpecLint.Spec.Yaml;

/// <summary>Builds the tree of one document from the parser's events.</summary>
internal sealed class YamlTreeBuilder(IParser parser, YamlLimits limits, List<YamlFault> faults)
{
    private readonly Dictionary<string, (YamlNode? Node, int Size)> _anchors = new(StringComparer.Ordinal);
    private int _size;

    internal YamlNode? ReadDocument()
    {
        parser.MoveNext();
        parser.MoveNext();
        if (parser.Current is not DocumentStart)
        {
            Tell(new YamlFault("the text holds no document; the keys of a spec or rulebook are expected", Region.Beginning));
            return null;
        }

        parser.MoveNext();
        var root = ReadNode(0);
        parser.MoveNext();
        while (parser.Current is not null and not StreamEnd)
        {
            if (parser.Current is DocumentStart second)
            {
                Tell(new YamlFault("a second document begins here; one document a file is expected", PlaceOf(second)));
                break;
            }

            parser.MoveNext();
        }

        return root;
    }

    private YamlNode ReadNode(int depth)
    {
        var start = parser.Current!;
        if (++_size > limits.Nodes)
        {
            throw TooMany(PlaceOf(start));
        }

        if (depth > limits.Depth)
        {
            throw new YamlStopException(new YamlFault(string.Create(CultureInfo.InvariantCulture, $"mappings and lists stand more than {limits.Depth} deep here"), PlaceOf(start)));
        }

        if (start is AnchorAlias alias)
        {
            return Resolve(alias);
        }

        // The library ends some malformed flow text where a value should begin.
        if (start is not NodeEvent named)
        {
            throw new YamlStopException(new YamlFault("a value is expected here", PlaceOf(start)));
        }

        int before = _size - 1;
        string? anchor = null;
        if (!named.Anchor.IsEmpty)
        {
            anchor = named.Anchor.Value;
            _anchors[anchor] = (null, 0);
        }

        CheckTag(named);
        YamlNode node = start switch
        {
            Scalar scalar => ReadScalar(scalar),
            MappingStart => ReadMapping(depth),
            _ => ReadSequence(depth),
        };
        if (anchor is not null)
        {
            _anchors[anchor] = (node, _size - before);
        }

        return node;
    }

    private YamlScalar ReadScalar(Scalar scalar)
    {
        parser.MoveNext();
        bool isPlain = scalar.Style == ScalarStyle.Plain && !string.Equals(TagText(scalar), "tag:yaml.org,2002:str", StringComparison.Ordinal);
        return new YamlScalar(PlaceOf(scalar), scalar.Value, isPlain);
    }

    private YamlSequence ReadSequence(int depth)
    {
        var start = parser.Current!;
        parser.MoveNext();
        var items = ImmutableArray.CreateBuilder<YamlNode>();
        while (parser.Current is not SequenceEnd)
        {
            items.Add(ReadNode(depth + 1));
        }

        var region = Spanning(start, items.Count > 0 ? items[^1] : null);
        parser.MoveNext();
        return new YamlSequence(region, items.DrainToImmutable());
    }

    private YamlMapping ReadMapping(int depth)
    {
        var start = parser.Current!;
        parser.MoveNext();
        var entries = new List<YamlEntry>();
        var places = new Dictionary<string, Region>(StringComparer.Ordinal);
        var merges = new List<(YamlScalar Key, YamlNode Value)>();
        while (parser.Current is not MappingEnd)
        {
            var key = ReadNode(depth + 1);
            var value = ReadNode(depth + 1);
            if (key is not YamlScalar name)
            {
                Tell(new YamlFault("a list or mapping stands where the name of a key is expected", key.Region));
            }
            else if (name.IsPlain && string.Equals(name.Text, "<<", StringComparison.Ordinal))
            {
                merges.Add((name, value));
            }
            else if (!places.TryAdd(name.Text, name.Region))
            {
                Tell(new YamlFault($"the key '{Shown(name.Text)}' stands twice in one mapping", name.Region)
                {
                    Related = places[name.Text],
                    RelatedMessage = "the first of the two",
                });
            }
            else
            {
                entries.Add(new YamlEntry(name, value));
            }
        }

        var region = Spanning(start, entries.Count > 0 ? entries[^1].Value : null);
        parser.MoveNext();
        foreach (var (key, value) in merges)
        {
            Merge(key, value, entries, places);
        }

        return new YamlMapping(region, [.. entries]);
    }

    private void Merge(YamlScalar key, YamlNode value, List<YamlEntry> entries, Dictionary<string, Region> places)
    {
        foreach (var source in value is YamlSequence list ? list.Items : [value])
        {
            if (source is not YamlMapping mapping)
            {
                Tell(new YamlFault("the merge key '<<' takes a mapping, or a list of mappings, by alias", key.Region));
                return;
            }

            foreach (var entry in mapping.Entries)
            {
                if (places.TryAdd(entry.Key.Text, entry.Key.Region))
                {
                    entries.Add(entry with { Value = entry.Value with { AliasSite = source.AliasSite ?? value.AliasSite ?? key.Region } });
                }
            }
        }
    }

    private YamlNode Resolve(AnchorAlias alias)
    {
        var site = PlaceOf(alias);
        string name = alias.Value.Value;
        parser.MoveNext();
        if (!_anchors.TryGetValue(name, out var target))
        {
            Tell(new YamlFault($"the alias '*{Shown(name)}' names no anchor above it", site));
            return Nothing(site)[0];
        }

        if (target.Node is null)
        {
            Tell(new YamlFault($"the alias '*{Shown(name)}' stands inside its own anchor", site));
            return Nothing(site)[0];
        }

        if (target.Size > limits.Nodes - _size)
        {
            throw TooMany(site);
        }

        _size += target.Size;
        return target.Node with { AliasSite = site };
    }

    private static YamlNode[] Nothing(Region site) => [new YamlScalar(site, "", IsPlain: true) { IsBroken = true }];

    private void Tell(YamlFault fault)
    {
        if (faults.Count >= limits.Faults)
        {
            throw new YamlStopException(new YamlFault(string.Create(CultureInfo.InvariantCulture, $"more than {limits.Faults} faults of syntax; reading stops here"), fault.Region));
        }

        faults.Add(fault);
    }

    private void CheckTag(NodeEvent start)
    {
        string tag = TagText(start);
        if (tag.Length > 1 && tag is not ("tag:yaml.org,2002:str" or "tag:yaml.org,2002:map" or "tag:yaml.org,2002:seq"))
        {
            Tell(new YamlFault($"the tag '{Shown(tag)}' stands before this value; plain values are expected", PlaceOf(start)));
        }
    }

    private static string TagText(NodeEvent start) => start.Tag.IsEmpty ? "" : start.Tag.IsNonSpecific ? "!" : start.Tag.Value;

    private YamlStopException TooMany(Region place) =>
        new(new YamlFault(string.Create(CultureInfo.InvariantCulture, $"the text holds more than {limits.Nodes} values, aliases counted with what they repeat"), place));

    private static string Shown(string text) => text.Length <= 60 ? text : text[..60] + "…";

    private static Region PlaceOf(ParsingEvent item) => RegionOf(item.Start, item.End);

    private Region Spanning(ParsingEvent start, YamlNode? last)
    {
        var end = parser.Current!;
        bool isFlow = start is MappingStart { Style: MappingStyle.Flow } or SequenceStart { Style: SequenceStyle.Flow };
        if (isFlow || last is null)
        {
            // The closing bracket is one character; the library's end mark leaves it out.
            return isFlow ? RegionOf(start.Start, end.Start) with { EndColumn = (int)end.Start.Column + 1 } : RegionOf(start.Start, start.End);
        }

        // A block container's end mark is where the next token begins; its last value is where it really ends.
        var lastPlace = last.AliasSite ?? last.Region;
        return RegionOf(start.Start, start.End) with { EndLine = lastPlace.EndLine, EndColumn = lastPlace.EndColumn };
    }

    private static Region RegionOf(Mark start, Mark end) =>
        new((int)start.Line, (int)start.Column, (int)end.Line, (int)end.Column);
}
