using SpecLint.Review.Figures;
using SpecLint.Reporting.Derivations;
using SpecLint.Reporting.Output;
using SpecLint.Reporting.Sheets;

namespace SpecLint.Reporting.Listings;

/// <summary>The working of a figure as Markdown.</summary>
internal static class WorkingMarkdown
{
    /// <summary>Writes the working; lines end with <c>\n</c>.</summary>
    /// <param name="graph">The machine.</param>
    /// <param name="sections">The working.</param>
    /// <param name="writer">Where to.</param>
    public static void Write(FigureGraph graph, IReadOnlyList<WorkingSection> sections, TextWriter writer)
    {
        for (int i = 0; i < sections.Count; i++)
        {
            if (i > 0)
            {
                writer.Write('\n');
            }

            WriteSection(graph, sections[i], writer, i == 0 ? "#" : "##");
        }
    }

    private static void WriteSection(FigureGraph graph, WorkingSection section, TextWriter writer, string mark)
    {
        DerivationStep step = section.Step;
        Figure figure = step.Figure!;
        writer.Write($"{mark} {MarkdownText.Escape(step.Name)}\n\n{MarkdownText.Escape(Printable.Sentence(figure.Definition.Meaning))}\n\n");
        string result = figure.Outcome.IsAssumed ? $"{step.Value}, assumed: {Printable.Line(figure.Outcome.Reason)}" : step.Value;
        writer.Write($"- **Value:** {MarkdownText.Escape(result)}\n- **Formula:** {MarkdownText.Escape(step.Formula)}\n");
        if (!string.Equals(step.Formula, step.Substituted, StringComparison.Ordinal))
        {
            writer.Write($"- **With values:** {MarkdownText.Escape(step.Substituted)}\n");
        }

        writer.Write($"- **Basis:** {MarkdownText.Escape(Printable.Line(RuleText.BasisWords(figure.Definition.Basis)))}\n");
        string uncertainty = WorkingListing.Uncertainty(figure);
        if (uncertainty.Length > 0)
        {
            writer.Write($"- **Uncertainty:** {MarkdownText.Escape(uncertainty)}\n");
        }

        if (section.Inputs.IsEmpty)
        {
            return;
        }

        writer.Write("\n| input | value | place |\n|---|---|---|\n");
        foreach (DerivationStep input in section.Inputs)
        {
            string place = input.Region is { } region ? ReviewWords.Place(graph.Spec, region.StartLine) : "";
            writer.Write($"| {MarkdownText.Escape(Printable.Line(input.Name))} | {MarkdownText.Escape(input.Value)} | {MarkdownText.Escape(place)} |\n");
        }
    }
}
