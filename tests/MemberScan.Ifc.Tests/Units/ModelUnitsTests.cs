using System.Collections.Frozen;
using MemberScan.Foundation.Diagnostics;
using MemberScan.Model.Rules;
using MemberScan.Model.Verdicts;

namespace MemberScan.Ifc.Tests.Units;

/// <summary>Factors: SI brochure, 9th edition (prefixes); international yard and pound agreement of 1959 and standard gravity (inch, pound-force).</summary>
public sealed class ModelUnitsTests
{
    private const double PoundForce = 4.4482216152605, Inch = 0.0254;

    [Theory]
    [InlineData("EXA", 1e18)]
    [InlineData("PETA", 1e15)]
    [InlineData("TERA", 1e12)]
    [InlineData("GIGA", 1e9)]
    [InlineData("MEGA", 1e6)]
    [InlineData("KILO", 1e3)]
    [InlineData("HECTO", 1e2)]
    [InlineData("DECA", 1e1)]
    [InlineData("DECI", 1e-1)]
    [InlineData("CENTI", 1e-2)]
    [InlineData("MILLI", 1e-3)]
    [InlineData("MICRO", 1e-6)]
    [InlineData("NANO", 1e-9)]
    [InlineData("PICO", 1e-12)]
    [InlineData("FEMTO", 1e-15)]
    [InlineData("ATTO", 1e-18)]
    public void Each_prefix_scales_its_unit(string prefix, double factor)
    {
        var units = Read($"#3=IFCSIUNIT(*,.PRESSUREUNIT.,.{prefix}.,.PASCAL.);").Model.Units;

        Assert.Equal(factor, units.Pressure);
    }

    [Theory]
    [InlineData("MASSUNIT", ".KILO.", "GRAM", 1)]
    [InlineData("MASSUNIT", "$", "GRAM", 1e-3)]
    [InlineData("AREAUNIT", ".MILLI.", "SQUARE_METRE", 1e-6)]
    [InlineData("AREAUNIT", "$", "SQUARE_METRE", 1)]
    [InlineData("VOLUMEUNIT", ".CENTI.", "CUBIC_METRE", 1e-6)]
    [InlineData("FORCEUNIT", ".KILO.", "NEWTON", 1e3)]
    [InlineData("LENGTHUNIT", "$", "METRE", 1)]
    public void Gram_and_powers_of_the_metre_follow_their_own_rule(string type, string prefix, string name, double factor)
    {
        var units = Read($"#3=IFCSIUNIT(*,.{type}.,{prefix},.{name}.);").Model.Units;

        Reading.AssertNear(factor, units.FactorOf(type)!.Value, 1e-15);
    }

    [Fact]
    public void An_unknown_prefix_or_a_unit_without_a_size_has_no_factor_and_is_still_reported()
    {
        var units = Read("#3=IFCSIUNIT(*,.LENGTHUNIT.,.DOZEN.,.METRE.);", "#4=IFCCONTEXTDEPENDENTUNIT(#9,.FORCEUNIT.,'bollard pull');", "#9=IFCDIMENSIONALEXPONENTS(1,1,-2,0,0,0,0);").Model.Units;

        Assert.Null(units.Length);
        Assert.Null(units.Force);
        Assert.False(units.NamedByModel("FORCEUNIT"));
        Assert.Equal("bollard pull", units.Reported.Single(u => u.UnitType == "FORCEUNIT").Text);
    }

    [Fact]
    public void A_foot_of_305_mm_counts_as_defined_and_is_told()
    {
        var reading = Read(Conversion(3, "LENGTHUNIT", "foot", 0.305, "METRE"));

        Assert.Equal(0.305, reading.Model.Units.Length);
        reading.AssertTold("IFC-0004", Severity.Warning, "0.305");
    }

    [Theory]
    [InlineData("FOOT", 0.3048)]
    [InlineData("inch", 0.0254)]
    [InlineData("cubit of the landing", 0.4572)]
    public void A_conversion_of_any_name_uses_its_own_factor_without_a_word(string name, double factor)
    {
        var reading = Read(Conversion(3, "LENGTHUNIT", name, factor, "METRE"));

        Assert.Equal(factor, reading.Model.Units.Length);
        Assert.Equal(0, reading.CountOf("IFC-0004"));
    }

    [Fact]
    public void A_conversion_may_stand_on_a_prefixed_unit_and_on_another_conversion()
    {
        // 1 ft = 12 in, 1 in = 25.4 mm; the tag of the value is wrong and does not count.
        var units = Read(
            "#3=IFCCONVERSIONBASEDUNIT(#9,.LENGTHUNIT.,'foot',#4);", "#4=IFCMEASUREWITHUNIT(IFCMASSMEASURE(12.),#105);",
            "#105=IFCCONVERSIONBASEDUNIT(#9,.LENGTHUNIT.,'inch',#106);", "#106=IFCMEASUREWITHUNIT(IFCLENGTHMEASURE(25.4),#107);",
            "#107=IFCSIUNIT(*,.LENGTHUNIT.,.MILLI.,.METRE.);", "#9=IFCDIMENSIONALEXPONENTS(1,0,0,0,0,0,0);").Model.Units;

        Reading.AssertNear(0.3048, units.Length!.Value, 1e-15);
    }

