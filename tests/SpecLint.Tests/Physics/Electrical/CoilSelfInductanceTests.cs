using CsCheck;
using SpecLint.Physics.Electrical;
using SpecLint.Physics.Geometry;

namespace SpecLint.Tests.Physics.Electrical;

public sealed class CoilSelfInductanceTests
{
    private const double Mu0 = 4e-7 * Math.PI;

    private static readonly CoilOutline Keystone = new()
    {
        Shape = CoilShape.Keystone,
        HoleLength = 0.046,
        HoleWidth = 0.026,
        LegWidth = 0.016,
        Thickness = 0.013,
        PitchRadius = 0.115,
    };

    private static readonly CoilOutline Rectangle = Keystone with { Shape = CoilShape.Rectangle };

    // Published: Grover 1946 and Brooks, NBS J. Res. 7 (1931) 289: 1.6994e-6 a N² for a = 1.5 c, b = c.
    [Fact]
    public void Self_BrooksCoil_MatchesPublishedConstant()
    {
        InductanceEstimate result = CoilSelfInductance.Of(CoilOutline.Round(0.010, 0.020, 0.010, 0.0), 100.0, IronPlanes.None);

        Assert.Equal(254.91e-6, result.Value, 254.91e-6 * 1e-3);
        Assert.InRange(result.Error, 0.0, 1e-4 * result.Value);
    }

    // Sums over 24 x 24 filaments and Wheeler, Proc. IRE 16, 1928, 1398: mean radius, axial length, radial depth, turns.
    [Theory]
    [InlineData(0.015, 0.010, 0.010, 100.0, 0.25490e-3)]
    [InlineData(0.030, 0.013, 0.020, 80.0, 0.36833e-3)]
    [InlineData(0.0325, 0.012, 0.025, 100.0, 0.61116e-3)]
    public void Self_Ring_MatchesFilamentSumsAndWheeler(double mean, double axial, double radial, double turns, double expected)
    {
        CoilOutline coil = CoilOutline.Round(mean - 0.5 * radial, mean + 0.5 * radial, axial, 0.0);

        double value = CoilSelfInductance.Of(coil, turns, IronPlanes.None).Value;

        Assert.Equal(expected, value, 1e-3 * expected);
        double wheeler = 31.6e-6 * mean * mean * turns * turns / (6.0 * mean + 9.0 * axial + 10.0 * radial);
        Assert.Equal(wheeler, value, 0.015 * wheeler);
    }

    [Theory]
    [InlineData(0.010, 0.030, 0.012)]
    [InlineData(0.020, 0.024, 0.020)]
    [InlineData(0.005, 0.040, 0.006)]
    public void Self_Ring_MatchesOwnFilamentSum(double inner, double outer, double thickness)
    {
        double coarse = FilamentOracle.Ring(inner, outer, thickness, 20);
        double fine = FilamentOracle.Ring(inner, outer, thickness, 40);

        double value = CoilSelfInductance.Of(CoilOutline.Round(inner, outer, thickness, 0.0), 1.0, IronPlanes.None).Value;

        Assert.Equal(fine + (fine - coarse) / 3.0, value, 5e-4 * fine);
    }

    // Long thin rectangle of small square section: Grover 1946, rectangle of wire, with the geometric mean distance of a square.
    [Fact]
    public void Self_SlenderRectangle_MatchesClassicalFormula()
    {
        const double section = 0.002;
        const double a = 0.30;
        const double b = 0.20;
        var coil = new CoilOutline
        {
            Shape = CoilShape.Rectangle,
            HoleLength = a - section,
            HoleWidth = b - section,
            LegWidth = section,
            Thickness = section,
        };
        double diagonal = Math.Sqrt(a * a + b * b);
        double gmd = 0.44705 * section;
        double amd = 0.52140 * section;
        double expected = Mu0 / Math.PI * (
            a * Math.Log(2.0 * a / gmd) + b * Math.Log(2.0 * b / gmd) + 2.0 * diagonal
            - a * Math.Asinh(a / b) - b * Math.Asinh(b / a) - 2.0 * (a + b) + 2.0 * amd);

        Assert.Equal(expected, CoilSelfInductance.Of(coil, 1.0, IronPlanes.None).Value, 1e-3 * expected);
    }

    [Fact]
    public void Self_KeystoneFarFromShaft_TendsToRectangle()
    {
        double far = CoilSelfInductance.Of(Keystone with { PitchRadius = 1e4 }, 1.0, IronPlanes.None).Value;
        double straight = CoilSelfInductance.Of(Rectangle, 1.0, IronPlanes.None).Value;

        Assert.Equal(straight, far, 1e-5 * straight);
    }

    [Fact]
    public void Self_FarPlanes_TendToAir()
    {
        double air = CoilSelfInductance.Of(Keystone, 1.0, IronPlanes.None).Value;
        double far = CoilSelfInductance.Of(Keystone, 1.0, new IronPlanes(5.0, 5.0)).Value;

        Assert.Equal(air, far, 1e-4 * air);
    }

