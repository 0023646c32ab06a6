using System.Collections.Immutable;
using SpecLint.Review.Expressions;
using SpecLint.Review.Rules;
using SpecLint.Spec.Schema;
using SpecLint.Spec.Units;

namespace SpecLint.Review.Catalogue;

/// <summary>The rulebooks of <c>rules/books</c>, embedded in the program.</summary>
public static class OurRulebooks
{
    private const string Prefix = "speclint.books.";

    private static readonly Lazy<(ImmutableArray<Rulebook> Books, SharedTexts Texts)> Loaded = new(Load);

    /// <summary>What expressions of a rulebook may name: our figures, the keys of the spec format, our tables.</summary>
    public static ExpressionScope Scope { get; } = new()
    {
        Figures = OurFigures.Catalogue,
        FindKey = FindKey,
        KeyNames = [.. KeyCatalogue.Entries.Select(e => e.Key)],
        Tables = OurTables.All,
    };

    /// <summary>All rulebooks, in ordinal order of their names.</summary>
    public static ImmutableArray<Rulebook> All => Loaded.Value.Books;

    /// <summary>Loads a further rulebook, whose rules may not take identifiers of ours.</summary>
    /// <param name="path">Where it was read from.</param>
    /// <param name="bytes">Its content.</param>
    public static Rulebook LoadFurther(string path, ReadOnlySpan<byte> bytes)
    {
        Rulebook book = RulebookLoader.Load(path, bytes, Scope, Loaded.Value.Texts);
        var twins = RulebookLoader.FindTwins([.. All, book]).Where(t => ReferenceEquals(t.Book, book)).Select(t => t.Fault);
        return book with { Faults = [.. book.Faults, .. twins] };
    }

    private static (ImmutableArray<Rulebook> Books, SharedTexts Texts) Load()
    {
        var files = Resources.Of(Prefix).ToList();
        SharedTexts texts = SharedTexts.None;
        foreach (var (_, bytes) in files)
        {
            texts = RulebookLoader.ReadSharedTexts(bytes, texts);
        }

        ImmutableArray<Rulebook> books = [.. files.Select(f => RulebookLoader.Load($"rules/books/{f.Name}", f.Bytes, Scope, texts))];
        foreach (Rulebook book in books)
        {
            if (!book.Faults.IsEmpty)
            {
                RulebookFault fault = book.Faults[0];
                throw new InvalidOperationException($"{book.Path}, line {fault.Region.StartLine}: {fault.Message}");
            }
        }

        return (books, texts);
    }

    private static NamedKey? FindKey(string name)
    {
        if (!KeyCatalogue.TryFind(name, out KeyEntry? entry))
        {
            return null;
        }

        NamedKeyKind kind = entry.IsList ? NamedKeyKind.List
            : entry.Quantity == "flag" ? NamedKeyKind.Flag
            : entry.Dimension is not null ? NamedKeyKind.Number
            : entry.Quantity.Length > 0 ? NamedKeyKind.Text
            : NamedKeyKind.Section;
        return new NamedKey(name, kind, entry.Dimension ?? Dimension.None, entry.Words);
    }
}
