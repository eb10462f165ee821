using System.Collections.Immutable;
using System.Globalization;
using MemberScan.Foundation.Geometry;
using MemberScan.Ifc.Outlines;
using MemberScan.Mechanics.Sections;

namespace MemberScan.Ifc.Meshes;

/// <summary>
/// Recognises a closed mesh whose points lie in two end planes, joined by straight edges along one direction, and whose end loops, seen
/// along it, are the outline of a covered section. End planes are square to the direction, or cut obliquely.
/// </summary>
internal static class PrismFit
{
    /// <summary>Largest distance of points from their end plane, and of one end from the other, over the section's least extent [-].</summary>
    public const double Tolerance = 1e-3;

    /// <summary>Most directions that are tried as the axis.</summary>
    private const int MaxDirections = 400;

    /// <summary>Fits a prism; null, with the reason, when the mesh is none.</summary>
    /// <param name="mesh">The mesh.</param>
    /// <param name="towardsY">Gives, for an axis, the direction that the plane's y is nearest to.</param>
    /// <param name="along">Gives a direction its sense: positive where the axis should point.</param>
    /// <param name="fault">Why there is none; empty when there is one.</param>
    public static Prism? Of(Mesh mesh, Func<Vector3, Vector3> towardsY, Func<Vector3, double> along, out string fault)
    {
        if (!IsClosed(mesh))
        {
            fault = "its faces do not close";
            return null;
        }

        // A block is a prism in three directions; the longest is the member's.
        fault = "its points lie in more than two parallel planes, so that it is no straight prism";
        Prism? best = null;
        foreach (var direction in Directions(mesh))
        {
            if (Ends(mesh, direction) is not { } ends) continue;

            var prism = OfEnds(mesh, ends, towardsY, along, out var why);
            if (prism is null && best is null) fault = why;
            if (prism is not null && (best is null || prism.Length > best.Length)) best = prism;
        }

        if (best is null)
            best = ObliqueEnds.Of(mesh).Select(ends => OfEnds(mesh, ends, towardsY, along, out _)).FirstOrDefault(prism => prism is not null);
        if (best is not null) fault = "";
        return best;
    }

    private static bool IsClosed(Mesh mesh)
    {
        var uses = new Dictionary<(int, int), int>();
        foreach (var loop in mesh.Faces.SelectMany(face => face))
            for (var i = 0; i < loop.Length; i++)
            {
                var (a, b) = (loop[i], loop[(i + 1) % loop.Length]);
                if (a == b) continue;

                var key = a < b ? (a, b) : (b, a);
                uses[key] = uses.GetValueOrDefault(key) + 1;
            }

        return uses.Count > 0 && uses.Values.All(count => count == 2);
    }

    /// <summary>Normals of the faces, each once whatever its sense.</summary>
    private static List<Vector3> Directions(Mesh mesh)
    {
        var found = new List<Vector3>();
        foreach (var face in mesh.Faces)
        {
            if (!Normal(mesh, face[0]).TryNormalize(out var normal)) continue;
            if (found.Exists(d => d.Cross(normal).Length < 1e-3)) continue;

            found.Add(normal);
            if (found.Count == MaxDirections) break;
        }

        return found;
    }

    private static Vector3 Normal(Mesh mesh, ImmutableArray<int> loop)
    {
        var sum = Vector3.Zero;
        var origin = mesh.Points[loop[0]];
        for (var i = 1; i + 1 < loop.Length; i++) sum += (mesh.Points[loop[i]] - origin).Cross(mesh.Points[loop[i + 1]] - origin);
        return sum;
    }

    /// <summary>The two planes square to a direction in which all points lie; null when they do not.</summary>
    private static EndPlanes? Ends(Mesh mesh, Vector3 direction)
    {
        if (Split(mesh, direction) is not { } rough) return null;

        // From the middle of one end to that of the other the axis is known better than from a small face.
        var (start, end) = (Middle(mesh, rough.IsEnd, false), Middle(mesh, rough.IsEnd, true));
        return (end - start).TryNormalize(out var axis) ? Split(mesh, axis) : null;
    }

    private static EndPlanes? Split(Mesh mesh, Vector3 direction)
    {
        var heights = mesh.Points.Select(p => p.Dot(direction)).ToArray();
        var (least, most) = (heights.Min(), heights.Max());
        var isEnd = heights.Select(h => h > (least + most) / 2).ToImmutableArray();
        var (low, high) = (heights.Where((_, i) => !isEnd[i]).ToArray(), heights.Where((_, i) => isEnd[i]).ToArray());
        if (low.Length < 3 || high.Length < 3) return null;

        var (atStart, atEnd) = (low.Average(), high.Average());
        var deviation = Math.Max(low.Max(h => Math.Abs(h - atStart)), high.Max(h => Math.Abs(h - atEnd)));
        return deviation <= 0.02 * (atEnd - atStart) ? new EndPlanes(direction, isEnd, atStart, atEnd, deviation) : null;
    }

