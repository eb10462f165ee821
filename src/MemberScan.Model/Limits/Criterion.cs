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

    /// <summary>AISC 360-22 with the factors of ASD: first yield of hollow sections, H3.3 for the others (service situations).</summary>
    Aisc360Asd,

    /// <summary>AISC 360-22 with the factors of LRFD: first yield of hollow sections, H3.3 for the others (design situations).</summary>
    Aisc360Lrfd,

    /// <summary>Principal stresses against given limits of a brittle material (situations of the kind that the limits are given for).</summary>
    LargestNormalStress,
}
