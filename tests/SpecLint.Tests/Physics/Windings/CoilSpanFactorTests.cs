using SpecLint.Physics.Geometry;
using SpecLint.Physics.Windings;

namespace SpecLint.Tests.Physics.Windings;

public sealed class CoilSpanFactorTests
{
    private static readonly CoilOutline Keystone = new()
    {
        Shape = CoilShape.Keystone,
        HoleLength = 0.046,
        HoleWidth = 0.026,
        LegWidth = 0.016,
        Thickness = 0.013,
        PitchRadius = 0.115,
    };

    // A coreless coil's real width decides: near the product of pitch factor and spread of a straight leg.
    [Fact]
    public void DiscCoil_Keystone_IsPitchTimesSpread()
    {
        double b = CoilGeometry.LegHalfAngle(Keystone);
        double half = 6.0 * 0.008 / 0.115;
        double closed = CoilSpanFactor.Pitch(1, 12.0 * b) * Math.Sin(half) / half;

        Assert.Equal(closed, CoilSpanFactor.OfDiscCoil(Keystone, 1, 6, 0.115), 2e-3);
    }

    [Fact]
    public void DiscCoil_ThinLegs_TendToPitchFactor()
    {
        CoilOutline thin = Keystone with { LegWidth = 1e-6 };

        Assert.Equal(Math.Sin(6.0 * CoilGeometry.LegHalfAngle(thin)), CoilSpanFactor.OfDiscCoil(thin, 1, 6, 0.115), 1e-9);
    }

    [Fact]
    public void DiscCoil_Rectangle_MatchesQuadrature()
    {
        CoilOutline coil = Keystone with { Shape = CoilShape.Rectangle };
        double expected = MathNet.Numerics.Integration.GaussLegendreRule.Integrate(
            s => Math.Sin(5.0 * 6.0 * Math.Asin((0.013 + s) / 0.115)) / 0.016, 0.0, 0.016, 40);

        Assert.Equal(expected, CoilSpanFactor.OfDiscCoil(coil, 5, 6, 0.115), 1e-10);
    }

    // A linear coil's factor is the mean over nested turns of sin(k half-span).
    [Theory]
    [InlineData(1)]
    [InlineData(3)]
    [InlineData(7)]
    public void LinearCoil_Rectangle_MatchesQuadrature(int order)
    {
        CoilOutline coil = Keystone with { Shape = CoilShape.Rectangle, PitchRadius = 0.0 };
        double k = order * Math.PI / 0.040;
        double expected = MathNet.Numerics.Integration.GaussLegendreRule.Integrate(
            s => Math.Sin(k * (0.013 + s)) / 0.016, 0.0, 0.016, 40);

        Assert.Equal(expected, CoilSpanFactor.OfLinearCoil(coil, order, 0.040), 1e-12);
    }

    // Circle of radius rho in cos(k x): integrate over the disc directly.
    [Fact]
    public void Ring_ThinTurn_MatchesDirectIntegral()
    {
        const double radius = 0.02;
        const double k = 70.0;
        double linkage = MathNet.Numerics.Integration.GaussLegendreRule.Integrate(
            t => 2.0 * radius * radius * Math.Cos(t) * Math.Cos(t) * Math.Cos(k * radius * Math.Sin(t)), -0.5 * Math.PI, 0.5 * Math.PI, 40);

        double factor = CoilSpanFactor.OfRing(CoilOutline.Round(radius - 1e-7, radius + 1e-7, 0.01, 0.1), k);

        Assert.Equal(linkage / (4.0 * radius / k), factor, 1e-9);
    }

    [Fact]
    public void Ring_BestRadius_IsAtMostNinetyOnePercent()
    {
        double best = Enumerable.Range(1, 400).Max(i => CoilSpanFactor.OfRing(CoilOutline.Round(0.02 - 1e-6, 0.02, 0.01, 0.1), i));

        Assert.Equal(0.914, best, 1e-3);
    }

    [Fact]
    public void Slots_LargeOrder_KeepsSign()
    {
        Assert.Equal(Math.Sin(11.0 * 5.0 * Math.PI / 12.0), CoilSpanFactor.OfSlots(11, 5, 1, 12), 1e-12);
        Assert.Equal(-0.866025403784, CoilSpanFactor.OfSlots(5, 2, 1, 6), 1e-9);
    }
}
