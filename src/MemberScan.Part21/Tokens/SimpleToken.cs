namespace MemberScan.Part21.Tokens;

/// <summary>Parameters without brackets or apostrophes: <c>$ * #12 12 1.5 .LITERAL. "0F"</c>.</summary>
internal static class SimpleToken
{
    /// <summary>Reads one; <see cref="TokenKind.Malformed"/> where it is none of these.</summary>
    /// <returns>The offset behind it.</returns>
    public static int Read(ReadOnlySpan<byte> text, int at, out TokenKind kind)
    {
        switch (text[at])
        {
            case (byte)'$':
                kind = TokenKind.Unset;
                return at + 1;
            case (byte)'*':
                kind = TokenKind.Derived;
                return at + 1;
            case (byte)'#':
                at++;
                kind = Numerals.TryRead(text, ref at, out _) ? TokenKind.Reference : TokenKind.Malformed;
                return at;
            case (byte)'.':
                return ReadEnumeration(text, at, out kind);
            case (byte)'"':
                return ReadBinary(text, at, out kind);
            default:
                return ReadNumber(text, at, out kind);
        }
    }

    // ENUMERATION = "." UPPER { UPPER | DIGIT } "."
    private static int ReadEnumeration(ReadOnlySpan<byte> text, int at, out TokenKind kind)
    {
        kind = TokenKind.Malformed;
        at++;
        if (at >= text.Length || !Words.Begins(text[at]) || text[at] == '!') return at;

        at = Words.End(text, at);
        if (at >= text.Length || text[at] != '.') return at;

        kind = TokenKind.Enumeration;
        return at + 1;
    }

    // BINARY = """ ( "0" | "1" | "2" | "3" ) { HEX } """
    private static int ReadBinary(ReadOnlySpan<byte> text, int at, out TokenKind kind)
    {
        kind = TokenKind.Malformed;
        var first = at + 1;
        at = first;
        while (at < text.Length && char.IsAsciiHexDigit((char)text[at])) at++;
        if (at >= text.Length || text[at] != '"') return at;

        if (at > first && text[first] is >= (byte)'0' and <= (byte)'3') kind = TokenKind.Binary;
        return at + 1;
    }

    // INTEGER = [ SIGN ] DIGIT { DIGIT }
    // REAL = [ SIGN ] DIGIT { DIGIT } "." { DIGIT } [ "E" [ SIGN ] DIGIT { DIGIT } ]; a missing point and a small e are taken too.
    private static int ReadNumber(ReadOnlySpan<byte> text, int at, out TokenKind kind)
    {
        kind = TokenKind.Malformed;
        if (text[at] is (byte)'+' or (byte)'-') at++;
        var first = at;
        at = SkipDigits(text, at);
        if (at == first) return at;

        var isReal = false;
        if (at < text.Length && text[at] == '.')
        {
            isReal = true;
            at = SkipDigits(text, at + 1);
        }

        if (at < text.Length && text[at] is (byte)'E' or (byte)'e')
        {
            isReal = true;
            at++;
            if (at < text.Length && text[at] is (byte)'+' or (byte)'-') at++;
            var exponent = at;
            at = SkipDigits(text, at);
            if (at == exponent) return at;
        }

        kind = isReal ? TokenKind.Real : TokenKind.Integer;
        return at;
    }

    private static int SkipDigits(ReadOnlySpan<byte> text, int at)
    {
        while (at < text.Length && char.IsAsciiDigit((char)text[at])) at++;
        return at;
    }
}
