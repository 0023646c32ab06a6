namespace SpecLint.Reporting.Output;

/// <summary>Writes a file whole or not at all.</summary>
public static class AtomicFile
{
    /// <summary>
    /// Writes to a new file beside the target and then puts it in the target's place, so that a reader sees the old
    /// content or the new, never a part. A link is followed; a device or a pipe is written directly.
    /// </summary>
    /// <param name="path">The target; its folder must exist.</param>
    /// <param name="write">Writes the content.</param>
    /// <exception cref="OutputException">The target cannot be written: no such folder, read-only, a folder, disk full.</exception>
    public static void Write(string path, Action<Stream> write)
    {
        ArgumentException.ThrowIfNullOrEmpty(path);
        ArgumentNullException.ThrowIfNull(write);
        try
        {
            string target = Resolve(path);
            if (Directory.Exists(target))
            {
                throw new OutputException($"{path} is a folder; expected a file to write.");
            }

            if (IsSpecial(target))
            {
                using FileStream stream = new(target, FileMode.Open, FileAccess.Write);
                write(stream);
                return;
            }

            if (File.Exists(target) && File.GetAttributes(target).HasFlag(FileAttributes.ReadOnly))
            {
                throw new OutputException($"{path} is read-only.");
            }

            Replace(target, write);
        }
        catch (Exception cause) when (cause is UnauthorizedAccessException or NotSupportedException
            || (cause is IOException && cause is not OutputException))
        {
            throw new OutputException($"{path} cannot be written: {Printable.Line(cause.Message)}", cause);
        }
    }

    private static void Replace(string target, Action<Stream> write)
    {
        string folder = Path.GetDirectoryName(Path.GetFullPath(target)) ?? ".";
        string fresh = Path.Combine(folder, $".{Path.GetFileName(target)}.{Path.GetRandomFileName()}");
        try
        {
            using (FileStream stream = new(fresh, FileMode.CreateNew, FileAccess.Write))
            {
                write(stream);
            }

            if (!OperatingSystem.IsWindows() && File.Exists(target))
            {
                File.SetUnixFileMode(fresh, File.GetUnixFileMode(target));
            }

            File.Move(fresh, target, overwrite: true);
        }
        finally
        {
            File.Delete(fresh);
        }
    }

    private static string Resolve(string path) =>
        File.Exists(path) && File.ResolveLinkTarget(path, returnFinalTarget: true) is { } final ? final.FullName : path;

    private static bool IsSpecial(string path)
    {
        if (OperatingSystem.IsWindows() || !File.Exists(path))
        {
            return false;
        }

        string full = Path.GetFullPath(path);
        return full.StartsWith("/dev/", StringComparison.Ordinal) || full.StartsWith("/proc/", StringComparison.Ordinal);
    }
}
