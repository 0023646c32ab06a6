namespace SpecLint.Physics.Geometry;

/// <summary>Lengths, areas and spans of a coreless coil.</summary>
public static class CoilGeometry
{
    /// <summary>Angle between a leg's centre line and the coil axis.</summary>
    /// <param name="coil">Outline; a keystone needs a pitch radius > 0.</param>
    /// <returns>[rad], in (0, pi/2) for a keystone, 0 for a rectangle or a ring.</returns>
    /// <remarks>
    /// The inner leg edge at the middle of the hole gives R sin(b) - (h/2) cos(b) = w/2, solved in closed form:
    /// b = atan(h/2R) + asin((w/2)/hypot(R, h/2)). NaN if the leg is wider than the radius allows.
    /// </remarks>
    /// <seealso>Derived from the definition of the keystone in the spec format.</seealso>
    public static double LegHalfAngle(in CoilOutline coil)
    {
        if (coil.Shape != CoilShape.Keystone)
        {
            return 0.0;
        }

        double halfHole = 0.5 * coil.HoleWidth;
        return Math.Atan2(halfHole, coil.PitchRadius)
            + Math.Asin(0.5 * coil.LegWidth / double.Hypot(coil.PitchRadius, halfHole));
    }

    /// <summary>Whether the outline encloses a hole with four sides and its corner radius fits into it.</summary>
    /// <param name="coil">Outline.</param>
    /// <returns>False when a dimension is not positive and finite, a keystone hole pinches out at its inner end, or the corner radius does not fit.</returns>
    public static bool IsBuildable(in CoilOutline coil)
    {
        bool positive = coil.HoleLength > 0.0 && coil.HoleWidth > 0.0 && coil.LegWidth > 0.0 && coil.Thickness > 0.0
            && double.IsFinite(coil.HoleLength + coil.HoleWidth + coil.LegWidth + coil.Thickness + coil.PitchRadius);
        if (!positive || coil.PitchRadius < 0.0)
        {
            return false;
        }

        if (coil.Shape == CoilShape.Round)
        {
            return true;
        }

        double corner = coil.CornerRadius ?? 0.0;
        double halfAngle = LegHalfAngle(coil);
        if (!(corner >= 0.0) || !(halfAngle < 0.5 * Math.PI) || (coil.Shape == CoilShape.Keystone && coil.PitchRadius <= 0.0))
        {
            return false;
        }

        var trapezoid = new CoilTrapezoid(coil);
        return trapezoid.InnerCorner(-corner).Along >= 0.0
            && trapezoid.OuterCorner(-corner).Along >= 0.0
            && 2.0 * corner <= coil.HoleLength;
    }

    /// <summary>Mean length of one turn over the winding cross-section.</summary>
    /// <param name="coil">Buildable outline.</param>
    /// <returns>[m], exact for even turn density: the turn's length is linear in its depth, so the middle turn is the mean.</returns>
    /// <remarks>With a corner radius r the turn at depth s bends with radius r + s round the same centre; without, corners are sharp.</remarks>
    public static double MeanTurnLength(in CoilOutline coil)
    {
        if (coil.Shape == CoilShape.Round)
        {
            return Math.PI * (coil.HoleWidth + coil.LegWidth);
        }

        var trapezoid = new CoilTrapezoid(coil);
        double depth = 0.5 * coil.LegWidth;
        double bars = 2.0 * (trapezoid.InnerCorner(depth).Along + trapezoid.OuterCorner(depth).Along);
        double legs = 2.0 * (coil.HoleLength + coil.LegWidth) / trapezoid.Cosine;
        return legs + bars - CornerSaving(coil, trapezoid.HalfAngle);
    }

    /// <summary>Share of the mean turn that does not run across the motion and so yields no EMF.</summary>
    /// <param name="coil">Buildable outline.</param>
    /// <returns>Ratio in (0, 1): 1 - (length projected across the motion)/(length); 1 - 2/pi for a ring.</returns>
    public static double EndTurnShare(in CoilOutline coil) =>
        1.0 - 2.0 * (coil.HoleLength + coil.LegWidth) / MeanTurnLength(coil);

    /// <summary>Cross-section of the winding of one leg.</summary>
    /// <param name="coil">Outline.</param>
    /// <returns>[m²], leg width times thickness.</returns>
    public static double CrossSection(in CoilOutline coil) => coil.LegWidth * coil.Thickness;

    /// <summary>Volume of the winding, insulation and resin between the turns included.</summary>
    /// <param name="coil">Buildable outline.</param>
    /// <returns>[m³], cross-section times mean turn length (exact: the plan area between hole and contour is w times the mean turn).</returns>
    public static double WindingVolume(in CoilOutline coil) => CrossSection(coil) * MeanTurnLength(coil);

    /// <summary>Plan area of the hole without corner radius.</summary>
    /// <param name="coil">Buildable outline.</param>
    /// <returns>[m²].</returns>
    public static double HoleArea(in CoilOutline coil) => coil.Shape == CoilShape.Round
        ? 0.25 * Math.PI * coil.HoleWidth * coil.HoleWidth
        : coil.HoleLength * coil.HoleWidth;

    /// <summary>Hole along the motion as a mean chord, so that discs, rings and blocks compare.</summary>
    /// <param name="coil">Buildable outline.</param>
    /// <returns>[m]: hole area over hole length; the hole width itself for keystone and rectangle, pi/4 of the bore for a ring.</returns>
    public static double HoleExtent(in CoilOutline coil) => HoleArea(coil) / coil.HoleLength;

    /// <summary>Distance between leg centres along the motion as a mean chord of the middle turn.</summary>
    /// <param name="coil">Buildable outline.</param>
    /// <returns>[m]: area of the middle turn over its extent across the motion; pi/4 of the mean diameter for a ring.</returns>
    /// <remarks>For a keystone the chord between the two rays at the pitch radius: 2 R tan(half angle).</remarks>
    public static double LegCentreSpan(in CoilOutline coil)
    {
        if (coil.Shape == CoilShape.Round)
        {
            return 0.25 * Math.PI * (coil.HoleWidth + coil.LegWidth);
        }

        var trapezoid = new CoilTrapezoid(coil);
        double depth = 0.5 * coil.LegWidth;
        return trapezoid.InnerCorner(depth).Along + trapezoid.OuterCorner(depth).Along;
    }

    /// <summary>Mechanical angle between leg centres where they cross a circle round the shaft.</summary>
    /// <param name="coil">Buildable outline with a pitch radius > 0.</param>
    /// <param name="radius">Radius of the circle [m], > half the span.</param>
    /// <returns>[rad]; times the pole pairs it is the electrical span. NaN if the circle misses the legs.</returns>
    /// <remarks>The same at every radius for a keystone; a rectangle or ring (by its mean chord) spans less farther out.</remarks>
    public static double LegCentreAngle(in CoilOutline coil, double radius) => coil.Shape == CoilShape.Keystone
        ? 2.0 * LegHalfAngle(coil)
        : 2.0 * Math.Asin(0.5 * LegCentreSpan(coil) / radius);

    private static double CornerSaving(in CoilOutline coil, double halfAngle)
    {
        if (coil.CornerRadius is not { } corner)
        {
            return 0.0;
        }

        double bend = corner + 0.5 * coil.LegWidth;
        double acute = 0.5 * Math.PI - halfAngle;
        double obtuse = 0.5 * Math.PI + halfAngle;
        double sharp = 4.0 * (Math.Tan(0.5 * acute) + Math.Tan(0.5 * obtuse));
        return bend * (sharp - 2.0 * (acute + obtuse));
    }
}
