using System.Security.Cryptography;
using System.Text;

namespace MemberScan.Reporting.Script;

/// <summary>The scripts of the page as embedded in the program, with their hashes for the content policy.</summary>
/// <param name="Main">Table, panel, figures and, where present, the drawing of sheets.</param>
/// <param name="View">The view in space; null where the program was built without Node.js.</param>
public sealed record PageScripts(string Main, string? View)
{
    private const string Folder = "script/";
    private const string ViewName = "view.js";

    // The order in which they build on one another; sheet.js draws the sheet of a member on demand.
    private static readonly string[] s_order = ["core.js", "figures.js", "block.js", "columns.js", "table.js", "panel.js", "sheet.js", "start.js"];

    /// <summary>The scripts of this program.</summary>
    public static PageScripts Embedded { get; } = new(string.Concat(s_order.Select(Read)), Read(ViewName) is { Length: > 0 } view ? view : null);

    /// <summary>The policy's list of sources for scripts.</summary>
    public string Sources => string.Join(' ', new[] { Main, View }.OfType<string>().Select(HashOf));

    /// <summary>The element of a script, as it stands in the page.</summary>
    /// <exception cref="InvalidOperationException">The script holds text that would end its element.</exception>
    public static string Element(string script)
    {
        ArgumentNullException.ThrowIfNull(script);
        if (script.Contains("</script", StringComparison.OrdinalIgnoreCase) || script.Contains("<!--", StringComparison.Ordinal))
            throw new InvalidOperationException("A script of the page holds text that would end its element.");
        return "<script>" + script + "</script>";
    }

    // Content Security Policy Level 3, hash-source: over the element's text, UTF-8.
    private static string HashOf(string script) => $"'sha256-{Convert.ToBase64String(SHA256.HashData(Encoding.UTF8.GetBytes(script)))}'";

    private static string Read(string name)
    {
        using var stream = typeof(PageScripts).Assembly.GetManifestResourceStream(Folder + name);
        if (stream is null) return "";
        using var reader = new StreamReader(stream, Encoding.UTF8);
        return reader.ReadToEnd().ReplaceLineEndings("\n");
    }
}
