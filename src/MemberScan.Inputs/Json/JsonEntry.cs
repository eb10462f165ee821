namespace MemberScan.Inputs.Json;

/// <summary>A key of an object with its value.</summary>
/// <param name="Key">The key, escapes resolved.</param>
/// <param name="KeyOffset">Byte at which the key begins.</param>
/// <param name="Value">The value.</param>
internal readonly record struct JsonEntry(string Key, int KeyOffset, JsonItem Value);
