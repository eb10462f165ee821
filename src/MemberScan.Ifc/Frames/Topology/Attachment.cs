using MemberScan.Foundation.Geometry;
using MemberScan.Part21;

namespace MemberScan.Ifc.Frames.Topology;

/// <summary>Where a curve member is tied to a node.</summary>
/// <param name="At">Distance from its start along its course [m].</param>
/// <param name="Node">Number of the node, from 0.</param>
/// <param name="Offset">From the node to the member [m], project axes; rigid.</param>
/// <param name="Relation">The relation that says so; null where only the place does.</param>
internal readonly record struct Attachment(double At, int Node, Vector3 Offset, Part21Record? Relation);
