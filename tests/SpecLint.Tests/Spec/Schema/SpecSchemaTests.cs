using System.Reflection;
using System.Text.Json;
using System.Text.RegularExpressions;
using Newtonsoft.Json.Linq;
using NJsonSchema;
using NJsonSchema.Validation;
using SpecLint.Spec.Schema;
using SpecLint.Spec.Units;
using SpecLint.Spec.Yaml;

namespace SpecLint.Tests.Spec.Schema;

public sealed class SpecSchemaTests
{
    private static readonly string[] Allowed =
    [
        "$schema", "title", "description", "type", "enum", "pattern", "minimum", "maximum", "examples", "required", "additionalProperties", "items", "properties",
        "x-quantity", "x-words", "x-words-by-topology", "x-short-for", "x-minimum", "x-maximum", "x-topologies", "x-with",
    ];

    private static IEnumerable<(string Path, JsonElement Schema)> Nodes(JsonElement schema, string path = "")
    {
        yield return (path, schema);
        foreach (string holder in (string[])["items", "additionalProperties"])
        {
            if (schema.TryGetProperty(holder, out var inner) && inner.ValueKind == JsonValueKind.Object)
            {
                foreach (var node in Nodes(inner, $"{path}/{holder}"))
                {
                    yield return node;
                }
            }
        }

        if (schema.TryGetProperty("properties", out var properties))
        {
            foreach (var node in properties.EnumerateObject().SelectMany(p => Nodes(p.Value, $"{path}/{p.Name}")))
            {
                yield return node;
            }
        }
    }

    private static List<(string Path, JsonElement Schema)> AllNodes()
    {
        using var document = JsonDocument.Parse(KeyCatalogue.SchemaText());
        return [.. Nodes(document.RootElement.Clone())];
    }

    [Fact]
    public void Schema_Keywords_AreAllEnforced()
    {
        foreach (var (path, schema) in AllNodes())
        {
            Assert.All(schema.EnumerateObject(), keyword => Assert.True(Allowed.Contains(keyword.Name), $"{path}: {keyword.Name}"));
        }
    }

    [Fact]
    public void Schema_EveryKey_HasTitleDescriptionAndType()
    {
        foreach (var (path, schema) in AllNodes())
        {
            foreach (string keyword in (string[])["title", "description", "type"])
            {
                Assert.True(schema.TryGetProperty(keyword, out _), $"{path} lacks {keyword}");
            }

            Assert.InRange(schema.GetProperty("title").GetString()!.Length, 3, 60);
            Assert.EndsWith(".", schema.GetProperty("description").GetString(), StringComparison.Ordinal);
        }
    }

    [Fact]
    public void Schema_EveryLeaf_HasQuantityAndExamples()
    {
        var leaves = AllNodes().Where(n => !n.Schema.TryGetProperty("properties", out _) && !n.Schema.TryGetProperty("items", out _) && !n.Path.EndsWith("declared", StringComparison.Ordinal) && !n.Path.EndsWith("measured", StringComparison.Ordinal)).ToList();

        Assert.InRange(leaves.Count, 200, 400);
        foreach (var (path, schema) in leaves)
        {
            string quantity = schema.TryGetProperty("x-quantity", out var word) ? word.GetString()! : "";
            Assert.True(quantity is "text" or "flag" or "figure" or "speed" || QuantityKind.TryFind(quantity, out _), $"{path} {quantity}");
            Assert.True(schema.TryGetProperty("examples", out var examples) && examples.GetArrayLength() > 0, path);
        }
    }

    [Fact]
    public void Schema_EveryMapping_RefusesUnknownKeys()
    {
        foreach (var (path, schema) in AllNodes().Where(n => n.Schema.TryGetProperty("properties", out _)))
        {
            Assert.True(schema.TryGetProperty("additionalProperties", out var more) && more.ValueKind == JsonValueKind.False, path);
        }
    }

