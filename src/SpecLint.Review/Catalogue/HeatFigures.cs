using SpecLint.Physics.Electrical;
using SpecLint.Physics.Geometry;
using SpecLint.Physics.Thermal;
using SpecLint.Physics.Windings;
using SpecLint.Review.Figures;

namespace SpecLint.Review.Catalogue;

/// <summary>Losses in the winding and its steady temperature.</summary>
internal static class HeatFigures
{
    private const double EddyMethod = 0.4;

    /// <summary>Steady temperatures at the rating.</summary>
    public static PartDefinition<Shape<WindingTemperatures>> Steady { get; } = new("steady temperature of the winding", ReadSteady);

    public static IEnumerable<FigureDefinition> All =>
    [
        Define.Figure("loss.copper.cold", FigureUnit.Watt, "resistive loss of all phases at the rating, winding at 20 °C", "{machine.phases} × {current.phase.rms}² × {resistance.phase.cold}", Sources.Arithmetic, x =>
        {
            double current = x.Figure("current.phase.rms");
            return x.Value(x.Number("machine.phases") * current * current * x.Figure("resistance.phase.cold"));
        }),
        Define.Figure("loss.copper", FigureUnit.Watt, "resistive loss of all phases at the rating, winding at its mean temperature", "{machine.phases} × {current.phase.rms}² × {resistance.phase.hot}", Sources.Arithmetic, x =>
        {
            double current = x.Figure("current.phase.rms");
            return x.Value(x.Number("machine.phases") * current * current * x.Figure("resistance.phase.hot"));
        }),
        Define.Figure("loss.winding-eddy", FigureUnit.Watt, "eddy-current loss in the strands of all legs at rated speed, wire at 20 °C", "copper volume × ω² × Σ(n·B_n)² × {winding.wire.size}² / (32 ρ), with {field.legs.weighted} in the legs and {field.bars.weighted} in the end bars", Sources.StrandEddy, Eddy) with { MethodUncertainty = EddyMethod },
        Define.Figure("loss.winding-circulation", FigureUnit.Watt, "loss of currents that circulate between untransposed strands in hand at rated speed, upper estimate", "strand EMF differences across the bundle over the strands' resistance", new Basis(BasisKind.Derived, "EMF difference of strands laid side by side; effect described by Wang and Kamper, IEEE Trans. Energy Convers. 19 (2004)"), Circulation) with { MethodUncertainty = 0.5, IsCoarse = true },
        Define.Figure("winding.delta-circulation", FigureUnit.Percent, "loss of the current that the third and its multiples drive round a delta, over the copper loss of the load", "(third-harmonic EMF / |R + j3ωL0|)² over {current.phase.rms}²", new Basis(BasisKind.Published, "third harmonics in delta: Fitzgerald, Kingsley, Umans, Electric Machinery, 6th ed. 2003, appendix on three-phase circuits"), DeltaLoss) with { MethodUncertainty = 0.1 },
        Define.Figure("loss.winding-ac.share", FigureUnit.Percent, "eddy and circulating loss over rated power", "({loss.winding-eddy} + {loss.winding-circulation}) / {power.rated}", Sources.Arithmetic, x =>
            x.Value((x.Figure("loss.winding-eddy") + (x.OptionalFigure("loss.winding-circulation") ?? 0)) / x.Figure("power.rated"))),
        Define.Figure("wire.strand.halving", FigureUnit.Metre, "strand diameter that would halve the eddy loss at the same copper section", "{winding.wire.size} / √2", Sources.StrandEddy, x =>
            x.Value(StrandEddyLoss.HalvingDiameter(x.Number("winding.wire.size")))),
        Define.Figure("cooling.coefficient", HeatTransferUnit, "heat-transfer coefficient from the winding's faces to the air", "rotor facing a stator by {gap.clearance} / radius and speed; still air for a linear machine or at rest", Sources.Heat, Coefficient) with { MethodUncertainty = 0.3 },
        Define.Figure("temperature.winding.mean", FigureUnit.Kelvin, "steady mean winding temperature at the rating", "one node cooled through both faces: ({loss.copper.cold} at temperature + {loss.winding-eddy}) × thermal resistance + {ambient.temperature}", Sources.Heat, x => Temperature(x, t => t.Mean)) with { IsCoarse = true },
        Define.Figure("temperature.winding.hot-spot", FigureUnit.Kelvin, "steady temperature in the middle of the winding at the rating", "as {temperature.winding.mean}, at the middle of the thickness", Sources.Heat, x => Temperature(x, t => t.HotSpot)) with { IsCoarse = true },
        Define.Figure("temperature.magnet", FigureUnit.Kelvin, "magnet temperature at the rating, first estimate: between the air and the winding's surface", "{ambient.temperature} + half of the winding's surface rise; the band reaches from the one to the other", Sources.Heat, Magnet) with { IsCoarse = true },
        Define.Figure("current.short-circuit", FigureUnit.Ampere, "steady rms phase current with the terminals shorted at rated speed, winding at 20 °C", "{emf.phase.rms} / |{resistance.phase.cold} + jω·{inductance.phase}|", Sources.Arithmetic, ShortCircuit),
        Define.Figure("time.short-circuit.class", FigureUnit.Second, "time to the class temperature at the steady short-circuit current, no heat given away", "density × c / (ρ·α·J²) × ln(ρ at {temperature.class} / ρ at {ambient.temperature})", new Basis(BasisKind.Standard, "IEC 60949, adiabatic heating (equation from memory)"), ShortCircuitTime) with { MethodUncertainty = 0.1 },
    ];

