using System.Runtime.InteropServices;

namespace SpecLint.Physics.Magnetics;

/// <summary>Mean squares of the field's harmonics over part of a winding, each harmonic times its number.</summary>
/// <remarks>
/// With the pole-pair angular frequency omega (linear: pi v/tau), the mean square over time of dB/dt is omega^2/2 times the entries. Eddy loss
/// in a thin wire takes the two components across the wire.
/// </remarks>
[StructLayout(LayoutKind.Auto)]
public readonly record struct WindingFieldSquares
{
    /// <summary>Mean over the section of the sum over n of (n B_z,n)^2, along the gap [T^2].</summary>
    public required double Normal { get; init; }

    /// <summary>Mean over the section of the sum over n of (n B_t,n)^2, along the motion [T^2].</summary>
    public required double AlongMotion { get; init; }

    /// <summary>Mean over the section of the sum over n of (n B_r,n)^2, along the radius or across the travel [T^2].</summary>
    public required double AcrossMotion { get; init; }

    /// <summary>Mean over the section of the sum over n of n^2 times the square of the field across the wire [T^2].</summary>
    public required double AcrossWire { get; init; }
}
