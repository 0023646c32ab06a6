using System.CommandLine;
using System.CommandLine.Parsing;

namespace SpecLint.Cli.Commands;

/// <summary>Arguments and options that several commands share.</summary>
internal static class Shared
{
    /// <summary>One spec.</summary>
    public static Argument<string> Spec() => new("SPEC") { Description = "The spec file, or - for standard input." };

    /// <summary>Changed values.</summary>
    public static Option<string[]> Set() => new("--set")
    {
        Description = "What if: review with KEY=VALUE instead of what the spec says, e.g. --set winding.turns=60 --set \"gap.clearance=2 mm\". May be repeated.",
        HelpName = "KEY=VALUE",
        AllowMultipleArgumentsPerToken = false,
    };

    /// <summary>Further rulebooks.</summary>
    public static Option<string[]> Rulebook() => new("--rulebook")
    {
        Description = "A further rulebook (YAML). May be repeated.",
        HelpName = "FILE",
        AllowMultipleArgumentsPerToken = false,
    };

    /// <summary>An option with a fixed set of words, compared exactly.</summary>
    /// <param name="name">Name with dashes.</param>
    /// <param name="description">Help text.</param>
    /// <param name="words">The words; the first is the default.</param>
    public static Option<string> Words(string name, string description, params string[] words)
    {
        var option = new Option<string>(name)
        {
            Description = $"{description} One of: {string.Join(", ", words)}.",
            HelpName = string.Join('|', words),
            DefaultValueFactory = _ => words[0],
        };
        option.CompletionSources.Add(words);
        option.Validators.Add(result =>
        {
            string? word = result.Tokens.Count > 0 ? result.Tokens[^1].Value : null;
            if (word is not null && !words.Contains(word, StringComparer.Ordinal))
            {
                result.AddError($"{name} takes {string.Join(" or ", words)}, not '{word}'");
            }
        });
        return option;
    }

    /// <summary>A refusal of arguments that look like options: a list of paths would swallow a mistyped option.</summary>
    /// <param name="argument">The argument to guard.</param>
    public static void RefuseOptions(Argument argument) => argument.Validators.Add(static (ArgumentResult result) =>
    {
        foreach (Token token in result.Tokens)
        {
            if (token.Value.Length > 1 && token.Value[0] == '-')
            {
                result.AddError($"there is no option {token.Value}");
            }
        }
    });
}
