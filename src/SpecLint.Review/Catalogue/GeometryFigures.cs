using SpecLint.Physics.Geometry;
using SpecLint.Review.Figures;

namespace SpecLint.Review.Catalogue;

/// <summary>Figures that follow from the dimensions alone.</summary>
internal static class GeometryFigures
{
    public static IEnumerable<FigureDefinition> All =>
    [
        Define.Figure("machine.pole-pairs", FigureUnit.Ratio, "pole pairs", "{machine.poles} / 2", Sources.Arithmetic, x =>
        {
            int poles = x.Count("machine.poles");
            return poles < 2 || poles % 2 != 0 ? x.OutOfDomain("poles come in pairs") : x.Value(poles / 2);
        }),
        Define.Figure("machine.outer-diameter", FigureUnit.Metre, "largest diameter of discs, magnets and coils", "2 × the largest radius of {rotor.back-iron.outer-radius}, magnets and coils", Sources.Geometry, OuterDiameter),
        Define.Figure("gap.magnetic", FigureUnit.Metre, "magnet face to the opposite magnet face, return plate or iron", "{winding.coil.thickness} + clearances and covers of both sides", Sources.Geometry, MagneticGap),
        Define.Figure("magnet.mean-radius", FigureUnit.Metre, "radius of the magnet centre", "{magnets.pitch-radius}, or the middle between {magnets.inner-radius} and {magnets.outer-radius}", Sources.Geometry, MeanRadius),
        Define.Figure("magnet.pole-pitch", FigureUnit.Metre, "pole pitch at the magnets' mean radius", "2π × {magnet.mean-radius} / {machine.poles}; linear: {magnets.pole-pitch}", Sources.Geometry, PolePitch),
        Define.Figure("magnet.extent", FigureUnit.Metre, "magnet extent along the motion as a mean chord", "area of the magnet face over its extent across the motion", Sources.Geometry, x =>
            x.Part(MachineParts.Magnet) is { } magnet ? x.Value(MagnetPlacement.Extent(magnet.Outline)) : x.Stop()),
        Define.Figure("magnet.length", FigureUnit.Metre, "magnet extent across the motion", "{magnets.length}, {magnets.diameter}, or outer less inner radius of a sector", Sources.Geometry, x =>
            x.Part(MachineParts.Magnet) is { } magnet ? x.Value(magnet.Outline.Length) : x.Stop()),
        Define.Figure("magnet.pole-arc", FigureUnit.Ratio, "magnet extent over pole pitch at the mean radius", "{magnet.extent} / {magnet.pole-pitch}", Sources.Geometry, x =>
            x.Value(x.Figure("magnet.extent") / x.Figure("magnet.pole-pitch"))),
        Define.Figure("magnet.spacing", FigureUnit.Metre, "space between neighbouring magnets at the mean radius", "{magnet.pole-pitch} less the magnet's greatest extent along the motion", Sources.Geometry, Spacing),
        Define.Figure("magnet.spacing.innermost", FigureUnit.Metre, "least space between neighbouring magnets; negative where they overlap", "distance of the magnet's outline from the line midway to its neighbour, doubled", Sources.Geometry, InnermostSpacing),
        Define.Figure("magnet.thickness.path", FigureUnit.Metre, "total magnet thickness in the path of one gap", "{magnets.thickness} × the number of magnets that face each other", Sources.Geometry, x =>
            x.Value(x.Number("magnets.thickness") * (MachineParts.FacingOf(x) == Facing.Magnets ? 2 : 1))),
        Define.Figure("coil.hole.extent", FigureUnit.Metre, "hole extent along the motion as a mean chord", "hole area over hole length", Sources.Geometry, x =>
            x.Part(MachineParts.Coil) is { } coil ? x.Value(CoilGeometry.HoleExtent(coil.Outline)) : x.Stop()),
        Define.Figure("coil.hole.length", FigureUnit.Metre, "hole extent across the motion", "{winding.coil.hole-length}, or the bore of a round coil", Sources.Geometry, x =>
            x.Part(MachineParts.Coil) is { } coil ? x.Value(coil.Outline.HoleLength) : x.Stop()),
        Define.Figure("coil.leg.span", FigureUnit.Metre, "distance between the leg centres at the coil's pitch radius", "area of the middle turn over its extent across the motion", Sources.Geometry, x =>
            x.Part(MachineParts.Coil) is { } coil ? x.Value(CoilGeometry.LegCentreSpan(coil.Outline)) : x.Stop()),
        Define.Figure("coil.section", FigureUnit.Area, "winding cross-section of one leg", "{winding.coil.leg-width} × {winding.coil.thickness}", Sources.Geometry, x =>
            x.Part(MachineParts.Coil) is { } coil ? x.Value(CoilGeometry.CrossSection(coil.Outline)) : x.Stop()),
        Define.Figure("coil.turn-length.mean", FigureUnit.Metre, "mean length of one turn", "length of the middle turn of the winding cross-section", Sources.Geometry, x =>
            x.Part(MachineParts.Coil) is { } coil ? x.Value(CoilGeometry.MeanTurnLength(coil.Outline)) : x.Stop()),
        Define.Figure("coil.spacing.innermost", FigureUnit.Metre, "least space between neighbouring coils; negative where they overlap", "distance of the coil's outline from the line midway to its neighbour, doubled", Sources.Geometry, CoilSpacing),
        Define.Figure("coil.radius.innermost", FigureUnit.Metre, "nearest the coils come to the shaft axis", "pitch radius less half the hole and the end bar", Sources.Geometry, x =>
            MachineParts.IsLinear(x) ? x.NotApplicable("a linear machine has no axis")
            : x.Part(MachineParts.Coil) is { } coil ? x.Value(CoilPlacement.InnermostRadius(coil.Outline)) : x.Stop()),
        Define.Figure("coil.radius.outermost", FigureUnit.Metre, "farthest the coils reach from the shaft axis", "outer corners of the coil", Sources.Geometry, x =>
            MachineParts.IsLinear(x) ? x.NotApplicable("a linear machine has no axis")
            : x.Part(MachineParts.Coil) is { } coil ? x.Value(CoilPlacement.OutermostRadius(coil.Outline)) : x.Stop()),
        Define.Figure("coil.radial-offset", FigureUnit.Metre, "distance between the coil's and the magnet's pitch radius", "|{winding.coil.pitch-radius} − {magnet.mean-radius}|", Sources.Geometry, x =>
            MachineParts.IsLinear(x) ? x.NotApplicable("a linear machine has no radius")
            : x.Part(MachineParts.Coil) is { } coil ? x.Value(Math.Abs(coil.Outline.PitchRadius - x.Figure("magnet.mean-radius"))) : x.Stop()),
        Define.Figure("stator.room", FigureUnit.Metre, "least room between the coils and hub, studs and housing, as far as they are stated", "least of {coil.radius.innermost} less {stator.hub-radius} or half of {stator.stud-circle}, and {stator.housing-radius} or half of {stator.fixings.circle} less {coil.radius.outermost}", Sources.Geometry, StatorRoom),
        Define.Figure("back-iron.overhang", FigureUnit.Metre, "least distance of a magnet's edge inside the edge of its steel; negative where it hangs over", "least of {rotor.back-iron.outer-radius} less the magnet's outermost point and its innermost point less {rotor.back-iron.inner-radius}", Sources.Geometry, BackIronOverhang),
        Define.Figure("speed.rim", FigureUnit.Velocity, "speed of the rim at overspeed", "{speed.overspeed} × {machine.outer-diameter} / 2", Sources.Geometry, x =>
            MachineParts.IsLinear(x) ? x.NotApplicable("a linear machine has no rim")
            : x.Value(x.Figure("speed.overspeed") * x.Figure("machine.outer-diameter") / 2)),
    ];

