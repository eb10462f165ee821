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
    public static (byte[] Bytes, string Note) Read(string path) => throw new NotImplementedException();
}
