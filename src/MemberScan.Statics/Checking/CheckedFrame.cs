using MemberScan.Foundation.Geometry;
using MemberScan.Model.Frames;
using MemberScan.Statics.Members;

namespace MemberScan.Statics.Checking;

/// <summary>A frame whose numbers hold, with what follows from its geometry.</summary>
/// <param name="Frame">The frame.</param>
/// <param name="Members">Stiffness of each member.</param>
/// <param name="SupportOf">Number of the support of each node, −1 for none.</param>
/// <param name="NodeAxes">Axes in which the unknowns of each node are counted; null for the global ones.</param>
internal sealed record CheckedFrame(Frame Frame, MemberStiffness[] Members, int[] SupportOf, MemberAxes?[] NodeAxes);
