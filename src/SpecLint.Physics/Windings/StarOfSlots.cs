using System.Collections.Immutable;
using System.Numerics;

namespace SpecLint.Physics.Windings;

/// <summary>Assignment of coils to phases from the electrical angles of their axes.</summary>
/// <remarks>
/// Each coil's EMF is a phasor at p times its mechanical angle. The circle is cut into 2m belts of pi/m, lower edge
/// included, the first centred on phase 0; a belt opposite a phase takes its coils reversed. Equally spaced coils are
/// placed in integer arithmetic, so no coil on a belt's edge is misjudged by rounding. Balanced means: with
/// t = Q/gcd(Q, p) distinct phasors, lcm(t, 2) is a multiple of 2m, which for an odd number of phases is
/// "Q/(m gcd(Q, p)) is an integer"; for coils at stated angles the residual of the phase phasors decides.
/// Where equal coil counts are possible but the belts give unequal ones, coils are exchanged until the sum of
/// the projections on the phase axes stops rising.
/// </remarks>
/// <seealso>Pyrhonen, Jokinen, Hrabovcova, Design of Rotating Electrical Machines, 2nd ed. 2013, chapter 2 (voltage phasor diagram, fractional-slot windings); belts generalised to m phases here.</seealso>
public static class StarOfSlots
{
    /// <summary>Residual under which coils at stated angles count as balanced, over the mean phase EMF.</summary>
    public const double BalanceTolerance = 1e-9;

    private const double EdgeTolerance = 1e-12;

    /// <summary>Star of equally spaced coils, the first at angle 0.</summary>
    /// <param name="coils">Number of coils, >= 1 and >= phases.</param>
    /// <param name="polePairs">Pole pairs, >= 1.</param>
    /// <param name="phases">Phases, >= 1.</param>
    /// <returns>The layout; unbalanced combinations carry their best assignment and their imbalance.</returns>
    public static WindingLayout EquallySpaced(int coils, int polePairs, int phases) =>
        EquallySpaced(coils, polePairs, phases, 0);

    /// <summary>Star of equally spaced coils whose first axis is turned, as for coils that span several slots.</summary>
    /// <param name="coils">Number of coils, >= phases.</param>
    /// <param name="polePairs">Pole pairs, >= 1.</param>
    /// <param name="phases">Phases, >= 1.</param>
    /// <param name="spanSlots">Span of a coil in coil pitches, >= 0; the first axis lies at half of it, the slots at whole pitches.</param>
    /// <returns>The layout.</returns>
    public static WindingLayout EquallySpaced(int coils, int polePairs, int phases, int spanSlots)
    {
        CheckCounts(coils, polePairs, phases);
        ArgumentOutOfRangeException.ThrowIfNegative(spanSlots);
        var angles = new double[coils];
        var belts = new int[coils];
        long circle = 2L * coils;
        for (int coil = 0; coil < coils; coil++)
        {
            long position = 2L * coil + spanSlots;
            angles[coil] = Math.PI * position / coils;

            // Electrical angle = 2 pi (position p mod 2Q)/(2Q); belt = floor(angle m/pi + 1/2).
            long turn = position * polePairs % circle;
            belts[coil] = (int)((2 * turn * phases + coils) / circle % (2 * phases));
        }

        return Assemble(angles, belts, polePairs, phases) with { IsBalanced = IsBalancedCount(coils, polePairs, phases) };
    }

    /// <summary>Star of coils at stated angles.</summary>
    /// <param name="mechanicalAngles">Angle of each coil axis [rad]; for a linear machine pi x/pole pitch with one pole pair.</param>
    /// <param name="polePairs">Pole pairs, >= 1.</param>
    /// <param name="phases">Phases, >= 1.</param>
    /// <returns>The layout; balance is judged by the residual.</returns>
    public static WindingLayout AtAngles(ReadOnlySpan<double> mechanicalAngles, int polePairs, int phases)
    {
        CheckCounts(mechanicalAngles.Length, polePairs, phases);
        var belts = new int[mechanicalAngles.Length];
        for (int coil = 0; coil < belts.Length; coil++)
        {
            double belt = mechanicalAngles[coil] * polePairs * phases / Math.PI + 0.5;
            double wrapped = belt - 2.0 * phases * Math.Floor(belt / (2.0 * phases) + EdgeTolerance);
            belts[coil] = (int)Math.Floor(wrapped + EdgeTolerance * phases) % (2 * phases);
        }

        return Assemble(mechanicalAngles.ToArray(), belts, polePairs, phases);
    }

