namespace MemberScan.Ifc.Tests.Analysis.Loads;

/// <summary>Load groups and actions from instances that the tests spell themselves.</summary>
internal static class Actions
{
    /// <summary>A load group; its coefficient as it stands in the file.</summary>
    public static int Group(ModelWriter model, string name, string kind, string coefficient, string purpose = "$") =>
        model.Rooted("IFCSTRUCTURALLOADGROUP", name, name, "$", $".{kind}.", ".NOTDEFINED.", ".NOTDEFINED.", coefficient, purpose);

    /// <summary>A load case, of the class that its schema has for it; self-weight coefficients from IFC4 on.</summary>
    public static int Case(ModelWriter model, string name, string coefficient, string selfWeight = "$") => model.Schema == Release.Ifc2X3
        ? Group(model, name, "LOAD_CASE", coefficient)
        : model.Rooted("IFCSTRUCTURALLOADCASE", name, name, "$", ".LOAD_CASE.", ".VARIABLE_Q.", ".LIVE_LOAD_Q.", coefficient, "$", selfWeight);

    /// <summary>Puts groups or actions into a group; with a factor from IFC4 on.</summary>
    public static void Assign(ModelWriter model, int group, string? factor, params int[] related)
    {
        var key = FormattableString.Invariant($"in {group} {string.Join(' ', related)} {factor}");
        if (factor is null) model.Rooted("IFCRELASSIGNSTOGROUP", key, null, Bars.Refs(related), "$", Bars.Ref(group));
        else model.Rooted("IFCRELASSIGNSTOGROUPBYFACTOR", key, null, Bars.Refs(related), "$", Bars.Ref(group), factor);
    }

    /// <summary>A line load along the whole member, in millimetres and newtons as the file has them.</summary>
    public static int Linear(ModelWriter model, int member, int group, string z, string flag = ".GLOBAL_COORDS.", string projected = ".TRUE_LENGTH.")
    {
        var load = model.Add("IFCSTRUCTURALLOADLINEARFORCE", "$", "$", "$", z, "$", "$", "$");
        string[] own = model.Schema == Release.Ifc2X3 ? [".F.", "$", projected] : ["$", projected, ".CONST."];
        return Add(model, "IFCSTRUCTURALLINEARACTION", member, group, load, "$", flag, own);
    }

    /// <summary>A curve action with one value or samples at locations (IFC4 on).</summary>
    public static int Curve(ModelWriter model, int member, int group, int load, string kind, string flag = ".LOCAL_COORDS.") =>
        Add(model, "IFCSTRUCTURALCURVEACTION", member, group, load, "$", flag, "$", "$", $".{kind}.");

    /// <summary>A varying line load of IFC2X3: the first value, the places of all as a shape aspect, and the further values.</summary>
    public static int Varying(ModelWriter model, int member, int group, int load, int aspect, params int[] subsequent) =>
        Add(model, "IFCSTRUCTURALLINEARACTIONVARYING", member, group, load, "$", ".LOCAL_COORDS.", ".F.", "$", ".TRUE_LENGTH.", Bars.Ref(aspect), Bars.Refs(subsequent));

    public static int LinearForce(ModelWriter model, params string[] components) => model.Add("IFCSTRUCTURALLOADLINEARFORCE", ["$", .. components]);

    /// <summary>A point action at a vertex, or without a place.</summary>
    public static int Point(ModelWriter model, int member, int group, int load, int? vertex, string flag = ".LOCAL_COORDS.")
    {
        var shape = "$";
        if (vertex is { } v)
        {
            var representation = model.Add("IFCTOPOLOGYREPRESENTATION", Bars.Ref(model.ReferenceContext), "'Reference'", "'Vertex'", Bars.Refs(v));
            shape = Bars.Ref(model.Add("IFCPRODUCTDEFINITIONSHAPE", "$", "$", Bars.Refs(representation)));
        }

        return Add(model, "IFCSTRUCTURALPOINTACTION", member, group, load, shape, flag, model.Schema == Release.Ifc2X3 ? [".F.", "$"] : ["$"]);
    }

    private static int Add(ModelWriter model, string keyword, int member, int group, int load, string shape, string flag, params string[] own)
    {
        var key = FormattableString.Invariant($"{keyword} {member} {group} {load}");
        var action = model.Rooted(keyword, key, null, ["$", "$", shape, Bars.Ref(load), flag, .. own]);
        model.Rooted("IFCRELCONNECTSSTRUCTURALACTIVITY", key, null, Bars.Ref(member), Bars.Ref(action));
        model.Rooted("IFCRELASSIGNSTOGROUP", key, null, Bars.Refs(action), "$", Bars.Ref(group));
        return action;
    }
}
