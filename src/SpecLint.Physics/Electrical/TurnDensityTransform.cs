using System.Numerics;
using System.Runtime.InteropServices;
using SpecLint.Physics.Geometry;

namespace SpecLint.Physics.Electrical;

/// <summary>Fourier transform of the turn density of a keystone or rectangular coil with mitred turns.</summary>
/// <remarks>
/// -k² W^(k) is the sum over the <see cref="CoilCreases"/> of the jump of the normal slope times the line\'s transform.
/// The corners come in mirrored pairs, so four phases are enough for eight corners.
/// </remarks>
[StructLayout(LayoutKind.Auto)]
internal readonly struct TurnDensityTransform
{
    private const double SmallPhase = 1e-4;
    private const double LongWave = 1e-3;

    private readonly CoilCreases _creases;
    private readonly double _reach;

    /// <summary>Prepares a coil, its coordinates counted from a point on the coil axis.</summary>
    /// <param name="coil">Buildable keystone or rectangle.</param>
    /// <param name="origin">Distance of the origin from the shaft axis [m].</param>
    public TurnDensityTransform(in CoilOutline coil, double origin)
    {
        _creases = new CoilCreases(coil, origin);
        _reach = _creases.Reach;
        double halfAngle = CoilGeometry.LegHalfAngle(coil);
        Volume = coil.HoleLength * coil.HoleWidth
            + 0.5 * coil.LegWidth * CoilGeometry.MeanTurnLength(coil with { CornerRadius = null })
            - coil.LegWidth * coil.LegWidth * CornerArea(halfAngle);
    }

    /// <summary>Largest distance of the contour from the origin [m].</summary>
    public double Reach => _reach;

    /// <summary>Integral of the turn density over the plane [m²], the transform at wave number 0.</summary>
    public double Volume { get; }

    /// <summary>Factor C of the short-wave limit: the mean of |W^|² over direction tends to C/k^5 [1/m].</summary>
    /// <remarks>Each straight crease of length l and jump g gives 2 l g²; the cross terms only oscillate.</remarks>
    public double ShortWave
    {
        get
        {
            double edges = 2.0 * (_creases.HoleInner.Along + _creases.HoleOuter.Along + _creases.RimInner.Along + _creases.RimOuter.Along
                + _creases.HoleLeg + _creases.RimLeg);
            double mitres = 2.0 * (_creases.InnerMitreJump * _creases.InnerMitreJump * _creases.InnerMitre
                + _creases.OuterMitreJump * _creases.OuterMitreJump * _creases.OuterMitre);
            return 2.0 * (_creases.Slope * _creases.Slope * edges + mitres);
        }
    }

    /// <summary>Transform W^ = integral of W exp(-j k.r).</summary>
    /// <param name="across">Wave number along the coil axis [1/m].</param>
    /// <param name="along">Wave number along the motion [1/m].</param>
    /// <returns>[m²]; even in the wave number along the motion.</returns>
    public Complex At(double across, double along)
    {
        double square = across * across + along * along;
        if (square * _reach * _reach < LongWave * LongWave)
        {
            return Volume;
        }

        PlanePoint holeInner = _creases.HoleInner;
        PlanePoint holeOuter = _creases.HoleOuter;
        PlanePoint rimInner = _creases.RimInner;
        PlanePoint rimOuter = _creases.RimOuter;
        Pair atHoleInner = Phases(holeInner, across, along);
        Pair atHoleOuter = Phases(holeOuter, across, along);
        Pair atRimInner = Phases(rimInner, across, along);
        Pair atRimOuter = Phases(rimOuter, across, along);
        Complex edges = Bar(rimInner, atRimInner, along) + Bar(rimOuter, atRimOuter, along)
            - Bar(holeInner, atHoleInner, along) - Bar(holeOuter, atHoleOuter, along)
            + (_creases.RimLeg * Sides(rimInner, rimOuter, atRimInner, atRimOuter, across, along))
            - (_creases.HoleLeg * Sides(holeInner, holeOuter, atHoleInner, atHoleOuter, across, along));
        Complex mitres = (_creases.InnerMitreJump * _creases.InnerMitre) * Sides(holeInner, rimInner, atHoleInner, atRimInner, across, along)
            + (_creases.OuterMitreJump * _creases.OuterMitre) * Sides(holeOuter, rimOuter, atHoleOuter, atRimOuter, across, along);
        return (mitres - _creases.Slope * edges) / square;
    }

    // Pyramid correction at the four corners: turns of depth s enclose A0 + L0 s + (sum of tan(exterior/2)) s².
    private static double CornerArea(double halfAngle) =>
        2.0 / 6.0 * (Math.Tan(0.25 * Math.PI - 0.5 * halfAngle) + Math.Tan(0.25 * Math.PI + 0.5 * halfAngle));

    private static Pair Phases(PlanePoint corner, double across, double along)
    {
        (double sineX, double cosineX) = Math.SinCos(across * corner.Across);
        (double sineY, double cosineY) = Math.SinCos(along * corner.Along);
        return new Pair(
            new Complex(cosineX * cosineY - sineX * sineY, -(sineX * cosineY + cosineX * sineY)),
            new Complex(cosineX * cosineY + sineX * sineY, -(sineX * cosineY - cosineX * sineY)));
    }

    private static Complex Bar(PlanePoint corner, Pair phases, double along) =>
        Line(2.0 * corner.Along, 2.0 * along * corner.Along, phases.Minus, phases.Plus);

    // Of unit length: the two mirrored lines from corner to corner.
    private static Complex Sides(PlanePoint from, PlanePoint to, Pair start, Pair end, double across, double along)
    {
        double advanceX = across * (to.Across - from.Across);
        double advanceY = along * (to.Along - from.Along);
        return Line(1.0, advanceX + advanceY, start.Plus, end.Plus) + Line(1.0, advanceX - advanceY, start.Minus, end.Minus);
    }

    // Integral of exp(-j phase) along a line whose phase advances evenly: (start - end)/(j advance), by series when the advance is small.
    private static Complex Line(double length, double advance, Complex start, Complex end)
    {
        if (Math.Abs(advance) < SmallPhase)
        {
            return 0.5 * length * (1.0 + advance * advance / 12.0) * (start + end);
        }

        double scale = length / advance;
        return new Complex(scale * (start.Imaginary - end.Imaginary), scale * (end.Real - start.Real));
    }

    [StructLayout(LayoutKind.Auto)]
    private readonly record struct Pair(Complex Plus, Complex Minus);
}
