using SpecLint.Spec.Units;

namespace SpecLint.Tests.Spec.Units;

public sealed class UnitTableTests
{
    public static TheoryData<string, double, string> Factors => new()
    {
        { "mm", 1e-3, "m" }, { "cm", 1e-2, "m" }, { "µm", 1e-6, "m" }, { "μm", 1e-6, "m" }, { "um", 1e-6, "m" }, { "in", 0.0254, "m" },
        { "\"", 0.0254, "m" }, { "inch", 0.0254, "m" }, { "mil", 25.4e-6, "m" }, { "ft", 0.3048, "m" }, { "km", 1000, "m" },
        { "mm²", 1e-6, "m²" }, { "mm2", 1e-6, "m²" }, { "mm^2", 1e-6, "m²" }, { "cm²", 1e-4, "m²" },
        { "g", 1e-3, "kg" }, { "min", 60, "s" }, { "h", 3600, "s" }, { "ms", 1e-3, "s" },
        { "rpm", Math.PI / 30, "s⁻¹" }, { "r/min", Math.PI / 30, "s⁻¹" }, { "1/min", Math.PI / 30, "s⁻¹" }, { "min^-1", Math.PI / 30, "s⁻¹" }, { "min⁻¹", Math.PI / 30, "s⁻¹" },
        { "rad/s", 1, "s⁻¹" }, { "Hz", 1, "s⁻¹" }, { "kHz", 1000, "s⁻¹" },
        { "km/h", 1 / 3.6, "m·s⁻¹" }, { "m/s", 1, "m·s⁻¹" },
        { "V", 1, "m²·kg·s⁻³·A⁻¹" }, { "mV", 1e-3, "m²·kg·s⁻³·A⁻¹" }, { "kA", 1000, "A" }, { "mA", 1e-3, "A" },
        { "Ω", 1, "m²·kg·s⁻³·A⁻²" }, { "\u2126", 1, "m²·kg·s⁻³·A⁻²" }, { "ohm", 1, "m²·kg·s⁻³·A⁻²" }, { "Ohm", 1, "m²·kg·s⁻³·A⁻²" }, { "mΩ", 1e-3, "m²·kg·s⁻³·A⁻²" }, { "mohm", 1e-3, "m²·kg·s⁻³·A⁻²" },
        { "T", 1, "kg·s⁻²·A⁻¹" }, { "mT", 1e-3, "kg·s⁻²·A⁻¹" }, { "µT", 1e-6, "kg·s⁻²·A⁻¹" }, { "uT", 1e-6, "kg·s⁻²·A⁻¹" }, { "G", 1e-4, "kg·s⁻²·A⁻¹" }, { "Gs", 1e-4, "kg·s⁻²·A⁻¹" }, { "kG", 0.1, "kg·s⁻²·A⁻¹" },
        { "mWb", 1e-3, "m²·kg·s⁻²·A⁻¹" }, { "Wb", 1, "m²·kg·s⁻²·A⁻¹" }, { "V/rpm", 30 / Math.PI, "m²·kg·s⁻²·A⁻¹" }, { "V·s/rad", 1, "m²·kg·s⁻²·A⁻¹" }, { "N·m/A", 1, "m²·kg·s⁻²·A⁻¹" },
        { "kA/m", 1000, "m⁻¹·A" }, { "Oe", 250 / Math.PI, "m⁻¹·A" }, { "kOe", 250_000 / Math.PI, "m⁻¹·A" },
        { "W", 1, "m²·kg·s⁻³" }, { "kW", 1000, "m²·kg·s⁻³" }, { "Wh", 3600, "m²·kg·s⁻²" }, { "kWh", 3.6e6, "m²·kg·s⁻²" }, { "Ah", 3600, "s·A" },
        { "Nm", 1, "m²·kg·s⁻²" }, { "N·m", 1, "m²·kg·s⁻²" }, { "N*m", 1, "m²·kg·s⁻²" }, { "N.m", 1, "m²·kg·s⁻²" }, { "N m", 1, "m²·kg·s⁻²" },
        { "kN", 1000, "m·kg·s⁻²" }, { "MPa", 1e6, "m⁻¹·kg·s⁻²" }, { "N/mm²", 1e6, "m⁻¹·kg·s⁻²" }, { "GPa", 1e9, "m⁻¹·kg·s⁻²" }, { "kPa", 1000, "m⁻¹·kg·s⁻²" }, { "bar", 1e5, "m⁻¹·kg·s⁻²" },
        { "kJ/m³", 1000, "m⁻¹·kg·s⁻²" }, { "MGOe", 1e5 / (4 * Math.PI), "m⁻¹·kg·s⁻²" },
        { "deg", Math.PI / 180, "" }, { "°", Math.PI / 180, "" }, { "rad", 1, "" }, { "%", 0.01, "" },
        { "kg/m3", 1, "m⁻³·kg" }, { "kg/m³", 1, "m⁻³·kg" }, { "g/cm³", 1000, "m⁻³·kg" },
        { "mH", 1e-3, "m²·kg·s⁻²·A⁻²" }, { "µH", 1e-6, "m²·kg·s⁻²·A⁻²" }, { "F", 1, "m⁻²·kg⁻¹·s⁴·A²" }, { "µF", 1e-6, "m⁻²·kg⁻¹·s⁴·A²" },
        { "W/(m·K)", 1, "m·kg·s⁻³·K⁻¹" }, { "W/mK", 1, "m·kg·s⁻³·K⁻¹" }, { "W/m²K", 1, "kg·s⁻³·K⁻¹" }, { "W/(m²·K)", 1, "kg·s⁻³·K⁻¹" }, { "kW/m²", 1000, "kg·s⁻³" },
        { "%/K", 0.01, "K⁻¹" }, { "1/K", 1, "K⁻¹" }, { "ppm/K", 1e-6, "K⁻¹" }, { "A/mm²", 1e6, "m⁻²·A" }, { "A/mm2", 1e6, "m⁻²·A" }, { "A/mm^2", 1e6, "m⁻²·A" },
        { "l/s", 1e-3, "m³·s⁻¹" }, { "m³/s", 1, "m³·s⁻¹" }, { "m3/s", 1, "m³·s⁻¹" }, { "W/kg", 1, "m²·s⁻³" }, { "µΩ·m", 1e-6, "m³·kg·s⁻³·A⁻²" }, { "MS/m", 1e6, "m⁻³·kg⁻¹·s³·A²" },
        { "K", 1, "K" }, { "°C", 1, "K" }, { "degC", 1, "K" }, { "℃", 1, "K" },
    };

