using System.Text;
using CsCheck;
using SpecLint.Review.Catalogue;
using SpecLint.Review.Figures;
using SpecLint.Review.Reviewing;
using SpecLint.Spec.Documents;
using SpecLint.Spec.Units;

namespace SpecLint.Tests.Review.Catalogue;

/// <summary>Laws that any sane machine obeys, and that no edit of a spec may break the program.</summary>
public sealed class RandomMachineTests
{
    private static readonly string[] Arrangements = ["twin-rotor", "rotor-and-return-plate", "single-rotor"];

    private static readonly string[] Texts =
    [
        "", "0", "-1", "1", "3", "1e300", "1e-300", "NaN", ".inf", "none", "ideal", "true", "~", "[]", "{}", "[1, 2]", "{a: b}", "\"", "'", "&a", "*a", "!!x", "|", "# gone",
        "0 mm", "0.5 mm", "-5 mm", "2 m", "1 km", "1e9 mm", "300 mm", "12 V", "0 V", "1e6 V", "0 A", "1 rpm", "0 rpm", "1e7 rpm", "-40 °C", "600 °C", "-300 °C", "0.05 T", "2 T", "9 T",
        "1 ± 2", "5 mm ± 9 mm", "5 mm ± 10 %", "AWG 50", "AWG 4/0", "SWG 3", "N52", "C5", "disc", "sector", "round", "linear", "delta", "battery", "drive", "2000", "1000000", "ü", "٣ mm", "5\tmm", "5,5 mm",
    ];

    private static readonly Gen<Sample> Sane = Gen.Select(
        Gen.Int[3, 10], Gen.Double[60e-3, 300e-3], Gen.Double[0.15, 0.5], Gen.Double[0.5, 0.95], Gen.Double[3e-3, 20e-3], Gen.Double[4e-3, 25e-3], Gen.Double[0.5e-3, 4e-3], Gen.Int[0, 2],
        (pairs, radius, length, width, magnet, coil, clearance, arrangement) => new Sample(pairs, radius, length, width, magnet, coil, clearance, Arrangements[arrangement]));

    [Fact]
    public void Linkage_WiderGap_IsLess() => Sane.Sample(
        s =>
        {
            FigureGraph figures = Machines.Figures(s.Spec());
            return figures.With(("gap.clearance", 1.3 * s.Clearance)).Value("linkage.turn.fundamental") < figures.Value("linkage.turn.fundamental");
        },
        iter: 60);

    [Fact]
    public void Linkage_ThickerMagnet_IsMore() => Sane.Sample(
        s =>
        {
            FigureGraph figures = Machines.Figures(s.Spec());
            return figures.With(("magnets.thickness", 1.2 * s.Magnet)).Value("linkage.turn.fundamental") > figures.Value("linkage.turn.fundamental");
        },
        iter: 60);

    [Fact]
    public void Figures_AllLengthsScaled_ScaleByTheirDimension() => Gen.Select(Sane, Gen.Double[0.6, 1.6]).Sample(
        (s, scale) =>
        {
            FigureGraph figures = Machines.Figures(s.Spec());
            FigureGraph scaled = Scaled(figures, scale);
            (string Name, double Power)[] laws =
            [
                ("linkage.turn.fundamental", 2), ("field.mid-coil.centre", 0), ("flux.pole", 2), ("permeance.coefficient", 0), ("mass.magnets", 3), ("mass.copper", 3), ("resistance.coil.cold", -1), ("magnet.surface-field.centre", 0),
            ];
            foreach ((string name, double power) in laws)
            {
                // The width of the wave-number panels moves in steps of 8 %, so a scaled machine is integrated on another grid. Only the
                // slowly converging demagnetising factor feels it; it is held to the accuracy of its own reference test.
                Machines.Near(Math.Pow(scale, power) * figures.Value(name), scaled.Value(name), name == "permeance.coefficient" ? 2e-3 : 1e-4);
            }
        },
        iter: 30);

    [Fact]
    public void Figures_SaneMachine_AreFiniteWithABand() => Sane.Sample(
        s =>
        {
            FigureGraph figures = Machines.Figures(s.Spec());
            AssertSound(figures);
            foreach (string name in (string[])["linkage.turn.fundamental", "field.mid-coil.centre", "flux.pole", "permeance.coefficient", "mass.copper", "resistance.phase.cold", "inductance.coil"])
            {
                Assert.True(figures.Value(name) > 0, name);
            }
        },
        iter: 30);

