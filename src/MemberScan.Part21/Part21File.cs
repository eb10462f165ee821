using MemberScan.Foundation.Diagnostics;
using MemberScan.Part21.Findings;
using MemberScan.Part21.Index;
using MemberScan.Part21.Reading;
using MemberScan.Part21.Tokens;

namespace MemberScan.Part21;

/// <summary>An exchange structure of ISO 10303-21: its bytes and where each instance stands. Nothing is decoded before it is asked for.</summary>
/// <remarks>Immutable after reading; safe for several threads.</remarks>
public sealed class Part21File
{
    private readonly SourceText _source;
    private readonly InstanceTable _instances;

    private Part21File(SourceText source, ReadingResult result)
    {
        _source = source;
        _instances = result.Instances;
        Header = Part21Header.From(source, result.Header);
        ReadToEnd = result.ReadToEnd;
        HasDamage = result.HasDamage;
        HighestId = result.HighestId;
        InsertionOffset = result.InsertionOffset;
        LineEnd = source.LineEnd;
    }

    /// <summary>Name of the file, without folder; for spans and messages.</summary>
    public string Name => _source.Name;

    /// <summary>The bytes as read; never changed.</summary>
    public ReadOnlyMemory<byte> Bytes => _source.Bytes;

    /// <summary>The header section.</summary>
    public Part21Header Header { get; }

    /// <summary>Whether the text was understood to the end of its one exchange structure; false for truncated text or several structures in one file.</summary>
    public bool ReadToEnd { get; }

    /// <summary>Whether anything was passed over as damaged.</summary>
    public bool HasDamage { get; }

    /// <summary>Number of instances indexed.</summary>
    public int Count => _instances.Count;

    /// <summary>Highest instance number met, also among references to nothing and in text that was passed over; 0 if none.</summary>
    public ulong HighestId { get; }

    /// <summary>Offset of the <c>E</c> of the last data section's <c>ENDSEC</c>; −1 when the text has none.</summary>
    public long InsertionOffset { get; }

    /// <summary>The first line end of the text (CR LF, LF or CR), or LF when the text has no line end.</summary>
    public string LineEnd { get; }

    /// <summary>All instances in file order: damaged ones and those whose number is used twice, too.</summary>
    public IEnumerable<Part21Record> Records
    {
        get
        {
            for (var row = 0; row < _instances.Count; row++) yield return new Part21Record(this, row);
        }
    }

    /// <summary>Number of instances of each keyword, in order of the keywords; complex instances have none.</summary>
    public IReadOnlyDictionary<string, int> CountByKeyword => _instances.CountByKeyword;

    internal SourceText Source => _source;

    /// <summary>Reads the structure. Damage is told in <paramref name="diagnostics"/>, never thrown.</summary>
    /// <param name="bytes">The whole text.</param>
    /// <param name="name">Name for spans.</param>
    /// <param name="diagnostics">Receives findings with codes <c>P21-…</c>.</param>
    public static Part21File Read(ReadOnlyMemory<byte> bytes, string name, DiagnosticList diagnostics) =>
        Read(bytes, name, diagnostics, ShippedLimits);

    /// <summary>Instances of a keyword in file order; the keyword upper-case, exact (no subtypes).</summary>
    public IEnumerable<Part21Record> RecordsOf(string keyword)
    {
        ArgumentNullException.ThrowIfNull(keyword);
        var rows = _instances.RowsOf(keyword);
        return Walk(rows);
    }

    /// <summary>Finds an instance by its number; the first one when a number is used twice.</summary>
    public bool TryFind(ulong id, out Part21Record record)
    {
        var found = _instances.Ids.TryFind(id, out var row);
        record = found ? new Part21Record(this, row) : default;
        return found;
    }

    /// <summary>The place of an offset as line and byte.</summary>
    public SourceSpan SpanAt(long offset, ulong instanceId = 0) => _source.SpanAt(offset, instanceId);

    internal static ReadingLimits ShippedLimits { get; } = new(
        Part21Limits.Depth,
        Part21Limits.InstanceLength,
        Part21Limits.StringLength,
        Part21Limits.KeywordLength,
        Part21Limits.Keywords,
        Part21Limits.Instances,
        Part21Limits.RescannedBytes);

    internal static Part21File Read(ReadOnlyMemory<byte> bytes, string name, DiagnosticList diagnostics, ReadingLimits limits)
    {
        ArgumentNullException.ThrowIfNull(name);
        ArgumentNullException.ThrowIfNull(diagnostics);
        var source = new SourceText(bytes, name);
        var result = new StructureReader(source, new FindingLog(source, diagnostics), limits).Read();
        return new Part21File(source, result);
    }

    internal InstanceRow Row(int row) => _instances[row];

    internal string KeywordOf(int row) => _instances.KeywordOf(row);

    private IEnumerable<Part21Record> Walk(ReadOnlyMemory<int> rows)
    {
        for (var i = 0; i < rows.Length; i++) yield return new Part21Record(this, rows.Span[i]);
    }
}
