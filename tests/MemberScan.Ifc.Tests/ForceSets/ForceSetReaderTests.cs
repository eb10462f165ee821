using System.Collections.Frozen;
using MemberScan.Ifc.ForceSets;
using MemberScan.Mechanics.Forces;
using MemberScan.Model.Forces;
using MemberScan.Model.Rules;
using MemberScan.Model.Rules.PropertySets;
using MemberScan.Model.Verdicts;

namespace MemberScan.Ifc.Tests.ForceSets;

/// <summary>Rails of 2 m whose property sets hold section forces; the file is in millimetres and newtons.</summary>
public sealed class ForceSetReaderTests
{
    private static readonly PropertySetMapping s_constant = new()
    {
        Set = "Forces *",
        Stations = StationSource.Constant,
        Components = [new(ForceComponent.N, "Axial*", 1000, "kN"), new(ForceComponent.My, "Bending", 1000, "kN·m")],
    };

    private static readonly PropertySetMapping s_list = s_constant with { Stations = StationSource.List, StationProperty = "Place", StationFactor = 1 };

    [Theory]
    [MemberData(nameof(Schemas.All), MemberType = typeof(Schemas))]
    public void Single_values_hold_along_the_member_and_the_set_names_the_situation(Release release)
    {
        var reading = Read(release, s_constant, set: "forces SLS 1", ("Axial force", Single("IFCREAL(-8.)")), ("Bending", Single("IFCREAL(0.9)")), ("Colour", Single("IFCLABEL('red')")));

        var forces = Assert.Single(reading);
        Assert.Equal(("SLS 1", true), (forces.Situation.Name, forces.Situation.ActsInFull));
        Assert.StartsWith("property set 'forces SLS 1' #", forces.Source, StringComparison.Ordinal);
        Assert.Equal([0, 2], forces.Stations.Select(s => s.X));
        Assert.All(forces.Stations, s => Near.Forces(new SectionForces(-8000, 0, 0, 0, 900, 0), s.Forces));
        Assert.EndsWith("components left out count as zero: Vy, Vz, T, Mz", forces.Conversion, StringComparison.Ordinal);
    }

    [Theory]
    [InlineData("IFCFORCEMEASURE(-8.)", -8)]
    [InlineData("IFCREAL(-8.)", -8000)]
    [InlineData("IFCINTEGER(-8)", -8000)]
    public void A_measure_has_the_unit_of_the_model_and_a_bare_number_that_of_the_mapping(string value, double expected)
    {
        var forces = Assert.Single(Read(Release.Ifc4, s_constant, "Forces A", ("Axial", Single(value)), ("Bending", Single("IFCREAL(0.)"))));

        Reading.AssertNear(expected, forces.Stations[0].Forces.N);
    }

    [Fact]
    public void A_unit_of_the_property_itself_counts_before_all_others()
    {
        var forces = Assert.Single(Read(Release.Ifc4, s_constant, "Forces A", model => model.Add("IFCSIUNIT", "*", ".FORCEUNIT.", ".MEGA.", ".NEWTON."),
            ("Axial", unit => $"IFCPROPERTYSINGLEVALUE('Axial',$,IFCFORCEMEASURE(-8.),{unit})"), ("Bending", _ => Single("IFCREAL(0.)")("Bending"))));

        Reading.AssertNear(-8e6, forces.Stations[0].Forces.N);
    }

    [Theory]
    [MemberData(nameof(Schemas.All), MemberType = typeof(Schemas))]
    public void Lists_have_a_list_of_stations_beside_them_and_two_at_one_place_are_a_jump(Release release)
    {
        var forces = Assert.Single(Read(release, s_list, "Forces A",
            ("Place", List("IFCREAL(0.)", "IFCREAL(1.)", "IFCREAL(1.)", "IFCREAL(2.)")), ("Axial", List("IFCREAL(1.)", "IFCREAL(1.)", "IFCREAL(3.)", "IFCREAL(3.)")),
            ("Bending", List("IFCREAL(0.)", "IFCREAL(4.)", "IFCREAL(4.)", "IFCREAL(0.)"))));

        Assert.Equal([(0, 1000, 0), (1, 1000, 4000), (1, 3000, 4000), (2, 3000, 0)], forces.Stations.Select(s => (s.X, s.Forces.N, s.Forces.My)));
    }

    [Theory]
    [MemberData(nameof(Schemas.Later), MemberType = typeof(Schemas))]
    public void Tables_carry_their_stations_in_their_defining_values(Release release)
    {
        var mapping = s_constant with { Stations = StationSource.Table, StationFactor = 0.01, StationIsShare = true };
        static string Table(string name, string values) =>
            $"IFCPROPERTYTABLEVALUE('{name}',$,(IFCREAL(0.),IFCREAL(25.),IFCREAL(100.)),({values}),$,$,$,$)";

        var forces = Assert.Single(Read(release, mapping, "Forces A", ("Axial", n => Table(n, "IFCREAL(1.),IFCREAL(2.),IFCREAL(3.)")), ("Bending", n => Table(n, "IFCREAL(4.),IFCREAL(5.),IFCREAL(6.)"))));

        Assert.Equal([(0, 1000, 4000), (0.5, 2000, 5000), (2, 3000, 6000)], forces.Stations.Select(s => (s.X, s.Forces.N, s.Forces.My)));
    }

