namespace SpecLint.Spec.Yaml;

/// <summary>Ends the reading of a text at once; never leaves the reader.</summary>
internal sealed class YamlStopException(YamlFault fault) : Exception(fault.Message)
{
    internal YamlFault Fault { get; } = fault;
}
