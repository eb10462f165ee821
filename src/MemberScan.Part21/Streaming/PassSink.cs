using System.Runtime.CompilerServices;
using MemberScan.Part21.Index;
using MemberScan.Part21.Plain;

namespace MemberScan.Part21.Streaming;

/// <summary>Keeps of each instance what the index needs: the anchor of its block, and its row if its keyword is wanted.</summary>
internal struct PassSink(ChunkResult result, WantedKeywords wanted) : IStatementSink
{
    private readonly List<BlockEntry> _blocks = result.Blocks;
    private readonly List<PlaceRow> _places = result.Places;
    private BlockEntry _entry = new() { Block = -1 };

    /// <inheritdoc />
    public static bool NeedsLength => false;

    /// <summary>Number of instances.</summary>
    public long Count { get; private set; }

    /// <inheritdoc />
    [MethodImpl(MethodImplOptions.AggressiveInlining)]
    public readonly bool MayWant(uint letters) => wanted.MayHold(letters);

    /// <inheritdoc />
    [MethodImpl(MethodImplOptions.AggressiveInlining)]
    public void Add(long offset, int length, uint id, ReadOnlySpan<byte> keyword, InstanceFlags flags)
    {
        var block = (int)((ulong)offset / BlockEntry.Length);
        if (block != _entry.Block) Begin(block, offset, id);
        else if (id <= _entry.LastId) _entry.Rises = false;
        _entry.LastId = id;
        Count++;

        if (keyword.Length > 0) Place(offset, id, keyword);
    }

    [MethodImpl(MethodImplOptions.NoInlining)]
    private readonly void Place(long offset, uint id, ReadOnlySpan<byte> keyword)
    {
        var number = wanted.Find(keyword);
        if (number >= 0) _places.Add(new PlaceRow(offset, id, number));
    }

    /// <summary>Hands over the last block.</summary>
    public readonly void Finish()
    {
        if (_entry.Block >= 0) _blocks.Add(_entry);
    }

    [MethodImpl(MethodImplOptions.NoInlining)]
    private void Begin(int block, long offset, uint id)
    {
        Finish();
        _entry = new BlockEntry { Block = block, FirstId = id, Within = (ushort)(offset % BlockEntry.Length), Rises = true };
    }
}
