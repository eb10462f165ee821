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
        using var stream = new FileStream(target + PartEnding, FileMode.Create, FileAccess.Write, FileShare.None);
        _targets.Add(target);
        stream.Write(content);
        stream.Flush(flushToDisk: true);
    }

    /// <summary>Puts all files in place. When one cannot be, those that were there before are put back and nothing new stays.</summary>
    /// <param name="stale">A file of an earlier run that this run has no successor for; removed together.</param>
    public void Commit(string? stale = null)
    {
        var replaced = new List<string>(_targets);
        if (stale is not null) replaced.Add(stale);

        var setAside = new List<string>();
        var placed = new List<string>();
        try
        {
            foreach (var target in replaced.Where(File.Exists))
            {
                File.Move(target, target + EarlierEnding, overwrite: true);
                setAside.Add(target);
            }

            foreach (var target in _targets)
            {
                File.Move(target + PartEnding, target);
                placed.Add(target);
            }
        }
        catch
        {
            foreach (var target in placed) File.Delete(target);
            foreach (var target in setAside) File.Move(target + EarlierEnding, target, overwrite: true);
            throw;
        }

        foreach (var target in setAside) File.Delete(target + EarlierEnding);
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
