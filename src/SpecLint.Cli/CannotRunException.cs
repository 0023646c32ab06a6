namespace SpecLint.Cli;

/// <summary>The command cannot be carried out; the message is one line for the user.</summary>
internal sealed class CannotRunException : Exception
{
    public CannotRunException()
    {
    }

    public CannotRunException(string message)
        : base(message)
    {
    }

    public CannotRunException(string message, Exception innerException)
        : base(message, innerException)
    {
    }
}
