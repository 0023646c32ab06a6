namespace SpecLint.Physics.Magnetics;

/// <summary>Sums over the spectrum of a magnet array: one transfer amplitude per wave number times products of coefficients.</summary>
internal sealed class SpectralSum
{
    /// <summary>Relative size of the remainder at which a sum ends.</summary>
    public const double Tolerance = 1e-7;

    private const int Nodes = WaveNumberGrid.NodesPerBlock;
    private const double SteepestRatio = 0.6;
    private const double SlowestRatio = 0.95;
    private const int LinearHarmonicCap = 400;
    private readonly MagnetTransform _magnets;
    private readonly double[] _nodes = new double[Nodes];
    private readonly double[] _weights = new double[Nodes];
    private readonly double[] _waveNumbers = new double[Nodes];
    private readonly double[] _measure = new double[Nodes];

    /// <summary>Prepares sums over an array's spectrum.</summary>
    /// <param name="magnets">The array.</param>
    public SpectralSum(MagnetTransform magnets) => _magnets = magnets;

    /// <summary>Amplitude of the stack for one wave number.</summary>
    /// <param name="response">Response of the stack.</param>
    /// <returns>The amplitude.</returns>
    public delegate double Amplitude(in LayerResponse response);

    /// <summary>Partner coefficients of one harmonic over one block.</summary>
    /// <param name="block">Block number.</param>
    /// <param name="index">Harmonic index.</param>
    /// <returns>One coefficient per node.</returns>
    public delegate ReadOnlySpan<double> Partner(int block, int index);

    /// <summary>Sums amplitude times magnet coefficient times partner coefficient, harmonic by harmonic.</summary>
    /// <param name="stack">The layers.</param>
    /// <param name="amplitude">Amplitude taken from the stack's response.</param>
    /// <param name="partner">Partner coefficients.</param>
    /// <param name="sums">Receives one sum per harmonic n = 1, 3, ...</param>
    /// <returns>Estimate of the error of any sum, absolute.</returns>
    public double PerHarmonic(MagneticLayers stack, Amplitude amplitude, Partner partner, Span<double> sums)
    {
        sums.Clear();
        Span<double> amplitudes = stackalloc double[Nodes];
        Span<double> last = stackalloc double[sums.Length];
        Span<double> previous = stackalloc double[sums.Length];
        double scale = 0.0;
        double remainder = double.PositiveInfinity;
        for (int block = 0; block < WaveNumberGrid.BlockCap; block++)
        {
            last.Clear();
            previous.Clear();
            for (int j = 0; j < sums.Length; j++)
            {
                if (j == 0 || _magnets.Grid.IsLinear)
                {
                    Prepare(block, j, stack, amplitude, amplitudes);
                }

                ReadOnlySpan<double> magnet = _magnets.Harmonic(block, j);
                ReadOnlySpan<double> other = partner(block, j);
                double sum = 0.0;
                double size = 0.0;
                for (int i = 0; i < Nodes; i++)
                {
                    if (i % WaveNumberGrid.NodesPerPanel == 0)
                    {
                        (previous[j], last[j]) = (last[j], 0.0);
                    }

                    double term = amplitudes[i] * magnet[i] * other[i];
                    sum += term;
                    size += Math.Abs(term);
                    last[j] += Math.Abs(term);
                }

                sums[j] += sum;
                scale += j == 0 ? size : 0.0;
            }

            remainder = Remainder(last, previous);
            if (remainder <= Tolerance * scale && HasReachedAll(block, sums.Length, stack))
            {
                break;
            }
        }

        return remainder + (QuadratureError * scale);
    }

