using System.Globalization;
using MemberScan.Foundation.Geometry;

namespace MemberScan.SampleModels.Writing;

/// <summary>Writes one analysis model that is to be solved: supports, releases, eccentricities and loads, in the spelling of each schema.</summary>
/// <remarks>Lengths and forces come in SI. Stiffnesses are written as given: their unit is not among those of the file.</remarks>
public sealed class FrameWriter
{
    private readonly ModelWriter _model;
    private readonly string _name;
    private readonly int _placement;
    private readonly List<int> _items = [];
    private readonly List<int> _top = [];
    private readonly Dictionary<int, List<int>> _actionsOf = [];
    private int _keys;

    /// <summary>Starts an analysis model.</summary>
    /// <param name="model">The model.</param>
    /// <param name="name">Name of the analysis model.</param>
    /// <param name="sharedFrame">The placement that all its items share; null for the project's axes.</param>
    public FrameWriter(ModelWriter model, string name, Transform3? sharedFrame = null) =>
        (_model, _name, _placement) = (model, name, model.LocalPlacement(sharedFrame ?? Transform3.Identity));

    private bool IsOld => _model.Schema == SchemaVersion.Ifc2X3;

    /// <summary>A boundary condition of a node; each direction <c>fixed</c>, <c>free</c>, <c>$</c> or a stiffness.</summary>
    public int Condition(params ReadOnlySpan<string> held)
    {
        var values = new List<string> { Spelling.Unset };
        for (var i = 0; i < 6; i++)
        {
            values.Add(held[i] switch
            {
                "$" => Spelling.Unset,
                "fixed" => IsOld ? "-1." : "IFCBOOLEAN(.T.)",
                "free" => IsOld ? "0." : "IFCBOOLEAN(.F.)",
                var number => IsOld ? number : Spelling.Typed(i < 3 ? "IFCLINEARSTIFFNESSMEASURE" : "IFCROTATIONALSTIFFNESSMEASURE", number),
            });
        }

        return _model.Add("IFCBOUNDARYNODECONDITION", [.. values]);
    }

    /// <summary>A point connection [m]; its condition in the axes of a system, from IFC4 on.</summary>
    public int Node(string name, Vector3 point, int? condition = null, Transform3? system = null)
    {
        string[] own = [Spelling.Unset, Ref(_placement), Ref(Topology("Vertex", Vertex(point))), Ref(condition)];
        int? axes = system is null ? null : _model.AxisPlacement(system);
        return Item(_model.Rooted("IFCSTRUCTURALPOINTCONNECTION", Key(name), name, IsOld ? own : [.. own, Ref(axes)]));
    }

    /// <summary>A straight curve member [m]; its axis is not written in IFC2X3.</summary>
    public int Member(string name, Vector3 start, Vector3 end, Vector3 axis, string predefinedType = "RIGID_JOINED_MEMBER") =>
        Member(name, _model.Add("IFCEDGE", Ref(Vertex(start)), Ref(Vertex(end))), axis, predefinedType);

    /// <summary>A curve member along an arc of a circle about the origin in the plane of X and Y [m, rad].</summary>
    public int ArcMember(string name, double radius, double from, double to, Vector3 axis)
    {
        Vector3 At(double angle) => new(radius * Math.Cos(angle), radius * Math.Sin(angle), 0);
        var circle = _model.Add("IFCCIRCLE", Ref(_model.AxisPlacement(Transform3.Identity)), _model.Units.LengthText(radius));
        var arc = _model.Add("IFCTRIMMEDCURVE", Ref(circle), Parameter(from), Parameter(to), ".T.", ".PARAMETER.");
        return Member(name, _model.Add("IFCEDGECURVE", Ref(Vertex(At(from))), Ref(Vertex(At(to))), Ref(arc), ".T."), axis, "RIGID_JOINED_MEMBER");
    }

    /// <summary>Any other structural item, such as a surface member; it is assigned to the model.</summary>
    public int Item(int item)
    {
        _items.Add(item);
        return item;
    }

    /// <summary>Joins a member to a connection: rigidly or by a condition; with an eccentricity from the connection to the member [m] where one is given.</summary>
    public int Join(int member, int node, int? condition = null, Transform3? system = null, Vector3? eccentricity = null)
    {
        int? axes = system is null ? null : _model.AxisPlacement(system);
        string[] own = [Ref(member), Ref(node), Ref(condition), Spelling.Unset, Spelling.Unset, Ref(axes)];
        if (eccentricity is not { } e) return _model.Rooted("IFCRELCONNECTSSTRUCTURALMEMBER", Key("join"), null, own);

        var geometry = _model.Add("IFCCONNECTIONPOINTGEOMETRY", Ref(_model.Point(e)), Ref(_model.Point(Vector3.Zero)));
        return _model.Rooted("IFCRELCONNECTSWITHECCENTRICITY", Key("join"), null, [.. own, Ref(geometry)]);
    }

