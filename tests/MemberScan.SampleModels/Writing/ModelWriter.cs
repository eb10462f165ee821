using System.Globalization;
using System.Text;
using MemberScan.Foundation.Geometry;
using MemberScan.SampleModels.Units;

namespace MemberScan.SampleModels.Writing;

/// <summary>Writes one IFC model: hands out instance numbers, keeps project, units, storey and elements, gives the bytes at the end.</summary>
/// <remarks>
/// Dimensions and forces come in SI and are written in the file's units. The same calls give the same bytes: instance numbers rise in calling
/// order, GlobalIds follow from names, the time stamp is a constant. Positions of parameters follow the three published EXPRESS schemas.
/// </remarks>
public sealed class ModelWriter
{
    /// <summary>Time stamp of every written file.</summary>
    public const string TimeStamp = "2026-01-15T08:00:00";

    private const long CreationSeconds = 1768464000;

    private readonly StringBuilder _data = new();
    private readonly Dictionary<string, int> _shared = new(StringComparer.Ordinal);
    private readonly HashSet<string> _globalIds = new(StringComparer.Ordinal);
    private readonly List<int> _contained = [];
    private readonly List<AnalysisWriter> _analyses = [];
    private readonly string _name;
    private readonly int? _owner;
    private readonly int _storey;
    private int _lastId;

    /// <summary>A model with project, units, contexts, site, building and storey.</summary>
    /// <param name="schema">Schema release.</param>
    /// <param name="units">Units of the file.</param>
    /// <param name="name">File name without extension; GlobalIds follow from it.</param>
    /// <param name="unitTypesLeftOut">Unit types missing from the unit assignment, such as <c>TORQUEUNIT</c>.</param>
    public ModelWriter(SchemaVersion schema, ModelUnits units, string name, params string[] unitTypesLeftOut)
    {
        (Schema, Units, _name) = (schema, units, name);
        _owner = schema == SchemaVersion.Ifc2X3 ? OwnerHistory() : null;

        var origin = AxisPlacement(Transform3.Identity);
        var context = Add("IFCGEOMETRICREPRESENTATIONCONTEXT", Spelling.Unset, Spelling.Text("Model"), "3", units.LengthText(1e-6), Spelling.Reference(origin), Spelling.Unset);
        BodyContext = SubContext("Body", "MODEL_VIEW", context);
        ReferenceContext = SubContext("Reference", "GRAPH_VIEW", context);
        var assignment = new UnitWriter(this).Assign(unitTypesLeftOut);
        Project = Rooted("IFCPROJECT", "project", "Cable-ferry landing", Spelling.Unset, Spelling.Unset, Spelling.Unset,
            Spelling.References([context]), Spelling.Reference(assignment));

        var site = Spatial("IFCSITE", "Landing", null, Spelling.Unset, Spelling.Unset, Spelling.Unset, Spelling.Unset, Spelling.Unset);
        var building = Spatial("IFCBUILDING", "Ferry landing", site, Spelling.Unset, Spelling.Unset, Spelling.Unset);
        _storey = Spatial("IFCBUILDINGSTOREY", "Gangway level", building, units.LengthText(0));

        Profiles = new ProfileWriter(this);
        Materials = new MaterialWriter(this);
        Bodies = new BodyWriter(this);
        Outlines = new OutlineWriter(this);
    }

    /// <summary>Schema release.</summary>
    public SchemaVersion Schema { get; }

    /// <summary>Units of the file.</summary>
    public ModelUnits Units { get; }

    /// <summary>Instance number of the project.</summary>
    public int Project { get; }

    /// <summary>Instance number of the subcontext of bodies.</summary>
    public int BodyContext { get; }

    /// <summary>Instance number of the subcontext of analytical topology.</summary>
    public int ReferenceContext { get; }

    /// <summary>Writes profiles.</summary>
    public ProfileWriter Profiles { get; }

    /// <summary>Writes materials and profile sets.</summary>
    public MaterialWriter Materials { get; }

    /// <summary>Writes solids, mapped items and shapes.</summary>
    public BodyWriter Bodies { get; }

    /// <summary>Writes drawn and derived profiles.</summary>
    public OutlineWriter Outlines { get; }

    /// <summary>Adds an instance with its parameters already spelled; gives its number.</summary>
    public int Add(string keyword, params ReadOnlySpan<string> parameters)
    {
        var id = ++_lastId;
        _data.Append(CultureInfo.InvariantCulture, $"#{id}={keyword}(").AppendJoin(',', parameters).Append(");\n");
        return id;
    }

