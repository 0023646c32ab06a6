using System.Globalization;
using System.Text;
using Microsoft.CodeAnalysis.Sarif;
using SpecLint.Reporting.Sarif;
using SpecLint.Review.Findings;
using SpecLint.Review.Reviewing;
using SpecLint.Review.Rules;

namespace SpecLint.Tests.Reporting;

public sealed class SarifLogWriterTests
{
    private static readonly SarifOptions All = new() { Rules = SampleReviews.Rules, IncludesAll = true };

    internal static string Write(SarifOptions options, params MachineReview[] reviews)
    {
        using var text = new StringWriter();
        SarifLogWriter.Write(reviews, options with { ProgramVersion = "0.0.0" }, text);
        return text.ToString();
    }

    [Fact]
    public void Write_EveryKindOfFinding_MatchesGolden() =>
        Golden.Matches("reporting.sarif.golden.json", Write(All, SampleReviews.Held(), SampleReviews.Unreadable()));

    [Fact]
    public async Task Write_EveryKindOfFinding_SatisfiesTheValidator() => Assert.Empty(await SarifValidator.ComplaintsAsync(
        Write(All, SampleReviews.Held(), SampleReviews.Unreadable()), TestContext.Current.CancellationToken));

    [Fact]
    public async Task Write_HostileTextAndPath_SatisfiesTheValidator() => Assert.Empty(await SarifValidator.ComplaintsAsync(
        Write(All, Hostile("specs/50 % {0} [a](b)#?.yaml")), TestContext.Current.CancellationToken));

    [Fact]
    public async Task Write_NothingReviewed_SatisfiesTheValidator() => Assert.Empty(await SarifValidator.ComplaintsAsync(
        Write(All with { RanToTheEnd = false }), TestContext.Current.CancellationToken));

    [Fact]
    public void Write_Log_ReadsBackAsTheObjectsItCameFrom()
    {
        var builder = new SarifLogBuilder(All);
        builder.Add(SampleReviews.Held());
        builder.Add(SampleReviews.Unreadable());
        AddFixAndBaseline(builder.Log().Runs[0].Results[0]);
        using var ours = new MemoryStream();
        builder.Write(ours);
        ours.Position = 0;
        Assert.Equal(SavedByTheLibrary(builder.Log()), SavedByTheLibrary(SarifLog.Load(ours)));
    }

    [Fact]
    public void Write_ToStream_HasNoMarkAndNoCarriageReturn()
    {
        using var stream = new MemoryStream();
        SarifLogWriter.Write([SampleReviews.Held()], All, stream);
        byte[] bytes = stream.ToArray();
        Assert.Equal((byte)'{', bytes[0]);
        Assert.Equal((byte)'\n', bytes[^1]);
        Assert.DoesNotContain((byte)'\r', bytes);
    }

    [Theory]
    [InlineData("de-DE")]
    [InlineData("tr-TR")]
    [InlineData("ar-SA")]
    [InlineData("fa-IR")]
    public void Write_UnderAnyCulture_IsTheSame(string culture)
    {
        string expected = Write(All, SampleReviews.Held());
        CultureInfo before = CultureInfo.CurrentCulture;
        CultureInfo beforeUi = CultureInfo.CurrentUICulture;
        try
        {
            CultureInfo.CurrentCulture = CultureInfo.CurrentUICulture = new CultureInfo(culture);
            Assert.Equal(expected, Write(All, SampleReviews.Held()));
        }
        finally
        {
            CultureInfo.CurrentCulture = before;
            CultureInfo.CurrentUICulture = beforeUi;
        }
    }

    [Fact]
    public void Write_Log_HasNoClockHostOrAbsolutePath()
    {
        string log = Write(All, SampleReviews.Held());
        Assert.DoesNotContain("TimeUtc", log, StringComparison.Ordinal);
        Assert.DoesNotContain(Environment.MachineName, log, StringComparison.Ordinal);
        Assert.DoesNotContain("file:", log, StringComparison.Ordinal);
        Assert.DoesNotContain("guid", log, StringComparison.OrdinalIgnoreCase);
    }

