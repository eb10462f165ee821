using MemberScan.Foundation.Geometry;
using MemberScan.Screening.Record;

namespace MemberScan.Reporting.Pictures;

/// <summary>A picture of members as lines: those of a topic strong, the others faint behind them.</summary>
internal static class Snapshot
{
    /// <summary>Size of the picture [pixels].</summary>
    public const int Width = 800, Height = 600;

    /// <summary>Members drawn faint at most; a picture of more is only a grey field.</summary>
    public const int MostOthers = 20_000;

    private const double NearPlane = 0.05;

    private static readonly (byte, byte, byte) s_ground = (250, 250, 247), s_other = (176, 184, 190), s_strong = (158, 42, 110), s_box = (92, 100, 108);

    /// <summary>The picture as a PNG file.</summary>
    public static byte[] Draw(Camera camera, Box box, IReadOnlyCollection<MemberResult> strong, IEnumerable<MemberResult> all)
    {
        var raster = new Raster(Width, Height, s_ground);
        var isStrong = new HashSet<MemberResult>(strong, ReferenceEqualityComparer.Instance);
        foreach (var member in all.Where(m => !isStrong.Contains(m)).Take(MostOthers)) Line(raster, camera, AxisLine.Of(member), 0, s_other);
        foreach (var edge in Edges(box)) Line(raster, camera, edge, 0, s_box);
        foreach (var member in strong) Line(raster, camera, AxisLine.Of(member), 2, s_strong);
        return Png.Write(raster);
    }

    private static void Line(Raster raster, Camera camera, (Vector3 Start, Vector3 End)? line, int half, (byte, byte, byte) colour)
    {
        if (line is not { } l) return;

        var (a, b) = (Seen(camera, l.Start), Seen(camera, l.End));
        if (a.Z < NearPlane && b.Z < NearPlane) return;
        if (a.Z < NearPlane) a = Cut(b, a);
        if (b.Z < NearPlane) b = Cut(a, b);
        var (p, q) = (Pixel(a), Pixel(b));
        if (Clip(ref p, ref q)) raster.Line(p, q, half, colour);
    }

    // Right, up and depth as the camera sees a point [m].
    private static Vector3 Seen(Camera camera, Vector3 point)
    {
        var d = point - camera.Position;
        return new Vector3(d.Dot(camera.Right), d.Dot(camera.Up), d.Dot(camera.Direction));
    }

    private static Vector3 Cut(Vector3 inside, Vector3 outside) => inside + (inside.Z - NearPlane) / (inside.Z - outside.Z) * (outside - inside);

    private static (double X, double Y) Pixel(Vector3 seen)
    {
        var scale = 0.5 * Height / (seen.Z * Camera.HalfHeight);
        return (0.5 * Width + scale * seen.X, 0.5 * Height - scale * seen.Y);
    }

    // The part of a line within the picture and a margin, after Liang and Barsky: each side narrows the stretch of the parameter.
    private static bool Clip(ref (double X, double Y) p, ref (double X, double Y) q)
    {
        const double Margin = 8;
        var (dx, dy) = (q.X - p.X, q.Y - p.Y);
        var (from, to) = (0.0, 1.0);
        ReadOnlySpan<(double Slope, double Room)> sides = [(-dx, p.X + Margin), (dx, Width + Margin - p.X), (-dy, p.Y + Margin), (dy, Height + Margin - p.Y)];
        foreach (var (slope, room) in sides)
        {
            if (slope == 0 && room < 0) return false;
            if (slope < 0) from = Math.Max(from, room / slope);
            if (slope > 0) to = Math.Min(to, room / slope);
        }

        if (!(from <= to)) return false;
        q = (p.X + to * dx, p.Y + to * dy);
        p = (p.X + from * dx, p.Y + from * dy);
        return true;
    }

    private static IEnumerable<(Vector3, Vector3)?> Edges(Box box)
    {
        Vector3 Corner(int i) => new((i & 1) == 0 ? box.Least.X : box.Most.X, (i & 2) == 0 ? box.Least.Y : box.Most.Y, (i & 4) == 0 ? box.Least.Z : box.Most.Z);
        for (var i = 0; i < 8; i++)
            foreach (var bit in new[] { 1, 2, 4 })
                if ((i & bit) == 0) yield return (Corner(i), Corner(i | bit));
    }
}
