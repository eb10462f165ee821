using System.Collections.Immutable;
using MemberScan.Foundation.Geometry;
using MemberScan.Ifc.Curves;
using MemberScan.Ifc.Geometry;
using MemberScan.Ifc.Units;
using MemberScan.Part21;

namespace MemberScan.Ifc.Meshes;

/// <summary>Meshes from faceted bodies, face sets and surface models.</summary>
internal sealed class MeshReader(Instances instances, PlacementReader placements, ModelUnits units)
{
    private readonly AdvancedFaceReader _advanced = new(instances, placements, new CurveReader(instances, placements, units));

    /// <summary>Reads a mesh; null, with the reason, when it is damaged, beyond the limits or has curved faces.</summary>
    /// <param name="body">The body.</param>
    /// <param name="fault">Why there is none; empty when there is one.</param>
    public Mesh? Read(Part21Record body, out string fault)
    {
        var builder = new Builder();
        fault = body.Keyword switch
        {
            "IFCFACETEDBREP" or "IFCADVANCEDBREP" => AddShells(builder, instances.TryFollow(body[0], out var shell) ? [shell] : null),
            "IFCSHELLBASEDSURFACEMODEL" or "IFCFACEBASEDSURFACEMODEL" => AddShells(builder, instances.FollowEach(body[0])),
            "IFCTRIANGULATEDFACESET" => AddTriangles(builder, body),
            "IFCPOLYGONALFACESET" => AddPolygons(builder, body),
            "IFCFACETEDBREPWITHVOIDS" or "IFCADVANCEDBREPWITHVOIDS" => "it has voids within",
            _ => "its faces may be curved",
        };
        return fault.Length == 0 ? builder.Build() : null;
    }

    private string AddShells(Builder builder, List<Part21Record>? shells)
    {
        if (shells is null) return "a shell of it is missing";

        foreach (var shell in shells)
            if (AddShell(builder, shell) is { Length: > 0 } fault)
                return fault;
        return "";
    }

    private string AddShell(Builder builder, Part21Record shell)
    {
        if (shell[0].ItemCount > Mesh.MaxFaces) return TooLarge;
        if (instances.FollowEach(shell[0]) is not { } faces) return "a face of it is missing";

        foreach (var face in faces)
        {
            var isPlain = face.Keyword is "IFCFACE" or "IFCFACESURFACE";
            if (!isPlain && (face.Keyword != "IFCADVANCEDFACE" || !_advanced.IsCovered(face))) return $"its faces are curved otherwise than a cylinder ({(face.Keyword == "IFCADVANCEDFACE" ? _advanced.SurfaceOf(face) : face.Keyword)})";
            if (instances.FollowEach(face[0]) is not { Count: > 0 } bounds) return "a face of it has no bounds";

            var loops = new List<ImmutableArray<int>>();
            foreach (var bound in bounds)
            {
                if (!instances.TryFollow(bound[0], out var loop) || Bound(builder, loop) is not { } indices) return "a face of it is not bounded by straight or circular edges";

                // The outer bound comes first whatever its place in the set.
                if (bound.Keyword == "IFCFACEOUTERBOUND") loops.Insert(0, indices);
                else loops.Add(indices);
            }

            builder.Faces.Add([.. loops]);
            if (builder.IsTooLarge) return TooLarge;
        }

        return "";
    }

    private ImmutableArray<int>? Bound(Builder builder, Part21Record loop) => loop.Keyword switch
    {
        "IFCPOLYLOOP" => Loop(builder, loop),
        "IFCEDGELOOP" => _advanced.Loop(loop) is { } points && points.Count <= Mesh.MaxPoints ? [.. points.Select(builder.Add)] : null,
        _ => null,
    };

    private ImmutableArray<int>? Loop(Builder builder, Part21Record loop)
    {
        if (loop[0].ItemCount > Mesh.MaxPoints) return null;

        var indices = ImmutableArray.CreateBuilder<int>();
        foreach (var id in Instances.IdsOf(loop[0]))
        {
            if (!builder.OfRecord.TryGetValue(id, out var index))
            {
                if (!instances.File.TryFind(id, out var record) || placements.Point(record) is not { } point) return null;

                builder.OfRecord[id] = index = builder.Add(point);
            }

            indices.Add(index);
        }

        return indices.Count >= 3 ? indices.ToImmutable() : null;
    }

