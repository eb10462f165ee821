using MemberScan.Foundation.Geometry;
using MemberScan.SampleModels.Writing;

namespace MemberScan.Ifc.Tests.Meshes;

/// <summary>Meshes of bars that are joined: a round outline led along a line with mitred corners, and bars that end on others.</summary>
internal sealed class JoinedMesh
{
    public List<Vector3> Points { get; } = [];

    public List<IReadOnlyList<IReadOnlyList<int>>> Faces { get; } = [];

    /// <summary>A round bar or tube along a line; each corner is cut by the plane that halves it.</summary>
    /// <param name="line">Corners of the middle line [m].</param>
    /// <param name="radii">Outer radius, and the bore's where there is one [m].</param>
    /// <param name="facets">Chords of the circle.</param>
    public static JoinedMesh Along(IReadOnlyList<Vector3> line, IReadOnlyList<double> radii, int facets)
    {
        var mesh = new JoinedMesh();
        var tangents = line.Skip(1).Select((p, i) => Unit(p - line[i])).ToList();
        var start = Bars.Frame(line[0], tangents[0], Math.Abs(tangents[0].Z) < 0.9 ? Vector3.UnitZ : Vector3.UnitX);
        List<Vector3> around = [.. radii.SelectMany(r => OutlineWriter.RegularPolygon(Vector3.Zero, r, facets)).Select(start.Point)];
        mesh.Points.AddRange(around);
        for (var i = 1; i < line.Count; i++)
        {
            var normal = i < tangents.Count ? Unit(tangents[i - 1] + tangents[i]) : tangents[i - 1];
            around = around.ConvertAll(p => p + (line[i] - p).Dot(normal) / tangents[i - 1].Dot(normal) * tangents[i - 1]);
            mesh.Points.AddRange(around);
        }

        var ring = radii.Count * facets;
        for (var i = 0; i + 1 < line.Count; i++)
            for (var loop = 0; loop < radii.Count; loop++)
                for (var k = 0; k < facets; k++)
                {
                    var (a, b) = (i * ring + loop * facets + k, i * ring + loop * facets + (k + 1) % facets);
                    mesh.Faces.Add([[a, b, b + ring, a + ring]]);
                }

        foreach (var end in new[] { 0, (line.Count - 1) * ring })
            mesh.Faces.Add([.. Enumerable.Range(0, radii.Count).Select(loop => Enumerable.Range(end + loop * facets, facets).ToList())]);
        return mesh;
    }

    /// <summary>A flat bar along x whose upper face has a round hole: a round post stands on it, or a bore runs through it.</summary>
    public static JoinedMesh FlatWith(double length, double width, double depth, double radius, double postHeight, int facets)
    {
        var mesh = new JoinedMesh();
        foreach (var z in new[] { -depth / 2, depth / 2 })
            foreach (var (x, y) in new[] { (0.0, -width / 2), (length, -width / 2), (length, width / 2), (0.0, width / 2) })
                mesh.Points.Add(new Vector3(x, y, z));
        var isBore = postHeight <= 0;
        foreach (var z in new[] { depth / 2, isBore ? -depth / 2 : depth / 2 + postHeight })
            mesh.Points.AddRange(OutlineWriter.RegularPolygon(new Vector3(length / 2, 0, z), radius, facets));
        List<int> near = [.. Enumerable.Range(8, facets)], far = [.. Enumerable.Range(8 + facets, facets)];
        mesh.Faces.AddRange([[[4, 5, 6, 7], near], isBore ? [[0, 1, 2, 3], far] : [[0, 1, 2, 3]], [[0, 1, 5, 4]], [[1, 2, 6, 5]], [[2, 3, 7, 6]], [[3, 0, 4, 7]]]);
        for (var k = 0; k < facets; k++) mesh.Faces.Add([[near[k], near[(k + 1) % facets], far[(k + 1) % facets], far[k]]]);
        if (!isBore) mesh.Faces.Add([far]);
        return mesh;
    }

    /// <summary>Both meshes in one.</summary>
    public JoinedMesh With(JoinedMesh other)
    {
        var shift = Points.Count;
        Points.AddRange(other.Points);
        Faces.AddRange(other.Faces.Select(face => (IReadOnlyList<IReadOnlyList<int>>)[.. face.Select(loop => loop.Select(i => i + shift).ToList())]));
        return this;
    }

    /// <summary>Changes every point.</summary>
    public JoinedMesh Changed(Func<Vector3, Vector3> change)
    {
        for (var i = 0; i < Points.Count; i++) Points[i] = change(Points[i]);
        return this;
    }

    /// <summary>The sides as triangles, the ends of a solid bar too.</summary>
    public IEnumerable<IReadOnlyList<int>> Triangles() =>
        from face in Faces from i in Enumerable.Range(1, face[0].Count - 2) select (IReadOnlyList<int>)[face[0][0], face[0][i], face[0][i + 1]];

    private static Vector3 Unit(Vector3 v) => 1 / v.Length * v;
}
