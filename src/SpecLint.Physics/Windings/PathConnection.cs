using System.Collections.Immutable;
using System.Numerics;

namespace SpecLint.Physics.Windings;

/// <summary>Connects coils into series paths and compares the EMF of parallel paths.</summary>
public static class PathConnection
{
    /// <summary>Coils that a stated connection uses.</summary>
    /// <param name="seriesCoils">Coils in series in one path, >= 1.</param>
    /// <param name="parallelPaths">Parallel paths of a phase, >= 1.</param>
    /// <param name="phases">Phases, >= 1.</param>
    /// <returns>Series coils times paths times phases; must equal the number of coils.</returns>
    public static long CoilsUsed(int seriesCoils, int parallelPaths, int phases) => (long)seriesCoils * parallelPaths * phases;

    /// <summary>Splits each phase's coils into equal paths.</summary>
    /// <param name="layout">Layout from <see cref="StarOfSlots"/>.</param>
    /// <param name="parallelPaths">Parallel paths of a phase, >= 1.</param>
    /// <param name="paths">The connection: neighbours in a path, or every so-manyth coil, whichever differs less; null on failure.</param>
    /// <returns>False if a phase's coils cannot be shared out evenly.</returns>
    public static bool TryRegular(WindingLayout layout, int parallelPaths, [System.Diagnostics.CodeAnalysis.NotNullWhen(true)] out WindingPaths? paths)
    {
        ArgumentNullException.ThrowIfNull(layout);
        ArgumentOutOfRangeException.ThrowIfNegativeOrZero(parallelPaths);
        paths = null;
        for (int phase = 0; phase < layout.Phases; phase++)
        {
            int coils = layout.CoilsOfPhase(phase);
            if (coils == 0 || coils % parallelPaths != 0)
            {
                return false;
            }
        }

        WindingPaths blocks = Assemble(layout, Split(layout, parallelPaths, PathOfBlock));
        WindingPaths combs = Assemble(layout, Split(layout, parallelPaths, PathOfComb));
        paths = combs.LargestDifference < blocks.LargestDifference - StarOfSlots.BalanceTolerance ? combs : blocks;
        return true;
    }

    /// <summary>Connects the coils as listed.</summary>
    /// <param name="layout">Layout from <see cref="StarOfSlots"/>; its senses hold for positive numbers.</param>
    /// <param name="coilNumbers">Coils of each path, from 1; a negative number reverses the coil against the layout's sense.</param>
    /// <param name="paths">The connection with the phases the paths' phasors point to; null on failure.</param>
    /// <returns>False if a number is out of range or used twice, a path is empty, or paths cannot be shared evenly over the phases.</returns>
    public static bool TryListed(
        WindingLayout layout,
        ImmutableArray<ImmutableArray<int>> coilNumbers,
        [System.Diagnostics.CodeAnalysis.NotNullWhen(true)] out WindingPaths? paths)
    {
        ArgumentNullException.ThrowIfNull(layout);
        paths = null;
        if (coilNumbers.IsDefaultOrEmpty || coilNumbers.Length % layout.Phases != 0 || !NumbersAreValid(coilNumbers, layout.Coils))
        {
            return false;
        }

        ImmutableArray<ImmutableArray<int>> signed = WithSenses(layout, coilNumbers);
        var phases = new int[signed.Length];
        for (int path = 0; path < signed.Length; path++)
        {
            phases[path] = NearestPhase(layout, Phasor(layout, signed[path]));
        }

        paths = Compare(AsConnected(layout, signed, phases), signed, phases);
        return EachPhaseHas(phases, layout.Phases);
    }

    private static int PathOfBlock(int index, int coils, int paths) => index * paths / coils;

    private static int PathOfComb(int index, int coils, int paths) => index % paths;

    private static ImmutableArray<ImmutableArray<int>> Split(WindingLayout layout, int parallelPaths, Func<int, int, int, int> pathOf)
    {
        var split = ImmutableArray.CreateBuilder<ImmutableArray<int>>();
        for (int phase = 0; phase < layout.Phases; phase++)
        {
            ImmutableArray<int> coils = layout.SignedCoilNumbers(phase);
            for (int path = 0; path < parallelPaths; path++)
            {
                var members = ImmutableArray.CreateBuilder<int>();
                for (int index = 0; index < coils.Length; index++)
                {
                    if (pathOf(index, coils.Length, parallelPaths) == path)
                    {
                        members.Add(coils[index]);
                    }
                }

                split.Add(members.ToImmutable());
            }
        }

        return split.ToImmutable();
    }

    private static WindingPaths Assemble(WindingLayout layout, ImmutableArray<ImmutableArray<int>> signed)
    {
        var phases = new int[signed.Length];
        for (int path = 0; path < signed.Length; path++)
        {
            phases[path] = layout.CoilPhases[Math.Abs(signed[path][0]) - 1];
        }

        return Compare(layout, signed, phases);
    }

