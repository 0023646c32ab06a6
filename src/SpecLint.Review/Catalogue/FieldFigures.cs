using SpecLint.Physics.Geometry;
using SpecLint.Physics.Magnetics;
using SpecLint.Review.Figures;
using SpecLint.Review.Rules;

namespace SpecLint.Review.Catalogue;

/// <summary>Figures of the gap field, of free magnets and of the forces between discs.</summary>
internal static class FieldFigures
{
    private const double ImplantCaution = 0.5e-3;
    private const double SaturationOnset = 1.6;
    private const double SaturationLimit = 1.8;

    /// <summary>The field over a pole's centre, up to the magnets' face.</summary>
    public static PartDefinition<PoleCentreField> PoleCentre { get; } = new("image sums of the field over a pole's centre", x => x.Part(FieldParts.RotorField) is { } solved ? new PoleCentreField(solved) : null);

    /// <summary>Flux of one pole.</summary>
    public static PartDefinition<PoleFlux> Flux { get; } = new("flux of one pole", x => x.Part(FieldParts.RotorField) is { } solved ? new PoleFlux(solved) : null);

    /// <summary>Harmonics of the field at the winding's height.</summary>
    public static PartDefinition<WindingField> Harmonics { get; } = new("harmonics of the field in the gap", x => x.Part(FieldParts.RotorField) is { } solved ? new WindingField(solved) : null);

    /// <summary>Harmonics of the field inside the winding.</summary>
    public static PartDefinition<WindingField> Winding { get; } = new("field inside the winding", x => x.Part(FieldParts.Field) is { } solved ? new WindingField(solved) : null);

