using MemberScan.Foundation.Geometry;
using MemberScan.Screening.Record;

namespace MemberScan.Screening.Comparison;

/// <summary>Finds the candidates of one run again in another: by GlobalId, then Tag, then class, axis and section.</summary>
internal sealed class MemberMatcher
{
    /// <summary>Largest distance of two ends that count as the same place [m].</summary>
    public const double SamePlace = 1e-3;

    /// <summary>Width of a cell of the search [m].</summary>
    private const double Cell = 0.1;

    private readonly List<MemberResult> _earlier, _later;
    private readonly Dictionary<MemberResult, (MemberResult Earlier, MatchedBy By)> _matches = new(ReferenceEqualityComparer.Instance);

    private MemberMatcher(ScreeningRecord earlier, ScreeningRecord later) => (_earlier, _later) = ([.. earlier.Members], [.. later.Members]);

    /// <summary>Later candidates with their earlier selves.</summary>
    public static IReadOnlyDictionary<MemberResult, (MemberResult Earlier, MatchedBy By)> Match(ScreeningRecord earlier, ScreeningRecord later)
    {
        var matcher = new MemberMatcher(earlier, later);
        matcher.ByName(m => m.Key, MatchedBy.GlobalId);
        matcher.ByName(m => m.Tag.Length == 0 ? "" : $"{m.Tag}\0{m.ItemNumber}", MatchedBy.Tag);
        matcher.ByAxis();
        return matcher._matches;
    }

    // A name that either run has twice names nobody.
    private void ByName(Func<MemberResult, string> name, MatchedBy by)
    {
        var before = Unique(_earlier, name);
        foreach (var (text, now) in Unique(_later, name))
            if (before.TryGetValue(text, out var then)) Take(then, now, by);
        Sweep();
    }

    private void ByAxis()
    {
        var cells = _earlier.Select(m => (Member: m, Ends: EndsOf(m))).Where(e => e.Ends is not null)
            .ToLookup(e => CellOf(e.Member, e.Ends!.Value, 0, 0, 0));
        var found = new List<(MemberResult Then, MemberResult Now)>();
        foreach (var now in _later)
            if (EndsOf(now) is { } ends && Around(now, ends).SelectMany(cell => cells[cell]).Where(e => AreSame(e.Ends!.Value, ends)).Take(2).ToList() is [var only])
                found.Add((only.Member, now));
        foreach (var pair in found.GroupBy(p => p.Then, ReferenceEqualityComparer.Instance).Where(g => g.Count() == 1).Select(g => g.Single())) Take(pair.Then, pair.Now, MatchedBy.Axis);
        Sweep();
    }

    private void Take(MemberResult then, MemberResult now, MatchedBy by) => _matches.Add(now, (then, by));

    private void Sweep()
    {
        var taken = new HashSet<MemberResult>(_matches.Values.Select(v => v.Earlier), ReferenceEqualityComparer.Instance);
        _earlier.RemoveAll(taken.Contains);
        _later.RemoveAll(_matches.ContainsKey);
    }

    private static Dictionary<string, MemberResult> Unique(List<MemberResult> members, Func<MemberResult, string> name) =>
        members.GroupBy(name, StringComparer.Ordinal).Where(g => g.Key.Length > 0 && g.Count() == 1).ToDictionary(g => g.Key, g => g.Single(), StringComparer.Ordinal);

    private static (Vector3 Start, Vector3 End)? EndsOf(MemberResult member) =>
        member is { Axes: { } axes, Length: { } length, Section.Length: > 0 } ? (axes.Origin, axes.Origin + length * axes.X) : null;

    private static bool AreSame((Vector3 Start, Vector3 End) a, (Vector3 Start, Vector3 End) b) =>
        AreNear(a.Start, b.Start) && AreNear(a.End, b.End) || AreNear(a.Start, b.End) && AreNear(a.End, b.Start);

    private static bool AreNear(Vector3 a, Vector3 b) => (a - b).Length <= SamePlace;

    private static IEnumerable<(string, string, long, long, long)> Around(MemberResult member, (Vector3 Start, Vector3 End) ends)
    {
        for (var x = -1; x <= 1; x++)
            for (var y = -1; y <= 1; y++)
                for (var z = -1; z <= 1; z++)
                    yield return CellOf(member, ends, x, y, z);
    }

    // By the middle of the axis, which is the same whichever end comes first.
    private static (string, string, long, long, long) CellOf(MemberResult member, (Vector3 Start, Vector3 End) ends, int x, int y, int z)
    {
        var middle = 0.5 * (ends.Start + ends.End);
        return (member.Class, member.Section, (long)Math.Floor(middle.X / Cell) + x, (long)Math.Floor(middle.Y / Cell) + y, (long)Math.Floor(middle.Z / Cell) + z);
    }
}
