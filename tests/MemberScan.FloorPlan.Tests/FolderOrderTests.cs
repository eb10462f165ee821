using System.Text.RegularExpressions;

namespace MemberScan.FloorPlan.Tests;

/// <summary>Inside a project too the way goes in one direction: folders whose namespaces use each other are one folder.</summary>
public sealed class FolderOrderTests
{
    [Theory]
    [InlineData("MemberScan.Mechanics")]
    public void No_folder_of_a_project_is_used_by_a_folder_that_it_uses(string project)
    {
        var uses = SourceTree.Sources.Where(file => file.StartsWith($"src/{project}/", StringComparison.Ordinal))
            .SelectMany(file => Using(project).Matches(SourceTree.Text(file)).Select(match => (From: FolderOf(file), To: match.Groups[1].Value)))
            .Where(use => use.From != use.To).ToLookup(use => use.From, use => use.To, StringComparer.Ordinal);

        Assert.NotEmpty(uses);
        foreach (var folder in uses.Select(group => group.Key)) Assert.DoesNotContain(folder, Reached(uses, folder));
    }

    private static HashSet<string> Reached(ILookup<string, string> uses, string from)
    {
        var (reached, open) = (new HashSet<string>(StringComparer.Ordinal), new Stack<string>(uses[from]));
        while (open.TryPop(out var folder))
            if (reached.Add(folder))
                foreach (var next in uses[folder]) open.Push(next);
        return reached;
    }

    private static string FolderOf(string file) => file.Split('/')[^2];

    private static Regex Using(string project) => new($@"^using {Regex.Escape(project)}\.([\w.]+);", RegexOptions.Multiline);
}
