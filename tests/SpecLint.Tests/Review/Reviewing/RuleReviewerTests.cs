using SpecLint.Review.Findings;
using SpecLint.Review.Rules;
using SpecLint.Spec.Yaml;
using static SpecLint.Tests.Review.ReviewFixture;

namespace SpecLint.Tests.Review.Reviewing;

public sealed class RuleReviewerTests
{
    private const string QueryThenHold = "measure: test.exact\nat-most: 30 mm\ngrade: query\nbeyond: {at-most: 40 mm, grade: hold}";

    [Theory]
    [InlineData("29.9 mm", FindingKind.Met, Grade.Hold, 0.00333333)]
    [InlineData("30 mm", FindingKind.Met, Grade.Hold, 0)]
    [InlineData("30.1 mm", FindingKind.Unmet, Grade.Query, -0.00333333)]
    [InlineData("39.9 mm", FindingKind.Unmet, Grade.Query, -0.33)]
    [InlineData("40 mm", FindingKind.Unmet, Grade.Query, -0.33333333)]
    [InlineData("40.1 mm", FindingKind.Unmet, Grade.Hold, -0.0025)]
    public void Ceiling_AtInsideAndOutside_GivesItsGrade(string width, FindingKind kind, Grade grade, double margin)
    {
        Finding finding = ReviewRule(QueryThenHold, ("magnets.width", width));
        Assert.Equal((kind, grade), (finding.Kind, finding.Grade));
        Assert.Equal(margin, finding.Margin!.Value, 1e-6);
    }

    [Theory]
    [InlineData("20 mm", FindingKind.Met, 0)]
    [InlineData("19.9 mm", FindingKind.Unmet, -0.005)]
    [InlineData("24 mm", FindingKind.Met, 0.2)]
    [InlineData("38 mm", FindingKind.Met, 0.05)]
    [InlineData("40 mm", FindingKind.Met, 0)]
    [InlineData("44 mm", FindingKind.Unmet, -0.1)]
    public void Within_MeasuresToTheNearerLimit(string width, FindingKind kind, double margin)
    {
        Finding finding = ReviewRule("measure: test.exact\nwithin: [20 mm, 40 mm]", ("magnets.width", width));
        Assert.Equal(kind, finding.Kind);
        Assert.Equal(margin, finding.Margin!.Value, 1e-9);
    }

    [Theory]
    [InlineData("33 mm", FindingKind.Met, Grade.Hold)]
    [InlineData("32.1 mm", FindingKind.Met, Grade.Hold)]
    [InlineData("31.9 mm", FindingKind.Unmet, Grade.Query)]
    [InlineData("30.1 mm", FindingKind.Unmet, Grade.Query)]
    [InlineData("29.9 mm", FindingKind.Unmet, Grade.Hold)]
    public void HoldBound_ReachedByTheBandOnly_IsAQuery(string width, FindingKind kind, Grade grade)
    {
        Finding finding = ReviewRule("measure: test.width\nat-least: 30 mm\ngrade: hold", ("magnets.width", width));
        Assert.Equal((kind, grade), (finding.Kind, finding.Grade));
        Assert.Equal(grade == Grade.Query, finding.Message.Contains("within its uncertainty of ± 2.0 mm", StringComparison.Ordinal));
    }

    [Fact]
    public void QueryBound_ReachedByTheBandOnly_IsMet() =>
        Assert.Equal(FindingKind.Met, ReviewRule("measure: test.width\nat-least: 30 mm\ngrade: query", ("magnets.width", "31 mm")).Kind);

    [Fact]
    public void BandOfMeasureAndBound_OnTheSameFigure_Cancels() =>
        Assert.Equal(FindingKind.Met, ReviewRule("measure: test.width\nat-most: test.width + 1 mm\ngrade: hold").Kind);

    // The coarse figure is the turns in °C with a band of 30 %.
    [Theory]
    [InlineData(75, FindingKind.Met, Grade.Hold)]
    [InlineData(80, FindingKind.Met, Grade.Hold)]
    [InlineData(81, FindingKind.Unmet, Grade.Query)]
    [InlineData(114, FindingKind.Unmet, Grade.Query)]
    [InlineData(115, FindingKind.Unmet, Grade.Hold)]
    public void CoarseFigure_IsAHoldOnlyWhenTheFavourableEndFails(int rise, FindingKind kind, Grade grade)
    {
        Finding finding = ReviewRule(
            "measure: test.hot\nat-most: 100 °C\nscale: 60 K\ngrade: hold",
            ("winding.turns", rise.ToString(System.Globalization.CultureInfo.InvariantCulture)));
        Assert.Equal((kind, grade), (finding.Kind, finding.Grade));
        Assert.Equal("°C", finding.DisplayUnit);
        Assert.Equal((80.0 - rise) / 60, finding.Margin!.Value, 1e-9);
    }

