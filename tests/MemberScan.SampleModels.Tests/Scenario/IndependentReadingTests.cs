using System.Diagnostics;
using System.Text;
using System.Text.Json;
using MemberScan.SampleModels.Scenario;
using MemberScan.SampleModels.Tests.Writing;

namespace MemberScan.SampleModels.Tests.Scenario;

/// <summary>The samples as an independent parser (the npm package web-ifc) reads them.</summary>
public sealed class IndependentReadingTests
{
    [Theory]
    [InlineData(GangwayRails.Name, "IFC4", "P-05", "Geländerpfosten A5 ('Nord')", "Pset_MemberCommon", "Span", "1100", "IFCPOSITIVELENGTHMEASURE")]
    [InlineData(DeckHangers.Name, "IFC2X3", "HR-03", "Hanger rod 3 (吊桿)", "Pset_LandingHanger", "Spacing", "60", "IFCLENGTHMEASURE")]
    [InlineData(MastStays.Name, "IFC4X3_ADD2", "S-5", "Abspannstab 'quer' 纜索 🚢", "Landing_Stay", "Pretension", "5000", "IFCFORCEMEASURE")]
    public async Task Property_sets_come_back(
        string sampleName, string schema, string tag, string elementName, string setName, string property, string value, string type)
    {
        var sample = Samples.Named(sampleName);
        var member = sample.Members.Single(m => m.Tag == tag);

        using var read = await ReadSets(sampleName + ".ifc");

        var root = read.RootElement;
        Assert.Equal(schema, root.GetProperty("schema").GetString());
        Assert.Equal(new WrittenFile(sample.Model).Instances.Count, root.GetProperty("lines").GetInt32());
        var element = root.GetProperty("elements").GetProperty(member.Key);
        Assert.Equal(elementName, element.GetProperty("name").GetString());
        var single = element.GetProperty("sets").GetProperty(setName).GetProperty(property);
        Assert.Equal(value, single.GetProperty("value").GetRawText());
        Assert.Equal(type, single.GetProperty("type").GetString());
    }

    private static async Task<JsonDocument> ReadSets(string fileName)
    {
        var folder = Path.Combine(RepositoryFolder.Root, "tests", "web-ifc");
        Assert.SkipUnless(Directory.Exists(Path.Combine(folder, "node_modules", "web-ifc")), "web-ifc is not installed: run npm ci in tests/web-ifc");
        var start = new ProcessStartInfo("node") { RedirectStandardOutput = true, RedirectStandardError = true, StandardOutputEncoding = Encoding.UTF8 };
        start.ArgumentList.Add(Path.Combine(folder, "read-sets.mjs"));
        start.ArgumentList.Add(Path.Combine(RepositoryFolder.Root, "sample-models", fileName));
        using var process = Process.Start(start)!;

        var error = process.StandardError.ReadToEndAsync(TestContext.Current.CancellationToken);
        var output = await process.StandardOutput.ReadToEndAsync(TestContext.Current.CancellationToken);
        await process.WaitForExitAsync(TestContext.Current.CancellationToken);

        Assert.True(process.ExitCode == 0, await error);
        return JsonDocument.Parse(output);
    }
}