    private static Outcome OuterDiameter(Evaluation x)
    {
        if (MachineParts.IsLinear(x))
        {
            return x.NotApplicable("a linear machine has no diameter");
        }

        if (x.Part(MachineParts.Magnet) is not { } magnet)
        {
            return x.Stop();
        }

        double radius = MagnetPlacement.OutermostRadius(magnet.Outline);
        radius = Math.Max(radius, x.Optional("rotor.back-iron.outer-radius") ?? 0);
        radius = Math.Max(radius, x.OptionalFigure("coil.radius.outermost") ?? 0);
        return x.Value(2 * radius);
    }

    private static Outcome MagneticGap(Evaluation x)
    {
        double near = x.Number("gap.clearance") + (x.Optional("gap.cover") ?? 0);
        double far = (x.Optional("gap.far-clearance") ?? x.Number("gap.clearance")) + (x.Optional("gap.cover") ?? 0);
        double thickness = x.Number("winding.coil.thickness");
        return MachineParts.FacingOf(x) switch
        {
            Facing.Magnets => x.Value(thickness + (2 * near)),
            Facing.Plate => x.Value(thickness + near + far),
            _ => x.NotApplicable("nothing faces an open single rotor"),
        };
    }

    private static Outcome MeanRadius(Evaluation x) =>
        MachineParts.IsLinear(x) ? x.NotApplicable("a linear machine has no radius")
        : x.Text("magnets.shape") == "sector" ? x.Value(0.5 * (x.Number("magnets.inner-radius") + x.Number("magnets.outer-radius")))
        : x.Value(x.Number("magnets.pitch-radius"));

