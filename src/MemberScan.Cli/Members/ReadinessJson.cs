using System.Text.Encodings.Web;
using System.Text.Json;
using System.Text.Json.Serialization;
using MemberScan.Model.Verdicts;
using MemberScan.Screening.Readiness;

namespace MemberScan.Cli.Members;

/// <summary>The readiness of a model as JSON: SI values, codes as in the reports.</summary>
[JsonSourceGenerationOptions(WriteIndented = true, PropertyNamingPolicy = JsonKnownNamingPolicy.CamelCase)]
[JsonSerializable(typeof(ReadinessDocument))]
internal sealed partial class ReadinessJson : JsonSerializerContext
{
    private static readonly ReadinessJson s_plain = new(new JsonSerializerOptions
    {
        WriteIndented = true,
        PropertyNamingPolicy = JsonNamingPolicy.CamelCase,
        Encoder = JavaScriptEncoder.UnsafeRelaxedJsonEscaping,
    });

    /// <summary>The record as UTF-8 bytes.</summary>
    public static byte[] Write(ReadinessRecord record) => JsonSerializer.SerializeToUtf8Bytes(
        new ReadinessDocument(
            record.Model.FileName, record.Model.Sha256, record.Model.ReadAs, record.Model.ReadToEnd, record.HasDamage, record.Members.Length, record.Ready,
            [.. record.Totals.Select(t => new ReadinessDocument.Total(t.Code.Text(), t.Count, t.Line))],
            [.. record.PassedOver.Select(p => new ReadinessDocument.Passed(p.Class, p.Count, p.Why))],
            [.. record.Members.Select(Of)]),
        s_plain.ReadinessDocument);

    private static ReadinessDocument.Candidate Of(MemberReadiness m) => new(
        m.Key, m.Identity.GlobalId, m.Identity.ItemNumber, m.Identity.Tag, m.Name, m.Class, m.Identity.PredefinedType, m.Identity.TypeName, m.RoleGuess, m.Identity.Storey,
        m.Identity.StoreyPath, m.Identity.Assembly, m.Identity.Layer, m.Section, m.SectionSource, m.Material, m.Strength, m.StrengthSource,
        m.Length, m.LengthSource, m.Situations, m.Stations, m.ForcesSource, m.IsReady, [.. m.Missing.Select(r => new ReadinessDocument.Lack(r.Code.Text(), r.Message))], m.Notes);
}
