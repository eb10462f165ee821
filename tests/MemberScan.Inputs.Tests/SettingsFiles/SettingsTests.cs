using System.Text;
using MemberScan.Foundation.Diagnostics;
using MemberScan.Inputs.Materials;
using MemberScan.Inputs.SettingsFiles;
using MemberScan.Model.Forces;
using MemberScan.Model.Limits;
using MemberScan.Model.Rules;

namespace MemberScan.Inputs.Tests.SettingsFiles;

public sealed class SettingsTests
{
    [Fact]
    public void The_shipped_defaults_are_those_of_the_model()
    {
        var settings = Settings.Default;
        var rules = new ReadingRules();

        Assert.Equal(Basis.Default, settings.Basis);
        Assert.Equal(CandidateRules.Default.Always, settings.Reading.Candidates.Always);
        Assert.Equal(CandidateRules.Default.WithBarBodyOrForces, settings.Reading.Candidates.WithBarBodyOrForces);
        Assert.Equal(rules.Forces with { TurnDegreesByMember = settings.Reading.Forces.TurnDegreesByMember }, settings.Reading.Forces);
        Assert.Empty(settings.Reading.Forces.TurnDegreesByMember);
        Assert.Empty(settings.Reading.MissingUnits);
        Assert.Equal(GradeTable.Shipped.Grades, settings.Reading.Grades);
        Assert.Equal("the shipped rules", Value(settings, "roles"));
        Assert.Equal(rules.Roles.Length, settings.Reading.Roles.Length);
        Assert.False(settings.Reading.RecogniseMeshes);
        Assert.Equal(rules.DefaultPoisson, settings.Reading.DefaultPoisson);
        Assert.Equal((2.0, DisplayUnits.Si), (settings.LengthFactor, settings.Display));
    }

    [Fact]
    public void The_effective_defaults_are_listed_in_order_and_marked_so()
    {
        var lines = Settings.Default.Effective;

        Assert.Equal(
        [
            "basis.service.criterion=allowable-von-mises", "basis.service.omega=1.67",
            "basis.design.criterion=en-1993-1-1-elastic", "basis.design.gammaM0=1",
            "basis.wall=automatic", "basis.brittle=none", "basis.gammaM1=1", "basis.gammaM2=1.25", "checks.off=none",
            "candidates.always=IfcBeam, IfcColumn, IfcMember, IfcRailing, IfcStructuralCurveMember",
            "candidates.withBarBodyOrForces=IfcBuildingElementProxy, IfcDiscreteAccessory, IfcMechanicalFastener, IfcReinforcingBar, IfcTendon, IfcFlowSegment, IfcPipeSegment, IfcCableSegment",
            "sections.recogniseMeshes=false", "roles=the shipped rules",
            "forces.from=auto", "forces.convention=positive-face", "forces.components=as-flagged", "forces.turnDegrees=0", "forces.turnDegreesByMember=none",
            "forces.missingComponents=refuse", "forces.unknownMembers=refuse", "forces.kinds=none",
            "forces.torsion=not-stated", "forces.missingCoefficients=refuse", "forces.caseCoefficients=refuse", "forces.combinations=none", "forces.combinationSets=none", "forces.caseTags=none",
            "forces.propertySets=none", "forces.kindOfAll=none",
            "loads.presets=none", "loads.contactTolerance=0.025 m",
            "units.LENGTHUNIT=none", "units.FORCEUNIT=none", "units.PRESSUREUNIT=none", "units.TORQUEUNIT=none", "units.MODULUSOFELASTICITYUNIT=none",
            "materials.grades=none", "materials.poisson=0.3", "materials.welds=none",
            "stability.lengthFactor=2", "stability.factorByRole=none", "stability.ends=from-contacts", "stability.hollowForming=unknown",
            "threads.rule=automatic", "threads.area=root", "threads.allowable=none", "threads.fu=none", "threads.cutThread=true", "threads.temperatureFactor=1", "threads.byMember=none",
            "deflection=none", "rules=none", "display=si",
        ], lines.Select(line => $"{line.Key}={line.Value}"));
        Assert.All(lines, line => Assert.True(line.IsDefault));
    }

    [Fact]
    public void What_was_given_is_marked_even_where_it_equals_the_default()
    {
        var settings = Read("""{"basis": {"service": {"omega": 1.67}, "design": null}, "units": {"FORCEUNIT": "kip"}, "display": "si"}""");

        Assert.Equal(["basis.service.omega", "basis.design", "units.FORCEUNIT", "display"],
            settings.Effective.Where(line => !line.IsDefault).Select(line => line.Key));
        Assert.Equal("none", Value(settings, "basis.design"));
        Assert.Equal("4448.2216152605 N", Value(settings, "units.FORCEUNIT"));
    }

