using System.Buffers.Binary;
using MemberScan.Part21.Index;
using MemberScan.Part21.Plain;
using MemberScan.Part21.Sources;
using MemberScan.Part21.Streaming;

namespace MemberScan.Part21.Blocks;

/// <summary>Instance number → block: the anchors themselves where numbers rise, five bytes an instance elsewhere.</summary>
/// <remarks>
/// Blocks whose numbers rise, each from above the last of the one before, are found by their anchors. Instances of all other blocks are listed:
/// in groups by the high half of their numbers, in each group the low half in rising order with the block beside it.
/// </remarks>
internal sealed class BlockIndex
{
    /// <summary>Blocks that the list can name; a file of so many is 64 GiB long.</summary>
    public const int MaxBlocks = 1 << 24;

    private const int BlockBytes = 3;

    private readonly Rows<BlockEntry> _entries;

    // Places in _entries of the blocks found by their anchors; null when those are all.
    private readonly int[]? _rising;
    private readonly uint[] _groups = [];
    private readonly ushort[] _lows = [];
    private readonly byte[] _blocks = [];

    public BlockIndex(Rows<BlockEntry> entries, ByteSource source, DataScanner scanner)
    {
        _entries = entries;
        if (CountRising() == _entries.Count) return;

        _rising = ListRising();
        var highest = 0u;
        var counts = new uint[65_537];
        var tally = new TallySink(this, counts, []);
        Walk(source, scanner, ref tally);
        for (var i = 1; i < counts.Length; i++)
        {
            if (counts[i] > 0) highest = (uint)i;
            counts[i] += counts[i - 1];
        }

        _groups = counts[..((int)highest + 1)];
        _lows = new ushort[counts[^1]];
        _blocks = new byte[checked(BlockBytes * (long)_lows.Length)];
        var fill = new TallySink(this, [], [.. _groups]);
        Walk(source, scanner, ref fill);
        SortGroups();
    }

    /// <summary>Number of instances listed one by one.</summary>
    public int Listed => _lows.Length;

    /// <summary>Anchors in file order.</summary>
    public Rows<BlockEntry> Entries => _entries;

    /// <summary>Whether the instances are plain in the block of an offset where one begins.</summary>
    public bool IsPlainAt(long offset)
    {
        var block = (int)(offset / BlockEntry.Length);
        int low = 0, high = _entries.Count - 1;
        while (low <= high)
        {
            var middle = (low + high) >>> 1;
            if (_entries[middle].Block == block) return _entries[middle].IsPlain && !IsShared(middle);
            if (_entries[middle].Block < block) low = middle + 1;
            else high = middle - 1;
        }

        return false;
    }

    // Two data sections may meet in a block; each has an anchor of its own there.
    private bool IsShared(int entry) =>
        (entry > 0 && _entries[entry - 1].Block == _entries[entry].Block)
        || (entry + 1 < _entries.Count && _entries[entry + 1].Block == _entries[entry].Block);

    /// <summary>The place in <see cref="Entries"/> of the only block found by its anchor that may hold a number; −1 if none.</summary>
    public int RisingWith(uint id)
    {
        int low = 0, high = (_rising?.Length ?? _entries.Count) - 1;
        while (low <= high)
        {
            var middle = (low + high) >>> 1;
            if (_entries[EntryAt(middle)].FirstId <= id) low = middle + 1;
            else high = middle - 1;
        }

        if (high < 0) return -1;

        var entry = EntryAt(high);
        return _entries[entry].LastId >= id ? entry : -1;
    }

    /// <summary>The place in <see cref="Entries"/> of the first block that lists a number; −1 if none does.</summary>
    public int ListedWith(uint id)
    {
        var group = (int)(id >> 16);
        if (group + 1 >= _groups.Length) return -1;

        var from = (int)_groups[group];
        var lows = _lows.AsSpan(from, (int)_groups[group + 1] - from);
        var low = (ushort)id;
        int first = 0, behind = lows.Length;
        while (first < behind)
        {
            var middle = (first + behind) >>> 1;
            if (lows[middle] < low) first = middle + 1;
            else behind = middle;
        }

        return first < lows.Length && lows[first] == low ? BlockAt(from + first) : -1;
    }

