using System.Security.Cryptography;
using System.Text;

namespace MemberScan.Reporting;

/// <summary>Style sheets and scripts that are embedded in the program and written into the page.</summary>
internal static class EmbeddedText
{
    /// <summary>A text by its name, line ends LF; null where the program was built without it.</summary>
    public static string? Find(string name)
    {
        using var stream = typeof(EmbeddedText).Assembly.GetManifestResourceStream(name);
        if (stream is null) return null;

        using var reader = new StreamReader(stream, Encoding.UTF8);
        return reader.ReadToEnd().ReplaceLineEndings("\n");
    }

    /// <summary>A text as a source in a content policy.</summary>
    /// <remarks>Content Security Policy Level 3, hash-source: over the element's text, UTF-8.</remarks>
    public static string PolicySource(string text) => $"'sha256-{Convert.ToBase64String(SHA256.HashData(Encoding.UTF8.GetBytes(text)))}'";
}
