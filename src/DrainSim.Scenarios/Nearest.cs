namespace DrainSim.Scenarios;

/// <summary>Finds the word that was probably meant.</summary>
public static class Nearest
{
    /// <summary>Words longer than this are no slips of the finger; it also bounds the work.</summary>
    private const int LongestWord = 64;

    /// <summary>
    /// The known word with the fewest edits from the text, when these are at most a third of its
    /// letters (two for a short word of four); null when none is so near.
    /// </summary>
    /// <param name="text">the word as written</param>
    /// <param name="known">the words that would have been right; the first of equals is taken</param>
    public static string? Find(string text, IEnumerable<string> known)
    {
        ArgumentNullException.ThrowIfNull(text);
        ArgumentNullException.ThrowIfNull(known);
        if (text.Length is 0 or > LongestWord)
            return null;
        string? best = null;
        int fewest = int.MaxValue;
        foreach (string word in known)
        {
            int limit = Math.Max(word.Length >= 4 ? 2 : 1, word.Length / 3);
            int edits = Edits(text.ToLowerInvariant(), word.ToLowerInvariant());
            if (edits < fewest && edits <= limit && edits < word.Length)
                (best, fewest) = (word, edits);
        }
        return best;
    }

    /// <summary>The known words with the fewest edits from the text, the nearest first.</summary>
    /// <param name="text">the word as written</param>
    /// <param name="known">the words that would have been right; the first of equals is taken</param>
    /// <param name="most">how many</param>
    public static IReadOnlyList<string> Several(string text, IEnumerable<string> known, int most)
    {
        ArgumentNullException.ThrowIfNull(text);
        return text.Length is 0 or > LongestWord
            ? []
            : [.. known.Where(word => word.Length <= LongestWord)
                .OrderBy(word => Edits(text.ToLowerInvariant(), word.ToLowerInvariant())).Take(most)];
    }

    /// <summary>
    /// Letters to insert, delete, replace or swap with a neighbour so that one word becomes the
    /// other: the optimal string alignment distance (Damerau 1964, each letter edited once).
    /// </summary>
    internal static int Edits(string a, string b)
    {
        int[,] d = new int[a.Length + 1, b.Length + 1];
        for (int i = 0; i <= a.Length; i++)
            d[i, 0] = i;
        for (int j = 0; j <= b.Length; j++)
            d[0, j] = j;
        for (int i = 1; i <= a.Length; i++)
        {
            for (int j = 1; j <= b.Length; j++)
            {
                int change = a[i - 1] == b[j - 1] ? 0 : 1;
                d[i, j] = Math.Min(d[i - 1, j - 1] + change, Math.Min(d[i - 1, j], d[i, j - 1]) + 1);
                if (i > 1 && j > 1 && a[i - 1] == b[j - 2] && a[i - 2] == b[j - 1])
                    d[i, j] = Math.Min(d[i, j], d[i - 2, j - 2] + 1);
            }
        }
        return d[a.Length, b.Length];
    }
}
