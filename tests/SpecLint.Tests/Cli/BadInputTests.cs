using System.Text;

namespace SpecLint.Tests.Cli;

/// <summary>Texts that are no specs: located findings or exit 2, never a trace, never a partial file, and the good spec beside them is reviewed.</summary>
public sealed class BadInputTests : IDisposable
{
    private static readonly string Good = File.ReadAllText(Path.Combine(ExampleSpecs.Folder, "wind-1kw.yaml"));

    private readonly SpecLintProcess _program = new();

    public static TheoryData<string, string> Texts => new()
    {
        { "empty", "" },
        { "blank", "\n\n   \n" },
        { "tabs", "spec: 1\nmachine:\n\trole: generator\n" },
        { "list", "- spec\n- 1\n" },
        { "scalar", "spec" },
        { "duplicate keys", Good.Replace("title:", "revision: A\nrevision: B\ntitle:", StringComparison.Ordinal) },
        { "wrong type", Good.Replace("poles: 12", "poles: {a: 1}", StringComparison.Ordinal) },
        { "not a number", Good.Replace("poles: 12", "poles: .nan", StringComparison.Ordinal) },
        { "fraction", Good.Replace("poles: 12", "poles: 12.5", StringComparison.Ordinal) },
        { "huge count", Good.Replace("poles: 12", "poles: 1000000000000", StringComparison.Ordinal) },
        { "hollow", "spec: 1\n" },
        { "deep", new string('[', 5000) },
        { "deep block", string.Concat(Enumerable.Range(0, 1000).Select(i => new string(' ', i) + "a:\n")) },
        { "alias bomb", "a: &a [x,x,x,x,x,x,x,x,x]\nb: &b [*a,*a,*a,*a,*a,*a,*a,*a,*a]\nc: &c [*b,*b,*b,*b,*b,*b,*b,*b,*b]\nd: &d [*c,*c,*c,*c,*c,*c,*c,*c,*c]\ne: &e [*d,*d,*d,*d,*d,*d,*d,*d,*d]\nf: [*e,*e,*e,*e,*e,*e,*e,*e,*e]\n" },
        { "self alias", "a: &a [*a]\n" },
        { "unclosed", "spec: {1\n" },
        { "two documents", Good + "\n---\n" + Good },
    };

    [Theory]
    [MemberData(nameof(Texts))]
    public void Review_BadText_IsALocatedFindingBesideAGoodReview(string name, string text)
    {
        Assert.NotEmpty(name);
        _program.Write("good.yaml", Good);
        _program.Write("bad.yaml", text);

        ProcessOutcome run = _program.Run("review", "bad.yaml", "good.yaml", "--sarif", "log.sarif");

        Assert.Equal(1, run.ExitCode);
        Assert.Contains("DOC-01", run.Output, StringComparison.Ordinal);
        Assert.Contains("bad.yaml, line ", run.Output, StringComparison.Ordinal);
        Assert.Contains("good.yaml", run.Output, StringComparison.Ordinal);
        Assert.DoesNotMatch(@"   at (SpecLint|System|YamlDotNet|NJsonSchema)\.", run.Error + run.Output);
        Assert.True(_program.Has("log.sarif"));
    }

    [Fact]
    public void Review_Binary_IsAFinding()
    {
        byte[] bytes = [.. Enumerable.Range(0, 4096).Select(i => (byte)((i * 197) ^ (i >> 3)))];
        _program.Write("bad.yaml", bytes);

        ProcessOutcome run = _program.Run("review", "bad.yaml");

        Assert.Equal(1, run.ExitCode);
        Assert.Contains("DOC-01", run.Output, StringComparison.Ordinal);
    }

    [Fact]
    public void Review_FiftyMegabytes_IsAFinding()
    {
        _program.Write("bad.yaml", Encoding.ASCII.GetBytes("a: " + new string('x', 50 * 1024 * 1024)));

        ProcessOutcome run = _program.Run("review", "bad.yaml");

        Assert.Equal(1, run.ExitCode);
        Assert.Contains("DOC-01", run.Output, StringComparison.Ordinal);
    }

    [Theory]
    [InlineData("gap.clearance", "3 km")]
    [InlineData("gap.clearance", "-1 mm")]
    [InlineData("gap.clearance", "1.5")]
    [InlineData("gap.clearance", "1,5 mm")]
    [InlineData("gap.clearance", "1.5 V")]
    [InlineData("gap.clearance", "NaN mm")]
    [InlineData("magnets.thickness", "0 mm")]
    [InlineData("magnets.thickness", "1e300 mm")]
    [InlineData("winding.turns", "-4")]
    [InlineData("winding.coil.hole-length", "900 mm")]
    public void Figures_AbsurdValue_AreRefusedOnTheCommandLine(string key, string value)
    {
        _program.Write("good.yaml", Good);

        ProcessOutcome run = _program.Run("review", "good.yaml", "--set", $"{key}={value}");

        Assert.NotEqual(0, run.ExitCode);
        Assert.NotEqual(3, run.ExitCode);
        Assert.DoesNotMatch(@"   at (SpecLint|System|YamlDotNet|NJsonSchema)\.", run.Error + run.Output);
    }

    [Theory]
    [InlineData("stator: coreless", "stator: slotted")]
    [InlineData("stator: coreless", "stator: slotless")]
    [InlineData("topology: axial-flux", "topology: radial-flux")]
    public void Review_ConstructionNotCovered_IsOneLocatedFault(string from, string to)
    {
        _program.Write("other.yaml", Good.Replace(from, to, StringComparison.Ordinal));

        ProcessOutcome run = _program.Run("review", "other.yaml", "--format", "json");

        Assert.Equal(1, run.ExitCode);
        Assert.Equal(1, run.Output.Split("\"DOC-01\"").Length - 1);
        Assert.DoesNotContain("emf.", run.Output, StringComparison.Ordinal);
    }

    public void Dispose() => _program.Dispose();
}
