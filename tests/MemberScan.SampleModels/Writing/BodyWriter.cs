using MemberScan.Foundation.Geometry;

namespace MemberScan.SampleModels.Writing;

/// <summary>Writes solids and the representations that hold them; dimensions in metres.</summary>
public sealed class BodyWriter
{
    private readonly ModelWriter _model;

    internal BodyWriter(ModelWriter model) => _model = model;

    /// <summary>A profile extruded along the z axis of its position (the placement's own axes when null); gives the solid.</summary>
    public int Extrusion(int profile, double depth, Transform3? position = null)
    {
        var place = _model.AxisPlacement(position ?? Transform3.Identity);
        return _model.Add("IFCEXTRUDEDAREASOLID", Spelling.Reference(profile), Spelling.Reference(place),
            Spelling.Reference(_model.Direction(Vector3.UnitZ)), _model.Units.LengthText(depth));
    }

    /// <summary>A disk swept along a polyline; an inner radius makes it a tube; gives the solid.</summary>
    public int SweptDisk(IReadOnlyList<Vector3> points, double radius, double? innerRadius = null)
    {
        var line = _model.Add("IFCPOLYLINE", Spelling.References(points.Select(_model.Point)));
        // The polyline's parameter counts its segments; both ends are mandatory in IFC2X3 alone.
        var old = _model.Schema == SchemaVersion.Ifc2X3;
        return _model.Add("IFCSWEPTDISKSOLID", Spelling.Reference(line), _model.Units.LengthText(radius),
            innerRadius is { } inner ? _model.Units.LengthText(inner) : Spelling.Unset,
            old ? Spelling.Real(0) : Spelling.Unset, old ? Spelling.Real(points.Count - 1) : Spelling.Unset);
    }

    /// <summary>A block of six faces as a faceted boundary, one corner at the origin; gives the solid.</summary>
    public int FacetedBlock(double x, double y, double z)
    {
        int[] corners = [.. Enumerable.Range(0, 8).Select(i => _model.Point(new Vector3((i & 1) * x, ((i >> 1) & 1) * y, ((i >> 2) & 1) * z)))];
        int[][] faces = [[0, 2, 3, 1], [4, 5, 7, 6], [0, 1, 5, 4], [2, 6, 7, 3], [0, 4, 6, 2], [1, 3, 7, 5]];
        var shell = faces.Select(face =>
        {
            var loop = _model.Add("IFCPOLYLOOP", Spelling.References(face.Select(i => corners[i])));
            var bound = _model.Add("IFCFACEOUTERBOUND", Spelling.Reference(loop), Spelling.Boolean(true));
            return _model.Add("IFCFACE", Spelling.References([bound]));
        }).ToArray();
        return _model.Add("IFCFACETEDBREP", Spelling.Reference(_model.Add("IFCCLOSEDSHELL", Spelling.References(shell))));
    }

    /// <summary>A faceted boundary; each face is its outer loop and then its holes, as indices into the points.</summary>
    public int FacetedBody(IReadOnlyList<Vector3> points, IEnumerable<IReadOnlyList<IReadOnlyList<int>>> faces) =>
        _model.Add("IFCFACETEDBREP", Spelling.Reference(Shell("IFCCLOSEDSHELL", points, faces)));

    /// <summary>A surface model of one shell.</summary>
    public int SurfaceModel(IReadOnlyList<Vector3> points, IEnumerable<IReadOnlyList<IReadOnlyList<int>>> faces) =>
        _model.Add("IFCSHELLBASEDSURFACEMODEL", Spelling.References([Shell("IFCCLOSEDSHELL", points, faces)]));

    /// <summary>A set of triangles (not in IFC2X3).</summary>
    public int Triangles(IReadOnlyList<Vector3> points, IEnumerable<IReadOnlyList<int>> triangles) => _model.Add("IFCTRIANGULATEDFACESET",
        Spelling.Reference(PointList(points)), Spelling.Unset, Spelling.Boolean(true), Spelling.List(triangles.Select(FromOne)), Spelling.Unset);

    /// <summary>A set of polygons (not in IFC2X3).</summary>
    public int Polygons(IReadOnlyList<Vector3> points, IEnumerable<IReadOnlyList<IReadOnlyList<int>>> faces)
    {
        var written = faces.Select(face => face.Count == 1
            ? _model.Add("IFCINDEXEDPOLYGONALFACE", FromOne(face[0]))
            : _model.Add("IFCINDEXEDPOLYGONALFACEWITHVOIDS", FromOne(face[0]), Spelling.List(face.Skip(1).Select(FromOne)))).ToArray();
        return _model.Add("IFCPOLYGONALFACESET", Spelling.Reference(PointList(points)), Spelling.Boolean(true), Spelling.References(written), Spelling.Unset);
    }

    private int Shell(string keyword, IReadOnlyList<Vector3> points, IEnumerable<IReadOnlyList<IReadOnlyList<int>>> faces)
    {
        int[] written = [.. points.Select(_model.Point)];
        int[] all = [.. faces.Select(face => _model.Add("IFCFACE", Spelling.References(face.Select((loop, i) => _model.Add(
            i == 0 ? "IFCFACEOUTERBOUND" : "IFCFACEBOUND",
            Spelling.Reference(_model.Add("IFCPOLYLOOP", Spelling.References(loop.Select(p => written[p])))), Spelling.Boolean(true))))))];
        return _model.Add(keyword, Spelling.References(all));
    }

    private int PointList(IReadOnlyList<Vector3> points) => _model.Add("IFCCARTESIANPOINTLIST3D", Spelling.List(points.Select(p =>
        Spelling.List([_model.Units.LengthText(p.X), _model.Units.LengthText(p.Y), _model.Units.LengthText(p.Z)]))));

    private static string FromOne(IReadOnlyList<int> indices) => Spelling.List(indices.Select(i => Spelling.Integer(i + 1)));

    /// <summary>The body representation of solids of one kind: <c>SweptSolid</c>, <c>AdvancedSweptSolid</c>, <c>Brep</c>, <c>MappedRepresentation</c>.</summary>
    public int Representation(string kind, params IEnumerable<int> items) =>
        _model.Add("IFCSHAPEREPRESENTATION", Spelling.Reference(_model.BodyContext), Spelling.Text("Body"), Spelling.Text(kind), Spelling.References(items));

    /// <summary>The shape of one body representation.</summary>
    public int Shape(string kind, params IEnumerable<int> items) =>
        _model.Add("IFCPRODUCTDEFINITIONSHAPE", Spelling.Unset, Spelling.Unset, Spelling.References([Representation(kind, items)]));

    /// <summary>A representation to be mapped, with its own origin.</summary>
    public int Map(int representation, Transform3? origin = null) => _model.Add("IFCREPRESENTATIONMAP",
        Spelling.Reference(_model.AxisPlacement(origin ?? Transform3.Identity)), Spelling.Reference(representation));

    /// <summary>One use of a mapped representation, moved, turned and scaled.</summary>
    public int MappedItem(int map, Transform3? target = null, double scale = 1)
    {
        var to = target ?? Transform3.Identity;
        var transformation = _model.AddOnce("IFCCARTESIANTRANSFORMATIONOPERATOR3D", Spelling.Reference(_model.Direction(to.X)), Spelling.Reference(_model.Direction(to.Y)),
            Spelling.Reference(_model.Point(to.Origin)), Spelling.Real(scale), Spelling.Reference(_model.Direction(to.Z)));
        return _model.Add("IFCMAPPEDITEM", Spelling.Reference(map), Spelling.Reference(transformation));
    }
}
