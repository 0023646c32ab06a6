using CsCheck;
using SpecLint.Physics.Windings;

namespace SpecLint.Tests.Physics.Windings;

public sealed class StarOfSlotsTests
{
    // Fundamental factors of tooth coils as any text on fractional-slot windings tabulates them.
    [Theory]
    [InlineData(12, 8, 0.8660)]
    [InlineData(9, 12, 0.8660)]
    [InlineData(12, 16, 0.8660)]
    [InlineData(15, 20, 0.8660)]
    [InlineData(6, 8, 0.8660)]
    [InlineData(9, 8, 0.9452)]
    [InlineData(12, 10, 0.9330)]
    [InlineData(30, 22, 0.8740)]
    public void Factor_ToothCoils_MatchesPublished(int coils, int poles, double expected)
    {
        WindingLayout layout = StarOfSlots.EquallySpaced(coils, poles / 2, 3);

        double factor = DistributionFactor.Of(layout, 0, 1) * Math.Abs(CoilSpanFactor.OfSlots(1, poles / 2, 1, coils));

        Assert.True(layout.IsBalanced);
        Assert.Equal(expected, factor, 5e-5);
    }

    // Public practitioner's note on 12 coils and 10 poles: pairs 15 degrees off the resultant, cos 15 = 0.9659.
    [Fact]
    public void Distribution_TwelveCoilsTenPoles_LosesCosineOfFifteenDegrees() =>
        Assert.Equal(Math.Cos(Math.PI / 12.0), DistributionFactor.Of(StarOfSlots.EquallySpaced(12, 5, 3), 0, 1), 1e-12);

    [Fact]
    public void Layout_NineCoilsTwelvePoles_IsEveryThirdCoil()
    {
        WindingLayout layout = StarOfSlots.EquallySpaced(9, 6, 3);

        Assert.Equal([1, 4, 7], layout.SignedCoilNumbers(0));
        Assert.Equal(1.0, DistributionFactor.Of(layout, 1, 1), 1e-12);
        Assert.Equal(1.0, DistributionFactor.Of(layout, 2, 3), 1e-12);
    }

    [Fact]
    public void Layout_FivePhases_IsBalanced()
    {
        WindingLayout layout = StarOfSlots.EquallySpaced(10, 4, 5);

        Assert.True(layout.IsBalanced);
        Assert.InRange(layout.Imbalance, 0.0, 1e-12);
        for (int phase = 0; phase < 5; phase++)
        {
            Assert.Equal(2, layout.CoilsOfPhase(phase));
            Assert.Equal(1.0, DistributionFactor.Of(layout, phase, 1), 1e-12);
        }
    }

    [Fact]
    public void Layout_TwoPhasesInQuadrature_IsBalanced()
    {
        WindingLayout layout = StarOfSlots.EquallySpaced(8, 2, 2);

        Assert.True(layout.IsBalanced);
        Assert.Equal(4, layout.CoilsOfPhase(1));
        Assert.InRange(layout.Imbalance, 0.0, 1e-12);
    }

    [Theory]
    [InlineData(12, 8)]
    [InlineData(3, 2)]
    public void Layout_OneCoilPerPolePairAndPhase_IsBalanced(int coils, int poles) =>
        Assert.True(StarOfSlots.EquallySpaced(coils, poles / 2, 3).IsBalanced);

    // All coils in phase: no three-phase set exists.
    [Fact]
    public void Layout_CoilsEqualPolePairs_IsUnbalanced()
    {
        WindingLayout layout = StarOfSlots.EquallySpaced(6, 6, 3);

        Assert.False(layout.IsBalanced);
        Assert.Equal(2, layout.CoilsOfPhase(2));
        Assert.True(layout.Imbalance > 0.5);
        Assert.True(StarOfSlots.EquallySpaced(6, 6, 1).IsBalanced);
    }

    [Theory]
    [InlineData(15, 12)]
    [InlineData(12, 18)]
    [InlineData(12, 12)]
    public void Layout_Unbalanced_SharesCoilsEvenlyAndReportsImbalance(int coils, int poles)
    {
        WindingLayout layout = StarOfSlots.EquallySpaced(coils, poles / 2, 3);

        Assert.False(layout.IsBalanced);
        for (int phase = 0; phase < 3; phase++)
        {
            Assert.Equal(coils / 3, layout.CoilsOfPhase(phase));
        }

        Assert.InRange(layout.Imbalance, 0.01, 2.0);
        Assert.InRange(DistributionFactor.Mean(layout, 1), 0.0, 1.0);
    }

    // The integer criterion and the residual of the phasors agree wherever phases can be formed.
    [Fact]
    public void Balance_Criterion_AgreesWithResidual() =>
        Gen.Select(Gen.Int[1, 12], Gen.Int[1, 20], Gen.Int[1, 5]).Sample((perPhase, pairs, phases) =>
        {
            WindingLayout layout = StarOfSlots.EquallySpaced(perPhase * phases, pairs, phases);
            return layout.IsBalanced ? layout.Imbalance < 1e-9 : layout.Imbalance > 1e-6;
        });

    [Fact]
    public void AtAngles_EvenSpacing_EqualsIntegerStar() =>
        Gen.Select(Gen.Int[1, 10], Gen.Int[1, 20]).Where((perPhase, pairs) => StarOfSlots.IsBalancedCount(3 * perPhase, pairs, 3)).Sample(
            (perPhase, pairs) =>
            {
                WindingLayout exact = StarOfSlots.EquallySpaced(3 * perPhase, pairs, 3);
                WindingLayout stated = StarOfSlots.AtAngles(exact.CoilAngles.AsSpan(), pairs, 3);
                Assert.True(stated.IsBalanced);
                Assert.Equal(exact.CoilPhases, stated.CoilPhases);
                Assert.Equal(exact.CoilSenses, stated.CoilSenses);
            });

    [Fact]
    public void AtAngles_ShiftedCoil_IsUnbalanced()
    {
        double[] angles = [.. StarOfSlots.EquallySpaced(9, 6, 3).CoilAngles];
        angles[4] += 0.01;

        WindingLayout layout = StarOfSlots.AtAngles(angles, 6, 3);

        Assert.False(layout.IsBalanced);
        // One of three coils 0.06 electrical radians off moves the phase phasor by 0.02, the mean by a third of it.
        Assert.Equal(0.02 * 2.0 / 3.0, layout.Imbalance, 5e-4);
    }

    [Fact]
    public void Counts_Nonsense_Throws()
    {
        Assert.Throws<ArgumentOutOfRangeException>(() => StarOfSlots.EquallySpaced(2, 4, 3));
        Assert.Throws<ArgumentOutOfRangeException>(() => StarOfSlots.EquallySpaced(9, 0, 3));
    }
}
