namespace SpecLint.Physics.Magnetics;

/// <summary>Flux of one magnet pole through planes of the gap, and what it asks of the steel.</summary>
/// <remarks>
/// Real plates and recoil permeability are included as in <see cref="SpectralField"/>. The numerical error is below 1e-6; the model's
/// own is that of the linkage, 0.5 %. Use one instance from one thread at a time.
/// </remarks>
public sealed class PoleFlux
{
    private readonly SpectralField _field;
    private readonly List<double[]> _annulus = [];

    /// <summary>Flux of a machine's poles.</summary>
    /// <param name="field">The machine's field.</param>
    public PoleFlux(SpectralField field)
    {
        ArgumentNullException.ThrowIfNull(field);
        _field = field;
    }

    /// <summary>Height of the middle of the gap; in an open stack, of the winding's middle [m].</summary>
    public double ReferenceHeight =>
        _field.Stack.Opposite == OppositeSide.Open ? _field.Layer.MidHeight : 0.5 * _field.Stack.Gap;

    /// <summary>Flux of one pole through a plane between its interpole lines, all radii (linear: all depths).</summary>
    /// <param name="height">Height above the magnets' face [m], > 0.</param>
    /// <param name="remanentFluxDensity">Remanent flux density [T].</param>
    /// <returns>Flux [Wb], positive.</returns>
    /// <remarks>The integral of r J_m(k r) over all radii is m/k^2; of the ends of a row only the zero wave number remains.</remarks>
    public double ThroughPlane(double height, double remanentFluxDensity)
    {
        double factor = _field.RecoilFactor * remanentFluxDensity;
        if (_field.Magnets.Grid.IsLinear)
        {
            return factor * LinearThroughPlane(height);
        }

        (double sum, _) = _field.Sum.AllHarmonics(
            _field.SlabLayers,
            (in LayerResponse r) => r.Normal(height) / (r.WaveNumber * r.WaveNumber),
            (_, _) => Ones,
            n => 2.0 * Alternation(n));
        return factor * sum;
    }

    /// <summary>Mean normal flux density of one pole over the magnets' annulus (linear: pole pitch by magnet length).</summary>
    /// <param name="height">Height above the magnets' face [m], > 0.</param>
    /// <param name="remanentFluxDensity">Remanent flux density [T].</param>
    /// <returns>Signed mean between the interpole lines [T]; equals the mean of |B_z| unless the field reverses between magnets.</returns>
    public double MeanOverAnnulus(double height, double remanentFluxDensity)
    {
        WaveNumberGrid grid = _field.Magnets.Grid;
        MagnetRow g = _field.Magnets.Row;
        (double sum, _) = _field.Sum.AllHarmonics(
            _field.SlabLayers, (in LayerResponse r) => r.Normal(height), Annulus, n => grid.IsLinear ? Alternation(n) / n : 1.0);
        double area = grid.IsLinear
            ? 0.5 * Math.PI * g.Length
            : Math.PI * ((g.OuterRadius * g.OuterRadius) - (g.InnerRadius * g.InnerRadius)) / (2.0 * grid.PolePairs);
        return _field.RecoilFactor * remanentFluxDensity * sum / area;
    }

    /// <summary>First estimate of the flux density in the steel behind the magnets, from the linear field.</summary>
    /// <param name="plateThickness">Thickness of the disc, return plate or back iron [m].</param>
    /// <param name="remanentFluxDensity">Remanent flux density [T].</param>
    /// <returns>
    /// Half the pole's flux over the annulus, divided by plate thickness times the magnets' radial length [T]. About 7 % above the mean of a
    /// linear three-dimensional solution for a plate of usual size; above saturation it tells by how much, not what the steel will carry.
    /// </returns>
    /// <remarks>The flux of a pole divides toward its two neighbours in the plate. Taken at the middle of the gap (open: of the winding).</remarks>
    public double PlateFluxDensity(double plateThickness, double remanentFluxDensity)
    {
        MagnetRow g = _field.Magnets.Row;
        double width = g.IsLinear
            ? g.PolePitch
            : Math.PI * ((g.OuterRadius * g.OuterRadius) - (g.InnerRadius * g.InnerRadius)) / (2.0 * g.PolePairs * g.Length);
        return 0.5 * MeanOverAnnulus(ReferenceHeight, remanentFluxDensity) * width / plateThickness;
    }

    private static readonly double[] Ones = CreateOnes();

    private static double[] CreateOnes()
    {
        double[] ones = new double[WaveNumberGrid.NodesPerBlock];
        Array.Fill(ones, 1.0);
        return ones;
    }

    private static double Alternation(int n) => (n / 2) % 2 == 0 ? 1.0 : -1.0;

    private double LinearThroughPlane(double height)
    {
        const int HarmonicCap = 401;
        const double Tolerance = 1e-9;
        double pitch = _field.Magnets.Grid.PolePitch;
        double sum = 0.0;
        for (int n = 1; n < HarmonicCap; n += 2)
        {
            double kx = n * Math.PI / pitch;
            double amplitude = _field.SlabLayers.Response(kx).Normal(height);
            double magnet = 2.0 * LinearTransform.Magnet(_field.Magnets.Row, kx, 0.0) / pitch;
            sum += Alternation(n) * 2.0 * amplitude * magnet / kx;
            if (amplitude < Tolerance)
            {
                break;
            }
        }

        return sum;
    }

    private ReadOnlySpan<double> Annulus(int block, int index)
    {
        const int Nodes = WaveNumberGrid.NodesPerBlock;
        WaveNumberGrid grid = _field.Magnets.Grid;
        MagnetRow g = _field.Magnets.Row;
        while (_annulus.Count <= block)
        {
            int next = _annulus.Count;
            if (grid.IsLinear)
            {
                double[] line = new double[Nodes];
                grid.Fill(next, line, new double[Nodes]);
                for (int i = 0; i < Nodes; i++)
                {
                    line[i] = g.Length * LinearTransform.Sinc(0.5 * line[i] * g.Length);
                }

                _annulus.Add(line);
            }
            else
            {
                SectorTransform window = new(g.InnerRadius, g.OuterRadius, Math.PI / (2.0 * grid.PolePairs));
                _annulus.Add(AngularProjection.Project(
                    window, grid.PolePairs, _field.Magnets.HarmonicCount(next), new PhaseTable(grid, next)));
            }
        }

        return _annulus[block].AsSpan(grid.IsLinear ? 0 : index * Nodes, Nodes);
    }
}
