using System.Globalization;

namespace MemberScan.Benchmarks.Models;

/// <summary>A cable-ferry landing with as much other equipment as it takes: members first and last, breps, point lists and property sets between.</summary>
public sealed class LandingModel
{
    private const int Types = 40;
    private const int SizeStep = 64;

    private readonly ModelRecipe _recipe;
    private readonly StatementWriter _writer;
    private readonly Random _random = new(20310504);
    private readonly string[] _types = new string[Types];
    private readonly string[] _maps = new string[Types];
    private readonly List<string>[] _occurrences = [.. Enumerable.Range(0, Types).Select(_ => new List<string>())];
    private string _owner = "", _context = "", _placement = "", _style = "";
    private int _guid;

    private LandingModel(ModelRecipe recipe, Stream output) => (_recipe, _writer) = (recipe, new StatementWriter(output, recipe));

    /// <summary>Writes the model of a recipe.</summary>
    public static void Write(ModelRecipe recipe, Stream output)
    {
        ArgumentNullException.ThrowIfNull(recipe);
        ArgumentNullException.ThrowIfNull(output);
        new LandingModel(recipe, output).Write();
    }

    private void Write()
    {
        var schema = _recipe.Ifc2x3 ? "IFC2X3" : "IFC4";
        _writer.Raw($"ISO-10303-21;\nHEADER;\nFILE_DESCRIPTION(('ViewDefinition [CoordinationView]'),'2;1');\nFILE_NAME('landing.ifc','2031-05-04T08:00:00',(''),(''),'','','');\nFILE_SCHEMA(('{schema}'));\nENDSEC;\nDATA;\n");
        Project();
        for (var i = 0; i < Types; i++) Type(i);

        // Members stand in groups all over the payload, as they do where a model is put together from trades.
        var written = 0;
        var perMember = _recipe.Bytes / Math.Max(1, _recipe.Members);
        while (written < _recipe.Members || _writer.Length < _recipe.Bytes)
        {
            for (var i = 0; i < SizeStep && written < _recipe.Members; i++) Member(written++);
            while (_writer.Length < Math.Min(_recipe.Bytes, written < _recipe.Members ? written * perMember : _recipe.Bytes)) Equipment();
        }

        for (var i = 0; i < Types; i++)
            if (_occurrences[i].Count > 0)
                _writer.Add("IFCRELDEFINESBYTYPE", Guid(), _owner, "$", "$", List(_occurrences[i]), _types[i]);
        _writer.Raw("ENDSEC;\nEND-ISO-10303-21;\n");
    }

    private void Project()
    {
        var person = _writer.Add("IFCPERSON", "$", "'Fern'", "$", "$", "$", "$", "$", "$");
        var organization = _writer.Add("IFCORGANIZATION", "$", "'Landing works'", "$", "$", "$");
        var both = _writer.Add("IFCPERSONANDORGANIZATION", person, organization, "$");
        var application = _writer.Add("IFCAPPLICATION", organization, "'1'", "'Landing'", "'landing'");
        _owner = _writer.Add("IFCOWNERHISTORY", both, application, "$", ".ADDED.", "$", "$", "$", "1935532800");
        var origin = _writer.Add("IFCCARTESIANPOINT", "(0.,0.,0.)");
        var axes = _writer.Add("IFCAXIS2PLACEMENT3D", origin, "$", "$");
        _context = _writer.Add("IFCGEOMETRICREPRESENTATIONCONTEXT", "$", "'Model'", "3", "1.E-05", axes, "$");
        var length = _writer.Add("IFCSIUNIT", "*", ".LENGTHUNIT.", ".MILLI.", ".METRE.");
        var units = _writer.Add("IFCUNITASSIGNMENT", $"({length})");
        _writer.Add("IFCPROJECT", Guid(), _owner, "'Cable-ferry landing'", "$", "$", "$", "$", $"({_context})", units);
        _placement = _writer.Add("IFCLOCALPLACEMENT", "$", axes);
        var colour = _writer.Add("IFCCOLOURRGB", "$", "0.5", "0.55", "0.6");
        var shading = _writer.Add("IFCSURFACESTYLERENDERING", colour, "0.", "$", "$", "$", "$", "$", "$", ".FLAT.");
        var style = _writer.Add("IFCSURFACESTYLE", "'Galvanised'", ".BOTH.", $"({shading})");
        _style = _writer.Add("IFCPRESENTATIONSTYLEASSIGNMENT", $"({style})");
    }

