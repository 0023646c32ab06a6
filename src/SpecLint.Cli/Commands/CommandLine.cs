using System.CommandLine;

namespace SpecLint.Cli.Commands;

/// <summary>All commands with their options.</summary>
internal static class CommandLine
{
    /// <summary>The command line of the program.</summary>
    /// <param name="streams">Where to read and write.</param>
    public static RootCommand Build(Streams streams)
    {
        var root = new RootCommand("Reviews specs of permanent-magnet generators and motors: recomputes the machine, holds each figure against a sourced limit, and says what to change.")
        {
            ReviewCommand.Build(streams),
            FiguresCommand.Build(streams),
            WorkingCommand.Build(streams),
            RuleCommand.Build(streams),
            RulesCommand.Build(streams),
            StartCommand.Build(streams),
            CompletionsCommand.Build(streams),
        };
        root.Options.Add(new Option<bool>("--verbose")
        {
            Description = "Say more when something goes wrong.",
            Recursive = true,
        });
        return root;
    }
}
