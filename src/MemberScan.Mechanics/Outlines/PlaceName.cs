using System.Globalization;
using MemberScan.Mechanics.Forces;

namespace MemberScan.Mechanics.Outlines;

/// <summary>Names of places of a section in words.</summary>
internal static class PlaceName
{
    /// <summary>The centroid of a solid section.</summary>
    public const string Centre = "centre";

    /// <summary>Only N acts: every point is stressed alike.</summary>
    public const string Uniform = "uniform over the section";

    /// <summary>No force acts.</summary>
    public const string Unstressed = "unstressed";

    // Forces below this share of the largest do not decide a name.
    private const double Negligible = 1e-9;

    private static readonly double s_halfDegree = Math.Sin(Math.PI / 360);

    /// <summary>A point of the outer edge of a round section of the given radius [m].</summary>
    public static string OnOuterCircle(double y, double z, in SectionForces forces, double radius) => Relation(y, z, forces, radius) switch
    {
        1 => AxisOf(y, z) is { } axis
            ? axis switch { "+y" => "extreme fibre, +y", "+z" => "extreme fibre, +z", "−y" => "extreme fibre, −y", _ => "extreme fibre, −z" }
            : "extreme fibre, " + Direction(y, z),
        2 => NeutralAxis(y, z),
        _ => "outer edge, " + (AxisOf(y, z) ?? Direction(y, z)),
    };

    /// <summary>A point of the bore of a tube of the given outer radius [m].</summary>
    public static string OnBore(double y, double z, in SectionForces forces, double radius) =>
        Relation(y, z, forces, radius) == 2
            ? "bore, " + NeutralAxis(y, z)
            : "bore, " + (AxisOf(y, z) ?? Direction(y, z));

    /// <summary>A point inside a round bar.</summary>
    public static string Inside(double y, double z) => "inside, " + (AxisOf(y, z) ?? Direction(y, z));

    /// <summary>A point inside the wall of a hollow section.</summary>
    public static string InsideTheWall(double y, double z) => "inside the wall, " + (AxisOf(y, z) ?? Direction(y, z));

    /// <summary>A point inside a rectangle, named by its quadrant or half axis.</summary>
    public static string InsideTowards(double y, double z, double tolerance) =>
        "inside, towards " + (Math.Abs(y) <= tolerance ? SignedZ(z) : Math.Abs(z) <= tolerance ? SignedY(y) : Quadrant(y, z));

    /// <summary>A point of the outer edge of a rectangle by half sides and corner radius [m]; null when it is not on the edge.</summary>
    public static string? OnRectangle(
        double y, double z, double halfWidth, double halfDepth, double radius, in SectionForces forces, double tolerance)
    {
        if (RoundedCorner.Beyond(halfWidth, halfDepth, radius, y, z) < -tolerance) return null;
        if (IsCorner(y, z, halfWidth, halfDepth, radius, tolerance)) return Corner(y, z);

        var onY = halfWidth - Math.Abs(y) <= tolerance;
        if (Math.Abs(onY ? z : y) > tolerance) return SideTowards(y, z, onY, halfWidth, halfDepth);

        // σ of bending is extreme over a whole side only when the other moment does not act.
        var (own, other) = onY
            ? (Math.Abs(forces.Mz) / halfWidth, Math.Abs(forces.My) / halfDepth)
            : (Math.Abs(forces.My) / halfDepth, Math.Abs(forces.Mz) / halfWidth);
        return own > 0 && other <= Negligible * own && own > Negligible * Largest(forces, Math.Max(halfWidth, halfDepth))
            ? (onY ? (y > 0 ? "extreme fibre, +y" : "extreme fibre, −y") : z > 0 ? "extreme fibre, +z" : "extreme fibre, −z")
            : MiddleOf(y, z, onY, halfWidth, halfDepth);
    }

    /// <summary>A point of the inner edge of a rectangular tube, by half sides and corner radius of the hole [m].</summary>
    public static string OnInnerRectangle(double y, double z, double halfWidth, double halfDepth, double radius, double tolerance)
    {
        if (IsCorner(y, z, halfWidth, halfDepth, radius, tolerance)) return "inner " + Corner(y, z);

        var onY = Math.Abs(halfWidth - Math.Abs(y)) <= tolerance;
        return "inner face, " + (Math.Abs(onY ? z : y) <= tolerance
            ? MiddleOf(y, z, onY, halfWidth, halfDepth)
            : SideTowards(y, z, onY, halfWidth, halfDepth));
    }

