using SpecLint.Physics.Geometry;

namespace SpecLint.Physics.Magnetics;

/// <summary>Maps the unit square onto a magnet's face, for quadrature.</summary>
internal static class MagnetFace
{
    /// <summary>One point of the face.</summary>
    /// <param name="g">The magnets; the first one lies on the line of angle zero.</param>
    /// <param name="u">Place along the radius [-], -1 to 1.</param>
    /// <param name="v">Place along the motion [-], -1 to 1; negative is the mirror image.</param>
   
    public static (double X, double Y, double Density) Place(in MagnetRow g, double u, double v)
    {
        switch (g.Shape)
        {
            case MagnetShape.Block:
                return (g.PitchRadius + (0.5 * g.Length * u), 0.5 * g.Width * v, 1.0);
            case MagnetShape.Disc:
                double share = 0.5 * (1.0 + u);
                (double sine, double cosine) = Math.SinCos(Math.PI * v);
                double rho = 0.5 * g.Length * share;
                return (g.PitchRadius + (rho * cosine), rho * sine, 2.0 * share);
            default:
                double r = g.PitchRadius + (0.5 * g.Length * u);
                (double s, double c) = Math.SinCos(g.SectorHalfAngle * v);
                return (r * c, r * s, r / g.PitchRadius);
        }
    }
}
