namespace MemberScan.Inputs.Values;

/// <summary>Takes a short text of words, numbers and units apart from left to right.</summary>
internal ref struct ValueScanner
{
    /// <summary>Longest text that is read [characters].</summary>
    public const int LongestText = 256;

    private ReadOnlySpan<char> _rest;

    public ValueScanner(ReadOnlySpan<char> text) => _rest = text.Trim();

    public readonly bool AtEnd => _rest.IsEmpty;

    /// <summary>What is left.</summary>
    public readonly ReadOnlySpan<char> Rest => _rest;

    /// <summary>Takes one of the given characters, if it is next.</summary>
    public bool Take(ReadOnlySpan<char> anyOf)
    {
        if (_rest.IsEmpty || !anyOf.Contains(_rest[0])) return false;
        Skip(1);
        return true;
    }

    /// <summary>Takes the letters that are next; empty if none are.</summary>
    public string Word()
    {
        var length = 0;
        while (length < _rest.Length && char.IsLetter(_rest[length])) length++;
        var word = _rest[..length].ToString();
        Skip(length);
        return word;
    }

    /// <summary>Takes a number; the error is a clause with the remedy.</summary>
    public bool TryNumber(out double value, out string error)
    {
        error = "";
        var length = NumberText.Measure(_rest);
        if (length == 0)
        {
            value = 0;
            var token = _rest[..TokenLength(_rest)];
            var fault = NumberText.Read(token, out _);
            error = fault == NumberFault.Empty
                ? "a number is missing"
                : $"{Excerpt.Of(token)} is not a {(fault == NumberFault.NotFinite ? "finite " : "")}number; {NumberText.Remedy(fault)}";
            return false;
        }

        if (length + 1 < _rest.Length && _rest[length] == ',' && char.IsAsciiDigit(_rest[length + 1]))
        {
            value = 0;
            error = $"{Excerpt.Of(_rest[..TokenLength(_rest, ' ')])} has a decimal comma; {NumberText.Remedy(NumberFault.DecimalComma)}";
            return false;
        }

        var finite = NumberText.Read(_rest[..length], out value) == NumberFault.None;
        if (!finite) error = $"{Excerpt.Of(_rest[..length])} is too large; {NumberText.Remedy(NumberFault.NotFinite)}";
        Skip(length);
        return finite;
    }

    /// <summary>Takes everything up to the next blank, separator, '=' or '×'; empty if that is next.</summary>
    public string UnitWord()
    {
        var length = TokenLength(_rest);
        var word = _rest[..length].ToString();
        Skip(length);
        return word;
    }

    private static int TokenLength(ReadOnlySpan<char> text, params ReadOnlySpan<char> stops)
    {
        var length = text.IndexOfAny(stops.IsEmpty ? " \t,;=×" : stops);
        return length < 0 ? text.Length : length;
    }

    private void Skip(int length) => _rest = _rest[length..].TrimStart();
}
