using MemberScan.Part21.Findings;
using MemberScan.Part21.Index;
using MemberScan.Part21.Tokens;

namespace MemberScan.Part21.Reading;

/// <summary>Reads <c>#id=KEYWORD(…);</c> into one row each; a damaged instance costs itself and no other.</summary>
internal sealed class InstanceReader(FindingLog log, ReferenceMarks marks, ParameterScanner parameters, ReadingLimits limits)
{
    private readonly List<InstanceRow> _rows = [];
    private readonly KeywordTable _keywords = new();

    /// <summary>Text read a second time so far [byte].</summary>
    public long Rescanned { get; set; }

    /// <summary>How far into its text the last call looked [byte].</summary>
    public int Reached { get; private set; }

    public InstanceTable Build() => new(_rows, _keywords);

    /// <summary>Takes the row that the last call left out of the table; false if it left none.</summary>
    public bool TryTakeRow(out InstanceRow row, out string keyword)
    {
        row = _rows.Count > 0 ? _rows[^1] : default;
        keyword = _keywords[row.Keyword];
        if (_rows.Count == 0) return false;

        _rows.Clear();
        return true;
    }

    /// <summary>Notes how far a look outside of an instance went.</summary>
    public int LookedTo(int at) => Reached = at;

    /// <summary>Reads the instance whose '#' stands at <paramref name="start"/>.</summary>
    /// <returns>Where reading goes on; −1 if it stops at a limit.</returns>
    public int Read(ReadOnlySpan<byte> all, int start)
    {
        if (_rows.Count >= limits.Instances)
        {
            log.Tell(FindingKinds.TooManyInstances, start);
            return -1;
        }

        // What lies beyond the limit for one instance is not looked at.
        var text = all[start..(int)Math.Min(all.Length, (long)start + limits.InstanceLength)];
        var draft = new Draft();
        if (!TryRead(text, start, ref draft, out var fault)) return PassOver(all, start, text.Length, draft, fault);

        Reached = start + draft.At;
        marks.Note(draft.Id);
        _rows.Add(new InstanceRow(start, draft.At, draft.Id, draft.Keyword, draft.Flags));
        return start + draft.At;
    }

    /// <summary>Goes on behind damage that reached to <paramref name="reached"/>.</summary>
    /// <returns>Where reading goes on; −1 if it stops at a limit.</returns>
    public int Resume(ReadOnlySpan<byte> all, int from, int reached)
    {
        var resume = Resynchronizer.Next(all, from);
        Reached = Math.Max(resume, reached);
        NoteNumbers(all[from..resume]);
        if (reached <= resume) return resume;

        if (Rescanned > limits.RescannedBytes)
        {
            log.Tell(FindingKinds.TooMuchDamage, from);
            return -1;
        }

        Rescanned += reached - resume;
        return resume;
    }

    // ENTITY_INSTANCE = "#" DIGIT { DIGIT } "=" ( SIMPLE_RECORD | "(" SIMPLE_RECORD { SIMPLE_RECORD } ")" ) ";"
    private bool TryRead(ReadOnlySpan<byte> text, long origin, ref Draft draft, out Fault fault)
    {
        var at = 1;
        if (!Numerals.TryRead(text, ref at, out draft.Id)) return Fail(FindingKinds.NoInstance, 0, 1, at, out fault);
        if (!TrySkip(text, ref at, out fault)) return false;
        if (at == text.Length || text[at] != '=') return Fail(FindingKinds.NoInstance, 0, 1, at, out fault);

        draft.HasHead = true;
        at++;
        if (!TrySkip(text, ref at, out fault)) return false;

        var first = at < text.Length ? text[at] : (byte)0;
        var understood = first switch
        {
            (byte)'(' => TryComplex(text, ref at, origin, ref draft, out fault),
            (byte)'&' => Fail(FindingKinds.Scope, at, at, at, out fault),
            _ when Words.Begins(first) => TrySimple(text, ref at, origin, ref draft, out fault),
            _ => Fail(FindingKinds.NoInstance, at, at, at, out fault),
        };
        return understood && TryEnd(text, at, origin, ref draft, out fault);
    }

