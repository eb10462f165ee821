namespace MemberScan.Part21.Index;

/// <summary>Which numbers are referred to: a bit each where they are small for the size of the file, a plain list of the others.</summary>
/// <remarks>Kept instead of every reference: a model has several references per instance, and nearly all of them lead somewhere.</remarks>
internal sealed class ReferenceMarks
{
    private readonly ulong _limit;
    private readonly List<ulong> _large = [];
    private ulong[] _bits = new ulong[64];

    /// <param name="textLength">Length of the text [byte]; the bits take half of it at most.</param>
    public ReferenceMarks(long textLength) => _limit = 4UL * (ulong)textLength;

    /// <summary>Whether references are passed over: nothing is marked, nothing grows.</summary>
    public bool IsOff { get; init; }

    /// <summary>Highest number marked or noted; 0 if none.</summary>
    public ulong Highest { get; private set; }

    public void Mark(ulong id)
    {
        if (IsOff) return;
        if (id > Highest) Highest = id;
        if (id >= _limit)
        {
            _large.Add(id);
            return;
        }

        var word = (int)(id >> 6);
        if (word >= _bits.Length) Array.Resize(ref _bits, Math.Max(word + 1, (int)Math.Min(2L * _bits.Length, (long)(_limit >> 6) + 1)));
        _bits[word] |= 1UL << (int)(id & 63);
    }

    /// <summary>Notes a number that is in use, without a reference to it.</summary>
    public void Note(ulong id)
    {
        if (id > Highest) Highest = id;
    }

    /// <summary>Whether every number marked has an instance.</summary>
    public bool AllFoundIn(IdIndex index)
    {
        foreach (var id in _large)
        {
            if (!index.TryFind(id, out _)) return false;
        }

        for (var word = 0; word < _bits.Length; word++)
        {
            for (var rest = _bits[word]; rest != 0; rest &= rest - 1)
            {
                var id = ((ulong)word << 6) + (ulong)System.Numerics.BitOperations.TrailingZeroCount(rest);
                if (!index.TryFind(id, out _)) return false;
            }
        }

        return true;
    }
}
