using System.Globalization;
using SpecLint.Review.Findings;
using SpecLint.Review.Reviewing;
using SpecLint.Review.Rules;
using SpecLint.Spec.Documents;
using SpecLint.Spec.Yaml;
using static SpecLint.Tests.Review.ReviewFixture;

namespace SpecLint.Tests.Review.Reviewing;

public sealed class ReviewerTests
{
    private const string Document = """
        rulebook: doc
        rules:
          - {id: DOC-01, title: The spec cannot be read as written, source: reading, grade: hold, why: w, basis: {kind: derived}}
          - {id: DOC-03, title: A waiver does not stand, source: waivers, grade: hold, why: w, basis: {kind: common-practice}}
          - {id: CLM-01, title: A claim is not borne out, source: declarations, at-most: 5 %, grade: query, beyond: {at-most: 15 %, grade: hold}, why: w, basis: {kind: derived}}
        """;

    private const string Common = ", say: s, why: w, basis: {kind: derived}}\n";

    [Fact]
    public void Machine_WithoutUnmetRules_IsReleased() => Assert.Equal(ReviewOutcome.Released, Run("  - {id: A-1, title: t, require: 1 < 2, grade: hold").Outcome);

    [Theory]
    [InlineData("hold", "1 > 2", ReviewOutcome.Held)]
    [InlineData("query", "1 > 2", ReviewOutcome.ReleasedWithQueries)]
    [InlineData("remark", "1 > 2", ReviewOutcome.Released)]
    [InlineData("hold", "load.voltage > 1 V", ReviewOutcome.Incomplete)]
    [InlineData("query", "load.voltage > 1 V", ReviewOutcome.Released)]
    public void Outcome_FollowsTheGravestFinding(string grade, string condition, ReviewOutcome outcome) =>
        Assert.Equal(outcome, Run($"  - {{id: A-1, title: t, require: {condition}, grade: {grade}").Outcome);

    [Fact]
    public void Held_OutweighsIncomplete() => Assert.Equal(
        ReviewOutcome.Held,
        Run("  - {id: A-1, title: t, require: 1 > 2, grade: hold", "  - {id: A-2, title: t, require: load.voltage > 1 V, grade: hold").Outcome);

    [Fact]
    public void ClosingKeys_AreRankedByTheRulesTheyClose()
    {
        MachineReview review = Run(
            "  - {id: A-1, title: t, require: load.voltage > ratings.voltage, grade: hold",
            "  - {id: A-2, title: t, require: load.voltage > 1 V, grade: hold",
            "  - {id: A-3, title: t, require: ratings.power > 1 W, grade: query");
        Assert.Equal(["load.voltage", "ratings.voltage"], review.ClosingKeys);
    }

    [Fact]
    public void Findings_AreSortedByPlaceThenRule()
    {
        MachineReview review = Run(
            "  - {id: B-2, title: t, require: 1 > 2, levers: [magnets.width], grade: hold",
            "  - {id: B-1, title: t, require: 1 > 2, levers: [magnets.width], grade: query",
            "  - {id: C-1, title: t, require: 1 > 2, levers: [machine.poles], grade: query");
        Assert.Equal(["C-1", "B-1", "B-2"], review.Findings.Where(f => f.Kind == FindingKind.Unmet).Select(f => f.Rule.Id));
        Assert.Equal(["B-2", "C-1", "B-1"], review.Unmet.Select(f => f.Rule.Id));
    }

    [Fact]
    public void Fault_OfTheSpec_IsAFindingBesideTheOthers()
    {
        MachineReview review = Run(Machine + "colour: red\n", "  - {id: A-1, title: t, require: 1 > 2, grade: query");
        Finding fault = Assert.Single(review.Findings, f => f.Rule.Id == "DOC-01");
        Assert.Equal((FindingKind.Unmet, Grade.Hold), (fault.Kind, fault.Grade));
        Assert.Equal(34, fault.Region.StartLine);
        Assert.Contains(review.Findings, f => f.Rule.Id == "A-1" && f.Kind == FindingKind.Unmet);
        Assert.Equal(ReviewOutcome.Held, review.Outcome);
    }

