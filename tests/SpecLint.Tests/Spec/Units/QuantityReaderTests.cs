using System.Globalization;
using CsCheck;
using SpecLint.Spec.Units;

namespace SpecLint.Tests.Spec.Units;

public sealed class QuantityReaderTests
{
    private static QuantityKind Kind(string name) => QuantityKind.TryFind(name, out var kind) ? kind : throw new ArgumentException(name, nameof(name));

    private static Quantity Read(string text, string kind)
    {
        Assert.True(QuantityReader.TryRead(text, Kind(kind), out var quantity, out string problem), problem);
        return quantity;
    }

    private static string Problem(string text, string kind)
    {
        Assert.False(QuantityReader.TryRead(text, Kind(kind), out _, out string problem));
        return problem;
    }

    [Theory]
    [InlineData("2.0 mm ± 0.2 mm", 2e-3, 0.2e-3, 0.2e-3)]
    [InlineData("2.0 ± 0.2 mm", 2e-3, 0.2e-3, 0.2e-3)]
    [InlineData("2.0mm±0.2mm", 2e-3, 0.2e-3, 0.2e-3)]
    [InlineData("2.0 mm +/- 0.2 mm", 2e-3, 0.2e-3, 0.2e-3)]
    [InlineData("2.0 mm +0.3/-0.1 mm", 2e-3, 0.1e-3, 0.3e-3)]
    [InlineData("2.0 mm -0.1/+0.3 mm", 2e-3, 0.1e-3, 0.3e-3)]
    [InlineData("2.0 mm +0.3 mm / -0.1 mm", 2e-3, 0.1e-3, 0.3e-3)]
    [InlineData("2.0 +0.3/-0 mm", 2e-3, 0, 0.3e-3)]
    [InlineData("2.0 mm +0.3/0 mm", 2e-3, 0, 0.3e-3)]
    [InlineData("0.2 cm ± 100 µm", 2e-3, 0.1e-3, 0.1e-3)]
    [InlineData("2 mm ± 5 %", 2e-3, 0.1e-3, 0.1e-3)]
    [InlineData("2 mm +5/-10 %", 2e-3, 0.2e-3, 0.1e-3)]
    [InlineData("\u22122\u00a0mm ± 5\u2009%", -2e-3, 0.1e-3, 0.1e-3)]
    public void Length_WithTolerance_GivesLimits(string text, double value, double below, double above)
    {
        var quantity = Read(text, "length");

        Assert.Equal(value, quantity.Value, 1e-15);
        Assert.Equal(below, quantity.Below, 1e-15);
        Assert.Equal(above, quantity.Above, 1e-15);
        Assert.True(quantity.HasTolerance);
        Assert.Equal(Dimensions.Length, quantity.Dimension);
    }

    [Theory]
    [InlineData("1.30 T ± 3 %", "flux-density", 1.30, 0.039)]
    [InlineData("85 °C ± 5 K", "temperature", 358.15, 5)]
    [InlineData("85 °C ± 5 °C", "temperature", 358.15, 5)]
    [InlineData("85 % ± 3 %", "ratio", 0.85, 0.03)]
    [InlineData("0.85 ± 0.03", "ratio", 0.85, 0.03)]
    [InlineData("-0.12 %/K ± 0.01 %/K", "temperature-coefficient", -0.0012, 0.0001)]
    [InlineData("8900 kg/m³ +50/-50 kg/m³", "density", 8900, 50)]
    public void Quantity_WithTolerance_GivesLimits(string text, string kind, double value, double width)
    {
        var quantity = Read(text, kind);

        Assert.Equal(value, quantity.Value, 1e-9 * Math.Abs(value));
        Assert.Equal(width, quantity.Below, 1e-9 * width);
        Assert.Equal(width, quantity.Above, 1e-9 * width);
    }

    [Theory]
    [InlineData("40 °C", "temperature", 313.15)]
    [InlineData("313.15 K", "temperature", 313.15)]
    [InlineData("40 °C", "temperature-difference", 40)]
    [InlineData("40 K", "temperature-difference", 40)]
    [InlineData("250 rpm", "rotational-speed", 26.179938779914945)]
    [InlineData("1.5e3 rpm", "rotational-speed", 157.07963267948966)]
    [InlineData(".5 mm", "length", 5e-4)]
    [InlineData("85 %", "ratio", 0.85)]
    [InlineData("0.85", "ratio", 0.85)]
    [InlineData("15°", "angle", 0.2617993877991494)]
    [InlineData("200 Ah", "charge", 720000)]
    public void Quantity_WithUnit_IsCoherentSi(string text, string kind, double si) => Assert.Equal(si, Read(text, kind).Value, 1e-12 * si);

