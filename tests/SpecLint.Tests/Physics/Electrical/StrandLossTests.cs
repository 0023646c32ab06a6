using System.Numerics;
using CsCheck;
using SpecLint.Physics.Electrical;

namespace SpecLint.Tests.Physics.Electrical;

public sealed class StrandLossTests
{
    private const double Mu0 = 4e-7 * Math.PI;

    // By hand from the formula of Sullivan 1999: field, frequency, diameter, resistivity, W/m³, W/m.
    [Theory]
    [InlineData(0.50, 50.0, 1.5e-3, 1.724e-8, 1.0063e5, 0.1778)]
    [InlineData(0.60, 30.0, 1.6e-3, 2.0e-8, 5.116e4, 0.1029)]
    public void Eddy_PublishedCases_AreExact(double field, double frequency, double diameter, double resistivity, double perVolume, double perLength)
    {
        double speed = 2.0 * Math.PI * frequency;

        Assert.Equal(perVolume, StrandEddyLoss.PerVolume(speed, field * field, diameter, resistivity), 1e-4 * perVolume);
        Assert.Equal(perLength, StrandEddyLoss.PerLength(speed, field * field, diameter, resistivity), 4e-4 * perLength);
    }

    // Full solution of a cylinder across a field: P/l = (pi omega B² a²/mu0) |Im(J2(x)/J0(x))|, x = (1 - j) a/delta.
    [Theory]
    [InlineData(0.2, 1e-4)]
    [InlineData(1.0, 0.01)]
    [InlineData(2.0, 0.12)]
    public void Eddy_LowFrequencyLimit_OverstatesBesselSolutionAsStated(double ratio, double most)
    {
        const double diameter = 1e-3;
        const double resistivity = 1.7241e-8;
        double delta = diameter / ratio;
        double speed = 2.0 * resistivity / (Mu0 * delta * delta);
        double radius = 0.5 * diameter;
        var argument = new Complex(radius / delta, -radius / delta);
        double exact = Math.PI * speed * radius * radius / Mu0 * Math.Abs((Bessel(2, argument) / Bessel(0, argument)).Imaginary);

        double limit = StrandEddyLoss.PerLength(speed, 1.0, diameter, resistivity);

        Assert.Equal(ratio, StrandEddyLoss.DiameterOverSkinDepth(diameter, WindingResistance.SkinDepth(resistivity, speed)), 1e-12);
        Assert.InRange(limit / exact - 1.0, -1e-9, most);
        Assert.Equal(1.0 - 11.0 / 96.0 * Math.Pow(radius / delta, 4), exact / limit, 0.02 * Math.Pow(radius / delta, 8) + 1e-9);
    }

    [Fact]
    public void Eddy_HalvingDiameter_HalvesLossAtEqualCopper() => Gen.Double[1e-4, 3e-3].Sample(diameter =>
    {
        double now = StrandEddyLoss.PerVolume(300.0, 0.25, diameter, 1.7e-8);
        double then = StrandEddyLoss.PerVolume(300.0, 0.25, StrandEddyLoss.HalvingDiameter(diameter), 1.7e-8);
        return Math.Abs(then / now - 0.5) < 1e-12;
    });

    // Two strands: the loop of both resistances carries the difference of their EMFs, loss e²/(2 R) of it.
    [Fact]
    public void Circulation_TwoStrands_IsLoopLoss()
    {
        StrandBundle bundle = Bundle(2);
        double difference = 300.0 * 2.0 * 50.0 * 0.046 * 0.5 * Math.Cos(0.5 * 2.4) * 1.4e-3;

        double loss = StrandCirculation.LossOfCoil(bundle, 300.0, 0.5, 2.4);

        Assert.Equal(0.5 * difference * difference / (2.0 * 0.2), loss, 1e-12 + 1e-9 * loss);
    }

    // Direct sum: each strand's EMF about the mean, its own resistance.
    [Fact]
    public void Circulation_ManyStrands_IsDirectSum() => Gen.Int[1, 12].Sample(strands =>
    {
        double sum = 0.0;
        for (int j = 0; j < strands; j++)
        {
            double emf = 300.0 * 2.0 * 50.0 * 0.046 * 0.5 * Math.Cos(1.2) * 1.4e-3 * (j - 0.5 * (strands - 1));
            sum += 0.5 * emf * emf / 0.2;
        }

        Assert.Equal(sum, StrandCirculation.LossOfCoil(Bundle(strands), 300.0, 0.5, 2.4), 1e-9);
    });

    [Fact]
    public void Circulation_FullPitch_IsNone() =>
        Assert.Equal(0.0, StrandCirculation.LossOfCoil(Bundle(4), 300.0, 0.5, Math.PI), 1e-20);

    private static StrandBundle Bundle(int strands) => new()
    {
        Strands = strands,
        StrandPitch = 1.4e-3,
        StrandResistance = 0.2,
        Turns = 50.0,
        LegLength = 0.046,
    };

    private static Complex Bessel(int order, Complex x)
    {
        Complex term = Complex.Pow(0.5 * x, order) / (order == 2 ? 2.0 : 1.0);
        Complex sum = term;
        for (int k = 1; k < 40; k++)
        {
            term *= -0.25 * x * x / (k * (k + order));
            sum += term;
        }

        return sum;
    }
}
