using System.Runtime.CompilerServices;
using MemberScan.Part21.Index;
using MemberScan.Part21.Plain;

namespace MemberScan.Part21.Streaming;

/// <summary>Keeps of each instance what the index needs: the anchor of its block, and its row if its keyword is wanted.</summary>
internal struct PassSink(ChunkResult result, WantedKeywords wanted) : IStatementSink
{
    private BlockEntry _entry = new() { Block = -1 };

    /// <inheritdoc />
    public static bool NeedsText => false;

    /// <summary>Number of instances.</summary>
    public long Count { get; private set; }

    /// <inheritdoc />
    [MethodImpl(MethodImplOptions.AggressiveInlining)]
    public readonly bool MayWant(uint letters) => wanted.MayHold(letters);

    /// <inheritdoc />
    [MethodImpl(MethodImplOptions.AggressiveInlining)]
    public void AddPlain(long offset, uint id, ReadOnlySpan<byte> text, ReadOnlySpan<byte> keyword)
    {
        Anchor(offset, id);
        if (keyword.Length > 0) Place(offset, id, text, keyword, InstanceFlags.None);
    }

    /// <inheritdoc />
    public void AddOther(long offset, uint id, ReadOnlySpan<byte> text, ReadOnlySpan<byte> keyword, InstanceFlags flags)
    {
        Anchor(offset, id);
        _entry.IsPlain = false;
        Place(offset, id, text, keyword, flags);
    }

    /// <inheritdoc />
    public void PassOver() => _entry.IsPlain = false;

    /// <summary>Hands over the last block.</summary>
    public readonly void Finish()
    {
        if (_entry.Block >= 0) result.Blocks.Add(_entry);
    }

    [MethodImpl(MethodImplOptions.AggressiveInlining)]
    private void Anchor(long offset, uint id)
    {
        var block = (int)((ulong)offset / BlockEntry.Length);
        if (block != _entry.Block) Begin(block, offset, id);
        else if (id <= _entry.LastId) _entry.Rises = false;
        _entry.LastId = id;
        Count++;
    }

    [MethodImpl(MethodImplOptions.NoInlining)]
    private void Begin(int block, long offset, uint id)
    {
        Finish();
        _entry = new BlockEntry { Block = block, FirstId = id, Within = (ushort)(offset % BlockEntry.Length), Rises = true, IsPlain = true };
    }

    [MethodImpl(MethodImplOptions.NoInlining)]
    private readonly void Place(long offset, uint id, ReadOnlySpan<byte> text, ReadOnlySpan<byte> keyword, InstanceFlags flags)
    {
        var number = wanted.Find(keyword);
        if (number < 0) return;

        result.Places.Add(new PlaceRow(offset, id, number));
        result.Taker?.Take(new Part21Instance(text, offset, id, flags));
    }
}
