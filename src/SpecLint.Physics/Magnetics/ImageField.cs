using System.Runtime.InteropServices;
using SpecLint.Physics.Geometry;

namespace SpecLint.Physics.Magnetics;

/// <summary>Field of an alternating magnet array at single points, by magnetic charge sheets and their images.</summary>
/// <remarks>
/// <para>Ideal steel planes, unit recoil permeability; right up to the magnets' face, where the spectral sum converges slowly. A plane
/// of infinite permeability reflects a charge into one of opposite sign; the image sum ends where the alternating poles have damped it below 1e-7.
/// Distant poles of a long row are taken with Euler's weights for alternating sums.</para>
/// <para>Plane positions: x along the radius through the centre of magnet 0 (linear: across the travel, from the row's middle),
/// y along the motion. Heights are over the magnets' face.</para>
/// </remarks>
/// <seealso>Image method and solid angle of a sheet: Jackson J.D., Classical Electrodynamics, 3rd ed., 1998, sections 2.1 and 5.10;
/// reference notes on axial machines, section M1.</seealso>
public sealed class ImageField
{
    private const double DampingExponent = 17.0;
    private const double PerSolidAngle = 0.25 / Math.PI;

    /// <summary>Angle of a chord of a sector's arc, for points in the gap and inside the magnet [degree].</summary>
    private const double FineChord = 2.5;
    private const double CoarseChord = 8.0;

    /// <summary>Distance over magnet length plus pole pitch below which a cloud is taken dense.</summary>
    private const double CloseShare = 0.8;
    private const int ImageCap = 60;
    private const int FarthestPole = 10;
    private static readonly double[] EulerWeights = [15.0 / 16.0, 11.0 / 16.0, 5.0 / 16.0, 1.0 / 16.0];
    private readonly IChargeSheet _sheet;
    private readonly List<(double Height, double Sign)> _sheets = [];
    private readonly List<Pole> _poles = [];
    private readonly double _dampingExponent;
    private readonly int _farthestPole;
    private readonly double _nearDistance;
    private readonly ChargeCloud _dense;
    private readonly ChargeCloud _sparse;

    /// <summary>Prepares the sheets of an array.</summary>
    /// <param name="magnets">The magnets; their <see cref="MagnetRow.DomainFault"/> must be null.</param>
    /// <param name="layers">The layers; steel is taken as ideal and the recoil permeability as 1.</param>
    public ImageField(MagnetRow magnets, MagneticLayers layers)
        : this(magnets, layers, DampingExponent, FarthestPole, 0.0)
    {
    }

    /// <summary>Prepares sheets of lesser reach, divided into near and far ones.</summary>
    /// <param name="magnets">The magnets.</param>
    /// <param name="layers">The layers.</param>
    /// <param name="dampingExponent">Exponent at which the image sum ends.</param>
    /// <param name="farthestPole">Poles to either side that are summed.</param>
    /// <param name="nearDistance">Sheets of the magnet and its neighbours this near to the magnet's body count as near [m].</param>
    internal ImageField(MagnetRow magnets, MagneticLayers layers, double dampingExponent, int farthestPole, double nearDistance)
    {
        _dampingExponent = dampingExponent;
        _farthestPole = farthestPole;
        _nearDistance = nearDistance;
        Magnets = magnets;
        Layers = layers;
        _sheet = magnets.Shape switch
        {
            MagnetShape.Block => PolygonSheet.Rectangle(magnets.PitchRadius, magnets.Length, magnets.Width),
            MagnetShape.Disc => new DiscSheet(magnets.PitchRadius, 0.5 * magnets.Length),
            _ => PolygonSheet.Sector(magnets, nearDistance > 0.0 ? CoarseChord : FineChord),
        };
        _dense = new ChargeCloud(magnets, 4);
        _sparse = new ChargeCloud(magnets, 2);
        AddSheets();
        AddPoles();
    }

    /// <summary>The magnets.</summary>
    public MagnetRow Magnets { get; }

    /// <summary>The layers.</summary>
    public MagneticLayers Layers { get; }

    /// <summary>Normal flux density in the gap.</summary>
    /// <param name="x">Position along the radius [m].</param>
    /// <param name="y">Position along the motion [m].</param>
    /// <param name="height">Height above the magnets' face [m], > 0 and inside the gap.</param>
    /// <param name="remanentFluxDensity">Remanent flux density [T].</param>
    /// <returns>B_z [T].</returns>
    public double NormalFluxDensity(double x, double y, double height, double remanentFluxDensity)
    {
        double sum = 0.0;
        foreach ((double at, double sign) in _sheets)
        {
            sum += (height >= at ? sign : -sign) * RowSolidAngle(x, y, height - at);
        }

        return remanentFluxDensity * sum * PerSolidAngle;
    }

