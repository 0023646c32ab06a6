using System.Collections.Immutable;
using SpecLint.Review.Expressions;
using SpecLint.Spec.Yaml;

namespace SpecLint.Review.Rules;

/// <summary>The faults of one file, in order of discovery, up to a number that someone would read.</summary>
internal sealed class FaultList
{
    /// <summary>Most faults that are listed.</summary>
    public const int Most = 200;

    private readonly List<RulebookFault> _faults = [];

    /// <summary>True when no more faults are taken, so that reading on is of no use.</summary>
    public bool IsFull => _faults.Count >= Most;

    public int Count => _faults.Count;

    public void Add(string message, Region region)
    {
        if (_faults.Count < Most)
        {
            _faults.Add(new RulebookFault(message, region));
        }
    }

    public void Add(ExpressionFault fault, YamlScalar scalar) => Add(fault.Message, ScalarPlace.Of(scalar, fault.Start, fault.Length));

    public ImmutableArray<RulebookFault> Sorted() => [.. _faults.OrderBy(f => f.Region).ThenBy(f => f.Message, StringComparer.Ordinal)];
}
