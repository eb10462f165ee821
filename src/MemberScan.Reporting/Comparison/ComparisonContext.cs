using System.Text.Encodings.Web;
using System.Text.Json;
using System.Text.Json.Serialization;

namespace MemberScan.Reporting.Comparison;

/// <summary>How a comparison is spelled in JSON; made by source generation.</summary>
[JsonSourceGenerationOptions(WriteIndented = true, PropertyNamingPolicy = JsonKnownNamingPolicy.CamelCase)]
[JsonSerializable(typeof(ComparisonDocument))]
internal sealed partial class ComparisonContext : JsonSerializerContext
{
    // Made at first use: the generated part sets its own statics in an order that this part cannot see.
    private static ComparisonContext? s_plain;

    /// <summary>Letters of all scripts stay as they are; the file is never put into a page.</summary>
    public static ComparisonContext Plain => s_plain ??= new ComparisonContext(new JsonSerializerOptions
    {
        WriteIndented = true,
        NewLine = "\n",
        PropertyNamingPolicy = JsonNamingPolicy.CamelCase,
        Encoder = JavaScriptEncoder.UnsafeRelaxedJsonEscaping,
    });
}
