using System.Collections.Immutable;
using System.Text.Json;
using System.Text.Unicode;

namespace MemberScan.Inputs.Json;

/// <summary>Reads JSON with comments and trailing commas into values that know their places; a doubled key is an error.</summary>
internal static class StrictJson
{
    /// <summary>Largest file that is read [bytes].</summary>
    public const int LargestFile = 1024 * 1024;

    /// <summary>Deepest nesting of objects and lists.</summary>
    public const int DeepestNesting = 16;

    /// <summary>Reads a file; null with an error when it is not JSON.</summary>
    public static JsonItem? Read(JsonSource source)
    {
        if (source.Bytes.Length > LargestFile)
        {
            source.Fail(InputCodes.SettingsLimit, 0, $"the file is larger than {LargestFile / 1024} KiB; take out what is not needed");
            return null;
        }

        var invalid = FirstInvalidByte(source.Bytes);
        if (invalid >= 0)
        {
            source.Fail(InputCodes.NotJson, invalid, "the text is not UTF-8 here; save the file in UTF-8");
            return null;
        }

        var mark = source.Bytes.StartsWith("\uFEFF"u8) ? 3 : 0;
        var reader = new Utf8JsonReader(source.Bytes[mark..], new JsonReaderOptions
        {
            CommentHandling = JsonCommentHandling.Skip,
            AllowTrailingCommas = true,
            MaxDepth = DeepestNesting,
        });
        try
        {
            _ = reader.Read();                                         // throws on an empty file
            var root = Value(ref reader, source, mark);
            while (reader.Read()) { }                                  // nothing but comments may follow
            return root;
        }
        catch (JsonException fault)
        {
            // The reader's own position stays at the token before the fault; only the exception knows the place.
            source.Fail(InputCodes.NotJson, OffsetOf(source.Bytes[mark..], fault) + mark, $"this is not JSON: {Sentence(fault)}");
            return null;
        }
        catch (InvalidOperationException)
        {
            // The way in which a string tells that an escape is half a character.
            source.Fail(InputCodes.NotJson, mark + (int)reader.TokenStartIndex, "the text holds half of a surrogate pair; write the whole character");
            return null;
        }
    }

    private static JsonItem Value(ref Utf8JsonReader reader, JsonSource source, int mark)
    {
        var offset = mark + (int)reader.TokenStartIndex;
        return reader.TokenType switch
        {
            JsonTokenType.StartObject => Object(ref reader, source, mark, offset),
            JsonTokenType.StartArray => List(ref reader, source, mark, offset),
            JsonTokenType.String => new JsonItem(JsonValueKind.String, offset, reader.GetString()!, [], []),
            JsonTokenType.Number => new JsonItem(JsonValueKind.Number, offset, System.Text.Encoding.UTF8.GetString(reader.ValueSpan), [], []),
            JsonTokenType.True => new JsonItem(JsonValueKind.True, offset, "", [], []),
            JsonTokenType.False => new JsonItem(JsonValueKind.False, offset, "", [], []),
            _ => new JsonItem(JsonValueKind.Null, offset, "", [], []),
        };
    }

    private static JsonItem Object(ref Utf8JsonReader reader, JsonSource source, int mark, int offset)
    {
        var entries = ImmutableArray.CreateBuilder<JsonEntry>();
        var keys = new HashSet<string>(StringComparer.Ordinal);
        while (reader.Read() && reader.TokenType == JsonTokenType.PropertyName)
        {
            var (key, keyOffset) = (reader.GetString()!, mark + (int)reader.TokenStartIndex);
            _ = reader.Read();
            var value = Value(ref reader, source, mark);
            if (keys.Add(key)) entries.Add(new JsonEntry(key, keyOffset, value));
            else source.Fail(InputCodes.KeyDoubled, keyOffset, $"the key {Excerpt.Of(key)} stands twice in one object; keep one of them");
        }

        return new JsonItem(JsonValueKind.Object, offset, "", entries.ToImmutable(), []);
    }

    private static JsonItem List(ref Utf8JsonReader reader, JsonSource source, int mark, int offset)
    {
        var items = ImmutableArray.CreateBuilder<JsonItem>();
        while (reader.Read() && reader.TokenType != JsonTokenType.EndArray) items.Add(Value(ref reader, source, mark));
        return new JsonItem(JsonValueKind.Array, offset, "", [], items.ToImmutable());
    }

    private static int FirstInvalidByte(ReadOnlySpan<byte> bytes)
    {
        if (Utf8.IsValid(bytes)) return -1;

        var at = 0;
        while (System.Text.Rune.DecodeFromUtf8(bytes[at..], out _, out var length) == System.Buffers.OperationStatus.Done) at += length;
        return at;
    }

    private static int OffsetOf(ReadOnlySpan<byte> bytes, JsonException fault)
    {
        var start = 0;
        for (var line = 0L; line < (fault.LineNumber ?? 0); line++)
        {
            var end = bytes[start..].IndexOf((byte)'\n');
            if (end < 0) break;
            start += end + 1;
        }

        return start + (int)(fault.BytePositionInLine ?? 0);
    }

    // The message ends with a place counted from 0, and may repeat text of the file.
    private static string Sentence(JsonException fault)
    {
        var end = fault.Message.IndexOf(" LineNumber:", StringComparison.Ordinal);
        var text = end < 0 ? fault.Message : fault.Message[..end];
        return string.Concat(text.Take(200).Select(letter => Excerpt.IsPlain(letter) ? letter : '?')).TrimEnd('.');
    }
}
