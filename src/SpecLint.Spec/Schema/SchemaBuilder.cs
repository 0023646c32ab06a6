using System.Globalization;
using System.Text.Json;
using NJsonSchema;

namespace SpecLint.Spec.Schema;

/// <summary>Builds the schema library's object from the schema file, keyword by keyword.</summary>
/// <remarks>
/// The library's own loader takes some 0.35 s on first use; this takes a tenth of it. A test holds the two to the same
/// verdicts. Patterns are for editors only: the typed reader judges the text of a value, and says more about it.
/// </remarks>
internal static class SchemaBuilder
{
    internal static JsonSchema Build(Stream json)
    {
        using var document = JsonDocument.Parse(json);
        var schema = new JsonSchema();
        Fill(schema, document.RootElement);
        return schema;
    }

    private static void Fill(JsonSchema schema, JsonElement json)
    {
        foreach (var keyword in json.EnumerateObject())
        {
            var value = keyword.Value;
            switch (keyword.Name)
            {
                case "type":
                    schema.Type = value.ValueKind == JsonValueKind.String
                        ? TypeOf(value.GetString()!)
                        : value.EnumerateArray().Aggregate(JsonObjectType.None, (types, type) => types | TypeOf(type.GetString()!));
                    break;
                case "enum":
                    foreach (var word in value.EnumerateArray())
                    {
                        schema.Enumeration.Add(word.ValueKind == JsonValueKind.Number ? word.GetInt64() : word.GetString());
                    }

                    break;
                case "minimum":
                    schema.Minimum = value.GetDecimal();
                    break;
                case "maximum":
                    schema.Maximum = value.GetDecimal();
                    break;
                case "required":
                    foreach (var name in value.EnumerateArray())
                    {
                        schema.RequiredProperties.Add(name.GetString()!);
                    }

                    break;
                case "properties":
                    foreach (var property in value.EnumerateObject())
                    {
                        var child = new JsonSchemaProperty();
                        Fill(child, property.Value);
                        schema.Properties[property.Name] = child;
                    }

                    break;
                case "items":
                    schema.Item = new JsonSchema();
                    Fill(schema.Item, value);
                    break;
                case "additionalProperties" when value.ValueKind == JsonValueKind.Object:
                    schema.AdditionalPropertiesSchema = new JsonSchema();
                    Fill(schema.AdditionalPropertiesSchema, value);
                    break;
                case "additionalProperties":
                    schema.AllowAdditionalProperties = value.GetBoolean();
                    break;
                case "$schema" or "title" or "description" or "examples" or "pattern":
                case var name when name.StartsWith("x-", StringComparison.Ordinal):
                    break;
                default:
                    throw new InvalidOperationException($"the schema uses the keyword {keyword.Name}, which is not checked");
            }
        }
    }

    private static JsonObjectType TypeOf(string word) => word switch
    {
        "string" => JsonObjectType.String,
        "number" => JsonObjectType.Number,
        "integer" => JsonObjectType.Integer,
        "boolean" => JsonObjectType.Boolean,
        "object" => JsonObjectType.Object,
        "array" => JsonObjectType.Array,
        _ => throw new InvalidOperationException(string.Create(CultureInfo.InvariantCulture, $"the schema uses the type {word}, which is not known")),
    };
}
