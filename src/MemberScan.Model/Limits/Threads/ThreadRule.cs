namespace MemberScan.Model.Limits.Threads;

/// <summary>The rule that tension in a thread is held against.</summary>
public enum ThreadRule
{
    /// <summary>Equivalent stress on the root diameter against the stress limit of the basis.</summary>
    Basis,

    /// <summary>A given allowable stress on a named area, for service situations.</summary>
    Allowable,

    /// <summary>AISC 360-22 J3.7: 0.75·Fu on the nominal area with Ω or φ.</summary>
    Aisc360,

    /// <summary>EN 1993-1-8 Table 3.4: 0.9·fub on the stress area over γM2.</summary>
    En1993,
}
