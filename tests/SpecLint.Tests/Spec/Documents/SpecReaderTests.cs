using System.Diagnostics;
using System.Globalization;
using System.Text;
using CsCheck;
using SpecLint.Spec.Documents;
using SpecLint.Spec.Units;
using SpecLint.Spec.Yaml;

namespace SpecLint.Tests.Spec.Documents;

public sealed class SpecReaderTests
{
    [Fact]
    public void Sound_Spec_HasNoFaultsAndAllLeaves()
    {
        var spec = Specs.Read(Specs.Sound);

        Assert.Empty(spec.Faults);
        Assert.Equal("spec.yaml", spec.Path);
        Assert.Equal(Specs.Sound, spec.Text);
        var clearance = spec.Find("gap.clearance")!;
        Assert.Equal(SpecValueKind.Number, clearance.Kind);
        Assert.Equal(1.5e-3, clearance.Number, 1e-15);
        Assert.Equal(0.2e-3, clearance.ToleranceBelow, 1e-15);
        Assert.Equal("mm", clearance.UnitText);
        Assert.Equal("1.5 mm ± 0.2 mm", clearance.Text);
        Assert.Equal(new Region(13, 3, 13, 12), clearance.KeyRegion);
        Assert.Equal(new Region(13, 14, 13, 29), clearance.ValueRegion);
        Assert.True(spec.States("rotor.back-iron"));
        Assert.False(spec.States("ratings"));
        Assert.Equal(new Region(12, 1, 12, 4), spec.KeyRegion("gap"));
        Assert.Equal("gap", spec.NearestParent("gap.far-clearance").Key);
    }

    [Fact]
    public void Wire_Gauge_IsDiameterAndKeepsItsText()
    {
        var wire = Specs.Read(Specs.Sound).Find("winding.wire.size")!;

        Assert.Equal(1.4495e-3, wire.Number, 1e-7);
        Assert.Equal("AWG 15", wire.Text);
        Assert.Equal(Dimensions.Length, wire.Dimension);
    }

    [Fact]
    public void Wire_ShortForm_IsItsSize()
    {
        var spec = Specs.With("{size: AWG 15, enamel: grade-2, thermal-class: 180, material: copper}", "1.25 mm");

        Assert.Empty(spec.Faults);
        Assert.Equal(1.25e-3, spec.Find("winding.wire.size")!.Number, 1e-12);
        Assert.True(spec.States("winding.wire"));
    }

    [Theory]
    [InlineData("back-iron: {material: mild-steel, thickness: 10 mm, inner-radius: 50 mm, outer-radius: 145 mm}", "back-iron: none", "rotor.back-iron", "none")]
    [InlineData("material: mild-steel", "material: ideal", "rotor.back-iron.material", "ideal")]
    [InlineData("material: mild-steel", "material: {relative-permeability: 1000}", "rotor.back-iron.material.relative-permeability", "1000")]
    [InlineData("grade: N42SH", "material: {remanence: 1.30 T, recoil-permeability: 1.05}", "magnets.material.remanence", "1.30 T")]
    [InlineData("title: bench machine", "revision: 2", "revision", "2")]
    [InlineData("title: bench machine", "title: 2027-01-31", "title", "2027-01-31")]
    [InlineData("title: bench machine", "environment: {ambient: 40 °C}", "environment.ambient", "40 °C")]
    [InlineData("title: bench machine", "environment: {ambient: {min: -20 °C, max: 40 °C}}", "environment.ambient.max", "40 °C")]
    [InlineData("title: bench machine", "load: {voltage: {min: 44 V, max: 58 V}}", "load.voltage.min", "44 V")]
    [InlineData("title: bench machine", "waivers: [{rule: FIT-04, reason: made, approved-by: chief, until: 2027-06-30}]", "waivers[0].until", "2027-06-30")]
    [InlineData("title: bench machine", "mechanics: {bearings: [{type: ball, load-rating: 25.5 kN, position: -60 mm}]}", "mechanics.bearings[0].position", "-60 mm")]
    [InlineData("title: bench machine", "declared: {emf.phase.rms: 28 V ± 5 %}", "declared.emf.phase.rms", "28 V ± 5 %")]
    [InlineData("title: bench machine", "measured: {emf.phase.rms: 27 V}", "measured.emf.phase.rms", "27 V")]
    [InlineData("title: bench machine", "measured: {emf.phase.rms: {value: 27 V, speed: 250 rpm}}", "measured.emf.phase.rms", "27 V")]
    [InlineData("title: bench machine", "measured: {emf.phase.rms: {value: 27 V, speed: 250 rpm}}", "measured.emf.phase.rms.speed", "250 rpm")]
    [InlineData("title: bench machine", "protection: {overspeed: [furling tail, brake]}", "protection.overspeed[1]", "brake")]
    [InlineData("title: bench machine", "load: {cable: {size: AWG 6}}", "load.cable.size", "AWG 6")]
    public void Form_Allowed_IsALeafOfItsKey(string old, string replacement, string key, string text)
    {
        var spec = Specs.With(old, replacement);

        Assert.Empty(spec.Faults);
        Assert.Equal(text, spec.Find(key)?.Text);
    }

