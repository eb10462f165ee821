using System.Security.Cryptography;
using System.Text;

namespace MemberScan.Ifc.WriteBack;

/// <summary>GlobalIds that derive from a text, so that a repeated run writes the same.</summary>
public static class GlobalIds
{
    private const string Alphabet = "0123456789ABCDEFGHIJKLMNOPQRSTUVWXYZabcdefghijklmnopqrstuvwxyz_$";

    /// <summary>The 22 characters of a UUID made from the SHA-256 of a text (version 8 of RFC 9562).</summary>
    public static string From(string text)
    {
        Span<byte> hash = stackalloc byte[32];
        SHA256.HashData(Encoding.UTF8.GetBytes(text), hash);
        hash[6] = (byte)(hash[6] & 0x0F | 0x80);
        hash[8] = (byte)(hash[8] & 0x3F | 0x80);
        return Compress(hash[..16]);
    }

    /// <summary>The 22 characters of 16 bytes in printed order: the first byte as two, then three bytes as four.</summary>
    internal static string Compress(ReadOnlySpan<byte> bytes)
    {
        Span<char> text = stackalloc char[22];
        Put(text[..2], bytes[0]);
        for (var i = 0; i < 5; i++)
            Put(text.Slice(2 + 4 * i, 4), bytes[1 + 3 * i] << 16 | bytes[2 + 3 * i] << 8 | bytes[3 + 3 * i]);
        return new string(text);
    }

    private static void Put(Span<char> target, int value)
    {
        for (var i = target.Length - 1; i >= 0; i--, value >>= 6) target[i] = Alphabet[value & 63];
    }
}
