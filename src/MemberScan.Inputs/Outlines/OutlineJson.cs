using System.Text.Json;
using System.Text.Json.Serialization;

namespace MemberScan.Inputs.Outlines;

/// <summary>Reads outline files; unknown and repeated keys are errors.</summary>
[JsonSourceGenerationOptions(
    PropertyNamingPolicy = JsonKnownNamingPolicy.CamelCase, UnmappedMemberHandling = JsonUnmappedMemberHandling.Disallow,
    ReadCommentHandling = JsonCommentHandling.Skip, AllowTrailingCommas = true, AllowDuplicateProperties = false)]
[JsonSerializable(typeof(OutlineFile))]
internal sealed partial class OutlineJson : JsonSerializerContext;
