using System.Collections.Immutable;
using System.Numerics;
using SpecLint.Physics.Windings;

namespace SpecLint.Physics.Electrical;

/// <summary>Electromotive forces of coil, phase and line per unit of mechanical speed.</summary>
/// <remarks>
/// A coil at angle theta_k links N sum of psi_n cos(n p (theta - theta_k)); EMF = -d(linkage)/d(theta). Orders are electrical; angles of the
/// waveforms are electrical, p times the rotor angle. For a linear machine the ratio of electrical
/// to mechanical travel is pi/pole pitch, the speed then in m/s.
/// </remarks>
/// <seealso>Pyrhonen, Jokinen, Hrabovcova, Design of Rotating Electrical Machines, 2nd ed. 2013, section 7 (no-load EMF from linkage); star and delta: any text on three-phase circuits.</seealso>
public static class PhaseEmf
{
    /// <summary>EMF of one coil per unit of speed.</summary>
    /// <param name="linkage">Linkage of the coil.</param>
    /// <param name="electricalPerMechanical">Electrical radians per unit of travel: pole pairs, or pi/pole pitch [rad/m].</param>
    /// <returns>[V s/rad], or [V s/m] for a linear machine.</returns>
    public static HarmonicWaveform OfCoil(in CoilLinkage linkage, double electricalPerMechanical)
    {
        var amplitudes = ImmutableArray.CreateBuilder<Complex>(linkage.PerTurn.Length);
        for (int index = 0; index < linkage.PerTurn.Length; index++)
        {
            amplitudes.Add(new Complex(0.0, -(2 * index + 1) * electricalPerMechanical * linkage.Turns * linkage.PerTurn[index]));
        }

        return new HarmonicWaveform { Amplitudes = amplitudes.MoveToImmutable() };
    }

    /// <summary>EMF of one phase per unit of speed, mean of its parallel paths.</summary>
    /// <param name="linkage">Linkage of one coil.</param>
    /// <param name="paths">Connection.</param>
    /// <param name="phase">Phase, from 0.</param>
    /// <returns>[V s/rad].</returns>
    public static HarmonicWaveform OfPhase(in CoilLinkage linkage, WindingPaths paths, int phase)
    {
        ArgumentNullException.ThrowIfNull(paths);
        return OfPhase(OfCoil(linkage, paths.Layout.PolePairs), paths, phase);
    }

    /// <summary>EMF of one phase from the EMF of a coil on the axis.</summary>
    /// <param name="coil">EMF of one coil, from <see cref="OfCoil"/>.</param>
    /// <param name="paths">Connection.</param>
    /// <param name="phase">Phase, from 0.</param>
    /// <returns>In the unit of the coil's EMF; the sum over the phase's coils, each turned back by its angle, over the number of paths.</returns>
    public static HarmonicWaveform OfPhase(HarmonicWaveform coil, WindingPaths paths, int phase)
    {
        ArgumentNullException.ThrowIfNull(coil);
        ArgumentNullException.ThrowIfNull(paths);
        var amplitudes = ImmutableArray.CreateBuilder<Complex>(coil.Amplitudes.Length);
        for (int index = 0; index < coil.Amplitudes.Length; index++)
        {
            Complex sum = Complex.Conjugate(DistributionFactor.PhasorSum(paths.Layout, phase, 2 * index + 1));
            amplitudes.Add(coil.Amplitudes[index] * sum / paths.ParallelPaths);
        }

        return new HarmonicWaveform { Amplitudes = amplitudes.MoveToImmutable() };
    }

    /// <summary>Voltage between two star-connected phases.</summary>
    /// <param name="first">EMF of one phase.</param>
    /// <param name="second">EMF of the other phase.</param>
    /// <returns>Difference; triplen orders of a balanced three-phase set cancel.</returns>
    public static HarmonicWaveform StarLine(HarmonicWaveform first, HarmonicWaveform second)
    {
        ArgumentNullException.ThrowIfNull(first);
        ArgumentNullException.ThrowIfNull(second);
        ArgumentOutOfRangeException.ThrowIfNotEqual(second.Amplitudes.Length, first.Amplitudes.Length, nameof(second));
        var amplitudes = ImmutableArray.CreateBuilder<Complex>(first.Amplitudes.Length);
        for (int index = 0; index < first.Amplitudes.Length; index++)
        {
            amplitudes.Add(first.Amplitudes[index] - second.Amplitudes[index]);
        }

        return new HarmonicWaveform { Amplitudes = amplitudes.MoveToImmutable() };
    }

    /// <summary>Open-circuit voltage between the corners of a delta.</summary>
    /// <param name="phase">EMF of one phase of a balanced set.</param>
    /// <param name="phases">Phases in the ring, >= 3 and odd.</param>
    /// <returns>The phase EMF without orders that are multiples of the number of phases: those drive the circulating current and drop on the way.</returns>
    public static HarmonicWaveform DeltaLine(HarmonicWaveform phase, int phases)
    {
        ArgumentNullException.ThrowIfNull(phase);
        ArgumentOutOfRangeException.ThrowIfLessThan(phases, 3);
        var amplitudes = ImmutableArray.CreateBuilder<Complex>(phase.Amplitudes.Length);
        for (int index = 0; index < phase.Amplitudes.Length; index++)
        {
            amplitudes.Add((2 * index + 1) % phases == 0 ? Complex.Zero : phase.Amplitudes[index]);
        }

        return new HarmonicWaveform { Amplitudes = amplitudes.MoveToImmutable() };
    }
}
