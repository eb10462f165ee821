using MemberScan.Part21.Findings;
using MemberScan.Part21.Index;
using MemberScan.Part21.Tokens;

namespace MemberScan.Part21.Reading;

/// <summary>Reads an exchange structure section by section.</summary>
/// <remarks>EXCHANGE_FILE = "ISO-10303-21;" HEADER_SECTION [ ANCHOR ] [ REFERENCE ] { DATA_SECTION } "END-ISO-10303-21;" { SIGNATURE }.</remarks>
internal sealed class StructureReader
{
    private readonly SourceText? _source;
    private readonly FindingLog _log;
    private readonly ReferenceMarks _marks;
    private readonly InstanceReader _instances;
    private readonly HeaderReader _header;

    private long _insertionOffset = -1;
    private bool _hasData;
    private bool _isOver;

    /// <summary>A reader of a whole text.</summary>
    public StructureReader(SourceText source, FindingLog log, ReadingLimits limits)
        : this(log, limits, new ReferenceMarks(source.Bytes.Length)) => _source = source;

    /// <summary>A reader of pieces between data sections, whose instances another one takes.</summary>
    public StructureReader(FindingLog log, ReadingLimits limits)
        : this(log, limits, new ReferenceMarks(0) { IsOff = true })
    {
    }

    private StructureReader(FindingLog log, ReadingLimits limits, ReferenceMarks marks)
    {
        _log = log;
        _marks = marks;
        var parameters = new ParameterScanner(log, _marks, limits);
        _instances = new InstanceReader(log, _marks, parameters, limits);
        _header = new HeaderReader(log, parameters);
    }

    /// <summary>What was found.</summary>
    public FindingLog Log => _log;

    /// <summary>Where the instances of a data section begin in the piece read last; −1 if it came to none.</summary>
    public int DataStart { get; private set; } = -1;

    /// <summary>Where the <c>ENDSEC</c> of a data section stands in the piece read last; −1 if there is none.</summary>
    public int DataEnd => (int)_insertionOffset;

    /// <summary>The entries of the header, by their offsets in the piece read.</summary>
    public IReadOnlyList<HeaderEntry> Header => _header.Entries;

    /// <summary>Reads the beginning of a text up to its first data section.</summary>
    /// <returns>Whether it is an exchange structure.</returns>
    public bool ReadBeginning(ReadOnlySpan<byte> text)
    {
        var start = FindStart(text);
        if (start >= 0) ReadSections(text, start);
        return start >= 0;
    }

    /// <summary>Whether a header was read, here or before; a second one is none.</summary>
    public bool HasHeader { get; private set; }

    /// <summary>Reads from where the instances of a data section end up to those of the next one.</summary>
    public void ReadBehindData(ReadOnlySpan<byte> text, bool hasHeader)
    {
        HasHeader = hasHeader;
        var at = 0;
        if (Words.Stands(text, at, "ENDSEC"u8)) at = ReadEndOfData(text, at);
        else if (text.Length > 0) _log.Tell(FindingKinds.EndOfSectionMissing, at);
        ReadSections(text, at);
    }

    /// <summary>Tells what a header lacks, and if there were no data.</summary>
    public void TellMissing(bool hasData)
    {
        _header.TellMissing();
        if (!hasData) _log.Tell(FindingKinds.NoData, -1);
    }

    public ReadingResult Read()
    {
        var text = _source!.Bytes.Span;
        var start = FindStart(text);
        if (start >= 0)
        {
            ReadSections(text, start);
            TellMissing(_hasData);
        }

        var table = _instances.Build();
        TellDuplicates(table);
        DanglingReferences.Tell(_source!, table, _marks, _log);
        return new ReadingResult
        {
            Instances = table,
            Header = _header.Entries,
            ReadToEnd = !_log.EndsReading,
            HasDamage = _log.HasDamage,
            HighestId = _marks.Highest,
            InsertionOffset = _insertionOffset,
        };
    }

