using SpecLint.Review.Figures;
using SpecLint.Review.Rules;
using SpecLint.Tests.Review.Catalogue;

namespace SpecLint.Tests.Review.Rules;

/// <summary>The magnet grades against physics, against their own series and against worked temperatures.</summary>
public sealed class MagnetTableTests
{
    private const double Mu0 = 4e-7 * Math.PI;

    private static readonly string[] Series = ["none", "M", "H", "SH", "UH", "EH", "AH"];

    private static ReferenceTable Grades => EmbeddedRulebooks.Tables.Find("magnet-grades")!;

    public static TheoryData<string> Names => [.. Grades.Rows.Select(r => r.Text("grade")!)];

    [Theory]
    [MemberData(nameof(Names))]
    public void Grade_BandsAndSigns_ArePhysical(string name)
    {
        ReferenceRow row = Grades.FindRow("grade", name)!;
        double Of(string column) => row.Number(column)!.Value;
        bool ferrite = row.Text("family") == "ferrite";

        Assert.True(Of("remanence-least") <= Of("remanence-typical") && Of("remanence-typical") <= Of("remanence-greatest"));
        Assert.Equal(0.5 * (Of("remanence-least") + Of("remanence-greatest")), Of("remanence-typical"), 1e-9);
        Assert.InRange(Of("remanence-greatest"), 0.2, 1.6);
        Assert.True(Of("remanence-coefficient") < 0);
        Assert.Equal(ferrite, Of("coercivity-coefficient") > 0);
        Assert.InRange(Of("recoil-permeability"), 1.0, 1.3);
        Assert.NotEmpty(row.Text("source")!);
        Assert.NotEmpty(row.Text("status")!);
        (double from, double to) = row.Text("family") switch
        {
            "NdFeB-sintered" => (7400, 7650),
            "NdFeB-bonded" => (4800, 6300),
            "SmCo" => (8200, 8500),
            _ => (4800.0, 5000.0),
        };
        Assert.InRange(Of("density"), from, to);
        if (!ferrite)
        {
            // A straight line to the working field in air of a slender magnet: rare-earth grades hold more than half of Br/μ0.
            Assert.True(Of("coercivity-intrinsic-least") > 0.5 * Of("remanence-greatest") / Mu0, name);
        }
    }

    [Theory]
    [MemberData(nameof(Names))]
    public void Grade_AtItsTemperatureLimit_KeepsRemanenceAndSomeCoercivity(string name)
    {
        ReferenceRow row = Grades.FindRow("grade", name)!;
        double rise = row.Number("temperature-limit")!.Value - 293.15;
        double remanence = 1 + (row.Number("remanence-coefficient")!.Value * rise);
        double coercivity = 1 + (row.Number("coercivity-coefficient")!.Value * rise);

        Assert.InRange(remanence, 0.5, 0.99);
        Assert.InRange(coercivity, 0.15, 1.7);
    }

    [Fact]
    public void SuffixSeries_EachLetter_HoldsMoreHotterAndLosesLess()
    {
        ReferenceTable table = EmbeddedRulebooks.Tables.Find("magnet-suffixes")!;
        ReferenceRow[] rows = [.. Series.Select(s => table.FindRow("suffix", s)!)];
        for (int i = 1; i < rows.Length; i++)
        {
            Assert.True(rows[i].Number("coercivity-intrinsic-least") > rows[i - 1].Number("coercivity-intrinsic-least"));
            Assert.True(rows[i].Number("temperature-nominal") > rows[i - 1].Number("temperature-nominal"));
            Assert.True(rows[i].Number("coercivity-coefficient") > rows[i - 1].Number("coercivity-coefficient"));
            Assert.True(rows[i].Number("remanence-coefficient") >= rows[i - 1].Number("remanence-coefficient"));
        }

        foreach (ReferenceRow row in table.Rows)
        {
            Assert.InRange(row.Number("coercivity-coefficient")!.Value, row.Number("coercivity-coefficient-least")!.Value, row.Number("coercivity-coefficient-greatest")!.Value);
        }
    }

    [Theory]
    [InlineData("none", 12)]
    [InlineData("M", 14)]
    [InlineData("H", 17)]
    [InlineData("SH", 20)]
    [InlineData("UH", 25)]
    [InlineData("EH", 30)]
    [InlineData("AH", 35)]
    public void SuffixSeries_Coercivity_IsTheRoundFigureInKilooersted(string suffix, double kilooersted)
    {
        // 1 Oe is 1000/(4π) A/m; the trade series is set in whole kilooersteds.
        ReferenceRow row = EmbeddedRulebooks.Tables.Find("magnet-suffixes")!.FindRow("suffix", suffix)!;

        Machines.Near(kilooersted * 1e6 / (4 * Math.PI), row.Number("coercivity-intrinsic-least")!.Value, 5e-4);
    }

