using System.Collections.Immutable;
using MemberScan.Foundation.Diagnostics;
using MemberScan.Inputs.Json;
using MemberScan.Inputs.SettingsFiles.Limits;

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
        return source.ErrorCount == 0 ? settings with { Places = SettingPlaces.Of(root, source) } : null;
    }

    internal static Settings ReadShipped()
    {
        var diagnostics = new DiagnosticList();
        return Read(new JsonSource(ShippedFiles.Read(ShippedFiles.DefaultSettings), ShippedFiles.DefaultSettings, diagnostics) { IsShipped = true }) is { } settings
            ? AsDefaults(settings)
            : throw new InvalidOperationException($"the shipped settings are damaged: {diagnostics.Items[0]}");
    }

    private static Settings AsDefaults(Settings settings)
    {
        var limits = settings.Limits with { Stability = settings.Limits.Stability with { IsLengthFactorGiven = false } };
        return settings with { Given = [], Places = ImmutableDictionary<string, int>.Empty, Limits = limits };
    }
}
