using SpecLint.Physics.Electrical;
using SpecLint.Physics.Geometry;
using SpecLint.Physics.Windings;
using SpecLint.Review.Figures;
using SpecLint.Review.Rules;

namespace SpecLint.Review.Catalogue;

/// <summary>Figures of wire and winding: diameters, fill, resistance, inductance, copper mass.</summary>
internal static class ConductorFigures
{
    /// <summary>Winding tension, leads and crossings move resistance and mass by about this share, common practice.</summary>
    private const double WorkshopSpread = 0.02;

    /// <summary>The wire of one coil with its turns.</summary>
    public static PartDefinition<Shape<WindingWire>> Wire { get; } = new("wire of one coil", ReadWire);

    /// <summary>Self and mutual inductances of the coils, iron planes included.</summary>
    public static PartDefinition<CoilInductances> Inductances { get; } = new("inductances of the coils", ReadInductances);

    /// <summary>Inductance of a phase.</summary>
    public static PartDefinition<Shape<PhaseInductance>> Phase { get; } = new("inductance of a phase", x =>
        x.Part(Inductances) is { } coils && x.Part(WindingParts.Paths) is { } paths ? new(SynchronousInductance.Of(coils, paths)) : null);

    public static IEnumerable<FigureDefinition> All =>
    [
        Define.Figure("wire.overall-diameter", FigureUnit.Metre, "greatest diameter of the wire over its enamel", "{winding.wire.size} and the build of the next larger preferred size in grade {winding.wire.enamel}", new Basis(BasisKind.Standard, "IEC 60317-0-1, R20 preferred sizes and the rule for intermediate sizes"), Overall),
        Define.Figure("wire.stocked", FigureUnit.Ratio, "1 where the wire is a preferred or intermediate metric size or a whole gauge number, else 0", "{winding.wire.size} against tables wire-metric and the gauge law", new Basis(BasisKind.Standard, "IEC 60317-0-1 (metric sizes) and ASTM B258 (gauge numbers)"), Stocked),
        Define.Figure("wire.section", FigureUnit.Area, "bare section of one strand", "π/4 × {winding.wire.size}²", Sources.Geometry, x => x.Value(WireGauge.Section(x.Number("winding.wire.size")))),
        Define.Figure("fill.conductors", FigureUnit.Ratio, "wires in one leg", "{winding.turns} × {winding.strands}", Sources.Arithmetic, x => x.Value(x.Number("winding.turns") * RatingFigures.Strands(x))),
        Define.Figure("fill.copper", FigureUnit.Ratio, "bare copper area over the coil's cross-section", "{fill.conductors} × {wire.section} / {coil.section}", Sources.Geometry, x =>
            x.Value(x.Figure("fill.conductors") * x.Figure("wire.section") / x.Figure("coil.section"))),
        Define.Figure("fill.conductors-that-fit", FigureUnit.Ratio, "enamelled wires that lie in the leg in whole layers, nested or square, whichever holds more", "whole layers of {wire.overall-diameter} in {winding.coil.leg-width} × {winding.coil.thickness}", Sources.Geometry, ThatFit),
        Define.Figure("resistance.coil.cold", FigureUnit.Ohm, "resistance of one coil at 20 °C", "ρ20 × {winding.turns} × {coil.turn-length.mean} / ({winding.strands} × {wire.section})", Sources.Ohm, x =>
            x.Part(Wire) is { } wire ? x.Value(WindingResistance.OfCoil(wire.Outline, ConductorMaterial.ReferenceTemperature)) : x.Stop()) with { MethodUncertainty = WorkshopSpread },
        Define.Figure("resistance.phase.cold", FigureUnit.Ohm, "resistance of one phase at 20 °C, leads not counted", "{resistance.coil.cold} × coils in series / parallel paths", Sources.Ohm, x =>
            x.Value(x.Figure("resistance.coil.cold") * x.Figure("winding.series-coils.each") / WindingParts.ParallelPaths(x))),
        Define.Figure("resistance.phase.hot", FigureUnit.Ohm, "resistance of one phase at the computed mean winding temperature", "{resistance.phase.cold} × (1 + α × ({temperature.winding.mean} − 20 °C))", Sources.Ohm, HotResistance),
        Define.Figure("mass.copper", FigureUnit.Kilogram, "mass of the bare conductor of all coils", "density × {winding.coils} × {fill.conductors} × {wire.section} × {coil.turn-length.mean}", Sources.Geometry, x =>
        {
            double coils = x.Number("winding.coils");
            return x.Part(Wire) is { } wire ? x.Value(coils * WindingResistance.CoilMass(wire.Outline)) : x.Stop();
        }) with { MethodUncertainty = WorkshopSpread },
        Define.Figure("inductance.coil", FigureUnit.Henry, "self inductance of one coil between the iron planes", "∫ |W(k)|² × response of the coil layer dk, times {winding.turns}²", Sources.Inductance, x =>
            x.Part(Inductances) is { } coils ? x.Value(coils.Self) : x.Stop()) with { MethodUncertainty = 0.05 },
        Define.Figure("inductance.mutual", FigureUnit.Henry, "mutual inductance of two neighbouring coils wound in the same sense, between the iron planes; negative side by side", "∫ W(k)·W(k)·cos(k·distance) × response of the coil layer dk, times {winding.turns}²", Sources.Inductance, x =>
            x.Part(Inductances) is not { } coils ? x.Stop()
            : coils.Coils < 2 ? x.NotApplicable("a single coil has no neighbour")
            : x.Value(coils.Between(0, 1))) with { MethodUncertainty = 0.1 },
        Define.Figure("inductance.phase", FigureUnit.Henry, "synchronous inductance of one phase, self minus mutual", "self and mutual inductances of the phase's coils with the senses and paths of the connection", Sources.Inductance, x =>
            x.Part(Phase) is { } phase ? x.Value(phase.Outline.Synchronous) : x.Stop()) with { MethodUncertainty = 0.05 },
    ];

