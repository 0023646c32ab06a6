namespace SpecLint.Physics.Windings;

/// <summary>Gives every phase the same number of coils where phase belts alone do not.</summary>
internal static class EqualCoilCounts
{
    private const double LeastGain = 1e-9;
    private const int MostProjections = 100_000;
    private const int MostSweeps = 100;

    /// <summary>Reassigns coils, in place, if the phases hold unequal numbers and the coils can be shared out evenly.</summary>
    /// <remarks>
    /// Coils of over-full phases go one at a time where the projection on the phase axes loses least; pairs are then exchanged
    /// in sweeps while the sum of projections rises. The result is a local best. Above 100 000 projections nothing is done.
    /// </remarks>
    public static void Reassign(ReadOnlySpan<double> angles, int polePairs, int phases, Span<int> phaseOf, Span<int> senseOf)
    {
        int share = angles.Length / phases;
        if (angles.Length % phases != 0 || (long)angles.Length * phases > MostProjections || HasEqualCounts(phases, phaseOf, share))
        {
            return;
        }

        double[] sizes = new double[angles.Length * phases];
        for (int coil = 0; coil < angles.Length; coil++)
        {
            for (int phase = 0; phase < phases; phase++)
            {
                sizes[coil * phases + phase] = Math.Abs(Projection(angles[coil], polePairs, phase, phases));
            }
        }

        LevelCounts(sizes, phases, share, phaseOf);
        for (int sweep = 0; sweep < MostSweeps && ExchangeSweep(sizes, phases, phaseOf); sweep++)
        {
        }

        for (int coil = 0; coil < angles.Length; coil++)
        {
            senseOf[coil] = Projection(angles[coil], polePairs, phaseOf[coil], phases) < 0.0 ? -1 : 1;
        }
    }

    private static bool HasEqualCounts(int phases, ReadOnlySpan<int> phaseOf, int share)
    {
        for (int phase = 0; phase < phases; phase++)
        {
            if (phaseOf.Count(phase) != share)
            {
                return false;
            }
        }

        return true;
    }

    private static void LevelCounts(ReadOnlySpan<double> sizes, int phases, int share, Span<int> phaseOf)
    {
        int[] counts = new int[phases];
        foreach (int phase in phaseOf)
        {
            counts[phase]++;
        }

        while (true)
        {
            (int coil, int target) = CheapestMove(sizes, counts, share, phaseOf);
            if (coil < 0)
            {
                return;
            }

            counts[phaseOf[coil]]--;
            counts[target]++;
            phaseOf[coil] = target;
        }
    }

    private static (int Coil, int Target) CheapestMove(ReadOnlySpan<double> sizes, ReadOnlySpan<int> counts, int share, ReadOnlySpan<int> phaseOf)
    {
        double best = double.NegativeInfinity;
        (int Coil, int Target) move = (-1, -1);
        for (int coil = 0; coil < phaseOf.Length; coil++)
        {
            ReadOnlySpan<double> own = sizes.Slice(coil * counts.Length, counts.Length);
            for (int phase = 0; phase < counts.Length && counts[phaseOf[coil]] > share; phase++)
            {
                double gain = own[phase] - own[phaseOf[coil]];
                if (counts[phase] < share && gain > best + LeastGain)
                {
                    (best, move) = (gain, (coil, phase));
                }
            }
        }

        return move;
    }

    private static bool ExchangeSweep(ReadOnlySpan<double> sizes, int phases, Span<int> phaseOf)
    {
        bool exchanged = false;
        for (int first = 0; first < phaseOf.Length; first++)
        {
            for (int second = first + 1; second < phaseOf.Length; second++)
            {
                double now = sizes[first * phases + phaseOf[first]] + sizes[second * phases + phaseOf[second]];
                double then = sizes[first * phases + phaseOf[second]] + sizes[second * phases + phaseOf[first]];
                if (then > now + LeastGain)
                {
                    (phaseOf[first], phaseOf[second]) = (phaseOf[second], phaseOf[first]);
                    exchanged = true;
                }
            }
        }

        return exchanged;
    }

    private static double Projection(double angle, int polePairs, int phase, int phases) =>
        Math.Cos(polePairs * angle - StarOfSlots.PhaseAngle(phase, phases));
}
