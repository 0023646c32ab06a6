using SpecLint.Review.Expressions;
using static SpecLint.Tests.Review.ReviewFixture;

namespace SpecLint.Tests.Review.Expressions;

public sealed class ExpressionTests
{
    [Theory]
    [InlineData("load.voltage > 1 V and 1 > 2", false)]
    [InlineData("1 > 2 and load.voltage > 1 V", false)]
    [InlineData("load.voltage > 1 V or 1 < 2", true)]
    [InlineData("1 < 2 or load.voltage > 1 V", true)]
    [InlineData("test.foreign > 1 T and 1 > 2", false)]
    [InlineData("test.broken > 1 T or 1 < 2", true)]
    [InlineData("stated(load.kind) and load.kind = \"battery\"", false)]
    [InlineData("stated(magnets.width) and stated(winding.coil)", true)]
    [InlineData("known(test.missing) or known(test.foreign) or known(test.broken)", false)]
    [InlineData("known(test.width)", true)]
    public void Condition_WithALackThatDoesNotMatter_IsDecided(string text, bool expected)
    {
        Evaluated value = Evaluate(text);
        Assert.Equal(EvaluatedKind.Condition, value.Kind);
        Assert.Equal(expected, value.Truth);
    }

    [Theory]
    [InlineData("load.voltage > 1 V and 1 < 2", "load.voltage")]
    [InlineData("load.voltage > 1 V or 1 > 2", "load.voltage")]
    [InlineData("not load.voltage > 1 V", "load.voltage")]
    [InlineData("load.kind = \"battery\"", "load.kind")]
    [InlineData("load.kind in (\"battery\", \"drive\")", "load.kind")]
    [InlineData("winding.transposed", "winding.transposed")]
    [InlineData("number-of(protection.overspeed) >= 2", "protection.overspeed")]
    [InlineData("load.voltage > 1 V and ratings.power > 1 W", "load.voltage ratings.power")]
    [InlineData("ratings.power / load.voltage", "ratings.power load.voltage")]
    [InlineData("min(ratings.power, 1 W)", "ratings.power")]
    [InlineData("test.missing", "load.voltage load.cable.length")]
    [InlineData("load.voltage + test.missing", "load.voltage load.cable.length")]
    [InlineData("table(\"clearance\", \"least\", \"diameter-up-to\" >= stator.housing-radius)", "stator.housing-radius")]
    public void Lack_OfKeys_IsMissingWithThem(string text, string keys)
    {
        Evaluated value = Evaluate(text);
        Assert.Equal(EvaluatedKind.Missing, value.Kind);
        Assert.Equal(keys.Split(' '), value.MissingKeys);
    }

    [Theory]
    [InlineData("test.foreign * 2")]
    [InlineData("test.foreign / test.broken")]
    [InlineData("load.voltage * 1 T > test.foreign * 1 V")]
    [InlineData("test.foreign > 1 T or load.voltage > 1 V")]
    public void Lack_OfAFigureThatDoesNotConcern_OutweighsOthers(string text)
    {
        Evaluated value = Evaluate(text);
        Assert.Equal(EvaluatedKind.NotApplicable, value.Kind);
        Assert.Equal("there is no tooth", value.Text);
    }

    [Theory]
    [InlineData("1 / (2 - 2)", "a division by zero")]
    [InlineData("(1 - 1) ^ -1", "a division by zero")]
    [InlineData("sqrt(1 - 2)", "the square root of a negative number")]
    [InlineData("gcd(1.5, 2)", "a common divisor or multiple needs positive whole numbers")]
    [InlineData("test.broken", "the gap is wider than the pole")]
    [InlineData("table(\"clearance\", \"least\", \"diameter-up-to\" >= 2 m)", "table clearance has no row for this machine")]
    [InlineData("table(\"clearance\", \"note\", \"kind\" = machine.topology) = \"\"", "table clearance gives no note for this machine")]
    public void Value_OutsideTheDomain_SaysWhy(string text, string reason)
    {
        Evaluated value = Evaluate(text);
        Assert.Equal(EvaluatedKind.OutOfDomain, value.Kind);
        Assert.Equal(reason, value.Text);
    }

    [Theory]
    [InlineData("table(\"clearance\", \"least\", \"kind\" = machine.topology, \"diameter-up-to\" >= 90 mm)", 0.0005)]
    [InlineData("table(\"clearance\", \"least\", \"kind\" = machine.topology, \"diameter-up-to\" >= 100 mm)", 0.0005)]
    [InlineData("table(\"clearance\", \"least\", \"kind\" = machine.topology, \"diameter-up-to\" >= 2 * magnets.pitch-radius)", 0.001)]
    [InlineData("table(\"clearance\", \"least\", \"kind\" != \"axial-flux\")", 0.002)]
    public void Table_GivesTheFirstRowThatFits(string text, double expected) => Assert.Equal(expected, Evaluate(text).Number, 1e-12);

    [Fact]
    public void Table_TextColumn_GivesText() => Assert.True(Evaluate("table(\"clearance\", \"note\", \"kind\" = \"linear\") = \"rails\"").Truth);

    [Fact]
    public void Key_OfAnotherQuantityInThisMachine_DoesNotApply()
    {
        const string Linear = "spec: 1\nmachine: {topology: linear}\nratings: {speed: 2 m/s}\n";
        var graph = new SpecLint.Review.Figures.FigureGraph(ReviewFixture.ReadSpec(Linear), Figures);
        Assert.Equal(EvaluatedKind.NotApplicable, Parse("ratings.speed > 100 rpm").Evaluate(graph).Kind);
    }

    [Fact]
    public void Uncertainty_OfAQuotient_IsTheRootSumSquareOfItsShares()
    {
        // h = 26 ± 1 mm, w = 30 ± 2 mm: the spread of 1/w is taken from both ends, 26·(1/28 − 1/32)/2.
        double hole = 1.0 / 30;
        double width = 26 * ((1.0 / 28) - (1.0 / 32)) / 2;
        Evaluated value = Parse("test.hole / test.width").Measure(Graph());
        Assert.Equal(26.0 / 30, value.Number, 1e-12);
        Assert.Equal(Math.Sqrt((hole * hole) + (width * width)), value.Uncertainty, 1e-12);
    }

    [Fact]
    public void Uncertainty_OfAFigureThatCancels_IsNil() => Assert.Equal(0, Parse("test.width / test.width").Measure(Graph()).Uncertainty, 1e-15);

    [Fact]
    public void Uncertainty_WhereOneEndLeavesTheDomain_IsTakenFromTheOther()
    {
        Evaluated value = Parse("sqrt((test.width - 29 mm) / 1 m)").Measure(Graph());
        Assert.Equal(Math.Sqrt(0.003) - Math.Sqrt(0.001), value.Uncertainty, 1e-12);
    }

    [Fact]
    public void Evaluation_UnderAnotherCulture_IsTheSame()
    {
        var before = System.Globalization.CultureInfo.CurrentCulture;
        try
        {
            System.Globalization.CultureInfo.CurrentCulture = new System.Globalization.CultureInfo("de-DE");
            Assert.Equal(0.0015, Evaluate("1.5 mm").Number, 1e-15);
            Assert.Contains("','", Fault("1,5 mm").Message, StringComparison.Ordinal);
        }
        finally
        {
            System.Globalization.CultureInfo.CurrentCulture = before;
        }
    }
}
