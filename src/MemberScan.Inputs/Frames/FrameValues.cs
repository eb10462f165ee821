using System.Text.Json;
using MemberScan.Foundation.Geometry;
using MemberScan.Inputs.Json;
using MemberScan.Model.Frames;

namespace MemberScan.Inputs.Frames;

/// <summary>Values of a frame file: numbers, vectors, names of other entries.</summary>
internal sealed class FrameValues(JsonValues values)
{
    /// <summary>Largest magnitude of a number.</summary>
    public const double Largest = 1e25;

    /// <summary>Names of the six directions, in the order of <see cref="Direction"/>.</summary>
    public static readonly string[] Directions = ["ux", "uy", "uz", "rx", "ry", "rz"];

    /// <summary>The plain values.</summary>
    public JsonValues Json => values;

    /// <summary>Entries by key; keys outside of the known ones are errors, missing required ones too.</summary>
    public Dictionary<string, JsonItem> Entries(JsonItem item, string path, string[] required, string[] optional)
    {
        var found = new Dictionary<string, JsonItem>(StringComparer.Ordinal);
        foreach (var entry in values.Object(item, path, [.. required, .. optional])) found[entry.Key] = entry.Value;
        if (item.Kind == JsonValueKind.Object) _ = values.Has(item, path.Length == 0 ? "the file" : path, required);
        return found;
    }

    /// <summary>A finite number; 0 with an error.</summary>
    public double Number(JsonItem item, string path) => values.Number(item, path, -Largest, Largest) ?? 0;

    /// <summary>A number above zero, or from zero on; 1 with an error.</summary>
    public double Positive(JsonItem item, string path, bool zeroToo = false)
    {
        if (values.Number(item, path, -Largest, Largest) is not { } number) return 1;
        if (number > 0 || (zeroToo && number == 0)) return number;

        values.Fail(InputCodes.OutOfRange, item, $"{path} is {Excerpt.Of(item.Text)}; give a number {(zeroToo ? "of zero or above" : "above zero")}");
        return 1;
    }

    /// <summary>A list of three numbers; zeros with an error.</summary>
    public Vector3 Vector(JsonItem item, string path)
    {
        var items = values.List(item, path).ToArray();
        if (item.Kind != JsonValueKind.Array) return default;
        if (items.Length == 3) return new Vector3(Number(items[0], path), Number(items[1], path), Number(items[2], path));

        values.Fail(InputCodes.WrongType, item, $"{path} has {items.Length} numbers; give three, [x, y, z]");
        return default;
    }

    /// <summary>A vector of an entry that may be left out.</summary>
    public Vector3? Optional(Dictionary<string, JsonItem> entries, string key, string path) =>
        entries.TryGetValue(key, out var item) ? Vector(item, $"{path}.{key}") : null;

    /// <summary>The number of a named entry; −1 with an error that tells the nearest name.</summary>
    public int Reference(JsonItem item, string path, Dictionary<string, int> known, string what)
    {
        if (values.Text(item, path) is not { } name) return -1;
        if (known.TryGetValue(name, out var number)) return number;

        values.Fail(InputCodes.ReferenceUnknown, item, $"{path}: there is no {what} {Excerpt.Of(name)}; {Advice(name, known.Keys)}");
        return -1;
    }

    /// <summary>Tells that a key names nothing.</summary>
    public void UnknownKey(JsonItem at, string name, string path, Dictionary<string, int> known, string what) =>
        values.Fail(InputCodes.ReferenceUnknown, at, $"{path}: there is no {what} {Excerpt.Of(name)}; {Advice(name, known.Keys)}");

    /// <summary>One of the six directions; null with an error.</summary>
    public Direction? Direction(JsonItem item, string path) =>
        values.Word(item, path, Directions) is { } word ? (Direction)Array.IndexOf(Directions, word) : null;

    private static string Advice(string name, Dictionary<string, int>.KeyCollection known) => known.Count == 0 ? "there are none" : NearestName.Advice(name, known);
}