    [Fact]
    public void Names_of_properties_carry_stations_as_numbers_or_words()
    {
        var mapping = s_constant with
        {
            Stations = StationSource.Name,
            StationFactor = 0.001,
            StationWords = new Dictionary<string, double> { ["start"] = 0, ["end"] = 1 }.ToFrozenDictionary(StringComparer.OrdinalIgnoreCase),
            Components = [new(ForceComponent.N, "N at {station}", 1000, "kN"), new(ForceComponent.My, "My at {station}", 1000, "kN·m")],
        };

        var forces = Assert.Single(Read(Release.Ifc4, mapping, "Forces A",
            ("N at END", Single("IFCREAL(3.)")), ("My at end", Single("IFCREAL(0.)")), ("N at 500", Single("IFCREAL(2.)")), ("My at 500", Single("IFCREAL(7.)")),
            ("N at start", Single("IFCREAL(1.)")), ("My at Start", Single("IFCREAL(0.)"))));

        Assert.Equal([(0, 1000, 0), (0.5, 2000, 7000), (2, 3000, 0)], forces.Stations.Select(s => (s.X, s.Forces.N, s.Forces.My)));
    }

    [Fact]
    public void End_forces_change_sign_at_the_start_and_kinds_and_cases_follow_the_mapping()
    {
        var mapping = s_list with { Convention = ForceConvention.EndForces, Kind = SituationKind.Design, IsLoadCase = true, IsLinear = true, Situation = "Q" };

        var forces = Assert.Single(Read(Release.Ifc4, mapping, "Forces A", ("Place", List("IFCREAL(0.)", "IFCREAL(2.)")), ("Axial", List("IFCREAL(-5.)", "IFCREAL(5.)")), ("Bending", List("IFCREAL(0.)", "IFCREAL(0.)"))));

        Assert.Equal([5000, 5000], forces.Stations.Select(s => s.Forces.N));
        Assert.Equal(("Q", SituationKind.Design, false, true), (forces.Situation.Name, forces.Situation.Kind, forces.Situation.ActsInFull, forces.Situation.IsLinear));
    }

    public static TheoryData<string, string, ReasonCode, string> Faults => new()
    {
        { "Axial", "IFCPROPERTYSINGLEVALUE('Axial',$,IFCLABEL('8 kN'),$)", ReasonCode.ForcesIncomplete, "something other than a number" },
        { "Axial", "IFCPROPERTYSINGLEVALUE('Axial',$,$,$)", ReasonCode.ForcesIncomplete, "something other than a number" },
        { "Axial", "IFCPROPERTYSINGLEVALUE('Axial',$,IFCTORQUEMEASURE(8.),$)", ReasonCode.UnitMissing, "no measure of force" },
        { "Axial", "IFCPROPERTYSINGLEVALUE('Axial',$,IFCMASSMEASURE(8.),$)", ReasonCode.UnitMissing, "no measure of force" },
        { "Axial", "IFCPROPERTYLISTVALUE('Axial',$,(IFCREAL(8.)),$)", ReasonCode.ForcesIncomplete, "is no single value" },
        { "Axial", "IFCPROPERTYSINGLEVALUE('Axial',$,IFCREAL(1.E308),$)", ReasonCode.UnitMissing, "bare number or its unit is missing" },
        { "Axial other", "IFCPROPERTYSINGLEVALUE('Axial other',$,IFCREAL(8.),$)", ReasonCode.ForcesIncomplete, "several properties fit" },
    };

    [Theory]
    [MemberData(nameof(Faults))]
    public void What_cannot_be_read_says_why(string name, string property, ReasonCode code, string words)
    {
        (string, Func<string, string>)[] properties = name == "Axial"
            ? [("Axial", _ => property), ("Bending", Single("IFCREAL(1.)"))]
            : [("Axial", Single("IFCREAL(1.)")), (name, _ => property), ("Bending", Single("IFCREAL(1.)"))];

        var forces = Assert.Single(Read(Release.Ifc4, s_constant, "Forces A", properties));

        Assert.Equal(code, forces.Unusable!.Code);
        Assert.Contains(words, forces.Unusable.Message, StringComparison.Ordinal);
        Assert.StartsWith("property set 'Forces A' #", forces.Unusable.Message, StringComparison.Ordinal);
    }

    [Fact]
    public void Components_left_out_are_refused_unless_the_settings_say_that_they_are_zero()
    {
        var forces = Assert.Single(Read(Release.Ifc4, s_constant, "Forces A", missingAreZero: false, model: null, ("Axial", _ => Single("IFCREAL(1.)")("Axial"))));

        Assert.Equal(ReasonCode.ForcesIncomplete, forces.Unusable!.Code);
        Assert.Contains("no value of Vy, Vz, T, My, Mz", forces.Unusable.Message, StringComparison.Ordinal);
    }

