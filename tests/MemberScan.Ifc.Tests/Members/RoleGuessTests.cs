using MemberScan.Foundation.Geometry;
using MemberScan.Ifc.Members;
using MemberScan.Model.Members;
using MemberScan.Model.Rules;

namespace MemberScan.Ifc.Tests.Members;

public sealed class RoleGuessTests
{
    [Theory]
    [InlineData("IfcMember", "POST", "rail 3", "", "post")]
    [InlineData("IfcMember", "STUD", "", "", "post")]
    [InlineData("IfcMember", "STRUT", "hanger 1", "", "strut")]
    [InlineData("IfcMember", "BRACE", "", "", "brace")]
    [InlineData("IfcMember", "TIEBAR", "", "", "stay")]
    [InlineData("IfcMember", "SUSPENDER", "", "", "hanger")]
    [InlineData("IfcRailing", "HANDRAIL", "", "", "rail")]
    [InlineData("IfcRailing", "GUARDRAIL", "Post P-2", "", "post")]
    [InlineData("IfcRailing", "", "", "", "rail")]
    [InlineData("IfcBuildingElementProxy", "", "Threaded rod M16", "", "hanger")]
    [InlineData("IfcBuildingElementProxy", "", "Gewindestange", "", "hanger")]
    [InlineData("IfcReinforcingBar", "", "Rod 12", "", "rod")]
    [InlineData("IfcMember", "", "M-7", "Mast stay type", "stay")]
    [InlineData("IfcBeam", "BEAM", "B-1", "", "beam")]
    [InlineData("IfcBeamStandardCase", "", "", "", "beam")]
    [InlineData("IfcColumn", "", "C-1", "", "column")]
    [InlineData("IfcColumn", "", "Mast", "", "mast")]
    [InlineData("IfcMember", "", "X-1", "", "member")]
    [InlineData("IfcMember", "", "Rail 1", "Hanger type", "rail")]
    [InlineData("IfcMember", "", "Poteau 3", "", "post")]
    [InlineData("IfcMember", "", "Barandilla norte", "", "rail")]
    [InlineData("IfcMember", "", "Leuning 2", "", "rail")]
    [InlineData("IfcMember", "", "Contreventement", "", "brace")]
    [InlineData("IfcMember", "", "Puntone A", "", "strut")]
    public void Predefined_type_names_and_class_are_tried_in_turn(string className, string predefinedType, string name, string typeName, string role)
    {
        var element = new ElementIdentity(1, "", className, predefinedType, name, "", typeName, "");

        Assert.Equal(role, new RoleGuess(RoleRule.Default).Of(element, null, null));
    }

    [Theory]
    [InlineData(0, 1, 20, "rail")]
    [InlineData(1, 0, 20, "post")]
    [InlineData(1, 0, 4, "rail")]
    [InlineData(1, 1, 20, "rail")]
    public void Slope_and_slenderness_are_conditions_like_the_others(double up, double along, double slenderness, string role)
    {
        // Up and along give slopes of 0°, 90° and 45°.
        var rules = new RoleGuess([new("post") { Classes = ["ifcrailing"], MinSlopeDegrees = 60, MinSlenderness = 5 }, new("rail") { Classes = ["IfcRailing"] }]);
        var element = new ElementIdentity(1, "", "IfcRailing", "", "", "", "", "");

        Assert.Equal(role, rules.Of(element, MemberAxes.From(Vector3.Zero, new Vector3(along, 0, up), Vector3.UnitY), slenderness));
        Assert.Equal("rail", rules.Of(element, null, null));
    }
}
