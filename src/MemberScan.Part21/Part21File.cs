using System.Collections.Immutable;
using MemberScan.Foundation.Diagnostics;
using MemberScan.Part21.Containers;
using MemberScan.Part21.Findings;
using MemberScan.Part21.Index;
using MemberScan.Part21.Reading;
using MemberScan.Part21.Records;
using MemberScan.Part21.Tokens;

namespace MemberScan.Part21;

/// <summary>An exchange structure of ISO 10303-21: its records, nothing of them decoded before it is asked for.</summary>
/// <remarks>
/// <see cref="Read(ReadOnlyMemory{byte}, string, DiagnosticList)"/> holds the text and a row for each instance. <see cref="Read(ModelText, IReadOnlyCollection{string}, DiagnosticList)"/> may leave the text on
/// disk: an instance is read when it is met, the keywords that will be asked for are named beforehand, and references to nothing are told when they
/// are followed (<see cref="TryFollow"/>), not before. Immutable after reading; safe for several threads.
/// </remarks>
public sealed class Part21File : IDisposable
{
    private readonly SourceText? _source;
    private readonly InstanceTable? _instances;
    private readonly StreamedRecords? _streamed;
    private readonly DiagnosticList? _diagnostics;
    private readonly HashSet<long> _dangling = [];

    private Part21File(SourceText source, ReadingResult result)
    {
        _source = source;
        _instances = result.Instances;
        Name = source.Name;
        Header = Part21Header.From(source, result.Header);
        ReadToEnd = result.ReadToEnd;
        HasDamage = result.HasDamage;
        InsertionOffset = result.InsertionOffset;
        LineEnd = source.LineEnd;
        CountByKeyword = _instances.CountByKeyword;
        HighestId = result.HighestId;
    }

    private Part21File(StreamedRecords streamed, IReadOnlyCollection<string> wanted, DiagnosticList diagnostics)
    {
        (_streamed, _diagnostics) = (streamed, diagnostics);
        var index = streamed.Index;
        Name = index.Name;
        Header = index.Header;
        ReadToEnd = index.ReadToEnd;
        HasDamage = index.HasDamage;
        InsertionOffset = index.InsertionOffset;
        LineEnd = index.LineEnd;
        HighestId = index.HighestId;
        CountByKeyword = wanted.Distinct(StringComparer.Ordinal).Where(k => index.OffsetsOf(k).Length > 0)
            .ToImmutableSortedDictionary(k => k, k => index.OffsetsOf(k).Length, StringComparer.Ordinal);
    }

    /// <summary>Name of the file, without folder; for spans and messages.</summary>
    public string Name { get; }

    /// <summary>The bytes as read; never changed.</summary>
    /// <exception cref="InvalidOperationException">The text stays on disk.</exception>
    public ReadOnlyMemory<byte> Bytes => _source?.Bytes ?? throw new InvalidOperationException($"The text of {Name} stays on disk.");

    /// <summary>The header section.</summary>
    public Part21Header Header { get; }

    /// <summary>Whether the text was understood to the end of its one exchange structure; false for truncated text or several structures in one file.</summary>
    public bool ReadToEnd { get; }

    /// <summary>Whether anything was passed over as damaged, or a reference followed that leads to nothing.</summary>
    public bool HasDamage { get; private set; }

    /// <summary>Number of instances.</summary>
    public long Count => _instances?.Count ?? _streamed!.Index.Count;

    /// <summary>Highest instance number met, also among references to nothing and in text that was passed over; 0 if none.</summary>
    public ulong HighestId { get; }

    /// <summary>Highest number that a reader of this file finds again; instances must not be numbered above it.</summary>
    public ulong HighestPossibleId => _streamed is null ? long.MaxValue : uint.MaxValue - 1UL;

    /// <summary>Offset of the <c>E</c> of the last data section's <c>ENDSEC</c>; −1 when the text has none.</summary>
    public long InsertionOffset { get; }

    /// <summary>The first line end of the text (CR LF, LF or CR), or LF when the text has no line end.</summary>
    public string LineEnd { get; }

    /// <summary>All instances in file order, damaged ones and those whose number is used twice, too; of a text that stays on disk those of the keywords named beforehand.</summary>
    public IEnumerable<Part21Record> Records
    {
        get
        {
            if (_streamed is not null)
            {
                foreach (var offset in _streamed.All()) yield return new Part21Record(this, offset);
                yield break;
            }

            for (var row = 0; row < _instances!.Count; row++) yield return new Part21Record(this, row);
        }
    }

    /// <summary>Number of instances of each keyword that has any, in order of the keywords; complex instances have none.</summary>
    public IReadOnlyDictionary<string, int> CountByKeyword { get; }

    internal static ReadingLimits ShippedLimits { get; } = new(
        Part21Limits.Depth,
        Part21Limits.InstanceLength,
        Part21Limits.StringLength,
        Part21Limits.KeywordLength,
        Part21Limits.Keywords,
        Part21Limits.Instances,
        Part21Limits.RescannedBytes);

    /// <summary>Reads the structure. Damage is told in <paramref name="diagnostics"/>, never thrown.</summary>
    /// <param name="bytes">The whole text.</param>
    /// <param name="name">Name for spans.</param>
    /// <param name="diagnostics">Receives findings with codes <c>P21-…</c>.</param>
    public static Part21File Read(ReadOnlyMemory<byte> bytes, string name, DiagnosticList diagnostics) =>
        Read(bytes, name, diagnostics, ShippedLimits);

