using SpecLint.Physics.Geometry;
using SpecLint.Review.Figures;

namespace SpecLint.Review.Catalogue;

/// <summary>The machine's parts as shapes, shared by the figures.</summary>
internal static class MachineParts
{
    /// <summary>Plan form and place of one magnet.</summary>
    public static PartDefinition<Shape<MagnetOutline>> Magnet { get; } = new("magnet outline", ReadMagnet);

    /// <summary>Plan form, cross-section and place of one coil.</summary>
    public static PartDefinition<Shape<CoilOutline>> Coil { get; } = new("coil outline", ReadCoil);

    /// <summary>True for a linear machine.</summary>
    /// <param name="x">The evaluation.</param>
    public static bool IsLinear(Evaluation x) => x.Text("machine.topology") == "linear";

    /// <summary>What faces the magnets across the gap.</summary>
    /// <param name="x">The evaluation.</param>
    public static Facing FacingOf(Evaluation x) => x.Text("machine.arrangement") switch
    {
        "twin-rotor" or "double-sided" => Facing.Magnets,
        "rotor-and-return-plate" or "track-and-return-plate" => Facing.Plate,
        _ => Facing.Nothing,
    };

    private static Shape<MagnetOutline>? ReadMagnet(Evaluation x)
    {
        bool linear = IsLinear(x);
        string shape = x.Text("magnets.shape");
        if (shape == "sector")
        {
            double inner = x.Number("magnets.inner-radius");
            double outer = x.Number("magnets.outer-radius");
            double arc = x.Number("magnets.arc");
            int poles = x.Count("machine.poles");
            return x.Incomplete || poles < 2 ? null : new(new MagnetOutline
            {
                Shape = MagnetShape.Sector,
                Length = outer - inner,
                PitchRadius = 0.5 * (inner + outer),
                SectorAngle = arc * 2 * Math.PI / poles,
            });
        }

        double radius = linear ? 0 : x.Number("magnets.pitch-radius");
        bool disc = shape == "disc";
        double length = disc ? x.Number("magnets.diameter") : x.Number("magnets.length");
        double width = disc ? length : x.Number("magnets.width");
        return x.Incomplete ? null : new(new MagnetOutline
        {
            Shape = disc ? MagnetShape.Disc : MagnetShape.Block,
            Length = length,
            Width = width,
            PitchRadius = radius,
        });
    }

    private static Shape<CoilOutline>? ReadCoil(Evaluation x)
    {
        bool linear = IsLinear(x);
        string shape = x.Text("winding.coil.shape");
        double thickness = x.Number("winding.coil.thickness");
        double radius = linear ? 0 : x.Optional("winding.coil.pitch-radius") ?? x.Figure("magnet.mean-radius");
        CoilOutline outline;
        if (shape == "round")
        {
            double inner = x.Number("winding.coil.inner-radius");
            double outer = x.Number("winding.coil.outer-radius");
            outline = CoilOutline.Round(inner, outer, thickness, radius);
        }
        else
        {
            outline = new CoilOutline
            {
                Shape = shape == "keystone" ? CoilShape.Keystone : CoilShape.Rectangle,
                HoleLength = x.Number("winding.coil.hole-length"),
                HoleWidth = x.Number("winding.coil.hole-width"),
                LegWidth = x.Number("winding.coil.leg-width"),
                Thickness = thickness,
                PitchRadius = radius,
                CornerRadius = x.Optional("winding.coil.corner-radius"),
            };
        }

        return x.Incomplete || !CoilGeometry.IsBuildable(outline) ? null : new(outline);
    }
}

/// <summary>What faces the magnets across the gap.</summary>
internal enum Facing
{
    /// <summary>A second row of magnets on steel.</summary>
    Magnets,

    /// <summary>A plain steel plate.</summary>
    Plate,

    /// <summary>Nothing: the single rotor is open.</summary>
    Nothing,
}

/// <summary>A value type kept as a part of the graph.</summary>
/// <param name="Outline">The value.</param>
/// <typeparam name="T">Its type.</typeparam>
internal sealed record Shape<T>(T Outline)
    where T : struct;
