using System.Collections.Immutable;
using SpecLint.Spec.Documents;

namespace SpecLint.Review.Figures;

/// <summary>
/// What a figure's function sees: spec values and other figures, each access recorded so that the working and the
/// dependency of one figure on another are known without being declared twice.
/// </summary>
/// <remarks>
/// A missing number reads as NaN inside the function; <see cref="Value(double)"/> and <see cref="Stop"/> turn
/// it into <see cref="Outcome.Missing"/>, so it never leaves the function. Check <see cref="Incomplete"/> before anything costly.
/// </remarks>
public sealed class Evaluation
{
    private readonly FigureGraph _graph;
    private readonly FigureDefinition? _definition;
    private readonly List<FigureInput> _inputs = [];
    private List<string>? _missing;
    private Outcome? _obstacle;
    private double _squaredUncertainty;

    internal Evaluation(FigureGraph graph, FigureDefinition? definition)
    {
        _graph = graph;
        _definition = definition;
    }

    /// <summary>True when an input is missing, does not apply or is out of its domain.</summary>
    public bool Incomplete => _missing is not null || _obstacle is not null;

    /// <summary>What was read so far, in order of first use.</summary>
    internal ImmutableArray<FigureInput> Inputs => [.. _inputs];

    /// <summary>A number of the spec in SI; recorded as missing when the spec does not state it.</summary>
    /// <param name="key">Dotted key.</param>
    public double Number(string key)
    {
        if (Find(key) is { Kind: SpecValueKind.Number } value)
        {
            return value.Number;
        }

        Miss(key);
        return double.NaN;
    }

    /// <summary>A whole number of the spec; recorded as missing when the spec does not state it, and then 0.</summary>
    /// <param name="key">Dotted key.</param>
    public int Count(string key)
    {
        double number = Number(key);
        return double.IsNaN(number) ? 0 : (int)Math.Round(Math.Clamp(number, int.MinValue, int.MaxValue));
    }

    /// <summary>A number of the spec in SI, or null when it is not stated (which is then no lack).</summary>
    /// <param name="key">Dotted key.</param>
    public double? Optional(string key) => Find(key) is { Kind: SpecValueKind.Number } value ? value.Number : null;

    /// <summary>A word of the spec; recorded as missing when not stated, and then empty.</summary>
    /// <param name="key">Dotted key.</param>
    public string Text(string key)
    {
        if (Find(key) is { } value)
        {
            return value.Text;
        }

        Miss(key);
        return "";
    }

    /// <summary>A word of the spec, or null when not stated (which is then no lack).</summary>
    /// <param name="key">Dotted key.</param>
    public string? OptionalText(string key) => Find(key)?.Text;

    /// <summary>A flag of the spec, or null when not stated.</summary>
    /// <param name="key">Dotted key.</param>
    public bool? OptionalFlag(string key) => Find(key) is { Kind: SpecValueKind.Flag } value ? value.Flag : null;

    /// <summary>True when the spec states the key, as a leaf or a section.</summary>
    /// <param name="key">Dotted key.</param>
    public bool States(string key)
    {
        Record(new FigureInput(FigureInputKind.Key, key));
        return _graph.Spec.States(key);
    }

    /// <summary>The value behind a key, or null; recorded, and no lack when absent.</summary>
    /// <param name="key">Dotted key.</param>
    public SpecValue? Find(string key)
    {
        Record(new FigureInput(FigureInputKind.Key, key));
        return _graph.Spec.Find(key);
    }

    /// <summary>Another figure's value; its lack becomes this figure's lack.</summary>
    /// <param name="name">Figure name.</param>
    public double Figure(string name)
    {
        Outcome outcome = Look(name);
        if (outcome.HasValue)
        {
            if (outcome.Value != 0)
            {
                double relative = outcome.Uncertainty / Math.Abs(outcome.Value);
                _squaredUncertainty += relative * relative;
            }

            return outcome.Value;
        }

        Block(outcome);
        return double.NaN;
    }

    /// <summary>Another figure's outcome, whatever it is; its lack is not this figure's lack.</summary>
    /// <param name="name">Figure name.</param>
    public Outcome Look(string name)
    {
        Record(new FigureInput(FigureInputKind.Figure, name));
        return _graph[name].Outcome;
    }

