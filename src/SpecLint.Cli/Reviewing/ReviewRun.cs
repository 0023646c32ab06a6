using System.Collections.Immutable;
using SpecLint.Cli.Paths;
using SpecLint.Reporting.Listings;
using SpecLint.Reporting.Output;
using SpecLint.Reporting.Sarif;
using SpecLint.Reporting.Sheets;
using SpecLint.Review.Catalogue;
using SpecLint.Review.Figures;
using SpecLint.Review.Reviewing;
using SpecLint.Review.Rules;
using SpecLint.Spec.Documents;
using SpecLint.Spec.Schema;

namespace SpecLint.Cli.Reviewing;

/// <summary>Carries out the review command.</summary>
internal static class ReviewRun
{
    /// <summary>Reviews every spec, prints sheets in order, writes the log.</summary>
    /// <param name="request">What was asked for.</param>
    /// <param name="streams">Where to.</param>
    public static ExitCode Execute(ReviewRequest request, Streams streams)
    {
        // Start-up is most of a cold review: the schema and the rulebooks load beside the reading of the first spec.
        _ = SchemaCheck.Prepare();
        Task<RulebookSource> loading = Task.Run(() => RulebookSource.Load(request.Rulebooks, request.HousePath));
        var problems = new List<string>();
        IReadOnlyList<string> files = SpecFiles.Expand(request.Paths, problems);
        IReadOnlyList<Attempt> attempted = files.Count == 1 ? [ReviewOne(files[0], request, loading, streams)] : [];
        ImmutableArray<Rulebook> books = loading.GetAwaiter().GetResult().Books;
        SheetOptions sheet = Terminal.SheetOptions(request.IncludesAll);
        SarifLogBuilder? log = request.SarifPath is null ? null : NewLog(request, books);
        var summary = new SummaryTable();
        var kept = new List<MachineReview>();
        bool fails = false;
        using (var progress = new Progress(files.Count, streams.Error))
        {
            foreach (Attempt attempt in files.Count == 1 ? attempted : (IEnumerable<Attempt>)InParallel(files, request, loading, streams))
            {
                progress.Step();
                if (attempt.Review is not { } review)
                {
                    problems.Add(attempt.Problem);
                    continue;
                }

                fails |= review.Gravest >= request.FailAt;
                summary.Add(review);
                log?.Add(review);
                if (request.PrintsJson)
                {
                    review.Figures?.ForgetParts();
                    kept.Add(review);
                }
                else
                {
                    progress.Clear();
                    PrintSheet(review, files.Count, sheet, streams.Output);
                }
            }
        }

        if (request.PrintsJson && summary.Count > 0)
        {
            streams.Output.Flush();
            JsonSummary.Write(kept, sheet, streams.RawOutput);
        }
        else if (summary.Count > 1)
        {
            summary.Write(sheet, streams.Output);
        }

        if (log is not null && summary.Count > 0)
        {
            WriteLog(request.SarifPath!, log, problems);
        }

        problems.ForEach(p => streams.Error.WriteLine($"spec-lint: {p}"));
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

    private static SarifLogBuilder NewLog(ReviewRequest request, ImmutableArray<Rulebook> books) => new(new SarifOptions
    {
        Rules = [.. books.SelectMany(b => b.Rules)],
        WorkingFolder = Directory.GetCurrentDirectory(),
        IncludesAll = request.IncludesAll,
        LeavesOutWaived = request.LeavesOutWaived,
    });

    private static void WriteLog(string path, SarifLogBuilder log, List<string> problems)
    {
        if (problems.Count > 0)
        {
            log.MarkIncomplete();
        }

        try
        {
            AtomicFile.Write(path, log.Write);
        }
        catch (OutputException e)
        {
            problems.Add(e.Message);
        }
    }

    /// <summary>The reviews of many specs, computed side by side and handed out in the order of the paths.</summary>
    private static ParallelQuery<Attempt> InParallel(IReadOnlyList<string> files, ReviewRequest request, Task<RulebookSource> rules, Streams streams) => files
        .AsParallel()
        .AsOrdered()
        .WithMergeOptions(ParallelMergeOptions.NotBuffered)
        .Select(file => ReviewOne(file, request, rules, streams));

    private static Attempt ReviewOne(string file, ReviewRequest request, Task<RulebookSource> rules, Streams streams)
    {
        SpecDocument spec;
        try
        {
            spec = SpecSource.Change(SpecSource.Read(file, request.StandardInputName, streams), request.Changes);
        }
        catch (CannotRunException e)
        {
            return new Attempt(null, e.Message);
        }

        FigureGraph? graph = ReadingReview.LeavesMachine(spec) ? new FigureGraph(spec, OurFigures.Catalogue) : null;
        if (graph is not null && !rules.IsCompleted)
        {
            // The costliest figure that nearly every review needs; the rulebooks are still loading.
            _ = graph["coil.hole.worth"];
        }

        RulebookSource source = rules.GetAwaiter().GetResult();
        var options = new ReviewOptions { On = request.On, Waivers = source.Waivers };
        return new Attempt(Reviewer.Review(spec, graph, source.Books, options), "");
    }

    private readonly record struct Attempt(MachineReview? Review, string Problem);
}