    [Fact]
    public void When_False_IsNotApplicable()
    {
        Finding finding = ReviewRule("when: machine.stator = \"slotted\"\nrequire: 1 > 2");
        Assert.Equal(FindingKind.NotApplicable, finding.Kind);
        Assert.Contains("machine.stator = \"slotted\"", finding.Message, StringComparison.Ordinal);
    }

    [Fact]
    public void When_Unknown_IsOpenAsARemark()
    {
        Finding finding = ReviewRule("when: load.kind = \"battery\"\nrequire: 1 > 2\ngrade: hold");
        Assert.Equal((FindingKind.Open, Grade.Remark), (finding.Kind, finding.Grade));
        Assert.Equal(["load.kind"], finding.MissingKeys);
        Assert.Equal("Open: whether the rule applies needs load.kind.", finding.Message);
    }

    [Theory]
    [InlineData("sketch", FindingKind.NotApplicable)]
    [InlineData("order", FindingKind.Unmet)]
    [InlineData("build", FindingKind.Unmet)]
    public void Stage_BeforeTheRule_IsNotApplicable(string stage, FindingKind kind) =>
        Assert.Equal(kind, ReviewRule("from: order\nrequire: stated(magnets.coating)\nlevers: [magnets.coating]", ("stage", stage)).Kind);

    [Fact]
    public void Require_UnstatedKey_PointsAtItsParent()
    {
        Finding finding = ReviewRule("require: stated(magnets.coating)\nlevers: [magnets.coating]");
        Assert.Equal(FindingKind.Unmet, finding.Kind);
        Assert.Equal("magnets.coating", finding.Key);
        Assert.Equal(new Region(10, 1, 10, 8), finding.Region);
        Assert.Equal("Said.", finding.Message);
    }

    [Fact]
    public void MissingInput_IsOpenWithItsKeysAtTheParent()
    {
        Finding finding = ReviewRule("measure: test.missing / 1 V\nat-most: 1\ngrade: query\nbeyond: {at-most: 2, grade: hold}", ("load.kind", "battery"));
        Assert.Equal((FindingKind.Open, Grade.Hold), (finding.Kind, finding.Grade));
        Assert.Equal(["load.voltage", "load.cable.length"], finding.MissingKeys);
        Assert.Equal("load.voltage", finding.Key);
        Assert.Equal("Open: needs load.voltage and load.cable.length.", finding.Message);
    }

    [Theory]
    [InlineData("measure: test.foreign\nat-most: 1 T", FindingKind.NotApplicable, "Not applicable: there is no tooth.")]
    [InlineData("measure: test.broken\nat-most: 1 T", FindingKind.Open, "Open: the gap is wider than the pole.")]
    [InlineData("measure: test.field\nat-most: test.foreign", FindingKind.NotApplicable, "Not applicable: there is no tooth.")]
    [InlineData("measure: test.exact / (1 mm - 1 mm)\nat-most: 1", FindingKind.Open, "Open: a division by zero.")]
    [InlineData("require: test.missing > 1 V", FindingKind.Open, "Open: needs load.voltage and load.cable.length.")]
    [InlineData("when: test.foreign > 1 T\nrequire: 1 > 2", FindingKind.NotApplicable, "Not applicable: there is no tooth.")]
    public void Lack_OfMeasureOrBound_DecidesTheKind(string fields, FindingKind kind, string message)
    {
        Finding finding = ReviewRule(fields);
        Assert.Equal((kind, message), (finding.Kind, finding.Message));
    }

    [Fact]
    public void HarsherBound_Unknown_LeavesTheFirstGradeAndSaysSo()
    {
        Finding finding = ReviewRule("measure: 50 V\nat-most: 40 V\ngrade: query\nbeyond: {at-most: test.missing, grade: hold}");
        Assert.Equal((FindingKind.Unmet, Grade.Query), (finding.Kind, finding.Grade));
        Assert.Contains("The harsher bound could not be judged: needs load.voltage and load.cable.length.", finding.Message, StringComparison.Ordinal);
    }

    [Fact]
    public void Blame_IsTheFirstStatedLever_AndOthersAreRelated()
    {
        Finding finding = ReviewRule(
            "measure: winding.coil.hole-width / magnets.width\nat-most: 0.5\nlevers: [winding.coil.corner-radius, winding.coil.hole-width, magnets.width, magnets.length]");
        Assert.Equal("winding.coil.hole-width", finding.Key);
        Assert.Equal(new Region(27, 17, 27, 22), finding.Region);
        Assert.Equal(["magnets.width is 30 mm", "magnets.length is 46 mm"], finding.Related.Select(r => r.Message));
    }

