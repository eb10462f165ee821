namespace MemberScan.Ifc.WriteBack.Earlier;

/// <summary>The numbers that the text of an instance refers to.</summary>
internal static class ReferenceScan
{
    private static readonly System.Buffers.SearchValues<byte> s_stops = System.Buffers.SearchValues.Create("'/#"u8);

    /// <summary>Calls back for each <c>#number</c> behind the first, outside strings and comments.</summary>
    public static void Each(ReadOnlySpan<byte> instance, Action<ulong> found)
    {
        var rest = instance.Length > 0 ? instance[1..] : instance;      // the first '#' is the instance's own
        while (rest.IndexOfAny(s_stops) is var at and >= 0)
        {
            rest = rest[at..];
            if (rest[0] == '\'') rest = Behind(rest[1..], "'"u8);         // a doubled quote closes one string and opens the next
            else if (rest.StartsWith("/*"u8)) rest = Behind(rest[2..], "*/"u8);
            else if (rest[0] == '#' && System.Buffers.Text.Utf8Parser.TryParse(rest[1..], out ulong number, out var length))
            {
                found(number);
                rest = rest[(1 + length)..];
            }
            else rest = rest[1..];
        }
    }

    private static ReadOnlySpan<byte> Behind(ReadOnlySpan<byte> text, ReadOnlySpan<byte> mark) =>
        text.IndexOf(mark) is var at and >= 0 ? text[(at + mark.Length)..] : default;
}
