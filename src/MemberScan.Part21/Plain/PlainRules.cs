using System.Numerics;
using System.Runtime.CompilerServices;
using System.Runtime.Intrinsics;
using static MemberScan.Part21.Plain.WideBits;

namespace MemberScan.Part21.Plain;

/// <summary>The rules of plain layout over 512 bytes at a time; what the rules look back to is kept from one time to the next.</summary>
internal struct PlainRules
{
    private Vector512<ulong> _numeric, _letter, _wordDot, _point, _endDot, _hash, _semicolon, _equals, _headBlank, _close, _quoteEnd, _typeOpen, _backslash;
    private Vector512<ulong> _run1, _run2, _run4, _run8, _run11;
    private BracketDepth _depth;
    private uint _inside, _start, _ref, _part, _enum, _one;

    /// <summary>Sets the state between two statements.</summary>
    public void Begin() => _semicolon = Vector512.Create(0, 0, 0, 0, 0, 0, 0, 1UL << 63);

    /// <summary>Marks as bad each byte, or one near behind it in the same statement, at which a statement stops to be plain.</summary>
    /// <param name="classes">Classes of the bytes.</param>
    /// <param name="text">The text.</param>
    /// <param name="block">Where the 512 bytes begin in it.</param>
    /// <param name="found">Receives the masks of <see cref="Found"/>.</param>
    /// <returns>Whether nothing is bad and nothing but instances follows the statements.</returns>
    /// <remarks>In one piece: the masks are shared by the rules and stay in registers.</remarks>
    [MethodImpl(MethodImplOptions.AggressiveOptimization)]
    public bool Apply(scoped in ByteClasses classes, ReadOnlySpan<byte> text, int block, scoped Span<ulong> found)
    {
        classes.Columns(0, out var quote, out var numeric, out var letter, out var dot, out var hash, out var blank, out var open, out var close);
        classes.Columns(1, out var comma, out var semicolon, out var equals, out var lineEnd, out var backslash, out var misplaced, out _, out _);

        // Strings: from each opening apostrophe to before the closing one. Two apostrophes within are one string's end and the next one's beginning.
        var inside = PrefixXor(quote, ref _inside);
        var quoteStart = quote & inside;
        var quoteEnd = quote & ~inside;
        var outside = ~(inside | quote);
        var afterQuoteEnd = Before(quoteEnd, ref _quoteEnd);
        var bad = misplaced & (outside | (quoteStart & ~afterQuoteEnd));
        bad |= inside & lineEnd;

        numeric &= outside;
        letter &= outside;
        dot &= outside;
        hash &= outside;
        blank &= outside;
        open &= outside;
        close &= outside;
        comma &= outside;
        semicolon &= outside;
        equals &= outside;
        var afterNumeric = Before(numeric, ref _numeric);
        var afterLetter = Before(letter, ref _letter);
        var word = letter | numeric;

        // A statement ends behind a bracket; what follows it and is not blank begins the next one.
        bad |= semicolon & ~Before(close, ref _close);
        var start = Run(Before(semicolon, ref _semicolon), blank, ref _start);

        // Brackets: a semicolon stands outside of all, a comma and no equals sign within some.
        bad |= _depth.Take(open, close, out var ones, out var higher);
        var within = ones | higher;
        bad |= (semicolon | equals) & within;
        bad |= comma & ~within;

        // #12 : of at most ten digits; '=' stands behind it only, and a word or a blank and a word behind that.
        var afterHash = Before(hash, ref _hash);
        var refEnd = Run(afterHash & numeric, numeric, ref _ref);
        bad |= refEnd & ~(comma | close | equals);
        bad |= equals & ~refEnd;
        bad |= Before(blank & Before(equals, ref _equals), ref _headBlank) & ~letter;
        var run2 = numeric & Before(numeric, ref _run1);
        var run4 = run2 & Before(run2, ref _run2, 2);
        var run8 = run4 & Before(run4, ref _run4, 4);
        var run11 = run8 & Before(run8, ref _run8, 3);
        bad |= refEnd & Before(run11, ref _run11);

        // Longer than any double, or any keyword: sixty-four in a row, at least.
        bad |= Vector512.Equals(word, Vector512<ulong>.AllBitsSet);

        // Three kinds of dots: before a word, behind a digit, behind a letter.
        var point = dot & afterNumeric;
        var endDot = dot & afterLetter;
        var wordDot = dot & ~(point | endDot);
        var afterWordDot = Before(wordDot, ref _wordDot);
        var afterPoint = Before(point, ref _point);
        bad |= afterWordDot & ~letter;
        bad |= Before(endDot, ref _endDot) & word;

        // .LITERAL. begins and ends with a dot; a number has one.
        var enumEnd = Run(afterWordDot & letter, word, ref _enum);
        bad |= enumEnd & ~dot;
        bad |= endDot & ~enumEnd;
        bad |= Run(afterPoint & numeric, numeric, ref _part) & dot;

        // A typed value holds one value: the next bracket or comma behind its bracket closes it, and not at once.
        var inType = Before(open & (afterLetter | afterNumeric) & higher, ref _typeOpen);
        bad |= inType & close;
        bad |= Run(inType, ~(open | close | comma), ref _one) & ~close;

        // Letters next to digits.
        var odd = (afterNumeric & (letter | open)) | (afterLetter & numeric) | (afterPoint & letter);
        if (odd != Vector512<ulong>.Zero) bad |= OddTokens.Unsound(odd, text, block);

        // \S\' : only reading the string from its start tells whether the apostrophe closes it.
        var trap = quote & Before(backslash, ref _backslash);
        if (trap != Vector512<ulong>.Zero) bad |= Traps(trap, text, block);

        bad.CopyTo(found[Found.Bad..]);
        start.CopyTo(found[Found.Start..]);
        semicolon.CopyTo(found[Found.Semicolon..]);
        return (bad | (start & ~hash)) == Vector512<ulong>.Zero;
    }

    private static Vector512<ulong> Traps(Vector512<ulong> trap, ReadOnlySpan<byte> text, int block)
    {
        Span<ulong> bad = stackalloc ulong[8];
        bad.Clear();
        for (var i = 0; i < 8; i++)
        {
            for (var rest = trap[i]; rest != 0; rest &= rest - 1)
            {
                var bit = BitOperations.TrailingZeroCount(rest);
                var quote = block + 64 * i + bit;
                if (quote >= 3 && quote < text.Length && text[quote - 2] == 'S' && text[quote - 3] == '\\') bad[i] |= 1UL << bit;
            }
        }

        return Vector512.Create<ulong>(bad);
    }
}