    private string AddTriangles(Builder builder, Part21Record set)
    {
        if (set[3].ItemCount > Mesh.MaxFaces) return TooLarge;
        if (Coordinates(builder, set[0]) is not { } points) return "its points are damaged or too many";

        var chosen = Chosen(set[4]);
        foreach (var triangle in set[3].Items)
            if (!AddFace(builder, [triangle], points, chosen))
                return "a triangle of it is damaged";
        return "";
    }

    private string AddPolygons(Builder builder, Part21Record set)
    {
        if (set[2].ItemCount > Mesh.MaxFaces) return TooLarge;
        if (Coordinates(builder, set[0]) is not { } points || instances.FollowEach(set[2]) is not { } faces) return "its points or faces are damaged or too many";

        var chosen = Chosen(set[3]);
        foreach (var face in faces)
        {
            Part21Value[] loops = face.Keyword == "IFCINDEXEDPOLYGONALFACEWITHVOIDS" ? [face[0], .. face[1].Items] : [face[0]];
            if (!AddFace(builder, loops, points, chosen)) return "a face of it is damaged";
        }

        return "";
    }

    private int[]? Coordinates(Builder builder, Part21Value reference)
    {
        if (units.Length is not { } metre || !instances.TryFollow(reference, out var list) || list[0].ItemCount is 0 or > Mesh.MaxPoints) return null;

        var indices = new List<int>();
        foreach (var row in list[0].Items)
        {
            if (Instances.Reals(row) is not { Length: 3 } c) return null;

            indices.Add(builder.Add(metre * new Vector3(c[0], c[1], c[2])));
        }

        return [.. indices];
    }

    // Indices count from 1; where a second list is given, the first points into that.
    private static long[]? Chosen(Part21Value list) =>
        list.IsEmpty ? null : [.. list.Items.Select(i => i.TryInteger(out var index) ? index : 0)];

    private static bool AddFace(Builder builder, IReadOnlyList<Part21Value> loops, int[] points, long[]? chosen)
    {
        var face = ImmutableArray.CreateBuilder<ImmutableArray<int>>();
        foreach (var loop in loops)
        {
            var indices = ImmutableArray.CreateBuilder<int>();
            foreach (var item in loop.Items)
            {
                if (!item.TryInteger(out var index)) return false;
                if (chosen is not null) index = index >= 1 && index <= chosen.Length ? chosen[index - 1] : 0;
                if (index < 1 || index > points.Length) return false;

                indices.Add(points[index - 1]);
            }

            if (indices.Count < 3) return false;

            face.Add(indices.ToImmutable());
        }

        builder.Faces.Add(face.ToImmutable());
        return true;
    }

    private static string TooLarge => string.Create(System.Globalization.CultureInfo.InvariantCulture, $"it has more than {Mesh.MaxFaces} faces or {Mesh.MaxPoints} points");

    /// <summary>Points are one where they are nearer than a nanometre's grid.</summary>
    private sealed class Builder
    {
        private const double Grid = 1e-8;

        private readonly Dictionary<(double X, double Y, double Z), int> _index = [];
        private readonly ImmutableArray<Vector3>.Builder _points = ImmutableArray.CreateBuilder<Vector3>();

        public Dictionary<ulong, int> OfRecord { get; } = [];

        public List<ImmutableArray<ImmutableArray<int>>> Faces { get; } = [];

        public bool IsTooLarge => Faces.Count > Mesh.MaxFaces || _points.Count > Mesh.MaxPoints;

        public int Add(Vector3 point)
        {
            var key = (Math.Round(point.X / Grid), Math.Round(point.Y / Grid), Math.Round(point.Z / Grid));
            if (_index.TryGetValue(key, out var index)) return index;

            _points.Add(point);
            return _index[key] = _points.Count - 1;
        }

        public Mesh Build() => new(_points.ToImmutable(), [.. Faces]);
    }
}
