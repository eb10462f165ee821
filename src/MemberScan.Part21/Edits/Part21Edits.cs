using System.Buffers;
using System.Buffers.Text;
using System.Globalization;
using System.Runtime.InteropServices;
using System.Text;
using MemberScan.Part21.Findings;
using MemberScan.Part21.Index;
using MemberScan.Part21.Plain;
using MemberScan.Part21.Reading;
using MemberScan.Part21.Sources;
using MemberScan.Part21.Streaming;
using Microsoft.Win32.SafeHandles;

namespace MemberScan.Part21.Edits;

/// <summary>Changes laid over a text: instances appended, replaced, removed. Every byte that no change names stays as it is.</summary>
/// <remarks>Not safe for several threads. The index must stay open, and its file unchanged, until the changes are written.</remarks>
public sealed class Part21Edits
{
    private const int CopyLength = 1024 * 1024;
    private static readonly WantedKeywords s_nothing = new([]);

    private readonly Part21Index _index;
    private readonly Part21Lookup _lookup;
    private readonly SortedDictionary<long, (int Length, byte[] Text)> _changes = [];
    private readonly ArrayBufferWriter<byte> _appended = new();
    private readonly byte[] _lineEnd;
    private readonly FindingLog _log = new();
    private readonly InstanceReader _reader;
    private readonly ChunkResult _plainOnes = new() { From = 0 };
    private byte[] _draft = new byte[1024];
    private uint _lastId;
    private bool _hasLastId;

    /// <summary>No changes yet.</summary>
    public Part21Edits(Part21Index index)
    {
        ArgumentNullException.ThrowIfNull(index);
        _index = index;
        _lookup = index.CreateLookup();
        _lineEnd = Encoding.ASCII.GetBytes(index.LineEnd);
        var marks = new ReferenceMarks(0) { IsOff = true };
        _reader = new InstanceReader(_log, marks, new ParameterScanner(_log, marks, Part21File.ShippedLimits), Part21File.ShippedLimits);
    }

    /// <summary>Whether nothing is changed.</summary>
    public bool IsEmpty => _changes.Count == 0 && _appended.WrittenCount == 0;

    /// <summary>Appends an instance before the end of the last data section.</summary>
    /// <param name="record">Keyword and arguments such as <c>IFCLABEL('x')</c>, in the spelling of Part 21 (<see cref="Part21Text"/>), ASCII only.</param>
    /// <returns>Its number, above every number in use.</returns>
    /// <exception cref="ArgumentException">That is no sound record.</exception>
    /// <exception cref="InvalidOperationException">The text has no place to append at, or no number is left.</exception>
    public uint Append(string record)
    {
        ArgumentNullException.ThrowIfNull(record);
        return Append(Bytes(record));
    }

    /// <summary>As <see cref="Append(string)"/>, from bytes; nothing is allocated for an instance.</summary>
    /// <param name="record">Keyword and arguments, ASCII only.</param>
    public uint Append(ReadOnlySpan<byte> record)
    {
        if (_index.InsertionOffset < 0) throw new InvalidOperationException($"{_index.Name} has no ENDSEC of a data section, so there is no place to append at.");

        if (!_hasLastId) (_lastId, _hasLastId) = (_index.HighestId, true);
        if (_lastId == uint.MaxValue) throw new InvalidOperationException($"{_index.Name} uses the number {uint.MaxValue}; no higher one is left.");

        var text = Spell(_lastId + 1, record);
        _appended.Write(text);
        _appended.Write(_lineEnd);
        return ++_lastId;
    }

    /// <summary>Replaces an instance, keeping its number; the first one when a number is used twice.</summary>
    /// <param name="id">Its number.</param>
    /// <param name="record">As for <see cref="Append(string)"/>.</param>
    /// <exception cref="ArgumentException">That is no sound record, or there is no such instance.</exception>
    public void Replace(uint id, string record)
    {
        ArgumentNullException.ThrowIfNull(record);
        Change(id, Spell(id, Bytes(record)).ToArray());
    }

    /// <summary>Removes an instance, from '#' to ';'; the first one when a number is used twice.</summary>
    /// <exception cref="ArgumentException">There is no such instance.</exception>
    public void Remove(uint id) => Change(id, []);

    /// <summary>Writes the changed text in one pass.</summary>
    public void WriteTo(Stream output)
    {
        ArgumentNullException.ThrowIfNull(output);
        var buffer = ArrayPool<byte>.Shared.Rent(CopyLength);
        WriteTo(output.Write, Copy);
        ArrayPool<byte>.Shared.Return(buffer);

        void Copy(long from, long until)
        {
            while (from < until) output.Write(Read(buffer, ref from, until));
        }
    }