    /// <summary>Opposing field inside the magnets' layer per unit remanence, -mu0 H_z/B_r.</summary>
    /// <param name="x">Position along the radius [m].</param>
    /// <param name="y">Position along the motion [m].</param>
    /// <param name="height">Height relative to the magnets' face [m], negative inside the magnet.</param>
    /// <returns>The field [-]; its mean over a magnet is the demagnetising factor.</returns>
    public double OpposingField(double x, double y, double height) => -NormalFluxDensity(x, y, height, 1.0);

    /// <summary>Vector of mu0 H over the remanence anywhere in the magnets' layer or the gap.</summary>
    /// <param name="x">Position along the radius [m].</param>
    /// <param name="y">Position along the motion [m].</param>
    /// <param name="height">Height relative to the magnets' face [m].</param>
    /// <returns>Components along x, y and the height [-].</returns>
    public (double X, double Y, double Z) FieldStrength(double x, double y, double height) => Strength(x, y, height, nearOnly: false);

    /// <summary>The share of the near sheets in <see cref="FieldStrength"/>.</summary>
    /// <param name="x">Position along the radius [m].</param>
    /// <param name="y">Position along the motion [m].</param>
    /// <param name="height">Height relative to the magnets' face [m].</param>
    /// <returns>Components along x, y and the height [-].</returns>
    internal (double X, double Y, double Z) NearFieldStrength(double x, double y, double height) => Strength(x, y, height, nearOnly: true);

    /// <summary>The share of all other sheets in <see cref="FieldStrength"/>, each as a cloud of point charges.</summary>
    /// <param name="x">Position along the radius [m].</param>
    /// <param name="y">Position along the motion [m].</param>
    /// <param name="height">Height relative to the magnets' face [m].</param>
    /// <returns>Components along x, y and the height [-].</returns>
    internal (double X, double Y, double Z) FarFieldStrength(double x, double y, double height)
    {
        double sumX = 0.0;
        double sumY = 0.0;
        double sumZ = 0.0;
        double close = CloseShare * (Magnets.Length + Magnets.PitchArc);
        foreach ((double at, double sign) in _sheets)
        {
            bool nearSheet = IsNear(at);
            foreach (Pole pole in _poles)
            {
                if (nearSheet && pole.IsNeighbour)
                {
                    continue;
                }

                (double px, double py) = pole.Enter(x, y);
                double z = height - at;
                double aside = px - Magnets.PitchRadius;
                ChargeCloud cloud = (aside * aside) + (py * py) + (z * z) < close * close ? _dense : _sparse;
                (double hx, double hy, double hz) = cloud.Field(px, py, z);
                (hx, hy) = pole.Leave(hx, hy);
                double charge = sign * pole.Weight;
                sumX += charge * hx;
                sumY += charge * hy;
                sumZ += charge * hz;
            }
        }

        return (sumX * PerSolidAngle, sumY * PerSolidAngle, sumZ * PerSolidAngle);
    }

    /// <summary>The normal component of <see cref="NearFieldStrength"/>.</summary>
    /// <param name="x">Position along the radius [m].</param>
    /// <param name="y">Position along the motion [m].</param>
    /// <param name="height">Height relative to the magnets' face [m].</param>
    /// <returns>The component [-].</returns>
    internal double NearNormal(double x, double y, double height)
    {
        double sum = 0.0;
        foreach ((double at, double sign) in _sheets)
        {
            if (!IsNear(at))
            {
                continue;
            }

            foreach (Pole pole in _poles)
            {
                if (pole.IsNeighbour)
                {
                    (double px, double py) = pole.Enter(x, y);
                    double z = height - at;
                    sum += (z >= 0.0 ? sign : -sign) * pole.Weight * _sheet.SolidAngle(px, py, z);
                }
            }
        }

        return sum * PerSolidAngle;
    }

    private bool IsNear(double at) => Math.Max(at, -Layers.MagnetThickness - at) < _nearDistance;

    private (double X, double Y, double Z) Strength(double x, double y, double height, bool nearOnly)
    {
        double sumX = 0.0;
        double sumY = 0.0;
        double sumZ = 0.0;
        foreach ((double at, double sign) in _sheets)
        {
            if (nearOnly && !IsNear(at))
            {
                continue;
            }

            foreach (Pole pole in _poles)
            {
                if (nearOnly && !pole.IsNeighbour)
                {
                    continue;
                }

                (double px, double py) = pole.Enter(x, y);
                double z = height - at;
                double charge = sign * pole.Weight;
                (double hx, double hy) = _sheet.InPlane(px, py, z);
                (hx, hy) = pole.Leave(hx, hy);
                sumX += charge * hx;
                sumY += charge * hy;
                sumZ += (z >= 0.0 ? charge : -charge) * _sheet.SolidAngle(px, py, z);
            }
        }

        return (sumX * PerSolidAngle, sumY * PerSolidAngle, sumZ * PerSolidAngle);
    }

