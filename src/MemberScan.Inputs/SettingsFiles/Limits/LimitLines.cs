using MemberScan.Model.Limits;

namespace MemberScan.Inputs.SettingsFiles.Limits;

/// <summary>Limits as lines of key and canonical text.</summary>
internal static class LimitLines
{
    private const string None = "none";

    /// <summary>The limits of each kind of situation, the wall, brittle materials and partial factors.</summary>
    public static IEnumerable<(string Key, string Value)> Basis(LimitSet set)
    {
        foreach (var line in Limit("basis.service", "omega", set.Basis.Service, SettingKeys.ServiceCriteria)) yield return line;
        foreach (var line in Limit("basis.design", "gammaM0", set.Basis.Design, SettingKeys.DesignCriteria)) yield return line;
        yield return ("basis.wall", LimitKeys.Walls.WordOf(LimitKeys.Of(set.Wall)));
        yield return ("basis.brittle", set.Brittle is { } brittle ? $"tension {Pa(brittle.Tension)}, compression {Pa(brittle.Compression)}, {SettingKeys.Kinds.WordOf(brittle.Kind)} situations" : None);
        yield return ("basis.gammaM1", Number(set.GammaM1));
        yield return ("basis.gammaM2", Number(set.GammaM2));
        yield return ("checks.off", set.ChecksOff.IsEmpty ? None : string.Join(", ", set.ChecksOff));
    }

    /// <summary>Stability, threads, welds and deflection.</summary>
    public static IEnumerable<(string Key, string Value)> Further(LimitSet set)
    {
        yield return ("materials.welds", Listed(set.Welds.Select(w => $"{Quoted(w.Members)} {(w.WeldedYield is { } welded ? Pa(welded) : "no welds")}")));
        yield return ("stability.lengthFactor", Number(set.Stability.LengthFactor));
        yield return ("stability.factorByRole", Listed(set.Stability.FactorByRole.Select(f => $"{Quoted(f.Key)} {Number(f.Value)}")));
        yield return ("stability.ends", LimitKeys.Ends.WordOf(set.Stability.EndsFromContacts));
        yield return ("stability.hollowForming", LimitKeys.Forming.WordOf(set.Stability.Forming));
        var threads = set.Threads;
        yield return ("threads.rule", LimitKeys.ThreadRules.WordOf(LimitKeys.Of(threads.Rule)));
        yield return ("threads.area", LimitKeys.Areas.WordOf(threads.Area));
        yield return ("threads.allowable", threads.Allowable is { } allowable ? Pa(allowable) : None);
        yield return ("threads.fu", threads.TensileStrength is { } tensile ? Pa(tensile) : None);
        yield return ("threads.cutThread", threads.IsCut ? "true" : "false");
        yield return ("threads.temperatureFactor", Number(threads.TemperatureFactor));
        yield return ("threads.byMember", Listed(threads.ByMember.Select(t => $"{Quoted(t.Members)} {Quoted(t.Thread)}")));
        yield return ("deflection", Listed(set.Deflection.Select(Of)));
    }

    /// <summary>A rule: the members, and what it sets otherwise than for all.</summary>
    public static string Of(LimitRule rule, LimitSet all)
    {
        var standard = Basis(all).Concat(Further(all)).ToHashSet();
        var changed = Basis(rule.Limits).Concat(Further(rule.Limits)).Where(line => !standard.Contains(line)).Select(line => $"{line.Key} {line.Value}");
        var when = new[] { ("role", rule.When.Role), ("class", rule.When.Class), ("name", rule.When.Name), ("storey", rule.When.Storey) }
            .Where(p => p.Item2 is not null).Select(p => $"{p.Item1} {Quoted(p.Item2!)}");
        return $"{string.Join(", ", when)}: {string.Join("; ", changed)}";
    }

    private static IEnumerable<(string Key, string Value)> Limit(string key, string factor, StressLimit? limit, WordTable<Criterion> criteria)
    {
        if (limit is null)
        {
            yield return (key, None);
            yield break;
        }

        yield return ($"{key}.criterion", criteria.WordOf(limit.Criterion));
        if (LimitSetReader.OwnFactor(limit.Criterion) is null) yield return ($"{key}.{factor}", Number(limit.Factor));
    }

    private static string Of(DeflectionRule rule) => $"{Quoted(rule.Name)} for {Quoted(rule.Role)}"
        + (rule.SpanOver is { } ratio ? $", span over {Number(ratio)}" : "") + (rule.Largest is { } largest ? $", {Number(largest)} m" : "");

    private static string Listed(IEnumerable<string> entries) => string.Join(", ", entries) is { Length: > 0 } text ? text : None;

    private static string Pa(double value) => $"{Number(value)} Pa";

    private static string Number(double value) => EffectiveSettings.Number(value);

    private static string Quoted(string text) => EffectiveSettings.Quoted(text);
}
