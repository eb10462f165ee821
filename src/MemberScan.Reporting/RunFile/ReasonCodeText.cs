using System.Text.Json;
using System.Text.Json.Serialization;
using MemberScan.Model.Verdicts;

namespace MemberScan.Reporting.RunFile;

/// <summary>A reason code as it is printed, such as <c>no-strength</c>.</summary>
internal sealed class ReasonCodeText : JsonConverter<ReasonCode>
{
    /// <inheritdoc/>
    public override ReasonCode Read(ref Utf8JsonReader reader, Type typeToConvert, JsonSerializerOptions options)
    {
        var text = reader.TokenType == JsonTokenType.String ? reader.GetString() : null;
        foreach (var code in Enum.GetValues<ReasonCode>())
        {
            if (code.Text() == text) return code;
        }

        throw new JsonException("Not a reason code.");
    }

    /// <inheritdoc/>
    public override void Write(Utf8JsonWriter writer, ReasonCode value, JsonSerializerOptions options) => writer.WriteStringValue(value.Text());
}