    // One plane touching a coil of thickness t is half of a coil of thickness 2 t in air: flux density equal, half the current.
    [Fact]
    public void Self_PlaneTouching_IsTwiceTheDoubledCoil()
    {
        double touching = CoilSelfInductance.Of(Keystone, 1.0, new IronPlanes(0.0, double.PositiveInfinity)).Value;
        double doubled = CoilSelfInductance.Of(Keystone with { Thickness = 0.026 }, 1.0, IronPlanes.None).Value;

        Assert.Equal(2.0 * doubled, touching, 1e-4 * touching);
    }

    // Coil between planes that touch it: the field is uniform through the thickness, L = mu0 N² (integral of W²)/t.
    [Fact]
    public void Self_TwoPlanesTouching_IsIntegralOfSquaredTurnDensity()
    {
        const double inner = 0.02;
        const double outer = 0.05;
        CoilOutline coil = CoilOutline.Round(inner, outer, 0.01, 0.0);
        double ring = MathNet.Numerics.Integration.GaussLegendreRule.Integrate(
            r => 2.0 * Math.PI * r * Math.Pow((outer - r) / (outer - inner), 2), inner, outer, 16);
        double expected = Mu0 * (Math.PI * inner * inner + ring) / 0.01;

        Assert.Equal(expected, CoilSelfInductance.Of(coil, 1.0, new IronPlanes(0.0, 0.0)).Value, 1e-4 * expected);
    }

    [Fact]
    public void Self_KeystoneTwoPlanesTouching_IsIntegralOfSquaredTurnDensity()
    {
        // Area enclosed by the turn at depth s by the shoelace rule; integral of W² dA = integral of 2 (1 - s/w)/w A(s) ds.
        double expected = Mu0 / Keystone.Thickness * MathNet.Numerics.Integration.GaussLegendreRule.Integrate(
            s => 2.0 * (1.0 - s / Keystone.LegWidth) / Keystone.LegWidth * EnclosedArea(s), 0.0, Keystone.LegWidth, 8);

        Assert.Equal(expected, CoilSelfInductance.Of(Keystone, 1.0, new IronPlanes(0.0, 0.0)).Value, 1e-4 * expected);
    }

    [Fact]
    public void Self_Unbuildable_IsNotANumber() =>
        Assert.True(double.IsNaN(CoilSelfInductance.Of(Keystone with { HoleLength = 0.4 }, 1.0, IronPlanes.None).Value));

    [Fact]
    public void Self_NegativeDistance_IsNotANumber() =>
        Assert.True(double.IsNaN(CoilSelfInductance.Of(Keystone, 1.0, new IronPlanes(-0.001, 0.01)).Value));

    // A leg of a thousandth of the coil's size is beyond the panels that the work limit allows: said so, not guessed.
    [Fact]
    public void Self_TooSlender_IsNotANumberInBoundedWork() =>
        Assert.True(double.IsNaN(CoilSelfInductance.Of(Rectangle with { HoleLength = 1.0, HoleWidth = 1.0, LegWidth = 1e-4, Thickness = 1e-4 }, 1.0, IronPlanes.None).Value));

    [Fact]
    public void Self_Scaling_IsLengthTimesTurnsSquared() =>
        Gen.Select(Gen.Double[0.2, 5.0], Gen.Double[1.0, 200.0], Gen.Double[0.002, 0.05]).Sample(
            (scale, turns, distance) =>
            {
                var planes = new IronPlanes(distance, 2.0 * distance);
                var scaledPlanes = new IronPlanes(scale * distance, 2.0 * scale * distance);
                double value = CoilSelfInductance.Of(Keystone, 1.0, planes).Value;
                double scaled = CoilSelfInductance.Of(Scaled(Keystone, scale), turns, scaledPlanes).Value;
                return Math.Abs(scaled - scale * turns * turns * value) < 1e-9 * scaled;
            },
            iter: 30);

    [Fact]
    public void Self_CloserPlanes_RaiseInductance() =>
        Gen.Select(Gen.Double[0.001, 0.05], Gen.Double[1.1, 3.0]).Sample(
            (distance, ratio) =>
                CoilSelfInductance.Of(Keystone, 1.0, new IronPlanes(distance, distance)).Value
                > CoilSelfInductance.Of(Keystone, 1.0, new IronPlanes(ratio * distance, distance)).Value,
            iter: 30);

    internal static CoilOutline Scaled(CoilOutline coil, double scale) => coil with
    {
        HoleLength = scale * coil.HoleLength,
        HoleWidth = scale * coil.HoleWidth,
        LegWidth = scale * coil.LegWidth,
        Thickness = scale * coil.Thickness,
        PitchRadius = scale * coil.PitchRadius,
    };

    private static double EnclosedArea(double depth)
    {
        double b = CoilGeometry.LegHalfAngle(Keystone);
        double length = Keystone.HoleLength + 2.0 * depth;
        double middle = 2.0 * (Keystone.PitchRadius * Math.Tan(b) - (0.5 * Keystone.LegWidth - depth) / Math.Cos(b));
        return length * middle;
    }
}
