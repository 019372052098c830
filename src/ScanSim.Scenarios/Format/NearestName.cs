namespace ScanSim.Scenarios.Format;

/// <summary>Finds the name that was most likely meant.</summary>
internal static class NearestName
{
    private const int LongestCompared = 64;

    /// <summary>The allowed name with the fewest edits, when these are at most a third of its length (case costs nothing); otherwise null.</summary>
    public static string? Find(string written, IEnumerable<string> allowed)
    {
        if (written.Length > LongestCompared)
        {
            return null;
        }

        var best = allowed.MinBy(name => Edits(written, name));
        return best is not null && Edits(written, best) <= best.Length / 3 ? best : null;
    }

    /// <summary>Levenshtein distance without regard to case.</summary>
    private static int Edits(string a, string b)
    {
        var row = Enumerable.Range(0, b.Length + 1).ToArray();
        for (var i = 1; i <= a.Length; i++)
        {
            var diagonal = row[0];
            row[0] = i;
            for (var j = 1; j <= b.Length; j++)
            {
                var replaced = diagonal + (char.ToUpperInvariant(a[i - 1]) == char.ToUpperInvariant(b[j - 1]) ? 0 : 1);
                diagonal = row[j];
                row[j] = Math.Min(replaced, Math.Min(row[j], row[j - 1]) + 1);
            }
        }

        return row[^1];
    }
}
