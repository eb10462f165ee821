using MemberScan.Part21.Tokens;

namespace MemberScan.Part21.Reading;

/// <summary>Finds where sound text begins again after damage.</summary>
internal static class Resynchronizer
{
    /// <summary>
    /// The next <c>#number=</c> after a semicolon or at the start of a line, or the next <c>ENDSEC</c> or <c>END-ISO-10303-21</c>,
    /// whichever comes first; the length of the text if there is none.
    /// </summary>
    public static int Next(ReadOnlySpan<byte> text, int from)
    {
        var instance = NextInstance(text, from);
        var end = NextWord(text[..instance], from, "ENDSEC"u8);
        return NextWord(text[..end], from, "END-ISO-10303-21"u8);
    }

    private static int NextInstance(ReadOnlySpan<byte> text, int from)
    {
        var at = from;
        while (true)
        {
            var hop = text[at..].IndexOf((byte)'#');
            if (hop < 0) return text.Length;

            at += hop;
            if (Numerals.IsInstanceHead(text, at) && BeginsStatement(text, from, at)) return at;
            at++;
        }
    }

    private static int NextWord(ReadOnlySpan<byte> text, int from, ReadOnlySpan<byte> word)
    {
        var at = from;
        while (true)
        {
            var hop = text[at..].IndexOf(word);
            if (hop < 0) return text.Length;

            at += hop;
            if (Words.Stands(text, at, word) && BeginsStatement(text, from, at)) return at;
            at++;
        }
    }

    private static bool BeginsStatement(ReadOnlySpan<byte> text, int from, int at)
    {
        var before = at;
        while (before > from && text[before - 1] is not ((byte)'\n' or (byte)'\r') && Blanks.IsBlank(text[before - 1])) before--;
        return before == from || text[before - 1] is (byte)';' or (byte)'\n' or (byte)'\r' || EndsComment(text, before);
    }

    private static bool EndsComment(ReadOnlySpan<byte> text, int at) => at >= 2 && text[at - 1] == '/' && text[at - 2] == '*';
}
