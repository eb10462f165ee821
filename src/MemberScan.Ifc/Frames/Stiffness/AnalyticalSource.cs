using MemberScan.Ifc.Materials;
using MemberScan.Ifc.Sections;
using MemberScan.Model;
using MemberScan.Model.Members;
using MemberScan.Model.Verdicts;
using MemberScan.Part21;

namespace MemberScan.Ifc.Frames.Stiffness;

/// <summary>Section and material that hang on an analytical member itself.</summary>
internal sealed class AnalyticalSource(Instances instances, Relations relations, ProfileReader profiles, MaterialReader materials)
{
    /// <summary>The section, by profile properties (IFC2X3) or a material profile set, and the material.</summary>
    public (Finding<SectionFinding> Section, Material Material) Read(Part21Record member)
    {
        var section = Section(member);
        return (section, materials.Read(member.Id, (section as Finding<SectionFinding>.Found)?.Value));
    }

    private Finding<SectionFinding> Section(Part21Record member)
    {
        if (member.Keyword == "IFCSTRUCTURALCURVEMEMBERVARYING") return Missing(ReasonCode.SectionNotCovered, "it varies along its length");
        if (materials.IsTapering(member.Id)) return Missing(ReasonCode.SectionNotCovered, "its material profile set tapers to another");

        foreach (var (properties, _) in relations.ProfilePropertiesOf(member.Id))
            if (instances.File.TryFind(properties, out var record) && instances.TryFollow(record[1], out var profile))
                return Of(profiles.Read(profile), $"profile properties #{properties}");

        var sets = materials.ProfilesOf(member.Id);
        return sets.Length switch
        {
            0 => Missing(ReasonCode.NoSection, "neither it nor a body names a profile"),
            1 => Of(sets[0], "material profile set"),
            _ => Missing(ReasonCode.SectionNotCovered, "its material profile set has several profiles"),
        };
    }

    private static Finding<SectionFinding> Of(Finding<ProfileShape> profile, string source)
    {
        if (!profile.TryGet(out var found, out var why)) return new Finding<SectionFinding>.Missing(why);

        return found.Value.IsMoved
            ? Missing(ReasonCode.SectionNotCovered, $"{found.Source} is turned or shifted by its position, and no body shows how it lies in the member")
            : new Finding<SectionFinding>.Found(found.Value.Section, $"{source}, {found.Source}");
    }

    private static Finding<SectionFinding> Missing(ReasonCode code, string message) => new Finding<SectionFinding>.Missing(new Reason(code, message));
}