    [Theory]
    [MemberData(nameof(Factors))]
    public void Unit_UsualSpelling_HasFactorAndDimension(string spelling, double factor, string dimension)
    {
        Assert.True(UnitTable.TryFind(spelling, out var unit));
        Assert.Equal(factor, unit.Factor, Math.Abs(factor) * 1e-12);
        Assert.Equal(dimension, unit.Dimension.ToString());
    }

    [Fact]
    public void Unit_CanonicalSpelling_IsFoundAndGoesBothWays()
    {
        foreach (var unit in UnitTable.Units)
        {
            Assert.True(UnitTable.TryFind(unit.Spelling, out var again), unit.Spelling);
            Assert.Same(unit, again);
            Assert.Equal(12.5, unit.FromSi(unit.ToSi(12.5)), 1e-9);
        }
    }

    [Fact]
    public void Celsius_PlainAndDifference_DifferByTheOffset()
    {
        Assert.True(UnitTable.TryFind("°C", out var unit));

        Assert.Equal(273.15, unit.Offset, 1e-12);
        Assert.Equal(298.15, unit.ToSi(25), 1e-9);
        Assert.Equal(25, unit.DifferenceToSi(25), 1e-9);
    }

    [Theory]
    [InlineData("MM", "mm")]
    [InlineData("C", "°C")]
    [InlineData("kA/n", "kA/m")]
    public void Nearest_Slip_IsFound(string written, string meant) => Assert.Equal(meant, UnitTable.Nearest(written)?.Spelling);

    [Theory]
    [InlineData("furlong")]
    [InlineData("")]
    [InlineData("mmm·····························································································")]
    public void Unit_Unknown_IsNotFound(string written) => Assert.False(UnitTable.TryFind(written, out _));

    [Fact]
    public void Kinds_Example_IsReadAsThatKind()
    {
        foreach (var kind in QuantityKind.All.Where(k => k.Name is not ("wire" or "cable" or "count" or "ratio")))
        {
            Assert.True(QuantityReader.TryRead(kind.Example, kind, out var quantity, out string problem), problem);
            Assert.Equal(kind.Dimension, quantity.Dimension);
            Assert.True(UnitTable.TryFind(kind.DisplayUnit, out var unit), kind.Name);
            Assert.True(kind.Takes(unit), kind.Name);
            foreach (string accepted in kind.AcceptedUnits.Split(", "))
            {
                Assert.True(UnitTable.TryFind(accepted, out var other) && kind.Takes(other), $"{kind.Name} {accepted}");
            }
        }
    }
}
