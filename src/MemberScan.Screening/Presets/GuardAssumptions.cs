using System.Collections.Immutable;
using MemberScan.Foundation.Geometry;
using MemberScan.Model.Forces;
using MemberScan.Model.Members;
using MemberScan.Model.Presets;
using MemberScan.Screening.Contacts;

namespace MemberScan.Screening.Presets;

/// <summary>Guards and handrails: top rails on their posts, posts as cantilevers, infill between rails.</summary>
internal sealed class GuardAssumptions(PresetMembers members, PresetUse use)
{
    private static readonly string[] s_roles = ["rail", "post"];

    /// <summary>Forces of a member; empty when the preset is not for it.</summary>
    public IEnumerable<MemberForces> Of(Member member)
    {
        if (!PresetMembers.IsFor(use, member, s_roles)) return [];

        var blank = new Assumption(member.Key, use, "");
        if (members.Line(member.Key) is not { } line) return [blank.Doubt("the member is bent, or its section, length or axes are not known")];
        if (IsInfill(member.Key)) return Infill(blank, line);
        if (members.IsUpright(member.Key)) return Post(blank, line);

        return members.IsLevel(member.Key) ? Rail(blank, line) : [blank.Doubt("the member neither stands nor lies")];
    }

    // Neighbours count by their role too: a pattern may name the rails alone.
    private bool IsGuard(string key) => PresetMembers.IsFor(use, members[key], s_roles) || s_roles.Contains(members[key].Role);

    private bool IsLevelGuard(string key) => IsGuard(key) && members.IsLevel(key);

    private bool IsPost(string key) => IsGuard(key) && members.IsUpright(key) && !IsInfill(key) && members.Contacts.Of(key).Any(c => c.IsCertain && IsLevelGuard(c.Other(key)));

    /// <summary>Whether a standing member's both ends lie at the sides of rails.</summary>
    private bool IsInfill(string key)
    {
        if (!IsGuard(key) || !members.IsUpright(key)) return false;

        var line = members.Line(key)!;
        var ends = members.Contacts.Of(key).Where(c => c is { IsCertain: true, Kind: ContactKind.EndToSide } && c.First == key && IsLevelGuard(c.Second)).ToList();
        return ends.Exists(c => c.FirstAt < line.Length / 2) && ends.Exists(c => c.FirstAt > line.Length / 2);
    }

    /// <summary>The highest rail at a post; null when it has none.</summary>
    private Contact? TopOf(string post)
    {
        var line = members.Line(post)!;
        return members.Contacts.Of(post).Where(c => c is { IsCertain: true, Kind: not ContactKind.Alongside } && IsLevelGuard(c.Other(post))).MaxBy(c => line.PointAt(c.At(post)).Z);
    }

    private IEnumerable<MemberForces> Rail(Assumption blank, BarLine line)
    {
        if (members.Doubt(line.Key, other => IsGuard(other) && members.IsUpright(other)) is { } doubt) return [blank.Doubt($"a contact is in doubt ({doubt.Words})")];

        var supports = members.Places(line.Key, IsPost);
        if (supports.Count < 2) return [blank.Doubt($"it touches {(supports.Count == 0 ? "no post" : "one post only")} within {members.Contacts.Tolerance * 1e3:0.#} mm")];

        var isTop = members.Contacts.Of(line.Key).Any(c => c.IsCertain && IsPost(c.Other(line.Key)) && TopOf(c.Other(line.Key))?.Other(c.Other(line.Key)) == line.Key);
        var assumption = blank with { Model = $"simple spans between posts at {string.Join(", ", supports.Select(Assumption.At))}, pulled from behind by loads along it{(isTop ? ", the top rail" : ", no top rail: infill")}" };
        var beam = new BeamAssumptions(members, assumption, line, supports);
        var preset = use.Preset;
        if (!isTop) return preset.Infill is { } infill ? beam.Concentrated(infill, null) : [assumption.Doubt("the preset has no load for infill")];

        return [.. preset.Concentrated is { } load ? beam.Concentrated(load, null) : [], .. preset.Line is { } spread ? beam.Spread(spread) : []];
    }

