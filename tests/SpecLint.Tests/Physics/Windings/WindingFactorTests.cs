using SpecLint.Physics.Geometry;
using SpecLint.Physics.Windings;

namespace SpecLint.Tests.Physics.Windings;

public sealed class WindingFactorTests
{
    private static readonly CoilOutline Coil = new()
    {
        Shape = CoilShape.Rectangle,
        HoleLength = 0.046,
        HoleWidth = 0.030,
        LegWidth = 0.010,
        Thickness = 0.013,
        PitchRadius = 0.115,
    };

    [Fact]
    public void Slots_TwelveTen_IsTextbookValue() =>
        Assert.Equal(0.933012702, WindingFactor.OfSlots(StarOfSlots.EquallySpaced(12, 5, 3), 1, 1, 12), 1e-9);

    // Full pitch with thin spread: sin(k w/2)/(k w/2) alone, 40 mm span on 40 mm poles.
    [Fact]
    public void Linear_FullPitch_IsSpreadAlone()
    {
        double half = 0.5 * Math.PI * 0.010 / 0.040;

        Assert.Equal(Math.Sin(half) / half, WindingFactor.OfLinear(StarOfSlots.EquallySpaced(3, 3, 1), Coil, 1, 0.040), 1e-12);
    }

    // At a large radius with the poles of equal pitch the disc is the linear machine.
    [Fact]
    public void Disc_LargeRadius_TendsToLinear()
    {
        const int pairs = 9000;
        WindingLayout layout = StarOfSlots.EquallySpaced(27000, pairs, 3);
        double radius = 0.040 * pairs / Math.PI;

        Assert.Equal(WindingFactor.OfLinear(layout, Coil, 5, 0.040), WindingFactor.OfDisc(layout, Coil, 5, radius), 1e-6);
    }
}
