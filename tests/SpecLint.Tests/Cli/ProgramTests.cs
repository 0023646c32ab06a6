using System.Text;
using System.Text.Json;

namespace SpecLint.Tests.Cli;

/// <summary>The program as a process: exit codes, streams, files.</summary>
public sealed class ProgramTests : IDisposable
{
    private static readonly string Good = File.ReadAllText(Path.Combine(ExampleSpecs.Folder, "wind-1kw.yaml"));

    private readonly SpecLintProcess _program = new();

    [Fact]
    public void Review_SoundSpec_ExitsZeroAndWritesTheLog()
    {
        _program.Write("good.yaml", Good);

        ProcessOutcome run = _program.Run("review", "good.yaml", "--sarif", "good.sarif");

        Assert.Equal(0, run.ExitCode);
        Assert.Contains("Outcome", run.Output, StringComparison.Ordinal);
        Assert.Empty(run.Error);
        using JsonDocument log = JsonDocument.Parse(_program.Read("good.sarif"));
        Assert.Equal("2.1.0", log.RootElement.GetProperty("version").GetString());
        Assert.Contains(
            log.RootElement.GetProperty("runs")[0].GetProperty("results").EnumerateArray(),
            r => r.TryGetProperty("kind", out JsonElement kind) && kind.GetString() == "informational");
    }

    [Fact]
    public void Review_HeldSpec_ExitsOne()
    {
        _program.Write("odd.yaml", Good.Replace("poles: 12", "poles: 11", StringComparison.Ordinal));

        ProcessOutcome run = _program.Run("review", "odd.yaml");

        Assert.Equal(1, run.ExitCode);
        Assert.Contains("FLX-13", run.Output, StringComparison.Ordinal);
    }

    [Fact]
    public void Review_FailAtRemark_ExitsOneOnAnyFinding()
    {
        _program.Write("thin.yaml", Good.Replace("back-iron: {material: mild-steel, thickness: 10 mm", "back-iron: {material: mild-steel, thickness: 4 mm", StringComparison.Ordinal));

        Assert.Equal(1, _program.Run("review", "thin.yaml", "--fail-at", "remark", "--set", "magnets.pitch-radius=118 mm").ExitCode);
    }

    [Fact]
    public void Review_MistypedKey_NamesTheNearestAtItsPlace()
    {
        _program.Write("typo.yaml", Good.Replace("clearance:", "clearence:", StringComparison.Ordinal));

        ProcessOutcome run = _program.Run("review", "typo.yaml");

        Assert.Equal(1, run.ExitCode);
        Assert.Contains("clearance", run.Output, StringComparison.Ordinal);
    }

    [Theory]
    [InlineData("review", "absent.yaml")]
    [InlineData("review", "--nonsense")]
    [InlineData("review", "good.yaml", "--nonsense")]
    [InlineData("review")]
    [InlineData("review", "good.yaml", "--fail-at", "9")]
    [InlineData("review", "good.yaml", "--on", "tomorrow")]
    [InlineData("review", "good.yaml", "--set", "winding.tuns=4")]
    [InlineData("review", "good.yaml", "--set", "winding.turns")]
    [InlineData("review", "good.yaml", "--rulebook", "absent.yaml")]
    [InlineData("review", "good.yaml", "--house", "absent.yaml")]
    [InlineData("review", "good.yaml", "--sarif", "no-such-folder/a.sarif")]
    [InlineData("working", "good.yaml", "resistance.phase.cool")]
    [InlineData("rule", "FIT-99")]
    [InlineData("start", "--topology", "radial-flux")]
    [InlineData("completions", "csh")]
    [InlineData("frobnicate")]
    public void Run_WrongUse_ExitsTwoWithoutATrace(params string[] arguments)
    {
        _program.Write("good.yaml", Good);

        ProcessOutcome run = _program.Run(arguments);

        Assert.Equal(2, run.ExitCode);
        Assert.NotEmpty(run.Error.Trim());
        Assert.DoesNotContain("   at ", run.Error, StringComparison.Ordinal);
        Assert.DoesNotContain("Exception", run.Error, StringComparison.Ordinal);
    }

