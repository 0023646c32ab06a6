using System.Reflection;
using Microsoft.CodeAnalysis.Sarif;
using Newtonsoft.Json;
using Newtonsoft.Json.Serialization;

namespace SpecLint.Reporting.Sarif;

/// <summary>
/// Writes the level and the kind of every result and the level of every rule, also where they are the default: a missing level
/// would be read from the rule, which is wrong for a finding milder than its rule.
/// </summary>
internal sealed class SarifContract : DefaultContractResolver
{
    /// <inheritdoc />
    protected override JsonProperty CreateProperty(MemberInfo member, MemberSerialization memberSerialization)
    {
        JsonProperty property = base.CreateProperty(member, memberSerialization);
        bool isAlwaysWritten = (property.DeclaringType == typeof(Result) && property.PropertyName is "level" or "kind")
            || (property.DeclaringType == typeof(ReportingConfiguration) && property.PropertyName == "level")
            || (property.DeclaringType == typeof(ReportingDescriptor) && property.PropertyName == "defaultConfiguration");
        if (isAlwaysWritten)
        {
            property.DefaultValueHandling = DefaultValueHandling.Include;
            property.NullValueHandling = NullValueHandling.Ignore;
            property.ShouldSerialize = null;
        }

        return property;
    }
}