    [Fact]
    public void Write_WithoutAll_KeepsUnmetAndHazards()
    {
        Run run = Read(Write(All with { IncludesAll = false }, SampleReviews.Held()));
        Assert.Equal(["THM-01", "FIT-04", "DOC-02", "MEC-02", "SAF-01"], run.Results.Select(r => r.RuleId));
        Assert.Equal(8, run.Tool.Driver.Rules.Count);
    }

    [Theory]
    [InlineData("FLX-13", ResultKind.Pass, FailureLevel.None)]
    [InlineData("THM-01", ResultKind.Fail, FailureLevel.Warning)]
    [InlineData("FIT-04", ResultKind.Fail, FailureLevel.Error)]
    [InlineData("DOC-02", ResultKind.Fail, FailureLevel.Note)]
    [InlineData("OUT-08", ResultKind.Open, FailureLevel.None)]
    [InlineData("FLX-08", ResultKind.NotApplicable, FailureLevel.None)]
    [InlineData("SAF-01", ResultKind.Informational, FailureLevel.None)]
    public void Write_Finding_HasItsKindAndLevel(string rule, ResultKind kind, FailureLevel level)
    {
        Result result = Result(rule);
        Assert.Equal(kind, result.Kind);
        Assert.Equal(level, result.Level);
        Assert.Equal(rule, Read(Write(All, SampleReviews.Held())).Tool.Driver.Rules[result.RuleIndex].Id);
    }

    [Fact]
    public void Write_WarningOfAHoldRule_StatesItsLevel()
    {
        MachineReview review = SampleReviews.Held();
        review = review with { Findings = [review.Findings.First(f => f.Rule.Id == "MEC-02") with { Grade = Grade.Query }] };
        Assert.Contains("\"level\": \"warning\"", Write(All with { Rules = [] }, review), StringComparison.Ordinal);
    }

    [Fact]
    public void Write_Finding_PointsAtTheValue()
    {
        Location location = Result("FIT-04").Locations[0];
        Region region = location.PhysicalLocation.Region;
        Assert.Equal((15, 17, 15, 22), (region.StartLine, region.StartColumn, region.EndLine, region.EndColumn));
        Assert.Equal("52 mm", region.Snippet.Text);
        Assert.Equal("winding.coil.hole-width", location.LogicalLocations[0].FullyQualifiedName);
        Assert.Equal("specs/wind.yaml", location.PhysicalLocation.ArtifactLocation.Uri.OriginalString);
    }

    [Fact]
    public void Write_Finding_CarriesNumbersInItsUnit()
    {
        Result result = Result("THM-01");
        Assert.Equal(111.4, result.GetProperty<double>("value"));
        Assert.Equal(105, result.GetProperty<double>("bound"));
        Assert.Equal(21, result.GetProperty<double>("uncertainty"));
        Assert.Equal("°C", result.GetProperty<string>("unit"));
        Assert.Equal(-0.0753, result.GetProperty<double>("margin"));
    }

    [Fact]
    public void Write_EveryResult_HasSafetyNotes()
    {
        IList<Result> results = Read(Write(All, SampleReviews.Held(), SampleReviews.Unreadable())).Results;
        Assert.Equal(9, results.Count);
        Assert.All(results, r => Assert.NotNull(r.GetProperty<List<string>>("safetyNotes")));
        Assert.Equal(2, Result("MEC-02").GetProperty<List<string>>("safetyNotes").Count);
    }

    [Fact]
    public void Write_CodeFlow_WalksFromTheSpecToTheFigure()
    {
        IList<ThreadFlowLocation> steps = Result("FIT-04").CodeFlows[0].ThreadFlows[0].Locations;
        var names = steps.Select(s => s.Location.LogicalLocations[0].FullyQualifiedName).ToList();
        Assert.Equal("emf.phase.rms", names[^1]);
        Assert.True(names.IndexOf("winding.turns") < names.IndexOf("linkage.coil.fundamental"));
        Assert.True(names.IndexOf("linkage.coil.fundamental") < names.IndexOf("emf.phase.rms"));
        Assert.Contains("magnets.width", names);
        Assert.Equal(names.Count, names.Distinct(StringComparer.Ordinal).Count());
        ThreadFlowLocation turns = steps[names.IndexOf("winding.turns")];
        Assert.Equal(13, turns.Location.PhysicalLocation.Region.StartLine);
        Assert.Equal("winding.turns is 60.", turns.Location.Message.Text);
        Assert.Equal(15, steps[^1].Location.PhysicalLocation.Region.StartLine);
    }

