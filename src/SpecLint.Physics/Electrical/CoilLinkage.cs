using System.Collections.Immutable;
using System.Runtime.InteropServices;

namespace SpecLint.Physics.Electrical;

/// <summary>Flux linkage of one coil as the rotor turns (or the mover travels).</summary>
/// <remarks>psi(theta) per turn = sum over the odd orders n of psi_n cos(n p theta), theta from the coil axis; see <see cref="PhaseEmf"/>.</remarks>
[StructLayout(LayoutKind.Auto)]
public readonly record struct CoilLinkage
{
    /// <summary>Signed cosine amplitudes per turn [Wb], of orders 1, 3, 5, ...</summary>
    public required ImmutableArray<double> PerTurn { get; init; }

    /// <summary>Turns of one coil, > 0.</summary>
    public required double Turns { get; init; }
}
