namespace MemberScan.Part21.Tokens;

/// <summary>Instance numbers such as <c>#0012</c>; leading zeros do not count.</summary>
internal static class Numerals
{
    /// <summary>Reads the digits from <paramref name="at"/> on; false without a digit or beyond 64 bits.</summary>
    /// <param name="text">The text.</param>
    /// <param name="at">First digit; afterwards the offset behind the last digit.</param>
    /// <param name="id">The number.</param>
    public static bool TryRead(ReadOnlySpan<byte> text, ref int at, out ulong id)
    {
        var first = at;
        var fits = true;
        id = 0;
        while (at < text.Length && char.IsAsciiDigit((char)text[at]))
        {
            var digit = (ulong)(text[at] - '0');
            if (id > (ulong.MaxValue - digit) / 10) fits = false;
            else id = id * 10 + digit;
            at++;
        }

        if (!fits) id = 0;
        return fits && at > first;
    }

    /// <summary>Whether <c>#digits =</c> stands at <paramref name="at"/>: the head of an instance, which no parameter can look like.</summary>
    public static bool IsInstanceHead(ReadOnlySpan<byte> text, int at)
    {
        if (at >= text.Length || text[at] != '#') return false;
        var end = at + 1;
        while (end < text.Length && char.IsAsciiDigit((char)text[end])) end++;
        if (end == at + 1) return false;

        while (end < text.Length && Blanks.IsBlank(text[end])) end++;
        return end < text.Length && text[end] == '=';
    }
}
