using MemberScan.Foundation.Geometry;

namespace MemberScan.Ifc.Tests.Analysis;

/// <summary>Analytical members and reactions from instances that the tests spell themselves, without a placement of their own.</summary>
internal static class Lines
{
    /// <summary>A curve member on an edge; no Axis when null (and never in IFC2X3).</summary>
    public static int CurveMember(ModelWriter model, string name, int edge, Vector3? axis, int? placement = null)
    {
        var shape = Topology(model, "Edge", edge);
        string[] own = ["$", Spelling.Reference(placement), Bars.Ref(shape), ".RIGID_JOINED_MEMBER."];
        return model.Rooted("IFCSTRUCTURALCURVEMEMBER", name, name,
            model.Schema == Release.Ifc2X3 ? own : [.. own, axis is { } z ? Bars.Ref(model.Direction(z)) : "$"]);
    }

    public static int Edge(ModelWriter model, Vector3 start, Vector3 end) => model.Add("IFCEDGE", Bars.Ref(Vertex(model, start)), Bars.Ref(Vertex(model, end)));

    public static int Vertex(ModelWriter model, Vector3 point) => model.Add("IFCVERTEXPOINT", Bars.Ref(model.Point(point)));

    public static int PointReaction(ModelWriter model, int member, int load, int vertex, int resultGroup) =>
        Activity(model, "IFCSTRUCTURALPOINTREACTION", member, load, resultGroup, Bars.Ref(Topology(model, "Vertex", vertex)), ".LOCAL_COORDS.");

    public static int CurveReaction(ModelWriter model, int member, int load, int? resultGroup, string kind, string flag = ".LOCAL_COORDS.") =>
        Activity(model, "IFCSTRUCTURALCURVEREACTION", member, load, resultGroup, "$", flag, $".{kind}.");

    /// <summary>Six components as they stand in the file.</summary>
    public static int SingleForce(ModelWriter model, params string[] components) => model.Add("IFCSTRUCTURALLOADSINGLEFORCE", ["$", .. components]);

    /// <summary>Samples at locations; none when the locations are null.</summary>
    public static int Samples(ModelWriter model, IEnumerable<int> loads, params string[]? locations) => model.Add("IFCSTRUCTURALLOADCONFIGURATION", "$",
        Spelling.References(loads), locations is null ? "$" : Spelling.List(locations.Select(l => $"({l})")));

    private static int Activity(ModelWriter model, string keyword, int member, int load, int? resultGroup, string shape, string flag, params string[] own)
    {
        var key = FormattableString.Invariant($"{keyword} {member} {load} {resultGroup}");
        var activity = model.Rooted(keyword, key, null, ["$", "$", shape, Bars.Ref(load), flag, .. own]);
        model.Rooted("IFCRELCONNECTSSTRUCTURALACTIVITY", key, null, Bars.Ref(member), Bars.Ref(activity));
        if (resultGroup is { } group) model.Rooted("IFCRELASSIGNSTOGROUP", key, null, Bars.Refs(activity), "$", Bars.Ref(group));
        return activity;
    }

    private static int Topology(ModelWriter model, string kind, int item)
    {
        var representation = model.Add("IFCTOPOLOGYREPRESENTATION", Bars.Ref(model.ReferenceContext), "'Reference'", $"'{kind}'", Bars.Refs(item));
        return model.Add("IFCPRODUCTDEFINITIONSHAPE", "$", "$", Bars.Refs(representation));
    }
}