    /// <summary>Reads the structure of a model's text; where that stays on disk, it must stay open for as long as the file is used.</summary>
    /// <param name="text">The text.</param>
    /// <param name="wanted">Keywords in upper case that <see cref="RecordsOf(string)"/> will be asked for; matters only for a text on disk.</param>
    /// <param name="diagnostics">Receives findings with codes <c>P21-…</c>, of a text on disk also later when references are followed.</param>
    public static Part21File Read(ModelText text, IReadOnlyCollection<string> wanted, DiagnosticList diagnostics)
    {
        ArgumentNullException.ThrowIfNull(text);
        return text.IsOnDisk ? Over(Part21Index.Over(text, wanted, diagnostics), wanted, diagnostics) : Read(text.Held, text.Name, diagnostics);
    }

    /// <summary>Instances of a keyword in file order; the keyword upper-case, exact (no subtypes).</summary>
    /// <exception cref="ArgumentException">The text stays on disk and the keyword was not named beforehand.</exception>
    public IEnumerable<Part21Record> RecordsOf(string keyword)
    {
        ArgumentNullException.ThrowIfNull(keyword);
        return _streamed is null ? Walk(_instances!.RowsOf(keyword)) : Walk(_streamed.Index.OffsetsOf(keyword).ToArray());
    }

    /// <summary>Instances of several keywords, and others with them, in file order, each once.</summary>
    /// <param name="keywords">As for <see cref="RecordsOf(string)"/>.</param>
    /// <param name="others">Instances of this file.</param>
    public IEnumerable<Part21Record> InFileOrder(IEnumerable<string> keywords, IEnumerable<Part21Record> others)
    {
        ArgumentNullException.ThrowIfNull(keywords);
        ArgumentNullException.ThrowIfNull(others);
        return keywords.Distinct(StringComparer.Ordinal).SelectMany(RecordsOf).Concat(others).DistinctBy(r => r.Place).OrderBy(r => r.Place);
    }

    /// <summary>Finds an instance by its number; the first one when a number is used twice.</summary>
    public bool TryFind(ulong id, out Part21Record record)
    {
        var place = -1L;
        var found = _streamed?.TryFind(id, out place) ?? TryRow(id, out place);
        record = found ? new Part21Record(this, place) : default;
        return found;
    }

    /// <summary>Finds the instance that a reference names. One that names none is told (P21-0028), if reading has not told it.</summary>
    /// <returns>False also for a value that is no reference.</returns>
    public bool TryFollow(Part21Value value, out Part21Record record)
    {
        record = default;
        if (!value.TryReference(out var id)) return false;
        if (TryFind(id, out record)) return true;

        if (_streamed is not null) TellDangling(value);
        return false;
    }

    /// <summary>The place of an offset as line and byte.</summary>
    public SourceSpan SpanAt(long offset, ulong instanceId = 0)
    {
        if (_streamed is null) return _source!.SpanAt(offset, instanceId);

        return offset < 0 || offset > _streamed.Index.Length
            ? new SourceSpan(Name, -1, 0, 0, instanceId)
            : new SourceSpan(Name, offset, _streamed.LineAt(offset), 0, instanceId);
    }

    /// <inheritdoc />
    public void Dispose() => _streamed?.Dispose();

    internal static Part21File Read(ReadOnlyMemory<byte> bytes, string name, DiagnosticList diagnostics, ReadingLimits limits)
    {
        ArgumentNullException.ThrowIfNull(name);
        ArgumentNullException.ThrowIfNull(diagnostics);
        var source = new SourceText(bytes, name);
        var result = new StructureReader(source, new FindingLog(source, diagnostics), limits).Read();
        return new Part21File(source, result);
    }

    internal static Part21File Over(Part21Index index, IReadOnlyCollection<string> wanted, DiagnosticList diagnostics) =>
        new(new StreamedRecords(index, wanted), wanted, diagnostics);

    internal RecordText TextOf(long place)
    {
        if (_streamed is not null) return _streamed.At(place);

        ref readonly var row = ref _instances![(int)place];
        return new RecordText(row.Id, _instances.KeywordOf((int)place), row.Flags, _source!, row.Start, row.Length);
    }

    internal bool IsDuplicate(long place) => _streamed is null
        ? (_instances![(int)place].Flags & InstanceFlags.Duplicate) != 0
        : _streamed.TryFind(_streamed.At(place).Id, out var first) && first != place;

    private bool TryRow(ulong id, out long place)
    {
        var found = _instances!.Ids.TryFind(id, out var row);
        place = row;
        return found;
    }

    private void TellDangling(Part21Value value)
    {
        lock (_dangling)
        {
            if (!_dangling.Add(value.Offset)) return;

            HasDamage = true;
            var kind = FindingKinds.Dangling;
            _diagnostics!.Add(kind.Code, kind.Severity, kind.Message, SpanAt(value.Offset, value.InstanceId));
        }
    }

    private IEnumerable<Part21Record> Walk(ReadOnlyMemory<int> rows)
    {
        for (var i = 0; i < rows.Length; i++) yield return new Part21Record(this, rows.Span[i]);
    }

    private IEnumerable<Part21Record> Walk(long[] offsets)
    {
        foreach (var offset in offsets) yield return new Part21Record(this, offset);
    }
}