    /// <summary>Another figure's value, or null when it has none (which is then no lack).</summary>
    /// <param name="name">Figure name.</param>
    public double? OptionalFigure(string name) => Look(name) is { HasValue: true } outcome ? outcome.Value : null;

    /// <summary>An intermediate result; null when its inputs are lacking, which becomes this figure's lack.</summary>
    /// <param name="part">Which part.</param>
    /// <typeparam name="T">Its type.</typeparam>
    public T? Part<T>(PartDefinition<T> part)
        where T : class
    {
        Record(new FigureInput(FigureInputKind.Part, part.Name));
        T? value = _graph.Part(part, out Outcome obstacle);
        if (value is null)
        {
            Block(obstacle);
        }

        return value;
    }

    /// <summary>
    /// A figure of the same machine with some spec values changed, for questions such as what a thinner coil would give.
    /// The unchanged rest is shared. Its lack becomes this figure's lack.
    /// </summary>
    /// <param name="name">Figure name.</param>
    /// <param name="changes">Keys with their new values in SI.</param>
    public double Varied(string name, params ReadOnlySpan<(string Key, double Number)> changes)
    {
        foreach (var (key, _) in changes)
        {
            Record(new FigureInput(FigureInputKind.Key, key));
        }

        _ = Look(name);
        Outcome outcome = _graph.With(changes)[name].Outcome;
        if (outcome.HasValue)
        {
            return outcome.Value;
        }

        Block(outcome);
        return double.NaN;
    }

    /// <summary>Ends with a value whose uncertainty follows from the inputs (taken as independent, of sensitivity one) and the method.</summary>
    /// <param name="value">In coherent SI.</param>
    public Outcome Value(double value)
    {
        double method = _definition?.MethodUncertainty ?? 0;
        return Value(value, Math.Abs(value) * Math.Sqrt(_squaredUncertainty + (method * method)));
    }

    /// <summary>Ends with a value of stated uncertainty.</summary>
    /// <param name="value">In coherent SI.</param>
    /// <param name="uncertainty">Half width of its band, same unit.</param>
    public Outcome Value(double value, double uncertainty) => Incomplete ? Stop() : Outcome.Of(value, uncertainty);

    /// <summary>Ends with a default that practice allows.</summary>
    /// <param name="value">In coherent SI.</param>
    /// <param name="reason">Where the default comes from.</param>
    public Outcome Assume(double value, string reason) => Incomplete ? Stop() : Outcome.Assumed(value, reason);

    /// <summary>Ends because the figure does not concern this machine.</summary>
    /// <param name="reason">Why.</param>
    public Outcome NotApplicable(string reason) => _missing is null ? Outcome.NotApplicable(reason) : Stop();

    /// <summary>Ends because the method does not hold here.</summary>
    /// <param name="reason">Why.</param>
    public Outcome OutOfDomain(string reason) => Incomplete ? Stop() : Outcome.OutOfDomain(reason);

    /// <summary>Records a key as lacking.</summary>
    /// <param name="key">Dotted key.</param>
    public void Miss(string key)
    {
        _missing ??= [];
        if (!_missing.Contains(key, StringComparer.Ordinal))
        {
            _missing.Add(key);
        }
    }

    /// <summary>Ends with what stands in the way; only valid when <see cref="Incomplete"/>.</summary>
    public Outcome Stop() =>
        _obstacle is { Kind: OutcomeKind.NotApplicable } no ? no
        : _missing is not null ? Outcome.Missing([.. _missing])
        : _obstacle ?? throw new InvalidOperationException("A figure stopped although nothing is lacking.");

    private void Block(Outcome outcome)
    {
        if (outcome.Kind == OutcomeKind.Missing)
        {
            foreach (string key in outcome.MissingKeys)
            {
                Miss(key);
            }
        }
        else
        {
            _obstacle ??= outcome;
        }
    }

    private void Record(FigureInput input)
    {
        if (!_inputs.Contains(input))
        {
            _inputs.Add(input);
        }
    }
}
