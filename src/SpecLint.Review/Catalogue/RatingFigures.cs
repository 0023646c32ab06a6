using SpecLint.Review.Figures;

namespace SpecLint.Review.Catalogue;

/// <summary>Figures of the rating: speeds, power, current, and what they imply for each phase and strand.</summary>
internal static class RatingFigures
{
    private const string TwoOrMany = "the relations between line, phase and direct values used here are not those of this number of phases";

    public static IEnumerable<FigureDefinition> All =>
    [
        Define.Figure("speed.rated", FigureUnit.AngularSpeed, "rated speed", "{ratings.speed}", Sources.Arithmetic, x => x.Value(x.Number("ratings.speed"))) with { LinearUnit = FigureUnit.Velocity },
        Define.Figure("speed.overspeed", FigureUnit.AngularSpeed, "greatest speed the machine must survive", "{ratings.overspeed}, or 1.2 × the greater of {ratings.top-speed} and {ratings.speed}", new Basis(BasisKind.Standard, "IEC 60034-1, overspeed of a.c. machines: 1.2 times the maximum rated speed (from memory)"), Overspeed) with { LinearUnit = FigureUnit.Velocity },
        Define.Figure("frequency", FigureUnit.Hertz, "electrical frequency at rated speed", "{machine.pole-pairs} × {speed.rated} / 2π; linear: {speed.rated} / (2 × {magnet.pole-pitch})", Sources.Arithmetic, x => x.Value(ElectricalSpeed(x) / (2 * Math.PI))),
        Define.Figure("power.rated", FigureUnit.Watt, "rated power: electrical output of a generator, shaft output of a motor", "{ratings.power}", Sources.Arithmetic, x => x.Value(x.Number("ratings.power"))),
        Define.Figure("power.declared-product", FigureUnit.Watt, "electrical power that the stated voltage and current give at unity power factor", "√3 × {ratings.voltage} × {ratings.current}; their product after a bridge or with a single phase; {machine.phases} times it where each phase has terminals of its own", Sources.Arithmetic, DeclaredProduct),
        Define.Figure("torque.rated", FigureUnit.NewtonMetre, "torque at the rating; linear: force", "{ratings.torque}, or {power.rated} over {speed.rated} (a generator's output over its efficiency)", Sources.Arithmetic, Torque) with { LinearUnit = FigureUnit.Newton },
        Define.Figure("current.phase.rms", FigureUnit.Ampere, "rms current of one phase at the rating", "{ratings.current}, or {ratings.power} over {ratings.voltage}, carried to the phase by {winding.connection} and, after a bridge, by the share of the period for which a phase carries the smooth direct current: √(2/{machine.phases}) of it in star", Sources.Bridge, PhaseCurrent),
        Define.Figure("current.direct", FigureUnit.Ampere, "mean direct current after the bridge at the rating", "{ratings.current}, or {ratings.power} over {ratings.voltage}; from the line current over √(2/{machine.phases})", Sources.Bridge, DirectCurrent),
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
        double phases = x.Number("machine.phases");
        return PowerOverProduct(x, phases) is { } factor ? x.Value(product * factor) : x.OutOfDomain(TwoOrMany);
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
        if (PowerOverProduct(x, x.Number("machine.phases")) is { } factor)
        {
            return input / (x.Number("ratings.voltage") * factor);
        }

        x.Miss("ratings.current");
        return double.NaN;
    }

    /// <summary>
    /// Power over stated voltage × current at unity power factor. Beyond three phases in star the voltage is that between the lines of
    /// the phases farthest apart; null where the phases leave open between which lines the voltage stands.
    /// </summary>
    private static double? PowerOverProduct(Evaluation x, double phases) =>
        IsAfterBridge(x) || phases == 1 ? 1
        : x.OptionalText("winding.connection") == "separate-bridges" ? phases
        : phases == 3 ? Math.Sqrt(3)
        : phases > 3 && x.OptionalText("winding.connection") != "delta" ? phases / (2 * Math.Sin(Math.PI * Math.Floor(phases / 2) / phases))
        : null;

    /// <summary>
    /// Rms line current over the smooth direct current of a bridge with two diodes a line: each line carries it for one part in as many
    /// as there are phases, once in either direction; a single phase carries it always. Null for two phases.
    /// </summary>
    private static double? LineOverDirect(double phases) => phases == 1 ? 1 : phases >= 3 ? Math.Sqrt(2 / phases) : null;

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
                "delta" when phases > 1 => phases == 3 ? x.Value(stated * Math.Sqrt(2) / 3) : x.OutOfDomain(TwoOrMany),
                _ => LineOverDirect(phases) is { } share ? x.Value(stated * share) : x.OutOfDomain(TwoOrMany),
            };
        }

        return connection != "delta" || phases == 1 ? x.Value(stated)
            : phases >= 3 ? x.Value(stated / LineOverMeshCurrent(phases))
            : x.OutOfDomain(TwoOrMany);
    }

    private static Outcome DirectCurrent(Evaluation x)
    {
        if (!LoadFigures.HasBridge(x))
        {
            return x.NotApplicable("there is no bridge in this machine's load");
        }

        double stated = StatedCurrent(x);
        double phases = x.Number("machine.phases");
        return IsAfterBridge(x) ? x.Value(stated)
            : x.OptionalText("winding.connection") == "separate-bridges" ? x.Value(stated * Math.Sqrt(phases))
            : LineOverDirect(phases) is { } share ? x.Value(stated / share)
            : x.OutOfDomain(TwoOrMany);
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
