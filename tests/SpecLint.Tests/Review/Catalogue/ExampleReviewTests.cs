using System.Collections.Immutable;
using System.Globalization;
using SpecLint.Reporting.Sarif;
using SpecLint.Reporting.Sheets;
using SpecLint.Review.Catalogue;
using SpecLint.Review.Reviewing;
using SpecLint.Review.Rules;
using SpecLint.Tests.Reporting;

namespace SpecLint.Tests.Review.Catalogue;

/// <summary>Every example's review, kept as a golden sheet and a golden log, and judged by the outside validator.</summary>
public sealed class ExampleReviewTests
{
    private static readonly string[] Flawed =
    [
        "wind-1kw-wide-coils", "wind-1kw-wide-gap", "wind-1kw-thin-wire", "wind-1kw-hot-magnets",
    ];

    public static TheoryData<string> Sound => [.. ExampleSpecs.Names.Except(Flawed)];

    public static TheoryData<string, string> Flaws => new()
    {
        { "wind-1kw-wide-coils", "FIT-04" },
        { "wind-1kw-wide-gap", "FLX-01" },
        { "wind-1kw-thin-wire", "CUR-01" },
        { "wind-1kw-hot-magnets", "DMG-01" },
    };

    [Theory]
    [MemberData(nameof(ExampleSpecs.All), MemberType = typeof(ExampleSpecs))]
    public void Example_Sheet_IsAsKept(string name)
    {
        using var writer = new StringWriter(CultureInfo.InvariantCulture);

        TextSheet.Write(Review(name), new SheetOptions(), writer);

        Golden.Matches($"{name}.sheet.golden.txt", writer.ToString());
    }

    [Theory]
    [MemberData(nameof(ExampleSpecs.All), MemberType = typeof(ExampleSpecs))]
    public void Example_Log_IsAsKept(string name) => Golden.Matches($"{name}.sarif.golden.json", Log(name));

    [Theory]
    [MemberData(nameof(ExampleSpecs.All), MemberType = typeof(ExampleSpecs))]
    public async Task Example_Log_PassesTheOutsideValidator(string name) =>
        Assert.Empty(await SarifValidator.ComplaintsAsync(Log(name), TestContext.Current.CancellationToken));

    [Theory]
    [MemberData(nameof(Sound))]
    public void SoundExample_HasNoHoldAndAtMostThreeQueries(string name)
    {
        MachineReview review = Review(name);

        Assert.DoesNotContain(review.Unmet, f => f.Grade == Grade.Hold);
        Assert.True(review.Unmet.Count(f => f.Grade == Grade.Query) <= 3, string.Join(", ", review.Unmet.Select(f => f.Rule.Id)));
        Assert.True(review.Outcome is ReviewOutcome.Released or ReviewOutcome.ReleasedWithQueries, review.Outcome.ToString());
    }

    [Theory]
    [MemberData(nameof(Flaws))]
    public void FlawedExample_IsHeldForItsFlaw(string name, string rule)
    {
        MachineReview review = Review(name);

        Assert.Equal(ReviewOutcome.Held, review.Outcome);
        Assert.Contains(review.Unmet, f => f.Rule.Id == rule);
    }

    [Fact]
    public void Log_OtherCultureAndTwice_IsTheSame()
    {
        string here = Log("wind-1kw");
        CultureInfo before = CultureInfo.CurrentCulture;
        try
        {
            CultureInfo.CurrentCulture = CultureInfo.GetCultureInfo("de-DE");
            Assert.Equal(here, Log("wind-1kw"));
        }
        finally
        {
            CultureInfo.CurrentCulture = before;
        }
    }

    private static MachineReview Review(string name) =>
        Reviewer.Review(ExampleSpecs.Read(name), OurFigures.Catalogue, OurRulebooks.All, ReviewOptions.Default);

    private static string Log(string name)
    {
        ImmutableArray<Rule> rules = [.. OurRulebooks.All.SelectMany(b => b.Rules)];
        using var writer = new StringWriter(CultureInfo.InvariantCulture);
        SarifLogWriter.Write([Review(name)], new SarifOptions { Rules = rules, ProgramVersion = "0.0.0" }, writer);
        return writer.ToString();
    }
}
