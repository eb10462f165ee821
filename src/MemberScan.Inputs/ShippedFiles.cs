using System.Collections.Immutable;

namespace MemberScan.Inputs;

/// <summary>The files of <c>config/</c> that are embedded in the program.</summary>
public static class ShippedFiles
{
    /// <summary>The default settings, with remarks.</summary>
    public const string DefaultSettings = "settings.default.json";

    /// <summary>JSON Schema of settings files.</summary>
    public const string SettingsSchema = "settings.schema.json";

    /// <summary>Material grades by name.</summary>
    public const string Grades = "materials/grades.json";

    /// <summary>Load presets of guards and handrails.</summary>
    public const string GuardLoads = "loads/guards.json";

    /// <summary>Load presets of hangers.</summary>
    public const string HangerLoads = "loads/hangers.json";

    /// <summary>Load presets of maintenance.</summary>
    public const string MaintenanceLoads = "loads/maintenance.json";

    /// <summary>Pipe sizes by schedule, and densities of contents.</summary>
    public const string Pipes = "loads/pipes.json";

    /// <summary>Ready bases: allowable stress, EN 1993-1-1, AISC 360-22 by its two methods.</summary>
    public const string AllowableStressBasis = "basis/allowable-stress.json", En1993Basis = "basis/en-1993.json", AiscAsd = "basis/aisc-360-asd.json", AiscLrfd = "basis/aisc-360-lrfd.json";

    /// <summary>Names of the ready bases.</summary>
    public static ImmutableArray<string> Bases { get; } = [AllowableStressBasis, En1993Basis, AiscAsd, AiscLrfd];

    /// <summary>Names of all of them, with '/' between folder and file.</summary>
    public static ImmutableArray<string> Names { get; } = [DefaultSettings, SettingsSchema, Grades, GuardLoads, HangerLoads, MaintenanceLoads, Pipes, .. Bases];

    /// <summary>The bytes of one of them.</summary>
    /// <exception cref="ArgumentException">There is no such file.</exception>
    public static ReadOnlyMemory<byte> Read(string name)
    {
        using var stream = typeof(ShippedFiles).Assembly.GetManifestResourceStream(name)
            ?? throw new ArgumentException($"there is no shipped file '{name}'", nameof(name));
        var bytes = new byte[stream.Length];
        stream.ReadExactly(bytes);
        return bytes;
    }
}