    private double RowSolidAngle(double x, double y, double z)
    {
        double sum = 0.0;
        foreach (Pole pole in _poles)
        {
            (double px, double py) = pole.Enter(x, y);
            sum += pole.Weight * _sheet.SolidAngle(px, py, z);
        }

        return sum;
    }

    private void AddPoles()
    {
        int last = Magnets.IsLinear ? _farthestPole : Magnets.PolePairs;
        bool whole = !Magnets.IsLinear && last <= _farthestPole;
        int far = Math.Min(last, _farthestPole);
        for (int j = -far; j <= far; j++)
        {
            if (whole && j == -far)
            {
                continue;
            }

            int fromEnd = far - Math.Abs(j);
            double weight = !whole && fromEnd < EulerWeights.Length ? EulerWeights[^(fromEnd + 1)] : 1.0;
            weight = j % 2 == 0 ? weight : -weight;
            (double sine, double cosine) = Magnets.IsLinear ? (0.0, 1.0) : Math.SinCos(j * Math.PI / Magnets.PolePairs);
            _poles.Add(new Pole
            {
                Cosine = cosine,
                Sine = sine,
                Shift = Magnets.IsLinear ? j * Magnets.PolePitch : 0.0,
                Weight = weight,
                IsNeighbour = Math.Abs(j) <= 1,
            });
        }
    }

    private void AddSheets()
    {
        double h = Layers.MagnetThickness;
        double g = Layers.Gap;
        bool steel = !Layers.Behind.IsAbsent;
        bool twin = Layers.Opposite == OppositeSide.Magnets;
        bool plate = Layers.Opposite == OppositeSide.Plate && !Layers.OppositePlate.IsAbsent;
        double below = steel ? -2.0 * h : -h;
        if (!steel || (!twin && !plate))
        {
            Add(0.0, below);
            if (twin)
            {
                Add(g + h, g);
            }
            else if (plate)
            {
                Add((2.0 * g) - below, 2.0 * g);
            }

            return;
        }

        double period = 2.0 * ((twin ? 2.0 * h : h) + g);
        int images = ImageCount(period);
        for (int m = -images; m <= images; m++)
        {
            Add(m * period, (m * period) - (2.0 * h));
            if (twin)
            {
                // The upper discs' sheets, seen from the lower face: south at g, north at -g - 2h, both with the same period.
                Add((m * period) - g - (2.0 * h), (m * period) + g);
            }
        }
    }

    private int ImageCount(double period)
    {
        double decay = Magnets.IsLinear ? Math.PI / Magnets.PolePitch : Magnets.PolePairs / Magnets.Reach;
        return (int)Math.Clamp(Math.Ceiling(_dampingExponent / (decay * period)), 1.0, ImageCap);
    }

    private void Add(double north, double south)
    {
        _sheets.Add((north, 1.0));
        _sheets.Add((south, -1.0));
    }

    /// <summary>Place of one magnet of the array.</summary>
    [StructLayout(LayoutKind.Auto)]
    private readonly record struct Pole
    {
        /// <summary>Cosine of its angle.</summary>
        public required double Cosine { get; init; }

        /// <summary>Sine of its angle.</summary>
        public required double Sine { get; init; }

        /// <summary>Its shift along a row [m].</summary>
        public required double Shift { get; init; }

        /// <summary>Its sign times the summation weight.</summary>
        public required double Weight { get; init; }

        /// <summary>Magnet 0 or a direct neighbour.</summary>
        public required bool IsNeighbour { get; init; }

        /// <summary>Turns a position into the magnet's frame.</summary>
        /// <param name="x">Position along x [m].</param>
        /// <param name="y">Position along y [m].</param>
        /// <returns>The position there.</returns>
        public (double X, double Y) Enter(double x, double y) => ((x * Cosine) + (y * Sine), (y * Cosine) - (x * Sine) - Shift);

        /// <summary>Turns a vector back from the magnet's frame.</summary>
        /// <param name="x">Component along x.</param>
        /// <param name="y">Component along y.</param>
        /// <returns>The components in the common frame.</returns>
        public (double X, double Y) Leave(double x, double y) => ((x * Cosine) - (y * Sine), (y * Cosine) + (x * Sine));
    }
}
