using System.Diagnostics;

namespace MemberScan.FloorPlan.Tests;

/// <summary>The files of the project as its version control knows them.</summary>
internal static class SourceTree
{
    private static readonly Lazy<string[]> s_files = new(Tracked);

    /// <summary>The folder that holds the solution.</summary>
    public static string Root { get; } = FindRoot();

    /// <summary>Every tracked file that stands in the working copy, relative, with slashes.</summary>
    public static IReadOnlyList<string> Files => s_files.Value;

    /// <summary>Text of a tracked file.</summary>
    public static string Text(string file) => File.ReadAllText(Path.Combine(Root, file));

    /// <summary>Tracked C# files of <c>src</c>.</summary>
    public static IEnumerable<string> Sources => Files.Where(f => f.StartsWith("src/", StringComparison.Ordinal) && f.EndsWith(".cs", StringComparison.Ordinal));

    private static string FindRoot()
    {
        for (var folder = new DirectoryInfo(AppContext.BaseDirectory); folder is not null; folder = folder.Parent)
            if (File.Exists(Path.Combine(folder.FullName, "MemberScan.sln"))) return folder.FullName;
        throw new DirectoryNotFoundException("The tests run outside the repository.");
    }

    // Without version control (an unpacked archive) the files themselves are the list, less what a build leaves behind.
    private static string[] Tracked()
    {
        var listed = Path.Exists(Path.Combine(Root, ".git")) ? Git("ls-files", "-z", "--cached", "--others", "--exclude-standard") : null;
        var files = listed?.Split('\0', StringSplitOptions.RemoveEmptyEntries)
            ?? [.. Directory.EnumerateFiles(Root, "*", SearchOption.AllDirectories).Select(f => Path.GetRelativePath(Root, f).Replace('\\', '/'))
                .Where(f => !f.Split('/').Any(part => part is "bin" or "obj" or ".artifacts" or "node_modules"))];
        return [.. files.Where(f => File.Exists(Path.Combine(Root, f))).Order(StringComparer.Ordinal)];
    }

    private static string? Git(params string[] arguments)
    {
        var start = new ProcessStartInfo("git") { RedirectStandardOutput = true, RedirectStandardError = true, WorkingDirectory = Root };
        foreach (var argument in arguments) start.ArgumentList.Add(argument);
        try
        {
            using var process = Process.Start(start)!;
            var error = process.StandardError.ReadToEndAsync();
            var output = process.StandardOutput.ReadToEnd();
            process.WaitForExit();
            error.Wait();
            return process.ExitCode == 0 ? output : null;
        }
        catch (System.ComponentModel.Win32Exception)
        {
            return null;
        }
    }
}
