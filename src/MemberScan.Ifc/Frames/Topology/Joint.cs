using MemberScan.Foundation.Geometry;
using MemberScan.Part21;

namespace MemberScan.Ifc.Frames.Topology;

/// <summary>A relation between a curve member and a point connection.</summary>
/// <param name="Relation">IfcRelConnectsStructuralMember or IfcRelConnectsWithEccentricity.</param>
/// <param name="Connection">STEP id of the connection.</param>
/// <param name="Offset">From the connection to the member [m], in project axes, rigid; zero without eccentricity.</param>
internal sealed record Joint(Part21Record Relation, ulong Connection, Vector3 Offset);
