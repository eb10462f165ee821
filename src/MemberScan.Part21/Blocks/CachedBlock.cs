using MemberScan.Part21.Index;
using MemberScan.Part21.Plain;
using MemberScan.Part21.Sources;
using MemberScan.Part21.Streaming;

namespace MemberScan.Part21.Blocks;

/// <summary>The text of one block, or of one instance, with its instances.</summary>
/// <param name="source">The text.</param>
/// <param name="length">How much is read at a time [byte].</param>
internal sealed class CachedBlock(ByteSource source, int length)
{
    private readonly Window _window = new(source, length);
    private uint[] _ids = new uint[128];
    private (int Start, int Length, InstanceFlags Flags)[] _places = new (int, int, InstanceFlags)[128];

    /// <summary>Its place among the anchors; −1 while it holds none.</summary>
    public int Entry { get; private set; } = -1;

    /// <summary>Number of instances.</summary>
    public int Count { get; private set; }

    /// <summary>Numbers of its instances in file order.</summary>
    public ReadOnlySpan<uint> Ids => _ids.AsSpan(0, Count);

    public void Load(int entry, in BlockEntry anchor, DataScanner scanner)
    {
        Entry = entry;
        Count = 0;
        var at = anchor.Start;
        _window.Shrink();
        var sink = new ListSink(this, at);
        _ = scanner.Scan(_window, ref at, anchor.End, true, ref sink);
        scanner.Log.TakeBack(0);
    }

    /// <summary>Holds the one instance at an offset where an instance is known to begin.</summary>
    public void LoadOne(long offset, DataScanner scanner)
    {
        Entry = -1;
        Count = 0;
        var at = offset;
        var sink = new ListSink(this, at);
        _ = scanner.Scan(_window, ref at, offset + 1, true, ref sink);
        scanner.Log.TakeBack(0);
    }

    public Part21Instance At(int place)
    {
        var (start, length, flags) = _places[place];
        return new Part21Instance(_window.Text.Slice(start, length), _window.Origin + start, _ids[place], flags);
    }

    private readonly struct ListSink(CachedBlock block, long origin) : IStatementSink
    {
        public static bool NeedsLength => true;

        public bool MayWant(uint letters) => false;

        public void Add(long offset, int length, uint id, ReadOnlySpan<byte> keyword, InstanceFlags flags)
        {
            if (block.Count == block._ids.Length)
            {
                Array.Resize(ref block._ids, 2 * block.Count);
                Array.Resize(ref block._places, 2 * block.Count);
            }

            block._ids[block.Count] = id;
            block._places[block.Count] = ((int)(offset - origin), length, flags);
            block.Count++;
        }
    }
}
