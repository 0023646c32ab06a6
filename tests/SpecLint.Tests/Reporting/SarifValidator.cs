using System.Diagnostics;

namespace SpecLint.Tests.Reporting;

/// <summary>Runs the SARIF validator that the environment variable SPEC_LINT_SARIF_MULTITOOL names.</summary>
internal static class SarifValidator
{
    /// <summary>What the validator has to say, without the wish for an information address; the calling test is skipped when there is no validator.</summary>
    public static async Task<IReadOnlyList<string>> ComplaintsAsync(string log, CancellationToken cancellation)
    {
        string? program = Environment.GetEnvironmentVariable("SPEC_LINT_SARIF_MULTITOOL");
        Assert.SkipUnless(!string.IsNullOrEmpty(program), "SPEC_LINT_SARIF_MULTITOOL does not name the validator's program.");
        string folder = Directory.CreateTempSubdirectory("spec-lint-").FullName;
        try
        {
            string file = Path.Combine(folder, "log.sarif");
            await File.WriteAllTextAsync(file, log, cancellation);
            var start = new ProcessStartInfo(program!) { UseShellExecute = false, RedirectStandardOutput = true, RedirectStandardError = true, WorkingDirectory = folder };
            foreach (string argument in (string[])["validate", "--rule-kind", "Sarif;Ghas", file])
            {
                start.ArgumentList.Add(argument);
            }

            using Process process = Process.Start(start)!;
            Task<string> errors = process.StandardError.ReadToEndAsync(cancellation);
            string output = await process.StandardOutput.ReadToEndAsync(cancellation);
            await process.WaitForExitAsync(cancellation);
            Assert.Contains("1 files scanned", output, StringComparison.Ordinal);
            return [.. (output + await errors).Split('\n')
                .Where(line => line.Contains(": error ", StringComparison.Ordinal) || line.Contains(": warning ", StringComparison.Ordinal) || line.Contains(": note ", StringComparison.Ordinal))
                .Where(line => !line.Contains("SARIF2005", StringComparison.Ordinal))];
        }
        finally
        {
            Directory.Delete(folder, recursive: true);
        }
    }
}
