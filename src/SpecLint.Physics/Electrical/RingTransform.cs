using System.Runtime.InteropServices;
using SpecLint.Physics.Geometry;

namespace SpecLint.Physics.Electrical;

/// <summary>Fourier transform of the turn density of a ring coil.</summary>
/// <remarks>Each turn of radius rho gives 2 pi rho J1(k rho)/k; the mean over rho is a composite Gauss rule.</remarks>
[StructLayout(LayoutKind.Auto)]
internal readonly struct RingTransform
{
    private const double PhasePerSegment = 4.0;

    private readonly double _inner;
    private readonly double _outer;

    /// <summary>Prepares a round coil.</summary>
    public RingTransform(in CoilOutline coil)
    {
        _inner = 0.5 * coil.HoleWidth;
        _outer = _inner + coil.LegWidth;
    }

    /// <summary>Outer radius [m].</summary>
    public double Reach => _outer;

    /// <summary>Factor C of the short-wave limit |W^|² -> C/k^5 [1/m], oscillation averaged out.</summary>
    public double ShortWave => 4.0 * Math.PI * (_inner + _outer) / ((_outer - _inner) * (_outer - _inner));

    /// <summary>Transform at a wave number.</summary>
    /// <param name="waveNumber">[1/m], > 0.</param>
    /// <returns>[m²], real, the same in every direction.</returns>
    public double At(double waveNumber)
    {
        double width = _outer - _inner;
        int segments = 1 + (int)(waveNumber * width / PhasePerSegment);
        double half = 0.5 * width / segments;
        double sum = 0.0;
        for (int segment = 0; segment < segments; segment++)
        {
            double middle = _inner + half * (2 * segment + 1);
            for (int node = 0; node < GaussPanel.Count; node++)
            {
                double radius = middle + half * GaussPanel.Nodes[node];
                sum += GaussPanel.Weights[node] * radius * FirstKindBessel.J1(waveNumber * radius);
            }
        }

        return Math.PI * sum / (segments * waveNumber);
    }
}
