using System.Numerics;

namespace SpecLint.Physics.Magnetics;

/// <summary>Cosine and sine of wave number times length for all nodes of one block.</summary>
/// <remarks>
/// The nodes of a block's panels differ by the panel width, so the later panels follow from the first by one complex rotation. Not for
/// use from several threads at once: the scratch lines are reused.
/// </remarks>
internal sealed class PhaseTable
{
    private const int Nodes = WaveNumberGrid.NodesPerBlock;
    private const int PanelNodes = WaveNumberGrid.NodesPerPanel;
    private readonly double[] _scratch = new double[8 * Nodes];
    private readonly double _panelWidth;

    /// <summary>Prepares the tables of one block.</summary>
    /// <param name="grid">The grid.</param>
    /// <param name="block">Block number.</param>
    public PhaseTable(in WaveNumberGrid grid, int block)
    {
        WaveNumbers = new double[Nodes];
        grid.Fill(block, WaveNumbers, new double[Nodes]);
        _panelWidth = grid.PanelWidth;
    }

    /// <summary>Wave numbers of the nodes [1/m], ascending.</summary>
    public double[] WaveNumbers { get; }

    /// <summary>One of eight scratch lines of one value per node.</summary>
    /// <param name="index">Line number, 0 to 7.</param>
    /// <returns>The line.</returns>
    public Span<double> Line(int index) => _scratch.AsSpan(index * Nodes, Nodes);

    /// <summary>Tabulates cos(k u) and sin(k u).</summary>
    /// <param name="u">Length [m].</param>
    /// <param name="cosine">Receives the cosines, one per node.</param>
    /// <param name="sine">Receives the sines, one per node.</param>
    public void Fill(double u, Span<double> cosine, Span<double> sine)
    {
        int width = Vector<double>.Count;
        (double stepSine, double stepCosine) = Math.SinCos(_panelWidth * u);
        Vector<double> turnCosine = new(stepCosine);
        Vector<double> turnSine = new(stepSine);
        for (int i = 0; i < PanelNodes; i += width)
        {
            (Vector<double> s, Vector<double> c) = Vector.SinCos(new Vector<double>(WaveNumbers.AsSpan(i)) * u);
            c.CopyTo(cosine[i..]);
            s.CopyTo(sine[i..]);
            for (int j = i + PanelNodes; j < Nodes; j += PanelNodes)
            {
                Vector<double> next = (c * turnCosine) - (s * turnSine);
                s = (s * turnCosine) + (c * turnSine);
                c = next;
                c.CopyTo(cosine[j..]);
                s.CopyTo(sine[j..]);
            }
        }
    }

    /// <summary>Adds a multiple of one line to another.</summary>
    /// <param name="factor">Multiplier.</param>
    /// <param name="source">Line to add.</param>
    /// <param name="target">Line that receives the sum.</param>
    public static void AddScaled(double factor, ReadOnlySpan<double> source, Span<double> target)
    {
        int width = Vector<double>.Count;
        Vector<double> f = new(factor);
        for (int i = 0; i < target.Length; i += width)
        {
            (new Vector<double>(target[i..]) + (f * new Vector<double>(source[i..]))).CopyTo(target[i..]);
        }
    }

    /// <summary>Multiplies one line by another, entry by entry.</summary>
    /// <param name="factor">Line of factors.</param>
    /// <param name="target">Line that is multiplied.</param>
    public static void Multiply(ReadOnlySpan<double> factor, Span<double> target)
    {
        int width = Vector<double>.Count;
        for (int i = 0; i < target.Length; i += width)
        {
            (new Vector<double>(target[i..]) * new Vector<double>(factor[i..])).CopyTo(target[i..]);
        }
    }
}
