namespace SpecLint.Cli;

/// <summary>Where a command reads and writes.</summary>
/// <param name="Output">Results.</param>
/// <param name="Error">Messages.</param>
/// <param name="OpenInput">Opens standard input.</param>
internal sealed record Streams(TextWriter Output, TextWriter Error, Func<Stream> OpenInput);
