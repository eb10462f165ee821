using System.Buffers.Binary;
using System.Runtime.CompilerServices;
using System.Runtime.InteropServices;
using System.Text;

namespace MemberScan.Part21.Streaming;

/// <summary>The keywords whose instances are indexed exactly, looked up by their bytes.</summary>
internal sealed class WantedKeywords
{
    private const int Slots = 1024;
    private const int FilterBits = 4096;

    // Number + 1 of the first keyword of a slot; 0 where there is none, which settles nearly every look-up.
    private readonly short[] _slots = new short[Slots];
    private readonly short[] _next;

    // One bit for each hash of the fourth to seventh letter: the first three are the same in all keywords of a schema.
    private readonly ulong[] _filter = new ulong[FilterBits / 64];
    private readonly byte[][] _words;

    public WantedKeywords(IReadOnlyList<string> words)
    {
        _words = [.. words.Select(Encoding.ASCII.GetBytes)];
        _next = new short[_words.Length];
        for (var i = 0; i < _words.Length; i++)
        {
            ref var slot = ref _slots[Slot(_words[i])];
            _next[i] = slot;
            slot = (short)(i + 1);
            if (_words[i].Length < 7) _filter.AsSpan().Fill(ulong.MaxValue);
            else Mark(Hash(BinaryPrimitives.ReadUInt32LittleEndian(_words[i].AsSpan(3))));
        }
    }

    /// <summary>Number of keywords.</summary>
    public int Count => _words.Length;

    /// <summary>Whether a keyword with these as its fourth to seventh letter, lowest first, may be wanted.</summary>
    [MethodImpl(MethodImplOptions.AggressiveInlining)]
    public bool MayHold(uint letters)
    {
        var hash = Hash(letters);
        return (Unsafe.Add(ref MemoryMarshal.GetArrayDataReference(_filter), hash >> 6) >> (int)(hash & 63) & 1) != 0;
    }

    /// <summary>The number of an upper-case keyword; −1 if it is not wanted.</summary>
    public int Find(ReadOnlySpan<byte> word)
    {
        var number = _slots[Slot(word)];
        return number == 0 ? -1 : FindFrom(number - 1, word);
    }

    private void Mark(uint hash) => _filter[hash >> 6] |= 1UL << (int)(hash & 63);

    // Twelve bits.
    [MethodImpl(MethodImplOptions.AggressiveInlining)]
    private static uint Hash(uint letters) => letters * 0x9E37_79B1 >> 20;

    private int FindFrom(int number, ReadOnlySpan<byte> word)
    {
        while (number >= 0)
        {
            if (word.SequenceEqual(_words[number])) return number;
            number = _next[number] - 1;
        }

        return -1;
    }

    // Last eight bytes and length: first ones are the same in most keywords of a schema.
    [MethodImpl(MethodImplOptions.AggressiveInlining)]
    private static int Slot(ReadOnlySpan<byte> word)
    {
        var length = word.Length;
        var tail = length >= 8
            ? Unsafe.ReadUnaligned<ulong>(ref Unsafe.Add(ref MemoryMarshal.GetReference(word), length - 8))
            : Short(word);
        return (int)((tail + (ulong)length * 0x9E37) * 0x9E3779B97F4A7C15 >> 54);
    }

    private static ulong Short(ReadOnlySpan<byte> word)
    {
        var bits = 0UL;
        foreach (var letter in word) bits = bits << 8 | letter;
        return bits;
    }
}
