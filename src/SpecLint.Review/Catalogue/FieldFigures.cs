using SpecLint.Physics.Magnetics;
using SpecLint.Review.Figures;
using SpecLint.Review.Rules;

namespace SpecLint.Review.Catalogue;

/// <summary>Figures of the gap field, of free magnets and of the forces between discs.</summary>
internal static class FieldFigures
{
    private const double ImplantCaution = 0.5e-3;
    private const double SaturationOnset = 1.6;

    /// <summary>The field at single points, up to the magnets' face.</summary>
    public static PartDefinition<ImageField> Points { get; } = new("image sums of the gap field", x =>
        x.Part(FieldParts.Row) is { } row && x.Part(FieldParts.Layers) is { } layers ? new ImageField(row.Outline, layers.Outline) : null);

    /// <summary>Flux of one pole.</summary>
    public static PartDefinition<PoleFlux> Flux { get; } = new("flux of one pole", x => x.Part(FieldParts.Field) is { } solved ? new PoleFlux(solved) : null);

    /// <summary>Harmonics of the field inside the winding.</summary>
    public static PartDefinition<WindingField> Winding { get; } = new("field inside the winding", x => x.Part(FieldParts.Field) is { } solved ? new WindingField(solved) : null);

    public static IEnumerable<FigureDefinition> All =>
    [
        Define.Figure("magnet.surface-field.centre", FigureUnit.Tesla, "one free magnet in air, on its axis at the face", "closed form for a uniformly magnetised block or cylinder with {magnet.remanence}", Sources.FreeMagnet, x => FreeOnAxis(x, 0)) with { MethodUncertainty = 0.01 },
        Define.Figure("magnet.surface-field.at-2mm", FigureUnit.Tesla, "one free magnet in air, on its axis 2 mm before the face", "closed form for a uniformly magnetised block or cylinder with {magnet.remanence}", Sources.FreeMagnet, x => FreeOnAxis(x, 2e-3)) with { MethodUncertainty = 0.01 },
        Define.Figure("magnet.surface-field.at-5mm", FigureUnit.Tesla, "one free magnet in air, on its axis 5 mm before the face", "closed form for a uniformly magnetised block or cylinder with {magnet.remanence}", Sources.FreeMagnet, x => FreeOnAxis(x, 5e-3)) with { MethodUncertainty = 0.01 },
        Define.Figure("magnet.stray-distance", FigureUnit.Distance, "distance on its axis at which one free magnet's field has fallen to 0.5 mT", "closed form of the free magnet solved for 0.5 mT", Sources.FreeMagnet, StrayDistance) with { MethodUncertainty = 0.02 },
        Define.Figure("magnet.handling-force", FigureUnit.Newton, "pull of one magnet in contact with thick steel", "mean of B² over the face × area / 2μ0, with the steel as a mirror", Sources.FreeMagnet, HandlingForce) with { MethodUncertainty = 0.15 },
        Define.Figure("mass.magnets", FigureUnit.Kilogram, "mass of all magnets", "number of magnets × {magnet.face-area} × {magnets.thickness} × {magnet.density}", Sources.Geometry, MagnetMass),
        Define.Figure("magnet.face-area", FigureUnit.Area, "area of one magnet's face", "{magnet.extent} × {magnet.length}", Sources.Geometry, x => x.Value(x.Figure("magnet.extent") * x.Figure("magnet.length"))),
        Define.Figure("field.mid-coil.centre", FigureUnit.Tesla, "flux density normal to the coil at its middle, on a pole centre at the mean radius, magnets at 20 °C", "image sums of the magnets' charge sheets, corrected for recoil permeability and plates", Sources.Field, x => AtHeight(x, 0)) with { MethodUncertainty = 0.005 },
        Define.Figure("field.mid-coil.fundamental", FigureUnit.Tesla, "fundamental of the flux density along the motion at the coil's middle height and the mean radius", "first harmonic of the harmonic solution at the mean radius, times {magnet.remanence}", Sources.Field, Fundamental) with { MethodUncertainty = 0.005 },
        Define.Figure("field.legs.weighted", FigureUnit.Tesla, "root of the mean over the legs of Σ(n·B_n)², field across the wire, peak amplitudes: what drives eddy currents", "harmonics up to 31 of the field inside the legs, each times its order", Sources.Field, x => Weighted(x, (w, b) => w.Legs(b))) with { MethodUncertainty = 0.02 },
        Define.Figure("field.bars.weighted", FigureUnit.Tesla, "the same over the coil's end bars", "harmonics up to 31 of the field inside the end bars, each times its order", Sources.Field, x => Weighted(x, (w, b) => w.EndBars(b))) with { MethodUncertainty = 0.02 },
        Define.Figure("field.coil.lowest", FigureUnit.Tesla, "lowest flux density through the coil's thickness on a pole centre", "image sums over the coil's thickness", Sources.Field, x => Extreme(x, highest: false)) with { MethodUncertainty = 0.005 },
        Define.Figure("field.coil.highest", FigureUnit.Tesla, "highest flux density through the coil's thickness on a pole centre", "image sums over the coil's thickness", Sources.Field, x => Extreme(x, highest: true)) with { MethodUncertainty = 0.005 },
        Define.Figure("flux.pole", FigureUnit.Weber, "flux of one pole through the plane at the coil's middle, all radii", "integral of the harmonic solution between the interpole lines, times {magnet.remanence}", Sources.Field, PoleFluxAtCoil) with { MethodUncertainty = 0.005 },
        Define.Figure("force.attraction", FigureUnit.Newton, "total attraction between the rotor discs, or between rotor and plate", "Σ π∫ k·(T·M)² dk / 2μ0 over the plane where the field is normal", Sources.Field, Attraction) with { MethodUncertainty = 0.015 },
        Define.Figure("flux-density.back-iron", FigureUnit.Tesla, "flux density in the steel behind the magnets, linear solution", "half of the pole's flux over {rotor.back-iron.thickness} × {magnet.length}", new Basis(BasisKind.Derived, "continuity of flux: each disc carries half a pole's flux each way"), x => PlateFlux(x, "rotor.back-iron")) with { MethodUncertainty = 0.1 },
        Define.Figure("flux-density.return-plate", FigureUnit.Tesla, "flux density in the return plate, linear solution", "half of the pole's flux over {rotor.return-plate.thickness} × {magnet.length}", new Basis(BasisKind.Derived, "continuity of flux: the plate carries half a pole's flux each way"), x =>
            MachineParts.FacingOf(x) == Facing.Plate ? PlateFlux(x, "rotor.return-plate") : x.NotApplicable("there is no return plate")) with { MethodUncertainty = 0.1 },
        Define.Figure("saturation.linkage-loss", FigureUnit.Percent, "estimated loss of linkage in back iron past 1.6 T; it widens the linkage's uncertainty", "H of {flux-density.back-iron} on the steel's curve over half a pole pitch against the magnetomotive force of the gap", new Basis(BasisKind.Derived, "magnetic circuit of one pole with table bh-mild-steel"), SaturationLoss) with { MethodUncertainty = 0.5 },
    ];

