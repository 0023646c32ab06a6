using SpecLint.Review.Figures;
using SpecLint.Review.Rules;
using SpecLint.Tests.Review.Catalogue;

namespace SpecLint.Tests.Review.Rules;

/// <summary>The wire tables against the gauge law of ASTM B258, the areas of circles and the resistances that follow.</summary>
public sealed class WireTableTests
{
    private const double Millimetre = 1e-3;

    /// <summary>Annealed copper, 58 MS/m (IEC 60028), 0.017241 ohm·mm²/m; nominal resistances of IEC 60317 lists rest on 1/58.5.</summary>
    private const double Annealed = 1.7241e-8;

    /// <summary>
    /// Gauge, area [mm²] and resistance [ohm/m at 20 °C] after ASTM B258 and annealed copper, to four digits; greatest overall
    /// diameters [mm] in grades 1 and 2 with the build of the next larger preferred size (IEC 60317-0-1, derived).
    /// </summary>
    public static TheoryData<int, double, double, double, double> Gauges => new()
    {
        { 5, 16.77, 0.001028, 4.714, 4.762 },
        { 6, 13.3, 0.001296, 4.206, 4.252 },
        { 7, 10.55, 0.001634, 3.753, 3.798 },
        { 8, 8.366, 0.002061, 3.349, 3.393 },
        { 9, 6.634, 0.002599, 2.989, 3.032 },
        { 10, 5.261, 0.003277, 2.668, 2.71 },
        { 11, 4.172, 0.004132, 2.383, 2.423 },
        { 12, 3.309, 0.005211, 2.129, 2.168 },
        { 13, 2.624, 0.006571, 1.902, 1.94 },
        { 14, 2.081, 0.008285, 1.7, 1.737 },
        { 15, 1.65, 0.01045, 1.52, 1.556 },
        { 16, 1.309, 0.01317, 1.359, 1.393 },
        { 17, 1.038, 0.01661, 1.216, 1.249 },
        { 18, 0.823, 0.02095, 1.088, 1.121 },
        { 19, 0.6527, 0.02641, 0.974, 1.006 },
        { 20, 0.5176, 0.03331, 0.871, 0.901 },
        { 21, 0.4105, 0.042, 0.778, 0.807 },
        { 22, 0.3255, 0.05296, 0.696, 0.723 },
        { 23, 0.2582, 0.06678, 0.622, 0.647 },
        { 24, 0.2047, 0.08421, 0.557, 0.581 },
        { 25, 0.1624, 0.1062, 0.499, 0.521 },
        { 26, 0.1288, 0.1339, 0.446, 0.468 },
        { 27, 0.1021, 0.1689, 0.4, 0.42 },
        { 28, 0.08098, 0.2129, 0.358, 0.377 },
        { 29, 0.06422, 0.2685, 0.32, 0.338 },
        { 30, 0.05093, 0.3385, 0.287, 0.304 },
        { 31, 0.04039, 0.4269, 0.258, 0.274 },
        { 32, 0.03203, 0.5383, 0.23, 0.244 },
        { 33, 0.0254, 0.6788, 0.204, 0.217 },
        { 34, 0.02014, 0.856, 0.184, 0.197 },
        { 35, 0.01597, 1.079, 0.165, 0.177 },
        { 36, 0.01267, 1.361, 0.147, 0.158 },
        { 37, 0.01005, 1.716, 0.132, 0.142 },
        { 38, 0.007967, 2.164, 0.119, 0.128 },
    };

