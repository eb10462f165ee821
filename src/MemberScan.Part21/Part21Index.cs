using System.Collections.Immutable;
using MemberScan.Foundation.Diagnostics;
using MemberScan.Part21.Blocks;
using MemberScan.Part21.Containers;
using MemberScan.Part21.Findings;
using MemberScan.Part21.Index;
using MemberScan.Part21.Reading;
using MemberScan.Part21.Sources;
using MemberScan.Part21.Streaming;
using MemberScan.Part21.Tokens;

namespace MemberScan.Part21;

/// <summary>An exchange structure of ISO 10303-21 that stays on disk: exact places of the instances asked for, an anchor per 4 KiB for all others.</summary>
/// <remarks>
/// Made in one pass over the text; every instance is checked as <see cref="Part21File"/> checks it, but references to nothing are found when they
/// are followed, not before. Safe for several threads, each with a <see cref="Part21Lookup"/> of its own.
/// </remarks>
public sealed class Part21Index : IDisposable
{
    /// <summary>Largest text indexed [byte].</summary>
    public const long MaxBytes = (long)BlockIndex.MaxBlocks * BlockEntry.Length;

    private readonly ByteSource _source;
    private readonly IDisposable? _owned;
    private readonly BlockIndex _blocks;
    private readonly ImmutableArray<string> _wanted;
    private readonly long[][] _places;
    private readonly int _threads;
    private readonly Lock _gate = new();
    private long _highestId = -1;

    private Part21Index(
        ByteSource source, IDisposable? owned, string name, IReadOnlyCollection<string> wanted, DiagnosticList diagnostics, Options options, Func<IPart21Taker>? newTaker)
    {
        (_source, _owned, Name) = (source, owned, name);
        _wanted = [.. wanted.Distinct(StringComparer.Ordinal)];
        var log = new FindingLog();
        var pass = new DataPass(source, new WantedKeywords(_wanted), newTaker, options.Limits, options.Stretch, options.Window);
        var structure = new StreamedStructure(source, log, options.Limits, pass, options.Threads);
        structure.Read();

        Count = pass.Count;
        InsertionOffset = structure.InsertionOffset;
        Header = Part21Header.From(new SourceText(structure.HeaderText, name), structure.Header);
        LineEnd = new SourceText(structure.Beginning, name).LineEnd;
        Takers = pass.Takers;
        _places = Grouped(pass.Places, _wanted.Length);
        _blocks = new BlockIndex(pass.Blocks, source, NewScanner());
        TellDuplicates(log);
        Tell(log, diagnostics);
        ReadToEnd = !log.EndsReading;
        HasDamage = log.HasDamage;
        _threads = options.Threads;
    }

    /// <summary>Name of the file, without folder.</summary>
    public string Name { get; }

    /// <summary>Length of the text [byte].</summary>
    public long Length => _source.Length;

    /// <summary>The header section.</summary>
    public Part21Header Header { get; }

    /// <summary>Whether the text was understood to the end of its one exchange structure.</summary>
    public bool ReadToEnd { get; }

    /// <summary>Whether anything was passed over as damaged.</summary>
    public bool HasDamage { get; }

    /// <summary>Number of instances, damaged ones and doubled numbers included.</summary>
    public long Count { get; }

    /// <summary>Offset of the <c>E</c> of the last data section's <c>ENDSEC</c>; −1 when the text has none.</summary>
    public long InsertionOffset { get; }

    /// <summary>The first line end of the text (CR LF, LF or CR), or LF when it has none near its beginning.</summary>
    public string LineEnd { get; }

    /// <summary>Highest number that stands behind a '#' anywhere in the text, up to 4,294,967,295; 0 if none. The first call reads the text once more.</summary>
    public uint HighestId
    {
        get
        {
            lock (_gate)
            {
                if (_highestId < 0) _highestId = HighestNumber.In(_source, _threads);
                return (uint)_highestId;
            }
        }
    }

    /// <summary>What took the wanted instances while the pass went over them, in file order; empty if nothing was to take them.</summary>
    public IReadOnlyList<IPart21Taker> Takers { get; }

    internal ByteSource Source => _source;

    internal int Listed => _blocks.Listed;