    private static Outcome PolePitch(Evaluation x) =>
        MachineParts.IsLinear(x) ? x.Value(x.Number("magnets.pole-pitch"))
        : x.Value(2 * Math.PI * x.Figure("magnet.mean-radius") / x.Number("machine.poles"));

    private static Outcome Spacing(Evaluation x)
    {
        double pitch = x.Figure("magnet.pole-pitch");
        if (x.Part(MachineParts.Magnet) is not { } magnet)
        {
            return x.Stop();
        }

        double extent = magnet.Outline.Shape == MagnetShape.Sector ? MagnetPlacement.Extent(magnet.Outline) : magnet.Outline.Width;
        return x.Value(pitch - extent);
    }

    private static Outcome InnermostSpacing(Evaluation x)
    {
        int poles = x.Count("machine.poles");
        bool linear = MachineParts.IsLinear(x);
        if (x.Part(MachineParts.Magnet) is not { } magnet || x.Incomplete)
        {
            return x.Stop();
        }

        return linear ? x.Value(MagnetPlacement.SpaceInRow(magnet.Outline, x.Figure("magnet.pole-pitch")))
            : poles < 2 ? x.OutOfDomain("a rotor needs at least two magnets")
            : x.Value(MagnetPlacement.SpaceBetweenMagnets(magnet.Outline, poles));
    }

    private static Outcome CoilSpacing(Evaluation x)
    {
        int coils = x.Count("winding.coils");
        int poles = x.Count("machine.poles");
        bool linear = MachineParts.IsLinear(x);
        if (x.Part(MachineParts.Coil) is not { } coil || x.Incomplete)
        {
            return x.Stop();
        }

        return coils < 2 ? x.NotApplicable("a single coil has no neighbour")
            : linear ? x.Value(CoilPlacement.SpaceInRow(coil.Outline, x.Figure("magnet.pole-pitch") * poles / coils))
            : x.Value(CoilPlacement.SpaceBetweenCoils(coil.Outline, coils));
    }

    private static Outcome StatorRoom(Evaluation x)
    {
        if (MachineParts.IsLinear(x))
        {
            return x.NotApplicable("a linear machine has no hub or housing");
        }

        double room = double.PositiveInfinity;
        if (x.Optional("stator.hub-radius") is { } hub)
        {
            room = Math.Min(room, x.Figure("coil.radius.innermost") - hub);
        }

        if (x.Optional("stator.housing-radius") is { } housing)
        {
            room = Math.Min(room, housing - x.Figure("coil.radius.outermost"));
        }

        if (x.Optional("stator.stud-circle") is { } studs)
        {
            room = Math.Min(room, x.Figure("coil.radius.innermost") - (studs / 2));
        }

        if (x.Optional("stator.fixings.circle") is { } fixings)
        {
            room = Math.Min(room, (fixings / 2) - ((x.Optional("stator.fixings.size") ?? 0) / 2) - x.Figure("coil.radius.outermost"));
        }

        if (double.IsPositiveInfinity(room))
        {
            x.Miss("stator.housing-radius");
        }

        return x.Value(room);
    }

    private static Outcome BackIronOverhang(Evaluation x)
    {
        if (MachineParts.IsLinear(x))
        {
            return x.NotApplicable("the track's steel is taken as wide as its magnets");
        }

        if (x.OptionalText("rotor.back-iron") == "none" || x.OptionalText("rotor.back-iron.material") == "ideal")
        {
            return x.NotApplicable("there is no steel with an edge behind the magnets");
        }

        double outer = x.Number("rotor.back-iron.outer-radius");
        double inner = x.Number("rotor.back-iron.inner-radius");
        if (x.Part(MachineParts.Magnet) is not { } magnet)
        {
            return x.Stop();
        }

        double innermost = magnet.Outline.PitchRadius - (0.5 * magnet.Outline.Length);
        return x.Value(Math.Min(outer - MagnetPlacement.OutermostRadius(magnet.Outline), innermost - inner));
    }
}