    [Theory]
    [InlineData("1,5 mm", "length", "is 1,5 mm; decimals are written with a point and thousands without a mark, as in 1.5 or 1500")]
    [InlineData("1,000 rpm", "rotational-speed", "is 1,000 rpm; decimals are written with a point and thousands without a mark, as in 1.5 or 1500")]
    [InlineData("1.5", "length", "is 1.5 without a unit; a length such as 1.5 mm is expected (units: mm, cm, m, µm, in)")]
    [InlineData("1.5 V", "length", "is 1.5 V, a voltage; a length such as 1.5 mm is expected")]
    [InlineData("50 Hz", "rotational-speed", "is 50 Hz, a frequency; a rotational speed such as 250 rpm is expected")]
    [InlineData("50 rpm", "frequency", "is 50 rpm, a rotational speed; a frequency such as 16 kHz is expected")]
    [InlineData("15 %", "angle", "is 15 %, a ratio; an angle such as 15 deg is expected")]
    [InlineData("15 deg", "ratio", "is 15 deg, an angle; a ratio such as 0.85 or 85 % is expected")]
    [InlineData("40 C", "temperature", "is 40 C; the unit 'C' is not known (is °C meant?); a temperature such as 40 °C is expected")]
    [InlineData("thick", "length", "is thick; a length such as 1.5 mm is expected")]
    [InlineData("NaN mm", "length", "is NaN mm; a finite number is expected")]
    [InlineData(".inf", "power", "is .inf; a finite number is expected")]
    [InlineData("-Infinity W", "power", "is -Infinity W; a finite number is expected")]
    [InlineData("1e999 mm", "length", "is 1e999 mm, more than any size; a finite number is expected")]
    [InlineData("1e308 km", "length", "is 1e308 km, more than any size; a finite number is expected")]
    [InlineData("2 mm ± 0.1 V", "length", "is 2 mm ± 0.1 V; the tolerance is a voltage, the value a length")]
    [InlineData("2 mm ± -0.1 mm", "length", "is 2 mm ± -0.1 mm; after ± a positive number is expected")]
    [InlineData("2 ± 5 %", "length", "is 2 ± 5 %; the value needs its own unit or % before the tolerance")]
    [InlineData("85 °C ± 5 %", "temperature", "is 85 °C ± 5 %; the tolerance of a temperature is a number of kelvin, as in ± 5 K")]
    [InlineData("2 mm +0.3 mm", "length", "is 2 mm +0.3 mm; a tolerance is written as ± 0.2 mm or +0.3/-0.1 mm")]
    [InlineData("2 mm +0.3/+0.1 mm", "length", "is 2 mm +0.3/+0.1 mm; a tolerance is written as ± 0.2 mm or +0.3/-0.1 mm")]
    [InlineData("", "length", "is empty; a length such as 1.5 mm is expected")]
    public void Quantity_Wrong_SaysWhatWasFoundAndExpected(string text, string kind, string problem) => Assert.Equal(problem, Problem(text, kind));

    [Fact]
    public void Dimension_Expected_IsChecked()
    {
        Assert.True(QuantityReader.TryRead("5 A/mm2", Dimensions.CurrentDensity, isDifference: false, out var quantity, out _));
        Assert.Equal(5e6, quantity.Value, 1e-6);
        Assert.True(QuantityReader.TryRead("15 °C", Dimensions.Temperature, isDifference: true, out var rise, out _));
        Assert.Equal(15, rise.Value, 1e-12);
        Assert.False(QuantityReader.TryRead("5 mm", Dimensions.FluxDensity, isDifference: false, out _, out string problem));
        Assert.Equal("is 5 mm, of dimension m; dimension kg·s⁻²·A⁻¹ is expected", problem);
    }

    [Theory]
    [InlineData("AWG 16", 1.2908e-3)]
    [InlineData("AWG16", 1.2908e-3)]
    [InlineData("16 AWG", 1.2908e-3)]
    [InlineData("awg 36", 0.127e-3)]
    [InlineData("AWG 0", 8.2515e-3)]
    [InlineData("AWG 1/0", 8.2515e-3)]
    [InlineData("AWG 0000", 11.684e-3)]
    [InlineData("AWG 4/0", 11.684e-3)]
    [InlineData("1.25 mm", 1.25e-3)]
    public void Wire_GaugeOrDiameter_IsBareDiameter(string text, double diameter)
    {
        var quantity = Read(text, "wire");

        Assert.Equal(diameter, quantity.Value, 1e-4 * diameter);
        Assert.Equal(Dimensions.Length, quantity.Dimension);
    }

