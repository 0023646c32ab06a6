using System.Collections.Immutable;
using SpecLint.Review.Expressions;
using SpecLint.Review.Rules;

namespace SpecLint.Review.Catalogue;

/// <summary>The rulebooks of <c>rules/books</c> over the figures that spec-lint computes.</summary>
public static class OurRulebooks
{
    private static readonly Lazy<ImmutableArray<Rulebook>> Loaded = new(Load);

    /// <summary>What expressions of a rulebook or a house file may name: our figures, the spec's keys, our tables.</summary>
    public static ExpressionScope Scope => new(OurFigures.Catalogue, EmbeddedRulebooks.Tables);

    /// <summary>All rulebooks, in ordinal order of their names.</summary>
    /// <exception cref="InvalidOperationException">A rulebook of the program is faulty.</exception>
    public static ImmutableArray<Rulebook> All => Loaded.Value;

    /// <summary>Loads a further rulebook, whose rules may not take identifiers of ours.</summary>
    /// <param name="path">Where it was read from.</param>
    /// <param name="bytes">Its content.</param>
    public static Rulebook LoadFurther(string path, ReadOnlySpan<byte> bytes)
    {
        Rulebook book = RulebookLoader.Load(path, bytes, Scope, EmbeddedRulebooks.Texts());
        var twins = RulebookLoader.FindTwins([.. All, book]).Where(t => ReferenceEquals(t.Book, book)).Select(t => t.Fault);
        return book with { Faults = [.. book.Faults, .. twins] };
    }

    private static ImmutableArray<Rulebook> Load()
    {
        ImmutableArray<Rulebook> books = EmbeddedRulebooks.Load(OurFigures.Catalogue);
        var faults = books.SelectMany(b => b.Faults.Select(f => $"{b.Path}, line {f.Region.StartLine}: {f.Message}")).ToList();
        return faults.Count == 0 ? books : throw new InvalidOperationException(string.Join("\n", faults));
    }
}
