using System.CommandLine;
using System.CommandLine.Invocation;
using System.CommandLine.Parsing;
using System.Globalization;
using System.Text;
using SpecLint.Cli.Commands;

namespace SpecLint.Cli;

/// <summary>The program: one command a verb of the review.</summary>
internal static class Program
{
    private static int Main(string[] arguments)
    {
        // Numbers, dates and comparisons must not depend on the machine's locale.
        CultureInfo.CurrentCulture = CultureInfo.InvariantCulture;
        CultureInfo.CurrentUICulture = CultureInfo.InvariantCulture;
        CultureInfo.DefaultThreadCurrentCulture = CultureInfo.InvariantCulture;
        CultureInfo.DefaultThreadCurrentUICulture = CultureInfo.InvariantCulture;
        using Stream standardOutput = Console.OpenStandardOutput();
        using var output = new StreamWriter(standardOutput, new UTF8Encoding(encoderShouldEmitUTF8Identifier: false))
        {
            NewLine = "\n",
        };
        using var error = new StreamWriter(Console.OpenStandardError(), new UTF8Encoding(encoderShouldEmitUTF8Identifier: false))
        {
            NewLine = "\n",
            AutoFlush = true,
        };
        return (int)Run(arguments, new Streams(output, standardOutput, error, Console.OpenStandardInput));
    }

    /// <summary>Runs one command line.</summary>
    /// <param name="arguments">The arguments.</param>
    /// <param name="streams">Where to read and write.</param>
    internal static ExitCode Run(string[] arguments, Streams streams)
    {
        bool verbose = arguments.Contains("--verbose", StringComparer.Ordinal);
        try
        {
            RootCommand root = CommandLine.Build(streams);
            ParseResult parsed = root.Parse(arguments, new ParserConfiguration { ResponseFileTokenReplacer = null });
            if (parsed.Action is ParseErrorAction)
            {
                foreach (ParseError problem in parsed.Errors)
                {
                    streams.Error.WriteLine($"spec-lint: {problem.Message}");
                }

                streams.Error.WriteLine("spec-lint: 'spec-lint --help' lists the commands, 'spec-lint COMMAND --help' their options");
                return ExitCode.CouldNotRun;
            }

            return (ExitCode)parsed.Invoke(new InvocationConfiguration
            {
                Output = streams.Output,
                Error = streams.Error,
                EnableDefaultExceptionHandler = false,
            });
        }
        catch (CannotRunException e)
        {
            streams.Error.WriteLine($"spec-lint: {e.Message}");
            return ExitCode.CouldNotRun;
        }
        catch (Exception e) when (e is not OutOfMemoryException)
        {
            streams.Error.WriteLine($"spec-lint: a fault of the program itself: {(verbose ? e.ToString() : e.Message.ReplaceLineEndings(" "))}");
            return ExitCode.ProgramFault;
        }
        finally
        {
            streams.Output.Flush();
        }
    }
}
