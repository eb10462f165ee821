using System.Text;
using System.Text.Unicode;
using MemberScan.Inputs.ForcesTables.Rows;
using MemberScan.Inputs.Values;
using MemberScan.Mechanics.Forces;
using MemberScan.Model.Forces;

namespace MemberScan.Inputs.ForcesTables;

/// <summary>Turns the bytes of a forces table into rows, one at a time; goes on after an error to find the next.</summary>
/// <remarks>Memory grows with the number of different names and situations of members, not with the number of rows.</remarks>
internal sealed class TableReader
{
    private static readonly string[] s_kinds = ["service", "design"];

    private readonly RowWindow _window;
    private readonly TableLimits _limits;
    private readonly TableFindings _findings;
    private readonly TableDirectives _directives;
    private readonly CsvScanner _scanner;
    private readonly List<CsvField> _fields = [];
    private readonly char[] _letters;
    private readonly NameTable _names = new();
    private readonly Dictionary<long, (SituationKind Kind, int Line)> _kinds = [];
    private readonly (int Number, byte[] Spelling)[] _last = [(-1, []), (-1, [])];
    private (long Key, SituationKind Kind) _lastKind = (-1, SituationKind.Unknown);

    public TableReader(RowWindow window, TableLimits limits, TableFindings findings)
    {
        (_window, _limits, _findings) = (window, limits, findings);
        _scanner = new CsvScanner(window, limits);
        _letters = new char[Math.Max(limits.FieldLength, limits.RowLength) + limits.FieldLength + 2];
        _directives = new TableDirectives(Fail);
    }

    /// <summary>What the directives say; complete once the first row was read.</summary>
    public TableDirectives Directives => _directives;

    /// <summary>Bytes that a window must show from the start of a row.</summary>
    public static int Reach(TableLimits limits) => limits.RowLength + 2 * limits.FieldLength + 16;

    /// <summary>Reads all rows; gives their number, of meaning only when nothing was found.</summary>
    public int Read(ForcesRowSink sink)
    {
        TableHeader? header = null;
        var rows = 0;
        while (!_findings.Full && (header is not null || FindSeparator()) && _scanner.TryRow(_fields))
        {
            if (_scanner.Fault != CsvFault.None)
            {
                FailOnFault();
                _scanner.Resume();
                if (header is null) return 0;                          // without a header no later row can be understood
                continue;
            }

            if (!Utf8.IsValid(_window.Bytes[_scanner.RowStart.._scanner.RowEnd]))
            {
                FailOnEncoding();
                return 0;
            }

            if (_scanner.IsRemark) _directives.Take(Text(_fields[0]).ToString(), _scanner.RowStart, afterRows: rows > 0);
            else if (IsBlank()) continue;
            else if (header is null)
            {
                var before = _findings.Count;
                header = ReadHeader();
                if (_findings.Count > before) return 0;                // rows mean nothing under a wrong header
            }
            else if (rows >= _limits.Rows)
            {
                Fail(InputCodes.TableLimit, _scanner.RowStart, $"the table has more than {_limits.Rows} rows; split it");
                return 0;
            }
            else if (TryRow(header, out var row))
            {
                rows++;
                sink(row);
            }
        }

        if (_findings.Count > 0) return 0;
        if (header is null) _findings.Add(InputCodes.TableEmpty, "the table is empty; its first line names the columns: " + HeaderExample);
        else if (rows == 0) _findings.Add(InputCodes.TableWithoutRows, "the table has a header but no rows; add the section forces or leave the table out");
        return rows;
    }

    private const string HeaderExample = "member,situation,kind,station[m],N[kN],Vy[kN],Vz[kN],T[kNm],My[kNm],Mz[kNm]";

    private bool IsBlank() => _fields.Count == 1 && !_fields[0].IsQuoted && Text(_fields[0]).Trim().IsEmpty;

    /// <summary>Before the header: what stands between its columns. False when it cannot be told.</summary>
    private bool FindSeparator()
    {
        var line = _scanner.PeekLine();
        if (line.IsEmpty || line[0] == '#') return true;

        if (line is [(byte)'s', (byte)'e', (byte)'p', (byte)'=', var named] && named is (byte)',' or (byte)';' or (byte)'\t')
        {
            _scanner.Separator = named;                                // written by spreadsheet programs; the header below must agree
            _scanner.SkipLine();
            return FindSeparator();
        }

        var (commas, semicolons, tabs) = (line.Contains((byte)','), line.Contains((byte)';'), line.Contains((byte)'\t'));
        if ((commas ? 1 : 0) + (semicolons ? 1 : 0) + (tabs ? 1 : 0) <= 1)
        {
            if (semicolons) _scanner.Separator = (byte)';';
            else if (tabs) _scanner.Separator = (byte)'\t';
            return true;
        }

        // A blank line of tabs, or blanks around the names, is no second separator.
        if (commas && !semicolons && !line.Trim(" \t"u8).Contains((byte)'\t')) return true;

        var at = _scanner.RowStart + line.IndexOfAny(semicolons ? ";"u8 : "\t"u8);
        Fail(InputCodes.Separator, at, "the columns of the header are parted by more than one of comma, semicolon and tab; save the table with one of them");
        return false;
    }