    [Fact]
    public void Schema_ExamplesAndBounds_AreReadAsTheirOwnQuantity()
    {
        foreach (var entry in KeyCatalogue.Entries.Where(e => e.Kind is not null && e.Quantity is not ("speed" or "wire" or "cable")))
        {
            var node = KeyCatalogue.FindNode(entry.Key)!;
            foreach (string text in entry.Examples.Concat([node.Minimum, node.Maximum]).Where(t => t.Length > 0 && t[0] != '{'))
            {
                bool isRead = QuantityReader.TryRead(text, entry.Quantity is "count" ? null : entry.Kind, out _, out string problem);
                Assert.True(isRead, $"{entry.Key} {text} {problem}");
            }
        }
    }

    [Theory]
    [InlineData("2.0 ± 0.2 mm", true)]
    [InlineData("1.30 T ± 3 %", true)]
    [InlineData("2.0 mm +0.3/-0.1 mm", true)]
    [InlineData("-0.12 %/K", true)]
    [InlineData(".5 A/mm2", true)]
    [InlineData("15°", true)]
    [InlineData("1.5", false)]
    [InlineData("1e5", false)]
    [InlineData("1,5 mm", false)]
    [InlineData("thick", false)]
    public void Schema_PatternForEditors_AsksForNumberAndUnit(string text, bool isTaken)
    {
        var patterns = AllNodes().Where(n => n.Schema.TryGetProperty("pattern", out _)).Select(n => n.Schema.GetProperty("pattern").GetString()!).Distinct().Where(p => p != "^none$").ToList();

        string pattern = Assert.Single(patterns);
        Assert.Equal(isTaken, Regex.IsMatch(text, pattern, RegexOptions.None, TimeSpan.FromSeconds(1)));
    }

    [Fact]
    public void Schema_Examples_MatchTheirPattern()
    {
        foreach (var (path, schema) in AllNodes().Where(n => n.Schema.TryGetProperty("pattern", out _)))
        {
            string pattern = schema.GetProperty("pattern").GetString()!;
            Assert.All(
                schema.GetProperty("examples").EnumerateArray().Where(e => e.ValueKind == JsonValueKind.String),
                e => Assert.True(Regex.IsMatch(e.GetString()!, pattern, RegexOptions.None, TimeSpan.FromSeconds(1)), $"{path} {e}"));
        }
    }

    [Fact]
    public void PublicSignatures_OfTheProject_NameNoPackageTypes()
    {
        var own = typeof(KeyCatalogue).Assembly;
        var named = own.GetExportedTypes()
            .SelectMany(t => t.GetMembers(BindingFlags.Public | BindingFlags.Instance | BindingFlags.Static | BindingFlags.DeclaredOnly))
            .SelectMany(m => m switch
            {
                MethodInfo method => method.GetParameters().Select(p => p.ParameterType).Append(method.ReturnType),
                PropertyInfo property => [property.PropertyType],
                ConstructorInfo constructor => constructor.GetParameters().Select(p => p.ParameterType),
                FieldInfo field => [field.FieldType],
                _ => [],
            })
            .SelectMany(t => t.IsGenericType ? [t, .. t.GetGenericArguments()] : (Type[])[t])
            .Select(t => t.Assembly.GetName().Name!);

        Assert.All(named, name => Assert.True(name.StartsWith("System", StringComparison.Ordinal) || name == own.GetName().Name, name));
    }

    [Fact]
    public void Schema_TopologiesAndConditions_NameKnownWords()
    {
        foreach (var entry in KeyCatalogue.Entries)
        {
            var node = KeyCatalogue.FindNode(entry.Key)!;
            Assert.All(node.Topologies, t => Assert.Contains(t, KeyCatalogue.FindNode("machine.topology")!.Words));
            Assert.All(node.With, w => Assert.All(w.Words, word => Assert.Contains(word, KeyCatalogue.FindNode(w.Name)!.Words)));
            Assert.All(node.WordsByTopology, w => Assert.All(w.Words, word => Assert.Contains(word, node.Words)));
        }
    }

