namespace MemberScan.Mechanics.Meshes;

/// <summary>Patches that cover a section or, where it has two axes of symmetry, its first quadrant.</summary>
/// <param name="Patches">The patches, in an order in which neighbours stand close.</param>
/// <param name="IsQuarter">Whether only y ≥ 0, z ≥ 0 is covered.</param>
/// <param name="Scale">A length of the size of the section [m].</param>
internal sealed record PatchMesh(IReadOnlyList<Patch> Patches, bool IsQuarter, double Scale)
{
    /// <summary>Whether the patches were laid along the walls by hand, so that a moderate degree will do for many of them.</summary>
    public bool IsGraded { get; init; }
}
