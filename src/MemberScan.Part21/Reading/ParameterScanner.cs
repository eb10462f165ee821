using System.Globalization;
using MemberScan.Part21.Findings;
using MemberScan.Part21.Index;
using MemberScan.Part21.Tokens;

namespace MemberScan.Part21.Reading;

/// <summary>Goes once over the parameters of a statement: finds their end, tells what is wrong in them, marks what they refer to.</summary>
/// <remarks>It takes the same view of the text as <see cref="ParameterList"/>, which later takes parameters out of text found sound here.</remarks>
internal sealed class ParameterScanner(FindingLog log, ReferenceMarks marks, ReadingLimits limits)
{
    /// <summary>Scans up to the bracket that closes the list.</summary>
    /// <param name="text">The statement and what follows it.</param>
    /// <param name="at">Behind the opening bracket; afterwards behind the closing one.</param>
    /// <param name="origin">Offset of the statement in the file.</param>
    /// <param name="id">Number of the instance, for findings.</param>
    /// <param name="outerDepth">Brackets open around the list.</param>
    /// <param name="fault">Why the end cannot be told.</param>
    /// <returns>Whether the end was found.</returns>
    public bool TryScan(ReadOnlySpan<byte> text, ref int at, long origin, ulong id, int outerDepth, out Fault fault)
    {
        // One bit per depth: whether the bracket belongs to a typed value that still owes its one value.
        var typed = 0UL;
        var depth = 1;
        var opened = true;
        var owesValue = true;
        var lastString = -1;
        fault = default;
        while (true)
        {
            var next = Blanks.Skip(text, at);
            if (next < 0) return Fail(FindingKinds.UnterminatedComment, ~next, ~next, text.Length, out fault);
            at = next;
            if (at == text.Length) return FailAtEnd(at, lastString, out fault);

            var first = text[at];
            if (first == ',')
            {
                if (owesValue) log.Tell(FindingKinds.EmptyArgument, origin + at, id);
                if (TakeBit(ref typed, depth)) log.Tell(FindingKinds.TypedNotOne, origin + at, id);
                opened = false;
                owesValue = true;
                at++;
                continue;
            }

            if (first == ')')
            {
                if (owesValue && !opened) log.Tell(FindingKinds.EmptyArgument, origin + at, id);
                if (TakeBit(ref typed, depth) && opened) log.Tell(FindingKinds.TypedNotOne, origin + at, id);
                opened = false;
                owesValue = false;
                at++;
                if (--depth == 0) return true;
                continue;
            }

            if (!owesValue || first == ';') return FailBetween(text, at, lastString, out fault);

            opened = false;
            owesValue = false;
            if (first == '\'')
            {
                lastString = at;
                if (!TryString(text, ref at, out fault)) return false;
            }
            else if (first == '(')
            {
                if (!TryOpen(ref depth, outerDepth, at, out fault)) return false;
                opened = true;
                owesValue = true;
                at++;
            }
            else if (Words.Begins(first) && TryTypeName(text, at, out var bracket))
            {
                if (!TryOpen(ref depth, outerDepth, at, out fault)) return false;
                typed |= 1UL << (depth - 1);
                opened = true;
                owesValue = true;
                at = bracket + 1;
            }
            else if (!TrySimple(text, ref at, origin, id, lastString, out fault))
            {
                return false;
            }
        }
    }

    private static bool TakeBit(ref ulong bits, int depth)
    {
        var bit = 1UL << (depth - 1);
        var stood = (bits & bit) != 0;
        bits &= ~bit;
        return stood;
    }

    private static bool TryTypeName(ReadOnlySpan<byte> text, int at, out int bracket)
    {
        bracket = Blanks.Skip(text, Words.End(text, at));
        return bracket >= 0 && bracket < text.Length && text[bracket] == '(';
    }

    private bool TryOpen(ref int depth, int outerDepth, int at, out Fault fault)
    {
        fault = default;
        depth++;
        return depth + outerDepth <= limits.Depth || Fail(FindingKinds.TooDeep, at, at, at, out fault);
    }