    public static IEnumerable<FigureDefinition> All =>
    [
        Define.Figure("magnet.surface-field.centre", FigureUnit.Tesla, "one free magnet in air, on its axis at the face", "closed form for a uniformly magnetised block or cylinder with {magnet.remanence}", Sources.FreeMagnet, x => FreeOnAxis(x, 0)) with { MethodUncertainty = 0.01 },
        Define.Figure("magnet.surface-field.at-2mm", FigureUnit.Tesla, "one free magnet in air, on its axis 2 mm before the face", "closed form for a uniformly magnetised block or cylinder with {magnet.remanence}", Sources.FreeMagnet, x => FreeOnAxis(x, 2e-3)) with { MethodUncertainty = 0.01 },
        Define.Figure("magnet.surface-field.at-5mm", FigureUnit.Tesla, "one free magnet in air, on its axis 5 mm before the face", "closed form for a uniformly magnetised block or cylinder with {magnet.remanence}", Sources.FreeMagnet, x => FreeOnAxis(x, 5e-3)) with { MethodUncertainty = 0.01 },
        Define.Figure("magnet.stray-distance", FigureUnit.Distance, "distance on its axis at which one free magnet's field has fallen to 0.5 mT", "closed form of the free magnet solved for 0.5 mT", Sources.FreeMagnet, StrayDistance) with { MethodUncertainty = 0.02 },
        Define.Figure("magnet.handling-force", FigureUnit.Newton, "pull of one magnet in contact with thick, smooth steel; roughness and saturation lower it", "forces between the magnet's pole faces and their mirror images in the steel", Sources.FreeMagnet, HandlingForce) with { MethodUncertainty = 0.15 },
        Define.Figure("mass.magnets", FigureUnit.Kilogram, "mass of all magnets", "number of magnets × {magnet.face-area} × {magnets.thickness} × {magnet.density}", Sources.Geometry, MagnetMass),
        Define.Figure("magnet.face-area", FigureUnit.Area, "area of one magnet's face", "{magnet.extent} × {magnet.length}", Sources.Geometry, x => x.Value(x.Figure("magnet.extent") * x.Figure("magnet.length"))),
        Define.Figure("field.mid-coil.centre", FigureUnit.Tesla, "flux density normal to the coil at its middle, on a pole centre at the mean radius, magnets at 20 °C", "image sums of the magnets' charge sheets, corrected for recoil permeability and plates", Sources.Field, AtMiddle) with { MethodUncertainty = 0.005 },
        Define.Figure("field.mid-coil.fundamental", FigureUnit.Tesla, "fundamental of the flux density along the motion at the coil's middle height and the mean radius", "first harmonic of the harmonic solution at the mean radius, times {magnet.remanence}", Sources.Field, Fundamental) with { MethodUncertainty = 0.005 },
        Define.Figure("field.legs.weighted", FigureUnit.Tesla, "root of the mean over the legs of Σ(n·B_n)², field across the wire, peak amplitudes: what drives eddy currents", "harmonics up to 31 of the field inside the legs, each times its order", Sources.Field, x => Weighted(x, (w, b) => w.Legs(b))) with { MethodUncertainty = 0.02 },
        Define.Figure("field.bars.weighted", FigureUnit.Tesla, "the same over the coil's end bars", "harmonics up to 31 of the field inside the end bars, each times its order", Sources.Field, x => Weighted(x, (w, b) => w.EndBars(b))) with { MethodUncertainty = 0.02 },
        Define.Figure("field.coil.lowest", FigureUnit.Tesla, "lowest flux density through the coil's thickness on a pole centre", "image sums over the coil's thickness", Sources.Field, x => Extreme(x, e => e.Lowest)) with { MethodUncertainty = 0.005 },
        Define.Figure("field.coil.highest", FigureUnit.Tesla, "highest flux density through the coil's thickness on a pole centre", "image sums over the coil's thickness", Sources.Field, x => Extreme(x, e => e.Highest)) with { MethodUncertainty = 0.005 },
        Define.Figure("flux.pole", FigureUnit.Weber, "flux of one pole through the plane at the coil's middle, all radii", "integral of the harmonic solution between the interpole lines, times {magnet.remanence}", Sources.Field, PoleFluxAtCoil) with { MethodUncertainty = 0.005 },
        Define.Figure("force.attraction", FigureUnit.Newton, "total attraction between the rotor discs, or between rotor and plate", "Σ π∫ k·(T·M)² dk / 2μ0 over the plane where the field is normal", Sources.Field, Attraction) with { MethodUncertainty = 0.015 },
        Define.Figure("back-iron.permeability", FigureUnit.Ratio, "relative permeability of the steel behind the magnets", "{rotor.back-iron.material.relative-permeability}, or table steels at {rotor.back-iron.material}", Sources.PracticeTable, x => Permeability(x, "rotor.back-iron")),
        Define.Figure("return-plate.permeability", FigureUnit.Ratio, "relative permeability of the return plate", "{rotor.return-plate.material.relative-permeability}, or table steels at {rotor.return-plate.material}", Sources.PracticeTable, x =>
            MachineParts.FacingOf(x) == Facing.Plate ? Permeability(x, "rotor.return-plate") : x.NotApplicable("there is no return plate")),
        Define.Figure("back-iron.flux-density.usual", FigureUnit.Tesla, "flux density up to which the steel behind the magnets stays nearly ideal", "table steels at {rotor.back-iron.material}; 1.6 T where the permeability is stated in numbers", Sources.PracticeTable, x => Level(x, "rotor.back-iron", "warn-above", SaturationOnset)),
        Define.Figure("back-iron.flux-density.limit", FigureUnit.Tesla, "flux density past which the steel behind the magnets costs linkage fast", "table steels at {rotor.back-iron.material}; 1.8 T where the permeability is stated in numbers", Sources.PracticeTable, x => Level(x, "rotor.back-iron", "error-above", SaturationLimit)),
        Define.Figure("return-plate.flux-density.usual", FigureUnit.Tesla, "flux density up to which the return plate stays nearly ideal", "table steels at {rotor.return-plate.material}; 1.6 T where the permeability is stated in numbers", Sources.PracticeTable, x => Level(x, "rotor.return-plate", "warn-above", SaturationOnset)),
        Define.Figure("return-plate.flux-density.limit", FigureUnit.Tesla, "flux density past which the return plate costs linkage fast", "table steels at {rotor.return-plate.material}; 1.8 T where the permeability is stated in numbers", Sources.PracticeTable, x => Level(x, "rotor.return-plate", "error-above", SaturationLimit)),
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

        return magnet.Outline.Shape == MagnetShape.Disc
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

        return magnet.Outline.Shape == MagnetShape.Disc
            ? x.Value(FreeMagnet.CylinderReach(Cylinder(magnet.Outline, thickness, remanence), ImplantCaution))
            : x.Value(FreeMagnet.BlockReach(Block(magnet.Outline, thickness, remanence), ImplantCaution));
    }