    private static FigureUnit HeatTransferUnit { get; } = new("W/(m²·K)", "W/(m²·K)", new(0, 1, -3, 0, -1));

    private static Outcome Eddy(Evaluation x)
    {
        double legs = x.Figure("field.legs.weighted");
        double bars = x.Figure("field.bars.weighted");
        double speed = RatingFigures.ElectricalSpeed(x);
        double diameter = x.Number("winding.wire.size");
        double wires = x.Number("winding.coils") * x.Figure("fill.conductors") * x.Figure("wire.section");
        if (x.Part(ConductorFigures.Wire) is not { } wire || x.Part(MachineParts.Coil) is not { } coil || x.Incomplete)
        {
            return x.Stop();
        }

        double length = wire.Outline.MeanTurnLength;
        double legLength = Math.Min(2 * coil.Outline.HoleLength, length);
        double square = (legLength * legs * legs) + ((length - legLength) * bars * bars);
        return x.Value(wires * StrandEddyLoss.PerVolume(speed, square, diameter, wire.Outline.Material.Resistivity));
    }

    private static Outcome Circulation(Evaluation x)
    {
        int strands = (int)RatingFigures.Strands(x);
        if (strands < 2)
        {
            return x.NotApplicable("a single strand has no neighbour to exchange current with");
        }

        if (x.OptionalFlag("winding.transposed") ?? false)
        {
            return x.NotApplicable("the strands are transposed");
        }

        double field = x.Figure("field.mid-coil.fundamental");
        double span = Math.PI * x.Figure("coil.leg.span") / x.Figure("magnet.pole-pitch");
        var bundle = new StrandBundle
        {
            Strands = strands,
            StrandPitch = x.Figure("wire.overall-diameter"),
            StrandResistance = x.Figure("resistance.coil.cold") * strands,
            Turns = x.Number("winding.turns"),
            LegLength = x.Figure("coil.hole.length"),
        };
        double coils = x.Number("winding.coils");
        double speed = RatingFigures.ElectricalSpeed(x);
        return x.Incomplete ? x.Stop() : x.Value(coils * StrandCirculation.LossOfCoil(bundle, speed, field, span));
    }

    private static Outcome DeltaLoss(Evaluation x)
    {
        if ((x.OptionalText("winding.connection") ?? "star") != "delta")
        {
            return x.NotApplicable("the phases are not in delta");
        }

        int phases = x.Count("machine.phases");
        double current = x.Figure("current.phase.rms");
        double speed = x.Figure("speed.rated");
        double resistance = x.Figure("resistance.phase.cold");
        double electrical = RatingFigures.ElectricalSpeed(x);
        if (x.Part(EmfFigures.PhaseWave) is not { } wave || x.Part(ConductorFigures.Phase) is not { } inductance || x.Incomplete)
        {
            return x.Stop();
        }

        var circuit = new DeltaCircuit
        {
            PhaseResistance = resistance,
            ZeroSequenceInductance = Math.Max(0, inductance.Outline.ZeroSequence),
            ElectricalSpeed = electrical,
            Phases = Math.Max(3, phases),
        };
        return x.Value(DeltaCirculation.LossRatio(DeltaCirculation.RmsCurrent(wave.Scaled(speed), circuit), current));
    }

