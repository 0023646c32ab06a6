using System.Text.Json;
using Microsoft.CodeAnalysis.Sarif;

namespace SpecLint.Reporting.Sarif;

/// <summary>
/// Writes the part of the SARIF object model that our logs use. The library's own serialiser builds its contracts by reflection,
/// which costs a short-lived program more than the whole review; a test reads every log back with the library and compares.
/// </summary>
/// <remarks>
/// The level and the kind of a result are always written, also where they are the default: a missing level would be read from
/// the rule, which is wrong for a finding milder than its rule.
/// </remarks>
internal static class SarifJson
{
    /// <summary>Writes a log.</summary>
    /// <param name="json">Where to.</param>
    /// <param name="log">The log.</param>
    public static void Write(Utf8JsonWriter json, SarifLog log)
    {
        json.WriteStartObject();
        json.WriteString("$schema", log.SchemaUri.OriginalString);
        json.WriteString("version", "2.1.0");
        WriteArray(json, "runs", log.Runs, Write);
        json.WriteEndObject();
    }

    /// <summary>Writes a list under a name, or nothing when there is none.</summary>
    /// <param name="json">Where to.</param>
    /// <param name="name">The name.</param>
    /// <param name="items">The items; null is left out, an empty list is written.</param>
    /// <param name="write">Writes one item.</param>
    /// <typeparam name="T">Type of an item.</typeparam>
    internal static void WriteArray<T>(Utf8JsonWriter json, string name, IEnumerable<T>? items, Action<Utf8JsonWriter, T> write)
    {
        if (items is null)
        {
            return;
        }

        json.WriteStartArray(name);
        foreach (T item in items)
        {
            write(json, item);
        }

        json.WriteEndArray();
    }

    /// <summary>Writes a text under a name, or nothing when there is none.</summary>
    /// <param name="json">Where to.</param>
    /// <param name="name">The name.</param>
    /// <param name="text">The text.</param>
    internal static void WriteText(Utf8JsonWriter json, string name, string? text)
    {
        if (text is not null)
        {
            json.WriteString(name, text);
        }
    }

    /// <summary>Writes the property bag of an object, or nothing when it is empty.</summary>
    /// <param name="json">Where to.</param>
    /// <param name="holder">The object.</param>
    internal static void WriteProperties(Utf8JsonWriter json, PropertyBagHolder holder)
    {
        if (holder.PropertyNames.Count == 0)
        {
            return;
        }

        json.WriteStartObject("properties");
        foreach (string name in holder.PropertyNames)
        {
            if (holder.TryGetSerializedPropertyValue(name, out string value))
            {
                json.WritePropertyName(name);
                json.WriteRawValue(value);
            }
        }

        json.WriteEndObject();
    }

    /// <summary>Writes a message under a name, or nothing when there is none.</summary>
    /// <param name="json">Where to.</param>
    /// <param name="name">The name.</param>
    /// <param name="message">The message.</param>
    internal static void WriteMessage(Utf8JsonWriter json, string name, Message? message)
    {
        if (message is null)
        {
            return;
        }

        json.WriteStartObject(name);
        WriteText(json, "text", message.Text);
        WriteText(json, "markdown", message.Markdown);
        json.WriteEndObject();
    }

    private static void Write(Utf8JsonWriter json, Run run)
    {
        json.WriteStartObject();
        json.WriteStartObject("tool");
        json.WritePropertyName("driver");
        Write(json, run.Tool.Driver);
        json.WriteEndObject();
        WriteArray(json, "invocations", run.Invocations, static (json, invocation) =>
        {
            json.WriteStartObject();
            json.WriteBoolean("executionSuccessful", invocation.ExecutionSuccessful);
            json.WriteEndObject();
        });
        json.WriteString("language", run.Language);
        json.WriteStartObject("automationDetails");
        json.WriteString("id", run.AutomationDetails.Id);
        json.WriteEndObject();
        json.WriteString("columnKind", "utf16CodeUnits");
        WriteArray(json, "taxonomies", run.Taxonomies, Write);
        WriteArray(json, "artifacts", run.Artifacts, Write);
        WriteArray(json, "results", run.Results, SarifResultJson.Write);
        json.WriteEndObject();
    }

    private static void Write(Utf8JsonWriter json, ToolComponent component)
    {
        json.WriteStartObject();
        json.WriteString("name", component.Name);
        WriteText(json, "version", component.Version);
        WriteText(json, "semanticVersion", component.SemanticVersion);
        WriteDescription(json, "shortDescription", component.ShortDescription);
        json.WriteString("language", component.Language);
        WriteArray(json, "supportedTaxonomies", component.SupportedTaxonomies, Write);
        WriteArray(json, "rules", component.Rules, Write);
        WriteArray(json, "taxa", component.Taxa, Write);
        json.WriteEndObject();
    }

    private static void Write(Utf8JsonWriter json, ReportingDescriptor descriptor)
    {
        json.WriteStartObject();
        json.WriteString("id", descriptor.Id);
        WriteText(json, "name", descriptor.Name);
        WriteDescription(json, "shortDescription", descriptor.ShortDescription);
        WriteDescription(json, "fullDescription", descriptor.FullDescription);
        WriteDescription(json, "help", descriptor.Help);
        if (descriptor.DefaultConfiguration is { } configuration)
        {
            json.WriteStartObject("defaultConfiguration");
            json.WriteString("level", SarifResultJson.Word(configuration.Level));
            json.WriteEndObject();
        }

        WriteArray(json, "relationships", descriptor.Relationships, static (json, relationship) =>
        {
            json.WriteStartObject();
            json.WriteStartObject("target");
            json.WriteString("id", relationship.Target.Id);
            json.WriteNumber("index", relationship.Target.Index);
            json.WritePropertyName("toolComponent");
            Write(json, relationship.Target.ToolComponent);
            json.WriteEndObject();
            WriteArray(json, "kinds", relationship.Kinds, static (json, kind) => json.WriteStringValue(kind));
            json.WriteEndObject();
        });
        WriteProperties(json, descriptor);
        json.WriteEndObject();
    }

    private static void Write(Utf8JsonWriter json, ToolComponentReference reference)
    {
        json.WriteStartObject();
        json.WriteString("name", reference.Name);
        json.WriteNumber("index", reference.Index);
        json.WriteEndObject();
    }

    private static void Write(Utf8JsonWriter json, Artifact artifact)
    {
        json.WriteStartObject();
        json.WritePropertyName("location");
        SarifResultJson.Write(json, artifact.Location);
        json.WriteString("mimeType", artifact.MimeType);
        json.WriteString("sourceLanguage", artifact.SourceLanguage);
        json.WriteStartArray("roles");
        json.WriteStringValue("analysisTarget");
        json.WriteEndArray();
        json.WriteEndObject();
    }

    private static void WriteDescription(Utf8JsonWriter json, string name, MultiformatMessageString? description)
    {
        if (description is null)
        {
            return;
        }

        json.WriteStartObject(name);
        json.WriteString("text", description.Text);
        WriteText(json, "markdown", description.Markdown);
        json.WriteEndObject();
    }
}
