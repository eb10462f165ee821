using System.Text;
using MemberScan.Foundation.Diagnostics;
using MemberScan.Ifc.Schema;
using MemberScan.Model.Rules;
using MemberScan.Part21;

namespace MemberScan.Ifc.Tests.Schema;

public sealed class SchemaNameTests
{
    [Theory]
    [InlineData("IFC2X3", "IFC2X3")]
    [InlineData("ifc2x3", "IFC2X3")]
    [InlineData(" IFC4 ", "IFC4")]
    [InlineData("IFC4X3_ADD2", "IFC4X3_ADD2")]
    public void Released_schemas_are_read_without_a_word(string written, string expected)
    {
        var diagnostics = new DiagnosticList();

        var schema = SchemaName.Resolve([written], diagnostics);

        Assert.Equal(expected, SchemaName.Text(schema!.Value));
        Assert.Empty(diagnostics.Items);
    }

    [Theory]
    [InlineData("IFC4X3_RC3", "IFC4X3_ADD2")]
    [InlineData("IFC4X3", "IFC4X3_ADD2")]
    [InlineData("IFC4X1", "IFC4")]
    [InlineData("IFC4X2", "IFC4")]
    [InlineData("IFC2X3_TC1", "IFC2X3")]
    public void Drafts_are_read_by_the_nearest_schema_and_it_is_told(string written, string expected)
    {
        var diagnostics = new DiagnosticList();

        var schema = SchemaName.Resolve([written], diagnostics);

        Assert.Equal(expected, SchemaName.Text(schema!.Value));
        var finding = Assert.Single(diagnostics.Items);
        Assert.Equal(("IFC-0001", Severity.Warning), (finding.Code, finding.Severity));
    }

    [Theory]
    [InlineData("IFC2X2_FINAL")]
    [InlineData("CONFIG_CONTROL_DESIGN")]
    [InlineData("")]
    public void Other_schemas_are_refused_with_an_error(string written)
    {
        var diagnostics = new DiagnosticList();
        var text = Encoding.ASCII.GetBytes($"ISO-10303-21;\nHEADER;\nFILE_DESCRIPTION((''),'2;1');\nFILE_NAME('','',(''),(''),'','','');\nFILE_SCHEMA(('{written}'));\nENDSEC;\nDATA;\nENDSEC;\nEND-ISO-10303-21;\n");

        var model = IfcModel.Open(Part21File.Read(text, "old.ifc", diagnostics), new ReadingRules(), diagnostics);

        Assert.Null(model);
        Assert.Contains(diagnostics.Items, d => d is { Code: "IFC-0002", Severity: Severity.Error });
    }
}
