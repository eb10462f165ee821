using System.Security.Cryptography;
using System.Text;

namespace MemberScan.Reporting.Topics;

/// <summary>Identifiers that derive from the cause, so that a later run updates a topic and does not double it.</summary>
internal static class TopicIds
{
    /// <summary>A UUID of version 8 (RFC 9562) out of texts, in lower case.</summary>
    public static string Of(params string[] parts)
    {
        Span<byte> hash = stackalloc byte[32];
        SHA256.HashData(Encoding.UTF8.GetBytes(string.Join('\0', parts)), hash);
        hash[6] = (byte)(hash[6] & 0x0F | 0x80);
        hash[8] = (byte)(hash[8] & 0x3F | 0x80);
        return new Guid(hash[..16], bigEndian: true).ToString("D");
    }
}
