namespace MemberScan.Part21.Sources;

/// <summary>Small reads of a source that are near each other, in one larger one. For one thread.</summary>
internal sealed class ReadAhead(ByteSource source) : ByteSource
{
    // What belongs together stands together in most files; a call costs as much as copying this much.
    private const int Piece = 16 * 1024;

    private readonly byte[] _buffer = new byte[Piece];
    private long _origin;
    private int _held;

    /// <inheritdoc />
    public override long Length => source.Length;

    /// <inheritdoc />
    public override int Read(long offset, Span<byte> buffer)
    {
        if (buffer.Length > Piece / 2) return source.Read(offset, buffer);

        if (offset < _origin || offset + buffer.Length > _origin + _held)
        {
            _held = 0;
            (_origin, _held) = (offset, source.Read(offset, _buffer));
        }

        var count = (int)Math.Min(buffer.Length, _origin + _held - offset);
        _buffer.AsSpan((int)(offset - _origin), count).CopyTo(buffer);
        return count;
    }
}
