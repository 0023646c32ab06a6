using SpecLint.Reporting.Quantities;
using SpecLint.Spec.Units;

namespace SpecLint.Tests.Reporting;

public sealed class BandTextTests
{
    [Theory]
    [InlineData(0.612345, 0.0178, "T", "0.612 ± 0.018 T")]
    [InlineData(0.03, 0, "mm", "30 mm")]
    [InlineData(384.55, 21, "°C", "111 ± 21 °C")]
    [InlineData(2350, 120, "N", "2350 ± 120 N")]
    [InlineData(123456, 2300, "N", "123500 ± 2300 N")]
    [InlineData(1.7333, 0.02, "", "1.733 ± 0.020")]
    [InlineData(-0.5, 0.1, "T", "-0.50 ± 0.10 T")]
    [InlineData(0, 0.1, "T", "0.00 ± 0.10 T")]
    [InlineData(1, 1e-12, "T", "1 T")]
    [InlineData(0.853, 0.011, "%", "85.3 ± 1.1 %")]
    [InlineData(12.3456e6, 0, "A/mm²", "12.35 A/mm²")]
    [InlineData(31.41592653589793, 0, "rpm", "300 rpm")]
    public void Band_Value_IsRoundedWithItsBand(double value, double band, string unit, string expected) =>
        Assert.Equal(expected, BandText.Band(value, band, unit, Dimension.None));

    [Theory]
    [InlineData(0.0, "0")]
    [InlineData(9999.6, "10000")]
    [InlineData(123456789, "1.235e8")]
    [InlineData(0.00001234, "1.234e-5")]
    [InlineData(-0.02, "-0.02")]
    [InlineData(100, "100")]
    public void Number_Value_HasFourDigits(double value, string expected) => Assert.Equal(expected, BandText.Number(value));

    [Theory]
    [InlineData(-0.0833, "-8.3 %")]
    [InlineData(5, "+500 %")]
    [InlineData(0, "0 %")]
    [InlineData(-0.00004, "-0.004 %")]
    public void Margin_Share_IsInPercent(double margin, string expected) => Assert.Equal(expected, BandText.Margin(margin));

    [Fact]
    public void Value_UnknownUnit_IsToldInBaseUnits() => Assert.Equal("2 m²·s⁻¹", BandText.Value(2, "no such unit", new Dimension(2, 0, -1, 0, 0)));
}
