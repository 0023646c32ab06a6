namespace SpecLint.Physics.Magnetics;

/// <summary>Angular coefficients of odd harmonic order of a plane figure, for one block of wave numbers.</summary>
/// <remarks>
/// Periodic trapezoid rule in the angle, exact to rounding once the points outnumber the bandwidth. Only odd multiples of the pole pairs
/// are wanted, so the samples of one quadrant are first folded into half a pole pitch with alternating sign.
/// </remarks>
internal static class AngularProjection
{
    /// <summary>Points beyond the bandwidth x, as multiple of x^(1/3), that let J_m(x) fall below 1e-9.</summary>
    private const double TransitionMargin = 8.0;

    /// <summary>Number of samples in half a pole pitch that resolve a figure.</summary>
    /// <param name="polePairs">Pole pairs [-].</param>
    /// <param name="bandwidth">Largest wave number times the figure's reach [-].</param>
    /// <param name="harmonics">Number of odd harmonics wanted.</param>
    /// <returns>The number of samples, at least the number of harmonics.</returns>
    public static int HalfPitchSamples(int polePairs, double bandwidth, int harmonics)
    {
        double wide = bandwidth + (TransitionMargin * (1.0 + Math.Cbrt(bandwidth)));
        double points = wide + (((2.0 * harmonics) - 1.0) * polePairs);
        return Math.Max(harmonics, (int)Math.Ceiling(points / (4.0 * polePairs)));
    }

    /// <summary>Number of odd harmonics whose coefficients are not negligible.</summary>
    /// <param name="polePairs">Pole pairs [-].</param>
    /// <param name="bandwidth">Largest wave number times the figure's reach [-].</param>
    /// <returns>The number of harmonics n = 1, 3, ...</returns>
    public static int ResolvedHarmonics(int polePairs, double bandwidth)
    {
        double wide = bandwidth + (TransitionMargin * (1.0 + Math.Cbrt(bandwidth)));
        return (int)Math.Ceiling(0.5 * ((wide / polePairs) + 1.0));
    }

    /// <summary>Computes the coefficients.</summary>
    /// <param name="transform">The figure.</param>
    /// <param name="polePairs">Pole pairs [-].</param>
    /// <param name="harmonics">Number of odd harmonics.</param>
    /// <param name="table">Phase table of the block.</param>
    /// <returns>The integral of f J_m(k r) cos(m phi), harmonic by harmonic, node by node.</returns>
    public static double[] Project(IPlaneTransform transform, int polePairs, int harmonics, PhaseTable table)
    {
        const int Nodes = WaveNumberGrid.NodesPerBlock;
        int samples = HalfPitchSamples(polePairs, table.WaveNumbers[^1] * transform.Reach, harmonics);
        double[] folded = new double[samples * Nodes];
        Fold(transform, polePairs, samples, table, folded);
        double[] result = new double[harmonics * Nodes];
        double[] nodeFactor = new double[Nodes];
        transform.NodeFactor(table, nodeFactor);
        for (int j = 0; j < harmonics; j++)
        {
            int n = (2 * j) + 1;
            int order = n * polePairs;
            double scale = transform.OrderFactor(order) * (((order / 2) % 2) == 0 ? 1.0 : -1.0) / ((double)polePairs * samples);
            Span<double> line = result.AsSpan(j * Nodes, Nodes);
            for (int i = 0; i < samples; i++)
            {
                // The phase is reduced exactly in integers before the cosine is taken.
                long step = (long)n * ((2 * i) + 1) % (8L * samples);
                double weight = scale * Math.Cos(step * Math.PI / (4.0 * samples));
                PhaseTable.AddScaled(weight, folded.AsSpan(i * Nodes, Nodes), line);
            }

            PhaseTable.Multiply(nodeFactor, line);
        }

        return result;
    }

    private static void Fold(IPlaneTransform transform, int polePairs, int samples, PhaseTable table, double[] folded)
    {
        const int Nodes = WaveNumberGrid.NodesPerBlock;
        bool odd = (polePairs % 2) == 1;
        Span<double> value = stackalloc double[Nodes];
        for (int half = 0; half < polePairs; half++)
        {
            bool mirrored = (half % 2) == 1;
            double sign = (half % 4) is 1 or 2 ? -1.0 : 1.0;
            for (int i = 0; i < samples; i++)
            {
                double angle = ((half * samples) + i + 0.5) * Math.PI / (2.0 * polePairs * samples);
                (double sine, double cosine) = Math.SinCos(angle);
                transform.Sample((cosine, sine), odd, table, value);
                int slot = mirrored ? samples - 1 - i : i;
                PhaseTable.AddScaled(sign, value, folded.AsSpan(slot * Nodes, Nodes));
            }
        }
    }
}
