namespace Boltup.Config.Binding;

/// <summary>Finds the known name that a user probably meant.</summary>
public static class NearestName
{
    /// <summary>Largest number of changed characters at which a name is still suggested.</summary>
    public const int MaximumDistance = 2;

    /// <summary>Names longer than this are compared for equality only.</summary>
    private const int MaximumLength = 100;

    /// <summary>
    /// The nearest name within the distance, after folding case, <c>-</c>, <c>_</c> and spaces; null when none is near.
    /// A short name needs more than half of its characters right.
    /// </summary>
    public static string? Of(string text, IEnumerable<string> known)
    {
        string folded = Fold(text);
        string? best = null;
        int bestDistance = MaximumDistance + 1;
        foreach (string name in known)
        {
            string candidate = Fold(name);
            int limit = Math.Min(MaximumDistance, (Math.Max(folded.Length, candidate.Length) - 1) / 2);
            int distance = Distance(folded, candidate);
            if (distance <= limit && distance < bestDistance && name != text)
            {
                (best, bestDistance) = (name, distance);
            }
        }

        return best;
    }

    /// <summary>A help line that suggests the nearest name, or null.</summary>
    public static string? Suggest(string text, IEnumerable<string> known) =>
        Of(text, known) is string name ? $"did you mean `{name}`?" : null;

    private static string Fold(string text) => string.Concat(text.Where(c => c is not ('-' or '_' or ' '))).ToLowerInvariant();

    /// <summary>
    /// Insertions, deletions, substitutions and swaps of neighbours that lead from one to the other: Damerau, A technique for
    /// computer detection and correction of spelling errors, CACM 7 (1964), in the form that changes no letter twice.
    /// </summary>
    private static int Distance(string a, string b)
    {
        if (Math.Abs(a.Length - b.Length) > MaximumDistance || a.Length > MaximumLength)
        {
            return a == b ? 0 : MaximumDistance + 1;
        }

        int[,] cost = new int[a.Length + 1, b.Length + 1];
        for (int i = 0; i <= a.Length; i++)
        {
            for (int j = 0; j <= b.Length; j++)
            {
                cost[i, j] = i == 0 ? j : j == 0 ? i : Cell(cost, a, b, i, j);
            }
        }

        return cost[a.Length, b.Length];
    }

    private static int Cell(int[,] cost, string a, string b, int i, int j)
    {
        int change = cost[i - 1, j - 1] + (a[i - 1] == b[j - 1] ? 0 : 1);
        int best = Math.Min(change, Math.Min(cost[i - 1, j], cost[i, j - 1]) + 1);
        bool isSwap = i > 1 && j > 1 && a[i - 1] == b[j - 2] && a[i - 2] == b[j - 1];
        return isSwap ? Math.Min(best, cost[i - 2, j - 2] + 1) : best;
    }
}