    private static Outcome FreeOnAxis(Evaluation x, double distance)
    {
        double remanence = x.Figure("magnet.remanence");
        double thickness = x.Number("magnets.thickness");
        if (x.Part(MachineParts.Magnet) is not { } magnet || x.Incomplete)
        {
            return x.Stop();
        }

        return magnet.Outline.Shape == Physics.Geometry.MagnetShape.Disc
            ? x.Value(FreeMagnet.CylinderOnAxis(Cylinder(magnet.Outline, thickness, remanence), distance))
            : x.Value(FreeMagnet.BlockOnAxis(Block(magnet.Outline, thickness, remanence), distance));
    }

    private static Outcome StrayDistance(Evaluation x)
    {
        double remanence = x.Figure("magnet.remanence");
        double thickness = x.Number("magnets.thickness");
        if (x.Part(MachineParts.Magnet) is not { } magnet || x.Incomplete)
        {
            return x.Stop();
        }

        return magnet.Outline.Shape == Physics.Geometry.MagnetShape.Disc
            ? x.Value(FreeMagnet.CylinderReach(Cylinder(magnet.Outline, thickness, remanence), ImplantCaution))
            : x.Value(FreeMagnet.BlockReach(Block(magnet.Outline, thickness, remanence), ImplantCaution));
    }

