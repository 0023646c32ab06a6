using SpecLint.Review.Figures;
using SpecLint.Review.Rules;

namespace SpecLint.Review.Catalogue;

/// <summary>Figures that say how the machine can hurt someone.</summary>
internal static class SafetyFigures
{
    private const double SteelDensity = 7850;

    public static IEnumerable<FigureDefinition> All =>
    [
        Define.Figure("touch-voltage.limit", FigureUnit.Volt, "extra-low voltage between alternating lines, as a peak, up to which basic protection by insulation may be left out", "table of touch voltages, for the place of use in {environment.exposure}", new Basis(BasisKind.Standard, "IEC 61140:2016 and IEC 60364-4-41:2005 with amendment 1, clause 414"), TouchLimit),
        Define.Figure("energy.rotor", FigureUnit.Joule, "kinetic energy of discs, magnets and a plate that turns, at overspeed", "½ × (inertia of {rotor.back-iron}, of {rotor.return-plate} where it rotates, and of the magnets) × {speed.overspeed}²", Sources.Arithmetic, RotorEnergy) with { MethodUncertainty = 0.1 },
    ];

    private static Outcome TouchLimit(Evaluation x)
    {
        // Dry places: 25 V rms; all others 12 V rms. The figure is compared with the peak between the machine's own lines, which alternate
        // whatever stands behind them: the higher limits for direct voltage hold only past a bridge.
        string? exposure = x.OptionalText("environment.exposure");
        ReferenceRow? row = EmbeddedRulebooks.Tables.Find("touch-voltage")?.FindRow("case", exposure == "indoor" ? "dry" : "other");
        return row?.Number("alternating-peak") is not { } limit ? x.OutOfDomain("the table of touch voltages has no row for this place")
            : exposure is null ? x.Assume(limit, "the place of use is not stated and taken as not dry")
            : x.Value(limit);
    }

    private static Outcome RotorEnergy(Evaluation x)
    {
        if (MachineParts.IsLinear(x))
        {
            return x.NotApplicable("a linear machine has no flywheel");
        }

        double speed = x.Figure("speed.overspeed");
        double radius = x.Figure("magnet.mean-radius");
        double inertia = x.Figure("mass.magnets") * radius * radius;
        int discs = MachineParts.FacingOf(x) == Facing.Magnets ? 2 : 1;
        inertia += discs * DiscInertia(x, "rotor.back-iron");
        if (MachineParts.FacingOf(x) == Facing.Plate && (x.OptionalFlag("rotor.return-plate.rotates") ?? false))
        {
            inertia += DiscInertia(x, "rotor.return-plate");
        }

        return x.Value(0.5 * inertia * speed * speed);
    }

    /// <summary>Moment of inertia of a flat ring of the material stated [kg m²]; zero where there is none.</summary>
    private static double DiscInertia(Evaluation x, string section)
    {
        if (x.OptionalText(section) == "none" || x.OptionalText($"{section}.material") == "ideal")
        {
            return 0;
        }

        double outer = x.Number($"{section}.outer-radius");
        double inner = x.Number($"{section}.inner-radius");
        double thickness = x.Number($"{section}.thickness");
        string material = x.OptionalText($"{section}.material") ?? "";
        double density = EmbeddedRulebooks.Tables.Find("steels")?.FindRow("material", material)?.Number("density") ?? SteelDensity;
        return 0.5 * Math.PI * density * thickness * (Math.Pow(outer, 4) - Math.Pow(inner, 4));
    }
}
