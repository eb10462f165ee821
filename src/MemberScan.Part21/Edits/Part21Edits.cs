using System.Buffers;
using System.Globalization;
using System.Text;
using MemberScan.Part21.Findings;
using MemberScan.Part21.Index;
using MemberScan.Part21.Reading;

namespace MemberScan.Part21.Edits;

/// <summary>Changes laid over a text: instances appended, replaced, removed. Every byte that no change names stays as it is.</summary>
/// <remarks>Not safe for several threads. The index must stay open, and its file unchanged, until the changes are written.</remarks>
public sealed class Part21Edits
{
    private const int CopyLength = 1024 * 1024;

    private readonly Part21Index _index;
    private readonly Part21Lookup _lookup;
    private readonly SortedDictionary<long, (int Length, byte[] Text)> _changes = [];
    private readonly ArrayBufferWriter<byte> _appended = new();
    private readonly byte[] _lineEnd;
    private readonly FindingLog _log = new();
    private readonly InstanceReader _reader;
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
    /// <param name="record">As for <see cref="Append"/>.</param>
    /// <exception cref="ArgumentException">That is no sound record, or there is no such instance.</exception>
    public void Replace(uint id, string record)
    {
        ArgumentNullException.ThrowIfNull(record);
        Change(id, Spell(id, record).ToArray());
    }

    /// <summary>Removes an instance, from '#' to ';'; the first one when a number is used twice.</summary>
    /// <exception cref="ArgumentException">There is no such instance.</exception>
    public void Remove(uint id) => Change(id, []);

    /// <summary>Writes the changed text in one pass.</summary>
    public void WriteTo(Stream output)
    {
        ArgumentNullException.ThrowIfNull(output);
        var buffer = ArrayPool<byte>.Shared.Rent(CopyLength);
        var at = 0L;
        var isAppended = _appended.WrittenCount == 0;
        foreach (var (offset, change) in _changes)
        {
            if (!isAppended && offset > _index.InsertionOffset) Insert();
            Copy(offset);
            output.Write(change.Text);
            at = offset + change.Length;
        }

        if (!isAppended) Insert();
        Copy(_index.Length);
        ArrayPool<byte>.Shared.Return(buffer);

        void Insert()
        {
            Copy(_index.InsertionOffset);
            output.Write(_appended.WrittenSpan);
            isAppended = true;
        }

        void Copy(long until)
        {
            while (at < until)
            {
                var count = _index.Read(at, buffer.AsSpan(0, (int)Math.Min(CopyLength, until - at)));
                if (count == 0) throw new IOException($"{_index.Name} became shorter while it was read.");

                output.Write(buffer, 0, count);
                at += count;
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
            using (var output = new FileStream(temporary, FileMode.CreateNew, FileAccess.Write, FileShare.None, bufferSize: 0))
            {
                WriteTo(output);
                output.Flush(toDisk);
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

    // #id=RECORD; read back by the reader of models: one sound instance, and nothing else.
    private ReadOnlySpan<byte> Spell(uint id, string record)
    {
        var length = record.Length + 16;
        if (_draft.Length < length) _draft = new byte[2 * length];
        if (!Ascii.IsValid(record)) throw NotSound(record);

        _ = System.Text.Unicode.Utf8.TryWrite(_draft, CultureInfo.InvariantCulture, $"#{id}={record};", out var written);
        var text = _draft.AsSpan(0, written);
        _log.TakeBack(0);
        var end = _reader.Read(text, 0);
        var isSound = _reader.TryTakeRow(out var row, out _) && end == written && row.Flags == InstanceFlags.None && _log.Gathered.Count == 0;
        return isSound ? text : throw NotSound(record);
    }

    private static ArgumentException NotSound(string record) =>
        new($"This is no sound record of Part 21 in ASCII: {(record.Length > 80 ? string.Concat(record.AsSpan(0, 80), "…") : record)}", nameof(record));
}
