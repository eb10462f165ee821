using System.Buffers;

namespace MemberScan.Part21.Tokens;

/// <summary>Bracket pairs in text that was found sound before.</summary>
internal static class Brackets
{
    private static readonly SearchValues<byte> s_stops = SearchValues.Create("()'/"u8);

    /// <summary>The offset behind the bracket that closes the one at <paramref name="at"/>; the length of the text if none does.</summary>
    public static int End(ReadOnlySpan<byte> text, int at)
    {
        var depth = 0;
        while (true)
        {
            var hop = text[at..].IndexOfAny(s_stops);
            if (hop < 0) return text.Length;

            at += hop;
            switch (text[at])
            {
                case (byte)'(':
                    depth++;
                    at++;
                    break;
                case (byte)')':
                    depth--;
                    at++;
                    if (depth == 0) return at;
                    break;
                case (byte)'\'':
                    at = StringToken.End(text, at);
                    break;
                default:
                    var after = Blanks.Skip(text, at);
                    at = after == at ? at + 1 : after;
                    break;
            }

            if (at < 0) return text.Length;
        }
    }
}