    /// <summary>Indexes a model file, or the one model in an archive.</summary>
    /// <param name="path">Path of the file.</param>
    /// <param name="wanted">Keywords in upper case whose instances are kept exactly.</param>
    /// <param name="diagnostics">Receives findings with codes <c>P21-…</c>.</param>
    /// <param name="threads">Threads that share the pass; 0 for one per processor. The result is the same for any number.</param>
    /// <param name="newTaker">Makes what takes the wanted instances as they pass by, once for each stretch, on any thread; null if nothing does.</param>
    /// <exception cref="InvalidDataException">As <see cref="ModelContainer.Read(string)"/>, or the text is longer than <see cref="MaxBytes"/>.</exception>
    /// <exception cref="IOException">The file cannot be read.</exception>
    public static Part21Index Open(string path, IReadOnlyCollection<string> wanted, DiagnosticList diagnostics, int threads = 0, Func<IPart21Taker>? newTaker = null)
    {
        ArgumentException.ThrowIfNullOrEmpty(path);
        var name = Path.GetFileName(path);
        if (ModelContainer.IsArchive(path)) return Over(ModelContainer.Read(path).Bytes, name, wanted, diagnostics, threads, newTaker);

        var handle = File.OpenHandle(path, options: FileOptions.RandomAccess);
        try
        {
            var source = new FileSource(handle);
            RefuseTooLong(source.Length, name);
            ModelContainer.RefuseForeign(source, name);
            return new Part21Index(source, handle, name, Checked(wanted), diagnostics, Options.Shipped(threads), newTaker);
        }
        catch
        {
            handle.Dispose();
            throw;
        }
    }

    /// <summary>Indexes the text of a model; it stays open for as long as the index is used.</summary>
    /// <param name="text">The text.</param>
    /// <param name="wanted">As for <see cref="Open"/>.</param>
    /// <param name="diagnostics">Receives findings with codes <c>P21-…</c>.</param>
    /// <param name="threads">Threads that share the pass; 0 for one per processor.</param>
    public static Part21Index Over(ModelText text, IReadOnlyCollection<string> wanted, DiagnosticList diagnostics, int threads = 0)
    {
        ArgumentNullException.ThrowIfNull(text);
        return Over(text.Source, text.Name, wanted, diagnostics, Options.Shipped(threads));
    }

    /// <summary>Indexes a text in memory.</summary>
    /// <param name="text">The whole text.</param>
    /// <param name="name">Name for spans.</param>
    /// <param name="wanted">Keywords in upper case whose instances are kept exactly.</param>
    /// <param name="diagnostics">Receives findings with codes <c>P21-…</c>.</param>
    /// <param name="threads">Threads that share the pass; 0 for one per processor.</param>
    /// <param name="newTaker">As for <see cref="Open"/>.</param>
    public static Part21Index Over(
        ReadOnlyMemory<byte> text, string name, IReadOnlyCollection<string> wanted, DiagnosticList diagnostics, int threads = 0, Func<IPart21Taker>? newTaker = null) =>
        Over(new MemorySource(text), name, wanted, diagnostics, Options.Shipped(threads), newTaker);

    /// <summary>Offsets [byte] of the instances of a keyword, in file order, exact (no subtypes).</summary>
    /// <param name="keyword">One of those asked for.</param>
    /// <exception cref="ArgumentException">The keyword was not asked for.</exception>
    public ReadOnlySpan<long> OffsetsOf(string keyword)
    {
        var number = _wanted.IndexOf(keyword);
        return number >= 0 ? _places[number] : throw new ArgumentException($"{keyword} was not among the keywords to index.", nameof(keyword));
    }

    /// <summary>A look-up for one thread.</summary>
    public Part21Lookup CreateLookup() => new(_blocks, _source, NewScanner());

    /// <summary>Reads bytes as they stand.</summary>
    /// <returns>How many were read; fewer than asked for only at the end.</returns>
    public int Read(long offset, Span<byte> buffer)
    {
        ArgumentOutOfRangeException.ThrowIfNegative(offset);
        return _source.Read(offset, buffer);
    }

    /// <inheritdoc />
    public void Dispose() => _owned?.Dispose();

    internal static Part21Index Over(ReadOnlyMemory<byte> text, string name, IReadOnlyCollection<string> wanted, DiagnosticList diagnostics, Options options) =>
        Over(new MemorySource(text), name, wanted, diagnostics, options);