    /// <summary>Gives members a material and a profile: as a profile set, in IFC2X3 as material and profile properties.</summary>
    public void Section(int material, int profile, params IEnumerable<int> members)
    {
        int[] owners = [.. members];
        if (!IsOld)
        {
            _model.Associate(_model.Materials.ProfileSetUsage(_model.Materials.ProfileSet(Key("set"), material, profile)), owners);
            return;
        }

        _model.Associate(material, owners);
        var properties = _model.Add("IFCGENERALPROFILEPROPERTIES", Spelling.Unset, Ref(profile), "$", "$", "$", "$", "$");
        _model.Rooted("IFCRELASSOCIATESPROFILEPROPERTIES", Key("profile"), null, Spelling.References(owners), Ref(properties), "$", "$");
    }

    /// <summary>A load case; its self-weight factors are not written in IFC2X3, its coefficient as spelled.</summary>
    public int Case(string name, Vector3? selfWeight = null, string coefficient = "1.", bool onTop = true)
    {
        string[] own = ["$", ".LOAD_CASE.", ".VARIABLE_Q.", ".LIVE_LOAD_Q.", coefficient, "$"];
        var weight = selfWeight is { } w ? Spelling.List([Spelling.Real(w.X), Spelling.Real(w.Y), Spelling.Real(w.Z)]) : "$";
        var group = IsOld
            ? _model.Rooted("IFCSTRUCTURALLOADGROUP", Key(name), name, own)
            : _model.Rooted("IFCSTRUCTURALLOADCASE", Key(name), name, [.. own, weight]);
        _actionsOf[group] = [];
        if (onTop) _top.Add(group);
        return group;
    }

    /// <summary>A combination of cases with factors; the purpose is <c>SLS</c>, <c>ULS</c> or free text.</summary>
    public int Combination(string name, string purpose, params ReadOnlySpan<(int Case, double Factor)> cases)
    {
        var combination = Group(name, "LOAD_COMBINATION", 1, purpose);
        foreach (var (one, factor) in cases)
        {
            if (!IsOld)
            {
                _model.Rooted("IFCRELASSIGNSTOGROUPBYFACTOR", Key(name), null, Spelling.References([one]), "$", Ref(combination), Spelling.Real(factor));
                continue;
            }

            var inner = Group(name + " share", "LOAD_COMBINATION_GROUP", factor, null);
            _model.Rooted("IFCRELASSIGNSTOGROUP", Key(name), null, Spelling.References([one]), "$", Ref(inner));
            _model.Rooted("IFCRELASSIGNSTOGROUP", Key(name), null, Spelling.References([inner]), "$", Ref(combination));
        }

        _top.Add(combination);
        return combination;
    }

    /// <summary>A force and moment on a connection, or on a member at a place [m].</summary>
    public int PointAction(int item, int loadCase, Vector3 force, Vector3 moment = default, Vector3? place = null, bool inGlobalAxes = true)
    {
        var units = _model.Units;
        var load = _model.Add("IFCSTRUCTURALLOADSINGLEFORCE", "$", units.ForceText(force.X), units.ForceText(force.Y), units.ForceText(force.Z),
            units.MomentText(moment.X), units.MomentText(moment.Y), units.MomentText(moment.Z));
        int? shape = place is { } point ? Topology("Vertex", Vertex(point)) : null;
        return Action("IFCSTRUCTURALPOINTACTION", item, loadCase, load, inGlobalAxes, shape);
    }

    /// <summary>Displacements forced upon a connection [m, rad], as spelled in the file; <c>$</c> for none.</summary>
    public int Movement(int node, int loadCase, params ReadOnlySpan<string> values) =>
        Action("IFCSTRUCTURALPOINTACTION", node, loadCase, _model.Add("IFCSTRUCTURALLOADSINGLEDISPLACEMENT", ["$", .. values]), inGlobalAxes: true, null);

    /// <summary>A uniform force per length [N/m] over a whole member.</summary>
    public int LineAction(int member, int loadCase, Vector3 force, bool inGlobalAxes = true, bool isProjected = false) =>
        Action("IFCSTRUCTURALLINEARACTION", member, loadCase, LinearForce(force), inGlobalAxes, null, Projection(isProjected));

    /// <summary>A change of temperature of a whole member, in kelvin: of all of it, and the differences across y and z.</summary>
    public int Temperature(int member, int loadCase, double uniform, double acrossY = 0, double acrossZ = 0) =>
        Action("IFCSTRUCTURALLINEARACTION", member, loadCase,
            _model.Add("IFCSTRUCTURALLOADTEMPERATURE", "$", Spelling.Real(uniform), Spelling.Real(acrossY), Spelling.Real(acrossZ)), inGlobalAxes: false, null, Projection(false));

