using System.Runtime.InteropServices;
using SpecLint.Physics.Geometry;

namespace SpecLint.Physics.Magnetics;

/// <summary>Field strength inside one installed magnet, from the charge sheets near it exactly and from all others by interpolation.</summary>
/// <remarks>
/// Ideal steel, unit recoil permeability. Sheets of the magnet itself and its two neighbours within half a magnet's breadth of the body are summed
/// point by point; the field of all other sheets is smooth inside the body and interpolated from 27 points, with the symmetry about the
/// middle line built in.
/// </remarks>
internal sealed class InteriorField
{
    private const double NearShare = 0.5;
    private const double FarDampingExponent = 9.0;
    private const int FarPoles = 6;
    private static readonly double[] Fractions = [-0.9, 0.0, 0.9];
    private static readonly double[] HalfFractions = [0.0, 0.55, 0.95];
    private readonly ImageField _image;
    private readonly double _middleX;
    private readonly double _halfX;
    private readonly double _halfY;
    private readonly double _halfZ;
    private readonly FieldVector[] _far = new FieldVector[27];

    /// <summary>Prepares the field inside magnet 0.</summary>
    /// <param name="magnets">The magnets.</param>
    /// <param name="layers">The layers.</param>
    public InteriorField(MagnetRow magnets, MagneticLayers layers)
    {
        double breadth = magnets.Shape == MagnetShape.Sector
            ? Math.Min(magnets.Length, 2.0 * magnets.SectorHalfAngle * magnets.PitchRadius)
            : Math.Min(magnets.Length, magnets.Width);
        _image = new ImageField(magnets, layers, FarDampingExponent, FarPoles, NearShare * breadth);
        bool sector = magnets.Shape == MagnetShape.Sector;
        double inner = sector ? magnets.InnerRadius * Math.Cos(magnets.SectorHalfAngle) : magnets.InnerRadius;
        _middleX = 0.5 * (inner + magnets.OuterRadius);
        _halfX = 0.5 * (magnets.OuterRadius - inner);
        _halfY = sector ? magnets.OuterRadius * Math.Sin(magnets.SectorHalfAngle) : 0.5 * magnets.Width;
        _halfZ = 0.5 * layers.MagnetThickness;
        for (int i = 0; i < _far.Length; i++)
        {
            double x = _middleX + (_halfX * Fractions[i / 9]);
            double y = _halfY * HalfFractions[i / 3 % 3];
            double z = _halfZ * (Fractions[i % 3] - 1.0);
            (double hx, double hy, double hz) = _image.FarFieldStrength(x, y, z);
            _far[i] = new FieldVector { X = hx, Y = HalfFractions[i / 3 % 3] > 0.0 ? hy / y : 0.0, Z = hz };
        }

        // The component along the motion is odd; its share on the middle line follows from the even quotient's other two values.
        for (int i = 0; i < _far.Length; i += 9)
        {
            for (int q = 0; q < 3; q++)
            {
                double a = HalfFractions[1] * HalfFractions[1];
                double b = HalfFractions[2] * HalfFractions[2];
                double onLine = ((b * _far[i + 3 + q].Y) - (a * _far[i + 6 + q].Y)) / (b - a);
                _far[i + q] = _far[i + q] with { Y = onLine };
            }
        }
    }

    /// <summary>mu0 H over the remanence.</summary>
    /// <param name="x">Position along the radius [m].</param>
    /// <param name="y">Position along the motion [m].</param>
    /// <param name="z">Height relative to the face [m], negative.</param>
    /// <returns>The vector [-].</returns>
    public FieldVector At(double x, double y, double z)
    {
        (double hx, double hy, double hz) = _image.NearFieldStrength(x, y, z);
        FieldVector far = Far(x, y, z);
        return new FieldVector { X = hx + far.X, Y = hy + (far.Y * y), Z = hz + far.Z };
    }

    /// <summary>mu0 H_z over the remanence.</summary>
    /// <param name="x">Position along the radius [m].</param>
    /// <param name="y">Position along the motion [m].</param>
    /// <param name="z">Height relative to the face [m], negative.</param>
    /// <returns>The normal component [-].</returns>
    public double NormalAt(double x, double y, double z) => _image.NearNormal(x, y, z) + Far(x, y, z).Z;

    private FieldVector Far(double x, double y, double z)
    {
        Span<double> wx = stackalloc double[3];
        Span<double> wy = stackalloc double[3];
        Span<double> wz = stackalloc double[3];
        Lagrange(Fractions, (x - _middleX) / _halfX, wx);
        double s = y / _halfY;
        Span<double> squares = [HalfFractions[0], HalfFractions[1] * HalfFractions[1], HalfFractions[2] * HalfFractions[2]];
        Lagrange(squares, s * s, wy);
        Lagrange(Fractions, (z / _halfZ) + 1.0, wz);
        double sumX = 0.0;
        double sumY = 0.0;
        double sumZ = 0.0;
        for (int i = 0; i < _far.Length; i++)
        {
            double weight = wx[i / 9] * wy[i / 3 % 3] * wz[i % 3];
            sumX += weight * _far[i].X;
            sumY += weight * _far[i].Y;
            sumZ += weight * _far[i].Z;
        }

        return new FieldVector { X = sumX, Y = sumY, Z = sumZ };
    }

    private static void Lagrange(ReadOnlySpan<double> nodes, double t, Span<double> weights)
    {
        for (int i = 0; i < 3; i++)
        {
            double a = nodes[(i + 1) % 3];
            double b = nodes[(i + 2) % 3];
            weights[i] = (t - a) * (t - b) / ((nodes[i] - a) * (nodes[i] - b));
        }
    }
}
