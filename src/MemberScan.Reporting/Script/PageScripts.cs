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
    public string Sources => string.Join(' ', new[] { Main, View }.OfType<string>().Select(EmbeddedText.PolicySource));

    /// <summary>The element of a script, as it stands in the page.</summary>
    /// <exception cref="InvalidOperationException">The script holds text that would end its element.</exception>
    public static string Element(string script)
    {
        ArgumentNullException.ThrowIfNull(script);
        if (script.Contains("</script", StringComparison.OrdinalIgnoreCase) || script.Contains("<!--", StringComparison.Ordinal))
            throw new InvalidOperationException("A script of the page holds text that would end its element.");
        return "<script>" + script + "</script>";
    }

    private static string Read(string name) => EmbeddedText.Find(Folder + name) ?? "";
}
