using MemberScan.Foundation.Diagnostics;

namespace MemberScan.Part21.Tokens;

/// <summary>The bytes of a file with its name, and the line an offset lies in.</summary>
internal sealed class SourceText
{
    private const int BlockLength = 16 * 1024;

    private readonly Lazy<long[]> _linesBeforeBlock;

    public SourceText(ReadOnlyMemory<byte> bytes, string name)
    {
        Bytes = bytes;
        Name = name;
        _linesBeforeBlock = new Lazy<long[]>(CountBlocks);
    }

    public ReadOnlyMemory<byte> Bytes { get; }

    public string Name { get; }

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

    public ReadOnlySpan<byte> Slice(long start, int length) => Bytes.Span.Slice((int)start, length);

    /// <summary>The place of an offset: its line and byte.</summary>
    public SourceSpan SpanAt(long offset, ulong instanceId)
    {
        if (offset < 0 || offset > Bytes.Length) return new SourceSpan(Name, -1, 0, 0, instanceId);

        var block = (int)(offset / BlockLength);
        var start = block * BlockLength;
        var line = 1 + _linesBeforeBlock.Value[block] + CountLineEnds(start, (int)offset);
        return new SourceSpan(Name, offset, line, 0, instanceId);
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