    [Fact]
    public void Review_OneGoodOneAbsent_ReviewsTheGoodOneAndExitsTwo()
    {
        _program.Write("good.yaml", Good);

        ProcessOutcome run = _program.Run("review", "good.yaml", "absent.yaml", "--sarif", "log.sarif");

        Assert.Equal(2, run.ExitCode);
        Assert.Contains("good.yaml", run.Output, StringComparison.Ordinal);
        Assert.Contains("absent.yaml", run.Error, StringComparison.Ordinal);
        Assert.True(_program.Has("log.sarif"));
    }

    [Fact]
    public void Review_FolderPatternAndStandardInput_FindTheSameSpec()
    {
        _program.Write("designs/a/machine.yaml", Good);
        _program.Write("designs/pipeline.yml", "steps: [build]\n");

        ProcessOutcome folder = _program.Run("review", "designs");
        ProcessOutcome pattern = _program.Run("review", "designs/**/*.yaml");
        ProcessOutcome input = _program.RunWith(Good, null, "review", "-", "--stdin-path", "designs/a/machine.yaml");

        Assert.Equal(0, folder.ExitCode);
        Assert.Equal(folder.Output, pattern.Output);
        Assert.Equal(folder.Output, input.Output);
    }

    [Fact]
    public void Review_SeveralSpecs_PrintsThemInOrderWithASummary()
    {
        _program.Write("b.yaml", Good);
        _program.Write("a.yaml", Good);

        ProcessOutcome run = _program.Run("review", "b.yaml", "a.yaml");

        Assert.True(run.Output.IndexOf("b.yaml", StringComparison.Ordinal) < run.Output.IndexOf("a.yaml", StringComparison.Ordinal));
        Assert.Contains("2 specs reviewed", run.Output, StringComparison.Ordinal);
    }

    [Fact]
    public void Review_OtherLocaleAndTimeZone_SameBytes()
    {
        _program.Write("good.yaml", Good);
        _program.Run("review", "good.yaml", "--sarif", "here.sarif");

        foreach (string locale in (string[])["de_DE.UTF-8", "tr_TR.UTF-8", "ar_SA.UTF-8"])
        {
            var elsewhere = new Dictionary<string, string>(StringComparer.Ordinal) { ["LANG"] = locale, ["LC_ALL"] = locale, ["TZ"] = "Pacific/Chatham" };
            _program.RunWith(null, elsewhere, "review", "good.yaml", "--sarif", "there.sarif");

            Assert.Equal(_program.Read("here.sarif"), _program.Read("there.sarif"));
        }
    }

    [Fact]
    public void Review_Json_IsJsonOnly()
    {
        _program.Write("good.yaml", Good);

        ProcessOutcome run = _program.Run("review", "good.yaml", "--format", "json");

        using JsonDocument json = JsonDocument.Parse(run.Output);
        Assert.Equal("good.yaml", json.RootElement.GetProperty("reviews")[0].GetProperty("path").GetString());
    }

    [Fact]
    public void Figures_Json_HalvedTurnsHalveTheEmfConstant()
    {
        _program.Write("good.yaml", Good);

        double full = EmfConstant(_program.Run("figures", "good.yaml", "--format", "json", "--set", "winding.turns=60").Output);
        double half = EmfConstant(_program.Run("figures", "good.yaml", "--format", "json", "--set", "winding.turns=30").Output);

        Assert.Equal(0.5, half / full, 12);
    }

    [Fact]
    public void Working_TellsTheLinesOfItsInputs()
    {
        _program.Write("good.yaml", Good);

        ProcessOutcome run = _program.Run("working", "good.yaml", "resistance.phase.cold", "--depth", "5");

        Assert.Equal(0, run.ExitCode);
        Assert.Contains("winding.turns", run.Output, StringComparison.Ordinal);
        Assert.Matches(@"line \d+", run.Output);
    }

    [Theory]
    [InlineData("axial-flux")]
    [InlineData("linear")]
    public void Start_ItsSpec_ReviewsWithoutHold(string topology)
    {
        ProcessOutcome start = _program.Run("start", "--topology", topology);
        _program.Write("new.yaml", start.Output);

        ProcessOutcome review = _program.Run("review", "new.yaml");

        Assert.Equal(0, start.ExitCode);
        Assert.True(review.ExitCode == 0, review.Output);
        Assert.DoesNotContain("DOC-01", review.Output, StringComparison.Ordinal);
    }

