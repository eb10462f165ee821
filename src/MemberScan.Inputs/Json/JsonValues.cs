using System.Text.Json;
using MemberScan.Foundation.Units;
using MemberScan.Inputs.Values;
using MemberScan.Model.Rules;

namespace MemberScan.Inputs.Json;

/// <summary>Takes typed values out of JSON; each wrong one is an error at its place that names the key and the remedy.</summary>
internal sealed class JsonValues(JsonSource source)
{
    /// <summary>Longest text of a setting [characters].</summary>
    public const int LongestText = 256;

    /// <summary>What is wrong with a pattern over names; null when nothing is.</summary>
    public string? PatternFault(string pattern) => source.IsShipped ? null : GradePattern.Fault(pattern);

    /// <summary>Adds an error at a value.</summary>
    public void Fail(string code, JsonItem at, string message) => source.Fail(code, at.Offset, message);

    /// <summary>The entries of an object; keys outside <paramref name="known"/> are errors and left out.</summary>
    public IEnumerable<JsonEntry> Object(JsonItem item, string path, IReadOnlyCollection<string> known)
    {
        var entries = new List<JsonEntry>();
        foreach (var entry in Object(item, path))
        {
            if (known.Contains(entry.Key)) entries.Add(entry);
            else source.Fail(InputCodes.KeyUnknown, entry.KeyOffset, $"{Excerpt.Of(entry.Key)} is not a key{In(path)}; {NearestName.Advice(entry.Key, known)}");
        }

        return entries;
    }

    /// <summary>The entries of an object whose keys are free; empty ones are errors.</summary>
    public IEnumerable<JsonEntry> Object(JsonItem item, string path)
    {
        if (!Is(item, path, JsonValueKind.Object, "an object in braces")) return [];

        foreach (var entry in item.Entries)
            if (entry.Key.Length is 0 or > LongestText)
                source.Fail(InputCodes.TextUnusable, entry.KeyOffset, $"a key{In(path)} is empty or longer than {LongestText} characters; give a name");
        return item.Entries.Where(entry => entry.Key.Length is > 0 and <= LongestText);
    }

    /// <summary>The items of a list.</summary>
    public IEnumerable<JsonItem> List(JsonItem item, string path) =>
        Is(item, path, JsonValueKind.Array, "a list in square brackets") ? item.Items : [];

    /// <summary>A text that is not empty and has no control characters; null with an error.</summary>
    public string? Text(JsonItem item, string path)
    {
        if (!Is(item, path, JsonValueKind.String, "a text in quotes")) return null;
        if (item.Text.Trim().Length > 0 && item.Text.Length <= LongestText && item.Text.All(letter => Excerpt.IsPlain(letter) || char.IsSurrogate(letter)))
            return item.Text;

        Fail(InputCodes.TextUnusable, item, $"{path} is empty, longer than {LongestText} characters or holds control characters; give a plain text");
        return null;
    }

    /// <summary>One of several words; null with an error.</summary>
    public string? Word(JsonItem item, string path, IReadOnlyCollection<string> words)
    {
        if (!Is(item, path, JsonValueKind.String, $"{(words.Count == 1 ? "the text" : "one of the texts")} {string.Join(", ", words.Select(word => $"\"{word}\""))}")) return null;
        if (words.Contains(item.Text)) return item.Text;

        Fail(InputCodes.WordUnknown, item, $"{path} is {Excerpt.Of(item.Text)}; {NearestName.Advice(item.Text, words)}");
        return null;
    }

    /// <summary>A finite number in a closed range; null with an error.</summary>
    public double? Number(JsonItem item, string path, double least, double most)
    {
        if (!Is(item, path, JsonValueKind.Number, "a number without quotes")) return null;

        var fault = NumberText.Read(item.Text, out var value);
        if (fault == NumberFault.None && value >= least && value <= most) return value;

        Fail(InputCodes.OutOfRange, item, string.Create(System.Globalization.CultureInfo.InvariantCulture,
            $"{path} is {Excerpt.Of(item.Text)}; give a number from {least:R} to {most:R}"));
        return null;
    }

    /// <summary>True or false; null with an error.</summary>
    public bool? Flag(JsonItem item, string path)
    {
        if (item.Kind is JsonValueKind.True or JsonValueKind.False) return item.Kind == JsonValueKind.True;

        Fail(InputCodes.WrongType, item, $"{path} is {item.Word}; give true or false");
        return null;
    }

    /// <summary>A text of a number with its unit, in SI and within a closed range; null with an error.</summary>
    public double? Quantity(JsonItem item, string path, Quantity quantity, string example, double least, double most)
    {
        if (!Is(item, path, JsonValueKind.String, $"a text with its unit, such as \"{example}\"")) return null;
        if (!QuantityText.TryRead(item.Text, quantity, example, out var value, out var error))
        {
            Fail(InputCodes.ValueUnit, item, $"{path}: {error}");
            return null;
        }

        if (value >= least && value <= most) return value;
        Fail(InputCodes.OutOfRange, item, $"{path} is {Excerpt.Of(item.Text)}, which cannot be meant; write for example \"{example}\"");
        return null;
    }

    /// <summary>Refuses an object that lacks a key.</summary>
    public bool Has(JsonItem item, string path, params ReadOnlySpan<string> keys)
    {
        var complete = true;
        foreach (var key in keys)
        {
            if (item.Kind != JsonValueKind.Object || item.Entries.Any(entry => entry.Key == key)) continue;
            Fail(InputCodes.KeyMissing, item, $"{path} lacks the key '{key}'; add it");
            complete = false;
        }

        return complete;
    }

    private bool Is(JsonItem item, string path, JsonValueKind kind, string wanted)
    {
        if (item.Kind == kind) return true;

        Fail(InputCodes.WrongType, item, $"{(path.Length == 0 ? "the file" : path)} is {item.Word}; give {wanted}");
        return false;
    }

    private static string In(string path) => path.Length == 0 ? "" : $" of {path}";
}
