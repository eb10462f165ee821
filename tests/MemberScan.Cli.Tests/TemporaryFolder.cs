namespace MemberScan.Cli.Tests;

/// <summary>A folder that goes away with the test.</summary>
internal sealed class TemporaryFolder : IDisposable
{
    /// <summary>Its path.</summary>
    public string Path { get; } = Directory.CreateTempSubdirectory("memberscan-").FullName;

    /// <summary>Names of its files, those of folders below included.</summary>
    public IEnumerable<string> Names => Directory.EnumerateFileSystemEntries(Path).Select(p => System.IO.Path.GetFileName(p)).Order(StringComparer.Ordinal);

    /// <summary>Path of an entry.</summary>
    public string this[string name] => System.IO.Path.Combine(Path, name);

    /// <summary>Writes a file and gives its path.</summary>
    public string Write(string name, ReadOnlySpan<byte> content)
    {
        File.WriteAllBytes(this[name], content);
        return this[name];
    }

    /// <summary>Writes a text and gives its path.</summary>
    public string Write(string name, string content) => Write(name, System.Text.Encoding.UTF8.GetBytes(content));

    /// <inheritdoc/>
    public void Dispose() => Directory.Delete(Path, recursive: true);
}
