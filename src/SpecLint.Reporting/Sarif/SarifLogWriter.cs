using System.Globalization;
using System.Text;
using Microsoft.CodeAnalysis.Sarif;
using Newtonsoft.Json;
using SpecLint.Review.Reviewing;
using SpecLint.Reporting.Output;

namespace SpecLint.Reporting.Sarif;

/// <summary>
/// Writes reviews as a SARIF 2.1.0 log of one run: UTF-8 without byte-order mark, <c>\n</c> between lines, indented, and
/// byte-identical for the same reviews and options wherever and whenever it is written.
/// </summary>
public static class SarifLogWriter
{
    private const string AutomationId = "spec-lint/review/";

    /// <summary>Writes the log; the stream stays open.</summary>
    /// <param name="reviews">The reviews, in the order in which they are to appear.</param>
    /// <param name="options">What goes in besides them.</param>
    /// <param name="stream">Where to.</param>
    public static void Write(IReadOnlyList<MachineReview> reviews, SarifOptions options, Stream stream)
    {
        using var writer = new StreamWriter(stream, new UTF8Encoding(encoderShouldEmitUTF8Identifier: false), leaveOpen: true);
        Write(reviews, options, writer);
    }

    /// <summary>Writes the log; the writer stays open and decides the encoding.</summary>
    /// <param name="reviews">The reviews, in the order in which they are to appear.</param>
    /// <param name="options">What goes in besides them.</param>
    /// <param name="writer">Where to; its own line ends are not used.</param>
    public static void Write(IReadOnlyList<MachineReview> reviews, SarifOptions options, TextWriter writer)
    {
        ArgumentNullException.ThrowIfNull(reviews);
        ArgumentNullException.ThrowIfNull(options);
        ArgumentNullException.ThrowIfNull(writer);
        string newLine = writer.NewLine;
        writer.NewLine = "\n";
        using (var json = new JsonTextWriter(writer) { Formatting = Formatting.Indented, Culture = CultureInfo.InvariantCulture, CloseOutput = false })
        {
            var serializer = JsonSerializer.Create(new JsonSerializerSettings { Culture = CultureInfo.InvariantCulture, ContractResolver = new SarifContract() });
            serializer.Serialize(json, Log(reviews, options));
        }

        writer.NewLine = newLine;
        writer.Write('\n');
        writer.Flush();
    }

    private static SarifLog Log(IReadOnlyList<MachineReview> reviews, SarifOptions options)
    {
        var rules = new SarifRules(options.Rules, reviews);
        var artifacts = new List<Artifact>();
        var results = new List<Result>();
        foreach (MachineReview review in reviews)
        {
            string path = RelativePath.Of(review.Spec.Path, options.WorkingFolder);
            var places = new SarifPlaces(review.Spec, path, artifacts.Count);
            artifacts.Add(places.Artifact());
            results.AddRange(new SarifResults(review, options, rules, places, path).All());
        }

        var run = new Run
        {
            Tool = new Tool { Driver = Driver(rules, options) },
            Language = "en",
            ColumnKind = ColumnKind.Utf16CodeUnits,
            AutomationDetails = new RunAutomationDetails { Id = AutomationId },
            Invocations = [new Invocation { ExecutionSuccessful = options.RanToTheEnd }],
            Taxonomies = rules.Standards.IsEmpty ? null : [rules.Standards.Component(options.ProgramVersion)],
            Artifacts = artifacts,
            Results = results,
        };
        return new SarifLog { SchemaUri = new Uri("https://json.schemastore.org/sarif-2.1.0.json"), Version = SarifVersion.Current, Runs = [run] };
    }

    private static ToolComponent Driver(SarifRules rules, SarifOptions options) => new()
    {
        Name = "spec-lint",
        Version = options.ProgramVersion,
        SemanticVersion = options.ProgramVersion,
        ShortDescription = SarifText.Description("Recomputes permanent-magnet machines from their specs and checks each figure against a stated limit"),
        Language = "en",
        Rules = rules.Descriptors(),
        SupportedTaxonomies = rules.Standards.IsEmpty ? null : [SarifStandards.Reference()],
    };
}
