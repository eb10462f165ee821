using MemberScan.Foundation.Geometry;
using MemberScan.Ifc.Outlines;

namespace MemberScan.Ifc.Meshes;

/// <summary>A straight prism that a mesh is.</summary>
/// <param name="Start">Frame of the start plane: z along the prism, x and y those of the section's plane [m].</param>
/// <param name="Length">Distance of its end planes [m].</param>
/// <param name="Section">The section; its position is in the start plane.</param>
/// <param name="Residual">Largest distance of the mesh's points from the prism [m].</param>
/// <param name="IsOblique">Whether its ends are not square to it; its length is that along the middle.</param>
internal sealed record Prism(Transform3 Start, double Length, RecognisedSection Section, double Residual, bool IsOblique)
{
    /// <summary>Whether it is one straight run of a mesh whose bars are joined; its length is then that between the joints.</summary>
    public bool IsRun { get; init; }

    /// <summary>Of a run: straight pieces of its mesh that are too short to be runs.</summary>
    public int ShortPieces { get; init; }
}
