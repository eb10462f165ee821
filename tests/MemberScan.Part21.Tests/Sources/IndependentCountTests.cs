using System.Diagnostics;
using System.Text;
using System.Text.Json;
using MemberScan.Foundation.Diagnostics;
using MemberScan.OpenModels;

namespace MemberScan.Part21.Tests.Sources;

/// <summary>Numbers of instances against web-ifc, a parser that shares no code with this project.</summary>
public sealed class IndependentCountTests
{
    [Theory]
    [InlineData("balcony-railings-ifc2x3.ifc")]
    [InlineData("beams-six-profiles-ifc4.ifc")]
    [InlineData("columns-on-grid-ifc4x3.ifc")]
    [InlineData("concrete-frame-spanish-ifc2x3.ifc")]
    [InlineData("house-german-ifc4.ifc")]
    [InlineData("steel-frame-drawn-sections-ifc2x3.ifc")]
    [InlineData("structural-portal-frame-results-ifc4.ifc")]
    public async Task An_independent_parser_finds_as_many_instances(string name)
    {
        var path = OpenModel.Path(name);
        using var index = Part21Index.Open(path, [], new DiagnosticList());

        using var read = await ReadWithWebIfc(path);

        Assert.Equal(read.RootElement.GetProperty("lines").GetInt64(), index.Count);
    }

    private static async Task<JsonDocument> ReadWithWebIfc(string path)
    {
        var folder = WebIfcFolder();
        Assert.SkipWhen(folder is null, "web-ifc is not installed: run npm ci in tests/web-ifc");
        var start = new ProcessStartInfo("node") { RedirectStandardOutput = true, RedirectStandardError = true, StandardOutputEncoding = Encoding.UTF8 };
        start.ArgumentList.Add(Path.Combine(folder!, "read-sets.mjs"));
        start.ArgumentList.Add(path);
        using var process = Process.Start(start)!;

        var error = process.StandardError.ReadToEndAsync(TestContext.Current.CancellationToken);
        var output = await process.StandardOutput.ReadToEndAsync(TestContext.Current.CancellationToken);
        await process.WaitForExitAsync(TestContext.Current.CancellationToken);

        Assert.True(process.ExitCode == 0, await error);
        return JsonDocument.Parse(output);
    }

    private static string? WebIfcFolder()
    {
        for (var folder = new DirectoryInfo(AppContext.BaseDirectory); folder is not null; folder = folder.Parent)
        {
            var candidate = Path.Combine(folder.FullName, "tests", "web-ifc");
            if (Directory.Exists(Path.Combine(candidate, "node_modules", "web-ifc"))) return candidate;
        }

        return null;
    }
}