    [Fact]
    public void Help_OfTheProgram_FitsAScreen()
    {
        ProcessOutcome run = _program.Run("--help");

        Assert.Equal(0, run.ExitCode);
        Assert.InRange(run.Output.Split('\n').Length, 10, 40);
        foreach (string command in (string[])["review", "figures", "working", "rule", "rules", "start", "completions"])
        {
            Assert.Contains($"  {command} ", run.Output, StringComparison.Ordinal);
        }
    }

    [Fact]
    public void Rules_And_Rule_ShowTheCatalogue()
    {
        Assert.Contains("FIT-04", _program.Run("rules").Output, StringComparison.Ordinal);
        Assert.Contains("Coil hole", _program.Run("rule", "FIT-04").Output, StringComparison.Ordinal);
    }

    [Theory]
    [InlineData("bash")]
    [InlineData("zsh")]
    [InlineData("fish")]
    public void Completions_AskTheProgramItself(string shell)
    {
        Assert.Contains("[suggest:", _program.Run("completions", shell).Output, StringComparison.Ordinal);
    }

    [Fact]
    public void Completion_OfACommand_ListsItsOptions()
    {
        Assert.Contains("--sarif", _program.Run("[suggest:20]", "spec-lint review --s").Output, StringComparison.Ordinal);
    }

    [Fact]
    public void Review_OwnRulebook_IsAppliedBesideOurs()
    {
        _program.Write("good.yaml", Good);
        _program.Write("shop.yaml", """
            rulebook: shop
            rules:
              - id: SHOP-01
                title: More than our jig takes
                measure: machine.outer-diameter
                at-most: 100 mm
                grade: hold
                say: "The machine is {measure} across."
                why: "The winding jig ends there."
                basis: {kind: house}
                levers: [rotor.back-iron.outer-radius]
            """);

        ProcessOutcome run = _program.Run("review", "good.yaml", "--rulebook", "shop.yaml");

        Assert.Equal(1, run.ExitCode);
        Assert.Contains("SHOP-01", run.Output, StringComparison.Ordinal);
    }

    [Fact]
    public void Review_HouseFile_ChangesBoundsAndWaives()
    {
        _program.Write("wide.yaml", File.ReadAllText(Path.Combine(ExampleSpecs.Folder, "wind-1kw-wide-coils.yaml")));
        _program.Write("house.yaml", """
            house: Shed
            rules:
              FIT-04: {at-most: 1.7, grade: query, beyond: {at-most: 2.0, grade: hold}, why: "Our former allows it."}
            waivers:
              - {rule: OUT-01, reason: "charged through a step-up converter", approved-by: "second engineer", until: 2030-01-31}
            """);

        ProcessOutcome without = _program.Run("review", "wide.yaml");
        ProcessOutcome with = _program.Run("review", "wide.yaml", "--house", "house.yaml", "--on", "2027-01-01");

        Assert.Equal(1, without.ExitCode);
        Assert.Equal(0, with.ExitCode);
        Assert.Contains("waived hold: OUT-01", with.Output, StringComparison.Ordinal);
        Assert.DoesNotContain("FIT-04  Coil hole", with.Output, StringComparison.Ordinal);
    }

    [Fact]
    public void Review_FaultyRulebook_ExitsTwoAtItsLine()
    {
        _program.Write("good.yaml", Good);
        _program.Write("bad.yaml", "rulebook: bad\nrules:\n  - id: BAD-01\n    title: t\n    measure: gap.magnetic\n    at-most: 3 T\n    grade: hold\n    say: s\n    why: w\n    basis: {kind: house}\n    levers: [gap.clearance]\n");

        ProcessOutcome run = _program.Run("review", "good.yaml", "--rulebook", "bad.yaml");

        Assert.Equal(2, run.ExitCode);
        Assert.Contains("bad.yaml, line 6", run.Error, StringComparison.Ordinal);
    }

    public void Dispose() => _program.Dispose();

    private static double EmfConstant(string json)
    {
        using JsonDocument document = JsonDocument.Parse(json);
        return document.RootElement.GetProperty("figures").GetProperty("emf.constant.phase").GetProperty("value").GetDouble();
    }
}
