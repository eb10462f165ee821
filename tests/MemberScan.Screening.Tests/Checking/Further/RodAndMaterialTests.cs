using MemberScan.Foundation.Geometry;
using MemberScan.Foundation.Units;
using MemberScan.Mechanics.Forces;
using MemberScan.Mechanics.Sections;
using MemberScan.Model.Verdicts;
using MemberScan.SampleModels.Writing;
using MemberScan.Screening.Record;

namespace MemberScan.Screening.Tests.Checking.Further;

/// <summary>Threaded rods, and materials beyond carbon steel.</summary>
public sealed class RodAndMaterialTests
{
    /// <summary>
    /// 3/8-16 UNC, 700 lbf (areas by ASME B1.1, from memory: nominal 0.1104, stress 0.0775, root 0.0678 in²): 6.3, 9.0 and 10.3 ksi; 10.3/9 = 1.15.
    /// </summary>
    [Theory]
    [InlineData("nominal", 6.34)]
    [InlineData("stress", 9.03)]
    [InlineData("root", 10.33)]
    public void The_area_of_the_rule_is_the_one_that_tension_is_divided_by(string area, double ksi)
    {
        var member = Rod("Hanger rod 3/8-16 UNC", $$$"""{"threads": {"rule": "allowable", "area": "{{{area}}}", "allowable": "9 ksi"}}""");

        var line = member.Checks.Single(c => c.Key == "rod-tension");
        Assert.Equal(ksi / 9, line.Utilization!.Value, 2e-3);
        Assert.Equal(ksi > 9 ? Verdict.Overstressed : Verdict.WithinLimit, member.Verdict);
        if (area == "root") Assert.Equal(1.15, member.Governing!.Utilization, 4e-3);
    }

    [Fact]
    public void A_rod_whose_thread_is_not_known_is_not_checked_where_a_rule_asks_for_it()
    {
        const string settings = """{"threads": {"rule": "allowable", "allowable": "9 ksi"}}""";

        var member = Rod("Hanger rod", settings);
        var named = Rod("Hanger, threaded rod", settings: null);
        var given = Rod("Hanger rod", """{"threads": {"rule": "allowable", "allowable": "9 ksi", "byMember": {"P-*": "3/8-16 UNC"}}}""");

        Assert.Equal((Verdict.NotChecked, ReasonCode.ThreadUnknown), (member.Verdict, member.Reason!.Code));
        Assert.Equal((Verdict.NotChecked, ReasonCode.ThreadUnknown), (named.Verdict, named.Reason!.Code));
        Assert.Equal("rod-tension", given.Governing!.Check);
    }

    [Fact]
    public void A_plain_rod_without_a_rule_says_that_it_is_checked_on_its_full_section()
    {
        var member = Rod("Hanger rod", settings: null);

        Assert.Equal(Verdict.WithinLimit, member.Verdict);
        Assert.Contains("no thread is known; checked as a plain bar on its full section", member.Notes);
    }

    [Fact]
    public void Bending_in_a_threaded_rod_is_told_whatever_its_size()
    {
        var member = Rod("Hanger rod M10", settings: null, new SectionForces(100, 0, 0, 0, 0.001, 0), diameter: 10e-3);

        Assert.Contains(member.Notes, note => note.Contains("meant for tension alone", StringComparison.Ordinal));
    }

    [Fact]
    public void A_grade_by_name_says_so_and_a_bare_material_is_not_checked()
    {
        var named = Landing.ScreenOne(Landing.OnePost(material: "S235JR"), Landing.Constant(new SectionForces(30e3, 0, 0, 0, 0, 0)));

        Assert.Equal(235e6, named.Strength);
        Assert.StartsWith("by name", named.StrengthSource, StringComparison.Ordinal);
    }

