using System.CommandLine;
using System.Globalization;
using SpecLint.Cli.Reviewing;
using SpecLint.Review.Rules;

namespace SpecLint.Cli.Commands;

/// <summary>Reviews specs.</summary>
internal static class ReviewCommand
{
    public static Command Build(Streams streams)
    {
        var paths = new Argument<string[]>("PATH")
        {
            Description = "Spec files, folders (the YAML files in them with a top-level key 'spec'), patterns such as 'designs/**/*.yaml', or - for standard input.",
            Arity = ArgumentArity.OneOrMore,
        };
        Shared.RefuseOptions(paths);
        var sarif = new Option<string?>("--sarif") { Description = "Also write the findings as a SARIF 2.1.0 log.", HelpName = "FILE" };
        Option<string> format = Shared.Words("--format", "What to print.", "text", "json");
        Option<string[]> rulebooks = Shared.Rulebook();
        var house = new Option<string?>("--house")
        {
            Description = "A house file (YAML): further rulebooks, other bounds and grades, waivers for every spec.",
            HelpName = "FILE",
        };
        Option<string> failAt = Shared.Words("--fail-at", "The least grade of a finding that makes the exit code 1.", "hold", "query", "remark");
        var all = new Option<bool>("--all") { Description = "Also report the rules that are met, open or not applicable." };
        Option<string[]> set = Shared.Set();
        var on = new Option<DateOnly?>("--on")
        {
            Description = "The day on which waivers must still hold; without it their end dates are not judged.",
            HelpName = "YYYY-MM-DD",
            CustomParser = result =>
            {
                if (DateOnly.TryParseExact(result.Tokens[0].Value, "yyyy-MM-dd", CultureInfo.InvariantCulture, DateTimeStyles.None, out DateOnly day))
                {
                    return day;
                }

                result.AddError($"--on takes a date such as 2027-03-31, not '{result.Tokens[0].Value}'");
                return null;
            },
        };
        var stdinPath = new Option<string>("--stdin-path")
        {
            Description = "The name under which a spec from standard input is reported.",
            HelpName = "NAME",
            DefaultValueFactory = _ => "stdin.yaml",
        };
        var leaveOutWaived = new Option<bool>("--without-waived") { Description = "Leave waived findings out of the SARIF log, for hosts that would show them as unanswered." };
        var command = new Command("review", "Reviews specs: findings first, then the machine's figures, its hazards and the outcome.")
        {
            paths, sarif, format, rulebooks, house, failAt, all, set, on, stdinPath, leaveOutWaived,
        };
        command.SetAction(parsed => (int)ReviewRun.Execute(
            new ReviewRequest
            {
                Paths = parsed.GetValue(paths) ?? [],
                SarifPath = parsed.GetValue(sarif),
                PrintsJson = parsed.GetValue(format) == "json",
                Rulebooks = parsed.GetValue(rulebooks) ?? [],
                HousePath = parsed.GetValue(house),
                FailAt = parsed.GetValue(failAt) switch { "remark" => Grade.Remark, "query" => Grade.Query, _ => Grade.Hold },
                IncludesAll = parsed.GetValue(all),
                Changes = parsed.GetValue(set) ?? [],
                On = parsed.GetValue(on),
                StandardInputName = parsed.GetValue(stdinPath) ?? "stdin.yaml",
                LeavesOutWaived = parsed.GetValue(leaveOutWaived),
            },
            streams));
        return command;
    }
}