    [Fact]
    public void Write_Waived_IsSuppressedAndCanBeLeftOut()
    {
        Suppression suppression = Assert.Single(Result("MEC-02").Suppressions);
        Assert.Equal(SuppressionKind.External, suppression.Kind);
        Assert.Equal(SuppressionStatus.Accepted, suppression.Status);
        Assert.Equal("Static test rig, never turned; approved by head of test, until 2027-03-31.", suppression.Justification);
        Assert.Empty(Result("FIT-04").Suppressions);
        Run run = Read(Write(All with { LeavesOutWaived = true }, SampleReviews.Held()));
        Assert.DoesNotContain(run.Results, r => r.RuleId == "MEC-02");
    }

    [Fact]
    public void Write_WaiverWithoutApprover_IsUnderReview()
    {
        MachineReview review = SampleReviews.Held();
        Finding waived = review.Waived.Single();
        review = review with { Findings = [waived with { Waiver = waived.Waiver! with { ApprovedBy = "" } }] };
        Assert.Equal(SuppressionStatus.UnderReview, Read(Write(All, review)).Results[0].Suppressions[0].Status);
    }

    [Fact]
    public void Fingerprints_LinesMoved_OursStays()
    {
        MachineReview moved = SampleReviews.Held(text: "# one\n# two\n" + SampleSpec.Text);
        Result before = Result("FIT-04");
        Result after = Read(Write(All, moved)).Results.Single(r => r.RuleId == "FIT-04");
        Assert.Equal(17, after.Locations[0].PhysicalLocation.Region.StartLine);
        Assert.Equal(before.PartialFingerprints["specLintFinding/v1"], after.PartialFingerprints["specLintFinding/v1"]);
        Assert.Equal(HashUtilities.RollingHash(SampleSpec.Text)[15], before.PartialFingerprints["primaryLocationLineHash"]);
    }

    [Fact]
    public void Fingerprints_TwoFindingsOfOneRuleAndKey_Differ()
    {
        MachineReview review = SampleReviews.Held();
        Finding one = review.Findings.First(f => f.Rule.Id == "FIT-04");
        IList<Result> results = Read(Write(All, review with { Findings = [one, one] })).Results;
        Assert.NotEqual(results[0].PartialFingerprints["specLintFinding/v1"], results[1].PartialFingerprints["specLintFinding/v1"]);
        Assert.Equal(Result("FIT-04").PartialFingerprints["specLintFinding/v1"], results[0].PartialFingerprints["specLintFinding/v1"]);
    }

    [Fact]
    public void Fingerprints_OtherPath_Differ() => Assert.NotEqual(
        Result("FIT-04").PartialFingerprints["specLintFinding/v1"],
        Read(Write(All, SampleReviews.Held("specs/other.yaml"))).Results.Single(r => r.RuleId == "FIT-04").PartialFingerprints["specLintFinding/v1"]);

    [Fact]
    public void Write_HostileText_IsEscaped()
    {
        Result result = Read(Write(All, Hostile("a b/50 %.yaml"))).Results[0];
        Assert.Equal("Braces {{0}}, a link \\[here\\](http://x), an escape <U+001B>\\[2J and <U+202E>turned.", result.Message.Text);
        Assert.Equal("a%20b/50%20%25.yaml", result.Locations[0].PhysicalLocation.ArtifactLocation.Uri.OriginalString);
    }

