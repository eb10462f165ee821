using System.Collections.Immutable;
using MemberScan.Part21.Reading;
using MemberScan.Part21.Tokens;

namespace MemberScan.Part21;

/// <summary>The header section; missing entries are empty.</summary>
public sealed record Part21Header
{
    /// <summary>Entries of FILE_DESCRIPTION's description.</summary>
    public ImmutableArray<string> Description { get; init; } = [];

    /// <summary>Name in FILE_NAME.</summary>
    public string Name { get; init; } = "";

    /// <summary>Time stamp in FILE_NAME as written.</summary>
    public string TimeStamp { get; init; } = "";

    /// <summary>Preprocessor version in FILE_NAME.</summary>
    public string PreprocessorVersion { get; init; } = "";

    /// <summary>Originating system in FILE_NAME.</summary>
    public string OriginatingSystem { get; init; } = "";

    /// <summary>Identifiers in FILE_SCHEMA as written.</summary>
    public ImmutableArray<string> Schemas { get; init; } = [];

    // The first entry of a keyword counts; a text in place of a list counts as a list of one.
    internal static Part21Header From(SourceText source, IReadOnlyList<HeaderEntry> entries)
    {
        var description = Parameters(source, entries, "FILE_DESCRIPTION");
        var name = Parameters(source, entries, "FILE_NAME");
        var schema = Parameters(source, entries, "FILE_SCHEMA");
        return new Part21Header
        {
            Description = TextsAt(description, 0),
            Name = TextAt(name, 0),
            TimeStamp = TextAt(name, 1),
            PreprocessorVersion = TextAt(name, 4),
            OriginatingSystem = TextAt(name, 5),
            Schemas = TextsAt(schema, 0),
        };
    }

    private static Part21Value[] Parameters(SourceText source, IReadOnlyList<HeaderEntry> entries, string keyword)
    {
        foreach (var entry in entries)
        {
            if (entry.Keyword == keyword) return Part21Value.All(source, entry.Start, entry.Length);
        }

        return [];
    }

    private static string TextAt(Part21Value[] parameters, int index) =>
        index < parameters.Length && parameters[index].TryText(out var text) ? text : "";

    private static ImmutableArray<string> TextsAt(Part21Value[] parameters, int index)
    {
        if (index >= parameters.Length) return [];
        if (parameters[index].TryText(out var single)) return [single];

        var texts = ImmutableArray.CreateBuilder<string>();
        foreach (var item in parameters[index].Items)
        {
            if (item.TryText(out var text)) texts.Add(text);
        }

        return texts.ToImmutable();
    }
}
