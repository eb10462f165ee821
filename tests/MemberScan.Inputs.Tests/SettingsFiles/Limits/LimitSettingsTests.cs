using System.Text;
using MemberScan.Foundation.Diagnostics;
using MemberScan.Inputs.SettingsFiles;
using MemberScan.Model.Forces;
using MemberScan.Model.Limits;
using MemberScan.Model.Limits.Threads;

namespace MemberScan.Inputs.Tests.SettingsFiles.Limits;

/// <summary>The settings that say which checks are made and against what.</summary>
public sealed class LimitSettingsTests
{
    [Fact]
    public void Every_key_of_the_limits_is_read()
    {
        var settings = Sound("""
            {
              "basis": { "wall": "design-0.93", "gammaM1": 1.1, "gammaM2": 1.3, "brittle": { "tension": "8 MPa", "compression": "2 ksi", "situations": "design" } },
              "checks": { "off": ["en-6.2.7", "aisc-h1"] },
              "stability": { "factorByRole": { "post": 2.1 }, "ends": "by-role", "hollowForming": "hot-finished" },
              "threads": { "rule": "allowable", "area": "stress", "allowable": "62 MPa", "fu": "400 MPa", "cutThread": false, "temperatureFactor": 0.8, "byMember": { "HR-*": "M12" } },
              "materials": { "welds": [{ "members": "GP-*", "weldedYield": "65 MPa" }, { "members": "*", "weldedYield": "no-welds" }] },
              "deflection": [{ "name": "L/200", "role": "rail", "spanOver": 200 }, { "name": "top", "role": "post", "largest": "30 mm" }],
            }
            """);

        var limits = settings.Limits;
        Assert.Equal((WallBasis.Design, 1.1, 1.3), (limits.WallInForce, limits.GammaM1, limits.GammaM2));
        Assert.Equal((8e6, SituationKind.Design), (limits.Brittle!.Tension, limits.Brittle.Kind));
        Assert.Equal(13.789514e6, limits.Brittle.Compression, 1e1);         // 1 ksi = 6.894757 MPa, NIST SP 811, from memory
        Assert.Equal(["aisc-h1", "en-6.2.7"], limits.ChecksOff);
        Assert.Equal((2.1, false, TubeForming.HotFinished), (limits.Stability.FactorOf("post"), limits.Stability.EndsFromContacts, limits.Stability.Forming));
        Assert.Null(limits.Stability.FactorOf("strut"));
        var threads = limits.Threads;
        Assert.Equal((ThreadRule.Allowable, ThreadAreaBasis.Stress, 62e6, 400e6, false, 0.8), (threads.InForce, threads.Area, threads.Allowable, threads.TensileStrength, threads.IsCut, threads.TemperatureFactor));
        Assert.Equal(("HR-*", "M12"), Assert.Single(threads.ByMember));
        Assert.Equal([new WeldRule("GP-*", 65e6), new WeldRule("*", null)], limits.Welds);
        Assert.Equal([new DeflectionRule("L/200", "rail", 200, null), new DeflectionRule("top", "post", null, 0.03)], limits.Deflection);
    }

    [Fact]
    public void A_rule_begins_with_the_limits_of_all_wherever_it_stands()
    {
        var settings = Sound("""{"rules": [{"when": {"role": "post"}, "set": {"basis": {"service": {"omega": 2}}}}], "basis": {"gammaM1": 1.1}}""");

        var rule = Assert.Single(settings.LimitRules);
        Assert.Equal((2.0, 1.1), (rule.Limits.Basis.Service!.Factor, rule.Limits.GammaM1));
        Assert.Equal(1.67, settings.Basis.Service!.Factor);
        Assert.Equal("role \"post\": basis.service.omega 2", settings.Effective.Single(line => line.Key == "rules[1]").Value);
    }

    [Fact]
    public void A_length_factor_holds_for_stability_where_it_is_given_alone()
    {
        Assert.Null(Settings.Default.Limits.Stability.FactorOf("strut"));
        Assert.Equal(1.0, Sound("""{"stability": {"lengthFactor": 1}}""").Limits.Stability.FactorOf("strut"));
    }

    [Fact]
    public void A_setting_says_from_which_line_of_the_file_it_comes()
    {
        var settings = Sound("""
            {
              "basis": {
                "service": { "omega": 1.5 },
              },
              "rules": [{"when": {"role": "post"}, "set": {}}]
            }
            """);

        string Source(string key) => settings.SourceOf(settings.Effective.Single(line => line.Key == key), "own.json");
        Assert.Equal(("own.json, line 3", "own.json, line 5", "default"), (Source("basis.service.omega"), Source("rules[1]"), Source("basis.wall")));
    }

    [Theory]
    [InlineData("""{"basis": {"wal": "nominal"}}""", "INP-0102", "did you mean 'wall'?")]
    [InlineData("""{"basis": {"wall": "by grade"}}""", "INP-0105", "did you mean 'by-grade'?")]
    [InlineData("""{"basis": {"service": {"criterion": "aisc-360-lrfd"}}}""", "INP-0105", "did you mean 'aisc-360-asd'?")]
    [InlineData("""{"basis": {"service": {"criterion": "aisc-360-asd", "omega": 2}}}""", "INP-0106", "leave out 'omega'")]
    [InlineData("""{"basis": {"service": {"criterion": "largest-normal-stress"}}}""", "INP-0109", "'brittle'")]
    [InlineData("""{"basis": {"brittle": {"tension": "8 MPa"}}}""", "INP-0109", "compression")]
    [InlineData("""{"basis": {"gammaM1": 0.9}}""", "INP-0106", "from 1 to 100")]
    [InlineData("""{"checks": {"off": ["en-6.2.77"]}}""", "INP-0105", "did you mean 'en-6.2.7'?")]
    [InlineData("""{"checks": {"off": ["stress"]}}""", "INP-0105", "checks.off")]
    [InlineData("""{"stability": {"factorByRole": {"post": 0}}}""", "INP-0106", "stability.factorByRole")]
    [InlineData("""{"threads": {"rule": "aisc"}}""", "INP-0105", "aisc-360-j3.7")]
    [InlineData("""{"threads": {"allowable": 9}}""", "INP-0104", "10 MPa")]
    [InlineData("""{"threads": {"temperatureFactor": 1.2}}""", "INP-0106", "from 0.01 to 1")]
    [InlineData("""{"materials": {"welds": [{"members": "*"}]}}""", "INP-0109", "weldedYield")]
    [InlineData("""{"deflection": [{"name": "L/200", "role": "rail"}]}""", "INP-0109", "spanOver")]
    [InlineData("""{"rules": [{"when": {}, "set": {}}]}""", "INP-0109", "names no members")]
    [InlineData("""{"rules": [{"when": {"role": "post"}, "set": {"forces": {}}}]}""", "INP-0102", "rules[1].set")]
    public void What_is_wrong_is_told_with_its_place_and_a_remedy(string text, string code, string remedy)
    {
        var diagnostics = new DiagnosticList();

        Assert.Null(SettingsFile.Read(Encoding.UTF8.GetBytes(text), "own.json", diagnostics));

        Assert.Contains(diagnostics.Items, d => d.Code == code && d.Message.Contains(remedy, StringComparison.Ordinal) && d.Span is { Line: 1 });
    }

    private static Settings Sound(string text)
    {
        var diagnostics = new DiagnosticList();
        var settings = SettingsFile.Read(Encoding.UTF8.GetBytes(text), "own.json", diagnostics);
        Assert.True(settings is not null, string.Join('\n', diagnostics.Items.Select(d => $"{d.Span} {d.Message}")));
        return settings;
    }
}
