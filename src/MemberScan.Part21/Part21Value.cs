using System.Globalization;
using MemberScan.Part21.Tokens;

namespace MemberScan.Part21;

/// <summary>One argument or list item, not decoded before it is asked for; free to copy.</summary>
public readonly struct Part21Value
{
    private readonly SourceText? _source;
    private readonly long _start;
    private readonly int _length;
    private readonly TokenKind _kind;

    internal Part21Value(SourceText source, long start, int length, TokenKind kind) =>
        (_source, _start, _length, _kind) = (source, start, length, kind);

    /// <summary>What it is.</summary>
    public Part21ValueKind Kind => (Part21ValueKind)_kind;

    /// <summary>Whether it holds nothing: absent, <c>$</c> or <c>*</c>.</summary>
    public bool IsEmpty => _kind is TokenKind.Absent or TokenKind.Unset or TokenKind.Derived;

    /// <summary>Its bytes, without blanks and comments around.</summary>
    public ReadOnlySpan<byte> Text => _source is null ? default : _source.Slice(_start, _length);

    /// <summary>Offset of its first byte in the file [byte]; −1 for an argument beyond the last.</summary>
    public long Offset => _source is null ? -1 : _start;

    /// <summary>Number of the instance that holds it, where the text stays on disk; else 0.</summary>
    internal ulong InstanceId => _source?.InstanceId ?? 0;

    /// <summary>Keyword of a typed value, upper case; empty for others.</summary>
    public string TypeName => _kind == TokenKind.Typed ? Words.Upper(Text[..Words.End(Text, 0)]) : "";

    /// <summary>The value within a typed value; itself for others.</summary>
    public Part21Value Inner
    {
        get
        {
            if (_kind != TokenKind.Typed) return this;

            var content = Content(out var start);
            var list = new ParameterList(content);
            return list.MoveNext() ? new Part21Value(_source!, start + list.Start, list.End - list.Start, list.Kind) : default;
        }
    }

    /// <summary>Number of items of a list; 0 for others.</summary>
    public int ItemCount
    {
        get
        {
            if (_kind != TokenKind.List) return 0;

            var count = 0;
            for (var list = new ParameterList(Content(out _)); list.MoveNext();) count++;
            return count;
        }
    }

    /// <summary>Items of a list in order; none for others. Materialised once per call.</summary>
    public IReadOnlyList<Part21Value> Items
    {
        get
        {
            if (_kind != TokenKind.List) return [];
            var length = Content(out var start).Length;
            return All(_source!, start, length);
        }
    }

    /// <summary>Reads <c>#12</c>.</summary>
    public bool TryReference(out ulong id)
    {
        var at = 1;
        id = 0;
        return _kind == TokenKind.Reference && Numerals.TryRead(Text, ref at, out id);
    }

    /// <summary>Reads a real or an integer, typed or not; finite and correctly rounded, false otherwise.</summary>
    public bool TryReal(out double value)
    {
        var bare = Bare();
        value = 0;
        if (bare._kind is not (TokenKind.Real or TokenKind.Integer)) return false;
        if (double.TryParse(bare.Text, NumberStyles.Float, CultureInfo.InvariantCulture, out value) && double.IsFinite(value)) return true;

        value = 0;
        return false;
    }

    /// <summary>Reads an integer (or a real without fraction), typed or not.</summary>
    public bool TryInteger(out long value)
    {
        var bare = Bare();
        if (bare._kind == TokenKind.Integer) return long.TryParse(bare.Text, NumberStyles.AllowLeadingSign, CultureInfo.InvariantCulture, out value);

        value = 0;
        if (bare._kind != TokenKind.Real || !bare.TryReal(out var real) || real != Math.Truncate(real)) return false;
        if (real is < -9_223_372_036_854_775_808.0 or >= 9_223_372_036_854_775_808.0) return false;

        value = (long)real;
        return true;
    }

    /// <summary>Reads and decodes a string, typed or not; every directive of the standard.</summary>
    /// <remarks>A directive that is not complete stands for itself; half a surrogate pair reads as U+FFFD.</remarks>
    public bool TryText(out string value)
    {
        var bare = Bare();
        value = bare._kind == TokenKind.Text ? StringDecoder.Decode(bare.Text[1..^1]) : "";
        return bare._kind == TokenKind.Text;
    }

    /// <summary>Reads an enumeration literal without its dots, in upper case, typed or not.</summary>
    public bool TryEnumeration(out string literal)
    {
        var bare = Bare();
        literal = bare._kind == TokenKind.Enumeration ? Words.Upper(bare.Text[1..^1]) : "";
        return bare._kind == TokenKind.Enumeration;
    }

    /// <summary>The parameters in a stretch between two brackets.</summary>
    internal static Part21Value[] All(SourceText source, long start, int length)
    {
        var values = new List<Part21Value>();
        for (var list = new ParameterList(source.Slice(start, length)); list.MoveNext();)
            values.Add(new Part21Value(source, start + list.Start, list.End - list.Start, list.Kind));
        return [.. values];
    }

    // The value within typed values, however many stand around it.
    private Part21Value Bare()
    {
        var value = this;
        while (value._kind == TokenKind.Typed) value = value.Inner;
        return value;
    }

    // What stands between the brackets of a list or a typed value, and its offset in the file.
    private ReadOnlySpan<byte> Content(out long start)
    {
        var text = Text;
        var bracket = _kind == TokenKind.Typed ? Blanks.Skip(text, Words.End(text, 0)) : 0;
        start = _start + bracket + 1;
        return text[(bracket + 1)..^1];
    }
}
