using SpecLint.Physics.Geometry;

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
    /// <param name="coil">Buildable outline; its thickness and corner radius are not used, turns are mitred sharp.</param>
    /// <param name="grid">The wave-number grid, shared with the magnets.</param>
    /// <exception cref="ArgumentException">The outline is not buildable.</exception>
    public CoilTransform(CoilOutline coil, WaveNumberGrid grid)
    {
        if (!CoilGeometry.IsBuildable(coil))
        {
            throw new ArgumentException("the outline does not enclose a hole", nameof(coil));
        }

        Outline = coil;
        Grid = grid;
    }

    /// <summary>The coil.</summary>
    public CoilOutline Outline { get; }

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
        IPlaneTransform transform = Outline.Shape == CoilShape.Round
            ? RoundTransform.Ring(Outline.PitchRadius, 0.5 * Outline.HoleWidth, (0.5 * Outline.HoleWidth) + Outline.LegWidth)
            : new CreaseTransform(Outline);
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
                all[(j * Nodes) + i] = LinearTransform.Coil(Outline, kx, across[i]);
            }
        }

        return all;
    }
}
