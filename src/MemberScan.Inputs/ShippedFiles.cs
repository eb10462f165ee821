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

    /// <summary>Names of all of them, with '/' between folder and file.</summary>
    public static ImmutableArray<string> Names { get; } = [DefaultSettings, SettingsSchema, Grades];

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
