using System.Collections.Immutable;
using CsCheck;
using SpecLint.Physics.Electrical;
using SpecLint.Physics.Geometry;
using SpecLint.Physics.Windings;

namespace SpecLint.Tests.Physics.Electrical;

public sealed class SynchronousInductanceTests
{
    // Nine coils, every third one a phase: own mutuals at three pitches, foreign ones at 1, 2 and 4, by hand.
    [Fact]
    public void Synchronous_NineCoils_IsSelfLessMutual()
    {
        CoilInductances coils = Table(9, [10.0, -2.0, -0.5, -0.2, -0.1]);

        PhaseInductance phase = SynchronousInductance.Of(coils, PhaseEmfTests.Paths(9, 6, 1));

        double self = 3.0 * (10.0 + 2.0 * -0.2);
        double mutual = 3.0 * (-2.0 - 0.5 - 0.1);
        Assert.Equal(self, phase.Self, 1e-12);
        Assert.Equal(self - mutual, phase.Synchronous, 1e-12);
        Assert.Equal(self + 2.0 * mutual, phase.ZeroSequence, 1e-12);
    }

    // 12 coils, 10 poles: neighbours of a phase are reversed, so their negative mutual adds to the self inductance.
    [Fact]
    public void Self_ReversedNeighbours_AddTheirMutual()
    {
        CoilInductances coils = Table(12, [10.0, -2.0, 0.0, 0.0, 0.0, 0.0, 0.0]);

        PhaseInductance phase = SynchronousInductance.Of(coils, PhaseEmfTests.Paths(12, 5, 1));

        Assert.Equal(4.0 * 10.0 + 4.0 * 2.0, phase.Self, 1e-12);
    }

    [Fact]
    public void Paths_Parallel_DivideBySquare()
    {
        CoilInductances coils = Table(12, [10.0, -2.0, 0.3, -0.2, 0.0, 0.0, 0.0]);
        double series = SynchronousInductance.Of(coils, PhaseEmfTests.Paths(12, 8, 1)).Synchronous;

        Assert.Equal(series / 16.0, SynchronousInductance.Of(coils, PhaseEmfTests.Paths(12, 8, 4)).Synchronous, 1e-12);
    }

    // Energy: the quadratic form of balanced currents is m/2 times the synchronous inductance, and cannot be negative.
    [Fact]
    public void Synchronous_RealCoils_HasPositiveEnergy() => Gen.Double[0.002, 0.03].Sample(
        distance =>
        {
            var coil = new CoilOutline
            {
                Shape = CoilShape.Keystone,
                HoleLength = 0.046,
                HoleWidth = 0.026,
                LegWidth = 0.016,
                Thickness = 0.013,
                PitchRadius = 0.115,
            };
            CoilInductances coils = CoilMutualInductance.Ring(coil, 55.0, new IronPlanes(distance, distance), 9);
            PhaseInductance phase = SynchronousInductance.Of(coils, PhaseEmfTests.Paths(9, 6, 1));
            Assert.True(phase.Synchronous > 0.0 && phase.ZeroSequence > 0.0);
            Assert.InRange(phase.Synchronous / (3.0 * coils.Self), 0.9, 1.6);
        },
        iter: 5);

    private static CoilInductances Table(int coils, ImmutableArray<double> values) => new()
    {
        Arrangement = CoilArrangement.Ring,
        Coils = coils,
        BySeparation = values,
        Error = 0.0,
    };
}
