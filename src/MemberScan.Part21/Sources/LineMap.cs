namespace MemberScan.Part21.Sources;

/// <summary>Lines of offsets asked for one by one: counted once over the whole text, by pieces, when the first is asked for.</summary>
internal sealed class LineMap(ByteSource source)
{
    private const long PieceLength = 1024 * 1024;

    private long[]? _linesAtPieces;

    /// <summary>The line of an offset, from 1. A line ends at LF, or at CR if no LF follows.</summary>
    public long At(long offset)
    {
        if (_linesAtPieces is null)
        {
            var starts = new long[source.Length / PieceLength + 1];
            for (var i = 0; i < starts.Length; i++) starts[i] = i * PieceLength;
            _linesAtPieces = LineCounter.LinesAt(source, starts);
        }

        var piece = offset / PieceLength;
        return LineCounter.LineAt(source, piece * PieceLength, _linesAtPieces[piece], offset);
    }
}
