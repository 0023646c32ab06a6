using CsCheck;
using SpecLint.Physics.Thermal;

namespace SpecLint.Tests.Physics.Thermal;

public sealed class DiscConvectionTests
{
    private const double Rpm = Math.PI / 30.0;

    // Cobb and Saunders 1956, worked by hand: 150 mm at 300 rpm, 200 mm at 200 rpm.
    [Theory]
    [InlineData(0.150, 300.0, 44180.0, 75.7, 13.2)]
    [InlineData(0.200, 200.0, 52360.0, 82.4, 10.8)]
    public void FreeDisc_PublishedExamples(double radius, double rpm, double reynolds, double nusselt, double coefficient)
    {
        HeatTransfer result = DiscConvection.Free(rpm * Rpm, radius, FluidProperties.Air);

        Assert.Equal(reynolds, DiscConvection.Reynolds(rpm * Rpm, radius, FluidProperties.Air), 5.0);
        Assert.Equal(nusselt, result.Nusselt, 0.06);
        Assert.Equal(coefficient, result.Coefficient, 0.06);
    }

    // Boutarfa and Harmand 2005, worked by hand: Re 44 180 at gap ratios 0.01, 0.02 and 0.08.
    [Theory]
    [InlineData(0.01, 228.7)]
    [InlineData(0.02, 105.6)]
    [InlineData(0.08, 153.4)]
    public void FacingStator_PublishedExamples(double ratio, double nusselt)
    {
        HeatTransfer result = DiscConvection.FacingStator(300.0 * Rpm, 0.150, ratio * 0.150, FluidProperties.Air);

        Assert.Equal(nusselt, result.Nusselt, 0.2);
        Assert.Equal(CorrelationRange.Inside, result.Range);
    }

    [Fact]
    public void FacingStator_SixHundredths_JoinsWithinThreePercent()
    {
        double below = DiscConvection.FacingStator(31.4, 0.15, 0.06 * 0.15 * (1.0 - 1e-9), FluidProperties.Air).Nusselt;
        double above = DiscConvection.FacingStator(31.4, 0.15, 0.06 * 0.15 * (1.0 + 1e-6), FluidProperties.Air).Nusselt;

        Assert.Equal(1.0, above / below, 0.03);
    }

    [Fact]
    public void FacingStator_UsualClearance_IsReportedBelowRange() =>
        Assert.Equal(CorrelationRange.Below, DiscConvection.FacingStator(31.4, 0.15, 0.001, FluidProperties.Air).Range);

    [Fact]
    public void FacingStator_TinyGap_IsConduction() =>
        Assert.Equal(0.0262 / 1e-4, DiscConvection.FacingStator(31.4, 0.15, 1e-4, FluidProperties.Air).Coefficient, 1e-9);

    [Fact]
    public void FacingStator_FastRotor_IsReportedAboveRange() =>
        Assert.Equal(CorrelationRange.Above, DiscConvection.FacingStator(400.0, 0.15, 0.003, FluidProperties.Air).Range);

    [Fact]
    public void Convection_Speed_RaisesCoefficient() =>
        Gen.Select(Gen.Double[5.0, 300.0], Gen.Double[1.05, 3.0], Gen.Double[0.0005, 0.02]).Sample((speed, ratio, gap) =>
        {
            Assert.True(DiscConvection.Free(ratio * speed, 0.15, FluidProperties.Air).Coefficient
                > DiscConvection.Free(speed, 0.15, FluidProperties.Air).Coefficient);
            Assert.True(DiscConvection.FacingStator(ratio * speed, 0.15, gap, FluidProperties.Air).Coefficient
                >= DiscConvection.FacingStator(speed, 0.15, gap, FluidProperties.Air).Coefficient);
        });

    [Fact]
    public void StillAir_IsMiddleOfBand() =>
        Assert.InRange(StillAir.OpenFace().Coefficient, StillAir.LeastCoefficient, StillAir.MostCoefficient);
}
