using MemberScan.Foundation.Geometry;

namespace MemberScan.Ifc.Frames;

/// <summary>Which stretch of which analytical member a frame member is.</summary>
/// <param name="Line">STEP id of the analytical member.</param>
/// <param name="Name">The analytical member by name and STEP id, for messages.</param>
/// <param name="From">Distance of its start from the start of the analytical member, along it [m].</param>
/// <param name="LineLength">Length of the whole analytical member [m].</param>
/// <param name="Sense">Which axial forces it can carry.</param>
/// <param name="Axes">Axes of the frame member: x along it, z of its section.</param>
/// <param name="IsStraight">Whether the whole analytical member is one straight line.</param>
public sealed record FramePiece(ulong Line, string Name, double From, double LineLength, AxialSense Sense, MemberAxes Axes, bool IsStraight);
