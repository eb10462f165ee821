using System.Security.Cryptography;
using System.Text;

namespace MemberScan.SampleModels.Writing;

/// <summary>GlobalIds that follow from a name: the first 128 bits of its SHA-256 as 22 characters.</summary>
public static class GlobalIds
{
    private const string Alphabet = "0123456789ABCDEFGHIJKLMNOPQRSTUVWXYZabcdefghijklmnopqrstuvwxyz_$";

    /// <summary>The GlobalId for a name.</summary>
    public static string From(string name) => Compress(SHA256.HashData(Encoding.UTF8.GetBytes(name)).AsSpan(0, 16));

    /// <summary>The 22 characters for 16 bytes, in the order in which a UUID's digits are printed.</summary>
    public static string Compress(ReadOnlySpan<byte> bytes)
    {
        ArgumentOutOfRangeException.ThrowIfNotEqual(bytes.Length, 16);

        var text = new StringBuilder(22);
        Append(text, bytes[0], 2);
        for (var i = 1; i < 16; i += 3) Append(text, (bytes[i] << 16) | (bytes[i + 1] << 8) | bytes[i + 2], 4);
        return text.ToString();
    }

    private static void Append(StringBuilder text, int value, int digits)
    {
        for (var shift = 6 * (digits - 1); shift >= 0; shift -= 6) text.Append(Alphabet[(value >> shift) & 63]);
    }
}
