using System.Runtime.InteropServices;

namespace SpecLint.Physics.Magnetics;

/// <summary>Outline of one air-cored coil whose turns fill the winding cross-section evenly.</summary>
/// <remarks>
/// The share of turns round a point is 1 in the hole and falls linearly to 0 across the leg. The coil's axis of symmetry is the
/// radius through its centre (linear: the line across the travel).
/// </remarks>
[StructLayout(LayoutKind.Auto)]
public readonly record struct CoilGeometry
{
    /// <summary>Outline of the coil.</summary>
    public required CoilShape Shape { get; init; }

    /// <summary>Distance of the hole's middle from the machine axis [m]; zero in a linear machine.</summary>
    public double CentreRadius { get; init; }

    /// <summary>Radial length of the hole, or its length across the travel [m]; unused for a ring.</summary>
    public double HoleLength { get; init; }

    /// <summary>Width of the hole along the motion at its middle [m]; unused for a ring.</summary>
    public double HoleWidth { get; init; }

    /// <summary>Width of the winding across the leg [m].</summary>
    public required double LegWidth { get; init; }

    /// <summary>Inner radius of a ring coil [m]; unused otherwise.</summary>
    public double RingInnerRadius { get; init; }

    /// <summary>Keystone only: angle between the coil's axis of symmetry and a leg's centre line [rad].</summary>
    public double LegHalfAngle { get; init; }

    /// <summary>Keystone coil given by the angle of its legs.</summary>
    /// <param name="holeInnerDistance">Distance of the hole's inner end from the machine axis, along the coil's middle line [m].</param>
    /// <param name="holeOuterDistance">Distance of the hole's outer end from the machine axis [m].</param>
    /// <param name="legWidth">Leg width across itself, also of the end bars [m].</param>
    /// <param name="legHalfAngle">Angle between the middle line and a leg's centre line, which passes through the axis [rad].</param>
    /// <returns>The outline.</returns>
    public static CoilGeometry KeystoneByAngle(double holeInnerDistance, double holeOuterDistance, double legWidth, double legHalfAngle)
    {
        double centre = 0.5 * (holeInnerDistance + holeOuterDistance);
        return new CoilGeometry
        {
            Shape = CoilShape.Keystone,
            CentreRadius = centre,
            HoleLength = holeOuterDistance - holeInnerDistance,
            HoleWidth = 2.0 * ((centre * Math.Tan(legHalfAngle)) - (0.5 * legWidth / Math.Cos(legHalfAngle))),
            LegWidth = legWidth,
            LegHalfAngle = legHalfAngle,
        };
    }

    /// <summary>Keystone coil given by its hole.</summary>
    /// <param name="centreRadius">Distance of the hole's middle from the machine axis [m].</param>
    /// <param name="holeLength">Radial length of the hole [m].</param>
    /// <param name="holeWidth">Width of the hole between the legs' inner edges at its middle [m].</param>
    /// <param name="legWidth">Leg width across itself, also of the end bars [m].</param>
    /// <returns>The outline.</returns>
    /// <remarks>The leg angle solves R sin(a) - (hole/2) cos(a) = leg/2: a = asin((leg/2)/hypot(R, hole/2)) + atan2(hole/2, R).</remarks>
    public static CoilGeometry Keystone(double centreRadius, double holeLength, double holeWidth, double legWidth) => new()
    {
        Shape = CoilShape.Keystone,
        CentreRadius = centreRadius,
        HoleLength = holeLength,
        HoleWidth = holeWidth,
        LegWidth = legWidth,
        LegHalfAngle = Math.Asin(0.5 * legWidth / double.Hypot(centreRadius, 0.5 * holeWidth)) + Math.Atan2(0.5 * holeWidth, centreRadius),
    };

    /// <summary>Rectangular coil.</summary>
    /// <param name="centreRadius">Distance of the hole's middle from the machine axis [m]; zero in a linear machine.</param>
    /// <param name="holeLength">Radial length of the hole, or its length across the travel [m].</param>
    /// <param name="holeWidth">Width of the hole along the motion [m].</param>
    /// <param name="legWidth">Leg width [m].</param>
    /// <returns>The outline.</returns>
    public static CoilGeometry Rectangle(double centreRadius, double holeLength, double holeWidth, double legWidth) => new()
    {
        Shape = CoilShape.Rectangle, CentreRadius = centreRadius, HoleLength = holeLength, HoleWidth = holeWidth, LegWidth = legWidth,
    };

    /// <summary>Ring coil.</summary>
    /// <param name="centreRadius">Distance of the ring's centre from the machine axis [m]; zero in a linear machine.</param>
    /// <param name="innerRadius">Inner radius of the winding [m].</param>
    /// <param name="outerRadius">Outer radius of the winding [m].</param>
    /// <returns>The outline.</returns>
    public static CoilGeometry Round(double centreRadius, double innerRadius, double outerRadius) => new()
    {
        Shape = CoilShape.Round, CentreRadius = centreRadius, RingInnerRadius = innerRadius, LegWidth = outerRadius - innerRadius,
    };

    /// <summary>Outer radius of a ring coil [m].</summary>
    public double RingOuterRadius => RingInnerRadius + LegWidth;

    /// <summary>Farthest distance of winding from the machine axis; linear: from the middle line across the travel [m].</summary>
    /// <param name="linear">The kind of machine the coil sits in: its travel is straight.</param>
    /// <returns>The distance [m].</returns>
    internal double ReachIn(bool linear)
    {
        if (Shape == CoilShape.Round)
        {
            return CentreRadius + RingOuterRadius;
        }

        CoilOutline outline = CoilOutline.Of(this);
        return linear ? CentreRadius + (0.5 * HoleLength) + LegWidth : double.Hypot(outline.OuterEndOuter, outline.OuterEndOuterHalfWidth);
    }

    /// <summary>Why the outline lies outside the model's domain, or null if it does not.</summary>
    public string? DomainFault
    {
        get
        {
            if (!(LegWidth > 0.0 && double.IsFinite(LegWidth)) || !(CentreRadius >= 0.0 && double.IsFinite(CentreRadius)))
            {
                return "the coil's leg width must be positive and its radius zero or more";
            }

            if (Shape == CoilShape.Round)
            {
                return RingInnerRadius >= 0.0 && double.IsFinite(RingInnerRadius) ? null : "the ring's inner radius must be zero or more";
            }

            if (!(HoleLength > 0.0 && HoleWidth > 0.0 && double.IsFinite(HoleLength) && double.IsFinite(HoleWidth)))
            {
                return "the coil's hole must have a positive length and width";
            }

            CoilOutline outline = CoilOutline.Of(this);
            return outline.InnerEndHalfWidth > 0.0 && double.IsFinite(outline.OuterEndOuterHalfWidth)
                ? null
                : "the keystone's legs meet before the inner end of its hole";
        }
    }
}
