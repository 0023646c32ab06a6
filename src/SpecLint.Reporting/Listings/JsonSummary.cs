using System.Globalization;
using System.Text.Json;
using SpecLint.Review.Findings;
using SpecLint.Review.Reviewing;
using SpecLint.Review.Rules;
using SpecLint.Reporting.Output;
using SpecLint.Reporting.Quantities;
using SpecLint.Reporting.Sheets;

namespace SpecLint.Reporting.Listings;

/// <summary>Reviews as JSON: <c>{"reviews": [{"path", "title", "outcome", "findings", "hazards", …}]}</c>.</summary>
public static class JsonSummary
{
    /// <summary>
    /// Writes the document; the stream stays open. A finding's <c>value</c>, <c>bound</c> and <c>uncertainty</c> are told in
    /// its <c>unit</c>, which is the one people read; figures in SI come from <see cref="FigureListing"/>.
    /// </summary>
    /// <param name="reviews">The reviews in order; each is let go of once it is written.</param>
    /// <param name="options">Whether rules that are met and not applicable are listed too.</param>
    /// <param name="stream">Where to.</param>
    public static void Write(IEnumerable<MachineReview> reviews, SheetOptions options, Stream stream)
    {
        ArgumentNullException.ThrowIfNull(reviews);
        ArgumentNullException.ThrowIfNull(options);
        JsonOutput.Write(stream, json =>
        {
            json.WriteStartObject();
            json.WriteStartArray("reviews");
            foreach (MachineReview review in reviews)
            {
                Write(json, review, options);
            }

            json.WriteEndArray();
            json.WriteEndObject();
        });
    }

    private static void Write(Utf8JsonWriter json, MachineReview review, SheetOptions options)
    {
        json.WriteStartObject();
        json.WriteString("path", Printable.Line(review.Spec.Path));
        json.WriteString("title", ReviewWords.Title(review.Spec));
        json.WriteString("revision", Printable.Line(review.Spec.Find("revision")?.Text ?? ""));
        json.WriteString("outcome", ReviewWords.Outcome(review.Outcome));
        WriteCounts(json, review);
        WriteFindings(json, "findings", review.Unmet);
        WriteFindings(json, "waived", review.Waived);
        WriteFindings(json, "open", review.Findings.Where(f => f.Kind == FindingKind.Open));
        JsonOutput.WriteTexts(json, "closing-keys", review.ClosingKeys);
        if (options.IncludesAll)
        {
            WriteFindings(json, "met", review.Findings.Where(f => f.Kind == FindingKind.Met));
            WriteFindings(json, "not-applicable", review.Findings.Where(f => f.Kind == FindingKind.NotApplicable));
        }

        WriteFindings(json, "hazards", review.Hazards);
        WriteAssumed(json, review);
        json.WriteEndObject();
    }

    private static void WriteCounts(Utf8JsonWriter json, MachineReview review)
    {
        var unmet = review.Unmet.ToLookup(f => f.Grade);
        var kinds = review.Findings.ToLookup(f => f.Kind);
        json.WriteStartObject("counts");
        json.WriteNumber("hold", unmet[Grade.Hold].Count());
        json.WriteNumber("query", unmet[Grade.Query].Count());
        json.WriteNumber("remark", unmet[Grade.Remark].Count());
        json.WriteNumber("waived", review.Waived.Count());
        json.WriteNumber("open", kinds[FindingKind.Open].Count());
        json.WriteNumber("met", kinds[FindingKind.Met].Count());
        json.WriteNumber("not-applicable", kinds[FindingKind.NotApplicable].Count());
        json.WriteEndObject();
    }

    private static void WriteFindings(Utf8JsonWriter json, string name, IEnumerable<Finding> findings)
    {
        json.WriteStartArray(name);
        foreach (Finding finding in findings)
        {
            Write(json, finding);
        }

        json.WriteEndArray();
    }

    private static void Write(Utf8JsonWriter json, Finding finding)
    {
        json.WriteStartObject();
        json.WriteString("rule", Printable.Line(finding.Rule.Id));
        json.WriteString("title", Printable.Line(finding.Rule.Title));
        if (finding.Kind != FindingKind.Hazard)
        {
            json.WriteString("grade", RuleText.GradeWord(finding.Grade));
        }

        json.WriteString("message", Printable.Sentence(finding.Message));
        json.WriteString("key", Printable.Line(finding.Key));
        json.WriteStartObject("place");
        json.WriteNumber("line", finding.Region.StartLine);
        json.WriteNumber("column", finding.Region.StartColumn);
        json.WriteNumber("end-line", finding.Region.EndLine);
        json.WriteNumber("end-column", finding.Region.EndColumn);
        json.WriteEndObject();
        WriteMeasure(json, finding);
        if (finding.Kind == FindingKind.Open)
        {
            JsonOutput.WriteTexts(json, "missing-keys", finding.MissingKeys);
        }

        json.WriteString("why", Printable.Sentence(finding.Rule.Why));
        json.WriteString("basis", Printable.Line(RuleText.BasisWords(finding.Rule.Basis)));
        JsonOutput.WriteTexts(json, "figures", finding.Figures);
        JsonOutput.WriteTexts(json, "safety-notes", finding.Rule.Safety);
        if (finding.Waiver is { } waiver)
        {
            json.WriteStartObject("waiver");
            json.WriteString("reason", Printable.Line(waiver.Reason));
            json.WriteString("approved-by", Printable.Line(waiver.ApprovedBy));
            json.WriteString("until", Printable.Line(waiver.Until));
            json.WriteNumber("line", waiver.Region.StartLine);
            json.WriteEndObject();
        }

        json.WriteEndObject();
    }

    private static void WriteMeasure(Utf8JsonWriter json, Finding finding)
    {
        if (finding.Value is null && finding.Limit is null)
        {
            return;
        }

        DisplayUnit unit = DisplayUnit.Of(finding.DisplayUnit, finding.Dimension);
        JsonOutput.WriteOptional(json, "value", finding.Value is { } value ? BandText.Rounded(unit.FromSi(value)) : null);
        JsonOutput.WriteOptional(json, "bound", finding.Limit is { } limit ? BandText.Rounded(unit.FromSi(limit)) : null);
        JsonOutput.WriteOptional(json, "uncertainty", finding.Uncertainty is { } band ? BandText.Rounded(unit.DifferenceFromSi(band)) : null);
        JsonOutput.WriteOptional(json, "margin", finding.Margin is { } margin ? BandText.Rounded(margin) : null);
        json.WriteString("unit", unit.Symbol.Length == 0 ? "1" : unit.Symbol);
    }

    private static void WriteAssumed(Utf8JsonWriter json, MachineReview review)
    {
        json.WriteStartObject("assumed");
        if (review.Figures is { } graph)
        {
            foreach (var figure in KeyFigures.AssumedBehind(graph, review.Findings.SelectMany(f => f.Figures)))
            {
                json.WriteString(figure.Name, Printable.Line(
                    string.Create(CultureInfo.InvariantCulture, $"{Derivations.ValueText.Of(figure)}: {figure.Outcome.Reason}")));
            }
        }

        json.WriteEndObject();
    }
}
