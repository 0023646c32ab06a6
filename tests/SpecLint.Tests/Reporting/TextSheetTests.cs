using CsCheck;
using SpecLint.Reporting.Sheets;
using SpecLint.Review.Findings;
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

    [Fact]
    public void Write_Findings_ComeGravestFirstAndTheOutcomeLast()
    {
        string sheet = Write(new SheetOptions(), SampleReviews.Held());
        string[] inOrder = ["FIT-04", "THM-01", "DOC-02", "waived  MEC-02", "Key figures", "Assumed", "Open:", "Hazards", "Outcome  held"];
        Assert.Equal(inOrder, inOrder.OrderBy(part => sheet.IndexOf(part, StringComparison.Ordinal)));
        Assert.All(inOrder, part => Assert.Contains(part, sheet, StringComparison.Ordinal));
        Assert.EndsWith("Outcome  held: 1 hold, 1 query, 1 remark; waived hold: MEC-02\n", sheet, StringComparison.Ordinal);
    }

    [Theory]
    [InlineData(ReviewOutcome.Released, "Outcome  released\n")]
    [InlineData(ReviewOutcome.ReleasedWithQueries, "Outcome  released with queries\n")]
    [InlineData(ReviewOutcome.Incomplete, "Outcome  incomplete: 0 of hold grade open\n")]
    [InlineData(ReviewOutcome.Held, "Outcome  held\n")]
    public void Write_Outcome_IsInItsWords(ReviewOutcome outcome, string line) =>
        Assert.EndsWith(line, Write(new SheetOptions(), SampleReviews.Released() with { Outcome = outcome }), StringComparison.Ordinal);

    [Fact]
    public void Write_WithoutColour_HasNoControlCharacters()
    {
        string sheet = Write(new SheetOptions { IncludesAll = true }, SampleReviews.Held(), SampleReviews.Unreadable());
        Assert.DoesNotContain(sheet, c => char.IsControl(c) && c != '\n');
    }

    [Fact]
    public void Write_WithColour_SaysTheSame()
    {
        string coloured = Write(new SheetOptions { UsesColour = true }, SampleReviews.Held());
        Assert.Contains("\u001b[1;31mhold", coloured, StringComparison.Ordinal);
        string bare = System.Text.RegularExpressions.Regex.Replace(coloured, "\u001b\\[[0-9;]*m", "", System.Text.RegularExpressions.RegexOptions.None, TimeSpan.FromSeconds(5));
        Assert.Equal(Write(new SheetOptions(), SampleReviews.Held()), bare);
    }

    [Fact]
    public void Write_HostileTitle_IsNeutralised()
    {
        string text = SampleSpec.Text.Replace("Small wind generator", "Evil \u001b]0;owned\u0007\u202e title", StringComparison.Ordinal);
        string sheet = Write(new SheetOptions { UsesColour = true }, SampleReviews.Held("specs/\u001b[2J.yaml", text));
        Assert.StartsWith("\u001b[1mEvil <U+001B>]0;owned<U+0007><U+202E> title, revision B\u001b[0m\nspecs/<U+001B>[2J.yaml", sheet, StringComparison.Ordinal);
        Assert.DoesNotContain("\u001b]", sheet, StringComparison.Ordinal);
        Assert.DoesNotContain("\u001b[2J", sheet, StringComparison.Ordinal);
    }

    [Theory]
    [InlineData("FLX-13", 2.0, "measured 2, at least 2 required")]
    [InlineData("FIT-04", 1.6, "measured 1.600 ± 0.020, at most 1.6 required")]
    public void Write_ValueAtItsBound_NamesTheSideOfTheRule(string rule, double value, string words)
    {
        MachineReview review = SampleReviews.Held();
        Finding finding = review.Findings.First(f => f.Rule.Id == rule) with { Kind = FindingKind.Unmet, Value = value, Margin = 0 };
        Assert.Contains(words, Write(new SheetOptions(), review with { Findings = [finding] }), StringComparison.Ordinal);
    }

    [Fact]
    public void Write_NoReviews_WritesNothing() => Assert.Empty(Write(new SheetOptions()));

    [Fact]
    public void Write_AnyWords_StayWithinTheWidth()
    {
        Gen<string> words = Gen.Char["abcdeé± 123.,mT電"].Array[0, 14].Select(c => new string(c)).Array[0, 30].Select(w => string.Join(' ', w));
        Gen.Select(words, Gen.Int[60, 120]).Sample((message, width) =>
        {
            MachineReview review = SampleReviews.Held();
            Finding finding = review.Findings.First(f => f.Rule.Id == "FIT-04");
            finding = finding with { Message = message, Rule = finding.Rule with { Title = message, Why = message, Safety = [message] } };
            string sheet = Write(new SheetOptions { Width = width, IncludesAll = true }, review with { Findings = [finding, finding with { Kind = FindingKind.Met }] });
            return sheet.Split('\n').All(line => TextPage.Columns(line) <= Math.Max(80, width));
        });
    }

    [Fact]
    public void Write_EightyColumns_NoLineIsLonger()
    {
        string sheet = Write(new SheetOptions { IncludesAll = true }, SampleReviews.Held(), SampleReviews.Unreadable(), SampleReviews.Released());
        Assert.All(sheet.Split('\n'), line => Assert.InRange(TextPage.Columns(line), 0, 80));
    }

    [Fact]
    public void Write_UnreadableSpec_NamesTheNearestKey()
    {
        string sheet = Write(new SheetOptions(), SampleReviews.Unreadable());
        Assert.Contains("the nearest is clearance", sheet, StringComparison.Ordinal);
        Assert.DoesNotContain("Key figures", sheet, StringComparison.Ordinal);
    }

    [Theory]
    [InlineData("de-DE")]
    [InlineData("ar-SA")]
    public void Write_UnderAnyCulture_IsTheSame(string culture)
    {
        string expected = Write(new SheetOptions { IncludesAll = true }, SampleReviews.Held());
        System.Globalization.CultureInfo before = System.Globalization.CultureInfo.CurrentCulture;
        try
        {
            System.Globalization.CultureInfo.CurrentCulture = new System.Globalization.CultureInfo(culture);
            Assert.Equal(expected, Write(new SheetOptions { IncludesAll = true }, SampleReviews.Held()));
        }
        finally
        {
            System.Globalization.CultureInfo.CurrentCulture = before;
        }
    }
}
