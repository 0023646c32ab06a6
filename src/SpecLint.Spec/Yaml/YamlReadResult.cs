using System.Collections.Immutable;

namespace SpecLint.Spec.Yaml;

/// <summary>A text as read: its tree as far as it goes, and every fault met on the way.</summary>
/// <param name="Text">The decoded text without byte-order mark; empty when it could not be decoded.</param>
/// <param name="Root">The document's value; null when there is none or reading had to stop.</param>
/// <param name="Faults">The faults in order of position.</param>
public sealed record YamlReadResult(string Text, YamlNode? Root, ImmutableArray<YamlFault> Faults);
