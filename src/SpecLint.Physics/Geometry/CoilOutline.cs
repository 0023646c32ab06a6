using System.Runtime.InteropServices;

namespace SpecLint.Physics.Geometry;

/// <summary>Plan form, cross-section and place of one coreless coil.</summary>
/// <remarks>
/// The turns fill the leg width times the thickness evenly. Keystone: the centre line of each leg lies on a ray from
/// the shaft axis, the leg has constant width, the hole width is measured between the legs' inner edges at the middle
/// of the hole, straight end bars of the same width close it. A round coil has hole length = hole width = bore.
/// </remarks>
[StructLayout(LayoutKind.Auto)]
public readonly record struct CoilOutline
{
    /// <summary>Plan form.</summary>
    public required CoilShape Shape { get; init; }

    /// <summary>Hole across the motion (radially in a disc machine) [m], > 0; bore of a round coil.</summary>
    public required double HoleLength { get; init; }

    /// <summary>Hole along the motion at its middle [m], > 0; bore of a round coil.</summary>
    public required double HoleWidth { get; init; }

    /// <summary>Width of the winding across itself [m], > 0.</summary>
    public required double LegWidth { get; init; }

    /// <summary>Thickness of the winding along the gap [m], > 0.</summary>
    public required double Thickness { get; init; }

    /// <summary>Distance of the coil centre from the shaft axis [m]; 0 for a linear machine, > 0 for a keystone.</summary>
    public double PitchRadius { get; init; }

    /// <summary>Radius of the hole's corners [m], >= 0; null when every turn is mitred sharp, as the field solution assumes.</summary>
    public double? CornerRadius { get; init; }

    /// <summary>Round coil from its radii.</summary>
    /// <param name="innerRadius">Radius of the bore [m], > 0.</param>
    /// <param name="outerRadius">Outer radius [m], > inner radius.</param>
    /// <param name="thickness">Thickness along the gap [m], > 0.</param>
    /// <param name="pitchRadius">Distance of the centre from the shaft axis [m], >= 0.</param>
    /// <returns>The outline.</returns>
    public static CoilOutline Round(double innerRadius, double outerRadius, double thickness, double pitchRadius) => new()
    {
        Shape = CoilShape.Round,
        HoleLength = 2.0 * innerRadius,
        HoleWidth = 2.0 * innerRadius,
        LegWidth = outerRadius - innerRadius,
        Thickness = thickness,
        PitchRadius = pitchRadius,
    };
}
