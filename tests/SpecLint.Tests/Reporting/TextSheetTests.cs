using SpecLint.Reporting.Sheets;
using SpecLint.Review.Reviewing;

namespace SpecLint.Tests.Reporting;

public sealed class TextSheetTests
{
    internal static string Write(SheetOptions options, params MachineReview[] reviews)
    {
        using var text = new StringWriter();
        TextSheet.Write(reviews, options, text);
        return text.ToString();
    }

    [Fact]
    public void Write_HeldMachine_MatchesGolden() =>
        Golden.Matches("reporting.sheet.golden.txt", Write(new SheetOptions(), SampleReviews.Held()));

    [Fact]
    public void Write_SeveralSpecsWithAllRules_MatchesGolden() => Golden.Matches(
        "reporting.sheet-all.golden.txt",
        Write(new SheetOptions { IncludesAll = true }, SampleReviews.Held(), SampleReviews.Unreadable(), SampleReviews.Released()));
}
