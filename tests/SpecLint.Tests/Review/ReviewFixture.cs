using System.Text;
using SpecLint.Review.Expressions;
using SpecLint.Review.Figures;
using SpecLint.Review.Findings;
using SpecLint.Review.Reviewing;
using SpecLint.Review.Rules;
using SpecLint.Spec.Documents;
using SpecLint.Spec.Units;
using SpecLint.Spec.Yaml;

namespace SpecLint.Tests.Review;

/// <summary>A small machine, a small figure catalogue and short ways to a rule and its finding.</summary>
internal static class ReviewFixture
{
    public const string Machine = """
        spec: 1
        title: small machine
        machine:
          role: generator
          topology: axial-flux
          arrangement: twin-rotor
          stator: coreless
          poles: 12
          phases: 3
        magnets:
          shape: block
          length: 46 mm
          width: 30 mm
          thickness: 10 mm
          pitch-radius: 115 mm
          grade: N42SH
        rotor:
          back-iron: {material: mild-steel, thickness: 10 mm, inner-radius: 50 mm, outer-radius: 145 mm}
        winding:
          coils: 9
          turns: 55
          strands: 2
          wire: AWG 16
          coil:
            shape: keystone
            hole-length: 46 mm
            hole-width: 26 mm
            leg-width: 16 mm
            thickness: 13 mm
          connection: star
        gap:
          clearance: 1.5 mm
          cover: 0.5 mm

        """;

    public static Dimension Length { get; } = Dimensions.Length;

    /// <summary>Figures: a width with a band of 2 mm, a coarse temperature, a ratio, and one of each lack.</summary>
    public static FigureCatalogue Figures { get; } = new(
    [
        Figure("test.width", "m", "mm", Dimensions.Length, e => e.Value(e.Number("magnets.width"), 0.002)),
        Figure("test.hole", "m", "mm", Dimensions.Length, e => e.Value(e.Number("winding.coil.hole-width"), 0.001)),
        Figure("test.exact", "m", "mm", Dimensions.Length, e => e.Value(e.Number("magnets.width"), 0)),
        Figure("test.field", "T", "T", Dimensions.FluxDensity, e => e.Value(0.6, 0.03)),
        Figure("test.hot", "K", "°C", Dimensions.Temperature, e => e.Value(e.Number("winding.turns") + 293.15, 0.3 * e.Number("winding.turns"))) with { IsCoarse = true },
        Figure("test.force", "N", "N", Dimensions.Force, e => e.Value(250, 0)),
        Figure("test.missing", "V", "V", Dimensions.Voltage, e => e.Value(e.Number("load.voltage") + e.Number("load.cable.length"))),
        Figure("test.foreign", "T", "T", Dimensions.FluxDensity, e => e.NotApplicable("there is no tooth")),
        Figure("test.broken", "T", "T", Dimensions.FluxDensity, e => e.OutOfDomain("the gap is wider than the pole")),
    ]);

    public static ExpressionScope Scope { get; } = new(Figures, Tables());

    public static SpecDocument ReadSpec(string text = Machine) => SpecReader.Read("machine.yaml", Encoding.UTF8.GetBytes(text));

    /// <summary>The small machine with values set from text.</summary>
    public static SpecDocument With(params (string Key, string Text)[] changes)
    {
        SpecDocument spec = ReadSpec();
        foreach (var (key, text) in changes)
        {
            spec = spec.WithText(key, text, out SpecFault? fault);
            Assert.Null(fault);
        }

        return spec;
    }

    public static FigureGraph Graph(params (string Key, string Text)[] changes) => new(With(changes), Figures);

    public static Expression Parse(string text)
    {
        Expression? expression = ExpressionParser.Parse(text, Region.Beginning, Scope, out ExpressionFault? fault);
        Assert.True(fault is null, fault?.Message);
        return expression!;
    }

    public static ExpressionFault Fault(string text)
    {
        Expression? expression = ExpressionParser.Parse(text, Region.Beginning, Scope, out ExpressionFault? fault);
        Assert.Null(expression);
        return fault!;
    }

    public static Evaluated Evaluate(string text, params (string Key, string Text)[] changes) => Parse(text).Evaluate(Graph(changes));

    public static Rulebook Book(string text) => RulebookLoader.Load("book.yaml", Encoding.UTF8.GetBytes(text), Scope);

    /// <summary>A rulebook of one rule with the fields given and the rest filled in.</summary>
    public static Rule Rule(string fields)
    {
        Rulebook book = Book(RuleText(fields));
        Assert.Empty(book.Faults);
        return Assert.Single(book.Rules);
    }

    public static string RuleText(string fields)
    {
        var text = new StringBuilder("rulebook: test\nrules:\n  - id: TST-01\n");
        foreach (string line in fields.ReplaceLineEndings("\n").Split('\n'))
        {
            text.Append("    ").Append(line).Append('\n');
        }

        foreach (var (field, value) in new[]
        {
            ("title", "Something is wrong"), ("grade", "hold"), ("say", "Said."), ("why", "Because."), ("basis", "{kind: derived}"),
        })
        {
            if (!fields.Split('\n').Any(l => l.StartsWith(field + ":", StringComparison.Ordinal)) && !(field is "grade" && fields.Contains("source: hazard", StringComparison.Ordinal)))
            {
                text.Append("    ").Append(field).Append(": ").Append(value).Append('\n');
            }
        }

        return text.ToString();
    }

    public static Finding ReviewRule(string fields, params (string Key, string Text)[] changes) =>
        Reviewer.ReviewRule(Graph(changes), Rule(fields));

    private static FigureDefinition Figure(string name, string unit, string shown, Dimension dimension, Func<Evaluation, Outcome> compute) => new()
    {
        Name = name,
        UnitOfMeasure = new FigureUnit(unit, shown, dimension),
        Meaning = name,
        Formula = name,
        Basis = new Basis(BasisKind.Derived, ""),
        Compute = compute,
    };

    private static ReferenceTables Tables()
    {
        const string Text = """
            tables:
              clearance:
                what: least clearance
                source: invented for the tests
                status: common-practice
                units: {diameter-up-to: mm, least: mm}
                rows:
                  - {kind: axial-flux, diameter-up-to: 100, least: 0.5}
                  - {kind: axial-flux, diameter-up-to: 400, least: 1.0 mm}
                  - {kind: linear, diameter-up-to: 400, least: 2, note: rails}
            """;
        ReferenceTables tables = ReferenceTableLoader.Load([("tables.yaml", Encoding.UTF8.GetBytes(Text))]);
        Assert.Empty(tables.Faults);
        return tables;
    }
}
