using System.Text;

namespace SpecLint.Tests;

/// <summary>Compares output byte for byte with a file under <c>Golden</c>; writes the file when SPEC_LINT_UPDATE_GOLDEN is 1.</summary>
internal static class Golden
{
    public static void Matches(string fileName, string actual)
    {
        if (Environment.GetEnvironmentVariable("SPEC_LINT_UPDATE_GOLDEN") == "1")
        {
            File.WriteAllText(Path.Combine(SourceFolder(), fileName), actual, new UTF8Encoding(encoderShouldEmitUTF8Identifier: false));
            return;
        }

        string path = Path.Combine(AppContext.BaseDirectory, "Golden", fileName);
        Assert.True(File.Exists(path), $"There is no golden file {fileName}; set SPEC_LINT_UPDATE_GOLDEN=1 to write it.");
        string expected = File.ReadAllText(path);
        if (!string.Equals(expected, actual, StringComparison.Ordinal))
        {
            Assert.Fail($"{fileName}: {FirstDifference(expected, actual)}");
        }
    }

    private static string FirstDifference(string expected, string actual)
    {
        string[] wanted = expected.Split('\n');
        string[] got = actual.Split('\n');
        int line = 0;
        while (line < wanted.Length && line < got.Length && wanted[line] == got[line])
        {
            line++;
        }

        string At(string[] lines) => line < lines.Length ? $"<{lines[line]}>" : "the end";
        return FormattableString.Invariant($"line {line + 1} is {At(got)}; expected {At(wanted)}");
    }

    private static string SourceFolder()
    {
        var folder = new DirectoryInfo(AppContext.BaseDirectory);
        while (folder is not null && !File.Exists(Path.Combine(folder.FullName, "SpecLint.Tests.csproj")))
        {
            folder = folder.Parent;
        }

        return Path.Combine(folder?.FullName ?? throw new InvalidOperationException("The source folder of the tests is not above the program."), "Golden");
    }
}