    [Fact]
    public void Paths_ListOfLists_AreNumbersWithCounts()
    {
        var spec = Specs.With("connection: star", "paths: [[1, 4, 7], [2, -5, 8]]");

        Assert.Empty(spec.Faults);
        Assert.Equal(2, spec.Find("winding.paths")!.Count);
        Assert.Equal(3, spec.Find("winding.paths[1]")!.Count);
        Assert.Equal(-5, spec.Find("winding.paths[1][1]")!.Number);
    }

    [Fact]
    public void Flag_TrueAndFalse_AreRead()
    {
        var spec = Specs.With("connection: star", "transposed: true");

        Assert.Equal(SpecValueKind.Flag, spec.Find("winding.transposed")!.Kind);
        Assert.True(spec.Find("winding.transposed")!.Flag);
    }

    [Fact]
    public void Speed_OfLinearMachine_IsAVelocity()
    {
        const string Linear = """
            spec: 1
            machine: {role: motor, topology: linear, arrangement: single-sided, stator: coreless, poles: 12, phases: 3}
            magnets: {shape: block, length: 46 mm, width: 30 mm, thickness: 10 mm, pole-pitch: 40 mm}
            rotor: {back-iron: {material: ideal}}
            winding: {coils: 9, coil: {shape: rectangle}}
            gap: {clearance: 1 mm}
            ratings: {speed: 2 m/s}
            """;
        var spec = Specs.Read(Linear);

        Assert.Empty(spec.Faults);
        Assert.Equal(2, spec.Find("ratings.speed")!.Number);
        Assert.Equal("7:18 ratings.speed is 2 rpm, a rotational speed; a velocity such as 11 m/s is expected", Specs.OnlyFault(Specs.Read(Linear.Replace("2 m/s", "2 rpm", StringComparison.Ordinal))));
    }

