using System.CommandLine;
using SpecLint.Cli.Reviewing;
using SpecLint.Reporting.Listings;
using SpecLint.Review.Rules;

namespace SpecLint.Cli.Commands;

/// <summary>Lists the rules.</summary>
internal static class RulesCommand
{
    public static Command Build(Streams streams)
    {
        Option<string[]> rulebooks = Shared.Rulebook();
        Option<string> format = Shared.Words("--format", "What to print.", "text", "json");
        var command = new Command("rules", "Lists the rules with their grades.") { rulebooks, format };
        command.SetAction(parsed =>
        {
            IEnumerable<Rule> rules = RulebookSource.Load(parsed.GetValue(rulebooks) ?? []).Books.SelectMany(b => b.Rules);
            if (parsed.GetValue(format) == "json")
            {
                streams.Output.Flush();
                RuleListing.WriteJson(rules, streams.RawOutput);
            }
            else
            {
                RuleListing.WriteTable(rules, Terminal.SheetOptions(includesAll: false), streams.Output);
            }

            return (int)ExitCode.Clear;
        });
        return command;
    }
}
