using SpecLint.Physics.Geometry;
using SpecLint.Physics.Magnetics;
using SpecLint.Review.Figures;
using SpecLint.Review.Rules;

namespace SpecLint.Review.Catalogue;

/// <summary>The gap field in pieces that are reused when a spec value changes: transforms of magnet and coil, layers, solution.</summary>
internal static class FieldParts
{
    /// <summary>Magnets round the rotor or along the track.</summary>
    public static PartDefinition<Shape<MagnetRow>> Row { get; } = new("row of magnets", ReadRow);

    /// <summary>The coil as the field solution takes it: every turn mitred sharp.</summary>
    public static PartDefinition<Shape<CoilOutline>> Plan { get; } = new("plan of the coil", x =>
        x.Part(MachineParts.Coil) is { } coil ? new(coil.Outline with { CornerRadius = null }) : null);

    /// <summary>Transform of the magnets' outline, on a grid that follows from the magnets alone.</summary>
    public static PartDefinition<MagnetTransform> RotorTransform { get; } = new("transform of the magnet", x =>
        x.Part(Row) is { } row
            ? new MagnetTransform(row.Outline, WaveNumberGrid.For(row.Outline, NominalCoil(row.Outline)))
            : null);

    /// <summary>Transform of the magnets on the grid that the coil shares; the rotor's own unless the coil reaches farther.</summary>
    public static PartDefinition<MagnetTransform> MagnetTransform { get; } = new("transform of the magnet on the coil's grid", x =>
    {
        if (x.Part(RotorTransform) is not { } rotor || x.Part(Plan) is not { } coil)
        {
            return null;
        }

        WaveNumberGrid needed = WaveNumberGrid.For(rotor.Row, coil.Outline);
        return needed.PanelWidth < rotor.Grid.PanelWidth ? new MagnetTransform(rotor.Row, needed) : rotor;
    });

    /// <summary>Transform of the coil's turn density.</summary>
    public static PartDefinition<CoilTransform> CoilTransform { get; } = new("transform of the coil", x =>
        x.Part(MagnetTransform) is { } magnets && x.Part(Plan) is { } coil ? new CoilTransform(coil.Outline, magnets.Grid) : null);

    /// <summary>
    /// The solved gap field for what the coil's plan does not touch: field, flux and force. Its coil is a nominal one of
    /// the magnets' size, which only weights the small correction for recoil permeability.
    /// </summary>
    public static PartDefinition<SpectralField> RotorField { get; } = new("harmonic solution of the rotor's field", x =>
        x.Part(RotorTransform) is { } magnets
            ? Solve(x, magnets, new CoilTransform(NominalCoil(magnets.Row), magnets.Grid))
            : null);

    /// <summary>Layers across the gap.</summary>
    public static PartDefinition<Shape<MagneticLayers>> Layers { get; } = new("layers across the gap", ReadLayers);

    /// <summary>The solved gap field per tesla of remanence.</summary>
    public static PartDefinition<SpectralField> Field { get; } = new("harmonic solution of the gap field", ReadField);

    private static Shape<MagnetRow>? ReadRow(Evaluation x)
    {
        bool linear = MachineParts.IsLinear(x);
        double pairs = x.Figure("machine.pole-pairs");
        double pitch = x.Figure("magnet.pole-pitch");
        double gapBetween = x.Figure("magnet.spacing.innermost");
        if (x.Part(MachineParts.Magnet) is not { } part || x.Incomplete)
        {
            return null;
        }

        // Overlapping magnets, and a sector on a straight track, are no machine to solve.
        if (gapBetween < 0 || (linear && part.Outline.Shape == MagnetShape.Sector))
        {
            return null;
        }

        var row = new MagnetRow { Outline = part.Outline, PolePairs = linear ? 0 : (int)pairs, PolePitch = linear ? pitch : 0 };
        return row.DomainFault is null ? new(row) : null;
    }

