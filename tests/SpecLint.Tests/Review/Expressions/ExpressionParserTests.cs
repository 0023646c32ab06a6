using SpecLint.Review.Expressions;
using SpecLint.Spec.Units;
using static SpecLint.Tests.Review.ReviewFixture;

namespace SpecLint.Tests.Review.Expressions;

public sealed class ExpressionParserTests
{
    [Theory]
    [InlineData("1 + 2 * 3", 7)]
    [InlineData("(1 + 2) * 3", 9)]
    [InlineData("8 - 4 - 2", 2)]
    [InlineData("8 / 4 / 2", 1)]
    [InlineData("-2 ^ 2", -4)]
    [InlineData("(-2) ^ 2", 4)]
    [InlineData("2 ^ -1", 0.5)]
    [InlineData("2 * -3", -6)]
    [InlineData("- - 3", 3)]
    [InlineData("6 × 2 · 3 − 1", 35)]
    [InlineData("1.5e3", 1500)]
    [InlineData("min(3, 1, 2)", 1)]
    [InlineData("max(3, 1 + 4, 2)", 5)]
    [InlineData("abs(2 - 5)", 3)]
    [InlineData("sqrt(16)", 4)]
    [InlineData("gcd(12, 9)", 3)]
    [InlineData("lcm(4, 6)", 12)]
    [InlineData("choose(1 < 2, 10, 20)", 10)]
    public void Arithmetic_OfNumbers_FollowsPrecedence(string text, double expected) =>
        Assert.Equal(expected, Evaluate(text).Number, 1e-12);

    [Theory]
    [InlineData("1 < 2 and 3 < 2 or 1 < 2", true)]
    [InlineData("1 < 2 or 3 < 2 and 3 < 2", true)]
    [InlineData("(1 < 2 or 3 < 2) and 3 < 2", false)]
    [InlineData("not 1 > 2 and 1 < 2", true)]
    [InlineData("not (1 < 2 and 1 < 2)", false)]
    [InlineData("1 + 1 = 2", true)]
    [InlineData("0.1 + 0.2 = 0.3", true)]
    [InlineData("0.1 + 0.2 > 0.3", false)]
    [InlineData("2 ≥ 2 and 2 ≤ 2 and 2 ≠ 3", true)]
    [InlineData("machine.phases in (1, 3)", true)]
    [InlineData("machine.phases not in (1, 3)", false)]
    [InlineData("machine.stator = \"coreless\"", true)]
    [InlineData("machine.stator != 'slotted'", true)]
    [InlineData("machine.topology in (\"linear\", \"axial-flux\")", true)]
    [InlineData("magnets.grade = \"N42\"", false)]
    public void Condition_OfKnownValues_IsDecided(string text, bool expected) => Assert.Equal(expected, Evaluate(text).Truth);

    [Theory]
    [InlineData("0.5 mm", 0.0005)]
    [InlineData("0.5mm", 0.0005)]
    [InlineData("10 A/mm²", 1e7)]
    [InlineData("10 A/mm^2", 1e7)]
    [InlineData("5 mm^2", 5e-6)]
    [InlineData("5 mm ^ 2", 25e-6)]
    [InlineData("15 K", 15)]
    [InlineData("85 °C", 358.15)]
    [InlineData("85 °C + 10 K", 368.15)]
    [InlineData("85 °C - 15 °C", 70)]
    [InlineData("80 %", 0.8)]
    [InlineData("10 mm/2", 0.005)]
    [InlineData("10 mm*2", 0.02)]
    [InlineData("magnets.width", 0.03)]
    [InlineData("winding.coil.hole-width / magnets.width", 26.0 / 30)]
    public void Number_WithUnit_IsInSi(string text, double expected) => Assert.Equal(expected, Evaluate(text).Number, 1e-9 * expected);

    [Fact]
    public void Name_WithHyphens_IsOneName() =>
        Assert.Equal(["winding.coil.hole-width", "magnets.width"], Parse("winding.coil.hole-width - magnets.width").Keys);

    [Fact]
    public void Expression_NamesFiguresAndKeys_InOrderOnce()
    {
        Expression expression = Parse("test.hole / test.width + test.hole / magnets.width");
        Assert.Equal(["test.hole", "test.width"], expression.Figures);
        Assert.Equal(["magnets.width"], expression.Keys);
        Assert.Equal(Dimension.None, expression.Dimension);
    }

    [Theory]
    [InlineData("test.hole", "mm")]
    [InlineData("test.hot - 20 °C", "K")]
    [InlineData("test.hot - 20 K", "°C")]
    [InlineData("1.1 * test.width", "mm")]
    [InlineData("test.hole / test.width", "")]
    [InlineData("80 %", "%")]
    public void DisplayUnit_FollowsWhatIsNamed(string text, string expected) => Assert.Equal(expected, Parse(text).DisplayUnit);

