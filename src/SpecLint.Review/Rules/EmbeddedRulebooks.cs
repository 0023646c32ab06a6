using System.Collections.Immutable;
using SpecLint.Review.Expressions;
using SpecLint.Review.Figures;

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
    public static SharedTexts Texts() => TextsOf(Read(BookPrefix, "rules/books/"));

    /// <summary>Reads the rulebooks, in order of name.</summary>
    /// <param name="figures">The figures that rules may name.</param>
    public static ImmutableArray<Rulebook> Load(FigureCatalogue figures)
    {
        var files = Read(BookPrefix, "rules/books/");
        SharedTexts shared = TextsOf(files);
        var scope = new ExpressionScope(figures, Tables);
        return [.. files.Select(file => RulebookLoader.Load(file.Path, file.Bytes.Span, scope, shared))];
    }

    private static SharedTexts TextsOf(ImmutableArray<(string Path, ReadOnlyMemory<byte> Bytes)> files) =>
        files.Aggregate(SharedTexts.None, (shared, file) => RulebookLoader.ReadSharedTexts(file.Bytes.Span, shared));

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
