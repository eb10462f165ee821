namespace MemberScan.Model.Members;

/// <summary>What names an element in its model.</summary>
/// <param name="StepId">Number after '#'.</param>
/// <param name="GlobalId">GlobalId as written, also when malformed.</param>
/// <param name="Class">Class in its schema's spelling, such as <c>IfcMember</c>.</param>
/// <param name="PredefinedType">Predefined type of the element or its type; empty if none.</param>
/// <param name="Name">Name; empty if none.</param>
/// <param name="Tag">Tag; empty if none.</param>
/// <param name="TypeName">Name of its type object; empty if none.</param>
/// <param name="Storey">Name of its storey or other container; empty if none.</param>
public sealed record ElementIdentity(
    ulong StepId, string GlobalId, string Class, string PredefinedType, string Name, string Tag, string TypeName, string Storey)
{
    /// <summary>Names of what contains it, from the outermost to its storey, with <c> / </c> between; empty if none.</summary>
    public string StoreyPath { get; init; } = "";

    /// <summary>Name of the assembly that it is part of, its GlobalId where it has no name; empty if none.</summary>
    public string Assembly { get; init; } = "";

    /// <summary>Name of the presentation layer of its body; empty if none.</summary>
    public string Layer { get; init; } = "";
}
