using SpecLint.Physics.Geometry;
using SpecLint.Physics.Magnetics;
using SpecLint.Physics.Windings;
using SpecLint.Review.Figures;

namespace SpecLint.Review.Catalogue;

/// <summary>Figures that ask whether copper, hole and steel are where they earn most.</summary>
internal static class CoilWorthFigures
{
    private const double ThinnerShare = 0.9;
    private const double GoldenRatio = 0.6180339887498949;
    private const int SearchSteps = 12;
    private const double ClimbFactor = 1.14;
    private const int MostClimbs = 5;

    /// <summary>Best hole width and what the present one reaches of it.</summary>
    public static PartDefinition<Shape<HoleSearch>> Hole { get; } = new("search for the best hole width", Search);

    public static IEnumerable<FigureDefinition> All =>
    [
        Define.Figure("coil.last-tenth.worth", FigureUnit.Ratio, "relative EMF gained over relative copper added by the last tenth of coil thickness, wire and clearance kept, turns in proportion", "(linkage at {winding.coil.thickness} over 0.9 × linkage at nine tenths of it, clearances kept, − 1) / (1/0.9 − 1)", Sources.Field, LastTenth),
        Define.Figure("coil.hole.worth", FigureUnit.Ratio, "the coil's E²/R over the best that any hole width gives with the same wire, turns and leg", "{linkage.turn.fundamental}² / {coil.turn-length.mean} over its greatest value for other hole widths", Sources.Field, x =>
            x.Part(Hole) is { } hole ? x.Value(hole.Outline.Worth) : x.Stop()),
        Define.Figure("coil.hole.best", FigureUnit.Metre, "hole extent along the motion that gives the greatest E²/R", "golden-section search with the coil's own winding factor, then steps of 14 % with the harmonic solution", Sources.Field, x =>
            x.Part(Hole) is { } hole ? x.Value(hole.Outline.BestWidth) : x.Stop()) with { MethodUncertainty = 0.1 },
        Define.Figure("plate.gain", FigureUnit.Percent, "what an ideal return plate at the same clearance would add to the EMF", "linkage with a plate behind the coil over {linkage.turn.fundamental}, less 1", Sources.Field, PlateGain),
    ];

    private static Outcome LastTenth(Evaluation x)
    {
        if (x.Part(FieldParts.Field) is not { } field || x.Incomplete)
        {
            return x.Stop();
        }

        // Clearances kept: a thinner coil lets the magnets come closer, and its middle sinks toward them.
        double removed = (1 - ThinnerShare) * field.Layer.Thickness;
        CoilLayer thinnerLayer = new() { MidHeight = field.Layer.MidHeight - (0.5 * removed), Thickness = field.Layer.Thickness - removed };
        MagneticLayers thinnerStack = field.Stack.Opposite == OppositeSide.Open ? field.Stack : field.Stack with { Gap = field.Stack.Gap - removed };
        double full = field.IdealFluxLinkage(1).Harmonic(1);
        double thinner = new SpectralField(field.Magnets, field.Coil, thinnerStack, thinnerLayer).IdealFluxLinkage(1).Harmonic(1);
        double gain = (full / (ThinnerShare * thinner)) - 1;
        return x.Value(gain / ((1 / ThinnerShare) - 1), 0.02);
    }

    private static Outcome PlateGain(Evaluation x)
    {
        if (MachineParts.FacingOf(x) != Facing.Nothing)
        {
            return x.NotApplicable("the gap is closed by steel already");
        }

        double clearance = x.Number("gap.clearance") + (x.Optional("gap.cover") ?? 0);
        double thickness = x.Number("winding.coil.thickness");
        if (x.Part(FieldParts.Field) is not { } open || x.Incomplete)
        {
            return x.Stop();
        }

        MagneticLayers closed = open.Stack with
        {
            Opposite = OppositeSide.Plate,
            OppositePlate = SteelPlate.Ideal,
            Gap = thickness + (2 * clearance),
        };
        double with = new SpectralField(open.Magnets, open.Coil, closed, open.Layer).FluxLinkage(1).Harmonic(1);
        return x.Value((with / open.FluxLinkage(1).Harmonic(1)) - 1, 0.02);
    }