    /// <summary>Adds an instance unless the same text was added before; gives the number of the one that stands.</summary>
    public int AddOnce(string keyword, params ReadOnlySpan<string> parameters)
    {
        var text = keyword + "(" + string.Join(',', parameters) + ")";
        return _shared.TryGetValue(text, out var id) ? id : _shared[text] = Add(keyword, parameters);
    }

    /// <summary>Adds an instance of a subtype of IfcRoot: GlobalId from the class and a key, owner history as the schema demands, name, no description, then the rest.</summary>
    public int Rooted(string keyword, string key, string? name, params ReadOnlySpan<string> rest) =>
        RootedSpelled(keyword, key, Spelling.Text(name), null, rest);

    /// <summary>The GlobalId that an instance of a class with a key has in this model.</summary>
    public string GlobalIdOf(string keyword, string key) => GlobalIds.From($"{_name}/{keyword}/{key}");

    /// <summary>A point in space [m].</summary>
    public int Point(Vector3 metres) =>
        AddOnce("IFCCARTESIANPOINT", Spelling.List([Units.LengthText(metres.X), Units.LengthText(metres.Y), Units.LengthText(metres.Z)]));

    /// <summary>A direction in space.</summary>
    public int Direction(Vector3 direction) =>
        AddOnce("IFCDIRECTION", Spelling.List([Spelling.Real(direction.X), Spelling.Real(direction.Y), Spelling.Real(direction.Z)]));

    /// <summary>A right-handed orthonormal frame as IfcAxis2Placement3D.</summary>
    public int AxisPlacement(Transform3 frame) =>
        AddOnce("IFCAXIS2PLACEMENT3D", Spelling.Reference(Point(frame.Origin)), Spelling.Reference(Direction(frame.Z)), Spelling.Reference(Direction(frame.X)));

    /// <summary>A local placement, relative to another one or to the project's axes.</summary>
    public int LocalPlacement(Transform3 frame, int? relativeTo = null) =>
        Add("IFCLOCALPLACEMENT", Spelling.Reference(relativeTo), Spelling.Reference(AxisPlacement(frame)));

    /// <summary>An element of any class, such as <c>IFCMEMBER</c>.</summary>
    public int Element(string keyword, string name, int? placement, int? shape, ElementOptions? options = null)
    {
        var given = options ?? ElementOptions.None;
        var own = ElementClasses.OwnParameters(keyword, Schema, given.PredefinedType);
        string[] rest = [Spelling.Text(given.ObjectType), Spelling.Reference(placement), Spelling.Reference(shape), Spelling.Text(given.Tag), .. own];
        var id = RootedSpelled(keyword, given.Key ?? name, given.NameSpelling ?? Spelling.Text(name), given.Description, rest);
        if (given.IsContained) _contained.Add(id);
        return id;
    }

    /// <summary>Makes elements parts of a whole.</summary>
    public int Aggregate(int whole, params IEnumerable<int> parts) =>
        Rooted("IFCRELAGGREGATES", "aggregate " + whole.ToString(CultureInfo.InvariantCulture), null, Spelling.Reference(whole), Spelling.References(parts));

    /// <summary>A property set on elements; each property with its value spelled with its measure type.</summary>
    public int PropertySet(string setName, IEnumerable<int> elements, params (string Name, string Value)[] properties)
    {
        int[] owners = [.. elements];
        var key = string.Create(CultureInfo.InvariantCulture, $"{setName} of {owners[0]}");
        var values = properties.Select(p => Property(p.Name, p.Value)).ToArray();
        var set = Rooted("IFCPROPERTYSET", key, setName, Spelling.References(values));
        return Rooted("IFCRELDEFINESBYPROPERTIES", key, null, Spelling.References(owners), Spelling.Reference(set));
    }

    /// <summary>A single-valued property without a unit of its own.</summary>
    public int Property(string name, string typedValue) =>
        Add("IFCPROPERTYSINGLEVALUE", Spelling.Text(name), Spelling.Unset, typedValue, Spelling.Unset);

    /// <summary>A type object with its occurrences; a representation map gives them their common body.</summary>
    public int TypeObject(string keyword, string name, string predefinedType, int? representationMap, IEnumerable<int> occurrences)
    {
        var maps = representationMap is { } map ? Spelling.References([map]) : Spelling.Unset;
        var type = Rooted(keyword, name, name, Spelling.Unset, Spelling.Unset, maps, Spelling.Unset, Spelling.Unset, Spelling.Literal(predefinedType));
        Rooted("IFCRELDEFINESBYTYPE", name, null, Spelling.References(occurrences), Spelling.Reference(type));
        return type;
    }

