using System.Runtime.InteropServices;
using SpecLint.Physics.Geometry;

namespace SpecLint.Physics.Magnetics;

/// <summary>Outline and arrangement of the magnets of one rotor disc or of one linear row, poles alternating.</summary>
[StructLayout(LayoutKind.Auto)]
public readonly record struct MagnetRow
{
    /// <summary>Outline and place of one magnet.</summary>
    public required MagnetOutline Outline { get; init; }

    /// <summary>Pole pairs round the disc [-]; zero for a linear row.</summary>
    public int PolePairs { get; init; }

    /// <summary>Distance between neighbouring magnets of a linear row [m]; unused on a disc.</summary>
    public double PolePitch { get; init; }

    /// <summary>Blocks round a disc, two sides parallel to the radius through the centre.</summary>
    /// <param name="polePairs">Pole pairs [-], >= 1.</param>
    /// <param name="pitchRadius">Radius of the magnet centres [m].</param>
    /// <param name="length">Radial length [m].</param>
    /// <param name="width">Width along the motion [m].</param>
    /// <returns>The arrangement.</returns>
    public static MagnetRow AxialBlock(int polePairs, double pitchRadius, double length, double width) => new()
    {
        PolePairs = polePairs,
        Outline = new() { Shape = MagnetShape.Block, PitchRadius = pitchRadius, Length = length, Width = width },
    };

    /// <summary>Round magnets round a disc.</summary>
    /// <param name="polePairs">Pole pairs [-], >= 1.</param>
    /// <param name="pitchRadius">Radius of the magnet centres [m].</param>
    /// <param name="diameter">Magnet diameter [m].</param>
    /// <returns>The arrangement.</returns>
    public static MagnetRow AxialDisc(int polePairs, double pitchRadius, double diameter) => new()
    {
        PolePairs = polePairs,
        Outline = new() { Shape = MagnetShape.Disc, PitchRadius = pitchRadius, Length = diameter, Width = diameter },
    };

    /// <summary>Annular sectors round a disc.</summary>
    /// <param name="polePairs">Pole pairs [-], >= 1.</param>
    /// <param name="innerRadius">Inner radius [m].</param>
    /// <param name="outerRadius">Outer radius [m].</param>
    /// <param name="arcFraction">Magnet angle over pole pitch [-].</param>
    /// <returns>The arrangement.</returns>
    public static MagnetRow AxialSector(int polePairs, double innerRadius, double outerRadius, double arcFraction) => new()
    {
        PolePairs = polePairs,
        Outline = new()
        {
            Shape = MagnetShape.Sector,
            PitchRadius = 0.5 * (innerRadius + outerRadius),
            Length = outerRadius - innerRadius,
            SectorAngle = arcFraction * Math.PI / polePairs,
        },
    };

    /// <summary>Blocks in an endless row.</summary>
    /// <param name="polePitch">Distance between neighbouring magnets [m].</param>
    /// <param name="length">Length across the travel [m].</param>
    /// <param name="width">Width along the travel [m].</param>
    /// <returns>The arrangement.</returns>
    public static MagnetRow LinearBlock(double polePitch, double length, double width) => new()
    {
        PolePitch = polePitch, Outline = new() { Shape = MagnetShape.Block, Length = length, Width = width },
    };

    /// <summary>Round magnets in an endless row.</summary>
    /// <param name="polePitch">Distance between neighbouring magnets [m].</param>
    /// <param name="diameter">Magnet diameter [m].</param>
    /// <returns>The arrangement.</returns>
    public static MagnetRow LinearDisc(double polePitch, double diameter) => new()
    {
        PolePitch = polePitch, Outline = new() { Shape = MagnetShape.Disc, Length = diameter, Width = diameter },
    };

    /// <summary>Plan form of one magnet.</summary>
    public MagnetShape Shape => Outline.Shape;

    /// <summary>Radius of the magnet's centre from the machine axis [m]; zero for a linear row.</summary>
    public double PitchRadius => Outline.PitchRadius;

    /// <summary>Radial length, or length across the travel [m]; a disc's diameter.</summary>
    public double Length => Outline.Length;

    /// <summary>Width along the motion [m]; a disc's diameter; unused for a sector.</summary>
    public double Width => Outline.Width;

    /// <summary>Whether the magnets form a linear row.</summary>
    public bool IsLinear => PolePairs == 0;

    /// <summary>Inner radius of the annulus the magnets cover, measured on a magnet's middle line [m].</summary>
    public double InnerRadius => PitchRadius - (0.5 * Length);

    /// <summary>Outer radius of the annulus the magnets cover, measured on a magnet's middle line [m].</summary>
    public double OuterRadius => PitchRadius + (0.5 * Length);

    /// <summary>Farthest distance of magnet material from the axis; in a row, from the row's middle line across the travel [m].</summary>
    public double Reach => IsLinear ? OuterRadius : MagnetPlacement.OutermostRadius(Outline);

    /// <summary>Half the angle of a sector magnet seen from the axis [rad].</summary>
    public double SectorHalfAngle => 0.5 * Outline.SectorAngle;

    /// <summary>Pole pitch along the motion at the pitch radius [m].</summary>
    public double PitchArc => IsLinear ? PolePitch : Math.PI * PitchRadius / PolePairs;

    /// <summary>Face area of one magnet [m^2].</summary>
    public double FaceArea => MagnetPlacement.Extent(Outline) * Length;

    /// <summary>Length of the edge round one magnet's face [m].</summary>
    public double FacePerimeter => Shape switch
    {
        MagnetShape.Block => 2.0 * (Length + Width),
        MagnetShape.Disc => Math.PI * Length,
        _ => (4.0 * SectorHalfAngle * PitchRadius) + (2.0 * Length),
    };

    /// <summary>Why the arrangement lies outside the model's domain, or null if it does not.</summary>
    public string? DomainFault
    {
        get
        {
            if (!(Length > 0.0 && double.IsFinite(Length)) || (Shape == MagnetShape.Block && !(Width > 0.0 && double.IsFinite(Width))))
            {
                return "the magnet's dimensions must be positive";
            }

            if (IsLinear)
            {
                return Shape != MagnetShape.Sector && PolePitch > 0.0 && double.IsFinite(PolePitch)
                    ? null
                    : "a linear row needs block or disc magnets and a positive pole pitch";
            }

            if (PolePairs < 1 || !(InnerRadius > 0.0) || !double.IsFinite(PitchRadius))
            {
                return "the magnets must lie outside the machine axis";
            }

            return Shape == MagnetShape.Sector && !(Outline.SectorAngle > 0.0 && Outline.SectorAngle <= Math.PI / PolePairs)
                ? "a sector magnet must cover more than none and at most all of its pole pitch"
                : null;
        }
    }
}
