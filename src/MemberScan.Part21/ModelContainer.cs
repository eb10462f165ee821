using MemberScan.Part21.Containers;
using MemberScan.Part21.Sources;

namespace MemberScan.Part21;

/// <summary>The bytes of a model out of a plain file, a zip with one model inside, or a gzip.</summary>
public static class ModelContainer
{
    /// <summary>Largest model read [byte].</summary>
    public const long MaxModelBytes = 2_000_000_000;

    /// <summary>Largest ratio of unpacked to packed size.</summary>
    public const int MaxExpansion = 200;

    /// <summary>Reads a model file. The kind is told by its first bytes, not by its name.</summary>
    /// <param name="path">Path of the file.</param>
    /// <returns>The text of the model, and a note about the container ("out of x.ifczip"), empty for a plain file.</returns>
    /// <exception cref="InvalidDataException">No model, two models, an encrypted or damaged archive, expansion beyond the limits,
    /// or another encoding (ifcXML, JSON, UTF-16): the message is one sentence with the remedy.</exception>
    /// <exception cref="IOException">The file cannot be read.</exception>
    public static (byte[] Bytes, string Note) Read(string path) => Read(path, MaxModelBytes, MaxExpansion);

    internal static (byte[] Bytes, string Note) Read(string path, long maxBytes, int maxRatio)
    {
        ArgumentException.ThrowIfNullOrEmpty(path);
        var name = Path.GetFileName(path);
        using var file = Open(path);
        try
        {
            return Read(file, name, maxBytes, maxRatio);
        }
        catch (RefusedContainer refusal)
        {
            throw new InvalidDataException(refusal.Message, refusal);
        }
    }

    /// <summary>Whether a file is a zip or gzip by its first bytes.</summary>
    internal static bool IsArchive(string path)
    {
        using var file = Open(path);
        Span<byte> magic = stackalloc byte[4];
        var count = file.ReadAtLeast(magic, magic.Length, throwOnEndOfStream: false);
        return magic[..count] is [(byte)'P', (byte)'K', 3 or 5 or 7, ..] or [0x1F, 0x8B, ..];
    }

    /// <summary>Refuses a text in another encoding by its beginning.</summary>
    /// <exception cref="InvalidDataException">It is UTF-16, XML or JSON.</exception>
    internal static void RefuseForeign(ByteSource source, string name)
    {
        Span<byte> beginning = stackalloc byte[256];
        try
        {
            ForeignEncoding.Refuse(beginning[..source.Read(0, beginning)], name);
        }
        catch (RefusedContainer refusal)
        {
            throw new InvalidDataException(refusal.Message, refusal);
        }
    }

    private static (byte[] Bytes, string Note) Read(FileStream file, string name, long maxBytes, int maxRatio)
    {
        Span<byte> magic = stackalloc byte[4];
        var count = file.ReadAtLeast(magic, magic.Length, throwOnEndOfStream: false);
        file.Position = 0;

        var (bytes, note) = magic[..count] switch
        {
            [(byte)'P', (byte)'K', 3 or 5 or 7, ..] => ZipModel.Read(file, name, maxBytes, maxRatio),
            [0x1F, 0x8B, ..] => (GzipModel.Read(file, name, maxBytes, maxRatio), $"out of {name}"),
            _ => (ReadPlain(file, name, maxBytes), ""),
        };
        ForeignEncoding.Refuse(bytes, name);
        return (bytes, note);
    }

    private static FileStream Open(string path)
    {
        try
        {
            return new FileStream(path, FileMode.Open, FileAccess.Read, FileShare.Read);
        }
        catch (UnauthorizedAccessException fault)
        {
            throw new IOException(fault.Message, fault);
        }
    }

    private static byte[] ReadPlain(FileStream file, string name, long maxBytes)
    {
        if (file.Length > maxBytes) throw new RefusedContainer($"{name} has {file.Length} bytes, more than the {maxBytes} of the largest model read; split the model.");

        var bytes = new byte[file.Length];
        file.ReadExactly(bytes);
        return bytes;
    }
}
