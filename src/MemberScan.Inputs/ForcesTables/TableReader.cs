using System.Collections.Immutable;
using System.Text;
using System.Text.Unicode;
using MemberScan.Inputs.Values;
using MemberScan.Mechanics.Forces;
using MemberScan.Model.Forces;

namespace MemberScan.Inputs.ForcesTables;

/// <summary>Turns the bytes of a forces table into rows; goes on after an error to find the next.</summary>
internal ref struct TableReader
{
    private static readonly string[] s_kinds = ["service", "design"];

    private readonly ReadOnlySpan<byte> _bytes;
    private readonly TableLimits _limits;
    private readonly TableFindings _findings;
    private readonly TableDirectives _directives;
    private readonly List<CsvField> _fields = [];
    private readonly char[] _letters;
    private readonly HashSet<string> _names = new(StringComparer.Ordinal);
    private readonly Dictionary<(string Member, string Situation), (SituationKind Kind, int Line)> _kinds = [];
    private CsvScanner _scanner;

    public TableReader(ReadOnlySpan<byte> bytes, TableLimits limits, TableFindings findings, TableDirectives directives)
    {
        _bytes = bytes;
        (_limits, _findings, _directives) = (limits, findings, directives);
        _scanner = new CsvScanner(bytes, limits);
        _letters = new char[Math.Max(limits.FieldLength, limits.RowLength)];
    }

    public ImmutableArray<ForcesRow> Read()
    {
        if (!Utf8.IsValid(_bytes))
        {
            FailOnEncoding();
            return [];
        }

        TableHeader? header = null;
        var rows = ImmutableArray.CreateBuilder<ForcesRow>();
        while (!_findings.Full && _scanner.TryRow(_fields))
        {
            if (_scanner.Fault != CsvFault.None) FailOnFault(header is null);
            else if (_scanner.IsRemark) _directives.Take(Text(_fields[0]).ToString(), _scanner.RowStart, _scanner.RowLine, afterRows: rows.Count > 0);
            else if (IsBlank()) continue;
            else if (header is null)
            {
                if (HasOtherSeparator()) return [];
                var before = _findings.Count;
                header = ReadHeader();
                if (_findings.Count > before) return [];               // rows mean nothing under a wrong header
            }
            else if (rows.Count >= _limits.Rows)
            {
                Fail(InputCodes.TableLimit, _scanner.RowStart, $"the table has more than {_limits.Rows} rows; split it");
                return [];
            }
            else if (TryRow(header, out var row)) rows.Add(row);

            // Without a header no later row can be understood.
            if (header is null && _scanner.Fault != CsvFault.None) return [];
        }

        if (_findings.Count > 0) return [];
        if (header is null) _findings.Add(InputCodes.TableEmpty, "the table is empty; its first line names the columns: " + HeaderExample);
        else if (rows.Count == 0) _findings.Add(InputCodes.TableWithoutRows, "the table has a header but no rows; add the section forces or leave the table out");
        return rows.DrainToImmutable();
    }

    private const string HeaderExample = "member,situation,kind,station[m],N[kN],Vy[kN],Vz[kN],T[kNm],My[kNm],Mz[kNm]";

    private readonly bool IsBlank() => _fields.Count == 1 && !_fields[0].IsQuoted && Text(_fields[0]).Trim().IsEmpty;

    // A table of semicolons or tabs has no comma in its header.
    private readonly bool HasOtherSeparator()
    {
        if (_fields.Count > 1 || _fields[0].IsQuoted) return false;

        var field = _fields[0];
        var other = _bytes.Slice(field.Start, field.Length).IndexOfAny(";\t"u8);
        if (other < 0) return false;

        FailOnSeparator(field.Start + other);
        return true;
    }

    private readonly void FailOnSeparator(int at) => Fail(InputCodes.Separator, at,
        $"the columns are parted by {(_bytes[at] == ';' ? "semicolons" : "tabs")}; save the table as CSV with commas and decimal points");

    private readonly TableHeader ReadHeader()
    {
        var cells = new List<(string, int)>(_fields.Count);
        foreach (var field in _fields) cells.Add((Text(field).Trim().ToString(), field.Start));
        return TableHeader.Read(cells, _scanner.RowStart, _scanner.RowLine, _findings);
    }

    private readonly bool TryRow(TableHeader header, out ForcesRow row)
    {
        row = default;
        if (_fields.Count != header.Width)
        {
            var at = _fields[Math.Min(header.Width, _fields.Count - 1)].Start;
            var advice = _fields.Count > header.Width ? "; perhaps a number has a decimal comma: write it with a point" : "";
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

        row = new ForcesRow(_scanner.RowLine, member, situation, kind, station, header.StationIsShare,
            new SectionForces(forces[0], forces[1], forces[2], forces[3], forces[4], forces[5]));
        return true;
    }

    // Names repeat from row to row: one string each.
    private readonly string Name(TableHeader header, int column)
    {
        var field = _fields[header.PlaceOf(column)];
        var text = Trimmed(field);
        if (text.IsEmpty)
        {
            Fail(InputCodes.FieldEmpty, field.Start, $"the field '{TableColumn.Names[column]}' is empty; name the {TableColumn.Names[column]}");
            return "";
        }

        if (_names.GetAlternateLookup<ReadOnlySpan<char>>().TryGetValue(text, out var known)) return known;
        foreach (var letter in text)
        {
            if (Excerpt.IsPlain(letter) || char.IsSurrogate(letter)) continue;
            Fail(InputCodes.ControlCharacter, field.Start,
                $"the {TableColumn.Names[column]} {Excerpt.Of(text)} holds a line end, control or direction character; take it out");
            return "";
        }

        var name = text.ToString();
        _names.Add(name);
        return name;
    }

    private readonly SituationKind Kind(TableHeader header)
    {
        if (header.PlaceOf(TableColumn.Kind) < 0) return SituationKind.Unknown;

        var field = _fields[header.PlaceOf(TableColumn.Kind)];
        var text = Trimmed(field);
        if (text.IsEmpty) return SituationKind.Unknown;
        if (text.SequenceEqual("service")) return SituationKind.Service;
        if (text.SequenceEqual("design")) return SituationKind.Design;

        Fail(InputCodes.KindUnknown, field.Start, $"{Excerpt.Of(text)} is not a kind of situation; {NearestName.Advice(text.ToString(), s_kinds)}");
        return SituationKind.Unknown;
    }

    private readonly double Station(TableHeader header)
    {
        var station = Number(header, TableColumn.Station);
        if (station >= 0 && (!header.StationIsShare || station <= 1)) return station;

        var field = _fields[header.PlaceOf(TableColumn.Station)];
        Fail(InputCodes.StationOutOfRange, field.Start, $"the station {Excerpt.Of(Trimmed(field))} is "
            + (station < 0 ? "negative; measure from the start of the member" : "more than 100 %; give it as a share of the member's length"));
        return 0;
    }

    private readonly double Number(TableHeader header, int column)
    {
        var field = _fields[header.PlaceOf(column)];
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

    private readonly bool KindAgrees(TableHeader header, string member, string situation, SituationKind kind)
    {
        if (_kinds.TryAdd((member, situation), (kind, _scanner.RowLine))) return true;

        var earlier = _kinds[(member, situation)];
        if (earlier.Kind == kind) return true;

        Fail(InputCodes.KindContradicted, _fields[header.PlaceOf(TableColumn.Kind)].Start,
            $"situation {Excerpt.Of(situation)} of member {Excerpt.Of(member)} is {Word(kind)} here and {Word(earlier.Kind)} on line {earlier.Line}; "
            + "a situation has one kind");
        return false;
    }

    private static string Word(SituationKind kind) => kind switch
    {
        SituationKind.Service => "service",
        SituationKind.Design => "design",
        _ => "without a kind",
    };

    private readonly void FailOnFault(bool inHeader)
    {
        var row = _bytes[_scanner.RowStart..];
        row = row[..Math.Max(0, row.IndexOf((byte)'\n'))];
        if (inHeader && !row.Contains((byte)',') && row.IndexOfAny(";\t"u8) is >= 0 and var other)
        {
            FailOnSeparator(_scanner.RowStart + other);
            return;
        }

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

    private readonly void FailOnEncoding()
    {
        var (at, rowStart, line) = (0, 0, 1);
        while (Rune.DecodeFromUtf8(_bytes[at..], out _, out var length) == System.Buffers.OperationStatus.Done)
        {
            if (_bytes[at] == '\n') (rowStart, line) = (at + 1, line + 1);
            at += length;
        }

        _findings.Add(InputCodes.TableNotUtf8, at, rowStart, line, "the text is not UTF-8 here; save the table as CSV in UTF-8");
    }

    private readonly void Fail(string code, int at, string message) => _findings.Add(code, at, _scanner.RowStart, _scanner.RowLine, message);

    private readonly ReadOnlySpan<char> Trimmed(CsvField field) => field.IsQuoted ? Text(field) : Text(field).Trim();

    // Valid only until the next call: the letters are shared.
    private readonly ReadOnlySpan<char> Text(CsvField field)
    {
        var text = _letters.AsSpan(0, Encoding.UTF8.GetChars(_bytes.Slice(field.Start, field.Length), _letters));
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
