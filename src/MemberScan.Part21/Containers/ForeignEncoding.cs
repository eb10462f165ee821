namespace MemberScan.Part21.Containers;

/// <summary>Recognises models in an encoding that is not read.</summary>
internal static class ForeignEncoding
{
    /// <exception cref="RefusedContainer">The text is UTF-16, XML or JSON.</exception>
    public static void Refuse(ReadOnlySpan<byte> bytes, string name)
    {
        if (bytes.StartsWith([(byte)0xFF, (byte)0xFE]) || bytes.StartsWith([(byte)0xFE, (byte)0xFF])
            || bytes.StartsWith("I\0S\0"u8) || bytes.StartsWith("\0I\0S"u8))
        {
            throw new RefusedContainer($"{name} is in UTF-16, which ISO 10303-21 does not know; save it as UTF-8 or ASCII.");
        }

        var text = bytes.StartsWith("\uFEFF"u8) ? bytes[3..] : bytes;
        var first = text.IndexOfAnyExcept(" \t\r\n"u8);
        if (first < 0) return;
        if (text[first] == '<') throw new RefusedContainer($"{name} is XML (ifcXML?), which is not read; export the model as IFC-SPF (.ifc).");
        if (text[first] is (byte)'{' or (byte)'[') throw new RefusedContainer($"{name} is JSON, which is not read; export the model as IFC-SPF (.ifc).");
    }
}
