using SpecLint.Spec.Units;

namespace SpecLint.Tests.Spec.Units;

public sealed class UnitDisplayTests
{
    [Theory]
    [InlineData(0.01142, "mm", "11.4 mm")]
    [InlineData(2e6, "A/mm²", "2.0 A/mm²")]
    [InlineData(358.15, "°C", "85 °C")]
    [InlineData(26.179938779914945, "rpm", "250 rpm")]
    [InlineData(0.12, "%", "12 %")]
    [InlineData(0.0354, "", "0.0354")]
    [InlineData(0.73912, "T", "0.739 T")]
    [InlineData(1234.6, "W", "1235 W")]
    [InlineData(0, "mm", "0 mm")]
    [InlineData(-0.0000001, "%", "-1e-5 %")]
    [InlineData(1.2566e-6, "H", "1.26e-6 H")]
    [InlineData(3.14159, "parsec", "3.14 parsec")]
    public void Format_Value_HasDigitsAReaderCanUse(double si, string unit, string text) => Assert.Equal(text, UnitDisplay.Format(si, unit));

    [Theory]
    [InlineData(0.0015, "m", "1.5 mm")]
    [InlineData(12.3, "m", "12.3 m")]
    [InlineData(2e-5, "m", "20 µm")]
    [InlineData(366.15, "K", "93 °C")]
    [InlineData(4.6e6, "A/m²", "4.6 A/mm²")]
    [InlineData(23.5e6, "Pa", "23.5 MPa")]
    [InlineData(31.41592653589793, "rad/s", "300 rpm")]
    [InlineData(0.00079, "Wb", "0.79 mWb")]
    [InlineData(0.12, "Ω", "120 mΩ")]
    [InlineData(0, "m", "0 mm")]
    [InlineData(0.91, "", "0.91")]
    [InlineData(1.44, "V·s/rad", "1.44 V·s/rad")]
    public void Readable_SiValue_IsInTheUnitOfTheWorkshop(double si, string siUnit, string text) => Assert.Equal(text, UnitDisplay.Readable(si, siUnit));

    [Fact]
    public void FormatDifference_Celsius_IsKelvinWithoutOffset() => Assert.Equal("15 K", UnitDisplay.FormatDifference(15, "°C"));

    [Fact]
    public void FormatExact_Metres_GivesWhatWasWritten() => Assert.Equal("14.25 mm", UnitDisplay.FormatExact(0.01425, "mm"));
}
