using SpecLint.Physics.Geometry;
using SpecLint.Physics.Numerics;

namespace SpecLint.Physics.Magnetics;

/// <summary>Harmonics of the open-circuit field inside the winding, for fundamental amplitude and eddy loss.</summary>
/// <remarks>
/// Real plates and recoil permeability as in <see cref="SpectralField"/>. Harmonics up to n = 31 are summed, sections by Gauss quadrature of
/// <see cref="SectionNodes"/> lengths by <see cref="HeightNodes"/> heights. Numerical accuracy of the squares up to that harmonic: normal 1 %, along the
/// motion 1.5 %, across it 10 % (it peaks sharply at the magnets' ends). Harmonics above 31 matter where the winding lies within a thirtieth of
/// the pole pitch of the magnets. Use one instance from one thread at a time.
/// </remarks>
public sealed class WindingField
{
    /// <summary>Nodes along a leg or bar.</summary>
    internal const int SectionNodes = 5;

    /// <summary>Nodes through the winding's thickness.</summary>
    internal const int HeightNodes = 5;

    private const int Harmonics = 16;
    private const int Nodes = WaveNumberGrid.NodesPerBlock;
    private const double Tolerance = 1e-3;
    private static readonly (double[] Nodes, double[] Weights) Along = GaussLegendreRule.Create(SectionNodes);
    private static readonly (double[] Nodes, double[] Weights) Through = GaussLegendreRule.Create(HeightNodes);
    private readonly SpectralField _field;

    /// <summary>Field inside a machine's winding.</summary>
    /// <param name="field">The machine's field.</param>
    public WindingField(SpectralField field)
    {
        ArgumentNullException.ThrowIfNull(field);
        _field = field;
    }

    /// <summary>Peak fundamental of the normal flux density along the motion.</summary>
    /// <param name="radius">Radius [m]; linear: distance from the row's middle across the travel.</param>
    /// <param name="height">Height above the magnets' face [m], > 0.</param>
    /// <param name="remanentFluxDensity">Remanent flux density [T].</param>
    /// <returns>Signed peak [T], positive over a north pole.</returns>
    public double NormalFundamental(double radius, double height, double remanentFluxDensity)
    {
        double[] amplitudes = new double[Harmonics];
        Accumulate(radius, [height], [amplitudes], [new double[Harmonics]], [new double[Harmonics]]);
        return amplitudes[0] * remanentFluxDensity * _field.RecoilFactor;
    }

    /// <summary>Squares over the two legs; a ring coil is taken as a whole.</summary>
    /// <param name="remanentFluxDensity">Remanent flux density [T].</param>
    /// <returns>Mean squares over leg length and cross-section.</returns>
    /// <remarks>Legs of a keystone or rectangle: over the length of the hole, at the leg's centre line. Ring: at its mean radius.</remarks>
    public WindingFieldSquares Legs(double remanentFluxDensity)
    {
        CoilOutline coil = _field.Coil.Outline;
        if (coil.Shape == CoilShape.Round)
        {
            return Ring(coil, remanentFluxDensity);
        }

        Span<double> places = stackalloc double[SectionNodes];
        Span<double> turns = stackalloc double[SectionNodes];
        bool linear = _field.Magnets.Grid.IsLinear;
        double slope = Math.Tan(CoilGeometry.LegHalfAngle(coil));
        for (int i = 0; i < SectionNodes; i++)
        {
            double x = coil.PitchRadius + (0.5 * coil.HoleLength * Along.Nodes[i]);
            double aside = coil.Shape == CoilShape.Keystone ? x * slope : 0.5 * (coil.HoleWidth + coil.LegWidth);
            places[i] = linear ? x : double.Hypot(x, aside);
            turns[i] = linear ? 0.0 : Math.Atan(slope) - Math.Atan2(aside, x);
        }

        return Mean(places, Along.Weights, turns, remanentFluxDensity);
    }

