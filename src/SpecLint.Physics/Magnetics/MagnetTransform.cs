using SpecLint.Physics.Geometry;

namespace SpecLint.Physics.Magnetics;

/// <summary>Spectrum of the magnetisation of an alternating magnet array; depends on the outline and arrangement only.</summary>
/// <remarks>
/// <para>Axial: per unit remanence the magnetisation is the sum over odd n of cos(n p theta) times the integral of k M_n(k) J_np(k r) dk.
/// Linear: the sum over odd n of cos(n pi x/tau) times (1/pi) times the integral of M_n(ky) cos(ky y) dky over positive ky.</para>
/// <para>Coefficients are computed block by block when first asked for and kept; an instance may be shared by many fields but used by one
/// thread at a time.</para>
/// </remarks>
/// <seealso>Hankel transform: Watson G.N., A Treatise on the Theory of Bessel Functions, 2nd ed., 1944, section 14.4.</seealso>
public sealed class MagnetTransform
{
    private const int Nodes = WaveNumberGrid.NodesPerBlock;

    /// <summary>Number of radii at which fields inside the magnet are tabulated.</summary>
    internal const int InteriorNodes = 8;

    private readonly List<List<double[]>> _blocks = [];
    private readonly List<double[]> _interior = [];

    /// <summary>Prepares the spectrum of a magnet array.</summary>
    /// <param name="row">The magnets; their <see cref="MagnetRow.DomainFault"/> must be null.</param>
    /// <param name="grid">The wave-number grid, shared with the coil.</param>
    /// <exception cref="ArgumentException">The geometry is outside the model's domain, or the grid belongs to another kind of machine.</exception>
    public MagnetTransform(MagnetRow row, WaveNumberGrid grid)
    {
        if (row.DomainFault is { } fault)
        {
            throw new ArgumentException(fault, nameof(row));
        }

        if (row.PolePairs != grid.PolePairs)
        {
            throw new ArgumentException("the grid serves another number of pole pairs", nameof(grid));
        }

        Row = row;
        Grid = grid;
    }

    /// <summary>The magnets.</summary>
    public MagnetRow Row { get; }

    /// <summary>The wave-number grid.</summary>
    public WaveNumberGrid Grid { get; }

    /// <summary>Number of odd harmonics that are not negligible in a block.</summary>
    /// <param name="block">Block number.</param>
    /// <returns>The number; a linear row has no bound and returns the largest integer.</returns>
    internal int HarmonicCount(int block) => Grid.IsLinear
        ? int.MaxValue
        : Math.Max(FluxLinkageHarmonics.Count, AngularProjection.ResolvedHarmonics(Grid.PolePairs, (block + 1) * Grid.BlockWidth * Row.Reach));

    /// <summary>Coefficients of one harmonic over one block.</summary>
    /// <param name="block">Block number.</param>
    /// <param name="index">Harmonic index j, n = 2 j + 1, below <see cref="HarmonicCount"/>.</param>
    /// <returns>One coefficient per node.</returns>
    internal ReadOnlySpan<double> Harmonic(int block, int index)
    {
        while (_blocks.Count <= block)
        {
            _blocks.Add([]);
        }

        List<double[]> lines = _blocks[block];
        if (Grid.IsLinear)
        {
            while (lines.Count <= index)
            {
                lines.Add(LinearLine(block, lines.Count));
            }
        }
        else if (lines.Count == 0)
        {
            AddAxialLines(block, lines);
        }

        return lines[index];
    }

    /// <summary>Radii (linear: distances across the travel) at which the coil's field inside the magnet is tabulated [m].</summary>
    /// <returns>Chebyshev nodes over the magnet, ascending.</returns>
    internal double[] InteriorRadii()
    {
        double inner = Row.IsLinear ? 0.0 : Row.Shape == MagnetShape.Sector ? Row.InnerRadius : Row.PitchRadius - (0.5 * Row.Length);
        double outer = Row.Reach;
        double[] radii = new double[InteriorNodes];
        for (int i = 0; i < InteriorNodes; i++)
        {
            radii[i] = (0.5 * (inner + outer)) - (0.5 * (outer - inner) * Math.Cos(Math.PI * (i + 0.5) / InteriorNodes));
        }

        return radii;
    }

    /// <summary>J_p(k r), or cos(ky y), at the interior radii over one block.</summary>
    /// <param name="block">Block number.</param>
    /// <returns>Radius by radius, node by node.</returns>
    internal ReadOnlySpan<double> InteriorHarmonics(int block)
    {
        while (_interior.Count <= block)
        {
            double[] radii = InteriorRadii();
            double[] all = new double[InteriorNodes * Nodes];
            PhaseTable table = new(Grid, _interior.Count);
            for (int i = 0; i < InteriorNodes; i++)
            {
                Span<double> line = all.AsSpan(i * Nodes, Nodes);
                if (Grid.IsLinear)
                {
                    table.Fill(radii[i], line, table.Line(0));
                }
                else
                {
                    AngularProjection.Project(RoundTransform.Point(radii[i]), Grid.PolePairs, 1, table).CopyTo(line);
                }
            }

            _interior.Add(all);
        }

        return _interior[block];
    }

    private double[] LinearLine(int block, int index)
    {
        double[] line = new double[Nodes];
        double[] across = new double[Nodes];
        Grid.Fill(block, across, line);
        double kx = ((2 * index) + 1) * Math.PI / Grid.PolePitch;
        for (int i = 0; i < Nodes; i++)
        {
            line[i] = 2.0 * LinearTransform.Magnet(Row, kx, across[i]) / Grid.PolePitch;
        }

        return line;
    }

    private void AddAxialLines(int block, List<double[]> lines)
    {
        IPlaneTransform transform = Row.Shape switch
        {
            MagnetShape.Block => new BlockTransform(Row.PitchRadius, Row.Length, Row.Width),
            MagnetShape.Disc => RoundTransform.Disc(Row.PitchRadius, 0.5 * Row.Length),
            _ => new SectorTransform(Row.InnerRadius, Row.OuterRadius, Row.SectorHalfAngle),
        };
        int harmonics = HarmonicCount(block);
        double[] all = AngularProjection.Project(transform, Grid.PolePairs, harmonics, new PhaseTable(Grid, block));
        double scale = 2.0 * Grid.PolePairs / Math.PI;
        for (int j = 0; j < harmonics; j++)
        {
            double[] line = new double[Nodes];
            PhaseTable.AddScaled(scale, all.AsSpan(j * Nodes, Nodes), line);
            lines.Add(line);
        }
    }
}
