using CsCheck;
using SpecLint.Physics.Thermal;

namespace SpecLint.Tests.Physics.Thermal;

public sealed class WindingConductivityTests
{
    [Fact]
    public void Across_NoWire_IsBinder() => Assert.Equal(0.2, WindingConductivity.Across(0.0, 390.0, 0.2), 1e-15);

    [Fact]
    public void Across_OneMaterial_IsItself() => Assert.Equal(0.2, WindingConductivity.Across(0.5, 0.2, 0.2), 1e-15);

    // Perfect conductor in the wires: k_b (1 + f)/(1 - f).
    [Fact]
    public void Across_MetalWires_TendsToPerfectConductor() =>
        Assert.Equal(0.2 * 1.55 / 0.45, WindingConductivity.Across(0.55, 390.0, 0.2), 2e-3);

    // Series and parallel bounds of any mixture.
    [Fact]
    public void Across_LiesBetweenBounds() => Gen.Select(Gen.Double[0.01, 0.9], Gen.Double[1.0, 400.0], Gen.Double[0.05, 0.9]).Sample((fill, wire, binder) =>
    {
        double value = WindingConductivity.Across(fill, wire, binder);
        double series = 1.0 / (fill / wire + (1.0 - fill) / binder);
        double parallel = fill * wire + (1.0 - fill) * binder;
        return value >= series && value <= parallel;
    });
}