    private bool TryString(ReadOnlySpan<byte> text, ref int at, out Fault fault)
    {
        fault = default;
        var start = at;
        var window = text[..(int)Math.Min(text.Length, (long)start + limits.StringLength)];
        var end = StringToken.End(window, start);
        if (end < 0)
        {
            var kind = window.Length < text.Length ? FindingKinds.StringTooLong : FindingKinds.UnterminatedString;
            return Fail(kind, start, start, window.Length, out fault);
        }

        if (StringToken.RunsOverAnInstance(text[start..end]))
            return Fail(FindingKinds.UnterminatedString, start, start, end, out fault);

        at = end;
        return true;
    }

    private bool TrySimple(ReadOnlySpan<byte> text, ref int at, long origin, ulong id, int lastString, out Fault fault)
    {
        fault = default;
        var start = at;
        var end = SimpleToken.Read(text, start, out var kind);
        if (kind != TokenKind.Malformed)
        {
            var next = Blanks.Skip(text, end);
            if (next >= 0 && next < text.Length && text[next] is (byte)',' or (byte)')')
            {
                Note(text[start..end], kind, origin + start, id);
                at = end;
                return true;
            }

            if (next < 0) return Fail(FindingKinds.UnterminatedComment, ~next, ~next, text.Length, out fault);
        }

        var junk = Junk.End(text, end);
        if (junk == text.Length) return FailAtEnd(junk, lastString, out fault);
        if (junk < 0) return FailBetween(text, ~junk, lastString, out fault);

        log.Tell(text[start] is (byte)'+' or (byte)'-' or (byte)'.' or (>= (byte)'0' and <= (byte)'9') ? FindingKinds.BadNumber : FindingKinds.BadValue, origin + start, id);
        at = junk;
        return true;
    }

    private void Note(ReadOnlySpan<byte> token, TokenKind kind, long offset, ulong id)
    {
        if (kind == TokenKind.Reference)
        {
            var at = 1;
            if (Numerals.TryRead(token, ref at, out var target)) marks.Mark(target);
        }
        else if (kind is TokenKind.Real or TokenKind.Integer && MayBeTooLarge(token)
            && double.TryParse(token, NumberStyles.Float, CultureInfo.InvariantCulture, out var value) && !double.IsFinite(value))
        {
            log.Tell(FindingKinds.NumberTooLarge, offset, id);
        }
    }

    private static bool MayBeTooLarge(ReadOnlySpan<byte> token)
    {
        if (token.Length > 300) return true;
        var exponent = token.IndexOfAny((byte)'E', (byte)'e');
        return exponent >= 0 && token.Length - exponent >= 4 && token[exponent + 1] != '-';
    }

    // A semicolon or the head of another instance within brackets: one of them was never closed. Anything else is text out of place, most
    // often what follows a string that was closed too early; the string before is then suspected of having begun the trouble.
    private static bool FailBetween(ReadOnlySpan<byte> text, int at, int lastString, out Fault fault)
    {
        var kind = text[at] is (byte)';' or (byte)'=' || Numerals.IsInstanceHead(text, at) ? FindingKinds.BracketMissing : FindingKinds.UnexpectedText;
        return Fail(kind, at, lastString >= 0 ? lastString : Before(text, at), at, out fault);
    }

    private static bool FailAtEnd(int at, int lastString, out Fault fault) =>
        Fail(FindingKinds.BracketMissing, at, lastString >= 0 ? lastString : at, at, out fault);

    // '=' stands behind the number that makes it the head of another instance.
    private static int Before(ReadOnlySpan<byte> text, int at)
    {
        var hash = at;
        if (text[at] != '=') return at;
        while (Blanks.IsBlank(text[hash - 1])) hash--;
        while (char.IsAsciiDigit((char)text[hash - 1])) hash--;
        return text[hash - 1] == '#' && Numerals.IsInstanceHead(text, hash - 1) ? hash - 1 : at;
    }

    private static bool Fail(FindingKind kind, int at, int resumeFrom, int reached, out Fault fault)
    {
        fault = new Fault(kind, at, resumeFrom, reached);
        return false;
    }
}
