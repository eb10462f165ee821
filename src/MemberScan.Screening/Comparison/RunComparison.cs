using System.Collections.Immutable;
using System.Globalization;
using MemberScan.Model.Verdicts;
using MemberScan.Screening.Record;

namespace MemberScan.Screening.Comparison;

/// <summary>Compares two finished screenings.</summary>
public static class RunComparison
{
    /// <summary>Lengths that differ by less [m] are alike.</summary>
    public const double SameLength = 1e-4;

    /// <summary>The comparison; the same records give the same one.</summary>
    public static ComparisonRecord Of(ScreeningRecord earlier, ScreeningRecord later)
    {
        ArgumentNullException.ThrowIfNull(earlier);
        ArgumentNullException.ThrowIfNull(later);
        var matches = MemberMatcher.Match(earlier, later);
        var found = new HashSet<MemberResult>(matches.Values.Select(m => m.Earlier), ReferenceEqualityComparer.Instance);
        var movements = later.Members.Select(now => matches.TryGetValue(now, out var match) ? Both(match.Earlier, now, match.By) : new MemberMovement(null, now, null, Movement.New, []))
            .Concat(earlier.Members.Where(m => !found.Contains(m)).Select(then => new MemberMovement(then, null, null, Movement.Gone, [])));
        return new ComparisonRecord(earlier, later, [.. movements.OrderBy(m => m.Movement)], [.. RunChanges(earlier, later)]);
    }

    private static MemberMovement Both(MemberResult then, MemberResult now, MatchedBy by)
    {
        var changes = Changes(then, now).ToImmutableArray();
        var movement = (then.Verdict, now.Verdict) switch
        {
            (Verdict.Overstressed, Verdict.Overstressed) => Movement.StillOverstressed,
            (_, Verdict.Overstressed) => Movement.BecameOverstressed,
            (Verdict.Overstressed, Verdict.WithinLimit) => Movement.Cured,
            (Verdict.NotChecked, Verdict.WithinLimit) => Movement.NowWithinLimit,
            (not Verdict.NotChecked, Verdict.NotChecked) => Movement.NoLongerChecked,
            _ => changes.IsEmpty ? Movement.Unchanged : Movement.ChangedInput,
        };
        return new MemberMovement(then, now, by, movement, changes);
    }

    private static IEnumerable<InputChange> Changes(MemberResult then, MemberResult now)
    {
        var marks = then.Inputs is { } before && now.Inputs is { } after ? before.Differing(after).ToHashSet(StringComparer.Ordinal) : [];
        if (then.Section != now.Section || marks.Contains("section")) yield return new InputChange("section", then.Section, now.Section);
        if (then.Material != now.Material || then.Strength != now.Strength || marks.Contains("material")) yield return new InputChange("material", MaterialOf(then), MaterialOf(now));
        if (then.Length is null != now.Length is null || Math.Abs((then.Length ?? 0) - (now.Length ?? 0)) > SameLength) yield return new InputChange("length", LengthOf(then), LengthOf(now));
        if (marks.Contains("forces")) yield return new InputChange("forces", ForcesOf(then), ForcesOf(now));
        if (marks.Contains("limit")) yield return new InputChange("limit", then.Governing?.Criterion ?? "", now.Governing?.Criterion ?? "");
    }

    private static string MaterialOf(MemberResult member) =>
        member.Strength is { } strength ? string.Create(CultureInfo.InvariantCulture, $"{member.Material} fy {strength / 1e6:0.###} MPa") : member.Material;

    private static string LengthOf(MemberResult member) => member.Length is { } length ? string.Create(CultureInfo.InvariantCulture, $"{length:0.####} m") : "";

    private static string ForcesOf(MemberResult member) => member.Governing is not { } governing ? "" : string.Create(CultureInfo.InvariantCulture,
        $"{governing.Situation} at {governing.Station:0.###} m: N {governing.Forces.N / 1e3:0.###} kN, Vy {governing.Forces.Vy / 1e3:0.###} kN, Vz {governing.Forces.Vz / 1e3:0.###} kN, T {governing.Forces.T / 1e3:0.####} kN·m, My {governing.Forces.My / 1e3:0.####} kN·m, Mz {governing.Forces.Mz / 1e3:0.####} kN·m");

    private static IEnumerable<string> RunChanges(ScreeningRecord then, ScreeningRecord now)
    {
        if (then.Version != now.Version) yield return $"program version {then.Version} → {now.Version}";
        if (then.Model.Sha256 == now.Model.Sha256) yield return "the same model";
        if (!then.Model.ReadToEnd) yield return "the earlier model could not be read to its end";
        if (!now.Model.ReadToEnd) yield return "the later model could not be read to its end";
        if (!then.ForcesFiles.Select(f => f.Sha256).SequenceEqual(now.ForcesFiles.Select(f => f.Sha256))) yield return "other forces tables";
        foreach (var (a, b) in then.Basis.Zip(now.Basis)) if (a.Text != b.Text) yield return $"{b.Kind}: {a.Text} → {b.Text}";
        var before = then.Settings.GroupBy(s => s.Key, StringComparer.Ordinal).ToDictionary(g => g.Key, g => g.First().Value, StringComparer.Ordinal);
        foreach (var setting in now.Settings)
            if (before.GetValueOrDefault(setting.Key) is var old && old != setting.Value) yield return $"{setting.Key}: {old ?? "not known"} → {setting.Value}";
    }
}
