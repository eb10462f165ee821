using MemberScan.Ifc.Materials;
using MemberScan.Ifc.Sections;
using MemberScan.Mechanics.Sections;
using MemberScan.Model;
using MemberScan.Model.Members;
using MemberScan.Model.Verdicts;
using MemberScan.Part21;

namespace MemberScan.Ifc.Frames.Stiffness;

/// <summary>Section and material that hang on an analytical member itself.</summary>
internal sealed class AnalyticalSource(Instances instances, Relations relations, ProfileReader profiles, MaterialReader materials)
{
    /// <summary>What hangs on an analytical member.</summary>
    /// <param name="Section">The section, of a tapering member at its start.</param>
    /// <param name="Taper">How it changes to the end; null for a member of one section.</param>
    /// <param name="Material">The material.</param>
    /// <param name="Beside">How far the section's centroid lies from the member's line [m]; zero where it lies on it.</param>
    public sealed record Own(Finding<SectionFinding> Section, Taper? Taper, Material Material, (double Y, double Z) Beside);

    /// <summary>The section, by profile properties (IFC2X3) or a material profile set, and the material.</summary>
    public Own Read(Part21Record member)
    {
        var (section, taper, beside) = Section(member);
        return new Own(section, taper, materials.Read(member.Id, (section as Finding<SectionFinding>.Found)?.Value), beside);
    }

    private (Finding<SectionFinding> Section, Taper? Taper, (double Y, double Z) Beside) Section(Part21Record member)
    {
        if (member.Keyword == "IFCSTRUCTURALCURVEMEMBERVARYING") return (Missing(ReasonCode.SectionNotCovered, "it varies along its length"), null, default);
        if (materials.IsTapering(member.Id)) return Tapering(member);

        var properties = relations.ProfilePropertiesOf(member.Id);
        if (properties.Count > 1) return (Missing(ReasonCode.SectionNotCovered, "several profile properties are related to it, so its section varies along its length"), null, default);
        if (properties.Count == 1 && instances.File.TryFind(properties[0].Properties, out var record) && instances.TryFollow(record[1], out var profile))
            return Of(profiles.Read(profile), $"profile properties #{properties[0].Properties}", mayLieBeside: true);

        var sets = materials.ProfilesOf(member.Id);
        return sets.Length switch
        {
            0 => (Missing(ReasonCode.NoSection, "neither it nor a body names a profile"), null, default),
            1 => Of(sets[0], "material profile set", mayLieBeside: !materials.RunsAlongCentroid(member.Id)),
            _ => (Missing(ReasonCode.SectionNotCovered, "its material profile set has several profiles"), null, default),
        };
    }

    private (Finding<SectionFinding> Section, Taper? Taper, (double Y, double Z) Beside) Tapering(Part21Record member)
    {
        if (materials.TaperOf(member.Id) is not { } ends) return (Missing(ReasonCode.SectionNotCovered, "its material profile set tapers and does not name one profile at each end"), null, default);

        var (start, _, beside) = Of(ends.Start, "material profile set", mayLieBeside: true);
        var (end, _, besideAtEnd) = Of(ends.End, "material profile set", mayLieBeside: true);
        if (start is not Finding<SectionFinding>.Found first) return (start, null, default);
        if (end is not Finding<SectionFinding>.Found last) return (end, null, default);
        if (beside != default || besideAtEnd != default) return (Missing(ReasonCode.SectionNotCovered, "its material profile set tapers about another line than its centroid's"), null, default);

        return Taper.Of(first.Value.Shape, last.Value.Shape) is { } taper
            ? (first with { Source = $"{first.Source}, tapering to {last.Value.Shape.Designation}" }, taper, default)
            : (Missing(ReasonCode.SectionNotCovered, $"its material profile set tapers from {first.Value.Shape.Designation} to {last.Value.Shape.Designation}, between which the section is not known"), null, default);
    }

    private static (Finding<SectionFinding> Section, Taper? Taper, (double Y, double Z) Beside) Of(Finding<ProfileShape> profile, string source, bool mayLieBeside)
    {
        if (!profile.TryGet(out var found, out var why)) return (new Finding<SectionFinding>.Missing(why), null, default);
        if (found.Value.IsMoved)
            return (Missing(ReasonCode.SectionNotCovered, $"{found.Source} is turned or shifted by its position, and no body shows how it lies in the member"), null, default);

        var at = found.Value.Position.Origin;
        var hair = 1e-6 * found.Value.LargestExtent;
        var isBeside = mayLieBeside && (Math.Abs(at.X) > hair || Math.Abs(at.Y) > hair);
        return (new Finding<SectionFinding>.Found(found.Value.Section, $"{source}, {found.Source}"), null, isBeside ? (at.X, at.Y) : default);
    }

    private static Finding<SectionFinding> Missing(ReasonCode code, string message) => new Finding<SectionFinding>.Missing(new Reason(code, message));
}
