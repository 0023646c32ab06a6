using System.Collections.Frozen;
using System.Collections.Immutable;

namespace SpecLint.Review.Rules;

/// <summary>Reference tables by name, with what is wrong with the files they were read from.</summary>
public sealed class ReferenceTables
{
    private readonly FrozenDictionary<string, ReferenceTable> _byName;

    /// <summary>Tables of the given list; names must be unique.</summary>
    /// <param name="tables">The tables.</param>
    /// <param name="faults">What is wrong with their files.</param>
    public ReferenceTables(IEnumerable<ReferenceTable> tables, ImmutableArray<RulebookFault> faults)
    {
        Tables = [.. tables];
        Faults = faults;
        _byName = Tables.ToFrozenDictionary(t => t.Name, StringComparer.Ordinal);
    }

    /// <summary>No tables.</summary>
    public static ReferenceTables Empty { get; } = new([], []);

    /// <summary>The tables in order.</summary>
    public ImmutableArray<ReferenceTable> Tables { get; }

    /// <summary>What is wrong with the files.</summary>
    public ImmutableArray<RulebookFault> Faults { get; }

    /// <summary>The table of a name, or null.</summary>
    /// <param name="name">Its name.</param>
    public ReferenceTable? Find(string name) => _byName.GetValueOrDefault(name);
}
