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
    private const int ImageCap = 60;
    private const int FarthestPole = 10;
    private static readonly double[] EulerWeights = [15.0 / 16.0, 11.0 / 16.0, 5.0 / 16.0, 1.0 / 16.0];
    private readonly IChargeSheet _sheet;
    private readonly List<(double Height, double Sign)> _sheets = [];
    private readonly List<(double Cosine, double Sine, double Shift, double Weight)> _poles = [];

    /// <summary>Prepares the sheets of an array.</summary>
    /// <param name="magnets">The magnets; their <see cref="MagnetGeometry.DomainFault"/> must be null.</param>
    /// <param name="layers">The layers; steel is taken as ideal and the recoil permeability as 1.</param>
    public ImageField(MagnetGeometry magnets, MagneticLayers layers)
    {
        Magnets = magnets;
        Layers = layers;
        _sheet = magnets.Shape switch
        {
            MagnetShape.Block => PolygonSheet.Rectangle(magnets.PitchRadius, magnets.Length, magnets.Width),
            MagnetShape.Disc => new DiscSheet(magnets.PitchRadius, 0.5 * magnets.Length),
            _ => PolygonSheet.Sector(magnets.InnerRadius, magnets.OuterRadius, magnets.SectorHalfAngle),
        };
        AddSheets();
        AddPoles();
    }

    /// <summary>The magnets.</summary>
    public MagnetGeometry Magnets { get; }

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

        return remanentFluxDensity * sum / (4.0 * Math.PI);
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
    public (double X, double Y, double Z) FieldStrength(double x, double y, double height)
    {
        double sumX = 0.0;
        double sumY = 0.0;
        double sumZ = 0.0;
        foreach ((double at, double sign) in _sheets)
        {
            foreach ((double cosine, double sine, double shift, double weight) in _poles)
            {
                double px = (x * cosine) + (y * sine);
                double py = (y * cosine) - (x * sine) - shift;
                double z = height - at;
                double charge = sign * weight;
                (double hx, double hy) = _sheet.InPlane(px, py, z);
                sumX += charge * ((hx * cosine) - (hy * sine));
                sumY += charge * ((hy * cosine) + (hx * sine));
                sumZ += (z >= 0.0 ? charge : -charge) * _sheet.SolidAngle(px, py, z);
            }
        }

        const double Scale = 1.0 / (4.0 * Math.PI);
        return (sumX * Scale, sumY * Scale, sumZ * Scale);
    }

    private double RowSolidAngle(double x, double y, double z)
    {
        double sum = 0.0;
        foreach ((double cosine, double sine, double shift, double weight) in _poles)
        {
            double px = (x * cosine) + (y * sine);
            double py = (y * cosine) - (x * sine) - shift;
            sum += weight * _sheet.SolidAngle(px, py, z);
        }

        return sum;
    }

    private void AddPoles()
    {
        int last = Magnets.IsLinear ? FarthestPole : Magnets.PolePairs;
        bool whole = !Magnets.IsLinear && last <= FarthestPole;
        int far = Math.Min(last, FarthestPole);
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
            _poles.Add((cosine, sine, Magnets.IsLinear ? j * Magnets.PolePitch : 0.0, weight));
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
        return (int)Math.Clamp(Math.Ceiling(DampingExponent / (decay * period)), 1.0, ImageCap);
    }

    private void Add(double north, double south)
    {
        _sheets.Add((north, 1.0));
        _sheets.Add((south, -1.0));
    }
}
