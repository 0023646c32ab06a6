using System.Reflection;

namespace SpecLint.Tests.Architecture;

/// <summary>The arrows between the projects, and the packages each may name.</summary>
public sealed class ReferenceTests
{
    [Theory]
    [InlineData("SpecLint.Physics", "MathNet.Numerics")]
    [InlineData("SpecLint.Spec", "NJsonSchema,NJsonSchema.Annotations,Newtonsoft.Json,UnitsNet,YamlDotNet")]
    [InlineData("SpecLint.Review", "SpecLint.Spec,SpecLint.Physics")]
    [InlineData("SpecLint.Reporting", "SpecLint.Review,SpecLint.Spec,Sarif,Newtonsoft.Json")]
    [InlineData("spec-lint", "SpecLint.Reporting,SpecLint.Review,SpecLint.Spec,System.CommandLine,Microsoft.Extensions.FileSystemGlobbing")]
    public void Project_References_OnlyWhatItMay(string assembly, string allowed)
    {
        HashSet<string> permitted = [.. allowed.Split(',')];

        IEnumerable<string> foreign = Assembly.Load(assembly).GetReferencedAssemblies()
            .Select(a => a.Name!)
            .Where(name => !IsFramework(name) && !permitted.Contains(name));

        Assert.Empty(foreign);
    }

    private static bool IsFramework(string name) =>
        name is "netstandard" or "mscorlib"
        || (name.StartsWith("System.", StringComparison.Ordinal) && name != "System.CommandLine")
        || name is "System" or "Microsoft.Win32.Primitives";
}
