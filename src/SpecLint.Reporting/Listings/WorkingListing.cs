using System.Globalization;
using SpecLint.Review.Figures;
using SpecLint.Reporting.Derivations;
using SpecLint.Reporting.Output;
using SpecLint.Reporting.Quantities;
using SpecLint.Reporting.Sheets;

namespace SpecLint.Reporting.Listings;

/// <summary>The working of a figure: formula, values, and every input down to its line in the spec.</summary>
public static class WorkingListing
{
    private const int LabelColumns = 13;
    private const int Gap = 3;

    /// <summary>Writes the working for people.</summary>
    /// <param name="graph">The machine.</param>
    /// <param name="figure">Figure name; must be in the catalogue.</param>
    /// <param name="options">Depth and layout.</param>
    /// <param name="writer">Where to.</param>
    public static void WriteText(FigureGraph graph, string figure, WorkingOptions options, TextWriter writer)
    {
        ArgumentNullException.ThrowIfNull(graph);
        ArgumentNullException.ThrowIfNull(options);
        ArgumentNullException.ThrowIfNull(writer);
        var page = new TextPage(writer, options.Layout);
        var sections = WorkingSection.Unfold(graph, figure, options.Depth);
        var unfolded = sections.Select(s => s.Step.Name).ToHashSet(StringComparer.Ordinal);
        for (int i = 0; i < sections.Count; i++)
        {
            if (i > 0)
            {
                page.Blank();
            }

            WriteSection(page, graph, sections[i], unfolded);
        }
    }

    /// <summary>Writes the working as JSON in SI: <c>{"figure", "steps": [{"name", "value", "unit", "formula", "inputs", …}]}</c>.</summary>
    /// <param name="graph">The machine.</param>
    /// <param name="figure">Figure name; must be in the catalogue.</param>
    /// <param name="options">Depth.</param>
    /// <param name="stream">Where to; stays open.</param>
    public static void WriteJson(FigureGraph graph, string figure, WorkingOptions options, Stream stream)
    {
        ArgumentNullException.ThrowIfNull(graph);
        ArgumentNullException.ThrowIfNull(options);
        WorkingJson.Write(graph, figure, WorkingSection.Unfold(graph, figure, options.Depth), stream);
    }

    /// <summary>Writes the working as Markdown, to be kept beside a design.</summary>
    /// <param name="graph">The machine.</param>
    /// <param name="figure">Figure name; must be in the catalogue.</param>
    /// <param name="options">Depth.</param>
    /// <param name="writer">Where to.</param>
    public static void WriteMarkdown(FigureGraph graph, string figure, WorkingOptions options, TextWriter writer)
    {
        ArgumentNullException.ThrowIfNull(graph);
        ArgumentNullException.ThrowIfNull(options);
        ArgumentNullException.ThrowIfNull(writer);
        WorkingMarkdown.Write(graph, WorkingSection.Unfold(graph, figure, options.Depth), writer);
    }

    /// <summary>How sure the value is, in words: the band, its share of the value, and what the method adds; empty for an exact one.</summary>
    /// <param name="figure">The figure.</param>
    internal static string Uncertainty(Figure figure)
    {
        if (!figure.Outcome.HasValue || figure.Outcome.Uncertainty <= 0)
        {
            return "";
        }

        DisplayUnit unit = DisplayUnit.Of(figure.Definition.DisplayUnit, figure.Definition.Dimension);
        string text = "± " + unit.Attach(BandText.Number(unit.DifferenceFromSi(figure.Outcome.Uncertainty), 2));
        if (!unit.HasOffset && figure.Outcome.Value != 0)
        {
            double share = 100 * figure.Outcome.Uncertainty / Math.Abs(figure.Outcome.Value);
            text += string.Create(CultureInfo.InvariantCulture, $", {BandText.Number(share, 2)} % of the value");
        }

        return text
            + (figure.Definition.MethodUncertainty > 0 ? $"; the method adds {BandText.Number(100 * figure.Definition.MethodUncertainty, 2)} %" : "")
            + (figure.Definition.IsCoarse ? "; a coarse estimate" : "");
    }

    private static void WriteSection(TextPage page, FigureGraph graph, WorkingSection section, HashSet<string> unfolded)
    {
        DerivationStep step = section.Step;
        FigureDefinition definition = step.Figure!.Definition;
        page.Wrapped("", step.Figure.Outcome.HasValue ? $"{step.Name} = {step.Value}" : $"{step.Name}: {step.Value}", Emphasis.Heading);
        Labelled(page, "meaning", Printable.Line(definition.Meaning));
        if (step.Figure.Outcome.IsAssumed)
        {
            Labelled(page, "assumed", Printable.Line(step.Figure.Outcome.Reason));
        }

        bool isMethod = string.Equals(step.Formula, step.Substituted, StringComparison.Ordinal);
        Labelled(page, isMethod ? "method" : "formula", step.Formula);
        if (!isMethod)
        {
            Labelled(page, "with values", step.Substituted);
        }

        WriteInputs(page, graph, section, unfolded);
        Labelled(page, "basis", Printable.Line(RuleText.BasisWords(definition.Basis)));
        string uncertainty = Uncertainty(step.Figure);
        if (uncertainty.Length > 0)
        {
            Labelled(page, "uncertainty", uncertainty);
        }
    }

    private static void WriteInputs(TextPage page, FigureGraph graph, WorkingSection section, HashSet<string> unfolded)
    {
        var rows = section.Inputs.Select(input => (Text: InputText(input), Place: PlaceText(graph, input, unfolded))).ToList();
        int room = page.Width - LabelColumns - 2 - Gap - rows.Select(row => TextPage.Columns(row.Place)).DefaultIfEmpty().Max();
        int column = rows.Where(row => row.Place.Length > 0).Select(row => TextPage.Columns(row.Text)).Where(c => c <= room).DefaultIfEmpty().Max();
        string label = "from";
        foreach (var (text, place) in rows)
        {
            if (place.Length > 0 && TextPage.Columns(text) <= column)
            {
                page.Columned("  " + TextPage.Pad(label, LabelColumns - 2) + "  ", TextPage.Pad(text, column + Gap) + place, Emphasis.Quiet);
            }
            else
            {
                Labelled(page, label, place.Length > 0 ? $"{text} {place}" : text);
            }

            label = "";
        }
    }

    private static string InputText(DerivationStep input)
    {
        string name = (input.Depth > 0 ? "· " : "") + Printable.Line(input.Name);
        return input.Kind switch
        {
            FigureInputKind.Part => $"{name}, {input.Value}",
            FigureInputKind.Key when input.Region is null => $"{name} ({input.Value})",
            FigureInputKind.Figure when !input.Figure!.Outcome.HasValue => $"{name} ({input.Value})",
            _ => $"{name} = {input.Value}",
        };
    }

    private static string PlaceText(FigureGraph graph, DerivationStep input, HashSet<string> unfolded) =>
        input.Region is { } region ? $"({ReviewWords.Place(graph.Spec, region.StartLine)})"
        : input.Kind == FigureInputKind.Figure && unfolded.Contains(input.Name) ? "(below)"
        : "";

    private static void Labelled(TextPage page, string label, string text) =>
        page.Wrapped("  " + TextPage.Pad(label, LabelColumns - 2) + "  ", text, Emphasis.Quiet);
}
