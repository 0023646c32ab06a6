namespace SpecLint.Reporting.Output;

/// <summary>Paths of specs as they may appear in a report: told from the working folder, never from the root of a machine.</summary>
internal static class RelativePath
{
    /// <summary>
    /// The path from the working folder, <c>/</c> between segments, without <c>.</c> and with <c>..</c> only in front. A spec
    /// outside the working folder is told by <c>..</c> steps; one that no steps lead to (another drive, or an
    /// absolute path when no working folder is known) by its file name alone.
    /// </summary>
    /// <param name="path">As given on the command line.</param>
    /// <param name="workingFolder">Absolute; may be empty.</param>
    public static string Of(string path, string workingFolder)
    {
        bool isAbsolute = Path.IsPathRooted(path) || (path.Length > 1 && path[1] == ':');
        if (workingFolder.Length > 0)
        {
            path = Path.GetRelativePath(workingFolder, Path.GetFullPath(path, workingFolder));
            isAbsolute = Path.IsPathRooted(path);
        }

        string slashed = OperatingSystem.IsWindows() || isAbsolute ? path.Replace('\\', '/') : path;
        return isAbsolute ? slashed[(slashed.LastIndexOf('/') + 1)..] : Normalise(slashed);
    }

    /// <summary>The path as the reference part of a URI: each segment percent-escaped.</summary>
    /// <param name="relativePath">A path from <see cref="Of"/>.</param>
    public static string Escape(string relativePath) => string.Join('/', relativePath.Split('/').Select(Uri.EscapeDataString));

    private static string Normalise(string path)
    {
        var segments = new List<string>();
        foreach (string segment in path.Split('/'))
        {
            if (segment is "" or ".")
            {
                continue;
            }

            if (segment == ".." && segments.Count > 0 && segments[^1] != "..")
            {
                segments.RemoveAt(segments.Count - 1);
            }
            else
            {
                segments.Add(segment);
            }
        }

        return string.Join('/', segments);
    }
}
