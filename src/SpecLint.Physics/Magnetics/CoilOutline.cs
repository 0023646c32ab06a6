using System.Runtime.InteropServices;

namespace SpecLint.Physics.Magnetics;

/// <summary>The two nested trapezoids that bound a keystone or rectangular winding, in the half plane of positive width.</summary>
/// <remarks>Length runs along the coil's axis of symmetry from the machine axis, width along the motion.</remarks>
[StructLayout(LayoutKind.Auto)]
internal readonly record struct CoilOutline
{
    /// <summary>Distance of the hole's inner end [m].</summary>
    public required double InnerEnd { get; init; }

    /// <summary>Distance of the hole's outer end [m].</summary>
    public required double OuterEnd { get; init; }

    /// <summary>Half width of the hole at its inner end [m].</summary>
    public required double InnerEndHalfWidth { get; init; }

    /// <summary>Half width of the hole at its outer end [m].</summary>
    public required double OuterEndHalfWidth { get; init; }

    /// <summary>Distance of the winding's inner end [m].</summary>
    public required double InnerEndOuter { get; init; }

    /// <summary>Distance of the winding's outer end [m].</summary>
    public required double OuterEndOuter { get; init; }

    /// <summary>Half width of the winding at its inner end [m].</summary>
    public required double InnerEndOuterHalfWidth { get; init; }

    /// <summary>Half width of the winding at its outer end [m].</summary>
    public required double OuterEndOuterHalfWidth { get; init; }

    /// <summary>Leg width [m].</summary>
    public required double LegWidth { get; init; }

    /// <summary>Angle of the legs to the coil's axis of symmetry [rad].</summary>
    public required double LegHalfAngle { get; init; }

    /// <summary>Outline of a keystone or rectangle.</summary>
    /// <param name="coil">The coil.</param>
    /// <returns>Its corners.</returns>
    public static CoilOutline Of(in CoilGeometry coil)
    {
        double w = coil.LegWidth;
        double inner = coil.CentreRadius - (0.5 * coil.HoleLength);
        double outer = coil.CentreRadius + (0.5 * coil.HoleLength);
        double angle = coil.Shape == CoilShape.Keystone ? coil.LegHalfAngle : 0.0;
        double slope = Math.Tan(angle);
        double across = w / Math.Cos(angle);
        double hole = 0.5 * coil.HoleWidth;
        return new CoilOutline
        {
            InnerEnd = inner,
            OuterEnd = outer,
            InnerEndHalfWidth = hole - (slope * 0.5 * coil.HoleLength),
            OuterEndHalfWidth = hole + (slope * 0.5 * coil.HoleLength),
            InnerEndOuter = inner - w,
            OuterEndOuter = outer + w,
            InnerEndOuterHalfWidth = hole + across - (slope * ((0.5 * coil.HoleLength) + w)),
            OuterEndOuterHalfWidth = hole + across + (slope * ((0.5 * coil.HoleLength) + w)),
            LegWidth = w,
            LegHalfAngle = angle,
        };
    }
}
