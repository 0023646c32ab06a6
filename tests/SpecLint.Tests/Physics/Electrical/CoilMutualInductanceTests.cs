using SpecLint.Physics.Electrical;
using SpecLint.Physics.Geometry;

namespace SpecLint.Tests.Physics.Electrical;

public sealed class CoilMutualInductanceTests
{
    private const double Mu0 = 4e-7 * Math.PI;

    private static readonly double[] DepthNodes = [0.112701665379258, 0.5, 0.887298334620742];
    private static readonly double[] DepthWeights = [5.0 / 18.0, 8.0 / 18.0, 5.0 / 18.0];

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

    [Theory]
    [InlineData(1)]
    [InlineData(2)]
    [InlineData(4)]
    public void Ring_Keystones_MatchNeumannSum(int separation)
    {
        CoilInductances coils = CoilMutualInductance.Ring(Keystone, 1.0, IronPlanes.None, 9);

        double expected = NestedTurns(Keystone, 2.0 * Math.PI * separation / 9.0, 0.0, 0.0);
        Assert.Equal(expected, coils.BySeparation[separation], 1e-4 * coils.Self);
        Assert.Equal(expected, coils.BySeparation[separation], 2e-3 * Math.Abs(expected));
    }

    // A plane under the coils adds the mutual with the mirrored coil, same sense of current along the plane.
    [Fact]
    public void Ring_OnePlane_AddsMirrorImage()
    {
        var plane = new IronPlanes(0.012, double.PositiveInfinity);

        double change = CoilMutualInductance.Ring(Keystone, 1.0, plane, 9).BySeparation[1]
            - CoilMutualInductance.Ring(Keystone, 1.0, IronPlanes.None, 9).BySeparation[1];

        double expected = NestedTurns(Keystone, 2.0 * Math.PI / 9.0, 0.0, 0.013 + 2.0 * 0.012);
        Assert.Equal(expected, change, 2e-3 * Math.Abs(expected));
    }

    [Fact]
    public void Self_OnePlane_AddsMirrorImage()
    {
        var plane = new IronPlanes(0.012, double.PositiveInfinity);

        double change = CoilSelfInductance.Of(Keystone, 1.0, plane).Value - CoilSelfInductance.Of(Keystone, 1.0, IronPlanes.None).Value;

        double expected = NestedTurns(Keystone, 0.0, 0.0, 0.013 + 2.0 * 0.012);
        Assert.Equal(expected, change, 2e-3 * expected);
    }

    [Fact]
    public void Row_Rectangles_MatchNeumannSum()
    {
        CoilInductances row = CoilMutualInductance.Row(Rectangle, 1.0, IronPlanes.None, new CoilRow(4, 0.07));

        for (int separation = 1; separation < 4; separation++)
        {
            double expected = NestedTurns(Rectangle, 0.0, 0.07 * separation, 0.0);
            Assert.Equal(expected, row.BySeparation[separation], 2e-3 * Math.Abs(expected) + 2e-5 * row.Self);
        }
    }

    [Fact]
    public void Ring_ManyRectanglesOnLargeCircle_TendToRow()
    {
        const double pitch = 0.07;
        const int coils = 600;
        CoilOutline onCircle = Rectangle with { PitchRadius = 0.5 * pitch / Math.Sin(Math.PI / coils) };

        double ring = CoilMutualInductance.Ring(onCircle, 1.0, IronPlanes.None, coils).BySeparation[1];
        double row = CoilMutualInductance.Row(Rectangle, 1.0, IronPlanes.None, new CoilRow(2, pitch)).BySeparation[1];

        Assert.Equal(row, ring, 0.02 * Math.Abs(row));
    }

    // Coplanar loops: M = -mu0 A1 A2/(4 pi d³) (1 + (9/8)(a1² + a2²)/d² - (9/2) z²/d²), z the difference of height; from the
    // Legendre series of a loop's field. Over the turns: mean a² = integral of rho², z² = t²/6.
    [Fact]
    public void Row_RoundsApart_TendToDipoles()
    {
        const double inner = 0.01;
        const double outer = 0.02;
        const double thickness = 0.005;
        const double distance = 0.1;
        CoilOutline coil = CoilOutline.Round(inner, outer, thickness, 0.0);
        double square = (inner * inner + inner * outer + outer * outer) / 3.0;
        double fourth = (Math.Pow(outer, 5) - Math.Pow(inner, 5)) / (5.0 * (outer - inner));
        double correction = 1.0 + (2.25 * fourth / square - 0.75 * thickness * thickness) / (distance * distance);
        double expected = -Mu0 * Math.PI * square * square * correction / (4.0 * Math.Pow(distance, 3));

        CoilInductances row = CoilMutualInductance.Row(coil, 1.0, IronPlanes.None, new CoilRow(2, distance));

        Assert.Equal(expected, row.BySeparation[1], 0.004 * Math.Abs(expected) + row.Error);
    }

