namespace MemberScan.Model.Frames;

/// <summary>How one direction is held: between a node and the ground, or between a member end and its node.</summary>
/// <param name="Kind">Free, fixed or by a spring.</param>
/// <param name="Stiffness">Of a spring: force per shift [N/m] or moment per turn [N·m/rad], above zero; 0 for the other kinds.</param>
/// <param name="Displacement">Of a fixed direction of a support: the shift [m] or turn [rad] forced upon it in every situation; 0 otherwise.</param>
public readonly record struct Restraint(RestraintKind Kind, double Stiffness, double Displacement)
{
    /// <summary>Not held.</summary>
    public static Restraint Free => default;

    /// <summary>Held rigidly.</summary>
    public static Restraint Fixed => new(RestraintKind.Fixed, 0, 0);

    /// <summary>Held by a spring of the given stiffness [N/m, N·m/rad].</summary>
    public static Restraint Spring(double stiffness) => new(RestraintKind.Spring, stiffness, 0);

    /// <summary>Held where it is forced to, in every situation [m, rad].</summary>
    public static Restraint Moved(double displacement) => new(RestraintKind.Fixed, 0, displacement);
}
