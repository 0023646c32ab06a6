using System.Collections.Immutable;
using SpecLint.Review.Figures;
using SpecLint.Reporting.Derivations;

namespace SpecLint.Reporting.Listings;

/// <summary>One figure of a working with what it was computed from.</summary>
/// <param name="Step">The figure.</param>
/// <param name="Inputs">Its inputs; those of an intermediate result follow it with a greater <see cref="DerivationStep.Depth"/>.</param>
internal sealed record WorkingSection(DerivationStep Step, ImmutableArray<DerivationStep> Inputs)
{
    /// <summary>The figure asked for and the figures below it, level by level, each once.</summary>
    /// <param name="graph">The machine.</param>
    /// <param name="figure">Figure name.</param>
    /// <param name="depth">Levels below it.</param>
    public static IReadOnlyList<WorkingSection> Unfold(FigureGraph graph, string figure, int depth)
    {
        var sections = new List<WorkingSection>();
        var seen = new HashSet<string>(StringComparer.Ordinal) { figure };
        var level = new List<string> { figure };
        for (int at = 0; at <= depth && level.Count > 0; at++)
        {
            var next = new List<string>();
            foreach (string name in level)
            {
                var inputs = new List<DerivationStep>();
                Collect(graph, graph[name].Inputs, 0, inputs);
                sections.Add(new WorkingSection(Derivation.Step(graph, new FigureInput(FigureInputKind.Figure, name), at), [.. inputs]));
                next.AddRange(inputs.Where(i => i.Kind == FigureInputKind.Figure).Select(i => i.Name).Where(seen.Add));
            }

            level = next;
        }

        return sections;
    }

    private static void Collect(FigureGraph graph, ImmutableArray<FigureInput> inputs, int depth, List<DerivationStep> found)
    {
        foreach (FigureInput input in inputs)
        {
            if (found.Exists(f => f.Kind == input.Kind && f.Name == input.Name))
            {
                continue;
            }

            found.Add(Derivation.Step(graph, input, depth));
            if (input.Kind == FigureInputKind.Part)
            {
                Collect(graph, graph.PartInputs(input.Name), depth + 1, found);
            }
        }
    }
}
