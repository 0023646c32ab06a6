using System.Collections.Immutable;
using SpecLint.Spec.Documents;

namespace SpecLint.Review.Figures;

/// <summary>
/// The figures of one machine, each computed when first asked for and then kept. A graph with changed spec values shares
/// every result that does not depend on them.
/// </summary>
/// <remarks>Not safe for use by several threads at once; each review has its own.</remarks>
public sealed class FigureGraph
{
    private readonly FigureCatalogue _catalogue;
    private readonly Dictionary<string, Node> _nodes;
    private readonly HashSet<string> _running = new(StringComparer.Ordinal);

    /// <summary>A graph with nothing computed yet.</summary>
    /// <param name="spec">The machine.</param>
    /// <param name="catalogue">All figures there are.</param>
    public FigureGraph(SpecDocument spec, FigureCatalogue catalogue)
        : this(spec, catalogue, new Dictionary<string, Node>(StringComparer.Ordinal))
    {
    }

    private FigureGraph(SpecDocument spec, FigureCatalogue catalogue, Dictionary<string, Node> nodes)
    {
        Spec = spec;
        _catalogue = catalogue;
        _nodes = nodes;
    }

    /// <summary>The machine as read.</summary>
    public SpecDocument Spec { get; }

    /// <summary>All figures there are.</summary>
    public FigureCatalogue Catalogue => _catalogue;

    /// <summary>One figure, computed if it was not yet.</summary>
    /// <param name="name">Figure name; must be in the catalogue.</param>
    public Figure this[string name]
    {
        get
        {
            if (_nodes.TryGetValue(name, out var known))
            {
                return (Figure)known.Result!;
            }

            FigureDefinition definition = _catalogue[name];
            if (definition.LinearUnit is { } unit && string.Equals(Spec.Find("machine.topology")?.Text, "linear", StringComparison.Ordinal))
            {
                definition = definition with { UnitOfMeasure = unit };
            }

            Figure figure;
            var evaluation = new Evaluation(this, definition);
            if (_running.Add(name))
            {
                Outcome outcome = definition.Compute(evaluation);
                _running.Remove(name);
                figure = new Figure(definition, outcome, evaluation.Inputs);
            }
            else
            {
                throw new InvalidOperationException($"Figure {name} depends on itself.");
            }

            _nodes[name] = new Node(figure, Outcome.NotApplicable(""), KeysOf(evaluation.Inputs));
            return figure;
        }
    }

    /// <summary>Every figure of the catalogue, in its order.</summary>
    public IEnumerable<Figure> All() => _catalogue.Definitions.Select(d => this[d.Name]);

    /// <summary>The spec keys that a figure depends on, directly or through others.</summary>
    /// <param name="name">Figure name.</param>
    public IReadOnlySet<string> KeysBehind(string name)
    {
        _ = this[name];
        return _nodes[name].Keys;
    }

    /// <summary>The same machine with some spec values changed; results that do not depend on them are shared.</summary>
    /// <param name="changes">Keys with their new values in SI.</param>
    public FigureGraph With(params ReadOnlySpan<(string Key, double Number)> changes)
    {
        SpecDocument spec = Spec;
        var keys = new HashSet<string>(StringComparer.Ordinal);
        foreach (var (key, number) in changes)
        {
            keys.Add(key);
            SpecValue old = spec.Find(key) ?? new SpecValue
            {
                Key = key,
                Kind = SpecValueKind.Number,
                Text = "",
                KeyRegion = spec.NearestParent(key).Region,
                ValueRegion = spec.NearestParent(key).Region,
            };
            spec = spec.With(old with { Number = number, Kind = SpecValueKind.Number });
        }

        return With(spec, keys);
    }

    /// <summary>The graph of a changed spec; results that do not depend on the changed keys are shared.</summary>
    /// <param name="spec">The changed spec.</param>
    /// <param name="changedKeys">The keys whose values differ.</param>
    public FigureGraph With(SpecDocument spec, IReadOnlySet<string> changedKeys)
    {
        var kept = new Dictionary<string, Node>(_nodes.Count, StringComparer.Ordinal);
        foreach (var (name, node) in _nodes)
        {
            if (!node.Keys.Overlaps(changedKeys))
            {
                kept[name] = node;
            }
        }

        return new FigureGraph(spec, _catalogue, kept);
    }

    internal T? Part<T>(PartDefinition<T> part, out Outcome obstacle)
        where T : class
    {
        if (!_nodes.TryGetValue(part.Name, out var node) || node.IsForgotten)
        {
            var evaluation = new Evaluation(this, definition: null);
            T? value = part.Compute(evaluation);
            Outcome lack = value is not null ? Outcome.NotApplicable("")
                : evaluation.Incomplete ? evaluation.Stop()
                : Outcome.OutOfDomain($"{part.Name} cannot be computed for these inputs");
            node = new Node(value, lack, KeysOf(evaluation.Inputs)) { Inputs = evaluation.Inputs };
            _nodes[part.Name] = node;
        }

        obstacle = node.Obstacle;
        return (T?)node.Result;
    }

    /// <summary>What a part was computed from; empty when it was not computed.</summary>
    /// <param name="partName">Name of the part.</param>
    public ImmutableArray<FigureInput> PartInputs(string partName) =>
        _nodes.TryGetValue(partName, out var node) ? node.Inputs : [];

    /// <summary>
    /// Lets go of the intermediate results, which are large, once everything of interest is computed. Figures, their
    /// inputs and what they depend on stay; a figure not yet computed would compute its parts anew.
    /// </summary>
    public void ForgetParts()
    {
        foreach (var (name, node) in _nodes)
        {
            if (node.Result is not Figure && node.Result is not null)
            {
                _nodes[name] = node with { Result = null, IsForgotten = true };
            }
        }
    }

    private HashSet<string> KeysOf(ImmutableArray<FigureInput> inputs)
    {
        var keys = new HashSet<string>(StringComparer.Ordinal);
        foreach (FigureInput input in inputs)
        {
            if (input.Kind == FigureInputKind.Key)
            {
                keys.Add(input.Name);
            }
            else if (_nodes.TryGetValue(input.Name, out var node))
            {
                keys.UnionWith(node.Keys);
            }
        }

        return keys;
    }

    private sealed record Node(object? Result, Outcome Obstacle, IReadOnlySet<string> Keys)
    {
        public ImmutableArray<FigureInput> Inputs { get; init; } = [];

        public bool IsForgotten { get; init; }
    }
}