    // Untouched stretches and changes in file order.
    private void WriteTo(Action<byte[], int, int> write, Action<long, long> copy)
    {
        var at = 0L;
        var isAppended = _appended.WrittenCount == 0;
        foreach (var (offset, change) in _changes)
        {
            if (!isAppended && offset > _index.InsertionOffset) Insert();
            copy(at, offset);
            write(change.Text, 0, change.Text.Length);
            at = offset + change.Length;
        }

        if (!isAppended) Insert();
        copy(at, _index.Length);

        void Insert()
        {
            copy(at, _index.InsertionOffset);
            at = _index.InsertionOffset;
            _ = MemoryMarshal.TryGetArray(_appended.WrittenMemory, out var appended);
            write(appended.Array!, appended.Offset, appended.Count);
            isAppended = true;
        }
    }

    private ReadOnlySpan<byte> Read(byte[] buffer, ref long from, long until)
    {
        var count = _index.Read(from, buffer.AsSpan(0, (int)Math.Min(CopyLength, until - from)));
        if (count == 0) throw new IOException($"{_index.Name} became shorter while it was read.");

        from += count;
        return buffer.AsSpan(0, count);
    }

    private void WriteTo(SafeFileHandle output)
    {
        var position = 0L;
        var buffer = ArrayPool<byte>.Shared.Rent(CopyLength);
        WriteTo(Write, Copy);
        ArrayPool<byte>.Shared.Return(buffer);

        void Write(byte[] text, int offset, int count)
        {
            RandomAccess.Write(output, text.AsSpan(offset, count), position);
            position += count;
        }

        void Copy(long from, long until)
        {
            if (_index.Source is FileSource file) KernelCopy.Copy(file.File, ref from, until, output, ref position);
            while (from < until)
            {
                var text = Read(buffer, ref from, until);
                RandomAccess.Write(output, text, position);
                position += text.Length;
            }
        }
    }

    /// <summary>Writes the changed text to a file that is there as a whole or, if anything fails, not touched: a temporary file beside it takes its place.</summary>
    /// <param name="path">The file; it may be the one that was indexed.</param>
    /// <param name="toDisk">Whether to wait until the disk has it, so that not even a power cut leaves half a file; a copy command does not.</param>
    /// <exception cref="IOException">It cannot be written.</exception>
    public void Save(string path, bool toDisk = true)
    {
        ArgumentException.ThrowIfNullOrEmpty(path);
        var whole = Path.GetFullPath(path);
        var temporary = Path.Combine(Path.GetDirectoryName(whole)!, $".{Path.GetFileName(whole)}.{Path.GetRandomFileName()}");
        try
        {
            using (var output = File.OpenHandle(temporary, FileMode.CreateNew, FileAccess.Write, FileShare.None))
            {
                WriteTo(output);
                if (toDisk) RandomAccess.FlushToDisk(output);
            }

            File.Move(temporary, whole, overwrite: true);
        }
        catch
        {
            File.Delete(temporary);
            throw;
        }
    }

    private void Change(uint id, byte[] text)
    {
        if (!_lookup.TryFind(id, out var instance))
            throw new ArgumentException(string.Create(CultureInfo.InvariantCulture, $"{_index.Name} has no instance #{id}."), nameof(id));

        _changes[instance.Offset] = (instance.Text.Length, text);
    }

    private static byte[] Bytes(string record) => Ascii.IsValid(record) ? Encoding.ASCII.GetBytes(record) : throw NotSound(record);

    // #id=RECORD; as the reader of models would take it: one sound instance, and nothing else.
    private ReadOnlySpan<byte> Spell(uint id, ReadOnlySpan<byte> record)
    {
        const int Around = 16;
        if (_draft.Length < record.Length + Around + PlainScanner.Slack) _draft = new byte[2 * (record.Length + Around) + PlainScanner.Slack];
        if (!Ascii.IsValid(record)) throw NotSound(Encoding.ASCII.GetString(record));

        _draft[0] = (byte)'#';
        _ = Utf8Formatter.TryFormat(id, _draft.AsSpan(1), out var digits);
        _draft[digits + 1] = (byte)'=';
        record.CopyTo(_draft.AsSpan(digits + 2));
        var length = digits + 2 + record.Length;
        _draft[length++] = (byte)';';
        var text = _draft.AsSpan(0, length);
        return IsPlain(text) || IsSound(text) ? text : throw NotSound(Encoding.ASCII.GetString(record));
    }

    private bool IsPlain(ReadOnlySpan<byte> text)
    {
        var sink = new PassSink(_plainOnes, s_nothing);
        var at = 0;
        return PlainScanner.Scan(text, ref at, text.Length, 0, ref sink) == PlainStop.More && at == text.Length && sink.Count == 1;
    }

    private bool IsSound(ReadOnlySpan<byte> text)
    {
        _log.TakeBack(0);
        var end = _reader.Read(text, 0);
        return _reader.TryTakeRow(out var row, out _) && end == text.Length && row.Flags == InstanceFlags.None && _log.Gathered.Count == 0;
    }

    private static ArgumentException NotSound(string record) =>
        new($"This is no sound record of Part 21 in ASCII: {(record.Length > 80 ? string.Concat(record.AsSpan(0, 80), "…") : record)}", nameof(record));
}