    [Theory]
    [InlineData("clearance:", "clearence:", "13:3 clearence is not a key of gap; is gap.clearance meant?")]
    [InlineData("connection: star", "hole-width: 3 mm", "11:3 hole-width is not a key of winding; hole-width is a key as winding.coil.hole-width")]
    [InlineData("title: bench machine", "zzzqqq: 1", "2:1 zzzqqq is not a key of a spec; its keys are spec, title, revision, stage, machine, magnets, rotor, winding, …")]
    [InlineData("magnets:", "magnet:", "4:1 magnet is not a key of a spec; is magnets meant?")]
    [InlineData("back-iron:", "backiron:", "5:9 backiron is not a key of rotor; is rotor.back-iron meant?")]
    [InlineData("role: generator", "role: genrator", "3:17 machine.role is genrator; generator or motor is expected; is generator meant?")]
    [InlineData("role: generator, ", "", "3:1 machine.role is missing; generator or motor is expected")]
    [InlineData("arrangement: twin-rotor", "arrangement: inner-rotor", "3:63 machine.arrangement is inner-rotor; for axial-flux machines twin-rotor, rotor-and-return-plate or single-rotor is expected")]
    [InlineData("arrangement: twin-rotor", "arrangement: rotor-and-return-plate", "5:1 rotor.return-plate is missing; machine.arrangement rotor-and-return-plate has one")]
    [InlineData("shape: keystone, ", "", "10:3 winding.coil.shape is missing; keystone, rectangle or round is expected")]
    [InlineData("length: 46 mm, width", "length: 46, width", "4:33 magnets.length is 46 without a unit; a length such as 1.5 mm is expected (units: mm, cm, m, µm, in)")]
    [InlineData("cover: 0.5 mm", "cover: 0.5 V", "14:10 gap.cover is 0.5 V, a voltage; a length such as 1.5 mm is expected")]
    [InlineData("cover: 0.5 mm", "cover: 0,5 mm", "14:10 gap.cover is 0,5 mm; decimals are written with a point and thousands without a mark, as in 1.5 or 1500")]
    [InlineData("cover: 0.5 mm", "cover: .nan", "14:10 gap.cover is .nan; a finite number is expected")]
    [InlineData("cover: 0.5 mm", "cover:", "14:3 gap.cover has no value; a length such as 0.5 mm is expected")]
    [InlineData("cover: 0.5 mm", "cover: -0.5 mm", "14:10 gap.cover is -0.5 mm; at least 0 mm is expected")]
    [InlineData("cover: 0.5 mm", "cover: 0.5 mm ± 0.7 mm", "14:10 gap.cover is 0.5 mm ± 0.7 mm, which reaches below 0 mm")]
    [InlineData("1.5 mm ± 0.2 mm", "3 km", "13:14 gap.clearance is 3 km; at most 500 mm is plausible")]
    [InlineData("1.5 mm ± 0.2 mm", "[1 mm]", "13:3 gap.clearance is a list; a length such as 1.5 mm ± 0.2 mm is expected")]
    [InlineData("1.5 mm ± 0.2 mm", "{a: 1}", "13:3 gap.clearance is a mapping; a length such as 1.5 mm ± 0.2 mm is expected")]
    [InlineData("turns: 60", "turns: 60.5", "8:10 winding.turns is 60.5; a whole number such as 55 is expected")]
    [InlineData("turns: 60", "turns: '60'", "8:10 winding.turns is 60 in quotes; a whole number such as 55 is expected")]
    [InlineData("turns: 60", "turns: 0", "8:10 winding.turns is 0; at least 1 is expected")]
    [InlineData("turns: 60", "turns: yes", "8:10 winding.turns is yes; a whole number such as 55 is expected")]
    [InlineData("connection: star", "transposed: yes", "11:15 winding.transposed is yes; true or false is expected")]
    [InlineData("AWG 15", "SWG 15", "9:16 winding.wire.size is SWG 15, a size of the British gauge; a wire size such as AWG 16 or 1.25 mm is expected")]
    [InlineData("AWG 15", "40 mm", "9:16 winding.wire.size is 40 mm; at most 12 mm is plausible")]
    [InlineData("thermal-class: 180", "thermal-class: 181", "9:56 winding.wire.thermal-class is 181; 105, 120, 130, 155, 180, 200, 220 or 240 is expected; is 180 meant?")]
    [InlineData("pitch-radius: 115 mm", "pole-pitch: 40 mm", "4:81 magnets.pole-pitch belongs to linear machines; machine.topology is axial-flux")]
    [InlineData("width: 30 mm", "diameter: 30 mm", "4:40 magnets.diameter belongs to a machine with magnets.shape: disc; magnets.shape is block")]
    [InlineData("connection: star", "span: 1", "11:3 winding.span belongs to a machine with machine.stator: slotted; machine.stator is coreless")]
    [InlineData("title: bench machine", "slots: {count: 36, depth: 20 mm}", "2:1 slots belongs to a machine with machine.stator: slotted; machine.stator is coreless")]
    [InlineData("leg-width: 14 mm", "leg-width: 95 mm", "10:40 winding.coil.hole-length is 46 mm: at a pitch radius of 115 mm the coil's inner edge lies -3.0 mm from the shaft's axis; more than 0 mm is expected")]
    [InlineData("inner-radius: 50 mm", "inner-radius: 150 mm", "5:97 rotor.back-iron.outer-radius is 145 mm; more than rotor.back-iron.inner-radius, 150 mm, is expected")]
    [InlineData("title: bench machine", "environment: {ambient: {min: 40 °C, max: 20 °C}}", "2:42 environment.ambient.max is 20 °C; at least environment.ambient.min, 40 °C, is expected")]
    [InlineData("title: bench machine", "waivers: [{rule: FIT-04, reason: made}]", "2:11 waivers[0].approved-by is missing; a text such as chief engineer is expected")]
    [InlineData("title: bench machine", "declared: {emf.phase.rms: high}", "2:27 declared.emf.phase.rms is high; a number with a unit is expected")]
    [InlineData("title: bench machine", "rotor: {}", "5:1 the key 'rotor' stands twice in one mapping", 2)]
    [InlineData("spec: 1", "spec: 2", "1:7 spec is 2; 1 is expected")]
    [InlineData("{material: mild-steel, thickness: 10 mm, inner-radius: 50 mm, outer-radius: 145 mm}", "mild-steel", "5:20 rotor.back-iron is mild-steel; none, or a mapping with keys such as material, thickness, inner-radius, is expected")]
    [InlineData("cover: 0.5 mm", "cover: *thin", "14:10 the alias '*thin' names no anchor above it")]
    public void Fault_OfOneCause_IsToldOnceAtItsPlace(string old, string replacement, string told, int count = 1)
    {
        var spec = Specs.With(old, replacement);

        Assert.Equal(count, spec.Faults.Length);
        Assert.Contains(told, spec.Faults.Select(Specs.Told));
    }

