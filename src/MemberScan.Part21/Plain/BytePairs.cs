namespace MemberScan.Part21.Plain;

/// <summary>Which bytes may not follow which in a plain statement, outside of strings: two bytes do not go together if they have a bit in common.</summary>
/// <remarks>
/// Each bit stands for a group of bytes behind which none of another group may stand. What more than two bytes decide (words, numbers, brackets,
/// semicolons, equals signs) is left to <see cref="PlainRules"/>. A byte that is no byte of plain layout has all bits and follows none.
/// </remarks>
internal static class BytePairs
{
    private const int NoComma = 1, NoClose = 2, NoValue = 4, NoBlank = 8, NoSign = 16, NoLetter = 32, NoPoint = 64, NoDigit = 128;
    private const int Any = 255;

    private static readonly byte[] s_before = Table(BitsBefore);
    private static readonly byte[] s_behind = Table(BitsBehind);

    /// <summary>Bits of the byte before, by its value below 0x80.</summary>
    public static ReadOnlySpan<byte> Before => s_before;

    /// <summary>Bits of the byte behind, by its value below 0x80.</summary>
    public static ReadOnlySpan<byte> Behind => s_behind;

    private static byte[] Table(Func<char, int> bits)
    {
        var table = new byte[128];
        for (var c = 0; c < table.Length; c++) table[c] = (byte)bits((char)c);
        return table;
    }

    // E may end in a sign (an exponent); what follows ';' begins a statement and is looked at there.
    private static int BitsBefore(char c) => c switch
    {
        '(' => NoComma,
        ',' or <= ' ' or (char)0x7F => NoComma | NoClose,
        '=' => NoComma | NoClose | NoValue | NoSign | NoPoint | NoDigit,
        ')' or '$' or '*' => NoValue | NoBlank | NoSign | NoLetter | NoPoint | NoDigit,
        '#' or '+' or '-' => NoComma | NoClose | NoValue | NoBlank | NoSign | NoLetter | NoPoint,
        'E' => NoComma | NoClose | NoValue | NoBlank,
        (>= 'A' and <= 'Z') or '_' => NoComma | NoClose | NoValue | NoBlank | NoSign,
        >= '0' and <= '9' => NoValue | NoBlank | NoSign,
        '.' => NoValue | NoBlank | NoSign | NoPoint,
        '\'' => NoValue | NoBlank | NoSign | NoLetter | NoPoint | NoDigit,
        _ => 0,
    };

    private static int BitsBehind(char c) => c switch
    {
        ',' => NoComma,
        ')' => NoClose,
        '#' or '$' or '*' or '\'' => NoValue,
        <= ' ' or (char)0x7F => NoBlank,
        '+' or '-' => NoSign,
        (>= 'A' and <= 'Z') or '_' => NoLetter,
        '.' or '(' => NoPoint,
        >= '0' and <= '9' => NoDigit,
        ';' or '=' => 0,
        _ => Any,
    };
}
