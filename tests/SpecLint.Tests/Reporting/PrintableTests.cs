using CsCheck;
using System.Text;
using SpecLint.Reporting.Output;

namespace SpecLint.Tests.Reporting;

public sealed class PrintableTests
{
    [Theory]
    [InlineData("plain", "plain")]
    [InlineData("  two  spaces ", "two spaces")]
    [InlineData("line\r\nbreak\tand\u2028more", "line break and more")]
    [InlineData("\u001b[31mred", "<U+001B>[31mred")]
    [InlineData("turn\u202eed", "turn<U+202E>ed")]
    [InlineData("2 mm ± 0.1 mm, 40 °C, 3 Ω·m, 電機", "2 mm ± 0.1 mm, 40 °C, 3 Ω·m, 電機")]
    [InlineData("\u009b2J", "<U+009B>2J")]
    public void Line_Text_IsHarmless(string text, string expected) => Assert.Equal(expected, Printable.Line(text));

    [Fact]
    public void Line_HalfOfAPair_IsNamed() => Assert.Equal("half <U+D800> pair", Printable.Line("half \ud800 pair"));

    [Fact]
    public void Line_AnyText_HasNoControlsAndIsStable() => Gen.String.Sample(text =>
    {
        string line = Printable.Line(text);
        return !line.Any(char.IsControl)
            && line.EnumerateRunes().All(r => r != Rune.ReplacementChar || text.Contains('\ufffd', StringComparison.Ordinal))
            && Printable.Line(line) == line;
    });
}
