using MemberScan.Part21.Index;
using MemberScan.Part21.Tokens;

namespace MemberScan.Part21;

/// <summary>The text of one instance such as <c>#12=IFCBEAM(…);</c>, nothing of it decoded.</summary>
/// <remarks>Good until the next look-up of the <see cref="Part21Lookup"/> that it came from.</remarks>
public readonly ref struct Part21Instance
{
    private readonly InstanceFlags _flags;

    internal Part21Instance(ReadOnlySpan<byte> text, long offset, uint id, InstanceFlags flags)
    {
        Text = text;
        Offset = offset;
        Id = id;
        _flags = flags;
    }

    /// <summary>From '#' to ';', both included; a damaged instance reaches to where reading went on.</summary>
    public ReadOnlySpan<byte> Text { get; }

    /// <summary>Offset of the '#' in the file [byte].</summary>
    public long Offset { get; }

    /// <summary>The number after '#'.</summary>
    public uint Id { get; }

    /// <summary>Whether the instance is of the external mapping <c>#1=(A(…)B(…))</c>; it then has no arguments here.</summary>
    public bool IsComplex => (_flags & InstanceFlags.Complex) != 0;

    /// <summary>Whether its arguments cannot be told apart; they then read as absent.</summary>
    public bool IsDamaged => (_flags & InstanceFlags.Damaged) != 0;

    /// <summary>The keyword as written; empty for a complex or damaged instance.</summary>
    public ReadOnlySpan<byte> Keyword
    {
        get
        {
            if (_flags != InstanceFlags.None) return default;

            var start = KeywordStart();
            return Text[start..Words.End(Text, start)];
        }
    }

    /// <summary>The keyword as written, also of a damaged instance where it can be told.</summary>
    internal ReadOnlySpan<byte> KeywordAsRead
    {
        get
        {
            if (IsComplex) return default;

            var start = KeywordStart();
            return start >= 0 && start < Text.Length && Words.Begins(Text[start]) ? Text[start..Words.End(Text, start)] : default;
        }
    }

    /// <summary>Whether it has exactly this keyword.</summary>
    /// <param name="keyword">In upper case.</param>
    public bool Is(ReadOnlySpan<byte> keyword) => System.Text.Ascii.EqualsIgnoreCase(Keyword, keyword);

    /// <summary>Its arguments, to be walked in order.</summary>
    public Part21Cursor Arguments
    {
        get
        {
            if (_flags != InstanceFlags.None) return default;

            var bracket = Blanks.Skip(Text, Words.End(Text, KeywordStart()));

            // A ')' right before the last ';' closes the list; anywhere else a comment may stand between.
            var end = Text.EndsWith(");"u8) ? Text.Length - 1 : Brackets.End(Text, bracket);
            return new Part21Cursor(Text[(bracket + 1)..(end - 1)]);
        }
    }

    private int KeywordStart()
    {
        var at = 1;
        while (char.IsAsciiDigit((char)Text[at])) at++;
        return Blanks.Skip(Text, Blanks.Skip(Text, at) + 1);
    }
}
