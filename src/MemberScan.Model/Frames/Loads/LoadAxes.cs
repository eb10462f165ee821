namespace MemberScan.Model.Frames.Loads;

/// <summary>Axes of the components of a member load.</summary>
public enum LoadAxes
{
    /// <summary>The member's x, y, z, per length of the member.</summary>
    Local,

    /// <summary>Global X, Y, Z, per length of the member.</summary>
    Global,

    /// <summary>Global X, Y, Z, each per length of the member's projection on the plane square to that component.</summary>
    Projected,
}
