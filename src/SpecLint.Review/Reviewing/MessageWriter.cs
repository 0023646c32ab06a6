using System.Collections.Immutable;
using System.Globalization;
using System.Text;
using SpecLint.Review.Expressions;
using SpecLint.Review.Figures;
using SpecLint.Review.Rules;
using SpecLint.Spec.Units;

namespace SpecLint.Review.Reviewing;

/// <summary>What a message says about a measure, beside the sentence of the rule.</summary>
internal sealed record MeasuredValue(double Value, double Uncertainty, string Unit, BoundVerdict Verdict);

/// <summary>Writes the sentences of findings, the same on every machine and in every locale.</summary>
internal static class MessageWriter
{
    /// <summary>Longest expression that stands in a message in place of a name.</summary>
    private const int LongestMeasureText = 60;

    /// <summary>Most significant digits that a value and its limit are shown with to tell them apart.</summary>
    private const int MostDigits = 9;

    /// <summary>Whole numbers below this are shown as counts.</summary>
    private const double LargestCount = 1e6;

    /// <summary>The rule's own sentence with its gaps filled.</summary>
    public static string Say(Rule rule, FigureGraph graph, MeasuredValue? measured)
    {
        if (rule.Template is not { } template)
        {
            return rule.Say;
        }

        var text = new StringBuilder();
        foreach (MessagePart part in template.Parts)
        {
            text.Append(part.Kind switch
            {
                MessagePartKind.Literal => part.Literal,
                MessagePartKind.Expression => Expression(part, graph),
                _ when measured is null => "unknown",
                MessagePartKind.Margin => Percent(measured.Verdict.Margin),
                MessagePartKind.Measure => Pair(measured, part.Unit).Value,
                _ => Pair(measured, part.Unit).Limit,
            });
        }

        return text.ToString();
    }

    /// <summary>The standing sentence of a measured rule: what it is, what was expected, and the margin.</summary>
    public static string Tail(Rule rule, MeasuredValue measured, double? otherLimit)
    {
        BoundVerdict verdict = measured.Verdict;
        var (value, limit) = Pair(measured, "");
        string name = rule.Measure!.Text.Length <= LongestMeasureText ? rule.Measure.Text : "The measured value";
        string expected = otherLimit is not { } other ? $"{(verdict.IsFloor ? "at least" : "at most")} {limit}"
            : verdict.IsFloor ? $"{limit} to {Show(other, measured.Unit)}" : $"{Show(other, measured.Unit)} to {limit}";
        string band = verdict.IsUncertain ? $", within its uncertainty of ± {Difference(measured.Uncertainty, measured.Unit)}" : "";
        return $"{name} is {value}; expected {expected} (margin {Percent(verdict.Margin)}{band}).";
    }

    /// <summary>A rule's sentence and the standing one, joined.</summary>
    public static string Join(string first, string second) =>
        first.Length == 0 ? second : second.Length == 0 ? first : $"{first}{(first[^1] is '.' or '!' or '?' ? "" : ".")} {second}";

    /// <summary>Why something is unknown.</summary>
    public static string Lack(Evaluated lack) => lack.Kind switch
    {
        EvaluatedKind.Missing => $"needs {List(lack.MissingKeys)}",
        _ when lack.Text.Length > 0 => lack.Text,
        EvaluatedKind.NotApplicable => "does not concern this machine",
        _ => "cannot be worked out",
    };

    /// <summary>Keys as a phrase.</summary>
    public static string List(ImmutableArray<string> names) => names.Length switch
    {
        0 => "",
        1 => names[0],
        _ => $"{string.Join(", ", names.Take(names.Length - 1))} and {names[^1]}",
    };

    /// <summary>A margin or a share in percent.</summary>
    public static string Percent(double share) => $"{UnitDisplay.Digits(share * 100)} %";

