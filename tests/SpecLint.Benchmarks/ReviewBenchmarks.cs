using System.Collections.Immutable;
using System.Text;
using BenchmarkDotNet.Attributes;
using SpecLint.Review.Catalogue;
using SpecLint.Review.Reviewing;
using SpecLint.Review.Rules;
using SpecLint.Spec.Documents;

namespace SpecLint.Benchmarks;

/// <summary>Reading and reviewing an example, warm: one spec, and two hundred that differ in gap and turns.</summary>
[MemoryDiagnoser]
public class ReviewBenchmarks
{
    private const int Many = 200;

    private ImmutableArray<Rulebook> _books;
    private byte[] _one = [];
    private byte[][] _many = [];

    [GlobalSetup]
    public void Prepare()
    {
        _books = OurRulebooks.All;
        string text = File.ReadAllText(Find("specs-examples/wind-1kw.yaml"));
        _one = Encoding.UTF8.GetBytes(text);
        SpecDocument spec = SpecReader.Read("a.yaml", _one);
        string clearance = spec.Find("gap.clearance")!.Text;
        string turns = "turns: " + spec.Find("winding.turns")!.Text;
        _many = [.. Enumerable.Range(0, Many).Select(i => Encoding.UTF8.GetBytes(text
            .Replace(clearance, FormattableString.Invariant($"{1.2 + (0.005 * i):F3} mm ± 0.2 mm"), StringComparison.Ordinal)
            .Replace(turns, FormattableString.Invariant($"turns: {30 + (i % 20)}"), StringComparison.Ordinal)))];
    }

    [Benchmark]
    public SpecDocument Read() => SpecReader.Read("a.yaml", _one);

    [Benchmark]
    public int ReadAndReviewOne() => Review(_one);

    [Benchmark]
    public int ReadAndReviewTwoHundredOnAllCores() => _many.AsParallel().Select(Review).Sum();

    private int Review(byte[] bytes) =>
        Reviewer.Review(SpecReader.Read("a.yaml", bytes), OurFigures.Catalogue, _books, ReviewOptions.Default).Findings.Length;

    private static string Find(string name)
    {
        for (DirectoryInfo? folder = new(AppContext.BaseDirectory); folder is not null; folder = folder.Parent)
        {
            string path = Path.Combine(folder.FullName, name);
            if (File.Exists(path))
            {
                return path;
            }
        }

        throw new FileNotFoundException(name);
    }
}
