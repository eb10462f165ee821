using MemberScan.Foundation.Diagnostics;

namespace MemberScan.Part21;

/// <summary>An exchange structure of ISO 10303-21: its bytes and where each instance stands. Nothing is decoded before it is asked for.</summary>
/// <remarks>Immutable after reading; safe for several threads.</remarks>
public sealed class Part21File
{
    /// <summary>Name of the file, without folder; for spans and messages.</summary>
    public string Name => throw new NotImplementedException();

    /// <summary>The bytes as read; never changed.</summary>
    public ReadOnlyMemory<byte> Bytes => throw new NotImplementedException();

    /// <summary>The header section.</summary>
    public Part21Header Header => throw new NotImplementedException();

    /// <summary>Whether the text was understood to the end of its one exchange structure; false for truncated text or several structures in one file.</summary>
    public bool ReadToEnd => throw new NotImplementedException();

    /// <summary>Whether anything was passed over as damaged.</summary>
    public bool HasDamage => throw new NotImplementedException();

    /// <summary>Number of instances indexed.</summary>
    public int Count => throw new NotImplementedException();

    /// <summary>Highest instance number met, also among references to nothing; 0 if none.</summary>
    public ulong HighestId => throw new NotImplementedException();

    /// <summary>Offset of the <c>E</c> of the last data section's <c>ENDSEC</c>; −1 when the text has none.</summary>
    public long InsertionOffset => throw new NotImplementedException();

    /// <summary>Line end in use: CR LF, or LF when the text has no line end.</summary>
    public string LineEnd => throw new NotImplementedException();

    /// <summary>All instances in file order.</summary>
    public IEnumerable<Part21Record> Records => throw new NotImplementedException();

    /// <summary>Reads the structure. Damage is told in <paramref name="diagnostics"/>, never thrown.</summary>
    /// <param name="bytes">The whole text.</param>
    /// <param name="name">Name for spans.</param>
    /// <param name="diagnostics">Receives findings with codes <c>P21-…</c>.</param>
    public static Part21File Read(ReadOnlyMemory<byte> bytes, string name, DiagnosticList diagnostics) => throw new NotImplementedException();

    /// <summary>Instances of a keyword in file order; the keyword upper-case, exact (no subtypes).</summary>
    public IEnumerable<Part21Record> RecordsOf(string keyword) => throw new NotImplementedException();

    /// <summary>Number of instances of each keyword.</summary>
    public IReadOnlyDictionary<string, int> CountByKeyword => throw new NotImplementedException();

    /// <summary>Finds an instance by its number; the first one when a number is used twice.</summary>
    public bool TryFind(ulong id, out Part21Record record) => throw new NotImplementedException();

    /// <summary>The place of an offset as line and byte.</summary>
    public SourceSpan SpanAt(long offset, ulong instanceId = 0) => throw new NotImplementedException();
}
