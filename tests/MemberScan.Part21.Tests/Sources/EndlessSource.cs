using MemberScan.Part21.Sources;

namespace MemberScan.Part21.Tests.Sources;

/// <summary>A source that claims to be one byte longer than the limit.</summary>
internal sealed class EndlessSource : ByteSource
{
    public override long Length => Part21Index.MaxBytes + 1;

    public override int Read(long offset, Span<byte> buffer) => 0;
}
