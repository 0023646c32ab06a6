namespace SpecLint.Spec.Yaml;

/// <summary>How much of a stranger's text is read before reading stops with a fault.</summary>
public sealed record YamlLimits
{
    /// <summary>The limits for specs and rulebooks.</summary>
    public static YamlLimits Default { get; } = new();

    /// <summary>Largest size of the text [bytes].</summary>
    public int Bytes { get; init; } = 2 * 1024 * 1024;

    /// <summary>Deepest nesting of mappings and sequences.</summary>
    public int Depth { get; init; } = 64;

    /// <summary>Largest number of values, each alias counted with all that it repeats.</summary>
    public int Nodes { get; init; } = 50_000;

    /// <summary>Most faults that are told before reading stops.</summary>
    public int Faults { get; init; } = 100;
}
