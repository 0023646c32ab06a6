using System.Collections.Immutable;

namespace SpecLint.Physics.Geometry;

/// <summary>Outer contour of a coil and the space between coils set round a shaft or in a row.</summary>
/// <remarks>
/// A coil with corner radius is the convex polygon of its corner centres grown by a disc, which makes reach and spacing
/// exact: the extreme over the whole outline is the extreme over the centres plus the disc's radius.
/// </remarks>
public static class CoilPlacement
{
    /// <summary>Corner points of the outer contour.</summary>
    /// <param name="coil">Buildable outline.</param>
    /// <returns>Four points anticlockwise from the inner corner on the negative side, corners taken sharp; for a ring the corners of its bounding square.</returns>
    public static ImmutableArray<PlanePoint> OuterCorners(in CoilOutline coil)
    {
        PlanePoint inner;
        PlanePoint outer;
        if (coil.Shape == CoilShape.Round)
        {
            double reach = 0.5 * coil.HoleWidth + coil.LegWidth;
            inner = new PlanePoint(coil.PitchRadius - reach, reach);
            outer = new PlanePoint(coil.PitchRadius + reach, reach);
        }
        else
        {
            var trapezoid = new CoilTrapezoid(coil);
            inner = trapezoid.InnerCorner(coil.LegWidth);
            outer = trapezoid.OuterCorner(coil.LegWidth);
        }

        return [inner with { Along = -inner.Along }, outer with { Along = -outer.Along }, outer, inner];
    }

    /// <summary>Smallest distance of the winding from the shaft axis.</summary>
    /// <param name="coil">Buildable outline with a pitch radius > 0.</param>
    /// <returns>[m]; negative if the coil reaches over the axis.</returns>
    public static double InnermostRadius(in CoilOutline coil) =>
        coil.PitchRadius - 0.5 * coil.HoleLength - coil.LegWidth;

    /// <summary>Largest distance of the winding from the shaft axis.</summary>
    /// <param name="coil">Buildable outline with a pitch radius > 0.</param>
    /// <returns>[m], over the rounded or sharp corners.</returns>
    public static double OutermostRadius(in CoilOutline coil)
    {
        (PlanePoint inner, PlanePoint outer, double growth) = CornerCentres(coil);
        return Math.Max(inner.Radius, outer.Radius) + growth;
    }

    /// <summary>Least space between neighbours of equally spaced coils round the shaft.</summary>
    /// <param name="coil">Buildable outline with a pitch radius > 0.</param>
    /// <param name="coils">Number of coils, >= 2.</param>
    /// <returns>[m], signed: negative is the depth of overlap across the line midway between two coil axes.</returns>
    /// <remarks>
    /// Neighbours are mirror images in that line, so the space is twice the distance of the outline from it; with
    /// convex outlines this is the exact minimum.
    /// </remarks>
    public static double SpaceBetweenCoils(in CoilOutline coil, int coils)
    {
        ArgumentOutOfRangeException.ThrowIfLessThan(coils, 2);
        (PlanePoint inner, PlanePoint outer, double growth) = CornerCentres(coil);
        (double sine, double cosine) = Math.SinCos(Math.PI / coils);
        double distance = Math.Min(
            inner.Across * sine - inner.Along * cosine,
            outer.Across * sine - outer.Along * cosine);
        return 2.0 * (distance - growth);
    }

    /// <summary>Space between neighbouring coils of a linear machine.</summary>
    /// <param name="coil">Rectangular or round outline.</param>
    /// <param name="coilPitch">Distance between coil axes along the motion [m], > 0.</param>
    /// <returns>[m], signed.</returns>
    public static double SpaceInRow(in CoilOutline coil, double coilPitch) =>
        coilPitch - coil.HoleWidth - 2.0 * coil.LegWidth;

    private static (PlanePoint Inner, PlanePoint Outer, double Growth) CornerCentres(in CoilOutline coil)
    {
        if (coil.Shape == CoilShape.Round)
        {
            var centre = new PlanePoint(coil.PitchRadius, 0.0);
            return (centre, centre, 0.5 * coil.HoleWidth + coil.LegWidth);
        }

        var trapezoid = new CoilTrapezoid(coil);
        return coil.CornerRadius is { } corner
            ? (trapezoid.InnerCorner(-corner), trapezoid.OuterCorner(-corner), coil.LegWidth + corner)
            : (trapezoid.InnerCorner(coil.LegWidth), trapezoid.OuterCorner(coil.LegWidth), 0.0);
    }
}
