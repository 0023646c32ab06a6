using System.Text.Json;
using SpecLint.Review.Figures;
using SpecLint.Reporting.Derivations;
using SpecLint.Reporting.Output;
using SpecLint.Reporting.Sheets;

namespace SpecLint.Reporting.Listings;

/// <summary>The figures of a machine as a table for people or as JSON in SI.</summary>
public static class FigureListing
{
    /// <summary>
    /// Writes <c>{"figures": {name: {"value", "unit", "uncertainty", "meaning", "assumed"}}, "without-value": {…}}</c>: coherent SI,
    /// doubles that read back exactly. The stream stays open.
    /// </summary>
    /// <param name="figures">The figures in order.</param>
    /// <param name="stream">Where to.</param>
    public static void WriteJson(IEnumerable<Figure> figures, Stream stream)
    {
        ArgumentNullException.ThrowIfNull(figures);
        var all = figures.ToList();
        JsonOutput.Write(stream, json =>
        {
            json.WriteStartObject();
            json.WriteStartObject("figures");
            foreach (Figure figure in all.Where(f => f.Outcome.HasValue))
            {
                WriteValue(json, figure);
            }

            json.WriteEndObject();
            json.WriteStartObject("without-value");
            foreach (Figure figure in all.Where(f => !f.Outcome.HasValue))
            {
                WriteLack(json, figure);
            }

            json.WriteEndObject();
            json.WriteEndObject();
        });
    }

    /// <summary>Writes the figures with display units, grouped by the first part of their names, and then those without value.</summary>
    /// <param name="figures">The figures in order.</param>
    /// <param name="options">Width, colour; with <see cref="SheetOptions.IncludesAll"/> also what each figure means.</param>
    /// <param name="writer">Where to.</param>
    public static void WriteText(IEnumerable<Figure> figures, SheetOptions options, TextWriter writer)
    {
        ArgumentNullException.ThrowIfNull(figures);
        ArgumentNullException.ThrowIfNull(options);
        ArgumentNullException.ThrowIfNull(writer);
        var page = new TextPage(writer, options);
        var all = figures.ToList();
        bool isFirst = true;
        foreach (var group in all.Where(f => f.Outcome.HasValue).GroupBy(f => f.Name.Split('.')[0], StringComparer.Ordinal))
        {
            if (!isFirst)
            {
                page.Blank();
            }

            isFirst = false;
            page.Line("  " + group.Key, Emphasis.Heading);
            if (options.IncludesAll)
            {
                WriteWithMeaning(page, group);
            }
            else
            {
                FigureTable.Write(page, group);
            }
        }

        var lacking = all.Where(f => !f.Outcome.HasValue).ToList();
        if (lacking.Count > 0)
        {
            page.Heading("Without value");
            foreach (Figure figure in lacking)
            {
                page.Wrapped("    " + TextPage.Pad(figure.Name, 34) + "  ", ValueText.Lack(figure.Outcome));
            }
        }
    }

    private static void WriteWithMeaning(TextPage page, IEnumerable<Figure> figures)
    {
        foreach (Figure figure in figures)
        {
            FigureTable.Write(page, [figure]);
            page.Wrapped("        ", Printable.Line(figure.Definition.Meaning), Emphasis.Quiet);
        }
    }

    private static void WriteValue(Utf8JsonWriter json, Figure figure)
    {
        json.WriteStartObject(figure.Name);
        json.WriteNumber("value", figure.Outcome.Value);
        json.WriteString("unit", figure.Definition.Unit);
        json.WriteNumber("uncertainty", figure.Outcome.Uncertainty);
        json.WriteString("meaning", Printable.Line(figure.Definition.Meaning));
        json.WriteBoolean("assumed", figure.Outcome.IsAssumed);
        if (figure.Outcome.IsAssumed)
        {
            json.WriteString("reason", Printable.Line(figure.Outcome.Reason));
        }

        json.WriteEndObject();
    }

    private static void WriteLack(Utf8JsonWriter json, Figure figure)
    {
        json.WriteStartObject(figure.Name);
        json.WriteString("reason", figure.Outcome.Kind switch
        {
            OutcomeKind.Missing => "missing",
            OutcomeKind.NotApplicable => "not-applicable",
            _ => "out-of-domain",
        });
        if (figure.Outcome.Kind == OutcomeKind.Missing)
        {
            JsonOutput.WriteTexts(json, "missing-keys", figure.Outcome.MissingKeys);
        }
        else
        {
            json.WriteString("detail", Printable.Line(figure.Outcome.Reason));
        }

        json.WriteString("meaning", Printable.Line(figure.Definition.Meaning));
        json.WriteEndObject();
    }
}