    /// <summary>Each number that is listed, with its block; equal ones follow each other, the first in the file first.</summary>
    public IEnumerable<(uint Id, int Entry)> List()
    {
        for (var group = 0; group + 1 < _groups.Length; group++)
            for (var i = (int)_groups[group]; i < _groups[group + 1]; i++)
                yield return (((uint)group << 16) | _lows[i], BlockAt(i));
    }

    private int CountRising()
    {
        var (count, last) = (0, -1L);
        for (var i = 0; i < _entries.Count; i++) count += IsRising(_entries[i], ref last) ? 1 : 0;
        return count;
    }

    private int[] ListRising()
    {
        var rising = new int[CountRising()];
        var (count, last) = (0, -1L);
        for (var i = 0; i < _entries.Count; i++)
            if (IsRising(_entries[i], ref last))
                rising[count++] = i;
        return rising;
    }

    private static bool IsRising(in BlockEntry entry, ref long last)
    {
        if (!entry.Rises || entry.FirstId <= last) return false;

        last = entry.LastId;
        return true;
    }

    private int EntryAt(int place) => _rising is null ? place : _rising[place];

    private int BlockAt(int place)
    {
        var at = _blocks.AsSpan(checked(BlockBytes * place), BlockBytes);
        return at[0] | at[1] << 8 | at[2] << 16;
    }

    private void SetBlock(int place, int entry)
    {
        var at = _blocks.AsSpan(checked(BlockBytes * place), BlockBytes);
        BinaryPrimitives.WriteUInt16LittleEndian(at, (ushort)entry);
        at[2] = (byte)(entry >> 16);
    }

    // Over the blocks that are not found by their anchors, neighbours in one go.
    private void Walk(ByteSource source, DataScanner scanner, ref TallySink sink)
    {
        var window = new Window(source, 256 * 1024);
        var rising = 0;
        for (var i = 0; i < _entries.Count;)
        {
            if (rising < _rising!.Length && _rising[rising] == i)
            {
                rising++;
                i++;
                continue;
            }

            var next = rising < _rising.Length ? _rising[rising] : _entries.Count;
            var at = _entries[i].Start;
            sink.Entry = i;
            while (at < _entries[next - 1].End)
            {
                // Between two data sections the scan stops; the next anchor is where it goes on.
                if (scanner.Scan(window, ref at, _entries[next - 1].End, false, ref sink) == DataStop.Until) break;

                var again = sink.Entry + 1;
                while (again < next && _entries[again].Start < at) again++;
                if (again >= next) break;
                at = _entries[again].Start;
                sink.Entry = again;
            }

            i = next;
        }

        scanner.Log.TakeBack(0);
    }

    private void SortGroups()
    {
        var keys = Array.Empty<ulong>();
        for (var group = 0; group + 1 < _groups.Length; group++)
        {
            var from = (int)_groups[group];
            var count = (int)_groups[group + 1] - from;
            if (keys.Length < count) keys = new ulong[count];
            for (var i = 0; i < count; i++) keys[i] = (ulong)_lows[from + i] << 24 | (uint)BlockAt(from + i);
            keys.AsSpan(0, count).Sort();
            for (var i = 0; i < count; i++)
            {
                _lows[from + i] = (ushort)(keys[i] >> 24);
                SetBlock(from + i, (int)(keys[i] & 0xFF_FFFF));
            }
        }
    }

    // Counts the numbers of each group, one place up, or puts each into its place.
    private struct TallySink(BlockIndex index, uint[] counts, uint[] next) : IStatementSink
    {
        public int Entry;

        public static bool NeedsText => false;

        public readonly bool MayWant(uint letters) => false;

        public void AddOther(long offset, uint id, ReadOnlySpan<byte> text, ReadOnlySpan<byte> keyword, InstanceFlags flags) => AddPlain(offset, id, text, keyword);

        public readonly void PassOver()
        {
        }

        public void AddPlain(long offset, uint id, ReadOnlySpan<byte> text, ReadOnlySpan<byte> keyword)
        {
            while (offset >= index._entries[Entry].End) Entry++;
            if (counts.Length > 0)
            {
                counts[(id >> 16) + 1]++;
                return;
            }

            var place = (int)next[id >> 16]++;
            index._lows[place] = (ushort)id;
            index.SetBlock(place, Entry);
        }
    }
}
