namespace MemberScan.Part21.Containers;

/// <summary>Unpacks a stream and counts while it does; sizes that an archive declares are not believed.</summary>
internal static class Expansion
{
    private const int FirstBuffer = 1024 * 1024;

    /// <param name="packed">The unpacking stream.</param>
    /// <param name="packedLength">What it unpacks [byte].</param>
    /// <param name="maxBytes">Largest result [byte].</param>
    /// <param name="maxRatio">Largest ratio of the result to <paramref name="packedLength"/>.</param>
    /// <param name="name">Name of the archive, for the message.</param>
    /// <exception cref="RefusedContainer">The result is larger.</exception>
    public static byte[] Unpack(Stream packed, long packedLength, long maxBytes, int maxRatio, string name)
    {
        var limit = Math.Min(maxBytes, packedLength * maxRatio);
        var bytes = new byte[Math.Min(FirstBuffer, limit + 1)];
        var length = 0;
        while (true)
        {
            var read = packed.Read(bytes, length, bytes.Length - length);
            if (read == 0) return length == bytes.Length ? bytes : bytes[..length];

            length += read;
            if (length > limit)
            {
                throw new RefusedContainer(length > maxBytes
                    ? $"{name} unpacks to more than {maxBytes} bytes, the largest model read; split the model."
                    : $"{name} unpacks to more than {maxRatio} times its size, which no model does; pack it anew or give the plain file.");
            }

            if (length == bytes.Length) Array.Resize(ref bytes, (int)Math.Min(2L * bytes.Length, Math.Min(limit + 1, Array.MaxLength)));
        }
    }
}
