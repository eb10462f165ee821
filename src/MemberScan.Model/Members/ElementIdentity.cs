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
    ulong StepId, string GlobalId, string Class, string PredefinedType, string Name, string Tag, string TypeName, string Storey);
