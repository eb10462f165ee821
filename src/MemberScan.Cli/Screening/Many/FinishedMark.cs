using System.Globalization;
using System.Security.Cryptography;
using System.Text;
using System.Text.Json;
using System.Text.Json.Serialization;
using MemberScan.Cli.Files;

namespace MemberScan.Cli.Screening.Many;

/// <summary>A file beside the outputs of a model that says what they were made from, so that a later run can tell that nothing is left to do.</summary>
/// <param name="Format">Name and number of the format.</param>
/// <param name="Inputs">SHA-256 over version, options and the bytes of all files read, in hexadecimal.</param>
/// <param name="ExitCode">What the run returned.</param>
/// <param name="Outputs">SHA-256 of each output by its name.</param>
internal sealed record FinishedMark(string Format, string Inputs, int ExitCode, SortedDictionary<string, string> Outputs)
{
    private const string FormatName = "memberscan-finished/1";

    private const string Ending = ".finished.json";

    /// <summary>Where the mark of a model is.</summary>
    public static string PathOf(OutputNames names) => names.RunRecord[..^".run.json".Length] + Ending;

    /// <summary>SHA-256 over what a run depends on. A time is part of it only when it was given.</summary>
    /// <exception cref="Failure">A file cannot be read.</exception>
    public static string InputsOf(ScreenRun.Options options)
    {
        var text = new StringBuilder();
        void Line(string name, string value) => text.Append(CultureInfo.InvariantCulture, $"{name} {value.Length} {value}\n");

        Line("version", Program.Version);
        Line("kind", options.Kind ?? "");
        Line("timestamp", options.Timestamp ?? "");
        Line("template", options.SetTemplate ? "yes" : "no");
        Line("bcf", options.Further.Bcf is null ? "none" : options.Further.BcfVersion.ToString());
        foreach (var path in options.Further.Paths) Line("output", Path.GetFileName(path));
        foreach (var (name, path) in options.NamedInputs)
        {
            Line(name, Path.GetFileName(path));
            text.Append(InputFile.Sha256(path)).Append('\n');
        }

        return Convert.ToHexStringLower(SHA256.HashData(Encoding.UTF8.GetBytes(text.ToString())));
    }

    /// <summary>Adds the mark to the files of a run, as the last one: where it stands, all others do.</summary>
    public static void AddTo(OutputSet files, OutputNames names, string inputs, int exitCode)
    {
        var folder = Path.GetDirectoryName(names.RunRecord)!;
        var outputs = new SortedDictionary<string, string>(StringComparer.Ordinal);
        foreach (var target in files.Targets) outputs[Path.GetRelativePath(folder, target).Replace('\\', '/')] = OutputSet.Sha256OfAdded(target);
        var mark = new FinishedMark(FormatName, inputs, exitCode, outputs);
        files.Add(PathOf(names), [.. JsonSerializer.SerializeToUtf8Bytes(mark, FinishedJson.Default.FinishedMark), (byte)'\n']);
    }

    /// <summary>The mark of a run from these inputs whose outputs all stand unchanged; null when there is none.</summary>
    public static FinishedMark? Find(OutputNames names, string inputs)
    {
        try
        {
            var mark = JsonSerializer.Deserialize(File.ReadAllBytes(PathOf(names)), FinishedJson.Default.FinishedMark);
            if (mark is not { Format: FormatName, Outputs.Count: > 0 } || mark.Inputs != inputs) return null;

            var folder = Path.GetDirectoryName(names.RunRecord)!;
            return mark.Outputs.All(o => Path.Combine(folder, o.Key) is var path && File.Exists(path) && InputFile.Sha256(path) == o.Value) ? mark : null;
        }
        catch (Exception e) when (e is IOException or UnauthorizedAccessException or JsonException or Failure)
        {
            return null;                                                     // no mark, or none of ours: the model is screened again
        }
    }
}

/// <summary>Reading and writing of the mark.</summary>
[JsonSourceGenerationOptions(WriteIndented = true, NewLine = "\n", PropertyNamingPolicy = JsonKnownNamingPolicy.CamelCase, RespectNullableAnnotations = true, RespectRequiredConstructorParameters = true)]
[JsonSerializable(typeof(FinishedMark))]
internal sealed partial class FinishedJson : JsonSerializerContext;
