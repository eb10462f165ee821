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
    private static readonly string[] s_signs = ["+y", "−y", "+z", "−z"];
    private static readonly string[] s_sides = NameSides();

    /// <summary>A point of the outer edge of a round section of the given radius [m].</summary>
    public static string OnOuterCircle(double y, double z, in SectionForces forces, double radius) => Relation(y, z, forces, radius) switch
    {
        1 => AxisOf(y, z) is { } axis
            ? axis switch { "+y" => "extreme fibre, +y", "+z" => "extreme fibre, +z", "−y" => "extreme fibre, −y", _ => "extreme fibre, −z" }
            : "extreme fibre, " + Direction(y, z),
        2 => NeutralAxis(y, z),
        _ => AxisOf(y, z) is { } axis
            ? axis switch { "+y" => "outer edge, +y", "+z" => "outer edge, +z", "−y" => "outer edge, −y", _ => "outer edge, −z" }
            : "outer edge, " + Direction(y, z),
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
        (Math.Abs(y) <= tolerance, Math.Abs(z) <= tolerance, y < 0, z < 0) switch
        {
            (true, _, _, false) => "inside, towards +z",
            (true, _, _, true) => "inside, towards −z",
            (_, true, false, _) => "inside, towards +y",
            (_, true, true, _) => "inside, towards −y",
            (_, _, false, false) => "inside, towards +y +z",
            (_, _, true, false) => "inside, towards −y +z",
            (_, _, true, true) => "inside, towards −y −z",
            (_, _, false, true) => "inside, towards +y −z",
        };

    /// <summary>A point of the outer edge of a rectangle by half sides and corner radius [m]; null when it is not on the edge.</summary>
    public static string? OnRectangle(
        double y, double z, double halfWidth, double halfDepth, double radius, in SectionForces forces, double tolerance)
    {
        if (RoundedCorner.Beyond(halfWidth, halfDepth, radius, y, z) < -tolerance) return null;
        if (IsCorner(y, z, halfWidth, halfDepth, radius, tolerance)) return Corner(y, z, inner: false);

        var onY = halfWidth - Math.Abs(y) <= tolerance;
        if (Math.Abs(onY ? z : y) > tolerance) return SideTowards(y, z, onY, halfWidth, halfDepth, inner: false);

        // σ of bending is extreme over a whole side only when the other moment does not act.
        var (own, other) = onY
            ? (Math.Abs(forces.Mz) / halfWidth, Math.Abs(forces.My) / halfDepth)
            : (Math.Abs(forces.My) / halfDepth, Math.Abs(forces.Mz) / halfWidth);
        return own > 0 && other <= Negligible * own && own > Negligible * Largest(forces, Math.Max(halfWidth, halfDepth))
            ? (onY ? (y > 0 ? "extreme fibre, +y" : "extreme fibre, −y") : z > 0 ? "extreme fibre, +z" : "extreme fibre, −z")
            : MiddleOf(y, z, onY, halfWidth, halfDepth, inner: false);
    }

    /// <summary>A point of the inner edge of a rectangular tube, by half sides and corner radius of the hole [m].</summary>
    public static string OnInnerRectangle(double y, double z, double halfWidth, double halfDepth, double radius, double tolerance)
    {
        if (IsCorner(y, z, halfWidth, halfDepth, radius, tolerance)) return Corner(y, z, inner: true);

        var onY = Math.Abs(halfWidth - Math.Abs(y)) <= tolerance;
        return Math.Abs(onY ? z : y) <= tolerance
            ? MiddleOf(y, z, onY, halfWidth, halfDepth, inner: true)
            : SideTowards(y, z, onY, halfWidth, halfDepth, inner: true);
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

    private static string Corner(double y, double z, bool inner) => (y > 0, z > 0, inner) switch
    {
        (true, true, false) => "corner +y +z",
        (false, true, false) => "corner −y +z",
        (false, false, false) => "corner −y −z",
        (true, false, false) => "corner +y −z",
        (true, true, true) => "inner corner +y +z",
        (false, true, true) => "inner corner −y +z",
        (false, false, true) => "inner corner −y −z",
        (true, false, true) => "inner corner +y −z",
    };

    private static string MiddleOf(double y, double z, bool onY, double halfWidth, double halfDepth, bool inner) =>
        s_sides[Number(y, z, onY, halfWidth, halfDepth, 0, inner)];

    private static string SideTowards(double y, double z, bool onY, double halfWidth, double halfDepth, bool inner) =>
        s_sides[Number(y, z, onY, halfWidth, halfDepth, (onY ? z : y) < 0 ? 1 : 2, inner)];

    // Digits: inner face, kind of side, middle or which half, which side (+y −y +z −z).
    private static int Number(double y, double z, bool onY, double halfWidth, double halfDepth, int part, bool inner)
    {
        var (own, other) = onY ? (halfDepth, halfWidth) : (halfWidth, halfDepth);
        var kind = Math.Abs(own - other) <= 1e-9 * own ? 0 : own > other ? 1 : 2;
        var side = onY ? (y < 0 ? 1 : 0) : z < 0 ? 3 : 2;
        return (((inner ? 3 : 0) + kind) * 3 + part) * 4 + side;
    }

    private static string[] NameSides()
    {
        var names = new List<string>();
        foreach (var face in new[] { "", "inner face, " })
        {
            foreach (var kind in new[] { "side", "long side", "short side" })
            {
                names.AddRange(s_signs.Select(sign => $"{face}middle of the {kind}, {sign}"));
                foreach (var (towardsZ, towardsY) in new[] { ("−z", "−y"), ("+z", "+y") })
                    names.AddRange(s_signs.Select((sign, i) => $"{face}{kind}, {sign}, towards {(i < 2 ? towardsZ : towardsY)}"));
            }
        }

        return [.. names];
    }

    private static string SignedY(double y) => y < 0 ? "−y" : "+y";

    private static string SignedZ(double z) => z < 0 ? "−z" : "+z";
}
