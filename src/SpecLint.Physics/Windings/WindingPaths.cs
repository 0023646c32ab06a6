using System.Collections.Immutable;

namespace SpecLint.Physics.Windings;

/// <summary>A winding's parallel paths: coils in series per path, their EMF phasors and how far they differ.</summary>
public sealed record WindingPaths
{
    /// <summary>Layout that follows from the connection: phase and sense of every coil as connected.</summary>
    public required WindingLayout Layout { get; init; }

    /// <summary>Phase of each path, from 0.</summary>
    public required ImmutableArray<int> PathPhases { get; init; }

    /// <summary>Signed coil numbers of each path, from 1, negative where the coil is reversed.</summary>
    public required ImmutableArray<ImmutableArray<int>> PathCoils { get; init; }

    /// <summary>Fundamental EMF phasor of each path in units of one coil's EMF.</summary>
    public required ImmutableArray<System.Numerics.Complex> PathPhasors { get; init; }

    /// <summary>Largest difference between two parallel paths of one phase, over the phase's mean path EMF.</summary>
    public required double LargestDifference { get; init; }

    /// <summary>Parallel paths of each phase, paths over phases.</summary>
    public int ParallelPaths => PathCoils.Length / Layout.Phases;
}
