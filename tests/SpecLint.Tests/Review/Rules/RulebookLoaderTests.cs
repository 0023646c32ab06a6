using System.Text;
using CsCheck;
using SpecLint.Review.Figures;
using SpecLint.Review.Rules;
using SpecLint.Spec.Documents;
using SpecLint.Spec.Yaml;
using static SpecLint.Tests.Review.ReviewFixture;

namespace SpecLint.Tests.Review.Rules;

public sealed class RulebookLoaderTests
{
    private const string Whole = """
        rulebook: fit
        sources:
          book: A book, 2001
        safety-notes:
          crush: Magnets crush fingers.
        rules:
          - id: FIT-04
            title: Coil hole wider than the magnet
            when: machine.stator = "coreless"
            from: order
            measure: winding.coil.hole-width / magnets.width
            at-most: 1.1
            grade: query
            beyond: {at-most: 160 %, grade: hold}
            scale: 0.5
            unit: "%"
            say: "The hole of {winding.coil.hole-width} is {measure} of {magnets.width:mm}; at most {bound}, {margin}."
            why: Nothing moves flux there.
            basis: {kind: published, source: "Eq. 4", cite: [book]}
            levers: [winding.coil.hole-width, magnets.width]
            safety: [crush, "Another text."]
            examples:
              of: small
              meets: {}
              breaks: {winding.coil.hole-width: 40 mm}
              breaks-beyond: {winding.coil.hole-width: 52 mm}
              boundary: {winding.coil.hole-width: 33 mm}
        """;

    [Fact]
    public void Rule_WithEveryField_IsRead()
    {
        Rulebook book = Book(Whole);
        Assert.Empty(book.Faults);
        Assert.Equal("fit", book.Name);
        Rule rule = Assert.Single(book.Rules);
        Assert.Equal(("FIT-04", "Coil hole wider than the magnet", "fit"), (rule.Id, rule.Title, rule.Rulebook));
        Assert.Equal((SpecStage.Order, Grade.Query, Grade.Hold), (rule.From, rule.Grade, rule.GravestGrade));
        Assert.Equal(1.1, rule.Bound!.Most!.Constant!.Value, 1e-12);
        Assert.Equal(1.6, rule.Beyond!.Bound.Most!.Constant!.Value, 1e-12);
        Assert.Null(rule.Bound.Least);
        Assert.Equal(0.5, rule.Scale!.Constant);
        Assert.Equal("%", rule.DisplayUnit);
        Assert.Equal(new Basis(BasisKind.Published, "Eq. 4; A book, 2001"), rule.Basis);
        Assert.Equal(["winding.coil.hole-width", "magnets.width"], rule.Levers);
        Assert.Equal(["Magnets crush fingers.", "Another text."], rule.Safety);
        Assert.Equal("52 mm", Assert.Single(rule.Examples!.BreaksBeyond).Value);
        Assert.Equal("33 mm", Assert.Single(rule.Examples.Boundary).Value);
        Assert.Equal(7, rule.Region.StartLine);
    }

