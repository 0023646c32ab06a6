using SpecLint.Physics.Numerics;

namespace SpecLint.Physics.Magnetics;

/// <summary>A charge sheet seen from a distance: point charges at the Gauss nodes of its face.</summary>
internal sealed class ChargeCloud
{
    private readonly double[] _x;
    private readonly double[] _y;
    private readonly double[] _area;

    /// <summary>Spreads a magnet's face over points.</summary>
    /// <param name="magnets">The magnets.</param>
    /// <param name="order">Nodes in each direction.</param>
    public ChargeCloud(in MagnetRow magnets, int order)
    {
        (double[] u, double[] weights) = GaussLegendreRule.Create(order);
        _x = new double[order * order];
        _y = new double[order * order];
        _area = new double[order * order];
        for (int i = 0; i < _x.Length; i++)
        {
            double a = u[i / order];
            double b = u[i % order];
            double share = 0.25 * weights[i / order] * weights[i % order];
            (_x[i], _y[i], double density) = MagnetFace.Place(magnets, a, b);
            _area[i] = share * density * magnets.FaceArea;
        }
    }

    /// <summary>Adds the cloud's field, that of unit surface charge times 4 pi.</summary>
    /// <param name="dx">Position of the field point along x in the cloud's frame [m].</param>
    /// <param name="dy">Position along y [m].</param>
    /// <param name="dz">Height over the cloud [m].</param>
    /// <returns>Components [-].</returns>
    public (double X, double Y, double Z) Field(double dx, double dy, double dz)
    {
        double sumX = 0.0;
        double sumY = 0.0;
        double sum = 0.0;
        for (int i = 0; i < _x.Length; i++)
        {
            double x = dx - _x[i];
            double y = dy - _y[i];
            double rr = (x * x) + (y * y) + (dz * dz);
            double strength = _area[i] / (rr * Math.Sqrt(rr));
            sumX += strength * x;
            sumY += strength * y;
            sum += strength;
        }

        return (sumX, sumY, sum * dz);
    }
}
