using SpecLint.Review.Reviewing;
using SpecLint.Review.Rules;
using static SpecLint.Tests.Review.ReviewFixture;

namespace SpecLint.Tests.Review.Reviewing;

public sealed class RuleExampleRunnerTests
{
    private const string Bounds = "measure: test.exact\nat-most: 30 mm\ngrade: query\nbeyond: {at-most: 40 mm, grade: hold}\n";

    [Theory]
    [InlineData(Bounds + "examples: {of: small, meets: {}, breaks: {magnets.width: 35 mm}, breaks-beyond: {magnets.width: 45 mm}, boundary: {magnets.width: 30.1 mm}}")]
    [InlineData("require: stated(magnets.grade)\nexamples: {of: small, meets: {}, breaks: {magnets.grade: ~}}")]
    [InlineData("require: stated(rotor.back-iron.inner-radius)\nexamples: {of: small, meets: {}, breaks: {rotor.back-iron.inner-radius: ~}}")]
    [InlineData("require: stated(winding.strands)\ngrade: remark\nexamples: {of: small, meets: {winding.strands: 3}, breaks: {winding.strands: ~}}")]
    public void Examples_ThatShowTheRule_HaveNoProblem(string fields) => Assert.Empty(Run(fields));

    [Theory]
    [InlineData(Bounds, "has no examples")]
    [InlineData(Bounds + "examples: {of: other, meets: {}, breaks: {}, breaks-beyond: {}}", "there is no example spec other")]
    [InlineData(Bounds + "examples: {of: small, meets: {magnets.width: 31 mm}, breaks: {magnets.width: 35 mm}, breaks-beyond: {magnets.width: 45 mm}}", "meets: is Unmet at Query")]
    [InlineData(Bounds + "examples: {of: small, meets: {}, breaks: {magnets.width: 45 mm}, breaks-beyond: {magnets.width: 45 mm}}", "breaks: is Unmet at Hold")]
    [InlineData(Bounds + "examples: {of: small, meets: {}, breaks: {magnets.width: 35 mm}, breaks-beyond: {magnets.width: 35 mm}}", "breaks-beyond: is Unmet at Query")]
    [InlineData(Bounds + "examples: {of: small, meets: {}, breaks: {magnets.width: 35 mm}}", "no example breaks-beyond")]
    [InlineData(Bounds + "examples: {of: small, meets: {}, breaks: {magnets.width: 35 mm}, breaks-beyond: {magnets.width: 45 mm}, boundary: {magnets.width: 31 mm}}", "boundary: is Unmet")]
    [InlineData(Bounds + "examples: {of: small, meets: {magnets.widht: 31 mm}, breaks: {magnets.width: 35 mm}, breaks-beyond: {magnets.width: 45 mm}}", "meets: ")]
    public void Examples_ThatDoNotShowTheRule_SayWhy(string fields, string problem) =>
        Assert.Contains(problem, Assert.Single(Run(fields)), StringComparison.Ordinal);

    private static System.Collections.Immutable.ImmutableArray<string> Run(string fields)
    {
        var runner = new RuleExampleRunner(name => name == "small" ? ReadSpec() : null, Figures);
        return runner.Run(ReviewFixture.Rule(fields));
    }

}
