using System.Diagnostics;
using System.Globalization;
using MemberScan.Reporting.Display;
using MemberScan.Reporting.Tests;

namespace MemberScan.Browser.Tests;

/// <summary>The page's scripts: types hold, numbers read as in the fixed part of the page.</summary>
public sealed class ScriptTests(Chromium chromium) : IClassFixture<Chromium>
{
    [Fact]
    public async Task Writes_every_number_as_the_fixed_part_of_the_page_does()
    {
        var random = new Random(20_310_402);
        double[] values =
        [
            0, 1, -1, 1 + 2e-9, 1 - 1e-7, 0.9995, 0.99949, 1.0005, 1e-4, 9.9995e-5, 12345.5, 99995, 123456789.5, 1e14, 9.9999e14, 1e15, 2.5, 0.5, 0.0005, -0.0004,
            .. Enumerable.Range(-2000, 4000).Select(k => k / 16.0), .. Enumerable.Range(0, 500).Select(k => 10_005.0 + 10 * k),
            .. Enumerable.Range(0, 3000).Select(_ => (random.NextDouble() - 0.5) * Math.Pow(10, random.Next(-8, 17))),
        ];
        await using var report = await chromium.Open(FerryLanding.Small());

        var shown = await report.Page.EvaluateAsync<string[]>(
            "values => values.flatMap(v => [memberScan.figures.significant(v), memberScan.figures.fixed(v, 3), memberScan.figures.utilization(v), memberScan.figures.inUnit(v, { symbol: 'x', size: 1e3 })])", values);

        var unit = new ShownUnit("x", 1e3);
        Assert.Equal(values.SelectMany(v => new[] { Figures.Significant(v), Figures.Fixed(v, 3), Figures.Utilization(v), unit.Figure(v) }), shown);
    }

    [Fact]
    public async Task Shows_the_utilization_of_the_record_in_each_row()
    {
        var record = FerryLanding.Small();
        await using var report = await chromium.Open(record);

        var rows = await report.Page.EvaluateAsync<string[]>("() => [...document.querySelectorAll('#table-rows .row')].map(r => r.id.slice(4) + ' ' + r.children[1].textContent)");

        Assert.Equal(
            record.Members.Select((m, i) => string.Create(CultureInfo.InvariantCulture, $"{i} {(m.Governing is { } g ? Figures.Utilization(g.Utilization) : "")}")).Order(StringComparer.Ordinal),
            rows.Order(StringComparer.Ordinal));
    }

    [Fact]
    public void Holds_its_types()
    {
        var folder = Path.Combine(Root(), "tests", "MemberScan.Browser.Tests", "types");
        Assert.True(Directory.Exists(Path.Combine(folder, "node_modules", "typescript")), "The type check needs 'npm ci' in tests/MemberScan.Browser.Tests/types; tests/run.sh does it.");
        var start = new ProcessStartInfo("node") { WorkingDirectory = folder, RedirectStandardOutput = true, UseShellExecute = false };
        foreach (var argument in new[] { "node_modules/typescript/bin/tsc", "-p", ".", "--listFiles" }) start.ArgumentList.Add(argument);

        using var process = Process.Start(start) ?? throw new InvalidOperationException("The type check needs Node.js ('node').");
        var output = process.StandardOutput.ReadToEnd();
        process.WaitForExit();

        Assert.True(process.ExitCode == 0, output);
        Assert.Contains("table.js", output, StringComparison.Ordinal);
        Assert.Contains("view.js", output, StringComparison.Ordinal);
    }

    private static string Root()
    {
        var folder = new DirectoryInfo(AppContext.BaseDirectory);
        while (folder is not null && !File.Exists(Path.Combine(folder.FullName, "MemberScan.sln"))) folder = folder.Parent;
        return folder?.FullName ?? throw new InvalidOperationException("The tests run outside of the project.");
    }
}
