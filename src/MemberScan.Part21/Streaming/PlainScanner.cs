using System.Numerics;
using System.Runtime.CompilerServices;
using System.Runtime.InteropServices;
using System.Runtime.Intrinsics;
using System.Runtime.Intrinsics.X86;
using MemberScan.Part21.Index;

namespace MemberScan.Part21.Streaming;

/// <summary>Walks over statements of plain layout, 64 bytes at a time, and stops at the first that is anything else.</summary>
/// <remarks>
/// Plain is a statement in which <see cref="Reading.InstanceReader"/> would find nothing to tell and that needs no look back: upper-case
/// words, no comment, blanks only between statements and behind comma, opening bracket and equals sign, no line end in a string. Every
/// byte is checked: each class of bytes is one mask of 64 bits, the rules of the grammar are shifts and sums over masks, and what breaks one
/// is a bit in <c>bad</c>. Rules are stricter than the grammar, never laxer: a statement refused here is read by the other reader.
/// Several times as fast as that reader (benchmark: RESULTS.md, section Part 21), which is its oracle in the tests.
/// </remarks>
internal static class PlainScanner
{
    /// <summary>Bytes that must be readable behind the text [byte].</summary>
    public const int Slack = 64;

    private const ulong Top = 1UL << 63;
    private const int LongestKeyword = 64;