    private TableHeader ReadHeader()
    {
        var cells = new List<(string, int)>(_fields.Count);
        foreach (var field in _fields) cells.Add((Text(field).Trim().ToString(), field.Start));
        return TableHeader.Read(cells, _scanner.RowStart, Fail);
    }

    private bool TryRow(TableHeader header, out ForcesRow row)
    {
        row = default;
        if (_fields.Count != header.Width)
        {
            var at = _fields[Math.Min(header.Width, _fields.Count - 1)].Start;
            var advice = _fields.Count > header.Width && _scanner.Separator == ',' ? "; perhaps a number has a decimal comma: write it with a point" : "";
            Fail(InputCodes.FieldCount, at, $"the row has {_fields.Count} fields, the header {header.Width}{advice}");
            return false;
        }

        var before = _findings.Count;
        var member = Name(header, TableColumn.Member);
        var situation = Name(header, TableColumn.Situation);
        var kind = Kind(header);
        var station = Station(header);
        Span<double> forces = stackalloc double[6];
        for (var i = 0; i < forces.Length; i++) forces[i] = Number(header, TableColumn.FirstForce + i);
        if (_findings.Count > before || !KindAgrees(header, member, situation, kind)) return false;

        row = new ForcesRow(_scanner.RowLine, _names[member], _names[situation], kind, station, header.StationIsShare,
            new SectionForces(forces[0], forces[1], forces[2], forces[3], forces[4], forces[5]));
        return true;
    }

    // Names repeat from row to row: one string each, and mostly that of the row before.
    private int Name(TableHeader header, int column)
    {
        var field = _fields[header.PlaceOf(column)];
        var spelling = _window.Bytes.Slice(field.Start, field.Length);
        ref var last = ref _last[column];
        if (!field.IsQuoted && last.Number >= 0 && spelling.SequenceEqual(last.Spelling)) return last.Number;
        if (field.IsQuoted || !_names.TryFind(spelling, out var number)) number = NewName(field, spelling, column);
        if (number >= 0 && !field.IsQuoted) last = (number, spelling.SequenceEqual(last.Spelling) ? last.Spelling : spelling.ToArray());
        return number;
    }

    private int NewName(CsvField field, ReadOnlySpan<byte> spelling, int column)
    {
        var text = Trimmed(field);
        if (text.IsEmpty)
        {
            Fail(InputCodes.FieldEmpty, field.Start, $"the field '{TableColumn.Names[column]}' is empty; name the {TableColumn.Names[column]}");
            return -1;
        }

        foreach (var letter in text)
        {
            if (Excerpt.IsPlain(letter) || char.IsSurrogate(letter)) continue;
            Fail(InputCodes.ControlCharacter, field.Start,
                $"the {TableColumn.Names[column]} {Excerpt.Of(text)} holds a line end, control or direction character; take it out");
            return -1;
        }

        if (_names.Count >= _limits.Names)
        {
            Fail(InputCodes.TableLimit, field.Start, $"the table has more than {_limits.Names} different names; split it");
            return -1;
        }

        return field.IsQuoted ? _names.Add([], text.ToString()) : _names.Add(spelling, text.ToString());
    }

    private SituationKind Kind(TableHeader header)
    {
        if (header.PlaceOf(TableColumn.Kind) < 0) return SituationKind.Unknown;

        var field = _fields[header.PlaceOf(TableColumn.Kind)];
        var bytes = _window.Bytes.Slice(field.Start, field.Length);
        if (bytes.SequenceEqual("service"u8)) return SituationKind.Service;
        if (bytes.SequenceEqual("design"u8)) return SituationKind.Design;

        var text = Trimmed(field);
        if (text.IsEmpty) return SituationKind.Unknown;
        if (text.SequenceEqual("service")) return SituationKind.Service;
        if (text.SequenceEqual("design")) return SituationKind.Design;

        Fail(InputCodes.KindUnknown, field.Start, $"{Excerpt.Of(text)} is not a kind of situation; {NearestName.Advice(text.ToString(), s_kinds)}");
        return SituationKind.Unknown;
    }

    private double Station(TableHeader header)
    {
        var station = Number(header, TableColumn.Station);
        if (station >= 0 && (!header.StationIsShare || station <= 1)) return station;

        var field = _fields[header.PlaceOf(TableColumn.Station)];
        Fail(InputCodes.StationOutOfRange, field.Start, $"the station {Excerpt.Of(Trimmed(field))} is "
            + (station < 0 ? "negative; measure from the start of the member" : "more than 100 %; give it as a share of the member's length"));
        return 0;
    }

