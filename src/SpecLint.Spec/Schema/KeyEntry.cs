using System.Collections.Immutable;
using SpecLint.Spec.Units;

namespace SpecLint.Spec.Schema;

/// <summary>What is known of one key of the spec format.</summary>
public sealed class KeyEntry
{
    private readonly SchemaNode _node;

    internal KeyEntry(SchemaNode node) => _node = node;

    /// <summary>Dotted key; <c>[]</c> stands for any item of a list, <c>*</c> for any figure name.</summary>
    public string Key => _node.Key;

    /// <summary>Its title.</summary>
    public string Title => _node.Title;

    /// <summary>What it means and how it is measured.</summary>
    public string Description => _node.Description;

    /// <summary>Values as one would write them.</summary>
    public ImmutableArray<string> Examples => _node.Examples;

    /// <summary>The only words it takes; empty when it takes any value of its kind.</summary>
    public ImmutableArray<string> Words => _node.Words;

    /// <summary>The topologies it belongs to; empty when it belongs to all.</summary>
    public ImmutableArray<string> Topologies => _node.Topologies;

    /// <summary>Word of the schema for what a scalar here means, such as <c>length</c>, <c>speed</c>, <c>text</c>; empty for a section.</summary>
    public string Quantity => _node.Quantity;

    /// <summary>The quantity of a value; null for words, flags, sections and figures; a <c>speed</c> is taken as rotational.</summary>
    public QuantityKind? Kind => _node.KindFor("");

    /// <summary>Dimension of a value; null for words, flags, sections and figures.</summary>
    public Dimension? Dimension => Kind?.Dimension;

    /// <summary>Unit for the screen; empty for plain numbers and all that has no unit.</summary>
    public string DisplayUnit => Kind?.DisplayUnit ?? "";

    /// <summary>True for a mapping of further keys, also where a scalar is an alternative.</summary>
    public bool IsSection => _node.TakesMapping;

    /// <summary>True for a list.</summary>
    public bool IsList => _node.Item is not null;

    /// <summary>The keys one level below, in the schema's order.</summary>
    public ImmutableArray<string> Children => [.. _node.Children.Select(c => c.Key)];

    /// <summary>The keys that must stand below it.</summary>
    public ImmutableArray<string> Required => _node.Required;

    /// <summary>The quantity of a value under a topology: a speed is a velocity in a linear machine.</summary>
    /// <param name="topology">Word of <c>machine.topology</c>.</param>
    public QuantityKind? KindFor(string topology) => _node.KindFor(topology);
}