    private static Shape<MagneticLayers>? ReadLayers(Evaluation x)
    {
        Facing facing = MachineParts.FacingOf(x);
        double thickness = x.Number("magnets.thickness");
        double recoil = x.Figure("magnet.recoil-permeability");
        double gap = facing == Facing.Nothing ? double.PositiveInfinity : x.Figure("gap.magnetic");
        SteelPlate behind = ReadPlate(x, "rotor.back-iron");
        SteelPlate opposite = facing == Facing.Plate ? ReadPlate(x, "rotor.return-plate") : SteelPlate.None;
        if (x.Incomplete || !(thickness > 0) || !(gap > 0))
        {
            return null;
        }

        var layers = new MagneticLayers
        {
            MagnetThickness = thickness,
            Gap = facing == Facing.Nothing ? 0 : gap,
            RecoilPermeability = recoil,
            Opposite = facing switch
            {
                Facing.Magnets => OppositeSide.Magnets,
                Facing.Plate => OppositeSide.Plate,
                _ => OppositeSide.Open,
            },
            Behind = behind,
            OppositePlate = opposite,
        };
        return layers.DomainFault is null ? new(layers) : null;
    }

    private static SteelPlate ReadPlate(Evaluation x, string section)
    {
        if (x.OptionalText(section) == "none")
        {
            return SteelPlate.None;
        }

        return x.OptionalText($"{section}.material") == "ideal" ? SteelPlate.Ideal
            : PermeabilityOf(x, section) is { } permeability ? Plate(x, section, permeability)
            : SteelPlate.None;
    }

    /// <summary>Relative permeability of a plate as stated or by its material; recorded as missing and null where neither tells it.</summary>
    /// <param name="x">The evaluation.</param>
    /// <param name="section">The plate's key.</param>
    public static double? PermeabilityOf(Evaluation x, string section)
    {
        if (x.Optional($"{section}.material.relative-permeability") is { } stated)
        {
            return stated;
        }

        string material = x.Text($"{section}.material");
        double? known = EmbeddedRulebooks.Tables.Find("steels")?.FindRow("material", material)?.Number("relative-permeability");
        if (known is null && material.Length > 0)
        {
            // A material that the table does not know is no help: the number itself is what is missing.
            x.Miss($"{section}.material.relative-permeability");
        }

        return known;
    }

    private static SteelPlate Plate(Evaluation x, string section, double permeability)
    {
        const double LeastMagnetic = 10;
        double thickness = x.Number($"{section}.thickness");
        return permeability < LeastMagnetic
            ? SteelPlate.None
            : new SteelPlate { Thickness = thickness, RelativePermeability = permeability };
    }

    private static SpectralField? ReadField(Evaluation x) =>
        x.Part(MagnetTransform) is { } magnets && x.Part(CoilTransform) is { } coil ? Solve(x, magnets, coil) : null;

    private static SpectralField? Solve(Evaluation x, MagnetTransform magnets, CoilTransform coil)
    {
        double near = x.Number("gap.clearance") + (x.Optional("gap.cover") ?? 0);
        double thickness = x.Number("winding.coil.thickness");
        if (x.Part(Layers) is not { } layers || x.Incomplete)
        {
            return null;
        }

        var layer = new CoilLayer { MidHeight = near + (0.5 * thickness), Thickness = thickness };
        return new SpectralField(magnets, coil, layers.Outline, layer);
    }

    /// <summary>A rectangular coil as long as the magnet, its legs a pole pitch apart to a large part.</summary>
    private static CoilOutline NominalCoil(in MagnetRow magnets)
    {
        double pitch = magnets.PitchArc;
        return new CoilOutline
        {
            Shape = CoilShape.Rectangle,
            PitchRadius = magnets.PitchRadius,
            HoleLength = magnets.Length,
            HoleWidth = 0.5 * pitch,
            LegWidth = 0.3 * pitch,
            Thickness = 0.3 * pitch,
        };
    }
}
