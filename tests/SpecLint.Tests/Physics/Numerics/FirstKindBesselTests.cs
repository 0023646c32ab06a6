using CsCheck;
using MathNet.Numerics;
using SpecLint.Physics.Numerics;

namespace SpecLint.Tests.Physics.Numerics;

public sealed class FirstKindBesselTests
{
    [Fact]
    public void Bessel_Values_MatchLibrary() => Gen.Double[0.0, 400.0].Sample(x =>
    {
        Assert.Equal(SpecialFunctions.BesselJ(0, x), FirstKindBessel.J0(x), 1e-12);
        Assert.Equal(SpecialFunctions.BesselJ(1, x), FirstKindBessel.J1(x), 1e-12);
    });

    [Theory]
    [InlineData(FirstKindBessel.Switch - 1e-9)]
    [InlineData(FirstKindBessel.Switch + 1e-9)]
    [InlineData(20.0)]
    [InlineData(29.0)]
    public void Bessel_AtSwitch_MatchesLibrary(double x)
    {
        Assert.Equal(SpecialFunctions.BesselJ(0, x), FirstKindBessel.J0(x), 1e-12);
        Assert.Equal(SpecialFunctions.BesselJ(1, x), FirstKindBessel.J1(x), 1e-12);
    }
}
