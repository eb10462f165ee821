using MemberScan.Foundation.Diagnostics;
using MemberScan.Inputs.Json;

namespace MemberScan.Inputs.SettingsFiles;

/// <summary>Settings files: JSON with comments and trailing commas, strict in everything else.</summary>
public static class SettingsFile
{
    /// <summary>Reads a settings file.</summary>
    /// <param name="bytes">The bytes of the file.</param>
    /// <param name="fileName">Name of the file, without its folder, for messages.</param>
    /// <param name="diagnostics">Takes the findings (INP-0101 to INP-0112), each with line and column.</param>
    /// <returns>The settings, what the file leaves out being the default; null when anything in it is wrong.</returns>
    public static Settings? Read(ReadOnlyMemory<byte> bytes, string fileName, DiagnosticList diagnostics)
    {
        ArgumentNullException.ThrowIfNull(fileName);
        ArgumentNullException.ThrowIfNull(diagnostics);
        return Read(new JsonSource(bytes, fileName, diagnostics));
    }

    private static Settings? Read(JsonSource source)
    {
        if (StrictJson.Read(source) is not { } root) return null;

        var settings = new SettingsReader(new JsonValues(source)).Read(root);
        return source.ErrorCount == 0 ? settings : null;
    }

    internal static Settings ReadShipped()
    {
        var diagnostics = new DiagnosticList();
        return Read(new JsonSource(ShippedFiles.Read(ShippedFiles.DefaultSettings), ShippedFiles.DefaultSettings, diagnostics) { IsShipped = true }) is { } settings
            ? settings with { Given = [] }
            : throw new InvalidOperationException($"the shipped settings are damaged: {diagnostics.Items[0]}");
    }
}
