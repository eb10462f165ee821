namespace MemberScan.Model.Limits;

/// <summary>What stress is compared with what.</summary>
public enum Criterion
{
    /// <summary>Equivalent stress of von Mises against <c>fy/Ω</c> (service situations).</summary>
    AllowableVonMises,

    /// <summary>Equivalent stress of Tresca against <c>fy/Ω</c> (service situations).</summary>
    AllowableTresca,

    /// <summary>EN 1993-1-1:2005 6.2.1(5) with γM0 (design situations).</summary>
    En1993Elastic,
}