    [Theory]
    [InlineData(0.0)]
    [InlineData(-0.3048)]
    public void A_conversion_that_is_not_above_zero_has_no_factor(double factor)
    {
        var units = Read(Conversion(3, "LENGTHUNIT", "foot", factor, "METRE")).Model.Units;

        Assert.Null(units.Length);
    }

    [Theory]
    [MemberData(nameof(Schemas.All), MemberType = typeof(Schemas))]
    public void Derived_units_multiply_powers_of_their_elements(Release release)
    {
        var name = release == Release.Ifc4X3 ? ",$" : "";
        var units = Read(release,
            [.. Conversion(20, "FORCEUNIT", "kip", 1000 * PoundForce, "NEWTON"), .. Conversion(30, "LENGTHUNIT", "inch", Inch, "METRE"),
            "#40=IFCDERIVEDUNITELEMENT(#20,1);", "#41=IFCDERIVEDUNITELEMENT(#30,1);", "#42=IFCDERIVEDUNITELEMENT(#30,-2);",
            $"#3=IFCDERIVEDUNIT((#40,#41),.TORQUEUNIT.,${name});", $"#4=IFCDERIVEDUNIT((#40,#42),.MODULUSOFELASTICITYUNIT.,${name});"]).Model.Units;

        Reading.AssertNear(1000 * PoundForce * Inch, units.Torque!.Value, 1e-14);
        Reading.AssertNear(6894757.293168361, units.Modulus!.Value, 1e-12);
        Assert.Equal("kip · inch", units.Reported.Single(u => u.UnitType == "TORQUEUNIT").Text);
    }

    [Fact]
    public void A_derived_unit_may_hold_another_one()
    {
        var units = Read("#3=IFCDERIVEDUNIT((#4,#5),.TORQUEUNIT.,$);", "#4=IFCDERIVEDUNITELEMENT(#106,1);", "#5=IFCDERIVEDUNITELEMENT(#109,2);",
            "#106=IFCDERIVEDUNIT((#7,#8),.LINEARFORCEUNIT.,$);", "#7=IFCDERIVEDUNITELEMENT(#110,1);", "#8=IFCDERIVEDUNITELEMENT(#109,-1);",
            "#109=IFCSIUNIT(*,.LENGTHUNIT.,.MILLI.,.METRE.);", "#110=IFCSIUNIT(*,.FORCEUNIT.,.KILO.,.NEWTON.);").Model.Units;

        Reading.AssertNear(1, units.Torque!.Value, 1e-14);           // kN/mm · mm² = kN·mm = 1 N·m
    }

    [Fact]
    public void A_derived_unit_that_lost_an_element_has_no_factor()
    {
        var units = Read("#3=IFCDERIVEDUNIT((#4,#99),.TORQUEUNIT.,$);", "#4=IFCDERIVEDUNITELEMENT(#5,1);", "#5=IFCSIUNIT(*,.FORCEUNIT.,.KILO.,.NEWTON.);").Model.Units;

        Assert.Null(units.Torque);
    }

    [Fact]
    public void Units_that_run_in_a_circle_end_without_a_factor()
    {
        var units = Read("#3=IFCDERIVEDUNIT((#4),.TORQUEUNIT.,$);", "#4=IFCDERIVEDUNITELEMENT(#3,2);",
            "#5=IFCCONVERSIONBASEDUNIT($,.LENGTHUNIT.,'span',#6);", "#6=IFCMEASUREWITHUNIT(IFCREAL(2.),#5);").Model.Units;

        Assert.Null(units.Torque);
        Assert.Null(units.Length);
    }

    [Fact]
    public void The_first_of_two_units_of_a_type_counts_and_the_second_is_told()
    {
        var reading = Read("#3=IFCSIUNIT(*,.LENGTHUNIT.,.MILLI.,.METRE.);", "#4=IFCSIUNIT(*,.LENGTHUNIT.,$,.METRE.);");

        Assert.Equal(1e-3, reading.Model.Units.Length);
        reading.AssertTold("IFC-0006", Severity.Warning, "LENGTHUNIT");
    }

    [Fact]
    public void A_unit_that_two_projects_name_differently_is_not_used_and_told()
    {
        var reading = Read("#3=IFCSIUNIT(*,.LENGTHUNIT.,.MILLI.,.METRE.);", "#4=IFCSIUNIT(*,.FORCEUNIT.,$,.NEWTON.);",
            "#900=IFCPROJECT('2Landing0000000000900',$,'other',$,$,$,$,$,#901);", "#901=IFCUNITASSIGNMENT((#902,#903));",
            "#902=IFCSIUNIT(*,.LENGTHUNIT.,$,.METRE.);", "#903=IFCSIUNIT(*,.FORCEUNIT.,$,.NEWTON.);");

        Assert.Null(reading.Model.Units.Length);
        Assert.Equal(1, reading.Model.Units.FactorOf("FORCEUNIT"));
        reading.AssertTold("IFC-0007", Severity.Warning, "LENGTHUNIT");
    }

