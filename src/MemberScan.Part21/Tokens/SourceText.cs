using MemberScan.Foundation.Diagnostics;

namespace MemberScan.Part21.Tokens;

/// <summary>The bytes of a file with its name, and the line an offset lies in.</summary>
internal sealed class SourceText
{
    private const int BlockLength = 16 * 1024;

    private readonly Lock _gate = new();
    private long[]? _linesBeforeBlock;

    /// <summary>A stretch of a file.</summary>
    /// <param name="bytes">The stretch.</param>
    /// <param name="name">Name of the file.</param>
    /// <param name="origin">Where it begins in the file [byte].</param>
    /// <param name="instanceId">Number of the instance that it is the text of.</param>
    public SourceText(ReadOnlyMemory<byte> bytes, string name, long origin, ulong instanceId)
        : this(bytes, name) => (Origin, InstanceId) = (origin, instanceId);

    /// <summary>A whole file.</summary>
    public SourceText(ReadOnlyMemory<byte> bytes, string name)
    {
        Bytes = bytes;
        Name = name;
    }

    public ReadOnlyMemory<byte> Bytes { get; }

    public string Name { get; }

    /// <summary>Where the bytes begin in the file [byte].</summary>
    public long Origin { get; }

    /// <summary>Number of the instance that it is the text of; 0 for a whole file.</summary>
    public ulong InstanceId { get; }

    /// <summary>The first line end met; LF where there is none.</summary>
    public string LineEnd
    {
        get
        {
            var text = Bytes.Span;
            var at = text.IndexOfAny((byte)'\r', (byte)'\n');
            if (at < 0 || text[at] == '\n') return "\n";
            return at + 1 < text.Length && text[at + 1] == '\n' ? "\r\n" : "\r";
        }
    }

    public ReadOnlySpan<byte> Slice(long start, int length) => Bytes.Span.Slice((int)(start - Origin), length);

    /// <summary>The place of an offset: its line and byte.</summary>
    public SourceSpan SpanAt(long offset, ulong instanceId)
    {
        if (offset < 0 || offset > Bytes.Length) return new SourceSpan(Name, -1, 0, 0, instanceId);

        var block = (int)(offset / BlockLength);
        var start = block * BlockLength;
        var line = 1 + LinesBeforeBlocks()[block] + CountLineEnds(start, (int)offset);
        return new SourceSpan(Name, offset, line, 0, instanceId);
    }

    private long[] LinesBeforeBlocks()
    {
        lock (_gate) return _linesBeforeBlock ??= CountBlocks();
    }

    private long[] CountBlocks()
    {
        var counts = new long[Bytes.Length / BlockLength + 1];
        for (var i = 1; i < counts.Length; i++) counts[i] = counts[i - 1] + CountLineEnds((i - 1) * BlockLength, i * BlockLength);
        return counts;
    }

    // A line ends at LF, or at CR if no LF follows, also where the two lie on either side of 'end'.
    private int CountLineEnds(int start, int end)
    {
        var all = Bytes.Span;
        var part = all[start..end];
        var lineFeeds = part.Count((byte)'\n');
        var returns = part.Count((byte)'\r');
        if (returns == 0) return lineFeeds;

        var pairs = all[start..Math.Min(end + 1, all.Length)].Count("\r\n"u8);
        return lineFeeds + returns - pairs;
    }
}
