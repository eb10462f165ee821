using MemberScan.Mechanics.Forces;

namespace MemberScan.Statics;

/// <summary>The least and largest value of a section force over a whole member, between stations too.</summary>
/// <param name="Component">Which force.</param>
/// <param name="Least">Smallest value [N, N·m].</param>
/// <param name="LeastAt">Where, distance from the flexible start [m].</param>
/// <param name="Largest">Largest value [N, N·m].</param>
/// <param name="LargestAt">Where, distance from the flexible start [m].</param>
public readonly record struct MemberExtreme(ForceComponent Component, double Least, double LeastAt, double Largest, double LargestAt);
