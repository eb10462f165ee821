using System.Globalization;
using MemberScan.Foundation.Geometry;
using MemberScan.Mechanics.Forces;

namespace MemberScan.SampleModels.Writing;

/// <summary>Writes one structural analysis model: curve members, connections, load groups, results, links to physical elements.</summary>
public sealed class AnalysisWriter
{
    private readonly ModelWriter _model;
    private readonly string _name;
    private readonly int _placement;
    private readonly List<int> _items = [];
    private readonly List<int> _topGroups = [];
    private readonly List<int> _resultGroups = [];
    private readonly Dictionary<int, List<int>> _reactions = [];

    internal AnalysisWriter(ModelWriter model, string name, Transform3 sharedFrame) =>
        (_model, _name, _placement) = (model, name, model.LocalPlacement(sharedFrame));

    private bool IsOld => _model.Schema == SchemaVersion.Ifc2X3;

    /// <summary>A straight curve member between two points of the shared frame [m]; the axis lies on the side of its local z (not written in IFC2X3).</summary>
    public int CurveMember(string name, Vector3 start, Vector3 end, Vector3 axis, string predefinedType = "RIGID_JOINED_MEMBER")
    {
        var edge = _model.Add("IFCEDGE", Spelling.Reference(Vertex(start)), Spelling.Reference(Vertex(end)));
        string[] own = [Spelling.Unset, Spelling.Reference(_placement), Spelling.Reference(Topology("Edge", edge)), Spelling.Literal(predefinedType)];
        var member = _model.Rooted("IFCSTRUCTURALCURVEMEMBER", $"{_name}/{name}", name, IsOld ? own : [.. own, Spelling.Reference(_model.Direction(axis))]);
        _items.Add(member);
        return member;
    }

    /// <summary>A point connection in the shared frame [m]; held in the directions given (x y z, then about x y z) or not at all.</summary>
    public int PointConnection(string name, Vector3 point, bool[]? held = null)
    {
        int? condition = held is null ? null : _model.AddOnce("IFCBOUNDARYNODECONDITION", [Spelling.Unset, .. held.Select(Held)]);
        string[] own = [Spelling.Unset, Spelling.Reference(_placement), Spelling.Reference(Topology("Vertex", Vertex(point))), Spelling.Reference(condition)];
        var connection = _model.Rooted("IFCSTRUCTURALPOINTCONNECTION", $"{_name}/{name}", name, IsOld ? own : [.. own, Spelling.Unset]);
        _items.Add(connection);
        return connection;
    }

    /// <summary>Joins a curve member to a point connection, rigidly.</summary>
    public int Connect(int member, int connection) => _model.Rooted("IFCRELCONNECTSSTRUCTURALMEMBER", Pair(member, connection), null,
        Spelling.Reference(member), Spelling.Reference(connection), Spelling.Unset, Spelling.Unset, Spelling.Unset, Spelling.Unset);

    /// <summary>Says that curve members are the analytical side of a physical element.</summary>
    public void Link(int physical, params int[] analytical)
    {
        if (!IsOld)
        {
            _model.Rooted("IFCRELASSIGNSTOPRODUCT", Pair(physical, analytical[0]), "Context", Spelling.References(analytical), Spelling.Unset, Spelling.Reference(physical));
            return;
        }

        foreach (var member in analytical)
            _model.Rooted("IFCRELCONNECTSSTRUCTURALELEMENT", Pair(physical, member), null, Spelling.Reference(physical), Spelling.Reference(member));
    }

    /// <summary>A load case; its actions, if any, are for the caller to add.</summary>
    public int LoadCase(string name, string actionType = "VARIABLE_Q", string source = "LIVE_LOAD_Q")
    {
        string[] own = [Spelling.Unset, Spelling.Literal("LOAD_CASE"), Spelling.Literal(actionType), Spelling.Literal(source), Spelling.Real(1), Spelling.Unset];
        return IsOld
            ? _model.Rooted("IFCSTRUCTURALLOADGROUP", $"{_name}/{name}", name, own)
            : _model.Rooted("IFCSTRUCTURALLOADCASE", $"{_name}/{name}", name, [.. own, Spelling.Unset]);
    }

