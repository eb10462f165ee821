using System.Text.Json.Serialization;

namespace MemberScan.Inputs.Outlines;

/// <summary>An outline as it stands in a JSON file.</summary>
/// <param name="Unit">Unit of all lengths.</param>
/// <param name="Outer">The outer ring.</param>
/// <param name="Holes">The holes.</param>
internal sealed record OutlineFile(
    [property: JsonRequired] string Unit, [property: JsonRequired] OutlineFileRing Outer, OutlineFileRing[]? Holes);
