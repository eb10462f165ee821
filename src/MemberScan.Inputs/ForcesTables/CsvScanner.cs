using System.Buffers;

namespace MemberScan.Inputs.ForcesTables;

/// <summary>Takes CSV apart row by row (RFC 4180), without copying; lines that begin with '#' are remarks.</summary>
internal ref struct CsvScanner
{
    private static readonly SearchValues<byte> s_fieldEnds = SearchValues.Create(",\r\n\""u8);

    private readonly ReadOnlySpan<byte> _bytes;
    private readonly TableLimits _limits;
    private int _at;

    public CsvScanner(ReadOnlySpan<byte> bytes, TableLimits limits)
    {
        _bytes = bytes;
        _limits = limits;
        _at = bytes.StartsWith("\uFEFF"u8) ? 3 : 0;                   // byte order mark
    }

    /// <summary>First byte of the row last taken.</summary>
    public int RowStart { get; private set; }

    /// <summary>Line on which it begins, from 1.</summary>
    public int RowLine { get; private set; } = 1;

    /// <summary>Whether it is a remark; it then has one field, from the '#' to the line end.</summary>
    public bool IsRemark { get; private set; }

    /// <summary>What is wrong with it.</summary>
    public CsvFault Fault { get; private set; }

    /// <summary>The byte at which it is wrong.</summary>
    public int FaultAt { get; private set; }

    /// <summary>Takes the next row; false at the end of the file. After a fault the next row is the one after the next line feed.</summary>
    public bool TryRow(List<CsvField> fields)
    {
        RowLine += _bytes[RowStart.._at].Count((byte)'\n');
        RowStart = _at;
        Fault = CsvFault.None;
        fields.Clear();
        if (_at >= _bytes.Length) return false;

        IsRemark = _bytes[_at] == '#';
        if (IsRemark) TakeRemark(fields);
        else TakeFields(fields);

        if (Fault == CsvFault.None && _at - RowStart > _limits.RowLength) Fail(CsvFault.RowTooLong, RowStart);
        if (Fault == CsvFault.None) return true;

        var resume = _bytes[FaultAt..].IndexOf((byte)'\n');
        _at = resume < 0 ? _bytes.Length : FaultAt + resume + 1;
        return true;
    }

    private void TakeRemark(List<CsvField> fields)
    {
        var end = _bytes[_at..].IndexOf((byte)'\n');
        end = end < 0 ? _bytes.Length : _at + end;
        var content = _bytes[end - 1] == '\r' ? end - 1 : end;
        fields.Add(new CsvField(_at, content - _at, IsQuoted: false));
        _at = Math.Min(end + 1, _bytes.Length);
    }

    private void TakeFields(List<CsvField> fields)
    {
        do
        {
            if (_at < _bytes.Length && _bytes[_at] == '"') TakeQuoted(fields);
            else TakePlain(fields);

            if (Fault == CsvFault.None && _at - RowStart > _limits.RowLength) Fail(CsvFault.RowTooLong, RowStart);
        }
        while (Fault == CsvFault.None && !TakeRowEnd());
    }

    private void TakePlain(List<CsvField> fields)
    {
        var length = _bytes[_at..].IndexOfAny(s_fieldEnds);
        if (length < 0) length = _bytes.Length - _at;
        fields.Add(new CsvField(_at, length, IsQuoted: false));
        if (length > _limits.FieldLength) Fail(CsvFault.FieldTooLong, _at);

        _at += length;
        if (Fault == CsvFault.None && _at < _bytes.Length && _bytes[_at] == '"') Fail(CsvFault.QuoteInside, _at);
    }

    private void TakeQuoted(List<CsvField> fields)
    {
        var opening = _at;
        var end = opening + 1;
        while (true)
        {
            // A closing quote further away than the longest field would come too late.
            var window = _bytes.Slice(end, Math.Min(_bytes.Length - end, _limits.FieldLength + 1));
            var quote = window.IndexOf((byte)'"');
            if (quote < 0 || end + quote - opening - 1 > _limits.FieldLength)
            {
                var atEnd = quote < 0 && end + window.Length == _bytes.Length;
                Fail(atEnd ? CsvFault.QuoteNotClosed : CsvFault.FieldTooLong, opening);
                return;
            }

            end += quote + 1;
            if (end >= _bytes.Length || _bytes[end] != '"') break;
            end++;                                                     // a doubled quote is content
        }

        fields.Add(new CsvField(opening + 1, end - opening - 2, IsQuoted: true));
        _at = end;
        if (_at < _bytes.Length && _bytes[_at] is not ((byte)',' or (byte)'\r' or (byte)'\n')) Fail(CsvFault.TextAfterQuote, _at);
    }

    // True at the end of the row; false after a comma, when another field follows.
    private bool TakeRowEnd()
    {
        if (_at >= _bytes.Length) return true;
        if (_bytes[_at] == ',')
        {
            _at++;
            return false;
        }

        if (_bytes[_at] == '\r')
        {
            if (_at + 1 >= _bytes.Length || _bytes[_at + 1] != '\n')
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
