using System.Collections.Immutable;
using System.Numerics;
using SpecLint.Physics.Geometry;
using SpecLint.Physics.Magnetics;
using SpecLint.Physics.Numerics;

namespace SpecLint.Physics.Electrical;

/// <summary>Mutual inductances of equal coreless coils in one plane, round a shaft or along a row.</summary>
/// <remarks>
/// M = mu0 N²/(2 pi) times the integral of k C(k) G(k), C the direction mean of the product of both coils' transforms.
/// A coil turned about the shaft has the same transform, turned; so one sampling of directions serves all separations. A coil
/// moved by d multiplies by exp(-j k.d). Short waves cancel between coils apart, so the integral ends early. Separations beyond 20 pitches
/// are left at zero: as dipoles they are about 1e-5 of the self inductance.
/// </remarks>
/// <seealso>W.G. Hurley, M.C. Duffy, IEEE Trans. Magn. 31(4), 1995, 2416-2422; rotation and shift theorems of the Fourier transform.</seealso>
public static class CoilMutualInductance
{
    private const double RelativeTolerance = 1e-4;
    private const int LeastPanels = 4;
    private const int MostPanels = 240;
    private const int MostCoils = 720;
    private const int FarthestSeparation = 20;

    /// <summary>All inductances of coils equally spaced round the shaft.</summary>
    /// <param name="coil">Buildable outline with a pitch radius > 0.</param>
    /// <param name="turns">Turns of one coil, > 0.</param>
    /// <param name="planes">Iron planes beside the winding.</param>
    /// <param name="coils">Number of coils, >= 1.</param>
    /// <returns>Self inductance and mutuals by separation; NaN if the coil is not buildable or there are more than 720.</returns>
    public static CoilInductances Ring(in CoilOutline coil, double turns, IronPlanes planes, int coils)
    {
        ArgumentOutOfRangeException.ThrowIfNegativeOrZero(coils);
        Span<double> integrals = new double[coils / 2 + 1];
        Span<double> near = integrals[..Math.Min(integrals.Length, FarthestSeparation + 1)];
        double scale = MagneticConstant.Mu0 * turns * turns / (2.0 * Math.PI);
        InductanceEstimate self = CoilSelfInductance.Of(coil, turns, planes);
        if (!double.IsFinite(self.Value) || coils > MostCoils)
        {
            integrals.Fill(double.NaN);
        }
        else if (coil.Shape == CoilShape.Round)
        {
            Span<double> distances = new double[integrals.Length];
            for (int separation = 0; separation < distances.Length; separation++)
            {
                distances[separation] = 2.0 * coil.PitchRadius * Math.Sin(Math.PI * separation / coils);
            }

            Rings(coil, planes, distances[..near.Length], self.Value / scale, near);
        }
        else
        {
            Turned(coil, planes, coils, self.Value / scale, near);
        }

        return Collect(CoilArrangement.Ring, coils, self, integrals, scale);
    }

    /// <summary>All inductances of coils equally spaced along a straight row.</summary>
    /// <param name="coil">Buildable rectangle or ring.</param>
    /// <param name="turns">Turns of one coil, > 0.</param>
    /// <param name="planes">Iron planes beside the winding.</param>
    /// <param name="row">Number and pitch of the coils.</param>
    /// <returns>Self inductance and mutuals by separation; NaN if the coil is not buildable or there are more than 720.</returns>
    public static CoilInductances Row(in CoilOutline coil, double turns, IronPlanes planes, CoilRow row)
    {
        ArgumentOutOfRangeException.ThrowIfNegativeOrZero(row.Coils, nameof(row));
        Span<double> integrals = new double[row.Coils];
        Span<double> near = integrals[..Math.Min(integrals.Length, FarthestSeparation + 1)];
        Span<double> distances = new double[row.Coils];
        for (int separation = 0; separation < row.Coils; separation++)
        {
            distances[separation] = separation * row.Pitch;
        }

        double scale = MagneticConstant.Mu0 * turns * turns / (2.0 * Math.PI);
        InductanceEstimate self = CoilSelfInductance.Of(coil, turns, planes);
        if (!double.IsFinite(self.Value) || row.Coils > MostCoils)
        {
            integrals.Fill(double.NaN);
        }
        else if (coil.Shape == CoilShape.Round)
        {
            Rings(coil, planes, distances[..near.Length], self.Value / scale, near);
        }
        else
        {
            Shifted(coil, planes, distances[..near.Length], self.Value / scale, near);
        }

        return Collect(CoilArrangement.Row, row.Coils, self, integrals, scale);
    }

    private static CoilInductances Collect(CoilArrangement arrangement, int coils, InductanceEstimate self, ReadOnlySpan<double> integrals, double scale)
    {
        var values = ImmutableArray.CreateBuilder<double>(integrals.Length);
        values.Add(self.Value);
        for (int separation = 1; separation < integrals.Length; separation++)
        {
            values.Add(scale * integrals[separation]);
        }

        return new CoilInductances
        {
            Arrangement = arrangement,
            Coils = coils,
            BySeparation = values.MoveToImmutable(),
            Error = Math.Max(self.Error, RelativeTolerance * Math.Abs(self.Value)),
        };
    }