    [Fact]
    public void Write_Standards_AreATaxonomyThatRulesPointInto()
    {
        Run run = Read(Write(All, SampleReviews.Held()));
        ToolComponent taxonomy = Assert.Single(run.Taxonomies);
        Assert.Equal(["IEC 60034-1:2022", "IEC 60085:2007"], taxonomy.Taxa.Select(t => t.Id));
        ReportingDescriptor rule = run.Tool.Driver.Rules.Single(r => r.Id == "THM-01");
        Assert.All(rule.Relationships, r => Assert.Equal(r.Target.Id, taxonomy.Taxa[r.Target.Index].Id));
        Assert.Equal(2, rule.Relationships.Count);
        Assert.Equal(taxonomy.Name, Assert.Single(run.Tool.Driver.SupportedTaxonomies).Name);
    }

    [Fact]
    public void Write_Rules_CarryHelpWithWhyBasisAndSafety()
    {
        ReportingDescriptor rule = Read(Write(All, SampleReviews.Held())).Tool.Driver.Rules.Single(r => r.Id == "THM-01");
        Assert.Equal("WindingTooHotForItsClass", rule.Name);
        foreach (string help in (string[])[rule.Help.Text, rule.Help.Markdown])
        {
            Assert.Contains("Insulation ages faster", help, StringComparison.Ordinal);
            Assert.Contains("IEC 60034-1:2022, table 8", help, StringComparison.Ordinal);
            Assert.Contains("gives off fumes", help, StringComparison.Ordinal);
        }

        Assert.InRange(rule.GetProperty<List<string>>("tags").Count, 1, 20);
    }

    [Fact]
    public void Rank_GraverOrFurtherOff_IsHigher()
    {
        Finding finding = SampleReviews.Held().Unmet.First();
        double Of(Grade grade, double? margin) => SarifResults.Rank(finding with { Grade = grade, Margin = margin });
        Assert.Equal([10, 25, 40, 55, 70, 85], [Of(Grade.Remark, 0), Of(Grade.Remark, null), Of(Grade.Query, 0), Of(Grade.Query, -1), Of(Grade.Hold, 0), Of(Grade.Hold, null)]);
        Assert.Equal(100, Of(Grade.Hold, -1e9));
        Assert.True(Of(Grade.Hold, -0.2) > Of(Grade.Hold, -0.1));
    }

    [Theory]
    [InlineData("Coil hole wider than the magnet", "CoilHoleWiderThanTheMagnet")]
    [InlineData("EMF too low at 20 °C", "EmfTooLowAt20c")]
    [InlineData("A disc's rim", "AdiscsRim")]
    [InlineData("…", "Rule")]
    public void PascalCase_Title_BecomesOneWord(string title, string name) => Assert.Equal(name, SarifText.PascalCase(title));

    private static string SavedByTheLibrary(SarifLog log)
    {
        using var stream = new MemoryStream();
        log.Save(stream);
        return Encoding.UTF8.GetString(stream.ToArray());
    }

    private static void AddFixAndBaseline(Result result)
    {
        result.BaselineState = BaselineState.Updated;
        result.Fixes =
        [
            new Fix
            {
                Description = new Message { Text = "Even number of poles." },
                ArtifactChanges =
                [
                    new ArtifactChange
                    {
                        ArtifactLocation = result.Locations[0].PhysicalLocation.ArtifactLocation,
                        Replacements =
                        [
                            new Replacement { DeletedRegion = new Region { StartLine = 7, StartColumn = 10, EndLine = 7, EndColumn = 12 }, InsertedContent = new ArtifactContent { Text = "14" } },
                        ],
                    },
                ],
            },
        ];
    }

    private static MachineReview Hostile(string path)
    {
        MachineReview review = SampleReviews.Held(path);
        Finding finding = review.Findings.First(f => f.Rule.Id == "FIT-04") with
        {
            Message = "Braces {0}, a link [here](http://x),\n  an escape \u001b[2J and \u202eturned",
        };
        Rule rule = finding.Rule with { Title = "{1} [x](y) \u0007", Why = "`code` <b> {2}" };
        return review with { Findings = [finding with { Rule = rule }] };
    }

    private static Result Result(string rule) => Read(Write(All, SampleReviews.Held())).Results.Single(r => r.RuleId == rule);

    private static Run Read(string log)
    {
        using var stream = new MemoryStream(Encoding.UTF8.GetBytes(log));
        return Assert.Single(SarifLog.Load(stream).Runs);
    }
}
