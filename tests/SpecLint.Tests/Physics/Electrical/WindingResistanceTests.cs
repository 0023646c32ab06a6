using CsCheck;
using SpecLint.Physics.Electrical;

namespace SpecLint.Tests.Physics.Electrical;

public sealed class WindingResistanceTests
{
    private const double Cold = 293.15;

    // ASTM B258 diameters in mm, as wire tables print them.
    [Theory]
    [InlineData(13, 1.828)]
    [InlineData(14, 1.628)]
    [InlineData(15, 1.450)]
    [InlineData(16, 1.291)]
    [InlineData(18, 1.024)]
    [InlineData(21, 0.723)]
    [InlineData(28, 0.321)]
    [InlineData(4, 5.189)]
    [InlineData(-3, 11.684)]
    public void Awg_Number_GivesPublishedDiameter(int number, double millimetres) =>
        Assert.Equal(millimetres, 1e3 * WireGauge.DiameterOfAwg(number), 6e-4);

    [Fact]
    public void Coil_Awg28_IsPublishedResistancePerMetre() =>
        Assert.Equal(0.2129, WindingResistance.OfCoil(Wire(WireGauge.DiameterOfAwg(28), 1, 1.0, 1.0), Cold), 6e-5);

    // 25 m of 1.7 mm is 0.1899 ohm at 20 C, 0.2496 at 100 C by hand; six such coils weigh 3.04 kg (density 8930 behind that figure, 8890 here: 0.5 %).
    [Fact]
    public void Coil_HundredTurnsOfQuarterMetre_MatchesPublished()
    {
        WindingWire wire = Wire(1.7e-3, 1, 0.25, 100.0);

        Assert.Equal(0.1899, WindingResistance.OfCoil(wire, Cold), 6e-5);
        Assert.Equal(0.2496, WindingResistance.OfCoil(wire, Cold + 80.0), 6e-5);
        Assert.Equal(3.04, 6.0 * WindingResistance.CoilMass(wire), 0.02);
        Assert.Equal(0.380, WindingResistance.OfPhase(WindingResistance.OfCoil(wire, Cold), 2, 1), 5e-4);
    }

    // A builder's 12 V and 24 V windings: 35 turns of two strands become 70 of one: phase resistance times four.
    [Fact]
    public void Coil_TwiceTheTurnsHalfTheStrands_IsFourfold()
    {
        double twelve = WindingResistance.OfCoil(Wire(WireGauge.DiameterOfAwg(14), 2, 0.25, 35.0), Cold);
        double twentyFour = WindingResistance.OfCoil(Wire(WireGauge.DiameterOfAwg(14), 1, 0.25, 70.0), Cold);

        Assert.Equal(4.0, twentyFour / twelve, 1e-12);
    }

    // Two public records of small machines: 0.2 ohm from 50 turns of 1 mm means a mean turn of 0.182 m; 200 turns of AWG 28, 80 mm, 3.4 ohm.
    [Fact]
    public void Coil_PublishedMachines_Agree()
    {
        Assert.Equal(0.2, WindingResistance.OfCoil(Wire(1e-3, 1, 0.182, 50.0), Cold), 1e-3);
        Assert.Equal(3.4, WindingResistance.OfCoil(Wire(WireGauge.DiameterOfAwg(28), 1, 0.080, 200.0), Cold), 0.01);
    }

    [Fact]
    public void Phase_Paths_DivideBySquareAtFixedCoils() => Gen.Int[1, 6].Sample(paths =>
    {
        double all = WindingResistance.OfPhase(1.0, 12 * paths, 1);
        return Math.Abs(WindingResistance.OfPhase(1.0, 12, paths) - all / (paths * paths)) < 1e-12;
    });

    [Fact]
    public void CurrentDensity_SharesBetweenPathsAndStrands() =>
        Assert.Equal(12.0 / (2.0 * 3.0 * 0.25 * Math.PI * 1e-6), WindingResistance.CurrentDensity(12.0, 2, Wire(1e-3, 3, 1.0, 1.0)), 1e-3);

    // By hand: 9.35 mm at 50 Hz with 1.724e-8.
    [Fact]
    public void SkinDepth_FiftyHertz_IsPublished() =>
        Assert.Equal(9.35e-3, WindingResistance.SkinDepth(1.724e-8, 100.0 * Math.PI), 6e-6);

    private static WindingWire Wire(double diameter, int strands, double turn, double turns) => new()
    {
        Material = ConductorMaterial.Copper,
        StrandDiameter = diameter,
        Strands = strands,
        MeanTurnLength = turn,
        Turns = turns,
    };
}
