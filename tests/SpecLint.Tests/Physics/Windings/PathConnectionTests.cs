using System.Collections.Immutable;
using System.Numerics;
using SpecLint.Physics.Windings;

namespace SpecLint.Tests.Physics.Windings;

public sealed class PathConnectionTests
{
    private static readonly WindingLayout NineTwelve = StarOfSlots.EquallySpaced(9, 6, 3);

    [Fact]
    public void Regular_AllInSeries_HasOnePathPerPhase()
    {
        Assert.True(PathConnection.TryRegular(NineTwelve, 1, out WindingPaths? paths));

        Assert.Equal(3, paths.PathCoils.Length);
        Assert.Equal([3, 6, 9], paths.PathCoils[1]);
        Assert.Equal(0.0, paths.LargestDifference);
        Assert.Equal(3.0, Complex.Abs(paths.PathPhasors[2]), 1e-12);
    }

    [Fact]
    public void Regular_ThreePaths_AreEqual()
    {
        Assert.True(PathConnection.TryRegular(NineTwelve, 3, out WindingPaths? paths));

        Assert.Equal(3, paths.ParallelPaths);
        Assert.InRange(paths.LargestDifference, 0.0, 1e-12);
    }

    // 12 coils, 10 poles: coils 1, -2 and -7, 8 of a phase form equal halves; one coil a path does not.
    [Fact]
    public void Regular_TwelveTen_TwoPathsEqualFourNot()
    {
        WindingLayout layout = StarOfSlots.EquallySpaced(12, 5, 3);
        Assert.True(PathConnection.TryRegular(layout, 2, out WindingPaths? two));
        Assert.True(PathConnection.TryRegular(layout, 4, out WindingPaths? four));

        Assert.InRange(two.LargestDifference, 0.0, 1e-12);
        // Phasors 30 degrees apart: 2 sin 15 over cos 15.
        Assert.Equal(2.0 * Math.Tan(Math.PI / 12.0), four.LargestDifference, 1e-12);
    }

    [Fact]
    public void Regular_UnevenSplit_Fails() => Assert.False(PathConnection.TryRegular(NineTwelve, 2, out _));

    [Fact]
    public void Listed_CustomaryConnection_IsBalanced()
    {
        Assert.True(PathConnection.TryListed(NineTwelve, [[1, 4, 7], [2, 5, 8], [3, 6, 9]], out WindingPaths? paths));

        Assert.True(paths.Layout.IsBalanced);
        Assert.Equal(0, paths.PathPhases[0]);
        Assert.Equal(3, paths.PathPhases.Distinct().Count());
    }

    [Fact]
    public void Listed_CoilsSwappedBetweenPhases_IsUnbalanced()
    {
        Assert.True(PathConnection.TryListed(NineTwelve, [[1, 4, 8], [2, 5, 7], [3, 6, 9]], out WindingPaths? paths));

        Assert.False(paths.Layout.IsBalanced);
        Assert.True(paths.Layout.Imbalance > 0.1);
    }

    [Fact]
    public void Listed_ReversedCoilInPath_DiffersFromItsTwin()
    {
        WindingLayout layout = StarOfSlots.EquallySpaced(12, 8, 3);
        Assert.True(PathConnection.TryListed(
            layout, [[1, 4], [7, 10], [2, 5], [8, 11], [3, 6], [9, 12]], out WindingPaths? right));
        Assert.InRange(right.LargestDifference, 0.0, 1e-12);

        WindingLayout tenPoles = StarOfSlots.EquallySpaced(12, 5, 3);
        ImmutableArray<ImmutableArray<int>> crossed = [[1, 7], [2, 8], [3, 9], [4, 10], [5, 11], [6, 12]];
        Assert.True(PathConnection.TryListed(tenPoles, crossed, out WindingPaths? wrong));
        Assert.True(wrong.LargestDifference > 0.02);
    }

    [Fact]
    public void Listed_BadNumbers_Fail()
    {
        Assert.False(PathConnection.TryListed(NineTwelve, [[1, 4, 7], [2, 5, 8], [3, 6, 10]], out _));
        Assert.False(PathConnection.TryListed(NineTwelve, [[1, 4, 7], [2, 5, 8], [3, 6, 1]], out _));
        Assert.False(PathConnection.TryListed(NineTwelve, [[1, 4, 7], [2, 5, 8]], out _));
        Assert.False(PathConnection.TryListed(NineTwelve, [[1, 4, 7], [], [2]], out _));
    }

    [Fact]
    public void CoilsUsed_IsProduct() => Assert.Equal(9, PathConnection.CoilsUsed(3, 1, 3));
}
