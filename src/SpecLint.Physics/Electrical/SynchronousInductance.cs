using SpecLint.Physics.Windings;

namespace SpecLint.Physics.Electrical;

/// <summary>Phase inductance of a winding from the inductances of its coils.</summary>
public static class SynchronousInductance
{
    /// <summary>Self, synchronous and zero-sequence inductance of a phase.</summary>
    /// <param name="coils">Inductances of the coils, as many as the winding has, in its order.</param>
    /// <param name="paths">Connection of the coils.</param>
    /// <returns>[H], mean over the phases; all mutuals with the senses of the coils.</returns>
    /// <remarks>
    /// A phase current splits evenly over its parallel paths and the linkage is the mean of the paths, so coil pair (i, j) weighs
    /// s_i s_j/a². Balanced currents: linkage of phase A = sum over phases of L_AB cos(phi_A - phi_B) times the current.
    /// </remarks>
    /// <seealso>Pyrhonen, Jokinen, Hrabovcova, Design of Rotating Electrical Machines, 2nd ed. 2013, chapter 4 (synchronous inductance as sum over phases).</seealso>
    public static PhaseInductance Of(CoilInductances coils, WindingPaths paths)
    {
        ArgumentNullException.ThrowIfNull(coils);
        ArgumentNullException.ThrowIfNull(paths);
        WindingLayout layout = paths.Layout;
        ArgumentOutOfRangeException.ThrowIfNotEqual(coils.Coils, layout.Coils, nameof(coils));
        double self = 0.0;
        double synchronous = 0.0;
        double zeroSequence = 0.0;
        for (int first = 0; first < layout.Coils; first++)
        {
            for (int second = 0; second < layout.Coils; second++)
            {
                int phase = layout.CoilPhases[first];
                int other = layout.CoilPhases[second];
                double signed = layout.CoilSenses[first] * layout.CoilSenses[second] * coils.Between(first, second);
                if (phase < 0 || other < 0)
                {
                    continue;
                }

                self += phase == other ? signed : 0.0;
                synchronous += signed * Math.Cos(layout.PhaseAngle(phase) - layout.PhaseAngle(other));
                zeroSequence += signed;
            }
        }

        double share = 1.0 / (layout.Phases * (double)paths.ParallelPaths * paths.ParallelPaths);
        return new PhaseInductance(share * self, share * synchronous, share * zeroSequence);
    }
}
