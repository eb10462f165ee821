using MemberScan.Mechanics.Forces;

namespace MemberScan.Model.Rules.PropertySets;

/// <summary>Which property holds one section force.</summary>
/// <param name="Component">The section force.</param>
/// <param name="Property">Name of the property, without regard to case; <c>*</c> and <c>?</c> are wildcards, <c>{station}</c> stands for the station in it.</param>
/// <param name="Factor">SI size of a bare number [N] or [N·m]; null when bare numbers have none and are not used.</param>
/// <param name="Unit">Symbol of that unit; empty for none.</param>
public sealed record ComponentMapping(ForceComponent Component, string Property, double? Factor, string Unit);
