using System.Collections.Immutable;
using MemberScan.Foundation.Geometry;

namespace MemberScan.Ifc.Meshes;

/// <summary>A body of plane faces: points, and faces as loops of indices into them.</summary>
/// <param name="Points">Points [m], each once.</param>
/// <param name="Faces">Faces; the first loop of each bounds it, the others are holes.</param>
internal sealed record Mesh(ImmutableArray<Vector3> Points, ImmutableArray<ImmutableArray<ImmutableArray<int>>> Faces)
{
    /// <summary>Most faces of a mesh that recognition is tried on.</summary>
    public const int MaxFaces = 5_000;

    /// <summary>Most points of a mesh that recognition is tried on.</summary>
    public const int MaxPoints = 5_000;
}
