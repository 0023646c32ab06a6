using System.Collections.Immutable;
using System.Globalization;
using SpecLint.Physics.Electrical;
using SpecLint.Physics.Magnetics;
using SpecLint.Physics.Windings;
using SpecLint.Review.Figures;

namespace SpecLint.Review.Catalogue;

/// <summary>Flux linkage and electromotive forces.</summary>
internal static class EmfFigures
{
    private const double DeadShareOfPeak = 0.05;

    private static readonly ImmutableArray<int> Orders = [3, 5, 7, 9, 11, 13, 15];

    private static readonly ImmutableArray<int> EmfOrders = [3, 5, 7];

    /// <summary>Linkage harmonics per turn at 20 °C.</summary>
    public static PartDefinition<FluxLinkageHarmonics> Linkage { get; } = new("flux linkage of one turn", ReadLinkage);

    /// <summary>EMF of one coil per unit of mechanical speed.</summary>
    public static PartDefinition<HarmonicWaveform> CoilEmf { get; } = new("EMF of one coil", ReadCoilEmf);

    /// <summary>EMF of one phase per unit of mechanical speed.</summary>
    public static PartDefinition<HarmonicWaveform> PhaseWave { get; } = new("EMF of one phase", x =>
        x.Part(CoilEmf) is { } coil && x.Part(WindingParts.Paths) is { } paths ? PhaseEmf.OfPhase(coil, paths, 0) : null);

    /// <summary>EMF between lines per unit of mechanical speed.</summary>
    public static PartDefinition<HarmonicWaveform> LineWave { get; } = new("EMF between two lines", ReadLine);

    public static IEnumerable<FigureDefinition> All =>
    [
        Define.Figure("linkage.turn.fundamental", FigureUnit.Weber, "peak fundamental flux linkage of one turn, averaged over the coil's cross-section, magnets at 20 °C", "harmonic solution of the gap field: ∫ k·T(k)·M(k)·C(k) dk with the transforms of magnet and coil and the layers' transfer function, times {magnet.remanence}", Sources.Field, x => Turn(x, 1)) with { MethodUncertainty = 0.005 },
        .. Orders.Select(Harmonic),
        Define.Figure("linkage.coil.fundamental", FigureUnit.Weber, "peak fundamental flux linkage of one coil", "{linkage.turn.fundamental} × {winding.turns}", Sources.Emf, x =>
            x.Value(x.Figure("linkage.turn.fundamental") * x.Number("winding.turns"))),
        Define.Figure("emf.constant.phase", FigureUnit.EmfConstantRotary, "peak fundamental phase EMF per mechanical rad/s (linear: per m/s)", "{linkage.coil.fundamental} × {winding.factor.distribution} × coils in series × {machine.pole-pairs} (linear: π / {magnet.pole-pitch})", Sources.Emf, x =>
            Of(x, PhaseWave, w => w.Fundamental)) with { LinearUnit = FigureUnit.EmfConstantLinear },
        AtSpeed("emf.coil.rms", "rms EMF of one coil at rated speed, open circuit", CoilEmf, w => w.Rms, hot: false),
        AtSpeed("emf.phase.rms", "rms phase EMF at rated speed, open circuit, harmonics included", PhaseWave, w => w.Rms, hot: false),
        AtSpeed("emf.line.rms", "rms line EMF at rated speed, open circuit, harmonics included", LineWave, w => w.Rms, hot: false),
        AtSpeed("emf.line.peak", "peak line EMF at rated speed, open circuit, harmonics included", LineWave, w => w.Peak, hot: false),
        AtSpeed("emf.phase.rms.hot", "rms phase EMF at rated speed with magnets at their working temperature", PhaseWave, w => w.Rms, hot: true),
        AtSpeed("emf.line.rms.hot", "rms line EMF at rated speed with magnets at their working temperature", LineWave, w => w.Rms, hot: true),
        AtSpeed("emf.line.peak.hot", "peak line EMF at rated speed with magnets at their working temperature", LineWave, w => w.Peak, hot: true),
        Define.Figure("emf.phase.distortion", FigureUnit.Percent, "total harmonic distortion of the phase EMF", "rms of the harmonics over the rms of the fundamental", Sources.Emf, x => Of(x, PhaseWave, w => w.Distortion)) with { MethodUncertainty = 0.02 },
        Define.Figure("emf.line.distortion", FigureUnit.Percent, "total harmonic distortion of the line EMF", "rms of the harmonics over the rms of the fundamental", Sources.Emf, x => Of(x, LineWave, w => w.Distortion)) with { MethodUncertainty = 0.02 },
        .. EmfOrders.Select(EmfHarmonic),
        Define.Figure("emf.phase.crest", FigureUnit.Ratio, "peak over rms of the phase EMF's waveform; a sine has 1.414", "peak of the waveform summed from its harmonics over its rms", Sources.Emf, x => Of(x, PhaseWave, w => w.CrestFactor)) with { MethodUncertainty = 0.005 },
        Define.Figure("linkage.coil.fundamental.hot", FigureUnit.Weber, "peak fundamental flux linkage of one coil with magnets at their working temperature", "{linkage.coil.fundamental} × {magnet.remanence.hot} / {magnet.remanence}", Sources.Emf, x =>
            x.Value(x.Figure("linkage.coil.fundamental") * x.Figure("magnet.remanence.hot") / x.Figure("magnet.remanence"))),
        Define.Figure("emf.dead-time", FigureUnit.Percent, "share of the period in which the coil's EMF is under 5 % of its peak", "waveform of the coil's EMF from its harmonics", Sources.Emf, x => Of(x, CoilEmf, w => w.ShareBelow(DeadShareOfPeak))) with { MethodUncertainty = 0.02 },
    ];

