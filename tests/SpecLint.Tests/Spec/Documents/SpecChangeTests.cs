using SpecLint.Spec.Documents;
using SpecLint.Spec.Yaml;

namespace SpecLint.Tests.Spec.Documents;

public sealed class SpecChangeTests
{
    private static readonly SpecDocument Sound = Specs.Read(Specs.Sound);

    private static SpecDocument Change(string key, string text)
    {
        var changed = Sound.WithText(key, text, out var fault);
        Assert.Null(fault);
        return changed;
    }

    private static string Fault(string key, string text)
    {
        var changed = Sound.WithText(key, text, out var fault);
        Assert.Same(Sound, changed);
        return fault!.Message;
    }

    [Fact]
    public void Value_Stated_IsReplacedInItsPlace()
    {
        var turns = Change("winding.turns", "30").Find("winding.turns")!;

        Assert.Equal(30, turns.Number);
        Assert.Equal(Sound.Find("winding.turns")!.ValueRegion, turns.ValueRegion);
        Assert.Equal(60, Sound.Find("winding.turns")!.Number);
    }

    [Fact]
    public void Value_WithTolerance_IsReadLikeTheFile()
    {
        var clearance = Change("gap.clearance", "2 mm +0.3/-0.1 mm").Find("gap.clearance")!;

        Assert.Equal(2e-3, clearance.Number, 1e-15);
        Assert.Equal(0.1e-3, clearance.ToleranceBelow, 1e-15);
        Assert.Equal(0.3e-3, clearance.ToleranceAbove, 1e-15);
    }

    [Fact]
    public void Value_Absent_TakesThePlaceOfItsParent()
    {
        var changed = Change("gap.far-clearance", "2 mm");

        Assert.Equal(Sound.KeyRegion("gap"), changed.Find("gap.far-clearance")!.ValueRegion);
        Assert.Equal(Region.Beginning, Change("ratings.speed", "250 rpm").Find("ratings.speed")!.ValueRegion);
    }

    [Fact]
    public void Wire_ShortForm_SetsTheSize() => Assert.Equal("AWG 12", Change("winding.wire", "AWG 12").Find("winding.wire.size")!.Text);

    [Fact]
    public void BackIron_None_RemovesWhatItHad()
    {
        var changed = Change("rotor.back-iron", "none");

        Assert.Equal("none", changed.Find("rotor.back-iron")!.Text);
        Assert.Null(changed.Find("rotor.back-iron.thickness"));
    }

    [Fact]
    public void Ambient_RangeAfterValue_ReplacesIt()
    {
        var changed = Change("environment.ambient", "40 °C").WithText("environment.ambient.max", "50 °C", out var fault);

        Assert.Null(fault);
        Assert.Null(changed.Find("environment.ambient"));
        Assert.Equal(323.15, changed.Find("environment.ambient.max")!.Number, 1e-9);
    }

    [Fact]
    public void Fault_OfTheFile_IsClearedByASoundValue()
    {
        var broken = Specs.With("turns: 60", "turns: many");

        var changed = broken.WithText("winding.turns", "60", out var fault);

        Assert.Null(fault);
        Assert.Empty(changed.Faults);
    }

    [Theory]
    [InlineData("winding.turn", "30", "winding.turn is not a key of a spec; is winding.turns meant?")]
    [InlineData("gap.clearance", "2", "gap.clearance is 2 without a unit; a length such as 1.5 mm is expected (units: mm, cm, m, µm, in)")]
    [InlineData("gap.clearance", "", "gap.clearance has no value; a length such as 1.5 mm ± 0.2 mm is expected")]
    [InlineData("gap", "2 mm", "gap takes no single value; one of its keys, such as gap.clearance, is expected")]
    [InlineData("winding.paths", "1", "winding.paths takes no single value; it is a list")]
    [InlineData("machine.stator", "slotted", "machine.stator is slotted, which is not covered yet; coreless is expected")]
    [InlineData("magnets.pole-pitch", "40 mm", "magnets.pole-pitch belongs to linear machines; machine.topology is axial-flux")]
    [InlineData("winding.coil.leg-width", "95 mm", "winding.coil.hole-length is 46 mm: at a pitch radius of 115 mm the coil's inner edge lies -3.0 mm from the shaft's axis; more than 0 mm is expected")]
    public void Change_Wrong_IsAFaultAndChangesNothing(string key, string text, string message) => Assert.Equal(message, Fault(key, text));

    [Fact]
    public void With_SeveralValues_ReplacesEach()
    {
        var turns = Sound.Find("winding.turns")! with { Number = 10 };
        var coils = Sound.Find("winding.coils")! with { Number = 18 };

        var changed = Sound.With([turns, coils]);

        Assert.Equal(10, changed.Find("winding.turns")!.Number);
        Assert.Equal(18, changed.Find("winding.coils")!.Number);
        Assert.Equal(Sound.Values.Length, changed.Values.Length);
    }
}