    private IEnumerable<MemberForces> Infill(Assumption blank, BarLine line)
    {
        if (use.Preset.Infill is not { } load) return [blank.Doubt("the preset has no load for infill")];

        var supports = members.Places(line.Key, IsLevelGuard);
        var assumption = blank with { Model = $"infill, a simple span between rails at {string.Join(" and ", supports.Select(Assumption.At))}, the load on it taken at one point" };
        return supports.Count < 2 ? [blank.Doubt("it is nowhere held twice")] : new BeamAssumptions(members, assumption, line, supports).Concentrated(load, null);
    }

    private IEnumerable<MemberForces> Post(Assumption blank, BarLine line)
    {
        if (members.Doubt(line.Key, _ => true) is { } doubt) return [blank.Doubt($"a contact is in doubt ({doubt.Words})")];
        if (TopOf(line.Key) is not { } top) return [blank.Doubt($"it touches no rail within {members.Contacts.Tolerance * 1e3:0.#} mm")];

        var fixedAtStart = line.Axes.X.Z > 0;
        var place = top.At(line.Key);
        var height = fixedAtStart ? place : line.Length - place;
        var below = members.Contacts.Of(line.Key).Where(c => c.IsCertain && Math.Abs(c.At(line.Key) - (fixedAtStart ? 0 : line.Length)) <= line.Reach + members.Contacts.Tolerance)
            .Select(c => c.Other(line.Key)).Distinct(StringComparer.Ordinal).ToList();
        var foot = below.Count > 0 ? $"where it touches {string.Join(", ", below)}" : "where nothing of the candidates touches it";
        var assumption = blank with { Model = $"a cantilever fixed at its lower end, {foot}; loaded at {Assumption.At(height)} above it by the top rail {top.Other(line.Key)}" };

        var (share, width) = Received(line.Key);
        var directions = LoadDirections.Of(line.Shape, members.Properties(line.Shape), height);
        IEnumerable<MemberForces> Under(double load, string words) => directions.Select(d => assumption.Forces(
            $"{words}, {Assumption.Towards(d.X * line.Axes.X + d.Y * line.Axes.Y + d.Z * line.Axes.Z)}", CantileverForces.Of(line.Length, fixedAtStart, place, load * d)));
        return
        [
            .. use.Preset.Concentrated is { } load ? Under(share * load, $"{Assumption.Kn(load)} concentrated on the rail, {Assumption.Kn(share * load)} on the post") : [],
            .. use.Preset.Line is { } spread ? Under(width * spread, $"{Assumption.Kn(spread)}/m on the rail, {Assumption.Kn(width * spread)} from {Assumption.At(width)} on the post") : [],
        ];
    }

    /// <summary>What a post receives at most of a unit force on the top rails, and of a unit load per length [m].</summary>
    private (double Share, double Width) Received(string post)
    {
        var (share, width) = (1.0, 0.0);
        var topAt = members.Line(post)!.PointAt(TopOf(post)!.At(post)).Z;
        foreach (var contact in members.Contacts.Of(post).Where(c => c.IsCertain && IsLevelGuard(c.Other(post))))
        {
            var rail = members.Line(contact.Other(post))!;
            var isTop = Math.Abs(members.Line(post)!.PointAt(contact.At(post)).Z - topAt) <= rail.Reach + members.Contacts.Tolerance;
            var supports = members.Places(rail.Key, IsPost);
            if (!isTop || supports.Count < 2) continue;

            var support = Enumerable.Range(0, supports.Count).MinBy(i => Math.Abs(supports[i] - contact.At(rail.Key)));
            foreach (var place in (double[])[0, rail.Length]) share = Math.Max(share, SpanForces.Reaction(support, rail.Length, supports, new AssumedLoad(Vector3.UnitZ, place, place)));
            width += Width(support, rail, supports);
        }

        return (share, width);
    }

    /// <summary>Reaction to a unit load per length on the stretches that add to it.</summary>
    private static double Width(int support, BarLine rail, List<double> supports)
    {
        double[] ends = [0, .. supports, rail.Length];
        return Enumerable.Range(1, ends.Length - 1).Where(i => ends[i] > ends[i - 1])
            .Sum(i => Math.Max(0, SpanForces.Reaction(support, rail.Length, supports, new AssumedLoad(Vector3.UnitZ, ends[i - 1], ends[i]))));
    }
}