    /// <summary>Scans from a place between two statements.</summary>
    /// <param name="text">The loaded text; <see cref="Slack"/> more bytes are readable behind it.</param>
    /// <param name="at">Where to begin; afterwards the start of the statement, or of the text, that the scan stopped at.</param>
    /// <param name="until">Statements that begin here or beyond are left.</param>
    /// <param name="origin">Offset of the text in the file.</param>
    /// <param name="sink">Receives each instance.</param>
    /// <remarks>One long method: fifty masks and carries live from one word to the next, and the compiler keeps locals apart from fields.</remarks>
    [MethodImpl(MethodImplOptions.AggressiveOptimization)]
    public static PlainStop Scan<TSink>(ReadOnlySpan<byte> text, ref int at, int until, long origin, ref TSink sink)
        where TSink : struct, IStatementSink
    {
        ref var bytes = ref MemoryMarshal.GetReference(text);
        var length = text.Length;
        var masks = new ByteClasses();

        // What the 64 bytes before held, as far as the rules look back: only the topmost bits count. A statement may follow.
        ulong inString = 0, pSep = 0, pSign = 0, pExp = 0, pWord = 0, pHeadEnd = 0, pEquals = 0, pEnumDot = 0, pPoint = 0, pHash = 0;
        ulong pSemi = Top, pAtom = 0, pQuoteEnd = 0, pClose = 0, pBlankable = Top, pNoClose = 0, pNoComma = 0, pTyped = 0, pBackslash = 0;
        ulong pRun1 = 0, pRun2 = 0, pRun4 = 0, pRun8 = 0, pRun11 = 0;
        ulong cHead = 0, cType = 0, cEnum = 0, cWhole = 0, cPart = 0, cRef = 0, cOne = 0;

        var start = -1;            // of the statement being read; −1 between statements
        var depth = BracketOrder.None;
        var equalsSigns = 0;
        var broken = 0UL;
        var between = at;          // where the search for the next statement stands

        for (var word = at; word < length; word += 64)
        {
            masks.Load(ref Unsafe.Add(ref bytes, word));

            // Strings: from each opening apostrophe to before the closing one.
            var quote = masks.Quote;
            var inside = PrefixXor(quote) ^ inString;
            inString = (ulong)((long)inside >> 63);
            var quoteStart = quote & inside;
            var quoteEnd = quote & ~inside;
            var outside = ~(inside | quote);

            var digit = masks.Digit & outside;
            var letter = masks.Letter & outside;
            var dot = masks.Dot & outside;
            var sign = masks.Sign & outside;
            var hash = masks.Hash & outside;
            var single = masks.Single & outside;
            var blank = masks.Blank & outside;
            var open = masks.Open & outside;
            var close = masks.Close & outside;
            var comma = masks.Comma & outside;
            var semicolon = masks.Semicolon & outside;
            var equals = masks.EqualsSign & outside;
            var exponent = masks.Exponent & letter;
            var ends = comma | close;

            var bad = outside & ~(digit | letter | dot | sign | hash | single | blank | open | close | comma | semicolon | equals);
            bad |= inside & masks.LineEnd;

            // \S\' : only reading the string from its start tells whether the apostrophe closes it.
            var trap = quote & Before(masks.Backslash, ref pBackslash);
            if (trap != 0) bad |= Traps(ref bytes, word, trap);

            var separators = open | comma | blank;
            var afterSep = Before(separators, ref pSep);
            bad |= blank & ~Before(separators | equals | semicolon, ref pBlankable);

            // Words: the entity's behind '=' (and one blank), those of typed values; each ends at its bracket.
            var wordBytes = letter | digit;
            var afterWord = Before(wordBytes, ref pWord);
            var afterEquals = Before(equals, ref pEquals);
            bad |= afterEquals & ~(letter | blank);
            var headStart = letter & Before(equals | (blank & afterEquals), ref pHeadEnd);
            var typeStart = letter & afterSep & ~headStart;
            var headEnd = Run(headStart, wordBytes, ref cHead);
            var typeEnd = Run(typeStart, wordBytes, ref cType);
            bad |= (headEnd | typeEnd) & ~open;
            bad |= open & ~(afterSep | headEnd | typeEnd);

            // A typed value holds one value: the next bracket or comma behind its bracket closes it, and not at once.
            var typeOpen = Before(typeEnd & open, ref pTyped);
            bad |= typeOpen & close;
            bad |= Run(typeOpen, ~(open | close | comma), ref cOne) & ~close;

            // .LITERAL.
            var enumDot = dot & afterSep;
            var afterEnumDot = Before(enumDot, ref pEnumDot);
            bad |= afterEnumDot & ~letter;
            var enumStart = letter & afterEnumDot;
            var enumEnd = Run(enumStart, wordBytes, ref cEnum);
            bad |= enumEnd & ~dot;

            // Numbers: [sign] digits [. [digits]] [E …]; a sign stands before a digit.
            var afterSign = Before(sign, ref pSign);
            bad |= sign & ~(afterSep | Before(exponent, ref pExp));
            bad |= afterSign & ~digit;
            var wholeStart = digit & (afterSep | afterSign);
            var wholeEnd = Run(wholeStart, digit, ref cWhole);
            bad |= wholeEnd & ~(dot | ends | exponent);
            var point = wholeEnd & dot;
            var partStart = Before(point, ref pPoint);
            var partEnd = Run(partStart, digit, ref cPart);
            bad |= partEnd & ~(ends | exponent);
            var power = (wholeEnd | partEnd) & exponent;
            if (power != 0) bad |= BadPowers(ref bytes, word, power, length);
            bad |= dot & ~(enumDot | enumEnd | point);
            bad |= letter & ~afterWord & ~(headStart | typeStart | enumStart | power);

            // #12 : of at most ten digits; only the head of an instance has '=' behind.
            var afterHash = Before(hash, ref pHash);
            bad |= hash & ~(afterSep | Before(semicolon, ref pSemi));
            bad |= afterHash & ~digit;
            var refEnd = Run(afterHash & digit, digit, ref cRef);
            bad |= refEnd & ~(ends | equals);
            bad |= equals & ~refEnd;
            bad |= digit & ~afterWord & ~(wholeStart | partStart | afterHash);
            var run2 = digit & Before(digit, ref pRun1);
            var run4 = run2 & Before(run2, 2, ref pRun2);
            var run8 = run4 & Before(run4, 4, ref pRun4);
            var run11 = run8 & Before(run8, 3, ref pRun8);
            bad |= refEnd & Before(run11, ref pRun11);
            if (digit == ulong.MaxValue) bad |= digit;

            // What may follow what.
            bad |= single & ~afterSep;
            bad |= Before(single | (enumEnd & dot), ref pAtom) & ~ends;
            var afterQuoteEnd = Before(quoteEnd, ref pQuoteEnd);
            bad |= quoteStart & ~(afterSep | afterQuoteEnd);
            bad |= afterQuoteEnd & ~(ends | quoteStart);
            var afterClose = Before(close, ref pClose);
            bad |= afterClose & ~(ends | semicolon);
            bad |= semicolon & ~afterClose;
            bad |= close & Before(comma | blank | equals, ref pNoClose);
            bad |= comma & Before(comma | blank | open, ref pNoComma);

            // Statements.
            var loaded = length - word;
            var rest = loaded >= 64 ? ulong.MaxValue : (1UL << loaded) - 1;
            semicolon &= rest;
            while (true)
            {
                if (start < 0)
                {
                    var next = ~blank & rest;
                    if (next == 0)
                    {
                        between = Math.Min(word + 64, length);
                        break;
                    }

                    var first = BitOperations.TrailingZeroCount(next);
                    at = word + first;
                    if (at >= until) return PlainStop.Until;
                    if (Unsafe.Add(ref bytes, at) != '#') return PlainStop.NoInstance;

                    start = at;
                    depth = BracketOrder.None;
                    equalsSigns = 0;
                    broken = 0;
                    rest &= ~((1UL << first) - 1);
                }

                var last = semicolon & rest;
                var part = last == 0 ? rest : rest & (last ^ (last - 1));
                broken |= bad & part;
                if (!BracketOrder.TryTake(open & part, close & part, ref depth)) broken = 1;
                equalsSigns += BitOperations.PopCount(equals & part);
                if (last == 0) break;

                var end = word + BitOperations.TrailingZeroCount(last) + 1;
                if (broken != 0 || depth != 0 || equalsSigns != 1 || !TryHead(ref bytes, start, end, out var id, out var keyword, out var keywordLength))
                {
                    at = start;
                    return PlainStop.NotPlain;
                }

                sink.Add(origin + start, end - start, id, MemoryMarshal.CreateReadOnlySpan(ref Unsafe.Add(ref bytes, keyword), keywordLength), InstanceFlags.None);
                start = -1;
                between = end;
                rest &= ~part;
                if (rest == 0) break;
            }
        }

        at = start >= 0 ? start : between;
        return PlainStop.More;
    }

