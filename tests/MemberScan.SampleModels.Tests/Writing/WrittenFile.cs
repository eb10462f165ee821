using System.Globalization;
using System.Text;

namespace MemberScan.SampleModels.Tests.Writing;

/// <summary>A plain reading of a written file for tests: instances with their parameters as text, split at top-level commas.</summary>
internal sealed class WrittenFile
{
    public WrittenFile(IEnumerable<byte> bytes)
    {
        Text = Encoding.ASCII.GetString([.. bytes]);
        foreach (var line in Text.Split('\n').Where(l => l.StartsWith('#')))
        {
            var equals = line.IndexOf('=', StringComparison.Ordinal);
            var open = line.IndexOf('(', StringComparison.Ordinal);
            Assert.EndsWith(");", line, StringComparison.Ordinal);
            Instances.Add(int.Parse(line.AsSpan(1, equals - 1), CultureInfo.InvariantCulture), (line[(equals + 1)..open], Split(line[(open + 1)..^2])));
        }
    }

    public string Text { get; }

    public Dictionary<int, (string Keyword, string[] Parameters)> Instances { get; } = [];

    public string Schema => Text.Split("FILE_SCHEMA(('")[1].Split('\'')[0];

    public IEnumerable<(int Id, string[] Parameters)> Of(string keyword) =>
        Instances.Where(i => i.Value.Keyword == keyword).Select(i => (i.Key, i.Value.Parameters));

    public string[] At(string reference) => Instances[Id(reference)].Parameters;

    public static int Id(string reference) => int.Parse(reference.AsSpan(1), CultureInfo.InvariantCulture);

    public static string[] List(string text) => Split(text[1..^1]);

    public static double Number(string text) => double.Parse(text, CultureInfo.InvariantCulture);

    public double[] Numbers(string reference) => [.. List(At(reference)[0]).Select(Number)];

    private static string[] Split(string text)
    {
        if (text.Length == 0) return [];

        var parts = new List<string>();
        var (depth, start, inString) = (0, 0, false);
        for (var i = 0; i < text.Length; i++)
        {
            if (text[i] == '\'') inString = !inString;
            if (inString) continue;

            if (text[i] == '(') depth++;
            else if (text[i] == ')') depth--;
            else if (text[i] == ',' && depth == 0)
            {
                parts.Add(text[start..i]);
                start = i + 1;
            }
        }

        Assert.Equal(0, depth);
        Assert.False(inString);
        return [.. parts, text[start..]];
    }
}
