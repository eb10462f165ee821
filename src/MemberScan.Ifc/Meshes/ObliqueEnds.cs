using System.Collections.Immutable;
using MemberScan.Foundation.Geometry;

namespace MemberScan.Ifc.Meshes;

/// <summary>Ends of a mesh whose corners are joined pairwise by edges along one direction: planes at any slope to it.</summary>
internal static class ObliqueEnds
{
    /// <summary>Most directions that are tried, those along which most edges run first.</summary>
    private const int MaxDirections = 3;

    /// <summary>Most edges, the longest, that directions are taken from.</summary>
    private const int MaxEdges = 400;

    /// <summary>Largest sine of the angle between edges that count as parallel.</summary>
    private const double Parallel = 1e-3;

    /// <summary>The ends along each direction in which every corner has just one edge.</summary>
    public static IEnumerable<EndPlanes> Of(Mesh mesh)
    {
        var edges = Edges(mesh);
        foreach (var direction in Directions(mesh, edges))
            if (Ends(mesh, edges, direction) is { } ends)
                yield return ends;
    }

    private static List<(int From, int To)> Edges(Mesh mesh)
    {
        var edges = new HashSet<(int, int)>();
        foreach (var loop in mesh.Faces.SelectMany(face => face))
            for (var i = 0; i < loop.Length; i++)
            {
                var (a, b) = (loop[i], loop[(i + 1) % loop.Length]);
                if (a != b) edges.Add(a < b ? (a, b) : (b, a));
            }

        return [.. edges];
    }

    private static List<Vector3> Directions(Mesh mesh, List<(int From, int To)> edges)
    {
        var found = new List<(Vector3 Unit, double Length)>();
        foreach (var along in edges.Select(e => mesh.Points[e.To] - mesh.Points[e.From]).OrderByDescending(a => a.Length).Take(MaxEdges))
        {
            if (!along.TryNormalize(out var unit)) continue;

            // The diagonals of triangles run each their own way; the sides of a prism all run one.
            var at = found.FindIndex(d => d.Unit.Cross(unit).Length < Parallel);
            if (at < 0) found.Add((unit, along.Length));
            else found[at] = (found[at].Unit, found[at].Length + along.Length);
        }

        return [.. found.OrderByDescending(d => d.Length).Take(MaxDirections).Select(d => d.Unit)];
    }

    private static EndPlanes? Ends(Mesh mesh, List<(int From, int To)> edges, Vector3 direction)
    {
        var mate = new int[mesh.Points.Length];
        Array.Fill(mate, -1);
        foreach (var (from, to) in edges)
        {
            var along = mesh.Points[to] - mesh.Points[from];
            if (along.Cross(direction).Length > Parallel * along.Length) continue;
            if (mate[from] >= 0 || mate[to] >= 0) return null;

            (mate[from], mate[to]) = (to, from);
        }

        if (Array.Exists(mate, m => m < 0)) return null;

        var isEnd = mate.Select((m, i) => (mesh.Points[i] - mesh.Points[m]).Dot(direction) > 0).ToImmutableArray();
        var sum = Vector3.Zero;
        for (var i = 0; i < mate.Length; i++)
            if (isEnd[i])
                sum += mesh.Points[i] - mesh.Points[mate[i]];
        return sum.TryNormalize(out var axis) ? Planes(mesh, isEnd, axis) : null;
    }

    private static EndPlanes? Planes(Mesh mesh, ImmutableArray<bool> isEnd, Vector3 axis)
    {
        var (low, high) = (Corners(mesh, isEnd, false), Corners(mesh, isEnd, true));
        if (low.Count < 3 || low.Max(p => p.Dot(axis)) >= high.Min(p => p.Dot(axis))) return null;

        // The height of a plane at the middle of its corners is the mean of their heights.
        var deviation = Math.Max(OutOfPlane(low, axis), OutOfPlane(high, axis));
        return new EndPlanes(axis, isEnd, low.Average(p => p.Dot(axis)), high.Average(p => p.Dot(axis)), deviation, IsOblique: true);
    }

    private static List<Vector3> Corners(Mesh mesh, ImmutableArray<bool> isEnd, bool end) => [.. mesh.Points.Where((_, i) => isEnd[i] == end)];

    /// <summary>Largest distance of points, along the axis, from the plane through their middle that fits them best [m].</summary>
    public static double OutOfPlane(List<Vector3> points, Vector3 axis)
    {
        var middle = 1.0 / points.Count * points.Aggregate(Vector3.Zero, (sum, p) => sum + p);
        _ = axis.Cross(Math.Abs(axis.X) < 0.9 ? Vector3.UnitX : Vector3.UnitY).TryNormalize(out var u);
        var v = axis.Cross(u);
        var local = points.ConvertAll(p => ((p - middle).Dot(u), (p - middle).Dot(v), (p - middle).Dot(axis)));
        double Sum(Func<(double U, double V, double H), double> of) => local.Sum(of);
        var (uu, uv, vv, uh, vh) = (Sum(p => p.U * p.U), Sum(p => p.U * p.V), Sum(p => p.V * p.V), Sum(p => p.U * p.H), Sum(p => p.V * p.H));
        var determinant = uu * vv - uv * uv;
        if (!(determinant > 1e-12 * uu * vv)) return double.PositiveInfinity;

        var (slopeU, slopeV) = ((uh * vv - vh * uv) / determinant, (vh * uu - uh * uv) / determinant);
        return local.Max(p => Math.Abs(p.Item3 - slopeU * p.Item1 - slopeV * p.Item2));
    }
}
