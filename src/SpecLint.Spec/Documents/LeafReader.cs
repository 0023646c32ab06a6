using System.Globalization;
using SpecLint.Spec.Schema;
using SpecLint.Spec.Units;
using SpecLint.Spec.Yaml;

namespace SpecLint.Spec.Documents;

/// <summary>Reads one scalar as what the schema says its key takes.</summary>
internal static class LeafReader
{
    /// <summary>Reads a scalar.</summary>
    /// <param name="node">The key's place in the schema.</param>
    /// <param name="key">The dotted key, with indices and figure names.</param>
    /// <param name="scalar">The scalar.</param>
    /// <param name="keyRegion">Where the key stands.</param>
    /// <param name="topology">Word of <c>machine.topology</c>, empty when unknown.</param>
    /// <param name="fault">What is wrong; null when nothing is.</param>
    /// <returns>The leaf, or null when it cannot be used.</returns>
    internal static SpecValue? Read(SchemaNode node, string key, YamlScalar scalar, Region keyRegion, string topology, out SpecFault? fault)
    {
        var value = new SpecValue { Key = key, Kind = SpecValueKind.Text, Text = scalar.Text, KeyRegion = keyRegion, ValueRegion = scalar.Region, AliasSite = scalar.AliasSite };
        string problem;
        if (CoreSchema.IsNull(scalar) || string.IsNullOrWhiteSpace(scalar.Text))
        {
            fault = new SpecFault(key, $"{key} has no value; {FaultText.Wanted(node, topology)} is expected", scalar.Text.Length == 0 && scalar.IsPlain ? keyRegion : scalar.Region);
            return null;
        }

        SpecValue? read = node.Quantity switch
        {
            "flag" => Flag(scalar, value, out problem),
            "text" => Word(node, topology, value, out problem),
            "count" => Count(node, scalar, value, out problem),
            _ => Number(node, topology, value, out problem),
        };
        fault = problem.Length == 0 ? null : new SpecFault(key, $"{key} {problem}", scalar.Region);
        return problem.Length == 0 ? read : null;
    }

    private static SpecValue Flag(YamlScalar scalar, SpecValue value, out string problem)
    {
        problem = CoreSchema.TryReadFlag(scalar, out bool flag) ? "" : $"is {FaultText.Shown(scalar.Text)}; true or false is expected";
        return value with { Kind = SpecValueKind.Flag, Flag = flag };
    }

    private static SpecValue Word(SchemaNode node, string topology, SpecValue value, out string problem)
    {
        problem = "";
        if (node.Words.Length > 0 && !node.Words.Contains(value.Text, StringComparer.Ordinal))
        {
            problem = FaultText.NotAmong(node, value.Text);
        }
        else if (node.WordsByTopology.FirstOrDefault(w => w.Name == topology).Words is { IsDefault: false } words && !words.Contains(value.Text, StringComparer.Ordinal))
        {
            problem = $"is {FaultText.Shown(value.Text)}; for {topology} machines {FaultText.Either(words)} is expected";
        }

        return value;
    }

    private static SpecValue Count(SchemaNode node, YamlScalar scalar, SpecValue value, out string problem)
    {
        bool isWhole = int.TryParse(scalar.Text, NumberStyles.AllowLeadingSign, CultureInfo.InvariantCulture, out int number);
        if (!isWhole || !scalar.IsPlain)
        {
            string quotes = isWhole ? " in quotes" : "";
            problem = $"is {FaultText.Shown(scalar.Text)}{quotes}; {FaultText.Wanted(node, "")} is expected";
        }
        else if (node.Words.Length > 0 && !node.Words.Contains(number.ToString(CultureInfo.InvariantCulture), StringComparer.Ordinal))
        {
            problem = FaultText.NotAmong(node, scalar.Text);
        }
        else
        {
            problem = OutOfBounds(node, new Quantity(number, Dimension.None, 0, 0, "", false), scalar.Text);
        }

        return value with { Kind = SpecValueKind.Number, Number = number };
    }

    private static SpecValue Number(SchemaNode node, string topology, SpecValue value, out string problem)
    {
        var kind = node.KindFor(topology);
        bool isRead = QuantityReader.TryRead(value.Text, kind, out var quantity, out problem);
        if (!isRead && node.Quantity is "speed" && topology.Length == 0)
        {
            isRead = QuantityReader.TryRead(value.Text, node.KindFor("linear"), out quantity, out _);
            problem = isRead ? "" : problem;
        }

        if (isRead)
        {
            problem = OutOfBounds(node, quantity, value.Text);
        }

        return value with
        {
            Kind = SpecValueKind.Number,
            Number = quantity.Value,
            Dimension = quantity.Dimension,
            UnitText = quantity.UnitText,
            ToleranceBelow = quantity.Below,
            ToleranceAbove = quantity.Above,
            HasTolerance = quantity.HasTolerance,
        };
    }

    private static string OutOfBounds(SchemaNode node, Quantity quantity, string text)
    {
        double slack = 1e-9 * Math.Abs(quantity.Value);
        if (node.Minimum.Length > 0 && Bound(node, node.Minimum) is var least && quantity.Value - quantity.Below < least - slack)
        {
            return quantity.Value < least - slack
                ? $"is {FaultText.Shown(text)}; at least {node.Minimum} is expected"
                : $"is {FaultText.Shown(text)}, which reaches below {node.Minimum}";
        }

        if (node.Maximum.Length > 0 && Bound(node, node.Maximum) is var most && quantity.Value + quantity.Above > most + slack)
        {
            return quantity.Value > most + slack
                ? $"is {FaultText.Shown(text)}; at most {node.Maximum} is plausible"
                : $"is {FaultText.Shown(text)}, which reaches above {node.Maximum}";
        }

        return "";
    }

    private static double Bound(SchemaNode node, string text)
    {
        if (node.Quantity is "count" or "ratio")
        {
            return double.Parse(text, NumberStyles.Float, CultureInfo.InvariantCulture);
        }

        bool isRead = QuantityReader.TryRead(text, node.Kind, out var bound, out string problem);
        return isRead ? bound.Value : throw new InvalidOperationException($"schema bound of {node.Key} {problem}");
    }
}
