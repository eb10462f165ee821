namespace MemberScan.Inputs;

/// <summary>The nearest right name for one that is not known: what turns "unknown" into advice.</summary>
public static class NearestName
{
    /// <summary>Longer names get no suggestion; the search is quadratic in the length.</summary>
    public const int LongestName = 64;

    private const int LongestList = 12;
    private const int ShortestBeginning = 4;

    /// <summary>The known name nearest to the given one by edit distance, without regard to case.</summary>
    /// <param name="given">The name as written.</param>
    /// <param name="known">The right names; the first of equally near ones wins.</param>
    /// <returns>
    /// The name, or null when none is near: one edit up to four letters, a third of the letters beyond; failing that, the one
    /// name that begins so, from four letters on.
    /// </returns>
    public static string? Of(string given, IEnumerable<string> known)
    {
        ArgumentNullException.ThrowIfNull(given);
        ArgumentNullException.ThrowIfNull(known);
        if (given.Length is 0 or > LongestName) return null;

        string? nearest = null, begun = null;
        var (least, beginnings) = (int.MaxValue, 0);
        foreach (var name in known)
        {
            if (given.Length >= ShortestBeginning && name.StartsWith(given, StringComparison.OrdinalIgnoreCase)) (begun, beginnings) = (name, beginnings + 1);

            var distance = Distance(given.ToLowerInvariant(), name.ToLowerInvariant());
            if (distance > Reach(Math.Max(given.Length, name.Length)) || distance >= least) continue;
            (nearest, least) = (name, distance);
        }

        return nearest ?? (beginnings == 1 ? begun : null);
    }

    /// <summary>The clause that follows "'…' is not a …;": the nearest name as a question, else the list of right names.</summary>
    public static string Advice(string given, IReadOnlyCollection<string> known)
    {
        ArgumentNullException.ThrowIfNull(known);
        if (Of(given, known) is { } nearest) return $"did you mean '{nearest}'?";

        var listed = string.Join(", ", known.Take(LongestList));
        return known.Count > LongestList ? $"known are {listed} and {known.Count - LongestList} more" : $"known are {listed}";
    }

    private static int Reach(int length) => length switch
    {
        1 => 0,
        <= 4 => 1,
        _ => length / 3,
    };

    // Insertions, deletions, replacements and swaps of neighbours, each part of the text edited at most once.
    private static int Distance(string a, string b)
    {
        var before = new int[b.Length + 1];
        var last = new int[b.Length + 1];
        var row = new int[b.Length + 1];
        for (var j = 0; j <= b.Length; j++) last[j] = j;
        for (var i = 1; i <= a.Length; i++)
        {
            row[0] = i;
            for (var j = 1; j <= b.Length; j++)
            {
                var replaced = last[j - 1] + (a[i - 1] == b[j - 1] ? 0 : 1);
                row[j] = Math.Min(replaced, Math.Min(last[j], row[j - 1]) + 1);
                if (i > 1 && j > 1 && a[i - 1] == b[j - 2] && a[i - 2] == b[j - 1]) row[j] = Math.Min(row[j], before[j - 2] + 1);
            }

            (before, last, row) = (last, row, before);
        }

        return last[b.Length];
    }
}
