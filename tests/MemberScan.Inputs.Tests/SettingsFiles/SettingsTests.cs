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
            "candidates.always=IfcBeam, IfcColumn, IfcMember, IfcRailing, IfcStructuralCurveMember",
            "candidates.withBarBodyOrForces=IfcBuildingElementProxy, IfcDiscreteAccessory, IfcMechanicalFastener, IfcReinforcingBar, IfcTendon, IfcFlowSegment, IfcPipeSegment, IfcCableSegment",
            "forces.convention=positive-face", "forces.components=as-flagged", "forces.turnDegrees=0", "forces.turnDegreesByMember=none",
            "forces.missingComponents=refuse", "forces.unknownMembers=refuse", "forces.kinds=none", "forces.kindOfAll=none",
            "units.LENGTHUNIT=none", "units.FORCEUNIT=none", "units.PRESSUREUNIT=none", "units.TORQUEUNIT=none", "units.MODULUSOFELASTICITYUNIT=none",
            "materials.grades=none", "materials.poisson=0.3", "stability.lengthFactor=2", "display=si",
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
        var one = Read("""{"display": "us", "forces": {"turnDegreesByMember": {"b": 1, "a": 2.50}, "kinds": [{"pattern": "U*", "kind": "design"}]}}""");
        var two = Read("""{"forces": {"kinds": [{"kind": "design", "pattern": "U*"}], "turnDegreesByMember": {"a": 25e-1, "b": 1.0}}, /* same */ "display": "us"}""");

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