    /// <summary>Bare diameter [mm], area [mm²], nominal resistance [ohm/m at 20 °C], to four digits.</summary>
    public static TheoryData<double, double, double> Metric => new()
    {
        { 0.1, 0.007854, 2.176 },
        { 0.112, 0.009852, 1.735 },
        { 0.125, 0.01227, 1.393 },
        { 0.14, 0.01539, 1.11 },
        { 0.16, 0.02011, 0.8502 },
        { 0.18, 0.02545, 0.6718 },
        { 0.2, 0.03142, 0.5441 },
        { 0.224, 0.03941, 0.4338 },
        { 0.25, 0.04909, 0.3482 },
        { 0.28, 0.06158, 0.2776 },
        { 0.315, 0.07793, 0.2193 },
        { 0.355, 0.09898, 0.1727 },
        { 0.4, 0.1257, 0.136 },
        { 0.45, 0.159, 0.1075 },
        { 0.5, 0.1963, 0.08706 },
        { 0.56, 0.2463, 0.0694 },
        { 0.63, 0.3117, 0.05484 },
        { 0.71, 0.3959, 0.04318 },
        { 0.8, 0.5027, 0.03401 },
        { 0.9, 0.6362, 0.02687 },
        { 1.0, 0.7854, 0.02176 },
        { 1.12, 0.9852, 0.01735 },
        { 1.25, 1.227, 0.01393 },
        { 1.4, 1.539, 0.0111 },
        { 1.6, 2.011, 0.008502 },
        { 1.8, 2.545, 0.006718 },
        { 2.0, 3.142, 0.005441 },
        { 2.24, 3.941, 0.004338 },
        { 2.5, 4.909, 0.003482 },
        { 2.8, 6.158, 0.002776 },
        { 3.15, 7.793, 0.002193 },
        { 3.55, 9.898, 0.001727 },
        { 4.0, 12.57, 0.00136 },
        { 4.5, 15.9, 0.001075 },
        { 5.0, 19.63, 0.0008706 },
    };

    public static TheoryData<string> Tables => [.. EmbeddedRulebooks.Tables.Tables.Select(t => t.Name)];

    [Theory]
    [MemberData(nameof(Gauges))]
    public void Gauge_SectionAndResistancePerMetre_AreThoseOfTheLaw(int gauge, double area, double resistance, double grade1, double grade2)
    {
        FigureGraph figures = Wire($"AWG {gauge}", "grade-1");

        Machines.Near(area * 1e-6, figures.Value("wire.section"), 5.1e-4);
        Machines.Near(resistance * 10, figures.Value("resistance.coil.cold") / figures.Value("coil.turn-length.mean"), 5.1e-4);
        Assert.Equal(grade1, figures.Value("wire.overall-diameter") / Millimetre, 6e-4);
        Assert.Equal(grade2, Wire($"AWG {gauge}", "grade-2").Value("wire.overall-diameter") / Millimetre, 6e-4);
        Assert.Equal(1, figures.Value("wire.stocked"));
    }

    [Fact]
    public void GaugeTable_EveryRow_HasTheDiameterOfTheLawAndTheBuildOfTheNextLargerSize()
    {
        ReferenceTable metric = EmbeddedRulebooks.Tables.Find("wire-metric")!;
        foreach (ReferenceRow row in EmbeddedRulebooks.Tables.Find("wire-awg-enamel")!.Rows)
        {
            double law = 0.127e-3 * Math.Pow(92, (36 - row.Number("awg")!.Value) / 39);
            Machines.Near(law, row.Number("diameter")!.Value, 5.1e-4);
            ReferenceRow next = metric.FindRow(r => r.Number("diameter") >= law)!;
            Assert.Equal(next.Number("diameter"), row.Number("build-from"));
            foreach (string grade in (string[])["overall-grade-1", "overall-grade-2"])
            {
                Assert.Equal(law + next.Number(grade)!.Value - next.Number("diameter")!.Value, row.Number(grade)!.Value, 6e-7);
            }
        }
    }

    [Theory]
    [MemberData(nameof(Metric))]
    public void MetricSize_SectionAndNominalResistance_FollowFromTheDiameter(double diameter, double area, double nominal)
    {
        FigureGraph figures = Wire(Machines.Text($"{diameter} mm"), "grade-2");
        double perMetre = figures.Value("resistance.coil.cold") / figures.Value("coil.turn-length.mean") / 10;

        Machines.Near(area * 1e-6, figures.Value("wire.section"), 5.1e-4);
        Machines.Near(nominal, perMetre / (58.5 * 1e6 * Annealed), 5.1e-4);
        Assert.Equal(1, figures.Value("wire.stocked"));
    }