    private static Vector3 Middle(Mesh mesh, ImmutableArray<bool> isEnd, bool end)
    {
        var (sum, count) = (Vector3.Zero, 0);
        for (var i = 0; i < mesh.Points.Length; i++)
            if (isEnd[i] == end)
                (sum, count) = (sum + mesh.Points[i], count + 1);
        return 1.0 / count * sum;
    }

    private static Prism? OfEnds(Mesh mesh, EndPlanes ends, Func<Vector3, Vector3> towardsY, Func<Vector3, double> along, out string fault)
    {
        var forward = along(ends.Axis) >= 0;
        var z = forward ? ends.Axis : -ends.Axis;
        var hint = towardsY(z);
        _ = (hint - hint.Dot(z) * z).TryNormalize(out var y);
        var x = y.Cross(z);
        Vector3 InPlane(int point) => new(mesh.Points[point].Dot(x), mesh.Points[point].Dot(y), 0);

        if (Loops(mesh, ends.IsEnd, end: !forward) is not { } loops)
        {
            fault = "its sides do not run from end to end in closed loops";
            return null;
        }

        var opposite = Enumerable.Range(0, mesh.Points.Length).Where(i => ends.IsEnd[i] == forward).Select(InPlane).ToList();
        var count = loops.Sum(l => l.Count);
        if (opposite.Count != count)
        {
            fault = "its two ends have different numbers of corners";
            return null;
        }

        var mismatch = 0.0;
        var outlines = new List<ClosedOutline>();
        foreach (var loop in loops)
        {
            var corners = new List<Vector3>(loop.Count);
            foreach (var point in loop.Select(InPlane))
            {
                var nearest = opposite.MinBy(o => (o - point).Length);
                mismatch = Math.Max(mismatch, (nearest - point).Length);
                corners.Add(0.5 * (point + nearest));
            }

            var edges = corners.Select((c, i) => OutlineEdge.Straight(c, corners[(i + 1) % corners.Count]));
            if (ClosedOutline.From(edges, out fault) is not { } outline) return null;

            outlines.Add(outline);
        }

        outlines.Sort((a, b) => b.Area.CompareTo(a.Area));
        if (RecognisedSection.Of(outlines[0], [.. outlines.Skip(1)]) is not { } section)
        {
            fault = "its section is none of the kinds that are evaluated";
            return null;
        }

        var shape = section.Shapes[0];
        var allowed = Allowed(shape);
        var residual = Math.Max(section.Deviation, mismatch / 2);
        if (mismatch > allowed || ends.Deviation > Tolerance * Math.Min(shape.ExtentY, shape.ExtentZ))
        {
            fault = string.Create(CultureInfo.InvariantCulture, $"its ends differ by {mismatch * 1e3:0.###} mm, or are out of plane by {ends.Deviation * 1e3:0.###} mm");
            return null;
        }

        fault = "";
        var height = forward ? ends.AtStart : -ends.AtEnd;
        return new Prism(new Transform3(height * z, x, y, z), ends.Length, section, Math.Max(residual, ends.Deviation), ends.IsOblique);
    }

    /// <summary>Largest distance of one end from the other, seen along the axis [m].</summary>
    public static double Allowed(CrossSection shape) => shape switch
    {
        Tube tube => RecognisedSection.WallTolerance * tube.Wall,
        Box box => RecognisedSection.WallTolerance * box.Wall,
        _ => Tolerance * Math.Min(shape.ExtentY, shape.ExtentZ),
    };

    /// <summary>
    /// Loops of edges in one end plane that belong to faces running to the other; null when a point has other than two of them.
    /// Faces within an end plane, whole or cut into triangles, have no part in it.
    /// </summary>
    private static List<List<int>>? Loops(Mesh mesh, ImmutableArray<bool> isEnd, bool end)
    {
        var neighbours = new Dictionary<int, List<int>>();
        foreach (var loop in mesh.Faces.SelectMany(face => face))
        {
            if (loop.All(i => isEnd[i] == isEnd[loop[0]])) continue;

            for (var i = 0; i < loop.Length; i++)
            {
                var (a, b) = (loop[i], loop[(i + 1) % loop.Length]);
                if (a == b || isEnd[a] != end || isEnd[b] != end) continue;

                Add(a, b);
                Add(b, a);
            }
        }

        if (neighbours.Count == 0 || neighbours.Values.Any(n => n.Count != 2)) return null;

        var loops = new List<List<int>>();
        var visited = new HashSet<int>();
        foreach (var first in neighbours.Keys)
        {
            if (!visited.Add(first)) continue;

            var loop = new List<int> { first };
            for (var at = neighbours[first][0]; visited.Add(at);)
            {
                loop.Add(at);
                at = visited.Contains(neighbours[at][0]) ? neighbours[at][1] : neighbours[at][0];
            }

            loops.Add(loop);
        }

        return loops;

        void Add(int from, int to)
        {
            if (!neighbours.TryGetValue(from, out var list)) neighbours[from] = list = [];
            list.Add(to);
        }
    }
}