    private double Number(TableHeader header, int column)
    {
        var field = _fields[header.PlaceOf(column)];
        if (DecimalBytes.TryRead(_window.Bytes.Slice(field.Start, field.Length), out var plain) && plain * header.FactorOf(column) is var si && double.IsFinite(si)) return si;

        var text = Trimmed(field);
        var fault = NumberText.Read(text, out var number);
        var value = number * header.FactorOf(column);
        if (fault == NumberFault.None && !double.IsFinite(value)) fault = NumberFault.NotFinite;
        if (fault == NumberFault.None) return value;

        var name = TableColumn.Names[column];
        var (code, message) = fault switch
        {
            NumberFault.Empty => (InputCodes.FieldEmpty, $"the field '{name}' is empty"),
            NumberFault.DecimalComma => (InputCodes.DecimalComma, $"{name} is {Excerpt.Of(text)}, with a comma"),
            NumberFault.NotFinite => (InputCodes.NotFinite, $"{name} is {Excerpt.Of(text)}, which is not finite"),
            _ => (InputCodes.NotANumber, $"{name} is {Excerpt.Of(text)}, which is not a number"),
        };
        Fail(code, field.Start, $"{message}; {NumberText.Remedy(fault)}");
        return 0;
    }

    private bool KindAgrees(TableHeader header, int member, int situation, SituationKind kind)
    {
        var key = ((long)member << 32) | (uint)situation;
        if (_lastKind == (key, kind)) return true;

        if (_kinds.TryAdd(key, (kind, _scanner.RowLine)) || _kinds[key].Kind == kind)
        {
            _lastKind = (key, kind);
            return true;
        }

        var earlier = _kinds[key];
        Fail(InputCodes.KindContradicted, _fields[header.PlaceOf(TableColumn.Kind)].Start,
            $"situation {Excerpt.Of(_names[situation])} of member {Excerpt.Of(_names[member])} is {Word(kind)} here and {Word(earlier.Kind)} on line {earlier.Line}; "
            + "a situation has one kind");
        return false;
    }

    private static string Word(SituationKind kind) => kind switch
    {
        SituationKind.Service => "service",
        SituationKind.Design => "design",
        _ => "without a kind",
    };

    private void FailOnFault()
    {
        var (code, message) = _scanner.Fault switch
        {
            CsvFault.QuoteNotClosed => (InputCodes.Quoting, "the quoted field that begins here is not closed; add its closing quote"),
            CsvFault.TextAfterQuote => (InputCodes.Quoting, "text follows the closing quote of a field; double the quotes inside a quoted field"),
            CsvFault.QuoteInside => (InputCodes.Quoting, "a quote stands inside an unquoted field; put the whole field in quotes and double those inside"),
            CsvFault.LoneCarriageReturn => (InputCodes.LineEnd, "a carriage return stands without a line feed; save the table with line ends CR LF or LF"),
            CsvFault.FieldTooLong => (InputCodes.TableLimit,
                $"the field that begins here is longer than {_limits.FieldLength} bytes; shorten it, or close its quote if that is missing"),
            _ => (InputCodes.TableLimit, $"the line is longer than {_limits.RowLength} bytes; shorten it"),
        };
        Fail(code, _scanner.FaultAt, message);
    }

    private void FailOnEncoding()
    {
        var row = _window.Bytes[_scanner.RowStart.._scanner.RowEnd];
        var at = 0;
        while (Rune.DecodeFromUtf8(row[at..], out _, out var length) == System.Buffers.OperationStatus.Done) at += length;
        Fail(InputCodes.TableNotUtf8, _scanner.RowStart + at, "the text is not UTF-8 here; save the table as CSV in UTF-8");
    }

    private void Fail(string code, int at, string message)
    {
        var bytes = _window.Bytes;
        _findings.Add(code, _window.Offset + at, bytes[_scanner.RowStart..at], _scanner.RowLine, message);
    }

    private ReadOnlySpan<char> Trimmed(CsvField field) => field.IsQuoted ? Text(field) : Text(field).Trim();

    // Valid only until the next call: the letters are shared.
    private ReadOnlySpan<char> Text(CsvField field)
    {
        var text = _letters.AsSpan(0, Encoding.UTF8.GetChars(_window.Bytes.Slice(field.Start, field.Length), _letters));
        if (!field.IsQuoted || !text.Contains('"')) return text;

        var length = 0;
        for (var i = 0; i < text.Length; i++)
        {
            text[length++] = text[i];
            if (text[i] == '"') i++;                                   // its double
        }

        return text[..length];
    }
}
