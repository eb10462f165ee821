using System.Text.Json;
using System.Text.Json.Serialization;
using MemberScan.Model.Verdicts;
using MemberScan.Reporting.Display;

namespace MemberScan.Reporting.RunFile;

/// <summary>A verdict in its words.</summary>
internal sealed class VerdictText : JsonConverter<Verdict>
{
    /// <inheritdoc/>
    public override Verdict Read(ref Utf8JsonReader reader, Type typeToConvert, JsonSerializerOptions options) =>
        reader.TokenType == JsonTokenType.String && VerdictWords.TryParse(reader.GetString(), out var verdict)
            ? verdict
            : throw new JsonException("Not one of WITHIN LIMIT, OVERSTRESSED, NOT CHECKED.");

    /// <inheritdoc/>
    public override void Write(Utf8JsonWriter writer, Verdict value, JsonSerializerOptions options) => writer.WriteStringValue(value.Word());
}
