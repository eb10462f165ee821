namespace MemberScan.Statics.Members;

/// <summary>Displacement and turn of a cross-section in the member's axes.</summary>
/// <param name="X">Shift along x [m].</param>
/// <param name="Y">Shift along y [m].</param>
/// <param name="Z">Shift along z [m].</param>
/// <param name="TurnX">Turn about x [rad].</param>
/// <param name="TurnY">Turn about y [rad].</param>
/// <param name="TurnZ">Turn about z [rad].</param>
internal readonly record struct EndDisplacement(double X, double Y, double Z, double TurnX, double TurnY, double TurnZ)
{
    public static EndDisplacement operator +(in EndDisplacement a, in EndDisplacement b) =>
        new(a.X + b.X, a.Y + b.Y, a.Z + b.Z, a.TurnX + b.TurnX, a.TurnY + b.TurnY, a.TurnZ + b.TurnZ);

    /// <summary>Carried rigidly along x by a distance [m].</summary>
    public EndDisplacement Carried(double distance) => this with { Y = Y + TurnZ * distance, Z = Z - TurnY * distance };

    /// <summary>What strains over a short length, at a distance before a cross-section, do to that cross-section.</summary>
    public static EndDisplacement Of(in Strains e, double length, double distance) => new(
        length * e.Axial, length * (e.ShearY + distance * e.BendZ), length * (e.ShearZ - distance * e.BendY),
        length * e.Twist, length * e.BendY, length * e.BendZ);
}
