using System.Numerics;

namespace SpecLint.Physics.Electrical;

/// <summary>Current that the phases' in-phase harmonics drive round a delta.</summary>
public static class DeltaCirculation
{
    /// <summary>Circulating current.</summary>
    /// <param name="phaseEmf">EMF of one phase [V], absolute.</param>
    /// <param name="circuit">Circuit.</param>
    /// <returns>Rms current [A] of all orders that are multiples of the phase number: E_n/|R + j n omega L0| each.</returns>
    /// <remarks>Balanced phases: the in-phase EMFs of all phases add round the ring, and so do the impedances, so one phase's ratio holds.</remarks>
    /// <seealso>Fitzgerald, Kingsley, Umans, Electric Machinery, 6th ed. 2003, appendix on three-phase circuits (third harmonics in delta).</seealso>
    public static double RmsCurrent(HarmonicWaveform phaseEmf, in DeltaCircuit circuit)
    {
        ArgumentNullException.ThrowIfNull(phaseEmf);
        double square = 0.0;
        for (int index = 0; index < phaseEmf.Amplitudes.Length; index++)
        {
            int order = 2 * index + 1;
            if (order % circuit.Phases == 0)
            {
                double reactance = order * circuit.ElectricalSpeed * circuit.ZeroSequenceInductance;
                double current = Complex.Abs(phaseEmf.Amplitudes[index]) / double.Hypot(circuit.PhaseResistance, reactance);
                square += 0.5 * current * current;
            }
        }

        return Math.Sqrt(square);
    }

    /// <summary>Loss of the circulating current over the copper loss of the load current.</summary>
    /// <param name="circulatingRms">Circulating current [A].</param>
    /// <param name="phaseRms">Load current of a phase [A], > 0; line current over sqrt(3) for three phases.</param>
    /// <returns>Ratio, same resistance for both.</returns>
    public static double LossRatio(double circulatingRms, double phaseRms) => circulatingRms * circulatingRms / (phaseRms * phaseRms);
}
