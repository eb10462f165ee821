namespace MemberScan.Part21.Sources;

/// <summary>Bytes that can be read from any place, by several threads at a time.</summary>
internal abstract class ByteSource
{
    /// <summary>How many there are.</summary>
    public abstract long Length { get; }

    /// <summary>Fills the buffer from an offset on, as far as there are bytes.</summary>
    /// <returns>How many were read.</returns>
    public abstract int Read(long offset, Span<byte> buffer);
}
