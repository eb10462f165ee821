using System.Collections.Immutable;
using System.Text.Json;
using MemberScan.Foundation.Units;
using MemberScan.Inputs.Json;
using MemberScan.Model.Forces;
using MemberScan.Model.Limits;
using MemberScan.Model.Limits.Keys;

namespace MemberScan.Inputs.SettingsFiles.Limits;

/// <summary>Reads the parts of a settings file that say which checks are made and against what.</summary>
/// <param name="values">Takes values out of the file.</param>
/// <param name="given">Takes the keys that are given.</param>
/// <param name="prefix">What stands before the keys in messages; empty for the file itself.</param>
internal sealed class LimitSetReader(JsonValues values, ISet<string> given, string prefix)
{
    private const string StressExample = "10 MPa";

    /// <summary>Reads <c>basis</c>.</summary>
    public LimitSet Basis(JsonItem item, LimitSet set)
    {
        foreach (var (key, _, value) in values.Object(item, $"{prefix}basis", SettingKeys.Basis))
        {
            var path = $"{prefix}basis.{key}";
            set = key switch
            {
                "service" => set with { Basis = set.Basis with { Service = Limit(value, path, set.Basis.Service ?? Model.Limits.Basis.Default.Service!, SettingKeys.Service, SettingKeys.ServiceCriteria) } },
                "design" => set with { Basis = set.Basis with { Design = Limit(value, path, set.Basis.Design ?? Model.Limits.Basis.Default.Design!, SettingKeys.Design, SettingKeys.DesignCriteria) } },
                "wall" => set with { Wall = LimitKeys.Of(Choose(value, path, LimitKeys.Walls, WallWord.Automatic)) },
                "brittle" => set with { Brittle = Brittle(value, path) },
                "gammaM1" => set with { GammaM1 = Number(value, path, SettingKeys.Factor, set.GammaM1) },
                _ => set with { GammaM2 = Number(value, path, SettingKeys.Factor, set.GammaM2) },
            };
        }

        var needsLimits = set.Basis.Service?.Criterion == Criterion.LargestNormalStress || set.Basis.Design?.Criterion == Criterion.LargestNormalStress;
        if (needsLimits && set.Brittle is null)
            values.Fail(InputCodes.KeyMissing, item, $"{prefix}basis has the criterion largest-normal-stress and lacks the key 'brittle' with its limits; add it");
        return set;
    }

    /// <summary>Reads <c>checks</c>.</summary>
    public LimitSet Checks(JsonItem item, LimitSet set)
    {
        foreach (var (key, _, value) in values.Object(item, $"{prefix}checks", LimitKeys.Checks))
        {
            var path = Given($"{prefix}checks.{key}");
            var off = values.List(value, path).Select(entry => values.Word(entry, path, CheckKeys.All)).OfType<string>();
            set = set with { ChecksOff = off.ToImmutableSortedSet(StringComparer.Ordinal) };
        }

        return set;
    }

    /// <summary>Reads <c>stability</c>.</summary>
    public LimitSet Stability(JsonItem item, LimitSet set)
    {
        var rules = set.Stability;
        foreach (var (key, _, value) in values.Object(item, $"{prefix}stability", SettingKeys.Stability))
        {
            var path = $"{prefix}stability.{key}";
            rules = key switch
            {
                "lengthFactor" => rules with { LengthFactor = Number(value, path, SettingKeys.LengthFactor, rules.LengthFactor), IsLengthFactorGiven = true },
                "factorByRole" => rules with { FactorByRole = Factors(value, Given(path)) },
                "ends" => rules with { EndsFromContacts = Choose(value, path, LimitKeys.Ends, true) },
                _ => rules with { Forming = Choose(value, path, LimitKeys.Forming, TubeForming.Unknown) },
            };
        }

        return set with { Stability = rules };
    }

    /// <summary>Reads <c>threads</c>.</summary>
    public LimitSet Threads(JsonItem item, LimitSet set)
    {
        var rules = set.Threads;
        foreach (var (key, _, value) in values.Object(item, $"{prefix}threads", LimitKeys.Threads))
        {
            var path = $"{prefix}threads.{key}";
            rules = key switch
            {
                "rule" => rules with { Rule = LimitKeys.Of(Choose(value, path, LimitKeys.ThreadRules, ThreadWord.Automatic)) },
                "area" => rules with { Area = Choose(value, path, LimitKeys.Areas, rules.Area) },
                "allowable" => rules with { Allowable = Stress(value, Given(path)) },
                "fu" => rules with { TensileStrength = Stress(value, Given(path)) },
                "cutThread" => rules with { IsCut = values.Flag(value, Given(path)) ?? true },
                "temperatureFactor" => rules with { TemperatureFactor = Number(value, path, LimitKeys.TemperatureFactor, 1) },
                _ => rules with { ByMember = [.. values.Object(value, Given(path)).Select(entry => (entry.Key, values.Text(entry.Value, $"{path}.{Excerpt.Of(entry.Key)}") ?? ""))] },
            };
        }

        return set with { Threads = rules };
    }

    /// <summary>Reads <c>materials.welds</c>, or <c>welds</c> of a rule.</summary>
    public LimitSet Welds(JsonItem list, string path, LimitSet set)
    {
        var welds = ImmutableArray.CreateBuilder<WeldRule>();
        foreach (var (item, at) in Entries(list, Given(path)))
        {
            if (!values.Has(item, at, "members", "weldedYield")) continue;

            var rule = new WeldRule("*", null);
            foreach (var (key, _, value) in values.Object(item, at, LimitKeys.Weld))
            {
                rule = key == "members" ? rule with { Members = values.Text(value, $"{at}.{key}") ?? "*" }
                    : rule with { WeldedYield = value is { Kind: JsonValueKind.String, Text: "no-welds" } ? null : Stress(value, $"{at}.{key}") };
            }

            welds.Add(rule);
        }

        return set with { Welds = welds.ToImmutable() };
    }

