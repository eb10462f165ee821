using System.Collections.Immutable;

namespace MemberScan.Mechanics.Profiles;

/// <summary>The walls of open profiles; together they have the profile's area but for its fillets.</summary>
internal static class ProfileWalls
{
    /// <summary>The walls of a profile, flanges first.</summary>
    public static ImmutableArray<ProfileWall> Of(OpenProfile p)
    {
        var (h, b, w, f) = (p.Depth, p.Width, p.Web, p.Flange);
        var (top, bottom, left, right) = (h - p.CentroidZ, -p.CentroidZ, -p.CentroidY, b - p.CentroidY);
        var middle = 0.5 * (left + right);
        return p.Shape switch
        {
            OpenShape.I =>
            [
                new("top flange, −y side", left, top - f / 2, 1, 0, b / 2, f),
                new("top flange, +y side", right, top - f / 2, -1, 0, b / 2, f),
                new("bottom flange, −y side", left, bottom + f / 2, 1, 0, b / 2, f),
                new("bottom flange, +y side", right, bottom + f / 2, -1, 0, b / 2, f),
                new("web", middle, top - f, 0, -1, h - 2 * f, w, 0, 1),
            ],
            OpenShape.T =>
            [
                new("flange, −y side", left, top - f / 2, 1, 0, b / 2, f),
                new("flange, +y side", right, top - f / 2, -1, 0, b / 2, f),
                new("web", middle, bottom, 0, 1, h - f, w),
            ],
            OpenShape.U =>
            [
                new("top flange", right, top - f / 2, -1, 0, b - w / 2, f),
                new("bottom flange", right, bottom + f / 2, -1, 0, b - w / 2, f),
                new("web", left + w / 2, top - f / 2, 0, -1, h - f, w, 0),
            ],
            _ =>
            [
                new("leg along z", left + w / 2, top, 0, -1, h - w / 2, w),
                new("leg along y", right, bottom + w / 2, -1, 0, b - w / 2, w),
            ],
        };
    }
}
