using SpecLint.Physics.Geometry;
using SpecLint.Physics.Magnetics;
using SpecLint.Review.Figures;

namespace SpecLint.Review.Catalogue;

/// <summary>Figures of how far the magnets are from losing their magnetisation.</summary>
internal static class DemagnetisationFigures
{
    /// <summary>Share of the intrinsic coercivity up to which the demagnetisation line is taken as straight (the knee).</summary>
    private const double KneeShare = 0.9;

    /// <summary>Sampling of the magnet's volume and its finite remanence band, relative to the opposing field.</summary>
    private const double MethodBand = 0.04;

    private const string Knee = "1 − opposing field / (0.9 × least intrinsic coercivity)";

    /// <summary>Opposing field inside the installed magnet per tesla of remanence.</summary>
    public static PartDefinition<Shape<DemagnetisingField>> Installed { get; } = new("opposing field inside the installed magnet", x =>
        x.Part(FieldParts.Row) is { } row && x.Part(FieldParts.Layers) is { } layers
            ? new(DemagnetisingField.Of(row.Outline, layers.Outline))
            : null);

    /// <summary>Opposing field inside one magnet alone in air, per tesla of remanence.</summary>
    public static PartDefinition<Shape<DemagnetisingField>> Loose { get; } = new("opposing field inside a loose magnet", ReadLoose);

    public static IEnumerable<FigureDefinition> All =>
    [
        Define.Figure("permeance.coefficient", FigureUnit.Ratio, "permeance coefficient as installed, open circuit, mean of the magnet", "(1 − N) / N with N the mean demagnetising factor from the harmonic solution", Sources.Field, x =>
            x.Part(FieldParts.RotorField) is { } solved ? x.Value(solved.PermeanceCoefficient) : x.Stop()) with { MethodUncertainty = 0.02 },
        Define.Figure("permeance.coefficient.loose", FigureUnit.Ratio, "permeance coefficient of one magnet alone in air, mean of the magnet", "(1 − N) / N with N the mean demagnetising factor of the free magnet", Sources.FreeMagnet, x =>
            x.Part(Loose) is { } loose ? x.Value((1 - loose.Outline.Mean) / loose.Outline.Mean) : x.Stop()) with { MethodUncertainty = 0.05 },
        Define.Figure("demagnetisation.opposing-field", FigureUnit.FieldStrength, "opposing field exceeded in 1 % of the installed magnet's volume, open circuit, hottest", "image sums over the magnet's volume × {magnet.remanence.hot} / μ0", Sources.Field, x =>
            Opposing(x, Installed, "magnet.remanence.hot")) with { MethodUncertainty = 0.03 },
        Define.Figure("demagnetisation.opposing-field.cold", FigureUnit.FieldStrength, "opposing field exceeded in 1 % of the installed magnet's volume, open circuit, at the coldest ambient", "image sums over the magnet's volume × {magnet.remanence.cold} / μ0", Sources.Field, x =>
            Opposing(x, Installed, "magnet.remanence.cold")) with { MethodUncertainty = 0.03 },
        Define.Figure("demagnetisation.margin", FigureUnit.Ratio, "margin to the knee at open circuit, hottest", Knee + " from {demagnetisation.opposing-field} and {magnet.coercivity-intrinsic.hot}", Sources.Field, x =>
            HotMargin(x)) with { IsCoarse = true },
        Define.Figure("demagnetisation.margin.cold", FigureUnit.Ratio, "ferrite: margin to the knee at open circuit, at the coldest ambient", Knee + " from {demagnetisation.opposing-field.cold} and {magnet.coercivity-intrinsic.cold}", Sources.Field, x =>
            MagnetFigures.IsFerrite(x)
                ? Margin(x, "demagnetisation.opposing-field.cold", "magnet.coercivity-intrinsic.cold")
                : Known(x)),
        Define.Figure("demagnetisation.margin.loose", FigureUnit.Ratio, "margin to the knee of one unmounted magnet at the temperature of curing or hot storage", Knee + " of one magnet in air at {magnet.loose-temperature}", Sources.FreeMagnet, LooseMargin) with { MethodUncertainty = 0.03 },
        Define.Figure("magnet.loose-temperature", FigureUnit.Kelvin, "temperature that unmounted magnets meet: curing of the resin or hot storage", "60 °C", Sources.PracticeTable, x =>
            x.Assume(LooseTemperature, "hot storage or a warm cure, common practice")),
    ];

    private const double LooseTemperature = 333.15;

