using System.Text.Json;

namespace MemberScan.Reporting.Data;

/// <summary>Distinct texts with their numbers; number 0 is the empty text.</summary>
internal sealed class TextPool
{
    private readonly Dictionary<string, uint> _numbers = new(StringComparer.Ordinal) { [""] = 0 };
    private readonly List<string> _texts = [""];

    /// <summary>The number of a text; a text met for the first time gets the next one.</summary>
    public uint NumberOf(string text)
    {
        if (_numbers.TryGetValue(text, out var number)) return number;

        number = (uint)_texts.Count;
        _numbers.Add(text, number);
        _texts.Add(text);
        return number;
    }

    /// <summary>All texts in the order of their numbers.</summary>
    public void Write(Utf8JsonWriter json)
    {
        json.WriteStartArray("texts");
        foreach (var text in _texts) json.WriteStringValue(text);
        json.WriteEndArray();
    }
}
