using System.Text;

namespace MemberScan.Part21.Tests;

/// <summary>Seeded random changes to a text, many of them with bytes that mean something.</summary>
internal static class Mutations
{
    private static readonly string[] s_telling =
    [
        "'", "(", ")", ",", ";", "#", "=", "/*", "*/", "\\", "\"", ".", "\0", "\n", "#1=A();", "ENDSEC;", "DATA;", "END-ISO-10303-21;", "\\S\\'", "\uFEFF", "E", "-", " ", "1", "A",
    ];

    /// <summary>A copy with one to four changes.</summary>
    public static byte[] Next(Random random, byte[] bytes)
    {
        for (var count = random.Next(1, 5); count > 0; count--)
        {
            var at = random.Next(bytes.Length + 1);
            var behind = Math.Min(at + random.Next(4), bytes.Length);
            byte[] patch = random.Next(2) == 0 ? Encoding.UTF8.GetBytes(s_telling[random.Next(s_telling.Length)]) : new byte[random.Next(4)];
            if (patch.Length > 0 && patch[0] == 0) random.NextBytes(patch);
            bytes = [.. bytes[..at], .. patch, .. bytes[behind..]];
        }

        return bytes;
    }
}
