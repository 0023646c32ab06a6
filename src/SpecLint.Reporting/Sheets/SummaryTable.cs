using System.Globalization;
using SpecLint.Review.Findings;
using SpecLint.Review.Reviewing;
using SpecLint.Review.Rules;
using SpecLint.Reporting.Output;

namespace SpecLint.Reporting.Sheets;

/// <summary>The table that closes a review of several specs; keeps numbers, not reviews.</summary>
public sealed class SummaryTable
{
    private readonly List<Row> _rows = [];

    /// <summary>Number of specs in the table.</summary>
    public int Count => _rows.Count;

    /// <summary>Adds a review behind those added before.</summary>
    /// <param name="review">The review.</param>
    public void Add(MachineReview review)
    {
        ArgumentNullException.ThrowIfNull(review);
        var unmet = review.Unmet.ToLookup(f => f.Grade);
        _rows.Add(new Row(
            review.Outcome,
            unmet[Grade.Hold].Count(),
            unmet[Grade.Query].Count(),
            unmet[Grade.Remark].Count(),
            review.Findings.Count(f => f.Kind == FindingKind.Open),
            Printable.Line(review.Spec.Path)));
    }

    /// <summary>Writes the table.</summary>
    /// <param name="options">Width and colour.</param>
    /// <param name="writer">Where to.</param>
    public void Write(SheetOptions options, TextWriter writer)
    {
        ArgumentNullException.ThrowIfNull(options);
        ArgumentNullException.ThrowIfNull(writer);
        var page = new TextPage(writer, options);
        page.Line(string.Create(CultureInfo.InvariantCulture, $"{_rows.Count} {(_rows.Count == 1 ? "spec" : "specs")} reviewed"), Emphasis.Heading);
        page.Line("  outcome                holds  queries  remarks  open  spec", Emphasis.Quiet);
        foreach (Row row in _rows)
        {
            string counts = string.Create(CultureInfo.InvariantCulture, $"{row.Holds,5}  {row.Queries,7}  {row.Remarks,7}  {row.Open,4}  ");
            page.Wrapped($"  {ReviewWords.Outcome(row.Outcome),-21}  {counts}", row.Path);
        }
    }

    private readonly record struct Row(ReviewOutcome Outcome, int Holds, int Queries, int Remarks, int Open, string Path);
}
