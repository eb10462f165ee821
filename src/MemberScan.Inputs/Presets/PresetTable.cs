using System.Collections.Immutable;
using MemberScan.Foundation.Diagnostics;
using MemberScan.Inputs.Json;
using MemberScan.Model.Presets;

namespace MemberScan.Inputs.Presets;

/// <summary>The load presets of <c>config/loads/</c>, embedded in the program; none acts unless settings switch it on.</summary>
public static class PresetTable
{
    private static readonly Lazy<ImmutableArray<LoadPreset>> s_shipped = new(ReadShipped);

    /// <summary>All shipped presets.</summary>
    public static ImmutableArray<LoadPreset> Shipped => s_shipped.Value;

    internal static ImmutableArray<LoadPreset> Read(ReadOnlyMemory<byte> bytes, string fileName, DiagnosticList diagnostics)
    {
        var source = new JsonSource(bytes, fileName, diagnostics);
        if (StrictJson.Read(source) is not { } root) return [];

        var values = new JsonValues(source);
        var presets = ImmutableArray<LoadPreset>.Empty;
        _ = values.Has(root, "the file", "presets");
        foreach (var (_, _, list) in values.Object(root, "", ["presets"])) presets = PresetReader.Read(list, "presets", values);
        return presets;
    }

    private static ImmutableArray<LoadPreset> ReadShipped()
    {
        var diagnostics = new DiagnosticList();
        string[] files = [ShippedFiles.GuardLoads, ShippedFiles.HangerLoads, ShippedFiles.MaintenanceLoads];
        ImmutableArray<LoadPreset> presets = [.. files.SelectMany(file => Read(ShippedFiles.Read(file), file, diagnostics))];
        return diagnostics.HasErrors ? throw new InvalidOperationException($"the shipped load presets are damaged: {diagnostics.Items[0]}") : presets;
    }
}