    [Theory]
    [InlineData("stator: coreless", "stator: slotted", "3:83 machine.stator is slotted, which is not covered yet; coreless is expected")]
    [InlineData("stator: coreless", "stator: slotless", "3:83 machine.stator is slotless, which is not covered yet; coreless is expected")]
    [InlineData("topology: axial-flux, arrangement: twin-rotor, stator: coreless", "topology: radial-flux, arrangement: inner-rotor, stator: slotted", "3:38 machine.topology is radial-flux, which is not covered yet; axial-flux or linear is expected")]
    public void Construction_NotCovered_IsOneFault(string old, string replacement, string told) => Assert.Equal(told, Specs.OnlyFault(Specs.With(old, replacement)));

    [Fact]
    public void RadialSlotted_FullSpec_IsOneFault()
    {
        var spec = Specs.Read("""
            spec: 1
            machine: {role: motor, topology: radial-flux, arrangement: inner-rotor, stator: slotted, poles: 8, phases: 3}
            magnets: {shape: arc, length: 50 mm, arc: 0.8, thickness: 4 mm, magnetisation: radial}
            rotor: {magnet-surface-radius: 30 mm}
            winding: {coils: 9, turns: 20, span: 1, layers: 2}
            slots: {count: 9, depth: 20 mm, tooth-width: 6 mm}
            gap: {clearance: 0.8 mm}
            """);

        Assert.Equal("2:34 machine.topology is radial-flux, which is not covered yet; axial-flux or linear is expected", Specs.OnlyFault(spec));
        Assert.Equal(9, spec.Find("slots.count")!.Number);
    }

    [Fact]
    public void Faults_OfManyKinds_AreAllToldInOrderAndTheRestIsRead()
    {
        var spec = Specs.Read(Specs.Sound
            .Replace("role: generator", "role: 7", StringComparison.Ordinal)
            .Replace("turns: 60", "turns: many", StringComparison.Ordinal)
            .Replace("thickness: 13 mm", "thickness: 13 T", StringComparison.Ordinal)
            .Replace("clearance:", "clearanse:", StringComparison.Ordinal)
            .Replace("cover: 0.5 mm", "cover: 0.5", StringComparison.Ordinal));

        Assert.Equal(["3:17", "8:10", "10:95", "13:3", "14:10"], spec.Faults.Select(f => string.Create(CultureInfo.InvariantCulture, $"{f.Region.StartLine}:{f.Region.StartColumn}")));
        Assert.Null(spec.Find("winding.turns"));
        Assert.Equal(12, spec.Find("machine.poles")!.Number);
        Assert.Equal("winding.coil.thickness", spec.Faults[2].Key);
    }

    [Fact]
    public void Related_Place_IsTheOtherValue()
    {
        var fault = Assert.Single(Specs.With("inner-radius: 50 mm", "inner-radius: 150 mm").Faults);

        Assert.Equal(new Region(5, 75, 5, 81), fault.Related);
        Assert.Equal("rotor.back-iron.inner-radius is 150 mm", fault.RelatedMessage);
    }

    [Fact]
    public void Alias_Leaf_CarriesTheAliasSite()
    {
        var spec = Specs.Read(Specs.Sound.Replace("hole-length: 46 mm", "hole-length: *long", StringComparison.Ordinal).Replace("title: bench machine", "title: &long 46 mm", StringComparison.Ordinal));

        Assert.Empty(spec.Faults);
        var hole = spec.Find("winding.coil.hole-length")!;
        Assert.Equal(0.046, hole.Number, 1e-15);
        Assert.Equal(10, hole.AliasSite!.Value.StartLine);
        Assert.Equal(2, hole.ValueRegion.StartLine);
        Assert.Null(spec.Find("title")!.AliasSite);
    }

