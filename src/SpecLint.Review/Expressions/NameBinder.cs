using SpecLint.Review.Figures;
using SpecLint.Spec.Names;

namespace SpecLint.Review.Expressions;

/// <summary>Resolves the figures and spec keys that an expression names, and remembers them in order.</summary>
internal sealed class NameBinder(FigureCatalogue figures, NameBinder.FaultTaker fail)
{
    /// <summary>Takes a fault; gives null in its place.</summary>
    internal delegate Typed? FaultTaker(string message, int start, int length);

    /// <summary>The figures named, in order.</summary>
    public List<string> Figures { get; } = [];

    /// <summary>The keys named, in order.</summary>
    public List<string> Keys { get; } = [];

    /// <summary>Those of the keys that are asked to be stated.</summary>
    public List<string> StatedKeys { get; } = [];

    public Typed? Name(Token token)
    {
        int end = token.Start + token.Length;
        if (figures.Find(token.Text) is { } figure)
        {
            Add(Figures, figure.Name);
            return new Typed(new FigureNode(figure.Name), TypedKind.Number, token.Start, end)
            {
                Dimension = figure.Dimension,
                Unit = figure.DisplayUnit,
            };
        }

        if (ExpressionScope.FindKey(token.Text) is not { } key)
        {
            return UnknownName(token);
        }

        Add(Keys, key.Key);
        return key.Kind switch
        {
            NamedKeyKind.Number => new Typed(new KeyNumberNode(key.Key, key.Dimension), TypedKind.Number, token.Start, end)
            {
                Dimension = key.Dimension,
                Unit = key.DisplayUnit,
            },
            NamedKeyKind.Text => new Typed(new KeyTextNode(key.Key), TypedKind.Text, token.Start, end) { Words = key.Words },
            NamedKeyKind.Flag => new Typed(new KeyFlagNode(key.Key), TypedKind.Condition, token.Start, end),
            NamedKeyKind.List => fail($"{key.Key} is a list; expected a value, or number-of({key.Key})", token.Start, token.Length),
            _ => fail($"{key.Key} is a section; expected a value, or stated({key.Key})", token.Start, token.Length),
        };
    }

    public Typed? Call(Token name, Token argument, int end)
    {
        if (name.Text is "known")
        {
            if (figures.Find(argument.Text) is not { } figure)
            {
                return fail(
                    $"there is no figure {argument.Text}{NearestName.Suggestion(argument.Text, FigureNames)}", argument.Start, argument.Length);
            }

            Add(Figures, figure.Name);
            return new Typed(new KnownNode(figure.Name), TypedKind.Condition, name.Start, end);
        }

        if (ExpressionScope.FindKey(argument.Text) is not { } key)
        {
            return fail($"there is no key {argument.Text}{NearestName.Suggestion(argument.Text, ExpressionScope.KeyNames)}", argument.Start, argument.Length);
        }

        Add(Keys, key.Key);
        if (name.Text is "stated")
        {
            Add(StatedKeys, key.Key);
            return new Typed(new StatedNode(key.Key), TypedKind.Condition, name.Start, end);
        }

        return key.Kind == NamedKeyKind.List
            ? new Typed(new ListLengthNode(key.Key), TypedKind.Number, name.Start, end)
            : fail($"{key.Key} is not a list", argument.Start, argument.Length);
    }

    private IEnumerable<string> FigureNames => figures.Definitions.Select(d => d.Name);

    private Typed? UnknownName(Token token)
    {
        string advice = NearestName.Suggestion(token.Text, FigureNames.Concat(ExpressionScope.KeyNames));
        if (IsRunTogether(token.Text))
        {
            advice = "; a minus sign has spaces round it";
        }
        else if (advice.Length == 0 && token.Text is "true" or "false")
        {
            advice = "; a flag is a condition by itself";
        }

        return fail($"{token.Text} is neither a figure nor a key{advice}", token.Start, token.Length);
    }

    /// <summary>True when a known name ends at one of the hyphens, so that a minus sign was most likely meant.</summary>
    private bool IsRunTogether(string name)
    {
        for (int hyphen = name.IndexOf('-', StringComparison.Ordinal); hyphen > 0; hyphen = name.IndexOf('-', hyphen + 1))
        {
            if (IsKnown(name[..hyphen]))
            {
                return true;
            }
        }

        return false;
    }

    private bool IsKnown(string name) => figures.Find(name) is not null || ExpressionScope.FindKey(name) is not null;

    private static void Add(List<string> names, string name)
    {
        if (!names.Contains(name, StringComparer.Ordinal))
        {
            names.Add(name);
        }
    }
}
