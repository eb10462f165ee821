namespace MemberScan.Cli.Queue;

/// <summary>The folder that enqueuer and workers share, each maybe under another name; nothing outside of it is named by a job.</summary>
internal sealed class SharedRoot
{
    private readonly string _folder;

    /// <summary>A root.</summary>
    /// <exception cref="Failure">The folder does not exist.</exception>
    public SharedRoot(string folder)
    {
        if (string.IsNullOrWhiteSpace(folder) || !Directory.Exists(folder)) throw new Failure(ExitCodes.Usage, $"The folder '{folder}' after --root does not exist; give the folder that holds the models.");
        _folder = Path.TrimEndingDirectorySeparator(Path.GetFullPath(folder));
    }

    /// <summary>The path of a file as a job names it.</summary>
    /// <exception cref="Failure">The file lies outside of the root.</exception>
    public string NameOf(string path)
    {
        var relative = Path.GetRelativePath(_folder, Path.GetFullPath(path)).Replace('\\', '/');
        return IsInside(relative) ? relative : throw new Failure(ExitCodes.Usage, $"'{path}' lies outside of the folder '{_folder}' that the workers see; give that folder with --root DIR, or move the file.");
    }

    /// <summary>The file that a job names.</summary>
    /// <exception cref="Failure">The name leads outside of the root, by itself or by a link.</exception>
    public string PathOf(string name)
    {
        if (!IsInside(name)) throw new Failure(ExitCodes.Usage, $"The job names '{name}', which is no path below the shared folder.");

        var path = Path.Combine(_folder, name);
        var target = File.Exists(path) ? new FileInfo(path).ResolveLinkTarget(returnFinalTarget: true)?.FullName : null;
        return target is null || target.StartsWith(_folder + Path.DirectorySeparatorChar, StringComparison.Ordinal)
            ? path
            : throw new Failure(ExitCodes.Usage, $"'{name}' is a link that leads outside of the shared folder.");
    }

    private static bool IsInside(string name) =>
        name.Length > 0 && !Path.IsPathRooted(name) && !name.Contains('\0', StringComparison.Ordinal) && !name.Contains('\\', StringComparison.Ordinal) && name.Split('/').All(part => part is not ("" or "." or ".."));
}
