using System.Text;
using MemberScan.SampleModels.Units;
using MemberScan.SampleModels.Writing;

namespace MemberScan.SampleModels.Tests.Writing;

/// <summary>The check against the attribute tables finds what it is for.</summary>
public sealed class SchemaTableTests
{
    [Theory]
    [InlineData("IFCMATERIAL('S235')", "1 parameters, not 3")]
    [InlineData("IFCMATERIAL($,$,$)", "mandatory")]
    [InlineData("IFCMATERIAL(#1,$,$)", "a STRING is needed")]
    [InlineData("IFCMATERIALS('S235',$,$)", "not in the schema")]
    [InlineData("IFCPROFILEDEF(.SOLID.,$)", "no such literal")]
    [InlineData("IFCCIRCLEPROFILEDEF(.AREA.,$,$,5)", "a REAL is needed")]
    [InlineData("IFCVERTEXPOINT(#2)", "refers to IFCDIRECTION")]
    [InlineData("IFCVERTEXPOINT(#99999)", "refers to nothing")]
    [InlineData("IFCCARTESIANPOINT((0.,0.,0.,0.))", "4 items")]
    [InlineData("IFCSIUNIT($,.LENGTHUNIT.,$,.METRE.)", "derived slots")]
    [InlineData("IFCPROPERTYSINGLEVALUE('a',$,1.,$)", "in none of the choices")]
    [InlineData("IFCELEMENT('0000000000000000000000',$,$,$,$,$,$,$)", "abstract")]
    public void A_wrong_instance_is_found(string instance, string expected)
    {
        var text = Encoding.ASCII.GetString(new ModelWriter(SchemaVersion.Ifc4, ModelUnits.MetreNewton, "faulty").Build());
        var file = new WrittenFile(Encoding.ASCII.GetBytes(text.Replace("ENDSEC;\nEND-ISO", $"#900={instance};\nENDSEC;\nEND-ISO", StringComparison.Ordinal)));

        var faults = SchemaTable.Of("IFC4").Faults(file);

        Assert.Contains(expected, Assert.Single(faults), StringComparison.Ordinal);
    }
}
