using System.Globalization;
using MemberScan.Part21.Tokens;

namespace MemberScan.Part21;

/// <summary>Walks over arguments or list items; nothing is decoded before it is asked for, and nothing is allocated unless a method says so.</summary>
public ref struct Part21Cursor
{
    private readonly ReadOnlySpan<byte> _text;
    private ParameterList _list;

    internal Part21Cursor(ReadOnlySpan<byte> text)
    {
        _text = text;
        _list = new ParameterList(text);
    }

    /// <summary>What the current value is; <see cref="Part21ValueKind.Absent"/> before the first and behind the last.</summary>
    public readonly Part21ValueKind Kind => (Part21ValueKind)_list.Kind;

    /// <summary>The bytes of the current value, without blanks and comments around.</summary>
    public readonly ReadOnlySpan<byte> Text => _text[_list.Start.._list.End];

    /// <summary>Goes to the next value; false behind the last.</summary>
    public bool MoveNext() => _list.MoveNext();

    /// <summary>Goes on by several values, passing over those between; false if there are not so many.</summary>
    /// <param name="count">How many, 1 for the next.</param>
    public bool Move(int count)
    {
        for (; count > 0; count--)
            if (!MoveNext())
                return false;
        return true;
    }

    /// <summary>The items of the current value if it is a list, to be walked in order; of a typed value its one value; none of others.</summary>
    public readonly Part21Cursor Items
    {
        get
        {
            if (_list.Kind is not (TokenKind.List or TokenKind.Typed)) return default;

            var text = Text;
            var bracket = _list.Kind == TokenKind.Typed ? Blanks.Skip(text, Words.End(text, 0)) : 0;
            return new Part21Cursor(text[(bracket + 1)..^1]);
        }
    }

    /// <summary>Keyword of a typed value as written; empty for others.</summary>
    public readonly ReadOnlySpan<byte> TypeName => _list.Kind == TokenKind.Typed ? Text[..Words.End(Text, 0)] : default;

    /// <summary>Reads <c>#12</c>; false also for a number that no index holds.</summary>
    public readonly bool TryReference(out uint id)
    {
        var at = 1;
        id = 0;
        if (_list.Kind != TokenKind.Reference || !Numerals.TryRead(Text, ref at, out var number) || number > uint.MaxValue) return false;

        id = (uint)number;
        return true;
    }

    /// <summary>Reads a real or an integer, typed or not; finite and correctly rounded, false otherwise.</summary>
    public readonly bool TryReal(out double value)
    {
        var text = Bare(out var kind);
        value = 0;
        if (kind is not (TokenKind.Real or TokenKind.Integer)) return false;
        if (double.TryParse(text, NumberStyles.Float, CultureInfo.InvariantCulture, out value) && double.IsFinite(value)) return true;

        value = 0;
        return false;
    }

    /// <summary>Reads an integer, typed or not.</summary>
    public readonly bool TryInteger(out long value)
    {
        var text = Bare(out var kind);
        value = 0;
        return kind == TokenKind.Integer && long.TryParse(text, NumberStyles.AllowLeadingSign, CultureInfo.InvariantCulture, out value);
    }

    /// <summary>Reads an enumeration literal without its dots, as written, typed or not.</summary>
    public readonly bool TryEnumeration(out ReadOnlySpan<byte> literal)
    {
        var text = Bare(out var kind);
        literal = kind == TokenKind.Enumeration ? text[1..^1] : default;
        return kind == TokenKind.Enumeration;
    }

    /// <summary>Reads a logical <c>.T.</c>, <c>.F.</c> or <c>.U.</c>, typed or not.</summary>
    /// <param name="value">Null for <c>.U.</c></param>
    public readonly bool TryLogical(out bool? value)
    {
        value = null;
        if (!TryEnumeration(out var literal) || literal.Length != 1) return false;

        value = (literal[0] | 0x20) switch { 't' => true, 'f' => false, _ => null };
        return value is not null || (literal[0] | 0x20) == 'u';
    }

    /// <summary>Reads a binary, typed or not.</summary>
    /// <param name="digits">Hexadecimal digits as written.</param>
    /// <param name="unusedBits">Unused leading bits of the first digit, 0 to 3.</param>
    public readonly bool TryBinary(out ReadOnlySpan<byte> digits, out int unusedBits)
    {
        var text = Bare(out var kind);
        digits = kind == TokenKind.Binary ? text[2..^1] : default;
        unusedBits = kind == TokenKind.Binary ? text[1] - '0' : 0;
        return kind == TokenKind.Binary;
    }

    /// <summary>Reads and decodes a string, typed or not, into a buffer.</summary>
    /// <param name="buffer">As long as the value's text is always enough.</param>
    /// <param name="length">UTF-16 units written.</param>
    /// <returns>False also where the buffer is too short.</returns>
    public readonly bool TryText(Span<char> buffer, out int length)
    {
        var text = Bare(out var kind);
        length = 0;
        if (kind != TokenKind.Text || buffer.Length < text.Length - 2) return false;

        length = StringDecoder.Decode(text[1..^1], buffer);
        return true;
    }

    /// <summary>Reads and decodes a string, typed or not; allocates the string.</summary>
    public readonly bool TryText(out string value)
    {
        var text = Bare(out var kind);
        value = kind == TokenKind.Text ? StringDecoder.Decode(text[1..^1]) : "";
        return kind == TokenKind.Text;
    }

    // The value within typed values, however many stand around it.
    private readonly ReadOnlySpan<byte> Bare(out TokenKind kind)
    {
        var cursor = this;
        while (cursor._list.Kind == TokenKind.Typed)
        {
            cursor = cursor.Items;
            if (!cursor.MoveNext()) break;
        }

        kind = cursor._list.Kind;
        return cursor.Text;
    }
}
