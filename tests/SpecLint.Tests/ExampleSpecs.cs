using SpecLint.Spec.Documents;

namespace SpecLint.Tests;

/// <summary>The specs of <c>specs-examples</c>, read from beside the tests.</summary>
internal static class ExampleSpecs
{
    public static string Folder { get; } = Path.Combine(AppContext.BaseDirectory, "specs-examples");

    public static IEnumerable<string> Names { get; } =
        [.. Directory.GetFiles(Folder, "*.yaml").Select(f => Path.GetFileNameWithoutExtension(f)).Order(StringComparer.Ordinal)];

    public static TheoryData<string> All => [.. Names];

    public static SpecDocument Read(string name) =>
        SpecReader.Read($"specs-examples/{name}.yaml", File.ReadAllBytes(Path.Combine(Folder, $"{name}.yaml")));

    public static SpecDocument? Find(string name) => File.Exists(Path.Combine(Folder, $"{name}.yaml")) ? Read(name) : null;
}
