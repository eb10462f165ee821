namespace MemberScan.Cli.Files;

/// <summary>Where the outputs of a model go.</summary>
internal sealed record OutputNames(string CheckedModel, string Report, string MembersTable, string RunRecord)
{
    /// <summary>Where the restore command writes.</summary>
    public required string Restored { get; init; }

    private static readonly string[] s_endings = [".gz", ".zip", ".ifczip", ".ifc"];

    /// <summary>Paths beside the model or in another folder; the base name drops the model's endings and one <c>.checked</c>.</summary>
    public static OutputNames For(string modelPath, string? folder)
    {
        var name = Path.GetFileName(modelPath);
        foreach (var ending in s_endings)
            if (name.EndsWith(ending, StringComparison.OrdinalIgnoreCase) && name.Length > ending.Length)
                name = name[..^ending.Length];
        if (name.EndsWith(".checked", StringComparison.OrdinalIgnoreCase) && name.Length > ".checked".Length) name = name[..^".checked".Length];

        var root = Path.Combine(folder ?? Path.GetDirectoryName(Path.GetFullPath(modelPath))!, name);
        return new OutputNames(root + ".checked.ifc", root + ".report.html", root + ".members.csv", root + ".run.json") { Restored = root + ".restored.ifc" };
    }

    /// <summary>The outputs that would be one of the inputs.</summary>
    public IEnumerable<string> Clashes(IEnumerable<string> inputs)
    {
        var taken = inputs.Select(Resolved).ToHashSet(StringComparer.OrdinalIgnoreCase);
        return new[] { CheckedModel, Report, MembersTable, RunRecord }.Where(path => taken.Contains(Resolved(path)));
    }

    /// <summary>Refuses outputs that are an input or one another.</summary>
    /// <exception cref="Failure">Two paths are the same file, or one is empty.</exception>
    public static void RefuseClashes(IReadOnlyList<string> outputs, IEnumerable<string> inputs)
    {
        if (outputs.Any(string.IsNullOrWhiteSpace)) throw new Failure(ExitCodes.Usage, "The path of an output is empty; give a file.");

        var taken = inputs.Where(i => !string.IsNullOrWhiteSpace(i)).Select(Resolved).ToHashSet(StringComparer.OrdinalIgnoreCase);
        foreach (var output in outputs)
            if (!taken.Add(Resolved(output))) throw new Failure(ExitCodes.Usage, $"The output '{output}' would be an input or another output of this run; give another file.");
    }

    /// <summary>The path behind all links: a folder given by another name may be the folder of the model.</summary>
    private static string Resolved(string path)
    {
        var full = Path.GetFullPath(path);
        var resolved = Path.GetPathRoot(full)!;
        foreach (var part in full[resolved.Length..].Split(Path.DirectorySeparatorChar, StringSplitOptions.RemoveEmptyEntries))
        {
            resolved = Path.Combine(resolved, part);
            if (Path.Exists(resolved)) resolved = new FileInfo(resolved).ResolveLinkTarget(returnFinalTarget: true)?.FullName ?? resolved;
        }

        return resolved;
    }
}
