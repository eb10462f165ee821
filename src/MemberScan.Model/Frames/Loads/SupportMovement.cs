namespace MemberScan.Model.Frames.Loads;

/// <summary>A displacement forced upon a fixed direction of a support.</summary>
/// <param name="Node">Number of the node, from 0.</param>
/// <param name="Direction">Direction in the axes of the support; it must be fixed.</param>
/// <param name="Value">Shift [m] or turn [rad].</param>
public readonly record struct SupportMovement(int Node, Direction Direction, double Value);
