using System.Text.RegularExpressions;
using SpecLint.Review.Catalogue;
using SpecLint.Review.Figures;
using SpecLint.Spec.Documents;
using SpecLint.Spec.Schema;

namespace SpecLint.Tests.Review.Catalogue;

public sealed partial class OurFiguresTests
{
    [Theory]
    [MemberData(nameof(ExampleSpecs.All), MemberType = typeof(ExampleSpecs))]
    public void Figures_EveryExample_AreFiniteOrSayWhyNot(string name)
    {
        var graph = new FigureGraph(ExampleSpecs.Read(name), OurFigures.Catalogue);

        foreach (Figure figure in graph.All())
        {
            Outcome outcome = figure.Outcome;
            Assert.True(
                outcome.Kind switch
                {
                    OutcomeKind.Value => double.IsFinite(outcome.Value) && double.IsFinite(outcome.Uncertainty) && outcome.Uncertainty >= 0,
                    OutcomeKind.Missing => !outcome.MissingKeys.IsEmpty,
                    _ => outcome.Reason.Length > 0,
                },
                $"{figure.Name}: {outcome}");
        }
    }

    [Fact]
    public void Figures_KeysTheyRead_AreKeysOfTheFormat()
    {
        var unknown = new SortedSet<string>(StringComparer.Ordinal);
        foreach (string name in ExampleSpecs.Names)
        {
            var graph = new FigureGraph(ExampleSpecs.Read(name), OurFigures.Catalogue);
            foreach (Figure figure in graph.All())
            {
                unknown.UnionWith(graph.KeysBehind(figure.Name).Where(k => !IsKey(k)));
            }
        }

        Assert.Empty(unknown);
    }

    [Fact]
    public void Figures_NamesInFormulas_AreFiguresOrKeys()
    {
        var unknown = OurFigures.Catalogue.Definitions
            .SelectMany(d => Braced().Matches(d.Formula).Select(m => (d.Name, Input: m.Groups["name"].Value)))
            .Where(p => OurFigures.Catalogue.Find(p.Input) is null && !IsKey(p.Input));

        Assert.Empty(unknown);
    }

    [Fact]
    public void Figures_Names_NeverCollideWithKeys()
    {
        Assert.DoesNotContain(OurFigures.Catalogue.Definitions, d => IsKey(d.Name));
    }

    [Fact]
    public void Figures_EachWithMeaningAndSource()
    {
        foreach (FigureDefinition definition in OurFigures.Catalogue.Definitions)
        {
            Assert.NotEmpty(definition.Meaning);
            Assert.True(definition.Basis.Kind == BasisKind.CommonPractice || definition.Basis.Source.Length > 0, definition.Name);
        }
    }

    [Fact]
    public void With_ChangedWire_LeavesTheFieldUntouched()
    {
        var graph = new FigureGraph(ExampleSpecs.Read("wind-1kw"), OurFigures.Catalogue);
        _ = graph["linkage.turn.fundamental"];
        _ = graph["current.density"];

        FigureGraph changed = graph.With(("winding.wire.size", 1e-3));

        Assert.Same(graph["linkage.turn.fundamental"], changed["linkage.turn.fundamental"]);
        Assert.NotEqual(graph["current.density"].Outcome.Value, changed["current.density"].Outcome.Value);
        Assert.DoesNotContain("winding.wire.size", graph.KeysBehind("linkage.turn.fundamental"));
    }

    [Fact]
    public void With_ChangedGap_KeepsTheTransforms()
    {
        var graph = new FigureGraph(ExampleSpecs.Read("wind-1kw"), OurFigures.Catalogue);
        _ = graph["linkage.turn.fundamental"];

        FigureGraph changed = graph.With(("gap.clearance", 3e-3));

        Assert.True(changed["linkage.turn.fundamental"].Outcome.Value < graph["linkage.turn.fundamental"].Outcome.Value);
        Assert.Equal(graph.PartInputs("transform of the magnet"), changed.PartInputs("transform of the magnet"));
        Assert.NotEmpty(changed.PartInputs("transform of the magnet"));
    }

