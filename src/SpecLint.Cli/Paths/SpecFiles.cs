using Microsoft.Extensions.FileSystemGlobbing;
using Microsoft.Extensions.FileSystemGlobbing.Abstractions;

namespace SpecLint.Cli.Paths;

/// <summary>Turns the paths of a command line into spec files.</summary>
internal static class SpecFiles
{
    /// <summary>The word for standard input.</summary>
    public const string StandardInput = "-";

    private const int HeadLength = 64 * 1024;

    /// <summary>
    /// Files as they are named; folders and patterns to the YAML files in them that have a top-level key <c>spec</c>,
    /// in ordinal order, each file once.
    /// </summary>
    /// <param name="paths">Files, folders, patterns with <c>*</c>, <c>**</c> or <c>?</c>, or <c>-</c>.</param>
    /// <param name="problems">Receives one line for each path that gives nothing.</param>
    public static IReadOnlyList<string> Expand(IEnumerable<string> paths, List<string> problems)
    {
        var files = new List<string>();
        var seen = new HashSet<string>(StringComparer.Ordinal);
        foreach (string path in paths)
        {
            foreach (string file in Resolve(path, problems))
            {
                if (seen.Add(file))
                {
                    files.Add(file);
                }
            }
        }

        return files;
    }

    private static List<string> Resolve(string path, List<string> problems)
    {
        if (path == StandardInput || File.Exists(path))
        {
            return [path];
        }

        try
        {
            List<string>? found = Directory.Exists(path) ? InFolder(path, "**/*.yaml", "**/*.yml")
                : path.AsSpan().ContainsAny('*', '?') ? InFolder(".", path)
                : null;
            if (found is null)
            {
                problems.Add($"{path}: there is no such file or folder");
            }
            else if (found.Count == 0)
            {
                problems.Add($"{path}: no spec found (a YAML file with a top-level key 'spec')");
            }

            return found ?? [];
        }
        catch (Exception e) when (e is IOException or UnauthorizedAccessException or ArgumentException)
        {
            problems.Add($"{path}: {e.Message}");
            return [];
        }
    }

    private static List<string> InFolder(string folder, params ReadOnlySpan<string> patterns)
    {
        var matcher = new Matcher(StringComparison.Ordinal);
        foreach (string pattern in patterns)
        {
            matcher.AddInclude(pattern);
        }

        PatternMatchingResult result = matcher.Execute(new DirectoryInfoWrapper(new DirectoryInfo(folder)));
        var files = result.Files
            .Select(f => folder == "." ? f.Path : Path.Join(folder, f.Path))
            .Select(f => f.Replace(Path.DirectorySeparatorChar, '/'))
            .Where(LooksLikeSpec)
            .ToList();
        files.Sort(StringComparer.Ordinal);
        return files;
    }

    private static bool LooksLikeSpec(string file)
    {
        try
        {
            using var reader = new StreamReader(file);
            var head = new char[HeadLength];
            int length = reader.ReadBlock(head);
            ReadOnlySpan<char> text = head.AsSpan(0, length);
            foreach (ReadOnlySpan<char> line in text.EnumerateLines())
            {
                if (line.StartsWith("spec:") || line.StartsWith("\"spec\":") || line.StartsWith("{spec:"))
                {
                    return true;
                }
            }

            return false;
        }
        catch (Exception e) when (e is IOException or UnauthorizedAccessException)
        {
            // Listed as unreadable when it is opened for review.
            return true;
        }
    }
}
