using CsCheck;
using SpecLint.Physics.Geometry;

namespace SpecLint.Tests.Physics.Geometry;

public sealed class PlacementTests
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

    [Fact]
    public void SpaceBetweenCoils_SharpOutlines_MatchesBruteForce() =>
        Gen.Select(Gen.Double[0.02, 0.06], Gen.Double[0.01, 0.04], Gen.Double[0.004, 0.014], Gen.Int[3, 16], Gen.Bool).Sample(
            (length, width, leg, coils, straight) =>
            {
                CoilOutline coil = Keystone with
                {
                    Shape = straight ? CoilShape.Rectangle : CoilShape.Keystone,
                    HoleLength = length,
                    HoleWidth = width,
                    LegWidth = leg,
                };
                double space = CoilPlacement.SpaceBetweenCoils(coil, coils);
                double brute = 2.0 * DistanceToMidLine(CoilPlacement.OuterCorners(coil), Math.PI / coils);
                Assert.Equal(brute, space, 1e-9);
            },
            iter: 300);

    [Fact]
    public void SpaceBetweenCoils_Round_IsChordLessDiameter()
    {
        CoilOutline coil = CoilOutline.Round(0.012, 0.028, 0.01, 0.1);

        Assert.Equal(0.2 * Math.Sin(Math.PI / 9.0) - 0.056, CoilPlacement.SpaceBetweenCoils(coil, 9), 1e-15);
    }

    // Legs along the rays of neighbours that meet at the middle line are parallel to it: the space is the same at every radius.
    [Fact]
    public void SpaceBetweenCoils_KeystoneLegsOnPitchRays_IsZeroLessLegWidth()
    {
        double b = Math.PI / 9.0;
        double width = 2.0 * (0.115 * Math.Tan(b) - 0.5 * 0.016 / Math.Cos(b));
        CoilOutline coil = Keystone with { HoleWidth = width };

        Assert.Equal(-0.016, CoilPlacement.SpaceBetweenCoils(coil, 9), 1e-12);
    }

    [Fact]
    public void Reach_Keystone_IsInnerBarAndOuterCorner()
    {
        double outer = CoilPlacement.OuterCorners(Keystone).Max(point => point.Radius);

        Assert.Equal(0.115 - 0.023 - 0.016, CoilPlacement.InnermostRadius(Keystone), 1e-15);
        Assert.Equal(outer, CoilPlacement.OutermostRadius(Keystone), 1e-15);
        Assert.True(CoilPlacement.OutermostRadius(Keystone with { CornerRadius = 0.004 }) < outer);
    }

    [Fact]
    public void SpaceInRow_CoilsAndMagnets_IsPitchLessWidth()
    {
        var magnet = new MagnetOutline { Shape = MagnetShape.Block, Length = 0.046, Width = 0.03 };

        Assert.Equal(0.07 - 0.058, CoilPlacement.SpaceInRow(Keystone with { Shape = CoilShape.Rectangle }, 0.07), 1e-15);
        Assert.Equal(0.01, MagnetPlacement.SpaceInRow(magnet, 0.04), 1e-15);
    }

    // 46 x 30 blocks, 12 on 115 mm: inner corners at 92 mm along the radius, 15 mm aside.
    [Fact]
    public void SpaceBetweenMagnets_Block_MatchesBruteForce()
    {
        var magnet = new MagnetOutline { Shape = MagnetShape.Block, Length = 0.046, Width = 0.03, PitchRadius = 0.115 };
        PlanePoint[] corners = [new(0.092, 0.015), new(0.138, 0.015)];

        Assert.Equal(2.0 * DistanceToMidLine(corners, Math.PI / 12.0), MagnetPlacement.SpaceBetweenMagnets(magnet, 12), 1e-15);
        Assert.Equal(double.Hypot(0.138, 0.015), MagnetPlacement.OutermostRadius(magnet), 1e-15);
        Assert.Equal(0.03, MagnetPlacement.Extent(magnet), 1e-15);
    }

    [Fact]
    public void SpaceBetweenMagnets_DiscAndSector_AreExact()
    {
        var disc = new MagnetOutline { Shape = MagnetShape.Disc, Length = 0.02, Width = 0.02, PitchRadius = 0.055 };
        var sector = new MagnetOutline { Shape = MagnetShape.Sector, Length = 0.04, PitchRadius = 0.1, SectorAngle = 0.8 * Math.PI / 6.0 };

        Assert.Equal(0.11 * Math.Sin(Math.PI / 12.0) - 0.02, MagnetPlacement.SpaceBetweenMagnets(disc, 12), 1e-15);
        Assert.Equal(0.16 * Math.Sin(0.1 * Math.PI / 6.0), MagnetPlacement.SpaceBetweenMagnets(sector, 12), 1e-15);
        Assert.Equal(0.25 * Math.PI * 0.02, MagnetPlacement.Extent(disc), 1e-15);
        Assert.Equal(0.1 * 0.8 * Math.PI / 6.0, MagnetPlacement.Extent(sector), 1e-15);
    }

    [Fact]
    public void SpaceBetweenMagnets_SectorTooWide_IsNegative() =>
        Assert.True(MagnetPlacement.SpaceBetweenMagnets(
            new MagnetOutline { Shape = MagnetShape.Sector, Length = 0.04, PitchRadius = 0.1, SectorAngle = 0.6 }, 12) < 0.0);

    // Points spread densely along the upper half of the outline, signed distance from the line midway to the neighbour.
    private static double DistanceToMidLine(IReadOnlyList<PlanePoint> corners, double angle)
    {
        double least = double.PositiveInfinity;
        for (int i = 0; i < corners.Count; i++)
        {
            PlanePoint from = corners[i];
            PlanePoint to = corners[(i + 1) % corners.Count];
            for (int step = 0; step <= 50; step++)
            {
                double x = from.Across + (to.Across - from.Across) * step / 50.0;
                double y = from.Along + (to.Along - from.Along) * step / 50.0;
                least = Math.Min(least, double.Hypot(x, y) * Math.Sin(angle - Math.Atan2(y, x)));
            }
        }

        return least;
    }
}
