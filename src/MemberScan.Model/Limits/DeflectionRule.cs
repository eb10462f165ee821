namespace MemberScan.Model.Limits;

/// <summary>A limit of deflection that the reviewer names for a role; a note, never part of a verdict.</summary>
/// <param name="Name">Its name, as printed beside the value.</param>
/// <param name="Role">Role of the members.</param>
/// <param name="SpanOver">Span over the largest deflection [-]; null for none.</param>
/// <param name="Largest">Largest deflection [m]; null for none.</param>
public sealed record DeflectionRule(string Name, string Role, double? SpanOver, double? Largest);