    /// <summary>Gives elements or type objects a material, a profile set or a usage of one.</summary>
    public int Associate(int material, params IEnumerable<int> objects)
    {
        int[] owners = [.. objects];
        var key = string.Create(CultureInfo.InvariantCulture, $"material of {owners[0]}");
        return Rooted("IFCRELASSOCIATESMATERIAL", key, null, Spelling.References(owners), Spelling.Reference(material));
    }

    /// <summary>Starts an analysis model.</summary>
    /// <param name="name">Its name.</param>
    /// <param name="sharedFrame">The placement that all its items share; their coordinates are in it.</param>
    public AnalysisWriter StartAnalysis(string name, Transform3 sharedFrame)
    {
        var analysis = new AnalysisWriter(this, name, sharedFrame);
        _analyses.Add(analysis);
        return analysis;
    }

    /// <summary>Finishes the model and gives its bytes: ASCII, LF line ends.</summary>
    public byte[] Build()
    {
        foreach (var analysis in _analyses) analysis.Finish();
        _analyses.Clear();
        if (_contained.Count > 0)
        {
            Rooted("IFCRELCONTAINEDINSPATIALSTRUCTURE", "storey", null, Spelling.References(_contained), Spelling.Reference(_storey));
            _contained.Clear();
        }

        var schema = Schema switch { SchemaVersion.Ifc2X3 => "IFC2X3", SchemaVersion.Ifc4 => "IFC4", _ => "IFC4X3_ADD2" };
        var header = "ISO-10303-21;\nHEADER;\n"
            + "FILE_DESCRIPTION(('ViewDefinition [NotAssigned]'),'2;1');\n"
            + $"FILE_NAME({Spelling.Text(_name + ".ifc")},'{TimeStamp}',(''),('MemberScan'),'MemberScan sample models','MemberScan sample models','');\n"
            + $"FILE_SCHEMA(('{schema}'));\nENDSEC;\nDATA;\n";
        return Encoding.ASCII.GetBytes(header + _data + "ENDSEC;\nEND-ISO-10303-21;\n");
    }

    private int RootedSpelled(string keyword, string key, string nameSpelling, string? description, ReadOnlySpan<string> rest)
    {
        var globalId = GlobalIdOf(keyword, key);
        if (!_globalIds.Add(globalId)) throw new ArgumentException($"{keyword} '{key}' stands in the model already.", nameof(key));

        return Add(keyword, [Spelling.Text(globalId), Spelling.Reference(_owner), nameSpelling, Spelling.Text(description), .. rest]);
    }

    private int Spatial(string keyword, string name, int? parent, params ReadOnlySpan<string> own)
    {
        var placement = LocalPlacement(Transform3.Identity);
        var id = Rooted(keyword, name, name, [Spelling.Unset, Spelling.Reference(placement), Spelling.Unset, Spelling.Unset, Spelling.Literal("ELEMENT"), .. own]);
        Aggregate(parent ?? Project, id);
        return id;
    }

    private int SubContext(string identifier, string view, int parent) =>
        Add("IFCGEOMETRICREPRESENTATIONSUBCONTEXT", Spelling.Text(identifier), Spelling.Text("Model"), Spelling.Derived, Spelling.Derived, Spelling.Derived,
            Spelling.Derived, Spelling.Reference(parent), Spelling.Unset, Spelling.Literal(view), Spelling.Unset);

    private int OwnerHistory()
    {
        var person = Add("IFCPERSON", Spelling.Unset, Spelling.Text("Landing office"), Spelling.Unset, Spelling.Unset, Spelling.Unset, Spelling.Unset, Spelling.Unset, Spelling.Unset);
        var office = Add("IFCORGANIZATION", Spelling.Unset, Spelling.Text("Landing office"), Spelling.Unset, Spelling.Unset, Spelling.Unset);
        var both = Add("IFCPERSONANDORGANIZATION", Spelling.Reference(person), Spelling.Reference(office), Spelling.Unset);
        var application = Add("IFCAPPLICATION", Spelling.Reference(office), Spelling.Text("1"), Spelling.Text("MemberScan sample models"), Spelling.Text("MemberScan"));
        return Add("IFCOWNERHISTORY", Spelling.Reference(both), Spelling.Reference(application), Spelling.Unset, Spelling.Literal("ADDED"), Spelling.Unset,
            Spelling.Unset, Spelling.Unset, Spelling.Integer(CreationSeconds));
    }
}