    [Fact]
    public void Blame_WithoutLevers_IsAKeyBehindTheFigure()
    {
        Finding finding = ReviewRule("measure: test.hole\nat-most: 10 mm");
        Assert.Equal("winding.coil.hole-width", finding.Key);
        Assert.Equal(["test.hole"], finding.Figures);
    }

    [Fact]
    public void Message_HasItsGapsFilledAndTheStandingSentence()
    {
        Finding finding = ReviewRule(
            """
            measure: winding.coil.hole-width / magnets.width
            at-most: 0.8
            say: "The hole of {winding.coil.hole-width} is {measure} of {test.exact:cm}, at most {bound} ({margin}), {magnets.grade}, {load.voltage}, {test.foreign}"
            """);
        Assert.Equal(
            "The hole of 26 mm is 0.867 of 3.0 cm, at most 0.8 (-8.33 %), N42SH, unknown (needs load.voltage), not applicable. "
            + "winding.coil.hole-width / magnets.width is 0.867; expected at most 0.8 (margin -8.33 %).",
            finding.Message);
    }

    [Fact]
    public void Message_OfNearlyEqualValues_ShowsDigitsEnoughToTellThemApart()
    {
        Finding finding = ReviewRule("measure: test.exact\nat-most: 30 mm", ("magnets.width", "30.0004 mm"));
        Assert.Contains("test.exact is 30.0004 mm; expected at most 30 mm", finding.Message, StringComparison.Ordinal);
    }

    [Theory]
    [InlineData("measure: test.exact\nwithin: [10 mm, 20 mm]", "expected 10 mm to 20 mm")]
    [InlineData("measure: test.exact\nat-most: 2 cm\nunit: cm", "test.exact is 3.0 cm; expected at most 2.0 cm")]
    [InlineData("measure: test.exact / 1 m\nat-most: 2 %", "is 3.0 %; expected at most 2.0 %")]
    [InlineData("measure: test.hot - 20 °C\nat-most: 10 K\ngrade: query", "is 55 K; expected at most 10 K")]
    public void Message_IsInReadableUnits(string fields, string part) =>
        Assert.Contains(part, ReviewRule(fields).Message, StringComparison.Ordinal);

    [Theory]
    [InlineData("when: test.force > 200 N\nsay: 'They pull with {test.force}; {load.voltage} at the terminals.'", FindingKind.Hazard, "They pull with 250 N; unknown (needs load.voltage) at the terminals.")]
    [InlineData("when: test.force > 300 N", FindingKind.NotApplicable, "Not applicable: concerns machines with test.force > 300 N.")]
    [InlineData("when: load.voltage > 50 V", FindingKind.Hazard, "Not known yet whether it concerns this machine (needs load.voltage).")]
    public void Hazard_IsReportedWhereItExistsOrIsUnknown(string fields, FindingKind kind, string message)
    {
        Finding finding = ReviewRule("source: hazard\n" + fields);
        Assert.Equal((kind, message), (finding.Kind, finding.Message));
    }

    [Fact]
    public void RuleThatDoesNotConcern_ComputesNoFigure()
    {
        int computed = 0;
        var counted = Figures["test.exact"] with { Name = "test.counted", Compute = e => { computed++; return e.Value(1, 0); } };
        var catalogue = new SpecLint.Review.Figures.FigureCatalogue([counted]);
        var graph = new SpecLint.Review.Figures.FigureGraph(ReadSpec(), catalogue);
        string text = RuleText("when: machine.stator = \"slotted\"\nmeasure: test.counted\nat-most: 1 mm");
        Rulebook book = RulebookLoader.Load(
            "b.yaml",
            System.Text.Encoding.UTF8.GetBytes(text),
            new SpecLint.Review.Expressions.ExpressionScope(catalogue, ReferenceTables.Empty));
        Finding finding = SpecLint.Review.Reviewing.Reviewer.ReviewRule(graph, Assert.Single(book.Rules));
        Assert.Equal(FindingKind.NotApplicable, finding.Kind);
        Assert.Equal(0, computed);
    }

    [Fact]
    public void Message_OfATorque_IsInNewtonMetres() =>
        Assert.Contains("is 7.5 N·m; expected at most 5.0 N·m", ReviewRule("measure: test.force * test.exact\nat-most: 5 N·m").Message, StringComparison.Ordinal);
}