    /// <summary>Squares over the two end bars of a keystone or rectangle, at their centre lines.</summary>
    /// <param name="remanentFluxDensity">Remanent flux density [T].</param>
    /// <returns>Mean squares; of a ring, which has no bars, the same as of its legs.</returns>
    public WindingFieldSquares EndBars(double remanentFluxDensity)
    {
        CoilOutline coil = _field.Coil.Outline;
        if (coil.Shape == CoilShape.Round)
        {
            return Ring(coil, remanentFluxDensity);
        }

        double reach = 0.5 * (coil.HoleLength + coil.LegWidth);
        double right = 0.5 * Math.PI;
        ReadOnlySpan<double> places = [coil.PitchRadius - reach, coil.PitchRadius + reach];
        return Mean(places, [1.0, 1.0], [right, right], remanentFluxDensity);
    }

    private WindingFieldSquares Ring(in CoilOutline coil, double remanentFluxDensity)
    {
        Span<double> places = stackalloc double[SectionNodes];
        Span<double> turns = stackalloc double[SectionNodes];
        Span<double> weights = stackalloc double[SectionNodes];
        double rho = 0.5 * (coil.HoleWidth + coil.LegWidth);
        for (int i = 0; i < SectionNodes; i++)
        {
            double angle = Math.PI * (i + 0.5) / SectionNodes;
            (double sine, double cosine) = Math.SinCos(angle);
            double x = coil.PitchRadius + (rho * cosine);
            double y = rho * sine;
            bool linear = _field.Magnets.Grid.IsLinear;
            places[i] = linear ? x : double.Hypot(x, y);
            turns[i] = angle + (0.5 * Math.PI) - (linear ? 0.0 : Math.Atan2(y, x));
            weights[i] = 1.0;
        }

        return Mean(places, weights, turns, remanentFluxDensity);
    }

    /// <summary>Averages over places of a section; a turn is the angle between the wire and the radius there.</summary>
    private WindingFieldSquares Mean(
        ReadOnlySpan<double> places, ReadOnlySpan<double> weights, ReadOnlySpan<double> turns, double remanentFluxDensity)
    {
        double[] heights = new double[HeightNodes];
        double[][] normal = new double[HeightNodes][];
        double[][] along = new double[HeightNodes][];
        double[][] across = new double[HeightNodes][];
        double z = 0.0;
        double t = 0.0;
        double r = 0.0;
        double wire = 0.0;
        double total = 0.0;
        for (int i = 0; i < places.Length; i++)
        {
            for (int h = 0; h < HeightNodes; h++)
            {
                heights[h] = _field.Layer.MidHeight + (0.5 * _field.Layer.Thickness * Through.Nodes[h]);
                (normal[h], along[h], across[h]) = (new double[Harmonics], new double[Harmonics], new double[Harmonics]);
            }

            Accumulate(places[i], heights, normal, along, across);
            double sine = Math.Sin(turns[i]);
            for (int h = 0; h < HeightNodes; h++)
            {
                double weight = weights[i] * Through.Weights[h];
                (double zz, double tt, double rr) = (Squares(normal[h]), Squares(along[h]), Squares(across[h]));
                z += weight * zz;
                t += weight * tt;
                r += weight * rr;
                wire += weight * (zz + tt + (sine * sine * (rr - tt)));
                total += weight;
            }
        }

        double scale = remanentFluxDensity * _field.RecoilFactor;
        scale *= scale / total;
        return new WindingFieldSquares { Normal = z * scale, AlongMotion = t * scale, AcrossMotion = r * scale, AcrossWire = wire * scale };
    }

    private static double Squares(double[] amplitudes)
    {
        double sum = 0.0;
        for (int j = 0; j < Harmonics; j++)
        {
            double term = ((2 * j) + 1) * amplitudes[j];
            sum += term * term;
        }

        return sum;
    }

