namespace MemberScan.Part21.Tokens;

/// <summary>Walks the parameters between two brackets.</summary>
internal ref struct ParameterList
{
    private readonly ReadOnlySpan<byte> _text;
    private int _at;
    private bool _begun;

    /// <param name="text">What stands between the brackets, without them.</param>
    public ParameterList(ReadOnlySpan<byte> text) => _text = text;

    /// <summary>First byte of the current parameter.</summary>
    public int Start { get; private set; }

    /// <summary>Behind the last byte of the current parameter.</summary>
    public int End { get; private set; }

    /// <summary>What the current parameter is.</summary>
    public TokenKind Kind { get; private set; }

    /// <summary>Goes to the next parameter; false behind the last.</summary>
    public bool MoveNext()
    {
        var at = Blanks.Skip(_text, _at);
        if (_begun)
        {
            if (at < 0 || at >= _text.Length || _text[at] != ',') return false;
            at = Blanks.Skip(_text, at + 1);
        }
        else if (at < 0 || at >= _text.Length)
        {
            return false;
        }

        _begun = true;
        Start = at < 0 ? _text.Length : at;
        Kind = TokenKind.Absent;
        End = Start < _text.Length ? Read() : Start;
        _at = End;
        return true;
    }

    private int Read()
    {
        var end = ValueToken.Read(_text, Start, out var kind);
        Kind = kind;
        return end;
    }
}
