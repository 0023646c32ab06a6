using SpecLint.Reporting.Sarif;
using SpecLint.Review.Reviewing;

namespace SpecLint.Tests.Reporting;

public sealed class SarifLogWriterTests
{
    internal static string Write(SarifOptions options, params MachineReview[] reviews)
    {
        using var text = new StringWriter();
        SarifLogWriter.Write(reviews, options with { ProgramVersion = "0.0.0" }, text);
        return text.ToString();
    }

    [Fact]
    public void Write_EveryKindOfFinding_MatchesGolden() => Golden.Matches(
        "reporting.sarif.golden.json",
        Write(new SarifOptions { Rules = SampleReviews.Rules, IncludesAll = true }, SampleReviews.Held(), SampleReviews.Unreadable()));

    [Fact]
    public async Task Write_EveryKindOfFinding_SatisfiesTheValidator() => Assert.Empty(await SarifValidator.ComplaintsAsync(
        Write(new SarifOptions { Rules = SampleReviews.Rules, IncludesAll = true }, SampleReviews.Held(), SampleReviews.Unreadable()),
        TestContext.Current.CancellationToken));
}