    [Fact]
    public void Order_and_spelling_in_the_file_do_not_change_the_effective_text()
    {
        var one = Read("""{"display": "si", "forces": {"turnDegreesByMember": {"b": 1, "a": 2.50}, "kinds": [{"pattern": "U*", "kind": "design"}]}}""");
        var two = Read("""{"forces": {"kinds": [{"kind": "design", "pattern": "U*"}], "turnDegreesByMember": {"a": 25e-1, "b": 1.0}}, /* same */ "display": "si"}""");

        Assert.Equal(one.Effective, two.Effective);
        Assert.Equal("2.5", Value(one, "forces.turnDegreesByMember[\"a\"]"));
        Assert.Equal("\"U*\" design", Value(one, "forces.kinds[1]"));
    }

    [Fact]
    public void Grades_of_the_settings_are_written_out()
    {
        var settings = Read("""
            {"materials": {"grades": [{"name": "X", "pattern": "S\"9", "standard": "own", "yields": [{"upTo": "16 mm", "yield": "235 MPa"}, {"yield": "225 MPa"}],
             "modulus": "210 GPa", "poisson": 0.3, "isSteel": true, "fromMemory": true}]}}
            """);

        Assert.Equal("\"X\", pattern \"S\\\"9\", \"own\", up to 0.016 m 235000000 Pa, 225000000 Pa, E 210000000000 Pa, ν 0.3, steel, from memory",
            Value(settings, "materials.grades[1]"));
    }

    [Fact]
    public void Roles_of_the_settings_take_the_place_of_the_shipped_ones()
    {
        var settings = Read("""
            {"sections": {"recogniseMeshes": true}, "roles": [
             {"role": "post", "classes": ["IfcRailing"], "minSlopeDegrees": 60, "minSlenderness": 5}, {"role": "gangway rail", "predefinedTypes": ["HANDRAIL"], "namePattern": "gangway|landgang"}]}
            """);

        Assert.True(settings.Reading.RecogniseMeshes);
        Assert.Equal("true", Value(settings, "sections.recogniseMeshes"));
        Assert.Equal("\"post\", classes \"IfcRailing\", slope 60 to 90 degrees, slenderness from 5", Value(settings, "roles[1]"));
        Assert.Equal("\"gangway rail\", predefined types \"HANDRAIL\", name \"gangway|landgang\"", Value(settings, "roles[2]"));
        Assert.Equal((60, 90, 5), (settings.Reading.Roles[0].MinSlopeDegrees, settings.Reading.Roles[0].MaxSlopeDegrees, settings.Reading.Roles[0].MinSlenderness));
    }

    [Theory]
    [InlineData("""{"roles": [{"classes": ["IfcBeam"]}]}""", "lacks the key 'role'")]
    [InlineData("""{"roles": [{"role": "post", "namePatern": "x"}]}""", "namePattern")]
    [InlineData("""{"roles": [{"role": "post", "namePattern": "("}]}""", "roles[1].namePattern")]
    [InlineData("""{"roles": [{"role": "post", "minSlopeDegrees": 91}]}""", "from 0 to 90")]
    [InlineData("""{"roles": [{"role": "post", "minSlopeDegrees": 60, "maxSlopeDegrees": 30}]}""", "fits no slope")]
    [InlineData("""{"roles": [{"role": "<b>"}]}""", "a word of letters")]
    [InlineData("""{"roles": {}}""", "a list in square brackets")]
    [InlineData("""{"sections": {"recogniseMeshes": "yes"}}""", "give true or false")]
    [InlineData("""{"sections": {"recognizeMeshes": true}}""", "recogniseMeshes")]
    public void Wrong_roles_and_section_rules_are_refused_with_the_remedy(string text, string words)
    {
        var diagnostics = new DiagnosticList();

        Assert.Null(SettingsFile.Read(Encoding.UTF8.GetBytes(text), "s.json", diagnostics));
        Assert.Contains(diagnostics.Items, d => d.Message.Contains(words, StringComparison.Ordinal));
    }

    [Fact]
    public void A_kind_for_all_situations_shows_as_given()
    {
        var reading = Settings.Default.Reading;
        var settings = Settings.Default with { Reading = reading with { Forces = reading.Forces with { KindOfAll = SituationKind.Design } } };

        Assert.Equal(new EffectiveSetting("forces.kindOfAll", "design", false), settings.Effective.Single(line => line.Key == "forces.kindOfAll"));
    }

    private static string Value(Settings settings, string key) => settings.Effective.Single(line => line.Key == key).Value;

    private static Settings Read(string text)
    {
        var diagnostics = new DiagnosticList();
        return SettingsFile.Read(Encoding.UTF8.GetBytes(text), "s.json", diagnostics)
            ?? throw new InvalidOperationException(string.Join("; ", diagnostics.Items));
    }
}
