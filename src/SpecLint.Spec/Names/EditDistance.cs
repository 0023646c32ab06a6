namespace SpecLint.Spec.Names;

/// <summary>How far two words lie apart: insertions, deletions, substitutions and swaps of neighbours.</summary>
/// <seealso href="https://doi.org/10.1145/363958.363994">F. J. Damerau, A technique for computer detection and correction of spelling errors, 1964.</seealso>
internal static class EditDistance
{
    private const int LongestWord = 80;

    internal static int Between(string a, string b)
    {
        if (a.Length > LongestWord || b.Length > LongestWord)
        {
            return int.MaxValue;
        }

        var cost = new int[a.Length + 1, b.Length + 1];
        for (int i = 0; i <= a.Length; i++)
        {
            for (int j = 0; j <= b.Length; j++)
            {
                cost[i, j] = i == 0 || j == 0 ? i + j : Cheapest(cost, a, b, i, j);
            }
        }

        return cost[a.Length, b.Length];
    }

    private static int Cheapest(int[,] cost, string a, string b, int i, int j)
    {
        int change = a[i - 1] == b[j - 1] ? 0 : 1;
        int least = Math.Min(Math.Min(cost[i - 1, j], cost[i, j - 1]) + 1, cost[i - 1, j - 1] + change);
        bool isSwap = i > 1 && j > 1 && a[i - 1] == b[j - 2] && a[i - 2] == b[j - 1];
        return isSwap ? Math.Min(least, cost[i - 2, j - 2] + 1) : least;
    }
}
