using System.Runtime.InteropServices;
using SpecLint.Physics.Geometry;
using SpecLint.Physics.Numerics;

namespace SpecLint.Physics.Magnetics;

/// <summary>
/// Quadrature grid of the spectral sum: Gauss-Legendre panels of equal width along the radial wave number (axial machine) or along the
/// wave number across the travel (linear machine).
/// </summary>
/// <remarks>
/// Magnet and coil transforms are functions of exponential type, the type being the sum of their reaches, so a panel
/// of <see cref="NodesPerPanel"/> nodes is exact to about 1e-8 of the integrand's size when it spans a phase of <see cref="PanelPhase"/>. The
/// reach is rounded up to the next step of a geometric ladder, so that small changes of the design keep the grid, and with it
/// the transforms already computed. Grids with the same members are equal.
/// </remarks>
[StructLayout(LayoutKind.Auto)]
public readonly record struct WaveNumberGrid
{
    /// <summary>Nodes of one panel.</summary>
    internal const int NodesPerPanel = 32;

    /// <summary>Panels that are computed together.</summary>
    internal const int PanelsPerBlock = 3;

    /// <summary>Nodes of one block.</summary>
    internal const int NodesPerBlock = NodesPerPanel * PanelsPerBlock;

    /// <summary>Most blocks ever computed; bounds the work on absurd geometry.</summary>
    internal const int BlockCap = 14;

    /// <summary>Phase of the fastest oscillation across one panel [rad].</summary>
    private const double PanelPhase = 76.0;

    private const double LadderStep = 1.08;

    private static readonly (double[] Nodes, double[] Weights) Rule = GaussLegendreRule.Create(NodesPerPanel);

    /// <summary>Pole pairs; zero for a linear machine.</summary>
    public int PolePairs { get; private init; }

    /// <summary>Pole pitch of a linear machine [m]; zero otherwise.</summary>
    public double PolePitch { get; private init; }

    /// <summary>Width of one panel [1/m].</summary>
    public double PanelWidth { get; private init; }

    /// <summary>Whether the machine is linear.</summary>
    public bool IsLinear => PolePairs == 0;

    /// <summary>Width of one block of panels [1/m].</summary>
    internal double BlockWidth => PanelWidth * PanelsPerBlock;

    /// <summary>Grid that serves a pair of magnets and coil.</summary>
    /// <param name="magnets">The magnets.</param>
    /// <param name="coil">The coil.</param>
    /// <returns>The grid.</returns>
    public static WaveNumberGrid For(in MagnetRow magnets, in CoilOutline coil)
    {
        bool linear = magnets.IsLinear;
        double reach = magnets.Reach;
        double support = reach + Math.Max(reach, ReachOf(coil, linear)) + (linear ? magnets.PolePitch : 0.0);
        double rung = Math.Ceiling(Math.Log(support) / Math.Log(LadderStep));
        return new WaveNumberGrid
        {
            PolePairs = magnets.PolePairs,
            PolePitch = linear ? magnets.PolePitch : 0.0,
            PanelWidth = PanelPhase / Math.Pow(LadderStep, rung),
        };
    }

    /// <summary>The same grid with panels half as wide, to check a result's error estimate.</summary>
    /// <returns>The finer grid.</returns>
    public WaveNumberGrid Refined() => this with { PanelWidth = 0.5 * PanelWidth };

    /// <summary>Fills the nodes and weights of one block.</summary>
    /// <param name="block">Block number from zero.</param>
    /// <param name="nodes">Wave numbers [1/m], length <see cref="NodesPerBlock"/>.</param>
    /// <param name="weights">Weights [1/m], same length.</param>
    internal void Fill(int block, Span<double> nodes, Span<double> weights)
    {
        double half = 0.5 * PanelWidth;
        for (int panel = 0; panel < PanelsPerBlock; panel++)
        {
            double middle = ((block * PanelsPerBlock) + panel + 0.5) * PanelWidth;
            for (int i = 0; i < NodesPerPanel; i++)
            {
                nodes[(panel * NodesPerPanel) + i] = middle + (half * Rule.Nodes[i]);
                weights[(panel * NodesPerPanel) + i] = half * Rule.Weights[i];
            }
        }
    }

    // Sharp corners, as the coil's transform takes them.
    private static double ReachOf(in CoilOutline coil, bool linear) => linear
        ? coil.PitchRadius + (0.5 * coil.HoleLength) + coil.LegWidth
        : CoilPlacement.OutermostRadius(coil with { CornerRadius = null });
}