    // SIMPLE_RECORD = KEYWORD "(" [ PARAMETER { "," PARAMETER } ] ")"
    private bool TrySimple(ReadOnlySpan<byte> text, ref int at, long origin, ref Draft draft, out Fault fault)
    {
        var start = at;
        var end = Words.End(text, at);
        at = end;
        if (end - start > limits.KeywordLength) return Fail(FindingKinds.KeywordTooLong, start, start, end, out fault);
        if (!_keywords.TryNumber(text[start..end], limits.Keywords, out draft.Keyword)) return Fail(FindingKinds.TooManyKeywords, start, start, end, out fault);

        return TryParameters(text, ref at, origin, draft.Id, 0, out fault);
    }

    private bool TryComplex(ReadOnlySpan<byte> text, ref int at, long origin, ref Draft draft, out Fault fault)
    {
        draft.Flags |= InstanceFlags.Complex;
        log.Tell(FindingKinds.Complex, origin, draft.Id);
        at++;
        while (true)
        {
            if (!TrySkip(text, ref at, out fault)) return false;
            if (at < text.Length && text[at] == ')')
            {
                at++;
                return true;
            }

            if (at == text.Length || !Words.Begins(text[at])) return Fail(FindingKinds.UnexpectedText, at, at, at, out fault);

            at = Words.End(text, at);
            if (!TryParameters(text, ref at, origin, draft.Id, 1, out fault)) return false;
        }
    }

    private bool TryParameters(ReadOnlySpan<byte> text, ref int at, long origin, ulong id, int outerDepth, out Fault fault)
    {
        if (!TrySkip(text, ref at, out fault)) return false;
        if (at == text.Length || text[at] != '(') return Fail(FindingKinds.NoInstance, at, at, at, out fault);

        at++;
        return parameters.TryScan(text, ref at, origin, id, outerDepth, out fault);
    }

    private bool TryEnd(ReadOnlySpan<byte> text, int at, long origin, ref Draft draft, out Fault fault)
    {
        draft.At = at;
        if (!TrySkip(text, ref at, out fault)) return false;

        if (at < text.Length && text[at] == ';')
        {
            draft.At = at + 1;
            return true;
        }

        if (at < text.Length && !Numerals.IsInstanceHead(text, at) && !Words.Stands(text, at, "ENDSEC"u8))
            return Fail(FindingKinds.UnexpectedText, at, at, at, out fault);

        log.Tell(FindingKinds.SemicolonMissing, origin + draft.At, draft.Id);
        return true;
    }

    private int PassOver(ReadOnlySpan<byte> all, int start, int windowLength, in Draft draft, in Fault fault)
    {
        var isCut = fault.Reached == windowLength && windowLength < all.Length - start;
        log.Tell(isCut ? FindingKinds.InstanceTooLong : fault.Kind, start + (isCut ? 0 : fault.At), draft.Id);

        var from = start + Math.Max(1, fault.ResumeFrom);
        var resume = Resume(all, from, start + fault.Reached);
        var end = resume < 0 ? from : resume;
        NoteNumbers(all[start..end]);
        while (end > start + 1 && Blanks.IsBlank(all[end - 1])) end--;
        if (draft.HasHead) _rows.Add(new InstanceRow(start, end - start, draft.Id, draft.Keyword, draft.Flags | InstanceFlags.Damaged));
        return resume;
    }

    // A number in text that is passed over is taken all the same: another reader may find an instance there.
    private void NoteNumbers(ReadOnlySpan<byte> text)
    {
        for (var at = text.IndexOf((byte)'#'); at >= 0;)
        {
            at++;
            if (Numerals.TryRead(text, ref at, out var id)) marks.Note(id);
            var hop = text[at..].IndexOf((byte)'#');
            at = hop < 0 ? -1 : at + hop;
        }
    }

    private static bool TrySkip(ReadOnlySpan<byte> text, ref int at, out Fault fault)
    {
        fault = default;
        var next = Blanks.Skip(text, at);
        if (next < 0) return Fail(FindingKinds.UnterminatedComment, ~next, ~next, text.Length, out fault);

        at = next;
        return true;
    }

    private static bool Fail(FindingKind kind, int at, int resumeFrom, int reached, out Fault fault)
    {
        fault = new Fault(kind, at, resumeFrom, reached);
        return false;
    }

    private struct Draft
    {
        public ulong Id;
        public int Keyword;
        public InstanceFlags Flags;
        public bool HasHead;
        public int At;
    }
}