    /// <summary>A load combination of cases with factors; the purpose is <c>SLS</c>, <c>ULS</c> or free text.</summary>
    public int LoadCombination(string name, string? purpose, params (int Case, double Factor)[] cases)
    {
        var combination = Group(name, "LOAD_COMBINATION", 1, purpose);
        foreach (var share in cases.GroupBy(c => c.Factor))
        {
            var key = string.Create(CultureInfo.InvariantCulture, $"{_name}/{name}/{share.Key}");
            var members = Spelling.References(share.Select(c => c.Case));
            if (!IsOld)
            {
                _model.Rooted("IFCRELASSIGNSTOGROUPBYFACTOR", key, null, members, Spelling.Unset, Spelling.Reference(combination), Spelling.Real(share.Key));
                continue;
            }

            var inner = Group(string.Create(CultureInfo.InvariantCulture, $"{name} × {share.Key}"), "LOAD_COMBINATION_GROUP", share.Key, null);
            _model.Rooted("IFCRELASSIGNSTOGROUP", key + " cases", null, members, Spelling.Unset, Spelling.Reference(inner));
            _model.Rooted("IFCRELASSIGNSTOGROUP", key, null, Spelling.References([inner]), Spelling.Unset, Spelling.Reference(combination));
        }

        _topGroups.Add(combination);
        return combination;
    }

    /// <summary>Makes a load case one of the model's own groups, where no combination holds it.</summary>
    public void ListOnTop(int loadCase) => _topGroups.Add(loadCase);

    /// <summary>A result group of a load case or combination (null: of none that is named).</summary>
    public int ResultGroup(string name, int? loadGroup, bool isLinear = true)
    {
        var group = _model.Rooted("IFCSTRUCTURALRESULTGROUP", $"{_name}/{name}", name, Spelling.Unset, Spelling.Literal("FIRST_ORDER_THEORY"),
            Spelling.Reference(loadGroup), Spelling.Boolean(isLinear));
        _resultGroups.Add(group);
        _reactions[group] = [];
        return group;
    }

    /// <summary>Section forces at stations along a curve member; from IFC4 on.</summary>
    /// <param name="member">The curve member.</param>
    /// <param name="resultGroup">The result group; null for none.</param>
    /// <param name="stations">Stations [m] with the components as they shall stand in the file (x, y, z of the axes that the flag names).</param>
    /// <param name="inGlobalAxes">Whether the components follow the shared frame's axes; otherwise the member's.</param>
    /// <param name="predefinedType">Distribution; when null LINEAR for two stations and DISCRETE for more.</param>
    /// <param name="omitted">Names of components written as <c>$</c>, among <c>N Vy Vz T My Mz</c>.</param>
    public int CurveReaction(int member, int? resultGroup, IReadOnlyList<ForceStation> stations, bool inGlobalAxes = false, string? predefinedType = null, params string[] omitted)
    {
        if (IsOld) throw new InvalidOperationException("IFC2X3 has no curve reactions.");

        var values = stations.Select(s => SingleForce(s.Forces, omitted)).ToArray();
        var kind = predefinedType ?? (stations.Count == 2 ? "LINEAR" : "DISCRETE");
        var places = kind == "EQUIDISTANT" ? Spelling.Unset : Spelling.List(stations.Select(s => Spelling.List([_model.Units.LengthText(s.X)])));
        var load = kind == "CONST" ? values[0] : _model.Add("IFCSTRUCTURALLOADCONFIGURATION", Spelling.Unset, Spelling.References(values), places);
        return Activity("IFCSTRUCTURALCURVEREACTION", member, resultGroup, load, inGlobalAxes, null, Spelling.Literal(kind));
    }

