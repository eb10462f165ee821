using System.Numerics;
using System.Runtime.CompilerServices;
using System.Runtime.InteropServices;
using System.Runtime.Intrinsics;
using MemberScan.Part21.Index;
using MemberScan.Part21.Plain;
using MemberScan.Part21.Sources;
using MemberScan.Part21.Streaming;
using MemberScan.Part21.Tokens;

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
        if (anchor.IsPlain && TryLoadPlain(at, anchor.End)) return;

        Count = 0;
        var sink = new ListSink(this, at);
        _ = scanner.Scan(_window, ref at, anchor.End, true, ref sink);
        scanner.Log.TakeBack(0);
    }

    /// <summary>Holds the one instance at an offset where an instance is known to begin.</summary>
    /// <param name="offset">Where it begins [byte].</param>
    /// <param name="isPlain">Whether it was found plain before.</param>
    /// <param name="scanner">Reads it otherwise.</param>
    public void LoadOne(long offset, bool isPlain, DataScanner scanner)
    {
        Entry = -1;
        Count = 0;
        if (isPlain && TryLoadPlain(offset, offset + 1)) return;

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

    // Statements found plain before: they end at semicolons outside of strings, and nothing else is looked at. False where that is not enough.
    private bool TryLoadPlain(long start, long until)
    {
        _window.Hold(start, 0);
        var text = _window.Text;
        ref var bytes = ref MemoryMarshal.GetReference(text);
        var limit = (int)Math.Min(until - start, text.Length);
        var (at, inString) = (0, 0UL);
        for (var word = 0; word < text.Length; word += 64)
        {
            var loaded = Vector512.LoadUnsafe(ref Unsafe.Add(ref bytes, word));
            var quotes = Vector512.Equals(loaded, Vector512.Create((byte)'\'')).ExtractMostSignificantBits();
            var inside = WideBits.PrefixXor(quotes) ^ inString;
            inString = (ulong)((long)inside >> 63);
            for (var ends = Vector512.Equals(loaded, Vector512.Create((byte)';')).ExtractMostSignificantBits() & ~inside; ends != 0; ends &= ends - 1)
            {
                var end = word + BitOperations.TrailingZeroCount(ends) + 1;
                if (end > text.Length || !PlainScanner.TryHead(ref bytes, at, out var id, out _)) return false;

                Add(id, at, end - at, InstanceFlags.None);
                at = end;
                while (at < text.Length && Blanks.IsBlank(text[at])) at++;
                if (at >= limit) return at < text.Length || limit < text.Length || _window.IsLast;
                if (text[at] != '#') return true;
            }
        }

        return false;
    }

    private void Add(uint id, int start, int length, InstanceFlags flags)
    {
        if (Count == _ids.Length)
        {
            Array.Resize(ref _ids, 2 * Count);
            Array.Resize(ref _places, 2 * Count);
        }

        _ids[Count] = id;
        _places[Count] = (start, length, flags);
        Count++;
    }

    private readonly struct ListSink(CachedBlock block, long origin) : IStatementSink
    {
        public static bool NeedsText => true;

        public bool MayWant(uint letters) => false;

        public void PassOver()
        {
        }

        public void AddPlain(long offset, uint id, ReadOnlySpan<byte> text, ReadOnlySpan<byte> keyword) => block.Add(id, (int)(offset - origin), text.Length, InstanceFlags.None);

        public void AddOther(long offset, uint id, ReadOnlySpan<byte> text, ReadOnlySpan<byte> keyword, InstanceFlags flags) =>
            block.Add(id, (int)(offset - origin), text.Length, flags);
    }
}