    [Theory]
    [InlineData("require: 1 < 2\nmessure: test.width", "a rule has no field messure; did you mean measure?", 5, 5, 12)]
    [InlineData("measure: test.widht\nat-most: 1 mm", "did you mean test.width?", 4, 14, 24)]
    [InlineData("measure: test.width\nat-most: 1 T", "the bound is kg·s⁻²·A⁻¹, the measure m", 5, 14, 17)]
    [InlineData("measure: 'test.width + 1 T'\nat-most: 1 mm", "cannot be added", 4, 15, 31)]
    [InlineData("measure: test.width", "measure has no bound", 4, 5, 12)]
    [InlineData("measure: test.width\nat-most: 1 mm\nat-least: 1 mm", "at-most and at-least stand together", 6, 5, 13)]
    [InlineData("measure: test.width\nwithin: [1 mm]", "needs a list of two limits", 5, 5, 11)]
    [InlineData("measure: test.width\nwithin: [3 mm, 1 mm]", "lower limit above its upper one", 5, 14, 18)]
    [InlineData("measure: test.width\nat-least: 0 mm", "needs a scale", 5, 15, 19)]
    [InlineData("measure: test.hot\nat-most: 90 °C", "needs a scale", 5, 14, 19)]
    [InlineData("measure: test.width\nat-most: 1 mm\nscale: 1 T", "scale is kg·s⁻²·A⁻¹, the measure m", 6, 12, 15)]
    [InlineData("measure: test.width\nat-most: 1 mm\nscale: 0 mm", "scale is not above zero", 6, 12, 16)]
    [InlineData("measure: test.width\nat-most: 1 mm\nunit: T", "does not fit the measure", 6, 11, 12)]
    [InlineData("measure: test.width\nat-most: 1 mm\nunit: ells", "is not a known unit", 6, 11, 15)]
    [InlineData("measure: test.width\nat-most: 2 mm\ngrade: query\nbeyond: {at-most: 1 mm, grade: hold}", "stricter", 7, 23, 27)]
    [InlineData("measure: test.width\nat-most: 2 mm\ngrade: query\nbeyond: {at-least: 1 mm, grade: hold}", "another side", 7, 24, 28)]
    [InlineData("measure: test.width\nat-most: 2 mm\ngrade: hold\nbeyond: {at-most: 3 mm, grade: query}", "no graver", 7, 29, 34)]
    [InlineData("measure: test.width\nat-most: 2 mm\nbeyond: {at-most: 3 mm}", "lacks the field grade", 6, 5, 11)]
    [InlineData("require: 1 mm", "require is a number; expected a condition", 4, 14, 18)]
    [InlineData("measure: 1 mm < 2 mm\nat-most: 1", "measure is a condition; expected a number", 4, 14, 25)]
    [InlineData("require: 1 < 2\nat-most: 1", "at-most goes with measure", 5, 5, 12)]
    [InlineData("require: 1 < 2\nmeasure: 1", "either measure or require", 5, 5, 12)]
    [InlineData("require: 1 < 2\nlevers: [magnets.widht]", "there is no key magnets.widht; did you mean magnets.width?", 5, 14, 27)]
    [InlineData("require: 1 < 2\nsafety: [crush]", "there is no safety note named crush", 5, 14, 19)]
    [InlineData("require: 1 < 2\ngrade: holt", "grade is holt; expected hold or query or remark", 5, 12, 16)]
    [InlineData("require: 1 < 2\nfrom: ordre", "from is ordre", 5, 11, 16)]
    [InlineData("require: 1 < 2\nbasis: {kind: standard}", "names no source", 5, 5, 10)]
    [InlineData("require: 1 < 2\nbasis: {kind: standard, cite: bok}", "there is no source named bok", 5, 35, 38)]
    [InlineData("require: 1 < 2\nsay: 'A {test.widht} b.'", "did you mean test.width?", 5, 14, 24)]
    [InlineData("require: 1 < 2\nsay: 'A {test.width:T} b.'", "cannot be shown in T", 5, 14, 24)]
    [InlineData("require: 1 < 2\nsay: 'A {measure} b.'", "needs a measure", 5, 14, 21)]
    [InlineData("require: 1 < 2\nsay: 'A {test.width b.'", "'{' is not closed", 5, 13, 27)]
    [InlineData("require: 1 < 2\nsay: 'A test.width} b.'", "'}' closes nothing", 5, 23, 24)]
    [InlineData("source: hazard\nrequire: 1 < 2", "a hazard has no require", 5, 5, 12)]
    public void Fault_IsNamedAndLocated(string fields, string message, int line, int column, int endColumn)
    {
        RulebookFault fault = Assert.Single(Book(RuleText(fields)).Faults);
        Assert.Contains(message, fault.Message, StringComparison.Ordinal);
        Assert.Equal(new Region(line, column, line, endColumn), fault.Region);
    }

    [Fact]
    public void Faults_OfSeveralRules_ComeInOnePassByPlace()
    {
        const string Text = """
            rulebook: test
            rules:
              - {id: A-1, title: t, require: 1 <, grade: hold, say: s, why: w, basis: {kind: derived}}
              - {id: A-1, title: t, require: 2 <, grade: hold, say: s, why: w, basis: {kind: derivd}}
              - {id: A 2}
              - text
            """;
        Rulebook book = Book(Text);
        Assert.Equal([3, 4, 4, 4, 5, 5, 5, 5, 5, 5, 5, 6], book.Faults.Select(f => f.Region.StartLine));
        Assert.Contains(book.Faults, f => f.Message.Contains("stands twice", StringComparison.Ordinal));
    }

    [Fact]
    public void Region_InABlockText_IsTheWholeText()
    {
        RulebookFault fault = Assert.Single(Book(RuleText("require: >-\n  1 < 2 and\n  test.widht > 1 mm")).Faults);
        Assert.Equal(4, fault.Region.StartLine);
        Assert.True(fault.Region.EndLine > 4);
    }

    [Fact]
    public void Twins_InTwoBooks_AreFaultsOfTheLater()
    {
        Rulebook first = Book(RuleText("require: 1 < 2"));
        Rulebook second = RulebookLoader.Load("house.yaml", Encoding.UTF8.GetBytes(RuleText("require: 1 < 2")), Scope);
        var (book, fault) = Assert.Single(RulebookLoader.FindTwins([first, second]));
        Assert.Equal("house.yaml", book.Path);
        Assert.Contains("book.yaml", fault.Message, StringComparison.Ordinal);
    }

