using System.CommandLine;
using SpecLint.Cli.Reviewing;
using SpecLint.Reporting.Listings;
using SpecLint.Review.Figures;
using SpecLint.Spec.Documents;

namespace SpecLint.Cli.Commands;

/// <summary>Lists the figures of a machine.</summary>
internal static class FiguresCommand
{
    public static Command Build(Streams streams)
    {
        Argument<string> spec = Shared.Spec();
        Option<string> format = Shared.Words("--format", "What to print; JSON holds SI units.", "text", "json");
        Option<string[]> set = Shared.Set();
        var command = new Command("figures", "Lists every figure of a machine: value, unit, uncertainty, or why there is none.") { spec, format, set };
        command.SetAction(parsed =>
        {
            SpecDocument document = SingleSpec.Read(parsed.GetValue(spec)!, parsed.GetValue(set) ?? [], streams);
            if (SingleSpec.Graph(document, streams) is not { } graph)
            {
                return (int)ExitCode.Findings;
            }

            IEnumerable<Figure> figures = graph.All();
            if (parsed.GetValue(format) == "json")
            {
                streams.Output.Flush();
                FigureListing.WriteJson(figures, streams.RawOutput);
            }
            else
            {
                FigureListing.WriteText(figures, Terminal.SheetOptions(includesAll: false), streams.Output);
            }

            return (int)ExitCode.Clear;
        });
        return command;
    }
}
