using System.Text;
using System.Text.Json;
using SpecLint.Reporting.Listings;
using SpecLint.Reporting.Sheets;
using SpecLint.Review.Figures;
using SpecLint.Review.Reviewing;

namespace SpecLint.Tests.Reporting;

public sealed class ListingTests
{
    private static FigureGraph Graph => new(SampleSpec.Read(), SampleFigures.Catalogue());

    [Fact]
    public void JsonSummary_EveryKindOfFinding_MatchesGolden() => Golden.Matches(
        "reporting.summary.golden.json",
        Bytes(s => JsonSummary.Write([SampleReviews.Held(), SampleReviews.Unreadable()], new SheetOptions { IncludesAll = true }, s)));

    [Fact]
    public void JsonSummary_Review_HasOutcomeFindingsAndHazards()
    {
        using JsonDocument document = JsonDocument.Parse(Bytes(s => JsonSummary.Write([SampleReviews.Held()], new SheetOptions(), s)));
        JsonElement review = document.RootElement.GetProperty("reviews")[0];
        Assert.Equal("held", review.GetProperty("outcome").GetString());
        Assert.Equal("Small wind generator", review.GetProperty("title").GetString());
        Assert.Equal(["FIT-04", "THM-01", "DOC-02"], review.GetProperty("findings").EnumerateArray().Select(f => f.GetProperty("rule").GetString()));
        Assert.Equal("SAF-01", review.GetProperty("hazards")[0].GetProperty("rule").GetString());
        Assert.False(review.TryGetProperty("met", out _));
        Assert.Equal(105, review.GetProperty("findings")[1].GetProperty("bound").GetDouble());
    }

    [Fact]
    public void FigureListing_Json_MatchesGolden() => Golden.Matches("reporting.figures.golden.json", Bytes(s => FigureListing.WriteJson(Graph.All(), s)));

    [Fact]
    public void FigureListing_Json_ReadsBackExactlyInSi()
    {
        using JsonDocument document = JsonDocument.Parse(Bytes(s => FigureListing.WriteJson(Graph.All(), s)));
        JsonElement figures = document.RootElement.GetProperty("figures");
        foreach (Figure figure in Graph.All().Where(f => f.Outcome.HasValue))
        {
            JsonElement written = figures.GetProperty(figure.Name);
            Assert.Equal(figure.Outcome.Value, written.GetProperty("value").GetDouble());
            Assert.Equal(figure.Outcome.Uncertainty, written.GetProperty("uncertainty").GetDouble());
            Assert.Equal(figure.Definition.Unit, written.GetProperty("unit").GetString());
            Assert.Equal(figure.Outcome.IsAssumed, written.GetProperty("assumed").GetBoolean());
        }

        JsonElement lacking = document.RootElement.GetProperty("without-value");
        Assert.Equal("missing", lacking.GetProperty("current.phase.rms").GetProperty("reason").GetString());
        Assert.Equal("ratings.power", lacking.GetProperty("current.phase.rms").GetProperty("missing-keys")[0].GetString());
        Assert.Equal("not-applicable", lacking.GetProperty("flux-density.tooth").GetProperty("reason").GetString());
        Assert.Equal("out-of-domain", lacking.GetProperty("speed.charging").GetProperty("reason").GetString());
    }

    [Fact]
    public void FigureListing_Text_MatchesGolden() =>
        Golden.Matches("reporting.figures.golden.txt", Text(w => FigureListing.WriteText(Graph.All(), new SheetOptions { IncludesAll = true }, w)));

    [Fact]
    public void FigureListing_LongName_StaysWithinEightyColumns()
    {
        FigureDefinition definition = SampleFigures.Catalogue()["gap.magnetic"] with { Name = "gap.magnetic.between-the-faces.worst-case" };
        var figure = new Figure(definition, Outcome.Of(0.0123456, 0.0001), []);
        string text = Text(w => FigureListing.WriteText([figure], new SheetOptions(), w));
        Assert.Contains("gap.magnetic.between-the-faces.worst-case 12.35  mm", text, StringComparison.Ordinal);
        Assert.All(text.Split('\n'), line => Assert.InRange(line.Length, 0, 80));
    }

    [Fact]
    public void WorkingListing_Text_MatchesGolden() => Golden.Matches(
        "reporting.working.golden.txt", Text(w => WorkingListing.WriteText(Graph, "emf.phase.rms", new WorkingOptions { Depth = 3 }, w)));

