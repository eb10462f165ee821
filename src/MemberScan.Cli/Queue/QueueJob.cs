using System.Text.Json;
using System.Text.Json.Serialization;

namespace MemberScan.Cli.Queue;

/// <summary>One model in the queue, with what is asked of it. Paths are relative to the root that enqueuer and workers share, parted by <c>/</c>.</summary>
/// <param name="Format">Name and number of the format.</param>
/// <param name="Model">Path of the model.</param>
/// <param name="Forces">Paths of forces tables.</param>
/// <param name="Settings">Path of a settings file; null for none.</param>
/// <param name="Kind">Kind of situations that nothing else tells; null for none.</param>
/// <param name="Timestamp">Time of the run; null for the clock's.</param>
/// <param name="SetTemplate">Whether the checked model explains our set by a template.</param>
/// <param name="Also">Further outputs: <c>bcf</c>, <c>parquet</c>, <c>xlsx</c>.</param>
internal sealed record QueueJob(string Format, string Model, string[] Forces, string? Settings, string? Kind, string? Timestamp, bool SetTemplate, string[] Also)
{
    /// <summary>Name and number of the format.</summary>
    public const string FormatName = "memberscan-job/1";

    /// <summary>Largest message read [byte].</summary>
    public const int MaxBytes = 65_536;

    /// <summary>Further outputs that a job can ask for.</summary>
    public static readonly string[] Outputs = ["bcf", "parquet", "xlsx"];

    /// <summary>The message.</summary>
    public byte[] Write() => JsonSerializer.SerializeToUtf8Bytes(this, QueueJson.Default.QueueJob);

    /// <summary>Reads a message; null when it is none of ours.</summary>
    public static QueueJob? Read(byte[]? message)
    {
        if (message is not { Length: <= MaxBytes }) return null;
        try
        {
            return JsonSerializer.Deserialize(message, QueueJson.Default.QueueJob) is { Format: FormatName } job && job.Also.All(Outputs.Contains) && job.Kind is null or "service" or "design" ? job : null;
        }
        catch (JsonException)
        {
            return null;
        }
    }
}

/// <summary>Reading and writing of jobs; strict.</summary>
[JsonSourceGenerationOptions(PropertyNamingPolicy = JsonKnownNamingPolicy.CamelCase, RespectNullableAnnotations = true, RespectRequiredConstructorParameters = true, UnmappedMemberHandling = JsonUnmappedMemberHandling.Disallow, MaxDepth = 4)]
[JsonSerializable(typeof(QueueJob))]
internal sealed partial class QueueJson : JsonSerializerContext;
