using System.Collections.Immutable;
using MemberScan.Mechanics.Edges;
using MemberScan.Mechanics.Sections;

namespace MemberScan.Mechanics.Profiles;

/// <summary>The edges of the sections that are given by their outline.</summary>
internal static class ProfileEdges
{
    /// <summary>Edges of an outline or an open profile about the centroid, the material to their left.</summary>
    public static ImmutableArray<EdgeCurve> Of(CrossSection section) => section switch
    {
        OutlineSection outline => outline.Edges,
        OpenProfile profile => profile.Edges,
        _ => throw new ArgumentOutOfRangeException(nameof(section), section.Kind, "no outline for this kind"),
    };
}