    /// <summary>Sums amplitude times a function of the magnet coefficients over all harmonics and wave numbers.</summary>
    /// <param name="stack">The layers.</param>
    /// <param name="amplitude">Amplitude taken from the stack's response.</param>
    /// <param name="partner">Partner coefficients, or null for the square of the magnet's own.</param>
    /// <param name="orderFactor">Factor of the harmonic number n.</param>
    /// <returns>The sum and an estimate of its error.</returns>
    public (double Sum, double Error) AllHarmonics(MagneticLayers stack, Amplitude amplitude, Partner? partner, Func<int, double> orderFactor)
    {
        double total = 0.0;
        double scale = 0.0;
        double remainder = double.PositiveInfinity;
        Span<double> amplitudes = stackalloc double[Nodes];
        for (int block = 0; block < WaveNumberGrid.BlockCap; block++)
        {
            double last = 0.0;
            double previous = 0.0;
            int count = Math.Min(_magnets.HarmonicCount(block), LinearHarmonicCap);
            for (int j = 0; j < count; j++)
            {
                if (j == 0 || _magnets.Grid.IsLinear)
                {
                    Prepare(block, j, stack, amplitude, amplitudes);
                }

                ReadOnlySpan<double> magnet = _magnets.Harmonic(block, j);
                ReadOnlySpan<double> other = partner is null ? magnet : partner(block, j);
                double factor = orderFactor((2 * j) + 1);
                (double sum, double size, double lastPanel, double previousPanel) = Terms(amplitudes, magnet, other);
                total += factor * sum;
                scale += Math.Abs(factor) * size;
                last += Math.Abs(factor) * lastPanel;
                previous += Math.Abs(factor) * previousPanel;
                if (_magnets.Grid.IsLinear && Math.Abs(factor) * size <= 0.01 * Tolerance * scale)
                {
                    break;
                }
            }

            remainder = Remainder([last], [previous]);
            if (remainder <= Tolerance * scale)
            {
                break;
            }
        }

        return (total, remainder + (QuadratureError * scale));
    }

    /// <summary>Bound on the panel rule's error relative to the sum of absolute terms, well above the largest seen on thousands of random machines.</summary>
    private const double QuadratureError = 7e-7;

    private static (double Sum, double Size, double Last, double Previous) Terms(
        ReadOnlySpan<double> amplitudes, ReadOnlySpan<double> magnet, ReadOnlySpan<double> other)
    {
        double sum = 0.0;
        double size = 0.0;
        double last = 0.0;
        double previous = 0.0;
        for (int i = 0; i < Nodes; i++)
        {
            if (i % WaveNumberGrid.NodesPerPanel == 0)
            {
                (previous, last) = (last, 0.0);
            }

            double term = amplitudes[i] * magnet[i] * other[i];
            sum += term;
            size += Math.Abs(term);
            last += Math.Abs(term);
        }

        return (sum, size, last, previous);
    }

    /// <summary>Wave numbers, and the measure of the sum times the stack's amplitude, for one harmonic of one block.</summary>
    private void Prepare(int block, int index, in MagneticLayers stack, Amplitude amplitude, Span<double> amplitudes)
    {
        _magnets.Grid.Fill(block, _nodes, _weights);
        bool linear = _magnets.Grid.IsLinear;
        double along = linear ? ((2 * index) + 1) * Math.PI / _magnets.Grid.PolePitch : 0.0;
        for (int i = 0; i < Nodes; i++)
        {
            _waveNumbers[i] = linear ? double.Hypot(along, _nodes[i]) : _nodes[i];
            _measure[i] = linear ? _weights[i] / Math.PI : _weights[i] * _nodes[i];
            amplitudes[i] = _measure[i] * amplitude(stack.Response(_waveNumbers[i]));
        }
    }

    /// <summary>Bounds what lies beyond the last panel by a geometric series with the ratio of the last two.</summary>
    private static double Remainder(ReadOnlySpan<double> last, ReadOnlySpan<double> previous)
    {
        double worst = 0.0;
        for (int j = 0; j < last.Length; j++)
        {
            if (!(last[j] > 0.0))
            {
                continue;
            }

            double ratio = previous[j] > 0.0 ? Math.Clamp(last[j] / previous[j], SteepestRatio, SlowestRatio) : SlowestRatio;
            worst = Math.Max(worst, last[j] * ratio / (1.0 - ratio));
        }

        return worst;
    }

    /// <summary>High orders begin only where the wave number times the reach exceeds the order; an early small panel is no proof.</summary>
    private bool HasReachedAll(int block, int harmonics, in MagneticLayers stack)
    {
        if (_magnets.Grid.IsLinear)
        {
            return true;
        }

        double order = ((2.0 * harmonics) - 1.0) * _magnets.Grid.PolePairs;
        double k = (block + 1) * _magnets.Grid.BlockWidth;
        return k * _magnets.Row.Reach > order || Math.Exp(-k * stack.MagnetThickness) < Tolerance;
    }
}
