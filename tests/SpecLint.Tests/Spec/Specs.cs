using System.Globalization;
using System.Text;
using SpecLint.Spec.Documents;

namespace SpecLint.Tests.Spec;

/// <summary>A sound spec and the ways the tests bend it.</summary>
internal static class Specs
{
    internal const string Sound = """
        spec: 1
        title: bench machine
        machine: {role: generator, topology: axial-flux, arrangement: twin-rotor, stator: coreless, poles: 12, phases: 3}
        magnets: {shape: block, length: 46 mm, width: 30 mm, thickness: 10 mm ± 0.1 mm, pitch-radius: 115 mm, grade: N42SH}
        rotor: {back-iron: {material: mild-steel, thickness: 10 mm, inner-radius: 50 mm, outer-radius: 145 mm}}
        winding:
          coils: 9
          turns: 60
          wire: {size: AWG 15, enamel: grade-2, thermal-class: 180, material: copper}
          coil: {shape: keystone, hole-length: 46 mm, hole-width: 26 mm, leg-width: 14 mm, thickness: 13 mm}
          connection: star
        gap:
          clearance: 1.5 mm ± 0.2 mm
          cover: 0.5 mm

        """;

    internal static SpecDocument Read(string text) => SpecReader.Read("spec.yaml", Encoding.UTF8.GetBytes(text));

    /// <summary>The sound spec with one text exchanged for another.</summary>
    internal static SpecDocument With(string old, string replacement)
    {
        Assert.Contains(old, Sound, StringComparison.Ordinal);
        return Read(Sound.Replace(old, replacement, StringComparison.Ordinal));
    }

    /// <summary>The sound spec with lines added at its end.</summary>
    internal static SpecDocument And(string lines) => Read(Sound + lines + "\n");

    /// <summary>A fault as <c>line:column message</c>.</summary>
    internal static string Told(SpecFault fault) =>
        string.Create(CultureInfo.InvariantCulture, $"{fault.Region.StartLine}:{fault.Region.StartColumn} {fault.Message}");

    /// <summary>The only fault of a spec, as <c>line:column message</c>.</summary>
    internal static string OnlyFault(SpecDocument document) => Told(Assert.Single(document.Faults));

    /// <summary>Runs something as on a machine of another country.</summary>
    internal static void UnderCulture(string name, Action action)
    {
        var before = CultureInfo.CurrentCulture;
        try
        {
            CultureInfo.CurrentCulture = CultureInfo.GetCultureInfo(name);
            action();
        }
        finally
        {
            CultureInfo.CurrentCulture = before;
        }
    }
}
