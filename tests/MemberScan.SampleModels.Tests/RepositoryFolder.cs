namespace MemberScan.SampleModels.Tests;

/// <summary>Folders of the working copy and beside it.</summary>
internal static class RepositoryFolder
{
    /// <summary>The folder that holds the solution.</summary>
    public static string Root { get; } = Upwards("MemberScan.sln") ?? throw new DirectoryNotFoundException("The tests run outside the repository.");

    /// <summary>A file in a folder of references beside the repository; null where it is absent.</summary>
    public static string? Reference(params string[] parts) =>
        Upwards(Path.Combine(["shared", .. parts])) is { } root ? Path.Combine([root, "shared", .. parts]) : null;

    private static string? Upwards(string entry)
    {
        for (var folder = new DirectoryInfo(AppContext.BaseDirectory); folder is not null; folder = folder.Parent)
            if (Path.Exists(Path.Combine(folder.FullName, entry))) return folder.FullName;
        return null;
    }
}
