using System.Collections.Immutable;

namespace MemberScan.Ifc.WriteBack;

/// <summary>The results that an element carries.</summary>
/// <param name="StepId">Number after '#' of the element.</param>
/// <param name="GlobalId">Its GlobalId.</param>
/// <param name="Keyword">Its class, upper case.</param>
/// <param name="Name">Its name; empty if none.</param>
/// <param name="Values">Its properties in the order of the set.</param>
public sealed record ElementResults(ulong StepId, string GlobalId, string Keyword, string Name, ImmutableArray<ElementResult> Values);