    /// <summary>Reads <c>deflection</c>.</summary>
    public LimitSet Deflection(JsonItem list, string path, LimitSet set)
    {
        var rules = ImmutableArray.CreateBuilder<DeflectionRule>();
        foreach (var (item, at) in Entries(list, Given(path)))
        {
            if (!values.Has(item, at, "name", "role")) continue;

            var rule = new DeflectionRule("", "", null, null);
            foreach (var (key, _, value) in values.Object(item, at, LimitKeys.Deflection))
            {
                rule = key switch
                {
                    "name" => rule with { Name = values.Text(value, $"{at}.{key}") ?? "" },
                    "role" => rule with { Role = values.Text(value, $"{at}.{key}") ?? "" },
                    "spanOver" => rule with { SpanOver = values.Number(value, $"{at}.{key}", LimitKeys.SpanOver.Least, LimitKeys.SpanOver.Most) },
                    _ => rule with { Largest = values.Quantity(value, $"{at}.{key}", Quantity.Length, "10 mm", LimitKeys.Length.Least, LimitKeys.Length.Most) },
                };
            }

            if (rule is { SpanOver: null, Largest: null })
                values.Fail(InputCodes.KeyMissing, item, $"{at} lacks the key 'spanOver' or 'largest'; add one of them");
            rules.Add(rule);
        }

        return set with { Deflection = rules.ToImmutable() };
    }

    // Null switches the limit off: situations of that kind are then not checked.
    private StressLimit? Limit(JsonItem item, string path, StressLimit limit, ImmutableArray<string> keys, WordTable<Criterion> criteria)
    {
        if (item.Kind == JsonValueKind.Null)
        {
            given.Add(path);
            return null;
        }

        JsonItem? factor = null;
        foreach (var (key, _, value) in values.Object(item, path, keys))
        {
            if (key == "criterion")
            {
                limit = limit with { Criterion = Choose(value, $"{path}.{key}", criteria, limit.Criterion) };
                continue;
            }

            limit = limit with { Factor = Number(value, $"{path}.{key}", SettingKeys.Factor, limit.Factor) };
            factor = value;
        }

        if (OwnFactor(limit.Criterion) is not { } own) return limit;
        if (factor is not null) values.Fail(InputCodes.OutOfRange, factor, $"{path} has a criterion whose factors are its own; leave out '{keys[1]}'");
        return limit with { Factor = own };
    }

    /// <summary>Factor of a criterion that brings its own; null where it is set.</summary>
    internal static double? OwnFactor(Criterion criterion) => criterion switch
    {
        Criterion.Aisc360Asd => 1.67,
        Criterion.Aisc360Lrfd => 1 / 0.90,
        Criterion.LargestNormalStress => 1,
        _ => null,
    };

    private BrittleLimits? Brittle(JsonItem item, string path)
    {
        given.Add(path);
        if (item.Kind == JsonValueKind.Null || !values.Has(item, path, "tension", "compression", "situations")) return null;

        var (tension, compression, kind) = (1e6, 1e6, SituationKind.Service);
        foreach (var (key, _, value) in values.Object(item, path, LimitKeys.Brittle))
        {
            if (key == "situations") kind = values.Word(value, $"{path}.{key}", SettingKeys.Kinds.Words) is { } word ? SettingKeys.Kinds.Of(word) : kind;
            else if (Stress(value, $"{path}.{key}") is { } stress) (tension, compression) = key == "tension" ? (stress, compression) : (tension, stress);
        }

        return new BrittleLimits(tension, compression, kind);
    }

    private ImmutableSortedDictionary<string, double> Factors(JsonItem item, string path)
    {
        var factors = ImmutableSortedDictionary.CreateBuilder<string, double>(StringComparer.OrdinalIgnoreCase);
        foreach (var (role, _, value) in values.Object(item, path))
            if (values.Number(value, $"{path}.{Excerpt.Of(role)}", SettingKeys.LengthFactor.Least, SettingKeys.LengthFactor.Most) is { } factor)
                factors[role] = factor;
        return factors.ToImmutable();
    }

    private IEnumerable<(JsonItem Item, string Path)> Entries(JsonItem list, string path)
    {
        var number = 0;
        foreach (var item in values.List(list, path))
        {
            if (++number > LimitKeys.MostEntries)
            {
                values.Fail(InputCodes.OutOfRange, item, $"{path} has more than {LimitKeys.MostEntries} entries; join some of their patterns");
                yield break;
            }

            yield return (item, $"{path}[{number}]");
        }
    }

    private double? Stress(JsonItem item, string path) => item.Kind == JsonValueKind.Null
        ? null
        : values.Quantity(item, path, Quantity.Stress, StressExample, LimitKeys.Stress.Least, LimitKeys.Stress.Most);

    private string Given(string path)
    {
        given.Add(path);
        return path;
    }

    private double Number(JsonItem item, string path, (double Least, double Most) range, double otherwise) =>
        values.Number(item, Given(path), range.Least, range.Most) ?? otherwise;

    private T Choose<T>(JsonItem item, string path, WordTable<T> table, T otherwise)
        where T : struct => values.Word(item, Given(path), table.Words) is { } word ? table.Of(word) : otherwise;
}
