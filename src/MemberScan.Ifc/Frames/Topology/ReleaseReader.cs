using MemberScan.Foundation.Geometry;
using MemberScan.Ifc.Analysis;
using MemberScan.Ifc.Geometry;
using MemberScan.Model;
using MemberScan.Model.Frames;
using MemberScan.Model.Verdicts;
using MemberScan.Part21;

namespace MemberScan.Ifc.Frames.Topology;

/// <summary>How a member end is joined to its node: rigidly where no condition is given, else by the condition, in the axes of the frame member.</summary>
internal sealed class ReleaseReader(Instances instances, PlacementReader placements, BoundaryReader boundaries)
{
    /// <summary>Reads the condition of a relation; null with the reason when it cannot be said in the member's axes.</summary>
    /// <param name="relation">IfcRelConnectsStructuralMember.</param>
    /// <param name="name">The member, for messages.</param>
    /// <param name="line">The analytical member, in whose axes the condition is given.</param>
    /// <param name="axes">Axes of the frame member.</param>
    /// <param name="why">The reason.</param>
    public Restraints? Read(Part21Record relation, string name, AnalyticalMember line, MemberAxes axes, out Reason? why)
    {
        why = null;
        if (instances.TryFollow(relation[7], out var additional) && additional.Keyword == "IFCSLIPPAGECONNECTIONCONDITION")
            return Not($"{name} slips in its joint #{relation.Id}, which a linear analysis does not cover", out why);
        if (relation[6].IsEmpty) return Restraints.AllFixed;
        if (!instances.TryFollow(relation[6], out var condition)) return Not($"the condition of the joint #{relation.Id} of {name} is missing", out why);
        if (boundaries.Read(condition, out why) is not { } held)
        {
            why = why! with { Message = $"{name}: {why.Message}" };
            return null;
        }

        if (Axes(relation, line, axes) is not { } given) return Not($"the coordinate system of the joint #{relation.Id} of {name} is damaged", out why);

        return RestraintAxes.Turned(held, given, axes) is { } turned
            ? turned
            : Not($"the joint #{relation.Id} of {name} is released in axes that lie askew to its section's, which is not covered", out why);
    }

    private MemberAxes? Axes(Part21Record relation, AnalyticalMember line, MemberAxes axes)
    {
        // The analytical member's own axes; where it has none the section has no preferred axes either, or it is curved.
        var own = line.Axes is Finding<MemberAxes>.Found found ? found.Value : axes;
        if (relation[9].IsEmpty) return own;
        if (placements.Axis2(relation[9]) is not { } system) return null;

        Vector3 Turned(Vector3 d) => d.X * own.X + d.Y * own.Y + d.Z * own.Z;
        return new MemberAxes(axes.Origin, Turned(system.X), Turned(system.Y), Turned(system.Z));
    }

    private static Restraints? Not(string message, out Reason? why)
    {
        why = new Reason(ReasonCode.NoForces, message);
        return null;
    }
}
