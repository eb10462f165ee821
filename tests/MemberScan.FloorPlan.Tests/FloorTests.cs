using System.Reflection.Metadata;
using System.Reflection.PortableExecutable;

namespace MemberScan.FloorPlan.Tests;

/// <summary>The floors of the house, on the built assemblies: a project refers to lower floors only, never to its own.</summary>
public sealed class FloorTests
{
    private static readonly Dictionary<string, int> s_floors = new(StringComparer.Ordinal)
    {
        ["MemberScan.Foundation"] = 0,
        ["MemberScan.Part21"] = 1,
        ["MemberScan.Mechanics"] = 1,
        ["MemberScan.Model"] = 2,
        ["MemberScan.Ifc"] = 3,
        ["MemberScan.Inputs"] = 3,
        ["MemberScan.Statics"] = 3,
        ["MemberScan.Checks"] = 3,
        ["MemberScan.Screening"] = 4,
        ["MemberScan.Reporting"] = 5,
        ["memberscan"] = 6,
        ["MemberScan.Web"] = 6,
    };

    /// <summary>Assembly names of the projects that stand in src; the command line's assembly has a name of its own.</summary>
    public static TheoryData<string> Projects =>
        [.. Directory.GetDirectories(Path.Combine(SourceTree.Root, "src")).Select(d => Path.GetFileName(d)!).Where(n => n.StartsWith("MemberScan.", StringComparison.Ordinal))
            .Order(StringComparer.Ordinal).Select(n => n == "MemberScan.Cli" ? "memberscan" : n)];

    [Theory]
    [MemberData(nameof(Projects))]
    public void A_project_has_its_floor_and_refers_to_lower_floors_only(string assembly)
    {
        Assert.True(s_floors.TryGetValue(assembly, out var floor), $"{assembly} has no floor in the plan");

        var references = References(assembly).Where(IsOurs).ToArray();

        Assert.All(references, reference => Assert.True(s_floors.TryGetValue(reference, out var other) && other < floor, $"{assembly} (floor {floor}) refers to {reference}"));
    }

    /// <summary>The project files too: a reference that no code uses leaves no trace in the assembly.</summary>
    [Theory]
    [MemberData(nameof(Projects))]
    public void A_project_file_names_lower_floors_only(string assembly)
    {
        var folder = assembly == "memberscan" ? "MemberScan.Cli" : assembly;
        var file = System.Xml.Linq.XDocument.Parse(SourceTree.Text($"src/{folder}/{folder}.csproj"));

        var references = file.Descendants("ProjectReference").Select(r => Path.GetFileNameWithoutExtension(r.Attribute("Include")!.Value.Replace('\\', '/'))).ToArray();

        Assert.All(references, reference => Assert.True(s_floors[reference] < s_floors[assembly], $"{folder} names {reference}"));
    }

    [Fact]
    public void The_lowest_floor_refers_to_none_of_ours()
    {
        var references = References("MemberScan.Foundation").ToArray();

        Assert.NotEmpty(references);
        Assert.DoesNotContain(references, IsOurs);
    }

    private static bool IsOurs(string name) => name.StartsWith("MemberScan", StringComparison.OrdinalIgnoreCase);

    private static IEnumerable<string> References(string assembly)
    {
        using var stream = File.OpenRead(Path.Combine(AppContext.BaseDirectory, assembly + ".dll"));
        using var image = new PEReader(stream);
        var metadata = image.GetMetadataReader();
        return [.. metadata.AssemblyReferences.Select(handle => metadata.GetString(metadata.GetAssemblyReference(handle).Name))];
    }
}