    [Theory]
    [InlineData("IFCREAL(0.)", "IFCREAL(3.)", "a station at 3 m")]
    [InlineData("IFCREAL(0.)", null, "2 values at 1 stations")]
    public void Stations_beyond_the_end_or_of_another_number_are_refused(string first, string? second, string words)
    {
        string[] places = second is null ? [first] : [first, second];

        var forces = Assert.Single(Read(Release.Ifc4, s_list, "Forces A", ("Place", List(places)), ("Axial", List("IFCREAL(1.)", "IFCREAL(1.)"))));

        Assert.Contains(words, forces.Unusable!.Message, StringComparison.Ordinal);
    }

    [Fact]
    public void A_set_without_any_mapped_property_is_none_and_the_first_mapping_that_fits_counts()
    {
        Assert.Empty(Read(Release.Ifc4, s_constant, "Forces A", ("Colour", Single("IFCLABEL('red')"))));
        Assert.Empty(Read(Release.Ifc4, s_constant, "Common", ("Axial", Single("IFCREAL(1.)"))));
    }

    [Fact]
    public void A_proxy_with_mapped_forces_is_a_candidate()
    {
        var model = Bars.Model(Release.Ifc4);
        var proxy = model.Element("IFCBUILDINGELEMENTPROXY", "strut", model.LocalPlacement(Foundation.Geometry.Transform3.Identity), null);
        model.PropertySet("Forces A", [proxy], ("Axial", "IFCREAL(1.)"));
        var rules = new ReadingRules { Forces = new ForceRules { PropertySets = [s_constant] } };

        var diagnostics = new Foundation.Diagnostics.DiagnosticList();
        var read = IfcModel.Open(Part21.Part21File.Read(model.Build(), "landing.ifc", diagnostics), rules, diagnostics)!;

        Assert.Equal("strut", Assert.Single(read.ReadMembers(read.HasForcesInSets).Members).Element.Name);
        Assert.Empty(read.ReadMembers(_ => false).Members);
    }

    [Theory]
    [InlineData("Forces *", "forces ULS 1", true, "ULS 1", null)]
    [InlineData("N?", "N1", true, null, null)]
    [InlineData("N?", "N", false, null, null)]
    [InlineData("a.b", "axb", false, null, null)]
    [InlineData("N at {station}", "N at 0.5", true, null, "0.5")]
    [InlineData("{station} of *", "end of N", true, "N", "end")]
    public void Patterns_know_wildcards_and_the_station(string pattern, string name, bool fits, string? wildcard, string? station)
    {
        Assert.Equal(fits, new NamePattern(pattern).Fits(name, out var rest, out var place));
        Assert.Equal((wildcard, station), (rest, place));
    }

    private static Func<string, string> Single(string value) => name => $"IFCPROPERTYSINGLEVALUE('{name}',$,{value},$)";

    private static Func<string, string> List(params string[] values) => name => $"IFCPROPERTYLISTVALUE('{name}',$,({string.Join(',', values)}),$)";

    private static IReadOnlyList<MemberForces> Read(Release release, PropertySetMapping mapping, string set, params (string Name, Func<string, string> Text)[] properties) =>
        Read(release, mapping, set, missingAreZero: true, model: null, [.. properties.Select(p => (p.Name, (Func<string, string>)(_ => p.Text(p.Name))))]);

    private static IReadOnlyList<MemberForces> Read(
        Release release, PropertySetMapping mapping, string set, Func<ModelWriter, int> unit, params (string Name, Func<string, string> Text)[] properties) =>
        Read(release, mapping, set, missingAreZero: true, model: unit, properties);

    // The texts of properties are given the reference of the unit that the test has added, if any.
    private static IReadOnlyList<MemberForces> Read(
        Release release, PropertySetMapping mapping, string set, bool missingAreZero, Func<ModelWriter, int>? model, params (string Name, Func<string, string> Text)[] properties)
    {
        var writer = Bars.Model(release);
        var rail = Bars.Add(writer, "rail", Bars.Rail, 2);
        var unit = model is null ? "$" : Bars.Ref(model(writer));
        var ids = properties.Select(p =>
        {
            var text = p.Text(unit);
            var open = text.IndexOf('(', StringComparison.Ordinal);
            return writer.Add(text[..open], text[(open + 1)..^1]);
        }).ToArray();
        var written = writer.Rooted("IFCPROPERTYSET", set, set, Bars.Refs(ids));
        writer.Rooted("IFCRELDEFINESBYPROPERTIES", set, null, Bars.Refs(rail), Bars.Ref(written));
        var diagnostics = new Foundation.Diagnostics.DiagnosticList();
        var rules = new ReadingRules { Forces = new ForceRules { MissingComponentsAreZero = missingAreZero, PropertySets = [mapping] } };
        var read = IfcModel.Open(Part21.Part21File.Read(writer.Build(), "landing.ifc", diagnostics), rules, diagnostics)!;
        return read.ReadForcesInSets(read.ReadMembers(_ => false).Members);
    }
}
