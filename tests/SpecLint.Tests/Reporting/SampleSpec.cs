using System.Collections.Immutable;
using System.Globalization;
using SpecLint.Spec.Documents;
using SpecLint.Spec.Units;
using SpecLint.Spec.Yaml;

namespace SpecLint.Tests.Reporting;

/// <summary>A small spec with places, without the reader of specs: nested block mappings of scalars with a few units.</summary>
internal static class SampleSpec
{
    public const string Text = """
        spec: 1
        title: Small wind generator
        revision: B
        stage: order
        machine:
          topology: axial-flux
          poles: 12
        magnets:
          width: 30 mm
          remanence: 1.30 T
        winding:
          coils: 9
          turns: 60
          coil:
            hole-width: 52 mm
            thickness: 13 mm ± 0.2 mm
          resistance: 0.42 Ω
        gap:
          clearance: 1.5 mm
        ratings:
          speed: 300 rpm
        waivers:
          - rule: MEC-02

        """;

    public static SpecDocument Read(string path = "specs/wind.yaml", string text = Text)
    {
        var values = new List<SpecValue>();
        var sections = new List<KeyValuePair<string, Region>>();
        var parents = new List<string>();
        string[] lines = text.Split('\n');
        for (int i = 0; i < lines.Length; i++)
        {
            string line = lines[i];
            int colon = line.IndexOf(':', StringComparison.Ordinal);
            if (colon < 0 || line.TrimStart().StartsWith('-'))
            {
                continue;
            }

            int indent = line.Length - line.TrimStart().Length;
            parents.RemoveRange(Math.Min(indent / 2, parents.Count), parents.Count - Math.Min(indent / 2, parents.Count));
            string key = string.Join('.', parents.Append(line[indent..colon]));
            var keyRegion = new Region(i + 1, indent + 1, i + 1, colon + 1);
            if (line.TrimEnd().Length == colon + 1)
            {
                parents.Add(line[indent..colon]);
                sections.Add(new(key, keyRegion));
            }
            else
            {
                values.Add(Value(key, line[(colon + 2)..], keyRegion, new Region(i + 1, colon + 3, i + 1, line.Length + 1)));
            }
        }

        return new SpecDocument(path, text, values, sections, []);
    }

    private static SpecValue Value(string key, string text, Region keyRegion, Region valueRegion)
    {
        string[] words = text.Split(' ');
        bool isNumber = double.TryParse(words[0], NumberStyles.Float, CultureInfo.InvariantCulture, out double number);
        string unit = isNumber && words.Length > 1 ? words[1] : "";
        var (scale, dimension) = unit switch
        {
            "mm" => (1e-3, new Dimension(1, 0, 0, 0, 0)),
            "rpm" => (Math.PI / 30, new Dimension(0, 0, -1, 0, 0)),
            "T" => (1, SampleFigures.Tesla),
            _ => (1.0, Dimension.None),
        };
        return new SpecValue
        {
            Key = key,
            Kind = isNumber ? SpecValueKind.Number : SpecValueKind.Text,
            Text = text,
            Number = isNumber ? number * scale : 0,
            UnitText = unit,
            HasTolerance = text.Contains('±', StringComparison.Ordinal),
            Dimension = dimension,
            KeyRegion = keyRegion,
            ValueRegion = valueRegion,
        };
    }
}