    /// <summary>A poly-linear force per length [N/m] at places [m]; from IFC4 on.</summary>
    public int CurveAction(int member, int loadCase, bool inGlobalAxes, params ReadOnlySpan<(double At, Vector3 Force)> samples)
    {
        var (loads, places) = (new List<int>(), new List<string>());
        foreach (var (at, force) in samples)
        {
            loads.Add(LinearForce(force));
            places.Add(Spelling.List([_model.Units.LengthText(at)]));
        }

        var configuration = _model.Add("IFCSTRUCTURALLOADCONFIGURATION", "$", Spelling.References(loads), Spelling.List(places));
        return Action("IFCSTRUCTURALCURVEACTION", member, loadCase, configuration, inGlobalAxes, null, "$", samples.Length == 2 ? ".LINEAR." : ".POLYGONAL.");
    }

    /// <summary>A force per area on any item [N/m²].</summary>
    public int PlanarAction(int item, int loadCase, Vector3 pressure)
    {
        var load = _model.Add("IFCSTRUCTURALLOADPLANARFORCE", "$", Spelling.Real(pressure.X), Spelling.Real(pressure.Y), Spelling.Real(pressure.Z));
        return Action("IFCSTRUCTURALPLANARACTION", item, loadCase, load, inGlobalAxes: true, null, Projection(false));
    }

    /// <summary>Finishes the analysis model.</summary>
    /// <param name="resultGroups">Result groups that it holds.</param>
    public int Finish(params IEnumerable<int> resultGroups)
    {
        foreach (var (group, actions) in _actionsOf)
            if (actions.Count > 0) _model.Rooted("IFCRELASSIGNSTOGROUP", Key("actions"), null, Spelling.References(actions), "$", Ref(group));

        int[] results = [.. resultGroups];
        string[] own = ["$", ".LOADING_3D.", "$", _top.Count > 0 ? Spelling.References(_top) : "$", results.Length > 0 ? Spelling.References(results) : "$"];
        var analysis = _model.Rooted("IFCSTRUCTURALANALYSISMODEL", _name, _name, IsOld ? own : [.. own, Ref(_placement)]);
        _model.Rooted("IFCRELASSIGNSTOGROUP", Key("items"), null, Spelling.References(_items), "$", Ref(analysis));
        return analysis;
    }

    private int Member(string name, int edge, Vector3 axis, string predefinedType)
    {
        string[] own = ["$", Ref(_placement), Ref(Topology("Edge", edge)), Spelling.Literal(predefinedType)];
        return Item(_model.Rooted("IFCSTRUCTURALCURVEMEMBER", Key(name), name, IsOld ? own : [.. own, Ref(_model.Direction(axis))]));
    }

    private string[] Projection(bool isProjected)
    {
        var word = isProjected ? ".PROJECTED_LENGTH." : ".TRUE_LENGTH.";
        return IsOld ? ["$", word] : [word, ".CONST."];
    }

    private int LinearForce(Vector3 force)
    {
        var units = _model.Units;
        return _model.Add("IFCSTRUCTURALLOADLINEARFORCE", "$", units.LineForceText(force.X), units.LineForceText(force.Y), units.LineForceText(force.Z), "$", "$", "$");
    }

    private int Action(string keyword, int item, int loadCase, int load, bool inGlobalAxes, int? shape, params ReadOnlySpan<string> own)
    {
        var axes = inGlobalAxes ? ".GLOBAL_COORDS." : ".LOCAL_COORDS.";
        var action = _model.Rooted(keyword, Key("action"), null, ["$", Ref(_placement), Ref(shape), Ref(load), axes, ".F.", .. own.Length == 0 && IsOld ? ["$"] : own]);
        _model.Rooted("IFCRELCONNECTSSTRUCTURALACTIVITY", Key("on"), null, Ref(item), Ref(action));
        _actionsOf[loadCase].Add(action);
        return action;
    }

    private int Group(string name, string kind, double coefficient, string? purpose) => _model.Rooted("IFCSTRUCTURALLOADGROUP", Key(name), name, "$",
        Spelling.Literal(kind), ".NOTDEFINED.", ".NOTDEFINED.", Spelling.Real(coefficient), Spelling.Text(purpose));

    private int Vertex(Vector3 point) => _model.AddOnce("IFCVERTEXPOINT", Ref(_model.Point(point)));

    private int Topology(string kind, int item)
    {
        var representation = _model.Add("IFCTOPOLOGYREPRESENTATION", Ref(_model.ReferenceContext), "'Reference'", Spelling.Text(kind), Spelling.References([item]));
        return _model.Add("IFCPRODUCTDEFINITIONSHAPE", "$", "$", Spelling.References([representation]));
    }

    private static string Parameter(double value) => $"(IFCPARAMETERVALUE({Spelling.Real(value)}))";

    private static string Ref(int? id) => Spelling.Reference(id);

    private string Key(string what) => string.Create(CultureInfo.InvariantCulture, $"{_name}/{what}/{++_keys}");
}
