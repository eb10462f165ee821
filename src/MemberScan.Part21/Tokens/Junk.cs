using System.Buffers;

namespace MemberScan.Part21.Tokens;

/// <summary>A parameter that is no value, such as <c>-1.#INF</c>: it reaches to the next comma or bracket, if nothing in it could open or close anything.</summary>
internal static class Junk
{
    private static readonly SearchValues<byte> s_stops = SearchValues.Create(",)('\";="u8);

    /// <summary>The offset of the comma or bracket that ends it, the length of the text where that ends first.</summary>
    /// <returns>The complement (negative) of the offset of the byte that makes the end uncertain.</returns>
    public static int End(ReadOnlySpan<byte> text, int start)
    {
        var hop = text[start..].IndexOfAny(s_stops);
        var end = hop < 0 ? text.Length : start + hop;
        var comment = text[start..end].IndexOf("/*"u8);
        if (comment >= 0) return ~(start + comment);

        return end == text.Length || text[end] is (byte)',' or (byte)')' ? end : ~end;
    }
}
