namespace MemberScan.Cli.Files;

/// <summary>Files that appear together, whole or not at all: written beside their targets, flushed, then renamed.</summary>
internal sealed class OutputSet : IDisposable
{
    private const string PartEnding = ".memberscan-part";
    private const string EarlierEnding = ".memberscan-earlier";

    private readonly List<string> _targets = [];

    /// <summary>Writes a file beside its target; nothing shows under the target's name yet.</summary>
    /// <exception cref="IOException">The folder or the disk does not take it.</exception>
    public void Add(string target, ReadOnlySpan<byte> content)
    {
        using var stream = Begin(target);
        stream.Write(content);
        stream.Flush(flushToDisk: true);
    }

    /// <summary>As <see cref="Add(string, ReadOnlySpan{byte})"/>, written by a caller.</summary>
    public void Add(string target, Action<FileStream> write)
    {
        using var stream = Begin(target);
        write(stream);
        stream.Flush(flushToDisk: true);
    }

    private FileStream Begin(string target)
    {
        File.Delete(target + EarlierEnding);                          // a killed run may have left it
        var stream = new FileStream(target + PartEnding, FileMode.Create, FileAccess.Write, FileShare.None);
        _targets.Add(target);
        return stream;
    }

    /// <summary>Puts all files in place, each in one step: at no moment is there half a file or none. When one cannot be, those that were there before are put back and nothing new stays.</summary>
    /// <param name="stale">Files of an earlier run that this run has no successor for; removed together.</param>
    public void Commit(params ReadOnlySpan<string?> stale)
    {
        var placed = new List<(string Target, bool HadEarlier)>();
        try
        {
            foreach (var target in _targets)
            {
                var hasEarlier = File.Exists(target);
                if (hasEarlier) File.Replace(target + PartEnding, target, target + EarlierEnding);
                else File.Move(target + PartEnding, target);
                placed.Add((target, hasEarlier));
            }

            foreach (var path in stale)
                if (path is not null)
                    foreach (var ending in new[] { "", PartEnding, EarlierEnding }) File.Delete(path + ending);
        }
        catch
        {
            foreach (var (target, hadEarlier) in placed)
                if (hadEarlier) File.Move(target + EarlierEnding, target, overwrite: true);
                else File.Delete(target);
            throw;
        }

        foreach (var (target, hadEarlier) in placed) if (hadEarlier) File.Delete(target + EarlierEnding);
        _targets.Clear();
    }

    /// <summary>Removes what was written but not put in place.</summary>
    public void Dispose()
    {
        foreach (var target in _targets)
        {
            try
            {
                File.Delete(target + PartEnding);
            }
            catch (Exception e) when (e is IOException or UnauthorizedAccessException)
            {
                // The run has already failed for a reason that is told; a part that stays is replaced by the next run.
            }
        }
    }
}
