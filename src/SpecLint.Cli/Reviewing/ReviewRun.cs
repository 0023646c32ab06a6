using System.Collections.Immutable;
using SpecLint.Cli.Paths;
using SpecLint.Reporting.Listings;
using SpecLint.Reporting.Output;
using SpecLint.Reporting.Sarif;
using SpecLint.Reporting.Sheets;
using SpecLint.Review.Catalogue;
using SpecLint.Review.Reviewing;
using SpecLint.Review.Rules;
using SpecLint.Spec.Documents;

namespace SpecLint.Cli.Reviewing;

/// <summary>Carries out the review command.</summary>
internal static class ReviewRun
{
    /// <summary>Reviews every spec, prints sheets in order, writes the log.</summary>
    /// <param name="request">What was asked for.</param>
    /// <param name="streams">Where to.</param>
    public static ExitCode Execute(ReviewRequest request, Streams streams)
    {
        var problems = new List<string>();
        IReadOnlyList<string> files = SpecFiles.Expand(request.Paths, problems);
        ImmutableArray<Rulebook> books = RulebookSource.Load(request.Rulebooks);
        var options = new ReviewOptions { On = request.On };
        var reviews = new List<MachineReview>(files.Count);
        SheetOptions sheet = Terminal.SheetOptions(request.IncludesAll);
        using (var progress = new Progress(files.Count, streams.Error))
        {
            foreach (Attempt attempt in Attempts(files, request, books, options, streams))
            {
                progress.Step();
                if (attempt.Review is not { } review)
                {
                    problems.Add(attempt.Problem);
                    continue;
                }

                if (!request.PrintsJson)
                {
                    progress.Clear();
                    PrintSheet(review, files.Count, sheet, streams.Output);
                }

                reviews.Add(review);
                if (files.Count > 1)
                {
                    review.Figures?.ForgetParts();
                }
            }
        }

        Finish(request, reviews, books, sheet, problems, streams);
        bool fails = reviews.Any(r => r.Gravest >= request.FailAt);
        return problems.Count > 0 ? ExitCode.CouldNotRun : fails ? ExitCode.Findings : ExitCode.Clear;
    }

    private static void PrintSheet(MachineReview review, int files, SheetOptions sheet, TextWriter output)
    {
        TextSheet.Write(review, sheet, output);
        if (files > 1)
        {
            output.Write("\n\n");
        }

        output.Flush();
    }

    private static void Finish(
        ReviewRequest request,
        List<MachineReview> reviews,
        ImmutableArray<Rulebook> books,
        SheetOptions sheet,
        List<string> problems,
        Streams streams)
    {
        if (reviews.Count > 0 && request.PrintsJson)
        {
            streams.Output.Flush();
            JsonSummary.Write(reviews, sheet, streams.RawOutput);
        }
        else if (reviews.Count > 1)
        {
            TextSheet.WriteSummary(reviews, sheet, streams.Output);
        }

        if (request.SarifPath is { } path && reviews.Count > 0)
        {
            WriteLog(path, request, reviews, books, problems);
        }

        foreach (string problem in problems)
        {
            streams.Error.WriteLine($"spec-lint: {problem}");
        }
    }

    private static void WriteLog(
        string path,
        ReviewRequest request,
        List<MachineReview> reviews,
        ImmutableArray<Rulebook> books,
        List<string> problems)
    {
        var options = new SarifOptions
        {
            Rules = [.. books.SelectMany(b => b.Rules)],
            WorkingFolder = Directory.GetCurrentDirectory(),
            IncludesAll = request.IncludesAll,
            LeavesOutWaived = request.LeavesOutWaived,
            RanToTheEnd = problems.Count == 0,
        };
        try
        {
            AtomicFile.Write(path, stream => SarifLogWriter.Write(reviews, options, stream));
        }
        catch (OutputException e)
        {
            problems.Add(e.Message);
        }
    }

    private static IEnumerable<Attempt> Attempts(
        IReadOnlyList<string> files,
        ReviewRequest request,
        ImmutableArray<Rulebook> books,
        ReviewOptions options,
        Streams streams)
    {
        Attempt One(string file)
        {
            try
            {
                SpecDocument spec = SpecSource.Change(SpecSource.Read(file, request.StandardInputName, streams), request.Changes);
                return new Attempt(Reviewer.Review(spec, OurFigures.Catalogue, books, options), "");
            }
            catch (CannotRunException e)
            {
                return new Attempt(null, e.Message);
            }
        }

        // Sheets come out in the order of the paths; a single spec does not pay for the query's start.
        return files.Count < 2
            ? files.Select(One)
            : files.AsParallel().AsOrdered().WithMergeOptions(ParallelMergeOptions.NotBuffered).Select(One);
    }

    private readonly record struct Attempt(MachineReview? Review, string Problem);
}
