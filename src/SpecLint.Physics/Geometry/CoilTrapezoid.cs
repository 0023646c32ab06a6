using System.Runtime.InteropServices;

namespace SpecLint.Physics.Geometry;

/// <summary>Nested mitred trapezoids of a keystone or rectangular coil.</summary>
/// <remarks>
/// The turn at depth s from the hole's edge has its bars at inner - s and outer + s and its legs at
/// across * slope - (w/2 - s)/cos(half angle) for a keystone; corners move along straight mitre lines as s grows.
/// </remarks>
[StructLayout(LayoutKind.Auto)]
internal readonly struct CoilTrapezoid
{
    private readonly double _holeInner;
    private readonly double _holeOuter;
    private readonly double _legOffset;

    /// <summary>Prepares the nested trapezoids of a coil that is not round.</summary>
    public CoilTrapezoid(in CoilOutline coil)
    {
        HalfAngle = CoilGeometry.LegHalfAngle(coil);
        (Sine, Cosine) = Math.SinCos(HalfAngle);
        _holeInner = coil.PitchRadius - 0.5 * coil.HoleLength;
        _holeOuter = coil.PitchRadius + 0.5 * coil.HoleLength;
        _legOffset = 0.5 * coil.HoleWidth * Cosine - coil.PitchRadius * Sine;
    }

    /// <summary>Angle of a leg against the coil axis [rad]; 0 for a rectangle.</summary>
    public double HalfAngle { get; }

    /// <summary>Sine of the half angle.</summary>
    public double Sine { get; }

    /// <summary>Cosine of the half angle.</summary>
    public double Cosine { get; }

    /// <summary>Corner of the turn at a depth, on the positive side, nearer the shaft.</summary>
    public PlanePoint InnerCorner(double depth) => Corner(_holeInner - depth, depth);

    /// <summary>Corner of the turn at a depth, on the positive side, farther from the shaft.</summary>
    public PlanePoint OuterCorner(double depth) => Corner(_holeOuter + depth, depth);

    private PlanePoint Corner(double across, double depth) => new(across, (across * Sine + _legOffset + depth) / Cosine);
}
