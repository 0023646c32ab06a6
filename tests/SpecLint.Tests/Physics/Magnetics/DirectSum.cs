using SpecLint.Physics.Geometry;
using SpecLint.Physics.Magnetics;

namespace SpecLint.Tests.Physics.Magnetics;

/// <summary>
/// Oracle: block magnets as charge sheets with explicit images, corner arctangents, and plain midpoint quadrature of the turn share times the
/// field. Shares no code with the kernels.
/// </summary>
internal static class DirectSum
{
    public static double NormalField(in MagnetRow g, in MagneticLayers layers, double x, double y, double height)
    {
        double h = layers.MagnetThickness;
        double z = height + h;
        bool twin = layers.Opposite == OppositeSide.Magnets;
        double l = (twin ? 2.0 * h : h) + layers.Gap;
        int images = layers.Opposite == OppositeSide.Open ? 0 : 12;
        double sum = 0.0;
        for (int m = -images; m <= images; m++)
        {
            sum += Row(g, x, y, z - ((2.0 * m * l) + h)) - Row(g, x, y, z - ((2.0 * m * l) - h));
            if (twin)
            {
                sum += Row(g, x, y, z - ((2.0 * m * l) - l + h)) - Row(g, x, y, z - ((2.0 * m * l) + l - h));
            }
        }

        return sum / (4.0 * Math.PI);
    }

    /// <summary>Fundamental linkage per turn and unit remanence: cosine mean over twelve coil angles of half an electrical period.</summary>
    public static double Fundamental(in MagnetRow g, in MagneticLayers layers, in CoilOutline coil, in CoilLayer layer)
    {
        const int Angles = 12;
        double sum = 0.0;
        for (int i = 0; i < Angles; i++)
        {
            double electrical = Math.PI * (i + 0.5) / Angles;
            sum += Math.Cos(electrical) * Linkage(g, layers, coil, layer, electrical / g.PolePairs) * 2.0 / Angles;
        }

        return sum;
    }

    public static double TurnShare(in CoilOutline coil, double x, double y)
    {
        if (coil.Shape == CoilShape.Round)
        {
            double d = double.Hypot(x - coil.PitchRadius, y);
            return Math.Clamp((((0.5 * coil.HoleWidth) + coil.LegWidth) - d) / coil.LegWidth, 0.0, 1.0);
        }

        double ends = Math.Abs(x - coil.PitchRadius) - (0.5 * coil.HoleLength);
        double angle = CoilGeometry.LegHalfAngle(coil);

        // Distance of the point from the hole's inner leg edge, across the leg.
        double legs = ((Math.Abs(y) - (0.5 * coil.HoleWidth)) * Math.Cos(angle)) - ((x - coil.PitchRadius) * Math.Sin(angle));
        return Math.Clamp(1.0 - (Math.Max(ends, legs) / coil.LegWidth), 0.0, 1.0);
    }

    private static double Linkage(in MagnetRow g, in MagneticLayers layers, in CoilOutline coil, in CoilLayer layer, double theta)
    {
        const int Steps = 44;
        double[] heights = [-0.7745966692414834, 0.0, 0.7745966692414834];
        double[] weights = [5.0 / 18.0, 8.0 / 18.0, 5.0 / 18.0];
        double half = coil.Shape == CoilShape.Round ? ((0.5 * coil.HoleWidth) + coil.LegWidth) : (0.5 * Math.Max(coil.HoleLength, coil.HoleWidth)) + (1.4 * coil.LegWidth);
        (double sine, double cosine) = Math.SinCos(theta);
        double sum = 0.0;
        for (int i = 0; i < Steps; i++)
        {
            for (int j = 0; j < Steps; j++)
            {
                double x = coil.PitchRadius + (half * ((2.0 * (i + 0.5) / Steps) - 1.0));
                double y = half * ((2.0 * (j + 0.5) / Steps) - 1.0);
                double share = TurnShare(coil, x, y);
                for (int q = 0; share > 0.0 && q < 3; q++)
                {
                    double z = layer.MidHeight + (0.5 * layer.Thickness * heights[q]);
                    sum += weights[q] * share * NormalField(g, layers, (x * cosine) - (y * sine), (x * sine) + (y * cosine), z);
                }
            }
        }

        return sum * 4.0 * half * half / (Steps * Steps);
    }

    private static double Row(in MagnetRow g, double x, double y, double z)
    {
        double sum = 0.0;
        for (int j = 0; j < 2 * g.PolePairs; j++)
        {
            (double sine, double cosine) = Math.SinCos(j * Math.PI / g.PolePairs);
            double px = (x * cosine) + (y * sine) - g.PitchRadius;
            double py = (y * cosine) - (x * sine);
            double sign = j % 2 == 0 ? 1.0 : -1.0;
            for (int corner = 0; corner < 4; corner++)
            {
                double u = px + ((corner & 1) == 0 ? 0.5 * g.Length : -0.5 * g.Length);
                double v = py + ((corner & 2) == 0 ? 0.5 * g.Width : -0.5 * g.Width);
                double s = Math.Sqrt((u * u) + (v * v) + (z * z));
                sum += (corner is 0 or 3 ? sign : -sign) * Math.Atan(u * v / (z * s));
            }
        }

        return sum;
    }
}