    private static void Turned(in CoilOutline coil, IronPlanes planes, int coils, double self, Span<double> integrals)
    {
        var transform = new TurnDensityTransform(coil, 0.0);
        int multiple = coils % 2 == 0 ? coils : 2 * coils;
        double own = new TurnDensityTransform(coil, coil.PitchRadius).Reach;
        double reach = own + coil.PitchRadius * Math.Sin(Math.PI * (integrals.Length - 1) / coils);
        double half = 0.5 * Math.PI / reach;
        Complex[] samples = [];
        Span<double> part = stackalloc double[FarthestSeparation + 1];
        part = part[..integrals.Length];
        var settling = new Settling(self * own / reach);
        for (int panel = 0; panel < MostPanels; panel++)
        {
            part.Clear();
            for (int node = 0; node < GaussPanel.Count; node++)
            {
                double k = half * (2 * panel + 1 + GaussPanel.Nodes[node]);
                int directions = multiple * (1 + (int)((2.0 * k * reach + 16.0) / multiple));
                if (samples.Length < directions)
                {
                    samples = new Complex[2 * directions];
                }

                Sample(transform, k, samples.AsSpan(0, directions));
                double weight = half * GaussPanel.Weights[node] * k * CoilLayerResponse.Of(k, coil.Thickness, planes) / directions;
                for (int separation = 1; separation < integrals.Length; separation++)
                {
                    part[separation] += weight * Correlation(samples.AsSpan(0, directions), separation * (directions / coils));
                }
            }

            if (settling.Adds(part, integrals, panel))
            {
                return;
            }
        }
    }

    // Directions 2 pi i/n: the coil is symmetric about its axis, so a quarter of them gives all.
    private static void Sample(in TurnDensityTransform transform, double k, Span<Complex> samples)
    {
        int count = samples.Length;
        int quarter = count / 4;
        for (int index = 0; index <= quarter; index++)
        {
            (double sine, double cosine) = Math.SinCos(2.0 * Math.PI * index / count);
            Complex value = transform.At(k * cosine, k * sine);
            samples[index] = value;
            samples[count / 2 - index] = Complex.Conjugate(value);
            samples[count / 2 + index] = Complex.Conjugate(value);
            samples[(count - index) % count] = value;
        }
    }

    // Mean over directions of one coil's transform and that of the coil turned by so many samples.
    private static double Correlation(ReadOnlySpan<Complex> samples, int shift)
    {
        return Product(samples[shift..], samples[..^shift]) + Product(samples[..shift], samples[^shift..]);
    }

    private static double Product(ReadOnlySpan<Complex> first, ReadOnlySpan<Complex> second)
    {
        double real = 0.0;
        double imaginary = 0.0;
        for (int index = 0; index < first.Length && index < second.Length; index++)
        {
            real += first[index].Real * second[index].Real;
            imaginary += first[index].Imaginary * second[index].Imaginary;
        }

        return real + imaginary;
    }

    private static void Shifted(in CoilOutline coil, IronPlanes planes, ReadOnlySpan<double> distances, double self, Span<double> integrals)
    {
        var transform = new TurnDensityTransform(coil, coil.PitchRadius);
        double reach = transform.Reach + 0.5 * distances[^1];
        double half = 0.5 * Math.PI / reach;
        Span<double> part = stackalloc double[FarthestSeparation + 1];
        part = part[..integrals.Length];
        var settling = new Settling(self * transform.Reach / reach);
        for (int panel = 0; panel < MostPanels; panel++)
        {
            part.Clear();
            for (int node = 0; node < GaussPanel.Count; node++)
            {
                double k = half * (2 * panel + 1 + GaussPanel.Nodes[node]);
                int quarter = 4 + (int)(0.55 * k * reach);
                double weight = half * GaussPanel.Weights[node] * k * CoilLayerResponse.Of(k, coil.Thickness, planes) / quarter;
                for (int index = 0; index < quarter; index++)
                {
                    (double sine, double cosine) = Math.SinCos((index + 0.5) * 0.5 * Math.PI / quarter);
                    Complex value = transform.At(k * cosine, k * sine);
                    double power = weight * (value.Real * value.Real + value.Imaginary * value.Imaginary);
                    for (int separation = 1; separation < integrals.Length; separation++)
                    {
                        part[separation] += power * Math.Cos(k * sine * distances[separation]);
                    }
                }
            }

            if (settling.Adds(part, integrals, panel))
            {
                return;
            }
        }
    }

    private static void Rings(in CoilOutline coil, IronPlanes planes, ReadOnlySpan<double> distances, double self, Span<double> integrals)
    {
        var transform = new RingTransform(coil);
        double reach = transform.Reach + 0.5 * distances[^1];
        double half = 0.5 * Math.PI / reach;
        Span<double> part = stackalloc double[FarthestSeparation + 1];
        part = part[..integrals.Length];
        var settling = new Settling(self * transform.Reach / reach);
        for (int panel = 0; panel < MostPanels; panel++)
        {
            part.Clear();
            for (int node = 0; node < GaussPanel.Count; node++)
            {
                double k = half * (2 * panel + 1 + GaussPanel.Nodes[node]);
                double value = transform.At(k);
                double power = half * GaussPanel.Weights[node] * k * CoilLayerResponse.Of(k, coil.Thickness, planes) * value * value;
                for (int separation = 1; separation < integrals.Length; separation++)
                {
                    part[separation] += power * FirstKindBessel.J0(k * distances[separation]);
                }
            }

            if (settling.Adds(part, integrals, panel))
            {
                return;
            }
        }
    }

    // Settled when two panels running, brought to the width that suits one coil, add less than the tolerance of the self inductance.
    private sealed class Settling(double scale)
    {
        private double _before = double.PositiveInfinity;

        public bool Adds(ReadOnlySpan<double> part, Span<double> integrals, int panel)
        {
            double largest = 0.0;
            for (int separation = 1; separation < integrals.Length; separation++)
            {
                integrals[separation] += part[separation];
                largest = Math.Max(largest, Math.Abs(part[separation]));
            }

            bool settled = panel >= LeastPanels && Math.Max(largest, _before) < RelativeTolerance * scale;
            _before = largest;
            return settled;
        }
    }
}
