using System.Globalization;
using System.Text;
using MemberScan.Foundation.Diagnostics;
using MemberScan.Foundation.Geometry;
using MemberScan.Ifc;
using MemberScan.Mechanics.Forces;
using MemberScan.Mechanics.Sections;
using MemberScan.Model.Rules;
using MemberScan.Part21;
using MemberScan.SampleModels.Scenario;
using MemberScan.SampleModels.Writing;
using MemberScan.Screening.Record;

namespace MemberScan.Screening.Tests.Sources;

/// <summary>The forces of the samples written as a table, as property sets and as results in the model: the same verdicts from each.</summary>
public sealed class RoundTripTests
{
    private const string Mapping = """
        {"forces": {"propertySets": [
         {"set": "Service *", "kind": "service", "stations": "list", "station": {"property": "Station", "unit": "m"}, "components": COMPONENTS},
         {"set": "Design *", "kind": "design", "stations": "list", "station": {"property": "Station", "unit": "m"}, "components": COMPONENTS}]}}
        """;

    private const string Components = """
        {"N": {"property": "N", "unit": "N"}, "Vy": {"property": "Vy", "unit": "N"}, "Vz": {"property": "Vz", "unit": "N"},
         "T": {"property": "T", "unit": "N·m"}, "My": {"property": "My", "unit": "N·m"}, "Mz": {"property": "Mz", "unit": "N·m"}}
        """;

    public static TheoryData<string> Names => [GangwayRails.Name, DeckHangers.Name, MastStays.Name];

    [Theory]
    [MemberData(nameof(Names))]
    public void Table_property_sets_and_results_give_the_same_verdicts(string name)
    {
        var sample = SampleModel.All().Single(s => s.Name == name);
        // What was there as results is cut off its members.
        var bare = string.Join('\n', Encoding.Latin1.GetString([.. sample.Model]).Split('\n').Where(l => !l.Contains("IFCRELCONNECTSSTRUCTURALACTIVITY", StringComparison.Ordinal)));
        var listed = Landing.Screen(Encoding.Latin1.GetBytes(bare)).Members.ToDictionary(m => m.Key);
        var members = sample.Members.Where(m => !m.Situations.IsEmpty && listed[m.Key].ItemNumber == 0).ToList();
        Assert.NotEmpty(members);

        var table = Landing.Screen(Encoding.Latin1.GetBytes(bare), Table(members));
        var sets = Landing.Screen(Append(bare, id => PropertySets(members, listed, id)), settings: Mapping.Replace("COMPONENTS", Components, StringComparison.Ordinal));
        var results = Landing.Screen(Append(bare, id => Results(members, listed, bare, id)));

        Assert.All(members, m => AssertSame(Of(table, m), Of(sets, m)));
        Assert.All(members, m => AssertSame(Of(table, m), Of(results, m)));
        Assert.Contains(members, m => Of(table, m).Governing is not null);
    }

    /// <summary>W = 40·80²/6 = 42,667 mm³ of a rectangle 40 mm along profile X and 80 mm along profile Y; 1 kNm about y gives 23.4375 MPa.</summary>
    [Theory]
    [InlineData(SchemaVersion.Ifc2X3)]
    [InlineData(SchemaVersion.Ifc4)]
    [InlineData(SchemaVersion.Ifc4X3)]
    public void Bending_about_y_stresses_a_rectangle_over_its_height_along_profile_Y(SchemaVersion schema)
    {
        var writer = Landing.Writer(schema);
        var post = Landing.Add(writer, Landing.Shape(writer, new Rectangle(0.040, 0.080), 1));
        var analysis = writer.StartAnalysis("Landing analysis", Transform3.Identity);
        // Profile Y is the project's y; without an Axis (IFC2X3) z of an upright member is the project's x, so y there is −(profile Y).
        var line = analysis.CurveMember("A P-1", Vector3.Zero, Vector3.UnitZ, Vector3.UnitY);
        analysis.Link(post, line);
        var group = analysis.ResultGroup("R", analysis.LoadCombination("C1", "SLS", (analysis.LoadCase("G"), 1)));
        var forces = schema == SchemaVersion.Ifc2X3 ? new SectionForces(0, 0, 0, 0, 0, 1000) : new SectionForces(0, 0, 0, 0, 1000, 0);
        foreach (var place in new[] { Vector3.Zero, Vector3.UnitZ }) analysis.PointReaction(line, group, forces, place);

        var member = Landing.ScreenOne(writer.Build());

        Assert.Equal(23.4375e6, member.Governing!.Stress, 1e-6 * 23.4375e6);
    }

