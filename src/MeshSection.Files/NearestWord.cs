namespace MeshSection.Files;

/// <summary>Guesses which of the known words was meant.</summary>
public static class NearestWord
{
    /// <summary>
    /// The known word that takes the fewest changes of a letter, if they are few for its length, or else the first that
    /// begins with what was written; null if there is neither.
    /// </summary>
    /// <param name="word">What was written.</param>
    /// <param name="known">The words that would have been right.</param>
    public static string? Find(string word, IReadOnlyCollection<string> known)
    {
        var (nearest, least) = ((string?)null, int.MaxValue);
        foreach (var candidate in known)
        {
            var changes = Changes(word.ToUpperInvariant(), candidate.ToUpperInvariant());
            if (changes < least)
            {
                (nearest, least) = (candidate, changes);
            }
        }

        return nearest is not null && least <= (nearest.Length + 1) / 3
            ? nearest
            : known.FirstOrDefault(k => word.Length > 2 && k.StartsWith(word, StringComparison.OrdinalIgnoreCase));
    }

    /// <summary>"Did you mean …?", or all that is known.</summary>
    /// <param name="word">What was written.</param>
    /// <param name="known">The words that would have been right.</param>
    public static string Advice(string word, IReadOnlyCollection<string> known) =>
        Find(word, known) is { } nearest ? $"Did you mean \"{nearest}\"?" : $"Known here: {string.Join(", ", known)}.";

    // Levenshtein's distance, one row at a time.
    private static int Changes(string a, string b)
    {
        var row = new int[b.Length + 1];
        for (var j = 0; j <= b.Length; j++)
        {
            row[j] = j;
        }

        for (var i = 1; i <= a.Length; i++)
        {
            var diagonal = row[0];
            row[0] = i;
            for (var j = 1; j <= b.Length; j++)
            {
                var replaced = diagonal + (a[i - 1] == b[j - 1] ? 0 : 1);
                diagonal = row[j];
                row[j] = Math.Min(replaced, 1 + Math.Min(row[j], row[j - 1]));
            }
        }

        return row[b.Length];
    }
}
