using Microsoft.Win32.SafeHandles;

namespace MemberScan.Part21.Sources;

/// <summary>The bytes of a file; its length is that at the beginning.</summary>
internal sealed class FileSource(SafeFileHandle file) : ByteSource
{
    /// <summary>The open file.</summary>
    public SafeFileHandle File { get; } = file;

    /// <inheritdoc />
    public override long Length { get; } = RandomAccess.GetLength(file);

    /// <inheritdoc />
    public override int Read(long offset, Span<byte> buffer)
    {
        buffer = buffer[..(int)Math.Min(buffer.Length, Math.Max(0, Length - offset))];
        var done = 0;
        while (done < buffer.Length)
        {
            var count = RandomAccess.Read(File, buffer[done..], offset + done);
            if (count == 0) throw new IOException("The file became shorter while it was read.");
            done += count;
        }

        return done;
    }
}