    // Behind the opening ISO-10303-21; −1 if there is none.
    private int FindStart(ReadOnlySpan<byte> text)
    {
        if (LooksLikeUtf16(text))
        {
            _log.Tell(FindingKinds.Utf16, 0);
            return -1;
        }

        var begin = text.StartsWith("\uFEFF"u8) ? 3 : 0;
        var at = Blanks.Skip(text, begin);
        if (at < 0 || !Words.Stands(text, at, "ISO-10303-21"u8))
        {
            at = NextStart(text, begin);
            if (at < 0)
            {
                _log.Tell(FindingKinds.NotPart21, 0);
                return -1;
            }

            _log.Tell(FindingKinds.TextBefore, begin);
        }

        return TakeSemicolon(text, at + "ISO-10303-21".Length);
    }

    private static bool LooksLikeUtf16(ReadOnlySpan<byte> text) =>
        text.StartsWith([(byte)0xFF, (byte)0xFE]) || text.StartsWith([(byte)0xFE, (byte)0xFF])
        || text.StartsWith("I\0S\0O\0"u8) || text.StartsWith("\0I\0S\0O"u8);

    // An opening ISO-10303-21 at the start of a line, so that a text that only speaks of it does not count.
    private static int NextStart(ReadOnlySpan<byte> text, int from)
    {
        var word = "ISO-10303-21"u8;
        var at = from;
        while (true)
        {
            var hop = text[at..].IndexOf(word);
            if (hop < 0) return -1;

            at += hop;
            var after = at + word.Length;
            var beginsLine = at == from || text[at - 1] is (byte)'\n' or (byte)'\r';
            if (beginsLine && after < text.Length && text[after] == ';') return at;
            at = after;
        }
    }

    private void ReadSections(ReadOnlySpan<byte> text, int at)
    {
        while (at >= 0 && !_isOver)
        {
            at = SkipBlanks(text, at);
            if (at < 0) break;
            if (at == text.Length)
            {
                _log.Tell(FindingKinds.Truncated, at);
                break;
            }

            if (!HasHeader && Words.Stands(text, at, "HEADER"u8))
            {
                HasHeader = true;
                at = _header.Read(text, TakeSemicolon(text, at + "HEADER".Length));
            }
            else
            {
                at = ReadSection(text, at);
            }
        }
    }

    private int ReadSection(ReadOnlySpan<byte> text, int at)
    {
        if (Words.Stands(text, at, "DATA"u8))
        {
            // DATA; or DATA('name',('SCHEMA'));
            var next = Blanks.Skip(text, at + "DATA".Length);
            if (next >= 0 && next < text.Length && text[next] is not ((byte)';' or (byte)'(')) _log.Tell(FindingKinds.TextBetween, next);
            return ReadData(text, SkipStatement(text, at));
        }

        if (Words.Stands(text, at, "ANCHOR"u8) || Words.Stands(text, at, "REFERENCE"u8))
        {
            _log.Tell(FindingKinds.SectionSkipped, at);
            return SkipSection(text, at);
        }

        if (Words.Stands(text, at, "END-ISO-10303-21"u8))
        {
            _isOver = true;
            ReadTail(text, TakeSemicolon(text, at + "END-ISO-10303-21".Length));
            return at;
        }

        if (Words.Stands(text, at, "ISO-10303-21"u8))
        {
            _isOver = true;
            _log.Tell(FindingKinds.Truncated, at);
            _log.Tell(FindingKinds.SeveralStructures, at);
            return at;
        }

        _log.Tell(FindingKinds.TextBetween, at);
        return PassOverToSection(text, at);
    }

    private int ReadData(ReadOnlySpan<byte> text, int at)
    {
        _hasData = true;
        if (_source is null)
        {
            DataStart = at;
            return -1;
        }

        while (true)
        {
            at = SkipBlanks(text, at);
            if (at < 0 || at == text.Length) return at;

            if (text[at] == '#')
            {
                at = _instances.Read(text, at);
            }
            else if (Words.Stands(text, at, "ENDSEC"u8))
            {
                return ReadEndOfData(text, at);
            }
            else if (BeginsOtherSection(text, at))
            {
                _log.Tell(FindingKinds.EndOfSectionMissing, at);
                return at;
            }
            else
            {
                _log.Tell(FindingKinds.TextBetween, at);
                at = _instances.Resume(text, at, at);
            }

            if (at < 0) return at;
        }
    }

