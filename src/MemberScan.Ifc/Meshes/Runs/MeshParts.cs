using System.Collections.Immutable;
using MemberScan.Foundation.Geometry;

namespace MemberScan.Ifc.Meshes.Runs;

/// <summary>The parts of a mesh that share no edge: several bodies may stand in one shell.</summary>
internal static class MeshParts
{
    /// <summary>Parts in the order of their first faces, each with the points that it uses.</summary>
    public static ImmutableArray<Mesh> Of(Mesh mesh)
    {
        var groups = new DisjointSets(mesh.Faces.Length);
        var owner = new Dictionary<(int, int), int>();
        for (var face = 0; face < mesh.Faces.Length; face++)
            foreach (var (from, to) in EdgesOf(mesh.Faces[face]))
            {
                var key = from < to ? (from, to) : (to, from);
                if (!owner.TryAdd(key, face)) groups.Join(owner[key], face);
            }

        return [.. Enumerable.Range(0, mesh.Faces.Length).GroupBy(groups.Of).Select(part => Part(mesh, [.. part]))];
    }

    /// <summary>Edges of all loops of a face, in order, without those of no length.</summary>
    public static IEnumerable<(int From, int To)> EdgesOf(ImmutableArray<ImmutableArray<int>> face)
    {
        foreach (var loop in face)
            for (var i = 0; i < loop.Length; i++)
                if (loop[i] != loop[(i + 1) % loop.Length])
                    yield return (loop[i], loop[(i + 1) % loop.Length]);
    }

    private static Mesh Part(Mesh mesh, List<int> faces)
    {
        var index = new Dictionary<int, int>();
        var points = ImmutableArray.CreateBuilder<Vector3>();
        int Renumbered(int point)
        {
            if (index.TryGetValue(point, out var known)) return known;

            points.Add(mesh.Points[point]);
            return index[point] = points.Count - 1;
        }

        var renumbered = faces.ConvertAll(f => mesh.Faces[f].Select(loop => loop.Select(Renumbered).ToImmutableArray()).ToImmutableArray());
        return new Mesh(points.ToImmutable(), [.. renumbered]);
    }
}