    private void Type(int i)
    {
        var size = (20 + i).ToString(CultureInfo.InvariantCulture);
        var profile = (i % 4) switch
        {
            0 => _writer.Add("IFCCIRCLEHOLLOWPROFILEDEF", ".AREA.", $"'Tube {size}'", "$", size + ".15", "3.2"),
            1 => _writer.Add("IFCRECTANGLEHOLLOWPROFILEDEF", ".AREA.", $"'Box {size}'", "$", size + ".", "60.", "4.", "4.", "6."),
            2 => _writer.Add("IFCCIRCLEPROFILEDEF", ".AREA.", $"'Rod {size}'", "$", size + ".5"),
            _ => _writer.Add("IFCRECTANGLEPROFILEDEF", ".AREA.", @"'Flachstahl \X2\00D7\X0\ " + size + "'", "$", size + ".", "8."),
        };
        var origin = Axes();
        var direction = _writer.Add("IFCDIRECTION", "(0.,0.,1.)");
        var solid = _writer.Add("IFCEXTRUDEDAREASOLID", profile, origin, direction, "1100.");
        var shape = _writer.Add("IFCSHAPEREPRESENTATION", _context, "'Body'", "'SweptSolid'", $"({solid})");
        _maps[i] = _writer.Add("IFCREPRESENTATIONMAP", origin, shape);
        var reference = _writer.Add("IFCPROPERTYSINGLEVALUE", "'Reference'", "$", $"IFCIDENTIFIER('T{size}')", "$");
        var grade = _writer.Add("IFCPROPERTYSINGLEVALUE", "'Grade'", "$", @"IFCLABEL('S355 \S\D quality')", "$");
        var set = _writer.Add("IFCPROPERTYSET", Guid(), _owner, "'Pset_MemberTypeCommon'", "$", $"({reference},{grade})");
        _types[i] = _writer.Add("IFCMEMBERTYPE", Guid(), _owner, $"'Type {size}'", "$", "$", $"({set})", $"({_maps[i]})", "$", "$", ".POST.");
    }

    private void Member(int i)
    {
        var type = i % Types;
        var number = i.ToString(CultureInfo.InvariantCulture);
        var target = _writer.Add("IFCCARTESIANTRANSFORMATIONOPERATOR3D", "$", "$", _writer.Add("IFCCARTESIANPOINT", "(0.,0.,0.)"), "1.", "$");
        var mapped = _writer.Add("IFCMAPPEDITEM", _maps[type], target);
        var shape = _writer.Add("IFCSHAPEREPRESENTATION", _context, "'Body'", "'MappedRepresentation'", $"({mapped})");
        var product = _writer.Add("IFCPRODUCTDEFINITIONSHAPE", "$", "$", $"({shape})");
        var placement = _writer.Add("IFCLOCALPLACEMENT", _placement, Axes());
        string[] attributes = [Guid(), _owner, $"'Gangway rail {number}'", "$", @"'Gel\X2\00E4\X0\nder'", placement, product, $"'T-{number}'"];
        var member = _recipe.Ifc2x3 ? _writer.Add("IFCMEMBER", attributes) : _writer.Add("IFCMEMBER", [.. attributes, ".POST."]);
        _occurrences[type].Add(member);

        Set(member, "'Pset_MemberCommon'",
            ("'Reference'", $"IFCIDENTIFIER('R-{number}')"), ("'Span'", $"IFCPOSITIVELENGTHMEASURE({number}.25)"), ("'Slope'", "IFCPLANEANGLEMEASURE(0.)"),
            ("'LoadBearing'", "IFCBOOLEAN(.T.)"), ("'IsExternal'", "IFCBOOLEAN(.F.)"), ("'Status'", "IFCLABEL('New')"), ("'Roll'", "IFCPLANEANGLEMEASURE(-1.5E-03)"));
        Set(member, @"'Landing \X\E4 data'",
            ("'Zone'", "IFCLABEL('Pontoon, north; upper')"), ("'Inspector''s mark'", "IFCTEXT('ok at ''pier 2''')"), ("'Coating'", "IFCLABEL('\\X2\\00F6\\X0\\')"),
            ("'Mass'", $"IFCMASSMEASURE({number}.5)"), ("'Bolts'", "IFCINTEGER(4)"), ("'Drawing'", $"IFCLABEL('D{number}')"), ("'Path'", @"IFCLABEL('C:\\landing')"), ("'Weld'", "$"));
        Quantities(member, number);
    }