    private static WindingPaths Compare(WindingLayout layout, ImmutableArray<ImmutableArray<int>> signed, int[] phases)
    {
        var phasors = new Complex[signed.Length];
        for (int path = 0; path < signed.Length; path++)
        {
            phasors[path] = Phasor(layout, signed[path]);
        }

        double largest = 0.0;
        for (int phase = 0; phase < layout.Phases; phase++)
        {
            largest = Math.Max(largest, DifferenceWithin(phasors, phases, phase));
        }

        return new WindingPaths
        {
            Layout = layout,
            PathCoils = signed,
            PathPhases = ImmutableArray.Create(phases),
            PathPhasors = ImmutableArray.Create(phasors),
            LargestDifference = largest,
        };
    }

    private static double DifferenceWithin(ReadOnlySpan<Complex> phasors, ReadOnlySpan<int> phases, int phase)
    {
        Complex sum = Complex.Zero;
        double largest = 0.0;
        int count = 0;
        for (int first = 0; first < phasors.Length; first++)
        {
            if (phases[first] != phase)
            {
                continue;
            }

            sum += phasors[first];
            count++;
            for (int second = first + 1; second < phasors.Length; second++)
            {
                if (phases[second] == phase)
                {
                    largest = Math.Max(largest, Complex.Abs(phasors[first] - phasors[second]));
                }
            }
        }

        return count < 2 ? 0.0 : largest * count / Complex.Abs(sum);
    }

    private static Complex Phasor(WindingLayout layout, ImmutableArray<int> signed)
    {
        Complex sum = Complex.Zero;
        foreach (int number in signed)
        {
            sum += Complex.FromPolarCoordinates(Math.Sign(number), layout.PolePairs * layout.CoilAngles[Math.Abs(number) - 1]);
        }

        return sum;
    }

    private static int NearestPhase(WindingLayout layout, Complex phasor)
    {
        int nearest = 0;
        double best = double.NegativeInfinity;
        for (int phase = 0; phase < layout.Phases; phase++)
        {
            (double sine, double cosine) = Math.SinCos(layout.PhaseAngle(phase));
            double projection = phasor.Real * cosine + phasor.Imaginary * sine;
            if (projection > best)
            {
                (best, nearest) = (projection, phase);
            }
        }

        return nearest;
    }

    private static bool NumbersAreValid(ImmutableArray<ImmutableArray<int>> coilNumbers, int coils)
    {
        var used = new bool[coils];
        foreach (ImmutableArray<int> path in coilNumbers)
        {
            if (path.IsDefaultOrEmpty)
            {
                return false;
            }

            foreach (int number in path)
            {
                if (number == 0 || number < -coils || number > coils || used[Math.Abs(number) - 1])
                {
                    return false;
                }

                used[Math.Abs(number) - 1] = true;
            }
        }

        return true;
    }

    private static ImmutableArray<ImmutableArray<int>> WithSenses(WindingLayout layout, ImmutableArray<ImmutableArray<int>> coilNumbers)
    {
        var paths = ImmutableArray.CreateBuilder<ImmutableArray<int>>(coilNumbers.Length);
        foreach (ImmutableArray<int> path in coilNumbers)
        {
            var members = ImmutableArray.CreateBuilder<int>(path.Length);
            foreach (int number in path)
            {
                members.Add(number * layout.CoilSenses[Math.Abs(number) - 1]);
            }

            paths.Add(members.MoveToImmutable());
        }

        return paths.MoveToImmutable();
    }

    private static WindingLayout AsConnected(WindingLayout layout, ImmutableArray<ImmutableArray<int>> signed, int[] phases)
    {
        int[] phaseOf = new int[layout.Coils];
        int[] senseOf = new int[layout.Coils];
        Array.Fill(phaseOf, -1);
        for (int path = 0; path < signed.Length; path++)
        {
            foreach (int number in signed[path])
            {
                phaseOf[Math.Abs(number) - 1] = phases[path];
                senseOf[Math.Abs(number) - 1] = Math.Sign(number);
            }
        }

        WindingLayout connected = layout with { CoilPhases = ImmutableArray.Create(phaseOf), CoilSenses = ImmutableArray.Create(senseOf) };
        double imbalance = StarOfSlots.ImbalanceOf(connected);
        return connected with { Imbalance = imbalance, IsBalanced = imbalance < StarOfSlots.BalanceTolerance };
    }

    private static bool EachPhaseHas(ReadOnlySpan<int> pathPhases, int phases)
    {
        for (int phase = 0; phase < phases; phase++)
        {
            if (pathPhases.Count(phase) != pathPhases.Length / phases)
            {
                return false;
            }
        }

        return true;
    }
}
