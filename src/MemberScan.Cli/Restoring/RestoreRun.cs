using MemberScan.Cli.Files;
using MemberScan.Ifc.WriteBack;
using MemberScan.Ifc.WriteBack.Earlier;

namespace MemberScan.Cli.Restoring;

/// <summary>One run of the restore command.</summary>
internal static class RestoreRun
{
    /// <summary>Ours are referred to by others; nothing was written.</summary>
    public const int Refused = 1;

    /// <summary>Ours were taken out, but what stays is not the text of the run; or there was nothing to take out.</summary>
    public const int NotOriginal = 2;

    /// <summary>Runs and returns the exit code: 0 original bytes, <see cref="Refused"/>, <see cref="NotOriginal"/>.</summary>
    public static int Execute(string model, string? folder, TextWriter output, TextWriter error)
    {
        if (string.IsNullOrWhiteSpace(model) || folder is not null && string.IsNullOrWhiteSpace(folder))
            throw new Failure(ExitCodes.Usage, "A path is empty; give the model, and what follows --out, a name.");

        var target = OutputNames.For(model, folder).Restored;
        if (Path.GetFullPath(target) == Path.GetFullPath(model))
            throw new Failure(ExitCodes.Usage, $"The output '{target}' would be the input; give another folder with --out DIR.");

        var (bytes, _) = InputFile.ReadModel(model);
        var earlier = EarlierResults.Find(bytes, Path.GetFileName(model));
        if (!earlier.References.IsEmpty)
        {
            error.WriteLine($"Other instances refer to ours: {EarlierWords.Of(earlier.References)}. Nothing was written; take these references out first.");
            return Refused;
        }

        if (earlier.Kind == EarlierKind.None)
        {
            error.WriteLine($"'{Path.GetFileName(model)}' carries no results of MemberScan; nothing was written.");
            return NotOriginal;
        }

        Write(folder, target, earlier.Base);
        output.WriteLine($"{EarlierWords.Count(earlier.Instances)} taken out. {Words(earlier.Kind)}");
        output.WriteLine($"sha256 {ResultBlock.Sha256(earlier.Base.Span)}");
        output.WriteLine($"wrote {target}");
        return earlier.Kind == EarlierKind.Intact ? ExitCodes.WithinLimit : NotOriginal;
    }

    private static string Words(EarlierKind kind) => kind switch
    {
        EarlierKind.Intact => "These are the original bytes: their SHA-256 is the one that the block names.",
        EarlierKind.LinesBehind => "Another program has written lines behind ours; they stay. Without them these are the original bytes.",
        EarlierKind.Rewritten => "Another program has written the whole file anew, so the original bytes cannot be given back; all else is as that program left it.",
        _ => "The rest of the model has changed since the results were written, so these are not the original bytes; all else is as it was found.",
    };

    private static void Write(string? folder, string target, ReadOnlyMemory<byte> content)
    {
        try
        {
            if (folder is not null) Directory.CreateDirectory(folder);
            using var files = new OutputSet();
            files.Add(target, content.Span);
            files.Commit();
        }
        catch (Exception e) when (e is IOException or UnauthorizedAccessException)
        {
            throw new Failure(ExitCodes.InputOutput, $"'{target}' cannot be written: {e.Message} Nothing was changed; give another folder with --out DIR.", e);
        }
    }
}
