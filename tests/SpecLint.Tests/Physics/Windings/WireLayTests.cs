using CsCheck;
using SpecLint.Physics.Windings;

namespace SpecLint.Tests.Physics.Windings;

public sealed class WireLayTests
{
    private static readonly WireSpace Space = new()
    {
        Width = 0.016,
        Thickness = 0.013,
        BareDiameter = 1.291e-3,
        OverallDiameter = 1.39e-3,
    };

    [Fact]
    public void Square_KnownSpace_IsLayersTimesWires() => Assert.Equal(11 * 9, WireLay.SquareCapacity(Space));

    // Layers stacked over the width: 1 + floor((16 - 1.39)/1.2038) = 13, of 9 and 8 wires (13/1.39 = 9.35, less a half 8.85).
    // Stacked over the thickness: 10 layers of 11 and 11 (16/1.39 = 11.51, less a half 11.01), one fewer in all.
    [Fact]
    public void Nested_KnownSpace_CountsAlternateLayers() => Assert.Equal(7 * 9 + 6 * 8, WireLay.NestedCapacity(Space));

    [Fact]
    public void Square_ExactMultiple_IsNotLostToRounding() =>
        Assert.Equal(30, WireLay.SquareCapacity(Space with { Width = 0.3, Thickness = 1.0, BareDiameter = 0.09, OverallDiameter = 0.1 }));

    [Fact]
    public void Capacity_WireThickerThanSpace_IsZero()
    {
        WireSpace space = Space with { Thickness = 1e-3 };

        Assert.Equal(0, WireLay.SquareCapacity(space));
        Assert.Equal(0, WireLay.NestedCapacity(space));
        Assert.Equal(0, WireLay.LayersNeeded(space, 10));
    }

    [Fact]
    public void Fill_GeometricLimits_AreNeverPassed() =>
        Gen.Select(Gen.Double[2e-3, 0.03], Gen.Double[2e-3, 0.03], Gen.Double[2e-4, 2e-3]).Sample((width, thickness, wire) =>
        {
            var space = new WireSpace { Width = width, Thickness = thickness, BareDiameter = wire, OverallDiameter = wire };
            Assert.True(WireLay.CopperFill(space, WireLay.SquareCapacity(space)) <= 0.25 * Math.PI + 1e-9);
            Assert.True(WireLay.CopperFill(space, WireLay.NestedCapacity(space)) <= 0.5 * Math.PI / Math.Sqrt(3.0) + 1e-9);
        });

    // Wire of 1.000 mm grade 2, overall 1.094 mm: at best 0.656 square and 0.758 nested, reached in a large section.
    [Fact]
    public void Fill_LargeSection_TendsToTableLimits()
    {
        var space = new WireSpace { Width = 2.0, Thickness = 2.0, BareDiameter = 1e-3, OverallDiameter = 1.094e-3 };

        Assert.Equal(0.656, WireLay.CopperFill(space, WireLay.SquareCapacity(space)), 2e-3);
        Assert.Equal(0.758, WireLay.CopperFill(space, WireLay.NestedCapacity(space)), 2e-3);
    }

    [Fact]
    public void Layers_AreWhole() => Assert.Equal(13, WireLay.LayersNeeded(Space, 110));
}
