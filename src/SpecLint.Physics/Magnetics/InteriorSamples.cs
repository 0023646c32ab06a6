using System.Runtime.InteropServices;
using SpecLint.Physics.Numerics;

namespace SpecLint.Physics.Magnetics;

/// <summary>Quadrature points of one magnet's volume on one side of its middle line.</summary>
internal static class InteriorSamples
{
    /// <summary>Numbers of points along the radius, the half width and the thickness.</summary>
    [StructLayout(LayoutKind.Auto)]
    internal readonly record struct Counts(int Radial, int Along, int Through);

    /// <summary>A point and its share of the volume.</summary>
    [StructLayout(LayoutKind.Auto)]
    internal readonly record struct Sample(double X, double Y, double Z, double Weight);

    /// <summary>Lists the points; layer by layer from the face down.</summary>
    /// <param name="magnets">The magnets.</param>
    /// <param name="layers">The layers.</param>
    /// <param name="counts">Numbers of points.</param>
    /// <returns>Points with positive y and weights that sum to 1; dense toward every free face.</returns>
    public static Sample[] List(in MagnetRow magnets, in MagneticLayers layers, Counts counts)
    {
        (double[] u, double[] uWeights) = GaussLegendreRule.Create(counts.Radial);
        (double[] v, double[] vWeights) = GaussLegendreRule.Create(counts.Along);
        (double[] w, double[] wWeights) = GaussLegendreRule.Create(counts.Through);
        bool bothFree = layers.Behind.IsAbsent;
        Sample[] samples = new Sample[counts.Radial * counts.Along * counts.Through];
        int next = 0;
        for (int q = 0; q < counts.Through; q++)
        {
            double s = 0.5 * (1.0 + w[q]);
            double depth = bothFree ? s * s * (3.0 - (2.0 * s)) : s * s;
            double slope = bothFree ? 6.0 * s * (1.0 - s) : 2.0 * s;
            for (int a = 0; a < counts.Radial; a++)
            {
                for (int b = 0; b < counts.Along; b++)
                {
                    double weight = 0.125 * uWeights[a] * vWeights[b] * wWeights[q] * slope;
                    (double x, double y, double density) = MagnetFace.Place(magnets, u[a], 0.5 * (1.0 + v[b]));
                    samples[next++] = new Sample(x, y, -depth * layers.MagnetThickness, weight * density);
                }
            }
        }

        return samples;
    }
}
