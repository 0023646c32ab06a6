using System.Text;
using Microsoft.CodeAnalysis.Sarif;
using SpecLint.Review.Reviewing;
using SpecLint.Reporting.Output;

namespace SpecLint.Reporting.Sarif;

/// <summary>
/// Collects reviews one by one into a SARIF 2.1.0 log of one run and writes it: UTF-8 without byte-order mark, <c>\n</c> between
/// lines, indented, and byte-identical for the same reviews and options wherever and whenever it is written.
/// </summary>
/// <remarks>Keeps of a review only what the log needs, so that the figures of many machines are not held at once.</remarks>
public sealed class SarifLogBuilder
{
    private const string AutomationId = "spec-lint/review/";

    private readonly SarifOptions _options;
    private readonly SarifRules _rules;
    private readonly List<Artifact> _artifacts = [];
    private readonly List<Result> _results = [];
    private bool _ranToTheEnd;

    /// <summary>A log without results.</summary>
    /// <param name="options">What goes in besides the reviews.</param>
    public SarifLogBuilder(SarifOptions options)
    {
        ArgumentNullException.ThrowIfNull(options);
        _options = options;
        _rules = new SarifRules(options.Rules);
        _ranToTheEnd = options.RanToTheEnd;
    }

    /// <summary>Adds a review behind those added before.</summary>
    /// <param name="review">The review.</param>
    public void Add(MachineReview review)
    {
        ArgumentNullException.ThrowIfNull(review);
        string path = RelativePath.Of(review.Spec.Path, _options.WorkingFolder);
        var places = new SarifPlaces(review.Spec, path, _artifacts.Count);
        _artifacts.Add(places.Artifact());
        _results.AddRange(new SarifResults(review, _options, _rules, places, path).All());
    }

    /// <summary>Records that something asked for could not be read, so that the log does not claim to be whole.</summary>
    public void MarkIncomplete() => _ranToTheEnd = false;

    /// <summary>Writes the log; the stream stays open.</summary>
    /// <param name="stream">Where to.</param>
    public void Write(Stream stream)
    {
        ArgumentNullException.ThrowIfNull(stream);
        JsonOutput.Write(stream, json => SarifJson.Write(json, Log()));
    }

    /// <summary>Writes the log; the writer stays open and decides the encoding.</summary>
    /// <param name="writer">Where to; its own line ends are not used.</param>
    public void Write(TextWriter writer)
    {
        ArgumentNullException.ThrowIfNull(writer);
        using var stream = new MemoryStream();
        Write(stream);
        writer.Write(Encoding.UTF8.GetString(stream.GetBuffer().AsSpan(0, (int)stream.Length)));
    }

    /// <summary>The log as objects.</summary>
    internal SarifLog Log()
    {
        SarifStandards standards = _rules.Standards();
        var run = new Run
        {
            Tool = new Tool { Driver = Driver(standards) },
            Language = "en",
            ColumnKind = ColumnKind.Utf16CodeUnits,
            AutomationDetails = new RunAutomationDetails { Id = AutomationId },
            Invocations = [new Invocation { ExecutionSuccessful = _ranToTheEnd }],
            Taxonomies = standards.IsEmpty ? null : [standards.Component(_options.ProgramVersion)],
            Artifacts = _artifacts,
            Results = _results,
        };
        return new SarifLog { SchemaUri = new Uri("https://json.schemastore.org/sarif-2.1.0.json"), Version = SarifVersion.Current, Runs = [run] };
    }

    private ToolComponent Driver(SarifStandards standards) => new()
    {
        Name = "spec-lint",
        Version = _options.ProgramVersion,
        SemanticVersion = _options.ProgramVersion,
        ShortDescription = SarifText.Description("Recomputes permanent-magnet machines from their specs and checks each figure against a stated limit"),
        Language = "en",
        Rules = _rules.Descriptors(standards),
        SupportedTaxonomies = standards.IsEmpty ? null : [SarifStandards.Reference()],
    };
}
