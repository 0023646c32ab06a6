using SpecLint.Review.Figures;

namespace SpecLint.Review.Catalogue;

/// <summary>Figures of the rating: speeds, power, current, and what they imply for each phase and strand.</summary>
internal static class RatingFigures
{
    /// <summary>Rms line current of a six-pulse bridge over its smooth direct current, √(2/3).</summary>
    private static readonly double LineOverDirect = Math.Sqrt(2.0 / 3.0);

    public static IEnumerable<FigureDefinition> All =>
    [
        Define.Figure("speed.rated", FigureUnit.AngularSpeed, "rated speed", "{ratings.speed}", Sources.Arithmetic, x => x.Value(x.Number("ratings.speed"))) with { LinearUnit = FigureUnit.Velocity },
        Define.Figure("speed.overspeed", FigureUnit.AngularSpeed, "greatest speed the machine must survive", "{ratings.overspeed}, or 1.2 × the greater of {ratings.top-speed} and {ratings.speed}", new Basis(BasisKind.Standard, "IEC 60034-1, overspeed of a.c. machines: 1.2 times the maximum rated speed (from memory)"), Overspeed) with { LinearUnit = FigureUnit.Velocity },
        Define.Figure("frequency", FigureUnit.Hertz, "electrical frequency at rated speed", "{machine.pole-pairs} × {speed.rated} / 2π; linear: {speed.rated} / (2 × {magnet.pole-pitch})", Sources.Arithmetic, x => x.Value(ElectricalSpeed(x) / (2 * Math.PI))),
        Define.Figure("power.rated", FigureUnit.Watt, "rated power: electrical output of a generator, shaft output of a motor", "{ratings.power}", Sources.Arithmetic, x => x.Value(x.Number("ratings.power"))),
        Define.Figure("power.declared-product", FigureUnit.Watt, "electrical power that the stated voltage and current give at unity power factor", "√3 × {ratings.voltage} × {ratings.current} (m phases: m over the line voltage per phase voltage), or their product after a bridge", Sources.Arithmetic, DeclaredProduct),
        Define.Figure("torque.rated", FigureUnit.NewtonMetre, "torque at the rating; linear: force", "{ratings.torque}, or {power.rated} over {speed.rated} (a generator's output over its efficiency)", Sources.Arithmetic, Torque) with { LinearUnit = FigureUnit.Newton },
        Define.Figure("current.phase.rms", FigureUnit.Ampere, "rms current of one phase at the rating", "{ratings.current}, or {ratings.power} over {ratings.voltage}, carried to the phase by {winding.connection} and, after a bridge, by the form factor of smooth direct current", Sources.Bridge, PhaseCurrent),
        Define.Figure("current.direct", FigureUnit.Ampere, "mean direct current after the bridge at the rating", "{ratings.current}, or {ratings.power} over {ratings.voltage}; from the line current by √(2/3)", Sources.Bridge, DirectCurrent),
        Define.Figure("current.strand", FigureUnit.Ampere, "rms current of one strand", "{current.phase.rms} over {winding.parallel-paths} and {winding.strands}", Sources.Arithmetic, x =>
            x.Value(x.Figure("current.phase.rms") / (WindingParts.ParallelPaths(x) * Strands(x)))),
        Define.Figure("current.density", FigureUnit.CurrentDensity, "rms current of a strand over its bare section", "{current.strand} over π/4 × {winding.wire.size}²", Sources.Arithmetic, x =>
            x.Value(x.Figure("current.strand") / x.Figure("wire.section"))),
        Define.Figure("efficiency.rating", FigureUnit.Percent, "efficiency at the rating, from copper, winding eddy and bridge loss alone (bearings and windage not counted yet)", "{power.rated} over {power.rated} + losses", Sources.Arithmetic, Efficiency) with { MethodUncertainty = 0.03 },
    ];

    /// <summary>Wires in hand; one where the spec is silent.</summary>
    /// <param name="x">The evaluation.</param>
    public static double Strands(Evaluation x) => x.Optional("winding.strands") ?? 1;

    /// <summary>Electrical angular speed at rated speed [rad/s].</summary>
    /// <param name="x">The evaluation.</param>
    public static double ElectricalSpeed(Evaluation x) => MachineParts.IsLinear(x)
        ? Math.PI * x.Figure("speed.rated") / x.Figure("magnet.pole-pitch")
        : x.Figure("machine.pole-pairs") * x.Figure("speed.rated");