    [Theory]
    [InlineData("winding.turns", 0.5, "emf.constant.phase", 0.5)]
    [InlineData("winding.turns", 2, "resistance.phase.cold", 2)]
    [InlineData("winding.turns", 2, "inductance.phase", 4)]
    [InlineData("ratings.speed", 2, "emf.line.rms", 2)]
    [InlineData("ratings.speed", 2, "loss.winding-eddy", 4)]
    public void Figure_ScalesAsPhysicsDemands(string key, double factor, string figure, double expected)
    {
        var graph = new FigureGraph(ExampleSpecs.Read("wind-1kw"), OurFigures.Catalogue);

        FigureGraph changed = graph.With((key, graph.Spec.Find(key)!.Number * factor));

        Assert.Equal(expected, changed[figure].Outcome.Value / graph[figure].Outcome.Value, 6);
    }

    [Fact]
    public void Figures_AllLengthsDoubled_ScaleByTheirDimension()
    {
        SpecDocument spec = ExampleSpecs.Read("wind-1kw");
        var graph = new FigureGraph(spec, OurFigures.Catalogue);
        var lengths = spec.Values.Where(v => v.Kind == SpecValueKind.Number && v.Dimension == SpecLint.Spec.Units.Dimensions.Length).ToArray();

        FigureGraph doubled = graph.With([.. lengths.Select(v => (v.Key, 2 * v.Number))]);

        AssertRatio("field.mid-coil.centre", 1);
        AssertRatio("linkage.turn.fundamental", 4);
        AssertRatio("force.attraction", 4);
        AssertRatio("mass.copper", 8);
        AssertRatio("resistance.coil.cold", 0.5);
        AssertRatio("inductance.coil", 2);
        AssertRatio("permeance.coefficient", 1);
        AssertRatio("magnet.surface-field.centre", 1);

        void AssertRatio(string figure, double expected) =>
            Assert.Equal(expected, doubled[figure].Outcome.Value / graph[figure].Outcome.Value, 3);
    }

    [Fact]
    public void Linkage_SaturatedBackIron_CarriesAWiderBand()
    {
        var graph = new FigureGraph(ExampleSpecs.Read("wind-1kw"), OurFigures.Catalogue);
        Outcome sound = graph["linkage.turn.fundamental"].Outcome;

        FigureGraph thin = graph.With(("rotor.back-iron.thickness", 2.5e-3));
        Outcome saturated = thin["linkage.turn.fundamental"].Outcome;

        Assert.True(thin["flux-density.back-iron"].Outcome.Value > 1.6);
        Assert.True(saturated.Uncertainty / saturated.Value > (sound.Uncertainty / sound.Value) + 0.005);
    }

    [Fact]
    public void Figures_SpecWithoutGap_NameTheMissingKey()
    {
        SpecDocument spec = SpecReader.Read("a.yaml", "spec: 1\nmachine: {role: generator, topology: axial-flux, arrangement: twin-rotor, stator: coreless, poles: 12, phases: 3}\nwinding: {coil: {thickness: 10 mm}}\n"u8);

        Outcome outcome = new FigureGraph(spec, OurFigures.Catalogue)["gap.magnetic"].Outcome;

        Assert.Equal(OutcomeKind.Missing, outcome.Kind);
        Assert.Contains("gap.clearance", outcome.MissingKeys);
    }

    private static bool IsKey(string name) =>
        KeyCatalogue.TryFind(ListIndex().Replace(name, "[]"), out _) || KeyCatalogue.TryFind(ListIndex().Replace(name, ""), out _);

    [GeneratedRegex(@"\{(?<name>[a-z0-9.\-]+)\}", RegexOptions.ExplicitCapture, 1000)]
    private static partial Regex Braced();

    [GeneratedRegex(@"\[\d+\]", RegexOptions.None, 1000)]
    private static partial Regex ListIndex();
}
