using System.Globalization;
using MemberScan.Model.Forces;
using MemberScan.Model.Rules;
using MemberScan.Part21;

namespace MemberScan.Ifc.Analysis;

/// <summary>Load situations from result groups: name, kind, and whether the results act in full.</summary>
internal sealed class SituationReader(Instances instances, ForceRules rules)
{
    private readonly Dictionary<ulong, Situation> _known = [];
    private readonly HashSet<string> _names = new(StringComparer.Ordinal);

    /// <summary>The situation of a result group.</summary>
    public Situation Read(Part21Record resultGroup)
    {
        if (_known.TryGetValue(resultGroup.Id, out var known)) return known;

        var hasLoads = instances.TryFollow(resultGroup[6], out var loads);
        var name = hasLoads ? Instances.Text(loads[2]).Trim() : "";
        if (name.Length == 0) name = Instances.Text(resultGroup[2]).Trim();
        if (name.Length == 0) name = string.Create(CultureInfo.InvariantCulture, $"result group #{resultGroup.Id}");
        name = Unique(name, resultGroup.Id);
        var type = hasLoads ? Instances.Literal(loads[5]) : "";
        var (kind, source) = Kind(name, hasLoads ? Instances.Text(loads[9]).Trim() : "");
        var origin = hasLoads
            ? string.Create(CultureInfo.InvariantCulture, $"result group #{resultGroup.Id} of {Words(type)} #{loads.Id}")
            : string.Create(CultureInfo.InvariantCulture, $"result group #{resultGroup.Id} without a load group");
        return _known[resultGroup.Id] = new Situation(name, kind, source, type == "LOAD_COMBINATION", origin)
        {
            IsLinear = Instances.Literal(resultGroup[7]) == "T",
        };
    }

    /// <summary>The situation of a combination that has no results of its own; they are superposed from those of its cases.</summary>
    public Situation OfCombination(Part21Record combination)
    {
        if (_known.TryGetValue(combination.Id, out var known)) return known;

        var name = Instances.Text(combination[2]).Trim();
        if (name.Length == 0) name = string.Create(CultureInfo.InvariantCulture, $"combination #{combination.Id}");
        name = Unique(name, combination.Id);
        var (kind, source) = Kind(name, Instances.Text(combination[9]).Trim());
        return _known[combination.Id] = new Situation(
            name, kind, source, ActsInFull: true, string.Create(CultureInfo.InvariantCulture, $"combination #{combination.Id}, superposed from the results of its cases"));
    }

    /// <summary>The situation of a load case or combination that is solved here.</summary>
    public Situation OfLoads(Part21Record group)
    {
        if (_known.TryGetValue(group.Id, out var known)) return known;

        var type = Instances.Literal(group[5]);
        var name = Instances.Text(group[2]).Trim();
        if (name.Length == 0) name = string.Create(CultureInfo.InvariantCulture, $"{Words(type)} #{group.Id}");
        name = Unique(name, group.Id);
        var (kind, source) = Kind(name, Instances.Text(group[9]).Trim());
        return _known[group.Id] = new Situation(
            name, kind, source, type == "LOAD_COMBINATION", string.Create(CultureInfo.InvariantCulture, $"{Words(type)} #{group.Id}, solved by our own frame analysis"))
        {
            IsLinear = true,
        };
    }

    private string Unique(string name, ulong id)
    {
        if (_names.Add(name)) return name;

        var numbered = string.Create(CultureInfo.InvariantCulture, $"{name} (#{id})");
        _ = _names.Add(numbered);
        return numbered;
    }

    /// <summary>Kind by the settings' patterns, then by the purpose in the model, then by the one kind for all.</summary>
    private (SituationKind Kind, string Source) Kind(string name, string purpose)
    {
        foreach (var pattern in rules.Kinds)
            if (pattern.Fits(name))
                return (pattern.Kind, $"settings, pattern '{pattern.Pattern}'");

        switch (purpose.ToUpperInvariant())
        {
            case "SLS": return (SituationKind.Service, "purpose 'SLS' in the model");
            case "ULS" or "ALS": return (SituationKind.Design, $"purpose '{purpose}' in the model");
        }

        return rules.KindOfAll != SituationKind.Unknown ? (rules.KindOfAll, "given for the run") : (SituationKind.Unknown, "not stated");
    }

    private static string Words(string predefinedType) => predefinedType switch
    {
        "LOAD_COMBINATION" => "combination",
        "LOAD_CASE" => "load case",
        _ => "load group",
    };
}
