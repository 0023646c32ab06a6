namespace SpecLint.Physics.Windings;

/// <summary>Gives every phase the same number of coils where phase belts alone do not.</summary>
internal static class EqualCoilCounts
{
    private const double LeastGain = 1e-9;

    /// <summary>Reassigns coils, in place, if the phases hold unequal numbers and the coils can be shared out evenly.</summary>
    /// <remarks>
    /// Coils of over-full phases go one at a time where the projection on the phase axes loses least; pairs are then exchanged while
    /// the sum of projections rises. The gain threshold bounds the number of exchanges. The result is a local best.
    /// </remarks>
    public static void Reassign(ReadOnlySpan<double> angles, int polePairs, int phases, Span<int> phaseOf, Span<int> senseOf)
    {
        int share = angles.Length / phases;
        if (angles.Length % phases != 0 || HasEqualCounts(phases, phaseOf, share))
        {
            return;
        }

        while (MoveOne(angles, polePairs, phases, phaseOf))
        {
        }

        while (ExchangeOne(angles, polePairs, phases, phaseOf))
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

    private static bool MoveOne(ReadOnlySpan<double> angles, int polePairs, int phases, Span<int> phaseOf)
    {
        int share = angles.Length / phases;
        double best = double.NegativeInfinity;
        int bestCoil = -1;
        int bestPhase = -1;
        for (int coil = 0; coil < angles.Length; coil++)
        {
            if (phaseOf.Count(phaseOf[coil]) <= share)
            {
                continue;
            }

            for (int phase = 0; phase < phases; phase++)
            {
                double gain = Size(angles[coil], polePairs, phase, phases) - Size(angles[coil], polePairs, phaseOf[coil], phases);
                if (phaseOf.Count(phase) < share && gain > best + LeastGain)
                {
                    (best, bestCoil, bestPhase) = (gain, coil, phase);
                }
            }
        }

        if (bestCoil >= 0)
        {
            phaseOf[bestCoil] = bestPhase;
        }

        return bestCoil >= 0;
    }

    private static bool ExchangeOne(ReadOnlySpan<double> angles, int polePairs, int phases, Span<int> phaseOf)
    {
        for (int first = 0; first < angles.Length; first++)
        {
            for (int second = first + 1; second < angles.Length; second++)
            {
                double now = Size(angles[first], polePairs, phaseOf[first], phases) + Size(angles[second], polePairs, phaseOf[second], phases);
                double then = Size(angles[first], polePairs, phaseOf[second], phases) + Size(angles[second], polePairs, phaseOf[first], phases);
                if (then > now + LeastGain)
                {
                    (phaseOf[first], phaseOf[second]) = (phaseOf[second], phaseOf[first]);
                    return true;
                }
            }
        }

        return false;
    }

    private static double Size(double angle, int polePairs, int phase, int phases) => Math.Abs(Projection(angle, polePairs, phase, phases));

    private static double Projection(double angle, int polePairs, int phase, int phases) =>
        Math.Cos(polePairs * angle - StarOfSlots.PhaseAngle(phase, phases));
}
