using System.Collections.Frozen;
using System.Collections.Immutable;

namespace SpecLint.Review.Figures;

/// <summary>All figures that spec-lint can compute, in the order in which they are listed.</summary>
public sealed class FigureCatalogue
{
    private readonly FrozenDictionary<string, FigureDefinition> _byName;

    /// <summary>A catalogue of the given figures.</summary>
    /// <param name="definitions">The figures; names must be unique.</param>
    /// <exception cref="ArgumentException">Two figures share a name.</exception>
    public FigureCatalogue(IEnumerable<FigureDefinition> definitions)
    {
        Definitions = [.. definitions];
        _byName = Definitions.ToFrozenDictionary(d => d.Name, StringComparer.Ordinal);
    }

    /// <summary>The figures in order.</summary>
    public ImmutableArray<FigureDefinition> Definitions { get; }

    /// <summary>The figure of a name.</summary>
    /// <param name="name">Dotted name.</param>
    /// <exception cref="KeyNotFoundException">There is no such figure.</exception>
    public FigureDefinition this[string name] =>
        _byName.TryGetValue(name, out var definition) ? definition : throw new KeyNotFoundException($"There is no figure {name}.");

    /// <summary>The figure of a name, or null.</summary>
    /// <param name="name">Dotted name.</param>
    public FigureDefinition? Find(string name) => _byName.GetValueOrDefault(name);
}
