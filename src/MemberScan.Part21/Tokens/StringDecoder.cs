using System.Buffers;
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
    private static readonly SearchValues<byte> s_plain = SearchValues.Create(Bytes(b => b is >= 0x20 and < 0x7F and not ('\'' or '\\')));
    private static readonly SearchValues<byte> s_controls = SearchValues.Create(Bytes(b => b is < 0x20 or 0x7F));

    /// <summary>Decodes what stands between the outer apostrophes.</summary>
    public static string Decode(ReadOnlySpan<byte> content)
    {
        if (content.IndexOfAnyExcept(s_plain) < 0) return Encoding.ASCII.GetString(content);

        var buffer = ArrayPool<char>.Shared.Rent(content.Length);
        var text = buffer.AsSpan(0, Decode(content, buffer)).ToString();
        ArrayPool<char>.Shared.Return(buffer);
        return text;
    }

    /// <summary>Decodes into a buffer at least as long as the content: no directive stands for more than it takes.</summary>
    /// <returns>UTF-16 units written.</returns>
    public static int Decode(ReadOnlySpan<byte> content, Span<char> buffer)
    {
        if (content.IndexOfAnyExcept(s_plain) < 0) return Encoding.ASCII.GetChars(content, buffer);
        if (!content.ContainsAny(s_controls)) return DecodeDirectives(content, buffer);

        var kept = ArrayPool<byte>.Shared.Rent(content.Length);
        var count = 0;
        foreach (var value in content)
        {
            if (value is not (< 0x20 or 0x7F)) kept[count++] = value;
        }

        var length = DecodeDirectives(kept.AsSpan(0, count), buffer);
        ArrayPool<byte>.Shared.Return(kept);
        return length;
    }

    private static int DecodeDirectives(ReadOnlySpan<byte> bytes, Span<char> buffer)
    {
        var raw = Utf8.IsValid(bytes) ? Encoding.UTF8 : Windows1252.Encoding;
        var text = new Output(buffer);
        var page = 'A';
        var at = 0;
        while (at < bytes.Length)
        {
            var run = bytes[at..].IndexOfAny((byte)'\\', (byte)'\'');
            if (run < 0) run = bytes.Length - at;
            text.Length += Chars(raw, bytes.Slice(at, run), text.Rest);
            at += run;
            if (at >= bytes.Length) break;

            if (bytes[at] == '\\')
            {
                at += Directive(bytes[at..], ref text, ref page);
            }
            else
            {
                text.Append('\'');
                at += at + 1 < bytes.Length && bytes[at + 1] == '\'' ? 2 : 1;
            }
        }

        MendLoneSurrogates(buffer[..text.Length]);
        return text.Length;
    }

    // Returns how many bytes the directive takes.
    private static int Directive(ReadOnlySpan<byte> rest, ref Output text, ref char page)
    {
        if (rest.StartsWith(@"\\"u8))
        {
            text.Append('\\');
            return 2;
        }

        if (rest.StartsWith(@"\S\"u8) && rest.Length > 3 && rest[3] is >= 0x20 and <= 0x7E) return PageCharacter(rest, ref text, page);

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

        if (rest.StartsWith(@"\X2\"u8) && TryExtended(rest[4..], 4, ref text, out var taken)) return 4 + taken;
        if (rest.StartsWith(@"\X4\"u8) && TryExtended(rest[4..], 8, ref text, out taken)) return 4 + taken;
        if (rest.StartsWith(@"\N\"u8) || rest.StartsWith(@"\F\"u8)) return 3;

        text.Append('\\');
        return 1;
    }

    private static int PageCharacter(ReadOnlySpan<byte> rest, ref Output text, char page)
    {
        var code = (byte)(rest[3] | 0x80);
        if (page == 'A') text.Append((char)code);
        else text.Length += CodePagesEncodingProvider.Instance.GetEncoding(28591 + page - 'A')!.GetChars([code], text.Rest);

        if (rest[3] == '\\') return rest.Length > 4 && rest[4] == '\\' ? 5 : 4;
        if (rest[3] != '\'') return 4;

        // One apostrophe or a doubled one belongs to the directive; the others come in pairs.
        var run = StringToken.RunOfApostrophes(rest, 3);
        for (var i = 0; i < (run - 1) / 2; i++) text.Append('\'');
        return 3 + run;
    }

    private static bool TryExtended(ReadOnlySpan<byte> rest, int digits, ref Output text, out int taken)
    {
        var length = text.Length;
        taken = 0;
        while (!rest[taken..].StartsWith(@"\X0\"u8))
        {
            if (rest.Length - taken < digits || !TryHex(rest.Slice(taken, digits), out var value) || !TryAppend(value, digits, ref text))
            {
                text.Length = length;
                return false;
            }

            taken += digits;
        }

        taken += 4;
        return true;
    }

    private static bool TryAppend(uint value, int digits, ref Output text)
    {
        if (digits == 4)
        {
            text.Append((char)value);
            return true;
        }

        if (!Rune.IsValid(value)) return false;
        text.Length += new Rune(value).EncodeToUtf16(text.Rest);
        return true;
    }

    private static bool TryHex(ReadOnlySpan<byte> digits, out uint value)
    {
        value = 0;
        foreach (var digit in digits)
        {
            if (!char.IsAsciiHexDigit((char)digit)) return false;
            value = value << 4 | (uint)(digit <= '9' ? digit - '0' : (digit | 0x20) - 'a' + 10);
        }

        return true;
    }

    private static int Chars(Encoding raw, ReadOnlySpan<byte> bytes, Span<char> buffer)
    {
        if (!Ascii.IsValid(bytes)) return raw.GetChars(bytes, buffer);

        _ = Ascii.ToUtf16(bytes, buffer, out var written);
        return written;
    }

    // Half a pair has no UTF-8 spelling and would stop every writer further on.
    private static void MendLoneSurrogates(Span<char> text)
    {
        for (var i = 0; i < text.Length; i++)
        {
            if (!char.IsSurrogate(text[i])) continue;

            if (i + 1 < text.Length && char.IsSurrogatePair(text[i], text[i + 1])) i++;
            else text[i] = '\uFFFD';
        }
    }

    private static byte[] Bytes(Func<int, bool> isOne)
    {
        var bytes = new List<byte>(128);
        for (var b = 0; b < 0x80; b++)
            if (isOne(b))
                bytes.Add((byte)b);
        return [.. bytes];
    }

    // Apart, so that the table of code pages is loaded only for a text that needs it.
    private static class Windows1252
    {
        public static readonly Encoding Encoding = CodePagesEncodingProvider.Instance.GetEncoding(1252)!;
    }

    // Characters written so far into a buffer that is long enough.
    private ref struct Output(Span<char> buffer)
    {
        private readonly Span<char> _buffer = buffer;

        public int Length;

        public readonly Span<char> Rest => _buffer[Length..];

        public void Append(char value) => _buffer[Length++] = value;
    }
}