    private static Shape<HoleSearch>? Search(Evaluation x)
    {
        double pitch = x.Figure("magnet.pole-pitch");
        double pairs = x.Figure("machine.pole-pairs");
        bool linear = MachineParts.IsLinear(x);
        if (x.Part(MachineParts.Coil) is not { } coil || x.Part(FieldParts.Field) is not { } field || x.Incomplete)
        {
            return null;
        }

        // The coil's own factor at the mean radius finds the place; near its top the merit is flat, and the full solution judges it.
        CoilOutline present = coil.Outline;
        double leg = present.LegWidth;
        double widest = Math.Max(1.2 * pitch, present.HoleWidth + leg) - leg;
        double narrowest = Math.Max(0.05 * pitch, (0.4 * pitch) - leg);
        double OwnFactor(double hole)
        {
            CoilOutline outline = WithHole(present, hole);
            if (!CoilGeometry.IsBuildable(outline))
            {
                return 0;
            }

            double factor = linear
                ? CoilSpanFactor.OfLinearCoil(outline, 1, pitch)
                : CoilSpanFactor.OfDiscCoil(outline, 1, (int)pairs, outline.PitchRadius);
            double reach = outline.Shape == CoilShape.Round ? outline.HoleWidth + leg : 1;
            return factor * factor * reach * reach / CoilGeometry.MeanTurnLength(outline);
        }

        double place = GreatestOf(OwnFactor, narrowest, widest);
        WaveNumberGrid grid = WaveNumberGrid.For(field.Magnets.Row, WithHole(present, widest));
        MagnetTransform magnets = grid.PanelWidth < field.Magnets.Grid.PanelWidth ? new MagnetTransform(field.Magnets.Row, grid) : field.Magnets;
        double Merit(double hole)
        {
            CoilOutline outline = WithHole(present, hole);
            if (!CoilGeometry.IsBuildable(outline))
            {
                return 0;
            }

            var transform = new CoilTransform(outline, magnets.Grid);
            double linkage = new SpectralField(magnets, transform, field.Stack, field.Layer).IdealFluxLinkage(1).Harmonic(1);
            return linkage * linkage / CoilGeometry.MeanTurnLength(outline);
        }

        double presentLinkage = field.IdealFluxLinkage(1).Harmonic(1);
        double now = presentLinkage * presentLinkage / CoilGeometry.MeanTurnLength(WithHole(present, present.HoleWidth));
        (double best, double merit) = Climb(Merit, place, widest);
        (best, merit) = now > merit ? (present.HoleWidth, now) : (best, merit);
        return new(new HoleSearch(CoilGeometry.HoleExtent(WithHole(present, best)), now / merit));
    }

    private static CoilOutline WithHole(in CoilOutline coil, double hole) => coil.Shape == CoilShape.Round
        ? coil with { HoleWidth = hole, HoleLength = hole }
        : coil with { HoleWidth = hole, CornerRadius = null };

    /// <summary>Steps from a first guess while it pays, up or down.</summary>
    private static (double At, double Value) Climb(Func<double, double> merit, double first, double greatest)
    {
        double at = first;
        double value = merit(first);
        foreach (double factor in (ReadOnlySpan<double>)[ClimbFactor, 1 / ClimbFactor])
        {
            for (int step = 0; step < MostClimbs; step++)
            {
                double next = Math.Min(greatest, at * factor);
                double there = merit(next);
                if (there <= value)
                {
                    break;
                }

                (at, value) = (next, there);
            }

            if (at > first)
            {
                break;
            }
        }

        return (at, value);
    }

    private static double GreatestOf(Func<double, double> merit, double low, double high)
    {
        double inner = high - (GoldenRatio * (high - low));
        double outer = low + (GoldenRatio * (high - low));
        double atInner = merit(inner);
        double atOuter = merit(outer);
        for (int step = 0; step < SearchSteps; step++)
        {
            if (atInner > atOuter)
            {
                (high, outer, atOuter) = (outer, inner, atInner);
                inner = high - (GoldenRatio * (high - low));
                atInner = merit(inner);
            }
            else
            {
                (low, inner, atInner) = (inner, outer, atOuter);
                outer = low + (GoldenRatio * (high - low));
                atOuter = merit(outer);
            }
        }

        return atInner > atOuter ? inner : outer;
    }
}

/// <summary>What the search for the best hole found.</summary>
/// <param name="BestWidth">Hole extent along the motion [m].</param>
/// <param name="Worth">The present coil's E²/R over the best.</param>
internal readonly record struct HoleSearch(double BestWidth, double Worth);