    /// <summary>Whether equally spaced coils can give balanced phases.</summary>
    /// <param name="coils">Number of coils, >= 1.</param>
    /// <param name="polePairs">Pole pairs, >= 1.</param>
    /// <param name="phases">Phases, >= 1.</param>
    /// <returns>The exact integer criterion named above.</returns>
    public static bool IsBalancedCount(int coils, int polePairs, int phases)
    {
        CheckCounts(1, polePairs, 1);
        int phasors = coils / (int)BigInteger.GreatestCommonDivisor(coils, polePairs);
        int withOpposites = phasors % 2 == 0 ? phasors : 2 * phasors;
        return withOpposites % (2 * phases) == 0;
    }

    /// <summary>Electrical angle by which a phase lags phase 0.</summary>
    /// <param name="phase">Phase, from 0.</param>
    /// <param name="phases">Phases, >= 1.</param>
    /// <returns>[rad].</returns>
    public static double PhaseAngle(int phase, int phases) => (phases % 2 == 0 ? Math.PI : 2.0 * Math.PI) * phase / phases;

    /// <summary>Largest departure of the phases' fundamental phasors from a symmetric set.</summary>
    /// <param name="layout">Layout; its own balance entries are not read.</param>
    /// <returns>Ratio to the mean phase EMF; 1 or more if a phase is empty.</returns>
    public static double ImbalanceOf(WindingLayout layout)
    {
        ArgumentNullException.ThrowIfNull(layout);
        Complex mean = Complex.Zero;
        for (int phase = 0; phase < layout.Phases; phase++)
        {
            mean += TurnedBack(layout, phase) / layout.Phases;
        }

        double largest = 0.0;
        for (int phase = 0; phase < layout.Phases; phase++)
        {
            largest = Math.Max(largest, Complex.Abs(TurnedBack(layout, phase) - mean));
        }

        double size = Complex.Abs(mean);
        return size > 0.0 ? largest / size : double.PositiveInfinity;
    }

    private static Complex TurnedBack(WindingLayout layout, int phase) =>
        DistributionFactor.PhasorSum(layout, phase, 1) * Complex.FromPolarCoordinates(1.0, -layout.PhaseAngle(phase));

    private static WindingLayout Assemble(double[] angles, int[] belts, int polePairs, int phases)
    {
        var phaseOf = new int[belts.Length];
        var senseOf = new int[belts.Length];
        for (int coil = 0; coil < belts.Length; coil++)
        {
            (phaseOf[coil], senseOf[coil]) = PhaseOfBelt(belts[coil], phases);
        }

        EqualCoilCounts.Reassign(angles, polePairs, phases, phaseOf, senseOf);
        var layout = new WindingLayout
        {
            PolePairs = polePairs,
            Phases = phases,
            CoilAngles = ImmutableArray.Create(angles),
            CoilPhases = ImmutableArray.Create(phaseOf),
            CoilSenses = ImmutableArray.Create(senseOf),
            IsBalanced = false,
            Imbalance = 0.0,
        };
        double imbalance = ImbalanceOf(layout);
        return layout with { Imbalance = imbalance, IsBalanced = imbalance < BalanceTolerance };
    }

    private static (int Phase, int Sense) PhaseOfBelt(int belt, int phases)
    {
        if (phases % 2 == 0)
        {
            return belt < phases ? (belt, 1) : (belt - phases, -1);
        }

        return belt % 2 == 0 ? (belt / 2, 1) : ((belt + phases) / 2 % phases, -1);
    }

    private static void CheckCounts(int coils, int polePairs, int phases)
    {
        ArgumentOutOfRangeException.ThrowIfNegativeOrZero(polePairs);
        ArgumentOutOfRangeException.ThrowIfNegativeOrZero(phases);
        ArgumentOutOfRangeException.ThrowIfLessThan(coils, phases);
    }
}
