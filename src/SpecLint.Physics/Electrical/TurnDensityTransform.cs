using System.Numerics;
using System.Runtime.InteropServices;
using SpecLint.Physics.Geometry;

namespace SpecLint.Physics.Electrical;

/// <summary>Fourier transform of the turn density of a keystone or rectangular coil with mitred turns.</summary>
/// <remarks>
/// W is 1 in the hole and falls linearly to 0 across the leg, so its Laplacian lives on the crease lines only: with jump g of
/// the normal slope, -k² W^(k) is the sum of g times the line's transform. g is -1/w on the four hole edges, +1/w on the
/// four outer edges, and -|n2 - n1|/w on the four mitres between sides with outward normals n1 and n2.
/// The corners come in mirrored pairs, so four phases are enough for eight corners.
/// </remarks>
[StructLayout(LayoutKind.Auto)]
internal readonly struct TurnDensityTransform
{
    private const double SmallPhase = 1e-4;
    private const double LongWave = 1e-3;

    private readonly PlanePoint _holeInner;
    private readonly PlanePoint _holeOuter;
    private readonly PlanePoint _rimInner;
    private readonly PlanePoint _rimOuter;
    private readonly double _slope;
    private readonly double _innerMitre;
    private readonly double _outerMitre;
    private readonly double _reach;

    /// <summary>Prepares a coil, its coordinates counted from a point on the coil axis.</summary>
    /// <param name="coil">Buildable keystone or rectangle.</param>
    /// <param name="origin">Distance of the origin from the shaft axis [m].</param>
    public TurnDensityTransform(in CoilOutline coil, double origin)
    {
        var trapezoid = new CoilTrapezoid(coil);
        _holeInner = Shift(trapezoid.InnerCorner(0.0), origin);
        _holeOuter = Shift(trapezoid.OuterCorner(0.0), origin);
        _rimInner = Shift(trapezoid.InnerCorner(coil.LegWidth), origin);
        _rimOuter = Shift(trapezoid.OuterCorner(coil.LegWidth), origin);
        _slope = 1.0 / coil.LegWidth;
        _innerMitre = _slope * 2.0 * Math.Sin(0.5 * (0.5 * Math.PI - trapezoid.HalfAngle));
        _outerMitre = _slope * 2.0 * Math.Sin(0.5 * (0.5 * Math.PI + trapezoid.HalfAngle));
        _reach = Math.Max(_rimInner.Radius, _rimOuter.Radius);
        Volume = coil.HoleLength * coil.HoleWidth
            + 0.5 * coil.LegWidth * CoilGeometry.MeanTurnLength(coil with { CornerRadius = null })
            - coil.LegWidth * coil.LegWidth * CornerArea(trapezoid.HalfAngle);
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
            double edges = 2.0 * (_holeInner.Along + _holeOuter.Along + _rimInner.Along + _rimOuter.Along
                + Distance(_holeInner, _holeOuter) + Distance(_rimInner, _rimOuter));
            double mitres = 2.0 * (_innerMitre * _innerMitre * Distance(_holeInner, _rimInner)
                + _outerMitre * _outerMitre * Distance(_holeOuter, _rimOuter));
            return 2.0 * (_slope * _slope * edges + mitres);
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

        Pair holeInner = Phases(_holeInner, across, along);
        Pair holeOuter = Phases(_holeOuter, across, along);
        Pair rimInner = Phases(_rimInner, across, along);
        Pair rimOuter = Phases(_rimOuter, across, along);
        Complex edges = Bar(_rimInner, rimInner, along) + Bar(_rimOuter, rimOuter, along)
            - Bar(_holeInner, holeInner, along) - Bar(_holeOuter, holeOuter, along)
            + Sides(_rimInner, _rimOuter, rimInner, rimOuter, across, along)
            - Sides(_holeInner, _holeOuter, holeInner, holeOuter, across, along);
        Complex mitres = _innerMitre * Sides(_holeInner, _rimInner, holeInner, rimInner, across, along)
            + _outerMitre * Sides(_holeOuter, _rimOuter, holeOuter, rimOuter, across, along);
        return (mitres - _slope * edges) / square;
    }

    private static PlanePoint Shift(PlanePoint point, double origin) => point with { Across = point.Across - origin };

    private static double Distance(PlanePoint from, PlanePoint to) => double.Hypot(to.Across - from.Across, to.Along - from.Along);

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

    private static Complex Sides(PlanePoint from, PlanePoint to, Pair start, Pair end, double across, double along)
    {
        double length = Distance(from, to);
        double advanceX = across * (to.Across - from.Across);
        double advanceY = along * (to.Along - from.Along);
        return Line(length, advanceX + advanceY, start.Plus, end.Plus) + Line(length, advanceX - advanceY, start.Minus, end.Minus);
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