    private static MemberResult Of(ScreeningRecord record, SampleMember member) => record.Members.Single(m => m.Key == member.Key);

    private static void AssertSame(MemberResult expected, MemberResult actual)
    {
        Assert.Equal((expected.Key, expected.Verdict, expected.Reason?.Code), (actual.Key, actual.Verdict, actual.Reason?.Code));
        Assert.Equal(expected.Governing is null, actual.Governing is null);
        if (expected.Governing is not { } governing) return;

        Assert.Equal(governing.Utilization, actual.Governing!.Utilization, 1e-9 * governing.Utilization);
        Assert.Equal(expected.Situations.Select(s => s.Situation).Order(), actual.Situations.Select(s => s.Situation).Order());
    }

    private static string Table(IEnumerable<SampleMember> members)
    {
        var text = new StringBuilder("member,situation,kind,station[m],N[N],Vy[N],Vz[N],T[Nm],My[Nm],Mz[Nm]\n");
        foreach (var member in members)
            foreach (var situation in member.Situations)
                foreach (var (x, f) in situation.Stations)
                    text.Append(CultureInfo.InvariantCulture, $"\"{member.Key}\",\"{situation.Name}\",{situation.Kind},{x:R},{f.N:R},{f.Vy:R},{f.Vz:R},{f.T:R},{f.My:R},{f.Mz:R}\n");
        return text.ToString();
    }

    private static IEnumerable<string> PropertySets(IEnumerable<SampleMember> members, Dictionary<string, MemberResult> listed, Func<long> id)
    {
        foreach (var member in members)
            foreach (var situation in member.Situations)
            {
                var columns = new (string Name, Func<ForceStation, double> Of)[]
                {
                    ("Station", s => s.X), ("N", s => s.Forces.N), ("Vy", s => s.Forces.Vy), ("Vz", s => s.Forces.Vz), ("T", s => s.Forces.T), ("My", s => s.Forces.My), ("Mz", s => s.Forces.Mz),
                };
                var properties = new List<long>();
                foreach (var (name, of) in columns)
                {
                    properties.Add(id());
                    yield return $"#{properties[^1]}=IFCPROPERTYLISTVALUE('{name}',$,({string.Join(',', situation.Stations.Select(s => $"IFCREAL({Real(of(s))})"))}),$);";
                }

                var (set, relation) = (id(), id());
                yield return $"#{set}=IFCPROPERTYSET('{Guid(set)}',$,'{(situation.IsService ? "Service" : "Design")} {situation.Name}',$,({string.Join(',', properties.Select(p => $"#{p}"))}));";
                yield return $"#{relation}=IFCRELDEFINESBYPROPERTIES('{Guid(relation)}',$,$,$,(#{listed[member.Key].StepId}),#{set});";
            }
    }

