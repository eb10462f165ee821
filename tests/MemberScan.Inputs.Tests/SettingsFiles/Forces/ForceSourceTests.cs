using System.Text;
using MemberScan.Foundation.Diagnostics;
using MemberScan.Inputs.SettingsFiles;
using MemberScan.Model.Rules;

namespace MemberScan.Inputs.Tests.SettingsFiles.Forces;

public sealed class ForceSourceTests
{
    [Fact]
    public void Sources_are_tried_in_the_order_given_and_automatically_computed_ones_come_before_assumed_ones()
    {
        Assert.Equal([ForceSource.Table, ForceSource.Results, ForceSource.PropertySets, ForceSource.Statics, ForceSource.Presets], Settings.Default.Reading.Forces.From);
        Assert.Equal(ForceRules.AutomaticOrder, Read("""{"forces": {"from": "auto"}}""", out _)!.Reading.Forces.From);

        var settings = Read("""{"forces": {"from": ["statics", "table"]}}""", out _)!;

        Assert.Equal([ForceSource.Statics, ForceSource.Table], settings.Reading.Forces.From);
        Assert.Contains(settings.Effective, line => line is { Key: "forces.from", Value: "statics, table", IsDefault: false });
    }

    [Theory]
    [InlineData("""{"forces": {"from": []}}""", "INP-0105")]
    [InlineData("""{"forces": {"from": ["tabel"]}}""", "INP-0105")]
    [InlineData("""{"forces": {"from": "statics"}}""", "INP-0105")]
    [InlineData("""{"forces": {"from": ["table", "table"]}}""", "INP-0112")]
    public void Wrong_lists_of_sources_are_refused(string text, string code)
    {
        Assert.Null(Read(text, out var diagnostics));
        Assert.Contains(diagnostics.Items, d => d.Code == code);
    }

    private static Settings? Read(string text, out DiagnosticList diagnostics)
    {
        diagnostics = new DiagnosticList();
        return SettingsFile.Read(Encoding.UTF8.GetBytes(text), "settings.json", diagnostics);
    }
}