    private static Outcome Opposing(Evaluation x, PartDefinition<Shape<DemagnetisingField>> part, string remanence)
    {
        double flux = x.Figure(remanence);
        return x.Part(part) is { } opposing && !x.Incomplete
            ? x.Value(opposing.Outline.ExceededInOnePercent * flux / MagneticConstant.Mu0)
            : x.Stop();
    }

    private static Outcome Margin(Evaluation x, string opposing, string coercivity)
    {
        double field = x.Figure(opposing);
        double knee = KneeShare * x.Figure(coercivity);
        return x.Incomplete ? x.Stop() : x.Value(MarginOf(field, knee), MethodBand * Math.Min(1, field / Math.Max(knee, 1)));
    }

    /// <summary>
    /// The margin at the magnets' estimated temperature; its band is the distance to the margin at the favourable end of that estimate,
    /// computed there, because coercivity runs out faster than a straight line says.
    /// </summary>
    private static Outcome HotMargin(Evaluation x)
    {
        double field = x.Figure("demagnetisation.opposing-field");
        double hot = x.Figure("magnet.remanence.hot");
        double margin = MarginOf(field, KneeShare * x.Figure("magnet.coercivity-intrinsic.hot"));
        double remanence = x.Figure("magnet.remanence");
        double coercivity = x.Figure("magnet.coercivity-intrinsic");
        double remanenceSlope = x.Figure("magnet.remanence-coefficient");
        double coercivitySlope = x.Figure("magnet.coercivity-coefficient");
        double temperature = x.Figure("temperature.magnet");
        if (x.Incomplete)
        {
            return x.Stop();
        }

        double band = x.Look("temperature.magnet").Uncertainty;
        double best = margin;
        foreach (double end in (ReadOnlySpan<double>)[temperature - band, temperature + band])
        {
            double rise = end - MagnetFigures.ReferenceTemperature;
            double fieldThere = field * remanence * (1 + (remanenceSlope * rise)) / Math.Max(hot, double.Epsilon);
            best = Math.Max(best, MarginOf(fieldThere, KneeShare * coercivity * (1 + (coercivitySlope * rise))));
        }

        return x.Value(margin, double.Hypot(best - margin, MethodBand * (1 - margin)));
    }

    /// <summary>1 − opposing field / knee; −1 where the field is twice the knee and more, or no coercivity is left.</summary>
    private static double MarginOf(double field, double knee) => knee > 0 ? Math.Max(-1, 1 - (field / knee)) : -1;

    private static Outcome Known(Evaluation x) =>
        x.Look("magnet.coercivity-coefficient").HasValue
            ? x.NotApplicable("only ferrite loses coercivity in the cold")
            : Lacking(x);

    private static Outcome Lacking(Evaluation x)
    {
        _ = x.Figure("magnet.coercivity-coefficient");
        return x.Stop();
    }

    private static Outcome LooseMargin(Evaluation x)
    {
        double temperature = x.Figure("magnet.loose-temperature");
        double rise = temperature - MagnetFigures.ReferenceTemperature;
        double remanence = x.Figure("magnet.remanence") * (1 + (x.Figure("magnet.remanence-coefficient") * rise));
        double coercivity = x.Figure("magnet.coercivity-intrinsic") * (1 + (x.Figure("magnet.coercivity-coefficient") * rise));
        if (x.Part(Loose) is not { } loose || x.Incomplete)
        {
            return x.Stop();
        }

        double ratio = loose.Outline.ExceededInOnePercent * remanence / MagneticConstant.Mu0 / (KneeShare * Math.Max(coercivity, 1));
        return x.Value(1 - ratio, 0.05 * ratio);
    }

    private static Shape<DemagnetisingField>? ReadLoose(Evaluation x)
    {
        if (x.Part(FieldParts.Row) is not { } row || x.Part(FieldParts.Layers) is not { } layers)
        {
            return null;
        }

        // A row stretched until the neighbours no longer matter, without steel, is one magnet in air.
        const double Apart = 40;
        MagneticLayers alone = layers.Outline with { Behind = SteelPlate.None, Opposite = OppositeSide.Open, OppositePlate = SteelPlate.None, Gap = 0 };
        MagnetRow magnet = row.Outline;
        double reach = Math.Max(magnet.Length, magnet.Width);
        MagnetRow lone = magnet.Shape == MagnetShape.Disc
            ? MagnetRow.LinearDisc(Apart * magnet.Length, magnet.Length)
            : MagnetRow.LinearBlock(Apart * reach, magnet.Length, Math.Max(magnet.Width, x.Figure("magnet.extent")));
        return new(DemagnetisingField.Of(lone, alone));
    }
}
