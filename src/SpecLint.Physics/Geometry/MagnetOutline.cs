using System.Runtime.InteropServices;

namespace SpecLint.Physics.Geometry;

/// <summary>Plan form and place of one magnet of a disc or linear machine.</summary>
[StructLayout(LayoutKind.Auto)]
public readonly record struct MagnetOutline
{
    /// <summary>Plan form.</summary>
    public required MagnetShape Shape { get; init; }

    /// <summary>Extent across the motion [m], > 0: block length, disc diameter, sector outer minus inner radius.</summary>
    public required double Length { get; init; }

    /// <summary>Extent along the motion [m], > 0: block width, disc diameter; not used for a sector.</summary>
    public double Width { get; init; }

    /// <summary>Distance of the magnet's middle from the shaft axis [m], > 0; 0 for a linear machine.</summary>
    public double PitchRadius { get; init; }

    /// <summary>Angle of a sector magnet [rad]; not used for the other shapes.</summary>
    public double SectorAngle { get; init; }
}
