namespace SpecLint.Physics.Magnetics;

/// <summary>Demagnetising factor of the installed magnet weighted with the field that the coil would make in it.</summary>
/// <remarks>
/// <para>A recoil permeability adds the magnetisation (mu_r - 1) H inside the magnets. By reciprocity it changes the linkage by
/// (mu_r - 1) times the integral over the magnets of mu0 H . h, h being the coil's field per ampere and H the magnets' own field, where the
/// remanence alone gives the integral of B_r h_z. Their ratio, with the sign of an opposing field, takes the place of the plain volume mean N in
/// 1/(1 + (mu_r - 1) N): the middle of the magnet, which the coil sees most, counts most, and so does the leakage along the face.</para>
/// <para>Fundamental only; ideal steel.</para>
/// </remarks>
/// <seealso>Reciprocity: Smythe W.R., Static and Dynamic Electricity, 3rd ed., 1968, section 8.02 (mutual energy); first-order perturbation as in
/// Jackson J.D., Classical Electrodynamics, 3rd ed., 1998, section 5.16.</seealso>
internal static class CoilWeightedDemagnetisation
{
    private const int Nodes = WaveNumberGrid.NodesPerBlock;
    private const int Radii = MagnetTransform.InteriorNodes;
    private const double Tolerance = 1e-4;

    /// <summary>Below this share of its absolute integral the coil's field hardly drives the magnet, and the plain mean is returned.</summary>
    private const double LeastShare = 0.1;

    private static readonly InteriorSamples.Counts Counts = new(6, 4, 6);

    /// <summary>Computes the factor.</summary>
    /// <param name="magnets">Spectrum of the magnets.</param>
    /// <param name="coil">Spectrum of the coil.</param>
    /// <param name="ideal">The layers with ideal steel and unit recoil permeability.</param>
    /// <param name="layer">Place of the winding.</param>
    /// <returns>The factor [-], to about 1 %.</returns>
    public static double Factor(MagnetTransform magnets, CoilTransform coil, MagneticLayers ideal, CoilLayer layer)
    {
        InteriorField field = new(magnets.Row, ideal);
        InteriorSamples.Sample[] samples = InteriorSamples.List(magnets.Row, ideal, Counts);
        int perLevel = samples.Length / Counts.Through;
        double[] potential = new double[Radii * Counts.Through];
        double[] normal = new double[Radii * Counts.Through];
        double[] depths = new double[Counts.Through];
        for (int q = 0; q < depths.Length; q++)
        {
            depths[q] = -samples[q * perLevel].Z;
        }

        Tabulate(magnets, coil, (ideal, layer), depths, potential, normal);
        double[] radii = magnets.InteriorRadii();
        double driven = 0.0;
        double opposed = 0.0;
        double size = 0.0;
        double mean = 0.0;
        Interpolant interpolant = new() { Radii = radii, Weights = stackalloc double[Radii], Slopes = stackalloc double[Radii] };
        for (int i = 0; i < samples.Length; i++)
        {
            int q = i / perLevel;
            InteriorSamples.Sample s = samples[i];
            FieldVector h = CoilField(magnets.Grid, s, interpolant, potential.AsSpan(q * Radii, Radii), normal.AsSpan(q * Radii, Radii));
            FieldVector m = field.At(s.X, s.Y, s.Z);
            driven += s.Weight * h.Z;
            size += s.Weight * Math.Abs(h.Z);
            mean -= s.Weight * m.Z;
            opposed -= s.Weight * ((m.X * h.X) + (m.Y * h.Y) + (m.Z * h.Z));
        }

        return Math.Abs(driven) > LeastShare * size ? opposed / driven : mean;
    }

    /// <summary>Potential and normal field of the coil's fundamental at the interior radii, level by level.</summary>
    private static void Tabulate(
        MagnetTransform magnets, CoilTransform coil, (MagneticLayers Ideal, CoilLayer Layer) place, double[] depths, double[] potential, double[] normal)
    {
        double[] across = new double[Nodes];
        double[] measure = new double[Nodes];
        double[] amplitude = new double[Nodes];
        double[] k = new double[Nodes];
        bool linear = magnets.Grid.IsLinear;
        double along = linear ? Math.PI / magnets.Grid.PolePitch : 0.0;
        double size = 0.0;
        for (int block = 0; block < WaveNumberGrid.BlockCap; block++)
        {
            magnets.Grid.Fill(block, across, measure);
            ReadOnlySpan<double> turns = coil.Harmonic(block, 0);
            ReadOnlySpan<double> harmonics = magnets.InteriorHarmonics(block);
            double last = 0.0;
            for (int i = 0; i < Nodes; i++)
            {
                k[i] = double.Hypot(along, across[i]);
                double share = place.Ideal.Response(k[i]).MeanNormal(place.Layer.MidHeight, place.Layer.Thickness);
                amplitude[i] = measure[i] * (linear ? 1.0 : k[i]) * share * turns[i];
                size += Math.Abs(amplitude[i]);
                last += i >= Nodes - WaveNumberGrid.NodesPerPanel ? Math.Abs(amplitude[i]) : 0.0;
            }

            for (int q = 0; q < depths.Length; q++)
            {
                AddLevel(place.Ideal, depths[q], (k, amplitude), harmonics, new Level { Potential = potential.AsSpan(q * Radii, Radii), Normal = normal.AsSpan(q * Radii, Radii) });
            }

            if (last <= Tolerance * size)
            {
                return;
            }
        }
    }

