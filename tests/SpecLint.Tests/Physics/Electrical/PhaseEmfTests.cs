using System.Collections.Immutable;
using CsCheck;
using SpecLint.Physics.Electrical;
using SpecLint.Physics.Windings;

namespace SpecLint.Tests.Physics.Electrical;

public sealed class PhaseEmfTests
{
    private static readonly ImmutableArray<double> Psi = [1.0e-3, -0.12e-3, 0.03e-3, 0.015e-3, -0.002e-3];

    // Public design note of a desk machine, its own estimates: 200 turns, flux 7.9e-5 Wb, 12 Hz: 1.19 V peak, 0.84 V rms a coil; three in series 2.5 V.
    [Fact]
    public void Coil_PublishedDeskMachine_GivesItsVoltage()
    {
        var linkage = new CoilLinkage { PerTurn = [7.9e-5], Turns = 200.0 };
        double speed = 120.0 * Math.PI / 30.0;

        HarmonicWaveform coil = PhaseEmf.OfCoil(linkage, 6.0).Scaled(speed);
        HarmonicWaveform phase = PhaseEmf.OfPhase(linkage, Paths(9, 6, 1), 0).Scaled(speed);

        Assert.Equal(1.19, coil.Fundamental, 0.003);
        Assert.Equal(0.84, coil.Rms, 0.003);
        Assert.Equal(2.5, phase.Rms, 0.05);
    }

    [Fact]
    public void Phase_Waveform_IsMinusSlopeOfSummedLinkage() => Gen.Select(Gen.Double[0.0, 1.2], Gen.Int[0, 2]).Sample((theta, phase) =>
    {
        WindingPaths paths = Paths(12, 5, 2);
        var linkage = new CoilLinkage { PerTurn = Psi, Turns = 40.0 };
        const double step = 1e-6;
        double slope = (Linkage(paths, phase, theta + step) - Linkage(paths, phase, theta - step)) / (2.0 * step);

        Assert.Equal(-slope, PhaseEmf.OfPhase(linkage, paths, phase).At(5.0 * theta), 1e-6);
    });

    [Fact]
    public void StarLine_BalancedPhases_CancelsTriplenAndGainsRootThree()
    {
        WindingPaths paths = Paths(9, 6, 1);
        var linkage = new CoilLinkage { PerTurn = Psi, Turns = 40.0 };
        HarmonicWaveform a = PhaseEmf.OfPhase(linkage, paths, 0);
        HarmonicWaveform b = PhaseEmf.OfPhase(linkage, paths, 1);

        HarmonicWaveform line = PhaseEmf.StarLine(a, b);

        Assert.Equal(Math.Sqrt(3.0) * a.Fundamental, line.Fundamental, 1e-9);
        Assert.Equal(0.0, line.Amplitudes[1].Magnitude, 1e-12);
        Assert.True(line.Distortion < a.Distortion);
    }

    [Fact]
    public void DeltaLine_KeepsAllButTriplen()
    {
        HarmonicWaveform phase = PhaseEmf.OfCoil(new CoilLinkage { PerTurn = Psi, Turns = 1.0 }, 6.0);

        HarmonicWaveform line = PhaseEmf.DeltaLine(phase, 3);

        Assert.Equal(phase.Amplitudes[0], line.Amplitudes[0]);
        Assert.Equal(0.0, line.Amplitudes[1].Magnitude);
        Assert.Equal(0.0, line.Amplitudes[4].Magnitude);
        Assert.Equal(phase.Amplitudes[2], line.Amplitudes[2]);
    }

    [Fact]
    public void Phase_TwoPaths_HalvesVoltageOfSeries()
    {
        var linkage = new CoilLinkage { PerTurn = Psi, Turns = 40.0 };

        double series = PhaseEmf.OfPhase(linkage, Paths(12, 8, 1), 1).Fundamental;
        double parallel = PhaseEmf.OfPhase(linkage, Paths(12, 8, 2), 1).Fundamental;

        Assert.Equal(0.5 * series, parallel, 1e-12);
    }

    // E_3 over |R + j 3 omega L0|, by hand.
    [Fact]
    public void Delta_ThirdHarmonic_DrivesKnownCurrent()
    {
        var emf = new HarmonicWaveform { Amplitudes = [100.0, 10.0, 4.0, 3.0, 5.0] };
        var circuit = new DeltaCircuit { PhaseResistance = 0.5, ZeroSequenceInductance = 1e-3, ElectricalSpeed = 200.0, Phases = 3 };
        double third = 10.0 / Math.Sqrt(0.25 + 0.36);
        double ninth = 5.0 / Math.Sqrt(0.25 + 3.24);

        double current = DeltaCirculation.RmsCurrent(emf, circuit);

        Assert.Equal(Math.Sqrt(0.5 * (third * third + ninth * ninth)), current, 1e-12);
        Assert.Equal(0.04, DeltaCirculation.LossRatio(2.0, 10.0), 1e-15);
    }

    private static double Linkage(WindingPaths paths, int phase, double theta)
    {
        double sum = 0.0;
        for (int coil = 0; coil < paths.Layout.Coils; coil++)
        {
            if (paths.Layout.CoilPhases[coil] != phase)
            {
                continue;
            }

            for (int i = 0; i < Psi.Length; i++)
            {
                sum += 40.0 * paths.Layout.CoilSenses[coil] * Psi[i]
                    * Math.Cos((2 * i + 1) * paths.Layout.PolePairs * (theta - paths.Layout.CoilAngles[coil]));
            }
        }

        return sum / paths.ParallelPaths;
    }

    internal static WindingPaths Paths(int coils, int pairs, int parallel)
    {
        Assert.True(PathConnection.TryRegular(StarOfSlots.EquallySpaced(coils, pairs, 3), parallel, out WindingPaths? paths));
        return paths;
    }
}
