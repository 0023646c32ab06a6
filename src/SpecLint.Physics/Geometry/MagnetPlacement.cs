namespace SpecLint.Physics.Geometry;

/// <summary>Extent of magnets along the motion and the space between neighbours.</summary>
public static class MagnetPlacement
{
    /// <summary>Magnet along the motion as a mean chord, comparable with <see cref="CoilGeometry.HoleExtent"/>.</summary>
    /// <param name="magnet">Outline.</param>
    /// <returns>[m]: area over extent across the motion; block width, pi/4 of a disc's diameter, sector arc at its middle radius.</returns>
    public static double Extent(in MagnetOutline magnet) => magnet.Shape switch
    {
        MagnetShape.Disc => 0.25 * Math.PI * magnet.Length,
        MagnetShape.Sector => magnet.SectorAngle * magnet.PitchRadius,
        _ => magnet.Width,
    };

    /// <summary>Least space between neighbours of equally spaced magnets round the shaft.</summary>
    /// <param name="magnet">Outline with a pitch radius > 0.</param>
    /// <param name="magnets">Number of magnets on the disc, >= 2.</param>
    /// <returns>[m], signed, negative when magnets overlap; at the innermost point of block and sector.</returns>
    /// <remarks>Mirror-image argument of <see cref="CoilPlacement.SpaceBetweenCoils"/>; exact.</remarks>
    public static double SpaceBetweenMagnets(in MagnetOutline magnet, int magnets)
    {
        ArgumentOutOfRangeException.ThrowIfLessThan(magnets, 2);
        double halfPitch = Math.PI / magnets;
        (double sine, double cosine) = Math.SinCos(halfPitch);
        double innermost = magnet.PitchRadius - 0.5 * magnet.Length;
        return magnet.Shape switch
        {
            MagnetShape.Disc => 2.0 * magnet.PitchRadius * sine - magnet.Length,
            MagnetShape.Sector => 2.0 * innermost * Math.Sin(halfPitch - 0.5 * magnet.SectorAngle),
            _ => 2.0 * innermost * sine - magnet.Width * cosine,
        };
    }

    /// <summary>Space between neighbouring magnets of a linear machine.</summary>
    /// <param name="magnet">Block or disc.</param>
    /// <param name="polePitch">Distance between magnet centres [m], > 0.</param>
    /// <returns>[m], signed.</returns>
    public static double SpaceInRow(in MagnetOutline magnet, double polePitch) =>
        polePitch - (magnet.Shape == MagnetShape.Disc ? magnet.Length : magnet.Width);

    /// <summary>Largest distance of a magnet from the shaft axis.</summary>
    /// <param name="magnet">Outline with a pitch radius > 0.</param>
    /// <returns>[m].</returns>
    public static double OutermostRadius(in MagnetOutline magnet)
    {
        double outer = magnet.PitchRadius + 0.5 * magnet.Length;
        return magnet.Shape == MagnetShape.Block ? double.Hypot(outer, 0.5 * magnet.Width) : outer;
    }
}
