using SpecLint.Review.Figures;
using SpecLint.Review.Rules;

namespace SpecLint.Review.Catalogue;

/// <summary>What the trade's tables give for this machine: clearances, fill, current density, class temperature, ambient.</summary>
internal static class PracticeFigures
{
    private const double Celsius = 273.15;

    public static IEnumerable<FigureDefinition> All =>
    [
        Define.Figure("clearance.practice", FigureUnit.Metre, "least running clearance of common practice for this kind and diameter", "table running-clearance at {machine.topology} and {machine.outer-diameter}", Sources.PracticeTable, Clearance),
        Define.Figure("fill.reachable", FigureUnit.Ratio, "copper fill beyond what the stated winding method reaches", "table fill-practice at {winding.method}", Sources.PracticeTable, x => Fill(x, "error-above")),
        Define.Figure("fill.usual", FigureUnit.Ratio, "copper fill that the stated winding method reaches with care", "table fill-practice at {winding.method}", Sources.PracticeTable, x => Fill(x, "warn-above")),
        Define.Figure("current.density.practice", FigureUnit.CurrentDensity, "customary continuous current density for the stated cooling", "table current-density at {environment.cooling.method}", Sources.PracticeTable, x => Density(x, "warn-above")),
        Define.Figure("current.density.limit", FigureUnit.CurrentDensity, "continuous current density past all practice for the stated cooling", "table current-density at {environment.cooling.method}", Sources.PracticeTable, x => Density(x, "error-above")),
        Define.Figure("temperature.class", FigureUnit.Kelvin, "hot-spot temperature of the insulation: the lower of the insulation class and the wire's thermal class", "table insulation-classes at {ratings.insulation-class}; {winding.wire.thermal-class}", new Basis(BasisKind.Standard, "IEC 60085:2007, thermal classes"), ClassTemperature),
        Define.Figure("spec.tolerances.missing", FigureUnit.Ratio, "how many of clearance, magnet thickness and remanence carry no tolerance; a named grade counts as one for the remanence", "count over {gap.clearance}, {magnets.thickness}, {magnets.material.remanence} or {magnets.grade}", Sources.Arithmetic, MissingTolerances),
        Define.Figure("ambient.temperature", FigureUnit.Kelvin, "hottest ambient", "{environment.ambient.max}, {environment.ambient} or {ratings.ambient}; 40 °C where none is stated", new Basis(BasisKind.Standard, "IEC 60034-1, 40 °C reference ambient (from memory)"), Ambient),
        Define.Figure("ambient.temperature.least", FigureUnit.Kelvin, "coldest ambient", "{environment.ambient.min}; by {environment.exposure} where it is not stated", Sources.PracticeTable, LeastAmbient),
    ];

    private static Outcome Clearance(Evaluation x)
    {
        string kind = x.Text("machine.topology");
        double size = MachineParts.IsLinear(x) ? x.Figure("magnet.length") : x.Figure("machine.outer-diameter");
        if (x.Incomplete)
        {
            return x.Stop();
        }

        ReferenceRow? row = EmbeddedRulebooks.Tables.Find("running-clearance")?.FindRow(r =>
            r.Text("kind") == kind && r.Number("diameter-from") <= size && size < r.Number("diameter-to"));
        return row?.Number("warn-below") is { } least
            ? x.Value(Math.Max(least, (row.Number("diameter-share") ?? 0) * size))
            : x.OutOfDomain("the table of running clearances has no row for this size");
    }

    private static Outcome Fill(Evaluation x, string column)
    {
        string method = x.Text("winding.method");
        return x.Incomplete ? x.Stop()
            : EmbeddedRulebooks.Tables.Find("fill-practice")?.FindRow("method", method)?.Number(column) is { } fill ? x.Value(fill)
            : x.OutOfDomain($"the table of fill factors has no row for '{method}'");
    }

    private static Outcome Density(Evaluation x, string column)
    {
        string cooling = x.Text("environment.cooling.method");
        return x.Incomplete ? x.Stop()
            : EmbeddedRulebooks.Tables.Find("current-density")?.FindRow("cooling", cooling)?.Number(column) is { } density ? x.Value(density)
            : x.OutOfDomain($"the table of current densities has no row for '{cooling}'");
    }

    private static Outcome ClassTemperature(Evaluation x)
    {
        double least = double.PositiveInfinity;
        if (x.OptionalText("ratings.insulation-class") is { } letter
            && EmbeddedRulebooks.Tables.Find("insulation-classes")?.FindRow("class", letter)?.Number("temperature") is { } ofClass)
        {
            least = ofClass;
        }

        if (x.Optional("winding.wire.thermal-class") is { } ofWire)
        {
            // The spec writes the class as a bare number of degrees Celsius, as IEC 60085 does.
            least = Math.Min(least, ofWire + Celsius);
        }

        if (double.IsPositiveInfinity(least))
        {
            x.Miss("ratings.insulation-class");
        }

        return x.Value(least);
    }

    private static Outcome MissingTolerances(Evaluation x)
    {
        int missing = 0;
        foreach (string key in (ReadOnlySpan<string>)["gap.clearance", "magnets.thickness"])
        {
            missing += x.Find(key) is { HasTolerance: true } ? 0 : 1;
        }

        bool remanence = x.Find("magnets.material.remanence") is { } stated ? stated.HasTolerance : x.States("magnets.grade");
        return x.Value(missing + (remanence ? 0 : 1), 0);
    }

    private static Outcome Ambient(Evaluation x) =>
        x.Optional("environment.ambient.max") is { } greatest ? x.Value(greatest)
        : x.Optional("environment.ambient") is { } single ? x.Value(single)
        : x.Optional("ratings.ambient") is { } rated ? x.Value(rated)
        : x.Assume(40 + Celsius, "IEC 60034-1 reference ambient (from memory)");

    private static Outcome LeastAmbient(Evaluation x) =>
        x.Optional("environment.ambient.min") is { } least ? x.Value(least)
        : x.OptionalText("environment.exposure") == "indoor" ? x.Assume(Celsius, "indoors, common practice")
        : x.Assume(-20 + Celsius, "outdoors in a temperate climate, common practice");
}
