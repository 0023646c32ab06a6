using SpecLint.Physics.Geometry;
using SpecLint.Physics.Magnetics;
using SpecLint.Review.Figures;
using CoilOutline = SpecLint.Physics.Geometry.CoilOutline;
using CoilPlan = SpecLint.Physics.Magnetics.CoilGeometry;

namespace SpecLint.Review.Catalogue;

/// <summary>Figures that ask whether copper, hole and steel are where they earn most.</summary>
internal static class CoilWorthFigures
{
    private const double ThinnerShare = 0.9;
    private const double GoldenRatio = 0.6180339887498949;
    private const int SearchSteps = 9;

    /// <summary>Best hole width and what the present one reaches of it.</summary>
    public static PartDefinition<Shape<HoleSearch>> Hole { get; } = new("search for the best hole width", Search);

    public static IEnumerable<FigureDefinition> All =>
    [
        Define.Figure("coil.last-tenth.worth", FigureUnit.Ratio, "relative EMF gained over relative copper added by the last tenth of coil thickness, wire and clearance kept, turns in proportion", "(linkage at {winding.coil.thickness} over 0.9 × linkage at nine tenths of it − 1) / (1/0.9 − 1)", Sources.Field, LastTenth),
        Define.Figure("coil.hole.worth", FigureUnit.Ratio, "the coil's E²/R over the best that any hole width gives with the same wire, turns and leg", "{linkage.turn.fundamental}² / {coil.turn-length.mean} over its greatest value for other hole widths", Sources.Field, x =>
            x.Part(Hole) is { } hole ? x.Value(hole.Outline.Worth) : x.Stop()),
        Define.Figure("coil.hole.best", FigureUnit.Metre, "hole extent along the motion that gives the greatest E²/R", "golden-section search over the hole width", Sources.Field, x =>
            x.Part(Hole) is { } hole ? x.Value(hole.Outline.BestWidth) : x.Stop()) with { MethodUncertainty = 0.02 },
        Define.Figure("plate.gain", FigureUnit.Percent, "what an ideal return plate at the same clearance would add to the EMF", "linkage with a plate behind the coil over {linkage.turn.fundamental}, less 1", Sources.Field, PlateGain),
    ];

    private static Outcome LastTenth(Evaluation x)
    {
        double thickness = x.Number("winding.coil.thickness");
        double full = x.Figure("linkage.turn.fundamental");
        if (x.Incomplete)
        {
            return x.Stop();
        }

        double thinner = x.Varied("linkage.turn.fundamental", ("winding.coil.thickness", ThinnerShare * thickness));
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
        if (x.Part(MachineParts.Coil) is not { } coil
            || x.Part(FieldParts.Row) is not { } row
            || x.Part(FieldParts.Field) is not { } field
            || x.Incomplete)
        {
            return null;
        }

        CoilOutline present = coil.Outline;
        double leg = present.LegWidth;
        double widest = Math.Max(1.2 * pitch, present.HoleWidth + leg) - leg;
        CoilOutline wide = WithHole(present, widest);
        if (!Physics.Geometry.CoilGeometry.IsBuildable(wide))
        {
            wide = present;
        }

        WaveNumberGrid grid = WaveNumberGrid.For(row.Outline, FieldParts.PlanOf(wide));
        var magnets = new MagnetTransform(row.Outline, grid);
        double Merit(double hole)
        {
            CoilOutline outline = WithHole(present, hole);
            if (!Physics.Geometry.CoilGeometry.IsBuildable(outline))
            {
                return 0;
            }

            CoilPlan plan = FieldParts.PlanOf(outline);
            double linkage = new SpectralField(magnets, new CoilTransform(plan, grid), field.Stack, field.Layer)
                .FluxLinkageIn(field.Stack.WithIdealSteel()).Harmonic(1);
            return linkage * linkage / Physics.Geometry.CoilGeometry.MeanTurnLength(outline);
        }

        double now = Merit(present.HoleWidth);
        (double best, double merit) = GreatestOf(Merit, Math.Max(0.05 * pitch, (0.4 * pitch) - leg), widest);
        return merit > now
            ? new(new HoleSearch(Physics.Geometry.CoilGeometry.HoleExtent(WithHole(present, best)), now / merit))
            : new(new HoleSearch(Physics.Geometry.CoilGeometry.HoleExtent(present), 1));
    }

    private static CoilOutline WithHole(in CoilOutline coil, double hole) => coil.Shape == Physics.Geometry.CoilShape.Round
        ? coil with { HoleWidth = hole, HoleLength = hole }
        : coil with { HoleWidth = hole, CornerRadius = null };

    private static (double At, double Value) GreatestOf(Func<double, double> merit, double low, double high)
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

        return atInner > atOuter ? (inner, atInner) : (outer, atOuter);
    }
}

/// <summary>What the search for the best hole found.</summary>
/// <param name="BestWidth">Hole extent along the motion [m].</param>
/// <param name="Worth">The present coil's E²/R over the best.</param>
internal readonly record struct HoleSearch(double BestWidth, double Worth);