    [Fact]
    public void Lines_Crlf_GiveTheSamePlacesAndValues()
    {
        var unix = Specs.Read(Specs.Sound);
        var dos = Specs.Read(Specs.Sound.ReplaceLineEndings("\r\n"));

        Assert.Empty(dos.Faults);
        Assert.Equal(unix.Values, dos.Values);
    }

    [Theory]
    [InlineData("de-DE")]
    [InlineData("tr-TR")]
    public void Culture_OfTheMachine_ChangesNothing(string culture)
    {
        string text = Specs.Sound.Replace("turns: 60", "turns: 6.5", StringComparison.Ordinal).Replace("title:", "TITLE:", StringComparison.Ordinal);
        var here = Specs.Read(text);
        Specs.UnderCulture(culture, () =>
        {
            var there = Specs.Read(text);
            Assert.Equal(here.Values, there.Values);
            Assert.Equal(here.Faults, there.Faults);
        });
    }

    [Theory]
    [InlineData("", "1:1 the text holds no document; the keys of a spec or rulebook are expected")]
    [InlineData("hello", "1:1 the text is a single value; a mapping with keys such as machine and magnets is expected")]
    [InlineData("- a\n", "1:1 the text is a list; a mapping with keys such as machine and magnets is expected")]
    [InlineData("---\n", "1:1 the text holds no keys; a mapping with keys such as machine and magnets is expected")]
    [InlineData("spec: 1\nmachine:\n\trole: motor\n", "3:1 a tab stands in the indentation; YAML allows only spaces there")]
    public void Text_NoSpec_IsOneFault(string text, string told) => Assert.Equal(told, Specs.OnlyFault(Specs.Read(text)));

    [Fact]
    public void Faults_Thousandfold_AreCutWithANote()
    {
        var spec = Specs.Read(string.Concat(Enumerable.Range(0, 4000).Select(i => string.Create(CultureInfo.InvariantCulture, $"strange{i}: 1\n"))));

        Assert.Equal(201, spec.Faults.Length);
        Assert.Equal("more than 200 faults; those after this place are not listed", spec.Faults[^1].Message);
    }

    [Theory]
    [InlineData("waivers:\n", "  - 3\n", 400_000)]
    [InlineData("", "a: b\n", 300_000)]
    [InlineData("a: ", "[", 1_000_000)]
    [InlineData("", "&a ", 300_000)]
    [InlineData("a: [", "?,", 300_000)]
    [InlineData("a: |\n", "  x\n", 300_000)]
    [InlineData("a: ", "x", 1_900_000)]
    [InlineData("a: \"", "\\x41", 300_000)]
    [InlineData("", "\"", 500_001)]
    [InlineData("", "\n", 1_900_000)]
    [InlineData("gap: {clearance: ", "1", 1_000_000)]
    public void Text_Hostile_EndsSoonWithFaults(string start, string piece, int times)
    {
        byte[] bytes = Encoding.UTF8.GetBytes(start + new StringBuilder(piece.Length * times).Insert(0, piece, times));
        SpecReader.Read("warm.yaml", "spec: 1"u8);
        var clock = Stopwatch.StartNew();

        var spec = SpecReader.Read("hostile.yaml", bytes);

        Assert.NotEmpty(spec.Faults);
        Assert.All(spec.Faults, f => Assert.InRange(f.Message.Length, 5, 400));

        // A guard against hanging, wide enough for any machine; it says nothing about speed.
        Assert.InRange(clock.Elapsed, TimeSpan.Zero, TimeSpan.FromSeconds(30));
    }

    [Fact]
    public void Bytes_Random_NeverThrow() => Gen.Byte.Array[0, 300].Sample(bytes => SpecReader.Read("x", bytes).Faults.Length > 0, iter: 2000);

    [Fact]
    public void Spec_WithRandomDamage_NeverThrowsAndFaultsLieInside() => Gen.Select(Gen.Int[0, Specs.Sound.Length - 1], Gen.Int[0, 12], Gen.String[Gen.Char["{}[]:,-&*!|>'\"%@`#? \n\tabc019.±"], 0, 4])
        .Sample(
            (at, cut, inserted) =>
            {
                string text = Specs.Sound[..at] + inserted + Specs.Sound[Math.Min(Specs.Sound.Length, at + cut)..];
                int lines = text.Split('\n').Length;
                return Specs.Read(text).Faults.All(f => f.Region.StartLine >= 1 && f.Region.StartLine <= lines + 1 && f.Message.Length > 4);
            },
            iter: 4000);
}
