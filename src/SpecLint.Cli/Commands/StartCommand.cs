using System.CommandLine;
using System.Reflection;

namespace SpecLint.Cli.Commands;

/// <summary>Prints a new, commented spec to fill in.</summary>
internal static class StartCommand
{
    public static Command Build(Streams streams)
    {
        Option<string> topology = Shared.Words("--topology", "The machine's topology.", "axial-flux", "linear");
        topology.Required = false;
        var command = new Command("start", "Prints a new, commented spec to fill in: spec-lint start --topology linear > machine.yaml") { topology };
        command.SetAction(parsed =>
        {
            string name = $"speclint.start.{parsed.GetValue(topology)}.yaml";
            using Stream stream = Assembly.GetExecutingAssembly().GetManifestResourceStream(name)
                ?? throw new InvalidOperationException($"The resource {name} is missing.");
            using var reader = new StreamReader(stream);
            streams.Output.Write(reader.ReadToEnd().ReplaceLineEndings("\n"));
            return (int)ExitCode.Clear;
        });
        return command;
    }
}
