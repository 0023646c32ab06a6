namespace SpecLint.Physics.Magnetics;

/// <summary>Spectrum of a coil's turn density for the harmonics 1, 3, ... 15; depends on the coil's outline and the pole pairs only.</summary>
/// <remarks>
/// Computed block by block when first asked for and kept; an instance may be shared by many fields but used by one thread at a time.
/// </remarks>
public sealed class CoilTransform
{
    private const int Nodes = WaveNumberGrid.NodesPerBlock;
    private readonly List<double[]> _blocks = [];

    /// <summary>Prepares the spectrum of a coil.</summary>
    /// <param name="geometry">The coil; its <see cref="CoilGeometry.DomainFault"/> must be null.</param>
    /// <param name="grid">The wave-number grid, shared with the magnets.</param>
    /// <exception cref="ArgumentException">The geometry is outside the model's domain.</exception>
    public CoilTransform(CoilGeometry geometry, WaveNumberGrid grid)
    {
        if (geometry.DomainFault is { } fault)
        {
            throw new ArgumentException(fault, nameof(geometry));
        }

        Geometry = geometry;
        Grid = grid;
    }

    /// <summary>The coil.</summary>
    public CoilGeometry Geometry { get; }

    /// <summary>The wave-number grid.</summary>
    public WaveNumberGrid Grid { get; }

    /// <summary>Coefficients of one harmonic over one block.</summary>
    /// <param name="block">Block number.</param>
    /// <param name="index">Harmonic index j, n = 2 j + 1, below <see cref="FluxLinkageHarmonics.Count"/>.</param>
    /// <returns>One coefficient [m^2] per node.</returns>
    internal ReadOnlySpan<double> Harmonic(int block, int index)
    {
        while (_blocks.Count <= block)
        {
            _blocks.Add(Grid.IsLinear ? LinearBlock(_blocks.Count) : AxialBlock(_blocks.Count));
        }

        return _blocks[block].AsSpan(index * Nodes, Nodes);
    }

    private double[] AxialBlock(int block)
    {
        IPlaneTransform transform = Geometry.Shape == CoilShape.Round
            ? RoundTransform.Ring(Geometry.CentreRadius, Geometry.RingInnerRadius, Geometry.RingOuterRadius)
            : new CreaseTransform(Geometry);
        return AngularProjection.Project(transform, Grid.PolePairs, FluxLinkageHarmonics.Count, new PhaseTable(Grid, block));
    }

    private double[] LinearBlock(int block)
    {
        double[] across = new double[Nodes];
        Grid.Fill(block, across, new double[Nodes]);
        double[] all = new double[FluxLinkageHarmonics.Count * Nodes];
        for (int j = 0; j < FluxLinkageHarmonics.Count; j++)
        {
            double kx = ((2 * j) + 1) * Math.PI / Grid.PolePitch;
            for (int i = 0; i < Nodes; i++)
            {
                all[(j * Nodes) + i] = LinearTransform.Coil(Geometry, kx, across[i]);
            }
        }

        return all;
    }
}
