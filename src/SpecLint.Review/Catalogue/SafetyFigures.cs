using SpecLint.Review.Figures;
using SpecLint.Review.Rules;

namespace SpecLint.Review.Catalogue;

/// <summary>Figures that say how the machine can hurt someone.</summary>
internal static class SafetyFigures
{
    private const double SteelDensity = 7850;

    public static IEnumerable<FigureDefinition> All =>
    [
        Define.Figure("touch-voltage.limit", FigureUnit.Volt, "extra-low voltage, as a peak or direct value, up to which basic protection by insulation may be left out", "table of touch voltages, for the place of use in {environment.exposure}", new Basis(BasisKind.Standard, "IEC 61140:2016 and IEC 60364-4-41:2005 with amendment 1, clause 414"), TouchLimit),
        Define.Figure("energy.rotor", FigureUnit.Joule, "kinetic energy of discs and magnets at overspeed", "½ × (inertia of {rotor.back-iron} and magnets) × {speed.overspeed}²", Sources.Arithmetic, RotorEnergy) with { MethodUncertainty = 0.1 },
    ];

    private static Outcome TouchLimit(Evaluation x)
    {
        // Dry places: 25 V rms or 60 V direct; all others 12 V rms or 30 V direct. The figure is compared with peaks.
        bool dry = x.OptionalText("environment.exposure") == "indoor";
        string where = dry ? "dry, indoors" : "any other place";
        bool direct = x.Look("voltage.overspeed.direct").HasValue;
        ReferenceRow? row = EmbeddedRulebooks.Tables.Find("touch-voltage")?.FindRow("case", dry ? "dry" : "other");
        return row?.Number(direct ? "direct" : "alternating-peak") is { } limit
            ? x.Value(limit)
            : x.OutOfDomain($"the table of touch voltages has no row for {where}");
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
        double outer = x.Number("rotor.back-iron.outer-radius");
        double inner = x.Number("rotor.back-iron.inner-radius");
        double thickness = x.Number("rotor.back-iron.thickness");
        int discs = MachineParts.FacingOf(x) == Facing.Magnets ? 2 : 1;
        double disc = 0.5 * Math.PI * SteelDensity * thickness * (Math.Pow(outer, 4) - Math.Pow(inner, 4));
        return x.Value(0.5 * (inertia + (discs * disc)) * speed * speed);
    }
}
