using System.Collections.Immutable;

namespace SpecLint.Physics.Windings;

/// <summary>Which coil belongs to which phase, and with which sense.</summary>
public sealed record WindingLayout
{
    /// <summary>Pole pairs of the machine, >= 1.</summary>
    public required int PolePairs { get; init; }

    /// <summary>Number of phases, >= 1.</summary>
    public required int Phases { get; init; }

    /// <summary>Mechanical angle of each coil axis [rad], coil by coil.</summary>
    public required ImmutableArray<double> CoilAngles { get; init; }

    /// <summary>Phase of each coil, from 0.</summary>
    public required ImmutableArray<int> CoilPhases { get; init; }

    /// <summary>Sense of each coil, +1 or -1.</summary>
    public required ImmutableArray<int> CoilSenses { get; init; }

    /// <summary>Whether the phases carry equal EMF, evenly displaced. See <see cref="StarOfSlots"/> for the criterion.</summary>
    public required bool IsBalanced { get; init; }

    /// <summary>Largest departure of a phase's fundamental EMF phasor from the symmetric set, over the mean phase EMF; 0 when balanced.</summary>
    public required double Imbalance { get; init; }

    /// <summary>Number of coils.</summary>
    public int Coils => CoilPhases.Length;

    /// <summary>Electrical angle by which a phase lags phase 0.</summary>
    /// <param name="phase">Phase, from 0.</param>
    /// <returns>[rad]: 2 pi/m apart for an odd number of phases and for one, pi/m apart for an even number (two phases in quadrature).</returns>
    public double PhaseAngle(int phase) => StarOfSlots.PhaseAngle(phase, Phases);

    /// <summary>Coils of a phase.</summary>
    /// <param name="phase">Phase, from 0.</param>
    /// <returns>Count.</returns>
    public int CoilsOfPhase(int phase)
    {
        int count = 0;
        foreach (int coilPhase in CoilPhases)
        {
            count += coilPhase == phase ? 1 : 0;
        }

        return count;
    }

    /// <summary>Coil numbers of a phase, from 1, negative where the coil is reversed.</summary>
    /// <param name="phase">Phase, from 0.</param>
    /// <returns>Signed numbers in rising order.</returns>
    public ImmutableArray<int> SignedCoilNumbers(int phase)
    {
        var numbers = ImmutableArray.CreateBuilder<int>();
        for (int coil = 0; coil < Coils; coil++)
        {
            if (CoilPhases[coil] == phase)
            {
                numbers.Add(CoilSenses[coil] * (coil + 1));
            }
        }

        return numbers.ToImmutable();
    }
}