    /// <summary>True when the rating is stated behind a rectifier.</summary>
    /// <param name="x">The evaluation.</param>
    public static bool IsAfterBridge(Evaluation x) => x.OptionalFlag("ratings.after-bridge") ?? false;

    private static Outcome Overspeed(Evaluation x)
    {
        if (x.Optional("ratings.overspeed") is { } stated)
        {
            return x.Value(stated);
        }

        double speed = x.Figure("speed.rated");
        double top = Math.Max(x.Optional("ratings.top-speed") ?? 0, speed);
        return x.Assume(1.2 * top, "IEC 60034-1, 1.2 times the highest rated speed (from memory)");
    }

    private static Outcome DeclaredProduct(Evaluation x)
    {
        double product = x.Number("ratings.voltage") * x.Number("ratings.current");
        return x.Value(IsAfterBridge(x) ? product : product * PowerPerLineProduct(x));
    }

    private static Outcome Torque(Evaluation x)
    {
        if (x.Optional("ratings.torque") is { } stated)
        {
            return x.Value(stated);
        }

        double torque = x.Figure("power.rated") / x.Figure("speed.rated");
        return x.Text("machine.role") == "motor" ? x.Value(torque) : x.Value(torque / x.Figure("efficiency.rating"));
    }

    /// <summary>Power at unity power factor over line voltage × line current: √m to three phases; beyond, lines of the phases farthest apart.</summary>
    private static double PowerPerLineProduct(Evaluation x)
    {
        double phases = x.Number("machine.phases");
        return phases > 3 ? phases / (2 * Math.Sin(Math.PI * Math.Floor(phases / 2) / phases)) : Math.Sqrt(phases);
    }

    /// <summary>Line current over phase current of a mesh: the difference of two neighbouring phases' currents, √3 for a delta.</summary>
    private static double LineOverMeshCurrent(double phases) => 2 * Math.Sin(Math.PI / phases);

    private static double StatedCurrent(Evaluation x)
    {
        if (x.Optional("ratings.current") is { } current)
        {
            return current;
        }

        if (!x.States("ratings.power") || !x.States("ratings.voltage"))
        {
            x.Miss("ratings.current");
            return double.NaN;
        }

        double power = x.Number("ratings.power");
        bool motor = x.Text("machine.role") == "motor";
        double input = motor ? power / (x.Optional("ratings.efficiency") ?? 1) : power;
        double ratio = input / x.Number("ratings.voltage");
        return IsAfterBridge(x) ? ratio : ratio / PowerPerLineProduct(x);
    }

    private static Outcome PhaseCurrent(Evaluation x)
    {
        double stated = StatedCurrent(x);
        double phases = x.Number("machine.phases");
        string connection = x.OptionalText("winding.connection") ?? "star";
        if (IsAfterBridge(x))
        {
            return connection switch
            {
                // Of single-phase bridges side by side, the phase of the highest EMF carries all of the direct current.
                "separate-bridges" => x.Value(stated / Math.Sqrt(phases)),
                "delta" => x.Value(stated * LineOverDirect / LineOverMeshCurrent(phases)),
                _ => x.Value(stated * LineOverDirect),
            };
        }

        return x.Value(connection == "delta" ? stated / LineOverMeshCurrent(phases) : stated);
    }

    private static Outcome DirectCurrent(Evaluation x)
    {
        if (!IsAfterBridge(x) && x.OptionalText("load.kind") is not ("battery" or "grid-inverter" or "resistor"))
        {
            return x.NotApplicable("there is no bridge in this machine's load");
        }

        double stated = StatedCurrent(x);
        return x.Value(IsAfterBridge(x) ? stated : stated / LineOverDirect);
    }

    private static Outcome Efficiency(Evaluation x)
    {
        double power = x.Figure("power.rated");
        double losses = x.Figure("loss.copper")
            + (x.OptionalFigure("loss.winding-eddy") ?? 0)
            + (x.OptionalFigure("loss.winding-circulation") ?? 0)
            + (x.OptionalFigure("loss.bridge") ?? 0);
        return x.Value(power / (power + losses));
    }
}