    [Fact]
    public void Example_AnyValueReplacedByAnyText_GivesFaultsOrFiguresAndNeverFails()
    {
        string[] names = [.. ExampleSpecs.Names];
        Dictionary<string, (string[] Lines, SpecDocument Spec)> examples = names.ToDictionary(
            n => n,
            n => (File.ReadAllText(Path.Combine(ExampleSpecs.Folder, $"{n}.yaml")).Split('\n'), ExampleSpecs.Read(n)),
            StringComparer.Ordinal);
        Gen.Select(Gen.Int[0, names.Length - 1], Gen.Int[0, 100_000], Gen.Int[0, Texts.Length - 1]).Sample(
            (which, place, replacement) =>
            {
                string name = names[which];
                string text = Texts[replacement];
                (string[] lines, SpecDocument spec) = examples[name];
                SpecValue[] onOneLine = [.. spec.Values.Where(v => v.ValueRegion.StartLine == v.ValueRegion.EndLine)];
                SpecValue value = onOneLine[place % onOneLine.Length];
                string[] edited = [.. lines];
                ref string line = ref edited[value.ValueRegion.StartLine - 1];
                line = line[..(value.ValueRegion.StartColumn - 1)] + text + line[(value.ValueRegion.EndColumn - 1)..];

                SpecDocument read = SpecReader.Read("edited.yaml", Encoding.UTF8.GetBytes(string.Join('\n', edited)));
                var figures = new FigureGraph(read, OurFigures.Catalogue);
                AssertSound(figures);
                _ = Reviewer.Review(read, OurFigures.Catalogue, OurRulebooks.All, ReviewOptions.Default);
                Assert.True(!read.Faults.IsEmpty || figures.All().Any(f => f.Outcome.HasValue), $"{value.Key}: {text}");
            },
            iter: 150);
    }

    private static FigureGraph Scaled(FigureGraph figures, double scale) =>
        figures.With([.. figures.Spec.Values.Where(v => v.Kind == SpecValueKind.Number && v.Dimension == Dimensions.Length).Select(v => (v.Key, scale * v.Number))]);

    private static void AssertSound(FigureGraph figures)
    {
        foreach (Figure figure in figures.All())
        {
            Outcome outcome = figure.Outcome;
            Assert.True(
                !outcome.HasValue || (double.IsFinite(outcome.Value) && double.IsFinite(outcome.Uncertainty) && outcome.Uncertainty >= 0),
                $"{figure.Name}: {outcome}");
        }
    }

    private sealed record Sample(int Pairs, double Radius, double LengthShare, double WidthShare, double Magnet, double Coil, double Clearance, string Arrangement)
    {
        public string Spec()
        {
            double length = LengthShare * Radius;
            double width = WidthShare * 2 * (Radius - (0.5 * length)) * Math.Tan(0.5 * Math.PI / Pairs);
            double pitch = Math.PI * Radius / Pairs;
            return Machines.Text($$"""
                spec: 1
                title: any machine
                machine: {role: generator, topology: axial-flux, arrangement: {{Arrangement}}, stator: coreless, poles: {{2 * Pairs}}, phases: 3}
                magnets: {shape: block, length: {{Machines.Millimetres(length)}}, width: {{Machines.Millimetres(width)}}, thickness: {{Machines.Millimetres(Magnet)}}, pitch-radius: {{Machines.Millimetres(Radius)}}, grade: N42SH}
                rotor:
                  back-iron: {material: ideal}
                {{(Arrangement == "rotor-and-return-plate" ? "  return-plate: {material: ideal}" : "")}}
                winding:
                  coils: {{3 * Pairs}}
                  turns: 20
                  wire: {size: 0.8 mm}
                  connection: star
                  coil: {shape: rectangle, hole-length: {{Machines.Millimetres(length)}}, hole-width: {{Machines.Millimetres(0.4 * pitch)}}, leg-width: {{Machines.Millimetres(0.25 * pitch)}}, thickness: {{Machines.Millimetres(Coil)}} }
                gap: {clearance: {{Machines.Millimetres(Clearance)}}, cover: 0.5 mm}
                ratings: {speed: 300 rpm, power: 100 W, voltage: 30 V}

                """);
        }
    }
}
