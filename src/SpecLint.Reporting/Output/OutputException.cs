namespace SpecLint.Reporting.Output;

/// <summary>A file could not be written.</summary>
public sealed class OutputException : IOException
{
    /// <summary>A failure without details.</summary>
    public OutputException()
    {
    }

    /// <summary>A failure with its reason.</summary>
    /// <param name="message">Which file and why, in one sentence.</param>
    public OutputException(string message)
        : base(message)
    {
    }

    /// <summary>A failure with its reason and its cause.</summary>
    /// <param name="message">Which file and why, in one sentence.</param>
    /// <param name="innerException">The cause.</param>
    public OutputException(string message, Exception innerException)
        : base(message, innerException)
    {
    }
}
