using System.Globalization;
using System.Text.RegularExpressions;
using MemberScan.Foundation.Diagnostics;
using MemberScan.Ifc.Curves;
using MemberScan.Ifc.Geometry;
using MemberScan.Ifc.Materials;
using MemberScan.Ifc.Sections;
using MemberScan.Ifc.Units;
using MemberScan.Model.Rules;
using MemberScan.OpenModels;
using MemberScan.Part21;

namespace MemberScan.Ifc.Tests.OpenModels;

/// <summary>
/// Profiles and materials of every real file, as the readers meet them, against the counts of a scanner that shares no code with them
/// (INVENTORY.md beside the files, lines "profiles" and "materials").
/// </summary>
public sealed partial class InventoryTests
{
    [Fact]
    public void Every_profile_and_material_that_the_inventory_counts_is_read_or_has_a_reason()
    {
        OpenModel.SkipIfAbsent();

        var files = 0;
        var found = new List<string>();
        foreach (var (file, lines) in Inventory())
        {
            if (!OpenModel.All.Any(path => Path.GetFileName(path) == file)) continue;

            var diagnostics = new DiagnosticList();
            var text = Part21File.Read(ModelContainer.Read(OpenModel.Path(file)).Bytes, file, diagnostics);
            if (!lines.ContainsKey("profiles") && !lines.ContainsKey("materials")) continue;

            files++;
            var instances = new Instances(text);
            var unitReader = new UnitReader(instances, diagnostics);
            var units = ModelUnits.Read(instances, unitReader, new ReadingRules(), diagnostics);
            var placements = new PlacementReader(instances, units);
            var profiles = new ProfileReader(instances, placements, new CurveReader(instances, placements, units), units);
            foreach (var (kind, count) in lines.GetValueOrDefault("profiles", []))
            {
                var read = text.RecordsOf("IFC" + kind).Select(profiles.Read).ToList();
                Assert.True(count == read.Count, $"{file}: {kind} {read.Count}, inventory {count}");
                var sections = read.Count(r => r.TryGet(out _, out _));
                Assert.All(read, r => Assert.True(r.TryGet(out _, out var why) || why.Message.Length > 0));
                found.Add(string.Create(CultureInfo.InvariantCulture, $"{file} {kind} {sections} of {count}"));
            }

            var facts = new MaterialFactsReader(instances, units, unitReader);
            var materials = lines.GetValueOrDefault("materials", []);
            Assert.Equal(materials.GetValueOrDefault("MATERIAL"), text.RecordsOf("IFCMATERIAL").Select(m => facts.Read(m, [])).Count(m => m.Name.Length > 0));
            Assert.Equal(materials.GetValueOrDefault("RELASSOCIATESMATERIAL"), text.RecordsOf("IFCRELASSOCIATESMATERIAL").Count(r => instances.TryFollow(r[5], out _)));
        }

        Assert.Equal(18, files);
        var reviewed = GoldenTableTests.Reviewed("profiles");
        if (!reviewed.SequenceEqual(found, StringComparer.Ordinal)) GoldenTableTests.Keep("profiles", found);
        Assert.Equal(reviewed, found);
    }

    /// <summary>For each file the counts of its lines, by keyword.</summary>
    private static IEnumerable<(string File, Dictionary<string, Dictionary<string, int>> Lines)> Inventory()
    {
        var text = File.ReadAllText(OpenModel.Path("INVENTORY.md"));
        foreach (var section in text.Split("\n## ").Skip(1))
        {
            var lines = section.Split('\n');
            var counts = lines.Select(line => Line().Match(line)).Where(m => m.Success)
                .ToDictionary(m => m.Groups[1].Value, m => Count().Matches(m.Groups[2].Value).ToDictionary(c => c.Groups[1].Value, c => int.Parse(c.Groups[2].Value, CultureInfo.InvariantCulture)));
            yield return (lines[0].Trim(), counts);
        }
    }

    [GeneratedRegex("^- (profiles|materials): (.*)$")]
    private static partial Regex Line();

    [GeneratedRegex("([A-Z]+) ([0-9]+)")]
    private static partial Regex Count();
}
