using System.Text.RegularExpressions;

namespace MemberScan.FloorPlan.Tests;

/// <summary>Where things stand: top level, folders, one public type a file, lock files.</summary>
public sealed partial class LayoutTests
{
    private const int FilesInAFolder = 12;
    private const int FoldersBelowAProject = 2;

    private static readonly string[] s_topLevel = ["README.md", "DEVELOPERS.md", "LICENSE", "MemberScan.sln", "src", "tests", "sample-models", "config"];
    private static readonly string[] s_drawers = ["Helpers", "Utils", "Utilities", "Common", "Extensions", "Internal", "Internals", "Core", "Misc", "Shared"];

    [Fact]
    public void The_top_level_holds_what_was_agreed_and_files_that_begin_with_a_dot()
    {
        var entries = SourceTree.Files.Select(f => f.Split('/')[0]).Distinct(StringComparer.Ordinal);

        Assert.All(entries, entry => Assert.True(entry.StartsWith('.') || s_topLevel.Contains(entry, StringComparer.Ordinal), $"{entry} stands at the top level"));
    }

    [Fact]
    public void No_folder_under_src_is_a_drawer()
    {
        var folders = SourceTree.Files.Where(f => f.StartsWith("src/", StringComparison.Ordinal)).SelectMany(f => f.Split('/')[..^1]).Distinct(StringComparer.Ordinal).ToArray();

        Assert.NotEmpty(folders);
        Assert.All(folders, folder => Assert.DoesNotContain(folder.Split('.')[^1], s_drawers, StringComparer.OrdinalIgnoreCase));
    }

    [Fact]
    public void A_folder_under_src_holds_twelve_source_files_at_most_and_lies_two_below_its_project_at_most()
    {
        var sources = SourceTree.Files.Where(f => f.StartsWith("src/", StringComparison.Ordinal) && (f.EndsWith(".cs", StringComparison.Ordinal) || f.EndsWith(".razor", StringComparison.Ordinal))).ToArray();

        var folders = sources.GroupBy(f => f[..f.LastIndexOf('/')]);

        Assert.All(folders, folder =>
        {
            Assert.True(folder.Count() <= FilesInAFolder, $"{folder.Key} holds {folder.Count()} source files");
            Assert.True(folder.Key.Split('/').Length <= 2 + FoldersBelowAProject, $"{folder.Key} lies too deep");
        });
    }

    [Fact]
    public void A_source_file_holds_one_public_type_of_its_own_name_in_the_namespace_of_its_folder()
    {
        var faults = new List<string>();
        foreach (var file in SourceTree.Sources)
        {
            var text = SourceTree.Text(file);
            var types = TopLevelPublicType().Matches(text).Select(m => m.Groups[1].Value).Distinct(StringComparer.Ordinal).ToArray();
            var name = file.Split('/')[^1].Split('.')[0];
            if (types.Length > 1) faults.Add($"{file}: {string.Join(", ", types)}");
            if (types.Length == 1 && types[0] != name) faults.Add($"{file}: {types[0]}");

            var expected = string.Join('.', file.Split('/')[1..^1]);
            var declared = Namespace().Match(text) is { Success: true } match ? match.Groups[1].Value : null;
            if (declared is not null && declared != expected) faults.Add($"{file}: namespace {declared}");
        }

        Assert.NotEmpty(SourceTree.Sources);
        Assert.Empty(faults);
    }

    [Fact]
    public void Every_project_has_its_lock_file_and_stands_in_the_solution()
    {
        var projects = SourceTree.Files.Where(f => f.EndsWith(".csproj", StringComparison.Ordinal)).ToArray();
        var solution = SourceTree.Text("MemberScan.sln").Replace('\\', '/');

        Assert.NotEmpty(projects);
        Assert.All(projects, project =>
        {
            Assert.Contains(project[..project.LastIndexOf('/')] + "/packages.lock.json", SourceTree.Files);
            Assert.Contains($"\"{project}\"", solution, StringComparison.Ordinal);
        });
    }

    [Fact]
    public void Every_project_of_src_has_its_tests()
    {
        var projects = SourceTree.Files.Where(f => f.StartsWith("src/", StringComparison.Ordinal) && f.EndsWith(".csproj", StringComparison.Ordinal))
            .Select(f => Path.GetFileNameWithoutExtension(f));

        Assert.All(projects, project => Assert.Contains($"tests/{project}.Tests/{project}.Tests.csproj", SourceTree.Files));
    }

    [GeneratedRegex(@"^public (?:(?:static|sealed|abstract|readonly|partial|ref|unsafe) )*(?:class|struct|interface|enum|delegate|record(?: struct| class)?) (?:\w+ (?=\w+\())?(\w+)", RegexOptions.Multiline)]
    private static partial Regex TopLevelPublicType();

    [GeneratedRegex(@"^namespace ([\w.]+);", RegexOptions.Multiline)]
    private static partial Regex Namespace();
}
