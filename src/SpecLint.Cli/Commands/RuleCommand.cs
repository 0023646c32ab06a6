using System.CommandLine;
using SpecLint.Cli.Reviewing;
using SpecLint.Reporting.Listings;
using SpecLint.Review.Catalogue;
using SpecLint.Review.Rules;
using SpecLint.Spec.Names;

namespace SpecLint.Cli.Commands;

/// <summary>Shows one rule in full.</summary>
internal static class RuleCommand
{
    public static Command Build(Streams streams)
    {
        var id = new Argument<string>("ID") { HelpName = "ID", Description = "The rule's identifier, e.g. FIT-04; 'spec-lint rules' lists them." };
        id.CompletionSources.Add(_ => OurRulebooks.All.SelectMany(b => b.Rules).Select(r => new System.CommandLine.Completions.CompletionItem(r.Id)));
        Option<string[]> rulebooks = Shared.Rulebook();
        var command = new Command("rule", "Shows one rule: what it demands, why, from what source, what to change, what can hurt someone.") { id, rulebooks };
        command.SetAction(parsed =>
        {
            string wanted = parsed.GetValue(id)!;
            var rules = RulebookSource.Load(parsed.GetValue(rulebooks) ?? []).Books.SelectMany(b => b.Rules).ToList();
            Rule? rule = rules.Find(r => string.Equals(r.Id, wanted, StringComparison.OrdinalIgnoreCase));
            if (rule is null)
            {
                string? near = NearestName.Of(wanted.ToUpperInvariant(), rules.Select(r => r.Id));
                throw new CannotRunException($"there is no rule '{wanted}'{(near is null ? "" : $"; the nearest is {near}")}");
            }

            RuleListing.WriteText(rule, Terminal.SheetOptions(includesAll: false), streams.Output);
            return (int)ExitCode.Clear;
        });
        return command;
    }
}