    private static Outcome HandlingForce(Evaluation x)
    {
        double remanence = x.Figure("magnet.remanence");
        double thickness = x.Number("magnets.thickness");
        double area = x.Figure("magnet.face-area");
        if (x.Part(MachineParts.Magnet) is not { } magnet || x.Incomplete)
        {
            return x.Stop();
        }

        // Thick steel mirrors the magnet: at its face the normal field is that of one twice as thick, at its middle Br (1 - N).
        double middle = magnet.Outline.Shape == Physics.Geometry.MagnetShape.Disc
            ? 2 * FreeMagnet.CylinderOnAxis(Cylinder(magnet.Outline, 2 * thickness, remanence), 0)
            : MirroredBlock(magnet.Outline, thickness, remanence);
        middle = Math.Min(middle, remanence);
        return x.Value(middle * middle * area / (2 * MagneticConstant.Mu0));
    }

    /// <summary>Flux density in the middle of a block twice as thick, where its mirror image in steel meets it [T].</summary>
    private static double MirroredBlock(in Physics.Geometry.MagnetOutline magnet, double thickness, double remanence)
    {
        FreeBlock doubled = Block(magnet, 2 * thickness, remanence);
        return FreeMagnet.BlockField(doubled, 0, 0, -thickness).Z;
    }

    private static FreeCylinder Cylinder(in Physics.Geometry.MagnetOutline magnet, double thickness, double remanence) =>
        new() { Diameter = magnet.Length, Thickness = thickness, RemanentFluxDensity = remanence };

    private static FreeBlock Block(in Physics.Geometry.MagnetOutline magnet, double thickness, double remanence) => new()
    {
        Length = magnet.Length,
        Width = Physics.Geometry.MagnetPlacement.Extent(magnet),
        Thickness = thickness,
        RemanentFluxDensity = remanence,
    };

    private static Outcome MagnetMass(Evaluation x)
    {
        int rows = MachineParts.FacingOf(x) == Facing.Magnets ? 2 : 1;
        return x.Value(rows * x.Number("machine.poles") * x.Figure("magnet.face-area") * x.Number("magnets.thickness") * x.Figure("magnet.density"));
    }

    /// <summary>What recoil permeability and real plates leave of the ideal field.</summary>
    /// <param name="field">The solved field.</param>
    public static double Correction(SpectralField field) =>
        field.FluxLinkage(1).Harmonic(1) / field.IdealFluxLinkage(1).Harmonic(1);

    /// <summary>Field at a fraction of the coil's half thickness from its middle, on a pole centre.</summary>
    private static Outcome AtHeight(Evaluation x, double fraction)
    {
        double remanence = x.Figure("magnet.remanence");
        if (x.Part(Points) is not { } points || x.Part(FieldParts.Field) is not { } field || x.Incomplete)
        {
            return x.Stop();
        }

        double height = field.Layer.MidHeight + (fraction * 0.5 * field.Layer.Thickness);
        double value = points.NormalFluxDensity(points.Magnets.PitchRadius, 0, height, remanence) * Correction(field);
        return x.Value(Math.Abs(value));
    }

