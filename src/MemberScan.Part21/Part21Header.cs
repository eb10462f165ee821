using System.Collections.Immutable;

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
}
