namespace SpecLint.Cli;

/// <summary>Where a command reads and writes.</summary>
/// <param name="Output">Results as text.</param>
/// <param name="RawOutput">The stream below <paramref name="Output"/>, for results written as bytes; flush the text first.</param>
/// <param name="Error">Messages.</param>
/// <param name="OpenInput">Opens standard input.</param>
internal sealed record Streams(TextWriter Output, Stream RawOutput, TextWriter Error, Func<Stream> OpenInput);
