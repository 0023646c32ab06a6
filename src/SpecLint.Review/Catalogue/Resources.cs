using System.Reflection;

namespace SpecLint.Review.Catalogue;

/// <summary>Files embedded in this assembly.</summary>
internal static class Resources
{
    /// <summary>The files whose resource name starts with a prefix, in ordinal order.</summary>
    /// <param name="prefix">Prefix; what follows it is the file name.</param>
    public static IEnumerable<(string Name, byte[] Bytes)> Of(string prefix)
    {
        Assembly assembly = typeof(Resources).Assembly;
        return assembly.GetManifestResourceNames()
            .Where(n => n.StartsWith(prefix, StringComparison.Ordinal))
            .Order(StringComparer.Ordinal)
            .Select(n => (n[prefix.Length..], Read(assembly, n)));
    }

    private static byte[] Read(Assembly assembly, string name)
    {
        using Stream stream = assembly.GetManifestResourceStream(name)
            ?? throw new InvalidOperationException($"The resource {name} is missing.");
        var bytes = new byte[stream.Length];
        stream.ReadExactly(bytes);
        return bytes;
    }
}