    [Fact]
    public void A_project_without_units_is_told_and_its_members_miss_their_unit()
    {
        var reading = Reading.Of(Reading.Text(Release.Ifc4, "#1=IFCPROJECT('0YvctVUKr0kugbFTf53O9L',$,'P',$,$,$,$,$,$);",
            "#10=IFCMEMBER('2O2Fr$t4X7Zf8NOew3FLOH',$,'R',$,$,$,#11,$,$);", "#11=IFCPRODUCTDEFINITIONSHAPE($,$,(#12));",
            "#12=IFCSHAPEREPRESENTATION($,'Body','SweptSolid',(#13));", "#13=IFCEXTRUDEDAREASOLID(#14,$,#15,3000.);",
            "#14=IFCCIRCLEPROFILEDEF(.AREA.,$,$,10.);", "#15=IFCDIRECTION((0.,0.,1.));"));

        reading.AssertTold("IFC-0003", Severity.Warning, "names no units");
        Assert.Equal(ReasonCode.UnitMissing, Reading.Why(reading.Only.Section).Code);
    }

    [Fact]
    public void The_one_unit_assignment_counts_where_no_project_refers_to_it()
    {
        var reading = Reading.Of(Reading.Text(Release.Ifc4, "#2=IFCUNITASSIGNMENT((#3));", "#3=IFCSIUNIT(*,.LENGTHUNIT.,.CENTI.,.METRE.);"));

        Assert.Equal(1e-2, reading.Model.Units.Length);
        Assert.Equal(0, reading.CountOf("IFC-0003"));
    }

    [Fact]
    public void Units_of_the_settings_fill_gaps_and_nothing_else()
    {
        var rules = new ReadingRules
        {
            MissingUnits = new Dictionary<string, double> { ["TORQUEUNIT"] = PoundForce * Inch, ["LENGTHUNIT"] = 1 }.ToFrozenDictionary(),
        };

        var reading = Reading.Of(Project(Release.Ifc4, "#3=IFCSIUNIT(*,.LENGTHUNIT.,.MILLI.,.METRE.);"), rules);

        Assert.Equal(1e-3, reading.Model.Units.Length);
        Assert.Equal(PoundForce * Inch, reading.Model.Units.Torque);
        Assert.True(reading.Model.Units.NamedByModel("LENGTHUNIT"));
        Assert.False(reading.Model.Units.NamedByModel("TORQUEUNIT"));
        Assert.Equal("settings", reading.Model.Units.Reported.Single(u => u.UnitType == "TORQUEUNIT").Source);
        reading.AssertTold("IFC-0005", Severity.Warning, "LENGTHUNIT");
    }

    [Fact]
    public void Missing_types_are_reported_missing_and_plane_angles_default_to_the_radian()
    {
        var units = Read("#3=IFCSIUNIT(*,.LENGTHUNIT.,.MILLI.,.METRE.);").Model.Units;

        Assert.Equal(["LENGTHUNIT", "FORCEUNIT", "TORQUEUNIT", "PRESSUREUNIT", "MODULUSOFELASTICITYUNIT", "PLANEANGLEUNIT"], units.Reported.Select(u => u.UnitType));
        Assert.All(units.Reported[1..5], u => Assert.Equal(("missing", (double?)null), (u.Text, u.Factor)));
        Assert.Equal(1, units.Angle);
        Assert.Equal("default", units.Reported[5].Source);
    }

    private static Reading Read(params string[] lines) => Read(Release.Ifc4, lines);

    private static Reading Read(Release release, string[] lines) => Reading.Of(Project(release, lines));

    /// <summary>A project with the units of the lines; those below #100 are its own, the others only parts of them.</summary>
    private static byte[] Project(Release release, params string[] lines)
    {
        var own = lines.Where(l => l.Contains("UNIT(", StringComparison.Ordinal) && !l.Contains("WITHUNIT(", StringComparison.Ordinal))
            .Select(l => l[..l.IndexOf('=', StringComparison.Ordinal)]).Where(id => id.Length <= 3);
        return Reading.Text(release, ["#1=IFCPROJECT('0YvctVUKr0kugbFTf53O9L',$,'P',$,$,$,$,$,#2);", $"#2=IFCUNITASSIGNMENT(({string.Join(',', own)}));", .. lines]);
    }

    private static string[] Conversion(int id, string type, string name, double factor, string si) =>
    [
        $"#{id}=IFCCONVERSIONBASEDUNIT($,.{type}.,'{name}',#{id + 100});",
        $"#{id + 100}=IFCMEASUREWITHUNIT(IFCREAL({Part21.Part21Text.Real(factor)}),#{id + 101});",
        $"#{id + 101}=IFCSIUNIT(*,.{type}.,$,.{si}.);",
    ];
}
