using MemberScan.Foundation.Geometry;
using MemberScan.Model.Forces;
using MemberScan.Model.Members;
using MemberScan.Model.Presets;

namespace MemberScan.Screening.Presets;

/// <summary>A person on a member that is held at both its ends: one load downwards at the worst place.</summary>
internal sealed class MaintenanceAssumptions(PresetMembers members, PresetUse use)
{
    private static readonly string[] s_roles = ["beam", "strut"];

    /// <summary>Forces of a member; empty when the preset is not for it.</summary>
    public IEnumerable<MemberForces> Of(Member member)
    {
        if (!PresetMembers.IsFor(use, member, s_roles) || use.Preset.Concentrated is not { } load) return [];

        var blank = new Assumption(member.Key, use, "");
        if (members.Line(member.Key) is not { } line) return [blank.Doubt("the member is bent, or its section, length or axes are not known")];
        if (!members.IsLevel(member.Key)) return [blank.Doubt("the member does not lie")];
        if (members.Doubt(line.Key, _ => true) is { } doubt) return [blank.Doubt($"a contact is in doubt ({doubt.Words})")];

        var held = members.Places(line.Key, _ => true).FindAll(at => Math.Min(at, line.Length - at) <= line.Reach + members.Contacts.Tolerance);
        if (held.Count != 2) return [blank.Doubt("it does not touch another member at both its ends")];

        var assumption = blank with { Model = $"a simple span between {Assumption.At(held[0])} and {Assumption.At(held[1])}, where it touches other members" };
        return new BeamAssumptions(members, assumption, line, held).Concentrated(load, [line.Axes.Components(-Vector3.UnitZ)], betweenSupports: true);
    }
}
