using System.Collections.Immutable;
using System.Text.Json;
using SpecLint.Spec.Units;

namespace SpecLint.Spec.Schema;

/// <summary>One key of the schema with the annotations that the typed reading needs.</summary>
internal sealed class SchemaNode
{
    private readonly Dictionary<string, SchemaNode> _properties = new(StringComparer.Ordinal);

    private SchemaNode(string key, JsonElement json)
    {
        Key = key;
        Title = Text(json, "title");
        Description = Text(json, "description");
        Quantity = Text(json, "x-quantity");
        ShortFor = Text(json, "x-short-for");
        Minimum = Text(json, "x-minimum");
        Maximum = Text(json, "x-maximum");
        Examples = [.. Items(json, "examples").Select(e => e.ToString())];
        Words = [.. Items(json, "enum").Concat(Items(json, "x-words")).Select(e => e.ToString())];
        Topologies = [.. Items(json, "x-topologies").Select(e => e.ToString())];
        Required = [.. Items(json, "required").Select(e => e.ToString())];
        With = Lists(json, "x-with");
        WordsByTopology = Lists(json, "x-words-by-topology");
        Kind = QuantityKind.TryFind(Quantity, out var kind) ? kind : null;
        ReadChildren(json);
    }

    internal string Key { get; }

    internal string Title { get; }

    internal string Description { get; }

    /// <summary>What a scalar here means: a quantity kind, <c>speed</c>, <c>text</c>, <c>flag</c> or <c>figure</c>; empty for a plain section.</summary>
    internal string Quantity { get; }

    internal QuantityKind? Kind { get; }

    internal string ShortFor { get; }

    internal string Minimum { get; }

    internal string Maximum { get; }

    internal ImmutableArray<string> Examples { get; }

    internal ImmutableArray<string> Words { get; }

    internal ImmutableArray<string> Topologies { get; }

    internal ImmutableArray<string> Required { get; }

    internal ImmutableArray<(string Name, ImmutableArray<string> Words)> With { get; }

    internal ImmutableArray<(string Name, ImmutableArray<string> Words)> WordsByTopology { get; }

    internal ImmutableArray<SchemaNode> Children { get; private set; } = [];

    internal SchemaNode? Item { get; private set; }

    /// <summary>What any other key of this mapping takes, when its keys are figure names; else null.</summary>
    internal SchemaNode? AnyKey { get; private set; }

    internal bool TakesScalar => Quantity.Length > 0;

    internal bool TakesMapping => Children.Length > 0 || AnyKey is not null;

    internal string Name => Key[(Key.LastIndexOf('.') + 1)..];

    internal static SchemaNode Parse(Stream json)
    {
        using var document = JsonDocument.Parse(json);
        return new SchemaNode("", document.RootElement);
    }

    internal SchemaNode? Child(string name) => _properties.GetValueOrDefault(name) ?? AnyKey;

    /// <summary>Kind of quantity for a topology: a speed is rotational, or linear along a track.</summary>
    internal QuantityKind? KindFor(string topology)
    {
        if (Quantity is "speed")
        {
            QuantityKind.TryFind(topology is "linear" ? "velocity" : "rotational-speed", out var speed);
            return speed;
        }

        return Kind;
    }

    private void ReadChildren(JsonElement json)
    {
        if (json.TryGetProperty("properties", out var properties))
        {
            foreach (var property in properties.EnumerateObject())
            {
                _properties.Add(property.Name, new SchemaNode(Key.Length == 0 ? property.Name : $"{Key}.{property.Name}", property.Value));
            }

            Children = [.. _properties.Values];
        }

        if (json.TryGetProperty("items", out var items))
        {
            Item = new SchemaNode($"{Key}[]", items);
        }

        if (json.TryGetProperty("additionalProperties", out var any) && any.ValueKind == JsonValueKind.Object)
        {
            AnyKey = new SchemaNode($"{Key}.*", any);
        }
    }

    private static string Text(JsonElement json, string name) => json.TryGetProperty(name, out var value) ? value.GetString()! : "";

    private static JsonElement[] Items(JsonElement json, string name) =>
        json.TryGetProperty(name, out var value) ? [.. value.EnumerateArray()] : [];

    private static ImmutableArray<(string Name, ImmutableArray<string> Words)> Lists(JsonElement json, string name) =>
        json.TryGetProperty(name, out var value)
            ? [.. value.EnumerateObject().Select(p => (p.Name, p.Value.EnumerateArray().Select(w => w.GetString()!).ToImmutableArray()))]
            : [];
}
