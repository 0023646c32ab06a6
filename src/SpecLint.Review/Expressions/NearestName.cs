namespace SpecLint.Review.Expressions;

/// <summary>Finds the known name that a mistyped one most likely means.</summary>
public static class NearestName
{
    private const int LongestName = 80;

    /// <summary>A phrase such as <c>; did you mean gap.magnetic?</c>, or empty when nothing is near.</summary>
    /// <param name="written">The name as written.</param>
    /// <param name="known">The names there are.</param>
    public static string Suggestion(string written, IEnumerable<string> known) =>
        Of(written, known) is { } name ? $"; did you mean {name}?" : "";

    /// <summary>The known name nearest to the written one, or null when none is within a third of its length.</summary>
    /// <param name="written">The name as written.</param>
    /// <param name="known">The names there are.</param>
    public static string? Of(string written, IEnumerable<string> known)
    {
        if (written.Length is 0 or > LongestName)
        {
            return null;
        }

        int allowed = Math.Max(1, written.Length / 3);
        string? best = null;
        int bestDistance = allowed + 1;
        foreach (string name in known)
        {
            if (name.Length > LongestName || Math.Abs(name.Length - written.Length) >= bestDistance)
            {
                continue;
            }

            int distance = Distance(written, name);
            if (distance < bestDistance || (distance == bestDistance && best is not null && string.CompareOrdinal(name, best) < 0))
            {
                best = name;
                bestDistance = distance;
            }
        }

        return bestDistance <= allowed ? best : null;
    }

    /// <summary>Number of single-character insertions, deletions and replacements between two short names.</summary>
    private static int Distance(string a, string b)
    {
        Span<int> row = stackalloc int[LongestName + 1];
        for (int j = 0; j <= b.Length; j++)
        {
            row[j] = j;
        }

        for (int i = 1; i <= a.Length; i++)
        {
            int diagonal = row[0];
            row[0] = i;
            for (int j = 1; j <= b.Length; j++)
            {
                int above = row[j];
                int cost = a[i - 1] == b[j - 1] ? diagonal : diagonal + 1;
                row[j] = Math.Min(cost, Math.Min(above, row[j - 1]) + 1);
                diagonal = above;
            }
        }

        return row[b.Length];
    }
}
