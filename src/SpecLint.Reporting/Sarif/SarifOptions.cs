using System.Collections.Immutable;
using System.Reflection;
using SpecLint.Review.Rules;

namespace SpecLint.Reporting.Sarif;

/// <summary>What goes into a SARIF log besides the reviews.</summary>
public sealed record SarifOptions
{
    /// <summary>Every rule loaded, in the order of the rulebooks; rules that findings name are added when they are not among them.</summary>
    public ImmutableArray<Rule> Rules { get; init; } = [];

    /// <summary>The folder that paths are told from, absolute; needed only when a spec's path is absolute.</summary>
    public string WorkingFolder { get; init; } = "";

    /// <summary>Also write rules that are met, open or not applicable.</summary>
    public bool IncludesAll { get; init; }

    /// <summary>Leave out findings that a waiver excuses, for hosts that would show them as unanswered.</summary>
    public bool LeavesOutWaived { get; init; }

    /// <summary>False when a spec or a rulebook could not be read.</summary>
    public bool RanToTheEnd { get; init; } = true;

    /// <summary>Version of the program, by default that of the assembly.</summary>
    public string ProgramVersion { get; init; } =
        typeof(SarifOptions).Assembly.GetCustomAttribute<AssemblyInformationalVersionAttribute>()?.InformationalVersion ?? "0.0.0";
}