    // Point reactions in global axes: they exist in every schema, and the project's axes are global where there is no placement.
    private static IEnumerable<string> Results(List<SampleMember> members, Dictionary<string, MemberResult> listed, string bare, Func<long> id)
    {
        var isOld = bare.Contains("'IFC2X3'", StringComparison.Ordinal);
        var units = IfcModel.Open(Part21File.Read(Encoding.Latin1.GetBytes(bare), "x.ifc", new DiagnosticList()), new ReadingRules(), new DiagnosticList())!.Units;
        var groups = new Dictionary<(string, bool), (long Group, List<long> Reactions)>();
        foreach (var situation in members.SelectMany(m => m.Situations).DistinctBy(s => (s.Name, s.IsService)))
        {
            var (loads, group) = (id(), id());
            groups[(situation.Name, situation.IsService)] = (group, []);
            yield return $"#{loads}=IFCSTRUCTURALLOADGROUP('{Guid(loads)}',$,'{situation.Name}',$,$,.LOAD_COMBINATION.,.NOTDEFINED.,.NOTDEFINED.,1.,'{(situation.IsService ? "SLS" : "ULS")}');";
            yield return $"#{group}=IFCSTRUCTURALRESULTGROUP('{Guid(group)}',$,$,$,$,.FIRST_ORDER_THEORY.,#{loads},.T.);";
        }

        foreach (var member in members)
        {
            string Point(Vector3 p) => $"({Real(p.X / units.Length!.Value)},{Real(p.Y / units.Length.Value)},{Real(p.Z / units.Length.Value)})";
            var line = (long)listed[member.Key].StepId;
            if (!listed[member.Key].Class.StartsWith("IfcStructural", StringComparison.Ordinal))
            {
                long[] n = [.. Enumerable.Range(0, 9).Select(_ => id())];
                line = id();
                var link = id();
                yield return $"#{n[0]}=IFCCARTESIANPOINT({Point(member.Axes.Origin)});";
                yield return $"#{n[1]}=IFCCARTESIANPOINT({Point(member.Axes.Origin + member.Length * member.Axes.X)});";
                yield return $"#{n[2]}=IFCVERTEXPOINT(#{n[0]});";
                yield return $"#{n[3]}=IFCVERTEXPOINT(#{n[1]});";
                yield return $"#{n[4]}=IFCEDGE(#{n[2]},#{n[3]});";
                yield return $"#{n[5]}=IFCTOPOLOGYREPRESENTATION($,'Reference','Edge',(#{n[4]}));";
                yield return $"#{n[6]}=IFCPRODUCTDEFINITIONSHAPE($,$,(#{n[5]}));";
                yield return $"#{n[7]}=IFCDIRECTION(({Real(member.Axes.Z.X)},{Real(member.Axes.Z.Y)},{Real(member.Axes.Z.Z)}));";
                yield return $"#{line}=IFCSTRUCTURALCURVEMEMBER('{Guid(line)}',$,'L',$,$,$,#{n[6]},.RIGID_JOINED_MEMBER.{(isOld ? "" : $",#{n[7]}")});";
                yield return $"#{link}=IFCRELCONNECTSSTRUCTURALELEMENT('{Guid(link)}',$,$,$,#{listed[member.Key].StepId},#{line});";
            }

            foreach (var situation in member.Situations)
                foreach (var (x, f) in situation.Stations)
                {
                    var (force, moment) = (f.N * member.Axes.X + f.Vy * member.Axes.Y + f.Vz * member.Axes.Z, f.T * member.Axes.X + f.My * member.Axes.Y + f.Mz * member.Axes.Z);
                    var (u, v) = (units.Force!.Value, units.Torque!.Value);
                    long[] n = [.. Enumerable.Range(0, 7).Select(_ => id())];
                    yield return $"#{n[0]}=IFCCARTESIANPOINT({Point(member.Axes.Origin + x * member.Axes.X)});";
                    yield return $"#{n[1]}=IFCVERTEXPOINT(#{n[0]});";
                    yield return $"#{n[2]}=IFCTOPOLOGYREPRESENTATION($,'Reference','Vertex',(#{n[1]}));";
                    yield return $"#{n[3]}=IFCPRODUCTDEFINITIONSHAPE($,$,(#{n[2]}));";
                    yield return $"#{n[4]}=IFCSTRUCTURALLOADSINGLEFORCE($,{Real(force.X / u)},{Real(force.Y / u)},{Real(force.Z / u)},{Real(moment.X / v)},{Real(moment.Y / v)},{Real(moment.Z / v)});";
                    yield return $"#{n[5]}=IFCSTRUCTURALPOINTREACTION('{Guid(n[5])}',$,$,$,$,$,#{n[3]},#{n[4]},.GLOBAL_COORDS.);";
                    yield return $"#{n[6]}=IFCRELCONNECTSSTRUCTURALACTIVITY('{Guid(n[6])}',$,$,$,#{line},#{n[5]});";
                    groups[(situation.Name, situation.IsService)].Reactions.Add(n[5]);
                }
        }

        foreach (var (group, reactions) in groups.Values)
        {
            var relation = id();
            yield return $"#{relation}=IFCRELASSIGNSTOGROUP('{Guid(relation)}',$,$,$,({string.Join(',', reactions.Select(r => $"#{r}"))}),$,#{group});";
        }
    }

    private static byte[] Append(string text, Func<Func<long>, IEnumerable<string>> write)
    {
        var next = 1_000_000L;
        var end = text.LastIndexOf("ENDSEC;", StringComparison.Ordinal);
        return Encoding.Latin1.GetBytes(text[..end] + string.Join('\n', write(() => next++)) + "\n" + text[end..]);
    }

    private static string Real(double value) => value.ToString("E16", CultureInfo.InvariantCulture);

    private static string Guid(long id) => id.ToString("D22", CultureInfo.InvariantCulture);
}
