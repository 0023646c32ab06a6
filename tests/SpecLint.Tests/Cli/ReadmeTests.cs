namespace SpecLint.Tests.Cli;

/// <summary>What the README claims.</summary>
public sealed class ReadmeTests
{
    private static readonly string Readme = File.ReadAllText(Path.Combine(AppContext.BaseDirectory, "README.md"));

    [Fact]
    public void Excerpt_StandsInTheExamplesSheet()
    {
        const string Fence = "```text\n";
        int start = Readme.IndexOf(Fence, StringComparison.Ordinal) + Fence.Length;
        string excerpt = Readme[start..Readme.IndexOf("```", start, StringComparison.Ordinal)];
        string sheet = File.ReadAllText(Path.Combine(AppContext.BaseDirectory, "Golden", "wind-1kw-wide-coils.sheet.golden.txt"));

        foreach (string line in excerpt.Split('\n').Where(l => l.Length > 0 && l != "…"))
        {
            Assert.Contains(line + "\n", sheet, StringComparison.Ordinal);
        }
    }

    [Fact]
    public void Commands_OfTheTable_AreThoseOfTheProgram()
    {
        using var program = new SpecLintProcess();
        string help = program.Run("--help").Output;

        foreach (string command in (string[])["review", "figures", "working", "rule", "rules", "start", "completions"])
        {
            Assert.Contains($"`spec-lint {command}", Readme, StringComparison.Ordinal);
            Assert.Contains($"  {command} ", help, StringComparison.Ordinal);
        }
    }

    [Fact]
    public void FirstCommand_NamesAnExample()
    {
        Assert.Contains("review specs-examples/wind-1kw-wide-coils.yaml --sarif review.sarif", Readme, StringComparison.Ordinal);
        Assert.Contains("wind-1kw-wide-coils", ExampleSpecs.Names);
    }
}
