using System.Text.Json;
using MemberScan.Cli.Tests.Screening;

namespace MemberScan.Cli.Tests.Readers;

/// <summary>The checked models as an independent parser (the npm package web-ifc) reads them.</summary>
public sealed class WebIfcTests
{
    private const string SetName = "MemberScan_StressCheck";

    [Theory]
    [MemberData(nameof(ScreenedSample.Samples), MemberType = typeof(ScreenedSample))]
    public async Task Every_candidate_element_carries_its_set(string name, int code)
    {
        var sample = await ScreenedSample.Of(name);
        Assert.True(code == sample.Ran.ExitCode, sample.Ran.All);
        using var folder = new TemporaryFolder();

        using var read = await ReadSets(folder.Write("checked.ifc", sample.Checked));

        var elements = read.RootElement.GetProperty("elements");
        var screening = sample.Screening;
        var (length, pressure) = (Factor(screening, "LENGTHUNIT"), Factor(screening, "PRESSUREUNIT"));
        var items = screening.GetProperty("members").EnumerateArray().GroupBy(m => m.GetProperty("identity").GetProperty("globalId").GetString()!).ToArray();
        Assert.All(items, group =>
        {
            var sets = elements.GetProperty(group.Key).GetProperty("sets");
            var set = sets.GetProperty(SetName);
            var member = group.Count() == 1 ? group.Single() : group.Single(m => m.GetProperty("identity").GetProperty("key").GetString() == Text(set, "Item"));
            Compare(member, set, length, pressure);
            Assert.Equal(screening.GetProperty("runId").GetString(), Text(set, "RunId"));
            Assert.Equal("MemberScan " + screening.GetProperty("version").GetString(), Text(set, "Program"));
            Assert.Equal(group.Count() > 1 ? group.Count() : 0, set.TryGetProperty("ItemCount", out var count) ? count.GetProperty("value").GetInt32() : 0);
            Assert.False(sets.TryGetProperty(SetName + " (2)", out _), "the set stands twice");
        });
        Assert.Equal(items.Length, elements.EnumerateObject().Count(e => e.Value.GetProperty("sets").TryGetProperty(SetName, out _)));
    }

    private static void Compare(JsonElement member, JsonElement set, double length, double pressure)
    {
        Assert.Equal(member.GetProperty("verdict").GetString(), Text(set, "Status"));
        var reason = member.GetProperty("reason");
        if (reason.ValueKind != JsonValueKind.Null)
            Assert.Equal($"{reason.GetProperty("code").GetString()}: {reason.GetProperty("message").GetString()}", Text(set, "Reason"));
        var governing = member.GetProperty("governing");
        if (governing.ValueKind == JsonValueKind.Null)
        {
            Assert.False(set.TryGetProperty("Utilization", out _));
            return;
        }

        var point = governing.GetProperty("point");
        (string Property, string Type, double Value)[] numbers =
        [
            ("Utilization", "IFCRATIOMEASURE", governing.GetProperty("utilization").GetDouble()),
            ("StressLimit", "IFCPRESSUREMEASURE", governing.GetProperty("limit").GetDouble() / pressure),
            ("EquivalentStress", "IFCPRESSUREMEASURE", governing.GetProperty("stress").GetDouble() / pressure),
            ("NormalStress", "IFCPRESSUREMEASURE", point.GetProperty("state").GetProperty("sigma").GetDouble() / pressure),
            ("Station", "IFCLENGTHMEASURE", governing.GetProperty("station").GetDouble() / length),
            ("PointY", "IFCLENGTHMEASURE", point.GetProperty("y").GetDouble() / length),
            ("PointZ", "IFCLENGTHMEASURE", point.GetProperty("z").GetDouble() / length),
        ];
        Assert.All(numbers, n =>
        {
            var single = set.GetProperty(n.Property);
            Assert.Equal(n.Type, single.GetProperty("type").GetString());
            Assert.Equal(n.Value, single.GetProperty("value").GetDouble(), 1e-6 * Math.Abs(n.Value) + 1e-9);
        });
        Assert.True(set.GetProperty("ShearStress").GetProperty("value").GetDouble() >= 0);
        Assert.Equal($"{governing.GetProperty("stress").GetDouble() / 1e6:0.0} MPa".Replace(',', '.'), Text(set, "EquivalentStressText"));
        (string Property, string Key)[] texts = [("Criterion", "criterion"), ("Situation", "situation"), ("ForcesSource", "forcesSource"), ("ShearModel", "shearModel")];
        Assert.All(texts, t => Assert.Equal(governing.GetProperty(t.Key).GetString(), Text(set, t.Property)));
        Assert.Equal(point.GetProperty("place").GetString(), Text(set, "PointName"));
        Assert.Equal(member.GetProperty("sectionSource").GetString(), Text(set, "SectionSource"));
    }

    private static string? Text(JsonElement set, string property) => set.GetProperty(property).GetProperty("value").GetString();

    private static double Factor(JsonElement screening, string unitType) => screening.GetProperty("model").GetProperty("units").EnumerateArray()
        .Single(u => u.GetProperty("unitType").GetString() == unitType).GetProperty("factor").GetDouble();

    private static async Task<JsonDocument> ReadSets(string path)
    {
        var ran = await OtherProgram.Node("web-ifc", "read-sets.mjs", path);
        Assert.True(ran.ExitCode == 0, ran.All);
        return JsonDocument.Parse(ran.Output);
    }
}
