using System.Text.Encodings.Web;
using System.Text.Json;
using System.Text.Json.Serialization;

namespace MemberScan.Cli.Sections;

/// <summary>Writes results of the section command as JSON.</summary>
[JsonSourceGenerationOptions(WriteIndented = true)]
[JsonSerializable(typeof(SectionResult))]
internal sealed partial class SectionJson : JsonSerializerContext
{
    /// <summary>Writes letters and signs as they are: the text goes to a terminal or a file, never into a page.</summary>
    public static SectionJson Plain { get; } = new(new JsonSerializerOptions { WriteIndented = true, Encoder = JavaScriptEncoder.UnsafeRelaxedJsonEscaping });
}
