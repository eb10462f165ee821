using System.Collections.Immutable;
using System.Globalization;
using MemberScan.Ifc.Units;
using MemberScan.Mechanics.Forces;
using MemberScan.Model.Forces;
using MemberScan.Model.Members;
using MemberScan.Model.Rules;
using MemberScan.Model.Rules.PropertySets;
using MemberScan.Model.Verdicts;
using MemberScan.Part21;

namespace MemberScan.Ifc.ForceSets;

/// <summary>Section forces of elements from their property sets, through the mappings of the settings; in the axes of the member.</summary>
internal sealed class ForceSetReader
{
    /// <summary>Share of the length within which a station is at an end.</summary>
    private const double AtEnd = 1e-6;

    private readonly Instances _instances;
    private readonly ForceRules _rules;
    private readonly PropertyNumbers _numbers;
    private readonly ImmutableArray<(PropertySetMapping Mapping, NamePattern Set, ImmutableArray<NamePattern> Components)> _mappings;
    private readonly Dictionary<ulong, List<ulong>> _setsOf = [];

    public ForceSetReader(Instances instances, ModelUnits units, UnitReader reader, ForceRules rules)
    {
        (_instances, _rules, _numbers) = (instances, rules, new PropertyNumbers(instances, units, reader));
        _mappings = [.. rules.PropertySets.Select(m => (m, new NamePattern(m.Set), m.Components.Select(c => new NamePattern(c.Property)).ToImmutableArray()))];
        if (_mappings.IsEmpty) return;

        foreach (var relation in instances.File.RecordsOf("IFCRELDEFINESBYPROPERTIES"))
            foreach (var element in Instances.IdsOf(relation[4]))
                foreach (var set in instances.FollowAll(relation[5]))
                    Add(element, set);
    }

    /// <summary>Whether an element has a set with at least one mapped property.</summary>
    public bool HasForces(ulong element) => Sets(element).Any();

    /// <summary>Reads the forces of all candidates, in candidate order and then in the order of the sets.</summary>
    public ImmutableArray<MemberForces> Read(ImmutableArray<Member> members)
    {
        var forces = ImmutableArray.CreateBuilder<MemberForces>();
        foreach (var member in members)
        {
            var names = new HashSet<string>(StringComparer.Ordinal);
            foreach (var (set, index, wildcard) in Sets(member.Element.StepId)) forces.Add(Of(member, set, index, wildcard, names));
        }

        return forces.ToImmutable();
    }

    private void Add(ulong element, Part21Record set)
    {
        if (set.Keyword != "IFCPROPERTYSET") return;
        if (!_setsOf.TryGetValue(element, out var sets)) _setsOf[element] = sets = [];
        if (!sets.Contains(set.Id)) sets.Add(set.Id);
    }

    private IEnumerable<(Part21Record Set, int Mapping, string? Wildcard)> Sets(ulong element)
    {
        foreach (var id in _setsOf.GetValueOrDefault(element) ?? [])
        {
            if (!_instances.File.TryFind(id, out var set)) continue;

            var (name, properties) = (Instances.Text(set[2]).Trim(), _instances.FollowAll(set[4]).Select(p => Instances.Text(p[0])).ToList());
            for (var i = 0; i < _mappings.Length; i++)
                if (_mappings[i].Set.Fits(name, out var wildcard, out _) && properties.Exists(p => _mappings[i].Components.Any(c => c.Fits(p, out _, out _))))
                {
                    yield return (set, i, wildcard);
                    break;
                }
        }
    }

    private MemberForces Of(Member member, Part21Record set, int index, string? wildcard, HashSet<string> names)
    {
        var (mapping, _, patterns) = _mappings[index];
        var setName = Instances.Text(set[2]).Trim();
        var forces = new MemberForces
        {
            MemberKey = member.Key,
            Situation = SituationOf(mapping, setName, wildcard),
            Stations = [],
            Source = string.Create(CultureInfo.InvariantCulture, $"property set '{setName}' #{set.Id}"),
        };
        MemberForces Unusable(Reason why) => forces with { Unusable = why };
        if (!names.Add(forces.Situation.Name)) return Unusable(new Reason(ReasonCode.ForcesIncomplete, $"the situation '{forces.Situation.Name}' stands in two property sets"));
        if (member.ItemCount > 1) return Unusable(new Reason(ReasonCode.ForcesIncomplete, $"{forces.Source} belongs to an element of {member.ItemCount} items and does not say which one"));
        if (!member.Length.TryGet(out var length, out var noLength)) return Unusable(noLength);
        if (!(length.Value > 0 && double.IsFinite(length.Value))) return Unusable(new Reason(ReasonCode.LengthAmbiguous, "the length is beyond the range of numbers"));

        var properties = _instances.FollowAll(set[4]).ToList();
        if (MappedSet.Read(mapping, patterns, properties, _numbers, length.Value, _rules.MissingComponentsAreZero, out var zeros, out var why) is not { } stations)
            return Unusable(why! with { Message = $"{forces.Source}: {why.Message}" });

        var words = zeros.IsEmpty ? "in the member's axes" : $"in the member's axes; components left out count as zero: {string.Join(", ", zeros)}";
        return mapping.Convention == ForceConvention.EndForces
            ? FromEndForces(forces, stations, length.Value, words)
            : forces with { Stations = stations, Conversion = words };
    }

    private static MemberForces FromEndForces(MemberForces forces, ImmutableArray<ForceStation> stations, double length, string words)
    {
        if (stations.Any(s => Math.Abs(s.X) > AtEnd * length && Math.Abs(s.X - length) > AtEnd * length))
            return forces with { Unusable = new Reason(ReasonCode.ConventionUnknown, $"{forces.Source} has stations between the ends, which end forces cannot have") };

        return forces with
        {
            Stations = [.. stations.Select(s => Math.Abs(s.X) <= AtEnd * length ? s with { Forces = -1 * s.Forces } : s)],
            Conversion = words + "; end forces: values at the start reversed",
        };
    }

    private Situation SituationOf(PropertySetMapping mapping, string setName, string? wildcard)
    {
        var name = mapping.Situation ?? (string.IsNullOrWhiteSpace(wildcard) ? setName : wildcard);
        var (kind, source) = (mapping.Kind, "settings, mapping");
        if (kind == SituationKind.Unknown)
        {
            var pattern = _rules.Kinds.FirstOrDefault(p => p.Fits(name));
            (kind, source) = pattern is not null ? (pattern.Kind, $"settings, pattern '{pattern.Pattern}'")
                : _rules.KindOfAll != SituationKind.Unknown ? (_rules.KindOfAll, "given for the run")
                : (SituationKind.Unknown, "not stated");
        }

        return new Situation(name, kind, source, !mapping.IsLoadCase, $"property set '{setName}'") { IsLinear = mapping.IsLinear };
    }
}