    [Fact]
    public void SharedTexts_OfAnotherBook_CanBeNamed()
    {
        byte[] notes = Encoding.UTF8.GetBytes("rulebook: notes\nsafety-notes: {crush: Mind your hands.}\nsources: {std: A standard}\n");
        SharedTexts shared = RulebookLoader.ReadSharedTexts(notes, SharedTexts.None);
        byte[] bytes = Encoding.UTF8.GetBytes(RuleText("require: 1 < 2\nsafety: [crush]\nbasis: {kind: standard, cite: std}"));
        Rulebook book = RulebookLoader.Load("b.yaml", bytes, Scope, shared);
        Assert.Empty(book.Faults);
        Assert.Equal(["Mind your hands."], book.Rules[0].Safety);
        Assert.Equal("A standard", book.Rules[0].Basis.Source);
    }

    [Theory]
    [InlineData("")]
    [InlineData("- a\n- b\n")]
    [InlineData("rulebook: [")]
    [InlineData("just text")]
    [InlineData("rulebook: a\nrules: 7\n")]
    [InlineData("rulebook: a\nrules: [[1], {}, ~]\n")]
    [InlineData("rulebook: {a: b}\nrules: [{id: [1], when: {a: b}, say: [], basis: [], levers: {a: 1}, examples: 3, beyond: 4}]\n")]
    public void Shape_ThatIsNoRulebook_IsAFault(string text) => Assert.NotEmpty(Book(text).Faults);

    [Fact]
    public void ManyFaults_AreCutOff()
    {
        var text = new StringBuilder("rulebook: a\nrules:\n");
        for (int i = 0; i < 3000; i++)
        {
            text.Append("  - {id: x}\n");
        }

        Assert.Equal(200, Book(text.ToString()).Faults.Length);
    }

    [Fact]
    public void HugeRulebook_IsReadInBoundedTime()
    {
        var text = new StringBuilder("rulebook: a\nrules:\n");
        string chain = string.Join(" + ", Enumerable.Repeat("winding.coil.hole-widht", 70));
        for (int i = 0; text.Length < 1_900_000; i++)
        {
            text.Append(System.Globalization.CultureInfo.InvariantCulture, $"  - {{id: A-{i}, title: t, measure: {chain}, at-most: 1 mm, grade: hold, say: s, why: w, basis: {{kind: derived}}}}\n");
        }

        var watch = System.Diagnostics.Stopwatch.StartNew();
        Assert.Equal(200, Book(text.ToString()).Faults.Length);
        Assert.InRange(watch.Elapsed.TotalSeconds, 0, 20);
    }

    [Fact]
    public void Aliases_ThatMultiply_AreAFault()
    {
        var text = new StringBuilder("rulebook: a\nl0: &l0 [x, x, x, x, x, x, x, x, x]\n");
        for (int i = 1; i < 12; i++)
        {
            text.Append(System.Globalization.CultureInfo.InvariantCulture, $"l{i}: &l{i} [{string.Join(", ", Enumerable.Repeat($"*l{i - 1}", 9))}]\n");
        }

        Assert.NotEmpty(Book(text.ToString()).Faults);
    }

    [Fact]
    public void EmbeddedTables_LoadWithoutFault()
    {
        Assert.Empty(EmbeddedRulebooks.Tables.Faults);
    }

    [Fact]
    public void RandomBytes_NeverThrow() =>
        Gen.Byte.Array[0, 300].Sample(bytes => RulebookLoader.Load("r.yaml", bytes, Scope).Faults.Length > 0, iter: 3000);

    [Fact]
    public void DamagedRulebook_NeverThrows()
    {
        byte[] whole = Encoding.UTF8.GetBytes(Whole);
        Gen.Select(Gen.Int[0, whole.Length - 1], Gen.Byte, Gen.Int[0, whole.Length - 1], Gen.Int[0, 40]).Sample(
            (at, value, from, count) =>
            {
                byte[] damaged = [.. whole];
                damaged[at] = value;
                byte[] cut = [.. damaged[..from], .. damaged[Math.Min(damaged.Length, from + count)..]];
                return RulebookLoader.Load("r.yaml", cut, Scope) is not null;
            },
            iter: 3000);
    }

    [Fact]
    public void RandomExpressions_NeverThrow()
    {
        string[] words =
        [
            "test.width", "magnets.width", "machine.stator", "\"coreless\"", "1 mm", "85 °C", "2", "0", "+", "-", "*", "/", "^", "(", ")", ",", "=", "<",
            ">=", "and", "or", "not", "in", "stated", "min", "table", "sqrt", "choose", "test.missing", "test.foreign", "test.broken", "'", "[", "°",
        ];
        SpecDocument spec = ReadSpec();
        Gen.Int[0, words.Length - 1].Array[1, 14].Sample(
            parts =>
            {
                string text = string.Join(' ', parts.Select(p => words[p]));
                var expression = SpecLint.Review.Expressions.ExpressionParser.Parse(text, Region.Beginning, Scope, out var fault);
                _ = expression?.Measure(new FigureGraph(spec, Figures));
                return expression is null == fault is not null
                    && (fault is null || (fault.Start >= 0 && fault.Start + fault.Length <= text.Length));
            },
            iter: 20_000);
    }
}
