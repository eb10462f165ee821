using System.Text.Encodings.Web;
using System.Text.Json;
using System.Text.Json.Serialization;
using System.Text.Json.Serialization.Metadata;

namespace MemberScan.Reporting.RunFile;

/// <summary>How a run record is spelled in JSON (RFC 8259); made by source generation.</summary>
[JsonSourceGenerationOptions(
    PropertyNamingPolicy = JsonKnownNamingPolicy.CamelCase,
    WriteIndented = true,
    NewLine = "\n",
    IgnoreReadOnlyProperties = true,
    AllowDuplicateProperties = false,
    RespectNullableAnnotations = true,
    RespectRequiredConstructorParameters = true,
    UnmappedMemberHandling = JsonUnmappedMemberHandling.Disallow,
    Converters =
    [
        typeof(VerdictText), typeof(ReasonCodeText), typeof(SeverityText), typeof(StressMeasureText),
    ])]
[JsonSerializable(typeof(RunDocument))]
internal sealed partial class RunJson : JsonSerializerContext
{
    // Made at first use: the generated part sets its own statics in an order that this part cannot see.
    private static JsonTypeInfo<RunDocument>? s_document;

    /// <summary>The document's contract: every member must be present, those of value types too.</summary>
    public static JsonTypeInfo<RunDocument> Document => s_document ??= MakeDocument();

    private static JsonTypeInfo<RunDocument> MakeDocument()
    {
        var options = new JsonSerializerOptions(Default.Options)
        {
            // The file is read as JSON alone and never put into a page, so letters may stay as they are.
            Encoder = JavaScriptEncoder.UnsafeRelaxedJsonEscaping,
            TypeInfoResolver = Default.WithAddedModifier(RequireAll),
        };
        return (JsonTypeInfo<RunDocument>)options.GetTypeInfo(typeof(RunDocument));
    }

    private static void RequireAll(JsonTypeInfo type)
    {
        if (type.Kind != JsonTypeInfoKind.Object) return;
        foreach (var property in type.Properties) property.IsRequired = property.Set is not null || property.AssociatedParameter is not null;
    }
}
