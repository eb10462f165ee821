namespace MemberScan.Foundation.Units;

/// <summary>What a unit measures.</summary>
public enum Quantity
{
    /// <summary>Length [m].</summary>
    Length,

    /// <summary>Force [N].</summary>
    Force,

    /// <summary>Moment of a force [N·m].</summary>
    Moment,

    /// <summary>Stress, strength or modulus [Pa].</summary>
    Stress,

    /// <summary>Share of a whole [-].</summary>
    Ratio,

    /// <summary>Plane angle [rad].</summary>
    Angle,
}
