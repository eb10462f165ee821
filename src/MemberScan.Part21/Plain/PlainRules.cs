using System.Numerics;
using System.Runtime.CompilerServices;
using System.Runtime.Intrinsics;
using static MemberScan.Part21.Plain.WideBits;

namespace MemberScan.Part21.Plain;

/// <summary>The rules of plain layout over 512 bytes at a time; what the rules look back to is kept from one time to the next.</summary>
internal struct PlainRules
{
    private Vector512<ulong> _sep, _sign, _exponent, _word, _headStart, _equals, _enumDot, _point, _hash, _semicolon, _atom, _quoteEnd, _close;
    private Vector512<ulong> _blankable, _noClose, _noComma, _typed, _backslash, _run1, _run2, _run4, _run8, _run11;
    private uint _head, _type, _enum, _whole, _part, _ref, _one;

    /// <summary>Sets the state between two statements.</summary>
    public void Begin() => _semicolon = _blankable = Vector512.Create(0, 0, 0, 0, 0, 0, 0, 1UL << 63);

    /// <summary>Marks as bad each byte, or one near behind it in the same statement, at which a statement stops to be plain.</summary>
    /// <param name="classes">Classes of the bytes.</param>
    /// <param name="inside">From each opening apostrophe to before the closing one.</param>
    /// <param name="bytes">First byte of the text.</param>
    /// <param name="block">Where the 512 bytes begin in it.</param>
    /// <param name="length">Length of the text [byte].</param>
    /// <param name="found">Receives the masks of <see cref="Found"/>.</param>
    /// <remarks>In one piece: forty masks are shared by the rules and stay in registers.</remarks>
    [MethodImpl(MethodImplOptions.AggressiveOptimization)]
    public void Apply(scoped in ByteClasses classes, Vector512<ulong> inside, ref byte bytes, int block, int length, scoped Span<ulong> found)
    {
        var quote = classes.Of(ByteClasses.Quote);
        var quoteStart = quote & inside;
        var quoteEnd = quote & ~inside;
        var outside = ~(inside | quote);

        var digit = classes.Of(ByteClasses.Digit) & outside;
        var letter = classes.Of(ByteClasses.Letter) & outside;
        var dot = classes.Of(ByteClasses.Dot) & outside;
        var sign = classes.Of(ByteClasses.Sign) & outside;
        var hash = classes.Of(ByteClasses.Hash) & outside;
        var single = classes.Of(ByteClasses.Single) & outside;
        var blank = classes.Of(ByteClasses.Blank) & outside;
        var open = classes.Of(ByteClasses.Open) & outside;
        var close = classes.Of(ByteClasses.Close) & outside;
        var comma = classes.Of(ByteClasses.Comma) & outside;
        var semicolon = classes.Of(ByteClasses.Semicolon) & outside;
        var equals = classes.Of(ByteClasses.EqualsSign) & outside;
        var exponent = classes.Of(ByteClasses.Exponent) & outside;
        var ends = comma | close;

        // No other byte outside of strings; no line end inside.
        var bad = outside & ~(digit | letter | dot | sign | hash | single | blank | open | close | comma | semicolon | equals);
        bad |= inside & classes.Of(ByteClasses.LineEnd);

        // Blanks behind , ( = ; and behind each other.
        var separators = open | comma | blank;
        var afterSep = Before(separators, ref _sep);
        bad |= blank & ~Before(separators | equals | semicolon, ref _blankable);

        // Words: the entity's behind '=' (and one blank), those of typed values; each ends at its bracket.
        var wordBytes = letter | digit;
        var afterWord = Before(wordBytes, ref _word);
        var afterEquals = Before(equals, ref _equals);
        bad |= afterEquals & ~(letter | blank);
        var headStart = letter & Before(equals | (blank & afterEquals), ref _headStart);
        var typeStart = letter & afterSep & ~headStart;
        var headEnd = Run(headStart, wordBytes, ref _head);
        var typeEnd = Run(typeStart, wordBytes, ref _type);
        bad |= (headEnd | typeEnd) & ~open;
        bad |= open & ~(afterSep | headEnd | typeEnd);

        // A typed value holds one value: the next bracket or comma behind its bracket closes it, and not at once.
        var typeOpen = Before(typeEnd & open, ref _typed);
        bad |= typeOpen & close;
        bad |= Run(typeOpen, ~(open | close | comma), ref _one) & ~close;

        // .LITERAL.
        var enumDot = dot & afterSep;
        var afterEnumDot = Before(enumDot, ref _enumDot);
        bad |= afterEnumDot & ~letter;
        var enumStart = letter & afterEnumDot;
        var enumEnd = Run(enumStart, wordBytes, ref _enum);
        bad |= enumEnd & ~dot;

        // Numbers: [sign] digits [. [digits]] [E …]; a sign stands before a digit.
        var afterSign = Before(sign, ref _sign);
        bad |= sign & ~(afterSep | Before(exponent, ref _exponent));
        bad |= afterSign & ~digit;
        var wholeStart = digit & (afterSep | afterSign);
        var wholeEnd = Run(wholeStart, digit, ref _whole);
        bad |= wholeEnd & ~(dot | ends | exponent);
        var point = wholeEnd & dot;
        var partStart = Before(point, ref _point);
        var partEnd = Run(partStart, digit, ref _part);
        bad |= partEnd & ~(ends | exponent);
        var power = (wholeEnd | partEnd) & exponent;
        if (power != Vector512<ulong>.Zero) bad |= BadPowers(power, ref bytes, block, length);
        bad |= dot & ~(enumDot | enumEnd | point);
        bad |= letter & ~(afterWord | headStart | typeStart | enumStart | power);

        // #12 : of at most ten digits; only the head of an instance has '=' behind.
        var afterHash = Before(hash, ref _hash);
        bad |= hash & ~(afterSep | Before(semicolon, ref _semicolon));
        bad |= afterHash & ~digit;
        var refEnd = Run(afterHash & digit, digit, ref _ref);
        bad |= refEnd & ~(ends | equals);
        bad |= equals & ~refEnd;
        bad |= digit & ~(afterWord | wholeStart | partStart | afterHash);
        var run2 = digit & Before(digit, ref _run1);
        var run4 = run2 & Before(run2, ref _run2, 2);
        var run8 = run4 & Before(run4, ref _run4, 4);
        var run11 = run8 & Before(run8, ref _run8, 3);
        bad |= refEnd & Before(run11, ref _run11);

        // Longer than any double: sixty-four digits in a row, at least.
        bad |= Vector512.Equals(digit, Vector512<ulong>.AllBitsSet);

        // What may follow what.
        bad |= single & ~afterSep;
        bad |= Before(single | (enumEnd & dot), ref _atom) & ~ends;
        var afterQuoteEnd = Before(quoteEnd, ref _quoteEnd);
        bad |= quoteStart & ~(afterSep | afterQuoteEnd);
        bad |= afterQuoteEnd & ~(ends | quoteStart);
        var afterClose = Before(close, ref _close);
        bad |= afterClose & ~(ends | semicolon);
        bad |= semicolon & ~afterClose;
        bad |= close & Before(comma | blank | equals, ref _noClose);
        bad |= comma & Before(comma | blank | open, ref _noComma);

        // \S\' : only reading the string from its start tells whether the apostrophe closes it.
        var trap = quote & Before(classes.Of(ByteClasses.Backslash), ref _backslash);
        if (trap != Vector512<ulong>.Zero) bad |= Traps(trap, ref bytes, block);

        bad.CopyTo(found[Found.Bad..]);
        (open & ~headEnd).CopyTo(found[Found.Open..]);
        close.CopyTo(found[Found.Close..]);
        semicolon.CopyTo(found[Found.Semicolon..]);
        equals.CopyTo(found[Found.EqualsSign..]);
        blank.CopyTo(found[Found.Blank..]);
    }

