using Newtonsoft.Json.Linq;
using NJsonSchema;
using SpecLint.Spec.Documents;
using SpecLint.Spec.Yaml;

namespace SpecLint.Spec.Schema;

/// <summary>Checks a spec's tree against the schema and says where each fault stands.</summary>
public static class SchemaCheck
{
    private static readonly Lazy<Task<JsonSchema>> Loaded = new(() => Task.Run(Load));

    /// <summary>Starts loading the schema on another thread; a program calls this first thing, before it reads files.</summary>
    /// <returns>Ends when the schema is ready.</returns>
    public static Task Prepare() => Loaded.Value;

    /// <summary>Faults of shape: unknown, missing and empty keys, words not in the list, a mapping where a value belongs.</summary>
    /// <param name="root">The spec's tree.</param>
    internal static IReadOnlyList<SpecFault> Check(YamlMapping root)
    {
        var tree = new TokenTree();
        var token = tree.Convert(root);
        var errors = Loaded.Value.GetAwaiter().GetResult().Validate(token);
        return new SchemaFaults(tree).From(errors);
    }

    private static JsonSchema Load()
    {
        // The key catalogue is wanted next, by the thread that reads meanwhile.
        _ = KeyCatalogue.Root;
        using var json = KeyCatalogue.OpenSchema();
        var schema = SchemaBuilder.Build(json);

        // The first validation costs as much as many later ones: it is done here, off the caller's thread.
        _ = schema.Validate(new JObject { ["spec"] = 1, ["machine"] = new JObject { ["poles"] = 2 }, ["gap"] = new JObject { ["clearance"] = "1 mm" } });
        return schema;
    }
}