    private static WireSpace? Space(Evaluation x)
    {
        double bare = x.Number("winding.wire.size");
        double overall = x.Figure("wire.overall-diameter");
        return x.Part(MachineParts.Coil) is not { } coil || x.Incomplete ? null : new WireSpace
        {
            Width = coil.Outline.LegWidth,
            Thickness = coil.Outline.Thickness,
            BareDiameter = bare,
            OverallDiameter = overall,
        };
    }

    private static Outcome ThatFit(Evaluation x) =>
        Space(x) is { } space ? x.Value(Math.Max(WireLay.SquareCapacity(space), WireLay.NestedCapacity(space))) : x.Stop();

    private static Outcome Overall(Evaluation x)
    {
        double bare = x.Number("winding.wire.size");
        string grade = x.OptionalText("winding.wire.enamel") ?? "";
        if (x.Incomplete)
        {
            return x.Stop();
        }

        bool assumed = grade.Length == 0;
        string column = $"overall-{(assumed ? "grade-2" : grade)}";
        ReferenceRow? row = EmbeddedRulebooks.Tables.Find("wire-metric")?.FindRow(r => r.Number("diameter") >= bare * (1 - 1e-9));
        if (row?.Number("diameter") is not { } preferred || row.Number(column) is not { } greatest)
        {
            return x.OutOfDomain("the wire lies outside the table of enamelled sizes");
        }

        double overall = bare + greatest - preferred;
        return assumed ? x.Assume(overall, "enamel grade 2, common practice") : x.Value(overall);
    }

    private static Outcome Stocked(Evaluation x)
    {
        double bare = x.Number("winding.wire.size");
        if (x.Incomplete)
        {
            return x.Stop();
        }

        double gauge = 36 - (39 * Math.Log(bare / 0.127e-3) / Math.Log(92));
        bool wholeGauge = Math.Abs(gauge - Math.Round(gauge)) < 0.02 && gauge is > -4 and < 45;
        bool preferred = EmbeddedRulebooks.Tables.Find("wire-metric")?.FindRow(r => Math.Abs((r.Number("diameter") ?? 0) - bare) < 1e-3 * bare) is not null;
        return x.Value(wholeGauge || preferred || IsIntermediate(bare) ? 1 : 0);
    }

    /// <summary>R40 sizes between the preferred ones: powers of 10^(1/40) rounded to two and a half digits as sold.</summary>
    private static bool IsIntermediate(double bare)
    {
        double step = 40 * Math.Log10(bare / 1e-3);
        return Math.Abs(step - Math.Round(step)) < 0.2;
    }

    private static Shape<WindingWire>? ReadWire(Evaluation x)
    {
        double turns = x.Number("winding.turns");
        double diameter = x.Number("winding.wire.size");
        double length = x.Figure("coil.turn-length.mean");
        ConductorMaterial material = x.OptionalText("winding.wire.material") == "aluminium" ? ConductorMaterial.Aluminium : ConductorMaterial.Copper;
        return x.Incomplete ? null : new(new WindingWire
        {
            Material = material,
            StrandDiameter = diameter,
            Strands = (int)RatingFigures.Strands(x),
            MeanTurnLength = length,
            Turns = turns,
        });
    }

    private static CoilInductances? ReadInductances(Evaluation x)
    {
        double turns = x.Number("winding.turns");
        int coils = x.Count("winding.coils");
        double near = x.Number("gap.clearance") + (x.Optional("gap.cover") ?? 0);
        double far = (x.Optional("gap.far-clearance") ?? x.Number("gap.clearance")) + (x.Optional("gap.cover") ?? 0);
        double magnet = x.Number("magnets.thickness");
        Facing facing = MachineParts.FacingOf(x);
        Shape<Physics.Magnetics.MagneticLayers>? layers = x.Part(FieldParts.Layers);
        bool linear = MachineParts.IsLinear(x);
        double pitch = linear ? x.Figure("magnet.pole-pitch") * x.Number("machine.poles") / coils : 0;
        if (x.Part(MachineParts.Coil) is not { } coil || layers is null || x.Incomplete || coils < 1)
        {
            return null;
        }

        // Magnets count as air: the planes lie behind them.
        double below = layers.Outline.Behind.IsAbsent ? double.PositiveInfinity : near + magnet;
        double above = facing switch
        {
            Facing.Magnets => near + magnet,
            Facing.Plate when !layers.Outline.OppositePlate.IsAbsent => far,
            _ => double.PositiveInfinity,
        };
        var planes = new IronPlanes(below, above);
        return linear
            ? CoilMutualInductance.Row(coil.Outline, turns, planes, new CoilRow(coils, pitch))
            : CoilMutualInductance.Ring(coil.Outline, turns, planes, coils);
    }

    private static Outcome HotResistance(Evaluation x)
    {
        double cold = x.Figure("resistance.phase.cold");
        double mean = x.Figure("temperature.winding.mean");
        if (x.Part(Wire) is not { } wire)
        {
            return x.Stop();
        }

        ConductorMaterial material = wire.Outline.Material;
        double hot = cold * material.ResistivityAt(mean) / material.Resistivity;
        double slope = cold * material.TemperatureCoefficient * x.Look("temperature.winding.mean").Uncertainty;
        return x.Value(hot, double.Hypot(slope, WorkshopSpread * hot));
    }
}
