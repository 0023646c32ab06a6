using SpecLint.Review.Reviewing;

namespace SpecLint.Reporting.Sarif;

/// <summary>Writes reviews that are all at hand as a SARIF log; see <see cref="SarifLogBuilder"/> for the form.</summary>
public static class SarifLogWriter
{
    /// <summary>Writes the log; the stream stays open.</summary>
    /// <param name="reviews">The reviews, in the order in which they are to appear.</param>
    /// <param name="options">What goes in besides them.</param>
    /// <param name="stream">Where to.</param>
    public static void Write(IEnumerable<MachineReview> reviews, SarifOptions options, Stream stream) => Build(reviews, options).Write(stream);

    /// <summary>Writes the log; the writer stays open and decides the encoding.</summary>
    /// <param name="reviews">The reviews, in the order in which they are to appear.</param>
    /// <param name="options">What goes in besides them.</param>
    /// <param name="writer">Where to; its own line ends are not used.</param>
    public static void Write(IEnumerable<MachineReview> reviews, SarifOptions options, TextWriter writer) => Build(reviews, options).Write(writer);

    private static SarifLogBuilder Build(IEnumerable<MachineReview> reviews, SarifOptions options)
    {
        ArgumentNullException.ThrowIfNull(reviews);
        ArgumentNullException.ThrowIfNull(options);
        var log = new SarifLogBuilder(options);
        foreach (MachineReview review in reviews)
        {
            log.Add(review);
        }

        return log;
    }
}
