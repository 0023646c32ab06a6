using SpecLint.Review.Rules;

namespace SpecLint.Review.Catalogue;

/// <summary>The reference tables of <c>rules/tables</c>, embedded in the program.</summary>
public static class OurTables
{
    private const string Prefix = "speclint.tables.";

    private static readonly Lazy<ReferenceTables> Loaded = new(Load);

    /// <summary>All tables.</summary>
    public static ReferenceTables All => Loaded.Value;

    private static ReferenceTables Load()
    {
        ReferenceTables tables = ReferenceTableLoader.Load(
            Resources.Of(Prefix).Select(r => ($"rules/tables/{r.Name}", (ReadOnlyMemory<byte>)r.Bytes)));
        return tables.Faults.IsEmpty
            ? tables
            : throw new InvalidOperationException($"A table of the program is faulty: {tables.Faults[0].Message}");
    }
}
