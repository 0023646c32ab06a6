using System.Collections.Immutable;
using System.Globalization;
using SpecLint.Review.Catalogue;
using SpecLint.Review.Findings;
using SpecLint.Review.Rules;

namespace SpecLint.Cli.Reviewing;

/// <summary>The rules of a review: our rulebooks, those named on the command line, and what a house file changes.</summary>
/// <param name="Books">The rulebooks with the house's bounds and grades.</param>
/// <param name="Waivers">The house's waivers.</param>
internal sealed record RulebookSource(ImmutableArray<Rulebook> Books, ImmutableArray<Waiver> Waivers)
{
    private const int MostFaultsShown = 20;

    /// <summary>Loads our rulebooks, the given files, and a house file.</summary>
    /// <param name="paths">Rulebook files of the user.</param>
    /// <param name="housePath">House file, or null.</param>
    /// <exception cref="CannotRunException">A file cannot be read or is faulty.</exception>
    public static RulebookSource Load(IReadOnlyList<string> paths, string? housePath = null)
    {
        ImmutableArray<Rulebook>.Builder books = OurRulebooks.All.ToBuilder();
        foreach (string path in paths)
        {
            books.Add(LoadBook(path));
        }

        if (housePath is null)
        {
            return new RulebookSource(books.ToImmutable(), []);
        }

        byte[] bytes = ReadBytes(housePath, "house file");
        string folder = Path.GetDirectoryName(housePath) ?? "";
        foreach (string path in HouseLoader.ReadRulebookPaths(bytes))
        {
            books.Add(LoadBook(Path.Combine(folder, path)));
        }

        House house = HouseLoader.Load(bytes, OurRulebooks.Scope, books.ToImmutable());
        Refuse(housePath, house.Faults);
        return new RulebookSource(house.Books, house.Waivers);
    }

    private static Rulebook LoadBook(string path)
    {
        Rulebook book = OurRulebooks.LoadFurther(path, ReadBytes(path, "rulebook"));
        Refuse(path, book.Faults);
        return book;
    }

    private static void Refuse(string path, ImmutableArray<RulebookFault> faults)
    {
        if (!faults.IsEmpty)
        {
            IEnumerable<string> lines = faults.Take(MostFaultsShown).Select(f => string.Create(
                CultureInfo.InvariantCulture, $"{path}, line {f.Region.StartLine}, column {f.Region.StartColumn}: {f.Message}"));
            throw new CannotRunException(string.Join("\nspec-lint: ", lines));
        }
    }

    private static byte[] ReadBytes(string path, string what)
    {
        try
        {
            return File.ReadAllBytes(path);
        }
        catch (Exception e) when (e is IOException or UnauthorizedAccessException or NotSupportedException)
        {
            throw new CannotRunException($"{path}: {(e is FileNotFoundException or DirectoryNotFoundException ? $"there is no such {what}" : e.Message)}", e);
        }
    }
}