    // A step of one byte back: the bits of the word moved up, the topmost of the word before below.
    [MethodImpl(MethodImplOptions.AggressiveInlining)]
    private static ulong Before(ulong bits, ref ulong previous) => Before(bits, 1, ref previous);

    [MethodImpl(MethodImplOptions.AggressiveInlining)]
    private static ulong Before(ulong bits, int steps, ref ulong previous)
    {
        var moved = (bits << steps) | (previous >> (64 - steps));
        previous = bits;
        return moved;
    }

    // The first byte at or behind each start that is none of those to run through: a sum carries each start through its run.
    [MethodImpl(MethodImplOptions.AggressiveInlining)]
    private static ulong Run(ulong starts, ulong through, ref ulong carry)
    {
        var sum = through + starts;
        var over = sum < through ? 1UL : 0;
        var total = sum + carry;
        carry = over | (total < sum ? 1UL : 0);
        return total & ~through;
    }

    [MethodImpl(MethodImplOptions.AggressiveInlining)]
    private static ulong PrefixXor(ulong bits)
    {
        if (Pclmulqdq.IsSupported) return Pclmulqdq.CarrylessMultiply(Vector128.CreateScalar(bits), Vector128<ulong>.AllBitsSet, 0).ToScalar();

        for (var step = 1; step < 64; step <<= 1) bits ^= bits << step;
        return bits;
    }

    private static ulong Traps(ref byte bytes, int word, ulong trap)
    {
        var bad = 0UL;
        for (; trap != 0; trap &= trap - 1)
        {
            var bit = BitOperations.TrailingZeroCount(trap);
            var quote = word + bit;
            if (quote >= 3 && Unsafe.Add(ref bytes, quote - 2) == 'S' && Unsafe.Add(ref bytes, quote - 3) == '\\') bad |= 1UL << bit;
        }

        return bad;
    }

    // E [sign] digit [digit] and a comma or bracket; larger exponents may be beyond a double.
    private static ulong BadPowers(ref byte bytes, int word, ulong power, int length)
    {
        var bad = 0UL;
        for (; power != 0; power &= power - 1)
        {
            var bit = BitOperations.TrailingZeroCount(power);
            var next = word + bit + 1;
            if (next + 4 > length)
            {
                // The statement ends behind what is loaded and is read again, or is cut off for good.
                bad |= 1UL << bit;
                continue;
            }

            if (Unsafe.Add(ref bytes, next) is (byte)'+' or (byte)'-') next++;
            var digits = 0;
            while (digits < 3 && char.IsAsciiDigit((char)Unsafe.Add(ref bytes, next)))
            {
                digits++;
                next++;
            }

            if (digits is 0 or 3 || Unsafe.Add(ref bytes, next) is not ((byte)',' or (byte)')')) bad |= 1UL << bit;
        }

        return bad;
    }

    // #id=KEYWORD( or #id= KEYWORD(
    [MethodImpl(MethodImplOptions.AggressiveInlining)]
    private static bool TryHead(ref byte bytes, int start, int end, out uint id, out int keyword, out int length)
    {
        var at = start + 1;
        var number = 0UL;
        keyword = length = 0;
        id = 0;
        while (true)
        {
            var digit = (uint)Unsafe.Add(ref bytes, at) - '0';
            if (digit > 9) break;
            number = number * 10 + digit;
            at++;
        }

        if (at - start > 11 || number > uint.MaxValue || Unsafe.Add(ref bytes, at) != '=') return false;

        at++;
        if (Unsafe.Add(ref bytes, at) <= ' ') at++;
        id = (uint)number;
        keyword = at;

        // The word itself was checked by the masks; Slack makes the load readable.
        var brackets = Vector256.Equals(Vector256.LoadUnsafe(ref Unsafe.Add(ref bytes, at)), Vector256.Create((byte)'(')).ExtractMostSignificantBits();
        if (brackets != 0)
        {
            length = BitOperations.TrailingZeroCount(brackets);
        }
        else
        {
            while (at + length < end && length <= LongestKeyword && Unsafe.Add(ref bytes, at + length) != '(') length++;
        }

        var first = Unsafe.Add(ref bytes, at);
        return length > 0 && length <= LongestKeyword && (char.IsAsciiLetterUpper((char)first) || first == '_');
    }
}
