using System.Collections.Immutable;
using System.Diagnostics.CodeAnalysis;
using System.Text;
using SpecLint.Spec.Names;

namespace SpecLint.Spec.Schema;

/// <summary>Every key that a spec may hold, as the schema names them.</summary>
public static class KeyCatalogue
{
    private const string Resource = "speclint.schema.json";

    private static readonly Lazy<(SchemaNode Root, Dictionary<string, SchemaNode> ByKey, ImmutableArray<KeyEntry> Entries)> Loaded = new(Load);

    /// <summary>Every key in the schema's order; lists with <c>[]</c>, figure names as <c>*</c>.</summary>
    public static ImmutableArray<KeyEntry> Entries => Loaded.Value.Entries;

    internal static SchemaNode Root => Loaded.Value.Root;

    /// <summary>The text of the schema, for an editor.</summary>
    public static string SchemaText()
    {
        using var reader = new StreamReader(OpenSchema(), Encoding.UTF8);
        return reader.ReadToEnd();
    }

    /// <summary>Finds a key.</summary>
    /// <param name="key">Dotted key, also with an index (<c>waivers[0].rule</c>) or a figure name (<c>declared.emf.phase.rms</c>).</param>
    /// <param name="entry">What is known of it.</param>
    /// <returns>False when the format has no such key.</returns>
    public static bool TryFind(string key, [NotNullWhen(true)] out KeyEntry? entry)
    {
        entry = FindNode(key) is { } node ? new KeyEntry(node) : null;
        return entry is not null;
    }

    /// <summary>The known key most like an unknown one, or null when none is near.</summary>
    /// <param name="key">A dotted key.</param>
    public static string? Nearest(string key)
    {
        if (NearestName.Of(key, Loaded.Value.ByKey.Keys) is { } near)
        {
            return near;
        }

        string name = key[(key.LastIndexOf('.') + 1)..];
        return name.Length == 0 ? null : KeysNamed(name).FirstOrDefault();
    }

    internal static Stream OpenSchema() => typeof(KeyCatalogue).Assembly.GetManifestResourceStream(Resource)!;

    /// <summary>The keys whose last part is this name, by depth.</summary>
    internal static IEnumerable<string> KeysNamed(string name) =>
        Loaded.Value.ByKey.Values.Where(n => string.Equals(n.Name, name, StringComparison.OrdinalIgnoreCase)).Select(n => n.Key);

    internal static SchemaNode? FindNode(string key)
    {
        string plain = WithoutIndices(key);
        if (Loaded.Value.ByKey.TryGetValue(plain, out var node))
        {
            return node;
        }

        int dot = plain.IndexOf('.', StringComparison.Ordinal);
        return dot > 0 && dot < plain.Length - 1 && plain[..dot] is "declared" or "measured" ? Loaded.Value.ByKey[plain[..dot]].AnyKey : null;
    }

    private static string WithoutIndices(string key)
    {
        if (!key.Contains('[', StringComparison.Ordinal))
        {
            return key;
        }

        var plain = new StringBuilder(key.Length);
        bool isInside = false;
        foreach (char c in key)
        {
            isInside = c == '[' || (isInside && c != ']');
            if (!isInside || c == '[')
            {
                plain.Append(c);
            }
        }

        return plain.ToString();
    }

    private static (SchemaNode Root, Dictionary<string, SchemaNode> ByKey, ImmutableArray<KeyEntry> Entries) Load()
    {
        using var json = OpenSchema();
        var root = SchemaNode.Parse(json);
        var byKey = new Dictionary<string, SchemaNode>(StringComparer.Ordinal);
        Collect(root, byKey);
        return (root, byKey, [.. byKey.Values.Select(n => new KeyEntry(n))]);
    }

    private static void Collect(SchemaNode node, Dictionary<string, SchemaNode> byKey)
    {
        if (node.Key.Length > 0)
        {
            byKey.Add(node.Key, node);
        }

        foreach (var child in node.Children)
        {
            Collect(child, byKey);
        }

        if (node.Item is not null)
        {
            Collect(node.Item, byKey);
        }

        if (node.AnyKey is not null)
        {
            Collect(node.AnyKey, byKey);
        }
    }
}