    // 1 in line with the bending (or, without it, the shear) resultant, 2 square to it, 0 neither.
    private static int Relation(double y, double z, in SectionForces forces, double radius)
    {
        var floor = Negligible * Largest(forces, radius);
        var (dirY, dirZ) = (-forces.Mz / radius, forces.My / radius);
        if (double.Hypot(dirY, dirZ) <= floor) (dirY, dirZ) = (forces.Vy, forces.Vz);
        var length = double.Hypot(dirY, dirZ) * double.Hypot(y, z);
        if (length == 0 || double.Hypot(dirY, dirZ) <= floor) return 0;
        if (Math.Abs(dirY * z - dirZ * y) <= s_halfDegree * length) return 1;
        return Math.Abs(dirY * y + dirZ * z) <= s_halfDegree * length ? 2 : 0;
    }

    private static double Largest(in SectionForces forces, double lever) => Math.Max(
        Math.Max(Math.Abs(forces.N), Math.Max(Math.Abs(forces.Vy), Math.Abs(forces.Vz))),
        Math.Max(Math.Abs(forces.T), Math.Max(Math.Abs(forces.My), Math.Abs(forces.Mz))) / lever);

    private static string NeutralAxis(double y, double z) => AxisOf(y, z) switch
    {
        "+y" => "neutral axis, +y side",
        "+z" => "neutral axis, +z side",
        "−y" => "neutral axis, −y side",
        "−z" => "neutral axis, −z side",
        _ => "neutral axis, " + Direction(y, z),
    };

    private static string? AxisOf(double y, double z)
    {
        var length = double.Hypot(y, z);
        if (Math.Abs(z) <= s_halfDegree * length) return SignedY(y);
        return Math.Abs(y) <= s_halfDegree * length ? SignedZ(z) : null;
    }

    private static string Direction(double y, double z)
    {
        var degrees = Math.Round(Math.Atan2(Math.Abs(z), Math.Abs(y)) * 180 / Math.PI, MidpointRounding.AwayFromZero);
        return string.Create(CultureInfo.InvariantCulture, $"direction {degrees:0}° from {SignedY(y)} towards {SignedZ(z)}");
    }

    private static bool IsCorner(double y, double z, double halfWidth, double halfDepth, double radius, double tolerance) =>
        radius <= tolerance
            ? Math.Abs(halfWidth - Math.Abs(y)) <= tolerance && Math.Abs(halfDepth - Math.Abs(z)) <= tolerance
            : Math.Abs(y) > halfWidth - radius + tolerance && Math.Abs(z) > halfDepth - radius + tolerance;

    private static string Corner(double y, double z) => (y > 0, z > 0) switch
    {
        (true, true) => "corner +y +z",
        (false, true) => "corner −y +z",
        (false, false) => "corner −y −z",
        (true, false) => "corner +y −z",
    };

    private static string MiddleOf(double y, double z, bool onY, double halfWidth, double halfDepth) =>
        $"middle of the {SideKind(onY, halfWidth, halfDepth)}, {(onY ? SignedY(y) : SignedZ(z))}";

    private static string SideTowards(double y, double z, bool onY, double halfWidth, double halfDepth)
    {
        var kind = SideKind(onY, halfWidth, halfDepth);
        return onY ? $"{kind}, {SignedY(y)}, towards {SignedZ(z)}" : $"{kind}, {SignedZ(z)}, towards {SignedY(y)}";
    }

    private static string SideKind(bool onY, double halfWidth, double halfDepth)
    {
        var (own, other) = onY ? (halfDepth, halfWidth) : (halfWidth, halfDepth);
        return Math.Abs(own - other) <= 1e-9 * own ? "side" : own > other ? "long side" : "short side";
    }

    private static string SignedY(double y) => y < 0 ? "−y" : "+y";

    private static string SignedZ(double z) => z < 0 ? "−z" : "+z";

    private static string Quadrant(double y, double z) => $"{SignedY(y)} {SignedZ(z)}";
}
