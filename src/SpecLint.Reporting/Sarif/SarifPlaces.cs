using Microsoft.CodeAnalysis.Sarif;
using SpecLint.Reporting.Output;
using SpecLint.Spec.Documents;
using SarifRegion = Microsoft.CodeAnalysis.Sarif.Region;
using TextRegion = SpecLint.Spec.Yaml.Region;

namespace SpecLint.Reporting.Sarif;

/// <summary>Locations in one spec of the run.</summary>
internal sealed class SarifPlaces
{
    private const int MostContextLines = 10;

    private static readonly string[] LineEnds = ["\r\n", "\n", "\r"];

    private readonly SpecDocument _spec;
    private readonly Uri _uri;
    private readonly int _artifactIndex;
    private readonly string[] _lines;

    /// <summary>Locations in a spec.</summary>
    /// <param name="spec">The spec.</param>
    /// <param name="relativePath">Its path from the working folder.</param>
    /// <param name="artifactIndex">Its place in the run's artifacts.</param>
    public SarifPlaces(SpecDocument spec, string relativePath, int artifactIndex)
    {
        _spec = spec;
        _uri = new Uri(RelativePath.Escape(relativePath), UriKind.Relative);
        _artifactIndex = artifactIndex;
        _lines = spec.Text.Split(LineEnds, StringSplitOptions.None);
    }

    /// <summary>The spec as an artifact of the run.</summary>
    public Artifact Artifact() => new()
    {
        Location = new ArtifactLocation { Uri = _uri, Index = _artifactIndex },
        MimeType = "application/x-yaml",
        SourceLanguage = "yaml",
        Roles = ArtifactRoles.AnalysisTarget,
    };

    /// <summary>A place of the spec with the key that stands there.</summary>
    /// <param name="region">The place.</param>
    /// <param name="key">Dotted key; empty for the document.</param>
    public Location Location(TextRegion region, string key) => new()
    {
        PhysicalLocation = new PhysicalLocation
        {
            ArtifactLocation = new ArtifactLocation { Uri = _uri, Index = _artifactIndex },
            Region = Region(region),
        },
        LogicalLocations = key.Length == 0 ? null : [Key(key)],
    };

    /// <summary>A place of the spec with the key that stands there and the lines round it, for readers without the file.</summary>
    /// <param name="region">The place.</param>
    /// <param name="key">Dotted key; empty for the document.</param>
    public Location LocationWithContext(TextRegion region, string key)
    {
        Location location = Location(region, key);
        int first = Math.Max(1, region.StartLine - 1);
        int last = Math.Min(_lines.Length, Math.Min(region.EndLine, region.StartLine + MostContextLines) + 1);
        if (last > first)
        {
            location.PhysicalLocation.ContextRegion = new SarifRegion
            {
                StartLine = first,
                EndLine = last,
                Snippet = new ArtifactContent { Text = string.Join('\n', _lines[(first - 1)..last]) },
            };
        }

        return location;
    }

    /// <summary>A place of the spec as a step of a working; without the text, which the step's message tells.</summary>
    /// <param name="region">The place.</param>
    /// <param name="key">Dotted key.</param>
    public Location StepLocation(TextRegion region, string key)
    {
        Location location = Location(region, key);
        location.PhysicalLocation.Region.Snippet = null;
        return location;
    }

    /// <summary>A place of the spec at which a figure of the machine is told, since a figure has no line of its own.</summary>
    /// <param name="region">The place.</param>
    /// <param name="figure">Figure name.</param>
    public Location FigureLocation(TextRegion region, string figure)
    {
        Location location = StepLocation(region, key: "");
        location.LogicalLocations = [new LogicalLocation { Name = LastPart(figure), FullyQualifiedName = figure, Kind = "variable" }];
        return location;
    }

    private LogicalLocation Key(string key) => new()
    {
        Name = LastPart(key),
        FullyQualifiedName = Printable.Line(key),
        Kind = _spec.Find(key) is null && _spec.States(key) ? "object" : "property",
    };

    private static string LastPart(string name) => Printable.Line(name[(name.LastIndexOf('.') + 1)..]);

    private SarifRegion Region(TextRegion region)
    {
        var sarif = new SarifRegion
        {
            StartLine = region.StartLine,
            StartColumn = region.StartColumn,
            EndLine = region.EndLine,
            EndColumn = region.EndColumn,
        };
        if (region.StartLine == region.EndLine && region.StartLine <= _lines.Length)
        {
            string line = _lines[region.StartLine - 1];
            int start = Math.Min(region.StartColumn - 1, line.Length);
            int end = Math.Clamp(region.EndColumn - 1, start, line.Length);
            if (end > start)
            {
                sarif.Snippet = new ArtifactContent { Text = line[start..end] };
            }
        }

        return sarif;
    }
}
