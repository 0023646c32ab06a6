using System.Collections.Immutable;
using System.Globalization;
using SpecLint.Review.Catalogue;
using SpecLint.Review.Rules;

namespace SpecLint.Cli.Reviewing;

/// <summary>Our own rulebooks and those named on the command line.</summary>
internal static class RulebookSource
{
    private const int MostFaultsShown = 20;

    /// <summary>Loads our rulebooks and the given files.</summary>
    /// <param name="paths">Rulebook files of the user.</param>
    /// <exception cref="CannotRunException">A rulebook cannot be read or is faulty.</exception>
    public static ImmutableArray<Rulebook> Load(IReadOnlyList<string> paths)
    {
        ImmutableArray<Rulebook> own = OurRulebooks.All;
        if (paths.Count == 0)
        {
            return own;
        }

        var books = own.ToBuilder();
        foreach (string path in paths)
        {
            Rulebook book = OurRulebooks.LoadFurther(path, ReadBytes(path));
            if (!book.Faults.IsEmpty)
            {
                IEnumerable<string> lines = book.Faults.Take(MostFaultsShown).Select(f => string.Create(
                    CultureInfo.InvariantCulture, $"{path}, line {f.Region.StartLine}, column {f.Region.StartColumn}: {f.Message}"));
                throw new CannotRunException(string.Join("\nspec-lint: ", lines));
            }

            books.Add(book);
        }

        return books.ToImmutable();
    }

    private static byte[] ReadBytes(string path)
    {
        try
        {
            return File.ReadAllBytes(path);
        }
        catch (Exception e) when (e is IOException or UnauthorizedAccessException or NotSupportedException)
        {
            throw new CannotRunException($"{path}: {(e is FileNotFoundException or DirectoryNotFoundException ? "there is no such rulebook" : e.Message)}", e);
        }
    }
}
