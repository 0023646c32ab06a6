namespace SpecLint.Spec.Names;

/// <summary>Finds the known name that a mistyped one most likely means.</summary>
public static class NearestName
{
    /// <summary>A phrase such as <c>; did you mean gap.magnetic?</c>, or empty when nothing is near.</summary>
    /// <param name="written">The name as written.</param>
    /// <param name="known">The names there are.</param>
    public static string Suggestion(string written, IEnumerable<string> known) =>
        Of(written, known) is { } name ? $"; did you mean {name}?" : "";

    /// <summary>The known name nearest to the written one, or null when none is near enough to be a slip of the keyboard.</summary>
    /// <param name="written">The name as written; upper case, blanks and underscores are no distance.</param>
    /// <param name="known">The names there are; of several equally near the first in ordinal order is taken.</param>
    public static string? Of(string written, IEnumerable<string> known)
    {
        if (written.Length == 0)
        {
            return null;
        }

        string wanted = written.ToLowerInvariant().Replace('_', '-').Replace(' ', '-');
        int least = Math.Max(1, (wanted.Length + 1) / 3);
        string? best = null;
        foreach (string name in known)
        {
            if (Math.Abs(name.Length - wanted.Length) > least)
            {
                continue;
            }

            int distance = EditDistance.Between(wanted, name.ToLowerInvariant());
            bool isNearer = distance < least || (distance == least && (best is null || string.CompareOrdinal(name, best) < 0));
            if (isNearer && distance < name.Length)
            {
                (least, best) = (distance, name);
            }
        }

        return best;
    }
}
