using System.Text;
using MemberScan.Foundation.Diagnostics;
using MemberScan.Inputs.SettingsFiles;
using MemberScan.Model.Presets;

namespace MemberScan.Inputs.Tests.Presets;

public sealed class LoadRulesTests
{
    [Fact]
    public void No_preset_is_switched_on_by_default_and_members_touch_within_25_mm()
    {
        Assert.Empty(Settings.Default.Loads.Presets);
        Assert.Equal(0.025, Settings.Default.Loads.ContactTolerance, 12);
        Assert.Equal(LoadRules.DefaultContactTolerance, Settings.Default.Loads.ContactTolerance, 12);
    }

    [Fact]
    public void A_preset_is_switched_on_by_its_name_or_with_the_members_that_it_is_for()
    {
        var loads = Read("""{"loads": {"presets": ["guard-asce-7-22", {"use": "pipe-hanger", "members": "HG-*", "pipe": "4", "schedule": "40", "contents": "water", "spacing": "10 ft"}], "contactTolerance": "10 mm"}}""", out _)!.Loads;

        Assert.Equal(0.010, loads.ContactTolerance, 12);
        Assert.Equal(["*", "HG-*"], loads.Presets.Select(p => p.Members));
        Assert.Equal((0.1143, 3.048, 1000.0), (Math.Round(loads.Presets[1].Pipe!.OuterDiameter, 9), Math.Round(loads.Presets[1].Spacing, 9), loads.Presets[1].ContentsDensity));
    }

    [Theory]
    [InlineData("""{"loads": {"presets": ["guard-asce-7-23"]}}""", "INP-0105", "guard-asce-7-22")]
    [InlineData("""{"loads": {"presets": ["pipe-hanger"]}}""", "INP-0109", "pipe, schedule, contents and spacing")]
    [InlineData("""{"loads": {"presets": [{"use": "pipe-hanger", "pipe": "1/2", "schedule": "10", "contents": "water", "spacing": "3 m"}]}}""", "INP-0105", "no pipe")]
    [InlineData("""{"loads": {"presets": [{"use": "sprinkler-hanger-nfpa-13", "pipe": "4", "schedule": "40", "contents": "nothing", "spacing": "3 m"}]}}""", "INP-0105", "water-filled")]
    [InlineData("""{"loads": {"presets": ["guard-asce-7-22", "guard-asce-7-22"]}}""", "INP-0112", "same members")]
    [InlineData("""{"loads": {"preset": []}}""", "INP-0102", "presets")]
    [InlineData("""{"loads": {"contactTolerance": "1 m"}}""", "INP-0106", "25 mm")]
    public void Wrong_uses_are_refused_with_the_remedy(string text, string code, string words)
    {
        Assert.Null(Read(text, out var diagnostics));
        Assert.Contains(diagnostics.Items, d => d.Code == code && d.Message.Contains(words, StringComparison.Ordinal));
    }

    [Fact]
    public void What_is_switched_on_is_listed_among_the_settings_in_force()
    {
        var settings = Read("""{"loads": {"presets": ["guard-asce-7-22"]}}""", out _)!;

        Assert.Contains(settings.Effective, line => line is { Key: "loads.presets[1]", Value: "\"guard-asce-7-22\" for \"*\"", IsDefault: false });
    }

    private static Settings? Read(string text, out DiagnosticList diagnostics)
    {
        diagnostics = new DiagnosticList();
        return SettingsFile.Read(Encoding.UTF8.GetBytes(text), "settings.json", diagnostics);
    }
}
