using System.Text;

namespace MemberScan.Part21.Tokens;

/// <summary>Keywords: letters, digits and underscores, a user-defined one after <c>!</c>; lower case is taken too.</summary>
internal static class Words
{
    /// <summary>Whether a keyword may begin with the byte.</summary>
    public static bool Begins(byte value) => char.IsAsciiLetter((char)value) || value is (byte)'_' or (byte)'!';

    /// <summary>The offset behind the keyword that begins at <paramref name="at"/>.</summary>
    public static int End(ReadOnlySpan<byte> text, int at)
    {
        at++;
        while (at < text.Length && (char.IsAsciiLetterOrDigit((char)text[at]) || text[at] == '_')) at++;
        return at;
    }

    /// <summary>Whether exactly this word (upper case) stands at <paramref name="at"/>, in either case.</summary>
    public static bool Stands(ReadOnlySpan<byte> text, int at, ReadOnlySpan<byte> word)
    {
        if (at < 0 || text.Length - at < word.Length) return false;
        if (!Ascii.EqualsIgnoreCase(text.Slice(at, word.Length), word)) return false;

        var after = at + word.Length;
        return after == text.Length || !(char.IsAsciiLetterOrDigit((char)text[after]) || text[after] is (byte)'_' or (byte)'-');
    }

    /// <summary>The word in upper case.</summary>
    public static string Upper(ReadOnlySpan<byte> word)
    {
        var chars = new char[word.Length];
        for (var i = 0; i < chars.Length; i++) chars[i] = char.ToUpperInvariant((char)word[i]);
        return new string(chars);
    }
}
