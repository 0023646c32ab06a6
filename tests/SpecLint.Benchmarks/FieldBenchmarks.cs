using BenchmarkDotNet.Attributes;
using SpecLint.Physics.Geometry;
using SpecLint.Physics.Magnetics;

namespace SpecLint.Benchmarks;

/// <summary>Field work of one coreless axial machine: linkage, force, demagnetising factors and mid-coil field.</summary>
[MemoryDiagnoser]
public class FieldBenchmarks
{
    private static readonly MagnetRow Magnets = MagnetRow.AxialBlock(6, 0.12, 0.046, 0.03);
    private static readonly CoilOutline Coil = new()
    {
        Shape = CoilShape.Keystone, HoleLength = 0.046, HoleWidth = 0.026, LegWidth = 0.016, Thickness = 0.013, PitchRadius = 0.12,
    };

    private static readonly CoilLayer Layer = new() { MidHeight = 0.0085, Thickness = 0.013 };
    private static readonly SteelPlate Steel = new() { Thickness = 0.008, RelativePermeability = 1000.0 };

    private static readonly MagneticLayers Layers = new()
    {
        MagnetThickness = 0.01, RecoilPermeability = 1.05, Gap = 0.017, Opposite = OppositeSide.Magnets, Behind = Steel,
    };

    private SpectralField? _warm;

    [GlobalSetup]
    public void Prepare()
    {
        _warm = Create();
        _ = Evaluate(_warm);
    }

    [Benchmark(Baseline = true)]
    public double WholeMachine() => Evaluate(Create());

    [Benchmark]
    public double LinkageOnly() => Create().IdealFluxLinkage(1.3).Fundamental;

    [Benchmark]
    public double ChangedGap() => Evaluate(new SpectralField(_warm!.Magnets, _warm.Coil, Layers with { Gap = 0.0175 }, Layer));

    private static double Evaluate(SpectralField field) =>
        field.FluxLinkage(1.3).Fundamental + field.AttractionForce(1.3) + field.MeanDemagnetisingFactor + new PoleCentreField(field).At(0.0085, 1.3);

    private static SpectralField Create()
    {
        WaveNumberGrid grid = WaveNumberGrid.For(Magnets, Coil);
        return new SpectralField(new MagnetTransform(Magnets, grid), new CoilTransform(Coil, grid), Layers, Layer);
    }
}
