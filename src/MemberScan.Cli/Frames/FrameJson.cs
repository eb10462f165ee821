using System.Text.Encodings.Web;
using System.Text.Json;

namespace MemberScan.Cli.Frames;

/// <summary>Writes the answers of the frame command as JSON; keys stay as they are, since others read them.</summary>
internal static class FrameJson
{
    private static readonly string[] s_row = ["x", "N", "Vy", "Vz", "T", "My", "Mz", "ux", "uy", "uz"];
    private static readonly string[] s_extreme = ["least", "leastAt", "largest", "largestAt"];

    /// <summary>Writes the document.</summary>
    public static void Write(Stream stream, FrameDocument document)
    {
        using (stream)
        using (var json = new Utf8JsonWriter(stream, new JsonWriterOptions { Indented = true, Encoder = JavaScriptEncoder.UnsafeRelaxedJsonEscaping }))
        {
            json.WriteStartObject();
            json.WriteStartObject("units");
            json.WriteString("length", document.Units.Length.Symbol);
            json.WriteString("force", document.Units.Force.Symbol);
            json.WriteEndObject();
            json.WriteStartObject("situations");
            foreach (var answer in document.Situations) Write(json, answer);
            json.WriteEndObject();
            json.WriteStartObject("quality");
            json.WriteNumber("unknowns", document.Quality.Unknowns);
            json.WriteNumber("condition", document.Quality.Condition);
            json.WriteNumber("smallestPivot", document.Quality.SmallestPivot);
            if (document.Quality.Reciprocity is { } reciprocity) json.WriteNumber("reciprocity", reciprocity);
            json.WriteEndObject();
            json.WriteStartArray("notes");
            foreach (var note in document.Notes) json.WriteStringValue(note);
            json.WriteEndArray();
            json.WriteEndObject();
        }
    }

    private static void Write(Utf8JsonWriter json, FrameDocument.Answer answer)
    {
        json.WriteStartObject(answer.Name);
        json.WriteString("kind", answer.Kind);
        if (answer.Basis is { } basis) json.WriteString("basis", basis);
        Write(json, "displacements", answer.Displacements);
        Write(json, "reactions", answer.Reactions);
        json.WriteStartObject("members");
        foreach (var member in answer.Members) Write(json, member);
        json.WriteEndObject();
        json.WriteNumber("residual", answer.Checks.Residual);
        json.WriteNumber("backwardError", answer.Checks.BackwardError);
        json.WriteNumber("equilibriumError", answer.Checks.EquilibriumError);
        json.WriteEndObject();
    }

    private static void Write(Utf8JsonWriter json, string key, IEnumerable<(string Node, double[] Six)> nodes)
    {
        json.WriteStartObject(key);
        foreach (var (node, six) in nodes)
        {
            json.WriteStartArray(node);
            foreach (var value in six) json.WriteNumberValue(Plain(value));
            json.WriteEndArray();
        }

        json.WriteEndObject();
    }

    private static void Write(Utf8JsonWriter json, FrameDocument.MemberAnswer member)
    {
        json.WriteStartObject(member.Name);
        json.WriteNumber("length", member.Length);
        json.WriteStartArray("stations");
        foreach (var row in member.Rows) Write(json, s_row, row);
        json.WriteEndArray();
        json.WriteStartObject("extremes");
        foreach (var (component, four) in member.Extremes)
        {
            json.WritePropertyName(component);
            Write(json, s_extreme, four);
        }

        json.WriteEndObject();
        if (member.Utilization is { } utilization) json.WriteNumber("utilization", utilization);
        if (member.WhyNoUtilization is { } why) json.WriteString("noUtilization", why);
        json.WriteEndObject();
    }

    private static void Write(Utf8JsonWriter json, string[] keys, double[] numbers)
    {
        json.WriteStartObject();
        for (var k = 0; k < keys.Length; k++) json.WriteNumber(keys[k], Plain(numbers[k]));
        json.WriteEndObject();
    }

    // −0 is 0.
    private static double Plain(double value) => value + 0.0;
}
