using MemberScan.Part21.Blocks;
using MemberScan.Part21.Index;
using MemberScan.Part21.Sources;
using MemberScan.Part21.Streaming;

namespace MemberScan.Part21;

/// <summary>Finds instances of a <see cref="Part21Index"/> and shows their text; one for each thread.</summary>
/// <remarks>It keeps a few hundred blocks of text in memory [4 KiB each], so that instances near each other are read once.</remarks>
public sealed class Part21Lookup
{
    private const int CachedBlocks = 256;

    // Most blocks end within an instance that is shorter than the rest; most instances are shorter than one piece [byte].
    private const int BlockPiece = BlockEntry.Length + 1024;
    private const int InstancePiece = 1024;

    private readonly BlockIndex _index;
    private readonly ReadAhead _source;
    private readonly DataScanner _scanner;
    private readonly CachedBlock?[] _cache = new CachedBlock?[CachedBlocks];
    private readonly CachedBlock _single;
    private int _last = -1;

    internal Part21Lookup(BlockIndex index, ByteSource source, DataScanner scanner)
    {
        (_index, _source, _scanner) = (index, new ReadAhead(source), scanner);
        _single = new CachedBlock(_source, InstancePiece);
    }

    /// <summary>Finds an instance by its number; the first one when a number is used twice.</summary>
    public bool TryFind(uint id, out Part21Instance instance)
    {
        instance = default;
        if (!TryFindPlace(id, out var block, out var place)) return false;

        instance = block.At(place);
        return true;
    }

    /// <summary>The instance at an offset.</summary>
    /// <param name="offset">One of <see cref="Part21Index.OffsetsOf"/> [byte].</param>
    /// <param name="instance">The instance.</param>
    /// <returns>False where no instance begins.</returns>
    public bool TryReadAt(long offset, out Part21Instance instance)
    {
        _single.LoadOne(offset, _index.IsPlainAt(offset), _scanner);
        var isFound = _single.Count > 0 && _single.At(0).Offset == offset;
        instance = isFound ? _single.At(0) : default;
        return isFound;
    }

    internal bool TryFindPlace(uint id, out CachedBlock block, out int place)
    {
        var rising = _index.Listed == 0 && Holds(_last, id) ? _last : _index.RisingWith(id);
        var listed = _index.ListedWith(id);
        var isFound = TryIn(rising, id, out block, out place);
        if (listed < 0 || (isFound && rising < listed)) return isFound;

        return TryIn(listed, id, out block, out place);
    }

    internal CachedBlock Block(int entry)
    {
        ref var slot = ref _cache[entry % CachedBlocks];
        slot ??= new CachedBlock(_source, BlockPiece);
        if (slot.Entry != entry) slot.Load(entry, _index.Entries[entry], _scanner);
        return slot;
    }

    private bool Holds(int entry, uint id) => entry >= 0 && _index.Entries[entry].FirstId <= id && id <= _index.Entries[entry].LastId;

    private bool TryIn(int entry, uint id, out CachedBlock block, out int place)
    {
        block = null!;
        place = -1;
        if (entry < 0) return false;

        block = Block(entry);
        place = block.Ids.IndexOf(id);
        if (place >= 0) _last = entry;
        return place >= 0;
    }
}
