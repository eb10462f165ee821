using System.Collections.Immutable;
using System.Globalization;
using MemberScan.Foundation.Geometry;
using MemberScan.Ifc.Analysis;
using MemberScan.Ifc.Curves;
using MemberScan.Ifc.Frames.Stiffness;
using MemberScan.Ifc.Frames.Topology;
using MemberScan.Ifc.Geometry;
using MemberScan.Model.Frames;
using MemberScan.Model.Verdicts;
using MemberScan.Part21;

namespace MemberScan.Ifc.Frames;

/// <summary>Structural analysis models as frames.</summary>
internal sealed class FrameReader(
    Instances instances, Relations relations, PlacementReader placements, AnalyticalMemberReader analytical, CurveReader curves, JointReader joints,
    ConnectionReader connections, ReleaseReader releases, FrameLoadReader loads, StiffnessReader stiffness)
{
    /// <summary>Reads all analysis models that hold curve members, in the order of the file.</summary>
    public ImmutableArray<AnalysisFrame> Read() =>
    [
        .. instances.File.RecordsOf("IFCSTRUCTURALANALYSISMODEL")
            .Select(model => (model, StructuralItems.Of(model, instances, relations, joints)))
            .Where(pair => pair.Item2.Members.Count > 0)
            .Select(pair => Read(pair.model, pair.Item2)),
    ];

    private AnalysisFrame Read(Part21Record model, StructuralItems items)
    {
        var assembly = new FrameAssembly();
        foreach (var other in items.Others)
            assembly.Refuse(new Reason(ReasonCode.NoForces, $"{ConnectionReader.Named(other)} is {other.Keyword}, which a frame does not hold"));
        foreach (var connection in items.Connections)
            if (connections.Read(connection).TryGet(out var found, out var why)) assembly.Add(found.Value);
            else assembly.Refuse(why);
        foreach (var member in items.Members) Add(assembly, member);

        var (situations, cases) = loads.Read(model, items, assembly, out var hasLoads);
        var frame = assembly.Refusals.Count > 0 ? null : new Frame { Nodes = assembly.Nodes, Members = assembly.Members, Supports = assembly.Supports, Situations = situations };
        return new AnalysisFrame
        {
            Id = model.Id,
            Name = Named(model),
            Lines = [.. items.Members.Select(m => m.Id)],
            Frame = frame,
            Pieces = [.. assembly.Pieces],
            Cases = cases,
            HasLoads = hasLoads,
            HasResults = HasResults(model),
            Refusals = [.. assembly.Refusals],
            Notes = [.. assembly.Notes],
        };
    }

    private void Add(FrameAssembly assembly, Part21Record record)
    {
        var name = ConnectionReader.Named(record);
        var line = analytical.Read(record.Id)!;
        if (line.EccentricCardinalPoint is { } point)
        {
            assembly.Refuse(new Reason(ReasonCode.AxesUnknown, $"{name} runs along cardinal point {point} of its section, not its centroid, which is not covered"));
            return;
        }

        if (!Course.Read(record, line, instances, curves).TryGet(out var course, out var noCourse))
        {
            assembly.Refuse(noCourse with { Message = $"{name}: {noCourse.Message}" });
            return;
        }

        var axis = placements.Direction(record[8]) is { } given ? line.ToProject.Direction(given) : (Vector3?)null;
        if (!stiffness.Read(record, line, axis, name).TryGet(out var found, out var noStiffness))
        {
            assembly.Refuse(noStiffness);
            return;
        }

        if (joints.Read(line, out var noJoint) is not { } tied)
        {
            assembly.Refuse(noJoint! with { Message = $"{name}: {noJoint.Message}" });
            return;
        }

        if (course.Value.IsCurved) assembly.Note(string.Create(CultureInfo.InvariantCulture, $"{name} is curved and is taken as a chain of chords that turn by {Course.TurnOfChord * 180 / Math.PI:0.#}° at most"));
        foreach (var note in found.Value.Notes) assembly.Note(note);
        assembly.Add(record, line, course.Value, found.Value, tied, releases);
    }

    private bool HasResults(Part21Record model)
    {
        var groups = Instances.IdsOf(model[8]).ToHashSet();
        return groups.Count > 0 && ((string[])["IFCSTRUCTURALCURVEREACTION", "IFCSTRUCTURALPOINTREACTION"])
            .Any(keyword => instances.File.RecordsOf(keyword).Any(reaction => relations.GroupsOf(reaction.Id).Any(groups.Contains)));
    }

    private static string Named(Part21Record model) => $"analysis model {ConnectionReader.Named(model)}";
}