    [Theory]
    [InlineData("SWG 16", "is SWG 16, a size of the British gauge; a wire size such as AWG 16 or 1.25 mm is expected")]
    [InlineData("AWG 16.5", "is AWG 16.5; AWG 4/0 to AWG 50 in whole numbers are known")]
    [InlineData("AWG 60", "is AWG 60; AWG 4/0 to AWG 50 in whole numbers are known")]
    [InlineData("AWG", "is AWG; AWG 4/0 to AWG 50 in whole numbers are known")]
    [InlineData("16", "is 16 without a unit; a wire size such as AWG 16 or 1.25 mm is expected (units: mm, cm, m, µm, in)")]
    public void Wire_Wrong_SaysSo(string text, string problem) => Assert.Equal(problem, Problem(text, "wire"));

    [Fact]
    public void Cable_Gauge_IsCrossSection()
    {
        Assert.Equal(13.3e-6, Read("AWG 6", "cable").Value, 0.01e-6);
        Assert.Equal(16e-6, Read("16 mm²", "cable").Value, 1e-12);
    }

    [Theory]
    [InlineData("de-DE")]
    [InlineData("tr-TR")]
    [InlineData("ar-SA")]
    public void Numbers_UnderAnyCulture_AreTheSame(string culture) => Specs.UnderCulture(culture, () =>
    {
        Assert.Equal(1.5e-3, Read("1.5 mm ± 0.1 mm", "length").Value, 1e-15);
        Assert.Contains("decimals are written with a point", Problem("1,5 mm", "length"), StringComparison.Ordinal);
        Assert.Equal(1592e3, Read("1592 kA/m", "field-strength").Value, 1e-6);
        Assert.Equal("1.5 mm", UnitDisplay.Format(1.5e-3, "mm"));
        Assert.Equal("-0.12 %/K", UnitDisplay.Format(-0.0012, "%/K"));
        Assert.Equal(1.2908e-3, Read("awg 16", "wire").Value, 1e-7);
    });

    [Fact]
    public void Quantity_RandomTexts_RoundTrip() => Gen.Select(Gen.Double[-1e6, 1e6], Gen.Double[0, 100], Gen.Int[0, UnitTable.Units.Length - 1])
        .Sample((value, width, index) =>
        {
            var unit = UnitTable.Units[index];
            string text = string.Create(CultureInfo.InvariantCulture, $"{value:R} {unit.Spelling} ± {width:R} {unit.Spelling}");
            return QuantityReader.TryRead(text, kind: null, out var quantity, out _)
                && Math.Abs(unit.FromSi(quantity.Value) - value) <= 1e-9 * (Math.Abs(value) + 1000)
                && Math.Abs(unit.DifferenceFromSi(quantity.Above) - width) <= 1e-9 * (width + 1)
                && quantity.Dimension == unit.Dimension
                && quantity.UnitText == unit.Spelling;
        }, iter: 5000);

    [Fact]
    public void Quantity_FormatExact_ReadsBackTheSame() => Gen.Select(Gen.Double[1e-6, 1e6], Gen.Int[0, UnitTable.Units.Length - 1])
        .Sample((value, index) =>
        {
            var unit = UnitTable.Units[index];
            double si = unit.ToSi(value);
            return QuantityReader.TryRead(UnitDisplay.FormatExact(si, unit.Spelling), kind: null, out var quantity, out _)
                && Math.Abs(quantity.Value - si) <= 1e-12 * (Math.Abs(si) + 300);
        }, iter: 5000);

    [Fact]
    public void Quantity_RandomText_NeverThrows() => Gen.String[Gen.OneOf(Gen.Char, Gen.Char["0123456789.,+-±/ %eEmkVATAWG°"]), 0, 30].Sample(text =>
    {
        foreach (var kind in QuantityKind.All)
        {
            bool isRead = QuantityReader.TryRead(text, kind, out var quantity, out string problem);
            if (isRead ? !double.IsFinite(quantity.Value) || quantity.Dimension != kind.Dimension : problem.Length < 3)
            {
                return false;
            }
        }

        return true;
    }, iter: 3000);
}