    private static FigureDefinition Harmonic(int order) =>
        Define.Figure(
            string.Create(CultureInfo.InvariantCulture, $"linkage.turn.harmonic-{order}"),
            FigureUnit.Weber,
            string.Create(CultureInfo.InvariantCulture, $"signed cosine amplitude of harmonic {order} of one turn's flux linkage"),
            "as {linkage.turn.fundamental}, electrical order " + order.ToString(CultureInfo.InvariantCulture),
            Sources.Field,
            x => Turn(x, order)) with { MethodUncertainty = 0.01 };

    private static FigureDefinition EmfHarmonic(int order) =>
        Define.Figure(
            string.Create(CultureInfo.InvariantCulture, $"emf.phase.harmonic-{order}"),
            FigureUnit.Percent,
            string.Create(CultureInfo.InvariantCulture, $"amplitude of harmonic {order} of the phase EMF over its fundamental"),
            "order × linkage harmonic × distribution factor of that order, over the same of order 1",
            Sources.Emf,
            x => Of(x, PhaseWave, w => w.Amplitudes[(order - 1) / 2].Magnitude / w.Fundamental)) with { MethodUncertainty = 0.02 };

    private static FigureDefinition AtSpeed(string name, string meaning, PartDefinition<HarmonicWaveform> wave, Func<HarmonicWaveform, double> reduce, bool hot) =>
        Define.Figure(
            name,
            FigureUnit.Volt,
            meaning,
            hot ? "waveform of the EMF × {speed.rated} × {magnet.remanence.hot} / {magnet.remanence}" : "waveform of the EMF × {speed.rated}",
            Sources.Emf,
            x => Of(x, wave, w => reduce(w) * x.Figure("speed.rated") * (hot ? x.Figure("magnet.remanence.hot") / x.Figure("magnet.remanence") : 1)));

    private static FluxLinkageHarmonics? ReadLinkage(Evaluation x)
    {
        double remanence = x.Figure("magnet.remanence");
        return x.Part(FieldParts.Field) is { } field && !x.Incomplete ? field.FluxLinkage(remanence) : null;
    }

    private static HarmonicWaveform? ReadCoilEmf(Evaluation x)
    {
        double turns = x.Number("winding.turns");
        double cycles = MachineParts.IsLinear(x) ? Math.PI / x.Figure("magnet.pole-pitch") : x.Figure("machine.pole-pairs");
        return x.Part(Linkage) is { } linkage && !x.Incomplete
            ? PhaseEmf.OfCoil(new CoilLinkage { PerTurn = linkage.Amplitudes, Turns = turns }, cycles)
            : null;
    }

    private static HarmonicWaveform? ReadLine(Evaluation x)
    {
        int phases = x.Count("machine.phases");
        string connection = x.OptionalText("winding.connection") ?? "star";
        if (x.Part(CoilEmf) is not { } coil || x.Part(WindingParts.Paths) is not { } paths || x.Incomplete)
        {
            return null;
        }

        HarmonicWaveform phase = PhaseEmf.OfPhase(coil, paths, 0);
        return phases == 1 || connection == "separate-bridges" ? phase
            : connection == "delta" ? PhaseEmf.DeltaLine(phase, Math.Max(3, phases))
            : PhaseEmf.StarLine(phase, PhaseEmf.OfPhase(coil, paths, phases / 2));
    }

    private static Outcome Turn(Evaluation x, int order)
    {
        // Read for its uncertainty: the linkage is proportional to the remanence.
        _ = x.Figure("magnet.remanence");
        if (x.Part(Linkage) is not { } linkage)
        {
            return x.Stop();
        }

        // Steel past 1.6 T is outside the linear solution: what it may cost widens the band.
        double value = linkage.Harmonic(order);
        double saturation = x.OptionalFigure("saturation.linkage-loss") ?? 0;
        Outcome linear = x.Value(value);
        return linear.HasValue ? x.Value(value, double.Hypot(linear.Uncertainty, saturation * value)) : linear;
    }

    private static Outcome Of(Evaluation x, PartDefinition<HarmonicWaveform> wave, Func<HarmonicWaveform, double> reduce)
    {
        // The waveform is proportional to the linkage and carries its uncertainty.
        _ = x.Figure("linkage.turn.fundamental");
        return x.Part(wave) is { } waveform ? x.Value(reduce(waveform)) : x.Stop();
    }
}
