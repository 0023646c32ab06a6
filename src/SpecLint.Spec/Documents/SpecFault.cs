using SpecLint.Spec.Yaml;

namespace SpecLint.Spec.Documents;

/// <summary>Something wrong with the text of a spec: syntax, schema, units, or a key of another topology (rule DOC-01).</summary>
/// <param name="Key">Dotted key concerned, or of the nearest parent; empty for the document.</param>
/// <param name="Message">What was found and what was expected, in one sentence.</param>
/// <param name="Region">The place to look at.</param>
public sealed record SpecFault(string Key, string Message, Region Region)
{
    /// <summary>A second place that belongs to the fault, such as the first of two equal keys; else null.</summary>
    public Region? Related { get; init; }

    /// <summary>What stands at <see cref="Related"/>; empty when there is none.</summary>
    public string RelatedMessage { get; init; } = "";

    /// <summary>The known key that a mistyped one may have meant; empty when there is none.</summary>
    public string SuggestedKey { get; init; } = "";

    /// <summary>The dotted key that is absent, when that is the fault; else empty.</summary>
    public string AbsentKey { get; init; } = "";
}
