using System.Buffers;

namespace MemberScan.Inputs.ForcesTables.Rows;

/// <summary>Takes CSV apart row by row (RFC 4180) within a window; lines that begin with '#' are remarks.</summary>
internal sealed class CsvScanner
{
    private readonly RowWindow _window;
    private readonly TableLimits _limits;
    private SearchValues<byte> _fieldEnds = SearchValues.Create(",\r\n\""u8);
    private byte _separator = (byte)',';
    private int _at;

    public CsvScanner(RowWindow window, TableLimits limits)
    {
        (_window, _limits) = (window, limits);
        _at = window.From(0);
        if (window.Bytes.StartsWith("\uFEFF"u8)) _at = RowStart = 3;      // byte order mark
    }

    /// <summary>What stands between fields.</summary>
    public byte Separator
    {
        get => _separator;
        set
        {
            _separator = value;
            _fieldEnds = SearchValues.Create([value, (byte)'\r', (byte)'\n', (byte)'"']);
        }
    }

    /// <summary>First byte of the row last taken, in the window.</summary>
    public int RowStart { get; private set; }

    /// <summary>First byte behind it.</summary>
    public int RowEnd => _at;

    /// <summary>Line on which it begins, from 1.</summary>
    public int RowLine { get; private set; } = 1;

    /// <summary>Whether it is a remark; it then has one field, from the '#' to the line end.</summary>
    public bool IsRemark { get; private set; }

    /// <summary>What is wrong with it.</summary>
    public CsvFault Fault { get; private set; }

    /// <summary>The byte at which it is wrong, in the window.</summary>
    public int FaultAt { get; private set; }

    private ReadOnlySpan<byte> Bytes => _window.Bytes;

    /// <summary>The next line as it stands, its end left out; nothing is taken.</summary>
    public ReadOnlySpan<byte> PeekLine()
    {
        Advance();
        var rest = Bytes[_at..];
        var end = rest.IndexOfAny((byte)'\r', (byte)'\n');
        return end < 0 ? rest : rest[..end];
    }

    /// <summary>Takes the next row; false at the end of the table. After a fault <see cref="Resume"/> must be called before the next one.</summary>
    public bool TryRow(List<CsvField> fields)
    {
        Advance();
        Fault = CsvFault.None;
        fields.Clear();
        if (_at >= Bytes.Length) return false;

        IsRemark = Bytes[_at] == '#';
        if (IsRemark) TakeRemark(fields);
        else TakeFields(fields);

        if (Fault == CsvFault.None && _at - RowStart > _limits.RowLength) Fail(CsvFault.RowTooLong, RowStart);
        return true;
    }

    /// <summary>Passes over the line that begins here.</summary>
    public void SkipLine()
    {
        FaultAt = _at;
        Resume();
    }

    /// <summary>Goes on behind the line of the fault.</summary>
    public void Resume()
    {
        Count(FaultAt);
        while (true)
        {
            var end = Bytes[_at..].IndexOf((byte)'\n');
            if (end >= 0)
            {
                _at += end + 1;
                return;
            }

            _at = Bytes.Length;
            if (_window.AtEnd) return;
            RowStart = _at = _window.From(_at);
        }
    }

    // Counts the lines of what was taken and lets the window go on.
    private void Advance()
    {
        Count(_at);
        RowStart = _at = _window.From(_at);
    }

    private void Count(int upTo)
    {
        RowLine += Bytes[RowStart..upTo].Count((byte)'\n');
        RowStart = _at = upTo;
    }

    private void TakeRemark(List<CsvField> fields)
    {
        var end = Bytes[_at..].IndexOf((byte)'\n');
        if (end < 0 && !_window.AtEnd)
        {
            Fail(CsvFault.RowTooLong, RowStart);
            return;
        }

        end = end < 0 ? Bytes.Length : _at + end;
        var content = Bytes[end - 1] == '\r' ? end - 1 : end;
        fields.Add(new CsvField(_at, content - _at, IsQuoted: false));
        _at = Math.Min(end + 1, Bytes.Length);
    }

    private void TakeFields(List<CsvField> fields)
    {
        var bytes = Bytes;
        do
        {
            if (_at < bytes.Length && bytes[_at] == '"') TakeQuoted(bytes, fields);
            else TakePlain(bytes, fields);

            if (Fault == CsvFault.None && _at - RowStart > _limits.RowLength) Fail(CsvFault.RowTooLong, RowStart);
        }
        while (Fault == CsvFault.None && !TakeRowEnd(bytes));
    }

    private void TakePlain(ReadOnlySpan<byte> bytes, List<CsvField> fields)
    {
        var length = bytes[_at..].IndexOfAny(_fieldEnds);
        if (length < 0) length = bytes.Length - _at;
        fields.Add(new CsvField(_at, length, IsQuoted: false));
        if (length > _limits.FieldLength) Fail(CsvFault.FieldTooLong, _at);

        _at += length;
        if (Fault == CsvFault.None && _at < bytes.Length && bytes[_at] == '"') Fail(CsvFault.QuoteInside, _at);
    }

    private void TakeQuoted(ReadOnlySpan<byte> bytes, List<CsvField> fields)
    {
        var opening = _at;
        var end = opening + 1;
        while (true)
        {
            // A closing quote further away than the longest field would come too late.
            var reach = bytes.Slice(end, Math.Min(bytes.Length - end, _limits.FieldLength + 1));
            var quote = reach.IndexOf((byte)'"');
            if (quote < 0 || end + quote - opening - 1 > _limits.FieldLength)
            {
                var atEnd = quote < 0 && end + reach.Length == bytes.Length && _window.AtEnd;
                Fail(atEnd ? CsvFault.QuoteNotClosed : CsvFault.FieldTooLong, opening);
                return;
            }

            end += quote + 1;
            if (end >= bytes.Length || bytes[end] != '"') break;
            end++;                                                     // a doubled quote is content
        }

        fields.Add(new CsvField(opening + 1, end - opening - 2, IsQuoted: true));
        _at = end;
        if (_at < bytes.Length && bytes[_at] != _separator && bytes[_at] is not ((byte)'\r' or (byte)'\n')) Fail(CsvFault.TextAfterQuote, _at);
    }

    // True at the end of the row; false after a separator, when another field follows.
    private bool TakeRowEnd(ReadOnlySpan<byte> bytes)
    {
        if (_at >= bytes.Length) return true;
        if (bytes[_at] == _separator)
        {
            _at++;
            return false;
        }

        if (bytes[_at] == '\r')
        {
            if (_at + 1 >= bytes.Length || bytes[_at + 1] != '\n')
            {
                Fail(CsvFault.LoneCarriageReturn, _at);
                return true;
            }

            _at++;
        }

        _at++;
        return true;
    }

    private void Fail(CsvFault fault, int at) => (Fault, FaultAt) = (fault, at);
}