    private static Vector512<ulong> Traps(Vector512<ulong> trap, ref byte bytes, int block)
    {
        Span<ulong> bad = stackalloc ulong[8];
        for (var i = 0; i < 8; i++)
        {
            for (var rest = trap[i]; rest != 0; rest &= rest - 1)
            {
                var bit = BitOperations.TrailingZeroCount(rest);
                var quote = block + 64 * i + bit;
                if (quote >= 3 && Unsafe.Add(ref bytes, quote - 2) == 'S' && Unsafe.Add(ref bytes, quote - 3) == '\\') bad[i] |= 1UL << bit;
            }
        }

        return Vector512.Create<ulong>(bad);
    }

    // E [sign] digit [digit] and a comma or bracket; larger exponents may be beyond a double.
    private static Vector512<ulong> BadPowers(Vector512<ulong> power, ref byte bytes, int block, int length)
    {
        Span<ulong> bad = stackalloc ulong[8];
        for (var i = 0; i < 8; i++)
        {
            for (var rest = power[i]; rest != 0; rest &= rest - 1)
            {
                var bit = BitOperations.TrailingZeroCount(rest);
                if (!IsShortPower(ref bytes, block + 64 * i + bit + 1, length)) bad[i] |= 1UL << bit;
            }
        }

        return Vector512.Create<ulong>(bad);
    }

    private static bool IsShortPower(ref byte bytes, int next, int length)
    {
        // Cut off at the end of what is loaded: the statement is, too, and is read again.
        if (next + 4 > length) return false;

        if (Unsafe.Add(ref bytes, next) is (byte)'+' or (byte)'-') next++;
        var digits = 0;
        while (digits < 3 && char.IsAsciiDigit((char)Unsafe.Add(ref bytes, next + digits))) digits++;
        return digits is 1 or 2 && Unsafe.Add(ref bytes, next + digits) is (byte)',' or (byte)')';
    }
}
