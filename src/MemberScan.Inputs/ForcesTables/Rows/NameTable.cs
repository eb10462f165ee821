using System.Diagnostics.CodeAnalysis;

namespace MemberScan.Inputs.ForcesTables.Rows;

/// <summary>Names of a table by number; a name that repeats is one string, found by its bytes.</summary>
internal sealed class NameTable
{
    private readonly Dictionary<byte[], int> _byBytes = new(new ByteComparer());
    private readonly Dictionary<string, int> _byText = new(StringComparer.Ordinal);
    private readonly List<string> _names = [];

    /// <summary>How many different names there are.</summary>
    public int Count => _names.Count;

    /// <summary>The name of a number.</summary>
    public string this[int number] => _names[number];

    /// <summary>The number of a spelling that was met before.</summary>
    public bool TryFind(ReadOnlySpan<byte> spelling, out int number) => _byBytes.GetAlternateLookup<ReadOnlySpan<byte>>().TryGetValue(spelling, out number);

    /// <summary>Takes in a spelling of a name; the same name may be spelt with and without quotes.</summary>
    public int Add(ReadOnlySpan<byte> spelling, string name)
    {
        if (!_byText.TryGetValue(name, out var number))
        {
            _byText[name] = number = _names.Count;
            _names.Add(name);
        }

        // Spellings are kept for speed only: not more of them than a few for each name.
        if (_byBytes.Count < 4 * _names.Count) _byBytes[spelling.ToArray()] = number;
        return number;
    }

    private sealed class ByteComparer : IEqualityComparer<byte[]>, IAlternateEqualityComparer<ReadOnlySpan<byte>, byte[]>
    {
        public bool Equals(byte[]? x, byte[]? y) => x.AsSpan().SequenceEqual(y);

        public int GetHashCode([DisallowNull] byte[] obj) => GetHashCode(obj.AsSpan());

        public bool Equals(ReadOnlySpan<byte> alternate, byte[] other) => alternate.SequenceEqual(other);

        public int GetHashCode(ReadOnlySpan<byte> alternate)
        {
            var hash = new HashCode();
            hash.AddBytes(alternate);
            return hash.ToHashCode();
        }

        public byte[] Create(ReadOnlySpan<byte> alternate) => alternate.ToArray();
    }
}
