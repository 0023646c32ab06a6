using System.Collections.Immutable;
using SpecLint.Review.Figures;
using SpecLint.Reporting.Output;
using SpecLint.Reporting.Quantities;
using SpecLint.Spec.Documents;

namespace SpecLint.Reporting.Derivations;

/// <summary>The working that leads from the values of a spec to figures.</summary>
internal sealed class Derivation
{
    private readonly FigureGraph _graph;
    private readonly int _deepest;
    private readonly Dictionary<FigureInput, int> _depth = [];
    private readonly HashSet<FigureInput> _seen = [];
    private readonly List<DerivationStep> _steps = [];

    private Derivation(FigureGraph graph, int deepest)
    {
        _graph = graph;
        _deepest = deepest;
    }

    /// <summary>The steps from the inputs to the figures, each once, every step after those it needs.</summary>
    /// <param name="graph">The machine.</param>
    /// <param name="figures">Where the working leads; names outside the catalogue are passed over.</param>
    /// <param name="deepest">How many levels of figures to unfold below the named ones.</param>
    public static IReadOnlyList<DerivationStep> Walk(FigureGraph graph, IEnumerable<string> figures, int deepest)
    {
        var derivation = new Derivation(graph, deepest);
        var ends = figures.Where(name => graph.Catalogue.Find(name) is not null).Select(name => new FigureInput(FigureInputKind.Figure, name)).ToList();
        derivation.Measure(ends);
        foreach (FigureInput end in ends)
        {
            derivation.Visit(end);
        }

        return derivation._steps;
    }

    /// <summary>One input as a step by itself.</summary>
    /// <param name="graph">The machine.</param>
    /// <param name="input">The input.</param>
    /// <param name="depth">Its distance from the figure that the working leads to.</param>
    public static DerivationStep Step(FigureGraph graph, FigureInput input, int depth) => input.Kind switch
    {
        FigureInputKind.Key => KeyStep(graph.Spec, input.Name, depth),
        FigureInputKind.Figure => FigureStep(graph, graph[input.Name], depth),
        _ => new DerivationStep { Kind = FigureInputKind.Part, Name = input.Name, Depth = depth, Value = "an intermediate result without a single number" },
    };

    /// <summary>The least distance of each input from the named figures, level by level.</summary>
    private void Measure(IEnumerable<FigureInput> figures)
    {
        var level = new Queue<FigureInput>();
        foreach (FigureInput figure in figures.Where(figure => _depth.TryAdd(figure, 0)))
        {
            level.Enqueue(figure);
        }

        while (level.TryDequeue(out FigureInput input))
        {
            foreach (FigureInput below in _depth[input] <= _deepest ? InputsOf(_graph, input) : [])
            {
                if (_depth.TryAdd(below, _depth[input] + 1))
                {
                    level.Enqueue(below);
                }
            }
        }
    }

    private void Visit(FigureInput input)
    {
        if (!_seen.Add(input))
        {
            return;
        }

        foreach (FigureInput below in _depth[input] <= _deepest ? InputsOf(_graph, input) : [])
        {
            Visit(below);
        }

        _steps.Add(Step(_graph, input, _depth[input]));
    }

    private static ImmutableArray<FigureInput> InputsOf(FigureGraph graph, FigureInput input) => input.Kind switch
    {
        FigureInputKind.Figure => graph[input.Name].Inputs,
        FigureInputKind.Part => graph.PartInputs(input.Name),
        _ => [],
    };

    private static DerivationStep KeyStep(SpecDocument spec, string key, int depth)
    {
        SpecValue? value = spec.Find(key);
        return new DerivationStep
        {
            Kind = FigureInputKind.Key,
            Name = key,
            Depth = depth,
            Value = value is not null ? ValueText.Of(value) : spec.States(key) ? "stated" : "not stated",
            Region = value is not null ? value.ValueRegion : spec.KeyRegion(key),
        };
    }

    private static DerivationStep FigureStep(FigureGraph graph, Figure figure, int depth) => new()
    {
        Kind = FigureInputKind.Figure,
        Name = figure.Name,
        Depth = depth,
        Value = ValueText.Of(figure),
        Figure = figure,
        Formula = Printable.Line(FormulaText.WithNames(figure.Definition.Formula)),
        Substituted = Printable.Line(FormulaText.WithValues(figure, graph)),
    };
}