    [Theory]
    [InlineData("")]
    [InlineData("spec: [")]
    [InlineData("spec: 1\nmachine: {topology: axial}\n")]
    [InlineData("spec: 1\nmachine: {role: motor}\n")]
    public void Spec_WithoutAMachine_HasReadingFaultsOnly(string text)
    {
        MachineReview review = Run(text, "  - {id: A-1, title: t, require: 1 > 2, grade: query");
        Assert.Null(review.Figures);
        Assert.NotEmpty(review.Findings);
        Assert.All(review.Findings, f => Assert.Equal("DOC-01", f.Rule.Id));
        Assert.Equal(ReviewOutcome.Held, review.Outcome);
    }

    [Fact]
    public void Faults_WithoutARuleForThem_AreStillFindings()
    {
        MachineReview review = Reviewer.Review(ReadSpec("spec: 1\n"), Figures, [], ReviewOptions.Default);
        Assert.Contains(review.Findings, f => f.Rule.Id == "DOC-01" && f.Kind == FindingKind.Unmet);
    }

    [Theory]
    [InlineData("rule: A-1, reason: r, approved-by: a", null, FindingKind.Met, true, "has a reason")]
    [InlineData("rule: A-1, reason: r, approved-by: a, until: 2030-06-01", "2030-06-01", FindingKind.Met, true, "has a reason")]
    [InlineData("rule: A-1, reason: r, approved-by: a, until: 2030-06-01", "2030-06-02", FindingKind.Unmet, false, "ended on 2030-06-01")]
    [InlineData("rule: A-1, reason: r, approved-by: a, until: 2030-06-01", null, FindingKind.Open, true, "no date was given")]
    [InlineData("rule: A-1, reason: r, approved-by: a, until: June", "2030-06-01", FindingKind.Unmet, false, "is no date")]
    [InlineData("rule: A-1, approved-by: a", null, FindingKind.Unmet, false, "gives no reason")]
    [InlineData("rule: A-1, reason: r", null, FindingKind.Unmet, false, "names no approver")]
    [InlineData("rule: A-9, reason: r, approved-by: a", null, FindingKind.Unmet, false, "names no live rule; did you mean A-1?")]
    [InlineData("rule: DOC-03, reason: r, approved-by: a", null, FindingKind.Unmet, false, "cannot be waived")]
    public void Waiver_IsJudgedAndExcuses(string fields, string? on, FindingKind kind, bool excuses, string message)
    {
        var options = new ReviewOptions { On = on is null ? null : DateOnly.ParseExact(on, "yyyy-MM-dd", CultureInfo.InvariantCulture) };
        string text = Machine + "waivers:\n  - {" + fields + "}\n";
        MachineReview review = Reviewer.Review(ReadSpec(text), Figures, Books("  - {id: A-1, title: t, require: 1 > 2, grade: hold"), options);
        Finding waiver = Assert.Single(review.Findings, f => f.Rule.Id == "DOC-03");
        Assert.Equal(kind, waiver.Kind);
        Assert.Contains(message, waiver.Message, StringComparison.Ordinal);
        Assert.Equal("waivers[0]", waiver.Key);
        Assert.Equal(35, waiver.Region.StartLine);
        Assert.Equal(excuses, Assert.Single(review.Findings, f => f.Rule.Id == "A-1").Waiver is not null);
        Assert.Equal(excuses ? ReviewOutcome.Released : ReviewOutcome.Held, review.Outcome);
    }

