using System.Text;
using MemberScan.Part21.Findings;
using MemberScan.Part21.Index;
using MemberScan.Part21.Plain;
using MemberScan.Part21.Reading;
using MemberScan.Part21.Sources;
using MemberScan.Part21.Tokens;

namespace MemberScan.Part21.Streaming;

/// <summary>Goes over the instances of a data section through a window: plain ones in leaps, each other one as the whole-text reader takes it.</summary>
internal sealed class DataScanner
{
    // What a statement's end may depend on behind it [byte]: blanks and the head of the next one.
    private const int Lookahead = 4096;

    // A statement longer than this is read by the other reader, which need not see its end at once.
    private const int LongStatement = 256 * 1024;

    // Text looked at for one piece of damage; what it means beyond is not sought [byte].
    private const int FarthestLook = 2 * Part21Limits.InstanceLength;

    private readonly InstanceReader _instances;

    // The leaps know the limits that ship; under lower ones every instance is read by the other reader.
    private readonly bool _leaps;

    public DataScanner(FindingLog log, ReadingLimits limits)
    {
        Log = log;
        _leaps = limits.Depth >= Part21Limits.Depth && limits.InstanceLength >= Part21Limits.InstanceLength
            && limits.StringLength >= Part21Limits.StringLength && limits.KeywordLength >= Part21Limits.KeywordLength;
        var marks = new ReferenceMarks(0) { IsOff = true };
        _instances = new InstanceReader(log, marks, new ParameterScanner(log, marks, limits), limits);
    }

    /// <summary>What was found.</summary>
    public FindingLog Log { get; }

    /// <summary>Scans from a place between two statements.</summary>
    /// <param name="window">Text is read through it.</param>
    /// <param name="at">Where to begin; afterwards where the scan stopped.</param>
    /// <param name="until">Statements that begin here or beyond are left.</param>
    /// <param name="keepsText">Whether the window keeps everything from the beginning on, so that what the sink got stays in it.</param>
    /// <param name="sink">Receives each instance.</param>
    public DataStop Scan<TSink>(Window window, ref long at, long until, bool keepsText, ref TSink sink)
        where TSink : struct, IStatementSink
    {
        var from = at;
        _instances.Rescanned = 0;
        if (!keepsText) window.Shrink();
        window.Hold(at, 0);
        while (true)
        {
            var rest = (int)(at - window.Origin);
            var near = (int)Math.Min(until - window.Origin, int.MaxValue);
            var stop = _leaps ? PlainScanner.Scan(window.Text, ref rest, near, window.Origin, ref sink) : Next(window.Text, ref rest, near);
            at = window.Origin + rest;
            if (stop == PlainStop.Until) return DataStop.Until;

            if (stop == PlainStop.More)
            {
                if (window.IsLast && rest == window.Length) return DataStop.End;

                if (!window.IsLast && window.Length - rest < LongStatement && (keepsText || rest > 0))
                {
                    window.Hold(keepsText ? from : at, keepsText ? 2 * window.Length : 0);
                    continue;
                }
            }

            if (stop == PlainStop.NoInstance) sink.PassOver();
            var isUnderstood = stop == PlainStop.NoInstance
                ? PassBetween(window, ref at, keepsText ? from : at, out var end)
                : TryOne(window, ref at, keepsText ? from : at, ref sink, out end);
            if (!isUnderstood) return end;
        }
    }

    private static PlainStop Next(ReadOnlySpan<byte> text, ref int at, int until)
    {
        while (at < text.Length && Blanks.IsBlank(text[at])) at++;
        if (at == text.Length) return PlainStop.More;
        if (at >= until) return PlainStop.Until;
        return text[at] == '#' ? PlainStop.NotPlain : PlainStop.NoInstance;
    }

    // One instance by the other reader, with as much text as it needs.
    private bool TryOne<TSink>(Window window, ref long at, long keptFrom, ref TSink sink, out DataStop end)
        where TSink : struct, IStatementSink
    {
        end = DataStop.Limit;
        var told = Log.Gathered.Count;
        var rescanned = _instances.Rescanned;
        while (true)
        {
            var rest = (int)(at - window.Origin);
            var text = window.Text[rest..];
            Log.Origin = at;
            var next = _instances.Read(text, 0);
            var hasRow = _instances.TryTakeRow(out var row, out var keyword);
            if (!IsConclusive(window, text.Length) && MayLookFarther(text.Length))
            {
                Log.TakeBack(told);
                _instances.Rescanned = rescanned;
                HoldMore(window, keptFrom, at, text.Length);
                continue;
            }

            if (hasRow) Hand(at, text, row, keyword, ref sink);
            else sink.PassOver();
            if (next < 0) return false;

            at += next;
            return true;
        }
    }

    private void Hand<TSink>(long origin, ReadOnlySpan<byte> text, in InstanceRow row, string keyword, ref TSink sink)
        where TSink : struct, IStatementSink
    {
        if (row.Id > uint.MaxValue)
        {
            sink.PassOver();
            Log.Tell(FindingKinds.NumberOfInstanceTooLarge, 0, row.Id);
            return;
        }

        Span<byte> word = stackalloc byte[Part21Limits.KeywordLength];
        var length = Encoding.ASCII.GetBytes(keyword, word);
        sink.AddOther(origin + row.Start, (uint)row.Id, text.Slice((int)row.Start, row.Length), word[..length], row.Flags);
    }

    // What stands between two statements and is no instance: a comment, the end of the section, or something that does not belong there.
    private bool PassBetween(Window window, ref long at, long keptFrom, out DataStop end)
    {
        end = DataStop.Section;
        var told = Log.Gathered.Count;
        var rescanned = _instances.Rescanned;
        while (true)
        {
            var text = window.Text[(int)(at - window.Origin)..];
            Log.Origin = at;
            var next = PassBetween(text, out var isSection);
            var isConclusive = isSection ? window.IsLast || text.Length >= Lookahead : IsConclusive(window, text.Length);
            if (!isConclusive && MayLookFarther(text.Length))
            {
                Log.TakeBack(told);
                _instances.Rescanned = rescanned;
                HoldMore(window, keptFrom, at, text.Length);
                continue;
            }

            if (isSection) return false;
            if (next < 0)
            {
                end = DataStop.Limit;
                return false;
            }

            at += next;
            return true;
        }
    }

    private int PassBetween(ReadOnlySpan<byte> text, out bool isSection)
    {
        isSection = false;
        var next = Blanks.Skip(text, 0);
        if (next < 0)
        {
            Log.Tell(FindingKinds.UnterminatedComment, ~next);
            return _instances.Resume(text, ~next, text.Length);
        }

        if (next > 0)
        {
            _ = _instances.LookedTo(next);
            return next;
        }

        isSection = StructureReader.BeginsSection(text, 0);
        if (isSection) return 0;

        Log.Tell(FindingKinds.TextBetween, 0);
        return _instances.Resume(text, 0, 0);
    }

    private bool IsConclusive(Window window, int length) => window.IsLast || _instances.Reached <= length - Lookahead;

    private static bool MayLookFarther(int length) => length < FarthestLook;

    private static void HoldMore(Window window, long keptFrom, long at, int length) =>
        window.Hold(keptFrom, checked((int)(at - keptFrom) + Math.Clamp(4 * length, 4 * Lookahead, FarthestLook)));
}