    private void Quantities(string member, string number)
    {
        string[] tail = _recipe.Ifc2x3 ? [] : ["$"];
        var length = _writer.Add("IFCQUANTITYLENGTH", ["'Length'", "$", "$", $"{number}.75", .. tail]);
        var area = _writer.Add("IFCQUANTITYAREA", ["'OuterSurfaceArea'", "$", "$", "0.25", .. tail]);
        var weight = _writer.Add("IFCQUANTITYWEIGHT", ["'NetWeight'", "$", "$", "1.25E1", .. tail]);
        var set = _writer.Add("IFCELEMENTQUANTITY", Guid(), _owner, "'Qto_MemberBaseQuantities'", "$", "$", $"({length},{area},{weight})");
        _writer.Add("IFCRELDEFINESBYPROPERTIES", Guid(), _owner, "$", "$", $"({member})", set);
    }

    private void Set(string element, string name, params ReadOnlySpan<(string Name, string Value)> properties)
    {
        var names = new List<string>();
        foreach (var property in properties) names.Add(_writer.Add("IFCPROPERTYSINGLEVALUE", property.Name, "$", property.Value, "$"));
        var set = _writer.Add("IFCPROPERTYSET", Guid(), _owner, name, "$", List(names));
        _writer.Add("IFCRELDEFINESBYPROPERTIES", Guid(), _owner, "$", "$", $"({element})", set);
    }

    // A piece of equipment of 40 faces with its style and one property set; every eighth as a point list (IFC4).
    private void Equipment()
    {
        string item, kind;
        if (!_recipe.Ifc2x3 && _guid % 8 == 0)
        {
            var points = _writer.Add("IFCCARTESIANPOINTLIST3D", "(" + string.Join(',', Enumerable.Range(0, 200).Select(_ => Coordinates())) + ")");
            var triangles = string.Join(',', Enumerable.Range(1, 198).Select(i => string.Create(CultureInfo.InvariantCulture, $"({i},{i + 1},{i + 2})")));
            item = _writer.Add("IFCTRIANGULATEDFACESET", points, "$", ".F.", $"({triangles})", "$");
            kind = "'Tessellation'";
        }
        else
        {
            item = Brep();
            kind = "'Brep'";
        }

        _writer.Add("IFCSTYLEDITEM", item, $"({_style})", "$");
        var shape = _writer.Add("IFCSHAPEREPRESENTATION", _context, "'Body'", kind, $"({item})");
        var product = _writer.Add("IFCPRODUCTDEFINITIONSHAPE", "$", "$", $"({shape})");
        var placement = _writer.Add("IFCLOCALPLACEMENT", _placement, Axes());
        var proxy = _writer.Add("IFCBUILDINGELEMENTPROXY", Guid(), _owner, "'Winch housing'", "$", "'Plant; winch (left)'", placement, product, "'W'", "$");
        Set(proxy, "'Plant'", ("'Maker'", "IFCLABEL('Ropeworks')"), ("'Power'", "IFCREAL(7.5)"), ("'Note'", "IFCTEXT('it''s #12=IFCWALL(x); in a text')"));
    }

    private string Brep()
    {
        var corners = new string[22];
        for (var i = 0; i < corners.Length; i++) corners[i] = _writer.Add("IFCCARTESIANPOINT", Coordinates());
        var faces = new List<string>();
        for (var i = 0; i < 40; i++)
        {
            var loop = _writer.Add("IFCPOLYLOOP", $"({corners[i % 20]},{corners[(i + 1) % 22]},{corners[(i * 7 + 2) % 22]})");
            var bound = _writer.Add("IFCFACEOUTERBOUND", loop, ".T.");
            faces.Add(_writer.Add("IFCFACE", $"({bound})"));
        }

        return _writer.Add("IFCFACETEDBREP", _writer.Add("IFCCLOSEDSHELL", List(faces)));
    }

    private string Axes() => _writer.Add("IFCAXIS2PLACEMENT3D", _writer.Add("IFCCARTESIANPOINT", Coordinates()), "$", "$");

    private string Coordinates() => string.Create(
        CultureInfo.InvariantCulture,
        $"({_random.Next(-90000, 90000)}.{_random.Next(1, 1000000):000000},{_random.Next(-90000, 90000)}.{_random.Next(1, 1000000):000000},{_random.Next(0, 9000)}.)");

    private string Guid() => string.Create(CultureInfo.InvariantCulture, $"'0Landing{++_guid:00000000000000}'");

    private static string List(IEnumerable<string> items) => $"({string.Join(',', items)})";
}