    [Fact]
    public void Waivers_OfTheOptions_Excuse()
    {
        var options = new ReviewOptions { Waivers = [new Waiver("A-1", "r", "a", "", Region.Beginning)] };
        MachineReview review = Reviewer.Review(ReadSpec(), Figures, Books("  - {id: A-1, title: t, require: 1 > 2, grade: hold"), options);
        Assert.Single(review.Waived);
    }

    [Theory]
    [InlineData("test.exact: 30 mm", FindingKind.Met, Grade.Query, "0 % apart")]
    [InlineData("test.exact: 31.5 mm", FindingKind.Met, Grade.Query, "expected at most 5.0 %")]
    [InlineData("test.exact: 31.6 mm", FindingKind.Unmet, Grade.Query, "declared as 31.6 mm, computed as 30 mm: 5.33 % apart; expected at most 5.0 %")]
    [InlineData("test.exact: 34.6 mm", FindingKind.Unmet, Grade.Hold, "expected at most 15 %")]
    [InlineData("test.width: 31.9 mm", FindingKind.Met, Grade.Query, "expected at most 6.67 %")]
    [InlineData("test.exact: 32 mm ± 2 mm", FindingKind.Met, Grade.Query, "expected at most 6.67 %")]
    [InlineData("test.exact: 37 mm ± 2 mm", FindingKind.Unmet, Grade.Hold, "expected at most 20 %")]
    [InlineData("test.hot: 78 °C", FindingKind.Met, Grade.Query, "5.45 % apart; expected at most 30 %")]
    [InlineData("test.exatc: 30 mm", FindingKind.Unmet, Grade.Hold, "no figure test.exatc to compare with; did you mean test.exact?")]
    [InlineData("test.exact: 30 T", FindingKind.Unmet, Grade.Hold, "expected a value in mm")]
    [InlineData("test.missing: 30 V", FindingKind.Open, Grade.Hold, "needs load.voltage")]
    [InlineData("test.foreign: 1 T", FindingKind.NotApplicable, Grade.Query, "there is no tooth")]
    public void Declaration_IsComparedWithTheFigure(string declared, FindingKind kind, Grade grade, string message)
    {
        MachineReview review = Run(Machine + "declared: {" + declared + "}\n", []);
        Finding claim = Assert.Single(review.Findings, f => f.Rule.Id == "CLM-01");
        Assert.Equal((kind, grade), (claim.Kind, claim.Grade));
        Assert.Contains(message, claim.Message, StringComparison.Ordinal);
        Assert.Equal(34, claim.Region.StartLine);
        Assert.StartsWith("declared.test.", claim.Key, StringComparison.Ordinal);
    }

    [Fact]
    public void Review_UnderAnotherCulture_IsTheSame()
    {
        string text = Machine + "declared: {test.exact: 31.6 mm}\n";
        string[] Messages() => [.. Run(text, "  - {id: A-1, title: t, measure: test.exact, at-most: 12.5 mm, grade: hold").Findings.Select(f => f.Message)];
        string[] invariant = Messages();
        CultureInfo before = CultureInfo.CurrentCulture;
        try
        {
            CultureInfo.CurrentCulture = new CultureInfo("de-DE");
            Assert.Equal(invariant, Messages());
        }
        finally
        {
            CultureInfo.CurrentCulture = before;
        }
    }

    private static MachineReview Run(params string[] rules) => rules[0].StartsWith("  - ", StringComparison.Ordinal)
        ? Run(Machine, rules)
        : Run(rules[0], rules[1..]);

    private static MachineReview Run(string text, string[] rules) => Reviewer.Review(ReadSpec(text), Figures, Books(rules), ReviewOptions.Default);

    private static Rulebook[] Books(params string[] rules)
    {
        Rulebook[] books = [Book(Document + "\n"), Book("rulebook: a\nrules:\n" + string.Concat(rules.Select(r => r + Common)))];
        Assert.All(books.Take(rules.Length == 0 ? 1 : 2), b => Assert.Empty(b.Faults));
        return books;
    }
}
