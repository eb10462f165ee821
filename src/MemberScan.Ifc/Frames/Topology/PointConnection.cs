using MemberScan.Foundation.Geometry;
using MemberScan.Model.Frames;

namespace MemberScan.Ifc.Frames.Topology;

/// <summary>A point connection: a place, and what holds it.</summary>
/// <param name="Id">STEP id.</param>
/// <param name="Name">Name with its STEP id, for messages.</param>
/// <param name="Position">Place in project coordinates [m].</param>
/// <param name="Axes">Axes of its condition in project coordinates.</param>
/// <param name="GlobalAxes">Axes that global components of its loads follow, in project coordinates.</param>
/// <param name="Held">How it is held against the ground; null when it is not.</param>
internal sealed record PointConnection(ulong Id, string Name, Vector3 Position, MemberAxes Axes, Transform3 GlobalAxes, Restraints? Held);