    /// <summary>Section forces at one place of a curve member (in all schemas), or the reaction of a connection (no place).</summary>
    public int PointReaction(int item, int? resultGroup, SectionForces components, Vector3? place = null, bool inGlobalAxes = false)
    {
        int? shape = place is { } point ? Topology("Vertex", Vertex(point)) : null;
        return Activity("IFCSTRUCTURALPOINTREACTION", item, resultGroup, SingleForce(components, []), inGlobalAxes, shape);
    }

    internal void Finish()
    {
        foreach (var group in _resultGroups.Where(g => _reactions[g].Count > 0))
            _model.Rooted("IFCRELASSIGNSTOGROUP", $"{_name}/results {Number(group)}", null, Spelling.References(_reactions[group]), Spelling.Unset, Spelling.Reference(group));

        string[] own = [Spelling.Unset, Spelling.Literal("LOADING_3D"), Spelling.Unset, OrUnset(_topGroups), OrUnset(_resultGroups)];
        var analysis = _model.Rooted("IFCSTRUCTURALANALYSISMODEL", _name, _name, IsOld ? own : [.. own, Spelling.Reference(_placement)]);
        if (_items.Count > 0) _model.Rooted("IFCRELASSIGNSTOGROUP", $"{_name}/items", null, Spelling.References(_items), Spelling.Unset, Spelling.Reference(analysis));
    }

    private static string OrUnset(List<int> ids) => ids.Count > 0 ? Spelling.References(ids) : Spelling.Unset;

    private static string Number(int id) => id.ToString(CultureInfo.InvariantCulture);

    private string Pair(int one, int other) => $"{_name}/{Number(one)}-{Number(other)}";

    private string Held(bool held) => IsOld ? Spelling.Real(held ? -1 : 0) : Spelling.Typed("IFCBOOLEAN", Spelling.Boolean(held));

    private int Group(string name, string kind, double coefficient, string? purpose) => _model.Rooted("IFCSTRUCTURALLOADGROUP", $"{_name}/{name}", name, Spelling.Unset,
        Spelling.Literal(kind), Spelling.Literal("NOTDEFINED"), Spelling.Literal("NOTDEFINED"), Spelling.Real(coefficient), Spelling.Text(purpose));

    private int SingleForce(in SectionForces f, string[] omitted)
    {
        var units = _model.Units;
        (string Name, string Text)[] all =
        [
            ("N", units.ForceText(f.N)), ("Vy", units.ForceText(f.Vy)), ("Vz", units.ForceText(f.Vz)),
            ("T", units.MomentText(f.T)), ("My", units.MomentText(f.My)), ("Mz", units.MomentText(f.Mz)),
        ];
        return _model.Add("IFCSTRUCTURALLOADSINGLEFORCE", [Spelling.Unset, .. all.Select(c => omitted.Contains(c.Name) ? Spelling.Unset : c.Text)]);
    }

    private int Activity(string keyword, int item, int? resultGroup, int load, bool inGlobalAxes, int? shape, params ReadOnlySpan<string> own)
    {
        var key = $"{_name}/{Number(item)} load {Number(load)}";
        var axes = Spelling.Literal(inGlobalAxes ? "GLOBAL_COORDS" : "LOCAL_COORDS");
        var activity = _model.Rooted(keyword, key, null, [Spelling.Unset, Spelling.Reference(_placement), Spelling.Reference(shape), Spelling.Reference(load), axes, .. own]);
        _model.Rooted("IFCRELCONNECTSSTRUCTURALACTIVITY", key, null, Spelling.Reference(item), Spelling.Reference(activity));
        if (resultGroup is { } group) _reactions[group].Add(activity);
        return activity;
    }

    private int Vertex(Vector3 point) => _model.AddOnce("IFCVERTEXPOINT", Spelling.Reference(_model.Point(point)));

    private int Topology(string kind, int item)
    {
        var representation = _model.Add("IFCTOPOLOGYREPRESENTATION", Spelling.Reference(_model.ReferenceContext), Spelling.Text("Reference"), Spelling.Text(kind), Spelling.References([item]));
        return _model.Add("IFCPRODUCTDEFINITIONSHAPE", Spelling.Unset, Spelling.Unset, Spelling.References([representation]));
    }
}
