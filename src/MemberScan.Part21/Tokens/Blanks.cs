namespace MemberScan.Part21.Tokens;

/// <summary>What may stand between two tokens: blanks, control characters, line ends and comments.</summary>
internal static class Blanks
{
    /// <summary>Whether the byte is outside the file's alphabet or a space; such bytes part tokens.</summary>
    public static bool IsBlank(byte value) => value <= 0x20 || value == 0x7F;

    /// <summary>
    /// The first offset from <paramref name="at"/> on that is neither blank nor in a comment; the length at the end of the text;
    /// the complement (negative) of the offset of a comment that is not closed.
    /// </summary>
    public static int Skip(ReadOnlySpan<byte> text, int at)
    {
        while (at < text.Length)
        {
            var value = text[at];
            if (IsBlank(value))
            {
                at++;
                continue;
            }

            if (value != '/' || at + 1 >= text.Length || text[at + 1] != '*') return at;

            var end = text[(at + 2)..].IndexOf("*/"u8);
            if (end < 0) return ~at;
            at += end + 4;
        }

        return at;
    }
}