    [Theory]
    [InlineData(null, Verdict.NotChecked, null)]
    [InlineData("""{"materials": {"welds": [{"members": "P-*", "weldedYield": "65 MPa"}]}}""", Verdict.Overstressed, 65e6)]
    [InlineData("""{"materials": {"welds": [{"members": "P-*", "weldedYield": "no-welds"}]}}""", Verdict.WithinLimit, 110e6)]
    public void An_aluminium_post_is_never_taken_at_its_unwelded_strength_unless_it_is_stated_to_have_no_welds(string? settings, Verdict verdict, double? strength)
    {
        // σ = 20 kN/453.4 mm² = 44.1 MPa against 110/1.67 = 65.9 and 65/1.67 = 38.9 MPa.
        var writer = Landing.Writer();
        var post = writer.Element("IFCMEMBER", "Gangway post", writer.LocalPlacement(Transform3.Identity), Landing.Shape(writer, Landing.PostTube, 1), new ElementOptions { Key = Landing.Post, Tag = Landing.Post });
        writer.Associate(writer.Materials.Material("Aluminium profile", yield: 110e6), post);

        var member = Landing.ScreenOne(writer.Build(), Landing.Constant(new SectionForces(20e3, 0, 0, 0, 0, 0)), settings);

        Assert.Equal(verdict, member.Verdict);
        if (strength is not null) Assert.Equal(strength.Value, member.Strength!.Value, 1);
        else Assert.Equal(ReasonCode.NoStrength, member.Reason!.Code);
    }

    [Fact]
    public void A_6063_T5_post_has_the_smaller_strength_of_its_welded_zone_whatever_its_properties_say()
    {
        var writer = Landing.Writer();
        var post = writer.Element("IFCMEMBER", "Gangway post", writer.LocalPlacement(Transform3.Identity), Landing.Shape(writer, Landing.PostTube, 1), new ElementOptions { Key = Landing.Post, Tag = Landing.Post });
        writer.Associate(writer.Materials.Material("6063-T5", yield: 145e6), post);

        var member = Landing.ScreenOne(writer.Build(), Landing.Constant(new SectionForces(5e3, 0, 0, 0, 0, 0)));

        // Aluminum Design Manual, welded 6063-T5: 8 ksi (from memory).
        Assert.Equal(Si.Ksi(8), member.Strength!.Value, 1);
        Assert.Contains("145 MPa", member.StrengthSource, StringComparison.Ordinal);
    }

    [Fact]
    public void Timber_is_refused_unless_limits_of_its_normal_stress_are_given()
    {
        // Rectangle 60 × 100 mm: σ = 12 kN/6000 mm² = 2 MPa against 8 MPa.
        var (model, table) = (Landing.OnePost(new Rectangle(60e-3, 100e-3), material: "Timber GL24h"), Landing.Constant(new SectionForces(12e3, 0, 0, 0, 0, 0)));

        var refused = Landing.ScreenOne(model, table);
        var given = Landing.ScreenOne(model, table, """{"basis": {"brittle": {"tension": "8 MPa", "compression": "16 MPa", "situations": "service"}}}""");

        Assert.Equal((Verdict.NotChecked, ReasonCode.MaterialNotCovered), (refused.Verdict, refused.Reason!.Code));
        Assert.Equal(Verdict.WithinLimit, given.Verdict);
        Assert.Equal(0.25, given.Governing!.Utilization, 1e-6);
    }

    private static MemberResult Rod(string name, string? settings, SectionForces? forces = null, double? diameter = null)
    {
        var writer = Landing.Writer();
        var d = diameter ?? Si.In(0.375);
        var rod = writer.Element("IFCMEMBER", name, writer.LocalPlacement(Transform3.Identity), Landing.Shape(writer, new Round(d / 2), 1), new ElementOptions { Key = Landing.Post, Tag = Landing.Post });
        writer.Associate(writer.Materials.Material("S235JR"), rod);
        return Landing.ScreenOne(writer.Build(), Landing.Constant(forces ?? new SectionForces(700 * Si.PoundForce, 0, 0, 0, 0, 0)), settings);
    }
}
