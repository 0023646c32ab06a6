using SpecLint.Physics.Geometry;

namespace SpecLint.Tests.Physics.Magnetics;

/// <summary>Coil outlines for the field kernels, which take their thickness from the layer.</summary>
internal static class Coils
{
    private const double Thickness = 0.01;

    public static CoilOutline Keystone(double pitchRadius, double holeLength, double holeWidth, double legWidth) =>
        Rectangle(pitchRadius, holeLength, holeWidth, legWidth) with { Shape = CoilShape.Keystone };

    /// <summary>Keystone given by the ends of its hole on the coil axis and the angle of its legs' centre lines.</summary>
    public static CoilOutline KeystoneByAngle(double holeInner, double holeOuter, double legWidth, double legHalfAngle)
    {
        double centre = 0.5 * (holeInner + holeOuter);
        double holeWidth = 2.0 * ((centre * Math.Tan(legHalfAngle)) - (0.5 * legWidth / Math.Cos(legHalfAngle)));
        return Keystone(centre, holeOuter - holeInner, holeWidth, legWidth);
    }

    public static CoilOutline Rectangle(double pitchRadius, double holeLength, double holeWidth, double legWidth) => new()
    {
        Shape = CoilShape.Rectangle, PitchRadius = pitchRadius, HoleLength = holeLength, HoleWidth = holeWidth, LegWidth = legWidth, Thickness = Thickness,
    };

    public static CoilOutline Round(double pitchRadius, double innerRadius, double outerRadius) =>
        CoilOutline.Round(innerRadius, outerRadius, Thickness, pitchRadius);
}
