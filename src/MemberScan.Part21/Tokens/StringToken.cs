namespace MemberScan.Part21.Tokens;

/// <summary>Where a string in apostrophes ends.</summary>
/// <remarks>
/// A doubled apostrophe needs no case: it closes one string and opens the next. The trap is <c>\S\'</c>: the grammar lets the directive take a
/// single apostrophe, many writers double it, and a text may just end in <c>\S\</c>. What follows the apostrophes decides: a comma or a
/// bracket means that the last of them closes the string.
/// </remarks>
internal static class StringToken
{
    /// <summary>The offset behind the closing apostrophe of the string that opens at <paramref name="start"/>; −1 if it is not closed.</summary>
    public static int End(ReadOnlySpan<byte> text, int start)
    {
        var at = start + 1;
        while (true)
        {
            var hop = text[at..].IndexOf((byte)'\'');
            if (hop < 0) return -1;

            at += hop;
            if (at - start >= 4 && text[(at - 3)..at].SequenceEqual(@"\S\"u8)) return EndByDirectives(text, start);
            if (at + 1 >= text.Length || text[at + 1] != '\'') return at + 1;

            at += 2;
        }
    }

    /// <summary>Whether the content runs over the head of another instance at the start of a line: the closing apostrophe is missing.</summary>
    public static bool RunsOverAnInstance(ReadOnlySpan<byte> content)
    {
        while (true)
        {
            var line = content.IndexOfAny((byte)'\n', (byte)'\r');
            if (line < 0) return false;

            var before = content[..line].TrimEnd((byte)' ');
            var at = line;
            while (at < content.Length && Blanks.IsBlank(content[at])) at++;
            if (before.Length > 0 && before[^1] == ';' && Numerals.IsInstanceHead(content, at)) return true;
            content = content[at..];
        }
    }

    /// <summary>Number of apostrophes from <paramref name="at"/> on.</summary>
    public static int RunOfApostrophes(ReadOnlySpan<byte> text, int at)
    {
        var run = text[at..].IndexOfAnyExcept((byte)'\'');
        return run < 0 ? text.Length - at : run;
    }

    // From the start and directive by directive: only so is it known whether \S\ is a directive or the tail of another one.
    private static int EndByDirectives(ReadOnlySpan<byte> text, int start)
    {
        var at = start + 1;
        while (at < text.Length)
        {
            if (text[at] == '\'')
            {
                if (at + 1 >= text.Length || text[at + 1] != '\'') return at + 1;
                at += 2;
            }
            else if (text[at..].StartsWith(@"\S\'"u8))
            {
                var after = at + 3 + RunOfApostrophes(text, at + 3);
                if (IsFollowedByDelimiter(text, after)) return after;
                at = after;
            }
            else
            {
                at += DirectiveLength(text[at..]);
            }
        }

        return -1;
    }

    private static bool IsFollowedByDelimiter(ReadOnlySpan<byte> text, int at)
    {
        while (at < text.Length && Blanks.IsBlank(text[at])) at++;
        return at >= text.Length || text[at] is (byte)',' or (byte)')';
    }

    // Only as exact as the search for apostrophes needs.
    private static int DirectiveLength(ReadOnlySpan<byte> rest)
    {
        if (rest[0] != '\\' || rest.Length < 3) return 1;
        return rest[1] switch
        {
            (byte)'\\' => 2,
            (byte)'S' when rest[2] == '\\' => rest.StartsWith(@"\S\\\"u8) ? 5 : Math.Min(4, rest.Length),
            (byte)'X' or (byte)'N' or (byte)'F' when rest[2] == '\\' => 3,
            (byte)'X' or (byte)'P' when rest.Length > 3 && rest[3] == '\\' => 4,
            _ => 1,
        };
    }
}
