using System.CommandLine;
using System.Globalization;
using SpecLint.Cli.Reviewing;
using SpecLint.Reporting.Listings;
using SpecLint.Review.Catalogue;
using SpecLint.Spec.Documents;
using SpecLint.Spec.Names;

namespace SpecLint.Cli.Commands;

/// <summary>Shows how a figure came about.</summary>
internal static class WorkingCommand
{
    private const int DefaultDepth = 1;

    public static Command Build(Streams streams)
    {
        Argument<string> spec = Shared.Spec();
        var figure = new Argument<string>("FIGURE") { HelpName = "FIGURE", Description = "The figure's name, e.g. resistance.phase.cold; 'spec-lint figures SPEC' lists them." };
        figure.CompletionSources.Add(_ => OurFigures.Catalogue.Definitions.Select(d => new System.CommandLine.Completions.CompletionItem(d.Name)));
        Option<string> format = Shared.Words("--format", "What to print.", "text", "markdown", "json");
        Option<string[]> set = Shared.Set();
        var depth = new Option<int>("--depth")
        {
            Description = "Levels of figures unfolded below the one asked for.",
            HelpName = "N",
            DefaultValueFactory = _ => DefaultDepth,
            CustomParser = result =>
            {
                if (int.TryParse(result.Tokens[0].Value, NumberStyles.None, CultureInfo.InvariantCulture, out int levels) && levels <= 50)
                {
                    return levels;
                }

                result.AddError($"--depth takes a whole number up to 50, not '{result.Tokens[0].Value}'");
                return DefaultDepth;
            },
        };
        var command = new Command("working", "Shows how a figure came about: formula, values, each input with its line in the spec, source.") { spec, figure, format, depth, set };
        command.SetAction(parsed =>
        {
            string name = parsed.GetValue(figure)!;
            if (OurFigures.Catalogue.Find(name) is null)
            {
                string? near = NearestName.Of(name, OurFigures.Catalogue.Definitions.Select(d => d.Name));
                throw new CannotRunException($"there is no figure '{name}'{(near is null ? "" : $"; the nearest is '{near}'")}");
            }

            SpecDocument document = SingleSpec.Read(parsed.GetValue(spec)!, parsed.GetValue(set) ?? [], streams);
            if (SingleSpec.Graph(document, streams) is not { } graph)
            {
                return (int)ExitCode.Findings;
            }

            var options = new WorkingOptions { Depth = parsed.GetValue(depth), Layout = Terminal.SheetOptions(includesAll: false) };
            switch (parsed.GetValue(format))
            {
                case "json":
                    streams.Output.Flush();
                    WorkingListing.WriteJson(graph, name, options, streams.RawOutput);
                    break;
                case "markdown":
                    WorkingListing.WriteMarkdown(graph, name, options, streams.Output);
                    break;
                default:
                    WorkingListing.WriteText(graph, name, options, streams.Output);
                    break;
            }

            return (int)ExitCode.Clear;
        });
        return command;
    }
}
