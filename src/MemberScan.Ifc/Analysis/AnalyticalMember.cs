using MemberScan.Foundation.Geometry;
using MemberScan.Model;

namespace MemberScan.Ifc.Analysis;

/// <summary>A curve member of an analysis model: its line and axes in project coordinates.</summary>
/// <param name="Id">STEP id.</param>
/// <param name="Name">Name; empty if none.</param>
/// <param name="GlobalId">GlobalId.</param>
/// <param name="Axes">Local axes at its start; x along its line, z towards its Axis.</param>
/// <param name="Line">Start and end [m], or why they are not known.</param>
/// <param name="ToProject">From the coordinates of its placement to project coordinates.</param>
/// <param name="GlobalAxes">Axes that global force components follow, in project coordinates: those of the shared placement, in IFC2X3 the project's.</param>
internal sealed record AnalyticalMember(
    ulong Id, string Name, string GlobalId, Finding<MemberAxes> Axes, Finding<(Vector3 Start, Vector3 End)> Line, Transform3 ToProject, Transform3 GlobalAxes)
{
    /// <summary>Cardinal point of its profile set usage where that need not be the section's centroid; null otherwise.</summary>
    public long? EccentricCardinalPoint { get; init; }

    /// <summary>Its length [m], or why it is not known.</summary>
    public Finding<double> Length => Line.TryGet(out var line, out var why)
        ? new Finding<double>.Found((line.Value.End - line.Value.Start).Length, line.Source)
        : new Finding<double>.Missing(why);
}
