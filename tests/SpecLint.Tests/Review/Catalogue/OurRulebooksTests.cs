using SpecLint.Review.Catalogue;
using SpecLint.Review.Reviewing;
using SpecLint.Review.Rules;

namespace SpecLint.Tests.Review.Catalogue;

public sealed class OurRulebooksTests
{
    public static TheoryData<string> ExpressionRules =>
        [.. OurRulebooks.All.SelectMany(b => b.Rules).Where(r => r.Source == RuleSource.Expression).Select(r => r.Id)];

    [Theory]
    [MemberData(nameof(ExpressionRules))]
    public void Rule_OwnExamples_ShowWhatTheyShould(string id)
    {
        Rule rule = OurRulebooks.All.SelectMany(b => b.Rules).Single(r => r.Id == id);

        var problems = new RuleExampleRunner(ExampleSpecs.Find, OurFigures.Catalogue).Run(rule);

        Assert.True(problems.IsEmpty, string.Join("\n", problems));
    }

    [Fact]
    public void Books_Ids_AreUnique()
    {
        var ids = OurRulebooks.All.SelectMany(b => b.Rules).Select(r => r.Id).ToList();

        Assert.Equal(ids.Count, ids.Distinct(StringComparer.Ordinal).Count());
        Assert.True(ids.Count >= 60, $"{ids.Count} rules");
    }

    [Fact]
    public void Rules_StandardsAndPublications_NameTheirSource()
    {
        var silent = OurRulebooks.All.SelectMany(b => b.Rules)
            .Where(r => r.Basis.Kind is SpecLint.Review.Figures.BasisKind.Standard or SpecLint.Review.Figures.BasisKind.Published && r.Basis.Source.Length == 0)
            .Select(r => r.Id);

        Assert.Empty(silent);
    }

    [Fact]
    public void Hazards_Notes_EndWithTheDeferralToLocalCodes()
    {
        var without = OurRulebooks.All.SelectMany(b => b.Rules)
            .Where(r => r.Source == RuleSource.Hazard)
            .Where(r => r.Safety.IsEmpty || !r.Safety[^1].Contains("ocal codes and licensed practice prevail", StringComparison.Ordinal))
            .Select(r => r.Id);

        Assert.Empty(without);
    }
}
