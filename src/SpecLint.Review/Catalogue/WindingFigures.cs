using SpecLint.Physics.Geometry;
using SpecLint.Physics.Windings;
using SpecLint.Review.Figures;

namespace SpecLint.Review.Catalogue;

/// <summary>Figures of the winding's layout: how well coils, phases and paths add up.</summary>
internal static class WindingFigures
{
    public static IEnumerable<FigureDefinition> All =>
    [
        Factor(1),
        Factor(5),
        Factor(7),
        Define.Figure("winding.factor.distribution", FigureUnit.Ratio, "distribution factor of the fundamental, mean of the phases", "size of the phasor sum of a phase's coils over their number", Sources.StarOfSlots, x =>
            x.Part(WindingParts.Layout) is { } layout ? x.Value(DistributionFactor.Mean(layout, 1)) : x.Stop()),
        Define.Figure("winding.imbalance", FigureUnit.Percent, "largest departure of a phase's EMF phasor from a balanced set, over the mean phase EMF", "star of the coil axes, {winding.coils} coils over {machine.poles} poles in {machine.phases} phases", Sources.StarOfSlots, Imbalance),
        Define.Figure("winding.coils-connected", FigureUnit.Ratio, "coils that the stated connection uses", "{winding.series-coils} × {winding.parallel-paths} × {machine.phases}", Sources.Arithmetic, x =>
            x.Value(x.Number("winding.series-coils") * WindingParts.ParallelPaths(x) * x.Number("machine.phases"))),
        Define.Figure("winding.path-difference", FigureUnit.Percent, "largest difference between parallel paths' EMF phasors, over their mean", "phasor sums of the coils of each path", Sources.StarOfSlots, PathDifference),
        Define.Figure("winding.series-coils.each", FigureUnit.Ratio, "coils in series in one path", "{winding.series-coils}, or coils / (phases × paths) where it is not stated", Sources.Arithmetic, SeriesCoils),
    ];

    private static FigureDefinition Factor(int order) =>
        Define.Figure($"winding.factor-{order}", FigureUnit.Ratio, $"winding factor of electrical order {order}, with the coil's own pitch and spread", "distribution factor × mean over the turns of the sine of half their electrical span", Sources.StarOfSlots, x => Of(x, order));

    private static Outcome Of(Evaluation x, int order)
    {
        double pairs = x.Figure("machine.pole-pairs");
        bool linear = MachineParts.IsLinear(x);
        double pitch = x.Figure("magnet.pole-pitch");
        WindingLayout? layout = x.Part(WindingParts.Layout);
        Shape<CoilOutline>? coil = x.Part(MachineParts.Coil);
        if (layout is null || coil is null || x.Incomplete)
        {
            return x.Stop();
        }

        double own = linear
            ? CoilSpanFactor.OfLinearCoil(coil.Outline, order, pitch)
            : CoilSpanFactor.OfDiscCoil(coil.Outline, order, (int)pairs, coil.Outline.PitchRadius);
        return x.Value(Math.Abs(own) * DistributionFactor.Mean(layout, order));
    }

    private static Outcome Imbalance(Evaluation x)
    {
        int coils = x.Count("winding.coils");
        int phases = x.Count("machine.phases");
        if (!x.Incomplete && coils < phases)
        {
            // A phase without a coil is as far from a balanced set as can be.
            return x.Value(1);
        }

        return x.Part(WindingParts.Layout) is { } layout ? x.Value(layout.IsBalanced ? 0 : layout.Imbalance) : x.Stop();
    }

    private static Outcome PathDifference(Evaluation x) =>
        WindingParts.ParallelPaths(x) < 2 && !x.Incomplete ? x.NotApplicable("each phase is a single path")
        : x.Part(WindingParts.Paths) is { } paths ? x.Value(paths.LargestDifference)
        : x.Stop();

    private static Outcome SeriesCoils(Evaluation x) =>
        x.Optional("winding.series-coils") is { } stated ? x.Value(stated)
        : x.Value(x.Number("winding.coils") / (x.Number("machine.phases") * WindingParts.ParallelPaths(x)));
}
