using System.CommandLine;

namespace SpecLint.Cli.Commands;

/// <summary>Prints a completion script for a shell; the shell then asks the program itself for the words.</summary>
internal static class CompletionsCommand
{
    private const string Bash = """
        # Completion of spec-lint in bash: source this file, or place it among your completion files.
        _spec_lint() {
            local IFS=$'\n'
            COMPREPLY=($(compgen -W "$(spec-lint "[suggest:$COMP_POINT]" "$COMP_LINE" 2>/dev/null)" -- "${COMP_WORDS[COMP_CWORD]}"))
        }
        complete -o default -F _spec_lint spec-lint
        """;

    private const string Zsh = """
        # Completion of spec-lint in zsh: source this file after compinit.
        _spec_lint() {
            local -a words_found
            words_found=("${(@f)$(spec-lint "[suggest:$CURSOR]" "$BUFFER" 2>/dev/null)}")
            compadd -a words_found
            _files
        }
        compdef _spec_lint spec-lint
        """;

    private const string Fish = """
        # Completion of spec-lint in fish: place this file among your completion files.
        complete -c spec-lint -a '(spec-lint "[suggest:"(commandline -C)"]" (commandline -p) 2>/dev/null)'
        """;

    public static Command Build(Streams streams)
    {
        var shell = new Argument<string>("SHELL") { HelpName = "SHELL", Description = "bash, zsh or fish." };
        shell.CompletionSources.Add("bash", "zsh", "fish");
        shell.Validators.Add(result =>
        {
            if (result.Tokens.Count > 0 && result.Tokens[0].Value is not ("bash" or "zsh" or "fish"))
            {
                result.AddError($"there is no script for '{result.Tokens[0].Value}'; bash, zsh and fish are known");
            }
        });
        var command = new Command("completions", "Prints a completion script for a shell.") { shell };
        command.SetAction(parsed =>
        {
            streams.Output.WriteLine(parsed.GetValue(shell) switch
            {
                "zsh" => Zsh,
                "fish" => Fish,
                _ => Bash,
            });
            return (int)ExitCode.Clear;
        });
        return command;
    }
}