    [Fact]
    public void SinteredGrades_OfOneNumber_RiseInCoercivityWithTheLetterAndShareRemanence()
    {
        foreach (var number in Grades.Rows.Where(r => r.Text("family") == "NdFeB-sintered").GroupBy(r => r.Text("grade")!.TrimEnd('M', 'H', 'S', 'U', 'E', 'A')))
        {
            ReferenceRow[] rows = [.. number.OrderBy(r => Array.IndexOf(Series, Suffix(r)))];
            for (int i = 1; i < rows.Length; i++)
            {
                Assert.True(rows[i].Number("coercivity-intrinsic-least") > rows[i - 1].Number("coercivity-intrinsic-least"), rows[i].Text("grade"));
                Assert.True(rows[i].Number("temperature-limit") > rows[i - 1].Number("temperature-limit"), rows[i].Text("grade"));
                Assert.Equal(rows[0].Number("remanence-typical"), rows[i].Number("remanence-typical"));
            }
        }
    }

    [Fact]
    public void SinteredGrades_OfOneLetter_RiseInRemanenceWithTheNumber()
    {
        foreach (var letter in Grades.Rows.Where(r => r.Text("family") == "NdFeB-sintered").GroupBy(Suffix))
        {
            ReferenceRow[] rows = [.. letter.OrderBy(r => r.Text("grade"), StringComparer.Ordinal)];
            for (int i = 1; i < rows.Length; i++)
            {
                Assert.True(rows[i].Number("remanence-typical") > rows[i - 1].Number("remanence-typical"), rows[i].Text("grade"));

                // The number is the energy product in MGOe, at most Br²/(4μ0·μr): 1 MGOe is 7.958 kJ/m³.
                double greatest = Math.Pow(rows[i].Number("remanence-greatest")!.Value, 2) / (4 * Mu0 * 1.05);
                double named = 7958 * int.Parse(rows[i].Text("grade")!.AsSpan(1, 2), System.Globalization.NumberStyles.None, System.Globalization.CultureInfo.InvariantCulture);
                Assert.InRange(named / greatest, 0.90, 1.03);
            }
        }
    }

    [Fact]
    public void PlainGrade_At80Degrees_HasLostAbout45PercentOfItsCoercivity()
    {
        ReferenceRow row = Grades.FindRow("grade", "N42")!;

        Assert.Equal(0.45, -row.Number("coercivity-coefficient")!.Value * 60, 1e-9);
    }

    [Fact]
    public void Ferrite_Cold_GainsRemanenceAndLosesCoercivity()
    {
        // Worked example: 0.39 T and 240 kA/m at 20 °C become 0.421 T and 211 kA/m at -20 °C (-0.2 and +0.3 %/K).
        FigureGraph figures = Machines.Figures(Machine("{remanence: 0.39 T, coercivity-intrinsic: 240 kA/m, remanence-coefficient: -0.2 %/K, coercivity-coefficient: 0.3 %/K}"));

        Assert.Equal(0.421, figures.Value("magnet.remanence.cold"), 5e-4);
        Assert.Equal(211e3, figures.Value("magnet.coercivity-intrinsic.cold"), 500.0);
    }

    [Theory]
    [InlineData("Y", 90)]
    [InlineData("A", 105)]
    [InlineData("E", 120)]
    [InlineData("B", 130)]
    [InlineData("F", 155)]
    [InlineData("H", 180)]
    [InlineData("N", 200)]
    [InlineData("R", 220)]
    public void InsulationClass_Letter_IsThatOfTheStandard(string letter, double celsius)
    {
        // IEC 60085:2007.
        ReferenceTable table = EmbeddedRulebooks.Tables.Find("insulation-classes")!;

        Assert.Equal(celsius, table.FindRow("class", letter)!.Number("temperature")!.Value - 273.15, 1e-9);
        Assert.Equal(celsius, table.FindRow("class", Machines.Text($"{celsius}"))!.Number("temperature")!.Value - 273.15, 1e-9);
    }

    [Theory]
    [InlineData("elv-limit", 50, 120)]
    [InlineData("dry", 25, 60)]
    [InlineData("other", 12, 30)]
    public void TouchVoltage_Case_IsThatOfTheStandardWithItsPeak(string place, double alternating, double direct)
    {
        // IEC 61140:2016 and IEC 60364-4-41, clause 414; the peak is √2 times the rms value.
        ReferenceRow row = EmbeddedRulebooks.Tables.Find("touch-voltage")!.FindRow("case", place)!;

        Assert.Equal(alternating, row.Number("alternating"));
        Assert.Equal(direct, row.Number("direct"));
        Machines.Near(alternating * Math.Sqrt(2), row.Number("alternating-peak")!.Value, 2e-3);
    }

    private static string Suffix(ReferenceRow row) => row.Text("grade")!.TrimStart('N', '0', '1', '2', '3', '4', '5', '6', '7', '8', '9') is { Length: > 0 } letters ? letters : "none";

    private static string Machine(string material) => $$"""
        spec: 1
        title: magnets
        machine: {role: generator, topology: axial-flux, arrangement: twin-rotor, stator: coreless, poles: 8, phases: 3}
        magnets: {shape: block, length: 50 mm, width: 50 mm, thickness: 20 mm, pitch-radius: 120 mm, material: {{material}} }
        rotor: {back-iron: none}
        winding: {coils: 6, coil: {shape: round, inner-radius: 15 mm, outer-radius: 40 mm, thickness: 15 mm} }
        gap: {clearance: 2 mm}
        environment:
          ambient: {min: -20 °C, max: 40 °C}

        """;
}
