namespace MemberScan.Part21.Tokens;

/// <summary>One parameter in text that was found sound before.</summary>
internal static class ValueToken
{
    /// <summary>Reads the parameter that begins at <paramref name="at"/>, where no blank stands.</summary>
    /// <returns>The offset behind it.</returns>
    public static int Read(ReadOnlySpan<byte> text, int at, out TokenKind kind)
    {
        var first = text[at];
        switch (first)
        {
            case (byte)',' or (byte)')':
                kind = TokenKind.Absent;
                return at;
            case (byte)'\'':
                kind = TokenKind.Text;
                var closed = StringToken.End(text, at);
                return closed < 0 ? text.Length : closed;
            case (byte)'(':
                kind = TokenKind.List;
                return Brackets.End(text, at);
        }

        int end;
        if (Words.Begins(first))
        {
            var bracket = Blanks.Skip(text, Words.End(text, at));
            if (bracket >= 0 && bracket < text.Length && text[bracket] == '(')
            {
                end = Brackets.End(text, bracket);
                kind = HoldsOneValue(text[(bracket + 1)..Math.Max(bracket + 1, end - 1)]) ? TokenKind.Typed : TokenKind.Malformed;
                return end;
            }

            kind = TokenKind.Malformed;
            end = at;
        }
        else
        {
            end = SimpleToken.Read(text, at, out kind);
        }

        var next = Blanks.Skip(text, end);
        if (kind != TokenKind.Malformed && (next == text.Length || (next >= 0 && text[next] is (byte)',' or (byte)')'))) return end;

        kind = TokenKind.Malformed;
        end = Junk.End(text, end);
        if (end < 0) end = text.Length;
        while (end > at && Blanks.IsBlank(text[end - 1])) end--;
        return end;
    }

    private static bool HoldsOneValue(ReadOnlySpan<byte> text)
    {
        var list = new ParameterList(text);
        return list.MoveNext() && list.Kind != TokenKind.Absent && !list.MoveNext();
    }
}
