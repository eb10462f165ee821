namespace MemberScan.Mechanics.Forces;

/// <summary>Section forces at one place along a member. Two stations at the same place are a jump: first left, then right of it.</summary>
/// <param name="X">Distance from the member's start [m].</param>
/// <param name="Forces">The six section forces there.</param>
public readonly record struct ForceStation(double X, SectionForces Forces);
