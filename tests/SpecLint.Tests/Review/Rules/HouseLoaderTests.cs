using System.Text;
using CsCheck;
using SpecLint.Review.Figures;
using SpecLint.Review.Findings;
using SpecLint.Review.Reviewing;
using SpecLint.Review.Rules;
using static SpecLint.Tests.Review.ReviewFixture;

namespace SpecLint.Tests.Review.Rules;

public sealed class HouseLoaderTests
{
    private const string Measured = "measure: test.exact\nat-most: 40 mm\ngrade: query\nbeyond: {at-most: 50 mm, grade: hold}\nbasis: {kind: published, source: A book}";

    [Fact]
    public void House_ChangesBoundGradeAndBasis()
    {
        House house = Load("house: Shed\nrules:\n  TST-01: {at-most: 29 mm, grade: hold, why: Ours.}\n", Measured);
        Assert.Empty(house.Faults);
        Rule rule = house.Books[0].Rules[0];
        Assert.Equal(0.029, rule.Bound!.Most!.Constant!.Value, 1e-12);
        Assert.Equal((Grade.Hold, "Ours."), (rule.Grade, rule.Why));
        Assert.Null(rule.Beyond);
        Assert.Equal(new Basis(BasisKind.House, "Shed, in place of: A book"), rule.Basis);
        Assert.Equal(FindingKind.Unmet, Reviewer.ReviewRule(Graph(), rule).Kind);
    }

    [Fact]
    public void House_NamesRulebooksAndWaivers()
    {
        const string Text = "house: Shed\nrulebooks: [more.yaml]\nwaivers:\n  - {rule: TST-01, reason: r, approved-by: a, until: 2030-01-01}\n";
        House house = Load(Text, Measured);
        Assert.Equal(["more.yaml"], house.RulebookPaths);
        Assert.Equal(["more.yaml"], HouseLoader.ReadRulebookPaths(Encoding.UTF8.GetBytes(Text)));
        Waiver waiver = Assert.Single(house.Waivers);
        Assert.Equal(("TST-01", "r", "a", "2030-01-01"), (waiver.RuleId, waiver.Reason, waiver.ApprovedBy, waiver.Until));
    }

    [Theory]
    [InlineData("house: Shed\nrules: {TST-02: {grade: hold}}\n", "there is no rule TST-02; did you mean TST-01?", 2, 9)]
    [InlineData("house: Shed\nrules: {TST-01: {at-most: 1 T}}\n", "the bound is kg·s⁻²·A⁻¹, the measure m", 2, 27)]
    [InlineData("house: Shed\nrules: {TST-01: {at-most: 60 mm}}\n", "state beyond too", 2, 18)]
    [InlineData("house: Shed\nrules: {TST-01: {measure: 1}}\n", "TST-01 has no field measure", 2, 18)]
    [InlineData("house: Shed\nwaivers: [{rule: TST-01, reason: r}]\n", "a waiver lacks the field approved-by", 2, 12)]
    [InlineData("rules: {}\n", "a house file lacks the field house", 1, 1)]
    [InlineData("", "holds no document", 1, 1)]
    public void Fault_IsNamedAndLocated(string text, string message, int line, int column)
    {
        RulebookFault fault = Assert.Single(Load(text, Measured).Faults);
        Assert.Contains(message, fault.Message, StringComparison.Ordinal);
        Assert.Equal((line, column), (fault.Region.StartLine, fault.Region.StartColumn));
    }

    [Fact]
    public void RandomBytes_NeverThrow() =>
        Gen.Byte.Array[0, 200].Sample(bytes => HouseLoader.Load(bytes, Scope, []).Faults.Length > 0, iter: 2000);

    private static House Load(string text, string fields) => HouseLoader.Load(Encoding.UTF8.GetBytes(text), Scope, [Book(RuleText(fields))]);
}