    [Fact]
    public void WorkingListing_Markdown_MatchesGolden() => Golden.Matches(
        "reporting.working.golden.md", Text(w => WorkingListing.WriteMarkdown(Graph, "emf.phase.rms", new WorkingOptions { Depth = 2 }, w)));

    [Fact]
    public void WorkingListing_Text_ShowsEachInputsLine()
    {
        string text = Text(w => WorkingListing.WriteText(Graph, "gap.magnetic", new WorkingOptions { Layout = new SheetOptions { Width = 100 } }, w));
        Assert.Contains("winding.coil.thickness = 13 mm ± 0.2 mm   (specs/wind.yaml, line 16)", text, StringComparison.Ordinal);
        Assert.Contains("13 mm + 2 · 1.5 mm", text, StringComparison.Ordinal);
    }

    [Fact]
    public void WorkingListing_SquaredValue_StandsInBrackets() => Assert.Contains(
        "(52 mm)²", Text(w => WorkingListing.WriteText(Graph, "linkage.coil.fundamental", new WorkingOptions { Depth = 0 }, w)), StringComparison.Ordinal);

    [Theory]
    [InlineData(0, 1)]
    [InlineData(1, 3)]
    [InlineData(2, 5)]
    [InlineData(9, 6)]
    public void WorkingListing_Depth_UnfoldsThatManyLevels(int depth, int steps)
    {
        using JsonDocument document = JsonDocument.Parse(Bytes(s => WorkingListing.WriteJson(Graph, "emf.phase.rms", new WorkingOptions { Depth = depth }, s)));
        Assert.Equal(steps, document.RootElement.GetProperty("steps").GetArrayLength());
    }

    [Theory]
    [InlineData("current.phase.rms", "current.phase.rms: needs ratings.power")]
    [InlineData("flux-density.tooth", "flux-density.tooth: not applicable: a coreless stator has no teeth")]
    [InlineData("ambient.temperature", "ambient.temperature = 40 °C")]
    public void WorkingListing_FigureWithoutNumber_SaysWhy(string figure, string start) =>
        Assert.StartsWith(start, Text(w => WorkingListing.WriteText(Graph, figure, new WorkingOptions(), w)), StringComparison.Ordinal);

    [Fact]
    public void RuleListing_OneRule_MatchesGolden() => Golden.Matches(
        "reporting.rules.golden.txt",
        Text(w =>
        {
            RuleListing.WriteText(SampleReviews.HoleRule, new SheetOptions(), w);
            w.Write('\n');
            RuleListing.WriteText(SampleReviews.CrushRule, new SheetOptions(), w);
            w.Write('\n');
            RuleListing.WriteTable(SampleReviews.Rules, new SheetOptions(), w);
        }));

    [Fact]
    public void RuleListing_Json_HasEveryRule()
    {
        using JsonDocument document = JsonDocument.Parse(Bytes(s => RuleListing.WriteJson(SampleReviews.Rules, s)));
        JsonElement rules = document.RootElement.GetProperty("rules");
        Assert.Equal(SampleReviews.Rules.Select(r => r.Id), rules.EnumerateArray().Select(r => r.GetProperty("id").GetString()));
        Assert.Equal("coil.hole.extent / magnets.width at most 1.1 (query), at most 1.6 (hold)", rules[0].GetProperty("requirement").GetString());
    }

    [Fact]
    public void Json_HostileTitle_HasNoRawControlCharacters()
    {
        string text = SampleSpec.Text.Replace("Small wind generator", "Evil \u001b]0;owned\u0007 \u202etitle \" \\", StringComparison.Ordinal);
        MachineReview review = SampleReviews.Held(text: text);
        string json = Bytes(s => JsonSummary.Write([review], new SheetOptions(), s));
        Assert.DoesNotContain(json, c => (char.IsControl(c) && c != '\n') || c == '\u202e');
        using JsonDocument document = JsonDocument.Parse(json);
        Assert.Equal("Evil <U+001B>]0;owned<U+0007> <U+202E>title \" \\", document.RootElement.GetProperty("reviews")[0].GetProperty("title").GetString());
    }

    private static string Bytes(Action<Stream> write)
    {
        using var stream = new MemoryStream();
        write(stream);
        return Encoding.UTF8.GetString(stream.ToArray());
    }

    private static string Text(Action<TextWriter> write)
    {
        using var text = new StringWriter();
        write(text);
        return text.ToString();
    }
}