    [Theory]
    [InlineData("", "empty", 0, 0)]
    [InlineData("1 +", "too early", 3, 0)]
    [InlineData("1 + * 2", "'*' is not expected", 4, 1)]
    [InlineData("(1 + 2", "too early", 6, 0)]
    [InlineData("1 2", "'2' is not expected", 2, 1)]
    [InlineData("1 < 2 < 3", "do not chain", 6, 1)]
    [InlineData("test.widht", "did you mean test.width?", 0, 10)]
    [InlineData("2 * magnets.widht", "did you mean magnets.width?", 4, 13)]
    [InlineData("test.width-test.hole", "minus sign has spaces", 0, 20)]
    [InlineData("3 furlong", "furlong is not a known unit", 2, 7)]
    [InlineData("\"open", "does not end", 0, 5)]
    [InlineData("1 # 2", "'#' has no meaning", 2, 1)]
    [InlineData("2 ^ 1.5", "cannot be an exponent", 4, 3)]
    [InlineData("2 ^ 7", "cannot be an exponent", 4, 1)]
    [InlineData("hypot(1, 2)", "there is no function hypot", 0, 5)]
    [InlineData("sqrt(1, 2)", "expected 1", 0, 10)]
    [InlineData("min(1)", "expected at least 2", 0, 6)]
    [InlineData("stated(magnets.colour)", "there is no key magnets.colour", 7, 14)]
    [InlineData("known(magnets.width)", "there is no figure magnets.width", 6, 13)]
    [InlineData("number-of(magnets.width)", "is not a list", 10, 13)]
    [InlineData("winding.coil = 1", "is a section", 0, 12)]
    [InlineData("machine.stator = \"corless\"", "is never \"corless\"", 17, 9)]
    [InlineData("machine.stator < \"slotted\"", "words have no order", 0, 26)]
    [InlineData("table(\"clearence\", \"least\")", "did you mean clearance?", 6, 11)]
    [InlineData("table(\"clearance\", \"leest\")", "did you mean least?", 19, 7)]
    [InlineData("table(\"clearance\", \"least\", \"kind\" = 3)", "numbers or words", 28, 6)]
    public void Fault_IsNamedAndLocated(string text, string message, int start, int length)
    {
        ExpressionFault fault = Fault(text);
        Assert.Contains(message, fault.Message, StringComparison.Ordinal);
        Assert.Equal((start, length), (fault.Start, fault.Length));
    }

    [Theory]
    [InlineData("test.field > 3 mm", 0, 17)]
    [InlineData("test.field + magnets.width", 0, 26)]
    [InlineData("1 + 1 mm", 0, 8)]
    [InlineData("min(1 mm, 1 T)", 4, 9)]
    [InlineData("choose(1 < 2, 1 mm, 1)", 14, 7)]
    [InlineData("sqrt(magnets.width)", 0, 19)]
    [InlineData("gcd(magnets.width, 2 mm)", 4, 13)]
    [InlineData("table(\"clearance\", \"least\", \"least\" >= 1 T)", 28, 14)]
    public void Dimensions_ThatDisagree_AreAFault(string text, int start, int length)
    {
        ExpressionFault fault = Fault(text);
        Assert.Equal((start, length), (fault.Start, fault.Length));
    }

    [Theory]
    [InlineData("(1 < 2) + 1", "(1 < 2) is a condition; expected a number", 0)]
    [InlineData("1 and 1 < 2", "1 is a number; expected a condition", 0)]
    [InlineData("not magnets.width", "magnets.width is a number; expected a condition", 4)]
    [InlineData("machine.stator + 1", "machine.stator is a text", 0)]
    [InlineData("sqrt(1 < 2)", "1 < 2 is a condition", 5)]
    [InlineData("winding.transposed = 1", "winding.transposed is a condition", 0)]
    public void Kinds_ThatDisagree_AreAFault(string text, string message, int start)
    {
        ExpressionFault fault = Fault(text);
        Assert.Contains(message, fault.Message, StringComparison.Ordinal);
        Assert.Equal(start, fault.Start);
    }

    [Theory]
    [InlineData("2 * 85 °C")]
    [InlineData("test.hot + 20 °C")]
    [InlineData("-(20 °C)")]
    [InlineData("20 °C ^ 2")]
    public void Celsius_AddedOrMultiplied_IsAFault(string text) => Assert.Contains("K", Fault(text).Message, StringComparison.Ordinal);

    [Fact]
    public void BareZero_GoesWithEveryDimension() => Assert.True(Evaluate("magnets.width > 0 and test.field >= 0").Truth);

    [Theory]
    [InlineData(40, true)]
    [InlineData(41, false)]
    public void Nesting_IsBounded(int depth, bool parses)
    {
        string text = new string('(', depth) + "1" + new string(')', depth);
        Expression? expression = ExpressionParser.Parse(text, SpecLint.Spec.Yaml.Region.Beginning, Scope, out ExpressionFault? fault);
        Assert.Equal(parses, expression is not null);
        Assert.Equal(parses, fault is null);
    }

    [Fact]
    public void Length_IsBounded() => Assert.Contains("2001 characters", Fault("1" + new string(' ', 2000)).Message, StringComparison.Ordinal);

    [Fact]
    public void LongestChain_IsEvaluated() => Assert.Equal(1000, Evaluate(string.Join('+', Enumerable.Repeat("1", 1000))).Number);

    [Fact]
    public void PowersOfPowers_OfAQuantity_AreAFault() =>
        Assert.Contains("is not a quantity", Fault("((magnets.width ^ 6) ^ 6) ^ 6").Message, StringComparison.Ordinal);

    [Fact]
    public void PowersOfPowers_OfANumber_AreOutOfDomain() =>
        Assert.Equal(EvaluatedKind.OutOfDomain, Evaluate("((((9 ^ 6) ^ 6) ^ 6) ^ 6) ^ 6").Kind);
}
