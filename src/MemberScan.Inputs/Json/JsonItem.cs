using System.Collections.Immutable;
using System.Text.Json;

namespace MemberScan.Inputs.Json;

/// <summary>A JSON value with its place in the file.</summary>
/// <param name="Kind">What it is.</param>
/// <param name="Offset">Byte at which it begins.</param>
/// <param name="Text">Text of a string, escapes resolved; digits of a number as written; empty for the others.</param>
/// <param name="Entries">Entries of an object, in the order of the file.</param>
/// <param name="Items">Items of an array.</param>
internal sealed record JsonItem(
    JsonValueKind Kind, int Offset, string Text, ImmutableArray<JsonEntry> Entries, ImmutableArray<JsonItem> Items)
{
    /// <summary>What it is, as the end of a sentence.</summary>
    public string Word => Kind switch
    {
        JsonValueKind.Object => "an object",
        JsonValueKind.Array => "a list",
        JsonValueKind.String => "a text",
        JsonValueKind.Number => "a number",
        JsonValueKind.Null => "null",
        _ => "true or false",
    };
}
