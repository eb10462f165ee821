using MemberScan.Foundation.Diagnostics;
using MemberScan.Mechanics.Sections;
using MemberScan.Model;
using MemberScan.Model.Members;

namespace MemberScan.Ifc.Analysis;

/// <summary>Which analytical members belong to which candidate.</summary>
internal sealed class BodyLines(Instances instances, Relations relations, AnalyticalMemberReader analytical, DiagnosticList diagnostics)
{
    /// <summary>The analytical members of an element, the element itself where it is one.</summary>
    public List<AnalyticalMember> LinesOf(Member member)
    {
        IEnumerable<ulong> ids = member.Element.Class.StartsWith("IfcStructuralCurveMember", StringComparison.Ordinal)
            ? [member.Element.StepId]
            : relations.AnalyticalOf(member.Element.StepId);
        return [.. ids.Select(analytical.Read).OfType<AnalyticalMember>()];
    }

    /// <summary>Gives each analytical member to the item whose body it runs along; all of them to the element that is its own candidate.</summary>
    public List<(Member Member, List<AnalyticalMember> Lines)> Assign(List<Member> items, List<AnalyticalMember> lines)
    {
        if (items.Count == 1) return [(items[0], lines)];

        var assigned = items.ConvertAll(item => (Member: item, Lines: new List<AnalyticalMember>()));
        foreach (var line in lines)
        {
            var nearest = -1;
            var least = double.PositiveInfinity;
            for (var i = 0; i < items.Count; i++)
            {
                var distance = Distance(items[i], line);
                if (distance < least) (nearest, least) = (i, distance);
            }

            if (nearest >= 0) assigned[nearest].Lines.Add(line);
            else diagnostics.Add("IFC-0022", Severity.Warning, "An analytical member runs along none of the bodies of the element that it is linked to; its forces are not used.", instances.File.TryFind(line.Id, out var record) ? record.Span : null);
        }

        return assigned;
    }

    /// <summary>Distance of an analytical member's middle from a body's line [m]; infinite when they do not run together.</summary>
    private static double Distance(Member item, AnalyticalMember line)
    {
        if (!item.Axes.TryGet(out var axes, out _) || !item.Length.TryGet(out var length, out _) || !line.Line.TryGet(out var ends, out _)) return double.PositiveInfinity;
        if (!(ends.Value.End - ends.Value.Start).TryNormalize(out var x) || x.Cross(axes.Value.X).Length > JoinedForces.ParallelTolerance) return double.PositiveInfinity;

        var middle = 0.5 * (ends.Value.Start + ends.Value.End) - axes.Value.Origin;
        var along = middle.Dot(axes.Value.X);
        var beside = (middle - along * axes.Value.X).Length;
        var reach = item.Section is Finding<SectionFinding>.Found section ? Largest(section.Value.Shape) : 0;
        var within = along > 0 && along < length.Value && beside <= Math.Max(reach, JoinedForces.StickOut * length.Value);
        return within ? beside : double.PositiveInfinity;
    }

    private static double Largest(CrossSection shape) => Math.Max(shape.ExtentY, shape.ExtentZ);
}
