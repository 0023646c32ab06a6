using System.Text;
using SpecLint.Review.Figures;

namespace SpecLint.Reporting.Derivations;

/// <summary>The formula of a figure, with names or with values in the place of its braces.</summary>
internal static class FormulaText
{
    /// <summary>The formula with the names that stand in braces.</summary>
    /// <param name="formula">As declared.</param>
    public static string WithNames(string formula) => Fill(formula, name => name);

    /// <summary>The formula with values; a name that the machine does not have stays as it is.</summary>
    /// <param name="figure">The figure.</param>
    /// <param name="graph">The machine.</param>
    public static string WithValues(Figure figure, FigureGraph graph) => Fill(figure.Definition.Formula, name =>
        graph.Catalogue.Find(name) is not null ? ValueText.Bare(graph[name])
        : graph.Spec.Find(name) is { } value ? ValueText.Bare(value)
        : figure.Inputs.Contains(new FigureInput(FigureInputKind.Key, name)) ? ValueText.Bare(value: null)
        : name);

    private static string Fill(string formula, Func<string, string> replace)
    {
        var text = new StringBuilder(formula.Length * 2);
        int at = 0;
        while (at < formula.Length)
        {
            int open = formula.IndexOf('{', at);
            int close = open < 0 ? -1 : formula.IndexOf('}', open);
            if (close < 0)
            {
                break;
            }

            text.Append(formula, at, open - at);
            string name = formula[(open + 1)..close];
            string value = replace(name);
            bool isRaised = close + 1 < formula.Length && "²³⁴⁵⁻^".Contains(formula[close + 1], StringComparison.Ordinal);
            bool needsBrackets = isRaised && value.AsSpan().ContainsAny(" /·");
            text.Append(needsBrackets ? $"({value})" : value);
            at = close + 1;
        }

        return text.Append(formula, at, formula.Length - at).ToString();
    }
}
