using System.Collections.Immutable;
using MemberScan.Mechanics.Sections;

namespace MemberScan.Model.Members;

/// <summary>The cross-section of a member as read.</summary>
/// <param name="Shapes">One section; two when corner radii are absent and both readings are checked, the less favourable deciding.</param>
/// <param name="Name">Profile name as written; empty if none.</param>
/// <param name="Notes">What a reader must know: "radii assumed", "cut", "y reversed" …</param>
public sealed record SectionFinding(ImmutableArray<CrossSection> Shapes, string Name, ImmutableArray<string> Notes)
{
    /// <summary>The first shape, as read.</summary>
    public CrossSection Shape => Shapes[0];
}
