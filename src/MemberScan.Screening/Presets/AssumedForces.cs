using System.Collections.Immutable;
using MemberScan.Model.Forces;
using MemberScan.Model.Members;
using MemberScan.Model.Presets;
using MemberScan.Screening.Contacts;

namespace MemberScan.Screening.Presets;

/// <summary>Forces by the load presets that are switched on, for members that have no others.</summary>
internal static class AssumedForces
{
    /// <summary>The forces by key of member, in the order of the presets; the first preset that is for a member counts.</summary>
    /// <param name="all">All members, whose geometry says where they touch.</param>
    /// <param name="rules">The presets.</param>
    /// <param name="isWanted">Whether a member has no other forces.</param>
    /// <param name="contacts">The contacts that spans and supports come from; null when no preset is switched on.</param>
    public static Dictionary<string, List<MemberForces>> Of(ImmutableArray<Member> all, LoadRules rules, Func<string, bool> isWanted, out ContactList? contacts)
    {
        var forces = new Dictionary<string, List<MemberForces>>(StringComparer.Ordinal);
        contacts = null;
        if (rules.Presets.IsEmpty) return forces;

        contacts = ContactFinder.Find(all, rules.ContactTolerance);
        var members = new PresetMembers(all, contacts);
        foreach (var use in rules.Presets)
        {
            Func<Member, IEnumerable<MemberForces>> of = use.Preset.Kind switch
            {
                PresetKind.Guard => new GuardAssumptions(members, use).Of,
                PresetKind.Maintenance => new MaintenanceAssumptions(members, use).Of,
                _ => new HangerAssumptions(members, use).Of,
            };
            foreach (var member in all)
                if (isWanted(member.Key) && !forces.ContainsKey(member.Key) && of(member).ToList() is { Count: > 0 } found)
                    forces[member.Key] = found;
        }

        return forces;
    }
}
