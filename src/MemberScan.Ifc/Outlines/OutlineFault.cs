using System.Collections.Immutable;
using System.Globalization;
using MemberScan.Foundation.Geometry;

namespace MemberScan.Ifc.Outlines;

/// <summary>Whether an outline and its voids bound an area: none crosses itself or another, each void lies within.</summary>
internal static class OutlineFault
{
    /// <summary>What is wrong; empty when nothing is.</summary>
    public static string Of(ClosedOutline outer, ImmutableArray<ClosedOutline> voids)
    {
        var polygons = new[] { outer }.Concat(voids).Select(o => o.Polygon()).ToArray();
        if (polygons.Sum(p => p.Length) > 2 * ClosedOutline.MaxEdges)
            return string.Create(CultureInfo.InvariantCulture, $"outline and voids have more than {2 * ClosedOutline.MaxEdges} edges");

        for (var i = 0; i < polygons.Length; i++)
        {
            if (Crosses(polygons[i])) return $"{Called(i)} crosses itself";

            for (var k = 0; k < i; k++)
                if (Cross(polygons[k], polygons[i]))
                    return $"{Called(i)} crosses {(k == 0 ? "the outline" : Called(k))}";
        }

        for (var i = 1; i < polygons.Length; i++)
        {
            if (!Holds(polygons[0], polygons[i][0])) return $"{Called(i)} lies outside the outline";

            for (var k = 1; k < polygons.Length; k++)
                if (k != i && Holds(polygons[k], polygons[i][0]))
                    return $"{Called(i)} lies within {Called(k)}";
        }

        return "";
    }

    private static string Called(int index) => index == 0 ? "the outline" : string.Create(CultureInfo.InvariantCulture, $"void {index}");

    private static bool Crosses(ImmutableArray<Vector3> polygon)
    {
        for (var i = 0; i < polygon.Length; i++)
            for (var k = i + 2; k < polygon.Length; k++)
                if ((i > 0 || k < polygon.Length - 1) && Meet(polygon, i, polygon, k))
                    return true;
        return false;
    }

    private static bool Cross(ImmutableArray<Vector3> a, ImmutableArray<Vector3> b)
    {
        for (var i = 0; i < a.Length; i++)
            for (var k = 0; k < b.Length; k++)
                if (Meet(a, i, b, k))
                    return true;
        return false;
    }

    /// <summary>Whether two edges cross at a point inside both.</summary>
    private static bool Meet(ImmutableArray<Vector3> a, int i, ImmutableArray<Vector3> b, int k)
    {
        var (p, r) = (a[i], a[(i + 1) % a.Length] - a[i]);
        var (q, s) = (b[k], b[(k + 1) % b.Length] - b[k]);
        double Side(Vector3 from, Vector3 along, Vector3 point) => OutlineEdge.Cross(along, point - from);

        return Side(p, r, q) * Side(p, r, q + s) < 0 && Side(q, s, p) * Side(q, s, p + r) < 0;
    }

    private static bool Holds(ImmutableArray<Vector3> polygon, Vector3 point)
    {
        var isInside = false;
        for (var i = 0; i < polygon.Length; i++)
        {
            var (a, b) = (polygon[i], polygon[(i + 1) % polygon.Length]);
            if (a.Y > point.Y == b.Y > point.Y) continue;
            if (point.X < a.X + (point.Y - a.Y) / (b.Y - a.Y) * (b.X - a.X)) isInside = !isInside;
        }

        return isInside;
    }
}
