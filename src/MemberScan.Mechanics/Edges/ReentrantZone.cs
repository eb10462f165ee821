using MemberScan.Mechanics.Sections;

namespace MemberScan.Mechanics.Edges;

/// <summary>The surroundings of re-entrant corners, whose peaks are told apart and do not decide.</summary>
/// <remarks>
/// The rule: a point nearer than half a wall to the corner, sharp or rounded, lies in the zone. At a sharp corner the elastic shear stress is
/// unbounded and means nothing; at a rounded one, of a radius up to
/// three walls, it is a local peak.
/// </remarks>
internal static class ReentrantZone
{
    /// <summary>Reach of the zone as a share of the wall.</summary>
    public const double Reach = 0.5;

    /// <summary>Largest radius of a fillet as a share of the wall; an arc beyond it is a bent wall, and decides.</summary>
    public const double LargestFillet = 3;

    /// <summary>How far the zones of a box reach [m]; 0 where its inner corners are too round for a peak.</summary>
    public static double ReachOf(Box box) => box.InnerRadius > LargestFillet * box.Wall * (1 + 1e-9) ? 0 : Reach * box.Wall;

    /// <summary>Whether a point [m] of a box lies in the zone of one of its inner corners.</summary>
    public static bool Covers(Box box, double y, double z) => Inset(box, y, z) < ReachOf(box);

    /// <summary>Distance of a point from the nearest inner corner's arc [m].</summary>
    public static double Inset(Box box, double y, double z)
    {
        var radius = box.InnerRadius;
        var (overY, overZ) = (Math.Abs(y) - (box.Width / 2 - box.Wall - radius), Math.Abs(z) - (box.Depth / 2 - box.Wall - radius));
        if (overY >= 0 && overZ >= 0) return Math.Abs(double.Hypot(overY, overZ) - radius);

        // Beyond the ends of the arc: from the end that is nearer.
        return Math.Min(double.Hypot(overY - radius, overZ), double.Hypot(overY, overZ - radius));
    }
}
