using System.Globalization;
using MemberScan.Mechanics.Forces;
using MemberScan.Model;
using MemberScan.Model.Forces;
using MemberScan.Model.Members;

namespace MemberScan.Screening.Sources;

/// <summary>Tells where two sources of forces say something different of one member: the first one found is used, the other is shown.</summary>
internal static class SourceConflicts
{
    /// <summary>Share of the largest force or moment from which values differ.</summary>
    public const double Differs = 1e-3;

    /// <summary>Situations named in one note.</summary>
    private const int Named = 5;

    /// <summary>Notes about a source that is not used for a member.</summary>
    /// <param name="member">The member.</param>
    /// <param name="used">Forces that are used, and the name of their source.</param>
    /// <param name="other">Forces that are not, and the name of their source.</param>
    public static IEnumerable<string> Notes(Member member, (IReadOnlyList<MemberForces> Forces, string Name) used, (IReadOnlyList<MemberForces> Forces, string Name) other)
    {
        if (other.Forces.Count == 0) yield break;

        yield return $"{other.Name} are not used for this member: the {used.Name} comes first";
        var byName = used.Forces.GroupBy(f => f.Situation.Name, StringComparer.Ordinal).ToDictionary(g => g.Key, g => g.First(), StringComparer.Ordinal);
        var only = other.Forces.Where(f => !byName.ContainsKey(f.Situation.Name)).Select(f => $"'{f.Situation.Name}'").Distinct(StringComparer.Ordinal).ToList();
        if (only.Count > 0)
            yield return string.Create(CultureInfo.InvariantCulture, $"{other.Name} have {only.Count} {(only.Count == 1 ? "situation" : "situations")} that the {used.Name} does not have: {string.Join(", ", only.Take(Named))}{(only.Count > Named ? ", …" : "")}");

        foreach (var entry in other.Forces)
            if (byName.TryGetValue(entry.Situation.Name, out var own) && Difference(member, own, entry) is { } words)
                yield return $"'{entry.Situation.Name}': {other.Name} ({entry.Source}) {words}";
    }

    private static string? Difference(Member member, MemberForces used, MemberForces other)
    {
        if (used.Unusable is not null || other.Unusable is not null || member.Length is not Finding<double>.Found { Value: > 0 and < double.PositiveInfinity } length) return "cannot be compared with them";

        var difference = Superposition.Of(used.Situation, [new(1, Linear(used)), new(-1, Linear(other))], length.Value, "");
        if (difference.Unusable is not null) return "cannot be compared with them, the stations being too coarse";

        var all = used.Stations.Concat(other.Stations).Select(s => s.Forces).ToList();
        var (force, moment) = (all.Max(Force), all.Max(Moment));
        var (share, x) = difference.Stations.Select(s => (Math.Max(Share(Force(s.Forces), force), Share(Moment(s.Forces), moment)), s.X)).MaxBy(d => d.Item1);
        return share > Differs ? string.Create(CultureInfo.InvariantCulture, $"differ by {100 * share:0.0} % of the largest force or moment, at {x:0.###} m") : null;
    }

    private static MemberForces Linear(MemberForces forces) => forces with { Situation = forces.Situation with { IsLinear = true } };

    private static double Share(double value, double largest) => largest > 0 ? value / largest : 0;

    private static double Force(SectionForces f) => Math.Max(Math.Abs(f.N), Math.Max(Math.Abs(f.Vy), Math.Abs(f.Vz)));

    private static double Moment(SectionForces f) => Math.Max(Math.Abs(f.T), Math.Max(Math.Abs(f.My), Math.Abs(f.Mz)));
}
