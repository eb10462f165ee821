using System.Collections.Immutable;
using System.Globalization;
using MemberScan.Ifc.Schema;
using MemberScan.Ifc.Units;
using MemberScan.Part21;

namespace MemberScan.Ifc.WriteBack;

/// <summary>Instances that hang one property set on each element: its properties, the set, a relation of its own.</summary>
public sealed class PropertySetWriter
{
    /// <summary>Longest text of an IfcLabel (STRING(255) since IFC4); a longer one is cut and ends in an ellipsis.</summary>
    public const int MaxLabel = 255;

    private readonly SchemaVersion _schema;
    private readonly List<string> _lines = [];
    private readonly (double Factor, string Override) _pressure, _length;
    private readonly string _owner;
    private readonly List<ulong> _sets = [];
    private ulong _next;

    private PropertySetWriter(SchemaVersion schema, ModelUnits units, ulong highestId, long creationDate, string version, List<StressCheckSet> sets)
    {
        (_schema, _next) = (schema, highestId);
        _owner = schema == SchemaVersion.Ifc2x3 ? Owner(creationDate, version) : "$";

        // Units of our own only where a value will name them: nothing must stand in the model that nothing refers to.
        var hasStress = sets.Exists(s => (s.StressLimit ?? s.EquivalentStress ?? s.NormalStress ?? s.ShearStress) is not null);
        var hasLength = sets.Exists(s => (s.Station ?? s.PointY ?? s.PointZ) is not null);
        _pressure = units.NamedByModel("PRESSUREUNIT")
            ? (units.Pressure!.Value, "$")
            : (1e6, hasStress ? Ref(Add("IFCSIUNIT(*,.PRESSUREUNIT.,.MEGA.,.PASCAL.)")) : "$");
        _length = units.NamedByModel("LENGTHUNIT")
            ? (units.Length!.Value, "$")
            : (1, hasLength ? Ref(Add("IFCSIUNIT(*,.LENGTHUNIT.,$,.METRE.)")) : "$");
    }

    /// <summary>The lines for all sets, in the order given; the same input gives the same lines.</summary>
    /// <param name="model">The model that they are for.</param>
    /// <param name="sets">One per element.</param>
    /// <param name="creationDate">Seconds since 1970 for the owner history that IFC2X3 demands.</param>
    /// <param name="version">Version of the program.</param>
    /// <param name="withTemplate">Whether a template that explains the set goes with them; IFC2X3 knows none, and none is written there.</param>
    public static ImmutableArray<string> Lines(IfcModel model, IEnumerable<StressCheckSet> sets, long creationDate, string version, bool withTemplate = false)
    {
        ArgumentNullException.ThrowIfNull(model);
        ArgumentNullException.ThrowIfNull(sets);
        var all = sets.ToList();
        if (all.Count == 0) return [];

        var writer = new PropertySetWriter(model.Schema, model.Units, model.File.HighestId, creationDate, version, all);
        foreach (var set in all) writer.Write(set);
        if (withTemplate && model.Schema != SchemaVersion.Ifc2x3) writer.WriteTemplate(model.File.RecordsOf("IFCPROJECT").Select(p => p.Id).FirstOrDefault());
        return [.. writer._lines];
    }

