using MemberScan.Part21.Plain;

namespace MemberScan.Part21.Sources;

/// <summary>A stretch of a source in memory; it moves forward and grows where one statement needs it.</summary>
internal sealed class Window(ByteSource source, int size)
{
    private byte[] _buffer = new byte[size + PlainScanner.Slack];

    /// <summary>Offset of the first byte held.</summary>
    public long Origin { get; private set; }

    /// <summary>Number of bytes held.</summary>
    public int Length { get; private set; }

    /// <summary>Whether it reaches to the end of the source.</summary>
    public bool IsLast => Origin + Length >= source.Length;

    /// <summary>The bytes held; <see cref="PlainScanner.Slack"/> more are readable behind them.</summary>
    public ReadOnlySpan<byte> Text => _buffer.AsSpan(0, Length);

    /// <summary>Holds the text from <paramref name="offset"/> on, at least <paramref name="least"/> bytes of it where there are so many.</summary>
    public void Hold(long offset, int least)
    {
        // What is held already and still wanted is kept, so that each byte of a pass is read once.
        var kept = 0;
        if (offset >= Origin && offset < Origin + Length)
        {
            kept = (int)(Origin + Length - offset);
            _buffer.AsSpan((int)(offset - Origin), kept).CopyTo(_buffer);
        }

        var capacity = Math.Max(size, least);
        if (_buffer.Length < capacity + PlainScanner.Slack)
        {
            // What has grown once for one statement stays so: the next one like it is often near.
            var larger = new byte[capacity + PlainScanner.Slack];
            _buffer.AsSpan(0, kept).CopyTo(larger);
            _buffer = larger;
        }

        Origin = offset;
        Length = kept;
        if (Length < capacity) Length += source.Read(offset + kept, _buffer.AsSpan(kept, capacity - kept));
    }

    /// <summary>Gives back what a long statement made it grow to.</summary>
    public void Shrink()
    {
        if (_buffer.Length > 4 * size + PlainScanner.Slack) (_buffer, Length) = (new byte[size + PlainScanner.Slack], 0);
    }
}
