namespace MemberScan.Screening.Checking.Further;

/// <summary>The checks beside the stress criterion in one situation: of each key the worst that was made, and the first that was not.</summary>
internal sealed class FurtherFindings
{
    private readonly Dictionary<string, PlacedCheck> _made = new(StringComparer.Ordinal);
    private readonly Dictionary<string, PlacedCheck> _notMade = new(StringComparer.Ordinal);

    /// <summary>All of them, in the order of their keys.</summary>
    public IEnumerable<PlacedCheck> All => _made.Values.Concat(_notMade.Values).OrderBy(c => c.Check.Key, StringComparer.Ordinal);

    /// <summary>The deciding one of largest utilization; null when none was made.</summary>
    public PlacedCheck? Worst => _made.Values.Where(c => c.Decides).OrderBy(c => c.Check.Key, StringComparer.Ordinal).MaxBy(c => c.Utilization);

    /// <summary>Takes a check.</summary>
    public void Add(PlacedCheck check)
    {
        var key = check.Check.Key;
        if (check.Utilization is not { } utilization) _notMade.TryAdd(key, check);
        else if (!_made.TryGetValue(key, out var known) || known.Utilization < utilization) _made[key] = check;
    }
}
