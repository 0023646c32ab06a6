using SpecLint.Cli.Paths;
using SpecLint.Spec.Documents;
using SpecLint.Spec.Yaml;

namespace SpecLint.Cli.Reviewing;

/// <summary>Reads specs from files or standard input, with the changes asked for on the command line.</summary>
internal static class SpecSource
{

    /// <summary>Reads one spec.</summary>
    /// <param name="path">File, or <c>-</c>.</param>
    /// <param name="standardInputName">Name for standard input.</param>
    /// <param name="streams">Where standard input is opened.</param>
    /// <exception cref="CannotRunException">The file cannot be read.</exception>
    public static SpecDocument Read(string path, string standardInputName, Streams streams)
    {
        if (path == SpecFiles.StandardInput)
        {
            using Stream input = streams.OpenInput();
            return SpecReader.Read(standardInputName, ReadLimited(input));
        }

        try
        {
            using FileStream file = File.OpenRead(path);
            return SpecReader.Read(path.Replace(Path.DirectorySeparatorChar, '/'), ReadLimited(file));
        }
        catch (Exception e) when (e is IOException or UnauthorizedAccessException or NotSupportedException)
        {
            string reason = e switch
            {
                FileNotFoundException or DirectoryNotFoundException => "there is no such file",
                UnauthorizedAccessException when Directory.Exists(path) => "is a folder",
                _ => e.Message,
            };
            throw new CannotRunException($"{path}: {reason}", e);
        }
    }

    /// <summary>Applies <c>KEY=VALUE</c> changes.</summary>
    /// <param name="spec">The spec.</param>
    /// <param name="changes">The changes as written.</param>
    /// <exception cref="CannotRunException">A change is not of that form, or names a key or value that does not exist.</exception>
    public static SpecDocument Change(SpecDocument spec, IReadOnlyList<string> changes)
    {
        foreach (string change in changes)
        {
            int equals = change.IndexOf('=', StringComparison.Ordinal);
            if (equals <= 0)
            {
                throw new CannotRunException($"--set takes KEY=VALUE, not '{change}'");
            }

            spec = spec.WithText(change[..equals].Trim(), change[(equals + 1)..].Trim(), out SpecFault? fault);
            if (fault is not null)
            {
                throw new CannotRunException($"--set {change}: {fault.Message}");
            }
        }

        return spec;
    }

    private static byte[] ReadLimited(Stream stream)
    {
        using var buffer = new MemoryStream();
        var chunk = new byte[64 * 1024];
        int read;
        while (buffer.Length < YamlLimits.Default.Bytes + 1L && (read = stream.Read(chunk)) > 0)
        {
            buffer.Write(chunk, 0, read);
        }

        return buffer.ToArray();
    }
}
