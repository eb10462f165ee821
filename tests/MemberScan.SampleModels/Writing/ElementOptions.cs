namespace MemberScan.SampleModels.Writing;

/// <summary>What an element may carry besides its name, placement and shape.</summary>
public sealed record ElementOptions
{
    /// <summary>Nothing besides.</summary>
    public static ElementOptions None { get; } = new();

    /// <summary>What the GlobalId follows from; the name when null.</summary>
    public string? Key { get; init; }

    /// <summary>Tag.</summary>
    public string? Tag { get; init; }

    /// <summary>Description.</summary>
    public string? Description { get; init; }

    /// <summary>ObjectType.</summary>
    public string? ObjectType { get; init; }

    /// <summary>Literal of PredefinedType, written where the class and schema have one.</summary>
    public string? PredefinedType { get; init; }

    /// <summary>The name parameter as it shall stand in the file, apostrophes included, well formed or not; instead of the name.</summary>
    public string? NameSpelling { get; init; }

    /// <summary>Whether the element is contained in the storey; parts of an assembly are not.</summary>
    public bool IsContained { get; init; } = true;
}
