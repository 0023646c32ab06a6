using CsCheck;
using SpecLint.Physics.Geometry;

namespace SpecLint.Tests.Physics.Geometry;

public sealed class CoilGeometryTests
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

    private static readonly CoilOutline Rectangle = Keystone with { Shape = CoilShape.Rectangle };
    private static readonly CoilOutline Round = CoilOutline.Round(0.012, 0.028, 0.010, 0.1);

    private static readonly Gen<CoilOutline> Keystones =
        Gen.Select(Gen.Double[0.02, 0.05], Gen.Double[0.02, 0.05], Gen.Double[0.004, 0.012]).Select((length, width, leg) => Keystone with
        {
            HoleLength = length,
            HoleWidth = width,
            LegWidth = leg,
        });

    [Fact]
    public void HalfAngle_Keystone_PutsInnerEdgesHoleWidthApart() => Keystones.Sample(coil =>
    {
        double b = CoilGeometry.LegHalfAngle(coil);
        double width = 2.0 * (coil.PitchRadius * Math.Tan(b) - 0.5 * coil.LegWidth / Math.Cos(b));
        Assert.Equal(coil.HoleWidth, width, 1e-12);
    });

    [Fact]
    public void MeanTurn_Rectangle_IsFourStraights() =>
        Assert.Equal(2.0 * (0.046 + 0.016 + 0.026 + 0.016), CoilGeometry.MeanTurnLength(Rectangle), 1e-15);

    [Fact]
    public void MeanTurn_Ring_IsMeanCircumference() => Assert.Equal(Math.PI * 0.040, CoilGeometry.MeanTurnLength(Round), 1e-15);

    // Area between contour and hole by the shoelace rule is leg width times mean turn.
    [Fact]
    public void MeanTurn_Keystone_TimesLegWidthIsPlanArea() => Keystones.Sample(coil =>
    {
        double contour = Shoelace(CoilPlacement.OuterCorners(coil));
        double expected = (contour - CoilGeometry.HoleArea(coil)) / coil.LegWidth;
        Assert.Equal(expected, CoilGeometry.MeanTurnLength(coil), 1e-9);
    });

    [Fact]
    public void MeanTurn_RoundedRectangle_IsStraightsAndQuarterCircles()
    {
        CoilOutline coil = Rectangle with { CornerRadius = 0.004 };

        double expected = 2.0 * (0.046 - 0.008 + 0.026 - 0.008) + 2.0 * Math.PI * (0.004 + 0.008);
        Assert.Equal(expected, CoilGeometry.MeanTurnLength(coil), 1e-15);
    }

    // A square hole with the largest corner radius is a ring.
    [Fact]
    public void MeanTurn_FullyRoundedSquare_IsRing()
    {
        CoilOutline square = Rectangle with { HoleLength = 0.024, HoleWidth = 0.024, CornerRadius = 0.012 };

        Assert.Equal(CoilGeometry.MeanTurnLength(Round), CoilGeometry.MeanTurnLength(square), 1e-12);
        Assert.Equal(CoilPlacement.OutermostRadius(Round with { PitchRadius = 0.115 }), CoilPlacement.OutermostRadius(square), 1e-12);
        Assert.Equal(
            CoilPlacement.SpaceBetweenCoils(Round with { PitchRadius = 0.115 }, 9), CoilPlacement.SpaceBetweenCoils(square, 9), 1e-12);
    }

    [Fact]
    public void MeanTurn_CornerRadius_ShortensKeystone() =>
        Assert.InRange(
            CoilGeometry.MeanTurnLength(Keystone with { CornerRadius = 0.004 }),
            0.8 * CoilGeometry.MeanTurnLength(Keystone),
            0.999 * CoilGeometry.MeanTurnLength(Keystone));

    [Fact]
    public void EndTurnShare_KnownShapes()
    {
        Assert.Equal(0.042 / 0.104, CoilGeometry.EndTurnShare(Rectangle), 1e-12);
        Assert.Equal(1.0 - 2.0 / Math.PI, CoilGeometry.EndTurnShare(Round), 1e-12);
    }

    [Fact]
    public void Spans_KeystoneAndRing_AreMeanChords()
    {
        double b = CoilGeometry.LegHalfAngle(Keystone);

        Assert.Equal(2.0 * 0.115 * Math.Tan(b), CoilGeometry.LegCentreSpan(Keystone), 1e-12);
        Assert.Equal(2.0 * b, CoilGeometry.LegCentreAngle(Keystone, 0.1), 1e-15);
        Assert.Equal(0.026, CoilGeometry.HoleExtent(Keystone), 1e-15);
        Assert.Equal(0.25 * Math.PI * 0.024, CoilGeometry.HoleExtent(Round), 1e-15);
        Assert.Equal(0.25 * Math.PI * 0.040, CoilGeometry.LegCentreSpan(Round), 1e-15);
        Assert.Equal(2.0 * Math.Asin(0.021 / 0.115), CoilGeometry.LegCentreAngle(Rectangle, 0.115), 1e-15);
    }

    [Fact]
    public void Lengths_Scale_WithTheDrawing() => Gen.Select(Keystones, Gen.Double[0.1, 10.0]).Sample((coil, scale) =>
    {
        CoilOutline scaled = coil with
        {
            HoleLength = scale * coil.HoleLength,
            HoleWidth = scale * coil.HoleWidth,
            LegWidth = scale * coil.LegWidth,
            Thickness = scale * coil.Thickness,
            PitchRadius = scale * coil.PitchRadius,
        };
        Assert.Equal(scale * CoilGeometry.MeanTurnLength(coil), CoilGeometry.MeanTurnLength(scaled), 1e-12 * scale);
        Assert.Equal(Math.Pow(scale, 3) * CoilGeometry.WindingVolume(coil), CoilGeometry.WindingVolume(scaled), 1e-12 * Math.Pow(scale, 3));
        Assert.Equal(CoilGeometry.EndTurnShare(coil), CoilGeometry.EndTurnShare(scaled), 1e-12);
        Assert.Equal(scale * CoilPlacement.SpaceBetweenCoils(coil, 9), CoilPlacement.SpaceBetweenCoils(scaled, 9), 1e-12 * scale);
    });

    [Theory]
    [InlineData(0.046, 0.026, 0.0, 0.115, true)]
    [InlineData(0.180, 0.026, 0.0, 0.115, false)]
    [InlineData(0.046, 0.026, 0.014, 0.115, false)]
    [InlineData(0.046, 0.026, 0.0, 0.0, false)]
    [InlineData(-0.046, 0.026, 0.0, 0.115, false)]
    [InlineData(double.NaN, 0.026, 0.0, 0.115, false)]
    public void Buildable_Keystone(double length, double width, double corner, double radius, bool expected) =>
        Assert.Equal(expected, CoilGeometry.IsBuildable(Keystone with
        {
            HoleLength = length,
            HoleWidth = width,
            CornerRadius = corner,
            PitchRadius = radius,
        }));

    private static double Shoelace(IReadOnlyList<PlanePoint> points)
    {
        double sum = 0.0;
        for (int i = 0; i < points.Count; i++)
        {
            PlanePoint next = points[(i + 1) % points.Count];
            sum += points[i].Across * next.Along - next.Across * points[i].Along;
        }

        return 0.5 * Math.Abs(sum);
    }
}