    [Fact]
    public void Ring_RoundCoils_MatchNeumannSum()
    {
        const double thickness = 0.010;
        CoilOutline coil = CoilOutline.Round(0.010, 0.025, thickness, 0.08);
        double expected = 0.0;
        for (int cell = 0; cell < 81; cell++)
        {
            int i = cell % 3;
            int j = cell / 3 % 3;
            int low = cell / 9 % 3;
            int high = cell / 27;
            double weight = DepthWeights[i] * DepthWeights[j] * DepthWeights[low] * DepthWeights[high];
            double[][] first = Circle(0.010 + 0.015 * DepthNodes[i], 0.0, thickness * DepthNodes[low]);
            double[][] second = Circle(0.010 + 0.015 * DepthNodes[j], 2.0 * 0.08 * Math.Sin(Math.PI / 6.0), thickness * DepthNodes[high]);
            expected += weight * FilamentOracle.Polygons(first, second);
        }

        CoilInductances coils = CoilMutualInductance.Ring(coil, 1.0, IronPlanes.None, 6);

        Assert.Equal(expected, coils.BySeparation[1], 3e-3 * Math.Abs(expected));
    }

    // Between planes that touch the coils the field of a coil stays inside it, so coils apart do not link.
    [Fact]
    public void Ring_PlanesTouching_LeaveCoilsUnlinked()
    {
        CoilInductances coils = CoilMutualInductance.Ring(Keystone, 1.0, new IronPlanes(0.0, 0.0), 9);

        Assert.Equal(0.0, coils.BySeparation[1] / coils.Self, 1e-3);
        Assert.Equal(0.0, coils.BySeparation[3] / coils.Self, 1e-3);
    }

    [Fact]
    public void Ring_TooManyCoils_IsNotANumber()
    {
        CoilInductances coils = CoilMutualInductance.Ring(Keystone, 1.0, IronPlanes.None, 721);

        Assert.True(double.IsNaN(coils.Between(0, 1)));
    }

    [Fact]
    public void Between_RingAndRow_CountSeparationsTheirWay()
    {
        CoilInductances ring = CoilMutualInductance.Ring(Keystone, 1.0, IronPlanes.None, 5);
        CoilInductances row = CoilMutualInductance.Row(Rectangle, 1.0, IronPlanes.None, new CoilRow(5, 0.07));

        Assert.Equal(ring.BySeparation[1], ring.Between(0, 4));
        Assert.Equal(row.BySeparation[4], row.Between(4, 0));
        Assert.Equal(ring.Self, ring.Between(3, 3));
    }

    [Fact]
    public void Ring_OneCoil_HasOnlySelf() => Assert.Single(CoilMutualInductance.Ring(Keystone, 1.0, IronPlanes.None, 1).BySeparation);

    // Turns at Gauss depths and heights; Neumann integral between nested polygons, one turn in all.
    private static double NestedTurns(CoilOutline coil, double turned, double shifted, double lifted)
    {
        double sum = 0.0;
        for (int i = 0; i < 3; i++)
        {
            for (int j = 0; j < 3; j++)
            {
                for (int low = 0; low < 3; low++)
                {
                    for (int high = 0; high < 3; high++)
                    {
                        double weight = DepthWeights[i] * DepthWeights[j] * DepthWeights[low] * DepthWeights[high];
                        double[][] first = Turn(coil, DepthNodes[i], 0.0, 0.0, coil.Thickness * DepthNodes[low]);
                        double[][] second = Turn(coil, DepthNodes[j], turned, shifted, lifted + coil.Thickness * DepthNodes[high]);
                        sum += weight * FilamentOracle.Polygons(first, second);
                    }
                }
            }
        }

        return sum;
    }

    private static double[][] Turn(CoilOutline coil, double depthShare, double turned, double shifted, double height)
    {
        double depth = depthShare * coil.LegWidth;
        double b = CoilGeometry.LegHalfAngle(coil);
        double inner = coil.PitchRadius - 0.5 * coil.HoleLength - depth;
        double outer = coil.PitchRadius + 0.5 * coil.HoleLength + depth;
        double Half(double x) => coil.Shape == CoilShape.Keystone
            ? x * Math.Tan(b) - (0.5 * coil.LegWidth - depth) / Math.Cos(b)
            : 0.5 * coil.HoleWidth + depth;
        double[] Place(double x, double y) =>
        [
            x * Math.Cos(turned) - y * Math.Sin(turned),
            x * Math.Sin(turned) + y * Math.Cos(turned) + shifted,
            height,
        ];
        return [Place(inner, -Half(inner)), Place(outer, -Half(outer)), Place(outer, Half(outer)), Place(inner, Half(inner))];
    }

    private static double[][] Circle(double radius, double centre, double height) => [.. Enumerable.Range(0, 24)
        .Select(i => new[] { centre + radius * Equal * Math.Cos(Math.PI * i / 12), radius * Equal * Math.Sin(Math.PI * i / 12), height })];

    // Polygon of 24 sides with the circle's area.
    private static readonly double Equal = Math.Sqrt(Math.PI / (12.0 * Math.Sin(Math.PI / 12.0)));
}