    [Fact]
    public void Catalogue_Key_IsFoundWithDimensionUnitAndText()
    {
        Assert.True(KeyCatalogue.TryFind("winding.coil.leg-width", out var entry));

        Assert.Equal(Dimensions.Length, entry.Dimension);
        Assert.Equal("mm", entry.DisplayUnit);
        Assert.Equal("Leg width", entry.Title);
        Assert.Equal(["16 mm"], entry.Examples);
        Assert.True(KeyCatalogue.TryFind("waivers[3].rule", out _));
        Assert.True(KeyCatalogue.TryFind("declared.emf.phase.rms", out var figure));
        Assert.Null(figure.Dimension);
        Assert.True(KeyCatalogue.TryFind("ratings.speed", out var speed));
        Assert.Equal(Dimensions.Velocity, speed.KindFor("linear")!.Dimension);
        Assert.Equal(Dimensions.Rate, speed.Dimension);
        Assert.True(KeyCatalogue.TryFind("rotor", out var section));
        Assert.True(section.IsSection);
        Assert.False(KeyCatalogue.TryFind("rotor.wheels", out _));
    }

    [Theory]
    [InlineData("gap.clearence", "gap.clearance")]
    [InlineData("winding.coil.leg_width", "winding.coil.leg-width")]
    [InlineData("magnet.thickness", "magnets.thickness")]
    [InlineData("coil.hole-width", "winding.coil.hole-width")]
    public void Catalogue_Slip_NearestKeyIsNamed(string written, string meant) => Assert.Equal(meant, KeyCatalogue.Nearest(written));

    [Fact]
    public void Catalogue_Nonsense_HasNoNearestKey() => Assert.Null(KeyCatalogue.Nearest("zzzzqqqq"));

    [Fact]
    public async Task Builder_AgainstTheLibrarysOwnLoader_GivesTheSameVerdicts()
    {
        var loaded = await JsonSchema.FromJsonAsync(KeyCatalogue.SchemaText(), TestContext.Current.CancellationToken);
        using var stream = KeyCatalogue.OpenSchema();
        var built = SchemaBuilder.Build(stream);
        string[] changes =
        [
            "", "role: generator>role: genrator", "poles: 12>poles: 12.5", "poles: 12>poles: 0", "poles: 12>poles: '12'", "turns: 60>turns: [60]", "coils: 9>coil: 9",
            "gap:>gaps:", "AWG 15, >AWG 15, colour: red, ", "{material: mild-steel>{material: {relative-permeability: 1000}", "title: bench machine>title: {a: 1}",
            "connection: star>connection:", "thermal-class: 180>thermal-class: 181", "spec: 1>spec: 2", "spec: 1>waivers: [{rule: a}, 3]", "spec: 1>measured: {a.b: {value: 3 V, odd: 1}, c: [1]}",
            "coils: 9>paths: [[1, x], 3]", "spec: 1>declared: {a: {b: 1}}", "spec: 1>rotor: none", "cover: 0.5 mm>cover: 0.5",
        ];
        foreach (string change in changes)
        {
            string text = change.Length == 0 ? Specs.Sound : Specs.Sound.Replace(change.Split('>')[0], change.Split('>')[1], StringComparison.Ordinal);
            var root = Assert.IsType<YamlMapping>(YamlReader.Read(text, YamlLimits.Default).Root);
            var token = new TokenTree().Convert(root);

            Assert.Equal(Verdicts(loaded, token), Verdicts(built, token));
        }
    }

    private static List<string> Verdicts(JsonSchema schema, JToken token) =>
        [.. Leaves(schema.Validate(token)).Select(e => $"{e.Kind} {e.Path} {e.Property}").Order(StringComparer.Ordinal)];

    private static IEnumerable<ValidationError> Leaves(IEnumerable<ValidationError> errors) => errors
        .Where(e => e.Kind != ValidationErrorKind.PatternMismatch)
        .SelectMany(e => e is ChildSchemaValidationError child ? [e, .. Leaves(child.Errors.Values.SelectMany(x => x))] : (IEnumerable<ValidationError>)[e]);
}
