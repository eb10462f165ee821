namespace MemberScan.Mechanics.Forces;

/// <summary>One of the six section forces.</summary>
public enum ForceComponent
{
    /// <summary>Axial force [N].</summary>
    N,

    /// <summary>Shear force along y [N].</summary>
    Vy,

    /// <summary>Shear force along z [N].</summary>
    Vz,

    /// <summary>Torsional moment [N·m].</summary>
    T,

    /// <summary>Bending moment about y [N·m].</summary>
    My,

    /// <summary>Bending moment about z [N·m].</summary>
    Mz,
}
