using System.Collections.Immutable;

namespace SpecLint.Spec.Yaml;

/// <summary>One node of a YAML 1.2 document with its place in the text.</summary>
/// <param name="Region">Where the value stands (for an alias: where the anchor's value stands).</param>
public abstract record YamlNode(Region Region)
{
    /// <summary>Where the alias stands when this value was reached through one; else null.</summary>
    public Region? AliasSite { get; init; }
}

/// <summary>A scalar with its text as written.</summary>
/// <param name="Region">Where it stands, quotes included.</param>
/// <param name="Text">The text after quotes and escapes are resolved.</param>
/// <param name="IsPlain">True when unquoted, so that the core schema may read it as a number, a boolean or null.</param>
public sealed record YamlScalar(Region Region, string Text, bool IsPlain) : YamlNode(Region)
{
    /// <summary>True for the stand-in of an alias that leads nowhere; its fault has been told.</summary>
    internal bool IsBroken { get; init; }
}

/// <summary>A mapping with its entries in order of appearance; keys are scalars and unique.</summary>
/// <param name="Region">Where it stands.</param>
/// <param name="Entries">The entries.</param>
public sealed record YamlMapping(Region Region, ImmutableArray<YamlEntry> Entries) : YamlNode(Region);

/// <summary>A sequence.</summary>
/// <param name="Region">Where it stands.</param>
/// <param name="Items">The items in order.</param>
public sealed record YamlSequence(Region Region, ImmutableArray<YamlNode> Items) : YamlNode(Region);

/// <summary>One key with its value.</summary>
/// <param name="Key">The key.</param>
/// <param name="Value">The value.</param>
public sealed record YamlEntry(YamlScalar Key, YamlNode Value);
