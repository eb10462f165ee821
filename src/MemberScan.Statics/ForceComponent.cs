namespace MemberScan.Statics;

/// <summary>One of the six section forces.</summary>
public enum ForceComponent
{
    /// <summary>Axial force.</summary>
    N,

    /// <summary>Shear force along y.</summary>
    Vy,

    /// <summary>Shear force along z.</summary>
    Vz,

    /// <summary>Torsional moment.</summary>
    T,

    /// <summary>Bending moment about y.</summary>
    My,

    /// <summary>Bending moment about z.</summary>
    Mz,
}
