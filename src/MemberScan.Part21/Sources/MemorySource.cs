namespace MemberScan.Part21.Sources;

/// <summary>Bytes in memory, such as those out of an archive.</summary>
internal sealed class MemorySource(ReadOnlyMemory<byte> bytes) : ByteSource
{
    /// <inheritdoc />
    public override long Length => bytes.Length;

    /// <inheritdoc />
    public override int Read(long offset, Span<byte> buffer)
    {
        if (offset >= bytes.Length) return 0;

        var part = bytes.Span[(int)offset..];
        part = part[..Math.Min(part.Length, buffer.Length)];
        part.CopyTo(buffer);
        return part.Length;
    }
}
