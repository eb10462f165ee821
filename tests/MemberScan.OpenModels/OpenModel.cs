using Xunit;

namespace MemberScan.OpenModels;

/// <summary>Real IFC files by others, in a folder beside the project; never copied into it and never changed.</summary>
public static class OpenModel
{
    private static readonly Lazy<string?> s_folder = new(Find);

    /// <summary>Files of the folder that hold a model; empty where the folder is absent.</summary>
    public static IReadOnlyList<string> All =>
        s_folder.Value is { } folder
            ? [.. Directory.EnumerateFiles(folder).Where(f => f.Contains(".ifc", StringComparison.OrdinalIgnoreCase)).Order(StringComparer.Ordinal)]
            : [];

    /// <summary>Path of a model by its file name; skips the running test, saying so, where the folder is absent.</summary>
    public static string Path(string fileName)
    {
        SkipIfAbsent();
        return System.IO.Path.Combine(s_folder.Value!, fileName);
    }

    /// <summary>Skips the running test, saying so, where the folder is absent.</summary>
    public static void SkipIfAbsent() => Assert.SkipWhen(s_folder.Value is null, "the folder of open models (shared/open-models) is absent");

    private static string? Find()
    {
        for (var folder = new DirectoryInfo(AppContext.BaseDirectory); folder is not null; folder = folder.Parent)
        {
            var candidate = System.IO.Path.Combine(folder.FullName, "shared", "open-models");
            if (Directory.Exists(candidate)) return candidate;
        }

        return null;
    }
}
