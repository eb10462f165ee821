namespace MemberScan.Ifc.WriteBack;

/// <summary>Where our block stands in a text, wherever that is.</summary>
internal static class BlockMarks
{
    private static readonly System.Buffers.SearchValues<byte> s_stops = System.Buffers.SearchValues.Create("'/"u8);

    /// <summary>The last block: from its opening comment to behind the line end of its closing one; null when there is none.</summary>
    /// <remarks>The words of a mark inside a string are content, so strings are passed over from the beginning of the text.</remarks>
    public static Range? Find(ReadOnlySpan<byte> bytes, ReadOnlySpan<byte> opening, ReadOnlySpan<byte> closing)
    {
        if (bytes.IndexOf(opening) < 0) return null;

        Range? found = null;
        var (begin, at) = (-1, 0);
        while (at < bytes.Length && bytes[at..].IndexOfAny(s_stops) is var hop and >= 0)
        {
            at += hop;
            var rest = bytes[at..];
            if (rest[0] == '\'') at += Length(rest, 1, "'"u8);
            else if (!rest.StartsWith("/*"u8)) at++;
            else
            {
                if (rest.StartsWith(opening)) begin = at;
                else if (rest.StartsWith(closing) && begin >= 0)
                {
                    found = begin..LineEnd(bytes, at + closing.Length);
                    begin = -1;
                }

                at += Length(rest, 2, "*/"u8);
            }
        }

        return found;
    }

    /// <summary>Offset behind a line end that stands at an offset; the offset itself where none does.</summary>
    public static int LineEnd(ReadOnlySpan<byte> bytes, int at) =>
        bytes[at..].StartsWith("\r\n"u8) ? at + 2
        : at < bytes.Length && bytes[at] is (byte)'\n' or (byte)'\r' ? at + 1
        : at;

    private static int Length(ReadOnlySpan<byte> text, int open, ReadOnlySpan<byte> close) =>
        text[open..].IndexOf(close) is var at and >= 0 ? open + at + close.Length : text.Length;
}
