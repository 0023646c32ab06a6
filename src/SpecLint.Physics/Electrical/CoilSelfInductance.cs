using System.Numerics;
using System.Runtime.InteropServices;
using SpecLint.Physics.Geometry;
using SpecLint.Physics.Magnetics;

namespace SpecLint.Physics.Electrical;

/// <summary>Self inductance of a coreless coil of evenly spread turns, in air or between iron planes.</summary>
public static class CoilSelfInductance
{
    private const double RelativeTolerance = 2e-5;
    private const int LeastPanels = 4;
    private const int MostPanels = 400;
    private const double UsableError = 0.01;
    private const double ShortWavePhase = 6.0;

    /// <summary>Self inductance.</summary>
    /// <param name="coil">Buildable outline; a corner radius is left out (turns mitred).</param>
    /// <param name="turns">Turns, > 0.</param>
    /// <param name="planes">Iron planes beside the winding.</param>
    /// <returns>[H] with the integration error; NaN if the coil is not buildable, a distance is negative, or the coil is so slender (leg width under some hundredth of its size) that 400 panels leave it 1 % unsure.</returns>
    /// <remarks>
    /// L = mu0 N²/(2 pi) times the integral of k S(k) G(k), S the mean of |W^|² over direction, G from <see cref="CoilLayerResponse"/>.
    /// Exact for uniform current density over the cross-section. Gauss panels of one period of the fastest oscillation; the rest
    /// beyond the last panel from the short-wave limit S -> C/k^5. Round insulated wire adds about
    /// mu0/(2 pi) N l (0.14 + ln(pitch/bare diameter)), l the mean turn: under 1 % from some tens of turns up; not included.
    /// </remarks>
    /// <seealso>W.G. Hurley, M.C. Duffy, IEEE Trans. Magn. 31(4), 1995; E.B. Rosa, F.W. Grover, Bulletin of the Bureau of Standards 8(1), 1912 (insulation correction).</seealso>
    public static InductanceEstimate Of(in CoilOutline coil, double turns, IronPlanes planes)
    {
        if (!CoilGeometry.IsBuildable(coil) || !(planes.Below >= 0.0 && planes.Above >= 0.0))
        {
            return new InductanceEstimate(double.NaN, double.NaN);
        }

        double scale = MagneticConstant.Mu0 * turns * turns / (2.0 * Math.PI);
        InductanceEstimate integral = coil.Shape == CoilShape.Round
            ? OfRing(new RingTransform(coil), coil, planes)
            : OfTrapezoid(new TurnDensityTransform(coil, coil.PitchRadius), coil, planes);
        return new InductanceEstimate(scale * integral.Value, scale * integral.Error);
    }

    /// <summary>Mean of |W^|² over direction.</summary>
    internal static double DirectionMean(in TurnDensityTransform transform, double waveNumber)
    {
        int quarter = 4 + (int)(0.55 * waveNumber * transform.Reach);
        double step = 0.5 * Math.PI / quarter;
        double sum = 0.0;
        for (int index = 0; index < quarter; index++)
        {
            (double sine, double cosine) = Math.SinCos((index + 0.5) * step);
            Complex value = transform.At(waveNumber * cosine, waveNumber * sine);
            sum += value.Real * value.Real + value.Imaginary * value.Imaginary;
        }

        return sum / quarter;
    }

    private static InductanceEstimate OfTrapezoid(in TurnDensityTransform transform, in CoilOutline coil, IronPlanes planes)
    {
        double thickness = coil.Thickness;
        double half = 0.5 * Math.PI / transform.Reach;
        var course = new TailedSum(transform.ShortWave, coil, planes);
        for (int panel = 0; panel < MostPanels; panel++)
        {
            double middle = half * (2 * panel + 1);
            double sum = 0.0;
            for (int node = 0; node < GaussPanel.Count; node++)
            {
                double k = middle + half * GaussPanel.Nodes[node];
                sum += GaussPanel.Weights[node] * k * CoilLayerResponse.Of(k, thickness, planes) * DirectionMean(transform, k);
            }

            if (course.Settles(half * sum, middle + half, panel))
            {
                return course.Estimate;
            }
        }

        return course.Usable;
    }

    private static InductanceEstimate OfRing(in RingTransform transform, in CoilOutline coil, IronPlanes planes)
    {
        double thickness = coil.Thickness;
        double half = 0.5 * Math.PI / transform.Reach;
        var course = new TailedSum(transform.ShortWave, coil, planes);
        for (int panel = 0; panel < MostPanels; panel++)
        {
            double middle = half * (2 * panel + 1);
            double sum = 0.0;
            for (int node = 0; node < GaussPanel.Count; node++)
            {
                double k = middle + half * GaussPanel.Nodes[node];
                double value = transform.At(k);
                sum += GaussPanel.Weights[node] * k * CoilLayerResponse.Of(k, thickness, planes) * value * value;
            }

            if (course.Settles(half * sum, middle + half, panel))
            {
                return course.Estimate;
            }
        }

        return course.Usable;
    }

    /// <summary>Running integral that closes itself with the short-wave remainder.</summary>
    [StructLayout(LayoutKind.Auto)]
    private struct TailedSum(double shortWave, CoilOutline coil, IronPlanes planes)
    {
        private double _sum;
        private double _before;
        private double _change;
        private double _end;

        public InductanceEstimate Estimate { get; private set; }

        /// <summary>The estimate as it stands, or NaN if it is more than 1 % unsure or short of the waves that resolve the leg.</summary>
        public readonly InductanceEstimate Usable => ResolvesLeg && Estimate.Error < UsableError * Math.Abs(Estimate.Value)
            ? Estimate
            : new InductanceEstimate(double.NaN, double.NaN);

        // The short-wave limit holds once the leg is about a wavelength wide.
        private readonly bool ResolvesLeg => _end * coil.LegWidth >= ShortWavePhase;

        public bool Settles(double panelValue, double end, int panel)
        {
            _sum += panelValue;
            _end = end;
            double edge = end * (1.0 - coil.Thickness * CoilLayerResponse.Of(end, coil.Thickness, planes));
            double tail = shortWave / (coil.Thickness * end * end * end) * (1.0 / 3.0 - 0.25 * edge / end);
            double total = _sum + tail;
            double change = Math.Abs(total - _before);
            Estimate = new InductanceEstimate(total, Math.Max(change, _change));
            bool settled = panel >= LeastPanels && ResolvesLeg && Estimate.Error < RelativeTolerance * Math.Abs(total);
            (_before, _change) = (total, change);
            return settled;
        }
    }
}