    private static Outcome HandlingForce(Evaluation x)
    {
        double remanence = x.Figure("magnet.remanence");
        double thickness = x.Number("magnets.thickness");
        if (x.Part(MachineParts.Magnet) is not { } magnet || x.Incomplete)
        {
            return x.Stop();
        }

        return magnet.Outline.Shape == MagnetShape.Disc
            ? x.Value(FreeMagnet.CylinderPullOnSteel(Cylinder(magnet.Outline, thickness, remanence), 0))
            : x.Value(FreeMagnet.BlockPullOnSteel(Block(magnet.Outline, thickness, remanence), 0));
    }

    private static FreeCylinder Cylinder(in MagnetOutline magnet, double thickness, double remanence) =>
        new() { Diameter = magnet.Length, Thickness = thickness, RemanentFluxDensity = remanence };

    private static FreeBlock Block(in MagnetOutline magnet, double thickness, double remanence) => new()
    {
        Length = magnet.Length,
        Width = MagnetPlacement.Extent(magnet),
        Thickness = thickness,
        RemanentFluxDensity = remanence,
    };

    private static Outcome MagnetMass(Evaluation x)
    {
        int rows = MachineParts.FacingOf(x) == Facing.Magnets ? 2 : 1;
        return x.Value(rows * x.Number("machine.poles") * x.Figure("magnet.face-area") * x.Number("magnets.thickness") * x.Figure("magnet.density"));
    }

    private static Outcome AtMiddle(Evaluation x)
    {
        double remanence = x.Figure("magnet.remanence");
        return x.Part(PoleCentre) is { } centre && x.Part(FieldParts.RotorField) is { } field && !x.Incomplete
            ? x.Value(Math.Abs(centre.At(field.Layer.MidHeight, remanence)))
            : x.Stop();
    }

    private static Outcome Extreme(Evaluation x, Func<(double Lowest, double Highest), double> pick)
    {
        double remanence = x.Figure("magnet.remanence");
        return x.Part(PoleCentre) is { } centre && !x.Incomplete
            ? x.Value(Math.Abs(pick(centre.ThroughWinding(remanence))))
            : x.Stop();
    }

    private static Outcome Fundamental(Evaluation x)
    {
        double remanence = x.Figure("magnet.remanence");
        return x.Part(Harmonics) is { } winding && x.Part(FieldParts.RotorField) is { } field && !x.Incomplete
            ? x.Value(Math.Abs(winding.NormalFundamental(field.Magnets.Row.PitchRadius, field.Layer.MidHeight, remanence)))
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
        return x.Part(Flux) is { } flux && x.Part(FieldParts.RotorField) is { } field && !x.Incomplete
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
        return x.Part(FieldParts.RotorField) is { } field && !x.Incomplete ? x.Value(poles * field.AttractionForce(remanence)) : x.Stop();
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

    private static Outcome Permeability(Evaluation x, string section) =>
        x.OptionalText(section) == "none" || x.OptionalText($"{section}.material") == "ideal" ? x.NotApplicable("there is no plate of finite permeability here")
        : FieldParts.PermeabilityOf(x, section) is { } permeability ? x.Value(permeability)
        : x.Stop();

    private static Outcome Level(Evaluation x, string section, string column, double mildSteel)
    {
        if (x.OptionalText(section) == "none" || x.OptionalText($"{section}.material") == "ideal")
        {
            return x.NotApplicable("there is no steel here that saturates");
        }

        if (x.States($"{section}.material.relative-permeability"))
        {
            return x.Value(mildSteel);
        }

        string material = x.Text($"{section}.material");
        return x.Incomplete ? x.Stop()
            : EmbeddedRulebooks.Tables.Find("steels")?.FindRow("material", material)?.Number(column) is { } level ? x.Value(level)
            : x.NotApplicable($"the table of steels has no flux level for '{material}'");
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
