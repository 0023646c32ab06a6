using System.Text.Encodings.Web;
using System.Text.Json;

namespace SpecLint.Reporting.Output;

/// <summary>Our own JSON: UTF-8 without mark, indented by two, <c>\n</c>, units and symbols readable.</summary>
internal static class JsonOutput
{
    private static readonly JsonWriterOptions Options = new()
    {
        Indented = true,
        NewLine = "\n",
        // The output is a document of its own, never part of a page, so that only what JSON itself demands is escaped.
        Encoder = JavaScriptEncoder.UnsafeRelaxedJsonEscaping,
    };

    /// <summary>Writes one document and a line end; the stream stays open.</summary>
    /// <param name="stream">Where to.</param>
    /// <param name="write">Writes the document.</param>
    public static void Write(Stream stream, Action<Utf8JsonWriter> write)
    {
        using (var json = new Utf8JsonWriter(stream, Options))
        {
            write(json);
        }

        stream.WriteByte((byte)'\n');
    }

    /// <summary>Writes a list of texts under a name.</summary>
    /// <param name="json">Where to.</param>
    /// <param name="name">The name.</param>
    /// <param name="texts">The texts.</param>
    public static void WriteTexts(Utf8JsonWriter json, string name, IEnumerable<string> texts)
    {
        json.WriteStartArray(name);
        foreach (string text in texts)
        {
            json.WriteStringValue(Printable.Line(text));
        }

        json.WriteEndArray();
    }

    /// <summary>Writes a number under a name when there is one.</summary>
    /// <param name="json">Where to.</param>
    /// <param name="name">The name.</param>
    /// <param name="number">The number; null or not finite is left out.</param>
    public static void WriteOptional(Utf8JsonWriter json, string name, double? number)
    {
        if (number is { } value && double.IsFinite(value))
        {
            json.WriteNumber(name, value);
        }
    }
}
