using System.Collections.Immutable;
using SpecLint.Review.Expressions;
using SpecLint.Review.Figures;
using SpecLint.Spec.Yaml;

namespace SpecLint.Review.Rules;

/// <summary>The rulebooks and reference tables that come with the program.</summary>
public static class EmbeddedRulebooks
{
    private const string BookPrefix = "speclint.books.";
    private const string TablePrefix = "speclint.tables.";

    private static readonly Lazy<ReferenceTables> LoadedTables = new(() => ReferenceTableLoader.Load(Read(TablePrefix, "rules/tables/")));

    /// <summary>The reference tables, read when first asked for.</summary>
    public static ReferenceTables Tables => LoadedTables.Value;

    /// <summary>The texts that the rulebooks share, which a rulebook of the user may name too.</summary>
    public static SharedTexts Texts() => TextsOf(ReadBooks().Select(b => b.Read));

    /// <summary>Reads the rulebooks, in order of name.</summary>
    /// <param name="figures">The figures that rules may name.</param>
    public static ImmutableArray<Rulebook> Load(FigureCatalogue figures)
    {
        (string Path, YamlReadResult Read)[] books = [.. ReadBooks()];
        SharedTexts shared = TextsOf(books.Select(b => b.Read));
        var scope = new ExpressionScope(figures, Tables);
        return [.. books.Select(book => RulebookLoader.Load(book.Path, book.Read, scope, shared))];
    }

    private static IEnumerable<(string Path, YamlReadResult Read)> ReadBooks() =>
        Read(BookPrefix, "rules/books/").Select(file => (file.Path, YamlReader.Read(file.Bytes.Span, YamlLimits.Default)));

    private static SharedTexts TextsOf(IEnumerable<YamlReadResult> books) =>
        books.Aggregate(SharedTexts.None, (shared, book) => RulebookLoader.ReadSharedTexts(book, shared));

    private static ImmutableArray<(string Path, ReadOnlyMemory<byte> Bytes)> Read(string prefix, string folder)
    {
        var assembly = typeof(EmbeddedRulebooks).Assembly;
        var files = ImmutableArray.CreateBuilder<(string, ReadOnlyMemory<byte>)>();
        foreach (string name in assembly.GetManifestResourceNames().Where(n => n.StartsWith(prefix, StringComparison.Ordinal)).Order(StringComparer.Ordinal))
        {
            using Stream stream = assembly.GetManifestResourceStream(name)!;
            var bytes = new byte[stream.Length];
            stream.ReadExactly(bytes);
            files.Add((folder + name[prefix.Length..], bytes));
        }

        return files.ToImmutable();
    }
}
