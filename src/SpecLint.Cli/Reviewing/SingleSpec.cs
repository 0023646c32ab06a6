using SpecLint.Reporting.Output;
using SpecLint.Reporting.Sheets;
using SpecLint.Review.Catalogue;
using SpecLint.Review.Figures;
using SpecLint.Review.Reviewing;
using SpecLint.Spec.Documents;

namespace SpecLint.Cli.Reviewing;

/// <summary>One spec for the commands that look at its figures.</summary>
internal static class SingleSpec
{
    /// <summary>Reads a spec with changes.</summary>
    /// <param name="path">File, or <c>-</c>.</param>
    /// <param name="changes"><c>KEY=VALUE</c> texts.</param>
    /// <param name="streams">Standard input.</param>
    public static SpecDocument Read(string path, IReadOnlyList<string> changes, Streams streams) =>
        SpecSource.Change(SpecSource.Read(path, "stdin.yaml", streams), changes);

    /// <summary>The machine's figures, or null when the text's faults leave none; its faults are then told on standard error.</summary>
    /// <param name="spec">The spec.</param>
    /// <param name="streams">Where messages go.</param>
    public static FigureGraph? Graph(SpecDocument spec, Streams streams)
    {
        foreach (SpecFault fault in spec.Faults)
        {
            streams.Error.WriteLine($"spec-lint: {ReviewWords.Place(spec, fault.Region.StartLine)}: {Printable.Line(fault.Message)}");
        }

        return ReadingReview.LeavesMachine(spec) ? new FigureGraph(spec, OurFigures.Catalogue) : null;
    }
}
