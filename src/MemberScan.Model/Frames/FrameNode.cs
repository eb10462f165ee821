using MemberScan.Foundation.Geometry;

namespace MemberScan.Model.Frames;

/// <summary>A node of a frame.</summary>
/// <param name="Name">Name, unique within the frame.</param>
/// <param name="Position">Position [m].</param>
public sealed record FrameNode(string Name, Vector3 Position);
