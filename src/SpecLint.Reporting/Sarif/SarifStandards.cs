using Microsoft.CodeAnalysis.Sarif;
using SpecLint.Review.Figures;
using SpecLint.Review.Rules;

namespace SpecLint.Reporting.Sarif;

/// <summary>The standards that rules cite, as a taxonomy of the run.</summary>
internal sealed class SarifStandards
{
    private const string Name = "standards cited";

    private readonly List<string> _ids;

    /// <summary>The standards of the given rules in ordinal order.</summary>
    /// <param name="rules">All rules of the run.</param>
    public SarifStandards(IEnumerable<Rule> rules)
    {
        _ids = [.. rules.SelectMany(rule => IdsOf(rule.Basis)).Distinct(StringComparer.Ordinal).Order(StringComparer.Ordinal)];
    }

    /// <summary>True when no rule cites a standard.</summary>
    public bool IsEmpty => _ids.Count == 0;

    /// <summary>The component of the run's <c>taxonomies</c>.</summary>
    /// <param name="version">Version of the program, which the list belongs to.</param>
    public ToolComponent Component(string version) => new()
    {
        Name = Name,
        Version = version,
        ShortDescription = SarifText.Description("Standards that the rules of this run cite as the basis of a limit"),
        Taxa = [.. _ids.Select(id => new ReportingDescriptor { Id = id, ShortDescription = SarifText.Description(id) })],
    };

    /// <summary>The driver's pointer to the taxonomy.</summary>
    public static ToolComponentReference Reference() => new() { Name = Name, Index = 0 };

    /// <summary>The relationships of a rule to the standards it cites; null when it cites none.</summary>
    /// <param name="rule">The rule.</param>
    public IList<ReportingDescriptorRelationship>? RelationshipsOf(Rule rule)
    {
        var relationships = IdsOf(rule.Basis).Select(id => new ReportingDescriptorRelationship
        {
            Target = new ReportingDescriptorReference { Id = id, Index = _ids.BinarySearch(id, StringComparer.Ordinal), ToolComponent = Reference() },
            Kinds = ["relevant"],
        }).ToList();
        return relationships.Count == 0 ? null : relationships;
    }

    /// <summary>The standards of a basis: its source split at semicolons, each up to the first comma (what follows is the clause).</summary>
    private static IEnumerable<string> IdsOf(Basis basis) => basis.Kind != BasisKind.Standard ? [] : basis.Source
        .Split(';', StringSplitOptions.TrimEntries | StringSplitOptions.RemoveEmptyEntries)
        .Select(part => Output.Printable.Line(part.Split(',')[0].Trim()))
        .Where(id => id.Length > 0)
        .Distinct(StringComparer.Ordinal);
}
