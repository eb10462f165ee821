using System.Text.Json.Serialization;

namespace MemberScan.Cli.Sections;

/// <summary>Writes results of the section command as JSON.</summary>
[JsonSourceGenerationOptions(WriteIndented = true)]
[JsonSerializable(typeof(SectionResult))]
internal sealed partial class SectionJson : JsonSerializerContext;