    private static Outcome Coefficient(Evaluation x)
    {
        if (MachineParts.IsLinear(x))
        {
            return x.Value(StillAir.OpenFace().Coefficient);
        }

        double speed = x.Figure("speed.rated");
        double radius = x.Figure("machine.outer-diameter") / 2;
        double gap = x.Number("gap.clearance");
        return x.Incomplete ? x.Stop()
            : speed > 0 ? x.Value(DiscConvection.FacingStator(speed, radius, gap, FluidProperties.Air).Coefficient)
            : x.Value(StillAir.OpenFace().Coefficient);
    }

    private static Shape<WindingTemperatures>? ReadSteady(Evaluation x)
    {
        double copper = x.Figure("loss.copper.cold");
        double eddy = (x.OptionalFigure("loss.winding-eddy") ?? 0) + (x.OptionalFigure("loss.winding-circulation") ?? 0);
        double coils = x.Number("winding.coils");
        double coefficient = x.Figure("cooling.coefficient");
        double ambient = x.Figure("ambient.temperature");
        double fill = x.Figure("fill.copper");
        double cover = x.Optional("gap.cover") ?? 0;
        double resin = x.Optional("winding.encapsulation.conductivity") ?? WindingConductivity.UnfilledResin;
        if (x.Part(MachineParts.Coil) is not { } coil || x.Part(ConductorFigures.Wire) is not { } wire || x.Incomplete || !(fill is > 0 and < 1))
        {
            return null;
        }

        var heat = new WindingHeat
        {
            CopperLossCold = copper,
            EddyLossCold = eddy,
            TemperatureCoefficient = wire.Outline.Material.TemperatureCoefficient,
            FaceArea = coils * coil.Outline.LegWidth * CoilGeometry.MeanTurnLength(coil.Outline),
            Thickness = coil.Outline.Thickness,
            WindingConductivity = WindingConductivity.Across(fill, wire.Outline.Material.ThermalConductivity, resin),
            CoverThickness = cover,
            CoverConductivity = resin,
            SurfaceCoefficient = coefficient,
            Ambient = ambient,
        };
        return WindingTemperature.TrySteady(heat, out WindingTemperatures temperatures) ? new(temperatures) : null;
    }

    private static Outcome Temperature(Evaluation x, Func<WindingTemperatures, double> reduce)
    {
        double ambient = x.Figure("ambient.temperature");
        if (x.Part(Steady) is not { } steady)
        {
            return x.Stop();
        }

        double temperature = reduce(steady.Outline);
        return x.Value(temperature, WindingTemperature.RiseUncertainty * (temperature - ambient));
    }

    private static Outcome Magnet(Evaluation x)
    {
        double ambient = x.Figure("ambient.temperature");
        if (x.Part(Steady) is not { } steady)
        {
            return x.Stop();
        }

        double half = 0.5 * (steady.Outline.Surface - ambient);
        return x.Value(ambient + half, half);
    }

    private static Outcome ShortCircuit(Evaluation x)
    {
        double reactance = RatingFigures.ElectricalSpeed(x) * x.Figure("inductance.phase");
        return x.Value(x.Figure("emf.phase.rms") / double.Hypot(x.Figure("resistance.phase.cold"), reactance));
    }

    private static Outcome ShortCircuitTime(Evaluation x)
    {
        double current = x.Figure("current.short-circuit");
        double from = x.Figure("ambient.temperature");
        double to = x.Figure("temperature.class");
        double paths = WindingParts.ParallelPaths(x);
        if (x.Part(ConductorFigures.Wire) is not { } wire || x.Incomplete)
        {
            return x.Stop();
        }

        double density = current / (paths * wire.Outline.TurnSection);
        return to <= from ? x.OutOfDomain("the ambient is at or above the class temperature")
            : x.Value(WindingTemperature.AdiabaticTime(wire.Outline.Material, density, from, to));
    }
}