    private static void AddLevel(
        in MagneticLayers ideal, double depth, (double[] K, double[] Amplitude) modes, ReadOnlySpan<double> harmonics, Level level)
    {
        double h = ideal.MagnetThickness;
        bool steel = !ideal.Behind.IsAbsent;
        for (int i = 0; i < Nodes; i++)
        {
            double k = modes.K[i];
            double decay = Math.Exp(-k * depth);
            double mirror = steel ? Math.Exp(-k * ((2.0 * h) - depth)) : 0.0;
            double thick = Math.Exp(steel ? -2.0 * k * h : -k * h);
            double scale = modes.Amplitude[i] / (1.0 - thick);
            double potential = scale * (decay - mirror);
            double normal = scale * k * (decay + mirror);
            for (int r = 0; r < Radii; r++)
            {
                level.Potential[r] += potential * harmonics[(r * Nodes) + i];
                level.Normal[r] += normal * harmonics[(r * Nodes) + i];
            }
        }
    }

    private static FieldVector CoilField(in WaveNumberGrid grid, in InteriorSamples.Sample s, Interpolant at, ReadOnlySpan<double> potential, ReadOnlySpan<double> normal)
    {
        double r = grid.IsLinear ? Math.Abs(s.X) : double.Hypot(s.X, s.Y);
        at.MoveTo(r);
        double value = 0.0;
        double slope = 0.0;
        double across = 0.0;
        for (int i = 0; i < Radii; i++)
        {
            value += at.Weights[i] * potential[i];
            slope += at.Slopes[i] * potential[i];
            across += at.Weights[i] * normal[i];
        }

        if (grid.IsLinear)
        {
            double kx = Math.PI / grid.PolePitch;
            (double sin, double cos) = Math.SinCos(kx * s.Y);
            return new FieldVector { X = (s.X < 0.0 ? -slope : slope) * cos, Y = -kx * value * sin, Z = across * cos };
        }

        double angle = Math.Atan2(s.Y, s.X);
        (double sine, double cosine) = Math.SinCos(grid.PolePairs * angle);
        double radial = slope * cosine;
        double around = -grid.PolePairs / r * value * sine;
        return new FieldVector
        {
            X = ((radial * s.X) - (around * s.Y)) / r,
            Y = ((radial * s.Y) + (around * s.X)) / r,
            Z = across * cosine,
        };
    }

    /// <summary>Sums of one level.</summary>
    private readonly ref struct Level
    {
        /// <summary>Potential at the interior radii.</summary>
        public required Span<double> Potential { get; init; }

        /// <summary>Normal field at the interior radii.</summary>
        public required Span<double> Normal { get; init; }
    }

    /// <summary>Lagrange interpolation over the interior radii.</summary>
    private readonly ref struct Interpolant
    {
        /// <summary>The radii.</summary>
        public required ReadOnlySpan<double> Radii { get; init; }

        /// <summary>Weights of the value.</summary>
        public required Span<double> Weights { get; init; }

        /// <summary>Weights of the derivative.</summary>
        public required Span<double> Slopes { get; init; }

        /// <summary>Computes the weights for one radius.</summary>
        /// <param name="r">The radius.</param>
        public void MoveTo(double r)
        {
            for (int i = 0; i < Radii.Length; i++)
            {
                double value = 1.0;
                double slope = 0.0;
                for (int j = 0; j < Radii.Length; j++)
                {
                    if (j == i)
                    {
                        continue;
                    }

                    double scale = 1.0 / (Radii[i] - Radii[j]);
                    slope = ((slope * (r - Radii[j])) + value) * scale;
                    value *= (r - Radii[j]) * scale;
                }

                Weights[i] = value;
                Slopes[i] = slope;
            }
        }
    }
}
