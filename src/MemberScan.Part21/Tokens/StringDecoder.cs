using System.Buffers;
using System.Globalization;
using System.Text;
using System.Text.Unicode;

namespace MemberScan.Part21.Tokens;

/// <summary>The text that the bytes between two apostrophes stand for.</summary>
/// <remarks>
/// Bytes from 0x80 on are UTF-8 where the whole string is valid UTF-8, else Windows-1252. Control characters do not count.
/// A backslash that begins no valid directive stands for itself.
/// </remarks>
internal static class StringDecoder
{
    private static readonly SearchValues<byte> s_plain = SearchValues.Create(PlainBytes());
    private static readonly Encoding s_windows1252 = CodePagesEncodingProvider.Instance.GetEncoding(1252)!;

    /// <summary>Decodes what stands between the outer apostrophes.</summary>
    public static string Decode(ReadOnlySpan<byte> content)
    {
        if (content.IndexOfAnyExcept(s_plain) < 0) return Encoding.ASCII.GetString(content);

        var bytes = WithoutControls(content);
        var raw = Utf8.IsValid(bytes) ? Encoding.UTF8 : s_windows1252;
        var text = new StringBuilder(bytes.Length);
        var page = 'A';
        var at = 0;
        while (at < bytes.Length)
        {
            var run = bytes[at..].IndexOfAny((byte)'\\', (byte)'\'');
            if (run < 0) run = bytes.Length - at;
            text.Append(raw.GetString(bytes.Slice(at, run)));
            at += run;
            if (at >= bytes.Length) break;

            if (bytes[at] == '\\')
            {
                at += Directive(bytes[at..], text, ref page);
            }
            else
            {
                text.Append('\'');
                at += at + 1 < bytes.Length && bytes[at + 1] == '\'' ? 2 : 1;
            }
        }

        return WithoutLoneSurrogates(text.ToString());
    }

    // Returns how many bytes the directive takes.
    private static int Directive(ReadOnlySpan<byte> rest, StringBuilder text, ref char page)
    {
        if (rest.StartsWith(@"\\"u8))
        {
            text.Append('\\');
            return 2;
        }

        if (rest.StartsWith(@"\S\"u8) && rest.Length > 3 && rest[3] is >= 0x20 and <= 0x7E) return PageCharacter(rest, text, page);

        if (rest.Length >= 4 && rest[1] == 'P' && rest[2] is >= (byte)'A' and <= (byte)'I' && rest[3] == '\\')
        {
            page = (char)rest[2];
            return 4;
        }

        if (rest.StartsWith(@"\X\"u8) && rest.Length >= 5 && TryHex(rest.Slice(3, 2), out var value))
        {
            text.Append((char)value);
            return 5;
        }

        if (rest.StartsWith(@"\X2\"u8) && TryExtended(rest[4..], 4, text, out var taken)) return 4 + taken;
        if (rest.StartsWith(@"\X4\"u8) && TryExtended(rest[4..], 8, text, out taken)) return 4 + taken;
        if (rest.StartsWith(@"\N\"u8) || rest.StartsWith(@"\F\"u8)) return 3;

        text.Append('\\');
        return 1;
    }

    private static int PageCharacter(ReadOnlySpan<byte> rest, StringBuilder text, char page)
    {
        var code = (byte)(rest[3] | 0x80);
        if (page == 'A') text.Append((char)code);
        else text.Append(CodePagesEncodingProvider.Instance.GetEncoding(28591 + page - 'A')!.GetString([code]));

        if (rest[3] == '\\') return rest.Length > 4 && rest[4] == '\\' ? 5 : 4;
        if (rest[3] != '\'') return 4;

        // One apostrophe or a doubled one belongs to the directive; the others come in pairs.
        var run = StringToken.RunOfApostrophes(rest, 3);
        text.Append('\'', (run - 1) / 2);
        return 3 + run;
    }

    private static bool TryExtended(ReadOnlySpan<byte> rest, int digits, StringBuilder text, out int taken)
    {
        var length = text.Length;
        taken = 0;
        while (!rest[taken..].StartsWith(@"\X0\"u8))
        {
            if (rest.Length - taken < digits || !TryHex(rest.Slice(taken, digits), out var value) || !TryAppend(value, digits, text))
            {
                text.Length = length;
                return false;
            }

            taken += digits;
        }

        taken += 4;
        return true;
    }

    private static bool TryAppend(uint value, int digits, StringBuilder text)
    {
        if (digits == 4)
        {
            text.Append((char)value);
            return true;
        }

        if (!Rune.IsValid(value)) return false;
        text.Append(new Rune(value).ToString());
        return true;
    }

    private static bool TryHex(ReadOnlySpan<byte> digits, out uint value) =>
        uint.TryParse(digits, NumberStyles.AllowHexSpecifier, CultureInfo.InvariantCulture, out value);

    private static ReadOnlySpan<byte> WithoutControls(ReadOnlySpan<byte> content)
    {
        var count = 0;
        foreach (var value in content) count += IsControl(value) ? 1 : 0;
        if (count == 0) return content;

        var kept = new byte[content.Length - count];
        var at = 0;
        foreach (var value in content)
        {
            if (!IsControl(value)) kept[at++] = value;
        }

        return kept;
    }

    private static bool IsControl(byte value) => value is < 0x20 or 0x7F;

    // Half a pair has no UTF-8 spelling and would stop every writer further on.
    private static string WithoutLoneSurrogates(string text)
    {
        if (text.AsSpan().IndexOfAnyInRange('\uD800', '\uDFFF') < 0) return text;

        var chars = text.ToCharArray();
        for (var i = 0; i < chars.Length; i++)
        {
            if (!char.IsSurrogate(chars[i])) continue;

            if (i + 1 < chars.Length && char.IsSurrogatePair(chars[i], chars[i + 1])) i++;
            else chars[i] = '\uFFFD';
        }

        return new string(chars);
    }

    private static byte[] PlainBytes() =>
        [.. Enumerable.Range(0x20, 0x5F).Select(b => (byte)b).Where(b => b is not ((byte)'\'' or (byte)'\\'))];
}
