using System.Runtime.InteropServices;
using SpecLint.Physics.Geometry;

namespace SpecLint.Physics.Electrical;

/// <summary>Fourier transform of the turn density of a ring coil.</summary>
[StructLayout(LayoutKind.Auto)]
internal readonly struct RingTransform
{
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
    public double At(double waveNumber) => RingTurnDensity.Transform(waveNumber, _inner, _outer);
}