    private int ReadEndOfData(ReadOnlySpan<byte> text, int at)
    {
        _insertionOffset = at;
        return TakeSemicolon(text, at + "ENDSEC".Length);
    }

    /// <summary>Whether what stands there ends a data section.</summary>
    public static bool BeginsSection(ReadOnlySpan<byte> text, int at) => Words.Stands(text, at, "ENDSEC"u8) || BeginsOtherSection(text, at);

    private static bool BeginsOtherSection(ReadOnlySpan<byte> text, int at) =>
        Words.Stands(text, at, "END-ISO-10303-21"u8) || Words.Stands(text, at, "ISO-10303-21"u8) || Words.Stands(text, at, "DATA"u8);

    // What follows the end: nothing, signatures, or something that does not belong there.
    private void ReadTail(ReadOnlySpan<byte> text, int at)
    {
        while (true)
        {
            var next = Blanks.Skip(text, at);
            if (next == text.Length) return;

            if (next >= 0 && Words.Stands(text, next, "SIGNATURE"u8))
            {
                _log.Tell(FindingKinds.Signature, next);
                at = SkipSection(text, next);
                continue;
            }

            var place = next < 0 ? ~next : next;
            var another = NextStart(text, place);
            _log.Tell(another >= 0 ? FindingKinds.SeveralStructures : FindingKinds.TextAfter, another >= 0 ? another : place);
            return;
        }
    }

    private int SkipBlanks(ReadOnlySpan<byte> text, int at)
    {
        var next = Blanks.Skip(text, at);
        if (next >= 0) return next;

        _log.Tell(FindingKinds.UnterminatedComment, ~next);
        return _instances.Resume(text, ~next, text.Length);
    }

    private int TakeSemicolon(ReadOnlySpan<byte> text, int at)
    {
        var next = Blanks.Skip(text, at);
        if (next >= 0 && next < text.Length && text[next] == ';') return next + 1;

        _log.Tell(FindingKinds.SemicolonMissing, at);
        return at;
    }

    // Behind the next semicolon outside of strings and comments.
    private static int SkipStatement(ReadOnlySpan<byte> text, int at)
    {
        while (at < text.Length && text[at] != ';')
        {
            var next = text[at] == '\'' ? StringToken.End(text, at) : Blanks.Skip(text, at);
            at = next <= at ? at + 1 : next;
        }

        return Math.Min(at + 1, text.Length);
    }

    private static int SkipSection(ReadOnlySpan<byte> text, int at)
    {
        while (at < text.Length)
        {
            var next = Blanks.Skip(text, at);
            at = next < 0 ? text.Length : next;
            if (Words.Stands(text, at, "ENDSEC"u8)) return SkipStatement(text, at);
            at = SkipStatement(text, at);
        }

        return at;
    }

    // To the next line or statement that begins like a section.
    private static int PassOverToSection(ReadOnlySpan<byte> text, int at)
    {
        while (true)
        {
            var hop = text[at..].IndexOfAny((byte)';', (byte)'\n', (byte)'\r');
            if (hop < 0) return text.Length;

            at += hop + 1;
            var next = at;
            while (next < text.Length && Blanks.IsBlank(text[next])) next++;
            if (BeginsOtherSection(text, next) || Words.Stands(text, next, "HEADER"u8)
                || Words.Stands(text, next, "ANCHOR"u8) || Words.Stands(text, next, "REFERENCE"u8)) return next;
        }
    }

    private void TellDuplicates(InstanceTable table)
    {
        for (var i = 0; i < table.Count; i++)
        {
            ref readonly var row = ref table[i];
            if ((row.Flags & InstanceFlags.Duplicate) != 0) _log.Tell(FindingKinds.DuplicateId, row.Start, row.Id);
        }
    }
}
