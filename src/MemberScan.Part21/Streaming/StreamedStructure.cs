using MemberScan.Part21.Findings;
using MemberScan.Part21.Reading;
using MemberScan.Part21.Sources;

namespace MemberScan.Part21.Streaming;

/// <summary>Reads an exchange structure without holding it: what stands around the data in pieces, the data in one pass.</summary>
internal sealed class StreamedStructure(ByteSource source, FindingLog log, ReadingLimits limits, DataPass pass, int threads)
{
    private const int FirstPiece = 64 * 1024;

    // What stands around the data is looked at as far as this [byte].
    private const int LargestPiece = 64 * 1024 * 1024;

    // A piece must go on for so much behind what it told [byte], or a larger one is read.
    private const int Lookahead = 4096;

    private bool _hasData;
    private bool _hasHeader;

    /// <summary>The entries of the header; their offsets count from the start of <see cref="HeaderText"/>.</summary>
    public IReadOnlyList<HeaderEntry> Header { get; private set; } = [];

    /// <summary>The piece that the header stands in.</summary>
    public byte[] HeaderText { get; private set; } = [];

    /// <summary>The piece at the start of the file.</summary>
    public byte[] Beginning { get; private set; } = [];

    /// <summary>Offset of the last data section's ENDSEC [byte]; −1 if none.</summary>
    public long InsertionOffset { get; private set; } = -1;

    public void Read()
    {
        var first = Piece(0, isFirst: true, out var isStructure);
        var header = first;
        var at = (long)first.DataStart;
        while (at >= 0)
        {
            if (!_hasData) pass.Guess(at, threads);
            _hasData = true;
            if (pass.Take(ref at, log) == DataStop.Limit) break;

            var next = Piece(at, isFirst: false, out _);
            if (next.DataEnd >= 0) InsertionOffset = at + next.DataEnd;
            if (!header.HasHeader) header = next;
            at = next.DataStart < 0 ? -1 : at + next.DataStart;
        }

        if (isStructure) header.TellMissing(_hasData);
        Hand(header, 0);
    }

    // Reads on from 'at' to the next data section or the end, in a piece as large as that takes.
    private StructureReader Piece(long at, bool isFirst, out bool isStructure)
    {
        for (var length = FirstPiece; ; length = Math.Min(4 * length, LargestPiece))
        {
            var text = new byte[Math.Min(length, source.Length - at)];
            _ = source.Read(at, text);
            var reader = new StructureReader(new FindingLog(), limits);
            isStructure = true;
            if (isFirst) isStructure = reader.ReadBeginning(text);
            else reader.ReadBehindData(text, _hasHeader);

            var isWhole = at + text.Length == source.Length || length == LargestPiece;
            var isConclusive = reader.DataStart >= 0 && reader.DataStart <= text.Length - Lookahead;
            if (!isWhole && !isConclusive) continue;

            if (isFirst) Beginning = text;
            if (reader.HasHeader && !_hasHeader) (Header, HeaderText, _hasHeader) = (reader.Header, text, true);
            Hand(reader, at);
            return reader;
        }
    }

    private void Hand(StructureReader reader, long origin)
    {
        log.Take(reader.Log.Gathered, origin);
        reader.Log.TakeBack(0);
    }
}
