using System.Collections.Immutable;
using MemberScan.Foundation.Geometry;

namespace MemberScan.Ifc.Meshes.Runs;

/// <summary>A closed mesh with all faces turned outwards: plane patches (faces; triangles of one plane together) and the edges between them.</summary>
internal sealed class ClosedSurface
{
    /// <summary>Largest sine of the angle between normals that count as one direction [-].</summary>
    public const double Flat = 1e-3;

    private readonly record struct Use(int Face, bool IsForward);

    private ClosedSurface(ImmutableArray<Vector3> points, int patches, ImmutableArray<SurfaceEdge> edges) => (Points, PatchCount, Edges) = (points, patches, edges);

    /// <summary>Points [m].</summary>
    public ImmutableArray<Vector3> Points { get; }

    /// <summary>Number of patches.</summary>
    public int PatchCount { get; }

    /// <summary>Edges between different patches.</summary>
    public ImmutableArray<SurfaceEdge> Edges { get; }

    /// <summary>Turns a mesh outwards; null, with the reason, where it is not closed or has two sides that are one.</summary>
    public static ClosedSurface? Of(Mesh mesh, out string fault)
    {
        var loops = mesh.Faces.Select(face => HolesReversed(mesh, face)).ToImmutableArray();
        var uses = Uses(loops);
        fault = uses.Values.Any(u => u.Count != 2) ? "its faces do not close" : "";
        if (fault.Length > 0) return null;

        if (Orientation(loops, uses) is not { } isTurned)
        {
            fault = "its faces cannot be turned to one side";
            return null;
        }

        if (Volume(mesh, loops, isTurned) < 0)
            for (var i = 0; i < isTurned.Length; i++) isTurned[i] = !isTurned[i];

        return Patched(mesh, loops, uses, isTurned);
    }

    // Loops of holes run against the loop that bounds the face; not all files keep to that.
    private static ImmutableArray<ImmutableArray<int>> HolesReversed(Mesh mesh, ImmutableArray<ImmutableArray<int>> face)
    {
        if (face.Length == 1) return face;

        var normal = AreaNormal(mesh, face[0]);
        return [face[0], .. face.Skip(1).Select(hole => AreaNormal(mesh, hole).Dot(normal) > 0 ? [.. hole.Reverse()] : hole)];
    }

    /// <summary>Twice the area of a loop along its normal [m²].</summary>
    private static Vector3 AreaNormal(Mesh mesh, ImmutableArray<int> loop)
    {
        var sum = Vector3.Zero;
        var origin = mesh.Points[loop[0]];
        for (var i = 1; i + 1 < loop.Length; i++) sum += (mesh.Points[loop[i]] - origin).Cross(mesh.Points[loop[i + 1]] - origin);
        return sum;
    }

    private static Dictionary<(int, int), List<Use>> Uses(ImmutableArray<ImmutableArray<ImmutableArray<int>>> loops)
    {
        var uses = new Dictionary<(int, int), List<Use>>();
        for (var face = 0; face < loops.Length; face++)
            foreach (var (from, to) in MeshParts.EdgesOf(loops[face]))
            {
                var key = from < to ? (from, to) : (to, from);
                if (!uses.TryGetValue(key, out var list)) uses[key] = list = [];
                list.Add(new Use(face, from < to));
            }

        return uses;
    }

    /// <summary>For each face whether it must be turned so that all lie to one side; null when that cannot be.</summary>
    private static bool[]? Orientation(ImmutableArray<ImmutableArray<ImmutableArray<int>>> loops, Dictionary<(int, int), List<Use>> uses)
    {
        var neighbours = new List<(int Face, bool IsOpposed)>[loops.Length];
        for (var i = 0; i < neighbours.Length; i++) neighbours[i] = [];
        foreach (var pair in uses.Values)
        {
            neighbours[pair[0].Face].Add((pair[1].Face, pair[0].IsForward == pair[1].IsForward));
            neighbours[pair[1].Face].Add((pair[0].Face, pair[0].IsForward == pair[1].IsForward));
        }

        var turned = new bool?[loops.Length];
        var open = new Queue<int>();
        turned[0] = false;
        open.Enqueue(0);
        while (open.TryDequeue(out var face))
            foreach (var (next, isOpposed) in neighbours[face])
            {
                var wanted = turned[face]!.Value ^ isOpposed;
                if (turned[next] is { } known)
                {
                    if (known != wanted) return null;
                    continue;
                }

                turned[next] = wanted;
                open.Enqueue(next);
            }

        return [.. turned.Select(t => t ?? false)];
    }

    private static double Volume(Mesh mesh, ImmutableArray<ImmutableArray<ImmutableArray<int>>> loops, bool[] isTurned)
    {
        var origin = mesh.Points[0];
        var sum = 0.0;
        for (var face = 0; face < loops.Length; face++)
            foreach (var loop in loops[face])
                sum += (isTurned[face] ? -1 : 1) * AreaNormal(mesh, loop).Dot(mesh.Points[loop[0]] - origin);
        return sum;
    }

    private static ClosedSurface Patched(Mesh mesh, ImmutableArray<ImmutableArray<ImmutableArray<int>>> loops, Dictionary<(int, int), List<Use>> uses, bool[] isTurned)
    {
        var normals = loops.Select((face, i) => (isTurned[i] ? -1.0 : 1.0) * face.Aggregate(Vector3.Zero, (sum, loop) => sum + AreaNormal(mesh, loop))).ToArray();
        var groups = new DisjointSets(loops.Length);
        foreach (var pair in uses.Values)
            if (IsTriangle(loops[pair[0].Face]) && IsTriangle(loops[pair[1].Face]) && IsOnePlane(normals[pair[0].Face], normals[pair[1].Face]))
                groups.Join(pair[0].Face, pair[1].Face);

        var units = new Vector3[loops.Length];
        for (var i = 0; i < loops.Length; i++) units[groups.Of(i)] += normals[i];
        for (var i = 0; i < loops.Length; i++) _ = units[i].TryNormalize(out units[i]);

        var edges = ImmutableArray.CreateBuilder<SurfaceEdge>();
        foreach (var ((low, high), pair) in uses)
        {
            var (left, right) = (groups.Of(pair[0].Face), groups.Of(pair[1].Face));
            if (left == right) continue;

            var (from, to) = pair[0].IsForward ^ isTurned[pair[0].Face] ? (low, high) : (high, low);
            _ = (mesh.Points[to] - mesh.Points[from]).TryNormalize(out var along);
            edges.Add(new SurfaceEdge(from, to, left, right, units[left].Cross(units[right]).Dot(along)));
        }

        return new ClosedSurface(mesh.Points, loops.Length, edges.ToImmutable());
    }

    private static bool IsTriangle(ImmutableArray<ImmutableArray<int>> face) => face is [{ Length: 3 }];

    private static bool IsOnePlane(Vector3 a, Vector3 b) => a.Dot(b) > 0 && a.Cross(b).Length <= Flat * a.Length * b.Length;
}
