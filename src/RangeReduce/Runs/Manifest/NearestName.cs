namespace RangeReduce.Runs.Manifest;

/// <summary>Finds the known name that a misspelt one was most likely meant to be.</summary>
/// <remarks>Optimal string alignment distance: insertions, deletions, exchanges and swaps of neighbours each cost one.</remarks>
internal static class NearestName
{
    private const int LongestCompared = 200;

    /// <summary>Gives the known name with the smallest distance; of equals the first.</summary>
    /// <param name="given">What was written.</param>
    /// <param name="known">At least one known name.</param>
    public static string Of(string given, IEnumerable<string> known) =>
        known.MinBy(name => Distance(given.ToLowerInvariant(), name.ToLowerInvariant())) ?? string.Empty;

    /// <summary>Gives the number of single-character edits between two words.</summary>
    public static int Distance(string a, string b)
    {
        (a, b) = (a[..Math.Min(a.Length, LongestCompared)], b[..Math.Min(b.Length, LongestCompared)]);
        var cost = new int[a.Length + 1, b.Length + 1];
        for (var i = 0; i <= a.Length; i++)
        {
            for (var j = 0; j <= b.Length; j++)
            {
                if (i == 0 || j == 0)
                {
                    cost[i, j] = i + j;
                    continue;
                }

                var exchange = cost[i - 1, j - 1] + (a[i - 1] == b[j - 1] ? 0 : 1);
                cost[i, j] = Math.Min(exchange, Math.Min(cost[i - 1, j], cost[i, j - 1]) + 1);
                if (i > 1 && j > 1 && a[i - 1] == b[j - 2] && a[i - 2] == b[j - 1])
                {
                    cost[i, j] = Math.Min(cost[i, j], cost[i - 2, j - 2] + 1);
                }
            }
        }

        return cost[a.Length, b.Length];
    }
}
