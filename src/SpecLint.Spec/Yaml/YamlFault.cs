namespace SpecLint.Spec.Yaml;

/// <summary>Something that keeps a text from being YAML as read here.</summary>
/// <param name="Message">What was found and what was expected.</param>
/// <param name="Region">The place to look at.</param>
public sealed record YamlFault(string Message, Region Region)
{
    /// <summary>A second place that belongs to the fault; else null.</summary>
    public Region? Related { get; init; }

    /// <summary>What stands at <see cref="Related"/>; empty when there is none.</summary>
    public string RelatedMessage { get; init; } = "";
}
