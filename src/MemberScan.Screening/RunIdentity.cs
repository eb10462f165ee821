using System.Globalization;
using System.Security.Cryptography;
using System.Text;
using MemberScan.Inputs.SettingsFiles;

namespace MemberScan.Screening;

/// <summary>What tells one run from another, and times as files write them.</summary>
internal static class RunIdentity
{
    /// <summary>First 16 hexadecimal digits of SHA-256 over base model, forces files, effective settings and version.</summary>
    public static string RunId(string modelSha256, IEnumerable<string> forcesSha256, Settings settings, string version)
    {
        var text = new StringBuilder();
        text.Append("model ").Append(modelSha256).Append('\n');
        foreach (var hash in forcesSha256) text.Append("forces ").Append(hash).Append('\n');
        foreach (var setting in settings.Effective) text.Append(setting.Key).Append('=').Append(setting.Value).Append('\n');
        text.Append("version ").Append(version).Append('\n');
        return Convert.ToHexStringLower(SHA256.HashData(Encoding.UTF8.GetBytes(text.ToString())))[..16];
    }

    /// <summary>Seconds since 1970 of a time stamp: the one given for the run, else the header's, else 0.</summary>
    public static long CreationDate(string given, string header) => Seconds(given) ?? Seconds(header) ?? 0;

    private static long? Seconds(string text) =>
        DateTimeOffset.TryParse(text, CultureInfo.InvariantCulture, DateTimeStyles.AssumeUniversal, out var time) ? time.ToUnixTimeSeconds() : null;
}