    /// <summary>Adds the harmonics' amplitudes at one place: normal (cosine), along the motion (sine), across it (cosine).</summary>
    private void Accumulate(double place, double[] heights, double[][] normal, double[][] along, double[][] across)
    {
        WaveNumberGrid grid = _field.Magnets.Grid;
        double[] k = new double[Nodes];
        double[] weights = new double[Nodes];
        double[] total = new double[Nodes];
        double[] normalAmplitude = new double[heights.Length * Nodes];
        double[] inPlaneAmplitude = new double[heights.Length * Nodes];
        for (int block = 0; block < WaveNumberGrid.BlockCap; block++)
        {
            grid.Fill(block, k, weights);
            int harmonics = Math.Min(Harmonics, _field.Magnets.HarmonicCount(block));
            (double[] value, double[] slope) = grid.IsLinear ? Across(place, k) : Around(place, block, harmonics);
            double added = 0.0;
            for (int j = 0; j < harmonics; j++)
            {
                double order = grid.IsLinear ? ((2 * j) + 1) * Math.PI / grid.PolePitch : ((2 * j) + 1) * grid.PolePairs / place;
                if (j == 0 || grid.IsLinear)
                {
                    Respond(grid.IsLinear ? order : 0.0, (k, total), heights, (normalAmplitude, inPlaneAmplitude));
                }

                ReadOnlySpan<double> magnet = _field.Magnets.Harmonic(block, j);
                int line = grid.IsLinear ? 0 : j * Nodes;
                for (int i = 0; i < Nodes; i++)
                {
                    double measure = magnet[i] * weights[i] * (grid.IsLinear ? 1.0 / Math.PI : k[i]);
                    double kk = total[i];
                    double radial = slope[line + i] * (grid.IsLinear ? k[i] / kk : 1.0);
                    for (int h = 0; h < heights.Length; h++)
                    {
                        double inPlane = inPlaneAmplitude[(h * Nodes) + i] * measure;
                        double term = normalAmplitude[(h * Nodes) + i] * measure * value[line + i];
                        normal[h][j] += term;
                        along[h][j] += inPlane * order / kk * value[line + i];
                        across[h][j] -= inPlane * radial;
                        added += i >= Nodes - WaveNumberGrid.NodesPerPanel ? Math.Abs(term) : 0.0;
                    }
                }
            }

            if (HasConverged(added, normal))
            {
                return;
            }
        }
    }

    private static bool HasConverged(double added, double[][] normal)
    {
        double size = 0.0;
        foreach (double[] amplitudes in normal)
        {
            size += Math.Abs(amplitudes[0]);
        }

        return added <= Tolerance * size;
    }

    private void Respond(
        double alongWaveNumber, (double[] Across, double[] Total) k, double[] heights, (double[] Normal, double[] InPlane) amplitudes)
    {
        for (int i = 0; i < Nodes; i++)
        {
            k.Total[i] = double.Hypot(alongWaveNumber, k.Across[i]);
            LayerResponse response = _field.SlabLayers.Response(k.Total[i]);
            for (int h = 0; h < heights.Length; h++)
            {
                amplitudes.Normal[(h * Nodes) + i] = response.Normal(heights[h]);
                amplitudes.InPlane[(h * Nodes) + i] = response.InPlane(heights[h]);
            }
        }
    }

    /// <summary>J_m(k r) and its derivative, harmonic by harmonic.</summary>
    private (double[] Value, double[] Slope) Around(double radius, int block, int harmonics)
    {
        WaveNumberGrid grid = _field.Magnets.Grid;
        PhaseTable table = new(grid, block);
        return (AngularProjection.Project(RoundTransform.Point(radius), grid.PolePairs, harmonics, table),
            AngularProjection.Project(RoundTransform.PointSlope(radius), grid.PolePairs, harmonics, table));
    }

    /// <summary>cos(ky y) and its derivative over ky.</summary>
    private static (double[] Value, double[] Slope) Across(double place, double[] k)
    {
        double[] value = new double[Nodes];
        double[] slope = new double[Nodes];
        for (int i = 0; i < Nodes; i++)
        {
            (double sine, value[i]) = Math.SinCos(k[i] * place);
            slope[i] = -sine;
        }

        return (value, slope);
    }
}
