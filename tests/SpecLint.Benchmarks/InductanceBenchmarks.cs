using BenchmarkDotNet.Attributes;
using SpecLint.Physics.Electrical;
using SpecLint.Physics.Geometry;

namespace SpecLint.Benchmarks;

/// <summary>Inductances of the coils of a disc machine between two steel planes: one coil, and the whole ring.</summary>
public class InductanceBenchmarks
{
    private const double Turns = 55.0;
    private static readonly IronPlanes Planes = new(0.012, 0.012);

    private CoilOutline _coil;
    private int _coils;

    [Params(CoilShape.Keystone, CoilShape.Rectangle, CoilShape.Round)]
    public CoilShape Shape { get; set; }

    [GlobalSetup]
    public void Prepare()
    {
        _coils = Shape == CoilShape.Keystone ? 9 : 12;
        _coil = Shape == CoilShape.Round
            ? CoilOutline.Round(0.012, 0.028, 0.013, 0.115)
            : new CoilOutline { Shape = Shape, HoleLength = 0.046, HoleWidth = 0.026, LegWidth = 0.016, Thickness = 0.013, PitchRadius = 0.12 };
    }

    [Benchmark]
    public double Self() => CoilSelfInductance.Of(_coil, Turns, Planes).Value;

    [Benchmark]
    public double Ring() => CoilMutualInductance.Ring(_coil, Turns, Planes, _coils).Self;
}
