using MemberScan.Ifc.Members;
using MemberScan.Model.Members;

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
    public void Predefined_type_names_and_class_are_tried_in_turn(string className, string predefinedType, string name, string typeName, string role)
    {
        var element = new ElementIdentity(1, "", className, predefinedType, name, "", typeName, "");

        Assert.Equal(role, RoleGuess.Of(element));
    }
}