    private static Outcome Extreme(Evaluation x, bool highest)
    {
        double remanence = x.Figure("magnet.remanence");
        if (x.Part(Points) is not { } points || x.Part(FieldParts.Field) is not { } field || x.Incomplete)
        {
            return x.Stop();
        }

        const int Steps = 8;
        double extreme = highest ? double.NegativeInfinity : double.PositiveInfinity;
        for (int step = 0; step <= Steps; step++)
        {
            double height = field.Layer.LowestHeight + (field.Layer.Thickness * step / Steps);
            double value = Math.Abs(points.NormalFluxDensity(points.Magnets.PitchRadius, 0, height, remanence));
            extreme = highest ? Math.Max(extreme, value) : Math.Min(extreme, value);
        }

        return x.Value(extreme * Correction(field));
    }

    private static Outcome Fundamental(Evaluation x)
    {
        double remanence = x.Figure("magnet.remanence");
        return x.Part(Winding) is { } winding && x.Part(FieldParts.Field) is { } field && !x.Incomplete
            ? x.Value(Math.Abs(winding.NormalFundamental(field.Magnets.Geometry.PitchRadius, field.Layer.MidHeight, remanence)))
            : x.Stop();
    }

    private static Outcome Weighted(Evaluation x, Func<WindingField, double, WindingFieldSquares> squares)
    {
        double remanence = x.Figure("magnet.remanence");
        return x.Part(Winding) is { } winding && !x.Incomplete
            ? x.Value(Math.Sqrt(squares(winding, remanence).AcrossWire))
            : x.Stop();
    }

    private static Outcome PoleFluxAtCoil(Evaluation x)
    {
        double remanence = x.Figure("magnet.remanence");
        return x.Part(Flux) is { } flux && x.Part(FieldParts.Field) is { } field && !x.Incomplete
            ? x.Value(Math.Abs(flux.ThroughPlane(field.Layer.MidHeight, remanence)))
            : x.Stop();
    }

    private static Outcome Attraction(Evaluation x)
    {
        if (MachineParts.FacingOf(x) == Facing.Nothing)
        {
            return x.NotApplicable("nothing faces an open single rotor");
        }

        double remanence = x.Figure("magnet.remanence");
        double poles = MachineParts.IsLinear(x) ? x.Number("machine.poles") : 1;
        return x.Part(FieldParts.Field) is { } field && !x.Incomplete ? x.Value(poles * field.AttractionForce(remanence)) : x.Stop();
    }

    private static Outcome PlateFlux(Evaluation x, string section)
    {
        if (x.OptionalText(section) == "none" || x.OptionalText($"{section}.material") == "ideal")
        {
            return x.NotApplicable("there is no plate of finite thickness here");
        }

        double remanence = x.Figure("magnet.remanence");
        double thickness = x.Number($"{section}.thickness");
        return x.Part(Flux) is { } flux && !x.Incomplete ? x.Value(flux.PlateFluxDensity(thickness, remanence)) : x.Stop();
    }

    private static Outcome SaturationLoss(Evaluation x)
    {
        double density = Math.Max(x.OptionalFigure("flux-density.back-iron") ?? 0, x.OptionalFigure("flux-density.return-plate") ?? 0);
        if (density <= SaturationOnset)
        {
            return x.NotApplicable("the back iron stays below 1.6 T");
        }

        // Half a flux path: one disc over a pole pitch against one gap half with its magnet.
        double remanence = x.Figure("magnet.remanence");
        double magnets = x.Number("magnets.thickness");
        double path = x.Figure("magnet.pole-pitch");
        double force = 2 * remanence * magnets / MagneticConstant.Mu0;
        if (x.Incomplete)
        {
            return x.Stop();
        }

        double low = 0;
        double high = 1;
        for (int step = 0; step < 50; step++)
        {
            double share = 0.5 * (low + high);
            bool tooMuch = (share * force) + (SteelCurve.FieldStrength(share * density) * path / Math.PI) > force;
            (low, high) = tooMuch ? (low, share) : (share, high);
        }

        return x.Value(1 - low);
    }
}
