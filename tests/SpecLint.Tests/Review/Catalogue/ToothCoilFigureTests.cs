using System.Text.Json;
using SpecLint.Review.Figures;

namespace SpecLint.Tests.Review.Catalogue;

/// <summary>Any coil count over any pole count, from Reference/winding.json and from published winding factors, as the program's figures.</summary>
public sealed class ToothCoilFigureTests
{
    public static TheoryData<string> Ids => [.. Cases().Select(c => c.GetProperty("id").GetString()!)];

    [Theory]
    [MemberData(nameof(Ids))]
    public void Layout_OfReference_HasItsDistributionAndBalance(string id)
    {
        JsonElement item = Cases().Single(c => c.GetProperty("id").GetString() == id);
        JsonElement inputs = item.GetProperty("inputs");
        JsonElement results = item.GetProperty("results");
        int slots = inputs.GetProperty("slots").GetInt32();
        int coils = inputs.GetProperty("layers").GetInt32() == 1 ? slots / 2 : slots;
        FigureGraph figures = Machines.Figures(Coils(coils, inputs.GetProperty("poles").GetInt32(), inputs.GetProperty("phases").GetInt32()));

        if (!results.GetProperty("balanced").GetBoolean())
        {
            Assert.True(figures.Value("winding.imbalance") > 0.01);
            return;
        }

        Assert.Equal(0, figures.Value("winding.imbalance"), 1e-9);
        Assert.Equal(results.GetProperty("distribution_factor").GetProperty("1").GetDouble(), figures.Value("winding.factor.distribution"), 1e-9);
    }

    [Theory]
    [InlineData(12, 8, 0.8660)]
    [InlineData(9, 12, 0.8660)]
    [InlineData(12, 16, 0.8660)]
    [InlineData(15, 20, 0.8660)]
    [InlineData(6, 8, 0.8660)]
    [InlineData(9, 8, 0.9452)]
    [InlineData(12, 10, 0.9330)]
    [InlineData(30, 22, 0.8740)]
    public void Factor_ThinLegsASlotPitchApart_IsThatOfTextbooks(int coils, int poles, double published)
    {
        // Double-layer tooth coils; any text on fractional-slot windings.
        Assert.Equal(published, Machines.Figures(Coils(coils, poles, 3)).Value("winding.factor-1"), 1.5e-4);
    }

    [Fact]
    public void Distribution_TwelveCoilsOnTenPoles_IsTheCosineOfFifteenDegrees()
    {
        // A practitioner's drawing of 2012 states 15° off the resultant and about 3.5 % of the voltage lost.
        double factor = Machines.Figures(Coils(12, 10, 3)).Value("winding.factor.distribution");

        Assert.Equal(0.9659, factor, 5e-5);
        Assert.Equal(0.034, 1 - factor, 5e-4);
    }

    [Fact]
    public void Distribution_TenCoilsOnTwelvePolesInFivePhases_IsBalancedAndWhole()
    {
        // Piggott, "How to build a wind turbine", 2003: twelve poles, ten coils, five phases.
        FigureGraph figures = Machines.Figures(Coils(10, 12, 5));

        Assert.Equal(1, figures.Value("winding.factor.distribution"), 1e-9);
        Assert.Equal(0, figures.Value("winding.imbalance"), 1e-9);
    }

    [Theory]
    [InlineData(16, 300, 40)]
    [InlineData(16, 450, 60)]
    [InlineData(16, 150, 20)]
    [InlineData(12, 3000, 300)]
    [InlineData(40, 1950, 650)]
    [InlineData(40, 2300, 766.7)]
    [InlineData(8, 600, 40)]
    [InlineData(16, 1000, 133.3)]
    public void Frequency_OfPublishedDiscMachines_CountsPolePairs(int poles, double rpm, double hertz)
    {
        // Bumby and Martin 2005, Chan and Lai 2007, Hosseini et al. 2008, Wang et al. 2005, Mbidi et al. 2000, Dehghanzadeh and Behjat 2014.
        FigureGraph figures = Machines.Figures(Coils(12, poles, 3) + Machines.Text($"ratings: {{speed: {rpm} rpm}}\n"));

        Assert.Equal(hertz, figures.Value("frequency"), 0.05);
    }

    [Fact]
    public void DeclaredProduct_SixteenPoleMachine_TakesTheVoltageAsLineVoltage()
    {
        // Chan and Lai, IEEE Trans. Energy Convers. 22(1), 2007, 86: 16.7 V and 8 A are 230 W; as a phase voltage they would be 401 W.
        FigureGraph figures = Machines.Figures(Coils(12, 16, 3) + "ratings: {speed: 450 rpm, voltage: 16.7 V, current: 8 A}\n");

        Assert.Equal(231, figures.Value("power.declared-product"), 0.5);
    }

    // Keystone coils of thin legs whose leg centres lie on the rays midway between neighbouring coils.
    private static string Coils(int coils, int poles, int phases)
    {
        const double PitchRadius = 0.2;
        const double Leg = 0.1e-3;
        double half = Math.PI / Math.Max(coils, 3);
        double hole = 2 * ((PitchRadius * Math.Tan(half)) - (0.5 * Leg / Math.Cos(half)));
        return Machines.Text($$"""
            spec: 1
            title: coils
            machine: {role: generator, topology: axial-flux, arrangement: twin-rotor, stator: coreless, poles: {{poles}}, phases: {{phases}} }
            magnets: {shape: disc, diameter: 10 mm, thickness: 10 mm, pitch-radius: 200 mm}
            rotor: {back-iron: none}
            gap: {clearance: 1 mm}
            winding:
              coils: {{coils}}
              coil: {shape: keystone, hole-length: 20 mm, hole-width: {{Machines.Millimetres(hole)}}, leg-width: {{Machines.Millimetres(Leg)}}, thickness: 10 mm}

            """);
    }

    private static JsonElement[] Cases()
    {
        string path = Path.Combine(AppContext.BaseDirectory, "Reference", "winding.json");
        return [.. JsonDocument.Parse(File.ReadAllText(path)).RootElement.GetProperty("cases").EnumerateArray()
            .Where(c => c.GetProperty("kind").GetString() == "tooth_coil" && c.GetProperty("defined").GetBoolean())];
    }
}
