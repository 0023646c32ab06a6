using System.Text.Json;
using SpecLint.Review.Figures;
using SpecLint.Reporting.Derivations;
using SpecLint.Reporting.Output;
using SpecLint.Spec.Documents;

namespace SpecLint.Reporting.Listings;

/// <summary>The working of a figure as JSON.</summary>
internal static class WorkingJson
{
    /// <summary>Writes the document.</summary>
    /// <param name="graph">The machine.</param>
    /// <param name="figure">The figure asked for.</param>
    /// <param name="sections">Its working.</param>
    /// <param name="stream">Where to; stays open.</param>
    public static void Write(FigureGraph graph, string figure, IReadOnlyList<WorkingSection> sections, Stream stream) => JsonOutput.Write(stream, json =>
    {
        json.WriteStartObject();
        json.WriteString("path", Printable.Line(graph.Spec.Path));
        json.WriteString("figure", figure);
        json.WriteStartArray("steps");
        foreach (WorkingSection section in sections)
        {
            WriteSection(json, graph, section);
        }

        json.WriteEndArray();
        json.WriteEndObject();
    });

    private static void WriteSection(Utf8JsonWriter json, FigureGraph graph, WorkingSection section)
    {
        Figure figure = section.Step.Figure!;
        json.WriteStartObject();
        json.WriteString("name", figure.Name);
        json.WriteString("meaning", Printable.Line(figure.Definition.Meaning));
        WriteOutcome(json, figure);
        json.WriteString("formula", section.Step.Formula);
        json.WriteString("with-values", section.Step.Substituted);
        json.WriteStartObject("basis");
        json.WriteString("kind", figure.Definition.Basis.KindText);
        json.WriteString("source", Printable.Line(figure.Definition.Basis.Source));
        json.WriteEndObject();
        json.WriteNumber("method-uncertainty", figure.Definition.MethodUncertainty);
        json.WriteStartArray("inputs");
        foreach (DerivationStep input in section.Inputs)
        {
            WriteInput(json, graph, input);
        }

        json.WriteEndArray();
        json.WriteEndObject();
    }

    private static void WriteInput(Utf8JsonWriter json, FigureGraph graph, DerivationStep input)
    {
        json.WriteStartObject();
        json.WriteString("name", Printable.Line(input.Name));
        json.WriteString("kind", input.Kind switch { FigureInputKind.Key => "key", FigureInputKind.Figure => "figure", _ => "part" });
        if (input.Figure is { } figure)
        {
            WriteOutcome(json, figure);
        }
        else if (input.Kind == FigureInputKind.Key)
        {
            json.WriteBoolean("stated", input.Region is not null);
            WriteKey(json, graph.Spec.Find(input.Name), input);
        }

        json.WriteEndObject();
    }

    private static void WriteKey(Utf8JsonWriter json, SpecValue? value, DerivationStep input)
    {
        if (input.Region is { } region)
        {
            json.WriteString("text", input.Value);
            json.WriteNumber("line", region.StartLine);
        }

        if (value is { Kind: SpecValueKind.Number })
        {
            json.WriteNumber("value", value.Number);
        }
    }

    private static void WriteOutcome(Utf8JsonWriter json, Figure figure)
    {
        if (figure.Outcome.HasValue)
        {
            json.WriteNumber("value", figure.Outcome.Value);
            json.WriteString("unit", figure.Definition.Unit);
            json.WriteNumber("uncertainty", figure.Outcome.Uncertainty);
            json.WriteBoolean("assumed", figure.Outcome.IsAssumed);
        }
        else
        {
            json.WriteString("without-value", ValueText.Lack(figure.Outcome));
        }
    }
}