    private void Write(StressCheckSet set)
    {
        var properties = new List<ulong>();
        Label("Status", set.Status);
        Text("Reason", set.Reason);
        Number("Utilization", "IFCRATIOMEASURE", set.Utilization, (1, "$"));
        Label("Criterion", set.Criterion);
        Number("StressLimit", "IFCPRESSUREMEASURE", set.StressLimit, _pressure);
        Number("EquivalentStress", "IFCPRESSUREMEASURE", set.EquivalentStress, _pressure);
        Number("NormalStress", "IFCPRESSUREMEASURE", set.NormalStress, _pressure);
        Number("ShearStress", "IFCPRESSUREMEASURE", set.ShearStress, _pressure);
        Label("EquivalentStressText", set.EquivalentStressText);
        Label("Situation", set.Situation);
        Number("Station", "IFCLENGTHMEASURE", set.Station, _length);
        Number("PointY", "IFCLENGTHMEASURE", set.PointY, _length);
        Number("PointZ", "IFCLENGTHMEASURE", set.PointZ, _length);
        Label("PointName", set.PointName);
        Label("ForcesSource", set.ForcesSource);
        Label("SectionSource", set.SectionSource);
        Label("ShearModel", set.ShearModel);
        Label("Item", set.Item);
        if (set.ItemCount is { } count) Single("ItemCount", string.Create(CultureInfo.InvariantCulture, $"IFCINTEGER({count})"), "$");
        Single("RunId", $"IFCIDENTIFIER({Part21Text.String(set.RunId)})", "$");
        Label("Program", set.Program);
        Label("ReviewDecision", set.ReviewDecision);
        Text("ReviewNote", set.ReviewNote);

        var seed = $"{StressCheckSet.SetName}|{set.ElementKey}";
        var id = Add($"IFCPROPERTYSET('{GlobalIds.From(seed + "|set")}',{_owner},'{StressCheckSet.SetName}','Combined stress, screening result',({string.Join(",", properties.Select(Ref))}))");
        _sets.Add(id);
        Add($"IFCRELDEFINESBYPROPERTIES('{GlobalIds.From(seed + "|relation")}',{_owner},$,$,({Ref(set.ElementId)}),{Ref(id)})");

        void Label(string name, string? value)
        {
            if (value is not null) Single(name, $"IFCLABEL({Part21Text.String(Cut(value))})", "$");
        }

        void Text(string name, string? value)
        {
            if (value is not null) Single(name, $"IFCTEXT({Part21Text.String(value)})", "$");
        }

        void Number(string name, string measure, double? value, (double Factor, string Override) unit)
        {
            if (value is { } si) Single(name, $"{measure}({Part21Text.Real(si / unit.Factor)})", unit.Override);
        }

        void Single(string name, string value, string unit) => properties.Add(Add($"IFCPROPERTYSINGLEVALUE('{name}',$,{value},{unit})"));
    }

    // The project declares the template where there is a project; the template names its sets.
    private void WriteTemplate(ulong project)
    {
        const string Seed = StressCheckSet.SetName + "|template";
        var properties = SetTemplate.Properties
            .Select(p => Ref(Add($"IFCSIMPLEPROPERTYTEMPLATE('{GlobalIds.From($"{Seed}|{p.Name}")}',$,'{p.Name}',{Part21Text.String(p.Meaning)},.P_SINGLEVALUE.,'{p.Measure}',$,$,$,$,$,$)"))).ToList();
        var template = Ref(Add($"IFCPROPERTYSETTEMPLATE('{GlobalIds.From(Seed)}',$,'{StressCheckSet.SetName}','Combined stress, screening result',.PSET_OCCURRENCEDRIVEN.,$,({string.Join(",", properties)}))"));
        Add($"IFCRELDEFINESBYTEMPLATE('{GlobalIds.From(Seed + "|sets")}',$,$,$,({string.Join(",", _sets.Select(Ref))}),{template})");
        if (project > 0) Add($"IFCRELDECLARES('{GlobalIds.From(Seed + "|declares")}',$,$,$,{Ref(project)},({template}))");
    }

    /// <summary>An ownership chain of our own: the schema demands one, and the original author did not write these results.</summary>
    private string Owner(long creationDate, string version)
    {
        var person = Add("IFCPERSON($,'MemberScan',$,$,$,$,$,$)");
        var organization = Add("IFCORGANIZATION($,'MemberScan',$,$,$)");
        var both = Add($"IFCPERSONANDORGANIZATION({Ref(person)},{Ref(organization)},$)");
        var application = Add($"IFCAPPLICATION({Ref(organization)},{Part21Text.String(version)},'MemberScan','MemberScan')");
        return Ref(Add(string.Create(CultureInfo.InvariantCulture, $"IFCOWNERHISTORY({Ref(both)},{Ref(application)},$,.ADDED.,$,$,$,{creationDate})")));
    }

    private ulong Add(string instance)
    {
        _next++;
        _lines.Add(string.Create(CultureInfo.InvariantCulture, $"#{_next}={instance};"));
        return _next;
    }

    private static string Ref(ulong id) => string.Create(CultureInfo.InvariantCulture, $"#{id}");

    private static string Cut(string text) => text.Length <= MaxLabel ? text : string.Concat(text.AsSpan(0, char.IsHighSurrogate(text[MaxLabel - 2]) ? MaxLabel - 2 : MaxLabel - 1), "…");
}