    [Fact]
    public void MetricTable_EveryRow_GrowsWithSizeAndGradeAndLeavesRoomForItsEnamel()
    {
        ReferenceTable metric = EmbeddedRulebooks.Tables.Find("wire-metric")!;
        double before = 0;
        foreach (ReferenceRow row in metric.Rows)
        {
            double bare = row.Number("diameter")!.Value;
            Assert.True(bare > before);
            before = bare;
            double overall = bare;
            for (int grade = 1; grade <= 3; grade++)
            {
                double greatest = row.Number($"overall-grade-{grade}")!.Value;
                Assert.True(greatest > overall);
                Assert.True(greatest >= bare + row.Number($"increase-grade-{grade}")!.Value, $"{bare} grade {grade}");
                overall = greatest;
            }
        }

        Assert.Equal(Metric.Count, metric.Rows.Length);
    }

    [Fact]
    public void WireSizes_GaugeRows_AreTheLawAndAllRise()
    {
        double before = 0;
        foreach (ReferenceRow row in EmbeddedRulebooks.Tables.Find("wire-sizes")!.Rows)
        {
            double diameter = row.Number("diameter")!.Value;
            Assert.True(diameter > before);
            before = diameter;
            if (row.Text("series") is { } series && series.StartsWith("AWG ", StringComparison.Ordinal))
            {
                int gauge = int.Parse(series[4..], System.Globalization.NumberStyles.None, System.Globalization.CultureInfo.InvariantCulture);
                Machines.Near(0.127e-3 * Math.Pow(92, (36 - gauge) / 39.0), diameter, 5.1e-4);
            }
        }
    }

    [Fact]
    public void Copper_TableAndFigures_AreTheInternationalStandard()
    {
        ReferenceRow copper = EmbeddedRulebooks.Tables.Find("conductors")!.FindRow("conductor", "copper")!;

        Machines.Near(1 / 58e6, copper.Number("resistivity")!.Value, 1e-4);
        Assert.Equal(0.00393, copper.Number("coefficient")!.Value, 1e-9);
        Assert.Equal(273.15 - 235, 273.15 + 20 - (1 / copper.Number("coefficient")!.Value), 1.0);
    }

    [Theory]
    [MemberData(nameof(Tables))]
    public void Table_AndEveryRow_NameSourceAndStatus(string name)
    {
        string[] known = ["seen", "from-memory", "common-practice", "derived"];
        ReferenceTable table = EmbeddedRulebooks.Tables.Find(name)!;

        Assert.NotEmpty(table.What);
        Assert.NotEmpty(table.Source);
        Assert.Contains(table.Status, known);
        Assert.NotEmpty(table.Rows);
        foreach (ReferenceRow row in table.Rows.Where(r => r.Text("status") is not null))
        {
            Assert.Contains(row.Text("status"), known);
        }
    }

    // Ten turns of a ring coil of 100 mm mean diameter.
    private static FigureGraph Wire(string size, string enamel) => Machines.Figures($$"""
        spec: 1
        title: wire
        machine: {role: generator, topology: axial-flux, arrangement: twin-rotor, stator: coreless, poles: 4, phases: 3}
        magnets: {shape: disc, diameter: 60 mm, thickness: 10 mm, pitch-radius: 150 mm, material: {remanence: 1.2 T} }
        rotor:
          back-iron: {material: ideal}
        winding:
          coils: 3
          turns: 10
          wire: {size: {{size}}, enamel: {{enamel}}, material: copper}
          coil: {shape: round, inner-radius: 40 mm, outer-radius: 60 mm, thickness: 20 mm}
        gap: {clearance: 2 mm}

        """);
}
