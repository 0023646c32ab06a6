using System.Diagnostics;

namespace SpecLint.Tests.Cli;

/// <summary>Runs the program as a process in a folder of its own.</summary>
internal sealed class SpecLintProcess : IDisposable
{
    private static readonly TimeSpan Patience = TimeSpan.FromSeconds(60);

    public SpecLintProcess() => Folder = Directory.CreateTempSubdirectory("spec-lint-").FullName;

    public string Folder { get; }

    public string Write(string name, string text)
    {
        string path = Path.Combine(Folder, name);
        Directory.CreateDirectory(Path.GetDirectoryName(path)!);
        File.WriteAllText(path, text);
        return name;
    }

    public string Write(string name, byte[] bytes)
    {
        File.WriteAllBytes(Path.Combine(Folder, name), bytes);
        return name;
    }

    public string Read(string name) => File.ReadAllText(Path.Combine(Folder, name));

    public bool Has(string name) => File.Exists(Path.Combine(Folder, name));

    public ProcessOutcome Run(params string[] arguments) => RunWith(null, null, arguments);

    public ProcessOutcome RunWith(string? input, IReadOnlyDictionary<string, string>? environment, params string[] arguments)
    {
        var start = new ProcessStartInfo("dotnet")
        {
            UseShellExecute = false,
            RedirectStandardInput = true,
            RedirectStandardOutput = true,
            RedirectStandardError = true,
            WorkingDirectory = Folder,
        };
        start.ArgumentList.Add(Path.Combine(AppContext.BaseDirectory, "spec-lint.dll"));
        foreach (string argument in arguments)
        {
            start.ArgumentList.Add(argument);
        }

        foreach (var (name, value) in environment ?? new Dictionary<string, string>(StringComparer.Ordinal))
        {
            start.Environment[name] = value;
        }

        using Process process = Process.Start(start) ?? throw new InvalidOperationException("The program does not start.");
        Task<string> output = process.StandardOutput.ReadToEndAsync();
        Task<string> error = process.StandardError.ReadToEndAsync();
        if (input is not null)
        {
            process.StandardInput.Write(input);
        }

        process.StandardInput.Close();
        if (!process.WaitForExit(Patience))
        {
            process.Kill(entireProcessTree: true);
            Assert.Fail($"The program hangs on {string.Join(' ', arguments)}.");
        }

        return new ProcessOutcome(process.ExitCode, output.GetAwaiter().GetResult(), error.GetAwaiter().GetResult());
    }

    public void Dispose() => Directory.Delete(Folder, recursive: true);
}

/// <summary>What a run of the program left.</summary>
internal sealed record ProcessOutcome(int ExitCode, string Output, string Error);
