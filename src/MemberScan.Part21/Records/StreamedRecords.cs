using System.Text;
using MemberScan.Part21.Index;
using MemberScan.Part21.Sources;
using MemberScan.Part21.Tokens;

namespace MemberScan.Part21.Records;

/// <summary>Instances of a text that stays on disk: each is read when it is met, and a bounded number is kept.</summary>
internal sealed class StreamedRecords(Part21Index index, IReadOnlyCollection<string> wanted) : IDisposable
{
    // Instances kept, and the longest of them [byte]: 64 MiB at most, a few as a rule.
    private const int Kept = 8192;
    private const int LongestKept = 8192;

    private readonly Lock _gate = new();
    private readonly Part21Lookup _lookup = index.CreateLookup();
    private readonly Held?[] _kept = new Held?[Kept];
    private readonly Dictionary<string, string> _keywords = new(StringComparer.Ordinal);
    private readonly LineMap _lines = new(index.Source);
    private long[]? _all;

    /// <summary>The index that it reads through.</summary>
    public Part21Index Index => index;

    /// <summary>The instance at an offset where one begins.</summary>
    public RecordText At(long offset)
    {
        lock (_gate)
        {
            if (_kept[Slot(offset)] is { } kept && kept.Text.Start == offset) return kept.Text;

            return _lookup.TryReadAt(offset, out var instance) ? Hold(instance) : throw new IOException($"{index.Name} was changed while it was read.");
        }
    }

    /// <summary>Finds an instance by its number; the first one when a number is used twice.</summary>
    public bool TryFind(ulong id, out long offset)
    {
        lock (_gate)
        {
            offset = -1;
            if (id > uint.MaxValue || !_lookup.TryFind((uint)id, out var instance)) return false;

            offset = instance.Offset;
            if (_kept[Slot(offset)] is not { } kept || kept.Text.Start != offset) Hold(instance);
            return true;
        }
    }

    /// <summary>Offsets of all wanted instances, in file order.</summary>
    public long[] All()
    {
        lock (_gate)
        {
            if (_all is not null) return _all;

            var all = new List<long>();
            foreach (var keyword in wanted.Distinct(StringComparer.Ordinal)) all.AddRange(index.OffsetsOf(keyword));
            all.Sort();
            return _all = [.. all];
        }
    }

    /// <summary>Line of an offset, from 1.</summary>
    public long LineAt(long offset)
    {
        lock (_gate) return _lines.At(offset);
    }

    /// <inheritdoc />
    public void Dispose() => index.Dispose();

    private static int Slot(long offset) => (int)((ulong)offset * 0x9E37_79B9_7F4A_7C15 >> 51);

    private RecordText Hold(in Part21Instance instance)
    {
        var source = new SourceText(instance.Text.ToArray(), index.Name, instance.Offset, instance.Id);
        var flags = (instance.IsComplex ? InstanceFlags.Complex : 0) | (instance.IsDamaged ? InstanceFlags.Damaged : 0);
        var text = new RecordText(instance.Id, Upper(instance.KeywordAsRead), flags, source, instance.Offset, instance.Text.Length);
        if (text.Length <= LongestKept) _kept[Slot(instance.Offset)] = new Held(text);
        return text;
    }

    // Each keyword as one string: there are few, and comparing equal references is quick.
    private string Upper(ReadOnlySpan<byte> word)
    {
        Span<char> letters = stackalloc char[Part21Limits.KeywordLength];
        letters = letters[..Encoding.ASCII.GetChars(word, letters)];
        for (var i = 0; i < letters.Length; i++) letters[i] = char.ToUpperInvariant(letters[i]);
        var keywords = _keywords.GetAlternateLookup<ReadOnlySpan<char>>();
        if (keywords.TryGetValue(letters, out var known)) return known;

        var keyword = letters.ToString();
        _keywords[keyword] = keyword;
        return keyword;
    }

    private sealed record Held(RecordText Text);
}
