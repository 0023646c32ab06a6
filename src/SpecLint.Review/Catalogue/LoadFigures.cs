using SpecLint.Review.Figures;

namespace SpecLint.Review.Catalogue;

/// <summary>Figures at the border between machine and load: rectified voltage, overspeed voltage, charging speed.</summary>
internal static class LoadFigures
{
    /// <summary>Six-pulse mean over the rms line voltage, 3√2/π.</summary>
    private static readonly double SixPulseMean = 3 * Math.Sqrt(2) / Math.PI;

    private static readonly string[] LimitKeys =
    [
        "load.bridge.reverse-voltage", "load.controller.voltage-limit", "load.capacitor.voltage-limit", "load.link.voltage-limit",
    ];

    public static IEnumerable<FigureDefinition> All =>
    [
        Define.Figure("bridge.diode-drop", FigureUnit.Volt, "forward drop of one diode of the bridge", "{load.bridge.diode-drop}", Sources.PracticeTable, DiodeDrop),
        Define.Figure("loss.bridge", FigureUnit.Watt, "loss in the bridge at the rating: two diodes carry the direct current", "2 × {bridge.diode-drop} × {current.direct}", Sources.Bridge, x =>
            x.Value(2 * x.Figure("bridge.diode-drop") * x.Figure("current.direct"))),
        Define.Figure("voltage.rectified.rating", FigureUnit.Volt, "mean direct voltage at rated speed and current, hot", "1.35 × {emf.line.rms.hot} less two diode drops, the drop of two hot phases (a delta: of two thirds of one) and the commutation drop 3ωL·I/π (a delta: a third of it); separate bridges: 3√2/π × {emf.phase.rms.hot} less two diode drops, the drop of one phase and 3ωL·I/π", Sources.Bridge, Rectified) with { MethodUncertainty = 0.03 },
        Define.Figure("voltage.load.needed", FigureUnit.Volt, "direct voltage that the load needs at the highest voltage stated for it", "{load.voltage}", Sources.Arithmetic, Needed),
        Define.Figure("voltage.overspeed.line-peak", FigureUnit.Volt, "peak line voltage at overspeed with the load lost and the coldest magnets", "{emf.line.peak} × {speed.overspeed} / {speed.rated} × {magnet.remanence.cold} / {magnet.remanence}", Sources.Emf, x =>
            x.Value(x.Figure("emf.line.peak") * x.Figure("speed.overspeed") / x.Figure("speed.rated") * x.Figure("magnet.remanence.cold") / x.Figure("magnet.remanence"))),
        Define.Figure("voltage.overspeed.direct", FigureUnit.Volt, "direct voltage behind the bridge at overspeed with the load lost and the coldest magnets", "{voltage.overspeed.line-peak}: an unloaded bridge charges to the peak", Sources.Bridge, x =>
            HasBridge(x) ? x.Value(x.Figure("voltage.overspeed.line-peak")) : x.NotApplicable("there is no bridge in this machine's load")),
        Define.Figure("voltage.load.limit", FigureUnit.Volt, "least of the voltage ratings stated for the load", "least of {load.bridge.reverse-voltage}, {load.controller.voltage-limit}, {load.capacitor.voltage-limit}, {load.link.voltage-limit}", Sources.Arithmetic, Limit),
        Define.Figure("speed.charging", FigureUnit.AngularSpeed, "speed at which charging begins: the peak line EMF equals the load voltage and two diode drops", "({load.voltage} + 2 × {bridge.diode-drop}) × {speed.rated} / {emf.line.peak}", Sources.Bridge, Charging) with { LinearUnit = FigureUnit.Velocity },
    ];

    /// <summary>True when a rectifier stands behind the machine.</summary>
    /// <param name="x">The evaluation.</param>
    public static bool HasBridge(Evaluation x) =>
        x.OptionalText("load.kind") is "battery" or "grid-inverter" || RatingFigures.IsAfterBridge(x) || x.States("load.bridge");

    private static Outcome DiodeDrop(Evaluation x) =>
        !HasBridge(x) ? x.NotApplicable("there is no bridge in this machine's load")
        : x.Optional("load.bridge.diode-drop") is { } stated ? x.Value(stated)
        : x.Assume(0.9, "silicon bridge diode at rated current, 0.7 to 1.1 V, common practice");

    private static Outcome Rectified(Evaluation x)
    {
        if (!HasBridge(x))
        {
            return x.NotApplicable("there is no bridge in this machine's load");
        }

        double current = x.Figure("current.direct");
        double drop = 2 * x.Figure("bridge.diode-drop");
        double resistance = x.Figure("resistance.phase.hot");
        double phases = x.Number("machine.phases");
        string connection = x.OptionalText("winding.connection") ?? "star";
        if (!x.Incomplete && phases != 3)
        {
            return x.OutOfDomain("the bridge relations used here are those of three phases");
        }

        if (connection == "separate-bridges")
        {
            // Single-phase bridges side by side: the phase of the highest EMF feeds the load, its mean is 3/π of the peak. Six times a
            // period the whole current passes from one phase to the next, as in a six-pulse bridge.
            double mean = 3 / Math.PI * Math.Sqrt(2) * x.Figure("emf.phase.rms.hot");
            double passing = 3 / Math.PI * RatingFigures.ElectricalSpeed(x) * x.Figure("inductance.phase");
            return x.Value(mean - drop - ((resistance + passing) * current));
        }

        // Seen from the line terminals a delta is a star of a third of its phase impedance.
        double share = connection == "delta" ? 1.0 / 3 : 1;
        double reactance = RatingFigures.ElectricalSpeed(x) * x.Figure("inductance.phase") * share;
        double noLoad = SixPulseMean * x.Figure("emf.line.rms.hot");
        return x.Value(noLoad - drop - (2 * resistance * share * current) - (3 / Math.PI * reactance * current));
    }

    private static Outcome Needed(Evaluation x) => x.OptionalText("load.kind") switch
    {
        "battery" => x.Value(x.Optional("load.voltage.max") ?? x.Number("load.voltage")),
        "grid-inverter" => x.Value(x.Optional("load.voltage.min") ?? x.Number("load.voltage")),
        null => MissingLoad(x),
        _ => x.NotApplicable("only a battery or an inverter with an input window demands a direct voltage"),
    };

    private static Outcome MissingLoad(Evaluation x)
    {
        if (x.Text("machine.role") == "motor")
        {
            return x.NotApplicable("a motor feeds no load");
        }

        x.Miss("load.kind");
        return x.Stop();
    }

    private static Outcome Limit(Evaluation x)
    {
        double least = double.PositiveInfinity;
        foreach (string key in LimitKeys)
        {
            least = Math.Min(least, x.Optional(key) ?? double.PositiveInfinity);
        }

        if (double.IsPositiveInfinity(least))
        {
            x.Miss(x.OptionalText("load.kind") switch
            {
                "drive" => "load.link.voltage-limit",
                "grid-inverter" => "load.controller.voltage-limit",
                _ => "load.bridge.reverse-voltage",
            });
        }

        return x.Value(least);
    }

    private static Outcome Charging(Evaluation x)
    {
        if (x.OptionalText("load.kind") != "battery" && x.States("load.kind"))
        {
            return x.NotApplicable("only a battery sets a voltage at which charging begins");
        }

        double voltage = x.Optional("load.voltage.min") ?? x.Number("load.voltage");
        double needed = voltage + (2 * x.Figure("bridge.diode-drop"));
        return x.Value(needed * x.Figure("speed.rated") / x.Figure("emf.line.peak"));
    }
}
