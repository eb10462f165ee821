namespace MemberScan.Part21.Index;

/// <summary>Each keyword once, in upper case, with a small number; number 0 is the empty keyword.</summary>
internal sealed class KeywordTable
{
    private readonly Dictionary<string, int> _numbers = new(StringComparer.Ordinal) { [""] = 0 };
    private readonly Dictionary<string, int>.AlternateLookup<ReadOnlySpan<char>> _lookup;
    private readonly List<string> _words = [""];

    public KeywordTable() => _lookup = _numbers.GetAlternateLookup<ReadOnlySpan<char>>();

    /// <summary>Number of keywords, the empty one included.</summary>
    public int Count => _words.Count;

    public string this[int number] => _words[number];

    /// <summary>The number of a keyword, given to it now if it is new; false if it is new and the table holds <paramref name="limit"/> already.</summary>
    public bool TryNumber(ReadOnlySpan<byte> word, int limit, out int number)
    {
        Span<char> upper = stackalloc char[128];
        upper = word.Length <= upper.Length ? upper[..word.Length] : new char[word.Length];
        for (var i = 0; i < word.Length; i++)
        {
            var letter = (char)word[i];
            upper[i] = char.IsAsciiLetterLower(letter) ? (char)(letter - 32) : letter;
        }

        if (_lookup.TryGetValue(upper, out number)) return true;
        if (_words.Count > limit) return false;

        number = _words.Count;
        var text = upper.ToString();
        _words.Add(text);
        _numbers.Add(text, number);
        return true;
    }

    public bool TryFind(string word, out int number) => _numbers.TryGetValue(word, out number);
}