    internal static Part21Index Over(
        ByteSource source, string name, IReadOnlyCollection<string> wanted, DiagnosticList diagnostics, Options options, Func<IPart21Taker>? newTaker = null)
    {
        RefuseTooLong(source.Length, name);
        return new(source, null, name, Checked(wanted), diagnostics, options, newTaker);
    }

    private static IReadOnlyCollection<string> Checked(IReadOnlyCollection<string> wanted)
    {
        ArgumentNullException.ThrowIfNull(wanted);
        ArgumentOutOfRangeException.ThrowIfGreaterThan(wanted.Count, short.MaxValue - 1, nameof(wanted));
        return wanted;
    }

    internal static void RefuseTooLong(long length, string name)
    {
        if (length > MaxBytes) throw new InvalidDataException($"{name} has {length} bytes, more than the {MaxBytes} that can be indexed; split the model.");
    }

    private static DataScanner NewScanner() => new(new FindingLog(), Part21File.ShippedLimits);

    private static long[][] Grouped(Rows<PlaceRow> places, int keywords)
    {
        var counts = new int[keywords];
        for (var i = 0; i < places.Count; i++) counts[places[i].Keyword]++;
        var grouped = new long[keywords][];
        for (var i = 0; i < keywords; i++) grouped[i] = new long[counts[i]];
        Array.Clear(counts);
        for (var i = 0; i < places.Count; i++) grouped[places[i].Keyword][counts[places[i].Keyword]++] = places[i].Offset;
        return grouped;
    }

    // A number used twice is never found by two anchors: at least one of its instances is listed.
    private void TellDuplicates(FindingLog log)
    {
        if (_blocks.Listed == 0) return;

        var lookup = CreateLookup();
        var (count, first, ids) = (0L, int.MaxValue, new HashSet<uint>());
        var (lastId, earliest) = (0u, -1);
        foreach (var (id, entry) in _blocks.List())
        {
            if (earliest < 0 || id != lastId)
            {
                // The one found by its anchor comes before, or is itself the double of this one.
                (lastId, earliest) = (id, entry);
                var rising = _blocks.RisingWith(id);
                if (rising >= 0 && lookup.Block(rising).Ids.Contains(id)) Note(id, Math.Max(rising, entry));
                continue;
            }

            Note(id, entry);
        }

        if (count > 0) log.Take([new Finding(FindingKinds.DuplicateId, FirstDouble(lookup, first, ids, out var told), told, count)], 0);

        void Note(uint id, int entry)
        {
            count++;
            if (entry > first) return;
            if (entry < first) ids.Clear();
            first = entry;
            ids.Add(id);
        }
    }

    private static long FirstDouble(Part21Lookup lookup, int entry, HashSet<uint> ids, out uint id)
    {
        for (var place = 0; place < lookup.Block(entry).Count; place++)
        {
            id = lookup.Block(entry).Ids[place];
            if (!ids.Contains(id)) continue;

            lookup.TryFindPlace(id, out var block, out var firstPlace);
            if (block.Entry != entry || firstPlace != place) return lookup.Block(entry).At(place).Offset;
        }

        id = 0;
        return -1;
    }

    private void Tell(FindingLog log, DiagnosticList diagnostics)
    {
        var findings = log.Counted();
        if (findings.Count == 0) return;

        long[] offsets = [.. findings.Select(f => f.Offset).Where(o => o >= 0).Order()];
        var lines = LineCounter.LinesAt(_source, offsets);
        foreach (var (kind, offset, id, count) in findings)
        {
            var span = offset < 0
                ? new SourceSpan(Name, -1, 0, 0, id)
                : new SourceSpan(Name, offset, lines[Array.IndexOf(offsets, offset)], 0, id);
            for (var i = 0L; i < count; i++) diagnostics.Add(kind.Code, kind.Severity, kind.Message, span);
        }
    }

    /// <summary>How a pass is made.</summary>
    /// <param name="Limits">How much a text may ask of the reader.</param>
    /// <param name="Stretch">Length of a stretch [byte].</param>
    /// <param name="Window">Length of the window that a stretch is read through [byte].</param>
    /// <param name="Threads">Threads that share the pass.</param>
    internal sealed record Options(ReadingLimits Limits, int Stretch, int Window, int Threads)
    {
        public static Options Shipped(int threads) => new(
            Part21File.ShippedLimits, DataPass.ShippedStretch, DataPass.ShippedWindow, threads > 0 ? threads : Environment.ProcessorCount);
    }
}
