using System.Collections.Immutable;

namespace SpecLint.Physics.Electrical;

/// <summary>Self and mutual inductances of equal coils in one plane.</summary>
public sealed record CoilInductances
{
    /// <summary>Ring or row.</summary>
    public required CoilArrangement Arrangement { get; init; }

    /// <summary>Number of coils.</summary>
    public required int Coils { get; init; }

    /// <summary>Inductance by separation in coil pitches [H]: the self inductance first, then the mutuals, all wound in one sense.</summary>
    public required ImmutableArray<double> BySeparation { get; init; }

    /// <summary>Estimate of the largest integration error [H].</summary>
    public required double Error { get; init; }

    /// <summary>Self inductance of one coil [H].</summary>
    public double Self => BySeparation[0];

    /// <summary>Inductance between two coils of one sense.</summary>
    /// <param name="first">Coil, from 0.</param>
    /// <param name="second">Coil, from 0.</param>
    /// <returns>[H]; the self inductance when they are the same. Mutuals of coils side by side in air are negative.</returns>
    public double Between(int first, int second)
    {
        int separation = Math.Abs(first - second);
        return BySeparation[Arrangement == CoilArrangement.Ring ? Math.Min(separation, Coils - separation) : separation];
    }
}
