using MemberScan.Mechanics.Meshes;

namespace MemberScan.Mechanics.Profiles;

/// <summary>Open profiles as walls that meet at right angles.</summary>
internal static class ProfileJunctions
{
    /// <summary>The junctions of a profile; of an I those of its first quadrant.</summary>
    public static Junction[] Of(OpenProfile p)
    {
        var (h, b, w, f, r) = (p.Depth, p.Width, p.Web, p.Flange, p.Root);
        var (left, bottom, top) = (-p.CentroidY, -p.CentroidZ, h - p.CentroidZ);
        return p.Shape switch
        {
            OpenShape.I => [new(w / 2, h / 2 - f, 1, -1, r, f, (b - w) / 2, w / 2, h / 2 - f, false)],
            OpenShape.T =>
            [
                new(w / 2, top - f, 1, -1, r, f, (b - w) / 2, w / 2, h - f, true),
                new(-w / 2, top - f, -1, -1, r, f, (b - w) / 2, w / 2, h - f, true),
            ],
            OpenShape.U =>
            [
                new(left + w, top - f, 1, -1, r, f, b - w, w, (h - 2 * f) / 2, false),
                new(left + w, bottom + f, 1, 1, r, f, b - w, w, (h - 2 * f) / 2, false),
            ],
            _ => [new(left + w, bottom + w, 1, 1, r, w, b - w, w, h - w, true)],
        };
    }

    /// <summary>Whether the junctions are those of the first quadrant alone.</summary>
    public static bool IsQuarter(OpenProfile profile) => profile.Shape == OpenShape.I;
}