    /// <summary>A value in a unit; in base units where the unit is not in the table.</summary>
    /// <remarks>A whole number without a unit is a count and stands without decimals.</remarks>
    public static string Show(double si, string unit) => unit.Length == 0 && Math.Abs(si) < LargestCount && Nearness.AreNear(si, Math.Round(si))
        ? Math.Round(si).ToString(CultureInfo.InvariantCulture)
        : UnitDisplay.Format(si, unit);

    /// <summary>A difference of values in a unit.</summary>
    public static string Difference(double si, string unit) => UnitDisplay.FormatDifference(si, unit);

    /// <summary>The unit in which a rule's measure is shown.</summary>
    public static string UnitOf(Rule rule, Expression measure, Bound bound)
    {
        string stated = new[] { rule.DisplayUnit, measure.DisplayUnit, bound.Most?.DisplayUnit ?? "", bound.Least?.DisplayUnit ?? "" }
            .FirstOrDefault(u => u.Length > 0) ?? "";
        return stated.Length > 0 ? stated : UnitOf(measure.Dimension);
    }

    /// <summary>The unit of the workshop for a dimension; the base units where there is none.</summary>
    /// <remarks>Energy and torque share a dimension; rules speak of torque.</remarks>
    public static string UnitOf(Dimension dimension) => dimension == Dimension.None ? ""
        : dimension == Dimensions.Energy ? "N·m"
        : QuantityKind.All.FirstOrDefault(k => k.Dimension == dimension)?.DisplayUnit ?? dimension.ToString();

    /// <summary>A value and its limit, with as many digits as it takes to tell them apart when they differ.</summary>
    private static (string Value, string Limit) Pair(MeasuredValue measured, string unit)
    {
        unit = unit.Length > 0 ? unit : measured.Unit;
        return Apart(measured.Value, measured.Verdict.Limit, unit);
    }

    /// <summary>Two values in a unit, with as many digits as it takes to tell them apart when they differ.</summary>
    public static (string First, string Second) Apart(double first, double second, string unit)
    {
        var (a, b) = (Show(first, unit), Show(second, unit));
        if (Nearness.AreNear(first, second) || !string.Equals(a, b, StringComparison.Ordinal))
        {
            return (a, b);
        }

        UnitEntry? entry = UnitTable.TryFind(unit, out UnitEntry? found) ? found : null;
        for (int digits = 4; digits <= MostDigits && string.Equals(a, b, StringComparison.Ordinal); digits++)
        {
            (a, b) = (Precise(first, entry, unit, digits), Precise(second, entry, unit, digits));
        }

        return (a, b);
    }

    private static string Precise(double si, UnitEntry? entry, string unit, int digits)
    {
        double value = entry?.FromSi(si) ?? si;
        string text = value.ToString(string.Create(CultureInfo.InvariantCulture, $"G{digits}"), CultureInfo.InvariantCulture);
        return unit.Length == 0 ? text : $"{text} {entry?.Spelling ?? unit}";
    }

    private static string Expression(MessagePart part, FigureGraph graph)
    {
        Expression expression = part.Expression!;
        Evaluated value = expression.Evaluate(graph);
        return value.Kind switch
        {
            EvaluatedKind.Number => Show(value.Number, UnitOf(part, graph)),
            EvaluatedKind.Text => value.Text,
            EvaluatedKind.NotApplicable => "not applicable",
            _ => $"unknown ({Lack(value)})",
        };
    }

    private static string UnitOf(MessagePart part, FigureGraph graph)
    {
        Expression expression = part.Expression!;
        string written = expression.Root switch
        {
            KeyNumberNode key => graph.Spec.Find(key.Key)?.UnitText ?? "",

            // A speed is in rpm or in m/s, as the machine turns or travels.
            FigureNode figure => graph[figure.Name].Definition.DisplayUnit,
            _ => "",
        };
        return new[] { part.Unit, written, expression.DisplayUnit }.FirstOrDefault(u => u.Length > 0) ?? UnitOf(expression.Dimension);
    }
}
